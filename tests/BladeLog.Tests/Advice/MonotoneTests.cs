using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using CsCheck;

namespace BladeLog.Tests.Advice;

/// <summary>Which way an answer must go when one thing changes.</summary>
public sealed class MonotoneTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    [Fact]
    public void The_chance_of_a_break_grows_with_the_hours_ahead_and_never_passes_one() =>
        Gen.Select(Gen.Double[0, 3], Gen.Double[1e-6, 2], Gen.Double[1e-6, 2]).Sample((used, first, more) =>
        {
            double near = AdviceSettings.Handbook.Level.BreakChance(used, first), far = AdviceSettings.Handbook.Level.BreakChance(used, first + more);
            Assert.InRange(near, 0, far);
            Assert.InRange(far, near, 1);
        }, iter: 200, threads: 1);

    [Fact]
    public void Two_steps_in_turn_are_one_long_step() =>
        Gen.Select(Gen.Double[0, 2], Gen.Double[1e-4, 1], Gen.Double[1e-4, 1]).Sample((used, first, then) =>
        {
            LevelSurvives(used, first, then);
        }, iter: 100, threads: 1);

    [Fact]
    public void More_hours_never_leave_more_life() =>
        Gen.Select(Gen.Double[0, 40], Gen.Double[0, 40]).Sample((a, b) =>
        {
            double less = Left(Math.Min(a, b)), more = Left(Math.Max(a, b));
            Assert.True(more <= less + 1e-9);
        }, iter: 100, threads: 1);

    [Fact]
    public void A_duller_edge_opens_no_gate()
    {
        foreach (QueuedCut cut in shop.Now.Cuts.Where(c => c.Material != MaterialKind.Other))
        {
            foreach (Choice c in shop.Advice.For(cut).Choices.Where(c => c.Gate is not null))
            {
                BladeFile dull = c.Blade.File with { SinceSharpening = [.. c.Blade.File.SinceSharpening, new PathLine("A2", Dirt.Clean, 1_000_000, 0)] };
                Choice later = shop.Advice.Try(c.Work, shop.Advice.On(dull, c.Saw), c.Saw, c.SpeedMps);
                Assert.True(later.Gate is null || later.Gate.RubbingMps > c.Gate!.RubbingMps);

                // Where no chip forms a rounder edge rides more easily: only feeds that cut are compared.
                Assert.True(later.Gate is null || c.Gate!.Green.GreenMps < later.Gate.NoChipMps || later.Gate.Green.GreenMps <= c.Gate.Green.GreenMps + 1e-12, $"{c.Tag} in cut {cut.Number}");
                Assert.True(later.Gate is null || later.Gate.State >= c.Gate!.State, $"{c.Tag} in cut {cut.Number}");
            }
        }
    }

    [Fact]
    public void Amber_lies_never_below_green_and_the_working_feed_within_the_window()
    {
        foreach (Choice c in shop.Now.Cuts.SelectMany(q => shop.Advice.For(q).Choices).Where(c => c.Gate is not null))
        {
            Assert.All(c.Gate!.Limits, l => Assert.True(l.AmberMps >= l.GreenMps));
            Assert.True(c.Gate.NoChipMps < c.Gate.RubbingMps);
            if (c.Gate.AdvisedMps is { } feed)
            {
                Assert.InRange(feed, c.Gate.LowMps!.Value, c.Gate.HighMps!.Value * (1 + 1e-12));
            }
        }
    }

    [Fact]
    public void A_raised_guide_and_a_slack_blade_stand_less_and_a_wider_blade_more()
    {
        Choice[] tried = [.. shop.Now.Cuts.SelectMany(q => shop.Advice.For(q).Choices).Where(c => c.Gate is not null)];
        Dictionary<WhatIfKind, int> seen = [];
        foreach (WhatIf w in tried.SelectMany(c => shop.Advice.WhatIf(c, all: true)))
        {
            seen[w.Kind] = seen.GetValueOrDefault(w.Kind) + 1;
            switch (w.Kind)
            {
                case WhatIfKind.RaisedGuide or WhatIfKind.SlackBlade:
                    Assert.True(w.After < w.Before, w.Sentence);
                    break;
                case WhatIfKind.HalfTheTeeth:
                    Assert.True(w.After > w.Before, w.Sentence);
                    break;
            }
        }

        Assert.Equal(4, seen.Count);
    }

    [Fact]
    public void A_wider_blade_at_the_same_tension_stands_more()
    {
        Choice c = shop.Advice.For(shop.Cut(7)).Choices.Single(x => x.Tag == "Q-02");
        WhatIf wide = shop.Advice.WhatIf(c, all: true).Single(w => w.Kind == WhatIfKind.WiderBlade);
        Assert.True(wide.After > wide.Before);
        Assert.Contains("A wider blade, 50.0 mm, would stand", wide.Sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void Only_what_matters_is_told_of_a_choice()
    {
        Assert.DoesNotContain(shop.Advice.WhatIf(shop.Advice.For(shop.Cut(2)).First!), w => w.Kind == WhatIfKind.SlackBlade);
        Assert.Contains(shop.Advice.WhatIf(shop.Advice.For(shop.Cut(9)).First!), w => w.Kind == WhatIfKind.RaisedGuide);
    }

    [Fact]
    public void A_strain_shop_reads_of_strain()
    {
        Shop mill = new() { Name = "Mill", Zone = "Etc/UTC", RateMinorPerHour = 4800, PullWord = PullWord.Strain };
        ShopAdvice advice = new(shop.Now with { Shop = mill });
        Choice c = advice.For(shop.Cut(9)).First!;
        Assert.Contains("two thirds of this strain", advice.WhatIf(c).Single(w => w.Kind == WhatIfKind.SlackBlade).Sentence, StringComparison.Ordinal);
    }

    private double Left(double hours)
    {
        BladeFile q17 = shop.Blade("Q-17");
        return shop.Advice.On(q17 with { Exposures = [q17.Exposures[0] with { RunningMs = (long)(hours * 3_600_000) }] }, shop.Saw("S3")).Record.HoursLeft!.Value;
    }

    private static void LevelSurvives(double used, double first, double then)
    {
        BladeLog.Advice.Life.LevelPrior level = AdviceSettings.Handbook.Level;
        double inTurn = (1 - level.BreakChance(used, first)) * (1 - level.BreakChance(used + first, then));
        Assert.Equal(1 - level.BreakChance(used, first + then), inTurn, 9);
    }
}

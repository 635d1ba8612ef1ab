using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Fatigue;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>The stories the invented shop must tell: demo-shop specification 5 and 7.</summary>
public sealed class StoriesTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    [Theory]
    [InlineData(6, "Q-01", "2.2 teeth in the cut (3 needed)")]
    [InlineData(7, "Q-32", "edge 39 µm, too dull for this (30 µm)")]
    [InlineData(15, "Q-30", "tightest curve 20 mm, hard bound 14")]
    [InlineData(2, "Q-12", "the push needed to make it cut would twist the blade")]
    [InlineData(1, "Q-02", "tightest curve 180 mm")]
    public void Refusals_read_well(int number, string tag, string sentence)
    {
        Choice refused = Choices(number).Single(c => c.Tag == tag);
        Assert.Equal(Verdict.No, refused.Verdict);
        Assert.StartsWith(sentence, refused.Reason.Sentence, StringComparison.Ordinal);
    }

    [Fact]
    public void A_cracked_blade_is_refused_everywhere_and_first_of_all()
    {
        foreach (QueuedCut cut in shop.Now.Cuts.Where(c => c.Number != 13))
        {
            Assert.Equal("on hold: crack 2.6 mm in a gullet", Choices(cut.Number).Single(c => c.Tag == "Q-14").Reason.Sentence);
        }

        Assert.Null(shop.Of("Q-14").Life);
        Assert.Equal(BladeState.Hold, shop.Of("Q-14").State);
    }

    [Fact]
    public void Without_the_hold_it_would_fit_the_four_resaw_cuts()
    {
        BladeFile whole = shop.Blade("Q-14") with { Hold = null };
        int[] fits = [.. new[] { 2, 3, 4, 14 }.Where(n => shop.Advice.Try(shop.Advice.For(shop.Cut(n)).Work, shop.Advice.On(whole, shop.Saw("S2")), shop.Saw("S2")).Verdict == Verdict.Fits)];
        Assert.Equal([2, 3, 4, 14], fits);
    }

    [Theory]
    [InlineData("Q-07")]
    [InlineData("Q-10")]
    [InlineData("Q-33")]
    [InlineData("Q-34")]
    [InlineData("Q-35")]
    public void Blades_away_say_in_which_batch(string tag)
    {
        foreach (QueuedCut cut in shop.Now.Cuts.Where(c => c.Number != 13))
        {
            Assert.Equal("at the sharpener, batch B-031", Choices(cut.Number).Single(c => c.Tag == tag).Reason.Sentence);
        }
    }

    [Fact]
    public void Aluminium_is_refused_to_every_blade_for_the_material()
    {
        CutAnswer answer = shop.Advice.For(shop.Cut(13));
        Assert.Null(answer.First);
        Assert.Empty(answer.Proposals);
        Assert.NotEmpty(answer.Choices);
        Assert.All(answer.Choices, c => Assert.Equal(ReasonKind.Material, c.Reason.Kind));
    }

    [Fact]
    public void Every_blade_that_is_not_gone_is_listed_once_for_each_saw_it_fits()
    {
        string[] here = [.. shop.Now.Blades.Where(b => b.Place != Place.Gone).Select(b => b.Blade.Tag).Order(StringComparer.Ordinal)];
        foreach (QueuedCut cut in shop.Now.Cuts)
        {
            Assert.Equal(here, Choices(cut.Number).Select(c => c.Tag).Order(StringComparer.Ordinal));
        }
    }

    [Fact]
    public void Two_stacked_sheets_of_plywood_are_cheaper_on_the_bench_saw()
    {
        Proposal[] stacks = [.. shop.Advice.For(shop.Cut(8)).Proposals.Where(p => p.Kind == ProposalKind.Stack)];
        Assert.Equal(["Q-30", "Q-20"], stacks.Select(p => p.Outcome.Tag));
        Choice finch = stacks[0].Outcome, wren = stacks[1].Outcome;
        Assert.Equal("Stack two pieces: Q-30 on Finch then has 5.7 teeth in the cut and takes 1.2 to 2.0 m/min, with care (front edge goes slack: light hand).", stacks[0].Sentence);
        Assert.True(finch.Relief);
        Holds("1.22", finch.Gate!.LowMps!.Value * 60);
        Holds("2.00", finch.Gate.HighMps!.Value * 60);
        Holds("31.53", finch.Job!.Cost.Total / 100);
        Assert.Equal((15.2, Verdict.WithCare), (wren.SpeedMps, wren.Verdict));
        Holds("1.64", wren.Gate!.LowMps!.Value * 60);
        Holds("33.97", wren.Job!.Cost.Total / 100);
        Assert.All(stacks, p => Assert.Equal(30, p.Outcome.Work.Cuts));
    }

    [Fact]
    public void Proposals_are_told_only_where_they_help()
    {
        foreach (CutAnswer answer in shop.Now.Cuts.Select(shop.Advice.For))
        {
            Choice? best = answer.First;
            Assert.All(answer.Proposals.Where(p => p.Kind is ProposalKind.Stack or ProposalKind.SharpenFirst or ProposalKind.Buy or ProposalKind.ComesBack), p =>
                Assert.True(best is null || p.Outcome.Verdict < best.Verdict || p.Outcome.Job!.Cost.Total < best.Job!.Cost.Total));
            Assert.Equal(answer.Proposals.OrderBy(p => p.Kind), answer.Proposals);
        }

        Assert.Contains(shop.Advice.For(shop.Cut(15)).Proposals, p => p.Kind == ProposalKind.SlowerSpeed);
    }

    [Fact]
    public void With_only_a_dull_blade_left_it_says_sharpen_first_and_what_comes_back()
    {
        string[] left = ["Q-32", "Q-34"];
        ShopNow mill = shop.Now with { Blades = [.. shop.Now.Blades.Where(b => left.Contains(b.Blade.Tag))] };
        CutAnswer answer = new ShopAdvice(mill).For(shop.Cut(7));
        Assert.Null(answer.First);
        Assert.Contains(answer.Proposals, p => p.Kind == ProposalKind.SharpenFirst && p.Outcome.Tag == "Q-32" && p.Outcome.Blade.File.Sharpenings == 6);
        Proposal back = answer.Proposals.Single(p => p.Kind == ProposalKind.ComesBack);
        Assert.Contains("batch B-031", back.Sentence, StringComparison.Ordinal);
        Assert.Equal(Verdict.Fits, back.Outcome.Verdict);
    }

    [Fact]
    public void The_order_of_the_day_needs_four_changes_instead_of_nine()
    {
        DayPlan plan = shop.Advice.Plan();
        Assert.Equal(9, plan.ChangesInQueueOrder);
        Assert.Equal(4, plan.Changes);
        string[] orders = [.. plan.Saws.Select(s => $"{s.Saw.Saw.Code}: {string.Join(", ", s.Cuts.Select(c => c.Cut.Number))}")];
        Assert.Equal(["S1: 7, 5, 6", "S2: 2, 14, 3, 4", "S3: 1, 10, 8, 9, 15", "S4: ", "S5: 12, 11"], orders);
        Assert.Equal([13], plan.WithoutBlade.Select(c => c.Number));
        Assert.Equal((7, "Q-01"), (shop.Advice.NextCut(shop.Saw("S1"))!.Cut.Number, shop.Advice.NextCut(shop.Saw("S1"))!.Choice.Tag));
        Assert.Null(shop.Advice.NextCut(shop.Saw("S4")));
    }

    [Theory]
    [InlineData("Q-33", false, "0.87")]
    [InlineData("Q-34", true, "0.53")]
    [InlineData("Q-35", true, "0.63")]
    public void Whether_another_grind_pays_is_said_while_the_blade_is_away(string tag, bool pays, string after)
    {
        BladeAdvice blade = shop.Of(tag);
        Assert.Equal(pays, blade.Grind.Pays);
        Assert.Equal((2, IntervalFrom.MillTarget), (blade.Grind.IntervalHours, blade.Grind.From));
        Holds(after, blade.Grind.UsedAfter);
        Assert.Equal(pays ? "Wait for it." : "Do not pay for another grind: ask for it back unground.", blade.Advice.Do);
        Assert.Equal(!pays, blade.Advice.Because.Contains("Another interval of 2.0 h takes it from 0.75 to 0.87, past 0.80: 8 in 100 would break in it."));
    }

    [Fact]
    public void A_blade_past_the_retire_mark_uses_up_its_edge_on_rough_work()
    {
        BladeAdvice old = shop.Of("Q-09");
        Assert.True(old.PastRetireMark);
        Assert.Equal("Use up its present edge on rough work, then scrap it.", old.Advice.Do);
        Holds("8.8", old.Edge.PathToDullKm - old.Edge.PathKm);
        Assert.Equal(ReasonKind.Life, Choices(4).Single(c => c.Tag == "Q-09").Reason.Kind);
        Assert.Equal(Verdict.Fits, Choices(10).Single(c => c.Tag == "Q-09").Verdict);
    }

    [Fact]
    public void The_weld_of_a_shortened_blade_has_its_own_clock()
    {
        LifeOfBlade life = shop.Of("Q-04b").Life!;
        Assert.Equal(97, life.Hours, 6);
        Assert.True(life.Used.Weld > 4 * life.Used.Gullet);
        Assert.Equal(LimitKind.Welds, shop.Of("Q-04b").Limits.GovernedBy);
        Assert.Equal("has had its last weld", Choices(4).Single(c => c.Tag == "Q-04b").Reason.Sentence);
    }

    [Fact]
    public void An_unknown_history_shows_its_range_and_is_inspected_before_each_mount()
    {
        BladeAdvice unknown = shop.Of("Q-06");
        Assert.True(unknown.Life!.UnknownHistory);
        Assert.InRange(unknown.Life.UsedLow, 0.2, 0.201);
        Assert.InRange(unknown.Life.UsedHigh, 0.6, 0.601);
        Assert.Equal((BladeState.Look, true), (unknown.State, unknown.InspectEachMount));
    }

    [Fact]
    public void Blades_too_thick_for_their_wheels_die_on_time()
    {
        Assert.Equal(LifeVerdict.Marginal, shop.Of("Q-26").Record.Verdict);
        Holds("323", 1 / shop.Of("Q-26").Record.ThicknessToWheel!.Value);
        Assert.Equal(LifeVerdict.Finite, shop.Of("Q-30").Record.Verdict);
    }

    [Fact]
    public void Half_the_teeth_would_free_the_motor_in_rosewood()
    {
        WhatIf half = shop.Advice.WhatIf(Choices(3).Single(c => c.Tag == "Q-08")).Single(w => w.Kind == WhatIfKind.HalfTheTeeth);
        Holds("0.55", half.Before * 60);
        Assert.Contains("Q-07, at the sharpener, has 10 teeth in the cut.", half.Sentence, StringComparison.Ordinal);

        // The same kind of blade with 10 teeth, sharp and on the rack: 3.8 m/min.
        BladeFile back = shop.Blade("Q-07") with { Place = Place.Rack, Away = null };
        Choice ten = shop.Advice.Try(shop.Advice.For(shop.Cut(3)).Work, shop.Advice.On(back, shop.Saw("S2")), shop.Saw("S2"));
        Holds("3.8", ten.Gate!.Limits.Single(l => l.Kind == FeedLimitKind.Power).GreenMps * 60);
    }

    [Fact]
    public void A_thinner_blade_on_the_mill_stands_a_fifth_less_push()
    {
        BladeFile thick = shop.Blade("Q-32") with { WidthM = 0.032, SinceSharpening = [] };
        double of107 = Allowed(thick), of09 = Allowed(shop.Blade("Q-40"));
        Holds("290", of107);
        Holds("235", of09);

        double Allowed(BladeFile blade) =>
            shop.Advice.Try(shop.Advice.For(shop.Cut(7)).Work, shop.Advice.On(blade, shop.Saw("S5")), shop.Saw("S5")).Gate!.Thrust!.Allowed.Newtons;
    }

    private IReadOnlyList<Choice> Choices(int number) => shop.Advice.For(shop.Cut(number)).Choices;

    private static void Holds(string printed, double actual) => Assert.True(Printed.Of(printed).Holds(actual, 0.01), $"{printed} expected, {actual:G6} found");
}

using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>How deep a saw resaws, and what a change of it does.</summary>
public sealed class SawWhatIfTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    private static readonly string[] Saws = ["S1", "S2", "S3", "S4", "S5"];

    [Fact]
    public void At_the_depth_found_every_limit_is_comfortable_and_a_little_deeper_one_is_not()
    {
        foreach (string code in Saws)
        {
            SawNow saw = shop.Saw(code);
            double feed = 2.0 / 60;
            Takes takes = saw.Setup.Takes;
            CutKind kind = takes.HasFlag(Takes.Resaw) ? CutKind.Resaw : takes.HasFlag(Takes.Beam) ? CutKind.Beam : takes.HasFlag(Takes.Board) ? CutKind.Board : CutKind.Log;
            CutWork work = Work("European oak", kind);
            foreach (BladeDepth d in new SawWhatIf(saw, work, feed, false, AdviceSettings.Handbook).Of(All(saw)))
            {
                // The advice on a cut is another road to the same limits.
                if (d.Deepest is { Stop: StockStop.ChipRoom or StockStop.Power or StockStop.Push or StockStop.Feeder or StockStop.Beam, HeightM: > 0.01 } deepest)
                {
                    Assert.True(Green(d, saw, work, deepest.HeightM) >= deepest.FeedMps * 0.999, $"{d.Blade.File.Blade.Tag} on {code}");
                    Assert.True(Green(d, saw, work, deepest.HeightM + 0.001) < deepest.FeedMps, $"{d.Blade.File.Blade.Tag} on {code}");
                }
            }
        }
    }

    [Fact]
    public void Faster_feed_and_heavier_wood_never_go_deeper()
    {
        foreach (string code in Saws)
        {
            Deeper(code, Work("European oak"), 1, Work("European oak"), 3);
            Deeper(code, Work("Norway spruce"), 2, Work("European oak"), 2);
        }

        void Deeper(string code, CutWork easy, double slow, CutWork hard, double fast)
        {
            SawNow saw = shop.Saw(code);
            var deep = new SawWhatIf(saw, easy, slow / 60, true, AdviceSettings.Handbook).Of(All(saw)).ToDictionary(d => d.Blade.File.Blade.Tag, d => d.Deepest.HeightM);
            foreach (BladeDepth d in new SawWhatIf(saw, hard, fast / 60, true, AdviceSettings.Handbook).Of(All(saw)))
            {
                Assert.True(d.Deepest.HeightM <= deep[d.Blade.File.Blade.Tag] + 0.001, $"{d.Blade.File.Blade.Tag} on {code}");
            }
        }
    }

    [Fact]
    public void A_stronger_motor_and_a_taller_column_never_make_it_shallower_and_a_raised_guide_never_deeper()
    {
        foreach (string code in Saws)
        {
            SawNow saw = shop.Saw(code);
            SawWhatIf asked = new(saw, Work("European oak"), 2.0 / 60, false, AdviceSettings.Handbook);
            foreach (BladeDepth d in asked.Of(All(saw)))
            {
                IReadOnlyList<SawVariant> told = asked.Variants(d,
                [
                    ("motor", new SetupChange(MotorW: 1.5 * saw.Setup.MotorW)),
                    ("column", new SetupChange(CutHeightMostM: saw.Setup.CutHeightMostM + 0.1)),
                    ("guide", new SetupChange(ClearanceM: saw.Setup.ClearanceM + 0.05)),
                    ("wheel", new SetupChange(WheelM: saw.Setup.Wheels.Min(w => w.DiameterM) + 0.1)),
                ]);
                SawVariant now = told[0];
                Assert.Equal(d.Deepest.HeightM, now.Deepest.HeightM, 1e-9);
                Assert.True(told[1].Deepest.HeightM >= now.Deepest.HeightM - 1e-9);
                Assert.True(told[2].Deepest.HeightM >= now.Deepest.HeightM - 0.5e-3);
                Assert.True(told[3].Deepest.HeightM <= now.Deepest.HeightM + 0.5e-3);
                Assert.True(told[4].Life.Result.MedianBends > now.Life.Result.MedianBends);
                if (now.AtDepth is { } push)
                {
                    // Raising the guides costs push, unless the guides cannot come as low as the wood.
                    Assert.True(told[3].AtDepth!.Allowed.Newtons <= push.Allowed.Newtons + 1e-9);
                }
            }
        }
    }

    [Fact]
    public void More_pull_stands_more_push_and_shortens_the_life()
    {
        SawNow saw = shop.Saw("S2");
        SawWhatIf asked = new(saw, Work("European oak"), 2.0 / 60, false, AdviceSettings.Handbook);
        foreach (BladeDepth d in asked.Of(All(saw)).Where(d => d.Deepest.HeightM > 0))
        {
            IReadOnlyList<SawVariant> told = asked.Variants(d, [("pull", new SetupChange(StrandForceMostN: 1.25 * saw.Setup.StrandForceMostN))]);
            Assert.InRange(told[1].Tension.Stress.Value, told[0].Tension.Stress.Value, Math.Max(told[0].Tension.Stress.Value, SawWhatIf.CeilingPa));
            Assert.True(told[1].AtDepth!.Allowed.Newtons > told[0].AtDepth!.Allowed.Newtons);
            Assert.True(told[1].Life.Result.MedianBends < told[0].Life.Result.MedianBends);
        }
    }

    [Fact]
    public void A_rounded_edge_that_must_be_fed_faster_says_so()
    {
        SawNow saw = shop.Saw("S2");
        BladeDepth blunt = new SawWhatIf(saw, Work("European oak"), 0.2 / 60, false, AdviceSettings.Handbook).Of(All(saw)).First(d => d.Blade.File.Blade.Tag == "Q-08");
        Assert.True(blunt.Deepest.FeedMps > 0.2 / 60);
        Assert.Equal(StockStop.Bite, blunt.Deepest.Stop);
        Assert.NotNull(blunt.Deepest.Behind);
    }

    [Fact]
    public void A_held_blade_and_one_that_does_not_fit_are_left_out()
    {
        SawNow saw = shop.Saw("S2");
        string[] tags = [.. new SawWhatIf(saw, Work("European oak"), 2.0 / 60, false, AdviceSettings.Handbook).Of(All(saw)).Select(d => d.Blade.File.Blade.Tag)];
        Assert.DoesNotContain("Q-14", tags);
        Assert.DoesNotContain("Q-01", tags);
        Assert.Contains("Q-13", tags);
    }

    [Fact]
    public void A_changed_setup_is_a_copy_and_leaves_the_fact_alone()
    {
        SawSetup setup = shop.Saw("S2").Setup;
        double wheel = setup.Wheels.Min(w => w.DiameterM);
        SawSetup copy = new SetupChange(WheelM: 2 * wheel, MotorW: 2 * setup.MotorW).On(setup);
        Assert.NotSame(setup, copy);
        Assert.Equal(wheel, setup.Wheels.Min(w => w.DiameterM));
        Assert.Equal(2 * wheel, copy.Wheels.Min(w => w.DiameterM), 12);
        string[] changed = [nameof(SawSetup.Wheels), nameof(SawSetup.Speeds), nameof(SawSetup.MotorW), nameof(SawSetup.IdleW)];
        Assert.All(typeof(SawSetup).GetProperties().Where(p => !changed.Contains(p.Name)), p => Assert.Equal(p.GetValue(setup), p.GetValue(copy)));
    }

    private IEnumerable<BladeAdvice> All(SawNow saw) => shop.Now.Blades.Select(b => shop.Advice.On(b, saw));

    private double Green(BladeDepth d, SawNow saw, CutWork work, double height)
    {
        // Through the advice on a cut, with the edge as it is and no dull limit in the way.
        Choice tried = shop.Advice.Try(work with { HeightM = height, EdgeLimit = work.EdgeLimit with { Value = 1 } }, d.Blade with { File = d.Blade.File with { Place = Place.Rack } }, saw, saw.Setup.UsualSpeedMps);
        return tried.Gate?.Green.GreenMps ?? double.NaN;
    }

    private CutWork Work(string wood, CutKind kind = CutKind.Resaw)
    {
        QueuedCut cut = new()
        {
            Job = "test",
            SpeciesKey = Handbook.Tables.MaterialTable.Find(wood, out _)!.Key,
            SpeciesTyped = wood,
            Material = MaterialKind.Wood,
            HeightM = 0.1,
            LengthM = 0.5,
            MoisturePct = 10,
            Kind = kind,
            Finish = Finish.Rough,
            Direction = CutDirection.Rip,
        };
        return CutWork.Of(cut, shop.Now.Shop, AdviceSettings.Handbook);
    }
}

using System.Globalization;
using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Fatigue;

namespace BladeLog.Tests.Advice;

/// <summary>Two cuts reckoned through to the printed digit: independent program, advice specification 9 and 10.</summary>
public sealed class WorkedExampleTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    [Fact]
    public void A_fir_beam_on_the_old_saw_comes_out_to_the_printed_digit()
    {
        Choice c = Of(7, "Q-01");
        Assert.Equal(Verdict.Fits, c.Verdict);
        Common(c, r: "14.637", z: "23.622", K: "54.919", hR: "32.499", T: "0.26795", we: "0.9", gullet: "36.286", rubs: "0.88848", noChip: "0.17770");
        Gate gate = c.Gate!;
        Digit("370", Band(c).GuideSpan.Millimetres);
        Digit("30.4", c.Blade.Body.BodyWidth * 1e3);
        Digit("388.04", gate.Thrust!.FrontEdge.Newtons);
        Digit("318.45", gate.Thrust.Stop.Newtons);
        Limit(gate, FeedLimitKind.ChipRoom, "5.9143", "8.8714");
        Limit(gate, FeedLimitKind.Power, "6.2945", "11.997");
        Limit(gate, FeedLimitKind.Feeder, "63.671", "96.932");
        Limit(gate, FeedLimitKind.Beam, "47.848", "74.328");
        Limit(gate, FeedLimitKind.Practical, "8", "8");
        Limit(gate, FeedLimitKind.Finish, "9.7795", "9.7795");
        Assert.Equal(6, gate.Limits.Count);
        Assert.Equal(FeedLimitKind.ChipRoom, gate.GovernedBy);
        Digit("5.9143", gate.HighMps!.Value * 60);
        Digit("4.7314", gate.AdvisedMps!.Value * 60);

        AtFeed at = c.AtAdvised!;
        Digit("48.381", at.BiteM * 1e6);
        Digit("0.40000", at.Fill);
        Digit("150.61", at.ForceN);
        Digit("96.227", at.ThrustN);
        Digit("3117.6", at.PowerW);
        Digit("3.3093", at.Reserve);

        JobCost job = c.Job!;
        Digit("2.5362", job.SawMinutes);
        Digit("4.5362", job.Minutes);
        Digit("3.6", job.AreaM2);
        Digit("0.16608", job.PathKm);
        Digit("11.200", c.Blade.Edge.PathToDullKm);
        Digit("15.155", job.EdgeAfterM * 1e6);
        Digit("0.058937", job.RunHours);
        Digit("3.2253e-5", c.Blade.Record.Rate!.Gullet);
        Digit("4.7044e-6", c.Blade.Record.Rate.Weld);
        Digit("0.0069099", c.Blade.Record.Used.Blade);
        Digit("1.9210e-6", job.LifeSpent);
        Within("6.630e-7", job.BreakChance, 0.005);
        Digit("362.90", job.Cost.Labour);
        Digit("14.829", job.Cost.Wear);
        Digit("5.2520", job.Cost.Life);
        Digit("417.60", job.Cost.Timber);
        Digit("0", job.Cost.Nail);
        Digit("800.58", job.Cost.Total);
    }

    [Fact]
    public void Thin_maple_on_a_tight_curve_comes_out_to_the_printed_digit()
    {
        Choice c = Of(9, "Q-21");
        Assert.Equal(Verdict.WithCare, c.Verdict);
        Assert.Equal(7.6, c.SpeedMps);
        Common(c, r: "9.4117", z: "3.3071", K: "108.38", hR: "26.616", T: "0.46631", we: "0.635", gullet: "0.63500", rubs: "1.4306", noChip: "0.28612");
        Gate gate = c.Gate!;
        Digit("2.3933", c.HardRadiusM!.Value * 1e3);
        Digit("3.4703", c.UsualRadiusM!.Value * 1e3);
        Digit("54", Band(c).GuideSpan.Millimetres);
        Digit("2.3", c.Blade.Body.BodyWidth * 1e3);
        Digit("5.3642", gate.Thrust!.FrontEdge.Newtons);
        Digit("95.127", gate.Thrust.Stop.Newtons);
        Limit(gate, FeedLimitKind.ChipRoom, "10.640", "19.950");
        Limit(gate, FeedLimitKind.Power, "61.682", "101.59");
        Limit(gate, FeedLimitKind.Push, "88.055", "192.40");
        Limit(gate, FeedLimitKind.Beam, "0.17611", "182.43");
        Limit(gate, FeedLimitKind.Practical, "2", "2");
        Limit(gate, FeedLimitKind.Finish, "7.5402", "7.5402");
        Assert.Equal(6, gate.Limits.Count);
        Assert.Equal(GateState.Amber, gate.State);
        Assert.Equal(FeedLimitKind.Beam, gate.GovernedBy);
        Assert.Equal(FeedLimitKind.Practical, gate.UpperEdgeBy);
        Assert.StartsWith("front edge goes slack", c.Reason.Sentence, StringComparison.Ordinal);
        Digit("1.6", gate.AdvisedMps!.Value * 60);

        AtFeed at = c.AtAdvised!;
        Digit("6.3659", at.BiteM * 1e6);
        Digit("10.526", at.ChipM * 1e6);
        Digit("8.4537", at.ForceN);
        Digit("9.6322", at.ThrustN);
        Digit("64.248", at.PowerW);

        JobCost job = c.Job!;
        Digit("10", job.SawMinutes);
        Digit("36", job.Minutes);
        Digit("0.096", job.AreaM2);
        Digit("0.015388", job.PathKm);
        Digit("9.5400", job.EdgeAfterM * 1e6);
        Digit("0.33333", job.RunHours);
        BandLifeResult slow = shop.Advice.Rate(c).Result;
        Digit("0.013916", slow.Gullet.DamagePerHour);
        Digit("0.0067756", slow.Weld.DamagePerHour);
        Digit("0.18818", c.Blade.Record.Used.Blade);
        Digit("0.0051593", job.LifeSpent);
        Within("0.0045278", job.BreakChance, 0.005);
        Digit("2880.0", job.Cost.Labour);
        Digit("0", job.Cost.Wear);
        Within("25.334", job.Cost.Life, 0.005);
        Digit("8.0640", job.Cost.Timber);
        Within("2913.4", job.Cost.Total, 1e-4);
    }

    [Fact]
    public void At_the_fast_speed_the_thin_maple_would_only_be_rubbed()
    {
        Choice slow = Of(9, "Q-21");
        Choice fast = shop.Advice.Try(slow.Work, slow.Blade, slow.Saw, 15.2);
        Assert.Equal(GateState.Rubbing, fast.Gate!.State);
        Digit("2.8612", fast.Gate.RubbingMps * 60);
    }

    [Theory]
    [InlineData(0.188184, 0.0104547, "0.00915")]
    [InlineData(0.748013, 0.125716, "0.0799")]
    [InlineData(0.340367, 0.00567278, "0.00472")]
    public void The_chance_of_a_break_is_that_of_the_prior(double used, double more, string expected) =>
        Within(expected, AdviceSettings.Handbook.Level.BreakChance(used, more), 0.005);

    [Fact]
    public void The_band_and_the_marks_are_those_of_the_handbook_alone()
    {
        // Printed from the quantile cut to 1.28155, which moves the sixth digit.
        Within("4.76556", AdviceSettings.Handbook.Level.BandFactor, 3e-6);
        Digit("0.389876", AdviceSettings.Handbook.WatchMark);
        Digit("0.183256", AdviceSettings.Handbook.Level.LnLevel);
    }

    [Theory]
    [InlineData("Q-17", "1.31", "12.2")]
    [InlineData("Q-30", "53.0", "121")]
    [InlineData("Q-32", "0", "3.33")]
    public void Hours_to_the_watch_and_the_retire_mark(string tag, string watch, string retire)
    {
        LifeOfBlade life = shop.Of(tag).Life!;
        Digit(watch, life.HoursToWatch!.Value);
        Digit(retire, life.HoursToRetire!.Value);
    }

    private Choice Of(int number, string tag) => shop.Advice.For(shop.Cut(number)).Choices.Single(c => c.Tag == tag);

    private static void Common(Choice c, string r, string z, string K, string hR, string T, string we, string gullet, string rubs, string noChip)
    {
        CutCase cut = c.Case!;
        Digit(r, c.Blade.Edge.RadiusM * 1e6);
        Digit(z, c.TeethInCut);
        Digit(K, CuttingForce.ShearFactor(cut).Megapascals);
        Digit(hR, CuttingForce.ReferenceThickness(cut.Rake, cut.Model).Micrometres);
        Digit(T, CuttingForce.ThrustSlope(cut));
        Digit(we, Bite.EdgeWidth(cut).Millimetres);
        Digit(gullet, Gullet.AreaOf(cut).SquareMillimetres);
        Digit(rubs, c.Gate!.RubbingMps * 60);
        Digit(noChip, c.Gate.NoChipMps * 60);
    }

    private BladeLog.Handbook.BeamStrength.GuidedBand Band(Choice c) =>
        shop.Advice.Beams.Band(c.Blade.Body, c.Tension!.Stress.Value, c.Saw.Setup, c.SpeedMps, c.Work.HeightM);

    private static void Limit(Gate gate, FeedLimitKind kind, string green, string amber)
    {
        FeedLimit limit = gate.Limits.Single(l => l.Kind == kind);
        Digit(green, limit.GreenMps * 60);
        Digit(amber, limit.AmberMps * 60);
    }

    private static void Digit(string printed, double actual) => Within(printed, actual, 0);

    private static void Within(string printed, double actual, double relative) =>
        Assert.True(Printed.Of(printed).Holds(actual, relative), $"{printed} expected, {actual.ToString("G9", CultureInfo.InvariantCulture)} found");
}

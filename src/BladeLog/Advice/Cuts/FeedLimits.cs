using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>The upper limits of feed of a blade in a cut.</summary>
internal static class FeedLimits
{
    internal static IReadOnlyList<FeedLimit> Of(CutCase cut, CutWork work, SawSetup setup, ThrustLimits thrust, AdviceSettings settings)
    {
        double low = settings[CutSettings.LowEnd];
        bool feeder = work.WithFeeder(setup);
        List<FeedLimit> limits = [ChipRoom(cut, work, setup, settings), Motor(cut, setup, low, settings)];
        limits.Add(feeder
            ? ByThrust(FeedLimitKind.Feeder, cut, setup.FeederN!.Value, setup.FeederN.Value / low, "push of the feeder", Provenance.Yours, Provenance.Yours, "derived")
            : ByThrust(FeedLimitKind.Push, cut, settings[CutSettings.PushGreen], settings[CutSettings.PushAmber] / low, "push of a hand", settings.ProvenanceOf(CutSettings.PushGreen), settings.ProvenanceOf(CutSettings.PushAmber), "hse-l23"));
        limits.Add(ByThrust(FeedLimitKind.Beam, cut, thrust.Allowed.Newtons, thrust.Stop.Newtons / low, "push the blade stands", Provenance.Derived, Provenance.Derived, "derived"));
        limits.Add(Practical(work, setup, feeder, settings));
        if (work.FinishBite is { } bite)
        {
            double f = Kinematics.FeedForBite(new Length(bite.Value), cut.Pitch, cut.BandSpeed).MetresPerSecond;
            Figure figure = Feed("finish", f, $"bite of {Wording.Number(bite.Value * 1e3, 2)} mm times band speed over pitch", "engineering-default", bite.Provenance);
            limits.Add(new FeedLimit(FeedLimitKind.Finish, f, f, figure, figure));
        }

        return limits;
    }

    private static FeedLimit ChipRoom(CutCase cut, CutWork work, SawSetup setup, AdviceSettings settings)
    {
        (Known fill, string because) = work.Fill(setup, settings);
        Known most = settings.Known(CutSettings.FillAmber);
        double green = Gullet.FeedAtFill(cut, fill.Value).MetresPerSecond, amber = Gullet.FeedAtFill(cut, Math.Max(fill.Value, most.Value)).MetresPerSecond;
        return new FeedLimit(
            FeedLimitKind.ChipRoom, green, amber,
            Feed("chip room", green, $"gullets filled to {Wording.Number(fill.Value, 2)} ({because}): fill times band speed times gullet area over pitch and height", "gullet-capacity-note", fill.Provenance),
            Feed("gullets nearly full", amber, $"gullets filled to {Wording.Number(most.Value, 2)}", "gullet-capacity-note", most.Provenance));
    }

    private static FeedLimit Motor(CutCase cut, SawSetup setup, double low, AdviceSettings settings)
    {
        double easy = BandPower.Easy(setup, settings), most = BandPower.Most(setup, settings) / low;
        double green = CuttingForce.FeedAtPower(cut, new Power(Math.Max(0, easy))).MetresPerSecond, amber = CuttingForce.FeedAtPower(cut, new Power(Math.Max(0, most))).MetresPerSecond;
        return new FeedLimit(
            FeedLimitKind.Power, green, amber,
            Feed("motor", green, $"{Wording.Number(easy, 0)} W at the blade, solved for the feed", "derived", settings.ProvenanceOf(CutSettings.Drive)),
            Feed("motor at its most", amber, $"{Wording.Number(most, 0)} W at the blade, at the low end of the force band", "derived", settings.ProvenanceOf(CutSettings.LowEnd)));
    }

    private static FeedLimit ByThrust(FeedLimitKind kind, CutCase cut, double green, double amber, string what, Provenance ofGreen, Provenance ofAmber, string source)
    {
        double easy = CuttingForce.FeedAtThrust(cut, new Force(green))?.MetresPerSecond ?? double.PositiveInfinity;
        double most = CuttingForce.FeedAtThrust(cut, new Force(amber))?.MetresPerSecond ?? double.PositiveInfinity;
        return new FeedLimit(
            kind, easy, most,
            Feed(what, easy, $"{Wording.Number(green, 0)} N of thrust, solved for the feed", source, ofGreen),
            Feed(what, most, $"{Wording.Number(amber, 0)} N of thrust, at the low end of the force band", source, ofAmber));
    }

    private static FeedLimit Practical(CutWork work, SawSetup setup, bool feeder, AdviceSettings settings)
    {
        SettingDefinition byHand = work.IsCurve(settings) ? CutSettings.FeedOnCurve : CutSettings.FeedByHand;
        double f = feeder ? setup.FeederMostMps ?? double.PositiveInfinity : settings[byHand] / 60;
        Figure figure = feeder
            ? Feed("greatest feed of the feeder", f, "as the saw is set up", "common-practice", Provenance.Yours)
            : Feed(work.IsCurve(settings) ? "practical feed on a curve" : "practical feed by hand", f, "what hands can guide", "common-practice", settings.ProvenanceOf(byHand));
        return new FeedLimit(FeedLimitKind.Practical, f, f, figure, figure);
    }

    private static Figure Feed(string name, double mps, string how, string source, Provenance provenance) => new(name, mps * 60, "m/min", how, source, provenance);
}

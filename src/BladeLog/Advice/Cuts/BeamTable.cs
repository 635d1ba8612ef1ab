using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Thrust limits of blades between guides, each found once: they do not depend on feed or edge.</summary>
public sealed class BeamTable(AdviceSettings settings)
{
    private readonly Dictionary<GuidedBand, Dictionary<double, ThrustLimits>> known = [];

    /// <summary>Span, middle of the cut and thrust limits of a blade in a cut of this height.</summary>
    public ThrustLimits Of(BladeBody body, BladeTension tension, SawSetup setup, double speedMps, double heightM)
    {
        ArgumentNullException.ThrowIfNull(tension);
        GuidedBand band = Band(body, tension.Stress.Value, setup, speedMps, heightM);
        return Of(band, tension.FrontEdgeFactor);
    }

    public ThrustLimits Of(GuidedBand band, double frontEdgeFactor)
    {
        if (!known.TryGetValue(band, out Dictionary<double, ThrustLimits>? byFactor))
        {
            known[band] = byFactor = [];
        }

        if (!byFactor.TryGetValue(frontEdgeFactor, out ThrustLimits? limits))
        {
            // The plate value only for wide bands: in narrow ones it lies within the scatter of the beam value.
            byFactor[frontEdgeFactor] = limits = ThrustLimit.Of(band, PlateUse.WideBandsOnly, frontEdgeFactor, settings[BladeSettings.Buckling]);
        }

        return limits;
    }

    /// <summary>The strand between its guides: the upper one just above the work, or as low as it comes.</summary>
    public GuidedBand Band(BladeBody body, double tensionPa, SawSetup setup, double speedMps, double heightM)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(setup);
        double span = Math.Max(setup.LowerGuideM + heightM + setup.ClearanceM, setup.GuideSpanLeastM ?? 0);
        return new GuidedBand
        {
            Width = new Length(body.Width.Value),
            Thickness = new Length(body.Thickness.Value),
            GulletDepth = new Length(body.Gullet.Value),
            Tension = new Stress(tensionPa),
            GuideSpan = new Length(span),
            CutHeight = new Length(heightM),
            CutCentre = new Length(setup.LowerGuideM + (heightM / 2)),
            Steel = settings.Steel,
            // A sprung saw loses nothing to speed, so both its speeds share one answer.
            BandSpeed = setup.TensionSystem == TensionSystem.Sprung ? default : new Speed(speedMps),
            System = setup.TensionSystem,
        };
    }
}

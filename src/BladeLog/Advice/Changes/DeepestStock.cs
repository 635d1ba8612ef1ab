using BladeLog.Advice.Cuts;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Changes;

/// <summary>What keeps a blade from deeper stock.</summary>
public enum StockStop
{
    ChipRoom,
    Power,
    Push,
    Feeder,
    Beam,

    /// <summary>The saw does not open further.</summary>
    Guides,

    /// <summary>So rounded an edge must be fed faster than asked, and that is what it cannot take.</summary>
    Bite,

    /// <summary>Faster than hands or the feeder go.</summary>
    Practical,
}

/// <summary>The deepest stock a blade resaws on a saw at a decent feed, every limit comfortable.</summary>
/// <param name="HeightM">Nought where it goes through nothing at that feed.</param>
/// <param name="Stop">What stops it.</param>
/// <param name="Behind">What stops it at the feed it must be given, where that is more than was asked.</param>
/// <param name="FeedMps">The feed reckoned with: as asked, or the least at which it cuts instead of rubbing.</param>
/// <param name="AskedM">That height, or the lowest asked about where it goes through nothing.</param>
/// <param name="ThrustAsked">Push the blade stands at the height asked.</param>
public sealed record DeepestStock(double HeightM, StockStop Stop, StockStop? Behind, double FeedMps, double AskedM, ThrustLimits ThrustAsked)
{
    /// <summary>Push the blade stands at the deepest; null where there is none.</summary>
    public ThrustLimits? Thrust => HeightM > 0 ? ThrustAsked : null;

    private const double Close = 0.01e-3;

    /// <summary>Lowest wood asked about: so many teeth must be in the cut.</summary>
    public static double Least(BladeBody body, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(settings);
        return Math.Max(1e-3, settings[CutSettings.LeastTeeth] * body.PitchCoarse);
    }

    /// <summary>Finds it by halving: every limit of feed falls with the height.</summary>
    /// <param name="work">The wood; its height is varied.</param>
    /// <param name="body">The blade.</param>
    /// <param name="edgeM">Its edge radius.</param>
    /// <param name="tension">Its tension on this saw.</param>
    /// <param name="setup">The saw.</param>
    /// <param name="feedMps">The feed asked for.</param>
    /// <param name="beams">Thrust limits, kept.</param>
    /// <param name="settings">The constants in force.</param>
    public static DeepestStock Of(CutWork work, BladeBody body, double edgeM, BladeTension tension, SawSetup setup, double feedMps, BeamTable beams, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(work);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(tension);
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(beams);
        ArgumentNullException.ThrowIfNull(settings);
        if (!(feedMps > 0))
        {
            throw new ArgumentOutOfRangeException(nameof(feedMps), "The feed must be above nought.");
        }

        double v = setup.UsualSpeedMps, rubbing = Bite.RubbingFeed(Case(0.1)).MetresPerSecond;
        (double height, StockStop stop) = At(feedMps);
        if (rubbing <= feedMps)
        {
            return Told(height, stop, null, feedMps);
        }

        (double faster, StockStop behind) = At(rubbing);
        return faster < height - Close
            ? Told(faster, StockStop.Bite, behind, rubbing)
            : Told(faster, behind, null, rubbing);

        DeepestStock Told(double H, StockStop what, StockStop? then, double feed)
        {
            double asked = H > 0 ? H : Least(body, settings);
            return new DeepestStock(H, what, then, feed, asked, Thrust(asked));
        }

        (double Height, StockStop Stop) At(double feed)
        {
            double low = Least(body, settings), high = setup.CutHeightMostM;
            if (low >= high || Stopping(high, feed) is null)
            {
                return (high, StockStop.Guides);
            }

            if (Stopping(low, feed) is { } atOnce)
            {
                return (0, atOnce);
            }

            while (high - low > Close)
            {
                double middle = (low + high) / 2;
                (low, high) = Stopping(middle, feed) is null ? (middle, high) : (low, middle);
            }

            return (low, Stopping(high, feed)!.Value);
        }

        StockStop? Stopping(double H, double feed)
        {
            FeedLimit least = FeedLimits.Of(Case(H), work with { HeightM = H }, setup, Thrust(H), settings).MinBy(l => l.GreenMps)!;
            return least.GreenMps >= feed * (1 - 1e-12) ? null : least.Kind switch
            {
                FeedLimitKind.ChipRoom => StockStop.ChipRoom,
                FeedLimitKind.Power => StockStop.Power,
                FeedLimitKind.Push => StockStop.Push,
                FeedLimitKind.Feeder => StockStop.Feeder,
                FeedLimitKind.Beam => StockStop.Beam,
                _ => StockStop.Practical,
            };
        }

        ThrustLimits Thrust(double H) => beams.Of(body, tension, setup, v, H);

        CutCase Case(double H) => new()
        {
            Thickness = new Length(body.Thickness.Value),
            Kerf = new Length(body.Kerf.Value),
            Pitch = new Length(body.PitchMean),
            GulletDepth = new Length(body.Gullet.Value),
            Form = body.Form,
            Rake = new Angle(body.Rake.Value),
            Tip = body.Tip,
            EdgeRadius = new Length(edgeM),
            BandSpeed = new Speed(v),
            CutHeight = new Length(H),
            Density12 = new Density(work.Density12.Value),
            MoisturePercent = work.Moisture.Value,
            Direction = work.Cut.Direction,
            Frozen = work.Cut.Frozen,
            Model = settings.Force,
        };
    }
}

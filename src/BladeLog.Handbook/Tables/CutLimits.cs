using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>A limit and where it comes from.</summary>
/// <param name="Value">The figure, in the unit its holder names.</param>
/// <param name="Because">In words.</param>
/// <param name="Provenance">Where it comes from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
public sealed record Limit(double Value, string Because, Provenance Provenance, string SourceKey);

/// <summary>The limits a cut is held to.</summary>
public static class CutLimits
{
    /// <summary>Gullet fills φ of each condition, dimensionless, in the order they are tried.</summary>
    public static IReadOnlyDictionary<string, Limit> Fills { get; } = new Dictionary<string, Limit>
    {
        ["frozen"] = new(0.40, "frozen wood: fine dust that freezes to the face", Provenance.EngineeringDefault, "engineering-default"),
        ["stringy"] = new(0.45, "stringy wood", Provenance.EngineeringDefault, "engineering-default"),
        ["dry_by_hand"] = new(0.40, "dry wood, fed by hand", Provenance.EngineeringDefault, "engineering-default"),
        ["dry_with_feeder"] = new(0.50, "dry wood, with a feeder", Provenance.EngineeringDefault, "engineering-default"),
        ["green_softwood"] = new(0.65, "green softwood", Provenance.EngineeringDefault, "engineering-default"),
        ["green_hardwood"] = new(0.60, "green hardwood", Provenance.EngineeringDefault, "engineering-default"),
    };

    /// <summary>Gullet fill up to which it is amber (published: deviation rises sharply before 1.0).</summary>
    public static Limit AmberFill { get; } = new(0.75, "gullets nearly full", Provenance.Published, "gullet-capacity-note");

    /// <summary>Moisture under which wood counts as dry, %.</summary>
    public const double DryBelowPercent = 20;

    /// <summary>Least teeth in the cut.</summary>
    public static Limit LeastTeeth { get; } = new(3, "fewer snatch and strip", Provenance.CommonPractice, "common-practice");

    /// <summary>Push by hand, green, N.</summary>
    public static Limit PushGreen { get; } = new(70, "guideline push to keep a load moving, women", Provenance.Published, "hse-l23");

    /// <summary>Push by hand, amber, N.</summary>
    public static Limit PushAmber { get; } = new(100, "guideline push to keep a load moving, men", Provenance.Published, "hse-l23");

    /// <summary>Push to start a load moving or to stop it, green, N.</summary>
    public static Limit PushToStartGreen { get; } = new(150, "guideline push to start or stop a load, women", Provenance.Published, "hse-l23");

    /// <summary>Push to start a load moving or to stop it, amber, N.</summary>
    public static Limit PushToStartAmber { get; } = new(200, "guideline push to start or stop a load, men", Provenance.Published, "hse-l23");

    /// <summary>Push with fingers within 150 mm of the blade: amber above, N.</summary>
    public static Limit PushPrecision { get; } = new(50, "fingers near the blade", Provenance.EngineeringDefault, "engineering-default");

    /// <summary>Practical feed by hand, straight, m/min.</summary>
    public static Limit FeedStraightByHand { get; } = new(4, "straight by hand", Provenance.CommonPractice, "common-practice");

    /// <summary>Practical feed on a curve, m/min.</summary>
    public static Limit FeedOnCurve { get; } = new(2, "on a curve", Provenance.CommonPractice, "common-practice");

    /// <summary>A radius from here on is fed like a straight cut.</summary>
    public static Length CurveBelow { get; } = Length.FromMillimetres(1000);

    /// <summary>The gullet fill a cut may reach, and why.</summary>
    /// <remarks>The smallest φ that applies: frozen 0.40; stringy 0.45; under 20 % moisture 0.40 by hand, 0.50 with a feeder; else softwood 0.65, hardwood 0.60.
    /// Usable fill of 0.50 to 0.75 is published for softwood mills; the steps are engineering defaults.</remarks>
    /// <source key="engineering-default" where="inside the published range of gullet-capacity-note"/>
    public static Limit FillFor(bool hardwood, bool stringy, double moisturePercent, bool frozen, bool feeder)
    {
        Limit least = Fills[(moisturePercent < DryBelowPercent, feeder, hardwood) switch
        {
            (true, false, _) => "dry_by_hand",
            (true, true, _) => "dry_with_feeder",
            (false, _, true) => "green_hardwood",
            (false, _, false) => "green_softwood",
        }];
        foreach (Limit other in new[] { stringy ? Fills["stringy"] : null, frozen ? Fills["frozen"] : null }.OfType<Limit>())
        {
            least = other.Value < least.Value ? other : least;
        }

        return least;
    }

    /// <summary>Edge radius at which a blade is too dull for a finish.</summary>
    /// <remarks>40 µm rough, 30 µm fine and medium.</remarks>
    /// <source key="engineering-default" where="dull edge; 30 to 40 µm from memory"/>
    public static Length EdgeLimit(Finish finish) => Length.FromMicrometres(finish == Finish.Rough ? 40 : 30);

    /// <summary>Greatest bite of a finish; null for rough.</summary>
    /// <remarks>c = 0.03 mm fine, 0.10 mm medium.</remarks>
    /// <source key="engineering-default" where="finish by bite"/>
    public static Length? FinishBite(Finish finish) => finish switch
    {
        Finish.Fine => Length.FromMillimetres(0.03),
        Finish.Medium => Length.FromMillimetres(0.10),
        _ => null,
    };

    /// <summary>Are there teeth enough in the cut?</summary>
    /// <remarks>H/p_coarsest, rounded to one decimal, must be 3.0 or more. H cut height, m; p coarsest pitch, m.</remarks>
    /// <source key="common-practice" where="three teeth in the cut"/>
    public static bool EnoughTeeth(Length height, Length coarsestPitch) =>
        Math.Round(Cutting.Kinematics.TeethInCut(height, coarsestPitch), 1, MidpointRounding.AwayFromZero) >= LeastTeeth.Value;
}

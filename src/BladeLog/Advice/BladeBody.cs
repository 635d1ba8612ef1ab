using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>Why this tension is reckoned with.</summary>
public enum TensionRule
{
    MeasuredThisSpell,
    LastMeasuredHere,
    Target,
    DefaultOfSteel,

    /// <summary>The saw's greatest pull in one strand, because it lies under the default of the steel.</summary>
    SawGreatestPull,
}

/// <summary>Tension of a blade on a saw, on the body section.</summary>
/// <param name="Stress">Pa on thickness times body width.</param>
/// <param name="Rule">How it was found.</param>
/// <param name="FrontEdgeFactor">Safety against a slack front edge that goes with it.</param>
/// <param name="PullOverSaw">The pull it means over the greatest the saw can give; null where that is not known.</param>
public sealed record BladeTension(Known Stress, TensionRule Rule, double FrontEdgeFactor, double? PullOverSaw)
{
    public bool Guessed => Rule is TensionRule.DefaultOfSteel or TensionRule.SawGreatestPull;
}

/// <summary>A blade with every figure filled: measured, printed on the box, or a default that says so. Lengths in metres.</summary>
public sealed record BladeBody
{
    private const string Box = "specification";

    public required Known Width { get; init; }

    public required Known NewWidth { get; init; }

    public required Known LeastWidth { get; init; }

    public required Known Thickness { get; init; }

    public required Known Gullet { get; init; }

    /// <summary>Measured on a gullet of this kind; null: reckoned from its form.</summary>
    public double? GulletAreaM2 { get; init; }

    public required Known Kerf { get; init; }

    public required Known Rake { get; init; }

    public required Known Hrc { get; init; }

    public required Known FreshEdge { get; init; }

    public required double PitchMean { get; init; }

    public required double PitchCoarse { get; init; }

    public required ToothForm Form { get; init; }

    public required TipKind Tip { get; init; }

    public required TipMaterial TipMaterial { get; init; }

    public required BodySteel Steel { get; init; }

    /// <summary>Burrs left in the gullets are taken as a punched edge.</summary>
    public GulletFinish GulletFinish { get; init; } = GulletFinish.Ground;

    /// <summary>Rust was seen in the gullets.</summary>
    public bool Rusty { get; init; }

    /// <summary>The shop's own target, Pa on the body.</summary>
    public double? TargetPa { get; init; }

    /// <summary>Back edge to gullet bottom: what carries the tension.</summary>
    /// <summary>What of the record cannot be; null: nothing.</summary>
    public string? Doubt { get; init; }

    /// <summary>Ground below its least width.</summary>
    public bool TooNarrow => Width.Value < LeastWidth.Value - 1e-9;

    public double BodyWidth => Width.Value - Gullet.Value;

    public static BladeBody Of(BladeFile file, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(settings);
        Spec spec = file.Spec;
        double t = file.ThicknessM;
        bool set = spec.TipKind == TipKind.Set;
        Known share = settings.Known(spec.ToothForm == ToothForm.Skip ? BladeSettings.GulletShareSkip : BladeSettings.GulletShare);
        Known gullet = Given(file.GulletM, "measured") ?? Given(spec.GulletDepthM, Box)
            ?? share with { Value = Math.Min(share.Value * spec.PitchCoarseM, settings[BladeSettings.GulletOfWidth] * spec.WidthM) };

        // Figures that cannot stand together are said, and reckoned without: one slip must not take down a page of all blades.
        string? doubt = gullet.Value + t > file.WidthM ? "Its gullets, as recorded, leave no body in its width: measure both." : null;
        Known kerf = settings.Known(set ? BladeSettings.KerfSet : BladeSettings.KerfTipped);
        return new BladeBody
        {
            Width = Known.Yours(file.WidthM, "measured"),
            NewWidth = Known.Yours(spec.WidthM, Box),
            LeastWidth = Given(spec.LeastWidthM, Box) ?? settings.Known(BladeSettings.LeastWidth, spec.WidthM),
            Thickness = Known.Yours(t, file.Blade.MeasuredThicknessM is null ? Box : "measured"),
            Gullet = doubt is null ? gullet : new Known(settings[BladeSettings.GulletOfWidth] * file.WidthM, Provenance.EngineeringDefault, "cannot be as recorded"),
            Doubt = doubt,
            // A gullet since ground to another depth has an area in proportion.
            GulletAreaM2 = spec.GulletAreaM2 * (file.GulletM is { } deep && spec.GulletDepthM is { } box ? deep / box : 1),
            Kerf = Given(file.KerfM, "measured") ?? Given(t + file.Kerf.Set?.BothM, "body and set, both measured") ?? Given(spec.KerfM, Box) ?? kerf with { Value = kerf.Value * t },
            Rake = Given(spec.RakeRad, Box)
                ?? (spec.ToothForm == ToothForm.Hook
                    ? settings.Known(BladeSettings.HookRake, Math.PI / 180)
                    : new Known(0, Provenance.CommonPractice, "default, not yours")),
            Hrc = Given(file.Blade.MeasuredHrc, "measured") ?? Given(spec.BodyHrc, Box) ?? settings.Hrc(spec.BodySteel),
            FreshEdge = Given(file.EdgeAfterM, "measured") ?? Given(spec.EdgeFreshM, Box)
                ?? settings.Known(spec.TipMaterial == TipMaterial.Carbide ? LifeSettings.FreshCarbide : LifeSettings.Fresh, 1e-6),
            PitchMean = spec.PitchMeanM,
            PitchCoarse = spec.PitchCoarseM,
            Form = spec.ToothForm,
            Tip = spec.TipKind,
            TipMaterial = spec.TipMaterial,
            Steel = spec.BodySteel,
            TargetPa = spec.TensionPa,
        }.With(file.Marks);
    }

    /// <summary>
    /// Tension on a saw: measured in this spell, else last measured for this blade on this saw, else the specification's
    /// target; else the smaller of the steel's default and what the saw can pull, and then with the larger safety factor.
    /// </summary>
    public BladeTension TensionOn(SawSetup setup, BladeFile file, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(settings);
        double sure = settings[BladeSettings.FrontEdge], section = Thickness.Value * BodyWidth;
        double? most = setup.StrandForceMostN / section;
        BladeTension Sure(double pa, TensionRule rule, string from) => new(Known.Yours(pa, from), rule, sure, pa / most);

        if (file.SawId == setup.SawId && file.TensionThisSpellPa is { } now)
        {
            return Sure(now, TensionRule.MeasuredThisSpell, "measured in this spell");
        }

        if (file.LastTensionPa.TryGetValue(setup.SawId, out double last))
        {
            return Sure(last, TensionRule.LastMeasuredHere, "last measured on this saw");
        }

        if (TargetPa is { } target)
        {
            return Sure(target, TensionRule.Target, "target of its specification");
        }

        Known common = settings.Tension(Steel);
        double guessed = settings[BladeSettings.FrontEdgeGuessed];
        return most < common.Value
            ? new BladeTension(new Known(most.Value, Provenance.Derived, "greatest pull of the saw"), TensionRule.SawGreatestPull, guessed, 1)
            : new BladeTension(common, TensionRule.DefaultOfSteel, guessed, common.Value / most);
    }

    /// <summary>The same body with its gullets as a look saw them.</summary>
    public BladeBody With(BladeMarks marks) => this with
    {
        GulletFinish = marks.HasFlag(BladeMarks.Burrs) ? GulletFinish.Punched : GulletFinish.Ground,
        Rusty = marks.HasFlag(BladeMarks.Rust),
    };

    private static Known? Given(double? value, string from) => value is { } v ? Known.Yours(v, from) : null;
}

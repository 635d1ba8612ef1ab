using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Changes;

/// <summary>A blade of the shop on the saw asked.</summary>
public sealed record BladeDepth(BladeAdvice Blade, BladeTension Tension, double EdgeM, DeepestStock Deepest);

/// <summary>The saw with one thing changed, asked with one blade.</summary>
/// <param name="Name">What is changed, in words.</param>
/// <param name="Saw">The saw as it would be.</param>
/// <param name="Deepest">Deepest stock then.</param>
/// <param name="AtDepth">Push the blade stands at the depth it reaches today.</param>
/// <param name="Tension">Tension then.</param>
/// <param name="Life">Life then; told only of a blade that is not held.</param>
public sealed record SawVariant(string Name, SawNow Saw, DeepestStock Deepest, ThrustLimits? AtDepth, BladeTension Tension, Damage Life);

/// <summary>What a saw can do with the blades of the rack, and what a change of the saw would do.</summary>
public sealed class SawWhatIf(SawNow saw, CutWork work, double feedMps, bool ground, AdviceSettings settings)
{
    /// <summary>Never more than this on any blade: 35,000 psi, a ceiling of the trade.</summary>
    public const double CeilingPa = 241e6;

    private readonly BeamTable beams = new(settings);
    private readonly DamageTable damage = new(settings);

    public SawNow Saw => saw;

    public CutWork Work => work;

    public AdviceSettings Settings => settings;

    /// <summary>Each blade that fits the saw and may cut, the deepest first.</summary>
    public IReadOnlyList<BladeDepth> Of(IEnumerable<BladeAdvice> blades)
    {
        ArgumentNullException.ThrowIfNull(blades);
        return
        [
            .. blades.Where(b => b.File is { Place: not Place.Gone, Hold: null, Break: null, Retirement: null } && ShopAdvice.Fits(b.File, saw) && b.Body.Kerf.Value >= b.Body.Thickness.Value)
                .Select(b => (Blade: b, Tension: b.Body.TensionOn(saw.Setup, b.File, settings), Edge: ground ? b.Body.FreshEdge.Value : b.Edge.RadiusM))
                .Select(b => new BladeDepth(b.Blade, b.Tension, b.Edge, DeepestStock.Of(work, b.Blade.Body, b.Edge, b.Tension, saw.Setup, feedMps, beams, settings)))
                .OrderByDescending(b => b.Deepest.HeightM).ThenByDescending(b => b.Deepest.Thrust?.Allowed.Newtons ?? 0).ThenBy(b => b.Blade.File.Blade.Tag, StringComparer.Ordinal),
        ];
    }

    /// <summary>The saw as it is and with one change at a time, for one blade.</summary>
    public IReadOnlyList<SawVariant> Variants(BladeDepth blade, IEnumerable<(string Name, SetupChange Change)> changes)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(changes);
        return [Variant("as it is", new SetupChange(), blade), .. changes.Select(c => Variant(c.Name, c.Change, blade))];
    }

    private SawVariant Variant(string name, SetupChange change, BladeDepth blade)
    {
        SawNow then = change.On(saw);
        BladeTension tension = Tension(blade, change);
        BladeBody body = blade.Blade.Body;
        DeepestStock deepest = DeepestStock.Of(work, body, blade.EdgeM, tension, then.Setup, feedMps, beams, settings);
        double v = then.Setup.UsualSpeedMps, depth = blade.Deepest.HeightM;
        return new SawVariant(
            name,
            then,
            deepest,
            depth > 0 ? beams.Of(body, tension, then.Setup, v, depth) : null,
            tension,
            damage.Of(body, blade.Blade.File.Weld, then.Setup, v, tension.Stress.Value, blade.Blade.File.LoopM ?? then.Setup.LoopM));
    }

    /// <summary>A stronger spring is used: the tension rises with the pull, up to the trade's ceiling.</summary>
    private BladeTension Tension(BladeDepth blade, SetupChange change)
    {
        double now = blade.Tension.Stress.Value;
        return change.StrandForceMostN is { } pull && saw.Setup.StrandForceMostN is { } most
            ? blade.Tension with { Stress = new Known(Math.Max(now * Math.Min(1, pull / most), Math.Min(CeilingPa, now * pull / most)), Provenance.Derived, "grown with the pull") }
            : blade.Tension;
    }
}

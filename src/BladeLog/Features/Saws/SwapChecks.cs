using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Saws;

/// <summary>What is looked at before a blade goes on a saw, as sentences: what fits, what to mind, what does not fit.</summary>
internal static class SwapChecks
{
    private const double Hair = 1e-6;

    public static IReadOnlyList<CheckLine> Of(ShopAdvice advice, SawNow saw, BladeFile blade, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(units);
        BladeAdvice here = advice.On(blade, saw);
        List<CheckLine> lines = [Size(saw, blade, units), Bending(here, units), Condition(here, saw, advice, units), Pull(here, units)];
        if (Said.Leads(blade, saw.Saw.Id, units) is { } leads)
        {
            lines.Add(new("care", Said.Capital(leads)));
        }

        return lines;
    }

    /// <summary>What the advice has against it beside what the records see themselves: the bending.</summary>
    public static IReadOnlyList<string> Unfit(ShopAdvice advice, SawNow saw, BladeFile blade)
    {
        BladeAdvice here = advice.On(blade, saw);
        return here.Record.Verdict == LifeVerdict.Unsuitable
            ? [$"{blade.Blade.Tag} is too thick for {saw.Saw.Name}: {Lower(LifeWords.ThicknessToWheel(here.Record.ThicknessToWheel!.Value))} {LifeWords.Ladder(LifeVerdict.Unsuitable)}"]
            : [];
    }

    private static CheckLine Size(SawNow saw, BladeFile blade, ShopUnits units)
    {
        SawSetup setup = saw.Setup;
        double? loop = blade.LoopM ?? blade.Spec.NewLoopM;
        string L(double m) => units.Show(new Length(m), Fields.Loop);
        string W(double m) => units.Show(new Length(m), Fields.BladeWidth);
        if (loop is { } l && (l < setup.LoopLeastM - Hair || l > setup.LoopMostM + Hair))
        {
            return new("no", $"Loop {L(l)}: {saw.Saw.Name} takes {L(setup.LoopLeastM)} to {L(setup.LoopMostM)}");
        }

        if (blade.Spec.WidthM < setup.WidthLeastM - Hair || blade.WidthM > setup.WidthMostM + Hair)
        {
            return new("no", $"Width {W(blade.WidthM)}: {saw.Saw.Name} takes {W(setup.WidthLeastM)} to {W(setup.WidthMostM)}");
        }

        return loop is { } known
            ? new("fits", $"Loop {L(known)} and width {W(blade.WidthM)} fit")
            : new("care", $"Its length is not known: {saw.Saw.Name} takes {L(setup.LoopLeastM)} to {L(setup.LoopMostM)}");
    }

    private static CheckLine Bending(BladeAdvice here, ShopUnits units)
    {
        LifeOfBlade life = here.Record;
        string ratio = $"Body {units.Show(new Length(here.Body.Thickness.Value), Fields.Thickness)} is 1/{Math.Round(1 / life.ThicknessToWheel!.Value)} of the wheel";
        return life.Verdict switch
        {
            LifeVerdict.Unsuitable => new("no", $"{ratio}: hours or less"),
            LifeVerdict.Marginal => new("care", $"{ratio}: a short life, hours to tens of hours"),
            LifeVerdict.Finite => new("fits", $"{ratio}: flexing will end it"),
            _ => new("fits", $"{ratio}: flexing will not end it"),
        };
    }

    private static CheckLine Condition(BladeAdvice here, SawNow saw, ShopAdvice advice, ShopUnits units)
    {
        BladeFile blade = here.File;
        DateTime now = advice.Now.AsOf;
        if (blade.Hold is { } hold)
        {
            return new("hold", $"{Said.Capital(LifeWords.Hold(hold, advice.Words))}, since {Said.When(hold.Entry.AtUtc, now, units)}");
        }

        if (blade.Place == Place.AtSharpener)
        {
            return new("no", $"Written as {LifeWords.Away(blade.Away)}");
        }

        if (blade.Place == Place.Gone)
        {
            return new("no", "Written as gone");
        }

        if (blade.Place == Place.OnSaw && blade.SawId != saw.Saw.Id)
        {
            return new("no", $"Written as on {advice.Now.Saws.First(s => s.Saw.Id == blade.SawId).Saw.Name}: take it off there first");
        }

        string looked = blade.LastInspectedUtc is { } at ? $"inspected {Said.When(at, now, units)}" : "never inspected here";
        string run = $"{Figures.With(Figures.Hours(blade.Hours), "h")} run";
        return here switch
        {
            { InspectionOverdue: true } or { InspectEachMount: true } => new("care", $"Inspect it before it cuts: {looked}, {run}"),
            { State: BladeState.Sharpen } => new("care", $"Dull: sharpen it first; {looked}, {run}"),
            _ => new("fits", $"Sharp, {looked}, {run}"),
        };
    }

    private static CheckLine Pull(BladeAdvice here, ShopUnits units)
    {
        BladeTension tension = here.Record.Tension!;
        string pull = $"{Said.Capital(units.PullName)} {units.Show(new Stress(tension.Stress.Value))} in the body";
        if (tension.PullOverSaw > 1 + 1e-9)
        {
            return new("care", $"{pull}: more than this saw can pull", tension.Stress.From);
        }

        return new(tension.Guessed ? "care" : "fits", pull, tension.Stress.From);
    }

    private static string Lower(string s) => char.ToLowerInvariant(s[0]) + s[1..];
}

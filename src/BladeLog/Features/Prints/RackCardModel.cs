using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Prints;

/// <summary>One hook: what hangs there and what it is for.</summary>
public sealed record PegRow(string Hook, string Tag, ToothSpec Teeth, string Section, string Use, string Last, bool Held);

/// <summary>One sheet of one rack.</summary>
public sealed record RackSheet(string Place, string Code, string Title, string Says, IReadOnlyList<PegRow> Pegs, string? Part);

public sealed record RackCardModel(IReadOnlyList<string> Racks, string? Shown, IReadOnlyList<RackSheet> Sheets, string When);

/// <summary>The rack on paper, for the day the tablet is dead.</summary>
internal static class RackCard
{
    /// <summary>As many hooks as fit on A4 at 20.5 mm each.</summary>
    private const int Pegs = 8;

    /// <summary>Wider than this a blade is not asked for curves; the trade's own tables end there for shop saws.</summary>
    private const double CurveWidthM = 0.0165;

    /// <summary>Three teeth in the cut at least, and no more than two dozen: common practice.</summary>
    private const double LeastTeeth = 3;
    private const double MostTeeth = 24;

    public static RackCardModel Of(ShopAdvice advice, IReadOnlyList<string> clearers, ShopUnits units, string? rack)
    {
        var hung = advice.Now.Blades.Where(b => b.Place == Place.Rack && b.Hook is not null).GroupBy(b => Rack(b.Hook!), StringComparer.OrdinalIgnoreCase)
            .OrderBy(g => g.Key, NaturalOrder.Instance).ToList();
        var shown = hung.Find(g => string.Equals(g.Key, rack, StringComparison.OrdinalIgnoreCase))?.Key;
        return new RackCardModel(
            [.. hung.Select(g => g.Key)],
            shown,
            [.. hung.Where(g => shown is null || g.Key == shown).SelectMany(g => Sheets(g.Key, [.. g.OrderBy(b => b.Hook, NaturalOrder.Instance)], advice, clearers, units))],
            Printing.When(advice.Now.AsOf, units));
    }

    /// <summary>"R2" of "R2-4".</summary>
    private static string Rack(string hook) => hook.LastIndexOf('-') is > 0 and int i ? hook[..i] : hook;

    private static IEnumerable<RackSheet> Sheets(string rack, BladeFile[] blades, ShopAdvice advice, IReadOnlyList<string> clearers, ShopUnits units)
    {
        var saws = advice.Now.Saws.Where(s => s.Saw.Active && blades.Any(b => Loop(b, s))).ToList();
        var parts = blades.Chunk(Pegs).ToList();
        for (var i = 0; i < parts.Count; i++)
        {
            yield return new RackSheet(
                rack,
                advice.Now.Shop.LanName is { } name ? $"http://{name}/rack" : rack,
                Title(saws, units),
                Says(blades.Length, saws, advice.Now),
                [.. parts[i].Select(b => Peg(b, advice, clearers, units))],
                parts.Count > 1 ? $"Sheet {i + 1} of {parts.Count}" : null);
        }
    }

    private static bool Loop(BladeFile blade, SawNow saw) =>
        (blade.LoopM ?? blade.Spec.NewLoopM) is { } loop && loop >= saw.Setup.LoopLeastM - 1e-9 && loop <= saw.Setup.LoopMostM + 1e-9;

    private static string Title(List<SawNow> saws, ShopUnits units) => saws.Count == 0
        ? "No saw takes these lengths"
        : string.Join("; ", saws.Select(s =>
            $"{s.Saw.Name}: loop {units.Show(new Length(s.Setup.LoopM), Fields.Loop)}, widths {Bare(s.Setup.WidthLeastM, units)} to {Bare(s.Setup.WidthMostM, units)}"));

    private static string Says(int count, List<SawNow> saws, ShopNow now)
    {
        List<string> says = [$"{(count == 1 ? "1 blade hangs" : $"{count} blades hang")} here."];
        foreach (var saw in saws)
        {
            if (now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId) is { } on)
            {
                says.Add($"{on.Blade.Tag} is on {saw.Saw.Name}.");
            }
        }

        string[] away = [.. now.Blades.Where(b => b.Place == Place.AtSharpener && saws.Exists(s => Loop(b, s))).Select(b => b.Blade.Tag).Order(NaturalOrder.Instance)];
        if (away.Length > 0)
        {
            says.Add($"{Joined(away)} {(away.Length == 1 ? "is" : "are")} at the sharpener.");
        }

        return string.Join(' ', says);
    }

    private static PegRow Peg(BladeFile file, ShopAdvice advice, IReadOnlyList<string> clearers, ShopUnits units)
    {
        var blade = advice.Of(file);
        var saw = advice.Fitting(file).FirstOrDefault();
        var section = $"{Said.Section(file, units)}{Figures.Glue}{(units.Units == UnitSystem.Inch ? "in" : "mm")}, {Said.Teeth(file.Spec, units)}";
        var hook = file.Hook!;
        if (file.Hold is { } hold)
        {
            var why = LifeWords.HoldReason(hold, advice.Words);
            var who = clearers.Count == 0 ? "Nobody may clear it yet." : $"{string.Join(" or ", clearers)} clears it after a look.";
            return new PegRow(Number(hook), file.Blade.Tag, Drawn.Teeth(blade.Body, file.Spec), section, $"HOLD{(why is null ? "" : ": " + why)}, stays off", who, Held: true);
        }

        return new PegRow(
            Number(hook), file.Blade.Tag, Drawn.Teeth(blade.Body, file.Spec), section, Use(blade, saw, advice, units),
            saw is null ? "fits no saw as it is" : $"{Tension(blade, saw, advice, units)}, mark ____", Held: false);
    }

    private static string Number(string hook) => hook[(hook.LastIndexOf('-') + 1)..];

    private static string Use(BladeAdvice blade, SawNow? saw, ShopAdvice advice, ShopUnits units)
    {
        var file = blade.File;
        if (blade.PastRetireMark)
        {
            return "rough work only, then scrap";
        }

        if (blade.State == BladeState.Sharpen)
        {
            return $"dull ({Wording.Edge(blade.Edge.RadiusM)}): sharpen first";
        }

        var first = file.Hours == 0 && file.PriorUse is null ? "new: " : "";
        var after = blade.Record.UnknownHistory || file.Blade.InspectEachMount ? "; look before each mount"
            : blade.InspectionOverdue ? "; look at it first"
            : file.Welds > 1 && file.Blade.InspectEveryH is { } every ? $"; look each {Figures.Hours(every)}{Figures.Glue}h" : "";
        return first + Work(blade, saw, advice, units) + after;
    }

    /// <summary>The tightest curve of a narrow blade; the heights in which a wide one has enough teeth and not too many.</summary>
    private static string Work(BladeAdvice blade, SawNow? saw, ShopAdvice advice, ShopUnits units)
    {
        var body = blade.Body;
        if (body.Width.Value <= CurveWidthM && body.Kerf.Value > body.Thickness.Value)
        {
            var hard = CurveRadius.Hard(new Length(body.Width.Value), new Length(body.Kerf.Value), new Length(body.Thickness.Value)).Metres;
            return $"curves from R{Figures.Glue}{Bare(hard * advice.Settings[Advice.CutSettings.CurveFactor], units)}{Unit(units)}";
        }

        var most = Math.Min(MostTeeth * body.PitchMean, saw?.Setup.CutHeightMostM ?? double.MaxValue);
        return $"straight, {Bare(LeastTeeth * body.PitchCoarse, units)} to {Bare(most, units)}{Unit(units)}";
    }

    private static string Tension(BladeAdvice blade, SawNow saw, ShopAdvice advice, ShopUnits units)
    {
        var known = blade.Body.TensionOn(saw.Setup, blade.File, advice.Settings).Stress;
        return $"{units.Show(new Stress(known.Value))} on the body{(known.IsDefault ? " (default, not yours)" : "")}";
    }

    /// <summary>A length to the whole millimetre, without its unit.</summary>
    private static string Bare(double metres, ShopUnits units) => units.Units == UnitSystem.Inch
        ? Figures.With(Figures.Number(metres / Handbook.Units.Exact.Inch, metres < Handbook.Units.Exact.Inch ? 2 : 1), "in")
        : Figures.Number(metres * 1e3);

    private static string Unit(ShopUnits units) => units.Units == UnitSystem.Inch ? "" : Figures.Glue + "mm";

    private static string Joined(string[] tags) => tags.Length == 1 ? tags[0] : $"{string.Join(", ", tags[..^1])} and {tags[^1]}";
}

using System.Globalization;
using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>The way to the working of a figure of something that is only asked about: what differs from the record is typed into the address.</summary>
internal static class WorkedAsked
{
    /// <summary>Everything compared of a blade as it might be.</summary>
    public static IReadOnlyList<Worked> All(BladeStand then, Wording words)
    {
        ArgumentNullException.ThrowIfNull(then);
        ArgumentNullException.ThrowIfNull(words);
        string on = $"then, on {then.Saw.Saw.Name}";
        return WorkedOut.Rows(
            new Worked($"The life {on}", "bending, bends an hour, half of such blades broken", At("band-life", then.File, then.Saw, [.. Life(then.Body, then.LoopM, then.Tension.Stress.Value, then.File.Weld)])),
            new Worked($"The {words.Tension} {on}", "the pull it means, what the saw can reach", At("tension", then.File, then.Saw, [.. Pull(then.Body, then.Tension.Stress.Value, then.Saw.Setup)])),
            new Worked($"The push it stands {on}", "span of the guides, slack front edge, twisting away", At("thrust-limits", then.File, then.Saw, [.. Push(then.Body, then.Tension, then.Saw.Setup, then.HeightM)])),
            then.UsualRadiusM is null ? null : new Worked("The tightest curve then", "from its width and kerf", At("curve", then.File, then.Saw, Millimetres("width", then.Body.Width.Value), Millimetres("thickness", then.Body.Thickness.Value), Millimetres("kerf", then.Body.Kerf.Value))));
    }

    /// <summary>The deepest stock: a cut of that height, with what holds it.</summary>
    public static Worked Depth(BladeDepth blade, SawNow saw, DeepestStock deepest, CutWork work, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(deepest);
        ArgumentNullException.ThrowIfNull(work);
        ArgumentNullException.ThrowIfNull(settings);
        SawSetup setup = saw.Setup;
        return new(
            $"Deepest stock of {blade.Blade.File.Blade.Tag} on {saw.Saw.Name}", "every limit at that height",
            At("cut", blade.Blade.File, saw,
            [
                Millimetres("height", deepest.AskedM), Millimetres("opens", setup.CutHeightMostM),
                $"wood={Uri.EscapeDataString(work.Material!.Name)}", Typed("moisture", work.Moisture.Value, "%"),
                Typed("feed", deepest.FeedMps * 60, "m/min"), Typed("edge", blade.EdgeM * 1e6, "µm"),
                Typed("fill", work.Fill(setup, settings).Fill.Value), Typed("power", BandPower.Easy(setup, settings), "W"),
                Typed("thrust", deepest.ThrustAsked.Allowed.Newtons, "N"),
            ]));
    }

    /// <summary>Push the blade stands in wood of this height.</summary>
    public static Worked? Push(BladeDepth blade, SawNow saw, BladeTension tension, double heightM) => heightM > 0
        ? new($"Push {Of(blade, saw)} stands", "span of the guides, slack front edge, twisting away", At("thrust-limits", blade.Blade.File, saw, [.. Push(blade.Blade.Body, tension, saw.Setup, heightM)]))
        : null;

    public static Worked Tension(BladeDepth blade, SawNow saw, double tensionPa, Wording words) =>
        new($"{Said.Capital(words.Tension)} of {Of(blade, saw)}", "on the body, and the pull it means", At("tension", blade.Blade.File, saw, [.. Pull(blade.Blade.Body, tensionPa, saw.Setup)]));

    public static Worked Life(BladeDepth blade, SawNow saw, double tensionPa) =>
        new($"Life of {Of(blade, saw)}", "bending, bends an hour, hours to each mark", At("band-life", blade.Blade.File, saw,
        [
            .. Life(blade.Blade.Body, blade.Blade.File.LoopM ?? saw.Setup.LoopM, tensionPa, blade.Blade.File.Weld),
            $"wheels={Uri.EscapeDataString(string.Join("; ", saw.Setup.Wheels.OrderBy(w => w.Position).Select(w => $"{Number(w.DiameterM * 1e3)} mm")))}",
        ]));

    private static string Of(BladeDepth blade, SawNow saw) => $"{blade.Blade.File.Blade.Tag} on {saw.Saw.Name}";

    private static IEnumerable<string> Life(BladeBody body, double loopM, double tensionPa, WeldQuality weld) =>
    [
        Millimetres("thickness", body.Thickness.Value), Millimetres("loop", loopM), Millimetres("body", body.BodyWidth), Megapascals(tensionPa),
        Typed("hrc", body.Hrc.Value), $"weld={weld.ToString().ToLowerInvariant()}",
    ];

    private static IEnumerable<string> Pull(BladeBody body, double tensionPa, SawSetup setup) =>
    [
        Millimetres("thickness", body.Thickness.Value), Millimetres("width", body.Width.Value), Millimetres("gullet", body.Gullet.Value),
        Typed("pull", tensionPa * body.Thickness.Value * body.BodyWidth, "N"),
        .. setup.StrandForceMostN is { } most ? (string[])[Typed("most", most, "N")] : [],
    ];

    private static IEnumerable<string> Push(BladeBody body, BladeTension tension, SawSetup setup, double heightM) =>
    [
        Millimetres("width", body.Width.Value), Millimetres("thickness", body.Thickness.Value), Millimetres("gullet", body.Gullet.Value), Megapascals(tension.Stress.Value),
        Millimetres("height", heightM), Millimetres("above", setup.ClearanceM), $"sure={(tension.Guessed ? "guessed" : "measured")}",
    ];

    private static string At(string working, BladeFile file, SawNow saw, params string[] typed) =>
        $"/workings/{working}?blade={Uri.EscapeDataString(file.Blade.Tag)}&saw={Uri.EscapeDataString(saw.Saw.Code)}&{string.Join('&', typed)}";

    private static string Millimetres(string name, double metres) => Typed(name, metres * 1e3, "mm");

    private static string Megapascals(double pascals) => Typed("tension", pascals / 1e6, "MPa");

    private static string Typed(string name, double value, string unit = "") => $"{name}={Uri.EscapeDataString($"{Number(value)} {unit}".Trim())}";

    private static string Number(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}

using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Bench;

/// <summary>One blade on the day's list: why, and where to write what was done.</summary>
public sealed record BenchRow(string Tag, ToothSpec Teeth, string Why, string Where, string Href, string Verb, Worked? Worked);

/// <summary>A batch that is out.</summary>
public sealed record BatchRow(string Number, string Service, string Sent, string Promised, bool Late, IReadOnlyList<string> Tags);

public sealed record BenchModel(IReadOnlyList<BenchRow> Sharpen, IReadOnlyList<BenchRow> Look, IReadOnlyList<BenchRow> Held, IReadOnlyList<BenchRow> Broken, IReadOnlyList<BatchRow> Out)
{
    public static BenchModel Of(ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(advice);
        List<BenchRow> sharpen = [], look = [], held = [], broken = [];
        foreach (BladeFile file in advice.Now.Blades.Where(b => b.Place is not (Place.Gone or Place.AtSharpener)).OrderBy(b => b.Blade.Tag, StringComparer.Ordinal))
        {
            BladeAdvice blade = advice.Of(file);
            if (blade.State == BladeState.Broken)
            {
                broken.Add(Row(blade, advice, "It broke: weld it, or retire it and cut it up.", "join", "Weld"));
            }
            else if (file.Hold is { } hold)
            {
                held.Add(Row(blade, advice, Said.Capital(LifeWords.Hold(hold, advice.Words)) + ".", "clear", "Clear"));
            }
            else if (blade.State == BladeState.Sharpen)
            {
                string why = file.OffAsDull ? Said.Capital(LifeWords.OffAsDull) + "." : $"Edge {Wording.Edge(blade.Edge.RadiusM)}.";
                sharpen.Add(Row(blade, advice, blade.Grind.Pays ? why : $"{why} {LifeWords.NoGrind(blade, advice.Settings, advice.Words)}", "sharpen", blade.Grind.Pays ? "Sharpen" : "No grind"));
            }
            else if (blade.InspectionOverdue || blade.State == BladeState.Look)
            {
                look.Add(Row(blade, advice, blade.Advice.Because.Count > 0 ? blade.Advice.Because[0] : "It is to be looked at before each mount.", "inspect", "Look"));
            }
        }

        return new BenchModel(sharpen, look, held, broken, Batches(advice.Now, units));
    }

    /// <summary>Batches with blades still away.</summary>
    public static IReadOnlyList<BatchRow> Batches(ShopNow now, ShopUnits units) =>
    [
        .. now.Blades.Where(b => b.Away is not null).GroupBy(b => b.Away!.BatchNumber).OrderBy(g => g.Key, StringComparer.Ordinal).Select(g =>
        {
            AwayIn away = g.First().Away!;
            return new BatchRow(
                g.Key,
                away.Service,
                Said.When(away.SentUtc, now.AsOf, units),
                away.PromisedUtc is { } due ? Said.Local(due, units).ToString("ddd d MMM", System.Globalization.CultureInfo.InvariantCulture) : "no date promised",
                away.PromisedUtc < now.AsOf,
                [.. g.Select(b => b.Blade.Tag).Order(StringComparer.Ordinal)]);
        }),
    ];

    private static BenchRow Row(BladeAdvice blade, ShopAdvice advice, string why, string page, string verb)
    {
        BladeFile file = blade.File;
        string where = file.Place switch
        {
            Place.OnSaw => $"on {advice.Now.Saws.First(s => s.Saw.Id == file.SawId).Saw.Name}",
            Place.Bench => "on the bench",
            _ => file.Hook is null ? "on the rack" : $"hook {file.Hook}",
        };
        return new BenchRow(file.Blade.Tag, Drawn.Teeth(blade.Body, file.Spec), why, where, $"/blades/{file.Blade.Tag}/{page}", verb, verb is "Sharpen" or "No grind" ? WorkedOut.Edge(blade) : verb == "Look" ? WorkedOut.Life(blade) : null);
    }
}

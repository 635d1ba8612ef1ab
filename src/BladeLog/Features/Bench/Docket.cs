using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Bench;

/// <summary>One blade on the docket: what a sharpener must know of it.</summary>
/// <param name="Tag">As painted.</param>
/// <param name="Size">Length by width by thickness.</param>
/// <param name="Teeth">Pitch and form.</param>
/// <param name="Hook">Hook angle.</param>
/// <param name="Set">Set wanted on each side, or what stands for it.</param>
/// <param name="Material">Of the teeth and the body.</param>
/// <param name="Seen">What was seen of its condition.</param>
/// <param name="Price">Expected; null where nobody told.</param>
public sealed record DocketLine(string Tag, string Size, string Teeth, string Hook, string Set, string Material, IReadOnlyList<string> Seen, string? Price);

public sealed record DocketModel(string Number, string Service, string Sent, string? Promised, string? By, IReadOnlyList<DocketLine> Lines, string Cost, int Unpriced, string When);

/// <summary>What goes along with a batch to the sharpener, readable without the program.</summary>
internal static class Docket
{
    public static void Map(WebApplication app) => app.MapGet("/bench/batches/{number}/docket", Get);

    private static async Task<IResult> Get(Desk desk, string number)
    {
        var batch = await desk.Db.Batches.AsNoTracking().Include(b => b.Entry.Person).Include(b => b.Lines).ThenInclude(l => l.Entry)
            .Where(b => b.Number == number).OrderByDescending(b => b.EntryId).FirstOrDefaultAsync();
        if (batch is null)
        {
            return Results.NotFound();
        }

        var advice = await desk.Advice();
        var units = await desk.Units();
        var sent = batch.Lines.Select(l => l.BladeId).ToHashSet();
        BladeFile[] files = [.. advice.Now.Blades.Where(b => sent.Contains(b.Blade.Id)).OrderBy(b => b.Blade.Tag, NaturalOrder.Instance)];
        List<DocketLine> lines = [];
        foreach (var file in files)
        {
            lines.Add(Line(advice.Of(file), await Seen(desk, file, batch.Entry.AtUtc, units, advice.Words), units));
        }

        return await desk.Page<DocketPage, DocketModel>(new(
            batch.Number,
            batch.Service,
            Day(batch.Entry.AtUtc, units),
            batch.PromisedUtc is { } due ? Day(due, units) : null,
            batch.Entry.Person?.Initials,
            lines,
            units.ShowMoney(files.Sum(f => f.Spec.SharpeningPriceMinor ?? 0)),
            files.Count(f => f.Spec.SharpeningPriceMinor is null),
            $"{Day(desk.Now, units)}, {Said.Local(desk.Now, units).ToString("HH:mm", System.Globalization.CultureInfo.InvariantCulture)}"));
    }

    private static string Day(DateTime utc, ShopUnits units) => Said.Local(utc, units).ToString("ddd d MMM yyyy", System.Globalization.CultureInfo.InvariantCulture);

    private static DocketLine Line(BladeAdvice blade, IReadOnlyList<string> seen, ShopUnits units)
    {
        var (body, file) = (blade.Body, blade.File);
        var loop = (file.LoopM ?? file.Spec.NewLoopM) is { } known ? units.Show(new Length(known), Fields.Loop) : "length not told";
        return new DocketLine(
            file.Blade.Tag,
            $"{loop} × {Said.Width(body.Width.Value, units)} × {units.Show(new Length(body.Thickness.Value), Fields.Thickness)}",
            Said.Teeth(file.Spec, units),
            $"{units.Show(new Angle(body.Rake.Value))}{Default(body.Rake)}",
            body.Tip switch
            {
                TipKind.Tipped => $"tipped: kerf {units.Show(new Length(body.Kerf.Value), Fields.Kerf)}{Default(body.Kerf)}",
                TipKind.Swaged => $"swaged: kerf {units.Show(new Length(body.Kerf.Value), Fields.Kerf)}{Default(body.Kerf)}",
                _ => $"{units.Show(new Length((body.Kerf.Value - body.Thickness.Value) / 2), Fields.Kerf)} each side{Default(body.Kerf)}",
            },
            Said.Capital($"{Teeth(body.TipMaterial)} teeth, {Body(body.Steel)}"),
            seen,
            file.Spec.SharpeningPriceMinor is { } price ? units.ShowMoney(price) : null);
    }

    private static string Default(Known known) => known.IsDefault ? " (default, not yours)" : "";

    /// <summary>Since it was last ground, up to the moment it went.</summary>
    private static async Task<IReadOnlyList<string>> Seen(Desk desk, BladeFile file, DateTime sent, ShopUnits units, Wording words)
    {
        var (db, id) = (desk.Db, file.Blade.Id);
        var ground = await db.Sharpenings.AsNoTracking().Where(s => s.BladeId == id && s.Entry.AtUtc < sent).MaxAsync(s => (DateTime?)s.Entry.AtUtc) ?? DateTime.MinValue;
        var nails = await db.CutsDone.AsNoTracking()
            .Where(c => c.Nail && c.Entry.AtUtc > ground && c.Entry.AtUtc <= sent
                && db.Mounts.Any(m => m.BladeId == id && m.SawId == c.SawId && m.Entry.AtUtc <= c.Entry.AtUtc
                    && !db.Dismounts.Any(d => d.MountId == m.EntryId && d.Entry.AtUtc < c.Entry.AtUtc)))
            .Select(c => c.Entry.AtUtc).ToListAsync();
        var looks = await db.Inspections.AsNoTracking().Include(i => i.Entry).Where(i => i.BladeId == id && i.Entry.AtUtc > ground && i.Entry.AtUtc <= sent).ToListAsync();
        List<string> seen = [.. nails.Select(n => $"hit metal {Day(n, units)}")];
        seen.AddRange(looks.Where(l => l.Found != Found.NothingSeen).Select(l =>
            $"{(l.Found == Found.Crack ? $"crack{(l.CrackLengthM is { } length ? " " + words.Length(length) : "")}" : l.Found == Found.Worn ? "worn" : "seen")}{(l.Note is { } note ? ": " + note.TrimEnd('.') : "")}, {Day(l.Entry.AtUtc, units)}"));
        if (seen.Count == 0)
        {
            seen.Add(looks.MaxBy(l => l.Entry.AtUtc) is { } last ? $"no crack seen, {Day(last.Entry.AtUtc, units)}" : "not looked at since its last grind");
        }

        return seen;
    }

    private static string Teeth(TipMaterial material) => material switch
    {
        TipMaterial.PlainSteel => "plain steel",
        TipMaterial.HardenedCarbon => "hardened carbon steel",
        TipMaterial.Bimetal => "bi-metal",
        TipMaterial.Carbide => "carbide",
        _ => "cobalt alloy",
    };

    private static string Body(BodySteel steel) => steel switch
    {
        BodySteel.FlexibleBack => "flexible back",
        BodySteel.SpringTempered => "spring-tempered body",
        BodySteel.Bimetal => "bi-metal back",
        BodySteel.CarbideTipped => "body for tips",
        _ => "wide strip",
    };
}

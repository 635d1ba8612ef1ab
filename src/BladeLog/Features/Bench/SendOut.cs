using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Bench;

public sealed record SendOutForm : PostedForm
{
    public string? Number { get; init; }

    public string? Service { get; init; }

    public string? Promised { get; init; }

    public string? At { get; init; }

    /// <summary>More tags, scanned or typed.</summary>
    public string? Tags { get; init; }

    public string[]? Pick { get; init; }
}

/// <summary>A blade that may go, with what speaks against paying for it.</summary>
public sealed record SendOutRow(string Tag, string Why, bool NoGrind);

public sealed record SendOutModel(SendOutForm Form, FormState State, IReadOnlyList<SendOutRow> Rows, IReadOnlyList<string> Services, IReadOnlyList<string> OnSaws);

/// <summary>Blades go to the sharpening service in one batch.</summary>
internal static class SendOut
{
    public static async Task<IResult> Get(Desk desk)
    {
        var last = await desk.Db.Batches.AsNoTracking().OrderByDescending(b => b.EntryId).Select(b => new { b.Number, b.Service }).FirstOrDefaultAsync();
        return await Show(desk, new SendOutForm { Number = Next(last?.Number), Service = last?.Service }, FormState.New);
    }

    public static async Task<IResult> Post([FromForm] SendOutForm? form, Desk desk)
    {
        form ??= new();
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        List<string> tags = [.. form.Pick ?? [], .. (form.Tags ?? "").Split([' ', ',', ';', '\n', '\r'], StringSplitOptions.RemoveEmptyEntries).Select(Records.Tags.Read)];
        read.RefuseUnless(tags.Count > 0, nameof(form.Tags), "Tick or type the blades that go.");
        DateTime? promised = read.DayAhead(nameof(form.Promised), form.Promised) is { } day
            ? TimeZoneInfo.ConvertTimeToUtc(day.ToDateTime(new TimeOnly(12, 0)), units.Zone)
            : null;
        var command = new SendBatch(form.Number?.Trim() ?? "", form.Service?.Trim() ?? "", [.. tags.Distinct()], promised, read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, "/bench", $"Batch {form.Number}", state => Show(desk, form, state))
            : await Show(desk, form, read.State);
    }

    private static async Task<IResult> Show(Desk desk, SendOutForm form, FormState state)
    {
        var advice = await desk.Advice();
        var rows = advice.Now.Blades.Where(b => b.Place is Place.Rack or Place.Bench && b.Hold is null).Select(advice.Of)
            .Where(b => b.State == BladeState.Sharpen || form.Pick?.Contains(b.File.Blade.Tag) == true)
            .OrderBy(b => b.File.Blade.Tag, StringComparer.Ordinal)
            .Select(b => new SendOutRow(
                b.File.Blade.Tag,
                b.Grind.Pays && b.File.OffAsDull ? LifeWords.OffAsDull
                    : b.Grind.Pays ? $"edge {Wording.Edge(b.Edge.RadiusM)}" : LifeWords.NoGrind(b, advice.Settings, advice.Words),
                !b.Grind.Pays));
        var services = await desk.Db.Batches.AsNoTracking().Select(b => b.Service).Distinct().ToListAsync();
        var onSaws = advice.Now.Blades.Where(b => b.Place == Place.OnSaw).Select(advice.Of).Where(b => b.State == BladeState.Sharpen).OrderBy(b => b.File.Blade.Tag, StringComparer.Ordinal)
            .Select(b => $"{b.File.Blade.Tag} on {advice.Now.Saws.First(s => s.Saw.Id == b.File.SawId).Saw.Name}");
        return await desk.Page<SendOutPage, SendOutModel>(new(form, state, [.. rows], services, [.. onSaws]), state.Status);
    }

    /// <summary>B-031 is followed by B-032.</summary>
    private static string Next(string? last)
    {
        var digits = (last ?? "B-000").Reverse().TakeWhile(char.IsAsciiDigit).Count();
        var head = (last ?? "B-000")[..^digits];
        return digits is 0 or > 9
            ? ""
            : head + (int.Parse((last ?? "B-000")[^digits..], System.Globalization.CultureInfo.InvariantCulture) + 1).ToString("D" + digits, System.Globalization.CultureInfo.InvariantCulture);
    }
}

using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record ClearForm : PostedForm
{
    public string? How { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }
}

/// <summary>A hold is cleared by a person who may.</summary>
internal static class Clear
{
    /// <summary>The way that needs a note.</summary>
    public const string Other = "other";

    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new ClearForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] ClearForm? form, Desk desk, string tag)
    {
        form ??= new();
        if ((await desk.Shop()).Blade(Tags.Read(tag)) is null)
        {
            return Results.NotFound();
        }

        var read = new FormReading(await desk.Units(), desk.Now);
        var (how, note) = (form.How?.Trim() ?? "", form.Note?.Trim() ?? "");
        read.RefuseUnless(how.Length > 0, nameof(form.How), "Say how it was cleared: ground out, cut out, no crack found.");
        read.RefuseUnless(how != Other || note.Length > 0, nameof(form.Note), "Write how it was cleared.");
        var command = new ClearHold(tag, how == Other ? note : note.Length > 0 ? $"{how}: {note}" : how, read.Time(nameof(form.At), form.At));
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Hold of {Tags.Read(tag)} cleared", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    private static Task<IResult> Show(Desk desk, string tag, ClearForm form, FormState state) =>
        BladeForm.Show<ClearPage, ClearForm>(desk, tag, form, state, async model => model with { Names = await MayClear(desk) });

    private static Task<List<string>> MayClear(Desk desk) =>
        desk.Db.PersonRoles.AsNoTracking()
            .Where(r => r.Role == Role.ClearHolds && r.FromUtc <= desk.Now && (r.UntilUtc == null || r.UntilUtc > desk.Now))
            .Join(desk.Db.People.Where(p => p.Active), r => r.PersonId, p => p.Id, (_, p) => p.Initials)
            .Distinct().OrderBy(i => i).ToListAsync();
}

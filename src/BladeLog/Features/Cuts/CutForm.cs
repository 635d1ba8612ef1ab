using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;
using Problem = BladeLog.Ui.Forms.Problem;

namespace BladeLog.Features.Cuts;

/// <summary>A cut for the list, as typed.</summary>
public sealed record CutForm
{
    public string? Op { get; init; }

    public string? Version { get; init; }

    /// <summary>A name tapped from those offered; it stands for the species.</summary>
    public string? Pick { get; init; }

    public string? Job { get; init; }

    public string? Species { get; init; }

    public string? Height { get; init; }

    public string? Length { get; init; }

    public string? Pieces { get; init; }

    public string? Kind { get; init; }

    public string? Finish { get; init; }

    public string? Radius { get; init; }

    public string? Bevel { get; init; }

    public string? Moisture { get; init; }

    public string? Frozen { get; init; }

    public string? Dirt { get; init; }

    public string? Direction { get; init; }

    public string? ClassWork { get; init; }

    public string? Nail { get; init; }

    public string? Timber { get; init; }

    public string? Due { get; init; }

    internal static CutForm New() => new()
    {
        Op = Guid.NewGuid().ToString(),
        Pieces = "1",
        Dirt = nameof(Handbook.Quantities.Dirt.Clean),
        Direction = nameof(CutDirection.Rip),
    };

    internal static CutForm Of(QueuedCut cut, ShopUnits units) => new()
    {
        Op = Guid.NewGuid().ToString(),
        Version = units.Typing.Show(cut.Version),
        Job = cut.Job,
        Species = cut.SpeciesTyped,
        Height = units.BareLength(cut.HeightM, Fields.CutHeight),
        Length = units.BareLength(cut.LengthM, Fields.Board),
        Pieces = units.Typing.Show(cut.Pieces),
        Kind = cut.Kind.ToString(),
        Finish = cut.Finish.ToString(),
        Radius = units.BareLength(cut.RadiusM, Fields.CurveRadius),
        Bevel = cut.BevelRad > 0 ? units.BareAngle(cut.BevelRad) : null,
        Moisture = cut.MoisturePct is { } m ? Figures.Plain(m, 1) : null,
        Frozen = cut.Frozen ? "true" : null,
        Dirt = cut.Dirt.ToString(),
        Direction = cut.Direction.ToString(),
        ClassWork = cut.ClassWork ? "true" : null,
        Nail = cut.NailChance > 0 ? Figures.Plain(cut.NailChance * 100, 1) : null,
        Timber = units.BareMoney(cut.TimberMinorPerM3),
        Due = cut.Due is { } due ? units.Typing.Show(due) : null,
    };

    /// <summary>The cut it says, or null with the sentences in the reader.</summary>
    internal QueuedCut? Read(FormReader read)
    {
        string job = (Job ?? "").Trim();
        if (job.Length is 0 or > 80)
        {
            read.Refuse(nameof(Job), "Say in a few words what it is for, such as drawer fronts.");
        }

        Wood? wood = read.Wood(Species, nameof(Species));
        double? height = read.NeedLength(Height, nameof(Height), Fields.CutHeight), length = read.NeedLength(Length, nameof(Length), Fields.CutLength);
        int? pieces = read.NeedPieces(Pieces, nameof(Pieces));
        CutKind? kind = read.OneOf<CutKind>(Kind, nameof(Kind), "Choose what kind of work it is.");
        Finish? finish = read.OneOf<Finish>(Finish, nameof(Finish), "Choose how fine the cut must be.");
        Dirt? dirt = read.OneOf<Dirt>(Dirt, nameof(Dirt), "Choose how clean the wood is.");
        CutDirection? direction = read.OneOf<CutDirection>(Direction, nameof(Direction), "Choose along or across the grain.");
        double? radius = read.Length(Radius, nameof(Radius), Fields.CurveRadius), moisture = read.Moisture(Moisture, nameof(Moisture)), nail = read.Percent(Nail, nameof(Nail));
        Angle? bevel = read.Bevel(Bevel, nameof(Bevel));
        long? timber = read.Money(Timber, nameof(Timber));
        DateOnly? due = read.Date(Due, nameof(Due));
        if (read.Problems.Count > 0)
        {
            return null;
        }

        return new QueuedCut
        {
            Job = job,
            Material = wood!.Kind,
            SpeciesKey = wood.Key,
            SpeciesTyped = wood.Typed,
            TakenAs = wood.TakenAs,
            HeightM = height!.Value,
            HeightTyped = Height!.Trim(),
            LengthM = length!.Value,
            LengthTyped = Length!.Trim(),
            Pieces = pieces!.Value,
            Kind = kind!.Value,
            Finish = finish!.Value,
            RadiusM = radius,
            RadiusTyped = radius is null ? null : Radius!.Trim(),
            BevelRad = bevel?.Radians ?? 0,
            MoisturePct = moisture,
            Frozen = Frozen == "true",
            Dirt = dirt!.Value,
            Direction = direction!.Value,
            ClassWork = ClassWork == "true",
            NailChance = (nail ?? 0) / 100,
            TimberMinorPerM3 = timber,
            Due = due,
        };
    }
}

public sealed record CutFormModel(int? Number, CutForm Form, IReadOnlyList<Problem> Problems, ShopUnits Units, string MoistureDefault)
{
    /// <summary>The cut as it stands, or the one put on the list before: what the keys of last time say.</summary>
    public CutForm? Before { get; init; }

    /// <summary>Moisture reckoned with where none is typed, in percent.</summary>
    public string? MoistureReckoned { get; init; }

    /// <summary>The shop's own value of a cubic metre.</summary>
    public string? TimberReckoned { get; init; }

    public string Action => Number is { } n ? $"/cuts/{n}/edit" : "/cuts/new";

    /// <summary>Names to tap in place of an unknown one.</summary>
    public IReadOnlyList<string> Offers => Wood.Offers(Form.Species);

    public string? Error(string field) => Problems.FirstOrDefault(p => p.Field == field)?.Sentence;
}

internal static class CutForms
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/cuts/new", async (Desk desk) => await Page(desk, null, CutForm.New(), []));
        app.MapPost("/cuts/new", Add);
        app.MapGet("/cuts/{number:int}/edit", Edit);
        app.MapPost("/cuts/{number:int}/edit", Save);
    }

    private static async Task<IResult> Add([FromForm] CutForm? form, Desk desk)
    {
        form ??= new();
        form = Picked(form);
        FormReader read = new(await desk.Units(), desk.Now);
        if (form.Read(read) is not { } cut)
        {
            return await Page(desk, null, form, read.Problems);
        }

        WriteResult result = await desk.Write(new QueueCut(cut), form.Op, null);
        return result is WriteResult.Done done ? desk.Saved(done, $"{cut.Job} on the list", canUndo: false) : await Page(desk, null, form, Unwritten.Of(result, read.Units, f => f));
    }

    private static async Task<IResult> Edit(int number, Desk desk) =>
        await CutsPages.Find(desk, number) is { } cut ? await Page(desk, number, CutForm.Of(cut, await desk.Units()), []) : Results.NotFound();

    private static async Task<IResult> Save(int number, [FromForm] CutForm? form, Desk desk)
    {
        form ??= new();
        form = Picked(form);
        FormReader read = new(await desk.Units(), desk.Now);
        if (form.Read(read) is not { } cut)
        {
            return await Page(desk, number, form, read.Problems);
        }

        int version = int.TryParse(form.Version, out int v) ? v : 0;
        WriteResult result = await desk.Write(new EditCut(number, version, cut), form.Op, null);
        return result is WriteResult.Done done ? desk.Saved(done, $"cut {number} edited", canUndo: false) : await Page(desk, number, form, Unwritten.Of(result, read.Units, f => f));
    }

    private static CutForm Picked(CutForm form) => string.IsNullOrWhiteSpace(form.Pick) ? form : form with { Species = form.Pick, Pick = null };

    private static async Task<IResult> Page(Desk desk, int? number, CutForm form, IReadOnlyList<Problem> problems)
    {
        AdviceSettings settings = (await desk.Advice()).Settings;
        string moisture = $"{Figures.Number(settings[CutSettings.Moisture])} % where nothing is typed: {settings.Known(CutSettings.Moisture).From}";
        ShopUnits units = await desk.Units();
        QueuedCut? before = number is { } n
            ? await CutsPages.Find(desk, n)
            : await desk.Db.QueuedCuts.AsNoTracking().OrderByDescending(c => c.Number).FirstOrDefaultAsync();
        long timber = (await desk.Shop()).Shop.TimberMinorPerM3;
        return await desk.Page<CutFormPage, CutFormModel>(
            new(number, form, problems, units, moisture)
            {
                Before = before is null ? null : CutForm.Of(before, units),
                MoistureReckoned = Figures.Plain(settings[CutSettings.Moisture], 1),
                TimberReckoned = timber > 0 ? units.BareMoney(timber) : null,
            },
            problems.Count > 0 ? StatusCodes.Status422UnprocessableEntity : StatusCodes.Status200OK);
    }
}

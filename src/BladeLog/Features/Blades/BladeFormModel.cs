using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

/// <summary>A form on one blade, as its page is given it.</summary>
public sealed record BladeFormModel<TForm>(TForm Form, FormState State, BladeFile File, BladeAdvice Advice, ShopUnits Units, DateTime Now)
    where TForm : PostedForm
{
    public string Tag => File.Blade.Tag;

    public ToothSpec Teeth => Drawn.Teeth(Advice.Body, File.Spec);

    /// <summary>Who is at this tablet; null: nobody has said.</summary>
    public string? Who { get; init; }

    public IReadOnlyList<string> People { get; init; } = [];

    /// <summary>Where it is and what is said of it, in one line.</summary>
    public string Line => $"{Said.Section(File, Units)}, {Said.Teeth(File.Spec, Units)}; {Where}";

    /// <summary>Why another grind is not worth its price; null: it is.</summary>
    public string? NoGrind { get; init; }

    /// <summary>What its measured kerf and set tell.</summary>
    public IReadOnlyList<string> KerfSays { get; init; } = [];

    /// <summary>What the form works out before it records; none while nothing is typed.</summary>
    public IReadOnlyList<BecauseLine> Lines { get; init; } = [];

    /// <summary>Further words a page needs: names to call, codes to choose from.</summary>
    public IReadOnlyList<string> Names { get; init; } = [];

    /// <summary>Saws to choose from where it is on none: those it fits, else all.</summary>
    public IReadOnlyList<Answer> Saws { get; init; } = [];

    /// <summary>What each field was told last time, as it is typed there; none where nothing is known.</summary>
    public IReadOnlyDictionary<string, string?> LastTime { get; init; } = new Dictionary<string, string?>();

    public string? Last(string field) => LastTime.GetValueOrDefault(field);

    private string Where => File.Place switch
    {
        Place.OnSaw => "on a saw",
        Place.Bench => "on the bench",
        Place.AtSharpener => LifeWords.Away(File.Away),
        Place.Gone => "gone",
        _ => File.Hook is null ? "on the rack" : $"on the rack, {File.Hook}",
    };
}

internal static class BladeForm
{
    public static async Task<IResult> Show<TView, TForm>(
        Desk desk, string tag, TForm form, FormState state, Func<BladeFormModel<TForm>, Task<BladeFormModel<TForm>>>? with = null)
        where TView : View<BladeFormModel<TForm>>
        where TForm : PostedForm
    {
        var shop = await desk.Shop();
        if (shop.Blade(Tags.Read(tag)) is not { } file)
        {
            return Results.NotFound();
        }

        var advice = await desk.Advice();
        var blade = advice.Of(file);
        var model = new BladeFormModel<TForm>(form, state, file, blade, await desk.Units(), desk.Now)
        {
            Who = (await desk.Who())?.Initials,
            People = await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync(),
            KerfSays = KerfWords.Of(file, advice.Settings, advice.Words),
            Saws = [.. (advice.Fitting(file).Any() ? advice.Fitting(file) : shop.Saws.Where(s => s.Saw.Active)).Select(s => new Answer(s.Saw.Code, s.Saw.Name))],
            NoGrind = blade.Grind.Pays ? null : LifeWords.NoGrind(blade, advice.Settings, advice.Words),
        };
        return await desk.Page<TView, BladeFormModel<TForm>>(with is null ? model : await with(model), state.Status);
    }

    /// <summary>The address of a blade's page.</summary>
    public static string Of(string tag) => $"/blades/{Tags.Read(tag)}";
}

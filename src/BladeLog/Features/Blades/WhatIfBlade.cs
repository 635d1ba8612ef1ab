using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features.Blades;

/// <summary>One row of the comparison.</summary>
/// <param name="What">The figure.</param>
/// <param name="Today">As it is.</param>
/// <param name="Then">With the change.</param>
/// <param name="Mark">Where it comes from.</param>
public sealed record ComparedRow(string What, string Today, string Then, string Mark);

/// <summary>A blade today beside the same or another as it would be.</summary>
public sealed record WhatIfBladeModel
{
    public required string Tag { get; init; }

    public required string Title { get; init; }

    public required IReadOnlyList<AskField> Fields { get; init; }

    public required IReadOnlyList<Problem> Problems { get; init; }

    public string Today { get; init; } = "";

    public string Then { get; init; } = "";

    public IReadOnlyList<ComparedRow> Rows { get; init; } = [];

    /// <summary>What stands in the way of it.</summary>
    public IReadOnlyList<string> Stops { get; init; } = [];

    public IReadOnlyList<string> Remarks { get; init; } = [];

    /// <summary>Where the figures of the change are worked out.</summary>
    public IReadOnlyList<Worked> Worked { get; init; } = [];

    /// <summary>On hold: no life is told.</summary>
    public string? Held { get; init; }

    public string Path => $"/blades/{Uri.EscapeDataString(Tag)}/what-if";
}

/// <summary>Before a mount, a weld or a purchase: what it would do, beside what is there today.</summary>
internal static class WhatIfBlade
{
    public static void Map(WebApplication app) => app.MapGet("/blades/{tag}/what-if", Get);

    private static async Task<IResult> Get(string tag, HttpRequest request, Desk desk)
    {
        ShopAdvice advice = await desk.Advice();
        if (advice.Now.Blade(tag) is not { } file)
        {
            return Results.NotFound();
        }

        WhatIfBladeModel model = Of(file, request.Query, advice, await desk.Units());
        return await desk.Page<WhatIfBladePage, WhatIfBladeModel>(model, model.Problems.Count == 0 ? StatusCodes.Status200OK : StatusCodes.Status422UnprocessableEntity);
    }

    private static WhatIfBladeModel Of(BladeFile file, IQueryCollection query, ShopAdvice advice, ShopUnits units)
    {
        AdviceSettings settings = advice.Settings;
        BladeAdvice blade = advice.Of(file);
        SawNow? today = blade.Record.On;
        AskForm form = new(query, units, true);
        SawNow? saw = advice.Now.Saw(form.Pick("saw", "On the saw", today?.Saw.Code ?? "", today is null ? "" : "where it is or was last", today is null ? "choose one" : null, [.. advice.Now.Saws.Select(s => new Answer(s.Saw.Code, s.Saw.Name))]));
        double? loop = form.Length("loop", "Loop, cut and welded again if shorter", Fields.Loop, Given.Of(file.LoopM ?? file.Spec.NewLoopM, "as it is", null), optional: true);
        WeldQuality weld = form.Choose("weld", "Weld", file.Weld, "as it is", (WeldQuality.Good, "good", "good: dressed and tempered"), (WeldQuality.Doubtful, "doubtful", "doubtful"), (WeldQuality.Best, "best", "best"));
        double? thickness = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(file.ThicknessM, "as it is", null));
        double? width = form.Length("width", "Width", Fields.BladeWidth, Given.Of(file.WidthM, "as it is", null));
        double? hrc = form.Number("hrc", "Hardness of the body", "a hardness", 20, 58, "HRC", Given.Of(blade.Body.Hrc, 46));
        double? tension = form.Stress("tension", $"{Said.Capital(units.PullName)} on the body", Given.None, optional: true);
        Fresh fresh = form.Choose("fresh", "Which blade", Fresh.This, "as it is", (Fresh.This, "this", "this one, with what it has run"), (Fresh.New, "new", "one like it, new"));
        double? height = form.Length("height", "Push told for wood of this height", Fields.CutHeight, Given.Of((saw ?? today) is { } s ? Sharpness.Reference(s.Setup, settings).DepthM : null, "depth for metres left", 0.1));

        WhatIfBladeModel model = new()
        {
            Tag = file.Blade.Tag,
            Title = $"What if {file.Blade.Tag} were changed?",
            Fields = form.Fields,
            Problems = form.Problems,
            Held = file.Hold is null ? null : $"{file.Blade.Tag} is on hold. No life is told of a blade that may be cracked: look at it first.",
        };
        if ((saw ?? (form.Problems.Count == 0 ? today : null)) is not { } on || thickness is not { } t || width is not { } w || hrc is not { } hard || height is not { } H)
        {
            return saw is null && today is null && form.Problems.Count == 0 ? model with { Remarks = [$"{file.Blade.Tag} is on no saw and fits none. Name one."] } : model;
        }

        BladeChange change = new(on, loop, weld, t, w, hard, tension, fresh == Fresh.New);
        return form.Try(() => BladeWhatIf.Compare(file, today, change, H, advice.Level, settings)) is { } compared
            ? Filled(model, compared, units, advice.Words)
            : model with { Problems = form.Problems };
    }

    private static WhatIfBladeModel Filled(WhatIfBladeModel model, BladeComparison compared, ShopUnits units, Wording words)
    {
        Shown shown = new(units);
        BladeStand then = compared.Then;
        List<string> stops = [];
        if (!then.LoopFits)
        {
            stops.Add($"A loop of {units.Show(new Length(then.LoopM), Fields.Loop)} does not go on {then.Saw.Saw.Name}: it takes {units.Show(new Length(then.Saw.Setup.LoopLeastM), Fields.Loop)} to {units.Show(new Length(then.Saw.Setup.LoopMostM), Fields.Loop)}.");
        }

        if (!then.WidthFits)
        {
            stops.Add($"{then.Saw.Saw.Name} takes blades {shown.SmallText(then.Saw.Setup.WidthLeastM, 0)} to {shown.SmallText(then.Saw.Setup.WidthMostM, 0)} wide.");
        }

        if (then.Result.Verdict == LifeVerdict.Unsuitable && model.Held is null)
        {
            stops.Add($"Too thick for the wheels of {then.Saw.Saw.Name}: it would last hours or less.");
        }

        List<string> remarks = [];
        if (compared.Rewelded)
        {
            remarks.Add("Cut and welded again: what the gullets have lived through goes with it, the new weld begins its own life.");
        }

        if (compared.AnotherBlade)
        {
            remarks.Add("That is another blade, reckoned as new.");
        }

        if (model.Held is null && compared.Today is { } before && before.Life.HoursShown != then.Life.HoursShown)
        {
            remarks.Add($"Half of such blades broken: {Life(then)}; today: {Life(before)}.");
        }

        if (then.WishedPa is { } wished)
        {
            remarks.Add($"{then.Saw.Saw.Name} reaches {shown.StressText(then.Tension.Stress.Value)} on it, not {shown.StressText(wished)}: reckoned with that.");
        }

        return model with
        {
            Title = Title(model, compared, shown),
            Today = compared.Today is { } now ? $"today: on {now.Saw.Saw.Name}" : "today",
            Then = $"then: on {then.Saw.Saw.Name}",
            Rows = [.. Rows(compared, model.Held is not null, shown)],
            Stops = stops,
            Remarks = remarks,
            Worked = model.Held is null ? WorkedAsked.All(then, words) : [],
        };
    }

    private static string Title(WhatIfBladeModel model, BladeComparison compared, Shown shown)
    {
        BladeStand then = compared.Then;
        string bending = shown.StressText(then.Bending.Pascals);
        if (compared.Today is { } today && shown.StressText(today.Bending.Pascals) == bending && Life(today) == Life(then))
        {
            return $"What would you change on {model.Tag}?";
        }

        return compared.Today is null ? $"{model.Tag} then bends at {bending}"
            : model.Held is not null || !compared.Today.Life.HoursShown || !then.Life.HoursShown || Life(compared.Today) == Life(then) ? $"{model.Tag} then bends at {bending} instead of {shown.StressText(compared.Today.Bending.Pascals)}"
            : $"{Said.Capital(Life(then))} instead of {Life(compared.Today)}";
    }

    private static IEnumerable<ComparedRow> Rows(BladeComparison compared, bool held, Shown shown)
    {
        ComparedRow Row(string what, Func<BladeStand, string> of, Provenance mark) =>
            new(what, compared.Today is { } now ? of(now) : "-", of(compared.Then), Figures.Mark(mark));

        yield return Row("Bending stress", s => shown.StressText(s.Bending.Pascals), Provenance.Derived);
        yield return Row("Thickness to wheel", s => $"1/{Figures.Number(1 / s.Life.ThicknessToWheel!.Value)}", Provenance.Derived);
        yield return Row(Said.Capital(shown.Units.PullName), s => $"{shown.StressText(s.Tension.Stress.Value)}, {s.Tension.Stress.From}", Provenance.Derived);
        yield return Row("The saw can reach", s => s.ReachPa is { } reach ? shown.StressText(reach) : "not known", Provenance.Derived);
        yield return Row("Pull in one strand", s => shown.ForceText(s.PullN), Provenance.Derived);
        yield return Row("Bends an hour", s => Figures.Number(s.Result.BendsPerHour), Provenance.Derived);
        if (!held)
        {
            yield return Row("Half of such blades broken", Life, Provenance.EngineeringDefault);
            yield return Row("Life used so far", s => Figures.Used(s.Life.Used.Blade, s.Life.UsedLow, s.Life.UsedHigh), Provenance.EngineeringDefault);
            yield return Row("Hours left to that mark", s => s.Life.HoursLeft is { } left ? Figures.With(Figures.Hours(Math.Max(0, left)), "h") : "not told", Provenance.EngineeringDefault);
        }

        yield return Row($"Push it stands in {shown.SmallText(compared.Then.HeightM, 0)}", s => shown.ForceText(s.Thrust.Allowed.Newtons), Provenance.EngineeringDefault);
        yield return Row("Tightest curve", s => s.UsualRadiusM is { } r ? shown.SmallText(r, 0) : "not known", Provenance.CommonPractice);
    }

    private static string Life(BladeStand stand) => stand.Result.Verdict switch
    {
        LifeVerdict.Unsuitable => "hours or less",
        LifeVerdict.NotLimiting => "flexing will not end it",
        _ => Figures.With(Figures.Hours(stand.Result.MedianHours), "h"),
    };

    private enum Fresh
    {
        This,
        New,
    }
}

using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features.Saws;

/// <summary>A blade in the list of depths.</summary>
public sealed record DepthRow(string Tag, string Section, string Teeth, string Away, Led Depth, string Stop, string Feed, Led Push, string Href, bool Chosen);

/// <summary>A change of the saw in the table.</summary>
public sealed record VariantRow(string Name, Led Depth, string Stop, Led Tension, Led Push, Led Life);

/// <summary>How deep a saw can resaw, and what would make it deeper.</summary>
public sealed record WhatIfSawModel
{
    public required string Code { get; init; }

    public required string Name { get; init; }

    public required string Title { get; init; }

    public required IReadOnlyList<AskField> Fields { get; init; }

    public required IReadOnlyList<Problem> Problems { get; init; }

    public IReadOnlyList<DepthRow> Blades { get; init; } = [];

    /// <summary>The blade the changes are reckoned with.</summary>
    public string? With { get; init; }

    /// <summary>The shop's word for it.</summary>
    public string Pull { get; init; } = "tension";

    /// <summary>What more pull never goes beyond.</summary>
    public string Ceiling { get; init; } = "";

    public string PushAt { get; init; } = "";

    public IReadOnlyList<VariantRow> Changes { get; init; } = [];

    public IReadOnlyList<string> Lessons { get; init; } = [];

    public string Path => $"/saws/{Uri.EscapeDataString(Code)}/what-if";
}

/// <summary>The deepest stock of a wood with each blade of the rack, and what a change of the saw would do.</summary>
internal static class WhatIfSaw
{
    /// <summary>A decent feed, m/min: engineering default.</summary>
    private const double ByHand = 1;
    private const double WithFeeder = 2;

    public static void Map(WebApplication app) => app.MapGet("/saws/{code}/what-if", Get);

    private static async Task<IResult> Get(string code, HttpRequest request, Desk desk)
    {
        ShopAdvice advice = await desk.Advice();
        if (advice.Now.Saw(code) is not { } saw)
        {
            return Results.NotFound();
        }

        WhatIfSawModel model = Of(saw, request.Query, advice, await desk.Units());
        return await desk.Page<WhatIfSawPage, WhatIfSawModel>(model, model.Problems.Count == 0 ? StatusCodes.Status200OK : StatusCodes.Status422UnprocessableEntity);
    }

    private static WhatIfSawModel Of(SawNow saw, IQueryCollection query, ShopAdvice advice, ShopUnits units)
    {
        SawSetup setup = saw.Setup;
        Shown shown = new(units);
        AskForm form = new(query, units, true);
        Material? wood = form.Look("wood", "Wood", "European oak", "default, not yours", Wood.Sawn, [.. MaterialTable.All.Where(m => m.Kind == MaterialKind.Wood).Select(m => m.Name)]);
        double? moisture = form.Moisture("moisture", "Moisture", new Given(wood?.DefaultMoisture ?? 10, "default, not yours"));
        double? feed = form.Feed("feed", "Feed that is decent", new Given((setup.FeederN is null ? ByHand : WithFeeder) / 60, "default, not yours"));
        Edges edges = form.Choose("edges", "Edges", Edges.Now, "as the page begins", (Edges.Now, "now", "as they are now"), (Edges.Ground, "ground", "freshly ground"));
        string with = form.Pick("blade", "Changes reckoned with", "", "", "the blade that goes deepest", [.. advice.Now.Blades.Where(b => b is { Place: not Place.Gone, Hold: null, Break: null, Retirement: null } && ShopAdvice.Fits(b, saw)).Select(b => new Answer(b.Blade.Tag, b.Blade.Tag))]);
        // A round step in the shop's own unit.
        (double step, string more, string half) = units.Units == UnitSystem.Inch ? (4 * Handbook.Units.Exact.Inch, "4 in", "2 in") : (0.1, "100 mm", "50 mm");
        double smallest = setup.Wheels.Min(w => w.DiameterM);
        double? wheel = form.Length("wheel", "A bigger wheel", Fields.WheelDiameter, new Given(smallest + step, $"{more} more than now"));
        double? pull = form.Force("pull", "More pull in one strand", Given.Of(1.25 * setup.StrandForceMostN, "a quarter more than now", null), optional: true);
        double? motor = form.Power("motor", "A stronger motor", new Given(1.5 * setup.MotorW, "half as much again"));
        double? column = form.Length("column", "A taller column: opens to", Fields.CutHeight, new Given(setup.CutHeightMostM + step, $"{more} more than now"));
        double? guide = form.Length("guide", "Upper guide left over the wood", Fields.CutHeight, new Given(setup.ClearanceM + (step / 2), $"{half} more than now"));

        WhatIfSawModel model = new()
        {
            Code = saw.Saw.Code,
            Name = saw.Saw.Name,
            Title = $"How deep can {saw.Saw.Name} resaw?",
            Fields = form.Fields,
            Problems = form.Problems,
            Pull = units.PullName,
            Ceiling = units.Show(new Stress(SawWhatIf.CeilingPa)),
        };
        if (wood is null || moisture is not { } wet || feed is not { } f)
        {
            return model;
        }

        CutWork work = CutWork.Of(Resaw(wood, wet), advice.Now.Shop, advice.Settings);
        SawWhatIf asked = new(saw, work, f, edges == Edges.Ground, advice.Settings);
        IReadOnlyList<BladeDepth> depths = form.Try(() => asked.Of(advice.Now.Blades.Select(b => advice.On(b, saw)))) ?? [];
        if (depths.Count == 0)
        {
            return model with { Problems = form.Problems, Title = $"No blade of the rack fits {saw.Saw.Name}" };
        }

        BladeDepth chosen = depths.FirstOrDefault(d => d.Blade.File.Blade.Tag == with) ?? depths[0];
        (string, SetupChange)[] changes =
        [
            .. wheel is { } D ? [($"wheels of {shown.SmallText(D, 0)}", new SetupChange(WheelM: D))] : Array.Empty<(string, SetupChange)>(),
            .. pull is { } P && setup.StrandForceMostN is not null ? [($"a pull of {shown.ForceText(P)}, used in full", new SetupChange(StrandForceMostN: P))] : Array.Empty<(string, SetupChange)>(),
            .. motor is { } M ? [($"a motor of {units.Show(new Power(M))}", new SetupChange(MotorW: M))] : Array.Empty<(string, SetupChange)>(),
            .. column is { } C ? [($"opening to {shown.SmallText(C, 0)}", new SetupChange(CutHeightMostM: C))] : Array.Empty<(string, SetupChange)>(),
            .. guide is { } G ? [($"guide left {shown.SmallText(G, 0)} over the wood", new SetupChange(ClearanceM: G))] : Array.Empty<(string, SetupChange)>(),
        ];
        IReadOnlyList<SawVariant> variants = form.Try(() => asked.Variants(chosen, changes)) ?? [];
        string deepest = shown.SmallText(depths[0].Deepest.HeightM, 0);
        return model with
        {
            Problems = form.Problems,
            Title = depths[0].Deepest.HeightM > 0 ? $"{saw.Saw.Name} resaws {wood.Name} to {deepest} with {depths[0].Blade.File.Blade.Tag}" : $"{saw.Saw.Name} resaws no {wood.Name} at {shown.FeedText(f)}",
            Blades = [.. depths.Select(d => Row(d, d == chosen, asked, query, shown))],
            With = chosen.Blade.File.Blade.Tag,
            PushAt = chosen.Deepest.HeightM > 0 ? $"push in {shown.SmallText(chosen.Deepest.HeightM, 0)}" : "push",
            Changes = [.. variants.Select(v => Row(v, chosen, asked, advice.Words, shown))],
            Lessons = [.. Lessons(variants, chosen, shown)],
        };
    }

    private static DepthRow Row(BladeDepth d, bool chosen, SawWhatIf asked, IQueryCollection query, Shown shown)
    {
        string tag = d.Blade.File.Blade.Tag;
        IEnumerable<string> kept = query.Where(q => q.Key != "blade" && q.Value.ToString().Length > 0).Select(q => $"{Uri.EscapeDataString(q.Key)}={Uri.EscapeDataString(q.Value.ToString())}");
        return new DepthRow(
            tag,
            Said.Section(d.Blade.File, shown.Units),
            Said.Teeth(d.Blade.File.Spec, shown.Units),
            d.Blade.File.Place == Place.AtSharpener ? ", at the sharpener" : "",
            new Led(Depth(d.Deepest, shown), WorkedAsked.Depth(d, asked.Saw, d.Deepest, asked.Work, asked.Settings)),
            Stop(d.Deepest, shown),
            shown.FeedText(d.Deepest.FeedMps),
            new Led(Push(d.Deepest.Thrust, shown), WorkedAsked.Push(d, asked.Saw, d.Tension, d.Deepest.HeightM)),
            "?" + string.Join('&', kept.Append($"blade={Uri.EscapeDataString(tag)}")),
            chosen);
    }

    private static VariantRow Row(SawVariant v, BladeDepth blade, SawWhatIf asked, Wording words, Shown shown) => new(
        v.Name,
        new Led(Depth(v.Deepest, shown), WorkedAsked.Depth(blade, v.Saw, v.Deepest, asked.Work, asked.Settings)),
        Stop(v.Deepest, shown),
        new Led(shown.StressText(v.Tension.Stress.Value), WorkedAsked.Tension(blade, v.Saw, v.Tension.Stress.Value, words)),
        new Led(Push(v.AtDepth, shown), WorkedAsked.Push(blade, v.Saw, v.Tension, blade.Deepest.HeightM)),
        new Led(Life(v.Life.Result), WorkedAsked.Life(blade, v.Saw, v.Tension.Stress.Value)));

    private static string Life(BandLifeResult life) => life.Verdict switch
    {
        LifeVerdict.Unsuitable => "unsuitable",
        LifeVerdict.NotLimiting => "flexing will not end it",
        _ => Figures.With(Figures.Hours(life.MedianHours), "h"),
    };

    private static string Push(ThrustLimits? limits, Shown shown) => limits is null ? "-" : shown.ForceText(limits.Allowed.Newtons);

    private static IEnumerable<string> Lessons(IReadOnlyList<SawVariant> variants, BladeDepth chosen, Shown shown)
    {
        foreach (SawVariant v in variants.Skip(1))
        {
            double more = v.Deepest.HeightM - chosen.Deepest.HeightM;
            if (more >= 1e-3)
            {
                yield return $"{Said.Capital(v.Name)}: {shown.SmallText(more, 0)} deeper, then {Stop(v.Deepest, shown)}{Cost(v, chosen, shown)}.";
            }

            if (v.AtDepth is { } then && chosen.Deepest.Thrust is { } now && then.Allowed.Newtons < 0.995 * now.Allowed.Newtons)
            {
                yield return $"{Said.Capital(v.Name)}: it costs {shown.ForceText(now.Allowed.Newtons - then.Allowed.Newtons)} of the {shown.ForceText(now.Allowed.Newtons)} of push it stands.";
            }
        }
    }

    /// <summary>Deeper stock means a longer span, and that costs push.</summary>
    private static string Cost(SawVariant v, BladeDepth chosen, Shown shown) =>
        v.Deepest.Thrust is { } there && chosen.Deepest.Thrust is { } now && there.Allowed.Newtons < 0.995 * now.Allowed.Newtons
            ? $"; so far apart the guides leave it {shown.ForceText(there.Allowed.Newtons)} of push instead of {shown.ForceText(now.Allowed.Newtons)}"
            : "";

    private static string Depth(DeepestStock d, Shown shown) => d.HeightM > 0 ? shown.SmallText(d.HeightM, 0) : "none";

    private static string Stop(DeepestStock d, Shown shown) => d.Stop == StockStop.Bite
        ? $"the bite: it must be fed {shown.FeedText(d.FeedMps)} to cut, and then {Word(d.Behind ?? StockStop.Guides)}"
        : Word(d.Stop);

    private static string Word(StockStop stop) => stop switch
    {
        StockStop.ChipRoom => "the chip room stops it",
        StockStop.Power => "the motor stops it",
        StockStop.Push => "the push of a hand stops it",
        StockStop.Feeder => "the feeder stops it",
        StockStop.Beam => "the blade bends",
        StockStop.Guides => "the saw opens no further",
        StockStop.Practical => "that is faster than it can be fed",
        _ => "it rubs",
    };

    private static QueuedCut Resaw(Material wood, double moisture) => new()
    {
        Job = "what-if",
        SpeciesKey = wood.Key,
        SpeciesTyped = wood.Name,
        Material = wood.Kind == MaterialKind.Panel ? MaterialKind.Panel : MaterialKind.Wood,
        HeightM = 0.1,
        LengthM = 1,
        MoisturePct = moisture,
        Kind = CutKind.Resaw,
        Finish = Finish.Rough,
    };

    private enum Edges
    {
        Now,
        Ground,
    }
}

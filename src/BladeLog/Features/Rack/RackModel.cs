using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Rack;

/// <summary>One blade as a row of the rack.</summary>
public sealed record RackRow(string Tag, string Section, ToothSpec Teeth, string State, string? Word, string Note, SmallBand Band, Worked? Worked);

/// <summary>The blades of one place, in the order a person walks.</summary>
public sealed record RackGroup(string Name, string Remark, IReadOnlyList<RackRow> Rows, bool Folded = false);

/// <summary>A filter with its count.</summary>
public sealed record RackFilter(string Key, string Name, int Count);

public sealed record RackModel
{
    public required string Title { get; init; }

    public required IReadOnlyList<RackFilter> Filters { get; init; }

    public required string Show { get; init; }

    public string? Query { get; init; }

    /// <summary>Nearest tags where a search found none.</summary>
    public IReadOnlyList<string> Nearest { get; init; } = [];

    public required IReadOnlyList<RackGroup> Groups { get; init; }

    public bool NoBlades { get; init; }

    private static readonly (string Key, string Name, Func<BladeFile, BladeAdvice, bool> Is)[] Kinds =
    [
        ("all", "All", (_, _) => true),
        ("saw", "On a saw", (b, _) => b.Place == Place.OnSaw),
        ("ready", "Ready", Free),
        ("new", "New", (b, _) => Here(b) && IsNew(b)),
        ("look", "Look", (b, a) => Here(b) && a.State == BladeState.Look),
        ("sharpen", "Sharpen", (b, a) => Here(b) && a.State == BladeState.Sharpen),
        ("hold", "Hold", (_, a) => a.State == BladeState.Hold),
        ("broken", "Broken", (b, a) => b.Place != Place.Gone && a.State == BladeState.Broken),
        ("away", "Away", (b, _) => b.Place == Place.AtSharpener),
        ("gone", "Gone", (b, _) => b.Place == Place.Gone),
    ];

    public static RackModel Of(ShopAdvice advice, ShopUnits units, string? show, string? query)
    {
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(units);
        (BladeFile File, BladeAdvice Advice)[] all = [.. advice.Now.Blades.Select(b => (b, advice.Of(b)))];
        int free = all.Count(b => Free(b.File, b.Advice));
        var chosen = Kinds.FirstOrDefault(k => k.Key == show, Kinds[0]);
        string sought = query is null ? "" : Tags.Read(query);
        (BladeFile File, BladeAdvice Advice)[] shown = [.. all.Where(b => sought.Length > 0
            ? b.File.Blade.Tag.Contains(sought, StringComparison.OrdinalIgnoreCase)
            : chosen.Is(b.File, b.Advice))];
        string[] words = query?.Split(' ', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries) ?? [];
        bool bySight = shown.Length == 0 && words.Length > 1;
        if (bySight)
        {
            // The label is off: what can be seen of the blade finds it.
            shown = [.. all.Where(b => b.File.Place != Place.Gone && BySight(b.File, advice.Now, units) is var seen && words.All(w => seen.Contains(w, StringComparison.OrdinalIgnoreCase)))];
            sought = query!.Trim();
        }

        return new RackModel
        {
            Title = bySight ? $"{Said.Count(shown.Length, "blade", "blades")} like {sought}" : sought.Length > 0 ? Found(shown.Length, sought) : free == 1 ? "1 blade is sharp and free" : $"{(free == 0 ? "No" : free)} blades are sharp and free",
            Filters = [.. Kinds.Select(k => new RackFilter(k.Key, k.Name, all.Count(b => k.Is(b.File, b.Advice)))).Where(f => f.Count > 0 || f.Key == "all")],
            Show = sought.Length > 0 ? "" : chosen.Key,
            Query = sought.Length > 0 ? sought : null,
            Nearest = sought.Length > 0 && shown.Length == 0 && !bySight ? NearestTags.To(sought, advice.Now) : [],
            Groups = Grouped(shown, advice, units, folded: chosen.Key != "gone" && sought.Length == 0),
            NoBlades = all.Length == 0,
        };
    }

    /// <summary>Saw, width, thickness, teeth and hook: what is known without a label.</summary>
    private static string BySight(BladeFile file, ShopNow shop, ShopUnits units)
    {
        var saw = shop.Saws.FirstOrDefault(s => s.Saw.Id == (file.SawId ?? file.LastSawId));
        return $"{saw?.Saw.Code} {saw?.Saw.Name} {Said.Section(file, units)} {Said.Width(file.WidthM, units)} {Said.Teeth(file.Spec, units)} {file.Hook} {file.Spec.Code}".Replace(Figures.Glue, ' ');
    }

    private static string Found(int count, string sought) => count switch
    {
        0 => $"No tag has {sought} in it",
        1 => $"1 blade with {sought} in its tag",
        _ => $"{count} blades with {sought} in their tags",
    };

    private static bool Free(BladeFile blade, BladeAdvice advice) => blade.Place == Place.Rack && advice.State == BladeState.Ready;

    /// <summary>Neither gone nor at the sharpener: a row of what is away says away, whatever else is to be done with it.</summary>
    private static bool Here(BladeFile blade) => blade.Place is not (Place.Gone or Place.AtSharpener);

    private static bool IsNew(BladeFile blade) => blade.Hours == 0 && blade.MountedSinceUtc is null && blade.LastSawId is null && blade.PriorUse is null;

    private static List<RackGroup> Grouped((BladeFile File, BladeAdvice Advice)[] shown, ShopAdvice advice, ShopUnits units, bool folded)
    {
        List<RackGroup> groups = [];
        void Add(string name, IEnumerable<(BladeFile File, BladeAdvice Advice)> blades, string? remark = null, bool fold = false)
        {
            (BladeFile File, BladeAdvice Advice)[] rows = [.. blades];
            if (rows.Length > 0)
            {
                string count = Said.Count(rows.Length, "blade", "blades");
                groups.Add(new RackGroup(name, remark is null ? count : $"{remark}, {count}", [.. rows.Select(r => Row(r.File, r.Advice, advice, units))], fold));
            }
        }

        Add("On a saw", shown.Where(b => b.File.Place == Place.OnSaw).OrderBy(b => SawOf(b.File, advice.Now)?.Saw.Code, NaturalOrder.Instance));
        foreach (var rack in shown.Where(b => b.File.Place == Place.Rack).GroupBy(b => RackOf(b.File.Hook)).OrderBy(g => g.Key.Length == 0).ThenBy(g => g.Key, NaturalOrder.Instance))
        {
            Add(rack.Key.Length == 0 ? "Rack, no hook told" : rack.Key, rack.OrderBy(b => b.File.Hook, NaturalOrder.Instance).ThenBy(b => b.File.Blade.Tag, NaturalOrder.Instance));
        }

        Add("Bench", ByTag(shown.Where(b => b.File.Place == Place.Bench)));
        foreach (var batch in shown.Where(b => b.File.Place == Place.AtSharpener).GroupBy(b => b.File.Away?.BatchNumber ?? "").OrderBy(g => g.Key, NaturalOrder.Instance))
        {
            Add(batch.Key.Length == 0 ? "At the sharpener" : $"At the sharpener, {batch.Key}", ByTag(batch), Back(batch.First().File.Away, advice.Now.AsOf, units));
        }

        Add("Gone", ByTag(shown.Where(b => b.File.Place == Place.Gone)), null, folded);
        return groups;
    }

    private static IEnumerable<(BladeFile File, BladeAdvice Advice)> ByTag(IEnumerable<(BladeFile File, BladeAdvice Advice)> blades) =>
        blades.OrderBy(b => b.File.Blade.Tag, NaturalOrder.Instance);

    /// <summary>"R2" of "R2-4": what stands before the last hyphen.</summary>
    private static string RackOf(string? hook) => hook is null ? "" : hook.LastIndexOf('-') is > 0 and int i ? hook[..i] : hook;

    private static string? Back(AwayIn? away, DateTime now, ShopUnits units)
    {
        if (away?.PromisedUtc is not { } promised)
        {
            return null;
        }

        int days = (Said.Local(promised, units).Date - Said.Local(now, units).Date).Days;
        return days switch
        {
            0 => "back today",
            1 => "back tomorrow",
            > 1 => $"back in {days} days",
            -1 => "a day late",
            _ => $"{-days} days late",
        };
    }

    private static SawNow? SawOf(BladeFile blade, ShopNow shop) => shop.Saws.FirstOrDefault(s => s.MountedBladeId == blade.Blade.Id);

    private static RackRow Row(BladeFile file, BladeAdvice blade, ShopAdvice advice, ShopUnits units)
    {
        SawNow? on = SawOf(file, advice.Now);
        (string state, string? word) = blade.State switch
        {
            BladeState.Retired => ("retired", null),
            BladeState.Broken => ("broken", null),
            BladeState.Hold => ("hold", null),
            _ when file.Place == Place.AtSharpener => ("away", "away"),
            _ when on is { Slack: true } => ("slack", null),
            BladeState.Sharpen => ("sharpen", null),
            BladeState.Look => ("look", null),
            _ when on is not null => ("runs", (string?)"on"),
            _ when IsNew(file) => ("new", null),
            _ => ("ready", null),
        };
        string teeth = Said.Teeth(file.Spec, units), first = on is not null ? on.Saw.Name + ", " : file.Place == Place.Rack && file.Hook is { } hook ? hook + ", " : "";
        SmallBand band = SmallBand.Of(blade, advice.Settings);
        return new RackRow(file.Blade.Tag, Said.Section(file, units), Drawn.Teeth(blade.Body, file.Spec), state, word, $"{first}{teeth}, {Remark(file, blade, advice, units)}", band, WorkedOut.Band(blade, band));
    }

    private static string Remark(BladeFile file, BladeAdvice blade, ShopAdvice advice, ShopUnits units) => blade.State switch
    {
        BladeState.Retired => StoryWords.Retired(file.Retirement!.Reason),
        BladeState.Broken => StoryWords.Broke(file.Break!.Site),
        BladeState.Hold => LifeWords.HoldReason(file.Hold!, advice.Words) ?? "on hold",
        _ when blade.Record.UnknownHistory => "history unknown: inspect",
        _ when file.Place == Place.AtSharpener && !blade.Grind.Pays => "no further grind",
        _ when file.Place == Place.AtSharpener => Run(file),
        BladeState.Sharpen when file.OffAsDull => LifeWords.OffAsDull,
        BladeState.Sharpen => $"edge {Wording.Edge(blade.Edge.RadiusM)}",
        _ when blade.PastRetireMark => "rough work, then scrap",
        _ when blade.InspectionOverdue => "inspection due",
        BladeState.Look => "inspect each mount",
        _ when IsNew(file) => "never on",
        _ when file.Spec.MostSharpenings == 0 => "still sharp; this kind is not ground",
        _ when blade.Limits.GovernedBy == LimitKind.Width => $"{Said.Width(file.WidthM, units)} left of {Said.Width(file.Spec.WidthM, units)}",
        _ => Run(file),
    };

    private static string Run(BladeFile file) => Figures.With(Figures.Hours(file.Hours), "h");
}

using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Floor;

/// <summary>A large figure: the text of the dimension line below it. The line is a wear line or a life band, never both.</summary>
public sealed record BigFigure(string Number, string Unit, string Way, string Stop, string Description)
{
    public double? Worn { get; init; }

    public LifeFigures? Life { get; init; }

    /// <summary>Where the figure is worked out.</summary>
    public Worked? Worked { get; init; }
}

/// <summary>The next cut of a saw and what to do for it.</summary>
public sealed record NextLine(string Number, string Wood, string Height, string Before, string Bold, string After);

/// <summary>Start or stop of a saw's timer. Start: the entry it stops; null: none runs.</summary>
public sealed record TileTimer(string Words, int? Start);

/// <summary>One saw as it stands on the floor.</summary>
public sealed record SawTile
{
    public required string Code { get; init; }

    public required string Name { get; init; }

    public required string Under { get; init; }

    public required SawShape Shape { get; init; }

    /// <summary>runs, look, slack, sharpen, hold or empty.</summary>
    public required string State { get; init; }

    public string? Tag { get; init; }

    public ToothSpec? Teeth { get; init; }

    public BigFigure? Edge { get; init; }

    public BigFigure? Limit { get; init; }

    /// <summary>In the place of figures: a hold, an empty saw, a life that has no hours.</summary>
    public string? Big { get; init; }

    public string? Small { get; init; }

    /// <summary>What the last check found not right on the saw; null: nothing that was looked at.</summary>
    public string? NotRight { get; init; }

    /// <summary>The one-tap timer in the place of the hours; null: the saw has a meter, or does not run.</summary>
    public TileTimer? Timer { get; init; }

    public NextLine? Next { get; init; }
}

public sealed record FloorModel(IReadOnlyList<SawTile> Tiles)
{
    /// <summary>One window height for all saws, so that they share one scale.</summary>
    public double Height => SawShape.CommonHeight(Tiles.Select(t => t.Shape));

    public static FloorModel Of(ShopAdvice advice, ShopUnits units, IReadOnlyDictionary<int, string>? initials = null)
    {
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(units);
        return new FloorModel([.. advice.Now.Saws.Where(s => s.Saw.Active).Select(s => Tile(s, advice, units, initials ?? new Dictionary<int, string>()))]);
    }

    private static SawTile Tile(SawNow saw, ShopAdvice advice, ShopUnits units, IReadOnlyDictionary<int, string> initials)
    {
        PlannedCut? next = advice.NextCut(saw);
        SawTile bare = new()
        {
            Code = saw.Saw.Code,
            Name = saw.Saw.Name,
            Under = Said.Wheels(saw.Setup, units),
            Shape = Drawn.Saw(saw.Setup),
            State = "empty",
            NotRight = CheckWords.OnTile(saw.LastCheck),
            Timer = saw.Timer is { } timer ? new($"Stop {Said.Clock(advice.Now.AsOf - timer.Entry.AtUtc)}", timer.EntryId) : null,
            Next = next is null ? null : Next(next, saw.Slack, advice.Words),
        };
        if (advice.Now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId) is not { } file)
        {
            return bare with { Big = Ready(saw, advice) };
        }

        BladeAdvice blade = advice.On(file, saw);
        SawTile on = bare with { Tag = file.Blade.Tag, Teeth = Drawn.Teeth(blade.Body, file.Spec) };
        if (file.Hold is { } hold)
        {
            return on with { State = "hold", Big = Heard(hold, advice, units, initials), Small = hold.Kind == HoldKind.Clicking ? "A crack may be starting. A named person clears it after a look." : "A named person clears it after a look." };
        }

        if (blade.State is BladeState.Retired or BladeState.Broken)
        {
            return on with { State = "hold", Big = Ended(file, advice, units), Small = "Take it off now, or strike that entry out if it is wrong." };
        }

        (BigFigure? limit, string? words) = Limit(blade, advice, units);
        return on with
        {
            State = saw.Slack ? "slack" : blade.State switch
            {
                BladeState.Sharpen => "sharpen",
                BladeState.Look => "look",
                _ => "runs",
            },
            Timer = on.Timer ?? (saw.Saw.HasHourMeter ? null : new("Start timer", null)),
            Edge = Edge(blade, next, units, advice.Words),
            Limit = limit,
            Small = words,
        };
    }

    private static string Heard(Hold hold, ShopAdvice advice, ShopUnits units, IReadOnlyDictionary<int, string> initials)
    {
        string what = Said.Capital(LifeWords.HoldReason(hold, advice.Words) ?? "put on hold");
        string when = hold.Entry is { } entry ? " " + Said.When(entry.AtUtc, advice.Now.AsOf, units) : "";
        string who = hold.Entry?.PersonId is { } id && initials.TryGetValue(id, out string? name) ? " by " + name : "";
        return $"Do not run. {what}{when}{who}.";
    }

    /// <summary>A blade that was retired or broke does not belong on a saw: somebody helpful put it back.</summary>
    private static string Ended(BladeFile file, ShopAdvice advice, ShopUnits units) => file.Retirement is { } end
        ? $"Do not run. {file.Blade.Tag} was retired {Said.When(end.Entry.AtUtc, advice.Now.AsOf, units)}."
        : $"Do not run. {file.Blade.Tag} is written as broken.";

    private static string Ready(SawNow saw, ShopAdvice advice)
    {
        int ready = advice.Now.Blades.Count(b => b.Place == Place.Rack && ShopAdvice.Fits(b, saw) && advice.Of(b).State == BladeState.Ready);
        return ready switch
        {
            0 => "No blade that fits is ready.",
            1 => "1 blade that fits is ready.",
            _ => $"{ready} blades that fit are ready.",
        };
    }

    private static BigFigure? Edge(BladeAdvice blade, PlannedCut? next, ShopUnits units, Wording words)
    {
        MetresLeft? left = (next is { Choice.Mounted: true } ? next.Choice.MetresLeft : null) ?? blade.Edge.Left;
        if (left is null)
        {
            return null;
        }

        // A foot is so short that three digits would say ">999" of nearly every edge: yards tell it as far as metres do.
        (double value, string unit) = units.Units == UnitSystem.Inch ? (left.Metres / (3 * Handbook.Units.Exact.Foot), "yd") : (left.Metres, "m");
        string depth = left.CutNumber is { } n ? $"in cut {n}" : $"in clean wood {words.Length(left.DepthM)} deep at {words.Feed(left.FeedMps)}";
        // An edge that will not be ground again runs into the scrap, not into the grinder.
        string stop = blade.Grind.Pays ? "grind" : "scrap";
        return new BigFigure(Figures.Floor(value), unit, "to", stop, $"Sharpness: {Figures.Number(value)} {unit} left {depth}") { Worn = blade.Edge.Used, Worked = WorkedOut.Edge(blade, null, left.CutNumber) };
    }

    private static (BigFigure? Figure, string? Words) Limit(BladeAdvice blade, ShopAdvice advice, ShopUnits units)
    {
        LifeOfBlade life = blade.Record;
        if (life.UnknownHistory)
        {
            return (null, "History unknown: inspect it before each mount.");
        }

        if (Drawn.Life(blade) is { } band)
        {
            (double hours, string way, string stop) = life.Reckoned.Blade < advice.Settings.WatchMark ? (life.HoursToWatch!.Value, "to", "look")
                : !blade.PastRetireMark ? (life.HoursToRetire!.Value, "to", "retire")
                : (0, "past", "mark");
            return (new BigFigure(Hours(hours), "h", way, stop, LifeBandGeometry.Describe(band)) { Life = band, Worked = WorkedOut.Life(blade) }, null);
        }

        if (life.Verdict == Handbook.Fatigue.LifeVerdict.Unsuitable)
        {
            return (null, LifeWords.Ladder(Handbook.Fatigue.LifeVerdict.Unsuitable));
        }

        return Drawn.OtherLimit(blade) switch
        {
            { Kind: LimitKind.Sharpenings } grinds => (Grinds(blade, grinds.Share), null),
            { Kind: LimitKind.Width } width => (WidthLeft(blade, width.Share, units), null),
            _ => (null, "Flexing will not end it; its edge will."),
        };
    }

    private static BigFigure Grinds(BladeAdvice blade, double used)
    {
        int left = Math.Max(0, blade.File.Spec.MostSharpenings!.Value - blade.File.Sharpenings);
        string word = left == 1 ? "grind" : "grinds";
        return new BigFigure(Figures.Floor(left), "", word, "left", $"{left} {word} left; flexing will not end it") { Worn = used, Worked = WorkedOut.Grinding(blade) };
    }

    private static BigFigure WidthLeft(BladeAdvice blade, double used, ShopUnits units)
    {
        double left = Math.Max(0, blade.Body.Width.Value - blade.Body.LeastWidth.Value);
        (string number, string unit) = units.Units == UnitSystem.Inch
            ? ((left / Handbook.Units.Exact.Inch).ToString("0.00", System.Globalization.CultureInfo.InvariantCulture), "in")
            : (left < 0.00995 ? (left * 1e3).ToString("0.0", System.Globalization.CultureInfo.InvariantCulture) : Figures.Floor(left * 1e3), "mm");
        return new BigFigure(number, unit, "width", "left", $"{number} {unit} of width left; flexing will not end it") { Worn = used, Worked = WorkedOut.Grinding(blade) };
    }

    /// <summary>Under ten hours a decimal matters, unless it is nought.</summary>
    private static string Hours(double hours) => hours is > 0 and < 9.95
        ? hours.ToString("0.#", System.Globalization.CultureInfo.InvariantCulture)
        : Figures.Floor(hours);

    /// <summary>Two lines are all a tile has: the saw's page and the list tell the height along the blade.</summary>
    private static string Short(QueuedCut cut, Wording words) =>
        words.Length(cut.HeightM).Replace(' ', Figures.Glue) + (Said.Height(cut, words).Contains(',', StringComparison.Ordinal) ? $"{Figures.Glue}bevel" : "");

    private static NextLine Next(PlannedCut next, bool slack, Wording words)
    {
        Choice c = next.Choice;
        NextLine line = new($"Cut {next.Cut.Number}", next.Cut.SpeciesTyped, Short(next.Cut, words), "use ", c.Tag, "");
        return next.ChangeBefore || !slack
            ? c.Verdict == Verdict.WithCare ? line with { Before = "", After = " with care" }
                : next.ChangeBefore ? line
                : line with { Before = "", After = " stays on" }
            : line with { Before = "", Bold = $"{words.Tension} on", After = " first" };
    }
}

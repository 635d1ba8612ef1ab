using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Blades;

/// <summary>The parts of a blade's page, worded from the advice.</summary>
internal sealed class BladeParts(BladeAdvice blade, ShopAdvice advice, ShopUnits units)
{
    private readonly BladeFile file = blade.File;

    public IReadOnlyList<BladeFact> Facts()
    {
        LifeOfBlade life = blade.Record;
        string ground = file.Sharpenings == 0 ? "never ground" : $"ground {(file.Sharpenings == 1 ? "once" : $"{file.Sharpenings} times")}";
        string pitch = units.Show(new ToothPitch(new Length(file.Spec.PitchCoarseM), new Length(file.Spec.PitchFineM)));
        List<BladeFact> facts =
        [
            new("Width", Said.Width(file.WidthM, units), $"{Bare(file.Spec.WidthM)} new, {Bare(blade.Body.LeastWidth.Value)} least{Mark(blade.Body.LeastWidth)}, {ground}"),
            new("Body", units.Show(new Length(blade.Body.Thickness.Value), Fields.Thickness), life is { ThicknessToWheel: { } ratio, On: { } on } ? $"1/{Wording.Number(1 / ratio, 0)} of {Whose(on)} smallest wheel" : null),
            new("Kerf", units.Show(new Length(blade.Body.Kerf.Value), Fields.Kerf), KerfFrom()),
            new("Teeth", Said.Teeth(file.Spec, units), $"{pitch}, {Figures.Number(double.RadiansToDegrees(blade.Body.Rake.Value))}°{Mark(blade.Body.Rake)}, {TipWords()}"),
            new("Loop", file.LoopM is { } loop ? units.Show(new Length(loop), Fields.Loop) : "not welded yet", $"{Said.Count(file.Welds, "weld", "welds")}, {WeldWords()}"),
            new("Run", Figures.With(Figures.Hours(file.Hours), "h"), file.Hours > 0 ? $"{Millions(life.Bends)} bends" : "never on"),
            new("Where", Where(), file.LastInspectedUtc is { } seen ? $"inspected {Said.When(seen, advice.Now.AsOf, units)}" : "never inspected"),
        ];
        return facts;
    }

    public LifePart? Life()
    {
        if (blade.Life is not { } life)
        {
            return null;
        }

        string source = advice.Level == advice.Settings.Level ? "From the handbook, not yet from your own breaks." : "From the handbook and your own breaks.";
        if (life.UnknownHistory)
        {
            return new LifePart(
                "Life: its history is unknown",
                null,
                [$"When it came it had used {Wording.Share(file.PriorUse!.UsedLow)} to {Wording.Share(file.PriorUse.UsedHigh)} of a life; 1 is where half of such blades have broken. Here it has run {Figures.With(Figures.Hours(file.Hours), "h")} since.", "It is looked at before each mount and left out of what your shop learns."],
                "As it was told, not measured.")
            {
                Range = (Math.Min(1, life.UsedLow), Math.Min(1, life.UsedHigh), advice.Settings.WatchMark),
            };
        }

        string? under = life is { On: { } on, Rate: { } rate } ? $"Hours as run on {on.Saw.Name}, {Figures.Number(rate.Result.BendsPerHour)} bends an hour{Worth(on)}" : null;
        List<string> sentences = [];
        if (life.Verdict is { } verdict && verdict != LifeVerdict.Finite)
        {
            sentences.Add(LifeWords.Ladder(verdict));
        }

        if (life.ThicknessToWheel is { } ratio)
        {
            sentences.Add(LifeWords.ThicknessToWheel(ratio));
        }

        if (life.Used.Blade > 0 && life.HoursShown)
        {
            sentences.Add($"Used {Figures.Used(life.Used.Blade, life.UsedLow, life.UsedHigh)} of a life; 1 is where half of such blades have broken.");
        }

        if (Usable && life is { HoursShown: true, BreakChance: { } chance })
        {
            sentences.Add($"{Figures.ChanceSentence(chance)} to break in the next {Wording.Hours(advice.Settings[LifeSettings.ChanceHours]).Replace(' ', Figures.Glue)}. {LifeWords.ChanceCounts(advice.Level)}");
        }

        if (Usable && blade.PastRetireMark is false && life.HoursToRetire is { } retire && life.Reckoned.Blade >= advice.Settings.WatchMark)
        {
            sentences.Add($"Retire it in {Figures.With(Figures.Hours(retire), "h")}.");
        }

        return new LifePart(LifeTitle(life), under, sentences, source) { Band = Drawn.Life(blade) };
    }

    /// <summary>The picture is in hours on one saw as it runs now: told where what the blade really ran reads otherwise.</summary>
    private string Worth(SawNow on)
    {
        string ran = Figures.With(Figures.Hours(file.Hours), "h");
        return Drawn.Life(blade) is { } band && Figures.With(Figures.Hours(band.Used), "h") is var worth && worth != ran
            ? $". The {ran} it ran count as {worth} there"
            : "";
    }

    private string LifeTitle(LifeOfBlade life)
    {
        if (!Usable)
        {
            return $"Life: {(blade.State == BladeState.Broken ? "broke" : "retired")} after {Figures.With(Figures.Hours(file.Hours), "h")}";
        }

        return life.Verdict switch
        {
            null => "Life: it fits no saw here",
            LifeVerdict.NotLimiting => "Life: flexing will not end it",
            LifeVerdict.Unsuitable => "Life: unsuitable on these wheels",
            _ when blade.PastRetireMark => "Life: past its retire mark",
            _ when life.Reckoned.Blade >= advice.Settings.WatchMark => "Life: past the point where 1 in 10 has broken",
            _ => $"Life: {Figures.With(Figures.Hours(life.HoursToWatch!.Value), "h")} to where 1 in 10 has broken",
        };
    }

    public (string Title, string Words) Edge()
    {
        Sharpness edge = blade.Edge;
        string used = $"Rounded to {Wording.Edge(edge.RadiusM).Replace(' ', Figures.Glue)}; dull at {Wording.Number(advice.Settings[LifeSettings.Dull], 0)}{Figures.Glue}µm.";
        if (edge.Left is not { } left || !Usable || blade.State == BladeState.Hold)
        {
            return ("Teeth", used);
        }

        (double metres, string unit) = Said.Cut(left.Metres, units);
        string then = blade.Grind.Pays ? "then grind" : "then scrap";
        return ($"Teeth: {Figures.With(Figures.Number(metres), unit)} left, {then}",
            $"{used} Metres are of clean medium wood {units.Show(new Length(left.DepthM))} deep at {units.ShowFeed(new Speed(left.FeedMps))}.");
    }

    /// <summary>The bite of the cut this blade is planned for, else of the first waiting cut it can make.</summary>
    public BitePart? Bite()
    {
        IEnumerable<Choice> planned = advice.Plan().Saws.SelectMany(s => s.Cuts).Select(p => p.Choice);
        IEnumerable<Choice> possible = advice.Now.Cuts.Where(c => c.DoneEntryId is null && c.DroppedUtc is null).SelectMany(c => advice.For(c).Choices);
        if (planned.Concat(possible).FirstOrDefault(c => c.Blade.File.Blade.Id == file.Blade.Id && c.AtAdvised is not null && c.Gate?.AdvisedMps is not null) is not { AtAdvised: { } at } choice)
        {
            return null;
        }

        EdgeVerdict verdict = at.Regime switch
        {
            BiteRegime.NoChip => EdgeVerdict.NoChip,
            BiteRegime.Rubbing => EdgeVerdict.Rubs,
            _ => EdgeVerdict.Cuts,
        };
        return new BitePart(
            blade.Edge.RadiusM * 1e6,
            at.ChipM * 1e6,
            double.RadiansToDegrees(blade.Body.Rake.Value),
            verdict,
            $"Cut {choice.Work.Cut.Number}, {Said.Wood(choice.Work.Cut, advice.Words)}, at {advice.Words.Feed(choice.Gate!.AdvisedMps!.Value).Replace(' ', Figures.Glue)}.");
    }

    public (string Title, IReadOnlyList<LimitPart> Rows) Limits()
    {
        string title = blade.Limits.GovernedBy switch
        {
            _ when blade.State == BladeState.Retired && file.Retirement is { } end => $"What ended it: {StoryWords.Retired(end.Reason)}",
            _ when blade.State == BladeState.Broken && file.Break is { } broke => $"What ended it: {(broke.Site == BreakSite.TeethStripped ? "" : "it ")}{StoryWords.Broke(broke.Site)}",
            LimitKind.Crack when file.Hold is { Kind: not HoldKind.Crack } hold => $"What holds it: {LifeWords.HoldReason(hold, advice.Words) ?? "on hold, no reason told"}",
            LimitKind.New => "What will end it: nothing used yet",
            LimitKind.Crack => "What ends it: the crack, until it is cleared",
            LimitKind.UnknownHistory => "What ends it: unknown, since its history is",
            LimitKind.Welds => "What ends it: it has had its last weld",
            _ => $"What ends it: {LifeWords.Governs(blade.Limits.GovernedBy)}",
        };
        bool life = blade.Life is { UnknownHistory: false };
        return (title, [.. blade.Limits.Shares.Where(s => s.Kind != LimitKind.Fatigue || life).Select(Limit)]);
    }

    private LimitPart Limit(LimitShare share) => share.Kind switch
    {
        LimitKind.Fatigue => new("Flexing", blade.Record.Verdict == LifeVerdict.NotLimiting ? "will not end it" : $"{Wording.Share(share.Share)} used", share.Share),
        LimitKind.Width => new("Width", $"{Said.Width(Math.Max(0, file.WidthM - blade.Body.LeastWidth.Value), units)} left of {Bare(file.Spec.WidthM - blade.Body.LeastWidth.Value)}", share.Share),
        LimitKind.Sharpenings => new("Sharpenings", $"{file.Sharpenings} of {file.Spec.MostSharpenings}", share.Share),
        _ => new("Edge", $"{Wording.Share(Math.Min(1, share.Share))} used; not worth sharpening", share.Share),
    };

    public IReadOnlyList<RunPart> Runs() =>
    [
        .. RunOnSaw.Of(file, blade.Body, advice.Settings).Select(r => new RunPart(
            (advice.Now.Saws.FirstOrDefault(s => s.Saw.Id == r.SawId)?.Saw.Name ?? "a saw") + (r.OfAncestor ? ", before it was cut down" : ""),
            units.ShowBandSpeed(new Speed(r.SpeedMps)),
            Figures.With(Figures.Number(r.Hours, 1), "h"),
            Millions(r.Bends),
            $"{units.Show(Stress.FromMegapascals(Math.Round(r.BendingPa / 1e6)))} over {units.Show(new Length(r.WheelM), Fields.WheelDiameter)}",
            $"1/{Wording.Number(1 / r.ThicknessToWheel, 0)}")),
    ];

    public IReadOnlyList<PathPart> Paths()
    {
        ILookup<(string, Dirt), PathLine> since = file.SinceSharpening.ToLookup(p => (p.WoodClass, p.Dirt));
        return
        [
            .. file.WholeLife.Concat(file.SinceSharpening).Where(p => p.PathMm > 0)
                .GroupBy(p => (p.WoodClass, p.Dirt))
                .OrderBy(g => g.Key.WoodClass, StringComparer.Ordinal).ThenBy(g => g.Key.Dirt)
                .Select(g => new PathPart(
                    WoodWords(g.Key.WoodClass) + DirtWords(g.Key.Dirt),
                    Km(since[g.Key].Sum(p => p.PathMm)),
                    Km(Math.Max(file.WholeLife.Where(p => (p.WoodClass, p.Dirt) == g.Key).Sum(p => p.PathMm), since[g.Key].Sum(p => p.PathMm))))),
        ];
    }

    private bool Usable => blade.State is not (BladeState.Broken or BladeState.Retired);

    private string Km(long mm) => mm == 0 ? "none" : Said.Path(mm * 1e-6, units, mm < 9_950_000 ? 2 : 1);

    public static string Millions(double bends) => bends >= 1e6 ? Figures.With(Figures.Number(bends / 1e6, bends < 1e7 ? 2 : 1), "million") : Figures.Number(bends);

    private static string WoodWords(string woodClass) => woodClass switch
    {
        "A1" => "light woods (A1)",
        "A2" => "medium woods (A2)",
        "A3" => "dense woods (A3)",
        "A4" => "very dense or mineral woods (A4)",
        "A5" => "silica woods (A5)",
        _ => "glued panels (P)",
    };

    private static string DirtWords(Dirt dirt) => dirt switch
    {
        Dirt.BarkOn => ", bark on",
        Dirt.Reclaimed => ", reclaimed",
        _ => ", clean",
    };

    private string Where() => file.Place switch
    {
        Place.OnSaw => $"On {advice.Now.Saws.FirstOrDefault(s => s.Saw.Id == file.SawId)?.Saw.Name ?? "a saw"}{(file.MountedSinceUtc is { } since ? $" since {Said.When(since, advice.Now.AsOf, units)}" : "")}",
        Place.Rack => file.Hook is { } hook ? $"Rack {hook}" : "Rack",
        Place.Bench => "Bench",
        Place.AtSharpener => file.Away is { } away
            ? $"At the sharpener, {away.BatchNumber}{(away.PromisedUtc is { } back ? $", promised {Said.When(back, advice.Now.AsOf, units)}" : "")}"
            : "At the sharpener",
        _ => file.CutDownTo is { } child ? $"It lives on as {child}" : "Gone",
    };

    /// <summary>Where the kerf reckoned with comes from, and since when.</summary>
    private string KerfFrom()
    {
        string On(DateTime at) => Said.When(at, advice.Now.AsOf, units);
        return file.Kerf switch
        {
            { Slot: { } slot, OverTeeth: var teeth } when teeth is null || slot.AtUtc >= teeth.Value.AtUtc => $"in a test cut, {On(slot.AtUtc)}",
            { OverTeeth: { } teeth } => $"over the teeth, {On(teeth.AtUtc)}",
            { Set: { } set } => $"body and set, {On(set.AtUtc)}",
            _ => blade.Body.Kerf.From,
        };
    }

    private string WeldWords() => file.Weld switch
    {
        WeldQuality.Best => "the best weld",
        WeldQuality.Doubtful => "doubtful",
        _ => "good",
    };

    private string TipWords() => blade.Body.Tip switch
    {
        TipKind.Tipped => "tipped",
        TipKind.Swaged => "swaged",
        _ => "set",
    };

    private string Bare(double metres) => Said.Width(metres, units).Split(Figures.Glue)[0];

    private static string Mark(Known known) => known.IsDefault ? " (default, not yours)" : "";

    private static string Whose(SawNow saw) => saw.Saw.Name.EndsWith('s') ? saw.Saw.Name + "’" : saw.Saw.Name + "’s";
}

using BladeLog.Advice.Life;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>The state a blade's card shows.</summary>
public enum BladeState
{
    Ready,
    Look,
    Sharpen,
    Hold,
    Broken,
    Retired,
}

/// <summary>What to do with a blade, and why.</summary>
public sealed record Advised(string Do, IReadOnlyList<string> Because);

/// <summary>Everything the advice says of one blade by itself.</summary>
public sealed record BladeAdvice
{
    public required BladeFile File { get; init; }

    public required BladeBody Body { get; init; }

    /// <summary>Always reckoned; what may be shown is <see cref="Life"/>.</summary>
    public required LifeOfBlade Record { get; init; }

    /// <summary>Null for a held blade: a crack beats every forecast.</summary>
    public LifeOfBlade? Life => File.Hold is null ? Record : null;

    public required Sharpness Edge { get; init; }

    public required LifeLimits Limits { get; init; }

    public required NextGrind Grind { get; init; }

    public required BladeState State { get; init; }

    /// <summary>By its hours, or because it was mounted since its last look and each mount asks for one.</summary>
    public bool InspectionOverdue => OverdueByHours || OverdueByMount;

    public required bool OverdueByHours { get; init; }

    public required bool OverdueByMount { get; init; }

    /// <summary>Past the watch mark or of unknown history: looked at before each mount.</summary>
    public required bool InspectEachMount { get; init; }

    /// <summary>Past the retire mark: no further grind, rough work only, then scrap.</summary>
    public required bool PastRetireMark { get; init; }

    public required Advised Advice { get; init; }

    public static BladeAdvice Of(BladeFile file, SawNow? on, DamageTable damage, LevelPrior level, AdviceSettings settings, Wording words)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(settings);
        BladeBody body = BladeBody.Of(file, settings);
        LifeOfBlade life = LifeOfBlade.Of(file, body, on, damage, level, settings);
        Sharpness edge = Sharpness.Of(file, body, settings);

        // Whoever took it off as dull saw what no path of wood tells.
        edge = edge with { Due = edge.Due || file.OffAsDull };
        if (on is not null)
        {
            (double depth, double feed) = Sharpness.Reference(on.Setup, settings);
            edge = edge with { Left = edge.LeftAt(depth, feed, file.LoopM ?? on.Setup.LoopM, on.Setup.UsualSpeedMps) };
        }

        bool watched = life.Reckoned.Blade >= settings.WatchMark || life.UnknownHistory;
        bool byHours = file.Blade.InspectEveryH is { } every && file.MsSinceInspection > every * 3_600_000;
        bool byMount = (watched || file.Blade.InspectEachMount) && MissedALook(file);
        BladeAdvice advice = new()
        {
            File = file,
            Body = body,
            Record = life,
            Edge = edge,
            Limits = LifeLimits.Of(file, body, life, edge, settings),
            Grind = NextGrind.Of(file, body, life, edge, level, settings),
            State = file.Retirement is not null ? BladeState.Retired
                : file.Break is not null ? BladeState.Broken
                : file.Hold is not null ? BladeState.Hold
                : body.Doubt is not null || body.TooNarrow ? BladeState.Look
                : edge.Due ? BladeState.Sharpen
                : watched || byHours || byMount ? BladeState.Look
                : BladeState.Ready,
            OverdueByHours = byHours,
            OverdueByMount = byMount,
            InspectEachMount = watched || file.Blade.InspectEachMount,
            PastRetireMark = life.Reckoned.Blade >= settings[LifeSettings.RetireMark],
            Advice = new Advised("", []),
        };
        return advice with { Advice = LifeWords.Advise(advice, settings, words) };
    }

    /// <summary>
    /// Off the saw: mounted since its last look, so it wants one before it goes on again. On the saw the look came before
    /// the mount; there only a blade that was never looked at has missed one.
    /// </summary>
    private static bool MissedALook(BladeFile file) => file.Place == Place.OnSaw
        ? file.LastInspectedUtc is null && file.MountedSinceInspection
        : file.MountedSinceInspection;
}

using BladeLog.Handbook.Fatigue;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>Every sentence on a blade's life, sharpness and next step.</summary>
public static class LifeWords
{
    public static string Governs(LimitKind kind) => kind switch
    {
        LimitKind.New => "new",
        LimitKind.Fatigue => "flexing",
        LimitKind.Width => "width",
        LimitKind.Sharpenings => "sharpenings",
        LimitKind.Edge => "edge",
        LimitKind.Crack => "on hold",
        LimitKind.UnknownHistory => "unknown history",
        _ => "welds",
    };

    /// <summary>What the person at the saw said of it.</summary>
    public const string OffAsDull = "came off as dull";

    /// <summary>The rung of the ladder beside thickness and wheel.</summary>
    public static string Ladder(LifeVerdict verdict) => verdict switch
    {
        LifeVerdict.Unsuitable => "Unsuitable on these wheels: hours or less.",
        LifeVerdict.Marginal => "Short life on these wheels: hours to tens of hours.",
        LifeVerdict.Finite => "Flexing will end it: plan its hours.",
        _ => "Flexing will not end it.",
    };

    public static string ThicknessToWheel(double ratio) => $"Its body is 1/{Wording.Number(1 / ratio, 0)} of the smallest wheel.";

    /// <summary>"on hold: crack 2.6 mm at a gullet".</summary>
    public static string Hold(Hold hold, Wording words) => HoldReason(hold, words) is { } reason ? $"on hold: {reason}" : "on hold";

    /// <summary>"crack 2.6 mm at a gullet"; null where nobody said.</summary>
    public static string? HoldReason(Hold hold, Wording words)
    {
        ArgumentNullException.ThrowIfNull(hold);
        ArgumentNullException.ThrowIfNull(words);
        return hold.Kind switch
        {
            HoldKind.Crack => (hold.CrackLengthM, hold.Place) switch
            {
                ({ } length, { } place) => $"crack {words.Length(length)} {Where(place)}",
                (null, { } place) => $"crack {Where(place)}",
                ({ } length, null) => $"crack {words.Length(length)}",
                _ => "crack",
            },
            HoldKind.Clicking => "clicking heard",
            HoldKind.Damage => "damage",
            _ => null,
        };
    }

    public static string Away(AwayIn? away) => away is null ? "at the sharpener" : $"at the sharpener, batch {away.BatchNumber}";

    /// <summary>What to do with the blade and why, the first thing first.</summary>
    public static Advised Advise(BladeAdvice blade, AdviceSettings settings, Wording words)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(words);
        string step = blade.State switch
        {
            BladeState.Retired => "Nothing: it is retired.",
            BladeState.Broken => "Scrap it, or cut it down and weld it.",
            BladeState.Hold => "Do not use it until a named person clears it.",
            _ => Usable(blade),
        };
        return new Advised(step, blade.State is BladeState.Retired or BladeState.Broken ? [] : [.. Because(blade, settings, words)]);
    }

    private static string Usable(BladeAdvice blade) => (blade.File.Place, blade.Grind.Pays, blade.Edge.Due) switch
    {
        (Place.AtSharpener, false, _) => "Do not pay for another grind: ask for it back unground.",
        (Place.AtSharpener, true, _) => "Wait for it.",
        (_, false, true) => "Scrap it.",
        (_, true, true) => "Sharpen it.",
        _ when blade.PastRetireMark => "Use up its present edge on rough work, then scrap it.",
        _ when blade.InspectionOverdue => "Inspect it before it cuts.",
        _ when blade.State == BladeState.Look => "Inspect it before each mount.",
        (_, false, false) when blade.Grind.Refusal != GrindRefusal.NeverWorth => "Use up its present edge; do not pay for another grind.",
        _ => "Use it.",
    };

    private static IEnumerable<string> Because(BladeAdvice blade, AdviceSettings settings, Wording words)
    {
        LifeOfBlade life = blade.Record;
        if (blade.File.Hold is { } hold)
        {
            string said = Hold(hold, words);
            yield return char.ToUpperInvariant(said[0]) + said[1..] + ".";
            yield return "Any crack that can be seen means hold, whatever the hours say.";
            yield break;
        }

        if (blade.File.OffAsDull)
        {
            yield return $"It {OffAsDull}.";
        }
        else if (blade.Edge.Due)
        {
            yield return $"Edge {Wording.Edge(blade.Edge.RadiusM)}; dull is {Wording.Number(settings[LifeSettings.Dull], 0)} µm.";
        }

        if (life.UnknownHistory)
        {
            yield return $"Its history is unknown: used {Wording.Share(life.UsedLow)} to {Wording.Share(life.UsedHigh)} of the life half of such blades reach.";
        }
        else if (blade.PastRetireMark)
        {
            yield return $"Used {Wording.Share(life.Used.Blade)} ({Wording.Share(life.UsedLow)} to {Wording.Share(life.UsedHigh)}), past the retire mark of {Wording.Share(settings[LifeSettings.RetireMark])}.";
        }
        else if (life.Reckoned.Blade >= settings.WatchMark)
        {
            yield return $"Used {Wording.Share(life.Used.Blade)} ({Wording.Share(life.UsedLow)} to {Wording.Share(life.UsedHigh)}): past the mark where 1 in 10 has broken.";
        }

        if (blade.InspectionOverdue)
        {
            yield return blade.OverdueByHours
                ? $"{Wording.Hours(blade.File.MsSinceInspection / 3_600_000.0)} run since it was last inspected."
                : "It was mounted since it was last inspected.";
        }

        if (blade.Limits.WeldLimitReached)
        {
            yield return $"It has had {Wording.Count(blade.File.Welds, "weld", "welds")}: no other is allowed.";
        }

        if (!blade.Grind.Pays && blade.Grind.Refusal != GrindRefusal.NeverWorth)
        {
            yield return NoGrind(blade, settings, words);
        }

        if (blade.Limits.GovernedBy == LimitKind.New)
        {
            yield return "New: nothing of it is used yet.";
        }

        if (life is { Verdict: LifeVerdict.Unsuitable or LifeVerdict.Marginal, ThicknessToWheel: { } ratio })
        {
            yield return Ladder(life.Verdict.Value);
            yield return ThicknessToWheel(ratio);
        }
        else if (life.Verdict == LifeVerdict.NotLimiting)
        {
            yield return Ladder(LifeVerdict.NotLimiting);
        }

        if (blade.Limits.Shares.Count > 0 && blade.Limits.GovernedBy is LimitKind.Fatigue or LimitKind.Width or LimitKind.Sharpenings or LimitKind.Edge)
        {
            LimitShare first = blade.Limits.Shares[0];
            string name = Governs(first.Kind);
            yield return $"{char.ToUpperInvariant(name[0])}{name[1..]} will end it first: {Wording.Share(first.Share)} used.";
        }
    }

    /// <summary>Why another grind is not worth its price.</summary>
    public static string NoGrind(BladeAdvice blade, AdviceSettings settings, Wording words)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(words);
        NextGrind grind = blade.Grind;
        return grind.Refusal switch
        {
            GrindRefusal.LifeUsed => $"Another interval of {Wording.Hours(grind.IntervalHours)} takes it from {Wording.Share(blade.Record.Reckoned.Blade)} to {Wording.Share(grind.UsedAfter)}, past {Wording.Share(settings[LifeSettings.RetireMark])}: {Wording.Chance(grind.BreakChance)} would break in it.",
            GrindRefusal.TooNarrow => $"One more grind leaves {words.Width(grind.WidthAfterM)}; the least is {words.Width(blade.Body.LeastWidth.Value)}.",
            GrindRefusal.TeethSpent => $"It has had {Wording.Count(blade.File.Sharpenings, "sharpening", "sharpenings")}, the most its teeth allow.",
            GrindRefusal.NeverWorth => "This kind is not worth sharpening.",
            _ => "",
        };
    }

    private static string Where(CrackPlace place) => place switch
    {
        CrackPlace.Gullet => "in a gullet",
        CrackPlace.Weld => "at the weld",
        CrackPlace.BackEdge => "at the back edge",
        _ => "in the body",
    };
}

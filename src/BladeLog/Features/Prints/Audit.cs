using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Prints;

/// <summary>The record of a stretch of time on paper: what was looked at, held, cleared, broken and taught, and where a look is missing.</summary>
internal sealed class Audit(AuditFacts facts, DateTime from, DateTime to, DateTime now, ShopUnits units, Story story)
{
    private readonly IReadOnlyList<BladeGaps> _gaps = facts.Gaps();

    public AuditModel Model(AuditForm form, FormState state)
    {
        var gaps = _gaps.Sum(g => g.Gaps.Count(Lies));
        var looks = facts.Looks.Where(In).ToList();
        var open = facts.Holds.Count(h => h.Entry.AtUtc < to && !facts.Cleared.Any(c => c.HoldId == h.EntryId && c.Entry.AtUtc < to) && !facts.Retirements.Any(r => r.BladeId == h.BladeId && r.Entry.AtUtc < to));
        return new AuditModel
        {
            Form = form,
            State = state,
            From = Said.Day(from, units),
            To = Said.Day(to.AddTicks(-1), units),
            Sums =
            [
                ("Inspections", Figures.Number(looks.Count)),
                ("Inspections that found a crack", Figures.Number(looks.Count(l => l.Found == Found.Crack))),
                ("Looks that came late or not at all", Figures.Number(gaps)),
                ("Checks before starting", Figures.Number(facts.Checks.Count(In))),
                ("Holds", Figures.Number(facts.Holds.Count(In))),
                ("Holds cleared", Figures.Number(facts.Cleared.Count(In))),
                ("Still on hold at the end", Figures.Number(open)),
                ("Breaks", Figures.Number(facts.Breaks.Count(In))),
                ("Blades retired", Figures.Number(facts.Retirements.Count(In))),
                ("Trainings", Figures.Number(facts.Trainings.Count(In))),
                ("Of these lines struck out since", Figures.Number(facts.StruckOut.Count(s => s >= from && s < to))),
            ],
            Saws = [.. facts.Saws.Select(OfSaw)],
            Blades = [.. facts.Blades.OrderBy(b => b.Tag, NaturalOrder.Instance).Select(OfBlade).Where(p => p.Rows.Count > 0)],
            Trainings = [.. facts.Trainings.Where(In).Select(t => Row(t, About.Shop))],
            Gaps = gaps,
            AllGaps = _gaps.Sum(g => g.Gaps.Count(x => x.DueUtc < now)),
            FirstRecord = facts.FirstUtc is { } first ? Said.Day(first, units) : null,
            Whole = facts.FirstUtc is not { } begun || (from <= begun && to > now),
            When = Printing.When(now, units),
        };
    }

    private AuditPart OfBlade(Blade blade)
    {
        var ran = facts.Runs[blade.Id].Where(r => r.UntilUtc >= from && r.UntilUtc < to).Sum(r => r.Ms);
        IEnumerable<AuditRow> rows =
        [
            .. facts.Looks.Where(l => l.BladeId == blade.Id && In(l)).Select(l => Row(l, About.Blade)),
            .. facts.Holds.Where(h => h.BladeId == blade.Id && In(h)).Select(h => Row(h, About.Blade, Cleared(h))),
            .. facts.Cleared.Where(c => c.Hold.BladeId == blade.Id && In(c)).Select(c => Row(c, About.Blade)),
            .. facts.Breaks.Where(b => b.BladeId == blade.Id && In(b)).Select(b => Row(b, About.Blade)),
            .. facts.Retirements.Where(r => r.BladeId == blade.Id && In(r)).Select(r => Row(r, About.Blade)),
            .. _gaps.First(g => g.Blade.Id == blade.Id).Gaps.Where(Lies).Select(g => Row(g, GapWords(g, blade))),
        ];
        return new AuditPart(
            blade.Tag,
            $"{Rule(blade)}; ran {Hours(ran)} in this time",
            [.. rows.OrderBy(r => r.At)]);
    }

    private AuditPart OfSaw(Saw saw)
    {
        var ran = facts.SawRuns.Where(r => r.SawId == saw.Id && r.UntilUtc >= from && r.UntilUtc < to).Sum(r => r.Ms);
        var looks = facts.Looks.Count(l => In(l) && facts.SawOf(l.BladeId, l.Entry.AtUtc) == saw.Id);
        var gaps = _gaps.SelectMany(g => g.Gaps.Where(x => x.SawId == saw.Id && Lies(x)).Select(x => (Gap: x, g.Blade))).ToList();
        IEnumerable<AuditRow> rows =
        [
            .. facts.Holds.Where(h => In(h) && facts.SawOf(h.BladeId, h.Entry.AtUtc) == saw.Id).Select(h => Row(h, About.Saw, Cleared(h))),
            .. facts.Cleared.Where(c => In(c) && facts.SawOf(c.Hold.BladeId, c.Hold.Entry.AtUtc) == saw.Id).Select(c => Row(c, About.Saw)),
            .. facts.Breaks.Where(b => In(b) && (b.SawId ?? facts.SawOf(b.BladeId, b.Entry.AtUtc)) == saw.Id).Select(b => Row(b, About.Saw)),
            .. facts.Trainings.Where(t => In(t) && t.SawId == saw.Id).Select(t => Row(t, About.Saw)),
            .. facts.Checks.Where(c => c.SawId == saw.Id && In(c) && CheckWords.NotRight(c, units).Count > 0).Select(c => Row(c, About.Saw)),
            .. gaps.Select(g => Row(g.Gap, $"{g.Blade.Tag}: {GapWords(g.Gap, g.Blade)}")),
        ];
        return new AuditPart(saw.Name, $"ran {Hours(ran)}; {DaysChecked(saw)}; its blades were inspected {Said.Count(looks, "time", "times")}; {Said.Count(gaps.Count, "look", "looks")} late or missing", [.. rows.OrderBy(r => r.At)]);
    }

    /// <summary>A day it ran is one on which running hours of it ended or a cut of it was made, on the shop's clock.</summary>
    private string DaysChecked(Saw saw)
    {
        DateTime Day(DateTime utc) => Said.Local(utc, units).Date;
        var ran = facts.SawRuns.Where(r => r.SawId == saw.Id && r.UntilUtc >= from && r.UntilUtc < to).Select(r => Day(r.UntilUtc))
            .Concat(facts.Cuts.Where(c => c.SawId == saw.Id && c.AtUtc >= from && c.AtUtc < to).Select(c => Day(c.AtUtc))).ToHashSet();
        var looked = facts.Checks.Where(c => c.SawId == saw.Id && In(c)).Select(c => Day(c.Entry.AtUtc)).ToHashSet();
        looked.IntersectWith(ran);
        return $"checked on {Figures.Number(looked.Count)} of {Said.Count(ran.Count, "day", "days")} it ran";
    }

    private bool In(Fact fact) => fact.Entry.AtUtc >= from && fact.Entry.AtUtc < to;

    /// <summary>A gap that was open within the time asked.</summary>
    private bool Lies(InspectionGap gap) => gap.DueUtc < to && (gap.LookedUtc ?? DateTime.MaxValue) >= from;

    private AuditRow Row(Fact fact, About about, string since = "")
    {
        var entry = fact.Entry;
        var later = Said.Local(entry.EnteredUtc, units).Date != Said.Local(entry.AtUtc, units).Date;
        return new AuditRow(entry.AtUtc, Printing.When(entry.AtUtc, units), story.Says(fact, about) + since, $"{entry.Person?.Initials ?? "not told"}{(later ? $", entered {Said.Day(entry.EnteredUtc, units)}" : "")}");
    }

    private AuditRow Row(InspectionGap gap, string what) => new(gap.DueUtc, Printing.When(gap.DueUtc, units), what, "nobody", Gap: true);

    private string GapWords(InspectionGap gap, Blade blade)
    {
        var end = gap.LookedUtc is { } looked ? $"looked at {Printing.When(looked, units)}" : "never looked at since";
        return gap.ByMount
            ? $"Look missing before it went on; {end}"
            : $"Look missing: due after {Hours((long)(blade.InspectEveryH!.Value * 3_600_000))}, ran {Hours(gap.RanMs)}; {end}";
    }

    private static string Rule(Blade blade) => (blade.InspectEveryH, blade.InspectEachMount) switch
    {
        ({ } every, true) => $"look each {Figures.Hours(every)}{Figures.Glue}h and before each mount",
        ({ } every, false) => $"look each {Figures.Hours(every)}{Figures.Glue}h",
        (null, true) => "look before each mount",
        _ => "no rule of inspection set",
    };

    private string Cleared(Hold hold) => facts.Cleared.FirstOrDefault(c => c.HoldId == hold.EntryId) is { } cleared
        ? $"; cleared {Said.Day(cleared.Entry.AtUtc, units)} by {cleared.Entry.Person?.Initials ?? "somebody"}"
        : facts.Retirements.Any(r => r.BladeId == hold.BladeId) ? "; retired" : "; not cleared";

    private static string Hours(long ms) => Figures.With(Figures.Number(ms / 3_600_000.0, 1), "h");
}

using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records;

/// <summary>Which entries belong to a blade or a saw, and what each kind of fact says, whether it stands or not.</summary>
internal static class HistoryKinds
{
    public static IQueryable<int> EntriesOfBlade(ShopDb db, int id) => Ids(db.Mounts.Where(f => f.BladeId == id))
        .Concat(Ids(db.Dismounts.Where(f => f.Mount.BladeId == id)))
        .Concat(Ids(db.Sharpenings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Joints.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Splits.Where(f => f.ParentId == id || f.ChildId == id)))
        .Concat(Ids(db.PriorUses.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Hangs.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Retags.Where(f => f.BladeId == id)))
        .Concat(Ids(db.BatchLines.Where(f => f.BladeId == id)))
        .Concat(Ids(db.BatchReturns.Where(f => f.Line.BladeId == id)))
        .Concat(Ids(db.TensionReadings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Drifts.Where(f => f.BladeId == id)))
        .Concat(Ids(db.KerfReadings.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Holds.Where(f => f.BladeId == id)))
        .Concat(Ids(db.HoldsCleared.Where(f => f.Hold.BladeId == id)))
        .Concat(Ids(db.Inspections.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Breaks.Where(f => f.BladeId == id)))
        .Concat(Ids(db.Retirements.Where(f => f.BladeId == id)))
        .Concat(Ids(db.LabelsPrinted.Where(f => f.BladeId == id)));

    public static IQueryable<int> EntriesOfSaw(ShopDb db, int id) => Ids(db.SawSetups.Where(f => f.SawId == id))
        .Concat(Ids(db.Mounts.Where(f => f.SawId == id)))
        .Concat(Ids(db.Dismounts.Where(f => f.Mount.SawId == id)))
        .Concat(Ids(db.Slacks.Where(f => f.SawId == id)))
        .Concat(Ids(db.StartChecks.Where(f => f.SawId == id)))
        .Concat(Ids(db.TimersStarted.Where(f => f.SawId == id)))
        .Concat(Ids(db.MeterEpochs.Where(f => f.SawId == id)))
        .Concat(Ids(db.MeterReadings.Where(f => f.SawId == id)))
        .Concat(Ids(db.Runs.Where(f => f.SawId == id)))
        .Concat(Ids(db.CutsDone.Where(f => f.SawId == id)))
        .Concat(Ids(db.TensionReadings.Where(f => f.SawId == id)))
        .Concat(Ids(db.Drifts.Where(f => f.SawId == id)))
        .Concat(Ids(db.KerfReadings.Where(f => f.SawId == id)))
        .Concat(Ids(db.Trainings.Where(f => f.SawId == id)))
        .Concat(Ids(db.Breaks.Where(f => f.SawId == id)));

    public static Task<List<FactWords>> Say(ShopDb db, string kind, IReadOnlyCollection<int> ids) => kind switch
    {
        nameof(SawSetup) => Of(db.SawSetups.Include(f => f.Saw), ids, f => new(f.EntryId, null, f.Saw.Code, Length("loop", f.LoopM), Length("widest blade", f.WidthMostM))),
        nameof(Mount) => Of(db.Mounts.Include(f => f.Saw).Include(f => f.Blade), ids, f =>
            new(f.EntryId, f.Blade.Tag, f.Saw.Code, Number("tension", f.TensionPa, "Pa"), Word("tension known", f.TensionPa is null ? null : f.TensionKnown.ToString()), Flag("inside out", f.InsideOut), Word("although", f.Although))),
        nameof(Dismount) => Of(db.Dismounts.Include(f => f.Mount.Saw).Include(f => f.Mount.Blade), ids, f =>
            new(f.EntryId, f.Mount.Blade.Tag, f.Mount.Saw.Code, Word("reason", f.Reason.ToString()))),
        nameof(Slack) => Of(db.Slacks.Include(f => f.Saw), ids, f => new(f.EntryId, null, f.Saw.Code, Word("tension", f.LetOff ? "let off" : "put on"))),
        nameof(StartCheck) => Of(db.StartChecks.Include(f => f.Saw), ids, f => new(
            f.EntryId, null, f.Saw.Code, Right("guards", f.GuardsRight), Right("tension", f.TensionRight), Right("under the table", f.UnderTableRight), Right("quiet", f.QuietRight), Right("brake", f.BrakeRight), Word("note", f.Note))),
        nameof(TimerStarted) => Of(db.TimersStarted.Include(f => f.Saw), ids, f => new(f.EntryId, null, f.Saw.Code, Number("speed", f.SpeedMps, "m/s"))),
        nameof(MeterEpoch) => OfSaw(db, db.MeterEpochs, ids, f => f.SawId, f => [Word("reason", f.Reason.ToString()), Number("started at", f.StartReadingMs, "ms")]),
        nameof(MeterReading) => OfSaw(db, db.MeterReadings, ids, f => f.SawId, f => [Number("reading", f.ReadingMs, "ms"), Word("typed", f.ReadingTyped)]),
        nameof(Run) => Of(db.Runs.Include(f => f.Saw), ids, f =>
            new(f.EntryId, null, f.Saw.Code, Number("running", f.RunningMs, "ms"), Number("speed", f.SpeedMps, "m/s"), Word("source", f.Source.ToString()), Word("grade", f.Grade.ToString()), Time("from", f.FromUtc))),
        nameof(CutDone) => Of(db.CutsDone.Include(f => f.Saw), ids, f =>
            new(f.EntryId, null, f.Saw.Code, Word("wood", f.SpeciesTyped), Length("height", f.HeightM), Length("length", f.LengthM), Number("pieces", f.Pieces, null), Number("feed", f.FeedMps, "m/s"), Word("feed known", f.FeedGrade.ToString()), Flag("nail", f.Nail))),
        nameof(TensionReading) => Both(db, db.TensionReadings, ids, f => (f.BladeId, f.SawId), f => [Number("tension", f.TensionPa, "Pa"), Word("how", f.How)]),
        nameof(Drift) => Both(db, db.Drifts, ids, f => (f.BladeId, f.SawId), f => [Number("leads by", f.AngleRad, "rad")]),
        nameof(Break) => Of(db.Breaks.Include(f => f.Blade), ids, f =>
            new(f.EntryId, f.Blade.Tag, null, Word("site", f.Site.ToString()), Time("not before", f.EarliestUtc), Number("hours from", f.HoursLow, "h"), Number("hours to", f.HoursHigh, "h"), Word("note", f.Note))),
        _ => HistoryOfBlades.Say(db, kind, ids),
    };

    internal static async Task<List<FactWords>> Of<T>(IQueryable<T> facts, IReadOnlyCollection<int> ids, Func<T, FactWords> say)
        where T : Fact =>
        [.. (await facts.IgnoreQueryFilters().AsNoTracking().Where(f => ids.Contains(f.EntryId)).ToListAsync()).Select(say).Select(Trim)];

    internal static async Task<List<FactWords>> Both<T>(
        ShopDb db, IQueryable<T> facts, IReadOnlyCollection<int> ids, Func<T, (int? Blade, int? Saw)> of, Func<T, HistoryPart[]> parts)
        where T : Fact
    {
        var rows = await facts.IgnoreQueryFilters().AsNoTracking().Where(f => ids.Contains(f.EntryId)).ToListAsync();
        var blades = rows.Select(r => of(r).Blade).OfType<int>().Distinct().ToList();
        var saws = rows.Select(r => of(r).Saw).OfType<int>().Distinct().ToList();
        var tags = await db.Blades.Where(b => blades.Contains(b.Id)).ToDictionaryAsync(b => b.Id, b => b.Tag);
        var codes = await db.Saws.Where(s => saws.Contains(s.Id)).ToDictionaryAsync(s => s.Id, s => s.Code);
        return
        [
            .. rows.Select(r => Trim(new FactWords(
                r.EntryId,
                of(r).Blade is { } blade ? tags[blade] : null,
                of(r).Saw is { } saw ? codes[saw] : null,
                parts(r)))),
        ];
    }

    internal static HistoryPart Word(string word, string? text) => new(word, text);

    internal static HistoryPart Flag(string word, bool holds) => new(word, holds ? "yes" : null);

    internal static HistoryPart Right(string word, bool? right) => new(word, right is { } is_ ? is_ ? "right" : "not right" : null);

    internal static HistoryPart Number(string word, double? value, string? unit) => new(word, null, value, unit);

    internal static HistoryPart Length(string word, double? metres) => new(word, null, metres, "m");

    internal static HistoryPart Time(string word, DateTime utc) => new(word, utc.ToString("O", System.Globalization.CultureInfo.InvariantCulture), null, "utc");

    private static Task<List<FactWords>> OfSaw<T>(ShopDb db, IQueryable<T> facts, IReadOnlyCollection<int> ids, Func<T, int> saw, Func<T, HistoryPart[]> parts)
        where T : Fact => Both(db, facts, ids, f => (null, saw(f)), parts);

    /// <summary>What was not said is left out.</summary>
    private static FactWords Trim(FactWords said) => said with { Parts = [.. said.Parts.Where(p => p.Text is not null || p.Value is not null)] };

    private static IQueryable<int> Ids<T>(IQueryable<T> facts)
        where T : Fact => facts.IgnoreQueryFilters().Select(f => f.EntryId);
}

using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Record;

/// <summary>Entries in the shop's words. Struck out facts are read too: their lines stay.</summary>
internal static class EntryWords
{
    private static readonly Dictionary<string, string> Edits = new()
    {
        [nameof(AddSaw)] = "A saw was added",
        [nameof(EditSaw)] = "A saw's name or code was changed",
        [nameof(AddSpec)] = "A specification was added",
        [nameof(EditSpec)] = "A specification was changed",
        [nameof(AddBlades)] = "Blades were added",
        [nameof(EditBlade)] = "A blade's figures were changed",
        [nameof(AddPerson)] = "A person was added",
        [nameof(EditPerson)] = "A person was changed",
        [nameof(SaveShop)] = "The shop's own figures were changed",
        [nameof(SaveSetting)] = "A setting was changed",
        [nameof(QueueCut)] = "A cut was put on the list",
        [nameof(EditCut)] = "A cut on the list was changed",
        [nameof(DropCut)] = "A cut was taken off the list",
        [nameof(ReorderCuts)] = "The list of cuts was put in another order",
        [nameof(ImportRows)] = "A file was brought in",
        [nameof(CutDown)] = "A blade was cut down",
        [nameof(SaveLanName)] = "The shop's name on the network was changed",
    };

    public static async Task<IReadOnlyList<EntryLine>> Of(Desk desk, IReadOnlyList<Entry> entries)
    {
        var units = await desk.Units();
        var words = await Facts(desk, entries, units);
        return
        [
            .. entries.Select(e => new EntryLine(
                e.Id,
                Said.When(e.AtUtc, desk.Now, units),
                Said.When(e.EnteredUtc, desk.Now, units),
                e.Person?.Initials ?? "somebody",
                words.GetValueOrDefault(e.Id) ?? Edits.GetValueOrDefault(e.Kind) ?? e.Kind,
                e.Void is { } v ? $"struck out by {v.Entry.Person?.Initials ?? "somebody"}, {Said.When(v.Entry.EnteredUtc, desk.Now, units)}: {v.Reason}" : null,
                e.Void is null && !Edits.ContainsKey(e.Kind) && e.Kind is not ("Void" or nameof(Retag)))),
        ];
    }

    private static async Task<Dictionary<int, string>> Facts(Desk desk, IReadOnlyList<Entry> entries, ShopUnits units)
    {
        var db = desk.Db;
        var words = new Dictionary<int, string>();
        var saws = await db.Saws.AsNoTracking().ToDictionaryAsync(s => s.Id, s => s.Name);
        var tags = await db.Blades.AsNoTracking().ToDictionaryAsync(b => b.Id, b => b.Tag);
        var people = await db.People.AsNoTracking().ToDictionaryAsync(p => p.Id, p => p.Initials);
        var cultureless = System.Globalization.CultureInfo.InvariantCulture;

        async Task Each<T>(Func<T, string> say)
            where T : Fact
        {
            var ids = entries.Where(e => e.Kind == typeof(T).Name).Select(e => e.Id).ToList();
            if (ids.Count > 0)
            {
                foreach (var fact in await db.Set<T>().AsNoTracking().IgnoreQueryFilters().Where(f => ids.Contains(f.EntryId)).ToListAsync())
                {
                    words[fact.EntryId] = say(fact);
                }
            }
        }

        string Mm(double? metres) => metres is { } m ? units.Show(new Length(m), Fields.BladeWidth) : "";
        string H(long ms) => Figures.With(Figures.Number(ms / 3_600_000.0, 1), "h");
        var offs = entries.Where(e => e.Kind == nameof(Dismount)).Select(e => e.Id).ToList();
        var mounts = offs.Count == 0
            ? []
            : await db.Dismounts.IgnoreQueryFilters().AsNoTracking().Where(d => offs.Contains(d.EntryId))
                .Join(db.Mounts.IgnoreQueryFilters(), d => d.MountId, m => m.EntryId, (d, m) => new { d.EntryId, m.BladeId, m.SawId })
                .ToDictionaryAsync(d => d.EntryId);
        await Each<Mount>(m => $"{tags[m.BladeId]} on {saws[m.SawId]}{(m.InsideOut ? ", inside out" : "")}{(m.Although is { } a ? $", although: {a}" : "")}");
        await Each<Dismount>(d => $"{(mounts.TryGetValue(d.EntryId, out var m) ? $"{tags[m.BladeId]} off {saws[m.SawId]}" : "A blade off")}: {Off(d.Reason)}");
        await Each<Slack>(s => $"{Said.Capital(units.PullName)} {(s.LetOff ? "off" : "on")} on {saws[s.SawId]}");
        await Each<StartCheck>(c => $"{saws[c.SawId]} looked at before starting: {CheckWords.Says(c, units)}");
        await Each<TimerStarted>(t => $"Timer of {saws[t.SawId]} started");
        await Each<MeterEpoch>(m => $"Meter of {saws[m.SawId]}: {m.Reason switch { EpochReason.First => "first reading", EpochReason.NewMeter => "a new one", EpochReason.RolledOver => "rolled over", _ => "turned back" }}");
        await Each<MeterReading>(m => $"Meter of {saws[m.SawId]} read: {H(m.ReadingMs)}");
        await Each<Run>(r => $"{saws[r.SawId]} ran {H(r.RunningMs)} (grade {r.Grade})");
        await Each<CutDone>(c => $"Cut on {saws[c.SawId]}: {c.SpeciesTyped} {Mm(c.HeightM)}, {Said.Count(c.Pieces, "piece", "pieces")}");
        await Each<Sharpening>(s => $"{tags[s.BladeId]} sharpened{(s.WidthM is null ? "" : $", {Mm(s.WidthM)} wide after")}");
        await Each<Joint>(j => $"{tags[j.BladeId]} joined, loop {units.Show(new Length(j.LoopM), Fields.Loop)}");
        await Each<Split>(s => $"{tags[s.ParentId]} cut down to {tags[s.ChildId]}");
        await Each<PriorUse>(p => $"{tags[p.BladeId]} used before this record: {p.UsedLow.ToString("0.##", cultureless)} to {p.UsedHigh.ToString("0.##", cultureless)}");
        await Each<Hang>(h => $"{tags[h.BladeId]} {(h.Place == Place.Bench ? "on the bench" : h.Hook is null ? "on the rack" : $"on hook {h.Hook}")}");
        await Each<Retag>(r => $"{r.OldTag} is now {r.NewTag}");
        await Each<Batch>(b => $"Batch {b.Number} to {b.Service}");
        await Each<BatchLine>(l => $"{tags[l.BladeId]} sent in a batch");
        await Each<BatchReturn>(r => $"A blade came back: {r.Outcome switch { ReturnOutcome.Sharpened => "sharpened", ReturnOutcome.Rejected => "rejected", ReturnOutcome.Lost => "lost", _ => "unsharpened" }}");
        await Each<TensionReading>(t => $"{Said.Capital(units.PullName)} of {tags[t.BladeId]} on {saws[t.SawId]}: {units.Show(new Stress(t.TensionPa))}, {t.How}");
        await Each<Drift>(d => $"Lead of {tags[d.BladeId]} on {saws[d.SawId]}: {units.Show(new Angle(d.AngleRad))}");
        await Each<KerfReading>(k => $"{(k.KerfM is null ? "Teeth" : "Kerf")} of {tags[k.BladeId]}: {Said.Kerf(k, units)}{(k.Note is null ? "" : $", {k.Note}")}");
        await Each<StockMove>(s => $"Stock {(s.Count > 0 ? "+" : "")}{s.Count.ToString(cultureless)}: {s.Reason}");
        await Each<Records.Hold>(h => $"{tags[h.BladeId]} on hold: {h.Kind.ToString().ToLowerInvariant()}{(h.Note is null ? "" : $", {h.Note}")}");
        await Each<HoldCleared>(h => $"A hold cleared: {h.How}");
        await Each<Inspection>(i => $"{tags[i.BladeId]} looked at: {i.Found switch { Found.NothingSeen => "nothing seen", Found.Crack => "crack", Found.Worn => "worn", _ => "see the note" }}{InspectionWords.Beside(i)}{(i.Note is null ? "" : $", {i.Note}")}");
        await Each<Records.Break>(b => $"{tags[b.BladeId]} broke");
        await Each<Retirement>(r => $"{tags[r.BladeId]} retired{(r.CutUp ? ", cut up" : "")}");
        await Each<HandOver>(h => $"Hand-over note: {(h.Text.Length > 80 ? h.Text[..80] + "…" : h.Text)}");
        await Each<HandOverRead>(_ => "A hand-over note was read");
        await Each<Trained>(t => $"{people.GetValueOrDefault(t.PersonId, "Somebody")} trained: {TaskWords.Of(t.Task)}{(t.SawId is { } on ? $", {saws[on]}" : "")}");
        await Each<LabelPrinted>(l => $"Label {l.Tag} printed");
        await Each<SawSetup>(s => $"Setup of {saws[s.SawId]}");
        return words;
    }

    private static string Off(OffReason reason) => reason switch
    {
        OffReason.StillSharp => "still sharp",
        OffReason.Dull => "dull",
        OffReason.CrackOrClicking => "crack or clicking",
        OffReason.Broke => "it broke",
        OffReason.FoundOff => "found off",
        _ => "other work",
    };
}

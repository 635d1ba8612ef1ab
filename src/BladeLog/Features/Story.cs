using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features;

/// <summary>One line of what happened.</summary>
public sealed record StoryLine(string When, string Words, string? Struck);

/// <summary>Whose page a line stands on: what the page names already is not named again.</summary>
internal enum About
{
    Shop,
    Blade,
    Saw,
}

/// <summary>The past in plain words and the shop's units: one wording for each kind of fact.</summary>
internal sealed class Story(ShopNow shop, ShopUnits units, IReadOnlyDictionary<int, string> specs)
{
    private readonly Wording words = Wording.Of(shop.Shop);
    private readonly Dictionary<int, string> saws = shop.Saws.ToDictionary(s => s.Saw.Id, s => s.Saw.Name);
    private readonly Dictionary<int, string> tags = shop.Blades.ToDictionary(b => b.Blade.Id, b => b.Blade.Tag);

    public static async Task<Story> Of(Desk desk) =>
        new(await desk.Shop(), await desk.Units(), await desk.Db.Specs.AsNoTracking().ToDictionaryAsync(s => s.Id, s => s.Code));

    public StoryLine Line(PastEntry past, About about)
    {
        ArgumentNullException.ThrowIfNull(past);
        Entry entry = past.Entry;
        string by = entry.Person is { } who ? $" ({who.Initials})" : "";
        string struck = entry.Void is { } v ? $"Struck out{(v.Entry.Person is { } striker ? " by " + striker.Initials : "")}: {v.Reason.TrimEnd('.')}." : "";
        return new StoryLine(
            Said.When(entry.AtUtc, shop.AsOf, units),
            $"{(past.Fact is { } fact ? Says(fact, about) : entry.Kind)}{by}.",
            struck.Length == 0 ? null : struck);
    }

    /// <summary>What a fact says, without its full stop.</summary>
    public string Says(Fact fact, About about) => fact switch
    {
        Mount m => $"{On(m, about)}{Tension(m.TensionPa)}{(m.InsideOut ? ", inside out" : "")}{After(", against the advice: ", m.Although)}",
        Dismount d => $"{Off(d.Mount, about)}, {StoryWords.Off(d.Reason)}",
        Slack s => AtSaw(s.SawId, about, $"{words.Tension} {(s.LetOff ? "let off" : "put on")}"),
        StartCheck c => AtSaw(c.SawId, about, $"looked at before starting: {CheckWords.Says(c, units)}"),
        TimerStarted t => AtSaw(t.SawId, about, "timer started"),
        SawSetup s => AtSaw(s.SawId, about, "set up as it is from here on"),
        MeterEpoch e => AtSaw(e.SawId, about, $"hour meter: {StoryWords.Epoch(e.Reason)}, from {Hours(e.StartReadingMs)}"),
        MeterReading r => AtSaw(r.SawId, about, $"hour meter read: {Hours(r.ReadingMs)}"),
        Run r => AtSaw(r.SawId, about, $"ran {Hours(r.RunningMs)}, grade {r.Grade}"),
        CutDone c => AtSaw(c.SawId, about, $"cut {c.SpeciesTyped} {words.Length(c.HeightM)}, {Said.Count(c.Pieces, "piece", "pieces")} of {words.Distance(c.LengthM)}{(c.Nail ? ", a nail was hit" : "")}"),
        Sharpening s => OfBlade(s.BladeId, about, $"sharpened, {(s.Kind == GrindKind.FullProfile ? "full profile" : "faces")}{(s.SetAgain ? ", set again" : "")}{Width(s.WidthM)}{(s.BatchId is null ? "" : ", by the service")}"),
        Joint j => OfBlade(j.BladeId, about, $"welded to {units.Show(new Length(j.LoopM), Fields.Loop)}, {StoryWords.Quality(j.Quality)}{After(", ", j.Method)}"),
        Split s => $"{tags[s.ParentId]} cut down to {tags[s.ChildId]}{Width(s.WidthM)}",
        PriorUse p => OfBlade(p.BladeId, about, $"used {Wording.Share(p.UsedLow)} to {Wording.Share(p.UsedHigh)} of its life before this record{After(": ", p.Source)}"),
        Hang h => OfBlade(h.BladeId, about, h.Place == Place.Bench ? "put on the bench" : $"hung up{After(" on ", h.Hook)}"),
        Retag r => $"Tag {r.OldTag} put right to {r.NewTag}",
        Batch b => $"Batch {b.Number} to {b.Service}",
        BatchLine l => OfBlade(l.BladeId, about, $"sent to {l.Batch.Service}, batch {l.Batch.Number}"),
        BatchReturn r => OfBlade(r.Line.BladeId, about, $"back from {r.Line.Batch.Service}, batch {r.Line.Batch.Number}: {StoryWords.Outcome(r.Outcome)}{Width(r.WidthM)}"),
        TensionReading t => OfBlade(t.BladeId, about, $"{words.Tension} measured: {units.Show(new Stress(t.TensionPa))} on the body, give or take {Uncertain(t.How)} %, on {Saw(t.SawId)}, by {t.How}"),
        Drift d => OfBlade(d.BladeId, about, $"leads {units.Show(new Angle(Math.Abs(d.AngleRad)))}{(d.AngleRad > 0 ? " left" : d.AngleRad < 0 ? " right" : "")} on {Saw(d.SawId)}"),
        KerfReading k => OfBlade(k.BladeId, about, $"measured: {(k.KerfM is null ? "" : "kerf ")}{Said.Kerf(k, units)}{After(", ", k.Note)}"),
        StockMove s => $"Stock of {specs[s.SpecId]}: {(s.Count > 0 ? "+" : "")}{Figures.Number(s.Count)}, {s.Reason.TrimEnd('.')}",
        Hold h => OfBlade(h.BladeId, about, $"put on hold: {LifeWords.HoldReason(h, words) ?? "no reason told"}{After(", ", h.Note)}"),
        HoldCleared c => OfBlade(c.Hold.BladeId, about, $"hold cleared{After(": ", c.How)}"),
        Inspection i => OfBlade(i.BladeId, about, $"inspected: {Seen(i)}{InspectionWords.Beside(i)}{After(", ", i.Note)}"),
        Break b => OfBlade(b.BladeId, about, $"{StoryWords.Broke(b.Site)}{(about != About.Saw && b.SawId is { } on ? $", on {Saw(on)}" : "")}{After(", ", b.Note)}"),
        Retirement r => OfBlade(r.BladeId, about, $"retired: {StoryWords.Retired(r.Reason)}{After(", ", r.Note)}{(r.CutUp ? ", cut up" : "")}"),
        LabelPrinted l => $"Label {l.Tag} printed",
        HandOver h => $"Hand-over note: {(h.Text.Length > 80 ? h.Text[..80] + "…" : h.Text)}",
        HandOverRead => "Hand-over note read",
        Trained t => $"{t.Person.Initials} trained by {t.By.Initials}: {TaskWords.Of(t.Task)}, {(t.SawId is { } saw ? Saw(saw) : "all saws")}{(t.RefresherUtc is { } due ? "; refresher due " + Said.Day(due, units) : "")}",
        _ => throw new ArgumentOutOfRangeException(nameof(fact), fact.GetType().Name, "This kind of fact has no wording."),
    };

    private string On(Mount m, About about) => about switch
    {
        About.Blade => $"Put on {Saw(m.SawId)}",
        About.Saw => $"{tags[m.BladeId]} on",
        _ => $"{tags[m.BladeId]} on {Saw(m.SawId)}",
    };

    private string Off(Mount m, About about) => about switch
    {
        About.Blade => $"Off {Saw(m.SawId)}",
        About.Saw => $"{tags[m.BladeId]} off",
        _ => $"{tags[m.BladeId]} off {Saw(m.SawId)}",
    };

    private string OfBlade(int id, About about, string said) => about == About.Blade ? Said.Capital(said) : $"{tags[id]} {said}";

    private string AtSaw(int id, About about, string said) => about == About.Saw ? Said.Capital(said) : $"{Saw(id)} {said}";

    private string Saw(int id) => saws.GetValueOrDefault(id, "a saw without a setup");

    private string Seen(Inspection look) => look.Found switch
    {
        Found.NothingSeen => "nothing seen",
        Found.Crack => look.CrackLengthM is { } length ? $"crack {words.Length(length)}" : "crack",
        Found.Worn => "worn",
        _ => "something else",
    };

    private static string Uncertain(string how) =>
        Figures.Number(100 * Handbook.Band.Tension.Uncertainty(how == "pluck" ? Handbook.Band.TensionMethod.Pluck : Handbook.Band.TensionMethod.StrandForce));

    private string Tension(double? pa) => pa is { } p ? $", {units.Show(new Stress(p))} on the body" : "";

    private string Width(double? metres) => metres is { } w ? $", width now {Said.Width(w, units)}" : "";

    private static string After(string lead, string? said) => said is null ? "" : lead + said.TrimEnd('.');

    private static string Hours(long ms) => Figures.With(Figures.Number(ms / 3_600_000.0, 1), "h");
}

using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features;

/// <summary>One line of what happened.</summary>
public sealed record StoryLine(string When, string Words, string? Struck);

/// <summary>The past in sentences.</summary>
internal static class Story
{
    public static StoryLine Line(PastFact past, DateTime now, ShopUnits units, Wording words, IReadOnlyDictionary<int, string> saws)
    {
        ArgumentNullException.ThrowIfNull(past);
        string by = past.Who is { } who ? $" ({who})" : "";
        return new StoryLine(
            Said.When(past.AtUtc, now, units),
            $"{Says(past.Fact, units, words, saws)}{by}.",
            past.Struck ? $"Struck out{(past.StruckBy is { } striker ? " by " + striker : "")}: {past.StruckWhy?.TrimEnd('.')}." : null);
    }

    private static string Says(Fact fact, ShopUnits units, Wording words, IReadOnlyDictionary<int, string> saws) => fact switch
    {
        Mount m => $"{(m.Blade is { } b ? b.Tag + " on" : "Put on " + m.Saw.Name)}{Tension(m.TensionPa, units)}{(m.InsideOut ? ", inside out" : "")}{(m.Although is { } why ? $", although {why}" : "")}",
        Dismount d => $"{(d.Mount.Blade is { } b ? b.Tag + " off" : "Off " + d.Mount.Saw.Name)}, {Off(d.Reason)}",
        Slack s => s.LetOff ? $"{Said.Capital(words.Tension)} let off" : $"{Said.Capital(words.Tension)} put on",
        StartCheck c => $"Looked at before starting: {CheckWords.Says(c, units)}",
        TimerStarted => "Timer started",
        Sharpening s => $"Sharpened, {(s.Kind == GrindKind.FullProfile ? "full profile" : "faces")}{(s.SetAgain ? ", set again" : "")}{Width(s.WidthM, units)}{(s.BatchId is null ? "" : ", by the service")}",
        Joint j => $"Welded to {units.Show(new Length(j.LoopM), Fields.Loop)}, {Quality(j.Quality)}{(j.Method is { } how ? ", " + how : "")}",
        Split => "Cut down: a new blade with its own tag came of it",
        PriorUse p => $"Used {Wording.Share(p.UsedLow)} to {Wording.Share(p.UsedHigh)} of its life before this record{(p.Source is { } from ? ": " + from.TrimEnd('.') : "")}",
        Hang h => h.Place == Place.Bench ? "Put on the bench" : $"Hung up{(h.Hook is { } hook ? " on " + hook : "")}",
        Retag r => $"Tag {r.OldTag} put right to {r.NewTag}",
        BatchLine l => $"Sent to {l.Batch.Service}, batch {l.Batch.Number}",
        BatchReturn r => $"Back from {r.Line.Batch.Service}, batch {r.Line.Batch.Number}: {Outcome(r.Outcome)}{Width(r.WidthM, units)}",
        TensionReading t => $"{Said.Capital(words.Tension)} measured: {units.Show(new Stress(t.TensionPa))} on the body{(saws.TryGetValue(t.SawId, out string? saw) ? ", on " + saw : "")}",
        Drift d => $"Leads {units.Show(new Angle(Math.Abs(d.AngleRad)))}{(d.AngleRad > 0 ? " left" : d.AngleRad < 0 ? " right" : "")}{(saws.TryGetValue(d.SawId, out string? on) ? " on " + on : "")}",
        KerfReading k => $"Measured: {(k.KerfM is null ? "" : "kerf ")}{Said.Kerf(k, units)}{(k.Note is { } note ? ", " + note.TrimEnd('.') : "")}",
        Hold h => $"Put on hold: {HoldWhat(h, words)}{(h.Note is { } note ? ", " + note.TrimEnd('.') : "")}",
        HoldCleared c => $"Hold cleared: {c.How.TrimEnd('.')}",
        Inspection i => $"Inspected: {Finding(i, words)}{InspectionWords.Beside(i)}{(i.Note is { } note ? ", " + note.TrimEnd('.') : "")}",
        Break b => $"{(b.Blade is { } broken ? broken.Tag + " broke" : "Broke")}{Site(b.Site)}{(b.Note is { } note ? ", " + note.TrimEnd('.') : "")}",
        Retirement r => $"Retired{(r.Note is { } note ? ": " + note.TrimEnd('.') : "")}{(r.CutUp ? ", cut up" : "")}",
        SawSetup => "Set up as it is from here on",
        MeterEpoch e => $"Hour meter: {Epoch(e.Reason)}, from {Hours(e.StartReadingMs)}",
        MeterReading r => $"Hour meter read: {Hours(r.ReadingMs)}",
        Run r => $"Ran {Hours(r.RunningMs)}",
        CutDone c => $"Cut {c.SpeciesTyped} {words.Length(c.HeightM)}, {Said.Count(c.Pieces, "piece", "pieces")} of {words.Distance(c.LengthM)}{(c.Nail ? ", a nail was hit" : "")}",
        _ => fact.Entry.Kind,
    };

    private static string Tension(double? pa, ShopUnits units) => pa is { } p ? $", {units.Show(new Stress(p))} on the body" : "";

    private static string Width(double? metres, ShopUnits units) => metres is { } w ? $", width now {Said.Width(w, units)}" : "";

    private static string Hours(long ms) => Figures.With(Figures.Number(ms / 3_600_000.0, 1), "h");

    private static string Quality(WeldQuality quality) => quality switch
    {
        WeldQuality.Good => "a good weld",
        WeldQuality.Best => "the best weld",
        _ => "a doubtful weld",
    };

    private static string Outcome(ReturnOutcome outcome) => outcome switch
    {
        ReturnOutcome.Sharpened => "sharpened",
        ReturnOutcome.Rejected => "rejected",
        ReturnOutcome.Unsharpened => "not sharpened",
        _ => "lost",
    };

    private static string Off(OffReason reason) => reason switch
    {
        OffReason.StillSharp => "still sharp",
        OffReason.Dull => "dull",
        OffReason.CrackOrClicking => "crack or clicking",
        OffReason.Broke => "broke",
        OffReason.OtherWork => "other work",
        _ => "found off",
    };

    private static string HoldWhat(Hold hold, Wording words)
    {
        string said = Advice.Life.LifeWords.Hold(hold, words);
        return said.StartsWith("on hold: ", StringComparison.Ordinal) ? said["on hold: ".Length..] : "no reason told";
    }

    private static string Finding(Inspection i, Wording words) => i.Found switch
    {
        Found.NothingSeen => "nothing seen",
        Found.Crack => i.CrackLengthM is { } length ? $"crack {words.Length(length)}" : "crack",
        Found.Worn => "worn",
        _ => "something else",
    };

    private static string Site(BreakSite site) => site switch
    {
        BreakSite.Gullet => " at a gullet",
        BreakSite.GulletAngled => " from a gullet, at an angle",
        BreakSite.Weld => " at its weld",
        BreakSite.BackEdge => " from the back edge",
        BreakSite.Body => " in the body",
        BreakSite.TeethStripped => ": teeth stripped",
        _ => "",
    };

    private static string Epoch(EpochReason reason) => reason switch
    {
        EpochReason.First => "first reading",
        EpochReason.NewMeter => "a new meter",
        EpochReason.RolledOver => "rolled over",
        _ => "rolled back",
    };
}

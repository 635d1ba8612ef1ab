using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>The answers a form offers, as the record tells them.</summary>
internal static class StoryWords
{
    public static string Off(OffReason reason) => reason switch
    {
        OffReason.StillSharp => "still sharp",
        OffReason.Dull => "dull",
        OffReason.CrackOrClicking => "crack or clicking",
        OffReason.Broke => "broke",
        OffReason.OtherWork => "other work",
        _ => "found off",
    };

    public static string Quality(WeldQuality quality) => quality switch
    {
        WeldQuality.Good => "a good weld",
        WeldQuality.Best => "the best weld",
        _ => "a doubtful weld",
    };

    public static string Outcome(ReturnOutcome outcome) => outcome switch
    {
        ReturnOutcome.Sharpened => "sharpened",
        ReturnOutcome.Rejected => "rejected",
        ReturnOutcome.Unsharpened => "not sharpened",
        _ => "lost",
    };

    public static string Broke(BreakSite site) => site switch
    {
        BreakSite.Gullet => "broke at a gullet",
        BreakSite.GulletAngled => "broke from a gullet, at an angle",
        BreakSite.Weld => "broke at its weld",
        BreakSite.BackEdge => "broke from the back edge",
        BreakSite.Body => "broke in the body",
        BreakSite.TeethStripped => "teeth stripped",
        _ => "broke, place unknown",
    };

    public static string Retired(RetireReason reason) => reason switch
    {
        RetireReason.FatigueMark => "past its retire mark",
        RetireReason.Crack => "cracked",
        RetireReason.Broke => "broke",
        RetireReason.WidthLimit => "under its least width",
        RetireReason.TooManyJoints => "too many welds",
        RetireReason.TeethStripped => "teeth stripped",
        RetireReason.BodyDamage => "body damaged",
        RetireReason.UnknownHistory => "history unknown",
        RetireReason.Uneconomic => "not worth its grind",
        RetireReason.Lost => "lost",
        RetireReason.Sold => "sold",
        RetireReason.Rejected => "rejected",
        RetireReason.CutDown => "cut down to a shorter loop",
        _ => "another reason",
    };

    public static string Epoch(EpochReason reason) => reason switch
    {
        EpochReason.First => "first reading",
        EpochReason.NewMeter => "a new meter",
        EpochReason.RolledOver => "rolled over",
        _ => "rolled back",
    };
}

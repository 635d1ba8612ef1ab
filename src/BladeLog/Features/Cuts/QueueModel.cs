using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Ui;
using Problem = BladeLog.Ui.Forms.Problem;

namespace BladeLog.Features.Cuts;

/// <summary>How the list is looked at.</summary>
public enum QueueView
{
    Queue,
    Saws,
    Order,
}

/// <summary>The cuts that wait, each with its answer.</summary>
public sealed record QueueModel(QueueView View, IReadOnlyList<CutAnswer> Answers, ShopAdvice Advice, ShopUnits Units, IReadOnlyList<Problem> Problems)
{
    /// <summary>So many on one page: each is answered in full.</summary>
    public const int PageSize = 60;

    /// <summary>Cuts that wait, on all pages.</summary>
    public int Count { get; init; }

    /// <summary>Cuts on the pages before this one.</summary>
    public int From { get; init; }

    public DayPlan Plan => Advice.Plan();

    internal static QueueModel Of(QueueView view, ShopAdvice advice, ShopUnits units, int from = 0, IReadOnlyList<Problem>? problems = null)
    {
        ArgumentNullException.ThrowIfNull(advice);
        QueuedCut[] waiting = [.. Waiting(advice.Now)];
        int first = Math.Clamp(from, 0, Math.Max(0, (waiting.Length - 1) / PageSize * PageSize));
        return new QueueModel(view, [.. waiting.Skip(first).Take(PageSize).Select(advice.For)], advice, units, problems ?? []) { Count = waiting.Length, From = first };
    }

    internal static IEnumerable<QueuedCut> Waiting(ShopNow shop)
    {
        ArgumentNullException.ThrowIfNull(shop);
        return shop.Cuts.Where(c => c.DoneEntryId is null && c.DroppedUtc is null).OrderBy(c => c.Order).ThenBy(c => c.Number);
    }

    /// <summary>"black cherry, 200 mm deep, 6 pieces of 1.2 m, due 2026-12-03".</summary>
    public string Line(CutAnswer answer)
    {
        ArgumentNullException.ThrowIfNull(answer);
        QueuedCut cut = answer.Work.Cut;
        string due = cut.Due is { } date ? $", due {Said.Day(date, Advice.Now.AsOf, Units)}" : "";
        return $"{CutSays.Wood(cut)}, {CutSays.Deep(cut, Advice.Words)}, {Said.Count(cut.Pieces, "piece", "pieces")} of {CutSays.Piece(cut.LengthM, Units)}{due}";
    }

    /// <summary>"Q-08 on Osprey, 1.8 to 4.8 m/min", or what to do where nothing fits.</summary>
    public string Says(CutAnswer answer)
    {
        ArgumentNullException.ThrowIfNull(answer);
        return answer.First is { } best
            ? $"on {best.Saw.Saw.Name}{CutSays.AtSpeed(best, Units)}, {CutSays.Window(best, Units)}"
            : CutSays.Instead(answer);
    }
}

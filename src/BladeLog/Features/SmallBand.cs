using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features;

/// <summary>What the small band beside a blade shows: at most one of the three. Nothing for a held or a gone blade.</summary>
public sealed record SmallBand
{
    public LifeFigures? Life { get; init; }

    public (double Low, double High)? Range { get; init; }

    public double OneInTen { get; init; }

    public (double Share, string Words)? Worn { get; init; }

    public bool Any => Life is not null || Range is not null || Worn is not null;

    public static SmallBand Of(BladeAdvice blade, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(settings);
        if (blade.Life is not { } life || blade.State is BladeState.Broken or BladeState.Retired)
        {
            return new SmallBand();
        }

        if (life.UnknownHistory)
        {
            return new SmallBand { Range = (life.UsedLow, life.UsedHigh), OneInTen = settings.WatchMark };
        }

        if (Drawn.Life(blade) is { } band)
        {
            return new SmallBand { Life = band };
        }

        return Drawn.OtherLimit(blade) is { } limit
            ? new SmallBand { Worn = (limit.Share, $"{Said.Capital(LifeWords.Governs(limit.Kind))}: {Wording.Share(Math.Min(1, limit.Share))} used; flexing will not end it") }
            : new SmallBand();
    }
}

using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Wear;

/// <summary>What grinding takes away.</summary>
public static class Sharpening
{
    /// <summary>Width of a blade after some grinds.</summary>
    /// <remarks>w_n = w_new − n·g. n grinds; g taken off the width each time, m (0.05 to 0.25 mm, 0.20 by default).</remarks>
    /// <source key="common-practice" where="stock removed per grind"/>
    public static Length WidthAfter(Length newWidth, double grinds, Length offEachTime)
    {
        double w = Require.Positive(newWidth.Metres, "blade width");
        double n = Require.NotNegative(grinds, "number of grinds");
        double g = Require.NotNegative(offEachTime.Metres, "stock ground off");
        return new Length(Math.Max(0, w - n * g));
    }

    /// <summary>Least width of a worn blade.</summary>
    /// <remarks>w_min = 0.75 w_new for narrow bands, 0.65 w_new for wide mill bands; never under what guides and wheels need.</remarks>
    /// <source key="common-practice" where="scrap width"/>
    public static Length LeastWidth(Length newWidth, bool wideMillBand) =>
        new(Require.Positive(newWidth.Metres, "blade width") * (wideMillBand ? 0.65 : 0.75));

    /// <summary>Whole grinds until the least width.</summary>
    /// <remarks>n = ⌊(w_now − w_min)/g⌋, zero if already under it. w_now and w_min, m; g per grind, m.</remarks>
    /// <source key="derived" where="width after grinding solved for the count"/>
    public static double GrindsLeft(Length widthNow, Length leastWidth, Length offEachTime)
    {
        double w = Require.Positive(widthNow.Metres, "blade width");
        double w_min = Require.NotNegative(leastWidth.Metres, "least width");
        double g = Require.Positive(offEachTime.Metres, "stock ground off");
        // A width that is a whole number of grinds away must not lose one to rounding.
        return Math.Max(0, Math.Floor((w - w_min) / g + 1e-9));
    }
}

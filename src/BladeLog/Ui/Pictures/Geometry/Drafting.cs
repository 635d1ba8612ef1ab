using System.Globalization;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>What the figures on a picture are written in. Pictures are given mm, MPa, N and m/min and stay to the same scale.</summary>
public sealed record Drafting(bool Inch)
{
    public static readonly Drafting Metric = new(false);

    private static readonly double[] MetricTicks = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20];
    private static readonly double[] InchTicks = [0.5, 1, 2, 5, 10, 20, 50];

    public static Drafting Of(ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return new(units.Units == UnitSystem.Inch);
    }

    /// <summary>On a drawing the unit is left away, as drawings do: the line under it names the unit of all of them.</summary>
    public string Length(double mm, int decimals) => Inch ? Inches(mm, decimals) : Figures.Number(mm, decimals);

    /// <summary>The same for those who hear it.</summary>
    public string Said(double mm, int decimals) => Length(mm, decimals) + (Inch ? " in" : " mm");

    /// <summary>"millimetres" or "inches": for the line under a drawing.</summary>
    public string Unit => Inch ? "inches" : "millimetres";

    public string FeedUnit => Inch ? "ft/min" : "m/min";

    public string Feed(double metresPerMinute) => Figures.Feed(Inch ? metresPerMinute / Exact.Foot : metresPerMinute);

    /// <summary>Marks of the feed axis: the figure, its place in m/min, and how early it gives way on a narrow screen.</summary>
    public IEnumerable<(string Words, double At, string Css)> Ticks => Inch
        ? InchTicks.Select(t => (Plain(t), t * Exact.Foot, t is 1 or 20 ? " minor" : t is 2 ? " m3" : ""))
        : MetricTicks.Select(t => (Plain(t), t, t is 0.2 ? " minor m2" : t is 2 or 10 ? " minor" : t is 0.5 ? " m3" : ""));

    public string Stress(double megapascals) => Inch
        ? Figures.With(Figures.Number(Math.Round(megapascals * 1e6 / Exact.Psi / 100, MidpointRounding.AwayFromZero) * 100), "psi")
        : Figures.With(Figures.Number(megapascals), "MPa");

    public string Force(double newtons) => Inch
        ? Figures.With(Figures.Number(newtons / Exact.PoundForce, newtons < 44 ? 1 : 0), "lbf")
        : Figures.With(Figures.Number(newtons), "N");

    // A tenth of a mm is told in thousandths, a whole one in tenths.
    private static string Inches(double mm, int decimals) => Figures.Number(mm * 1e-3 / Exact.Inch, decimals == 0 ? 1 : 3);

    private static string Plain(double tick) => tick.ToString(CultureInfo.InvariantCulture);
}

using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features;

/// <summary>SI to the shop's units on axes and in lines.</summary>
internal sealed class Shown(ShopUnits units)
{
    private bool Inch => units.Units == UnitSystem.Inch;

    public ShopUnits Units => units;

    public string SmallUnit => units.SmallLengthUnit;

    public double Small(double metres) => Inch ? metres / Exact.Inch : metres * 1e3;

    public string StressUnit => units.StressUnit;

    public double Stress(double pascals) => Inch ? pascals / Exact.Psi : pascals * 1e-6;

    public string ForceUnit => units.ForceUnit;

    public double Force(double newtons) => Inch ? newtons / Exact.PoundForce : newtons;

    public string FeedUnit => units.FeedUnit;

    public double Feed(double metresPerSecond) => metresPerSecond * 60 / (Inch ? Exact.Foot : 1);

    public string StressText(double pascals) => Figures.With(Figures.Number(Stress(pascals), 0), StressUnit);

    public string ForceText(double newtons) => Figures.With(Figures.Number(Force(newtons), Math.Abs(Force(newtons)) < 9.95 ? 1 : 0), ForceUnit);

    public string FeedText(double metresPerSecond) => double.IsFinite(metresPerSecond) ? Figures.With(Figures.Feed(Feed(metresPerSecond)), FeedUnit) : "no limit";

    public string PathUnit => Inch ? "miles" : "km";

    /// <summary>A path of a tooth in km, as its axis has it.</summary>
    public double? Path(double? km) => Inch ? km * 1e3 / (5280 * Exact.Foot) : km;

    public string FarText(double metres) => Inch ? Figures.With(Figures.Number(metres / Exact.Foot, 0), "ft") : Figures.With(Figures.Number(metres, 1), "m");

    public string GulletText(Area area) => Inch
        ? Figures.With(Figures.Number(area.SquareMetres / (Exact.Inch * Exact.Inch), 4), "in²")
        : Figures.With(Figures.Number(area.SquareMillimetres, 1), "mm²");

    /// <summary>Push for each length of give.</summary>
    public string StiffText(double newtonsPerMillimetre) => Inch
        ? Figures.With(Figures.Number(newtonsPerMillimetre * 1e3 * Exact.Inch / Exact.PoundForce, 0), "lbf/in")
        : Figures.With(Figures.Number(newtonsPerMillimetre, 1), "N/mm");

    public string AreaText(double squareMetres) => Inch ? Figures.With(Figures.Number(squareMetres / (Exact.Foot * Exact.Foot), 0), "ft²") : Figures.With(Figures.Number(squareMetres, 1), "m²");

    public string SmallText(double metres, int decimals = 1) => Figures.With(Figures.Number(Small(metres), Inch ? decimals + 1 : decimals), SmallUnit);

    public static string Micrometres(double metres, int decimals = 1) => Figures.With(Figures.Number(metres * 1e6, decimals), "µm");

    /// <summary>One line of the reckoning. Keys that are no publication say nothing beyond their mark.</summary>
    public static BecauseLine Line(string what, string value, string formula, string source, Provenance provenance) =>
        new(what, value, formula, Reckoned.Source(source), provenance);

    /// <summary>Points of a line, evenly spaced on its axis.</summary>
    public static IReadOnlyList<Point> Points(AxisScale x, Func<double, double?> y, int count = 60) =>
        [.. Enumerable.Range(0, count + 1).Select(i => x.Value(100.0 * i / count)).Select(v => new Point(v, Finite(() => y(v))))];

    // Where the handbook refuses a case the line has a gap.
    private static double Finite(Func<double?> y)
    {
        try
        {
            return y() ?? double.NaN;
        }
        catch (ArgumentOutOfRangeException)
        {
            return double.NaN;
        }
    }
}

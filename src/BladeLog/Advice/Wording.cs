using System.Globalization;
using BladeLog.Handbook.Units;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>The words of this shop, for sentences in which they occur.</summary>
public sealed record Wording(LengthUnit Lengths = LengthUnit.Millimetre, Spelling Spelling = Spelling.Uk, PullWord Pull = PullWord.Tension)
{
    public static Wording Of(Shop shop)
    {
        ArgumentNullException.ThrowIfNull(shop);
        return new Wording(shop.Lengths, shop.Spelling, shop.PullWord);
    }

    public string Tension => Pull == PullWord.Strain ? "strain" : "tension";

    /// <summary>A length with its unit; thin ones with a decimal.</summary>
    public string Length(double metres) => Lengths == LengthUnit.Inch
        ? Number(metres / Handbook.Units.Exact.Inch, Math.Abs(metres) < 0.254 ? 2 : 1) + " in"
        : Number(metres * 1e3, Math.Abs(metres) < 0.00995 ? 1 : 0) + " mm";

    /// <summary>A length for a second figure in one sentence: no unit again.</summary>
    public string BareLength(double metres) => Length(metres)[..^3];

    /// <summary>A width as a calliper reads it.</summary>
    public string Width(double metres) => Lengths == LengthUnit.Inch ? Number(metres / Handbook.Units.Exact.Inch, 3) + " in" : Number(metres * 1e3, 1) + " mm";

    /// <summary>An edge radius.</summary>
    public static string Edge(double metres) => Number(metres * 1e6, 0) + " µm";

    public string Feed(double metresPerSecond) => Lengths == LengthUnit.Inch
        ? Number(metresPerSecond * 60 / Exact.Foot, 1) + " ft/min"
        : Number(metresPerSecond * 60, 1) + " m/min";

    public string Distance(double metres) => Lengths == LengthUnit.Inch ? Number(metres / Exact.Foot, 0) + " ft" : Number(metres, metres < 9.95 ? 1 : 0) + " m";

    public static string Hours(double hours) => Number(hours, hours < 9.95 ? 1 : 0) + " h";

    public static string Share(double fraction) => Number(fraction, 2);

    /// <summary>A chance as "8 in 100", "5 in 1,000" or less than that.</summary>
    public static string Chance(double chance) => chance switch
    {
        >= 0.0095 => Number(chance * 100, 0) + " in 100",
        >= 0.00095 => Number(chance * 1000, 0) + " in 1,000",
        _ => "under 1 in 1,000",
    };

    public static string Count(int count, string one, string many) => count == 1 ? "1 " + one : Number(count, 0) + " " + many;

    public static string Number(double value, int decimals) => value.ToString("N" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}

using System.Globalization;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>The reference bands of the band stability specification, section 11: figures of an independent program, checked there
/// against an independent finite-element program. E = 206 GPa, ν = 0.30, ρ = 7850 kg/m³.</summary>
internal static class ReferenceBands
{
    public static readonly Steel Steel206 = new(new Stress(206e9), 0.30, new Density(7850));

    public sealed record Row(string Id, GuidedBand Band, IReadOnlyDictionary<string, double> Figures)
    {
        public double this[string column] => Figures[column];
    }

    public static IReadOnlyList<Row> All { get; } = Read();

    public static TheoryData<string> Ids
    {
        get
        {
            var ids = new TheoryData<string>();
            foreach (Row row in All)
            {
                ids.Add(row.Id);
            }

            return ids;
        }
    }

    public static Row Find(string id) => All.Single(row => row.Id == id);

    /// <summary>Millimetres and megapascals, as the reference is written.</summary>
    public static GuidedBand Guided(double w, double t, double g, double sigma, double S, double h, double xc) => new()
    {
        Width = Length.FromMillimetres(w),
        Thickness = Length.FromMillimetres(t),
        GulletDepth = Length.FromMillimetres(g),
        Tension = Stress.FromMegapascals(sigma),
        GuideSpan = Length.FromMillimetres(S),
        CutHeight = Length.FromMillimetres(h),
        CutCentre = Length.FromMillimetres(xc),
        Steel = Steel206,
    };

    /// <summary>Fails unless the value lies within a share of the reference.</summary>
    public static void Near(double expected, double actual, double share, string what = "") =>
        Assert.True(Math.Abs(actual - expected) <= share * Math.Abs(expected), FormattableString.Invariant($"{what} expected {expected:G9}, got {actual:G9}"));

    private static List<Row> Read()
    {
        string[][] lines = [.. File.ReadLines(Path.Combine(AppContext.BaseDirectory, "Cases", "beam-strength.csv"))
            .Where(line => line.Length > 0)
            .Select(line => line.Split(','))];
        var rows = new List<Row>();
        foreach (string[] line in lines.Skip(1))
        {
            var figures = lines[0].Zip(line).Skip(1).ToDictionary(cell => cell.First, cell => double.Parse(cell.Second, CultureInfo.InvariantCulture));
            GuidedBand band = Guided(figures["w"], figures["t"], figures["g"], figures["sigma"], figures["S"], figures["h"], figures["xc"]);
            rows.Add(new Row(line[0], band, figures));
        }

        return rows;
    }
}

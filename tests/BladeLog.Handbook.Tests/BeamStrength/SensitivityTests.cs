using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>Exponents d ln/d ln by ±2 % and ratios Pcr/P₁ of the band stability specification, section 9 (independent program; no gullet).</summary>
public class SensitivityTests
{
    private const double Printed = 0.0151;

    [Theory]
    [InlineData(6, 0.5, 150, 75, "w", 1.48, 0.48, 0.76, 0, -0.92)]
    [InlineData(6, 0.5, 150, 75, "t", 1.00, 2.17, 1.32, 0.02, 0.92)]
    [InlineData(6, 0.5, 150, 75, "sigma", 1.26, 0.60, 0.84, 0.49, 0.02)]
    [InlineData(6, 0.5, 150, 75, "S", -0.85, -1.09, -1.09, -1.02, -1.00)]
    [InlineData(25, 0.9, 200, 100, "w", 1.93, 0.91, 0.40, 0, -0.78)]
    [InlineData(25, 0.9, 200, 100, "t", 1.00, 2.13, 1.70, 0.03, 0.79)]
    [InlineData(25, 0.9, 200, 100, "sigma", 1.04, 0.45, 0.64, 0.48, 0.10)]
    [InlineData(25, 0.9, 200, 100, "S", -1.27, -1.45, -1.10, -1.03, -1.01)]
    [InlineData(50, 1.0, 300, 150, "w", 1.96, 1.10, 0.38, 0, -0.55)]
    [InlineData(50, 1.0, 300, 150, "t", 1.00, 1.88, 1.70, 0.02, 0.56)]
    [InlineData(50, 1.0, 300, 150, "sigma", 1.02, 0.57, 0.65, 0.49, 0.22)]
    [InlineData(50, 1.0, 300, 150, "S", -1.29, -1.42, -1.08, -1.02, -1.01)]
    [InlineData(100, 1.1, 600, 300, "w", 1.96, 1.36, 0.63, 0, -0.27)]
    [InlineData(100, 1.1, 600, 300, "t", 1.00, 1.53, 1.41, 0.01, 0.28)]
    [InlineData(100, 1.1, 600, 300, "sigma", 1.02, 0.74, 0.79, 0.50, 0.36)]
    [InlineData(100, 1.1, 600, 300, "S", -1.29, -1.35, -1.05, -1.01, -1.00)]
    public void Each_figure_answers_each_measure_as_in_the_reference(
        double w, double t, double S, double h, string measure, double P1, double Pcr, double k0, double lateral, double torsional)
    {
        Func<double, GuidedBand> band = share => Guided(
            measure == "w" ? w * share : w,
            measure == "t" ? t * share : t,
            0,
            measure == "sigma" ? 100 * share : 100,
            measure == "S" ? S * share : S,
            h,
            measure == "S" ? S * share / 2 : S / 2);
        Assert.Equal(P1, Exponent(band, b => FrontEdge.SlackThrust(b).Newtons), Printed);
        Assert.Equal(k0, Exponent(band, b => TipStiffness.AtPoint(b, new Force(0)).NewtonsPerMetre), Printed);
        Assert.Equal(lateral, Exponent(band, b => BandFrequency.Lateral(b).Hertz), Printed);
        Assert.Equal(torsional, Exponent(band, b => BandFrequency.Torsional(b).Hertz), Printed);
        Assert.Equal(Pcr, Exponent(band, b => Math.Min(LateralBuckling.CriticalThrust(b, 12, prebuckling: false).Newtons, PlateBuckling.CriticalThrust(b).Newtons)), Printed);
    }

    [Theory]
    [InlineData(6, 0.5, new[] { 6.39, 5.74, 5.18, 4.17, 3.01, 2.23 })]
    [InlineData(12, 0.6, new[] { 3.95, 3.70, 3.53, 3.20, 2.71, 2.26 })]
    [InlineData(19, 0.8, new[] { 3.47, 3.25, 3.12, 2.94, 2.68, 2.42 })]
    [InlineData(25, 0.9, new[] { 2.97, 2.81, 2.71, 2.57, 2.41, 2.25 })]
    [InlineData(38, 1.0, new[] { 2.09, 2.04, 2.00, 1.94, 1.87, 1.79 })]
    [InlineData(50, 1.0, new[] { 1.49, 1.53, 1.53, 1.52, 1.50, 1.46 })]
    [InlineData(80, 1.0, new[] { 0, 0.85, 0.95, 1.03, 1.07, 1.08 })]
    [InlineData(100, 1.1, new[] { 0, 0, 0.76, 0.89, 0.97, 1.00 })]
    [InlineData(150, 1.3, new[] { 0, 0, 0, 0.59, 0.74, 0.82 })]
    public void Narrow_bands_go_slack_long_before_they_buckle_and_wide_ones_do_not(double w, double t, double[] ratios)
    {
        double[] spans = [100, 150, 200, 300, 450, 600];
        for (int i = 0; i < spans.Length; i++)
        {
            if (ratios[i] > 0)
            {
                Assert.Equal(ratios[i], Ratio(Guided(w, t, 0, 100, spans[i], spans[i] / 2, spans[i] / 2)), 0.006);
            }
        }
    }

    [Theory]
    [InlineData(6, 0.5, 5.71, 2.03, 3.20, 5.40)]
    [InlineData(12, 0.6, 4.11, 1.87, 2.49, 4.13)]
    [InlineData(19, 0.8, 3.67, 1.88, 2.30, 3.78)]
    [InlineData(25, 0.9, 3.19, 1.72, 2.04, 3.30)]
    [InlineData(38, 1.0, 2.35, 1.40, 1.58, 2.45)]
    [InlineData(50, 1.0, 1.81, 1.15, 1.27, 1.88)]
    [InlineData(80, 1.0, 1.19, 0.81, 0.89, 1.23)]
    [InlineData(100, 1.1, 1.04, 0.67, 0.75, 1.07)]
    [InlineData(150, 1.3, 0.72, 0.41, 0.47, 0.75)]
    public void Tension_and_thickness_shift_which_comes_first(double w, double t, double slack, double tight, double thin, double thick)
    {
        Assert.Equal(slack, Ratio(Guided(w, t, 0, 70, 300, 150, 150)), 0.006);
        Assert.Equal(tight, Ratio(Guided(w, t, 0, 200, 300, 150, 150)), 0.006);
        Assert.Equal(thin, Ratio(Guided(w, t * 0.8, 0, 100, 300, 150, 150)), 0.006);
        Assert.Equal(thick, Ratio(Guided(w, t * 1.25, 0, 100, 300, 150, 150)), 0.006);
    }

    private static double Ratio(GuidedBand band) =>
        Math.Min(LateralBuckling.CriticalThrust(band).Newtons, PlateBuckling.CriticalThrust(band, 8, 5).Newtons) / FrontEdge.SlackThrust(band).Newtons;

    private static double Exponent(Func<double, GuidedBand> band, Func<GuidedBand, double> figure) =>
        Math.Log(figure(band(1.02)) / figure(band(0.98))) / Math.Log(1.02 / 0.98);
}

using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

public sealed class FractureTests
{
    private const double Mu = 0.6, Toughness = 1295;
    private static readonly Stress ShearYield = new(20.861e6);

    [Theory] // independent program, cutting specification 4.2 (Scots pine; R, τ and μ after Orlowski and others, from memory)
    [InlineData(0, "29.5181", "2.33238", "0.660286", "73.6890", "1.96127", "26.6155", "1.45687")]
    [InlineData(5, "32.0181", "2.10913", "0.659430", "66.7222", "1.96382", "29.4327", "1.31914")]
    [InlineData(10, "34.5181", "1.91013", "0.656843", "60.6648", "1.97155", "32.4991", "1.19938")]
    [InlineData(15, "37.0181", "1.73057", "0.652467", "55.3305", "1.98478", "35.8712", "1.09392")]
    [InlineData(20, "39.5181", "1.56679", "0.646197", "50.5802", "2.00403", "39.6209", "1.00000")]
    [InlineData(25, "42.0181", "1.41598", "0.637884", "46.3075", "2.03015", "43.8406", "0.915526")]
    [InlineData(30, "44.5181", "1.27592", "0.627318", "42.4298", "2.06434", "48.6532", "0.838861")]
    public void Shear_plane_strain_friction_and_factors_by_rake(
        double rake, string plane, string strain, string q, string k, string r, string h_R, string factor)
    {
        Angle g = Angle.FromDegrees(rake);
        Printed.Check(plane, Fracture.ShearPlane(g, Mu).Degrees, "Φ");
        Printed.Check(strain, Fracture.ShearStrain(g, Mu), "γ");
        Printed.Check(q, Fracture.FrictionCorrection(g, Mu), "Q");
        Printed.Check(k, ShearYield.Pascals * Fracture.ShearStrain(g, Mu) / Fracture.FrictionCorrection(g, Mu) / 1e6, "K");
        Printed.Check(r, Fracture.ForcePerWidth(new Length(0), g, Mu, ShearYield, Toughness) / 1000, "R/Q");
        Printed.Check(h_R, CuttingForce.ReferenceThickness(g).Micrometres, "h_R");
        Printed.Check(factor, CuttingForce.RakeFactor(g), "K_g");
    }

    [Theory] // independent program, cutting specification 4.3; model E at the pine mid value C = 22.5 N/mm^1.5 of Ettelt 1987
    [InlineData(0.0177083333, "2.99413", "2.89972", "4.92293")]
    [InlineData(0.05, "5.03115", "4.53304", "6.55625")]
    [InlineData(0.1, "7.11512", "7.06205", "9.08526")]
    [InlineData(0.3, "12.3238", "17.1781", "19.2013")]
    [InlineData(0.5, "15.9099", "27.2941", "29.3174")]
    public void Measurements_and_fracture_model_side_by_side(double chip, string ettelt, string sharp, string used)
    {
        double byFracture = Fracture.ForcePerWidth(Mm(chip), Angle.FromDegrees(20), Mu, ShearYield, Toughness) / 1000;
        // The density at which the fitted line passes through Ettelt's own pine mid value.
        double byEttelt = Fracture.EtteltForcePerWidth(Mm(chip), new Density(22.5 / 45.9334 * 1000)) / 1000;
        Printed.Check(ettelt, byEttelt, "Ettelt");
        Printed.Check(sharp, byFracture, "fracture, sharp");
        Printed.Check(used, CuttingForce.PerTooth(OneMillimetreWide(20), Mm(chip)).Newtons, "r = 20 µm");
        // At the edge radius of the measurements the model in use is the fracture model itself.
        Assert.Equal(byFracture, CuttingForce.PerTooth(OneMillimetreWide(10), Mm(chip)).Newtons, 1e-5 * byFracture);
        if (chip <= 0.1)
        {
            Assert.InRange(byFracture / byEttelt, 0.90, 1.10);
        }
    }

    [Theory] // Ettelt 1987, mid values for edge and motion across the fibres, N/mm^1.5; densities at the level of DIN 68364 (from memory)
    [InlineData(460, 21.5)]
    [InlineData(520, 22.5)]
    [InlineData(710, 33)]
    public void The_line_through_density_meets_the_published_mid_values(double density, double c)
    {
        double fitted = Fracture.EtteltForcePerWidth(Mm(1), new Density(density)) / 1000;
        Assert.InRange(fitted / c, 0.93, 1.07);
    }
}

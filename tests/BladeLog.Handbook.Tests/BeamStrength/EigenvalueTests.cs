using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>The quick solutions start from one half-wave and could settle on a mode that is not the lowest; a general eigenvalue solver cannot.</summary>
public class EigenvalueTests
{
    [Fact]
    public void The_beam_iteration_finds_the_least_eigenvalue() => Cuts.Sample(band =>
    {
        Near(Beam(band, 12), LateralBuckling.CriticalThrust(band, 12, prebuckling: false).Newtons, 1e-6);
    }, iter: 400);

    [Fact]
    public void The_plate_iteration_finds_the_least_eigenvalue() => Cuts.Sample(band =>
    {
        BandSection s = BandSection.Of(band);
        Near(PlateBuckling.ByEigenvalues(s, new InPlane(s)), PlateBuckling.CriticalThrust(band).Newtons, 1e-5, band.ToString());
    }, iter: 200);

    /// <summary>Half of the cuts lie in the very middle, where even and odd modes do not mix.</summary>
    private static Gen<GuidedBand> Cuts =>
        from band in TradeSenseTests.Bands
        from centred in Gen.Bool
        select centred ? band with { CutCentre = new Length(band.GuideSpan.Metres / 2) } : band;

    private static double Beam(GuidedBand band, int n)
    {
        BandSection s = BandSection.Of(band);
        var ritz = new RitzTerms(s, new InPlane(s), n, prebuckling: false, new double[RitzTerms.Room(n)]);
        var load = Matrix<double>.Build.Dense(2 * n, 2 * n);
        for (int i = 0; i < n; i++)
        {
            for (int j = 0; j < n; j++)
            {
                double coupling = ritz.C[(i * n) + j] / Math.Sqrt(ritz.ku[i] * ritz.kp[j]);
                load[i, n + j] = load[n + j, i] = coupling;
                load[n + i, n + j] = s.e * ritz.Q[(i * n) + j] / Math.Sqrt(ritz.kp[i] * ritz.kp[j]);
            }
        }

        return 1 / load.Evd(Symmetricity.Symmetric).EigenValues.Real().Maximum();
    }
}

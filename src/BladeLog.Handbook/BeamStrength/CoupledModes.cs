using BladeLog.Handbook.Quantities;
using MathNet.Numerics.LinearAlgebra;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The band's frequencies with a thrust on the cut, which ties sideways movement and twist together.</summary>
public static class CoupledModes
{
    /// <summary>Gives the lowest frequencies of the band at rest under a thrust, lowest first.</summary>
    /// <param name="b">The band and its cut; its speed is not taken in.</param>
    /// <param name="thrust">P, total over all teeth in the cut.</param>
    /// <param name="count">How many.</param>
    /// <param name="terms">N, sine terms in each of sideways movement and twist.</param>
    /// <remarks>
    /// (2πf)² = roots of M^(−½)(K − P B)M^(−½), M = ρ A S/2 for the sideways terms, ρ A r² S/2 for the twist; K, B as for
    /// <see cref="LateralBuckling"/> without the prebuckling term. Range: thrust from none; a mode that the thrust has buckled has frequency 0.
    /// count from 1 to N, so that the terms resolve the modes asked for.
    /// </remarks>
    /// <source key="derived" where="reference figures of an independent program, band stability specification 6"/>
    public static IReadOnlyList<Frequency> UnderThrust(GuidedBand b, Force thrust, int count, int terms = 12)
    {
        LateralBuckling.CheckTerms(terms);
        BandSection.Refuse(count < 1 || count > terms, nameof(count), "As many frequencies can be asked for as there are sine terms.");
        BandSection s = BandSection.Of(b);
        double P = TipStiffness.Thrust(thrust), mu = s.rho * s.A * s.S / 2, mp = mu * s.r2;
        var ritz = new RitzTerms(s, new InPlane(s), terms, prebuckling: false, new double[RitzTerms.Room(terms)]);
        var modes = Matrix<double>.Build.Dense(2 * terms, 2 * terms);
        for (int i = 0; i < terms; i++)
        {
            modes[i, i] = ritz.ku[i] / mu;
            modes[terms + i, terms + i] = ritz.kp[i] / mp;
            for (int j = 0; j < terms; j++)
            {
                modes[i, terms + j] = modes[terms + j, i] = -P * ritz.C[(i * terms) + j] / Math.Sqrt(mu * mp);
                modes[terms + i, terms + j] -= P * s.e * ritz.Q[(i * terms) + j] / mp;
            }
        }

        return [.. modes.Evd(Symmetricity.Symmetric).EigenValues.Real()
            .Order()
            .Take(count)
            .Select(omega2 => new Frequency(Math.Sqrt(Math.Max(0, omega2)) / (2 * Math.PI)))];
    }
}

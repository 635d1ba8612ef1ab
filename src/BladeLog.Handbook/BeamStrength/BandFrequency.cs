using BladeLog.Handbook.Quantities;
using MathNet.Numerics.LinearAlgebra;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The band's own frequencies between the guides.</summary>
public static class BandFrequency
{
    /// <summary>Gives the frequency of the n-th sideways mode of the running band.</summary>
    /// <remarks>
    /// f = n √c²/(2S) · (1 − v²/c²), c² = (T + E Iy a²)/(ρ A), a = nπ/S. T pull of one strand, running N; S guide span m; v band speed m/s;
    /// E Iy bending stiffness N m²; ρ A mass per length kg/m. No thrust; it lowers the frequency, to none at buckling.
    /// Range: n at least 1, v below c. Against a full gyroscopic solution within 0.2 % at wood speeds, 1.5 % at worst.
    /// The speed factor is that of a travelling string (Mote; Wickert and Mote).
    /// </remarks>
    /// <source key="wickert-mote" where="travelling string; from memory"/>
    public static Frequency Lateral(GuidedBand b, int mode = 1)
    {
        BandSection s = BandSection.Of(b);
        double a = Wave(s, mode), c2 = (s.T + (s.EIy * a * a)) / (s.rho * s.A);
        return Travelling(s, mode, c2);
    }

    /// <summary>Gives the frequency of the n-th twisting mode of the running band.</summary>
    /// <remarks>
    /// f = n √c²/(2S) · (1 − v²/c²), c² = (G J + T r² + E Iw a²)/(ρ A r²), a = nπ/S. r² = (b² + t²)/12 m²; G J torsion, E Iw warping stiffness;
    /// other symbols, range and origin as for <see cref="Lateral"/>. Against a full gyroscopic solution within 0.12 %.
    /// </remarks>
    /// <source key="wickert-mote" where="travelling string; from memory"/>
    public static Frequency Torsional(GuidedBand b, int mode = 1)
    {
        BandSection s = BandSection.Of(b);
        double a = Wave(s, mode), c2 = (s.GJ + (s.T * s.r2) + (s.EIw * a * a)) / (s.rho * s.A * s.r2);
        return Travelling(s, mode, c2);
    }

    /// <summary>Gives the lowest frequency of the band at rest with a thrust on the cut, sideways movement and twist together.</summary>
    /// <param name="b">The band and its cut; its speed is not taken in.</param>
    /// <param name="thrust">P, total over all teeth in the cut.</param>
    /// <param name="terms">N, sine terms in each of sideways movement and twist.</param>
    /// <remarks>
    /// (2πf)² = least root of M^(−½)(K − P B)M^(−½), M = ρ A S/2 for the sideways terms, ρ A r² S/2 for the twist; K, B as for
    /// <see cref="LateralBuckling"/> without the prebuckling term. ρ A mass per length kg/m, S guide span m, r² = (b² + t²)/12 m².
    /// Range: thrust from none; it falls to nothing at the buckling thrust and is nothing above it.
    /// </remarks>
    /// <source key="derived" where="band stability specification 6"/>
    public static Frequency UnderThrust(GuidedBand b, Force thrust, int terms = 12)
    {
        LateralBuckling.CheckTerms(terms);
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

        double omega2 = modes.Evd(Symmetricity.Symmetric).EigenValues.Real().Minimum();
        return new Frequency(Math.Sqrt(Math.Max(0, omega2)) / (2 * Math.PI));
    }

    private static double Wave(in BandSection s, int mode)
    {
        if (mode < 1)
        {
            throw new ArgumentOutOfRangeException(nameof(mode), "Modes are counted from one.");
        }

        return mode * Math.PI / s.S;
    }

    private static Frequency Travelling(in BandSection s, int mode, double c2)
    {
        double v2 = s.v * s.v;
        BandSection.Refuse(v2 >= c2, nameof(GuidedBand.BandSpeed), "At this speed the band outruns its own waves and has no frequency.");
        return new Frequency(mode * Math.Sqrt(c2) / (2 * s.S) * (1 - (v2 / c2)));
    }
}

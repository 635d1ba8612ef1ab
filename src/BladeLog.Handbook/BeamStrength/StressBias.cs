using BladeLog.Handbook.Quantities;
using MathNet.Numerics.LinearAlgebra;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>Stresses the band has across its width before any wood pushes on it: a tighter or slacker tooth edge, and rolled-in tension.</summary>
public static class StressBias
{
    /// <summary>Gives what rolled-in tension adds to the torsional stiffness, N m² per radian.</summary>
    /// <param name="edge">Stress the rolling leaves at both edges; the middle of the width gets minus half of it.</param>
    /// <param name="thickness">Thickness of the body.</param>
    /// <param name="bodyWidth">Width of the body.</param>
    /// <remarks>
    /// ∫ σ_r t y² dy = σ_e t b³/30 for σ_r = σ_e (3η² − 1)/2, η = 2y/b: a parabola that pulls on the whole as much as it pushes.
    /// σ_e Pa, below zero for a band with loose edges, t thickness m, b body width m. Elastic; other profiles of rolling differ.
    /// </remarks>
    /// <source key="derived" where="band stability specification 3.5, for a parabola"/>
    public static double RollStiffening(Stress edge, Length thickness, Length bodyWidth)
    {
        double sigma_e = edge.Pascals, t = thickness.Metres, b = bodyWidth.Metres;
        BandSection.Refuse(!double.IsFinite(sigma_e), nameof(edge), "The stress left by rolling must be a number.");
        BandSection.Refuse(!(t > 0 && double.IsFinite(t)), nameof(thickness), "The thickness of the band must be greater than zero.");
        BandSection.Refuse(!(b > 0 && double.IsFinite(b)), nameof(bodyWidth), "The width of the body must be greater than zero.");
        return sigma_e * t * b * b * b / 30;
    }

    /// <summary>Gives the total thrust at which a band with stresses of its own buckles, as a beam; none where those stresses twist it of themselves.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="bias">Extra tension at the tooth edge, linear across the body (wheel tilt, back crown); negative when the edge is slacker, as when it is hot.</param>
    /// <param name="rolled">Stress that rolling left at both edges, as for <see cref="RollStiffening"/>.</param>
    /// <param name="terms">N, sine terms in each of sideways movement and twist.</param>
    /// <remarks>
    /// Least positive root of K c = P B c, K with the block C₀ = diag(αₙ² S/2) σ_bias Z between sideways movement and twist and with
    /// G J + Tg r² + σ_e t b³/30 in the twist; Z = t b²/6, α = nπ/S; K, B and other symbols as for <see cref="LateralBuckling"/>, without the prebuckling term.
    /// By Cholesky of K and all eigenvalues of L⁻¹ B L⁻ᵀ. Range: the tooth edge must have some tension (σ + σ_bias + σ_e above zero), else it throws.
    /// </remarks>
    /// <source key="derived" where="energy of a tied band under edge thrust; reference figures of an independent program, band stability specification 3.5"/>
    public static Force CriticalThrust(GuidedBand b, Stress bias, Stress rolled = default, int terms = 12)
    {
        LateralBuckling.CheckTerms(terms);
        BandSection s = BandSection.Of(b);
        double extra = RollStiffening(rolled, b.Thickness, new Length(s.b));
        FrontEdge.CheckBias(s, new Stress(bias.Pascals + rolled.Pascals));
        var ritz = new RitzTerms(s, new InPlane(s), terms, prebuckling: false, new double[RitzTerms.Room(terms)]);
        double turn = bias.Pascals * s.t * s.b * s.b / 6;
        var K = Matrix<double>.Build.Dense(2 * terms, 2 * terms);
        var B = Matrix<double>.Build.Dense(2 * terms, 2 * terms);
        for (int i = 0; i < terms; i++)
        {
            double alpha = (i + 1) * Math.PI / s.S, weight = alpha * alpha * s.S / 2;
            K[i, i] = ritz.ku[i];
            K[terms + i, terms + i] = ritz.kp[i] + (weight * extra);
            K[i, terms + i] = K[terms + i, i] = weight * turn;
            for (int j = 0; j < terms; j++)
            {
                B[i, terms + j] = B[terms + j, i] = ritz.C[(i * terms) + j];
                B[terms + i, terms + j] = s.e * ritz.Q[(i * terms) + j];
            }
        }

        return new Force(LeastRoot(K, B));
    }

    /// <summary>Least positive P of K c = P B c; 0 where K itself is not stable, without limit where no thrust buckles it.</summary>
    private static double LeastRoot(Matrix<double> K, Matrix<double> B)
    {
        // Each row and column is scaled by its own stiffness, so that metres and radians compare.
        double[] scale = [.. K.Diagonal().Select(k => 1 / Math.Sqrt(k))];
        if (!Array.TrueForAll(scale, double.IsFinite))
        {
            return 0;
        }

        var D = Matrix<double>.Build.DenseOfDiagonalArray(scale);
        Matrix<double> stiffness = D * K * D;
        if (stiffness.Evd(Symmetricity.Symmetric).EigenValues.Real().Minimum() <= 0)
        {
            return 0;
        }

        Matrix<double> L = stiffness.Cholesky().Factor, half = L.Solve(D * B * D), standard = L.Solve(half.Transpose());
        double mu = ((standard + standard.Transpose()) / 2).Evd(Symmetricity.Symmetric).EigenValues.Real().Maximum();
        return mu > 0 ? 1 / mu : double.PositiveInfinity;
    }
}

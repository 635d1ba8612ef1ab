using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The thrust at which a tensioned band lies over and twists between its guides, as a beam.</summary>
public static class LateralBuckling
{
    /// <summary>Most sine terms that are taken.</summary>
    public const int MostTerms = 60;

    /// <summary>Gives the total thrust, over all teeth in the cut, at which the band buckles sideways and twists.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="terms">N, sine terms in each of sideways movement and twist. 8 are enough for a cut of at least a sixth of the span.</param>
    /// <param name="prebuckling">True to take in the curvature the thrust itself gives the band in its own plane.</param>
    /// <param name="bias">Extra tension at the tooth edge, linear across the body (wheel tilt, back crown); negative when the edge is slacker.</param>
    /// <remarks>
    /// Least P with δ²V = 0, where
    /// V = ½∫[E Iy u″² + Tg u′² + (G J + Tg r²) φ′² + E Iw φ″²]dx + ∫M φ u″ dx − ½∫q e φ² dx − ½∫M²/(E Iz) φ² dx − ∫σ_bias Z φ u″ dx,
    /// u = Σ aₙ sin(nπx/S), φ = Σ bₙ sin(nπx/S); the last term only with <paramref name="prebuckling"/>.
    /// For any b: P = 2k/(B + √(B² + 4 A k)), y = C b, A = Σyᵢ²/kuᵢ + bᵀZ b, B = e bᵀQ b, k = Σkpᵢ bᵢ²; an upper bound, lowered by
    /// b ← [P e Q b + P²(Cᵀ ku⁻¹ y + Z b)]/kp until it stands.
    /// Symbols: u sideways movement m, φ twist rad, M moment in the band's plane by the thrust N m (tied beam), q = P/h N/m on the cut,
    /// e = w − (w − g)/2 lever of the tooth tip m, E Iy, G J, E Iw bending, torsion and warping stiffness, r² = (b² + t²)/12 m²,
    /// Tg pull that straightens the band N: T, less ρ A v² on a locked saw; Z = t b²/6 section modulus m³.
    /// With a bias, C₀ = diag(α²S/2) σ_bias Z joins in: (P C − C₀) stands for P C in the coupling. A bias that twists the band of itself gives none.
    /// Range: elastic straight band, cut between the guides. Within 2 % to 50 mm width; for wider or short stout bands
    /// <see cref="PlateBuckling"/> is lower and rules. No help from the walls of the kerf. Impossible input throws.
    /// The torsion constant of a thin rectangle is quoted from memory (Timoshenko and Goodier).
    /// </remarks>
    /// <source key="derived" where="energy of a tied band under edge thrust; checked by an independent finite-element program, band stability specification 3"/>
    /// <source key="pahlitzsch-puttkammer-1974" where="critical total feed force by energy and series; abstracts"/>
    /// <source key="timoshenko-gere" where="ch. 6, the beam without tension; from memory"/>
    /// <source key="timoshenko-goodier" where="torsion constant; from memory"/>
    public static Force CriticalThrust(GuidedBand b, int terms = 12, bool prebuckling = true, Stress bias = default)
    {
        CheckTerms(terms);
        BandSection s = BandSection.Of(b);
        FrontEdge.CheckBias(s, bias);
        return new Force(Critical(s, new InPlane(s), terms, prebuckling, bias.Pascals));
    }

    internal static void CheckTerms(int terms)
    {
        if (terms is < 1 or > MostTerms)
        {
            throw new ArgumentOutOfRangeException(nameof(terms), "The buckling load is worked out with 1 to 60 sine terms.");
        }
    }

    internal static double Critical(in BandSection s, in InPlane plane, int terms, bool prebuckling, double sigma_bias = 0)
    {
        int size = RitzTerms.Room(terms) + (5 * terms);
        Span<double> room = size <= 1024 ? stackalloc double[size] : new double[size];
        var ritz = new RitzTerms(s, plane, terms, prebuckling, room[(5 * terms)..]);
        double turn = sigma_bias * s.t * s.b * s.b / 6 * s.S / 2, step = Math.PI / s.S;
        return Descend(ritz, turn * step * step, room[..(5 * terms)]);
    }

    /// <summary>The fixed point of the Rayleigh quotient, from one half-wave of twist. The n-th term of the bias is c0 n².</summary>
    private static double Descend(in RitzTerms ritz, double c0, Span<double> room)
    {
        const int MostPasses = 200;
        const double Settled = 1e-9;
        int n = ritz.N;
        Span<double> b = room[..n], y = room.Slice(n, n), cy = room.Slice(2 * n, n), qb = room.Slice(3 * n, n), zb = room.Slice(4 * n, n);
        b.Clear();
        zb.Clear();
        b[0] = 1;
        double last = double.PositiveInfinity;
        for (int pass = 0; pass < MostPasses; pass++)
        {
            Multiply(ritz.C, b, y);
            Multiply(ritz.Q, b, qb);
            if (!ritz.Z.IsEmpty)
            {
                Multiply(ritz.Z, b, zb);
            }

            double A = 0, B = 0, k = 0;
            for (int i = 0; i < n; i++)
            {
                double fixedTurn = c0 * (i + 1) * (i + 1) * b[i];
                A += (y[i] * y[i] / ritz.ku[i]) + (b[i] * zb[i]);
                B += (ritz.e * b[i] * qb[i]) - (2 * y[i] * fixedTurn / ritz.ku[i]);
                k += (ritz.kp[i] * b[i] * b[i]) - (fixedTurn * fixedTurn / ritz.ku[i]);
            }

            if (k <= 0)
            {
                return 0;
            }

            double root = Math.Sqrt((B * B) + (4 * A * k)), P = B >= 0 ? 2 * k / (B + root) : (root - B) / (2 * A);
            if (Math.Abs(last - P) <= Settled * P)
            {
                return P;
            }

            last = P;
            for (int i = 0; i < n; i++)
            {
                y[i] = ((P * y[i]) - (c0 * (i + 1) * (i + 1) * b[i])) / ritz.ku[i];
            }

            Transposed(ritz.C, y, cy);
            double largest = 0;
            for (int i = 0; i < n; i++)
            {
                b[i] = ((P * ritz.e * qb[i]) + (P * cy[i]) - (c0 * (i + 1) * (i + 1) * y[i]) + (P * P * zb[i])) / ritz.kp[i];
                largest = Math.Max(largest, Math.Abs(b[i]));
            }

            for (int i = 0; i < n; i++)
            {
                b[i] /= largest;
            }
        }

        return last;
    }

    private static void Multiply(ReadOnlySpan<double> matrix, ReadOnlySpan<double> vector, Span<double> product)
    {
        int n = vector.Length;
        for (int i = 0; i < product.Length; i++)
        {
            ReadOnlySpan<double> row = matrix.Slice(i * n, n);
            double sum = 0;
            for (int j = 0; j < row.Length; j++)
            {
                sum += row[j] * vector[j];
            }

            product[i] = sum;
        }
    }

    private static void Transposed(ReadOnlySpan<double> matrix, ReadOnlySpan<double> vector, Span<double> product)
    {
        int n = vector.Length;
        product.Clear();
        for (int i = 0; i < n; i++)
        {
            ReadOnlySpan<double> row = matrix.Slice(i * n, n);
            double factor = vector[i];
            for (int j = 0; j < row.Length; j++)
            {
                product[j] += factor * row[j];
            }
        }
    }
}

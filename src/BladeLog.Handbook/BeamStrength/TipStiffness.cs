using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.BeamStrength.Hyperbolic;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>How stiffly the band holds its tooth tips against a force from the side.</summary>
public static class TipStiffness
{
    private const int PointTerms = 24, CutTerms = 20;

    /// <summary>Gives the stiffness against a side force on one tooth tip at the middle of the cut, with a thrust on the cut. What a bench test measures.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="thrust">P, total over all teeth in the cut.</param>
    /// <remarks>
    /// 1/k = δ₀ + [δ_N(P) − δ_N(0)], δ_N(P) = fᵀ[K − P B]⁻¹f, f = [sₙ(xc); e sₙ(xc)], N = 24;
    /// δ₀ = tie(E Iy, Tg) + e² tie(E Iw, G J + Tg r²),
    /// tie(EI, T) = {x(S − x)/S − sinh(κx) sinh(κ(S − x))/(κ sinh κS)}/T, κ = √(T/EI).
    /// Symbols as for <see cref="LateralBuckling"/>. Range: thrust from none; at or above the buckling thrust of the beam (without the
    /// prebuckling term) it is nothing. Teeth are rigid.
    /// </remarks>
    /// <source key="derived" where="exact at rest, series under thrust; checked by an independent finite-element program, band stability specification 5.1"/>
    /// <source key="lehmann-1993" where="abstract: what tip stiffness means for the cut"/>
    public static Stiffness AtPoint(GuidedBand b, Force thrust)
    {
        BandSection s = BandSection.Of(b);
        double P = Thrust(thrust), x = s.xc, S = s.S;
        Span<double> f = stackalloc double[PointTerms];
        for (int i = 0; i < f.Length; i++)
        {
            f[i] = Math.Sin((i + 1) * Math.PI * x / S);
        }

        double delta = Tie(s.EIy, s.Tg, x, S) + (s.e * s.e * Tie(s.EIw, s.GJt, x, S));
        if (P > 0)
        {
            delta += Give(s, f, P);
            for (int i = 0; i < f.Length; i++)
            {
                double a = (i + 1) * Math.PI / S, a2 = a * a;
                delta -= f[i] * f[i] * ((1 / ((s.EIy * a2) + s.Tg)) + (s.e * s.e / (s.GJt + (s.EIw * a2)))) * 2 / (S * a2);
            }
        }

        return new Stiffness(double.IsFinite(delta) ? 1 / delta : 0);
    }

    /// <summary>Gives the stiffness against a side force spread over the tips in the cut, by their mean movement, with a thrust on the cut.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="thrust">P, total over all teeth in the cut.</param>
    /// <remarks>
    /// 1/k = fᵀ[K − P B]⁻¹f, f = [fₙ; e fₙ], fₙ = (cos αx₁ − cos αx₂)/(αh), α = nπ/S, N = 20. Symbols and range as for <see cref="AtPoint"/>;
    /// 1.3 to 2 times stiffer than a single tip.
    /// </remarks>
    /// <source key="derived" where="series; checked by an independent finite-element program, band stability specification 5.1"/>
    public static Stiffness OverCut(GuidedBand b, Force thrust)
    {
        BandSection s = BandSection.Of(b);
        Span<double> f = stackalloc double[CutTerms];
        for (int i = 0; i < f.Length; i++)
        {
            double alpha = (i + 1) * Math.PI / s.S;
            f[i] = Math.Sin(alpha * s.xc) * Sinc(alpha * s.h / 2);
        }

        double delta = Give(s, f, Thrust(thrust));
        return new Stiffness(double.IsFinite(delta) ? 1 / delta : 0);
    }

    /// <summary>Movement of the tips per unit of side force in the series; without limit at and above buckling.</summary>
    private static double Give(in BandSection s, ReadOnlySpan<double> f, double P)
    {
        int n = f.Length;
        double give = 0;
        Span<double> room = new double[RitzTerms.Room(n) + (2 * n) + (n * n)];
        var ritz = new RitzTerms(s, new InPlane(s), n, prebuckling: false, room);
        Span<double> right = room.Slice(room.Length - (n * n) - (2 * n), n), twist = room.Slice(room.Length - (n * n) - n, n);
        Span<double> matrix = room[(room.Length - (n * n))..];

        // The sideways terms are eliminated: their stiffness is diagonal and positive, so what is left is positive definite just below buckling.
        for (int i = 0; i < n; i++)
        {
            give += f[i] * f[i] / ritz.ku[i];
            right[i] = s.e * f[i];
            for (int j = 0; j < n; j++)
            {
                right[i] += P * ritz.C[(j * n) + i] * f[j] / ritz.ku[j];
            }
        }

        for (int i = 0; i < n; i++)
        {
            for (int j = 0; j <= i; j++)
            {
                double sum = 0;
                for (int k = 0; k < n; k++)
                {
                    sum += ritz.C[(k * n) + i] * ritz.C[(k * n) + j] / ritz.ku[k];
                }

                matrix[(i * n) + j] = (i == j ? ritz.kp[i] : 0) - (P * s.e * ritz.Q[(i * n) + j]) - (P * P * sum);
            }
        }

        if (!Cholesky.Factor(matrix, n))
        {
            return double.PositiveInfinity;
        }

        right.CopyTo(twist);
        Cholesky.Solve(matrix, twist);
        for (int i = 0; i < n; i++)
        {
            give += right[i] * twist[i];
        }

        return give;
    }

    /// <summary>Movement at x per unit of force there of a simply held beam under a pull.</summary>
    internal static double Tie(double EI, double pull, double x, double S)
    {
        double kappa = Math.Sqrt(pull / EI);
        return ((x * (S - x) / S) - (SinhSinhOverSinh(kappa * x, kappa * (S - x), kappa * S) / kappa)) / pull;
    }

    internal static double Thrust(Force thrust)
    {
        if (!(thrust.Newtons >= 0 && double.IsFinite(thrust.Newtons)))
        {
            throw new ArgumentOutOfRangeException(nameof(thrust), "The thrust must not be negative.");
        }

        return thrust.Newtons;
    }
}

using BladeLog.Handbook.Quantities;
using MathNet.Numerics.LinearAlgebra;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The thrust at which a wide band buckles, its section free to bend across the width.</summary>
public static class PlateBuckling
{
    private const int MostLengthTerms = 24, MostWidthTerms = 8;

    /// <summary>Gives the total thrust, over all teeth in the cut, at which the band buckles as a plate.</summary>
    /// <param name="b">The band and its cut.</param>
    /// <param name="lengthTerms">N, sine terms along the span.</param>
    /// <param name="widthTerms">K, highest Legendre polynomial across the body; 1 gives back the beam.</param>
    /// <remarks>
    /// Least positive root of K c = P B c for W = ΣΣ cₙₖ sin(nπx/S) Pₖ(2y/b), with the plate's bending stiffness D = E t³/(12(1 − ν²)),
    /// the tension, and the membrane stresses of the tied beam under the thrust (bending, shear, edge load; the tooth as a stub of length g).
    /// b = w − g body width m, t thickness m, S guide span m, ν Poisson's ratio.
    /// Range: w/S up to about 0.5; beyond it the beam's stress field is itself only approximate. With N = 8, K = 4 within 0.4 % of its
    /// own limit on usual spans, 2.6 % at half; a cut shorter than an eighth of the span needs N = 20. Terms outside 1 to 24 and 1 to 8 throw.
    /// </remarks>
    /// <source key="derived" where="plate energy with Legendre polynomials; checked by numerical quadrature, band stability specification 4"/>
    /// <source key="lengoc-1990" where="abstract: wide bands need the plate"/>
    public static Force CriticalThrust(GuidedBand b, int lengthTerms = 8, int widthTerms = 4)
    {
        if (lengthTerms is < 1 or > MostLengthTerms)
        {
            throw new ArgumentOutOfRangeException(nameof(lengthTerms), "The plate is worked out with 1 to 24 terms along the span.");
        }

        if (widthTerms is < 1 or > MostWidthTerms)
        {
            throw new ArgumentOutOfRangeException(nameof(widthTerms), "The plate is worked out with 1 to 8 terms across the width.");
        }

        BandSection s = BandSection.Of(b);
        return new Force(Critical(s, new InPlane(s), lengthTerms, widthTerms));
    }

    /// <summary>Terms along the span that resolve the cut: a short cut on a wide thin band dents it locally.</summary>
    internal static int TermsFor(in BandSection s) => s.h >= s.S / 8 ? 8 : 20;

    internal static double Critical(in BandSection s, in InPlane plane, int N, int K = 4)
    {
        int m = K + 1, size = N * m;
        WidthShapes shapes = WidthShapes.To(K);
        double[] stiffness = Stiffness(s, shapes, N, m), load = Load(s, plane, shapes, N, m);
        return Power(stiffness, load, N, m) ?? Dense(stiffness, load, N, m, size);
    }

    /// <summary>The same without the iteration, ten times slower; the measure of it in the tests.</summary>
    internal static double ByEigenvalues(in BandSection s, in InPlane plane, int N = 8, int K = 4)
    {
        int m = K + 1;
        WidthShapes shapes = WidthShapes.To(K);
        return Dense(Stiffness(s, shapes, N, m), Load(s, plane, shapes, N, m), N, m, N * m);
    }

    /// <summary>Stiffness blocks, one m × m block for each sine term.</summary>
    private static double[] Stiffness(in BandSection s, WidthShapes w, int N, int m)
    {
        double D = s.E * s.t * s.t * s.t / (12 * (1 - (s.nu * s.nu))), hb = s.b / 2;
        double[] blocks = new double[N * m * m];
        for (int n = 0; n < N; n++)
        {
            double alpha = (n + 1) * Math.PI / s.S, a2 = alpha * alpha;
            for (int k = 0; k < m; k++)
            {
                for (int l = 0; l < m; l++)
                {
                    int c = (k * m) + l;
                    double bending = (a2 * a2 * hb * w.A00[c]) + (w.A22[c] / (hb * hb * hb))
                        - (s.nu * a2 * (w.A02[c] + w.A02[(l * m) + k]) / hb)
                        + (2 * (1 - s.nu) * a2 * w.A11[c] / hb);
                    blocks[(n * m * m) + c] = s.S / 2 * ((D * bending) + (s.Tg / s.b * a2 * hb * w.A00[c]));
                }
            }
        }

        return blocks;
    }

    /// <summary>Work of the membrane stresses of unit thrust.</summary>
    private static double[] Load(in BandSection s, in InPlane plane, WidthShapes w, int N, int m)
    {
        int size = N * m;
        Span<double> q = stackalloc double[(2 * N) + 1], mc = stackalloc double[(2 * N) + 1], sd = stackalloc double[(2 * N) + 1];
        RitzTerms.Load(s, q);
        plane.Cosines(q, mc);
        double step = Math.PI / s.S, hb = s.b / 2;
        for (int k = 0; k < sd.Length; k++)
        {
            sd[k] = -k * step * mc[k];
        }

        double[] load = new double[size * size];
        for (int i = 1; i <= N; i++)
        {
            for (int j = 1; j <= N; j++)
            {
                double ai = i * step, aj = j * step;
                int apart = Math.Abs(i - j), sum = i + j;
                double signed = j >= i ? sd[apart] : -sd[apart];
                double MX = ai * aj * (mc[apart] + mc[sum]) / 2;
                double DX = ai * (sd[sum] + signed) / 2, DXt = aj * (sd[sum] - signed) / 2;
                double QX = (q[apart] - q[sum]) / 2;
                double bend = MX * 6 / (s.b * s.b) * hb, shear = 1.5 / s.b, edge = QX / hb, stub = QX * s.g / (hb * hb);
                for (int k = 0; k < m; k++)
                {
                    int row = ((((i - 1) * m) + k) * size) + ((j - 1) * m);
                    for (int l = 0; l < m; l++)
                    {
                        int c = (k * m) + l;
                        load[row + l] = (bend * w.H[c]) + (shear * ((DX * w.R[c]) + (DXt * w.R[(l * m) + k])))
                            + (edge * w.V[c]) + (stub * w.E1[k] * w.E1[l]);
                    }
                }
            }
        }

        return load;
    }

    /// <summary>Power iteration c ← K⁻¹ B c from one half-wave of movement and twist; null when it does not settle on a positive root.</summary>
    private static double? Power(double[] stiffness, double[] load, int N, int m)
    {
        const int MostPasses = 100;
        int size = N * m;
        double[] factors = (double[])stiffness.Clone();
        for (int n = 0; n < N; n++)
        {
            if (!Cholesky.Factor(factors.AsSpan(n * m * m, m * m), m))
            {
                return null;
            }
        }

        Span<double> c = stackalloc double[size], y = stackalloc double[size];
        c.Clear();
        c[0] = c[1] = 1;
        double last = 0;
        for (int pass = 0; pass < MostPasses; pass++)
        {
            double work = 0, energy = 0;
            for (int r = 0; r < size; r++)
            {
                ReadOnlySpan<double> row = load.AsSpan(r * size, size);
                double sum = 0;
                for (int j = 0; j < row.Length; j++)
                {
                    sum += row[j] * c[j];
                }

                y[r] = sum;
                work += sum * c[r];
            }

            for (int n = 0; n < N; n++)
            {
                ReadOnlySpan<double> block = stiffness.AsSpan(n * m * m, m * m);
                for (int k = 0; k < m; k++)
                {
                    double sum = 0;
                    for (int l = 0; l < m; l++)
                    {
                        sum += block[(k * m) + l] * c[(n * m) + l];
                    }

                    energy += sum * c[(n * m) + k];
                }
            }

            double P = energy / work;
            if (P > 0 && Math.Abs(P - last) <= 1e-8 * P)
            {
                return P;
            }

            last = P;
            double largest = 0;
            for (int n = 0; n < N; n++)
            {
                Cholesky.Solve(factors.AsSpan(n * m * m, m * m), y.Slice(n * m, m));
            }

            for (int r = 0; r < size; r++)
            {
                largest = Math.Max(largest, Math.Abs(y[r]));
            }

            for (int r = 0; r < size; r++)
            {
                c[r] = y[r] / largest;
            }
        }

        return null;
    }

    /// <summary>All roots by a dense symmetric solver; the largest 1/P is the least positive P.</summary>
    private static double Dense(double[] stiffness, double[] load, int N, int m, int size)
    {
        var K = Matrix<double>.Build.Dense(size, size);
        for (int n = 0; n < N; n++)
        {
            for (int c = 0; c < m * m; c++)
            {
                K[(n * m) + (c / m), (n * m) + (c % m)] = stiffness[(n * m * m) + c];
            }
        }

        Matrix<double> L = K.Cholesky().Factor, B = Matrix<double>.Build.DenseOfRowMajor(size, size, load);
        Matrix<double> half = L.Solve(B), standard = L.Solve(half.Transpose());
        return 1 / ((standard + standard.Transpose()) / 2).Evd(Symmetricity.Symmetric).EigenValues.Real().Maximum();
    }
}

using System.Collections.Concurrent;
using MathNet.Numerics.Integration;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>Integrals over the body width of Legendre polynomials P₀ … P_K of η = 2y/b; row-major, (K + 1) square. Exact by Gauss-Legendre.</summary>
internal sealed class WidthShapes
{
    private static readonly ConcurrentDictionary<int, WidthShapes> Known = new();

    /// <summary>∫PₖPₗ, ∫Pₖ′Pₗ′, ∫PₖPₗ″, ∫Pₖ″Pₗ″, ∫ηPₖPₗ, ∫(1 − η²)PₖPₗ′, ∫(½ + ¾η − ¼η³)Pₖ′Pₗ′.</summary>
    public readonly double[] A00, A11, A02, A22, H, R, V;

    /// <summary>Pₖ′(1) = k(k + 1)/2.</summary>
    public readonly double[] E1;

    public static WidthShapes To(int K) => Known.GetOrAdd(K, k => new WidthShapes(k));

    private WidthShapes(int K)
    {
        int m = K + 1;
        A00 = new double[m * m];
        A11 = new double[m * m];
        A02 = new double[m * m];
        A22 = new double[m * m];
        H = new double[m * m];
        R = new double[m * m];
        V = new double[m * m];
        E1 = new double[m];
        for (int k = 0; k < m; k++)
        {
            E1[k] = k * (k + 1) / 2.0;
        }

        var rule = new GaussLegendreRule(-1, 1, 12);
        double[] p = new double[m], d = new double[m], dd = new double[m];
        for (int point = 0; point < 12; point++)
        {
            double x = rule.Abscissas[point], weight = rule.Weights[point];
            Legendre(x, p, d, dd);
            for (int k = 0; k < m; k++)
            {
                for (int l = 0; l < m; l++)
                {
                    int c = (k * m) + l;
                    A00[c] += weight * p[k] * p[l];
                    A11[c] += weight * d[k] * d[l];
                    A02[c] += weight * p[k] * dd[l];
                    A22[c] += weight * dd[k] * dd[l];
                    H[c] += weight * x * p[k] * p[l];
                    R[c] += weight * (1 - (x * x)) * p[k] * d[l];
                    V[c] += weight * (0.5 + (0.75 * x) - (0.25 * x * x * x)) * d[k] * d[l];
                }
            }
        }
    }

    /// <summary>Values and first two derivatives by the three-term recurrence.</summary>
    private static void Legendre(double x, double[] p, double[] d, double[] dd)
    {
        p[0] = 1;
        p[1] = x;
        d[0] = dd[0] = dd[1] = 0;
        d[1] = 1;
        for (int k = 2; k < p.Length; k++)
        {
            p[k] = (((2 * k) - 1) * x * p[k - 1] / k) - ((k - 1) * p[k - 2] / k);
            d[k] = d[k - 2] + (((2 * k) - 1) * p[k - 1]);
            dd[k] = dd[k - 2] + (((2 * k) - 1) * d[k - 1]);
        }
    }
}

using MathNet.Numerics.Integration;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>The sine-series form of the band: u = Σ aₙ sin(nπx/S) sideways, φ = Σ bₙ sin(nπx/S) twist.
/// Stiffnesses ku and kp, coupling C by the in-plane moment, load Q at the tooth edge, prebuckling Z; all closed form but Z.</summary>
internal readonly ref struct RitzTerms
{
    private const int Points = 12;
    private static readonly (double[] X, double[] W) Gauss = Rule();

    public readonly int N;
    public readonly double e;
    public readonly Span<double> ku, kp, C, Q, Z;

    /// <summary>Doubles the caller must lend for n terms.</summary>
    public static int Room(int n) => (2 * n) + (3 * n * n) + (2 * ((2 * n) + 1));

    public RitzTerms(in BandSection s, in InPlane plane, int n, bool prebuckling, Span<double> room)
    {
        N = n;
        e = s.e;
        int cells = n * n, at = 0;
        ku = Take(room, ref at, n);
        kp = Take(room, ref at, n);
        C = Take(room, ref at, cells);
        Q = Take(room, ref at, cells);
        Z = prebuckling ? Take(room, ref at, cells) : default;
        Span<double> q = Take(room, ref at, (2 * n) + 1), mc = Take(room, ref at, (2 * n) + 1);

        Load(s, q);
        plane.Cosines(q, mc);
        double half = s.S / 2;
        for (int i = 0; i < n; i++)
        {
            double alpha = (i + 1) * Math.PI / s.S, a2 = alpha * alpha;
            ku[i] = half * ((s.EIy * a2) + s.Tg) * a2;
            kp[i] = half * (s.GJt + (s.EIw * a2)) * a2;
            for (int j = 0; j < n; j++)
            {
                int apart = Math.Abs(i - j), sum = i + j + 2;
                C[(i * n) + j] = a2 * (mc[apart] - mc[sum]) / 2;
                Q[(i * n) + j] = (q[apart] - q[sum]) / 2;
            }
        }

        if (prebuckling)
        {
            Prebuckling(s, plane, Z, n);
        }
    }

    /// <summary>Mean of cos(kπx/S) over the cut.</summary>
    public static void Load(in BandSection s, Span<double> q)
    {
        double centre = Math.PI * s.xc / s.S, half = Math.PI * s.h / (2 * s.S);
        for (int k = 0; k < q.Length; k++)
        {
            q[k] = Math.Cos(k * centre) * Hyperbolic.Sinc(k * half);
        }
    }

    /// <summary>Z = ∫ m² sᵢ sⱼ dx / (E Iz), by Gauss-Legendre on the three stretches between which m is smooth.</summary>
    private static void Prebuckling(in BandSection s, in InPlane plane, Span<double> Z, int n)
    {
        Z.Clear();
        Span<double> sine = stackalloc double[n];
        Span<double> ends = [0, s.x1, s.x2, s.S];
        double scale = 1 / (s.E * s.Iz);
        for (int stretch = 0; stretch < 3; stretch++)
        {
            double half = (ends[stretch + 1] - ends[stretch]) / 2, middle = (ends[stretch + 1] + ends[stretch]) / 2;
            if (half <= 0)
            {
                continue;
            }

            for (int p = 0; p < Points; p++)
            {
                double x = middle + (half * Gauss.X[p]), m = plane.At(x);
                Sines(Math.PI * x / s.S, sine);
                double weight = Gauss.W[p] * half * m * m * scale;
                for (int i = 0; i < n; i++)
                {
                    double wi = weight * sine[i];
                    Span<double> row = Z.Slice(i * n, n);
                    for (int j = i; j < row.Length; j++)
                    {
                        row[j] += wi * sine[j];
                    }
                }
            }
        }

        for (int i = 0; i < n; i++)
        {
            for (int j = 0; j < i; j++)
            {
                Z[(i * n) + j] = Z[(j * n) + i];
            }
        }
    }

    /// <summary>sin θ, sin 2θ, … by the three-term recurrence.</summary>
    private static void Sines(double theta, Span<double> sine)
    {
        double twice = 2 * Math.Cos(theta), before = 0, now = Math.Sin(theta);
        for (int i = 0; i < sine.Length; i++)
        {
            sine[i] = now;
            (before, now) = (now, (twice * now) - before);
        }
    }

    private static Span<double> Take(Span<double> room, scoped ref int at, int count)
    {
        Span<double> part = room.Slice(at, count);
        at += count;
        return part;
    }

    private static (double[] X, double[] W) Rule()
    {
        var rule = new GaussLegendreRule(-1, 1, Points);
        return (rule.Abscissas, rule.Weights);
    }
}

using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Wear;

/// <summary>How a fresh edge first breaks in.</summary>
/// <param name="Growth">δr, rounding gained by running in.</param>
/// <param name="PathKm">x_r, path over which it comes, km.</param>
public sealed record RunIn(Length Growth, double PathKm)
{
    /// <summary>4 µm over 0.5 km (engineering default).</summary>
    public static RunIn Default { get; } = new(Length.FromMicrometres(4), 0.5);
}

/// <summary>How the cutting edge rounds off with the wood it has gone through.</summary>
public static class EdgeRadius
{
    /// <summary>Edge radius after a path of wood per tooth.</summary>
    /// <remarks>r = r₀ + δr·(1 − exp(−x/x_r)) + w·x. r₀ fresh radius, m; δr = 4 µm and x_r = 0.5 km run-in; w wear, µm per equivalent km; x = Σ m_w·m_d·S, equivalent km.
    /// Linear growth after run-in; not checked beyond 80 µm.</remarks>
    /// <source key="engineering-default" where="run-in and rates; linear growth from saw-teeth texts, from memory"/>
    public static Length After(Length fresh, double wearPerKm_um, double pathKm, RunIn? runIn = null)
    {
        double r_0 = Require.NotNegative(fresh.Micrometres, "fresh edge radius");
        double w = Require.NotNegative(wearPerKm_um, "wear rate");
        double x = Require.NotNegative(pathKm, "wood path");
        (double dr, double x_r) = Unwrap(runIn);
        return Length.FromMicrometres(r_0 + dr * (1 - Math.Exp(-x / x_r)) + w * x);
    }

    /// <summary>The path at which an edge reaches a radius, equivalent km.</summary>
    /// <remarks>The root x of r₀ + δr·(1 − exp(−x/x_r)) + w·x = r; zero if r ≤ r₀. w above zero, µm/km. The inverse of <see cref="After"/>.</remarks>
    /// <source key="derived" where="edge law solved for the path"/>
    public static double PathTo(Length radius, Length fresh, double wearPerKm_um, RunIn? runIn = null)
    {
        double r = Require.NotNegative(radius.Micrometres, "edge radius");
        double r_0 = Require.NotNegative(fresh.Micrometres, "fresh edge radius");
        double w = Require.Positive(wearPerKm_um, "wear rate");
        (double dr, double x_r) = Unwrap(runIn);
        if (r <= r_0)
        {
            return 0;
        }

        // The law rises and is concave, so Newton from the left end never passes the root.
        double x = 0;
        for (int i = 0; i < 200; i++)
        {
            double missing = r - (r_0 + dr * (1 - Math.Exp(-x / x_r)) + w * x);
            double step = missing / (w + dr / x_r * Math.Exp(-x / x_r));
            x += step;
            if (Math.Abs(step) <= 1e-14 * x)
            {
                break;
            }
        }

        return x;
    }

    /// <summary>Path in equivalent km: what the wear law counts.</summary>
    /// <remarks>x = m_w·m_d·S/1000. S wood path per tooth, m; m_w wear of the wood against a clean medium one; m_d dirt.</remarks>
    /// <source key="engineering-default" where="class and dirt factors"/>
    public static double EquivalentKm(Length woodPath, double woodFactor, double dirtFactor)
    {
        double S = Require.NotNegative(woodPath.Metres, "wood path");
        double m_w = Require.Positive(woodFactor, "wear factor of the wood");
        double m_d = Require.Positive(dirtFactor, "dirt factor");
        return m_w * m_d * S / 1000;
    }

    private static (double dr, double x_r) Unwrap(RunIn? runIn)
    {
        RunIn run = runIn ?? RunIn.Default;
        return (Require.NotNegative(run.Growth.Micrometres, "run-in"), Require.Positive(run.PathKm, "run-in path"));
    }
}

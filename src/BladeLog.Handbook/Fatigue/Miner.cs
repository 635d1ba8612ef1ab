using BladeLog.Handbook.Band;

namespace BladeLog.Handbook.Fatigue;

/// <summary>Adding up used life over saws and over the two places where a band breaks, and the scatter about it.</summary>
public static class Miner
{
    /// <summary>The life used by bends at several levels.</summary>
    /// <remarks>U = Σ n/N. n bends done, zero or above; N median bends to a crack at that level, above zero, may be endless. U = 1: half of such blades have broken.</remarks>
    /// <source key="miner-1945" where="linear damage sum; from memory"/>
    public static double Used(IEnumerable<(double Bends, double MedianBends)> levels)
    {
        ArgumentNullException.ThrowIfNull(levels);
        double U = 0;
        foreach ((double n, double N) in levels)
        {
            Require.NotNegative(n, nameof(levels), "number of bends");
            if (!(N > 0))
            {
                throw new ArgumentOutOfRangeException(nameof(levels), N, "The median bends must be a number above zero.");
            }

            U += n / N;
        }

        return U;
    }

    /// <summary>The life used of a blade that breaks at the gullet or at the weld, whichever comes first.</summary>
    /// <remarks>U = (U_g^β + U_w^β)^(1/β). U zero or above; β Weibull shape, above zero. Both sites have median life at U = 1.</remarks>
    /// <source key="derived" where="two Weibull lives of one shape in series"/>
    public static double SystemUsed(double gulletUsed, double weldUsed, double shape)
    {
        double Ug = Require.NotNegative(gulletUsed, nameof(gulletUsed), "used life of the gullets");
        double Uw = Require.NotNegative(weldUsed, nameof(weldUsed), "used life of the weld");
        double beta = Require.Positive(shape, nameof(shape), "Weibull shape");
        double most = Math.Max(Ug, Uw);
        return most == 0 ? 0 : most * Math.Pow(Math.Pow(Ug / most, beta) + Math.Pow(Uw / most, beta), 1 / beta);
    }

    /// <summary>The median life of a blade that breaks at the gullet or at the weld, whichever comes first.</summary>
    /// <remarks>N = (N_g^−β + N_w^−β)^(−1/β). N median lives, above zero, may be endless; β Weibull shape, above zero.</remarks>
    /// <source key="derived" where="two Weibull lives of one shape in series"/>
    public static double SystemMedian(double gulletMedian, double weldMedian, double shape)
    {
        double beta = Require.Positive(shape, nameof(shape), "Weibull shape");
        if (!(gulletMedian > 0) || !(weldMedian > 0))
        {
            throw new ArgumentOutOfRangeException(nameof(gulletMedian), Math.Min(gulletMedian, weldMedian), "The median lives must be above zero.");
        }

        double weaker = Math.Min(gulletMedian, weldMedian);
        // Rounding of the two reciprocals must not lift the blade's life over that of its weaker place.
        return double.IsPositiveInfinity(weaker) ? weaker : Math.Min(weaker, 1 / SystemUsed(1 / gulletMedian, 1 / weldMedian, beta));
    }

    /// <summary>The life by which one in ten has broken, as a share of the median life.</summary>
    /// <remarks>(−ln 0.9 / ln 2)^(1/β). β Weibull shape, above zero. Scatter alone: one in ten if the median is exactly right.</remarks>
    /// <source key="derived" where="quantiles of the Weibull distribution"/>
    public static double TenthPercentileFactor(double shape)
    {
        double beta = Require.Positive(shape, nameof(shape), "Weibull shape");
        return Math.Pow(-Math.Log(0.9) / Math.Log(2), 1 / beta);
    }

    /// <summary>The share of blades broken by a used life, if the median is exactly right.</summary>
    /// <remarks>F = 1 − 2^(−U^β). U used life, zero or above; β Weibull shape, above zero.</remarks>
    /// <source key="derived" where="Weibull distribution with its median at U = 1"/>
    public static double ShareBroken(double used, double shape)
    {
        double U = Require.NotNegative(used, nameof(used), "used life");
        double beta = Require.Positive(shape, nameof(shape), "Weibull shape");
        return 1 - Math.Exp(-Math.Log(2) * Math.Pow(U, beta));
    }

    /// <summary>The Weibull scale (63.2 of 100 broken) as a multiple of the median.</summary>
    /// <remarks>η = 1/(ln 2)^(1/β). β Weibull shape, above zero.</remarks>
    /// <source key="derived" where="quantiles of the Weibull distribution"/>
    public static double ScaleFactor(double shape)
    {
        double beta = Require.Positive(shape, nameof(shape), "Weibull shape");
        return 1 / Math.Pow(Math.Log(2), 1 / beta);
    }

    /// <summary>The Weibull shape whose life scatters as much as a standard deviation of log₁₀ life.</summary>
    /// <remarks>β = π/(√6 ln 10 · s) = 0.557005/s. s standard deviation of log₁₀ N, above zero.</remarks>
    /// <source key="derived" where="variance of the logarithm of a Weibull variable"/>
    public static double ShapeFromScatter(double logTenDeviation)
    {
        double s = Require.Positive(logTenDeviation, nameof(logTenDeviation), "scatter of the life");
        return Math.PI / (Math.Sqrt(6) * Math.Log(10) * s);
    }
}

using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>How often a point of the band goes round and how often it is bent.</summary>
public static class LoopCycles
{
    /// <summary>Turns of the loop in a second.</summary>
    /// <remarks>v / L. v band speed, m/s, zero or above; L loop length, m.</remarks>
    /// <source key="derived" where="path over speed"/>
    public static double LoopsPerSecond(Speed bandSpeed, Length loop)
    {
        double v = Require.NotNegative(bandSpeed, nameof(bandSpeed), "band speed");
        double L = Require.Positive(loop, nameof(loop), "loop length");
        return v / L;
    }

    /// <summary>Bends of every point of the band in an hour of running.</summary>
    /// <remarks>
    /// 3600 n v / L. n number of wheels, one or more; v, m/s; L, m. Every hour with the band running counts:
    /// running idle bends the band as much as cutting does.
    /// </remarks>
    /// <source key="derived" where="one bend for each wheel in each turn of the loop"/>
    public static double BendsPerHour(int wheels, Speed bandSpeed, Length loop)
    {
        double n = Require.Positive(wheels, nameof(wheels), "number of wheels");
        return 3600 * n * LoopsPerSecond(bandSpeed, loop);
    }
}

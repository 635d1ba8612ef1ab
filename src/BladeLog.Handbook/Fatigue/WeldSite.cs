using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>The weld of the loop as a second place where the band can break.</summary>
public static class WeldSite
{
    /// <summary>The strength of the weld as a share of the plain body's.</summary>
    /// <remarks>0.75 dressed and tempered, 0.60 doubtful or an unknown repair, 0.85 the best. Both stress factors at the weld are 1 over it.</remarks>
    /// <source key="engineering-default" where="no cycle counts of welded band could be read; kubit-2021 shows the spread of welded strip"/>
    public static double StrengthFactor(WeldQuality weld) => weld switch
    {
        WeldQuality.Good => 0.75,
        WeldQuality.Doubtful => 0.60,
        WeldQuality.Best => 0.85,
        _ => throw new ArgumentOutOfRangeException(nameof(weld), weld, "The weld is good, doubtful or best."),
    };

    /// <summary>The hardness of the tempered weld zone.</summary>
    /// <remarks>The smaller of the body's hardness and 40 HRC.</remarks>
    /// <source key="engineering-default" where="tempered weld zone"/>
    public static double Hrc(double bodyHrc) => Math.Min(bodyHrc, 40);
}

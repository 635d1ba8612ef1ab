using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>How the gullet was made or left.</summary>
public enum GulletFinish
{
    /// <summary>Ground clean.</summary>
    Ground,

    /// <summary>Punched or with a burred edge: taken as machined.</summary>
    Punched,
}

/// <summary>What a surface that is worse than polished costs in strength.</summary>
public static class Surface
{
    /// <summary>The surface factor at the knee of the stress-life line.</summary>
    /// <remarks>
    /// C_s = a S_u^b, at most 1, S_u in MPa: ground a = 1.58, b = −0.085; machined or cold drawn a = 4.51, b = −0.265.
    /// Rusty: times 0.7, an engineering default.
    /// </remarks>
    /// <source key="noll-lipson-1946" where="as the surface table of shigley (table 6-2) prints it"/>
    public static double Factor(GulletFinish finish, Stress tensileStrength, bool rusty = false)
    {
        double Su = Require.Positive(tensileStrength, nameof(tensileStrength), "tensile strength") / 1e6;
        (double a, double b) = finish switch
        {
            GulletFinish.Ground => (1.58, -0.085),
            GulletFinish.Punched => (4.51, -0.265),
            _ => throw new ArgumentOutOfRangeException(nameof(finish), finish, "The gullet is ground or punched."),
        };
        return Math.Min(1, a * Math.Pow(Su, b)) * (rusty ? 0.7 : 1);
    }
}

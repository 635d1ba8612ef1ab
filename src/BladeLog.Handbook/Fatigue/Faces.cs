using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>The life that one turn of the loop uses at the gullets, on each face of the band.</summary>
/// <param name="Outer">On the face that lies away from the wheels and is stretched by them.</param>
/// <param name="Inner">On the face that lies on the wheels and is pressed together by them.</param>
public readonly record struct FaceDamage(double Outer, double Inner);

/// <summary>The two faces of a band, which change places when it is turned inside out.</summary>
public static class Faces
{
    /// <summary>The life that one turn of the loop uses on each face, at the gullets.</summary>
    /// <remarks>
    /// Outer: σ_T → σ_T + σ_b, inner: σ_T → σ_T − σ_b on each wheel, with K_ft and K_fb; cycles by rainflow, σ_ar by Walker with the ends held between
    /// the yield points, damage Σ 1/N(σ_ar). Range and refusals as for <see cref="BandLife.Of"/>. Over one wheel after another to the same side
    /// the inner face never governs.
    /// </remarks>
    /// <source key="astm-e1049" where="section 5.4.5, repeating histories"/>
    /// <source key="dowling-2009" where="Walker equation and its exponent"/>
    /// <source key="miner-1945" where="linear damage sum; from memory"/>
    public static FaceDamage PerLoop(BandCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        BandLife.Check(c);
        Stress running = Band.Tension.Running(c.Tension, Band.Tension.Support(c.System), c.Steel.Density, c.BandSpeed);
        Stress[] bending = [.. c.Wheels.Select(D => BendingStress.OverWheel(c.Thickness, D, c.Steel.YoungsModulus))];
        SiteMaterial body = SiteMaterial.Of(c, c.BodyHrc);
        double Damage(bool outer)
        {
            (StressCycle[] wheels, StressCycle[] beside) = LoopHistory.Gullet(c, running, bending, outer).Cycles();
            return wheels.Concat(beside).Sum(cycle => 1 / body.Curve.Cycles(body.Equivalent(cycle)));
        }

        return new FaceDamage(Damage(outer: true), Damage(outer: false));
    }

    /// <summary>The life used at the gullets of a band that ran part of its time turned inside out: that of the worse face.</summary>
    /// <remarks>
    /// U = max(n d_o + n′ d_i, n d_i + n′ d_o). n turns of the loop as it came, n′ turned inside out, zero or above; d_o, d_i damage for each turn on the outer and
    /// the inner face. The same saw and tension in both.
    /// </remarks>
    /// <source key="miner-1945" where="linear damage sum on each face; from memory"/>
    public static double Used(FaceDamage perLoop, double loopsAsItCame, double loopsTurned)
    {
        double n = Require.NotNegative(loopsAsItCame, nameof(loopsAsItCame), "number of turns as it came");
        double turned = Require.NotNegative(loopsTurned, nameof(loopsTurned), "number of turns inside out");
        return Math.Max(n * perLoop.Outer + turned * perLoop.Inner, n * perLoop.Inner + turned * perLoop.Outer);
    }
}

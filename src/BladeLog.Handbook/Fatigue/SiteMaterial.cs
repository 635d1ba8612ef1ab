using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Fatigue;

/// <summary>One cycle at a place on the band, in Pa.</summary>
internal readonly record struct StressCycle(double Greatest, double Amplitude);

/// <summary>What the steel at one place on the band stands.</summary>
internal sealed record SiteMaterial(double Yield, double WalkerExponent, SnCurve Curve)
{
    /// <summary>Yield point as a share of tensile strength: an engineering default.</summary>
    private const double YieldShare = 0.9;

    public static SiteMaterial Of(BandCase c, double hrc)
    {
        double HB = Hardness.Brinell(hrc);
        Stress Su = Hardness.TensileStrength(HB);
        double Cs = Surface.Factor(c.Finish, Su, c.Rusty);
        SnCurve curve = new(Basquin.RoessleFatemi(HB).WithSurface(Cs, c.KneeBends), c.KneeBends);
        return new SiteMaterial(YieldShare * Su.Pascals, MeanStress.WalkerExponent(Su), curve);
    }

    /// <summary>The fully reversed amplitude of a cycle, its ends held between the yield points.</summary>
    public Stress Equivalent(StressCycle c)
    {
        double smax = Math.Min(Math.Max(c.Greatest, 2 * c.Amplitude - Yield), Yield);
        smax = c.Amplitude > Yield ? c.Amplitude : smax;
        return MeanStress.Walker(new Stress(smax), new Stress(c.Amplitude), WalkerExponent);
    }
}

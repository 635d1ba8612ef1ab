using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>The force equation solved for the feed and for the edge radius.</summary>
public static partial class CuttingForce
{
    /// <summary>The feed at which the cut takes a given power at the band.</summary>
    /// <remarks>X = P·p/(H·v·K); c = (X − (h_R + e_m)·w_e)/k, e_m = η(r − r_s)⁺; where that is in the no-chip range c·k/w_e &lt; λr,
    /// c = X/(k·(1 + (h_R + e_m)/(λr))). f = c·v/p. The inverse of <see cref="CuttingPower"/>.</remarks>
    /// <source key="derived" where="equivalent-thickness form solved for the bite"/>
    public static Speed FeedAtPower(CutCase c, Power limit)
    {
        Terms x = Terms.Of(c);
        double X = Require.NotNegative(limit.Watts, "power limit") * x.p / (x.H * x.v * x.K);
        double b = (X - x.MainEdge * x.w_e) / x.k;
        if (b * x.k / x.w_e < x.lambda_r)
        {
            b = X / (x.k * (1 + x.MainEdge / x.lambda_r));
        }

        return new Speed(b * x.v / x.p);
    }

    /// <summary>The least feed at which the thrust reaches a limit; null where no feed reaches it.</summary>
    /// <remarks>Y = F·p/(H·K); peak = λr·w_e·T + (h_R·T + e_t)·w_e, the thrust where the chip begins. Below the peak c = Y/(k·(T + (h_R·T + e_t)/(λr))); else, if T ≤ 0,
    /// there is no limit: the chip pulls; else c = (Y − (h_R·T + e_t)·w_e)/(k·T). f = c·v/p. The inverse of <see cref="Thrust"/>.</remarks>
    /// <source key="derived" where="equivalent-thickness form solved for the bite"/>
    public static Speed? FeedAtThrust(CutCase c, Force limit)
    {
        Terms x = Terms.Of(c);
        double Y = Require.NotNegative(limit.Newtons, "thrust limit") * x.p / (x.H * x.K);
        double peak = x.lambda_r * x.w_e * x.T + x.ThrustEdge * x.w_e;
        double b;
        if (Y < peak)
        {
            b = Y / (x.k * (x.T + x.ThrustEdge / x.lambda_r));
        }
        else if (x.T <= 0)
        {
            return null;
        }
        else
        {
            b = (Y - x.ThrustEdge * x.w_e) / (x.k * x.T);
        }

        return new Speed(b * x.v / x.p);
    }

    /// <summary>The edge radius at which a cut at a fixed feed takes a given power: when to sharpen.</summary>
    /// <remarks>r = r_s + (P/(v·z·K) − c·k − h_R·w_e)/(η·w_e) while a chip forms (c_e ≥ λr), else the root of the faded form. Zero: even a fresh edge is over the
    /// limit. Null: rounding alone never reaches it.</remarks>
    /// <source key="derived" where="equivalent-thickness form solved for the edge radius"/>
    public static Length? EdgeRadiusAtPower(CutCase c, Speed feed, Power limit)
    {
        Terms x = Terms.Of(c);
        double b = Kinematics.BitePerTooth(feed, c.Pitch, c.BandSpeed).Metres;
        double target = Require.NotNegative(limit.Watts, "power limit") / (x.v * x.z * x.K);
        double h_R = ReferenceThickness(c.Rake, c.Model).Metres;
        return RadiusFor((target - b * x.k) / x.w_e, h_R, c.Model.Eta, b * x.k / x.w_e, c.Model);
    }

    /// <summary>The edge radius at which the thrust of a cut at a fixed feed reaches a limit: when to sharpen.</summary>
    /// <remarks>r = r_s + (F/(z·K) − (c·k + h_R·w_e)·T − e₀·w_e)/(ξ·η·w_e) while a chip forms (c_e ≥ λr), else the root of the faded form. Zero: even a fresh edge is
    /// over the limit. Null: rounding alone never reaches it.</remarks>
    /// <source key="derived" where="equivalent-thickness form solved for the edge radius"/>
    public static Length? EdgeRadiusAtThrust(CutCase c, Speed feed, Force limit)
    {
        Terms x = Terms.Of(c);
        double b = Kinematics.BitePerTooth(feed, c.Pitch, c.BandSpeed).Metres;
        double target = Require.NotNegative(limit.Newtons, "thrust limit") / (x.z * x.K);
        double sharp = ReferenceThickness(c.Rake, c.Model).Metres * x.T + c.Model.ThrustOffset.Metres;
        return RadiusFor((target - b * x.k * x.T) / x.w_e, sharp, c.Model.Xi * c.Model.Eta, b * x.k / x.w_e, c.Model);
    }

    /// <summary>Solves min(1, c_e/(λr))·(sharp + slope·(r − r_s)) = target for r ≥ r_s.</summary>
    private static Length? RadiusFor(double target, double sharp, double slope, double c_e, CutModel m)
    {
        double r_s = m.ReferenceRadius.Metres;
        double r_1 = Math.Max(r_s, c_e / m.Lambda); // beyond it the edge terms fade
        double fade = c_e / (m.Lambda * r_1);
        double atReference = Math.Min(1, c_e / (m.Lambda * r_s)) * sharp;
        if (target < atReference)
        {
            return new Length(0);
        }

        double r = r_s + (target - sharp) / slope;
        if (r <= r_1 && fade >= 1)
        {
            return new Length(r);
        }

        // Faded: c_e/λ·(slope + (sharp − slope·r_s)/r) = target, which only grows with r where sharp < slope·r_s.
        double a = target * m.Lambda / c_e - slope;
        double rest = sharp - slope * r_s;
        return c_e > 0 && rest < 0 && a < 0 && rest / a > r_1 ? new Length(rest / a) : null;
    }
}

using static BladeLog.Handbook.BeamStrength.Hyperbolic;

namespace BladeLog.Handbook.BeamStrength;

/// <summary>Bending moment of the band in its own plane, per unit of total thrust: a beam that is also a tie.
/// E Iz Y'''' − T Y'' = q, so M'' − β² M = −q, with M = 0 (or no slope) where the back is carried.</summary>
internal readonly struct InPlane
{
    private readonly double beta, L, x1, x2, xc, h, shift, S;

    /// <summary>Fixing moments at the two ends of the carried length; 0 when the ends may turn.</summary>
    public readonly double Ma, Mb;

    public InPlane(in BandSection s)
    {
        beta = s.beta;
        shift = s.below;
        S = s.S;
        L = s.below + s.S + s.above;
        x1 = shift + s.x1;
        x2 = shift + s.x2;
        xc = (x1 + x2) / 2;
        h = x2 - x1;
        Ma = Mb = 0;
        if (s.clamped)
        {
            (Ma, Mb) = FixingMoments();
        }
    }

    /// <summary>m at x above the lower guide.</summary>
    public double At(double xAboveGuide)
    {
        double x = xAboveGuide + shift, bL = beta * L, load;
        if (x <= x1)
        {
            load = 2 * SinhSinhSinhOverSinh(beta * x, beta * (L - xc), beta * h / 2, bL);
        }
        else if (x >= x2)
        {
            load = 2 * SinhSinhSinhOverSinh(beta * (L - x), beta * xc, beta * h / 2, bL);
        }
        else
        {
            // The cut is taken in two parts, on either side of x; every term is positive, so nothing cancels.
            load = 2 * (SinhSinhSinhOverSinh(beta * (L - x), beta * (x + x1) / 2, beta * (x - x1) / 2, bL)
                + SinhSinhSinhOverSinh(beta * x, beta * (L - ((x + x2) / 2)), beta * (x2 - x) / 2, bL));
        }

        double m = load / (beta * beta * h);
        return Ma == 0 && Mb == 0 ? m : m - (Ma * SinhOverSinh(beta * (L - x), bL)) - (Mb * SinhOverSinh(beta * x, bL));
    }

    /// <summary>Slope of m at the lower guide.</summary>
    public double SlopeLow() =>
        (2 * CoshSinhSinh(shift, L - xc) / (beta * h))
        + (Ma * beta * CoshOverSinh(beta * (L - shift), beta * L)) - (Mb * beta * CoshOverSinh(beta * shift, beta * L));

    /// <summary>Slope of m at the upper guide.</summary>
    public double SlopeHigh() =>
        (-2 * CoshSinhSinh(L - shift - S, xc) / (beta * h))
        + (Ma * beta * CoshOverSinh(beta * (L - shift - S), beta * L)) - (Mb * beta * CoshOverSinh(beta * (shift + S), beta * L));

    /// <summary>Where m is greatest, above the lower guide; always inside the cut.</summary>
    public double Peak()
    {
        double scale = beta * beta * h;
        double low = (Fall(beta * x1) / 2) + (scale * Ma * Math.Exp(-beta * x1));
        double high = (Fall(beta * (L - x2)) / 2) + (scale * Mb * Math.Exp(-beta * (L - x2)));
        double up = low - (high * Math.Exp(-2 * beta * xc));
        double down = high - (low * Math.Exp(-2 * beta * (L - xc)));
        double x = xc + (Math.Log(up / down) / (2 * beta));
        return Math.Clamp(double.IsFinite(x) ? x : xc, x1, x2) - shift;
    }

    /// <summary>∫ m cos(kπx/S) dx over the span, for k = 0 to last; q holds the same integrals of the load.</summary>
    public void Cosines(ReadOnlySpan<double> q, Span<double> mc)
    {
        double low = SlopeLow(), high = SlopeHigh(), beta2 = beta * beta, step = Math.PI / S;
        for (int k = 0; k < mc.Length; k++)
        {
            double a = k * step;
            mc[k] = (q[k] + ((k & 1) == 0 ? high : -high) - low) / ((a * a) + beta2);
        }

        if (beta * S < 1e-3)
        {
            double x = xc - shift;
            mc[0] = (x * (S - x) / 2) - (h * h / 24) + ((At(0) + At(S)) * S / 2);
        }
    }

    private double CoshSinhSinh(double p, double q)
    {
        double a = beta * p, c = beta * q, d = beta * h / 2, s = beta * L;
        return Math.Exp(a + c + d - s) * Fall(a) * Rise(c) * Rise(d) / (4 * Rise(s));
    }

    /// <summary>End moments that keep both ends from turning.</summary>
    private (double Low, double High) FixingMoments()
    {
        double s = beta * L, a = xc, B = L - xc;
        if (s < 1e-3)
        {
            // Untied: the point-load moments c(L − c)²/L² averaged over the cut.
            double part = h * h / 12;
            return (((a * B * B) + (part * (a - (2 * B)))) / (L * L), ((B * a * a) + (part * (B - (2 * a)))) / (L * L));
        }

        double near, far;
        if (s < 0.05)
        {
            double s2 = s * s;
            near = s2 * ((1.0 / 3) - (s2 / 45) + (s2 * s2 * 2 / 945)) / L;
            far = s2 * ((1.0 / 6) - (s2 * 7 / 360) + (s2 * s2 * 31 / 15120)) / L;
        }
        else
        {
            near = (beta / Math.Tanh(s)) - (1 / L);
            far = (1 / L) - (2 * beta * Math.Exp(-s) / Rise(s));
        }

        double turnLow = (B / L) - (2 * SinhSinhOverSinh(beta * B, beta * h / 2, s) / (beta * h));
        double turnHigh = (a / L) - (2 * SinhSinhOverSinh(beta * a, beta * h / 2, s) / (beta * h));
        double det = (near * near) - (far * far);
        return (((near * turnLow) - (far * turnHigh)) / det, ((near * turnHigh) - (far * turnLow)) / det);
    }
}

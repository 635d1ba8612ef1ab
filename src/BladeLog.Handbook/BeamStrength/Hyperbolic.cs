namespace BladeLog.Handbook.BeamStrength;

/// <summary>Quotients of hyperbolic functions that neither overflow for a long slender band nor cancel for a short stout one.</summary>
internal static class Hyperbolic
{
    /// <summary>1 − e^(−2x) for x ≥ 0.</summary>
    public static double Rise(double x) => x < 1 ? 2 * Math.Exp(-x) * Math.Sinh(x) : 1 - Math.Exp(-2 * x);

    /// <summary>1 + e^(−2x) for x ≥ 0.</summary>
    public static double Fall(double x) => 1 + Math.Exp(-2 * x);

    /// <summary>sinh p / sinh s, p ≤ s.</summary>
    public static double SinhOverSinh(double p, double s) => Math.Exp(p - s) * Rise(p) / Rise(s);

    /// <summary>cosh p / sinh s, p ≤ s.</summary>
    public static double CoshOverSinh(double p, double s) => Math.Exp(p - s) * Fall(p) / Rise(s);

    /// <summary>sinh p · sinh q / sinh s, p + q ≤ s.</summary>
    public static double SinhSinhOverSinh(double p, double q, double s) => Math.Exp(p + q - s) * Rise(p) * Rise(q) / (2 * Rise(s));

    /// <summary>cosh p · sinh q / sinh s, p + q ≤ s.</summary>
    public static double CoshSinhOverSinh(double p, double q, double s) => Math.Exp(p + q - s) * Fall(p) * Rise(q) / (2 * Rise(s));

    /// <summary>sinh p · sinh q · sinh r / sinh s, p + q + r ≤ s.</summary>
    public static double SinhSinhSinhOverSinh(double p, double q, double r, double s) =>
        Math.Exp(p + q + r - s) * Rise(p) * Rise(q) * Rise(r) / (4 * Rise(s));

    /// <summary>sin x / x.</summary>
    public static double Sinc(double x) => Math.Abs(x) < 1e-6 ? 1 - (x * x / 6) : Math.Sin(x) / x;
}

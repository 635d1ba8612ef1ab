using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>Kerf, set and side clearance.</summary>
public static class Kerf
{
    /// <summary>Kerf where the shop has not measured it.</summary>
    /// <remarks>k = 1.8 t for set teeth (0.40 t a side), 2.0 t for swaged and tipped ones. t body, m.</remarks>
    /// <source key="engineering-default" where="kerf where none is measured"/>
    public static Length Default(Length thickness, TipKind tip)
    {
        double t = Require.Positive(thickness.Metres, "blade thickness");
        return new Length((tip == TipKind.Set ? 1.8 : 2.0) * t);
    }

    /// <summary>Side clearance; for set teeth the set on each side.</summary>
    /// <remarks>s = (k − t)/2. k kerf, m; t body, m.</remarks>
    /// <source key="derived" where="geometry of the kerf"/>
    public static Length SetPerSide(Length kerf, Length thickness)
    {
        double k = Require.Positive(kerf.Metres, "kerf");
        double t = Require.Positive(thickness.Metres, "blade thickness");
        Require.Within(k, t, double.MaxValue, "The kerf cannot be narrower than the body of the blade.");
        return new Length((k - t) / 2);
    }

    /// <summary>Set left after grinding the tips back.</summary>
    /// <remarks>s_n = s₀·(1 − n·g/h_s). s₀ set when new or last set, m; n grinds; g taken off the tip each time, m; h_s height of the bend below the tip, m. Zero once the
    /// bend is ground away.</remarks>
    /// <source key="derived" where="a tooth bent on a line below its tip"/>
    public static Length SetAfter(Length set, double grinds, Length offEachTime, Length bendBelowTip)
    {
        double s_0 = Require.Positive(set.Metres, "set");
        double n = Require.NotNegative(grinds, "number of grinds");
        double g = Require.NotNegative(offEachTime.Metres, "stock ground off");
        double h_s = Require.Positive(bendBelowTip.Metres, "height of the bend");
        return new Length(s_0 * Math.Max(0, 1 - n * g / h_s));
    }

    /// <summary>Is it time to set the teeth again?</summary>
    /// <remarks>s &lt; 0.8 s₀, which comes every 2 to 3 grinds. s set now, m; s₀ set when last set, m.</remarks>
    /// <source key="common-practice" where="set again at least every third sharpening"/>
    public static bool NeedsSetting(Length setNow, Length setWhenLastSet) =>
        Require.NotNegative(setNow.Metres, "set") < 0.8 * Require.Positive(setWhenLastSet.Metres, "set");

    /// <summary>Alternate set so wide that it nears the uncut core.</summary>
    /// <remarks>s &gt; 0.45 t; at s &gt; t/2 a core stays uncut. A raker set may exceed it. s set a side, m; t body, m.</remarks>
    /// <source key="derived" where="lanes of alternate set across the kerf"/>
    public static bool SetTooWide(Length set, Length thickness, SetPattern pattern) =>
        pattern == SetPattern.Alternate && Require.NotNegative(set.Metres, "set") > 0.45 * Require.Positive(thickness.Metres, "blade thickness");

    /// <summary>Chip of the outer lanes of the kerf, where not every tooth cuts.</summary>
    /// <remarks>2c for alternate set, 3c for raker set, c for swaged and tipped teeth. c bite, m.</remarks>
    /// <source key="derived" where="lanes of a set tooth across the kerf"/>
    public static Length OuterLaneBite(Length bite, SetPattern pattern) =>
        new(Require.NotNegative(bite.Metres, "bite") * pattern switch
        {
            SetPattern.Alternate => 2,
            SetPattern.Raker => 3,
            _ => 1,
        });

    /// <summary>Least kerf of ground tips before the body rubs.</summary>
    /// <remarks>k_min = t + 2·s_min, s_min = 0.10 mm in dry wood, 0.15 mm in green. t body, m.</remarks>
    /// <source key="engineering-default" where="least side clearance of tipped teeth"/>
    public static Length LeastForTips(Length thickness, bool green) =>
        new(Require.Positive(thickness.Metres, "blade thickness") + 2 * (green ? 0.15e-3 : 0.10e-3));

    /// <summary>The set a side to aim at when setting.</summary>
    /// <remarks>Share of the body thickness: dry hardwood 0.30, dry softwood 0.35, green hardwood 0.40, green softwood 0.45, curves 0.45. Geometric limit 0.5 for alternate
    /// set. t body, m.</remarks>
    /// <source key="common-practice" where="set by wood and moisture; hand-saw tradition is 0.25"/>
    public static Length SetToAimAt(Length thickness, bool hardwood, bool green, bool curves) =>
        new(Require.Positive(thickness.Metres, "blade thickness") * (curves ? 0.45 : (hardwood, green) switch
        {
            (true, false) => 0.30,
            (false, false) => 0.35,
            (true, true) => 0.40,
            (false, true) => 0.45,
        }));

    /// <summary>Bite over side clearance, dimensionless: whether the dust can slip past the body.</summary>
    /// <remarks>c/s. c bite, m; s side clearance, m. A warning only on power-fed mills with c above 0.10 mm; every hand-fed cut lies far below 1.</remarks>
    /// <source key="from-memory" where="sawmill texts: bite no less than the side clearance"/>
    public static double SpillRatio(Length bite, Length sideClearance) =>
        Require.NotNegative(bite.Metres, "bite") / Require.Positive(sideClearance.Metres, "side clearance");

    /// <summary>Does dust slip out of the gullets past the body?</summary>
    /// <remarks>c/s &lt; 1 on a power-fed mill with c &gt; 0.10 mm; never by hand. c bite, m; s side clearance, m.</remarks>
    /// <source key="from-memory" where="sawmill texts: bite no less than the side clearance"/>
    public static bool Spills(Length bite, Length sideClearance, bool powerFed) =>
        powerFed && bite.Millimetres > 0.10 && SpillRatio(bite, sideClearance) < 1;

    /// <summary>Whole grinds until the teeth want setting again.</summary>
    /// <remarks>n = ⌊0.2 h_s/g⌋ + 1, the first n at which s_n = s₀·(1 − n·g/h_s) is less than 0.8 s₀. h_s height of the bend below the tip, m; g taken off the tip each
    /// time, m, above zero.</remarks>
    /// <source key="derived" where="set after grinding solved for the count; 0.8 of it is common practice"/>
    public static double GrindsToSetting(Length offEachTime, Length bendBelowTip)
    {
        double g = Require.Positive(offEachTime.Metres, "stock ground off");
        double h_s = Require.Positive(bendBelowTip.Metres, "height of the bend");
        // A share that is a whole number of grinds must not lose one to rounding.
        return Math.Floor(0.2 * h_s / g + 1e-9) + 1;
    }
}

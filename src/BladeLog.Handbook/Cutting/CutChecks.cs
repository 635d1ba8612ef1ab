using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>Where the force model holds: impossible input is refused, unproven input is cautioned.</summary>
public static class CutChecks
{
    /// <summary>Sentences for input that can exist but lies outside what the force model was checked on.</summary>
    /// <remarks>Checked: v 3 to 60 m/s; f 0.01 to 90 m/min; p 1 to 75 mm; d 0.15 p to 0.7 p; H 2 to 1,500 mm; k − t ≤ t for set teeth; g −5° to 35°;
    /// ρ₁₂ 200 to 1,300 kg/m³; moisture 4 to 200 %; r 3 to 120 µm; c 0.003 to 1.5 mm. An empty list means all inside.</remarks>
    /// <source key="engineering-default" where="range of the checks of the force model"/>
    public static IReadOnlyList<string> Cautions(CutCase c, Speed? feed = null)
    {
        Refuse(c);
        List<string> said = [];
        void Outside(double value, double low, double high, string sentence)
        {
            // A hair of slack keeps a value typed at the edge in other units from tripping the caution.
            if (value < low * (1 - 1e-9) || value > high * (1 + 1e-9))
            {
                said.Add(sentence);
            }
        }

        Outside(c.BandSpeed.MetresPerSecond, 3, 60, "The band speed lies outside 3 to 60 m/s, where the force model was checked.");
        Outside(c.Pitch.Millimetres, 1, 75, "The pitch lies outside 1 to 75 mm, where the force model was checked.");
        Outside(c.GulletDepth.Metres / c.Pitch.Metres, 0.15, 0.7, "The gullet depth is usually 0.15 to 0.7 of the pitch: check both.");
        Outside(c.CutHeight.Millimetres, 2, 1500, "The cut height lies outside 2 to 1,500 mm, where the force model was checked.");
        Outside(c.Density12.KilogramsPerCubicMetre, 200, 1300, "The density lies outside 200 to 1,300 kg/m³: is this wood?");
        Outside(c.MoisturePercent, 4, 200, "The moisture lies outside 4 to 200 %: check the figure.");
        Outside(c.EdgeRadius.Micrometres, 3, 120, "The edge radius lies outside 3 to 120 µm, where the force model was checked.");
        if (c.Rake.Degrees is < -5.000001 or > 35.000001)
        {
            said.Add("The hook lies outside -5 to 35 degrees, where the force model was checked.");
        }

        if (c.Kerf.Metres <= c.Thickness.Metres)
        {
            said.Add("The kerf is no wider than the body: the blade has no side clearance and will bind.");
        }

        if (c.Tip == TipKind.Set && c.Kerf.Metres - c.Thickness.Metres > c.Thickness.Metres * (1 + 1e-9))
        {
            said.Add("With alternate set this wide a core stays uncut in the middle of the kerf.");
        }

        if (CuttingForce.ThrustSlope(c) <= 0)
        {
            said.Add("With this hook the blade feeds itself and grabs thin stock.");
        }

        if (feed is { } f)
        {
            Outside(f.MetresPerMinute, 0.01, 90, "The feed lies outside 0.01 to 90 m/min, where the force model was checked.");
            Outside(Kinematics.BitePerTooth(f, c.Pitch, c.BandSpeed).Millimetres, 0.003, 1.5, "The bite lies outside 0.003 to 1.5 mm: outside the data behind the force model.");
        }

        return said;
    }

    internal static void Refuse(CutCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        double t = Require.Positive(c.Thickness.Metres, "blade thickness");
        double k = Require.Positive(c.Kerf.Metres, "kerf");
        Require.Within(k, t, double.MaxValue, "The kerf cannot be narrower than the body of the blade.");
        Require.Positive(c.Pitch.Metres, "pitch");
        Require.Positive(c.GulletDepth.Metres, "gullet depth");
        Require.Within(c.Rake.Degrees, -30, 45, "The hook must lie between -30 and 45 degrees.");
        Require.NotNegative(c.EdgeRadius.Metres, "edge radius");
        Require.Positive(c.BandSpeed.MetresPerSecond, "band speed");
        Require.Positive(c.CutHeight.Metres, "cut height");
        Require.Positive(c.Density12.KilogramsPerCubicMetre, "density");
        Require.NotNegative(c.MoisturePercent, "moisture");
    }
}

using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Cutting;

/// <summary>The tooth marks left on a sawn face.</summary>
public static class SurfaceMarks
{
    /// <summary>Distance along the feed between the marks on one face.</summary>
    /// <param name="bite">c, the bite of a tooth.</param>
    /// <param name="pattern">The order in which the teeth lean.</param>
    /// <remarks>
    /// s = n c: every tooth marks both faces where the tips are as wide as the kerf (n = 1); of alternate set every second tooth
    /// marks a face (n = 2), of left, right, straight every third (n = 3). c bite m, s spacing m. Even set is assumed: a tooth that
    /// stands out marks once a round of its pattern, or once a loop. A bite under zero throws.
    /// </remarks>
    /// <source key="derived" where="count of the teeth that reach one face"/>
    public static Length Spacing(Length bite, SetPattern pattern)
    {
        double c = Require.NotNegative(bite.Metres, "bite");
        int n = pattern switch
        {
            SetPattern.None => 1,
            SetPattern.Alternate => 2,
            SetPattern.Raker => 3,
            _ => throw new ArgumentOutOfRangeException(nameof(pattern), pattern, "The set is alternate, raker or none."),
        };
        return new Length(n * c);
    }

    /// <summary>Whether marks so far apart are seen as ripples.</summary>
    /// <param name="spacing">Distance between marks on one face.</param>
    /// <remarks>Seen from about 0.3 mm, plain from 0.5 mm; 0.3 mm is taken. Unevenness of set, ±0.05 mm in practice, often shows first.</remarks>
    /// <source key="engineering-default" where="visible from 0.3 mm between marks"/>
    public static bool Seen(Length spacing) => Require.NotNegative(spacing.Metres, "spacing") >= 0.3e-3;
}

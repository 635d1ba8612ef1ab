using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>How a tension was found; decides how far the true one may lie from it.</summary>
public enum TensionMethod
{
    /// <summary>From the pull in one strand.</summary>
    StrandForce,

    /// <summary>From the load on the movable wheel.</summary>
    WheelLoad,

    /// <summary>From the stretch of a measured length.</summary>
    Stretch,

    /// <summary>From the note of a plucked span.</summary>
    Pluck,
}

/// <summary>A tension with the band it lies in.</summary>
/// <param name="Value">The tension on the body.</param>
/// <param name="Low">Low end of the band.</param>
/// <param name="High">High end of the band.</param>
public sealed record TensionReading(Stress Value, Stress Low, Stress High)
{
    /// <summary>The tension with the band of its method.</summary>
    /// <remarks>±8 of 100 plucked, ±20 of 100 otherwise: chosen for this program, see <see cref="Tension.Uncertainty"/>.</remarks>
    public static TensionReading Of(Stress value, TensionMethod method)
    {
        double u = Tension.Uncertainty(method);
        return new TensionReading(value, new Stress(value.Pascals * (1 - u)), new Stress(value.Pascals * (1 + u)));
    }
}

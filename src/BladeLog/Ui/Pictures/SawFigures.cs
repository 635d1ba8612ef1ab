using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Ui.Pictures;

/// <summary>What is written on the large picture of a saw; what is not known stays away.</summary>
/// <param name="Body">Thickness of the blade's body, mm.</param>
/// <param name="BendStress">Bending stress over the (smaller) wheel, MPa.</param>
/// <param name="GuideSpan">Distance of the guides, mm.</param>
/// <param name="Thrust">Feed force of the next cut on the blade, N.</param>
public sealed record SawFigures(double? Body, double? BendStress, double? GuideSpan, double? Thrust)
{
    /// <summary>Where bending is hardest: the smaller wheel.</summary>
    public static WheelDrawing BendingWheel(SawDrawing drawing) =>
        drawing.Wheels.OrderBy(w => w.Radius).ThenBy(w => w.Centre.Y).First();
}

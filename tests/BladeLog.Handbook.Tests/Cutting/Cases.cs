using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using CsCheck;
using static BladeLog.Handbook.Tests.Cutting.Saws;

namespace BladeLog.Handbook.Tests.Cutting;

/// <summary>Cuts drawn at random from the whole range of the force model, thrust always against the feed.</summary>
internal static class Cases
{
    internal static Gen<CutCase> Random { get; } = Gen.Double[0, 1].Array[11].Select(u => new CutCase
    {
        Thickness = Mm(0.4 + 1.2 * u[0]),
        Kerf = Mm((0.4 + 1.2 * u[0]) * (1.2 + 0.8 * u[1])),
        Pitch = Mm(1.5 + 40 * u[2]),
        GulletDepth = Mm((1.5 + 40 * u[2]) * (0.2 + 0.3 * u[3])),
        Form = u[3] < 0.3 ? ToothForm.Regular : u[3] < 0.6 ? ToothForm.Skip : ToothForm.Hook,
        Rake = Angle.FromDegrees(-5 + 28 * u[4]),
        Tip = u[5] < 0.4 ? TipKind.Set : u[5] < 0.7 ? TipKind.Swaged : TipKind.Tipped,
        EdgeRadius = Length.FromMicrometres(3 + 100 * u[6]),
        BandSpeed = new Speed(5 + 45 * u[7]),
        CutHeight = Mm(5 + 600 * u[8]),
        Density12 = new Density(250 + 950 * u[9]),
        MoisturePercent = 5 + 80 * u[10],
        Direction = u[1] < 0.5 ? CutDirection.Rip : CutDirection.Cross,
        Frozen = u[10] > 0.8,
    });
}

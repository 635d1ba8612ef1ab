using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tests.Cutting;

/// <summary>The saws of the worked examples (independent program, cutting specification).</summary>
internal static class Saws
{
    /// <summary>Shop resaw: 16 m/s, 8.5 mm pitch, 0.6 mm body, 1.1 mm kerf, 150 mm deep, pine.</summary>
    internal static CutCase A(double edge = 10, double rake = 20, double density = 520, double moisture = 12) => new()
    {
        Thickness = Length.FromMillimetres(0.6),
        Kerf = Length.FromMillimetres(1.1),
        Pitch = Length.FromMillimetres(8.5),
        GulletDepth = Length.FromMillimetres(3.4),
        Form = ToothForm.Hook,
        Rake = Angle.FromDegrees(rake),
        Tip = TipKind.Set,
        EdgeRadius = Length.FromMicrometres(edge),
        BandSpeed = new Speed(16),
        CutHeight = Length.FromMillimetres(150),
        Density12 = new Density(density),
        MoisturePercent = moisture,
    };

    /// <summary>Narrow band mill: 25 m/s, 22 mm pitch, 300 mm deep, green pine.</summary>
    internal static CutCase MillB(double edge) => new()
    {
        Thickness = Length.FromMillimetres(1.07),
        Kerf = Length.FromMillimetres(2.0),
        Pitch = Length.FromMillimetres(22),
        GulletDepth = Length.FromMillimetres(6.4),
        Form = ToothForm.Hook,
        Rake = Angle.FromDegrees(10),
        Tip = TipKind.Set,
        EdgeRadius = Length.FromMicrometres(edge),
        BandSpeed = new Speed(25),
        CutHeight = Length.FromMillimetres(300),
        Density12 = new Density(520),
        MoisturePercent = 60,
    };

    /// <summary>A swaged tooth of 1 mm kerf, so that newtons on a tooth are N per mm of width.</summary>
    internal static CutCase OneMillimetreWide(double edge, double density = 520, double rake = 20) => A(edge, rake, density) with
    {
        Tip = TipKind.Swaged,
        Thickness = Length.FromMillimetres(0.5),
        Kerf = Length.FromMillimetres(1),
    };

    internal static Speed Feed(double metresPerMinute) => Speed.FromMetresPerMinute(metresPerMinute);

    internal static Length Mm(double mm) => Length.FromMillimetres(mm);
}

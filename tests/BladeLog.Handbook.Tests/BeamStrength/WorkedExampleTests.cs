using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

public class WorkedExampleTests
{
    [Theory]
    [InlineData(8)]
    [InlineData(12)]
    [InlineData(16)]
    [InlineData(40)]
    public void Probe(int n)
    {
        var q1 = Band(35.4, 0.9, 5, 135, 370, 300, 210) with { Steel = Steel.Carbon };
        var q21 = Band(3, 0.635, .7, 70, 54, 6, 43) with { Steel = Steel.Carbon };
        var a = ThrustLimit.Of(q1, PlateUse.Never, terms: n);
        var c = ThrustLimit.Of(q21, PlateUse.Never, terms: n);
        var q40 = ThrustLimit.Of(Band(32, 0.9, 6, 120, 380, 300, 190) with { Steel = Steel.Carbon }, PlateUse.Never, terms: n);
        var e1 = ThrustLimit.Of(Band(32, 1.07, 6, 120, 380, 300, 190) with { Steel = Steel.Carbon }, PlateUse.Never, terms: n);
        Assert.Fail(FormattableString.Invariant($"{n} {a.FrontEdge.Newtons} {a.Stop.Newtons} | {c.FrontEdge.Newtons} {c.Stop.Newtons} | {q40.Allowed.Newtons} {e1.Allowed.Newtons}"));
    }
}

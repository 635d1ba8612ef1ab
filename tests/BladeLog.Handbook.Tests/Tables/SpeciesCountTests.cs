using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;

namespace BladeLog.Handbook.Tests.Tables;

public sealed class SpeciesCountTests
{
    [Fact]
    public void At_least_twenty_woods_are_read_from_the_Wood_Handbook() =>
        Assert.True(WoodSpeciesTable.All.Count(w => w.Provenance == Provenance.Published && w.SourceKey == "wood-handbook-282") >= 20);
}

using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;

namespace BladeLog.Handbook.Tests.Tables;

public sealed class MaterialTests
{
    [Theory]
    [InlineData("oak", "European oak")]
    [InlineData("Ash", "European ash")]
    [InlineData("CHERRY", "Black cherry")]
    [InlineData("walnut", "Black walnut")]
    [InlineData("maple", "Sugar maple")]
    [InlineData("spruce", "Norway spruce")]
    [InlineData("larch", "European larch")]
    [InlineData("pine", "Scots pine")]
    [InlineData("douglas-fir", "Douglas-fir (coast)")]
    [InlineData("Douglas Fir", "Douglas-fir (coast)")]
    [InlineData("tulipwood", "Yellow-poplar")]
    [InlineData("mahogany", "True mahogany")]
    [InlineData("red oak", "Northern red oak")]
    [InlineData("rosewood", "Indian rosewood")]
    [InlineData("linden", "Lime")]
    [InlineData("birch ply", "Birch plywood")]
    [InlineData("aluminum", "Aluminium")]
    public void A_common_word_is_taken_as_one_wood_and_says_so(string typed, string name)
    {
        Material? m = MaterialTable.Find(typed, out string? takenAs);
        Assert.NotNull(m);
        Assert.Equal(name, m.Name);
        Assert.Equal(name, takenAs);
    }

    [Theory]
    [InlineData("european_oak")]
    [InlineData("European  Oak")]
    [InlineData(" european-oak ")]
    public void A_key_or_a_full_name_is_simply_found(string typed)
    {
        Material? m = MaterialTable.Find(typed, out string? takenAs);
        Assert.Equal("european_oak", m?.Key);
        Assert.Null(takenAs);
    }

    [Theory]
    [InlineData("waulnut", "Black walnut")]
    [InlineData("mapel", "Sugar maple")]
    [InlineData("chery", "Black cherry")]
    [InlineData("europaen oak", "European oak")]
    [InlineData("aluminiun", "Aluminium")]
    public void An_unknown_word_is_met_with_the_three_nearest_names(string typed, string meant)
    {
        Assert.Null(MaterialTable.Find(typed, out _));
        IReadOnlyList<string> near = MaterialTable.NearestNames(typed);
        Assert.Equal(3, near.Count);
        Assert.Equal(3, near.Distinct().Count());
        Assert.Contains(meant, near);
    }

    [Fact]
    public void An_empty_word_is_unknown() => Assert.Null(MaterialTable.Find("  ", out _));

    [Theory] // worked by hand
    [InlineData("oak", "oak", 0)]
    [InlineData("", "oak", 3)]
    [InlineData("kitten", "sitting", 3)]
    [InlineData("mapel", "maple", 1)]
    [InlineData("ash", "oak", 3)]
    public void Letters_apart(string a, string b, double count)
    {
        Assert.Equal(count, EditDistance.Between(a, b));
        Assert.Equal(count, EditDistance.Between(b, a));
    }

    [Fact]
    public void No_word_stands_for_two_materials()
    {
        var words = MaterialTable.All.SelectMany(m => m.Aliases.Append(m.Name).Append(m.Key.Replace('_', ' ')).Select(w => (Word: string.Join(' ',
            new string([.. w.ToLowerInvariant().Select(c => char.IsLetterOrDigit(c) ? c : ' ')]).Split(' ', StringSplitOptions.RemoveEmptyEntries)), m.Key)));
        Assert.All(words.GroupBy(w => w.Word), g => Assert.Single(g.Select(w => w.Key).Distinct()));
        Assert.All(MaterialTable.All, m => Assert.All(m.Aliases, a => Assert.Same(m, MaterialTable.Find(a, out _))));
    }

    [Fact]
    public void Birch_plywood_is_a_panel_and_wears_fourfold()
    {
        Material? m = MaterialTable.Find("birch plywood", out _);
        Assert.NotNull(m);
        Assert.Equal((MaterialKind.Panel, 680.0, 4.0), (m.Kind, m.Density12, m.WearFactor));
    }

    [Theory]
    [InlineData("aluminium")]
    [InlineData("steel")]
    [InlineData("acrylic")]
    [InlineData("brass")]
    public void What_is_not_wood_is_known_and_has_no_density_to_compute_with(string typed)
    {
        Material? m = MaterialTable.Find(typed, out _);
        Assert.Equal(MaterialKind.Other, m?.Kind);
        Assert.Null(m?.Density12);
    }

    [Fact]
    public void Factors_lie_inside_their_own_ranges()
    {
        Assert.All(AbrasivenessTable.All, a => Assert.True(a.Low <= a.WearFactor && a.WearFactor <= a.High));
        Assert.All(DirtTable.All, d => Assert.True(d.Low <= d.Factor && d.Factor <= d.High));
        Assert.All(ToothWearTable.All, w => Assert.True(w.Low < w.WearPerKm && w.WearPerKm < w.High));
        Assert.Throws<ArgumentOutOfRangeException>(() => AbrasivenessTable.Of("A9"));
    }

    [Theory] // the sample shop's cuts
    [InlineData(Dirt.Clean, 1)]
    [InlineData(Dirt.BarkOn, 2)]
    [InlineData(Dirt.Reclaimed, 2)]
    public void Dirt_doubles_wear(Dirt dirt, double factor) => Assert.Equal(factor, DirtTable.Of(dirt).Factor);

    [Fact]
    public void Every_tooth_material_and_body_steel_has_a_row()
    {
        Assert.All(Enum.GetValues<TipMaterial>(), t => Assert.Equal(t, ToothWearTable.Of(t).Tip));
        Assert.All(Enum.GetValues<BodySteel>(), b => Assert.Equal(b, BodySteelTable.Of(b).Steel));
        // Harder tips live longer between sharpenings, in the order the trade puts them.
        Assert.True(ToothWearTable.Of(TipMaterial.Carbide).WearPerKm < ToothWearTable.Of(TipMaterial.Bimetal).WearPerKm);
        Assert.True(ToothWearTable.Of(TipMaterial.Bimetal).WearPerKm < ToothWearTable.Of(TipMaterial.HardenedCarbon).WearPerKm);
        Assert.True(ToothWearTable.Of(TipMaterial.HardenedCarbon).WearPerKm < ToothWearTable.Of(TipMaterial.PlainSteel).WearPerKm);
    }

    [Theory] // engineering defaults
    [InlineData(BodySteel.FlexibleBack, 30, 90)]
    [InlineData(BodySteel.SpringTempered, 46, 130)]
    [InlineData(BodySteel.Bimetal, 46, 150)]
    [InlineData(BodySteel.CarbideTipped, 46, 150)]
    [InlineData(BodySteel.WideStrip, 44, 140)]
    public void Hardness_and_tension_where_the_shop_has_not_said(BodySteel steel, double hrc, double megapascals)
    {
        BodySteelDefault row = BodySteelTable.Of(steel);
        Assert.Equal((hrc, megapascals * 1e6, Provenance.EngineeringDefault), (row.HardnessHrc, row.Tension.Pascals, row.Provenance));
    }
}

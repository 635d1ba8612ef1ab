using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Quantities;
using static BladeLog.Handbook.Tests.BeamStrength.ReferenceBands;

namespace BladeLog.Handbook.Tests.BeamStrength;

/// <summary>All 26 bands of the band stability specification (independent program; tolerances wider than the printed digits only where said).</summary>
public class ReferenceBandTests
{
    public static TheoryData<string> Ids => ReferenceBands.Ids;

    [Fact]
    public void All_twenty_six_reference_bands_are_read() => Assert.Equal(26, All.Count);

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_front_edge_goes_slack_at_the_reference_thrust(string id)
    {
        Row row = Find(id);
        Near(row["P1_N"], FrontEdge.SlackThrust(row.Band).Newtons, 1e-5);
        Near(row["xmax"], FrontEdge.WeakestPoint(row.Band).Millimetres, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_pull_helps_the_front_edge_as_much_as_in_the_reference(string id)
    {
        Row row = Find(id);
        double S = row["S"], h = row["h"], xc = row["xc"], R = (S - xc) / S, plain = (R * (xc - (h / 2))) + (h * R * R / 2);
        Near(row["P1_ratio_untied"], plain / FrontEdge.GreatestMoment(row.Band).Millimetres, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_beam_buckles_at_the_reference_thrust_with_any_number_of_terms(string id)
    {
        Row row = Find(id);
        foreach (int terms in new[] { 4, 8, 12, 40 })
        {
            Near(row[$"PcrBeam_N{terms}"], LateralBuckling.CriticalThrust(row.Band, terms, prebuckling: false).Newtons, 1e-5, $"N = {terms}");
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Prebuckling_lowers_the_buckling_thrust_to_the_reference(string id)
    {
        Row row = Find(id);
        double P = LateralBuckling.CriticalThrust(row.Band).Newtons;
        Near(row["PcrBeamPB_N12"], P, 1e-5);
        Assert.True(P < row["PcrBeam_N12"]);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_plate_buckles_at_the_reference_thrust(string id)
    {
        Row row = Find(id);
        Near(row["PcrPlate_N8K4"], PlateBuckling.CriticalThrust(row.Band).Newtons, 1e-5);
        Near(row["PcrPlate_N12K6"], PlateBuckling.CriticalThrust(row.Band, 12, 6).Newtons, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_thrust_allowed_is_the_reference_thrust(string id)
    {
        Row row = Find(id);
        // The reference takes the plate value everywhere; decision 16 only for wide or stout bands.
        bool plateRules = row["w"] >= 40 || row["w"] / row["S"] > 0.2;
        ThrustLimits limits = ThrustLimit.Of(row.Band, PlateUse.Always);
        double used = plateRules ? row["Pcr_used"] : row["PcrBeamPB_N12"];
        Near(used, limits.Buckling.Newtons, 1e-5);
        Near(Math.Min(row["P1_N"], used / 2), limits.Allowed.Newtons, 1e-5);
        Near(row["PcrPlate_N8K4"], limits.PlateBuckling!.Value.Newtons, 1e-5);
        Near(row["Pallow"], limits.Allowed.Newtons, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void A_tooth_tip_is_as_stiff_as_in_the_reference(string id)
    {
        Row row = Find(id);
        var rest = new Force(0);
        var allowed = new Force(row["Pallow"]);
        Near(row["k0_pt_beam"], TipStiffness.AtPoint(row.Band, rest).NewtonsPerMillimetre, 1e-5, "one tip, no thrust");
        Near(row["k0_cut_beam"], TipStiffness.OverCut(row.Band, rest).NewtonsPerMillimetre, 1e-5, "cut, no thrust");
        Near(row["kAllow_cut_beam"], TipStiffness.OverCut(row.Band, allowed).NewtonsPerMillimetre, 1e-5, "cut, allowed thrust");
        // The reference takes 40 terms here, the program 24.
        Near(row["kAllow_pt_beam"], TipStiffness.AtPoint(row.Band, allowed).NewtonsPerMillimetre, 5e-4, "one tip, allowed thrust");
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_band_sounds_at_the_reference_frequencies(string id)
    {
        Row row = Find(id);
        Near(row["f_lat0"], BandFrequency.Lateral(row.Band).Hertz, 1e-5);
        Near(row["f_tor0"], BandFrequency.Torsional(row.Band).Hertz, 1e-5);
        GuidedBand running = row.Band with { BandSpeed = new Speed(row["v"]) };
        Near(row["f_latv"], BandFrequency.Lateral(running).Hertz, 1e-5);
        Near(row["f_torv"], BandFrequency.Torsional(running).Hertz, 1e-5);
    }
}

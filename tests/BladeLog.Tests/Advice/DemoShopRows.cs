using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

/// <summary>The invented shop as tables: saws, kinds of blades, blades, queued cuts. Millimetres, hours, minor units.</summary>
internal static class DemoShopRows
{
    internal enum DemoState
    {
        OnSaw,
        Rack,
        AtSharpener,
        Held,
        Broken,
        Retired,
        CutDown,
    }

    internal sealed record SawRow(
        string Code, string Name, double[] Wheels, double Loop, double TakeUp, double[] Speeds, double MotorKw, double WidthLeast, double WidthMost, double Pull,
        double LowerGuide, double Clearance, double Opens, Takes Takes, double Longest, double? FeederN, double? FeederMost, double Change, long BreakCost, ClassWork Class, double TiltDeg);

    internal sealed record SpecRow(
        string Code, double Width, double Body, double PitchCoarse, double PitchFine, ToothForm Form, double Hook, double Gullet, double Kerf, TipKind Tip,
        TipMaterial Material, double Hrc, long Price, long Sharpening, int? Most);

    internal sealed record BladeRow(string Tag, string Spec, string Saw, double Mpa, double Hours, int Sharpenings, double Width, double PathKm, DemoState State);

    internal sealed record CutRow(
        int Number, string Job, string Species, double Moisture, double Height, double Length, int Pieces, double? Radius, CutKind Kind, Finish Finish)
    {
        internal double BevelDeg { get; init; }

        internal Dirt Dirt { get; init; }

        internal double NailChance { get; init; }

        internal long? Timber { get; init; }

        internal bool ClassWork { get; init; }

        internal MaterialKind Material { get; init; }
    }

    internal static readonly SawRow[] Saws =
    [
        new("S1", "Old Heron", [900, 900], 5690, 30, [20.7], 5.5, 10, 50, 6600, 60, 10, 500, Takes.Beam | Takes.Board, 12, 400, 8, 12, 7500, ClassWork.No, 40),
        new("S2", "Osprey", [700, 700], 5080, 25, [23.5], 5.5, 6, 50, 5200, 50, 10, 450, Takes.Board | Takes.Resaw, 3.6, 250, 8, 8, 7500, ClassWork.No, 0),
        new("S3", "Wren", [356, 356], 2667, 12, [15.2, 7.6], 1.1, 3, 19, 800, 40, 8, 300, Takes.Board | Takes.Resaw, 2.0, null, null, 6, 4000, ClassWork.Supervised, 0),
        new("S4", "Finch", [205, 205, 205], 1425, 8, [12.0], 0.4, 3, 10, 280, 35, 6, 100, Takes.Board, 1.0, null, null, 5, 3000, ClassWork.Yes, 0),
        new("S5", "Longreach", [489, 489], 4013, 20, [25.0], 18.0, 24, 38, 4200, 40, 40, 620, Takes.Beam | Takes.Log, 6.0, 500, 20, 4, 5500, ClassWork.No, 0),
    ];

    internal static readonly SpecRow[] Specs =
    [
        new("A1", 38, 0.9, Tpi(2), Tpi(2), ToothForm.Hook, 10, 5.0, 1.45, TipKind.Set, TipMaterial.HardenedCarbon, 30, 4600, 1000, 12),
        new("A2", 25, 0.8, Tpi(3), Tpi(3), ToothForm.Hook, 10, 3.4, 1.36, TipKind.Set, TipMaterial.HardenedCarbon, 30, 3600, 900, 12),
        new("A3", 13, 0.65, Tpi(4), Tpi(4), ToothForm.Skip, 0, 1.6, 1.15, TipKind.Set, TipMaterial.HardenedCarbon, 30, 2600, 800, 12),
        new("A4", 50, 1.0, 19, 19, ToothForm.Hook, 20, 7.0, 2.00, TipKind.Swaged, TipMaterial.PlainSteel, 44, 9000, 1600, null),
        new("B1", 38, 0.9, Tpi(1.3), Tpi(1.3), ToothForm.Hook, 10, 6.5, 1.60, TipKind.Tipped, TipMaterial.Carbide, 46, 21000, 4500, 5),
        new("B2", 38, 0.9, Tpi(2), Tpi(3), ToothForm.Hook, 10, 4.2, 1.50, TipKind.Tipped, TipMaterial.Carbide, 46, 19500, 4500, 5),
        new("B3", 25, 0.9, Tpi(3), Tpi(3), ToothForm.Hook, 10, 3.4, 1.50, TipKind.Set, TipMaterial.HardenedCarbon, 30, 4100, 900, 12),
        new("B4", 19, 0.8, Tpi(3), Tpi(3), ToothForm.Hook, 10, 3.4, 1.36, TipKind.Set, TipMaterial.HardenedCarbon, 30, 3300, 900, 12),
        new("B5", 13, 0.635, Tpi(4), Tpi(4), ToothForm.Skip, 0, 1.6, 1.12, TipKind.Set, TipMaterial.HardenedCarbon, 30, 2400, 800, 12),
        new("B6", 6, 0.635, Tpi(6), Tpi(6), ToothForm.Regular, 0, 1.5, 1.10, TipKind.Set, TipMaterial.HardenedCarbon, 30, 1600, 0, 0),
        new("B7", 25, 0.65, Tpi(3), Tpi(4), ToothForm.Hook, 10, 2.7, 0.95, TipKind.Set, TipMaterial.Bimetal, 46, 7600, 1400, 6),
        new("C1", 13, 0.635, Tpi(3), Tpi(3), ToothForm.Hook, 10, 3.0, 1.10, TipKind.Set, TipMaterial.HardenedCarbon, 32, 1900, 700, 12),
        new("C2", 13, 0.5, Tpi(3), Tpi(4), ToothForm.Hook, 10, 2.7, 0.85, TipKind.Set, TipMaterial.HardenedCarbon, 32, 2000, 700, 12),
        new("C3", 10, 0.635, Tpi(4), Tpi(4), ToothForm.Skip, 0, 1.6, 1.10, TipKind.Set, TipMaterial.HardenedCarbon, 32, 1700, 700, 12),
        new("C4", 6, 0.635, Tpi(6), Tpi(6), ToothForm.Regular, 0, 1.5, 1.10, TipKind.Set, TipMaterial.HardenedCarbon, 32, 1400, 0, 0),
        new("C5", 3, 0.635, Tpi(14), Tpi(14), ToothForm.Regular, 0, 0.7, 1.05, TipKind.Set, TipMaterial.HardenedCarbon, 32, 1400, 0, 0),
        new("C6", 19, 0.8, Tpi(3), Tpi(3), ToothForm.Hook, 10, 3.4, 1.36, TipKind.Set, TipMaterial.HardenedCarbon, 32, 2300, 700, 12),
        new("D1", 10, 0.635, Tpi(4), Tpi(4), ToothForm.Skip, 0, 1.6, 1.10, TipKind.Set, TipMaterial.HardenedCarbon, 48, 1800, 0, 0),
        new("D2", 6, 0.36, Tpi(6), Tpi(6), ToothForm.Regular, 0, 1.5, 0.68, TipKind.Set, TipMaterial.HardenedCarbon, 48, 1500, 0, 0),
        new("E1", 32, 1.07, 22, 22, ToothForm.Hook, 10, 6.0, 1.95, TipKind.Set, TipMaterial.HardenedCarbon, 46, 3200, 850, 10),
        new("E2", 32, 1.07, 22, 22, ToothForm.Hook, 7, 6.0, 1.95, TipKind.Set, TipMaterial.HardenedCarbon, 46, 3200, 850, 10),
        new("E3", 32, 0.9, 22, 22, ToothForm.Hook, 10, 6.0, 1.70, TipKind.Set, TipMaterial.HardenedCarbon, 46, 3000, 850, 10),
    ];

    internal static readonly BladeRow[] Blades =
    [
        new("Q-01", "A1", "S1", 135, 212, 9, 35.4, 1.2, DemoState.OnSaw),
        new("Q-02", "A2", "S1", 135, 148, 6, 23.6, 0.4, DemoState.Rack),
        new("Q-03", "A3", "S1", 110, 61, 2, 12.6, 0.8, DemoState.Rack),
        new("Q-04", "A1", "S1", 135, 63, 4, 37.0, 0, DemoState.CutDown),
        new("Q-05", "A4", "S1", 150, 305, 14, 43.0, 0.3, DemoState.Rack),
        new("Q-06", "A2", "S1", 135, 26, 1, 21.8, 2.0, DemoState.Rack),
        new("Q-04b", "A1", "S2", 135, 34, 6, 36.6, 1.0, DemoState.Rack),
        new("Q-07", "B1", "S2", 150, 118, 3, 37.4, 0, DemoState.AtSharpener),
        new("Q-08", "B2", "S2", 150, 64, 1, 37.8, 0.5, DemoState.OnSaw),
        new("Q-09", "B3", "S2", 135, 310, 9, 20.6, 2.4, DemoState.Rack),
        new("Q-10", "B4", "S2", 130, 88, 4, 18.2, 0, DemoState.AtSharpener),
        new("Q-11", "B5", "S2", 110, 45, 1, 12.8, 0.1, DemoState.Rack),
        new("Q-12", "B6", "S2", 90, 19, 0, 6, 1.0, DemoState.Rack),
        new("Q-13", "B7", "S2", 150, 72, 3, 24.4, 0.6, DemoState.Rack),
        new("Q-14", "A1", "S2", 135, 133, 5, 37.0, 2.0, DemoState.Held),
        new("Q-15", "B3", "S2", 135, 0, 0, 25, 0, DemoState.Rack),
        new("Q-16", "B5", "S2", 110, 0, 0, 13, 0, DemoState.Rack),
        new("Q-17", "C1", "S3", 90, 9, 1, 12.8, 0.6, DemoState.OnSaw),
        new("Q-18", "C2", "S3", 90, 38, 2, 12.6, 1.5, DemoState.Rack),
        new("Q-19", "C3", "S3", 90, 8, 0, 10, 1.6, DemoState.Rack),
        new("Q-20", "C4", "S3", 80, 13.5, 0, 6, 0.8, DemoState.Rack),
        new("Q-21", "C5", "S3", 70, 6, 0, 3, 0.15, DemoState.Rack),
        new("Q-22", "C6", "S3", 60, 4.2, 0, 19, 1.0, DemoState.Broken),
        new("Q-23", "C1", "S3", 90, 29, 3, 12.4, 1.0, DemoState.Broken),
        new("Q-24", "C1", "S3", 90, 0, 0, 13, 0, DemoState.Rack),
        new("Q-25", "C3", "S3", 90, 4, 0, 10, 0.9, DemoState.Rack),
        new("Q-26", "D1", "S4", 50, 0.3, 0, 10, 0.1, DemoState.Broken),
        new("Q-27", "D1", "S4", 50, 0.5, 0, 10, 0.1, DemoState.Broken),
        new("Q-28", "D1", "S4", 50, 0.7, 0, 10, 0.1, DemoState.Broken),
        new("Q-29", "D1", "S4", 50, 1.1, 0, 10, 0.2, DemoState.Broken),
        new("Q-30", "D2", "S4", 60, 11.5, 0, 6, 0.9, DemoState.OnSaw),
        new("Q-31", "D2", "S4", 60, 0, 0, 6, 0, DemoState.Rack),
        new("Q-32", "E1", "S5", 120, 9.4, 5, 27.6, 10.9, DemoState.OnSaw),
        new("Q-33", "E1", "S5", 120, 11.9, 7, 26.4, 0, DemoState.AtSharpener),
        new("Q-34", "E1", "S5", 120, 6.4, 3, 29.5, 0, DemoState.AtSharpener),
        new("Q-35", "E1", "S5", 120, 8, 4, 28.6, 0, DemoState.AtSharpener),
        new("Q-36", "E1", "S5", 120, 15.8, 7, 26.2, 5, DemoState.Broken),
        new("Q-37", "E1", "S5", 120, 18.9, 8, 25.2, 5, DemoState.Broken),
        new("Q-38", "E2", "S5", 120, 14, 8, 23.8, 5, DemoState.Retired),
        new("Q-39", "E1", "S5", 120, 3.1, 1, 31.2, 2, DemoState.Retired),
        new("Q-40", "E3", "S5", 120, 0, 0, 32, 0, DemoState.Rack),
    ];

    internal static readonly CutRow[] Cuts =
    [
        new(1, "chair back legs", "European oak", 10, 45, 0.8, 12, 90, CutKind.Board, Finish.Medium),
        new(2, "drawer-front resaw", "black cherry", 9, 200, 1.2, 6, null, CutKind.Resaw, Finish.Medium) { Timber = 250_000 },
        new(3, "guitar backs", "Indian rosewood", 8, 190, 0.56, 10, null, CutKind.Resaw, Finish.Medium) { Timber = 9_000_000 },
        new(4, "soundboards", "Norway spruce", 8, 220, 0.6, 8, null, CutKind.Resaw, Finish.Medium) { Timber = 1_500_000 },
        new(5, "dinghy frames", "European oak", 18, 50, 1.4, 14, 400, CutKind.Board, Finish.Rough) { BevelDeg = 22 },
        new(6, "larch planking", "European larch", 16, 28, 4.5, 18, 3000, CutKind.Board, Finish.Medium),
        new(7, "beam resaw", "Douglas-fir (coast)", 18, 300, 3, 4, null, CutKind.Beam, Finish.Medium),
        new(8, "plywood brackets", "birch plywood", 9, 12, 0.3, 60, 20, CutKind.Board, Finish.Fine) { Material = MaterialKind.Panel },
        new(9, "puzzle boxes", "sugar maple", 8, 6, 0.4, 40, 5, CutKind.Board, Finish.Fine),
        new(10, "bowl blanks, green", "black walnut", 60, 100, 0.9, 8, 140, CutKind.Board, Finish.Rough),
        new(11, "slabs", "European ash", 45, 320, 2.6, 9, null, CutKind.Log, Finish.Rough) { Dirt = Dirt.BarkOn },
        new(12, "reclaimed beam, nail risk", "Scots pine", 14, 180, 3.2, 5, null, CutKind.Beam, Finish.Rough) { Dirt = Dirt.Reclaimed, NailChance = 0.3 },
        new(13, "aluminium angle", "aluminium", 0, 3, 0.5, 6, null, CutKind.Board, Finish.Rough) { Material = MaterialKind.Other },
        new(14, "face veneers 4 mm", "sugar maple", 8, 160, 0.9, 9, null, CutKind.Resaw, Finish.Medium) { Timber = 300_000 },
        new(15, "scroll corbels (class)", "yellow-poplar", 9, 19, 0.4, 20, 12, CutKind.Board, Finish.Medium) { ClassWork = true },
    ];

    private static double Tpi(double teeth) => 25.4 / teeth;
}

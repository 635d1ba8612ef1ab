using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using Material = BladeLog.Handbook.Tables.Material;
using MaterialTable = BladeLog.Handbook.Tables.MaterialTable;

namespace BladeLog.Advice.Cuts;

/// <summary>A queued cut with every figure filled. Lengths in metres.</summary>
public sealed record CutWork
{
    public required QueuedCut Cut { get; init; }

    /// <summary>Row of the handbook; null where the word is not known.</summary>
    public Material? Material { get; init; }

    /// <summary>Wood and panels are sawn, other things never.</summary>
    public bool IsWood => Material is { Density12: not null } && Cut.Material != MaterialKind.Other;

    /// <summary>Wood along the blade, the bevel counted.</summary>
    public required double HeightM { get; init; }

    public required double LengthM { get; init; }

    /// <summary>Cuts to make.</summary>
    public required int Cuts { get; init; }

    /// <summary>Pieces to handle: more than cuts when they are stacked.</summary>
    public required int Pieces { get; init; }

    public int Stack { get; init; } = 1;

    public required Known Density12 { get; init; }

    public required Known Moisture { get; init; }

    public required Known WoodFactor { get; init; }

    public required Known DirtFactor { get; init; }

    /// <summary>Edge radius too dull for this finish.</summary>
    public required Known EdgeLimit { get; init; }

    /// <summary>Greatest bite of this finish; null where there is none.</summary>
    public Known? FinishBite { get; init; }

    /// <summary>Minor units per m³.</summary>
    public required double TimberMinorPerM3 { get; init; }

    public double? RadiusM => Cut.RadiusM;

    public static CutWork Of(QueuedCut cut, Shop shop, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(cut);
        ArgumentNullException.ThrowIfNull(shop);
        ArgumentNullException.ThrowIfNull(settings);
        Material? material = MaterialTable.Find(cut.SpeciesKey, out _);
        bool rough = cut.Finish == Finish.Rough;
        return new CutWork
        {
            Cut = cut,
            Material = material,
            HeightM = cut.HeightM / Math.Cos(cut.BevelRad),
            LengthM = cut.LengthM,
            Cuts = cut.Pieces,
            Pieces = cut.Pieces,
            Density12 = new Known(material?.Density12 ?? double.NaN, material?.Provenance ?? Provenance.FromMemory, material?.Name ?? "not known"),
            Moisture = cut.MoisturePct is { } given
                ? Known.Yours(given, "given")
                : material is { Kind: not MaterialKind.Wood } panel
                    ? new Known(panel.DefaultMoisture, Provenance.EngineeringDefault, "default, not yours")
                    : settings.Known(CutSettings.Moisture),
            WoodFactor = settings.WoodFactor(material?.WearClass ?? "none"),
            DirtFactor = settings.DirtFactor(cut.Dirt),
            EdgeLimit = settings.Known(rough ? LifeSettings.Dull : LifeSettings.DullFine, 1e-6),
            FinishBite = cut.Finish switch
            {
                Finish.Fine => settings.Known(CutSettings.BiteFine, 1e-3),
                Finish.Medium => settings.Known(CutSettings.BiteMedium, 1e-3),
                _ => null,
            },
            TimberMinorPerM3 = cut.TimberMinorPerM3 ?? shop.TimberMinorPerM3,
        };
    }

    /// <summary>The same job cut several pieces at a time.</summary>
    public CutWork Stacked(int pieces)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(pieces, 1);
        return this with { HeightM = HeightM * pieces, Stack = pieces, Cuts = (Pieces + pieces - 1) / pieces };
    }

    /// <summary>This cut with a blade at a speed, for the handbook.</summary>
    public CutCase Case(BladeBody body, double edgeM, double speedMps, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(settings);
        return new CutCase
        {
            Thickness = new Length(body.Thickness.Value),
            Kerf = new Length(body.Kerf.Value),
            Pitch = new Length(body.PitchMean),
            GulletDepth = new Length(body.Gullet.Value),
            MeasuredGulletArea = body.GulletAreaM2 is { } area ? new Area(area) : null,
            Form = body.Form,
            Rake = new Angle(body.Rake.Value),
            Tip = body.Tip,
            EdgeRadius = new Length(edgeM),
            BandSpeed = new Speed(speedMps),
            CutHeight = new Length(HeightM),
            Density12 = new Density(Density12.Value),
            MoisturePercent = Moisture.Value,
            Direction = Cut.Direction,
            Frozen = Cut.Frozen,
            Model = settings.Force,
        };
    }

    /// <summary>Fed with the saw's feeder: straight cuts on a saw that has one.</summary>
    public bool WithFeeder(SawSetup setup)
    {
        ArgumentNullException.ThrowIfNull(setup);
        return RadiusM is null && setup.FeederN is not null;
    }

    /// <summary>Curved enough to be fed as a curve.</summary>
    public bool IsCurve(AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(settings);
        return RadiusM is { } r && r < settings[CutSettings.CurveBelow] * 1e-3;
    }

    /// <summary>Gullet fill allowed: the smallest that applies.</summary>
    public (Known Fill, string Because) Fill(SawSetup setup, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(settings);
        bool dry = Moisture.Value < settings[CutSettings.DryBelow];
        List<(SettingDefinition Setting, string Because)> apply =
        [
            !dry ? Material!.Hardwood ? (CutSettings.FillGreenHardwood, "green hardwood") : (CutSettings.FillGreenSoftwood, "green softwood")
                : WithFeeder(setup) ? (CutSettings.FillDryFeeder, "dry wood, with a feeder")
                : (CutSettings.FillDryHand, "dry wood, by hand"),
        ];
        if (Material!.IsStringyAt(Moisture.Value))
        {
            apply.Add((CutSettings.FillStringy, "stringy wood"));
        }

        if (Cut.Frozen)
        {
            apply.Add((CutSettings.FillFrozen, "frozen wood"));
        }

        (SettingDefinition least, string because) = apply.MinBy(a => settings[a.Setting]);
        return (settings.Known(least), because);
    }
}

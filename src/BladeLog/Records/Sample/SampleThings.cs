using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Sample;

/// <summary>What the shop calls a wood or panel, and its row in the handbook.</summary>
internal sealed record SampleSpecies(string Name, string Key, MaterialKind Material, string? WoodClass)
{
    public static SampleSpecies Read(SampleRow row) =>
        new(row.Text("species"), row.Text("key"), row.Case<MaterialKind>("material_kind"), row.Optional("wood_class"));
}

/// <summary>What the shop has: itself, people, saws, specifications, blades and the cuts that wait.</summary>
internal sealed class SampleThings
{
    public required Shop Shop { get; init; }

    public required SampleClock Clock { get; init; }

    public required IReadOnlyDictionary<string, Person> People { get; init; }

    public required IReadOnlyDictionary<string, Saw> Saws { get; init; }

    public required IReadOnlyDictionary<string, Spec> Specs { get; init; }

    public required IReadOnlyDictionary<string, Blade> Blades { get; init; }

    public required IReadOnlyDictionary<string, SampleSpecies> Species { get; init; }

    public required IReadOnlyList<QueuedCut> Queue { get; init; }

    public IEnumerable<object> All => [Shop, .. People.Values, .. Saws.Values, .. Specs.Values, .. Blades.Values, .. Queue];

    public static SampleThings Read(string folder, DateTime now)
    {
        var shop = ReadShop(SampleFile.Read(folder, "shop").ToDictionary(r => r.Text("key")));
        var clock = new SampleClock(shop.Zone, now);
        var specs = SampleFile.Read(folder, "specs").Select(ReadSpec).ToDictionary(s => s.Code);
        var species = SampleFile.Read(folder, "species").Select(SampleSpecies.Read).ToDictionary(s => s.Name);
        return new SampleThings
        {
            Shop = shop,
            Clock = clock,
            People = SampleFile.Read(folder, "people").Select(r => ReadPerson(r, clock)).ToDictionary(p => p.Initials),
            Saws = SampleFile.Read(folder, "saws").Select(ReadSaw).ToDictionary(s => s.Code),
            Specs = specs,
            Blades = ReadBlades(folder, specs, clock),
            Species = species,
            Queue = [.. SampleFile.Read(folder, "queue").Select(r => ReadQueued(r, clock, species))],
        };
    }

    private static Shop ReadShop(Dictionary<string, SampleRow> rows)
    {
        SampleRow Row(string key) => rows.TryGetValue(key, out var row) ? row : throw new SampleFileException($"shop.csv has no line for {key}.");
        return new Shop
        {
            Name = Row("name").Text("value"),
            Zone = Row("zone").Text("value"),
            Lengths = Row("lengths").Case<LengthUnit>("value"),
            Spelling = Row("spelling").Case<Spelling>("value"),
            PullWord = Row("pull_word").Case<PullWord>("value"),
            CurrencyDigits = Row("currency_digits").Whole("value"),
            RateMinorPerHour = Row("shop_rate_minor_per_h").Whole("value"),
            TimberMinorPerM3 = Row("timber_value_minor_per_m3").Whole("value"),
            IsSample = true,
        };
    }

    private static Person ReadPerson(SampleRow row, SampleClock clock)
    {
        var person = new Person { Initials = row.Text("initials"), Name = row.Text("name") };
        foreach (var (column, role) in new[] { ("may_clear_holds", Role.ClearHolds), ("may_sharpen", Role.Sharpen), ("may_weld", Role.Weld) })
        {
            if (row.Yes(column))
            {
                person.Roles.Add(new PersonRole { Role = role, FromUtc = clock.StartOf(row, "since_day") });
            }
        }

        return person;
    }

    private static Saw ReadSaw(SampleRow row) =>
        new() { Code = row.Text("code"), Name = row.Text("name"), HasHourMeter = row.Yes("has_hour_meter") };

    private static Spec ReadSpec(SampleRow row) => new()
    {
        Code = row.Text("spec"),
        WidthM = row.Metres("width_mm"),
        WidthTyped = Typed(row, "width_mm", "mm"),
        ThicknessM = row.Metres("body_mm"),
        ThicknessTyped = Typed(row, "body_mm", "mm"),
        PitchCoarseM = row.Metres("pitch_coarse_mm"),
        PitchFineM = row.Metres("pitch_fine_mm"),
        ToothForm = row.Case<ToothForm>("tooth_form"),
        RakeRad = Radians(row.OptionalNumber("hook_deg")),
        GulletDepthM = row.OptionalMetres("gullet_depth_mm"),
        KerfM = row.OptionalMetres("kerf_mm"),
        KerfTyped = Typed(row, "kerf_mm", "mm"),
        SetPattern = row.Case<SetPattern>("set_pattern"),
        TipKind = row.Case<TipKind>("tip_kind"),
        TipMaterial = row.Case<TipMaterial>("tip_material"),
        BodySteel = row.Case<BodySteel>("body_steel"),
        BodyHrc = row.OptionalNumber("body_hrc"),
        NewLoopM = row.OptionalMetres("new_loop_mm"),
        NewLoopTyped = Typed(row, "new_loop_mm", "mm"),
        TensionPa = row.OptionalNumber("tension_mpa") * 1e6,
        TensionTyped = Typed(row, "tension_mpa", "MPa"),
        LeastWidthM = row.OptionalMetres("least_width_mm"),
        SharpeningPriceMinor = row.OptionalMoney("sharpening_price_minor"),
        MostSharpenings = row.OptionalWhole("most_sharpenings"),
        EdgeFreshM = row.OptionalNumber("edge_um") / 1e6,
        PriceMinor = row.OptionalMoney("price_minor"),
    };

    private static Dictionary<string, Blade> ReadBlades(string folder, Dictionary<string, Spec> specs, SampleClock clock)
    {
        var blades = new Dictionary<string, Blade>();
        foreach (var row in SampleFile.Read(folder, "blades"))
        {
            blades.Add(row.Text("tag"), new Blade
            {
                Tag = row.Text("tag"),
                Spec = row.Of("spec", specs, "specification"),
                Parent = row.Optional("parent") is null ? null : row.Of("parent", blades, "blade above with the tag"),
                Folded = row.Yes("folded"),
                InspectEveryH = row.OptionalNumber("inspect_every_h"),
                InspectEachMount = row.Yes("inspect_each_mount"),
                AddedUtc = clock.StartOf(row, "stock_day"),
            });
        }

        return blades;
    }

    private static QueuedCut ReadQueued(SampleRow row, SampleClock clock, Dictionary<string, SampleSpecies> species)
    {
        var material = row.Of("species", species, "species");
        return new QueuedCut
        {
            Number = row.Whole("number"),
            Job = row.Text("job"),
            Material = material.Material,
            SpeciesKey = material.Key,
            SpeciesTyped = material.Name,
            HeightM = row.Metres("height_mm"),
            HeightTyped = Typed(row, "height_mm", "mm"),
            LengthM = row.Metres("length_mm"),
            LengthTyped = Typed(row, "length_mm", "mm"),
            Pieces = row.Whole("pieces"),
            RadiusM = row.OptionalMetres("tightest_radius_mm"),
            RadiusTyped = Typed(row, "tightest_radius_mm", "mm"),
            BevelRad = Radians(row.Number("bevel_deg")) ?? 0,
            MoisturePct = row.OptionalNumber("moisture_pct"),
            Frozen = row.Yes("frozen"),
            Dirt = row.Case<Dirt>("dirt"),
            Direction = row.Case<CutDirection>("direction"),
            Kind = row.Case<CutKind>("kind"),
            Finish = row.Case<Finish>("finish"),
            NailChance = row.Number("nail_chance"),
            TimberMinorPerM3 = row.OptionalMoney("timber_value_minor_per_m3"),
            ClassWork = row.Yes("class_work"),
            Order = row.Whole("order"),
            AddedUtc = clock.StartOf(row, "added_day"),
            Due = row.OptionalWhole("due_day") is { } due ? clock.Day(due) : null,
        };
    }

    private static double? Radians(double? degrees) => degrees * (Math.PI / 180);

    private static string? Typed(SampleRow row, string column, string unit) => row.Optional(column) is { } text ? $"{text} {unit}" : null;
}

using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;

namespace BladeLog.Features.Import;

/// <summary>Cuts for the list.</summary>
internal sealed class CutRows(ShopNow shop) : IImportKind
{
    private readonly Dictionary<string, int> _jobs = [];

    public string Key => "cuts";

    public string Name => "Cuts";

    public string Onwards => "/cuts";

    public IReadOnlyList<string> Defaults =>
    [
        "Kind of work: board. Finish: medium. Clean, along the grain, straight and square, one piece.",
        "Moisture: 10 %, default, not yours.",
    ];

    public IReadOnlyList<Column> Columns { get; } =
    [
        new("job", "Job", true, "what it is for", "name", "description", "part", "for", "title", "what", "auftrag"),
        new("species", "Wood", true, "wood or panel", "material", "timber", "wood species", "kind of wood", "holz", "bois"),
        new("height", "Height", true, "wood along the blade", "depth", "cut height", "thickness", "cut depth", "hoehe", "höhe", "stock height", "depth of cut"),
        new("length", "Length", true, "of one cut", "cut length", "länge", "laenge", "long"),
        new("pieces", "Pieces", false, "cuts to make", "qty", "quantity", "count", "number of pieces", "pcs", "stück", "cuts"),
        new("radius", "Tightest radius", false, "empty: straight", "tightest_radius", "curve", "tightest curve", "min radius", "r"),
        new("bevel", "Bevel", false, "empty: square", "tilt", "angle", "bevel angle"),
        new("moisture", "Moisture", false, "in percent of dry weight", "mc", "moisture content", "feuchte", "humidity"),
        new("frozen", "Frozen", false, "yes or no"),
        new("dirt", "How clean", false, "clean, bark on, reclaimed", "dirty", "cleanliness", "condition"),
        new("direction", "Direction", false, "along or across the grain", "grain"),
        new("kind", "Kind of work", false, "board, resaw, beam, log", "type", "work", "kind of cut"),
        new("finish", "Finish", false, "fine, medium, rough", "surface", "quality"),
        new("nail", "Chance of a nail", false, "in percent, or 0 to 1", "nail_chance", "nails", "nail risk", "metal risk"),
        new("timber", "Timber value", false, "of a m³", "timber_value", "value", "timber value per m3", "price per m3", "wood value"),
        new("class", "Work of a class", false, "yes or no", "class_work", "for class", "school"),
        new("due", "Due", false, "a date", "due date", "deadline", "by", "when"),
    ];

    public IReadOnlyList<string> Sample =>
    [
        "Job,Wood,Height (mm),Length (m),Pieces,Tightest radius (mm),Moisture (%),Kind of work,Finish",
        "drawer fronts,black cherry,200,1.2,6,,9,resaw,medium",
        "chair backs,European oak,45,0.8,12,90,10,board,medium",
        "plywood brackets,birch plywood,12,0.3,60,20,9,board,fine",
    ];

    public IReadOnlyList<Command> Read(RowReader row, List<string> remarks)
    {
        string? job = row.Text("job");
        row.Need("job", "Say what it is for.");
        if (job?.Length > 80)
        {
            row.Refuse("job", "A job's name may have 80 letters at the most.");
        }

        var species = Species(row);
        double? height = row.Length("height", Fields.CutHeight), length = row.Length("length", Fields.CutLength);
        row.Need("height", "Say how much wood stands along the blade.");
        row.Need("length", "Say how long one cut is.");
        int? pieces = row.Count("pieces", Fields.Pieces);
        double? radius = row.Length("radius", Fields.CurveRadius), bevel = row.Angle("bevel", Fields.Bevel), moisture = row.Moisture("moisture");
        bool? frozen = row.Yes("frozen"), forClass = row.Yes("class");
        Dirt? dirt = row.OneOf("dirt", (Dirt.Clean, ["clean", "no"]), (Dirt.BarkOn, ["bark on", "bark", "dirty"]), (Dirt.Reclaimed, ["reclaimed", "old", "salvaged"]));
        CutDirection? direction = row.OneOf("direction", (CutDirection.Rip, ["along", "rip", "along the grain"]), (CutDirection.Cross, ["across", "cross", "crosscut", "across the grain"]));
        CutKind? kind = row.OneOf("kind", (CutKind.Board, ["board", "boards", "rip", "curve"]), (CutKind.Resaw, ["resaw", "resawing", "veneer"]), (CutKind.Beam, ["beam", "beams", "timber"]), (CutKind.Log, ["log", "logs", "mill"]));
        Finish? finish = row.OneOf("finish", (Finish.Fine, ["fine"]), (Finish.Medium, ["medium", "normal"]), (Finish.Rough, ["rough", "coarse"]));
        double? nail = row.Share("nail");
        long? timber = row.Money("timber");
        DateOnly? due = row.Date("due");
        if (!row.Stands)
        {
            return [];
        }

        Same(row.Line, $"{job}|{species!.Key}|{height}|{length}|{radius}", job!, remarks);
        return
        [
            new QueueCut(new QueuedCut
            {
                Job = job!,
                Material = species.Kind,
                SpeciesKey = species.Key,
                SpeciesTyped = species.Typed,
                TakenAs = species.TakenAs,
                HeightM = height!.Value,
                HeightTyped = row.Understood["height"],
                LengthM = length!.Value,
                LengthTyped = row.Understood["length"],
                Pieces = pieces ?? 1,
                RadiusM = radius,
                RadiusTyped = radius is null ? null : row.Understood["radius"],
                BevelRad = bevel ?? 0,
                MoisturePct = moisture,
                Frozen = frozen ?? false,
                Dirt = dirt ?? Dirt.Clean,
                Direction = direction ?? CutDirection.Rip,
                Kind = kind ?? CutKind.Board,
                Finish = finish ?? Finish.Medium,
                NailChance = nail ?? 0,
                TimberMinorPerM3 = timber,
                ClassWork = forClass ?? false,
                Due = due,
            }),
        ];
    }

    private void Same(int line, string signature, string job, List<string> remarks)
    {
        if (_jobs.TryGetValue(signature, out int first))
        {
            remarks.Add($"Line {line} is the same job as line {first}: {job}. Both are taken.");
        }
        else if (shop.Cuts.FirstOrDefault(c => c.DoneEntryId is null && c.DroppedUtc is null && string.Equals($"{c.Job}|{c.SpeciesKey}|{c.HeightM}|{c.LengthM}|{c.RadiusM}", signature, StringComparison.OrdinalIgnoreCase)) is { } listed)
        {
            remarks.Add($"Line {line} is the same job as cut {listed.Number} on the list: {job}. It is taken as another.");
        }

        _jobs.TryAdd(signature, line);
    }

    private static Wood? Species(RowReader row)
    {
        row.Need("species", "Say which wood or panel it is.");
        if (row.Text("species") is not { } typed)
        {
            return null;
        }

        var wood = Wood.Read(typed, out var wrong);
        if (wrong is not null)
        {
            row.Refuse("species", wrong);
        }
        else if (wood is { TakenAs: { } takenAs })
        {
            row.Say("species", $"{typed}, taken as {takenAs}");
        }

        return wood;
    }
}

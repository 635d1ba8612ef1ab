using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;

namespace BladeLog.Features.Import;

/// <summary>Saws with their first setup.</summary>
internal sealed class SawRows(ShopNow shop) : IImportKind
{
    private const double TakeUp = 0.025;
    private const double LowerGuide = 0.050;
    private const double Clearance = 0.010;
    private const double ChangeMinutes = 10;
    private const double LeastWidth = 0.003;

    private readonly Dictionary<string, int> _codes = new(StringComparer.OrdinalIgnoreCase);

    public string Key => "saws";

    public string Name => "Saws";

    public string Onwards => "/";

    public IReadOnlyList<string> Defaults =>
    [
        "Loop: 25 mm either way of the nominal. Narrowest blade: 3 mm. Upper guide 10 mm above the work, lower guide 50 mm under the table.",
        "Takes boards and resawing. No classes, no feeder, no tilting frame, no hour meter, sprung tension, 10 minutes for a blade change.",
        "All of these are defaults, not yours, until you set up the saw.",
    ];

    public IReadOnlyList<Column> Columns { get; } =
    [
        new("code", "Code", true, "short, such as S1", "saw", "id", "no", "number", "short name"),
        new("name", "Name", true, "what it is called in the shop", "saw name", "machine", "description"),
        new("wheels", "Wheels", true, "diameters over the tyre, such as 900|900", "wheel_diameters", "wheel", "wheel diameter", "wheel size", "diameter"),
        new("speeds", "Blade speeds", true, "the usual first, such as 15.2|7.6", "speeds", "speed", "blade speed", "band speed"),
        new("loop", "Loop", true, "nominal length of blade", "loop length", "blade length", "length", "band length"),
        new("loop_least", "Shortest loop", false, "", "min loop", "shortest blade"),
        new("loop_most", "Longest loop", false, "", "max loop", "longest blade"),
        new("takeup_low", "Take-up shorter", false, "how far under the nominal", "take up low"),
        new("takeup_high", "Take-up longer", false, "how far over the nominal", "take up high"),
        new("width_least", "Narrowest blade", false, "", "least_blade_width", "min blade width", "min width"),
        new("width_most", "Widest blade", true, "", "greatest_blade_width", "max blade width", "max width", "blade width"),
        new("height", "Cut height", true, "the most it opens to", "greatest_cut_height", "max cut height", "depth of cut", "resaw height", "height"),
        new("longest", "Longest piece", false, "", "longest_piece", "bed length"),
        new("lower_guide", "Lower guide", false, "under the table"),
        new("clearance", "Upper guide", false, "above the work", "upper_clearance", "guide clearance"),
        new("takes", "Takes", false, "board|resaw|beam|log", "work", "kinds of work"),
        new("class", "Classes", false, "no, supervised, yes", "class_work", "school"),
        new("motor", "Motor", true, "power", "power", "motor power", "kw", "hp"),
        new("pull", "Greatest pull", false, "of one strand", "greatest_strand_force", "max tension force", "strand force"),
        new("feeder", "Feeder", false, "its force", "feeder force"),
        new("feeder_most", "Feeder feed", false, "its greatest", "feeder_max", "max feed"),
        new("change", "Blade change", false, "minutes", "change time"),
        new("break_cost", "A break costs", false, "", "break cost"),
        new("tilt", "Tilts to", false, "angle of the frame", "tilting frame", "tilt angle"),
        new("meter", "Hour meter", false, "yes or no", "has_hour_meter", "hours meter"),
    ];

    public IReadOnlyList<string> Sample =>
    [
        "Code,Name,Wheels (mm),Blade speeds (m/s),Loop (mm),Widest blade (mm),Cut height (mm),Motor (kW),Takes,Hour meter",
        "S1,Large saw,700|700,23.5,5080,50,450,5.5,board|resaw,yes",
        "S2,Small saw,350|350,15.2|7.6,2667,19,300,1.1,board|resaw,no",
    ];

    public IReadOnlyList<Command> Read(RowReader row, List<string> remarks)
    {
        foreach (Column needed in Columns.Where(c => c.Needed))
        {
            row.Need(needed.Key, $"A saw needs this: {needed.Name.ToLowerInvariant()}.");
        }

        string? code = row.Text("code"), name = row.Text("name");
        CheckCode(row, code);
        double[] wheels = [.. row.Several("wheels").Select(w => row.Wheel("wheels", w)).OfType<double>()];
        double[] speeds = [.. row.Several("speeds").Select(s => row.Speed("speeds", s)).OfType<double>()];
        wheels = wheels.Length == 1 ? [wheels[0], wheels[0]] : wheels;
        SawSetup? setup = Setup(row, wheels, speeds);
        bool? meter = row.Yes("meter");
        if (!row.Stands || setup is null)
        {
            return [];
        }

        _codes[code!] = row.Line;
        return [new AddSaw(code!, name!, meter ?? false, setup)];
    }

    private void CheckCode(RowReader row, string? code)
    {
        if (code is null)
        {
            return;
        }

        if (code.Length > 12 || !code.All(c => char.IsAsciiLetterOrDigit(c) || c is '-' or '.'))
        {
            row.Refuse("code", "A saw's code is 1 to 12 of A to Z, 0 to 9, hyphen and full stop.");
        }
        else if (_codes.TryGetValue(code, out int first))
        {
            row.Refuse("code", $"{code} stands on line {first} already.");
        }
        else if (shop.Saw(code) is not null)
        {
            row.Refuse("code", $"There is a saw {code} already.");
        }
    }

    private static SawSetup? Setup(RowReader row, double[] wheels, double[] speeds)
    {
        double? loop = row.Length("loop", Fields.Loop), width = row.Length("width_most", Fields.BladeWidth), height = row.Length("height", Fields.CutHeight), motor = row.Power("motor");
        double? low = row.Length("takeup_low", Fields.AnyLength), high = row.Length("takeup_high", Fields.AnyLength);
        double? least = row.Length("loop_least", Fields.Loop), most = row.Length("loop_most", Fields.Loop);
        Takes takes = TakesOf(row);
        ClassWork? classes = row.OneOf("class", (ClassWork.No, ["no"]), (ClassWork.Supervised, ["supervised", "with supervisor"]), (ClassWork.Yes, ["yes"]));
        double? feederMost = row.Feed("feeder_most"), feeder = row.Force("feeder"), pull = row.Force("pull");
        if (wheels.Length is < 2 or > 4 && row.Stands)
        {
            row.Refuse("wheels", "A band saw has two to four wheels: write their diameters such as 900|900.");
        }

        if (loop is not { } L || width is not { } w || height is not { } h || motor is not { } P || !row.Stands)
        {
            return null;
        }

        SawSetup setup = new()
        {
            LoopM = L,
            LoopLeastM = least ?? L - (low ?? TakeUp),
            LoopMostM = most ?? L + (high ?? TakeUp),
            WidthLeastM = row.Length("width_least", Fields.BladeWidth) ?? Math.Min(LeastWidth, w),
            WidthMostM = w,
            LowerGuideM = row.Length("lower_guide", Fields.AnyLength) ?? LowerGuide,
            ClearanceM = row.Length("clearance", Fields.AnyLength) ?? Clearance,
            CutHeightMostM = h,
            LongestPieceM = row.Length("longest", Fields.Board),
            Takes = takes,
            ClassWork = classes ?? ClassWork.No,
            StrandForceMostN = pull,
            TensionSystem = TensionSystem.Sprung,
            MotorW = P,
            FeederN = feeder,
            FeederMostMps = feederMost,
            ChangeMinutes = row.Minutes("change") ?? ChangeMinutes,
            BreakCostMinor = row.Money("break_cost") ?? 0,
            TiltMostRad = row.Angle("tilt", Fields.Bevel) ?? 0,
        };
        setup.Wheels.AddRange(wheels.Select((d, i) => new SetupWheel { Position = i + 1, DiameterM = d, Driven = i == wheels.Length - 1 }));
        setup.Speeds.AddRange(speeds.Select((v, i) => new SetupSpeed { Position = i + 1, SpeedMps = v, Usual = i == 0 }));
        Possible(row, setup, pull, feeder);
        return setup;
    }

    private static void Possible(RowReader row, SawSetup setup, double? pull, double? feeder)
    {
        double girth = setup.Wheels.Sum(w => w.DiameterM) * Math.PI / setup.Wheels.Count;
        if (setup.LoopM <= girth)
        {
            row.Refuse("loop", "This loop is too short for these wheels.");
        }

        if (setup.LoopLeastM > setup.LoopM || setup.LoopMostM < setup.LoopM || setup.LoopLeastM <= 0)
        {
            row.Refuse("loop", "The loop must lie inside the take-up: shortest, nominal, longest.");
        }

        if (setup.WidthLeastM > setup.WidthMostM)
        {
            row.Refuse("width_most", "The widest blade must not be narrower than the narrowest.");
        }

        if (pull is 0 || feeder is 0)
        {
            row.Refuse(pull is 0 ? "pull" : "feeder", "A force must be above zero; leave it empty where there is none.");
        }
    }

    private static Takes TakesOf(RowReader row)
    {
        string[] words = row.Several("takes");
        Takes takes = Takes.None;
        foreach (string word in words)
        {
            Takes one = word.TrimEnd('s').ToLowerInvariant() switch
            {
                "board" => Takes.Board,
                "resaw" or "resawing" => Takes.Resaw,
                "beam" => Takes.Beam,
                "log" => Takes.Log,
                _ => Takes.None,
            };
            if (one == Takes.None)
            {
                row.Refuse("takes", $"\"{word}\" is not one of these: board, resaw, beam, log.");
            }

            takes |= one;
        }

        if (words.Length > 0)
        {
            row.Say("takes", string.Join(", ", words));
        }

        return words.Length == 0 ? Takes.Board | Takes.Resaw : takes;
    }
}

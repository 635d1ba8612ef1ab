using System.Globalization;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Records.Sample;

/// <summary>What happened, from the sample's files: saws and running. The blades' own facts stand in the other part.</summary>
internal sealed partial class SampleFacts(string folder, SampleThings things, SampleLedger ledger)
{
    private const double MsPerHour = 3_600_000;

    private readonly Dictionary<string, SawSetup> _setups = [];

    private SampleClock Clock => things.Clock;

    /// <summary>Reads every file of facts; a file comes after those its rows name.</summary>
    public void Read()
    {
        Each("setups", Setup);
        Each("meter_epochs", Epoch);
        Each("meter_readings", Reading);
        Each("mounts", Mount);
        Each("runs", Run);
        Each("cuts", Cut);
        Each("tension_readings", Tension);
        BladeFacts();
        ShiftFacts();
        Each("voids", Void);
    }

    private void Each(string file, Action<SampleRow> read)
    {
        foreach (var row in SampleFile.Read(folder, file))
        {
            read(row);
        }
    }

    private int Blade(SampleRow row, string column = "tag") => row.Of(column, things.Blades, "blade").Id;

    private int Saw(SampleRow row) => row.Of("saw", things.Saws, "saw").Id;

    private int? Who(SampleRow row) => row.Of("who", things.People, "person").Id;

    private DateTime? Learned(SampleRow row) => Clock.OptionalAt(row, "entered_");

    /// <summary>A fact of the row's own time and person, known to other rows by its ref.</summary>
    private T Add<T>(SampleRow row, T fact, DateTime? learned = null, Action<T>? refer = null)
        where T : Fact
    {
        ledger.Name(row, ledger.Add(fact, Clock.At(row), learned, Who(row), refer));
        return fact;
    }

    private void Setup(SampleRow row)
    {
        var loop = row.Metres("loop_mm");
        var speeds = row.Numbers("speeds_m_s");
        var setup = new SawSetup
        {
            SawId = Saw(row),
            LoopM = loop,
            LoopLeastM = loop - row.Metres("takeup_low_mm"),
            LoopMostM = loop + row.Metres("takeup_high_mm"),
            WidthLeastM = row.Metres("least_blade_width_mm"),
            WidthMostM = row.Metres("greatest_blade_width_mm"),
            LowerGuideM = row.Metres("lower_guide_mm"),
            ClearanceM = row.Metres("upper_clearance_mm"),
            CutHeightMostM = row.Metres("greatest_cut_height_mm"),
            LongestPieceM = row.OptionalMetres("longest_piece_mm"),
            Takes = row.Cases<Takes>("takes"),
            ClassWork = row.Case<ClassWork>("class_work"),
            StrandForceMostN = row.OptionalNumber("greatest_strand_force_n"),
            TensionSystem = row.Case<TensionSystem>("tension_system"),
            MotorW = row.Number("motor_kw") * 1000,
            IdleW = row.OptionalNumber("idle_share") * row.Number("motor_kw") * 1000,
            FeederN = row.OptionalNumber("feeder_n"),
            FeederMostMps = row.OptionalNumber("feeder_max_m_min") / 60,
            ChangeMinutes = row.Number("change_min"),
            BreakCostMinor = row.Whole("break_cost_minor"),
            TiltMostRad = row.Number("tilt_deg") * (Math.PI / 180),
            MeterFactor = row.Number("meter_factor"),
        };
        var wheels = row.Numbers("wheel_diameters_mm");
        var driven = row.Whole("driven_wheel");
        setup.Wheels.AddRange(wheels.Select((mm, i) => new SetupWheel
        {
            Position = i + 1,
            DiameterM = mm / 1000,
            DiameterTyped = Figure(mm, "mm"),
            Driven = i + 1 == driven,
        }));
        setup.Speeds.AddRange(speeds.Select((v, i) => new SetupSpeed { Position = i + 1, SpeedMps = v, SpeedTyped = Figure(v, "m/s"), Usual = i == 0 }));
        _setups[row.Text("saw")] = setup;
        ledger.Name(row, ledger.Add(setup, Clock.At(row), null, null));
    }

    private void Epoch(SampleRow row) => Add(row, new MeterEpoch
    {
        SawId = Saw(row),
        Reason = row.Case<EpochReason>("reason"),
        StartReadingMs = Hours(row, "first_reading_h"),
    });

    private void Reading(SampleRow row)
    {
        var epoch = ledger.Named<MeterEpoch>(row, "epoch");
        var reading = new MeterReading { SawId = Saw(row), ReadingMs = Hours(row, "reading_h"), ReadingTyped = row.Text("reading_h") };
        Add(row, reading, Learned(row), r => r.EpochId = epoch.EntryId);
    }

    private void Mount(SampleRow row)
    {
        var mount = Add(row, new Mount
        {
            SawId = Saw(row),
            BladeId = Blade(row),
            TensionPa = row.OptionalNumber("tension_mpa") * 1e6,
            TensionTyped = row.Optional("tension_mpa") is { } typed ? $"{typed} MPa" : null,
            TensionKnown = row.Case<TensionKnown>("tension_grade"),
            InsideOut = row.Yes("inside_out"),
        }, Learned(row));
        if (Clock.OptionalAt(row, "off_") is { } off)
        {
            var dismount = new Dismount { Reason = row.Case<OffReason>("off_reason") };
            _dismounts[mount] = ledger.Add(dismount, off, Learned(row), Who(row), d => d.MountId = mount.EntryId);
        }
    }

    private void Run(SampleRow row)
    {
        var reading = row.Optional("meter_reading") is null ? null : ledger.Named<MeterReading>(row, "meter_reading");
        var until = Clock.At(row, "until_");
        var run = new Run
        {
            SawId = Saw(row),
            FromUtc = Clock.At(row, "from_"),
            UntilUtc = until,
            RunningMs = row.Whole("running_ms"),
            SpeedMps = row.Number("speed_m_s"),
            Grade = row.Case<HoursGrade>("grade"),
            Source = row.Case<RunSource>("source"),
        };

        // A reading that was put right later brought its run with it.
        ledger.Name(row, ledger.Add(run, until, reading?.Entry.EnteredUtc, Who(row), r => r.ReadingId = reading?.EntryId));
    }

    private void Cut(SampleRow row)
    {
        var material = row.Of("species", things.Species, "species");
        _ = Blade(row);
        Add(row, new CutDone
        {
            SawId = Saw(row),
            Material = material.Material,
            SpeciesKey = material.Key,
            SpeciesTyped = material.Name,
            WoodClass = material.WoodClass ?? throw row.Wrong("species", $"{material.Name} has no wear class"),
            HeightM = row.Metres("height_mm"),
            HeightTyped = $"{row.Text("height_mm")} mm",
            LengthM = row.Metres("length_mm"),
            LengthTyped = $"{row.Text("length_mm")} mm",
            Pieces = row.Whole("pieces"),
            FeedMps = row.Number("feed_m_min") / 60,
            FeedGrade = row.Case<FeedGrade>("feed_grade"),
            SpeedMps = row.Of("saw", _setups, "setup of saw").UsualSpeedMps,
            MoisturePct = row.OptionalNumber("moisture_pct"),
            Frozen = row.Yes("frozen"),
            Dirt = row.Case<Dirt>("dirt"),
            Nail = row.Yes("nail"),
        });
    }

    private void Tension(SampleRow row) => Add(row, new TensionReading
    {
        SawId = Saw(row),
        BladeId = Blade(row),
        TensionPa = row.Number("tension_mpa") * 1e6,
        Typed = $"{row.Text("tension_mpa")} MPa",
        How = row.Text("method"),
    });

    private static long Hours(SampleRow row, string column) => (long)Math.Round(row.Number(column) * MsPerHour);

    private static string Figure(double value, string unit) => string.Create(CultureInfo.InvariantCulture, $"{value} {unit}");
}

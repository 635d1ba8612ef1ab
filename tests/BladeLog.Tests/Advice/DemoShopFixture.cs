using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using static BladeLog.Tests.Advice.DemoShopRows;

namespace BladeLog.Tests.Advice;

/// <summary>The invented shop in memory, as advice is given it.</summary>
public sealed class DemoShopFixture
{
    public static readonly DateTime Today = new(2026, 3, 20, 8, 0, 0, DateTimeKind.Utc);

    public DemoShopFixture()
    {
        Now = Build();
        Advice = new ShopAdvice(Now);
    }

    public ShopNow Now { get; }

    public ShopAdvice Advice { get; }

    public BladeFile Blade(string tag) => Now.Blade(tag)!;

    public BladeAdvice Of(string tag) => Advice.Of(Blade(tag));

    public QueuedCut Cut(int number) => Now.Cuts.Single(c => c.Number == number);

    public SawNow Saw(string code) => Now.Saw(code)!;

    public static ShopNow Build(IReadOnlyDictionary<string, Setting>? settings = null)
    {
        Dictionary<string, SawSetup> setups = Saws.Select((row, i) => Setup(row, i + 1)).ToDictionary(s => s.Saw.Code);
        List<BladeFile> blades = [.. Blades.Select((row, i) => File(row, i + 1, setups))];
        SawNow[] saws = [.. setups.Values.Select(s => SawNow(s, blades))];
        Shop shop = new()
        {
            Name = "Quillmere Joinery & Boat Shed",
            Zone = "Etc/UTC",
            RateMinorPerHour = 4800,
            TimberMinorPerM3 = 80_000,
            IsSample = true,
        };
        return new ShopNow(Today, shop, settings ?? new Dictionary<string, Setting>(), saws, blades, [.. Cuts.Select(Queued)]);
    }

    private static SawSetup Setup(SawRow row, int id)
    {
        SawSetup setup = new()
        {
            SawId = id,
            Saw = new Saw { Id = id, Code = row.Code, Name = row.Name },
            LoopM = row.Loop * 1e-3,
            LoopLeastM = (row.Loop - row.TakeUp) * 1e-3,
            LoopMostM = (row.Loop + row.TakeUp) * 1e-3,
            WidthLeastM = row.WidthLeast * 1e-3,
            WidthMostM = row.WidthMost * 1e-3,
            LowerGuideM = row.LowerGuide * 1e-3,
            ClearanceM = row.Clearance * 1e-3,
            CutHeightMostM = row.Opens * 1e-3,
            LongestPieceM = row.Longest,
            Takes = row.Takes,
            ClassWork = row.Class,
            StrandForceMostN = row.Pull,
            MotorW = row.MotorKw * 1000,
            FeederN = row.FeederN,
            FeederMostMps = row.FeederMost / 60,
            ChangeMinutes = row.Change,
            BreakCostMinor = row.BreakCost,
            TiltMostRad = row.TiltDeg * Math.PI / 180,
        };
        setup.Wheels.AddRange(row.Wheels.Select((d, i) => new SetupWheel { Position = i, DiameterM = d * 1e-3, Driven = i == 0 }));
        setup.Speeds.AddRange(row.Speeds.Select((v, i) => new SetupSpeed { Position = i, SpeedMps = v, Usual = i == 0 }));
        return setup;
    }

    private static SawNow SawNow(SawSetup setup, List<BladeFile> blades) =>
        new(setup.Saw, setup, blades.Find(b => b.Place == Place.OnSaw && b.SawId == setup.SawId)?.Blade.Id, Today.AddDays(-1), 0, 0);

    private static BladeFile File(BladeRow row, int id, Dictionary<string, SawSetup> setups)
    {
        SpecRow kind = Specs.Single(s => s.Code == row.Spec);
        SawSetup setup = setups[row.Saw];
        bool shortened = row.Tag == "Q-04b", away = row.State == DemoState.AtSharpener;
        double loop = shortened ? 5.075 : setup.LoopM;
        List<ExposureLine> run = [];
        if (row.Hours > 0)
        {
            run.Add(new ExposureLine(setup, setup.UsualSpeedMps, (long)Math.Round(row.Hours * 3_600_000), row.Mpa * 1e6, loop, false, true, false));
        }

        if (shortened)
        {
            SawSetup before = setups["S1"];
            run.Add(new ExposureLine(before, before.UsualSpeedMps, 63L * 3_600_000, 135e6, 5.690, false, false, true));
        }

        Spec spec = Kind(kind, row.Mpa);
        return new BladeFile
        {
            Blade = new Blade { Id = id, Tag = row.Tag, Spec = spec, InspectEachMount = row.Tag == "Q-06", InspectEveryH = shortened ? 4 : null },
            Spec = spec,
            Place = row.State switch
            {
                DemoState.OnSaw => Place.OnSaw,
                DemoState.AtSharpener => Place.AtSharpener,
                DemoState.Rack or DemoState.Held => Place.Rack,
                _ => Place.Gone,
            },
            SawId = row.State == DemoState.OnSaw ? setup.SawId : null,
            LastSawId = setup.SawId,
            WidthM = row.Width * 1e-3,
            LoopM = loop,
            Weld = shortened ? WeldQuality.Doubtful : WeldQuality.Good,
            Welds = shortened ? 2 : 1,
            Sharpenings = row.Sharpenings,
            Exposures = run,
            SinceSharpening = row.PathKm > 0 ? [new PathLine("A2", Dirt.Clean, (long)Math.Round(row.PathKm * 1e6), 0)] : [],
            Hold = row.State == DemoState.Held ? new Hold { Kind = HoldKind.Crack, CrackLengthM = 2.6e-3, Place = CrackPlace.Gullet } : null,
            PriorUse = row.Tag == "Q-06" ? new PriorUse { UsedLow = 0.2, UsedHigh = 0.6 } : null,
            Away = away ? new AwayIn("B-031", "the grinding service", Today.AddDays(-6), Today.AddDays(3)) : null,
            Break = row.State == DemoState.Broken ? new Break { Site = BreakSite.Gullet } : row.State == DemoState.CutDown ? new Break { Site = BreakSite.Weld } : null,
            Retirement = row.State == DemoState.Retired ? new Retirement { Reason = RetireReason.WidthLimit } : null,
        };
    }

    private static Spec Kind(SpecRow row, double mpa) => new()
    {
        Code = row.Code,
        WidthM = row.Width * 1e-3,
        ThicknessM = row.Body * 1e-3,
        PitchCoarseM = row.PitchCoarse * 1e-3,
        PitchFineM = row.PitchFine * 1e-3,
        ToothForm = row.Form,
        RakeRad = row.Hook * Math.PI / 180,
        GulletDepthM = row.Gullet * 1e-3,
        KerfM = row.Kerf * 1e-3,
        TipKind = row.Tip,
        TipMaterial = row.Material,
        BodyHrc = row.Hrc,
        TensionPa = mpa * 1e6,
        PriceMinor = row.Price,
        SharpeningPriceMinor = row.Sharpening,
        MostSharpenings = row.Most,
    };

    private static QueuedCut Queued(CutRow row) => new()
    {
        Id = row.Number,
        Number = row.Number,
        Order = row.Number,
        Job = row.Job,
        Material = row.Material,
        SpeciesKey = row.Species,
        SpeciesTyped = row.Species,
        HeightM = row.Height * 1e-3,
        LengthM = row.Length,
        Pieces = row.Pieces,
        RadiusM = row.Radius * 1e-3,
        BevelRad = row.BevelDeg * Math.PI / 180,
        MoisturePct = row.Moisture,
        Dirt = row.Dirt,
        Kind = row.Kind,
        Finish = row.Finish,
        NailChance = row.NailChance,
        TimberMinorPerM3 = row.Timber,
        ClassWork = row.ClassWork,
    };
}

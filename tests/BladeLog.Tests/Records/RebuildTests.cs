using BladeLog.Records;
using BladeLog.Records.Folding;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class RebuildTests
{
    private static readonly DateTime Day = new(2026, 3, 2, 8, 0, 0, DateTimeKind.Utc);

    [Fact]
    public async Task A_day_of_running_is_divided_over_the_two_blades_of_that_day()
    {
        using var shop = await TempShop.Create();
        await using (var db = shop.Db())
        {
            var saw = new Saw { Code = "S1", Name = "First" };
            var spec = new Spec { Code = "A", WidthM = 0.025, ThicknessM = 0.0008, PitchCoarseM = 0.008, PitchFineM = 0.008, NewLoopM = 4 };
            var one = new Blade { Tag = "Q-1", Spec = spec };
            var two = new Blade { Tag = "Q-2", Spec = spec };
            var setup = new SawSetup
            {
                Entry = At(-24),
                Saw = saw,
                LoopM = 4,
                LoopLeastM = 3.98,
                LoopMostM = 4.02,
                WidthLeastM = 0.006,
                WidthMostM = 0.05,
                LowerGuideM = 0.05,
                ClearanceM = 0.01,
                CutHeightMostM = 0.4,
                MotorW = 3000,
                Wheels = { new SetupWheel { DiameterM = 0.6, Driven = true } },
                Speeds = { new SetupSpeed { SpeedMps = 20, Usual = true } },
            };
            var on = new Mount { Entry = At(0), Saw = saw, Blade = one };
            db.AddRange(
                setup, on,
                new Dismount { Entry = At(2), Mount = on, Reason = OffReason.Dull },
                new Mount { Entry = At(2), Saw = saw, Blade = two },
                new Run { Entry = At(8), Saw = saw, FromUtc = Day, UntilUtc = Day.AddHours(8), RunningMs = 1001, SpeedMps = 20, Grade = HoursGrade.A },
                new CutDone
                {
                    Entry = At(1),
                    Saw = saw,
                    SpeciesKey = "oak",
                    SpeciesTyped = "oak",
                    WoodClass = "A3",
                    HeightM = 0.1,
                    LengthM = 2,
                    Pieces = 5,
                    FeedMps = 0.05,
                    SpeedMps = 20,
                });
            await db.SaveChangesAsync();
            await Kept.Rebuild(db);
        }

        await using var read = shop.Db();
        Assert.Empty(await Verify.Run(read));
        var exposures = await read.Exposures.OrderBy(e => e.MountId).ToListAsync();

        // Only the first blade has cuts, so the run is divided by time: 2 h and 6 h of 8.
        Assert.Equal([250L, 751L], exposures.Select(e => e.RunningMs));

        // A v/(f L) = 1 m² · 20 m/s / (0.05 m/s · 4 m) = 100 m.
        var path = Assert.Single(await read.WoodPaths.ToListAsync());
        Assert.Equal((100_000, 1_000_000, 200_000), (path.PathMm, path.AreaMm2, path.CutMs));
        Assert.Equal(Place.OnSaw, (await read.BladesNow.SingleAsync(b => b.SawId != null)).Place);
    }

    private static int _op;

    private static Entry At(double hours) => new()
    {
        Op = Guid.NewGuid(),
        Part = _op++,
        Kind = "Test",
        AtUtc = Day.AddHours(hours),
        EnteredUtc = Day.AddHours(9),
    };
}

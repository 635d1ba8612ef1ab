using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Fatigue;
using BladeLog.Records;
using CsCheck;

namespace BladeLog.Tests.Advice;

public sealed class MarksAndFacesTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    [Fact]
    public void Rust_seen_at_a_look_leaves_the_share_of_the_median_bends_the_handbook_says()
    {
        BladeFile clean = shop.Blade("Q-18");
        LifeOfBlade before = On(clean), after = On(clean with { Marks = BladeMarks.Rust });
        BandLifeResult book = BandLife.Of(before.Rate!.Case! with { Rusty = true });
        Assert.Equal(book.MedianBends, after.Rate!.Result.MedianBends, 1e-6 * book.MedianBends);
        Assert.Equal(book.MedianBends / before.Rate.Result.MedianBends, after.RustFactor!.Value, 1e-9);
        Assert.InRange(after.RustFactor.Value, 0.01, 0.99);
        Assert.True(after.HoursLeft < before.HoursLeft);
        Assert.Null(before.RustFactor);
    }

    [Fact]
    public void Burrs_are_taken_as_punched_gullets()
    {
        BladeFile clean = shop.Blade("Q-18");
        BandLifeResult book = BandLife.Of(On(clean).Rate!.Case! with { Finish = GulletFinish.Punched });
        LifeOfBlade after = On(clean with { Marks = BladeMarks.Burrs });
        Assert.Equal(book.MedianBends, after.Rate!.Result.MedianBends, 1e-6 * book.MedianBends);
        Assert.InRange(after.BurrFactor!.Value, 0.01, 0.99);
    }

    [Fact]
    public void What_ran_before_the_rust_was_seen_is_not_reckoned_with_it()
    {
        BladeFile clean = shop.Blade("Q-18");
        Assert.Equal(On(clean).Used, On(clean with { Marks = BladeMarks.Rust }).Used);
        BladeFile rusty = clean with { Exposures = [.. clean.Exposures.Select(e => e with { Marks = BladeMarks.Rust })] };
        Assert.True(On(rusty).Used.Gullet > On(clean).Used.Gullet);
    }

    [Fact]
    public void The_because_says_what_rust_costs_and_that_it_is_a_default()
    {
        BladeAdvice rusty = shop.Advice.On(shop.Blade("Q-18") with { Marks = BladeMarks.Rust }, shop.Saw("S3"));
        Figure row = BladeFigures.Of(rusty, AdviceSettings.Handbook).Single(f => f.Name.StartsWith("rust in the gullets", StringComparison.Ordinal));
        Assert.Equal((rusty.Record.RustFactor!.Value, Handbook.Quantities.Provenance.EngineeringDefault), (row.Value, row.Provenance));
    }

    [Fact]
    public void A_held_blade_is_told_no_life_with_its_rust()
    {
        BladeFile held = shop.Blade("Q-18") with { Marks = BladeMarks.Rust, Hold = new Hold { Kind = HoldKind.Crack } };
        Assert.DoesNotContain("Life", string.Join(" ", MarkWords.Means(shop.Advice.On(held, shop.Saw("S3")))), StringComparison.Ordinal);
    }

    [Fact]
    public void A_blade_turned_half_way_bears_on_each_face_half_of_both()
    {
        BladeFile q18 = shop.Blade("Q-18");
        ExposureLine run = q18.Exposures[0], half = run with { RunningMs = run.RunningMs / 2 };
        Damage rate = On(q18).Rate!;
        FaceDamage face = Faces.PerLoop(rate.Case!);
        double loops = run.Hours * rate.Result.BendsPerHour / rate.Case!.Wheels.Count;
        Assert.Equal(Faces.Used(face, loops / 2, loops / 2), On(q18 with { Exposures = [half, half with { InsideOut = true }] }).Used.Gullet, 1e-6);
        Assert.Equal(Faces.Used(face, loops, 0), On(q18 with { Exposures = [run] }).Used.Gullet, 1e-6);
    }

    [Fact]
    public void Turning_a_blade_half_way_never_uses_more_than_not_turning_it() =>
        Gen.Select(Gen.Double[0.1, 200], Gen.Double[0, 1], Gen.Int[0, 1000]).Sample((hours, part, pick) =>
        {
            BladeFile[] ran = [.. shop.Now.Blades.Where(b => b.Exposures.Count > 0)];
            BladeFile file = ran[pick % ran.Length];
            ExposureLine run = file.Exposures[0] with { RunningMs = (long)(hours * 3_600_000) };
            ExposureLine first = run with { RunningMs = (long)(run.RunningMs * part) }, then = run with { RunningMs = run.RunningMs - first.RunningMs };
            double straight = shop.Advice.On(file with { Exposures = [first, then] }, shop.Saw("S2")).Record.Used.Gullet;
            double turned = shop.Advice.On(file with { Exposures = [first, then with { InsideOut = true }] }, shop.Saw("S2")).Record.Used.Gullet;
            Assert.InRange(turned, straight / 2 * (1 - 1e-9), straight * (1 + 1e-9));
        }, iter: 200, threads: 1);

    private LifeOfBlade On(BladeFile file) => shop.Advice.On(file, shop.Saw("S3")).Record;
}

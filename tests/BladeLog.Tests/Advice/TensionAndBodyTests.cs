using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

public sealed class TensionAndBodyTests(DemoShopFixture shop) : IClassFixture<DemoShopFixture>
{
    private const int Osprey = 2;

    [Fact]
    public void A_tension_measured_in_this_spell_rules()
    {
        BladeFile blade = Bare() with { SawId = Osprey, TensionThisSpellPa = 121e6, LastTensionPa = new Dictionary<int, double> { [Osprey] = 140e6 } };
        BladeTension tension = On("S2", blade);
        Assert.Equal((121e6, TensionRule.MeasuredThisSpell, 1.0), (tension.Stress.Value, tension.Rule, tension.FrontEdgeFactor));
    }

    [Fact]
    public void Else_the_last_one_of_this_blade_on_this_saw_and_on_no_other()
    {
        BladeFile blade = Bare() with { LastTensionPa = new Dictionary<int, double> { [Osprey] = 140e6 }, Spec = Spec(117e6) };
        Assert.Equal((140e6, TensionRule.LastMeasuredHere), (On("S2", blade).Stress.Value, On("S2", blade).Rule));
        Assert.Equal((117e6, TensionRule.Target), (On("S1", blade).Stress.Value, On("S1", blade).Rule));
    }

    [Fact]
    public void A_spell_on_another_saw_says_nothing_here()
    {
        BladeFile blade = Bare() with { SawId = 1, TensionThisSpellPa = 121e6 };
        Assert.Equal(TensionRule.DefaultOfSteel, On("S2", blade).Rule);
    }

    [Fact]
    public void A_guessed_tension_is_the_default_of_the_steel_and_asks_for_more_safety()
    {
        BladeTension tension = On("S2", Bare());
        Assert.Equal((90e6, TensionRule.DefaultOfSteel, 1.25), (tension.Stress.Value, tension.Rule, tension.FrontEdgeFactor));
        Assert.Equal("default, not yours", tension.Stress.From);
        Assert.True(tension.Guessed);
    }

    [Fact]
    public void A_weak_saw_cannot_be_guessed_to_pull_more_than_it_can()
    {
        BladeFile wide = Bare() with { WidthM = 0.019, Spec = Spec(null, 0.019) };
        BladeTension tension = On("S3", wide);
        BladeBody body = BladeBody.Of(wide, AdviceSettings.Handbook);
        Assert.Equal(TensionRule.SawGreatestPull, tension.Rule);
        Assert.Equal(800, tension.Stress.Value * body.Thickness.Value * body.BodyWidth, 6);
        Assert.Equal(1.25, tension.FrontEdgeFactor);
    }

    [Fact]
    public void What_the_shop_has_not_said_is_a_default_that_says_so()
    {
        BladeBody body = BladeBody.Of(Bare(), AdviceSettings.Handbook);
        Assert.Equal(1.8 * 0.8e-3, body.Kerf.Value, 12);
        Assert.Equal(Math.Min(0.40 * 25.4e-3 / 3, 0.025 / 5), body.Gullet.Value, 12);
        Assert.Equal(10 * Math.PI / 180, body.Rake.Value, 12);
        Assert.Equal(0.75 * 0.025, body.LeastWidth.Value, 12);
        Assert.All([body.Kerf, body.Gullet, body.Rake, body.Hrc, body.FreshEdge, body.LeastWidth], k => Assert.Equal("default, not yours", k.From));
        Assert.Equal("specification", body.Thickness.From);
    }

    [Fact]
    public void Turning_a_blade_inside_out_starts_the_other_face()
    {
        BladeFile q18 = shop.Blade("Q-18");
        ExposureLine run = q18.Exposures[0], half = run with { RunningMs = run.RunningMs / 2 };
        double straight = Gullet(q18), turned = Gullet(q18 with { Exposures = [half, half with { InsideOut = true }] });
        // The face that lies on the wheels bears far less, yet not nothing.
        Assert.InRange(turned, straight / 2, straight / 2 * 1.1);
        Assert.Equal(straight, Gullet(q18 with { Exposures = [half, half] }), 6);

        double Gullet(BladeFile blade) => shop.Advice.On(blade, shop.Saw("S3")).Record.Used.Gullet;
    }

    [Fact]
    public void Running_before_the_present_weld_does_not_tire_the_weld()
    {
        BladeFile q18 = shop.Blade("Q-18");
        UsedLife before = shop.Advice.On(q18 with { Exposures = [q18.Exposures[0] with { OnThisWeld = false }] }, shop.Saw("S3")).Record.Used;
        Assert.Equal(0, before.Weld);
        Assert.Equal(shop.Of("Q-18").Record.Used.Gullet, before.Gullet);
    }

    [Fact]
    public void After_the_hours_left_the_median_life_is_used_up()
    {
        foreach (BladeAdvice blade in shop.Now.Blades.Select(shop.Advice.Of).Where(b => b.Record.HoursLeft > 0))
        {
            LifeOfBlade life = blade.Record;
            Assert.Equal(1, life.Reckoned.After(life.HoursLeft!.Value, life.Rate!, 2).Blade, 9);
            Assert.Equal(0.80, Math.Max(0.80, life.Reckoned.After(life.HoursToRetire!.Value, life.Rate!, 2).Blade), life.HoursToRetire > 0 ? 9 : 0);
        }
    }

    private BladeTension On(string saw, BladeFile blade) => BladeBody.Of(blade, AdviceSettings.Handbook).TensionOn(shop.Saw(saw).Setup, blade, AdviceSettings.Handbook);

    private static BladeFile Bare()
    {
        Spec spec = Spec(null);
        return new BladeFile { Blade = new Blade { Id = 900, Tag = "X-1", Spec = spec }, Spec = spec, Place = Place.Rack, WidthM = spec.WidthM };
    }

    private static Spec Spec(double? tensionPa, double width = 0.025) => new()
    {
        Code = "X",
        WidthM = width,
        ThicknessM = 0.8e-3,
        PitchCoarseM = 25.4e-3 / 3,
        PitchFineM = 25.4e-3 / 3,
        ToothForm = ToothForm.Hook,
        TipMaterial = TipMaterial.HardenedCarbon,
        BodySteel = BodySteel.FlexibleBack,
        TensionPa = tensionPa,
    };
}

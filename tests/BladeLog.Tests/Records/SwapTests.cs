using BladeLog.Records;
using BladeLog.Records.Folding;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class SwapTests
{
    [Fact]
    public async Task A_swap_takes_one_blade_off_and_puts_the_other_on()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(On("S1", "Q-1", 0));
        await shop.Do(On("S1", "http://bladelog/b/q-2", 2));

        var places = await shop.Ask(db => db.BladesNow.Join(db.Blades, n => n.BladeId, b => b.Id, (n, b) => new { b.Tag, n.Place }).ToDictionaryAsync(x => x.Tag, x => x.Place));
        Assert.Equal(Place.Rack, places["Q-1"]);
        Assert.Equal(Place.OnSaw, places["Q-2"]);
        Assert.Equal(1, await shop.Ask(db => db.OnSaws.CountAsync()));
    }

    [Fact]
    public async Task An_unknown_tag_and_an_unknown_saw_are_named()
    {
        using var shop = await TempShop.WithSaws();
        Assert.Equal("There is no saw S9. | There is no blade Q-9.", await shop.Refused(On("S9", "Q-9", 0)));
    }

    [Fact]
    public async Task A_blade_on_another_saw_is_refused_and_the_entry_in_the_way_is_named()
    {
        using var shop = await TempShop.WithSaws();
        var entry = await shop.Do(On("S1", "Q-1", 0));
        Assert.Equal($"Q-1 is on First since 2 Mar 2026 08:00 (entry {entry}): put that right first.", await shop.Refused(On("S2", "Q-1", 2)));
    }

    [Fact]
    public async Task A_spell_entered_late_must_not_run_into_one_that_is_known()
    {
        using var shop = await TempShop.WithSaws();
        var entry = await shop.Do(On("S1", "Q-1", 4));
        Assert.Equal($"Q-1 is on First since 2 Mar 2026 12:00 (entry {entry}): put that right first.", await shop.Refused(On("S1", "Q-2", 2)));

        await shop.Do(On("S1", "Q-2", 2) with { Until = TempShop.Day.AddHours(4) });
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_blade_that_is_there_already_is_said_to_be()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(On("S1", "Q-1", 0));
        Assert.Equal("Q-1 is on First already.", await shop.Refused(On("S1", "Q-1", 2)));
        Assert.Equal("No blade was on Second at 2 Mar 2026 10:00.", await shop.Refused(new Swap("S2") { At = TempShop.Day.AddHours(2) }));
    }

    [Fact]
    public async Task The_future_is_refused_but_for_a_clock_a_little_fast()
    {
        using var shop = await TempShop.WithSaws();
        shop.Now = TempShop.Day;
        Assert.Equal("2 Mar 2026 08:06 has not come yet: check the date and the tablet's clock.", await shop.Refused(On("S1", "Q-1", 0.1)));
        await shop.Do(On("S1", "Q-1", 0.05));
    }

    [Fact]
    public async Task A_blade_that_does_not_fit_is_recorded_with_one_more_tap_and_a_reason()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new AddSaw("S3", "Small", false, TempShop.Setup(2.6), TempShop.Day.AddDays(-1)));
        var swap = On("S3", "Q-1", 0);
        Assert.Equal("Q-1 is 4,000 mm long; Small takes 2,580 mm to 2,620 mm. -> It is on the saw: record it", await shop.Asked(swap));
        Assert.Equal(0, await shop.Ask(db => db.Mounts.CountAsync()));

        var said = swap with { Although = "measured with the take-up packed" };
        Assert.Equal("Say who records it although it does not fit.", await shop.Refused(said));
        await shop.Do(said, await shop.Person("JP"));
        Assert.Equal("measured with the take-up packed", await shop.Ask(db => db.Mounts.Select(m => m.Although).SingleAsync()));
    }

    [Fact]
    public async Task A_held_blade_is_recorded_only_with_one_more_tap()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new RecordHold("Q-1", HoldKind.Crack) { At = TempShop.Day });
        Assert.Equal("Q-1 is on hold since 2 Mar 2026 08:00. -> It is on the saw: record it", await shop.Asked(On("S1", "Q-1", 1)));
    }

    [Fact]
    public async Task What_the_advice_has_against_it_is_asked_too()
    {
        using var shop = await TempShop.WithSaws();
        Assert.StartsWith("It bends too hard.", await shop.Asked(On("S1", "Q-1", 0) with { Unfit = ["It bends too hard."] }), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Of_two_tablets_one_wins_and_the_other_sees_who_when_and_what()
    {
        using var shop = await TempShop.WithSaws();
        var version = await shop.Ask(db => db.Saws.Where(s => s.Code == "S1").Select(s => s.Version).SingleAsync());
        var (ot, jp) = (await shop.Person("OT"), await shop.Person("JP"));
        var both = await Task.WhenAll(
            Task.Run(() => shop.Write(On("S1", "Q-1", 0) with { SawVersion = version }, ot)),
            Task.Run(() => shop.Write(On("S1", "Q-2", 0) with { SawVersion = version }, jp)));

        Assert.Single(both.OfType<WriteResult.Done>());
        var clash = Assert.Single(both.OfType<WriteResult.Clash>());
        var first = both[0] is WriteResult.Done;
        Assert.Equal((first ? "OT" : "JP", shop.Now, first ? "put Q-1 on First" : "put Q-2 on First"), (clash.Who, clash.When, clash.What));
        Assert.Equal(1, await shop.Ask(db => db.OnSaws.CountAsync()));
    }

    [Fact]
    public async Task Two_blades_change_places_one_saw_after_the_other()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(On("S1", "Q-1", 0));
        await shop.Do(On("S2", "Q-2", 0));
        await shop.Do(new Swap("S1") { At = TempShop.Day.AddHours(1) });
        await shop.Do(On("S2", "Q-1", 2));
        await shop.Do(On("S1", "Q-2", 3));
        Assert.Equal(2, await shop.Ask(db => db.OnSaws.CountAsync()));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    [Fact]
    public async Task A_spell_under_the_wrong_label_is_moved_to_the_right_blade_with_its_hours()
    {
        using var shop = await TempShop.WithSaws();
        var mount = await shop.Do(On("S1", "Q-1", 0));
        await shop.Do(new Swap("S1") { At = TempShop.Day.AddHours(4) });
        await shop.Do(new RecordHours("S1", TempShop.Day, TempShop.Day.AddHours(4), 3_600_000, RunSource.Typed));
        await shop.Do(new MoveSpell(mount, "Q-2", "both were labelled 24"), await shop.Person("OT"));

        var blade = await shop.Ask(db => db.Exposures.Join(db.Mounts, e => e.MountId, m => m.EntryId, (e, m) => new { m.Blade.Tag, e.RunningMs }).SingleAsync());
        Assert.Equal(("Q-2", 3_600_000), (blade.Tag, blade.RunningMs));
        Assert.Empty(await shop.Ask(Verify.Run));
    }

    internal static Swap On(string saw, string tag, double hours) => new(saw) { OnTag = tag, At = TempShop.Day.AddHours(hours) };
}

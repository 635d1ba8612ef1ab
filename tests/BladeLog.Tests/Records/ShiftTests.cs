using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Records;

public class ShiftTests
{
    [Fact]
    public async Task Training_to_clear_holds_gives_the_right_until_the_refresher()
    {
        using var shop = await TempShop.WithSaws();
        var (ot, jp) = (await shop.Person("OT"), await shop.Person("JP"));
        await shop.Do(new RecordHold("Q-1", HoldKind.Clicking));
        await shop.Refused(new ClearHold("Q-1", "looked"), jp);
        await shop.Do(new RecordTraining("JP", TrainedTask.ClearHold, "OT") { RefresherUtc = shop.Now.AddDays(10) }, ot);
        await shop.Do(new ClearHold("Q-1", "looked"), jp);
        shop.Now = shop.Now.AddDays(11);
        await shop.Do(new RecordHold("Q-1", HoldKind.Clicking));
        await shop.Refused(new ClearHold("Q-1", "looked"), jp);
    }

    [Fact]
    public async Task A_training_struck_out_takes_its_right_along()
    {
        using var shop = await TempShop.WithSaws();
        var (ot, jp) = (await shop.Person("OT"), await shop.Person("JP"));
        var training = await shop.Do(new RecordTraining("JP", TrainedTask.ClearHold, "OT"), ot);
        await shop.Do(new RecordHold("Q-1", HoldKind.Clicking));
        await shop.Do(new VoidEntry(training, "wrong person"), ot);
        shop.Now = shop.Now.AddMinutes(1);
        await shop.Refused(new ClearHold("Q-1", "looked"), jp);
        await shop.Do(new ClearHold("Q-1", "looked"), ot);
    }

    [Fact]
    public async Task Nobody_gives_themselves_the_right_to_clear_holds()
    {
        using var shop = await TempShop.WithSaws();
        var (ot, jp) = (await shop.Person("OT"), await shop.Person("JP"));
        Assert.Contains("OT", await shop.Refused(new RecordTraining("JP", TrainedTask.ClearHold, "OT"), jp), StringComparison.Ordinal);
        await shop.Refused(new RecordTraining("OT", TrainedTask.ClearHold, "OT"), ot);
        await shop.Refused(new RecordTraining("OT", TrainedTask.ClearHold, "JP"), ot);
        await shop.Refused(new RecordTraining("JP", TrainedTask.ClearHold, "OT") { Saw = "S1" }, ot);
        Assert.Equal(1, await shop.Ask(db => db.PersonRoles.CountAsync()));
    }

    [Fact]
    public async Task Training_never_shortens_a_right()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new AddPerson("MI", "Manager", [Role.ClearHolds]), await shop.Person("OT"));
        await shop.Do(new RecordTraining("OT", TrainedTask.ClearHold, "MI") { RefresherUtc = shop.Now.AddDays(1) }, await shop.Person("MI"));
        shop.Now = shop.Now.AddDays(5);
        await shop.Do(new RecordHold("Q-1", HoldKind.Clicking));
        await shop.Do(new ClearHold("Q-1", "looked"), await shop.Person("OT"));
    }

    [Fact]
    public async Task The_name_on_the_network_survives_an_edit_of_the_shop()
    {
        using var shop = await TempShop.WithSaws();
        await shop.Do(new SaveLanName("saws.local:5080"));
        await shop.Do(new SaveShop(new Shop { Name = "Another name", Zone = "UTC" }));
        Assert.Equal("saws.local:5080", await shop.Ask(db => db.Shops.Select(s => s.LanName).SingleAsync()));
        await shop.Refused(new SaveLanName("http://saws"));
        await shop.Refused(new SaveLanName("saws/b"));
        await shop.Do(new SaveLanName(" "));
        Assert.Null(await shop.Ask(db => db.Shops.Select(s => s.LanName).SingleAsync()));
    }

    [Fact]
    public async Task A_note_struck_out_takes_its_ticks_along()
    {
        using var shop = await TempShop.WithSaws();
        var (ot, jp) = (await shop.Person("OT"), await shop.Person("JP"));
        var note = await shop.Do(new SaveHandOver("Q-1 hangs on H-1."), ot);
        await shop.Do(new ReadHandOver(note), jp);
        await shop.Do(new VoidEntry(note, "wrong shop"), ot);
        Assert.Equal((0, 0), (await shop.Ask(db => db.HandOvers.CountAsync()), await shop.Ask(db => db.HandOversRead.CountAsync())));
    }
}

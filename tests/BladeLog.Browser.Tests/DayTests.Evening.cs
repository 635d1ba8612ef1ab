using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>The end of the day: hours, the hand-over, the bench.</summary>
public sealed partial class DayTests
{
    private sealed partial class Day
    {
        /// <summary>Task 5: readings where there is a meter, hours as they are known elsewhere; on Finch by the timer.</summary>
        public async Task Hours()
        {
            await At(2, 15, 20);
            await Within(1, "start", "/", () => tablet.Tap(tablet.Tile("S4").GetByRole(AriaRole.Button, new() { Name = "Start timer" })));
            await Expect(tablet.Tile("S4").GetByRole(AriaRole.Button, new() { NameRegex = new("^Stop") })).ToBeVisibleAsync();
            await At(2, 15, 50);
            await Within(1, "stop", "/", () => tablet.Tap(tablet.Tile("S4").GetByRole(AriaRole.Button, new() { NameRegex = new("^Stop") })));
            await Expect(tablet.Tile("S4").GetByRole(AriaRole.Button, new() { Name = "Start timer" })).ToBeVisibleAsync();
            foreach (var saw in new[] { "S1", "S2", "S5" })
            {
                await Within(2, "hour meter, task 5", "/", async () =>
                {
                    await tablet.Tap(tablet.OnTile(saw, "Hours"));
                    await tablet.Field("The meter shows").FillAsync(await NextReading(saw));
                    await tablet.Tap(tablet.Button("Record"));
                    await tablet.IsAt("/saws/" + saw);
                });
            }

            await Within(2, "hours without a meter, task 5", "/saws/S3/timer", async () =>
            {
                await tablet.Tap(tablet.Link("Type hours"));
                await tablet.Field("The wheels turned for").FillAsync("1:30");
                await tablet.Tap(tablet.Button("Record"));
                await tablet.IsAt("/saws/S3");
            });
        }

        /// <summary>The note is there before anybody types: the new hold beside the old one, what to sharpen, what runs low.</summary>
        public async Task HandOver()
        {
            await At(2, 16, 0);
            await tablet.Open("/handover");
            var note = tablet.Field("The note");
            var lines = (await note.InputValueAsync()).Split('\n');
            Assert.Contains(lines, l => l.StartsWith("Hold: Q-20, crack 2.6 mm in a gullet", StringComparison.Ordinal));
            Assert.Equal(2, lines.Count(l => l.StartsWith("Hold: ", StringComparison.Ordinal)));
            // Two are dull: the one that burned, and Longreach's, which has run past the mark after which a grind no longer pays.
            Assert.Contains(lines, l => l.StartsWith("To sharpen: Q-17", StringComparison.Ordinal));
            Assert.Contains(lines, l => l.StartsWith("Dull, no further grind: Q-32 on Longreach", StringComparison.Ordinal));
            Assert.Contains(lines, l => l.StartsWith("Spares on the rack: ", StringComparison.Ordinal));
            Assert.Contains(lines, l => l.StartsWith("Stock: order ", StringComparison.Ordinal));
            // The tablet knows since the morning who is at it.
            await Within(1, "hand-over", null, async () =>
            {
                await tablet.Tap(tablet.Button("Hand over"));
                await Expect(tablet.Page.Locator("main .list")).ToContainTextAsync("16:00, JP");
            });
            Assert.Equal(1, await shop.Ask(db => db.HandOvers.CountAsync(h => h.Entry.AtUtc >= Moment(2, 0, 0).UtcDateTime)));
        }
    }
}

using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>
/// A day on the tablet, as the design's story of it goes (the-job.md, section 1), on the sample shop: the clock moves, each
/// task has its budget of taps. Budgets: the twelve tasks of that section, and criterion U8 of trust.md (swap 3 after a tile,
/// 2 after a scan by section 4 of the-job.md; start or stop 1; sharpening 3; inspection 4; a blade for a cut 3).
/// </summary>
public sealed partial class DayTests(Workbench bench) : IClassFixture<Workbench>
{
    private const string Sharp = "Still sharp";

    [BrowserTheory]
    [InlineData("1280x800", true)]
    [InlineData("800x1280", false)]
    [InlineData("360x740", true)]
    public async Task Every_task_of_the_day_keeps_its_budget_of_taps(string screen, bool script)
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Of(screen), async tablet =>
        {
            var day = new Day(shop, tablet);
            await day.EveningBefore();
            await day.StartOfShift();
            await day.BladeForACut();
            await day.SwapAfterAScan();
            await day.Burning();
            await day.ThreeInspections();
            await day.TwoCuts();
            await day.Hours();
            await day.HandOver();
            await day.Sharpening();
        }, script);
    }

    private sealed partial class Day(ServedShop shop, Tablet tablet)
    {
        private readonly List<string> _marked = [];

        /// <summary>The tension of Finch is let off, so that the morning finds it off.</summary>
        public async Task EveningBefore()
        {
            await At(1, 17, 0);
            await Within(2, "tension off at the end of the day, task 10", "/saws/S4", async () =>
            {
                await tablet.Tap(tablet.Link("Tension off"));
                await tablet.Tap(tablet.Button("Off: slack for the night"));
                await tablet.IsAt("/saws/S4");
            });
            await tablet.Open("/");
            await Expect(tablet.Tile("S4").Locator(".state")).ToHaveTextAsync("slack");
        }

        /// <summary>Task 4: each row of the check is answered by itself, so that nothing is signed without looking; tension found on is written as on.</summary>
        public async Task StartOfShift()
        {
            await At(2, 7, 10);
            foreach (var saw in new[] { "S2", "S3", "S4" })
            {
                await Within(8, "start check: a tap for each of five rows, who, in and out; task 4", "/checks", async () =>
                {
                    await tablet.Tap(tablet.Page.Locator($"main .list a[href='/saws/{saw}/check']"));
                    foreach (var row in new[] { "Guards", "Tension", "UnderTable", "Quiet", "Brake" })
                    {
                        await tablet.Tap(tablet.Page.Locator($"label.opt:has(input[name={row}][value=yes])"));
                    }

                    if (await tablet.Choice("JP").CountAsync() > 0)
                    {
                        await tablet.Tap(tablet.Choice("JP"));
                    }

                    await tablet.Tap(tablet.Button("Record the check"));
                    await tablet.IsAt("/checks");
                });
            }

            await Expect(tablet.Title).ToHaveTextAsync("3 of 5 saws looked at today");
            await Expect(tablet.Page.Locator("main .list li", new() { HasText = "Finch" })).ToContainTextAsync("tension was off, now on");
            await tablet.Open("/");
            await Expect(tablet.Tile("S4").Locator(".state")).ToHaveTextAsync("runs");
        }

        /// <summary>Task 2: four cuts wait for the 700 mm saw; the third wants the thin kerf of Q-13, and the card says where it hangs.</summary>
        public async Task BladeForACut()
        {
            await At(2, 7, 25);
            await tablet.Open("/saws/S2");
            await Expect(tablet.Page.Locator("section:has(h2:text-is('Next cuts')) li")).ToHaveCountAsync(4);
            await Within(3, "a blade for a cut, task 2", "/", async () =>
            {
                await tablet.Tap(tablet.Tile("S2").GetByRole(AriaRole.Heading).GetByRole(AriaRole.Link));
                await tablet.Tap(tablet.Page.Locator("main a[href='/cuts/3']"));
            });
            var best = tablet.Page.Locator("article.best");
            await Expect(best).ToContainTextAsync("Q-13");
            await Expect(best).ToContainTextAsync("R2-5");
            await Expect(best.Locator(".state")).ToContainTextAsync("fits");
        }

        /// <summary>Task 1.</summary>
        public async Task SwapAfterAScan()
        {
            await At(2, 7, 26);
            await tablet.Open("/saws/S2/swap");
            var scan = tablet.Field("Scan or type");
            await scan.FillAsync("http://shop.local/b/Q-13");
            await scan.PressAsync("Enter");
            await Expect(tablet.Title).ToContainTextAsync("Q-08 off, Q-13 on");
            await Within(2, "swap after a scan, task 1", null, async () =>
            {
                await tablet.Tap(tablet.Choice(Sharp));
                await tablet.Tap(tablet.Button("Put Q-13 on"));
                await tablet.IsAt("/saws/S2");
            });
            await tablet.Open("/");
            await Expect(tablet.Tile("S2").Locator(".on")).ToContainTextAsync("Q-13");
        }

        /// <summary>Task 6: one tap at the saw; the blade is off, and waits for the bench before it goes on again.</summary>
        public async Task Burning()
        {
            await At(2, 9, 40);
            await Within(1, "burning, task 6", "/saws/S3", async () =>
            {
                await tablet.Tap(tablet.Button("Burning: Q-17 off, dull"));
                await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToContainTextAsync("Q-17 off Wren");
            });
            await tablet.Open("/bench");
            await Expect(tablet.Page.Locator("section:has(h2:text('To sharpen'))")).ToContainTextAsync("Q-17");
            await Within(2, "the next blade onto the empty saw, task 1", "/saws/S3/swap", async () =>
            {
                await tablet.Tap(tablet.Choice("Q-18"));
                await tablet.Tap(tablet.Button("Put it on"));
                await tablet.IsAt("/saws/S3");
            });
        }

        /// <summary>Task 7: three at the bench; one has a crack in a gullet, which holds it, and its label says so.</summary>
        public async Task ThreeInspections()
        {
            await At(2, 11, 30);
            foreach (var tag in new[] { "Q-04b", "Q-06" })
            {
                await Within(4, "inspection, task 7", "/bench", () => Look(tag, "Nothing seen"));
            }

            await Within(4, "inspection with a crack, task 7", "/bench", async () =>
            {
                await tablet.Tap(Row("Q-20"));
                await tablet.Tap(tablet.Answer("Found", "Crack"));
                await tablet.Tap(tablet.Answer("Place", "Gullet"));
                await tablet.Fill("How long", "2.6");
                await tablet.Tap(tablet.Button("Record the look"));
                await tablet.IsAt("/blades/Q-20");
            });
            await Expect(tablet.Page.Locator("main")).ToContainTextAsync("2.6 mm");
            await tablet.Open("/labels?tags=Q-20");
            await tablet.Page.EmulateMediaAsync(new() { Media = Media.Print });
            await Expect(tablet.Page.Locator(".label.held")).ToContainTextAsync("Q-20");
            await Expect(tablet.Page.Locator(".label.held .state")).ToContainTextAsync("HOLD");
            await tablet.Page.EmulateMediaAsync(new() { Media = Media.Screen });
        }

        /// <summary>Task 3: the cut of the list, then the same again; one too many is taken back with one tap.</summary>
        public async Task TwoCuts()
        {
            await At(2, 13, 0);
            await Within(2, "a cut of the list is done, task 3", "/cuts/3", async () =>
            {
                await tablet.Tap(tablet.Link("Cut it with Q-13"));
                await tablet.Tap(tablet.Button("It is cut"));
                await tablet.IsAt("/cuts");
            });
            await At(2, 13, 20);
            await Within(2, "the last cut again, task 3", "/saws/S2", async () =>
            {
                await tablet.Tap(tablet.Link("Cut done"));
                await tablet.Tap(tablet.Page.Locator("button:has-text('Again: Indian rosewood 190')"));
                await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToContainTextAsync("Indian rosewood");
            });
            Assert.Equal(2, await Cuts());
            await At(2, 13, 21);
            await Within(2, "the last cut again, task 3", "/saws/S2", async () =>
            {
                await tablet.Tap(tablet.Link("Cut done"));
                await tablet.Tap(tablet.Page.Locator("button:has-text('Again: Indian rosewood 190')"));
                await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToContainTextAsync("Indian rosewood");
            });
            Assert.Equal(3, await Cuts());
            await Within(1, "undo", null, async () =>
            {
                await tablet.Tap(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" }));
                await Expect(tablet.Foot).ToContainTextAsync("Undone");
                await Expect(tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" })).ToHaveCountAsync(0);
            });
            Assert.Equal(2, await Cuts());
        }

        /// <summary>Task 8.</summary>
        public async Task Sharpening()
        {
            await At(2, 16, 10);
            await Within(3, "sharpening, task 8", "/bench", async () =>
            {
                await tablet.Tap(Row("Q-17"));
                await tablet.Tap(tablet.Choice("the tooth faces only"));
                await tablet.Tap(tablet.Button("Record the grind"));
                await tablet.IsAt("/blades/Q-17");
            });
            await tablet.Open("/bench");
            await Expect(tablet.Page.Locator("section:has(h2:text('To sharpen'))")).Not.ToContainTextAsync("Q-17");
        }

        private ILocator Row(string tag) => tablet.Page.Locator($"main a.hang:has(.t:text('{tag}'))");

        private async Task Look(string tag, string found)
        {
            await tablet.Tap(Row(tag));
            await Expect(tablet.Title).ToContainTextAsync(tag);
            await tablet.Tap(tablet.Choice(found));
            await tablet.Tap(tablet.Choice("The whole loop"));
            await tablet.Tap(tablet.Button("Record the look"));
            await tablet.IsAt("/blades/" + tag);
        }

        private Task<int> Cuts() => shop.Ask(db => db.CutsDone.CountAsync(c => c.Saw.Code == "S2" && c.Entry.Void == null && c.Entry.AtUtc >= Moment(2, 0, 0).UtcDateTime));

        private async Task<string> NextReading(string saw)
        {
            var ms = await shop.Ask(db => db.MeterReadings.Where(r => r.Entry.Void == null && r.SawId == db.Saws.Single(s => s.Code == saw).Id)
                .OrderByDescending(r => r.Entry.AtUtc).Select(r => r.ReadingMs).FirstAsync());
            return (TimeSpan.FromMilliseconds(ms).TotalHours + 1.5).ToString("0.0", System.Globalization.CultureInfo.InvariantCulture);
        }

        private static DateTimeOffset Moment(int day, int hour, int minute) => new(2026, 12, day, hour, minute, 0, TimeSpan.Zero);

        private Task At(int day, int hour, int minute)
        {
            shop.Clock.SetUtcNow(Moment(day, hour, minute));
            return Task.CompletedTask;
        }

        /// <summary>Taps from a page that is open to the entry that is recorded.</summary>
        private async Task Within(int budget, string task, string? from, Func<Task> steps)
        {
            if (from is not null)
            {
                await tablet.Open(from);
            }

            var before = tablet.Taps;
            await steps();
            _marked.Add($"{task}: {tablet.Taps - before} of {budget}");
            Assert.True(tablet.Taps - before <= budget, _marked[^1]);
        }
    }
}

using Microsoft.EntityFrameworkCore;

namespace BladeLog.Browser.Tests;

/// <summary>Every entry of a working day can be taken back for a minute, with one tap, with script and without.</summary>
public sealed class UndoTests(Workbench bench) : IClassFixture<Workbench>
{
    /// <summary>The daily entries as forms: where, and what is chosen, typed and pressed.</summary>
    private static readonly (string Entry, string Path, string[] Steps)[] Entries =
    [
        ("swap", "/saws/S3/swap?on=Q-18", ["choose:Still sharp", "press:Put Q-18 on"]),
        ("a blade off", "/saws/S2/swap", ["choose:Other work", "press:Only take Q-08 off"]),
        ("burning", "/saws/S2", ["press:Burning: Q-08 off, dull"]),
        ("clicking", "/saws/S1/clicking", ["press:It clicks: stop and hold Q-01"]),
        ("tension off", "/saws/S4/slack", ["press:Off: slack for the night"]),
        ("hours", "/saws/S4/hours", ["fill:The wheels turned for=1:30", "press:Record"]),
        ("meter", "/saws/S1/hours", ["fill:The meter shows=7020.5", "press:Record"]),
        ("cut of the list", "/cuts/7/done?blade=Q-01&saw=S1", ["press:It is cut"]),
        ("cut at the saw", "/saws/S2/cut", ["first:Again"]),
        ("look", "/blades/Q-18/inspect", ["choose:Nothing seen", "choose:The whole loop", "press:Record the look"]),
        ("crack", "/blades/Q-18/inspect", ["choose:Crack", "is:Place=Gullet", "press:Record the look"]),
        ("grind", "/blades/Q-18/sharpen", ["choose:the tooth faces only", "press:Record the grind"]),
        ("start check", "/saws/S1/check", ["yes:Guards", "yes:Tension", "yes:UnderTable", "yes:Quiet", "yes:Brake", "choose:RU", "press:Record the check"]),
        ("place", "/blades/Q-18/hang", ["choose:Bench", "press:Record it"]),
        ("lead", "/blades/Q-08/drift", ["fill:It leads by=0.5", "choose:Left", "press:Record it"]),
        ("hand-over", "/handover", ["press:Hand over"]),
    ];

    [BrowserTheory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task Every_daily_entry_is_taken_back_with_one_tap(bool script)
    {
        await using var shop = await ServedShop.Sample();
        shop.Clock.Advance(TimeSpan.FromHours(5));
        await bench.At(shop, Screen.Lying, async tablet =>
        {
            foreach (var (entry, path, steps) in Entries)
            {
                var before = await Standing(shop);
                await tablet.Open(path);
                foreach (var step in steps)
                {
                    await Do(tablet, step, entry);
                }

                var undo = tablet.Foot.GetByRole(AriaRole.Button, new() { Name = "Undo" });
                await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Saved");
                await Expect(undo).ToBeVisibleAsync();
                Assert.True(await Standing(shop) > before, $"{entry}: nothing was recorded.");
                // A minute on the screen, and then it is gone; the correction stays with the record.
                shop.Clock.Advance(TimeSpan.FromSeconds(58));
                await tablet.Open("/");
                await tablet.Tap(undo);
                await Expect(undo).ToHaveCountAsync(0);
                Assert.True(await Standing(shop) == before, $"{entry}: {await Standing(shop)} entries stand, {before} stood before.");
                shop.Clock.Advance(TimeSpan.FromMinutes(5));
            }
        }, script);
    }

    private static async Task Do(Tablet tablet, string step, string entry)
    {
        var (verb, what) = (step.Split(':')[0], step[(step.IndexOf(':') + 1)..]);
        switch (verb)
        {
            case "choose":
                await tablet.Tap(tablet.Choice(what).First);
                break;
            case "yes":
                await tablet.Tap(tablet.Page.Locator($"label.opt:has(input[name={what}][value=yes])"));
                break;
            case "is":
                await tablet.Tap(tablet.Answer(what.Split('=')[0], what.Split('=')[1]));
                break;
            case "fill":
                await tablet.Field(what.Split('=')[0]).FillAsync(what.Split('=')[1]);
                break;
            case "press":
                await tablet.Tap(tablet.Button(what));
                break;
            case "first":
                await tablet.Tap(tablet.Page.Locator("main").GetByRole(AriaRole.Button, new() { Name = what }).First);
                break;
            default:
                Assert.Fail($"{entry}: no such step as {step}.");
                break;
        }
    }

    /// <summary>Entries that stand: neither struck out nor the striking out itself.</summary>
    private static Task<int> Standing(ServedShop shop) => shop.Ask(db => db.Entries.CountAsync(e => e.Void == null && e.Kind != "Void"));
}

namespace BladeLog.Browser.Tests;

/// <summary>A gloved finger writes a figure without the keyboard: the one of last time, and steps from it.</summary>
public sealed class StepKeysTests(Workbench bench) : IClassFixture<Workbench>
{
    [BrowserFact]
    public async Task A_reading_is_the_last_one_and_a_few_steps()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S1/hours");
            var reading = tablet.Page.GetByLabel("The meter shows", new() { Exact = true });
            await tablet.Tap(tablet.Button("The meter shows: 7019.3 as last time"));
            await Expect(reading).ToHaveValueAsync("7019.3");
            await tablet.Tap(tablet.Button("The meter shows: +1"));
            await tablet.Tap(tablet.Button("The meter shows: +0.1"));
            await Expect(reading).ToHaveValueAsync("7020.4");
            // What is typed with a decimal comma is stepped all the same; what is no plain number is left as it is.
            await reading.FillAsync("7020,5");
            await tablet.Tap(tablet.Button("The meter shows: −0.1"));
            await Expect(reading).ToHaveValueAsync("7020.4");
            await reading.FillAsync("7020 h 30");
            await tablet.Tap(tablet.Button("The meter shows: +1"));
            await Expect(reading).ToHaveValueAsync("7020 h 30");
        });
    }

    [BrowserFact]
    public async Task A_fraction_is_stepped_as_the_inches_it_is_and_never_as_millimetres()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/cuts/new");
            var height = tablet.Page.GetByLabel("Height along the blade", new() { Exact = true });
            await height.FillAsync("1/2");
            await tablet.Tap(tablet.Button("Height along the blade: +1"));
            await Expect(height).ToHaveValueAsync("1/2");
            await height.FillAsync("1,200");
            await tablet.Tap(tablet.Button("Height along the blade: +1"));
            await Expect(height).ToHaveValueAsync("1,200");

            await tablet.Open("/setup");
            await tablet.Page.Locator("[name=Lengths][value=Inch]").CheckAsync(new() { Force = true });
            await tablet.Page.Locator("form[action='/setup'] button[type=submit]").First.ClickAsync();
            await Expect(tablet.Page.Locator("#saved")).ToContainTextAsync("Saved");
            await tablet.Open("/cuts/new");
            height = tablet.Page.GetByLabel("Height along the blade", new() { Exact = true });
            await height.FillAsync("3 15/16");
            await tablet.Tap(tablet.Button("Height along the blade: +0.1"));
            await Expect(height).ToHaveValueAsync("4.0375");
            await tablet.Tap(tablet.Button("Height along the blade: −1"));
            await Expect(height).ToHaveValueAsync("3.0375");
        });
    }

    [BrowserFact]
    public async Task Without_script_no_key_stands_there_that_does_nothing()
    {
        await using var shop = await ServedShop.Sample();
        await bench.At(shop, Screen.Standing, async tablet =>
        {
            await tablet.Open("/saws/S1/hours");
            await Expect(tablet.Page.Locator(".steps button").First).ToBeHiddenAsync();
        }, script: false);
    }
}

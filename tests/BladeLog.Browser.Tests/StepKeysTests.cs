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

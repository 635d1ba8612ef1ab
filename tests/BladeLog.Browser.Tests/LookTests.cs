namespace BladeLog.Browser.Tests;

/// <summary>The measure itself: it must see what it is there to see, and be content with a sound page.</summary>
public sealed class LookTests(Workbench bench) : IClassFixture<Workbench>, IAsyncLifetime
{
    private const string Sheet = "*{margin:0;box-sizing:border-box}body{font:20px/1.4 sans-serif}a,button{font-size:24px;display:inline-block;width:120px;height:120px;margin:8px}";

    private ServedShop? _shop;

    public Task InitializeAsync()
    {
        _shop = Chromium.Path is null ? null : ServedShop.Unmade();
        return Task.CompletedTask;
    }

    public async Task DisposeAsync()
    {
        if (_shop is not null)
        {
            await _shop.DisposeAsync();
        }
    }

    [BrowserTheory]
    [InlineData("sideways", "<div style='width:900px;height:9px'></div>")]
    [InlineData("sideways", "<div class=scroll style='overflow-x:auto;width:300px'><div style='width:600px'>wide table</div></div>")]
    [InlineData("small", "<a href=/ style='height:60px'>Floor</a>")]
    [InlineData("small", "<input style='height:40px;width:200px;font-size:20px'>")]
    [InlineData("small for a frequent one", "<button class='btn main' style='height:100px'>Put it on</button>")]
    [InlineData("small for a frequent one", "<div class=hands><a class=btn href=/saws/S1/swap style='width:100px'>Swap</a></div>")]
    [InlineData("targets overlap", "<a href=/>Floor</a><a href=/rack style='margin-left:-60px'>Rack</a>")]
    [InlineData("targets too close", "<button class=btn style='margin:0'>One</button><button class=btn style='margin:0 0 0 4px'>Two</button>")]
    [InlineData("risky too near", "<a class='btn big' href=/blades/Q-1/sharpen>Sharpen</a><a class=btn href=/blades/Q-1/retire style='margin:80px 0 0'>Retire</a>")]
    [InlineData("risky too near", "<form action=/blades/Q-1/retire><label class=opt><input type=radio style='width:120px;height:120px'></label><div><button type=submit class='btn big'>Retire</button></div></form>")]
    [InlineData("key data", "<p class=key>What counts</p>")]
    [InlineData("key data", "<div class=fig><p style='font-size:60px'><b>723</b></p></div>")]
    [InlineData("text", "<p style='font-size:16px'>small print</p>")]
    [InlineData("text", "<input style='height:80px;width:200px;font-size:16px'>")]
    [InlineData("text", "<svg width=200 height=40 viewBox='0 0 400 80'><text x=0 y=40 style='font-size:20px'>shrunk</text></svg>")]
    [InlineData("cut off", "<svg width=760 height=40 style='overflow:visible'><text x=740 y=30>beyond the edge</text></svg>")]
    [InlineData("labels overlap", "<svg width=400 height=60><text x=0 y=30>one label</text><text x=40 y=34>another</text></svg>")]
    [InlineData("leader through a label", "<svg class=life width=400 height=60><line class=lead x1=40 x2=40 y1=0 y2=60 stroke='#000'/><text x=10 y=36>a long label</text></svg>")]
    [InlineData("spills", "<h2 style='width:80px;white-space:nowrap'>a heading that needs more</h2>")]
    [InlineData("floor scrolls", "<main class=floor style='height:1400px'></main>")]
    public async Task It_finds(string rule, string fault) =>
        Assert.Contains(await Measured(fault), f => f.StartsWith(rule + ":", StringComparison.Ordinal));

    [BrowserFact]
    public async Task It_is_content_with_a_sound_page() =>
        Assert.Empty(await Measured(
            "<main><h1>Floor</h1><p>Words</p><a href=/saws/S1/swap class=btn>Swap</a><button class='btn main'>Put it on</button>"
            + "<svg class=life width=400 height=80><line class=lead x1=10 x2=10 y1=0 y2=80 stroke='#000'/><text x=20 y=30>one label</text><text x=20 y=60>another</text></svg></main>"));

    [BrowserFact]
    public async Task A_page_that_complains_fails_its_test()
    {
        var complaint = await Assert.ThrowsAnyAsync<Exception>(() => bench.At(_shop!, Screen.Standing, async tablet =>
        {
            await tablet.Open("/start");
            // The page's own policy forbids a style attribute.
            await tablet.Page.EvaluateAsync("document.body.insertAdjacentHTML('beforeend', '<p style=\"color:red\">x</p>')");
            await tablet.Open("/trouble/404");
        }));
        Assert.Contains("Content Security Policy", complaint.Message, StringComparison.Ordinal);
        Assert.Contains("404", complaint.Message, StringComparison.Ordinal);
    }

    private async Task<IReadOnlyList<string>> Measured(string body)
    {
        IReadOnlyList<string> found = [];
        await bench.At(_shop!, Screen.Standing, async tablet =>
        {
            await tablet.Page.SetContentAsync($"<!doctype html><meta name=viewport content='width=device-width,initial-scale=1'><style>{Sheet}</style>{body}");
            found = await Look.Measured(tablet);
        });
        return found;
    }
}

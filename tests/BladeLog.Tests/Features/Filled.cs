using System.Net;
using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Tests.Features;

/// <summary>A form filled in and sent as a browser sends it: what stands in it goes along, what is named is typed over it.</summary>
internal static class Filled
{
    /// <summary>Sends the form on a page; the fields named are typed, ticked or pressed.</summary>
    public static async Task<Answered> Fill(this ShopApp app, string page, params (string Name, string? Value)[] typed) =>
        await app.SendForm(await app.GetPage(page), page.Split('?')[0], typed);

    /// <summary>Sends a form of a page already open, so that two tablets can hold the same one.</summary>
    public static async Task<Answered> SendForm(this ShopApp app, IDocument page, string action, params (string Name, string? Value)[] typed)
    {
        var form = page.QuerySelectorAll("form[method=post]").OfType<IHtmlFormElement>().FirstOrDefault(f => f.GetAttribute("action") == action);
        Assert.True(form is not null, $"No form is sent to {action}.");
        var fields = form!.Elements.Where(e => e.GetAttribute("form") is null).SelectMany(Standing)
            .Where(f => typed.All(t => t.Name != f.Key))
            .Concat(typed.Where(t => t.Value is not null).Select(t => KeyValuePair.Create(t.Name, t.Value!)))
            .ToList();
        using var body = new FormUrlEncodedContent(fields);
        using var answer = await app.Client.PostAsync(action, body);
        var html = await answer.Content.ReadAsStringAsync();
        return new Answered(answer.StatusCode, answer.Headers.Location?.OriginalString, ShopApp.Parse(html));
    }

    public static async Task<int> EntryCount(this ShopApp app)
    {
        await using var db = app.NewContext();
        return await db.Entries.CountAsync();
    }

    /// <summary>The tag on a saw as the kept state has it; null: none.</summary>
    public static async Task<string?> TagOn(this ShopApp app, string saw)
    {
        await using var db = app.NewContext();
        return await db.OnSaws.Where(o => db.Saws.Any(s => s.Id == o.SawId && s.Code == saw))
            .Join(db.Blades, o => o.BladeId, b => b.Id, (_, b) => b.Tag).SingleOrDefaultAsync();
    }

    public static async Task<bool> IsHeld(this ShopApp app, string tag)
    {
        await using var db = app.NewContext();
        return await db.BladesNow.AnyAsync(n => n.HoldId != null && db.Blades.Any(b => b.Id == n.BladeId && b.Tag == tag));
    }

    /// <summary>The kept state equals what the facts give when folded anew.</summary>
    public static async Task AssertKept(this ShopApp app)
    {
        await using var db = app.NewContext();
        Assert.Empty(await BladeLog.Records.Folding.Verify.Run(db));
    }

    public static async Task Be(this ShopApp app, string initials)
    {
        var answer = await app.Fill("/who", ("Who", initials));
        Assert.Equal(HttpStatusCode.Redirect, answer.Status);
    }

    private static IEnumerable<KeyValuePair<string, string>> Standing(IHtmlElement element)
    {
        var name = element.GetAttribute("name");
        if (string.IsNullOrEmpty(name))
        {
            yield break;
        }

        switch (element)
        {
            case IHtmlInputElement { Type: "radio" or "checkbox" } box:
                if (box.IsChecked)
                {
                    yield return new(name, box.Value);
                }

                break;
            case IHtmlInputElement input:
                yield return new(name, input.Value);
                break;
            case IHtmlSelectElement select:
                yield return new(name, select.Value ?? "");
                break;
            case IHtmlTextAreaElement area:
                yield return new(name, area.Value);
                break;
        }
    }
}

internal sealed record Answered(HttpStatusCode Status, string? Location, IDocument Page)
{
    public string Text => System.Text.RegularExpressions.Regex.Replace(Page.Body?.TextContent ?? "", @"\s+", " ");

    /// <summary>The sentence beside a field.</summary>
    public string? Beside(string field) => Page.QuerySelector($"#f-{field}-err")?.TextContent;

    public string? Typed(string field) => Page.QuerySelector($"input[name='{field}']")?.GetAttribute("value");

    public Answered LeadsTo(string path)
    {
        Assert.True(Status == HttpStatusCode.Redirect, $"{(int)Status}: {Text}");
        Assert.Equal(path, Location);
        return this;
    }

    public Answered Refused()
    {
        Assert.True(Status == HttpStatusCode.UnprocessableEntity, $"{(int)Status}: {Text}");
        return this;
    }
}

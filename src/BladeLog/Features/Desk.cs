using System.Globalization;
using BladeLog.Advice;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features;

/// <summary>
/// What every page has at hand for one request: the moment, the shop read once, the advice on it, its units, the title
/// block, and the one way to record. Scoped to the request.
/// </summary>
internal sealed class Desk(TimeProvider clock, ShopDb db, ShopWriter writer, IHttpContextAccessor accessor)
{
    /// <summary>The person who said last who is at this tablet.</summary>
    public const string WhoCookie = "who";

    /// <summary>The device of what another program sent.</summary>
    public const string ByJson = "JSON";

    /// <summary>What was just recorded and can be taken back: entry, words, time.</summary>
    private const string SavedCookie = "saved";

    private const string HandCookie = "hand";
    private const string Left = "left";

    /// <summary>In the place of an entry that can be undone: it was.</summary>
    private const int WasUndone = -1;

    private static readonly TimeSpan UndoFor = TimeSpan.FromSeconds(60);

    private ShopNow? _shop;
    private ShopAdvice? _advice;
    private Person? _who;

    /// <summary>Taken once, so that one request has one now.</summary>
    public DateTime Now { get; } = clock.GetUtcNow().UtcDateTime;

    public ShopDb Db => db;

    private HttpContext Http => accessor.HttpContext!;

    public async Task<ShopNow> Shop() => _shop ??= await ShopNowReader.Read(db, Now);

    public async Task<ShopAdvice> Advice() => _advice ??= new ShopAdvice(await Shop());

    public async Task<ShopUnits> Units() => Units((await Shop()).Shop);

    public static ShopUnits Units(Shop shop) => new()
    {
        Units = shop.Lengths == LengthUnit.Inch ? UnitSystem.Inch : UnitSystem.Metric,
        UkSpelling = shop.Spelling == Spelling.Uk,
        Pull = shop.PullWord == Records.PullWord.Strain ? Ui.PullWord.Strain : Ui.PullWord.Tension,
        CurrencyDigits = shop.CurrencyDigits,
        Zone = TimeZoneInfo.TryFindSystemTimeZoneById(shop.Zone, out var zone) ? zone : TimeZoneInfo.Utc,
    };

    /// <summary>The person at this tablet, by the initials they tapped; null when nobody has said.</summary>
    public async Task<Person?> Who()
    {
        var initials = Http.Request.Cookies[WhoCookie];
        if (_who is not null || string.IsNullOrEmpty(initials))
        {
            return _who;
        }

        return _who = await db.People.AsNoTracking().Include(p => p.Roles).FirstOrDefaultAsync(p => p.Initials == initials && p.Active);
    }

    /// <summary>The person said on a form itself, kept for this tablet where it knew nobody; false where nobody is called so.</summary>
    public async Task<bool> SayWho(string initials)
    {
        var person = await db.People.AsNoTracking().Include(p => p.Roles).FirstOrDefaultAsync(p => p.Initials == initials && p.Active);
        if (person is null)
        {
            return false;
        }

        // Somebody called to sign one entry does not take the tablet over from whoever works at it.
        var alone = await Who() is null || Http.Request.Path == "/who";
        _who = person;
        if (!alone)
        {
            return true;
        }

        Http.Response.Cookies.Append(
            WhoCookie, person.Initials, new CookieOptions { HttpOnly = true, SameSite = SameSiteMode.Strict, MaxAge = TimeSpan.FromHours(12), IsEssential = true });
        return true;
    }

    /// <summary>At which side of this tablet what is tapped often stands.</summary>
    public void SayHand(bool left) => Http.Response.Cookies.Append(
        HandCookie, left ? Left : "right", new CookieOptions { HttpOnly = true, SameSite = SameSiteMode.Strict, MaxAge = TimeSpan.FromDays(400), IsEssential = true });

    public async Task<Chrome> Chrome()
    {
        var shop = await Shop();
        var (savedAt, undo, undone) = LastSaved(Units(shop.Shop));
        return new Chrome(shop.Shop.Name, (await Who())?.Initials, savedAt, undo) { Undone = undone, LeftHand = Http.Request.Cookies[HandCookie] == Left };
    }

    public async Task<IResult> Page<TView, TModel>(TModel model, int status = StatusCodes.Status200OK)
        where TView : View<TModel> => Html.View<TView, TModel>(model, await Chrome(), status);

    /// <summary>Records a form's command. A form without an op, or with one that is no GUID, gets a new one: it cannot be sent twice then.</summary>
    public async Task<WriteResult> Write(Command command, string? op, string? answerPath, string? typedAt = null, string? device = null, string? form = null) =>
        await writer.Write(
            command,
            new Sent(Guid.TryParse(op, out var id) ? id : Guid.NewGuid(), Now, (await Who())?.Id, device, typedAt, answerPath) { Form = form },
            Http.RequestAborted);

    /// <summary>Where a recorded form leads: to its page, with an undo for a minute.</summary>
    public IResult Saved(WriteResult.Done done, string what, bool canUndo = true) => Told(done, canUndo ? done.EntryId : 0, what);

    /// <summary>Where an undo leads: the title block says that, and what, is undone.</summary>
    public IResult Undone(WriteResult.Done done, string what) => Told(done, WasUndone, what);

    /// <summary>What was done by the entry that is being undone, as its undo named it.</summary>
    public string WhatWas(int entry) =>
        Http.Request.Cookies[SavedCookie]?.Split('|', 3) is [var id, _, var what] && id == entry.ToString(CultureInfo.InvariantCulture) ? what : "";

    private IResult Told(WriteResult.Done done, int entry, string what)
    {
        Http.Response.Cookies.Append(
            SavedCookie,
            string.Create(CultureInfo.InvariantCulture, $"{entry}|{new DateTimeOffset(Now).ToUnixTimeSeconds()}|{what}"),
            new CookieOptions { HttpOnly = true, SameSite = SameSiteMode.Strict, MaxAge = TimeSpan.FromHours(12), IsEssential = true });
        return Results.Redirect(done.AnswerPath);
    }

    private (string? SavedAt, UndoOffer? Undo, string? Undone) LastSaved(ShopUnits units)
    {
        var parts = Http.Request.Cookies[SavedCookie]?.Split('|', 3);
        if (parts is not [var entry, var seconds, var what] || !int.TryParse(entry, out var id)
            || !long.TryParse(seconds, NumberStyles.None, CultureInfo.InvariantCulture, out var unix) || unix > 253_402_300_799)
        {
            return (null, null, null);
        }

        var at = DateTimeOffset.FromUnixTimeSeconds(unix).UtcDateTime;
        var local = TimeZoneInfo.ConvertTimeFromUtc(at, units.Zone).ToString("HH:mm", CultureInfo.InvariantCulture);
        var undo = id > 0 && Now - at is var age && age >= TimeSpan.Zero && age < UndoFor
            ? new UndoOffer(what, $"/record/{id.ToString(CultureInfo.InvariantCulture)}/void", Guid.NewGuid().ToString())
            : null;
        return (local, undo, id == WasUndone ? what : null);
    }
}

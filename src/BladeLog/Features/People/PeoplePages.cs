using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.People;

public sealed record WhoForm : PostedForm
{
    public string? Back { get; init; }
}

public sealed record WhoModel(IReadOnlyList<Person> People, string? Who, string Back, FormState State);

public sealed record PersonForm : PostedForm
{
    public string? Initials { get; init; }

    public string? Name { get; init; }

    public string? Version { get; init; }

    public string? Active { get; init; }

    public string? ClearHolds { get; init; }

    public string? Sharpen { get; init; }

    public string? Weld { get; init; }
}

public sealed record PeopleModel(IReadOnlyList<Person> People);

public sealed record PersonModel(PersonForm Form, FormState State, bool New);

/// <summary>Who is at the tablet, by a tap on the initials; and who there is.</summary>
internal static class PeoplePages
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/who", Who);
        app.MapPost("/who", SayWho);
        app.MapGet("/people", List);
        app.MapGet("/people/new", (Desk desk) => Show(desk, new PersonForm { Active = "true" }, FormState.New, isNew: true));
        app.MapPost("/people/new", Add);
        app.MapGet("/people/{initials}", Open);
        app.MapPost("/people/{initials}", Edit);
    }

    private static async Task<IResult> Who(Desk desk, HttpContext http) => await WhoPage(desk, Local(http.Request.Headers.Referer), FormState.New);

    private static async Task<IResult> SayWho([FromForm] WhoForm? form, Desk desk) => await desk.SayWho(form?.Who ?? "")
        ? Results.Redirect(Local(form?.Back))
        : await WhoPage(desk, Local(form?.Back), FormState.New with { Problems = [new("Who", "Tap your initials.")], Status = StatusCodes.Status422UnprocessableEntity });

    private static async Task<IResult> WhoPage(Desk desk, string back, FormState state) => await desk.Page<WhoPage, WhoModel>(
        new(await desk.Db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).ToListAsync(), (await desk.Who())?.Initials, back, state), state.Status);

    /// <summary>Only a path of this program: the way back, never away.</summary>
    private static string Local(string? from)
    {
        var path = Uri.TryCreate(from, UriKind.Absolute, out var uri) && uri.Scheme is "http" or "https" ? uri!.PathAndQuery : from;
        return path is ['/', ..] && !path.StartsWith("//", StringComparison.Ordinal) && !path.Contains('\\') && !path.StartsWith("/who", StringComparison.Ordinal) ? path : "/";
    }

    private static async Task<IResult> List(Desk desk) => await desk.Page<PeoplePage, PeopleModel>(
        new(await desk.Db.People.AsNoTracking().Include(p => p.Roles).OrderByDescending(p => p.Active).ThenBy(p => p.Initials).ToListAsync()));

    private static async Task<IResult> Open(Desk desk, string initials) => await Find(desk, initials) is { } person
        ? await Show(desk, FormOf(person, desk.Now), FormState.New, isNew: false)
        : Results.NotFound();

    private static async Task<IResult> Add([FromForm] PersonForm? form, Desk desk)
    {
        form ??= new();
        return await desk.Send(
            new AddPerson(form.Initials ?? "", form.Name ?? "", Roles(form)), form, "/people", $"{form.Initials} added", state => Show(desk, form, state, isNew: true), canUndo: false);
    }

    private static async Task<IResult> Edit([FromForm] PersonForm? form, Desk desk, string initials)
    {
        form ??= new();
        if (await Find(desk, initials) is not { } person)
        {
            return Results.NotFound();
        }

        return await desk.Send(
            new EditPerson(person.Initials, int.TryParse(form.Version, out var version) ? version : person.Version, form.Name ?? "", form.Active is not null, Roles(form)),
            form, "/people", $"{person.Initials} changed",
            state => Show(desk, form with { Initials = person.Initials, Version = Text(person.Version) }, state, isNew: false), canUndo: false);
    }

    private static Task<Person?> Find(Desk desk, string initials) =>
        desk.Db.People.AsNoTracking().Include(p => p.Roles).FirstOrDefaultAsync(p => p.Initials == initials);

    private static PersonForm FormOf(Person person, DateTime now)
    {
        string? Has(Role role) => person.Roles.Any(r => r.Role == role && (r.UntilUtc is null || r.UntilUtc > now)) ? "true" : null;
        return new PersonForm
        {
            Initials = person.Initials,
            Name = person.Name,
            Version = Text(person.Version),
            Active = person.Active ? "true" : null,
            ClearHolds = Has(Role.ClearHolds),
            Sharpen = Has(Role.Sharpen),
            Weld = Has(Role.Weld),
        };
    }

    private static List<Role> Roles(PersonForm form) =>
    [
        .. new[] { (form.ClearHolds, Role.ClearHolds), (form.Sharpen, Role.Sharpen), (form.Weld, Role.Weld) }.Where(r => r.Item1 is not null).Select(r => r.Item2),
    ];

    private static string Text(int number) => number.ToString(System.Globalization.CultureInfo.InvariantCulture);

    private static Task<IResult> Show(Desk desk, PersonForm form, FormState state, bool isNew) => desk.Page<PersonPage, PersonModel>(new(form, state, isNew), state.Status);
}

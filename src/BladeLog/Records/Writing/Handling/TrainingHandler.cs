using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class TrainingHandler
{
    public static async Task Handle(WriteSession w, RecordTraining c)
    {
        var at = w.At(c.At);
        var person = await Find(w, c.Person, nameof(c.Person), "Say who was trained.");
        var by = await Find(w, c.By, nameof(c.By), "Say who trained.");
        var saw = string.IsNullOrWhiteSpace(c.Saw) ? null : await w.FindSaw(c.Saw);
        w.RefuseUnless(person is null || person.Id != by?.Id, nameof(c.By), "Nobody signs for their own training.");
        w.RefuseUnless(c.RefresherUtc is null || c.RefresherUtc > at, nameof(c.RefresherUtc), "A refresher is due after the training.");
        if (c.Task == TrainedTask.ClearHold)
        {
            w.RefuseUnless(string.IsNullOrWhiteSpace(c.Saw), nameof(c.Saw), "Clearing a hold is about blades: it goes for all saws.");
            w.RefuseUnlessIn(Role.ClearHolds);
            w.RefuseUnless(by is null || Holds(w, by, w.Now), nameof(c.By), $"{c.By} may not clear a hold, so cannot train it.");
        }

        if (person is null || by is null || !w.Stands)
        {
            return;
        }

        var trained = w.Add(
            new Trained { PersonId = person.Id, SawId = saw?.Id, Task = c.Task, ById = by.Id, RefresherUtc = c.RefresherUtc is { } due ? RecordRules.Store(due) : null },
            at);
        w.AnswerPath = "/training";
        if (c.Task == TrainedTask.ClearHold && !(trained.RefresherUtc <= w.Now) && !Holds(w, person, trained.RefresherUtc))
        {
            // A right is only ever given or made longer by training; taking it away is done on the person's own page.
            await w.Save();
            person.Roles.Add(new PersonRole { Role = Role.ClearHolds, FromUtc = at, UntilUtc = trained.RefresherUtc, TrainedId = trained.EntryId });
            Edits.Bump(w, person);
        }
    }

    /// <summary>A right that this training gave ends with it.</summary>
    public static async Task Void(WriteSession w, Entry entry, string reason)
    {
        w.Void(entry.Id, reason);
        foreach (var role in await w.Db.PersonRoles.Where(r => r.TrainedId == entry.Id && (r.UntilUtc == null || r.UntilUtc > w.Now)).ToListAsync())
        {
            role.UntilUtc = w.Now;
        }
    }

    /// <summary>Has the right at this time; without one, for good.</summary>
    private static bool Holds(WriteSession w, Person person, DateTime? at) =>
        person.Roles.Any(r => r.Role == Role.ClearHolds && r.FromUtc <= w.Now && (r.UntilUtc is null || (at is not null && r.UntilUtc > w.Now && r.UntilUtc >= at)));

    private static async Task<Person?> Find(WriteSession w, string? initials, string field, string missing)
    {
        var text = (initials ?? "").Trim();
        var person = text.Length == 0 ? null : await w.Db.People.Include(p => p.Roles).SingleOrDefaultAsync(p => p.Initials == text && p.Active);
        if (person is null)
        {
            w.Refuse(field, text.Length == 0 ? missing : $"Nobody here is called {text}.");
        }

        return person;
    }
}

using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class PersonHandler
{
    public static async Task Handle(WriteSession w, AddPerson c)
    {
        await Check(w, c.Initials, c.Name);
        w.RefuseUnless(!await w.Db.People.AnyAsync(p => p.Initials == c.Initials.Trim()), "Initials", $"{c.Initials} is somebody already.");
        await MayGive(w, c.Roles, []);
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(AddPerson), w.Now);
        w.AnswerPath = "/setup/people";
        var person = new Person { Initials = c.Initials.Trim(), Name = c.Name.Trim() };
        person.Roles.AddRange(c.Roles.Distinct().Select(r => new PersonRole { Role = r, FromUtc = w.Now }));
        w.Db.People.Add(person);
    }

    public static async Task Handle(WriteSession w, EditPerson c)
    {
        await Check(w, c.Initials, c.Name);
        var person = await w.Db.People.Include(p => p.Roles).SingleOrDefaultAsync(p => p.Initials == c.Initials.Trim());
        if (person is null)
        {
            w.Refuse("Initials", $"There is nobody called {c.Initials}.");
            return;
        }

        await MayGive(w, c.Roles, person.Roles.Where(r => r.UntilUtc is null || r.UntilUtc > w.Now).Select(r => r.Role));
        if (!w.Stands || !await Edits.Guard(w, person, c.Version, person.Initials))
        {
            return;
        }

        w.NewEntry(nameof(EditPerson), w.Now);
        w.AnswerPath = "/setup/people";
        (person.Name, person.Active) = (c.Name.Trim(), c.Active);
        Edits.Bump(w, person);

        // A right taken away keeps the time it was held.
        foreach (var role in person.Roles.Where(r => (r.UntilUtc is null || r.UntilUtc > w.Now) && !c.Roles.Contains(r.Role)))
        {
            role.UntilUtc = w.Now;
        }

        var held = person.Roles.Where(r => r.UntilUtc is null || r.UntilUtc > w.Now).Select(r => r.Role).ToHashSet();
        person.Roles.AddRange(c.Roles.Distinct().Where(r => !held.Contains(r)).Select(r => new PersonRole { Role = r, FromUtc = w.Now }));
    }

    /// <summary>Who may clear holds is said by those who may; the first of a shop by anyone.</summary>
    private static async Task MayGive(WriteSession w, IEnumerable<Role> given, IEnumerable<Role> held)
    {
        if (given.Contains(Role.ClearHolds) && !held.Contains(Role.ClearHolds)
            && await w.Db.People.AnyAsync(p => p.Active && p.Roles.Any(r => r.Role == Role.ClearHolds && r.FromUtc <= w.Now && (r.UntilUtc == null || r.UntilUtc > w.Now))))
        {
            w.RefuseUnlessIn(Role.ClearHolds);
        }
    }

    private static Task Check(WriteSession w, string initials, string name)
    {
        w.RefuseUnless(initials.Trim().Length is >= 1 and <= 8, "Initials", "Initials are 1 to 8 letters.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(name), "Name", "Give a name.");
        return Task.CompletedTask;
    }
}

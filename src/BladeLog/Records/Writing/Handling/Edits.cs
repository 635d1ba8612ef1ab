using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>Edits a thing: the version the form saw must still be the thing's, else who was quicker is said.</summary>
internal static class Edits
{
    public static async Task<bool> Guard(WriteSession w, Thing thing, int? version, string what)
    {
        if (version is null || version == thing.Version)
        {
            return true;
        }

        var kind = thing.GetType().Name;
        var last = await w.Db.ThingHistories.AsNoTracking()
            .Where(h => h.Thing == kind && h.ThingId == thing.Id)
            .OrderByDescending(h => h.Id)
            .FirstOrDefaultAsync();
        w.ClashWith = new WriteResult.Clash(await w.Who(last?.PersonId), last?.EditedUtc ?? w.Now, $"changed {what}");
        return false;
    }

    /// <summary>Takes over every value except what tells the thing apart.</summary>
    public static async Task<bool> Edit<T>(WriteSession w, T thing, int? version, T values, string what)
        where T : Thing
    {
        if (!await Guard(w, thing, version, what))
        {
            return false;
        }

        var (id, uid, old) = (thing.Id, thing.Uid, thing.Version);
        (values.Id, values.Uid, values.Version) = (id, uid, old);
        w.Db.Entry(thing).CurrentValues.SetValues(values);
        return true;
    }

    /// <summary>Moves the version on without an edit: something happened to it that another form must see.</summary>
    public static void Bump(WriteSession w, Thing thing) => w.Db.Entry(thing).Property(t => t.Version).IsModified = true;
}

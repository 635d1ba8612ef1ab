using BladeLog.Records;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Saws;

/// <summary>A saw on today's list. Without a time it is not checked yet.</summary>
public sealed record CheckRow(string Code, string Name, string? When, string Says, bool NotRight);

public sealed record ChecksModel(IReadOnlyList<CheckRow> Rows, CheckRow? Next)
{
    public int Checked => Rows.Count(r => r.When is not null);
}

/// <summary>Which saws were looked at today, by whom and when; the next one is a tap away.</summary>
internal static class Checks
{
    public static async Task<IResult> Get(Desk desk)
    {
        var units = await desk.Units();
        var shop = await desk.Shop();
        var today = Said.Local(desk.Now, units).Date;
        var people = await desk.Db.People.AsNoTracking().ToDictionaryAsync(p => p.Id, p => p.Initials);
        var saws = shop.Saws.Where(s => s.Saw.Active).ToList();
        var ops = saws.Select(s => s.LastCheck?.Entry.Op).OfType<Guid>().ToList();
        var tensions = (await desk.Db.Slacks.AsNoTracking().Where(s => ops.Contains(s.Entry.Op)).Select(s => new { s.SawId, s.LetOff }).ToListAsync()).ToDictionary(s => s.SawId, s => s.LetOff);
        List<CheckRow> rows = [];
        string Last(StartCheck? check) => check is null ? "Never looked at" : $"Last looked at {Said.When(check.Entry.AtUtc, desk.Now, units)}";
        foreach (var saw in saws)
        {
            var check = saw.LastCheck;
            var still = CheckWords.ToPutRight(check);
            if (check is null || Said.Local(check.Entry.AtUtc, units).Date != today)
            {
                rows.Add(new CheckRow(saw.Saw.Code, saw.Saw.Name, null, Last(check) + (still.Length > 0 ? $", not right: {still}" : ""), still.Length > 0));
                continue;
            }

            string by = check.Entry.PersonId is { } id && people.TryGetValue(id, out var initials) ? $" by {initials}" : "";
            string pull = !tensions.TryGetValue(saw.Saw.Id, out var off) ? ""
                : !off ? $"; {units.PullName} was off, now on"
                : check.TensionRight == false ? ""
                : $"; {units.PullName} was found off";
            rows.Add(new CheckRow(saw.Saw.Code, saw.Saw.Name, Said.When(check.Entry.AtUtc, desk.Now, units) + by, Said.Capital(CheckWords.Says(check, units)) + pull, CheckWords.NotRight(check, units).Count > 0));
        }

        return await desk.Page<ChecksPage, ChecksModel>(new(rows, rows.Find(r => r.When is null)));
    }
}

using System.Globalization;

namespace BladeLog.Features.Prints;

internal static class AuditPages
{
    /// <summary>In the address: from the first record to today.</summary>
    public const string First = "first";

    public static void Map(WebApplication app) => app.MapGet("/audit", (Desk desk, string? from, string? to, string? since) => Get(desk, new AuditForm { From = from, To = to }, since == First));

    private static async Task<IResult> Get(Desk desk, AuditForm form, bool sinceFirst)
    {
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var today = DateOnly.FromDateTime(Said.Local(desk.Now, units));
        var facts = await AuditFacts.Read(desk.Db);
        if (sinceFirst && facts.FirstUtc is { } begun)
        {
            form = new AuditForm { From = DateOnly.FromDateTime(Said.Local(begun, units)).ToString("yyyy-MM-dd", CultureInfo.InvariantCulture) };
        }

        var last = read.Date(nameof(form.To), form.To) ?? today;
        var first = read.Date(nameof(form.From), form.From) ?? last.AddYears(-1).AddDays(1);
        read.RefuseUnless(first <= last, nameof(form.To), "The last day comes after the first.");
        if (!read.IsGood)
        {
            (first, last) = (today.AddYears(-1).AddDays(1), today);
        }

        var audit = new Audit(facts, Start(first), Start(last.AddDays(1)), desk.Now, units, await Story.Of(desk));
        var state = read.IsGood ? FormState.New : read.State;
        return await desk.Page<AuditPage, AuditModel>(audit.Model(form, state), state.Status);

        DateTime Start(DateOnly day)
        {
            var midnight = day.ToDateTime(TimeOnly.MinValue);

            // Where the clocks skip midnight, the day begins an hour on.
            return TimeZoneInfo.ConvertTimeToUtc(units.Zone.IsInvalidTime(midnight) ? midnight.AddHours(1) : midnight, units.Zone);
        }
    }
}

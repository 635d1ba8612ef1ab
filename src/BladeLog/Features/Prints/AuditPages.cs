namespace BladeLog.Features.Prints;

internal static class AuditPages
{
    public static void Map(WebApplication app) => app.MapGet("/audit", (Desk desk, string? from, string? to) => Get(desk, new AuditForm { From = from, To = to }));

    private static async Task<IResult> Get(Desk desk, AuditForm form)
    {
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var today = DateOnly.FromDateTime(Said.Local(desk.Now, units));
        var last = read.Date(nameof(form.To), form.To) ?? today;
        var first = read.Date(nameof(form.From), form.From) ?? last.AddYears(-1).AddDays(1);
        read.RefuseUnless(first <= last, nameof(form.To), "The last day comes after the first.");
        if (!read.IsGood)
        {
            (first, last) = (today.AddYears(-1).AddDays(1), today);
        }

        var audit = new Audit(await AuditFacts.Read(desk.Db), Start(first), Start(last.AddDays(1)), desk.Now, units, await Story.Of(desk));
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

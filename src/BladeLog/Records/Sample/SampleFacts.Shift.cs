namespace BladeLog.Records.Sample;

/// <summary>Who was trained at what, and what one shift told the next.</summary>
internal sealed partial class SampleFacts
{
    private void ShiftFacts()
    {
        Each("trainings", Train);
        Each("handovers", HandOver);
    }

    private void Train(SampleRow row) => Add(row, new Trained
    {
        PersonId = row.Of("person", things.People, "person").Id,
        SawId = row.Optional("saw") is null ? null : Saw(row),
        Task = row.Case<TrainedTask>("task"),
        ById = row.Of("by", things.People, "person").Id,
        RefresherUtc = row.Optional("refresher_day") is null ? null : Clock.StartOf(row, "refresher_day"),
    });

    private void HandOver(SampleRow row)
    {
        var note = Add(row, new HandOver { Text = row.Text("text").Replace('|', '\n') });
        foreach (var initials in row.Optional("read_by")?.Split('|') ?? [])
        {
            var person = things.People.GetValueOrDefault(initials) ?? throw row.Wrong("read_by", $"there is no person {initials}");

            // Read at the start of the next shift.
            ledger.Add(new HandOverRead(), Clock.At(row).AddHours(15), null, person.Id, r => r.HandOverId = note.EntryId);
        }
    }
}

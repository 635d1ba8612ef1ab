using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;

namespace BladeLog.Features.Record;

/// <summary>Entries as the record lists them: facts by their one wording, edits of things by what was edited.</summary>
internal static class EntryWords
{
    private static readonly Dictionary<string, string> Edits = new()
    {
        [nameof(AddSaw)] = "A saw was added",
        [nameof(EditSaw)] = "A saw's name or code was changed",
        [nameof(AddSpec)] = "A specification was added",
        [nameof(EditSpec)] = "A specification was changed",
        [nameof(AddBlades)] = "Blades were added",
        [nameof(EditBlade)] = "A blade's figures were changed",
        [nameof(AddPerson)] = "A person was added",
        [nameof(EditPerson)] = "A person was changed",
        [nameof(SaveShop)] = "The shop's own figures were changed",
        [nameof(SaveSetting)] = "A setting was changed",
        [nameof(QueueCut)] = "A cut was put on the list",
        [nameof(EditCut)] = "A cut on the list was changed",
        [nameof(DropCut)] = "A cut was taken off the list",
        [nameof(ReorderCuts)] = "The list of cuts was put in another order",
        [nameof(ImportRows)] = "A file was brought in",
        [nameof(SaveLanName)] = "The shop's name on the network was changed",
    };

    public static EntryLine Line(PastEntry past, Story story, EditedThings edited, DateTime now, ShopUnits units)
    {
        var entry = past.Entry;
        return new EntryLine(
            entry.Id,
            Said.When(entry.AtUtc, now, units),
            Said.When(entry.EnteredUtc, now, units),
            entry.Person?.Initials ?? "somebody",
            past.Fact is { } fact ? story.Says(fact, About.Shop) : Edits.GetValueOrDefault(entry.Kind, entry.Kind) + edited.Of(entry.Id),
            entry.Void is { } v ? $"struck out by {v.Entry.Person?.Initials ?? "somebody"}, {Said.When(v.Entry.EnteredUtc, now, units)}: {v.Reason}" : null,
            entry.Void is null && past.Fact is not (null or Retag));
    }
}

namespace BladeLog.Records.Writing;

internal static class LabelHandler
{
    public static async Task Handle(WriteSession w, RecordLabels c)
    {
        w.RefuseUnless(c.Tags.Count > 0, nameof(c.Tags), "Choose the blades.");
        foreach (var tag in c.Tags.Distinct(StringComparer.OrdinalIgnoreCase))
        {
            if (await w.FindBlade(tag, nameof(c.Tags)) is { } blade)
            {
                w.Add(new LabelPrinted { BladeId = blade.Id, Tag = blade.Tag }, w.Now);
            }
        }

        w.AnswerPath = "/labels";
    }
}

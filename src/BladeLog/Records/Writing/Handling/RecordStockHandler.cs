namespace BladeLog.Records.Writing;

internal static class RecordStockHandler
{
    public static async Task Handle(WriteSession w, RecordStock c)
    {
        var spec = await BladeHandler.FindSpec(w, c.Spec);
        var at = w.At(c.At);
        w.RefuseUnless(c.Count != 0, nameof(c.Count), "Say how many came or went.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Reason), nameof(c.Reason), "Say why.");
        if (spec is null || !w.Stands)
        {
            return;
        }

        w.Add(new StockMove { SpecId = spec.Id, Count = c.Count, Reason = c.Reason.Trim() }, at);
        w.AnswerPath = "/stock";
    }
}

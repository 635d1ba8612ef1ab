namespace BladeLog.Records.Writing;

internal static class RetagBladeHandler
{
    public static async Task Handle(WriteSession w, RetagBlade c)
    {
        var blade = await w.FindBlade(c.Tag);
        var at = w.At(c.At);
        var tag = Tags.Read(c.NewTag);
        if (blade is null)
        {
            return;
        }

        await BladeHandler.CheckTag(w, "NewTag", tag, blade.Id);
        w.RefuseUnless(!string.Equals(tag, blade.Tag, StringComparison.OrdinalIgnoreCase), "NewTag", $"The blade is called {blade.Tag} already.");
        if (!w.Stands)
        {
            return;
        }

        w.Add(new Retag { BladeId = blade.Id, OldTag = blade.Tag, NewTag = tag }, at);
        blade.Tag = tag;
        w.AnswerPath = $"/b/{tag}";
    }
}

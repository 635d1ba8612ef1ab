namespace BladeLog.Records.Writing;

internal static class SlackTensionHandler
{
    public static async Task Handle(WriteSession w, SlackTension c)
    {
        var saw = await w.FindSaw(c.Saw);
        var at = w.At(c.At);
        if (saw is null || !w.Stands)
        {
            return;
        }

        w.Add(new Slack { SawId = saw.Id, LetOff = c.LetOff }, at);
        w.AnswerPath = $"/saws/{saw.Code}";
    }
}

using BladeLog.Records.Folding;

namespace BladeLog.Records.Writing;

/// <summary>What was measured of a blade on a saw: its tension, or the angle it leads at.</summary>
internal static class RecordTensionHandler
{
    public static async Task Handle(WriteSession w, RecordTension c)
    {
        w.RefuseUnless(c.TensionPa > 0 && double.IsFinite(c.TensionPa), nameof(c.TensionPa), "The tension must be above zero.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(c.How), nameof(c.How), "Say how it was measured.");
        if (await Where(w, c.Saw, c.Tag, c.At) is var (saw, blade, at))
        {
            w.Add(new TensionReading { SawId = saw.Id, BladeId = blade, TensionPa = c.TensionPa, Typed = c.Typed, How = c.How }, at);
            w.AnswerPath = $"/saws/{saw.Code}";
        }
    }

    public static async Task Handle(WriteSession w, RecordDrift c)
    {
        w.RefuseUnless(Math.Abs(c.AngleRad) < Math.PI / 4, nameof(c.AngleRad), "A blade leads by less than 45 degrees.");
        if (await Where(w, c.Saw, c.Tag, c.At) is var (saw, blade, at))
        {
            w.Add(new Drift { SawId = saw.Id, BladeId = blade, AngleRad = c.AngleRad }, at);
            w.AnswerPath = $"/saws/{saw.Code}";
        }
    }

    private static async Task<(Saw Saw, int BladeId, DateTime At)?> Where(WriteSession w, string code, string? tag, DateTime? stated)
    {
        var saw = await w.FindSaw(code);
        var at = w.At(stated);
        if (saw is null || !w.Stands)
        {
            return null;
        }

        if (!string.IsNullOrWhiteSpace(tag))
        {
            return await w.FindBlade(tag) is { } blade ? (saw, blade.Id, at) : null;
        }

        var spell = (await FactReader.ReadSpells(w.Db, saw.Id, from: at, until: at)).Cast<Spell?>().FirstOrDefault(s => s!.Value.From <= at && at < s.Value.End);
        w.RefuseUnless(spell is not null, "Tag", $"No blade was on {saw.Name} at {w.Say(at)}: say which blade.");
        return spell is { } on ? (saw, on.BladeId, at) : null;
    }
}

using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

internal static class SawHandler
{
    public static async Task Handle(WriteSession w, AddSaw c)
    {
        var code = c.Code.Trim();
        var from = w.At(c.From, "From");
        CheckCode(w, code, c.Name);
        CheckSetup(w, c.Setup);
        w.RefuseUnless(!await w.Db.Saws.AnyAsync(s => s.Code == code), "Code", $"There is a saw {code} already.");
        if (!w.Stands)
        {
            return;
        }

        w.NewEntry(nameof(AddSaw), from);
        c.Setup.Saw = new Saw { Code = code, Name = c.Name.Trim(), HasHourMeter = c.HasHourMeter };
        w.Add(c.Setup, from);
        w.AnswerPath = $"/saws/{code}";
    }

    public static async Task Handle(WriteSession w, NewSetup c)
    {
        var saw = await w.FindSaw(c.Saw);
        CheckSetup(w, c.Setup);
        var from = w.At(c.From, "From");
        if (saw is null || !w.Stands)
        {
            return;
        }

        if (c.Replaces is { } old)
        {
            var replaced = await w.Db.SawSetups.AsNoTracking().Include(s => s.Entry).SingleOrDefaultAsync(s => s.EntryId == old && s.SawId == saw.Id);
            w.RefuseUnless(replaced is not null, "Replaces", $"Entry {old} is no standing setup of {saw.Name}.");
            w.RefuseUnless(!string.IsNullOrWhiteSpace(c.Reason), "Reason", "Say what was wrong.");
            if (!w.Stands)
            {
                return;
            }

            from = c.From is null ? replaced!.Entry.AtUtc : from;
            w.Void(old, c.Reason!);
        }

        c.Setup.SawId = saw.Id;
        w.Add(c.Setup, from);
        Edits.Bump(w, saw);
        w.Touched.Window(saw.Id, DateTime.MinValue, DateTime.MaxValue);
        w.AnswerPath = $"/saws/{saw.Code}";
    }

    public static async Task Handle(WriteSession w, EditSaw c)
    {
        var saw = await w.FindSaw(c.Code, "Code");
        var code = c.NewCode.Trim();
        CheckCode(w, code, c.Name);
        if (saw is null)
        {
            return;
        }

        w.RefuseUnless(!await w.Db.Saws.AnyAsync(s => s.Code == code && s.Id != saw.Id), "NewCode", $"There is a saw {code} already.");
        if (!w.Stands || !await Edits.Guard(w, saw, c.Version, saw.Code))
        {
            return;
        }

        w.NewEntry(nameof(EditSaw), w.Now);
        (saw.Code, saw.Name, saw.Active, saw.HasHourMeter) = (code, c.Name.Trim(), c.Active, c.HasHourMeter);
        Edits.Bump(w, saw);
        w.AnswerPath = $"/saws/{code}";
    }

    private static void CheckCode(WriteSession w, string code, string name)
    {
        w.RefuseUnless(
            code.Length is >= 1 and <= 12 && code.All(ch => char.IsAsciiLetterOrDigit(ch) || ch is '-' or '.'),
            "Code",
            "A saw's code is 1 to 12 of A to Z, 0 to 9, hyphen and full stop.");
        w.RefuseUnless(!string.IsNullOrWhiteSpace(name), "Name", "Give the saw a name.");
    }

    private static void CheckSetup(WriteSession w, SawSetup s)
    {
        w.RefuseUnless(s.Wheels.Count is >= 2 and <= 4, "Wheels", "A band saw has two to four wheels.");
        w.RefuseUnless(s.Speeds.Count >= 1, "Speeds", "Give at least one blade speed.");
        w.RefuseUnless(s.LoopLeastM <= s.LoopM && s.LoopM <= s.LoopMostM, "LoopM", "The loop must lie inside the take-up: shortest, nominal, longest.");
        w.RefuseUnless(s.WidthLeastM <= s.WidthMostM, "WidthMostM", "The widest blade must not be narrower than the narrowest.");

        // The whole form's wheels lie inside the loop: half their girth each, so the loop is longer than that.
        var girth = s.Wheels.Sum(wheel => wheel.DiameterM) * Math.PI / Math.Max(s.Wheels.Count, 1);
        w.RefuseUnless(s.LoopM > girth, "LoopM", $"A loop of {w.Say(s.LoopM)} is too short for these wheels.");
    }
}

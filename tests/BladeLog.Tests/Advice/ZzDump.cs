using System.Globalization;
using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;

namespace BladeLog.Tests.Advice;

public sealed class ZzDump
{
    [Fact]
    public void Dump()
    {
        using StreamWriter o = new("/tmp/dump.txt");
        DemoShopFixture shop = new();
        foreach (QueuedCut cut in shop.Now.Cuts)
        {
            CutAnswer a = shop.Advice.For(cut);
            o.WriteLine($"== {cut.Number} {cut.Job} ({a.Choices.Count})");
            foreach (Choice c in a.Choices) { o.WriteLine("  " + CutAnswersTests.Line(c) + " | " + string.Join("; ", c.Cautions)); }
            foreach (Proposal p in a.Proposals) { o.WriteLine($"  -> {p.Kind}: {p.Sentence} {p.Outcome.Job!.Cost.Total:G6} {p.Outcome.Job.Minutes:G4}"); }
        }

        DayPlan plan = shop.Advice.Plan();
        o.WriteLine($"plan {plan.Changes} queue {plan.ChangesInQueueOrder}");
        foreach (SawPlan s in plan.Saws) { o.WriteLine(s.Saw.Saw.Code + ": " + string.Join(",", s.Cuts.Select(c => c.Cut.Number + (c.ChangeBefore ? "*" : "")))); }
        foreach (BladeFile b in shop.Now.Blades)
        {
            BladeAdvice x = shop.Advice.Of(b);
            o.WriteLine($"{b.Blade.Tag} {x.State} {x.Advice.Do} | {string.Join(" ", x.Advice.Because)} | grind {x.Grind.Refusal} {x.Grind.IntervalHours:G3} {x.Grind.From} {x.Grind.UsedAfter:G3} {x.Grind.BreakChance:G3} watch {x.Record.HoursToWatch:G4} retire {x.Record.HoursToRetire:G4} chance {x.Record.BreakChance:G4}");
        }

        for (int k = 0; k < 4; k++)
        {
            System.Diagnostics.Stopwatch w = System.Diagnostics.Stopwatch.StartNew();
            ShopAdvice s2 = new(shop.Now);
            foreach (QueuedCut cut in shop.Now.Cuts) { s2.For(cut); }
            o.WriteLine(w.Elapsed.TotalMilliseconds.ToString(CultureInfo.InvariantCulture) + " ms");
        }
    }
}

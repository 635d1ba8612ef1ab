using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Blades;

/// <summary>Puts the page of one blade together.</summary>
internal static class BladePageModel
{
    public static BladeModel Of(BladeFile file, ShopAdvice advice, ShopUnits units, PastPage past, IReadOnlyList<Fact> cracks, Story story)
    {
        BladeAdvice blade = advice.Of(file);
        BladeParts parts = new(blade, advice, units);
        (string edgeTitle, string edgeWords) = parts.Edge();
        (string governs, IReadOnlyList<LimitPart> limits) = parts.Limits();
        return new BladeModel
        {
            Tag = file.Blade.Tag,
            Title = file.CutDownTo is { } child && blade.State is BladeState.Broken or BladeState.Retired ? $"cut down as {child}" : blade.State == BladeState.Retired ? "retired" : LowerFirst(blade.Advice.Do).TrimEnd('.'),
            Lede = blade.State == BladeState.Hold ? [.. blade.Advice.Because.Take(1)] : blade.Advice.Because,
            State = StateOf(blade),
            Teeth = Drawn.Teeth(blade.Body, file.Spec),
            In = Drafting.Of(units),
            NewWidth = blade.Body.NewWidth.Value * 1e3,
            LeastWidth = blade.Body.LeastWidth.Value * 1e3,
            Body = blade.Body.Thickness.Value * 1e3,
            Kerf = blade.Body.Kerf.Value * 1e3,
            Depth = blade.Body.Gullet.Value * 1e3,
            Tip = blade.Body.Tip,
            Facts = [.. parts.Facts(), .. CrackFacts.Of(file, cracks, advice.Words)],
            Life = parts.Life(),
            EdgeTitle = edgeTitle,
            EdgeWords = edgeWords,
            KerfSays = KerfWords.Of(file, advice.Settings, advice.Words),
            Bite = parts.Bite(),
            GovernsTitle = governs,
            Limits = limits,
            Runs = parts.Runs(),
            Paths = parts.Paths(),
            Because = Reckoned.Lines(BladeFigures.Of(blade, advice.Settings), units),
            WorkedLife = WorkedOut.Rows(WorkedOut.Life(blade)),
            WorkedEdge = WorkedOut.Rows(WorkedOut.Edge(blade)),
            WorkedLimits = WorkedOut.Rows(WorkedOut.Grinding(blade)),
            Worked = WorkedOut.Rows(WorkedOut.Tension(blade, null, advice.Words), WorkedOut.Push(blade, null)),
            Actions = [.. Actions(blade, advice)],
            Last = blade.State == BladeState.Retired || file.CutDownTo is not null ? null : new BladeAction($"Retire {file.Blade.Tag}", At(blade, "retire")),
            Cautions = [.. Cautions(blade)],
            Story = [.. past.Lines.Select(p => story.Line(p, About.Blade))],
            More = past.More,
        };
    }

    private static string StateOf(BladeAdvice blade) => blade.State switch
    {
        BladeState.Ready => blade.File.Place == Place.OnSaw ? "runs" : "ready",
        BladeState.Look => "look",
        BladeState.Sharpen => "sharpen",
        BladeState.Hold => "hold",
        BladeState.Broken => "broken",
        _ => "retired",
    };

    private static IEnumerable<BladeAction> Actions(BladeAdvice blade, ShopAdvice advice)
    {
        BladeFile file = blade.File;
        string tag = file.Blade.Tag;
        SawNow? on = advice.Now.Saws.FirstOrDefault(s => s.MountedBladeId == file.Blade.Id);
        bool dull = blade.State == BladeState.Sharpen && on is null && file.Place != Place.AtSharpener;
        if (dull)
        {
            yield return new("Sharpened", At(blade, "sharpen"), Main: true);
        }

        if (blade.State == BladeState.Hold)
        {
            yield return new("Clear the hold", At(blade, "clear"), Main: true);
        }
        else if (file.CutDownTo is { } child)
        {
            yield return new($"Go to {child}", $"/blades/{child}", Main: true);
        }
        else if (blade.State == BladeState.Broken)
        {
            yield return new("Weld it", At(blade, "join"), Main: true);
        }
        else if (file.Retirement is { } end && on is null && advice.Now.AsOf - end.Entry.EnteredUtc < TimeSpan.FromHours(24))
        {
            yield return new("Not retired after all", $"/record/{end.EntryId}/void");
        }
        else if (blade.State != BladeState.Retired && on is null && file.Place != Place.AtSharpener
            && (blade.Record.On is { } saw && ShopAdvice.Fits(file, saw) ? saw : advice.Fitting(file).FirstOrDefault()) is { } fits)
        {
            yield return new($"Put on {fits.Saw.Name}", $"/saws/{fits.Saw.Code}/swap?on={tag}", Main: !dull);
        }

        if (on is not null)
        {
            yield return new($"Swap on {on.Saw.Name}", $"/saws/{on.Saw.Code}/swap", Main: blade.State != BladeState.Hold);
            yield return new("Clicking", $"/saws/{on.Saw.Code}/clicking", Alarm: true);
        }

        if (blade.State is not (BladeState.Broken or BladeState.Retired))
        {
            if (!dull)
            {
                yield return new(file.Place == Place.AtSharpener ? "Came back sharp" : "Sharpened", At(blade, "sharpen"));
            }

            yield return new("Inspected", At(blade, "inspect"));
            if (blade.State != BladeState.Hold)
            {
                yield return new("Crack: hold", At(blade, "hold"), Alarm: true);
            }

            yield return new("It broke", At(blade, "break"), Alarm: true);
            yield return new("Welded", At(blade, "join"));
            yield return new("Leads", At(blade, "drift"));
            yield return new("Kerf and set", At(blade, "kerf"));
            yield return new(Said.Capital(advice.Words.Tension), At(blade, "tension"));
        }

        yield return new("What if", At(blade, "what-if"));
        if (blade.State != BladeState.Retired && file.Place is Place.Rack or Place.Bench)
        {
            yield return new("Where it hangs", At(blade, "hang"));
        }

        if (blade.State is not (BladeState.Broken or BladeState.Retired))
        {
            yield return new("Label", $"/labels?tags={Uri.EscapeDataString(tag)}");
        }

        yield return new("Edit", At(blade, "edit"));
        yield return new("Its kind", $"{SpecEdit.Of(file.Spec.Code)}?blade={Uri.EscapeDataString(tag)}");
    }

    private static IEnumerable<BladeCaution> Cautions(BladeAdvice blade)
    {
        if (blade.State is not (BladeState.Broken or BladeState.Retired))
        {
            string means = string.Join(" ", MarkWords.Means(blade));
            if (means.Length > 0)
            {
                yield return new(means, "Seen at a look; it stands until another look there. Common practice.");
            }
        }

        if (blade.State == BladeState.Hold)
        {
            yield return new("On hold: do not run it. Any crack that can be seen means hold, on every saw here, whatever its length and whatever the hours say.", "The tenth of the width that US law allows is for wide band head saws only: 29 CFR 1910.265(e)(2)(i).", Stop: true);
        }
        else if (blade.State is BladeState.Broken or BladeState.Retired)
        {
            if (blade.File.Retirement?.CutUp != true && blade.File.CutDownTo is null)
            {
                yield return new("Cut it up and throw it away as sharp scrap; a wide one with two people.", "Common practice.");
            }
        }
        else if (blade.Record.UnknownHistory)
        {
            yield return new("No proof of its history: inspect the whole loop, the weld and the body; no demanding work first.", "House rule.");
        }
        else if (blade.Edge.Due)
        {
            yield return new("A dull, badly set or badly tensioned saw comes out of service at once; only skilled people sharpen it, and look for cracks before and after.", "29 CFR 1910.213(s)(1) and (s)(5).");
        }
        else if (blade.State == BladeState.Look)
        {
            yield return new("A narrow blade often goes without ticking first: that it is silent does not mean that it is whole.", "Common practice.");
        }
    }

    private static string At(BladeAdvice blade, string verb) => $"/blades/{blade.File.Blade.Tag}/{verb}";

    private static string LowerFirst(string words) => words.Length == 0 ? words : char.ToLowerInvariant(words[0]) + words[1..];
}

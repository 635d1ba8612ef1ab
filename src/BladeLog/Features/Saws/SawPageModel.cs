using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Saws;

/// <summary>Puts the page of one saw together.</summary>
internal sealed class SawPageModel(SawNow saw, ShopAdvice advice, ShopUnits units, IdleShare idle, DateTime? heard = null, string? checker = null)
{
    private readonly SawSetup setup = saw.Setup;
    private readonly BladeAdvice? on = advice.Now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId) is { } file ? advice.On(file, saw) : null;
    private readonly PlannedCut? next = advice.NextCut(saw);

    public SawModel Model(PastPage past, Story story, bool first)
    {
        (string state, string title, string lede) = Answer();
        double? span = next is { Choice: { Tension: { } tension } c }
            ? advice.Beams.Band(c.Blade.Body, tension.Stress.Value, setup, c.SpeedMps, c.Work.HeightM).GuideSpan.Millimetres
            : null;
        double? thrust = next?.Choice.AtAdvised is { } at ? Math.Max(0, at.ThrustN) : null;
        return new SawModel
        {
            Code = saw.Saw.Code,
            Name = saw.Saw.Name,
            State = state,
            Title = title,
            Lede = lede,
            Shape = Drawn.Saw(setup),
            Figures = new SawFigures(on?.Body.Thickness.Value * 1e3, Bending(setup.Wheels.Min(w => w.DiameterM))?.Megapascals, span, thrust),
            In = Drafting.Of(units),
            Stock = next?.Choice.Work.HeightM * 1e3,
            Caption = next is { } n ? Caption(n, span, thrust) : null,
            Facts = [.. Facts()],
            Mounted = Mounted(),
            Hours = $"{Hours(saw.RunningMs)} run since this record began.{(idle.Accounted is { } share ? $" The cuts logged account for {Wording.Number(share * 100, 0)} %." : "")}",
            Checked = saw.LastCheck is { } check ? $"Looked at {Said.When(check.Entry.AtUtc, advice.Now.AsOf, units)}{(checker is null ? "" : $" by {checker}")}: {CheckWords.Says(check, units)}." : null,
            ToPutRight = CheckWords.ToPutRight(saw.LastCheck) is { Length: > 0 } wrong ? $"Found not right, and to be put right: {wrong}. This stands until the next check finds it right." : null,
            Question = saw.NoBladeKnownMs > 0 ? $"{Hours(saw.NoBladeKnownMs)} of them with no blade known. Say which was on, and the hours go to it." : null,
            Heard = heard is { } last ? $"Last heard from the logger: {Said.When(last, advice.Now.AsOf, units)}." : null,
            Wheels = [.. setup.Wheels.OrderBy(w => w.Position).Select(Wheel)],
            Speeds = [.. setup.Speeds.OrderBy(s => s.Position).Select(s => new SpeedPart(units.ShowBandSpeed(new Speed(s.SpeedMps)), Figures.Number(BendsPerHour(s.SpeedMps)), s.Usual && setup.Speeds.Count > 1))],
            Cuts = [.. advice.Plan().Saws.FirstOrDefault(p => p.Saw == saw)?.Cuts.Select(Cut) ?? []],
            Fitting = [.. Fitting()],
            Because = Reckoned.Lines(Because(span, thrust), units),
            Worked = Worked(),
            Actions = [.. Actions()],
            Story = [.. past.Lines.Select(p => story.Line(p, About.Saw))],
            More = first && past.More,
        };
    }

    private (string State, string Title, string Lede) Answer()
    {
        string name = saw.Saw.Name;
        string cut = next is { } n ? $"cut {n.Cut.Number}, {Said.Wood(n.Cut, advice.Words)}" : "";
        if (on is null)
        {
            return ("empty", next is { } first ? $"{name}: put {first.Choice.Tag} on for {cut}" : $"{name} is empty", "No blade is on it.");
        }

        string tag = on.File.Blade.Tag;
        if (on.File.Hold is { } hold)
        {
            return ("hold", $"{name}: do not run it", $"{tag} is {LifeWords.Hold(hold, advice.Words)}. A named person clears it, or it comes off.");
        }

        if (on.State is BladeState.Retired or BladeState.Broken)
        {
            return ("hold", $"{name}: do not run it", $"{tag} is written as {(on.State == BladeState.Broken ? "broken" : "retired")}. Take it off, or strike that entry out if it is wrong.");
        }

        string state = saw.Slack ? "slack" : on.State switch
        {
            BladeState.Sharpen => "sharpen",
            BladeState.Look => "look",
            _ => "runs",
        };
        string title = next switch
        {
            null => saw.Slack ? $"{name}: its {advice.Words.Tension} is off" : $"{name}: no cut waits for it",
            { ChangeBefore: true } change when saw.Slack => $"{name}: its {advice.Words.Tension} is off; put {change.Choice.Tag} on for {cut}",
            _ when saw.Slack => $"{name}: {advice.Words.Tension} on first, then {tag} for {cut}",
            { ChangeBefore: true } change => $"{name}: put {change.Choice.Tag} on for {cut}",
            _ => $"{name}: {tag} stays on for {cut}",
        };
        string since = saw.Timer is { } timer ? $" Timer since {Said.When(timer.Entry.AtUtc, advice.Now.AsOf, units)}." : "";
        return (state, title, (saw.Slack ? $"Its {advice.Words.Tension} is off: put the {advice.Words.Tension} on before it runs." : $"{tag} is on it. {string.Join(" ", on.Advice.Because.Take(1))}".Trim()) + since);
    }

    private CaptionPart Caption(PlannedCut cut, double? span, double? thrust)
    {
        string guides = span is { } s ? $"guides {units.Show(Length.FromMillimetres(s))} apart, " : "";
        string push = thrust is { } t ? $"thrust {units.Show(new Force(Math.Round(t)))}" : "thrust not reckoned";
        string feed = cut.Choice.Gate?.AdvisedMps is { } mps ? $" at {advice.Words.Feed(mps).Replace(' ', Figures.Glue)}" : "";
        // The picture writes what the mounted blade does at the wheel; the cut may want another.
        string drawn = on is null || !cut.ChangeBefore ? "" : $"Body and bending are of {on.File.Blade.Tag}, {(on.State == BladeState.Hold ? "on hold here" : "on it now")}. ";
        if (cut.ChangeBefore)
        {
            feed = " once it is on" + feed.Replace(" at ", ", at ", StringComparison.Ordinal);
        }

        return new CaptionPart($"{drawn}Cut {cut.Cut.Number}, {Said.Wood(cut.Cut, advice.Words)}: {guides}{push}", cut.Choice.Tag, feed);
    }

    private IEnumerable<SawFact> Facts()
    {
        yield return new("Wheels", Said.Wheels(setup, units).Replace(" wheels", "", StringComparison.Ordinal), setup.Wheels.Count == 2 ? "two" : null);
        yield return new("Loop", units.Show(new Length(setup.LoopM), Fields.Loop), $"takes {units.Show(new Length(setup.LoopLeastM), Fields.Loop)} to {units.Show(new Length(setup.LoopMostM), Fields.Loop)}");
        yield return new("Blades", $"{units.Show(new Length(setup.WidthLeastM), Fields.BladeWidth)} to {units.Show(new Length(setup.WidthMostM), Fields.BladeWidth)}", "wide");
        yield return new("Speed", string.Join(" or ", setup.Speeds.OrderByDescending(s => s.Usual).Select(s => units.ShowBandSpeed(new Speed(s.SpeedMps)))));
        yield return new("Motor", units.Show(new Power(setup.MotorW)), setup.IdleW is { } idle ? $"{units.Show(new Power(idle))} idle" : "idle 0.10 of it (default, not yours)");
        yield return new("Opens to", units.Show(new Length(setup.CutHeightMostM), Fields.CutHeight), setup.LongestPieceM is { } longest ? $"pieces up to {advice.Words.Distance(longest)}" : null);
        yield return new("Takes", TakesWords(), setup.ClassWork switch
        {
            ClassWork.Yes => "classes use it",
            ClassWork.Supervised => "classes use it with a supervisor",
            _ => null,
        });
        yield return new(Said.Capital(advice.Words.Tension), setup.StrandForceMostN is { } pull ? units.Show(new Force(pull)) : "greatest pull not told", setup.StrandForceMostN is null ? null : "greatest pull in one strand");
        yield return new("Guides", $"{units.Show(new Length(setup.LowerGuideM))} under the table", $"{units.Show(new Length(setup.ClearanceM))} above the work");
        yield return new("Feed", setup.FeederN is { } push ? $"feeder, {units.Show(new Force(push))}" : "by hand", setup.FeederMostMps is { } most ? $"up to {units.ShowFeed(new Speed(most))}" : null);
        if (setup.TiltMostRad > 0)
        {
            yield return new("Frame", $"tilts to {units.Show(new Angle(setup.TiltMostRad))}");
        }

        yield return new("Change", Figures.With(Figures.Number(setup.ChangeMinutes), "min"), $"a break costs {units.ShowMoney(setup.BreakCostMinor)}");
    }

    private string TakesWords()
    {
        (Takes Kind, string Word)[] all = [(Takes.Board, "boards"), (Takes.Resaw, "resawing"), (Takes.Beam, "beams"), (Takes.Log, "logs")];
        string words = string.Join(", ", all.Where(t => setup.Takes.HasFlag(t.Kind)).Select(t => t.Word));
        return words.Length == 0 ? "nothing told" : words;
    }

    private MountedPart? Mounted() => on is null ? null : new MountedPart(
        on.File.Blade.Tag,
        Drawn.Teeth(on.Body, on.File.Spec),
        on.State switch
        {
            BladeState.Hold or BladeState.Broken or BladeState.Retired => "hold",
            _ when saw.Slack => "slack",
            BladeState.Ready => "runs",
            BladeState.Sharpen => "sharpen",
            _ => "look",
        },
        saw.MountedSince is { } since ? $"on since {Said.When(since, advice.Now.AsOf, units)}" : "on it",
        on.Record.Tension is { } t ? $"{advice.Words.Tension} {(saw.Slack ? "off now; when on, " : "")}{units.Show(Stress.FromMegapascals(Math.Round(t.Stress.Value / 1e6)))} on the body, {t.Stress.From}" : "");

    private WheelPart Wheel(SetupWheel wheel, int index)
    {
        string name = setup.Wheels.Count == 2 ? setup.Takes.HasFlag(Takes.Log) ? index == 0 ? "left" : "right" : index == 0 ? "lower" : "upper" : $"wheel {index + 1}";
        return new WheelPart(
            Said.Capital(name) + (wheel.Driven ? ", driven" : ""),
            units.Show(new Length(wheel.DiameterM), Fields.WheelDiameter),
            Bending(wheel.DiameterM) is { } stress ? units.Show(Stress.FromMegapascals(Math.Round(stress.Megapascals))) : null,
            on is null ? null : $"1/{Wording.Number(wheel.DiameterM / on.Body.Thickness.Value, 0)}");
    }

    private Stress? Bending(double wheelM) => on is null ? null : BendingStress.OverWheel(new Length(on.Body.Thickness.Value), new Length(wheelM), advice.Settings.Steel.YoungsModulus);

    private double BendsPerHour(double speedMps) => LoopCycles.BendsPerHour(setup.Wheels.Count, new Speed(speedMps), new Length(on?.File.LoopM ?? setup.LoopM));

    private CutLine Cut(PlannedCut cut) => new(
        cut.Cut.Number,
        Said.Wood(cut.Cut, advice.Words),
        (cut.ChangeBefore ? $"put {cut.Choice.Tag} on" : $"{cut.Choice.Tag} stays on") + (cut.Choice.Verdict == Verdict.WithCare ? ", with care" : ""));

    private IEnumerable<FittingRow> Fitting() => advice.Now.Blades
        .Where(b => b.Break is null && b.Retirement is null && b.Place != Place.Gone && ShopAdvice.Fits(b, saw))
        .Select(b => (File: b, Blade: advice.On(b, saw)))
        .OrderByDescending(b => b.File.Blade.Id == saw.MountedBladeId).ThenBy(b => b.Blade.State == BladeState.Hold).ThenBy(b => b.File.Blade.Tag, NaturalOrder.Instance)
        .Select(b => new FittingRow(
            b.File.Blade.Tag,
            Said.Section(b.File, units),
            Drawn.Teeth(b.Blade.Body, b.File.Spec),
            b.Blade.State switch
            {
                BladeState.Hold => "hold",
                _ when b.File.Place == Place.AtSharpener => "away",
                BladeState.Sharpen => "sharpen",
                BladeState.Look => "look",
                _ => b.File.Blade.Id == saw.MountedBladeId ? "runs" : "ready",
            },
            b.File.Place == Place.Rack && b.File.Hook is { } hook ? $"{hook}, " : "",
            Lasts(b.Blade),
            SmallBand.Of(b.Blade, advice.Settings),
            WorkedOut.Band(b.Blade, SmallBand.Of(b.Blade, advice.Settings), saw)));

    private static string Lasts(BladeAdvice blade) => blade switch
    {
        { State: BladeState.Hold } => "on hold: no hours are told",
        { Record.UnknownHistory: true } => "history unknown: no hours are told",
        { Record: { HoursLeft: { } left, MedianHours: { } median } } => $"{Figures.With(Figures.Hours(left), "h")} left of {Figures.With(Figures.Hours(median), "h")} here",
        { Record.Verdict: LifeVerdict.NotLimiting } => "flexing will not end it here",
        { Record.Verdict: LifeVerdict.Unsuitable } => "unsuitable on these wheels",
        _ => "",
    };

    private IEnumerable<Figure> Because(double? span, double? thrust)
    {
        foreach (SetupSpeed speed in setup.Speeds.OrderBy(s => s.Position))
        {
            yield return new($"bends an hour at {units.ShowBandSpeed(new Speed(speed.SpeedMps))}", BendsPerHour(speed.SpeedMps), "", $"{setup.Wheels.Count} wheels times band speed over the loop of {units.Show(new Length(on?.File.LoopM ?? setup.LoopM), Fields.Loop)}, times 3,600", "derived", Provenance.Derived);
        }

        if (on is { } blade)
        {
            yield return new("bending stress over the smallest wheel", Bending(setup.Wheels.Min(w => w.DiameterM))!.Value.Megapascals, "MPa", "stiffness of the steel times thickness over wheel and thickness", "derived", Provenance.Derived);
            yield return new("thickness of the body", blade.Body.Thickness.Value * 1e3, "mm", blade.Body.Thickness.From, "derived", blade.Body.Thickness.Provenance);
        }

        if (span is { } s)
        {
            yield return new("distance of the guides", s, "mm", "lower guide under the table, height of the cut and clearance above it", "derived", Provenance.Derived);
        }

        if (thrust is { } t && next is { } n)
        {
            yield return new("thrust of the next cut", t, "N", $"force of all teeth against the feed, {n.Choice.Tag} in cut {n.Cut.Number} at the feed advised", "engineering-default", Provenance.EngineeringDefault);
        }
    }

    /// <summary>What is on it first, then the blade of its next cut.</summary>
    private IReadOnlyList<Worked> Worked() => WorkedOut.Rows(
        on is null ? WorkedOut.Bends(saw) : WorkedOut.Life(on, saw) ?? WorkedOut.Bends(saw),
        on is null ? null : WorkedOut.Tension(on, saw, advice.Words),
        next is { } span ? WorkedOut.Push(span.Choice.Blade, saw, span.Cut.Number) : null,
        next is { } cut ? WorkedOut.Cut(cut.Choice) : null);

    private IEnumerable<SawAction> Actions()
    {
        string At(string verb) => $"/saws/{saw.Saw.Code}/{verb}";
        yield return new(on is null ? "Put a blade on" : "Swap", At("swap"), Main: true);
        if (on is { File.Hold: not null })
        {
            yield return new("Clear it", $"/blades/{on.File.Blade.Tag}/clear");
        }
        else if (on is not null)
        {
            yield return new("Clicking", At("clicking"), Alarm: true);
        }

        if (saw.Timer is { } timer)
        {
            yield return new($"Stop {Said.Clock(advice.Now.AsOf - timer.Entry.AtUtc)}", At("timer"), Timer: timer.EntryId);
        }
        else if (!saw.Saw.HasHourMeter)
        {
            yield return new("Start timer", At("timer/start"), Timer: 0);
        }

        yield return new("Hours", At("hours"));
        yield return new("Check", At("check"));
        yield return new("Cut done", At("cut"));
        if (on is not null)
        {
            yield return new(Said.Capital($"{advice.Words.Tension} {(saw.Slack ? "on" : "off")}"), At("slack"));
            yield return new(Said.Capital($"{advice.Words.Tension} measured"), $"/blades/{on.File.Blade.Tag}/tension");
        }

        yield return new("What if", At("what-if"));
        yield return new("Edit", At("edit"));
    }

    private static string Hours(long ms) => Figures.With(Figures.Hours(ms / 3_600_000.0), "h");
}

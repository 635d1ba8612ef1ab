using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Breaks;

/// <summary>Breaks in the shop's words and units.</summary>
internal sealed class BreakSays(ShopAdvice advice, ShopUnits units, DateTime now)
{
    private IReadOnlyList<WatchedBlade>? watched;
    private IReadOnlyList<BreakCluster>? clusters;

    private IReadOnlyList<WatchedBlade> Watched => watched ??= BreakClusters.Watched(advice.Now.Blades.Select(advice.Of), advice.Settings);

    private IReadOnlyList<BreakCluster> Clusters => clusters ??= BreakClusters.Find(Watched);

    public BreaksModel List(IReadOnlyList<BrokenBlade> broken)
    {
        BreakRow[] rows = [.. broken.Select(Row)];
        return new BreaksModel(
            rows.Length == 0 ? "Breaks: none" : $"Breaks: {rows.Length}{(Clusters.Count == 0 ? "" : $", {Clusters.Sum(c => c.Broken.Count)} of them in a cluster")}",
            rows,
            [.. Clusters.Select(Cluster)],
            [.. rows.Where(r => r.ToComplete)],
            $"{Said.Count(Watched.Count, "blade", "blades")} that ran, on each saw and each thickness to wheel, were held against {Figures.Number(BreakClusters.Shuffles)} re-shuffles of their hours and breaks. A group of at least {BreakClusters.LeastBreaks} breaks is told where fewer than 1 in 100 re-shuffles shows one as striking anywhere in the shop (default, not yours). Blades of unknown history are left out.");
    }

    public BreakModel One(BrokenBlade b, CompleteForm form, FormState state)
    {
        FracturePart[] all = [.. FractureCauses.All.Select(c => new FracturePart(Fractures.Kind(c.Site)!.Value, c.Looks, c.Causes, c.Site == b.Break.Site))];
        string tag = b.Blade.File.Blade.Tag;
        return new BreakModel
        {
            Entry = b.Break.EntryId,
            Tag = tag,
            Says = FractureCauses.Flexing(b),
            Lede = $"It broke {Fractures.Words(b.Break.Site)}{(SawName(b) is { } saw ? " on " + saw : "")}, {Period(b)}{(b.Break.Note is { } note ? ": " + note.TrimEnd('.') : "")}.",
            Fracture = all.FirstOrDefault(f => f.This),
            Fractures = all,
            Facts = [.. Facts(b)],
            Life = b.MedianHours is { } median && b.OneInTenHours is { } tenth ? new LifeFigures(b.HoursLow, median, tenth, b.HoursUncertain ? b.HoursHigh : null) : null,
            LifeWords = Life(b),
            Clusters = [.. Clusters.Where(c => c.Broken.Any(x => x.Tag == tag)).Select(Cluster)],
            Because = Reckoned.Lines(Because(b), units),
            Worked = WorkedOut.Rows(WorkedOut.Life(b.Blade, b.Saw), WorkedOut.Tension(b.Blade, b.Saw, advice.Words)),
            Form = form,
            State = state,
            ToComplete = b.ToComplete,
            People = [],
        };
    }

    private BreakRow Row(BrokenBlade b) => new(
        b.Break.EntryId,
        b.Blade.File.Blade.Tag,
        Period(b),
        SawName(b) is { } on ? $"on {on}" : "no saw known",
        Fractures.Words(b.Break.Site),
        Hours(b) + (b.MedianHours is { } median ? $"; half of such by {Figures.With(Figures.Hours(median), "h")}" : ""),
        Used(b),
        string.Join(", ", new[] { Bending(b) is { } stress ? units.Show(stress) : null, b.Blade.Record.ThicknessToWheel is { } ratio ? $"1/{Wording.Number(1 / ratio, 0)}" : null }.OfType<string>()) is { Length: > 0 } bent ? bent : "not known",
        units.ShowMoney(b.Cost.Total),
        b.ToComplete,
        WorkedOut.Life(b.Blade, b.Saw));

    private ClusterPart Cluster(BreakCluster c)
    {
        string saw = advice.Now.Saws.First(s => s.Saw.Id == c.SawId).Saw.Name;
        string under = Figures.With(Figures.Hours(c.UnderHours), "h");
        string chance = c.Chance <= 1.5 / (BreakClusters.Shuffles + 1)
            ? $"not one of {Figures.Number(BreakClusters.Shuffles)} re-shuffles shows such a group"
            : $"such a group turns up in {Figures.Chance(c.Chance)} re-shuffles";
        return new ClusterPart(
            $"{c.Broken.Count} of {c.BreaksOnSaw} breaks on {saw} under {under}: thickness to wheel 1/{c.OneOver}",
            $"{c.Broken.Count} of {Said.Count(c.Blades, "blade", "blades")} that ran so broke; their hours would have brought {Wording.Number(c.Expected, 1)} in this shop as a whole. If chance dealt the breaks: {chance}.",
            string.Join(", ", c.Broken.Select(b => b.Tag)));
    }

    private IEnumerable<BreakFact> Facts(BrokenBlade b)
    {
        LifeOfBlade life = b.Blade.Record;
        yield return new("Ran", Hours(b), b.HoursUncertain ? "known only between these" : b.Break.HoursLow is null ? "as its saws’ hours add up" : null);
        if (b.MedianHours is { } median && b.OneInTenHours is { } tenth)
        {
            yield return new("Half of such", $"broken at {Figures.With(Figures.Hours(median), "h")}", $"1 in 10 at {Figures.With(Figures.Hours(tenth), "h")}, on this saw");
        }

        if (b.Flexing != FlexingSays.Nothing)
        {
            yield return new("Used", Used(b), "1 is where half have broken");
        }

        if (Bending(b) is { } stress && b.Saw is { } saw)
        {
            yield return new("Bending", units.Show(stress), $"over {units.Show(new Length(saw.Setup.Wheels.Min(w => w.DiameterM)), Fields.WheelDiameter)}");
        }

        if (life.ThicknessToWheel is { } ratio)
        {
            yield return new("Body to wheel", $"1/{Wording.Number(1 / ratio, 0)}", life.Verdict is { } verdict ? LifeWords.Ladder(verdict) : null);
        }

        if (life.Tension is { } tension)
        {
            yield return new(Said.Capital(advice.Words.Tension), units.Show(Stress.FromMegapascals(Math.Round(tension.Stress.Value / 1e6))), $"on the body, {tension.Stress.From}");
        }

        if (life.Rate is { } rate)
        {
            yield return new("Bends", Figures.Number(rate.Result.BendsPerHour), "an hour");
        }

        yield return new("Sharpened", Said.Count(b.Blade.File.Sharpenings, "time", "times"), $"width {Said.Width(b.Blade.File.WidthM, units)}");
        yield return new("Cost", units.ShowMoney(b.Cost.Total), CostWords(b));
    }

    private string CostWords(BrokenBlade b)
    {
        List<string> parts = [$"blade {units.ShowMoney(b.Cost.Blade)}"];
        parts.Add(b.Break.MinutesLost is { } minutes ? $"{Figures.With(Figures.Number(minutes), "min")} {units.ShowMoney(b.Cost.Time)}" : "minutes lost not told");
        if (b.Cost.Else > 0)
        {
            parts.Add($"else {units.ShowMoney(b.Cost.Else)}");
        }

        return string.Join(", ", parts);
    }

    private static string Life(BrokenBlade b) => b.Flexing == FlexingSays.Nothing
        ? "No hours are known, so nothing can be said of its life."
        : $"{Said.Capital(Figures.Chance(b.ChanceByThen))} such blades have broken by then, says the handbook with all its doubt.{(b.MedianHours is null ? " " + (b.Blade.Record.Verdict is { } verdict ? LifeWords.Ladder(verdict) : "") : "")}";

    private IEnumerable<Figure> Because(BrokenBlade b)
    {
        LifeOfBlade life = b.Blade.Record;
        if (life.Rate?.Result is { } result && b.Saw is { } saw)
        {
            yield return new("bends an hour", result.BendsPerHour, "", $"{saw.Setup.Wheels.Count} wheels times band speed over the loop, times 3,600", "derived", Provenance.Derived);
            yield return new("bending over the smallest wheel", result.Bending.Max(s => s.Megapascals), "MPa", "stiffness of the steel times thickness over wheel and thickness", "derived", Provenance.Derived);
            yield return new("running tension", result.RunningTension.Megapascals, "MPa", "on the body section, with what the speed adds", "derived", Provenance.Derived);
            yield return new("hours to half broken, gullets", result.Gullet.MedianHours, "h", "handbook median of the gullets on this saw", "engineering-default", Provenance.EngineeringDefault);
            yield return new("hours to half broken, weld", result.Weld.MedianHours, "h", "handbook median of the weld on this saw", "engineering-default", Provenance.EngineeringDefault);
        }

        yield return new("used at the gullets", life.Used.Gullet, "", "bends over median bends, summed over all saws", "miner-1945", Provenance.Published);
        yield return new("used at the weld", life.Used.Weld, "", "bends since this weld over its median bends", "miner-1945", Provenance.Published);
        yield return new("hardness of the body", b.Blade.Body.Hrc.Value, "HRC", b.Blade.Body.Hrc.From, "derived", b.Blade.Body.Hrc.Provenance);
        yield return new("band factor", advice.Level.BandFactor, "", "used life is divided and multiplied by it: 80 of 100 lie between", "engineering-default", Provenance.EngineeringDefault);
    }

    private static string Used(BrokenBlade b)
    {
        if (b.Flexing == FlexingSays.Nothing)
        {
            return "";
        }

        return b.HoursUncertain
            ? $"{Wording.Share(b.UsedAtLow)} to {Wording.Share(b.UsedAtHigh)} (band {Wording.Share(b.BandLow)} to {Wording.Share(b.BandHigh)})"
            : Figures.Used(b.UsedAtLow, b.BandLow, b.BandHigh);
    }

    private static string Hours(BrokenBlade b) => b.HoursUncertain
        ? $"{Figures.Number(b.HoursLow, 1)} to {Figures.With(Figures.Number(b.HoursHigh, 1), "h")}"
        : Figures.With(Figures.Hours(b.HoursLow), "h");

    private string Period(BrokenBlade b) => Said.When(b.Break.LatestUtc, now, units);

    private static string? SawName(BrokenBlade b) => b.Saw?.Saw.Name;

    private static Stress? Bending(BrokenBlade b) => b.Blade.Record.Rate is { } rate ? Stress.FromMegapascals(Math.Round(rate.Result.Bending.Max(s => s.Megapascals))) : null;
}

using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using Choice = BladeLog.Advice.Cuts.Choice;

namespace BladeLog.Features.Cuts;

/// <summary>The small form under "Other stock or feed", as typed. All of it travels in the address.</summary>
public sealed record OtherForm
{
    /// <summary>Anything: the form is wanted though nothing is changed yet.</summary>
    public string? Other { get; init; }

    public string? Height { get; init; }

    public string? Feed { get; init; }

    public string? Guide { get; init; }

    public string? Pull { get; init; }

    public string? Width { get; init; }

    public bool Asked => new[] { Height, Feed, Guide, Pull, Width }.Any(t => !string.IsNullOrWhiteSpace(t));

    public bool Wanted => Asked || !string.IsNullOrEmpty(Other);
}

/// <summary>A quantity as it is and as it would be.</summary>
public sealed record Changed(string What, string Now, string Then);

/// <summary>The same blade with other stock, feed, guides, tension or width: reckoned again.</summary>
public sealed record OtherStock(OtherForm Form, IReadOnlyList<Problem> Problems)
{
    /// <summary>The blade refused or shut at this stock.</summary>
    public string? Refusal { get; init; }

    public Choice? Then { get; init; }

    public Gate? Gate { get; init; }

    /// <summary>What happens at the typed feed, else at the advised one.</summary>
    public AtFeed? At { get; init; }

    public double FeedMps { get; init; }

    public IReadOnlyList<Changed> Rows { get; init; } = [];

    public IReadOnlyList<string> WhatIf { get; init; } = [];

    public string? Error(string field) => Problems.FirstOrDefault(p => p.Field == field)?.Sentence;

    internal static OtherStock Of(OtherForm form, Choice now, ShopAdvice advice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(form);
        ArgumentNullException.ThrowIfNull(now);
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(units);
        List<Problem> problems = [];
        double? height = Read(form.Height, nameof(form.Height), t => units.ReadLength(t, Fields.CutHeight), l => l.Metres, problems);
        double? feed = Read(form.Feed, nameof(form.Feed), t => units.ReadFeed(t), v => v.MetresPerSecond, problems);
        double? guide = Read(form.Guide, nameof(form.Guide), t => units.ReadLength(t, Clearance), l => l.Metres, problems);
        double? pull = Read(form.Pull, nameof(form.Pull), t => units.ReadStress(t), s => s.Pascals, problems);
        double? width = Read(form.Width, nameof(form.Width), t => units.ReadLength(t, Fields.BladeWidth), l => l.Metres, problems);
        if (pull is 0)
        {
            problems.Add(new Problem(nameof(form.Pull), "A blade without tension cannot be reckoned. Write what it is slackened to, such as 60 MPa."));
        }

        if (width <= now.Blade.Body.Gullet.Value)
        {
            problems.Add(new Problem(nameof(form.Width), $"The gullets alone are {units.Show(new Length(now.Blade.Body.Gullet.Value), Fields.GulletDepth)} deep: write a greater width."));
        }

        OtherStock other = new(form, problems) { WhatIf = [.. advice.WhatIf(now, all: true).Select(w => w.Sentence)] };
        return problems.Count > 0 || !form.Asked ? other : Reckon(other, now, advice, units, new Change(height, feed, guide, pull, width));
    }

    private static readonly TypedField Clearance = new("a clearance of the upper guide", 0, 2);

    private sealed record Change(double? Height, double? Feed, double? Guide, double? Pull, double? Width);

    private static OtherStock Reckon(OtherStock other, Choice now, ShopAdvice advice, ShopUnits units, Change change)
    {
        CutWork work = change.Height is { } h ? now.Work with { HeightM = h } : now.Work;
        BladeBody body = change.Width is { } w ? now.Blade.Body with { Width = now.Blade.Body.Width with { Value = w } } : now.Blade.Body;
        Choice then = advice.Try(work, now.Blade with { Body = body }, now.Saw, now.SpeedMps);
        if (then.Case is not { } cut || then.Tension is not { } tension)
        {
            return other with { Then = then, Refusal = then.Reason.Sentence };
        }

        double pull = change.Pull ?? tension.Stress.Value;
        GuidedBand band = advice.Beams.Band(body, pull, now.Saw.Setup, now.SpeedMps, work.HeightM);
        if (change.Guide is { } clearance)
        {
            band = band with { GuideSpan = new Length(now.Saw.Setup.LowerGuideM + work.HeightM + clearance) };
        }

        ThrustLimits thrust = advice.Beams.Of(band, tension.FrontEdgeFactor);
        Gate gate = Gate.Of(cut, FeedLimits.Of(cut, work, now.Saw.Setup, thrust, advice.Settings), thrust, advice.Settings);
        double feed = change.Feed ?? gate.AdvisedMps ?? gate.Amber.AmberMps;
        AtFeed at = CutDesk.At(cut, new Speed(feed), thrust);
        return other with
        {
            Then = then,
            Gate = gate,
            Refusal = gate.State == GateState.Shut ? CutWords.Shut(gate.GovernedBy) : null,
            At = at,
            FeedMps = feed,
            Rows = [.. Compare(now, band, thrust, gate, at, feed, pull, units, advice.Words)],
        };
    }

    private static IEnumerable<Changed> Compare(Choice now, GuidedBand band, ThrustLimits thrust, Gate gate, AtFeed at, double feed, double pull, ShopUnits units, Wording words)
    {
        string none = "none";
        if (now is not { Gate: { Thrust: { } before } was, AtAdvised: { } did, Tension: { } tension })
        {
            yield break;
        }

        double span = now.Saw.Setup.LowerGuideM + now.Work.HeightM + now.Saw.Setup.ClearanceM;
        yield return new("Open from, to", CutSays.Window(now, units), gate is { LowMps: { } low, HighMps: { } high } ? CutSays.Between(low, high, units) : none);
        yield return new("Closed by", CutWords.LimitName(was.UpperEdgeBy), CutWords.LimitName(gate.UpperEdgeBy));
        yield return new("Thrust allowed", units.Show(before.Allowed), units.Show(thrust.Allowed));
        yield return new("Guides apart", units.Show(new Length(span)), units.Show(band.GuideSpan));
        yield return new(Said.Capital(words.Tension) + " on the body", units.Show(new Stress(tension.Stress.Value)), units.Show(new Stress(pull)));
        yield return new("Feed", CutSays.Feed(was.AdvisedMps!.Value, units), CutSays.Feed(feed, units));
        yield return new("Push at that feed", units.Show(new Force(did.ThrustN)), units.Show(new Force(at.ThrustN)));
        yield return new("Power at the blade", units.Show(new Power(did.PowerW)), units.Show(new Power(at.PowerW)));
        yield return new("Gullets full to", Figures.Number(did.Fill, 2), Figures.Number(at.Fill, 2));
        yield return new("Bite", units.Show(new Length(did.BiteM), Fields.EdgeRadius), units.Show(new Length(at.BiteM), Fields.EdgeRadius));
        yield return new("The edge", Regime(did), Regime(at));
    }

    private static string Regime(AtFeed at) => at.Regime switch
    {
        BiteRegime.NoChip => "makes no chip",
        BiteRegime.Rubbing => "rubs",
        _ => "cuts",
    };

    private static double? Read<T>(string? text, string field, Func<string, Parsed<T>> read, Func<T, double> si, List<Problem> problems)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        if (read(text).TryGet(out T value, out string problem))
        {
            return si(value);
        }

        problems.Add(new Problem(field, problem));
        return null;
    }
}

using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;

namespace BladeLog.Advice.Cuts;

public enum WhatIfKind
{
    HalfTheTeeth,
    RaisedGuide,
    WiderBlade,
    SlackBlade,
}

/// <summary>What a change would do to a choice, reckoned and not guessed.</summary>
/// <param name="Kind">Which change.</param>
/// <param name="Sentence">In words.</param>
/// <param name="Before">Now: feed in m/s for the teeth, thrust in N for the others.</param>
/// <param name="After">With the change.</param>
public sealed record WhatIf(WhatIfKind Kind, string Sentence, double Before, double After);

/// <summary>Puts a changed blade or saw to the same cut.</summary>
internal sealed class WhatIfs(CutDesk desk, BeamTable beams, AdviceSettings settings, Wording words)
{
    private const double Raise = 0.050;
    private const double TensionLeft = 2.0 / 3;

    /// <summary>A thrust reserve that makes it idle to talk of guides, width and tension.</summary>
    private const double Ample = 4;

    /// <summary>A gain worth a sentence.</summary>
    private const double Telling = 1.05;

    internal IReadOnlyList<WhatIf> Of(Choice c, IReadOnlyList<Choice> others, bool all)
    {
        if (c.Case is null || c.Gate is not { Thrust: { } thrust } gate)
        {
            return [];
        }

        bool motor = gate.GovernedBy == FeedLimitKind.Power || gate.Green.Kind == FeedLimitKind.Power;
        bool push = gate.Green.Kind == FeedLimitKind.Beam || gate.GovernedBy == FeedLimitKind.Beam || c.AtAdvised?.Reserve < Ample;
        WhatIf?[] told =
        [
            all || motor ? HalfTheTeeth(c, gate, others) : null,
            all || push ? RaisedGuide(c, thrust) : null,
            all || push ? Wider(c, thrust) : null,
            all || push ? Slack(c, thrust) : null,
        ];
        return [.. told.OfType<WhatIf>()];
    }

    private WhatIf? HalfTheTeeth(Choice c, Gate gate, IReadOnlyList<Choice> others)
    {
        BladeBody body = c.Blade.Body;
        if (Kinematics.TeethInCut(new Length(c.Work.HeightM), new Length(2 * body.PitchCoarse)) < settings[CutSettings.LeastTeeth])
        {
            return null;
        }

        BladeAdvice coarse = c.Blade with { Body = body with { PitchMean = 2 * body.PitchMean, PitchCoarse = 2 * body.PitchCoarse } };
        if (desk.At(c.Work, coarse, c.Saw, c.SpeedMps).Gate is not { } other)
        {
            return null;
        }

        // While no chip forms the pitch cancels, and fewer teeth free nothing.
        double before = Motor(gate), after = Motor(other);
        if (after < Telling * before)
        {
            return null;
        }

        Choice? have = others.Where(o => o.Saw == c.Saw && o.Blade.Body.PitchMean >= 1.6 * body.PitchMean && o.Reason.Kind is not (ReasonKind.Hold or ReasonKind.Teeth or ReasonKind.Radius))
            .MinBy(o => Math.Abs(o.Blade.Body.PitchMean - (2 * body.PitchMean)));
        return new WhatIf(WhatIfKind.HalfTheTeeth, WhatIfWords.HalfTheTeeth(c, before, after, have, words), before, after);
    }

    private static double Motor(Gate gate) => gate.Limits.Single(l => l.Kind == FeedLimitKind.Power).GreenMps;

    private WhatIf RaisedGuide(Choice c, ThrustLimits now)
    {
        GuidedBand band = Band(c, c.Blade.Body, c.Tension!.Stress.Value);
        ThrustLimits raised = beams.Of(band with { GuideSpan = new Length(band.GuideSpan.Metres + Raise) }, c.Tension.FrontEdgeFactor);
        return new WhatIf(WhatIfKind.RaisedGuide, WhatIfWords.RaisedGuide(Raise, now, raised, words), now.Allowed.Newtons, raised.Allowed.Newtons);
    }

    /// <summary>As wide as the saw and the curve allow, at the tension the saw can still give it.</summary>
    private WhatIf? Wider(Choice c, ThrustLimits now)
    {
        BladeBody body = c.Blade.Body;
        double width = c.Saw.Setup.WidthMostM;
        if (c.Work.RadiusM is { } radius)
        {
            width = Math.Min(width, CurveRadius.WidestBlade(new Length(radius), new Length(body.Kerf.Value), new Length(body.Thickness.Value), settings[CutSettings.CurveFactor]).Metres);
        }

        if (width < 1.05 * body.Width.Value)
        {
            return null;
        }

        BladeBody wide = body with { Width = body.Width with { Value = width } };
        double section = wide.Thickness.Value * wide.BodyWidth;
        double tension = Math.Min(c.Tension!.Stress.Value, (c.Saw.Setup.StrandForceMostN / section) ?? double.PositiveInfinity);
        ThrustLimits wider = beams.Of(Band(c, wide, tension), c.Tension.FrontEdgeFactor);
        return new WhatIf(WhatIfKind.WiderBlade, WhatIfWords.Wider(width, now, wider, words), now.Allowed.Newtons, wider.Allowed.Newtons);
    }

    private WhatIf Slack(Choice c, ThrustLimits now)
    {
        ThrustLimits slack = beams.Of(Band(c, c.Blade.Body, TensionLeft * c.Tension!.Stress.Value), c.Tension.FrontEdgeFactor);
        return new WhatIf(WhatIfKind.SlackBlade, WhatIfWords.Slack(now, slack, words), now.Allowed.Newtons, slack.Allowed.Newtons);
    }

    private GuidedBand Band(Choice c, BladeBody body, double tension) => beams.Band(body, tension, c.Saw.Setup, c.SpeedMps, c.Work.HeightM);
}

using BladeLog.Handbook.BeamStrength;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Every sentence on what a change would do.</summary>
public static class WhatIfWords
{
    public static string HalfTheTeeth(Choice c, double before, double after, Choice? have, Wording words)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(words);
        string blade = have is null ? ""
            : $" {have.Tag}{(have.Blade.File.Place == Place.AtSharpener ? ", at the sharpener," : "")} has {Wording.Number(have.TeethInCut, 0)} teeth in the cut.";
        return $"Half the {Wording.Number(c.TeethInCut, 0)} teeth: the motor then gives {words.Feed(after)} instead of {words.Feed(before)}.{blade}";
    }

    public static string RaisedGuide(double raise, ThrustLimits now, ThrustLimits raised, Wording words)
    {
        ArgumentNullException.ThrowIfNull(words);
        return $"Keep the upper guide down: {words.Length(raise)} higher the blade stands {Push(raised)} instead of {Push(now)}.";
    }

    public static string Wider(double width, ThrustLimits now, ThrustLimits wider, Wording words)
    {
        ArgumentNullException.ThrowIfNull(words);
        return $"A wider blade, {words.Width(width)}, would stand {Push(wider)} instead of {Push(now)}.";
    }

    public static string Slack(ThrustLimits now, ThrustLimits slack, Wording words)
    {
        ArgumentNullException.ThrowIfNull(words);
        return $"Slack, at two thirds of this {words.Tension}, it stands {Push(slack)} instead of {Push(now)}.";
    }

    private static string Push(ThrustLimits limits)
    {
        double F = limits.Allowed.Newtons;
        return Wording.Number(F, F < 9.95 ? 1 : 0) + " N";
    }
}

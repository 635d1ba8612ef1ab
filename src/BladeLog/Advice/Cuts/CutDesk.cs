using BladeLog.Advice.Life;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Puts one blade on one saw to one cut.</summary>
internal sealed class CutDesk(Shop shop, AdviceSettings settings, DamageTable damage, BeamTable beams, LevelPrior level, Wording words)
{
    /// <summary>At the saw's usual speed, or at another where that makes the better answer.</summary>
    internal Choice Best(CutWork work, BladeAdvice blade, SawNow saw)
    {
        double usual = saw.Setup.UsualSpeedMps;
        Choice first = At(work, blade, saw, usual);
        if (saw.Setup.Speeds.Count < 2 || (first.Verdict == Verdict.No && first.Gate is null) || first.Verdict == Verdict.Fits)
        {
            return first;
        }

        IEnumerable<Choice> better = saw.Setup.Speeds
            .Where(s => s.SpeedMps != usual)
            .Select(s => At(work, blade, saw, s.SpeedMps))
            .Where(other => Worth(first, other));
        return better.OrderBy(c => c.Verdict).ThenBy(c => c.Job?.Cost.Total).FirstOrDefault() ?? first;
    }

    /// <summary>No into care, rubbing into another care, or care into fits.</summary>
    private static bool Worth(Choice usual, Choice other) =>
        other.Verdict < usual.Verdict
        || (usual.Gate?.State == GateState.Rubbing && other.Verdict == Verdict.WithCare && other.Gate?.State != GateState.Rubbing);

    internal Choice At(CutWork work, BladeAdvice blade, SawNow saw, double speed)
    {
        BladeBody body = blade.Body;
        BladeTension tension = body.TensionOn(saw.Setup, blade.File, settings);
        Damage rate = damage.Of(body, blade.File.Weld, saw.Setup, speed, tension.Stress.Value, blade.File.LoopM ?? saw.Setup.LoopM);
        double? hard = body.Kerf.Value > body.Thickness.Value ? CurveRadius.Hard(Of(body.Width), Of(body.Kerf), Of(body.Thickness)).Metres : null;
        Choice choice = new()
        {
            Work = work,
            Blade = blade,
            Saw = saw,
            SpeedMps = speed,
            Verdict = Verdict.No,
            Reasons = [],
            Tension = tension,
            HardRadiusM = hard,
            UsualRadiusM = hard * settings[CutSettings.CurveFactor],
        };
        if (Refusals.First(work, blade, saw, rate, settings, words) is { } refused)
        {
            return choice with { Reasons = [refused] };
        }

        CutCase cut = work.Case(body, blade.Edge.RadiusM, speed, settings);
        ThrustLimits thrust = beams.Of(body, tension, saw.Setup, speed, work.HeightM);
        Gate gate = Gate.Of(cut, FeedLimits.Of(cut, work, saw.Setup, thrust, settings), thrust, settings);
        choice = choice with { Case = cut, Gate = gate };
        if (gate.AdvisedMps is not { } feed)
        {
            return choice with { Reasons = [new CutReason(ReasonKind.Shut, CutWords.Shut(gate.GovernedBy))] };
        }

        bool relief = work.RadiusM is { } r && choice.UsualRadiusM is { } usual && r < usual;
        JobCost job = JobCost.Of(work, blade, saw, speed, feed, relief, rate, level, shop, settings);
        choice = choice with { Relief = relief, Job = job, AtAdvised = At(cut, new Speed(feed), thrust) };
        CutReason[] cares = [.. Cares(choice)];
        return choice with
        {
            Verdict = cares.Length == 0 ? Verdict.Fits : Verdict.WithCare,
            Reasons = cares.Length == 0 ? [new CutReason(ReasonKind.Fits, CutWords.Fits(gate.GovernedBy))] : cares,
            Cautions = [.. Cautions(choice)],
        };
    }

    internal static AtFeed At(CutCase cut, Speed feed, ThrustLimits thrust)
    {
        Length bite = Kinematics.BitePerTooth(feed, cut.Pitch, cut.BandSpeed);
        double F = CuttingForce.Thrust(cut, feed).Newtons;
        return new AtFeed(
            bite.Metres,
            Bite.OverEdge(cut, bite).Metres,
            Bite.RegimeOf(cut, feed),
            Gullet.Fill(bite, cut.CutHeight, Gullet.AreaOf(cut)),
            CuttingForce.Main(cut, feed).Newtons,
            F,
            CuttingForce.CuttingPower(cut, feed).Watts,
            F > 0 ? thrust.Allowed.Newtons / F : double.PositiveInfinity);
    }

    /// <summary>Why it fits only with care, the strongest first.</summary>
    private IEnumerable<CutReason> Cares(Choice c)
    {
        Gate gate = c.Gate!;
        if (gate.State == GateState.Amber)
        {
            yield return new CutReason(ReasonKind.AmberLimit, CutWords.Amber(gate.Green.Kind, gate.Thrust));
        }

        if (c.Blade.Record.UnknownHistory)
        {
            yield return new CutReason(ReasonKind.UnknownHistory, CutWords.UnknownHistory());
        }

        if (c.Relief)
        {
            yield return new CutReason(ReasonKind.Curve, CutWords.Curve(c.UsualRadiusM!.Value, words));
        }

        if (c.Job!.EdgeAfterM >= c.Work.EdgeLimit.Value)
        {
            yield return new CutReason(ReasonKind.DullBeforeEnd, CutWords.DullBeforeEnd());
        }

        if (gate.State == GateState.Rubbing)
        {
            yield return new CutReason(ReasonKind.Rubbing, CutWords.Rubs(gate.Amber.Kind));
        }

        if (c.Blade.PastRetireMark && c.Work.Cut.Finish != Finish.Rough)
        {
            yield return new CutReason(ReasonKind.Life, CutWords.LifeUsed());
        }

        if (c.Blade.InspectionOverdue)
        {
            yield return new CutReason(ReasonKind.Inspection, CutWords.Inspect(c.Blade.OverdueByHours));
        }

        if (c.Blade.Limits.WeldLimitReached)
        {
            yield return new CutReason(ReasonKind.Weld, CutWords.LastWeld());
        }
    }

    private IEnumerable<string> Cautions(Choice c)
    {
        if (c.Work.Cut.ClassWork && c.Saw.Setup.ClassWork == ClassWork.Supervised)
        {
            yield return CutWords.Supervisor();
        }

        if (c.Work.Cut.NailChance > 0)
        {
            yield return CutWords.Nails();
        }

        if (c.Tension!.PullOverSaw > 1 + 1e-9)
        {
            yield return CutWords.OverPull(c.Saw, c.Tension, words);
        }

        Speed advised = new(c.Gate!.AdvisedMps!.Value);
        if (Kerf.Spills(Kinematics.BitePerTooth(advised, c.Case!.Pitch, c.Case.BandSpeed), Kerf.SetPerSide(c.Case.Kerf, c.Case.Thickness), c.Work.WithFeeder(c.Saw.Setup)))
        {
            yield return CutWords.Spills();
        }

        foreach (string outside in CutChecks.Cautions(c.Case, advised))
        {
            yield return outside;
        }
    }

    private static Length Of(Known known) => new(known.Value);
}

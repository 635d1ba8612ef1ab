using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>Refusals before any force is computed. The first that applies is the reason.</summary>
internal static class Refusals
{
    internal static CutReason? First(CutWork work, BladeAdvice blade, SawNow saw, Life.Damage rate, AdviceSettings settings, Wording words) =>
        OfWork(work) ?? OfBlade(blade, words) ?? OfSaw(work, saw, rate.Result.Verdict, words) ?? OfTeeth(work, blade, settings, words);

    private static CutReason? OfWork(CutWork work) =>
        work.IsWood ? null : new CutReason(ReasonKind.Material, CutWords.NotWood(work));

    private static CutReason? OfBlade(BladeAdvice blade, Wording words) =>
        blade.File.Hold is { } hold ? new CutReason(ReasonKind.Hold, Life.LifeWords.Hold(hold, words))
        : blade.File.Place == Place.AtSharpener ? new CutReason(ReasonKind.Away, Life.LifeWords.Away(blade.File.Away))
        : blade.Body.Doubt is not null ? new CutReason(ReasonKind.Figures, CutWords.Doubtful())
        : blade.Body.TooNarrow ? new CutReason(ReasonKind.Width, CutWords.TooNarrow(blade.Body, words))
        : blade.Body.Kerf.Value < blade.Body.Thickness.Value ? new CutReason(ReasonKind.Figures, CutWords.KerfTooNarrow())
        : null;

    private static CutReason? OfSaw(CutWork work, SawNow saw, LifeVerdict verdict, Wording words)
    {
        SawSetup setup = saw.Setup;
        Takes kind = work.Cut.Kind switch
        {
            CutKind.Board => Takes.Board,
            CutKind.Resaw => Takes.Resaw,
            CutKind.Beam => Takes.Beam,
            _ => Takes.Log,
        };
        return !setup.Takes.HasFlag(kind) ? new CutReason(ReasonKind.WorkKind, CutWords.WorkKind(saw, work.Cut.Kind))
            : work.HeightM > setup.CutHeightMostM + 1e-9 ? new CutReason(ReasonKind.TooHigh, CutWords.TooHigh(saw, work, words))
            : setup.LongestPieceM is { } longest && work.LengthM > longest + 1e-9 ? new CutReason(ReasonKind.TooLong, CutWords.TooLong(saw, work, words))
            : Math.Abs(work.Cut.BevelRad) > setup.TiltMostRad + 1e-9 ? new CutReason(ReasonKind.Bevel, CutWords.Bevel(saw))
            : work.Cut.ClassWork && setup.ClassWork == ClassWork.No ? new CutReason(ReasonKind.ClassWork, CutWords.NoClass(saw))
            : verdict == LifeVerdict.Unsuitable ? new CutReason(ReasonKind.Unsuitable, CutWords.Unsuitable())
            : null;
    }

    private static CutReason? OfTeeth(CutWork work, BladeAdvice blade, AdviceSettings settings, Wording words)
    {
        BladeBody body = blade.Body;
        double teeth = Math.Round(Kinematics.TeethInCut(new Length(work.HeightM), new Length(body.PitchCoarse)), 1, MidpointRounding.AwayFromZero);
        double least = settings[CutSettings.LeastTeeth];
        if (teeth < least)
        {
            return new CutReason(ReasonKind.Teeth, CutWords.Teeth(teeth, least));
        }

        if (work.RadiusM is { } radius)
        {
            double hard = CurveRadius.Hard(new Length(body.Width.Value), new Length(body.Kerf.Value), new Length(body.Thickness.Value)).Metres;
            if (radius < hard)
            {
                return new CutReason(ReasonKind.Radius, CutWords.Radius(settings[CutSettings.CurveFactor] * hard, hard, words));
            }
        }

        if (blade.File.OffAsDull)
        {
            return new CutReason(ReasonKind.Dull, CutWords.OffAsDull());
        }

        return blade.Edge.RadiusM >= work.EdgeLimit.Value
            ? new CutReason(ReasonKind.Dull, CutWords.Dull(blade.Edge.RadiusM, work.EdgeLimit.Value))
            : null;
    }
}

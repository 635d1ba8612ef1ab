using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>What would help where nothing fits. Each is put to the cut and told only where it makes the better answer.</summary>
internal sealed class Proposals(CutDesk desk, AdviceSettings settings, Wording words)
{
    internal IReadOnlyList<Proposal> For(CutWork work, IReadOnlyList<Choice> ranked, IEnumerable<SawNow> saws, Func<BladeFile, SawNow, BladeAdvice> advise)
    {
        if (!work.IsWood)
        {
            return [];
        }

        Choice? best = ranked.FirstOrDefault(c => c.Verdict != Verdict.No);
        List<Proposal> all =
        [
            .. Best(best, ranked.Select(c => Stacked(work, c)).OfType<Choice>(), c => new Proposal(ProposalKind.Stack, ProposalWords.Stack(c, words), c), 2),
            .. Best(best, Sharpened(work, ranked, advise), c => new Proposal(ProposalKind.SharpenFirst, ProposalWords.SharpenFirst(c, words), c), 1),
            .. ranked.Where(c => c == best && c.SpeedMps != c.Saw.Setup.UsualSpeedMps).Select(c => new Proposal(ProposalKind.SlowerSpeed, ProposalWords.SlowerSpeed(c, words), c)),
            .. ranked.Where(c => c == best && c.Relief).Select(c => new Proposal(ProposalKind.ReliefCuts, ProposalWords.ReliefCuts(c, words), c)),
            .. Best(best, saws.Select(s => Bought(work, s, ranked, advise)).OfType<Choice>(), c => new Proposal(ProposalKind.Buy, ProposalWords.Buy(c, Coarsest(work), Widest(work, c), words), c), 1),
            .. Best(best, Returned(work, ranked, advise), c => new Proposal(ProposalKind.ComesBack, ProposalWords.ComesBack(c, c.Blade.File.Away, words), c), 1),
        ];
        return all;
    }

    private IEnumerable<Proposal> Best(Choice? now, IEnumerable<Choice> tried, Func<Choice, Proposal> say, int most) =>
        Ranking.Order(tried.Where(c => Better(c, now)), settings).Take(most).Select(say);

    private static bool Better(Choice tried, Choice? now) => tried.Verdict != Verdict.No
        && (now is null || tried.Verdict < now.Verdict || (tried.Verdict == now.Verdict && tried.Job!.Cost.Total < now.Job!.Cost.Total));

    /// <summary>As many pieces on one another as give this blade three teeth.</summary>
    private Choice? Stacked(CutWork work, Choice c)
    {
        if (c.Reason.Kind != ReasonKind.Teeth)
        {
            return null;
        }

        int pieces = (int)Math.Ceiling(settings[CutSettings.LeastTeeth] * c.Blade.Body.PitchCoarse / work.HeightM - 1e-9);
        return pieces > work.Pieces ? null : desk.Best(work.Stacked(pieces), c.Blade, c.Saw);
    }

    private IEnumerable<Choice> Sharpened(CutWork work, IReadOnlyList<Choice> ranked, Func<BladeFile, SawNow, BladeAdvice> advise) => ranked
        .Where(c => c.Blade.Grind.Pays && c.Reasons.Any(r => r.Kind is ReasonKind.Dull or ReasonKind.Rubbing or ReasonKind.Shut or ReasonKind.DullBeforeEnd or ReasonKind.AmberLimit))
        .Select(c => desk.Best(work, advise(Fresh(c.Blade), c.Saw), c.Saw));

    private IEnumerable<Choice> Returned(CutWork work, IReadOnlyList<Choice> ranked, Func<BladeFile, SawNow, BladeAdvice> advise) => ranked
        .Where(c => c.Reason.Kind == ReasonKind.Away)
        .Select(c => desk.Best(work, advise(c.Blade.File with { Place = Place.Rack, SinceSharpening = [] }, c.Saw), c.Saw));

    /// <summary>The blade after one more grind: fresh edge, narrower.</summary>
    private static BladeFile Fresh(BladeAdvice blade) => blade.File with
    {
        SinceSharpening = [],
        Sharpenings = blade.File.Sharpenings + 1,
        WidthM = blade.Grind.WidthAfterM,
    };

    /// <summary>A new blade of a kind this saw carries, with a pitch and width that the cut allows.</summary>
    private Choice? Bought(CutWork work, SawNow saw, IReadOnlyList<Choice> ranked, Func<BladeFile, SawNow, BladeAdvice> advise)
    {
        BladeFile[] carried = [.. ranked.Where(c => c.Saw == saw && c.Blade.File.Hold is null).Select(c => c.Blade.File)];
        if (carried.Length == 0)
        {
            return null;
        }

        // The thinnest body on the saw: new kinds are bought for the wheels they run on.
        BladeFile like = carried.MinBy(f => f.ThicknessM)!;
        double kerf = BladeBody.Of(like, settings).Kerf.Value;
        double width = Math.Min(like.Spec.WidthM, saw.Setup.WidthMostM);
        if (work.RadiusM is { } radius && kerf > like.ThicknessM)
        {
            Length widest = CurveRadius.WidestBlade(new Length(radius), new Length(kerf), new Length(like.ThicknessM), settings[CutSettings.CurveFactor]);
            width = Math.Min(width, widest.Metres);
        }

        double pitch = Math.Min(Coarsest(work), like.Spec.PitchCoarseM);
        if (width < saw.Setup.WidthLeastM || (width >= like.Spec.WidthM && pitch >= like.Spec.PitchCoarseM))
        {
            return null;
        }

        double share = settings[like.Spec.ToothForm == ToothForm.Skip ? BladeSettings.GulletShareSkip : BladeSettings.GulletShare];
        Spec spec = Kind(like.Spec, width, pitch, Math.Min(share * pitch, settings[BladeSettings.GulletOfWidth] * width));
        BladeFile bought = new()
        {
            Blade = new Blade { Tag = "", Spec = spec },
            Spec = spec,
            Place = Place.Rack,
            WidthM = width,
            LoopM = saw.Setup.LoopM,
        };
        return desk.Best(work, advise(bought, saw), saw);
    }

    private double Coarsest(CutWork work) => work.HeightM / settings[CutSettings.LeastTeeth];

    private double? Widest(CutWork work, Choice c) => work.RadiusM is { } radius
        ? CurveRadius.WidestBlade(new Length(radius), new Length(c.Blade.Body.Kerf.Value), new Length(c.Blade.Body.Thickness.Value), settings[CutSettings.CurveFactor]).Metres
        : null;

    private static Spec Kind(Spec like, double width, double pitch, double gullet) => new()
    {
        Code = "",
        WidthM = width,
        ThicknessM = like.ThicknessM,
        PitchCoarseM = pitch,
        PitchFineM = pitch,
        ToothForm = like.ToothForm,
        RakeRad = like.RakeRad,
        GulletDepthM = gullet,
        KerfM = like.KerfM,
        SetPattern = like.SetPattern,
        TipKind = like.TipKind,
        TipMaterial = like.TipMaterial,
        BodySteel = like.BodySteel,
        BodyHrc = like.BodyHrc,
        TensionPa = like.TensionPa,
        SharpeningPriceMinor = like.SharpeningPriceMinor,
        MostSharpenings = like.MostSharpenings,
        EdgeFreshM = like.EdgeFreshM,
        PriceMinor = like.PriceMinor,
    };
}

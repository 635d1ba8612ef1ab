using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>
/// All advice on a shop at one moment. Answers are worked out when first asked and kept; nothing here reads a clock,
/// a file or a database. One instance serves one request.
/// </summary>
public sealed class ShopAdvice
{
    private readonly DamageTable damage;
    private readonly CutDesk desk;
    private readonly Proposals proposals;
    private readonly Dictionary<int, BladeAdvice> blades = [];
    private readonly Dictionary<int, CutAnswer> answers = [];
    private DayPlan? plan;

    /// <param name="now">The shop.</param>
    /// <param name="level">What the shop's own breaks have taught of its level of life; null: the handbook alone.</param>
    public ShopAdvice(ShopNow now, LevelPrior? level = null)
    {
        ArgumentNullException.ThrowIfNull(now);
        Now = now;
        Settings = AdviceSettings.From(now.Settings);
        Level = level ?? Settings.Level;
        Words = Wording.Of(now.Shop);
        damage = new DamageTable(Settings);
        Beams = new BeamTable(Settings);
        desk = new CutDesk(now.Shop, Settings, damage, Beams, Level, Words);
        proposals = new Proposals(desk, Settings, Words);
    }

    public ShopNow Now { get; }

    public AdviceSettings Settings { get; }

    public LevelPrior Level { get; }

    public Wording Words { get; }

    public BeamTable Beams { get; }

    /// <summary>One blade by itself, asked on the saw it is or was last on, else the first it fits.</summary>
    public BladeAdvice Of(BladeFile blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        if (!blades.TryGetValue(blade.Blade.Id, out BladeAdvice? advice))
        {
            blades[blade.Blade.Id] = advice = On(blade, SawOf(blade));
        }

        return advice;
    }

    /// <summary>The same asked on a given saw: also for a blade as it might be.</summary>
    public BladeAdvice On(BladeFile blade, SawNow? saw) => BladeAdvice.Of(blade, saw, damage, Level, Settings, Words);

    /// <summary>Saws whose take-up and width range a blade fits.</summary>
    public IEnumerable<SawNow> Fitting(BladeFile blade)
    {
        ArgumentNullException.ThrowIfNull(blade);
        return Now.Saws.Where(s => s.Saw.Active && Fits(blade, s));
    }

    public static bool Fits(BladeFile blade, SawNow saw)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(saw);
        const double Hair = 1e-9;
        double? loop = blade.LoopM ?? blade.Spec.NewLoopM;
        bool length = loop is { } L ? L >= saw.Setup.LoopLeastM - Hair && L <= saw.Setup.LoopMostM + Hair : (blade.SawId ?? blade.LastSawId) == saw.Saw.Id;
        return length && blade.WidthM >= saw.Setup.WidthLeastM - Hair && blade.WidthM <= saw.Setup.WidthMostM + Hair;
    }

    /// <summary>Which blade for this cut: every blade that is not gone, once for each saw it fits, best first.</summary>
    public CutAnswer For(QueuedCut cut)
    {
        ArgumentNullException.ThrowIfNull(cut);
        if (!answers.TryGetValue(cut.Id, out CutAnswer? answer))
        {
            answers[cut.Id] = answer = Answer(CutWork.Of(cut, Now.Shop, Settings));
        }

        return answer;
    }

    /// <summary>One blade in one cut on a saw, at a speed of that saw.</summary>
    public Choice Try(CutWork work, BladeAdvice blade, SawNow saw, double? speedMps = null) =>
        speedMps is { } v ? desk.At(work, blade, saw, v) : desk.Best(work, blade, saw);

    /// <summary>What an hour of running at a choice's speed takes from its blade.</summary>
    public Damage Rate(Choice choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        BladeFile file = choice.Blade.File;
        return damage.Of(choice.Blade.Body, file.Weld, choice.Saw.Setup, choice.SpeedMps, choice.Tension!.Stress.Value, file.LoopM ?? choice.Saw.Setup.LoopM);
    }

    /// <summary>What a change would do to a choice: half the teeth, a raised guide, a wider blade, a slack one. Only what matters there, unless all is asked.</summary>
    public IReadOnlyList<WhatIf> WhatIf(Choice choice, bool all = false) => new WhatIfs(desk, Beams, Settings, Words).Of(choice, For(choice.Work.Cut).Choices, all);

    /// <summary>The order of the day over the cuts that wait.</summary>
    public DayPlan Plan() => plan ??= DayPlan.Of(
        [.. Now.Saws.Where(s => s.Saw.Active)],
        Now.Cuts.Where(c => c.DoneEntryId is null && c.DroppedUtc is null).Select(For));

    /// <summary>The next cut of a saw with the blade to use; null when none waits.</summary>
    public PlannedCut? NextCut(SawNow saw)
    {
        ArgumentNullException.ThrowIfNull(saw);
        return Plan().Saws.FirstOrDefault(p => p.Saw == saw)?.Next;
    }

    private CutAnswer Answer(CutWork work)
    {
        IEnumerable<Choice> tried = Now.Blades
            .Where(b => b.Place != Place.Gone && b.Break is null && b.Retirement is null)
            .SelectMany(b => Fitting(b).Select(saw => desk.Best(work, OnThis(b, saw), saw)));
        IReadOnlyList<Choice> ranked = Ranking.Order(tried, Settings);
        bool fits = ranked.Count > 0 && ranked[0].Verdict == Verdict.Fits;
        return new CutAnswer
        {
            Work = work,
            Choices = ranked,
            Proposals = fits ? [] : proposals.For(work, ranked, Now.Saws.Where(s => s.Saw.Active), On),
        };
    }

    private BladeAdvice OnThis(BladeFile blade, SawNow saw)
    {
        BladeAdvice usual = Of(blade);
        return usual.Record.On == saw ? usual : On(blade, saw);
    }

    private SawNow? SawOf(BladeFile blade) =>
        Now.Saws.FirstOrDefault(s => s.Saw.Id == blade.SawId)
        ?? Now.Saws.FirstOrDefault(s => s.Saw.Id == blade.LastSawId)
        ?? Fitting(blade).FirstOrDefault();
}

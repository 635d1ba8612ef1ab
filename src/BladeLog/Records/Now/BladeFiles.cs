using BladeLog.Handbook.Quantities;
using BladeLog.Records.Folding;

namespace BladeLog.Records;

/// <summary>Puts each blade's file together from the rows: its own spells, and its ancestors' up to the cutting down.</summary>
internal sealed class BladeFiles
{
    private readonly ShopRows _rows;
    private readonly Dictionary<int, Blade> _blades;
    private readonly ILookup<int, SpellRow> _spells;
    private readonly Dictionary<int, int> _cutDown;

    public BladeFiles(ShopRows rows)
    {
        _rows = rows;
        _blades = rows.Blades.ToDictionary(b => b.Id);
        _spells = rows.Spells.ToLookup(s => s.BladeId);
        _cutDown = rows.SplitsByChild.Values.GroupBy(s => s.ParentId).ToDictionary(g => g.Key, g => g.MaxBy(s => s.EntryId)!.ChildId);
    }

    /// <summary>Spells in which a blade was sharpened: their path since then is summed from the cuts themselves.</summary>
    public List<SpellRow> SharpenedInside() => Inside(b => LastSharpening(b)?.Entry.AtUtc);

    /// <summary>Spells in which a blade was last inspected.</summary>
    public List<SpellRow> InspectedInside() => Inside(b => _rows.LastInspections.GetValueOrDefault(b.Id)?.Entry.AtUtc);

    public BladeFile File(Blade blade, ILookup<int, CutLine> cuts, ILookup<int, ShareRow> shares)
    {
        var now = _rows.Now.GetValueOrDefault(blade.Id) ?? BladeFold.Now(new BladeStart(blade.Id, blade.Spec.WidthM, blade.Spec.NewLoopM), []);
        var line = Line(blade).ToList();
        var own = _spells[blade.Id].ToList();
        var open = own.Cast<SpellRow?>().LastOrDefault(s => s!.Value.Until is null);
        var joint = _rows.Joints[blade.Id].LastOrDefault();
        var sharpenings = line.SelectMany(a => _rows.Sharpenings[a.Blade.Id].Where(s => s.Entry.AtUtc <= a.Until)).OrderBy(s => s.Entry.AtUtc).ThenBy(s => s.EntryId).ToList();
        var last = sharpenings.LastOrDefault();
        var inspection = _rows.LastInspections.GetValueOrDefault(blade.Id);
        var broke = _rows.Breaks[blade.Id].LastOrDefault();
        var (marks, missing) = MarksAt(line, DateTime.MaxValue);
        return new BladeFile
        {
            Blade = blade,
            Spec = blade.Spec,
            Place = now.Place,
            SawId = now.SawId ?? (own.Count > 0 ? own[^1].SawId : null),
            LastSawId = own.Count > 0 ? own[^1].SawId : null,
            Hook = now.Hook,
            WidthM = now.WidthM,
            LoopM = now.LoopM,
            GulletM = sharpenings.LastOrDefault(s => s.GulletM is not null)?.GulletM,
            Kerf = KerfNow.Of(sharpenings, line.SelectMany(a => _rows.Kerfs[a.Blade.Id].Where(k => k.Entry.AtUtc <= a.Until))),
            EdgeAfterM = last?.EdgeAfterM,
            Weld = joint?.Quality ?? WeldQuality.Good,
            Welds = Welds(line),
            Sharpenings = sharpenings.Count + line.Sum(a => _rows.PriorUses.GetValueOrDefault(a.Blade.Id)?.Sharpenings ?? 0),
            LastSharpenedUtc = last?.Entry.AtUtc,
            Exposures = Exposures(blade, line, joint),
            SinceSharpening = Sum(line.SelectMany(a => Since(a, last?.Entry.AtUtc, cuts))),
            WholeLife = Sum(line.SelectMany(a => SpellsOf(a)).SelectMany(s => _rows.Paths[s.MountId].Select(Line))),
            TensionThisSpellPa = open is { } o ? MeasuredIn(o) : null,
            LastTensionPa = LastTensions(blade, own),
            // A saw set up anew since then leads another way.
            LeadsRad = _rows.Drifts[blade.Id]
                .Where(d => (last is null || d.At > last.Entry.AtUtc) && !_rows.Setups.Values.Any(s => s.SawId == d.SawId && s.Entry.AtUtc > d.At))
                .GroupBy(d => d.SawId).ToDictionary(g => g.Key, g => g.Last().AngleRad),
            Hold = _rows.Holds.GetValueOrDefault(blade.Id),
            PriorUse = line.Select(a => _rows.PriorUses.GetValueOrDefault(a.Blade.Id)).FirstOrDefault(p => p is not null),
            Away = _rows.Away.GetValueOrDefault(blade.Id),
            // A break mended by a joint is history.
            Break = broke is not null && joint is not null && joint.Entry.AtUtc >= broke.LatestUtc ? null : broke,
            Retirement = _rows.Retirements.GetValueOrDefault(blade.Id),
            CutDownTo = _cutDown.TryGetValue(blade.Id, out var child) ? _blades[child].Tag : null,
            LastInspection = inspection,
            Marks = marks,
            TeethMissing = missing,
            LastInspectedUtc = inspection?.Entry.AtUtc,
            MsSinceInspection = own.Sum(s => RunningSince(s, inspection?.Entry.AtUtc, shares)),
            MountedSinceInspection = own.Exists(s => inspection is null || s.From >= inspection.Entry.AtUtc),
            MountedSinceUtc = open?.From,
            OffAsDull = now.Place is Place.Rack or Place.Bench && own.Count > 0 && own[^1] is { Off: OffReason.Dull, Until: { } off } && !(last?.Entry.AtUtc >= off),
        };
    }

    /// <summary>
    /// What stood by a time: gullets as the last look at gullets saw them, the rest as the last look that said anything.
    /// A full-profile grind after it takes burrs away.
    /// </summary>
    private (BladeMarks Marks, int? TeethMissing) MarksAt(List<(Blade Blade, DateTime Until, bool Ancestor)> line, DateTime at)
    {
        if (!line.Exists(a => _rows.Marked[a.Blade.Id].Any()))
        {
            return (BladeMarks.None, null);
        }

        var looks = line.SelectMany(a => _rows.Marked[a.Blade.Id].Where(i => i.Entry.AtUtc <= a.Until && i.Entry.AtUtc <= at)).OrderBy(i => i.Entry.AtUtc).ThenBy(i => i.EntryId).ToList();
        var gullets = looks.LastOrDefault(i => i.LookedAt?.HasFlag(LookedAt.Gullets) == true);
        var level = looks.LastOrDefault(i => i.LookedAt?.HasFlag(LookedAt.Level) == true);
        var teeth = looks.LastOrDefault(i => i.LookedAt?.HasFlag(LookedAt.Teeth) == true);
        var marks = ((gullets?.Marks ?? default) & BladeMarks.InGullets)
            | ((level?.Marks ?? default) & BladeMarks.KinkOrTwist)
            | ((teeth?.Marks ?? default) & BladeMarks.TeethMissing);
        var ground = gullets is not null && line.Exists(a => _rows.Sharpenings[a.Blade.Id]
            .Any(s => s.Kind == GrindKind.FullProfile && s.Entry.AtUtc >= gullets.Entry.AtUtc && s.Entry.AtUtc <= a.Until && s.Entry.AtUtc <= at));
        return (ground ? marks & ~BladeMarks.Burrs : marks, marks.HasFlag(BladeMarks.TeethMissing) ? teeth!.TeethMissing : null);
    }

    /// <summary>A loop comes with its first weld; one made up from coil here has its first joint before it ever ran.</summary>
    private int Welds(List<(Blade Blade, DateTime Until, bool Ancestor)> line)
    {
        var joints = line.SelectMany(a => _rows.Joints[a.Blade.Id].Where(j => j.Entry.AtUtc <= a.Until)).ToList();
        var ran = line.SelectMany(SpellsOf).Select(s => s.From).DefaultIfEmpty(DateTime.MaxValue).Min();
        return joints.Exists(j => j.Entry.AtUtc <= ran) ? joints.Count : joints.Count + 1;
    }

    private List<SpellRow> Inside(Func<Blade, DateTime?> time) =>
    [
        .. _rows.Blades.Select(b => (Blade: b, At: time(b))).Where(x => x.At is not null)
            .SelectMany(x => Line(x.Blade).SelectMany(SpellsOf).Where(s => s.From < x.At && x.At < s.End)).Distinct(),
    ];

    /// <summary>The blade itself and those it was cut from, each up to the time of the cutting.</summary>
    private IEnumerable<(Blade Blade, DateTime Until, bool Ancestor)> Line(Blade blade)
    {
        yield return (blade, DateTime.MaxValue, false);
        var until = DateTime.MaxValue;
        var seen = new HashSet<int> { blade.Id };
        for (var b = blade; b.ParentId is { } parent && seen.Add(parent); b = _blades[parent])
        {
            var split = _rows.SplitsByChild.GetValueOrDefault(b.Id)?.Entry.AtUtc ?? DateTime.MaxValue;
            until = split < until ? split : until;
            yield return (_blades[parent], until, true);
        }
    }

    private IEnumerable<SpellRow> SpellsOf((Blade Blade, DateTime Until, bool Ancestor) a) => _spells[a.Blade.Id].Where(s => s.From < a.Until);

    private Sharpening? LastSharpening(Blade blade) =>
        Line(blade).SelectMany(a => _rows.Sharpenings[a.Blade.Id].Where(s => s.Entry.AtUtc <= a.Until)).MaxBy(s => (s.Entry.AtUtc, s.EntryId));

    private List<ExposureLine> Exposures(Blade blade, List<(Blade Blade, DateTime Until, bool Ancestor)> line, Joint? joint)
    {
        var found = new List<ExposureLine>();
        foreach (var a in line)
        {
            foreach (var spell in SpellsOf(a))
            {
                var marks = MarksAt(line, spell.End).Marks;
                var onThisWeld = !a.Ancestor && (joint is null ? blade.ParentId is null : spell.From >= joint.Entry.AtUtc);
                var tension = MeasuredIn(spell) ?? LastMeasuredBefore(spell);
                foreach (var e in _rows.Exposures[spell.MountId])
                {
                    var setup = _rows.Setups[e.SetupId];
                    var loop = _rows.Loops.At(a.Blade.Id, spell.From) ?? setup.LoopM;
                    found.Add(new ExposureLine(setup, e.SpeedMps, e.RunningMs, tension, loop, spell.InsideOut, onThisWeld, a.Ancestor) { FromUtc = spell.From, Marks = marks });
                }
            }
        }

        return found;
    }

    /// <summary>The last tension measured while the spell lasted; the mount's own counts where it was measured.</summary>
    private double? MeasuredIn(SpellRow spell)
    {
        double? found = spell.MeasuredPa;
        foreach (var t in _rows.Tensions[spell.BladeId])
        {
            found = t.SawId == spell.SawId && t.At >= spell.From && t.At <= spell.End ? t.TensionPa : found;
        }

        return found;
    }

    private double? LastMeasuredBefore(SpellRow spell)
    {
        var reading = _rows.Tensions[spell.BladeId].Where(t => t.SawId == spell.SawId && t.At < spell.From).Select(t => ((DateTime At, double Pa)?)(t.At, t.TensionPa)).LastOrDefault();
        var mount = _spells[spell.BladeId].Where(s => s.SawId == spell.SawId && s.From < spell.From && s.MeasuredPa is not null)
            .Select(s => ((DateTime At, double Pa)?)(s.From, s.MeasuredPa!.Value)).LastOrDefault();
        return mount is null || reading?.At >= mount?.At ? reading?.Pa : mount?.Pa;
    }

    private Dictionary<int, double> LastTensions(Blade blade, List<SpellRow> own) => own
        .Where(s => s.MeasuredPa is not null).Select(s => (s.SawId, At: s.From, Pa: s.MeasuredPa!.Value))
        .Concat(_rows.Tensions[blade.Id].Select(t => (t.SawId, t.At, Pa: t.TensionPa)))
        .GroupBy(t => t.SawId).ToDictionary(g => g.Key, g => g.OrderBy(t => t.At).Last().Pa);

    private IEnumerable<PathLine> Since((Blade Blade, DateTime Until, bool Ancestor) a, DateTime? sharpened, ILookup<int, CutLine> cuts)
    {
        foreach (var spell in SpellsOf(a))
        {
            if (sharpened is null || spell.From >= sharpened)
            {
                foreach (var path in _rows.Paths[spell.MountId])
                {
                    yield return Line(path);
                }
            }
            else if (spell.End > sharpened)
            {
                foreach (var cut in cuts[spell.MountId].Where(c => c.At > sharpened && c.At <= spell.End))
                {
                    var loop = _rows.Loops.At(spell.BladeId, cut.At) ?? SetupLoop(spell.SawId, cut.At);
                    yield return new PathLine(cut.WoodClass, cut.Dirt, CutSums.PathMm(cut, loop), CutSums.AreaMm2(cut.HeightM, cut.LengthM, cut.Pieces));
                }
            }
        }
    }

    private double SetupLoop(int sawId, DateTime at) =>
        new SawFold(sawId, [], [], _rows.Setups.Values.Where(s => s.SawId == sawId).Select(s => new SetupFrom(s.EntryId, s.SawId, s.Entry.AtUtc, s.LoopM))).SetupAt(at).LoopM;

    /// <summary>A run that began before the inspection counts for the part of its window after it.</summary>
    private long RunningSince(SpellRow spell, DateTime? inspected, ILookup<int, ShareRow> shares)
    {
        if (inspected is not { } at || spell.From >= at)
        {
            return _rows.Exposures[spell.MountId].Sum(e => e.RunningMs);
        }

        return spell.End <= at
            ? 0
            : shares[spell.MountId].Where(s => s.Until > at).Sum(s => s.From >= at
                ? s.Ms
                : (long)((Int128)s.Ms * (s.Until - at).Ticks / (s.Until - s.From).Ticks));
    }

    private static PathLine Line(WoodPath p) => new(p.WoodClass, p.Dirt, p.PathMm, p.AreaMm2);

    private static List<PathLine> Sum(IEnumerable<PathLine> lines) =>
    [
        .. lines.GroupBy(l => (l.WoodClass, l.Dirt)).OrderBy(g => g.Key.WoodClass, StringComparer.Ordinal).ThenBy(g => g.Key.Dirt)
            .Select(g => new PathLine(g.Key.WoodClass, g.Key.Dirt, g.Sum(l => l.PathMm), g.Sum(l => l.AreaMm2))),
    ];
}

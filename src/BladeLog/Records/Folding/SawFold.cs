namespace BladeLog.Records.Folding;

/// <summary>
/// One saw's spells, cuts and setups in time order, asked how a run divides over them. The same object serves the
/// recount of one window, the rebuild and the check.
/// </summary>
public sealed class SawFold
{
    private readonly Spell[] _spells;
    private readonly CutLine[] _cuts;
    private readonly SetupFrom[] _setups;

    public SawFold(int sawId, IEnumerable<Spell> spells, IEnumerable<CutLine> cuts, IEnumerable<SetupFrom> setups)
    {
        SawId = sawId;
        _spells = [.. spells.OrderBy(s => s.From).ThenBy(s => s.MountId)];
        _cuts = [.. cuts.OrderBy(c => c.At).ThenBy(c => c.Id)];
        _setups = [.. setups.OrderBy(s => s.At).ThenBy(s => s.Id)];
    }

    public int SawId { get; }

    public IReadOnlyList<Spell> AllSpells => _spells;

    public IReadOnlyList<CutLine> AllCuts => _cuts;

    /// <summary>The setup in force at a time; before the first one, the first.</summary>
    public SetupFrom SetupAt(DateTime at)
    {
        if (_setups.Length == 0)
        {
            throw new InvalidOperationException($"Saw {SawId} has no setup.");
        }

        var found = _setups[0];
        foreach (var setup in _setups)
        {
            if (setup.At <= at)
            {
                found = setup;
            }
        }

        return found;
    }

    /// <summary>The spell a cut that ended then was made in.</summary>
    public Spell? SpellOfCut(DateTime at)
    {
        // The spell with the latest start before the cut; spells of a saw do not overlap.
        var low = 0;
        var high = _spells.Length;
        while (low < high)
        {
            var middle = (low + high) / 2;
            if (_spells[middle].From < at)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low > 0 && _spells[low - 1].HoldsCut(at) ? _spells[low - 1] : null;
    }

    /// <summary>
    /// Divides a run over the spells in its window: in proportion to logged cutting minutes where every spell there has
    /// cuts, else by time on the saw. Time without a blade is a share without a spell. A setup change splits the run.
    /// Shares are whole milliseconds by the largest remainder, so they add up to the run exactly.
    /// </summary>
    public IReadOnlyList<RunShare> Divide(in RunLine run)
    {
        var cells = Cells(run);
        var byCuts = cells.Any(c => c.Spell is not null) && EverySpellHasCuts(cells);
        var weights = cells.ConvertAll(c => byCuts ? c.CutMs : (c.Until - c.From).Ticks / TimeSpan.TicksPerMillisecond);
        var parts = Apportion.LargestRemainder(run.Ms, weights);
        var shares = new List<RunShare>();
        for (var i = 0; i < cells.Count; i++)
        {
            if (parts[i] == 0)
            {
                continue;
            }

            var mount = cells[i].Spell?.MountId;
            var same = shares.Find(s => s.MountId == mount && s.SetupId == cells[i].SetupId);
            if (same is null)
            {
                shares.Add(new RunShare { RunId = run.Id, MountId = mount, SetupId = cells[i].SetupId, Ms = parts[i] });
            }
            else
            {
                same.Ms += parts[i];
            }
        }

        return shares;
    }

    private static bool EverySpellHasCuts(List<Cell> cells) => cells
        .Where(c => c.Spell is not null)
        .GroupBy(c => c.Spell!.Value.MountId)
        .All(spell => spell.Sum(c => c.CutMs) > 0);

    private List<Cell> Cells(in RunLine run)
    {
        var cells = new List<Cell>();
        var cursor = run.From;
        for (var i = FirstSpellEndingAfter(run.From); i < _spells.Length && _spells[i].From < run.Until; i++)
        {
            var spell = _spells[i];
            var from = spell.From > cursor ? spell.From : cursor;
            var until = spell.End < run.Until ? spell.End : run.Until;
            if (until <= from)
            {
                continue;
            }

            AddCells(cells, null, cursor, from);
            AddCells(cells, spell, from, until);
            cursor = until;
        }

        AddCells(cells, null, cursor, run.Until);
        return cells;
    }

    private int FirstSpellEndingAfter(DateTime at)
    {
        var low = 0;
        var high = _spells.Length;
        while (low < high)
        {
            var middle = (low + high) / 2;
            if (_spells[middle].End <= at)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }

    private void AddCells(List<Cell> cells, Spell? spell, DateTime from, DateTime until)
    {
        while (from < until)
        {
            var end = until;
            foreach (var setup in _setups.Skip(1))
            {
                if (setup.At > from && setup.At < end)
                {
                    end = setup.At;
                }
            }

            cells.Add(new Cell(spell, SetupAt(from).Id, from, end, CutMsWithin(from, end)));
            from = end;
        }
    }

    private long CutMsWithin(DateTime from, DateTime until)
    {
        var low = 0;
        var high = _cuts.Length;
        while (low < high)
        {
            var middle = (low + high) / 2;
            if (_cuts[middle].At <= from)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        var sum = 0L;
        for (; low < _cuts.Length && _cuts[low].At <= until; low++)
        {
            sum += _cuts[low].CutMs;
        }

        return sum;
    }

    private sealed record Cell(Spell? Spell, int SetupId, DateTime From, DateTime Until, long CutMs);
}

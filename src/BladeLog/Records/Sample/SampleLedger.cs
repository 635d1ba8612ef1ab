namespace BladeLog.Records.Sample;

/// <summary>
/// Collects the sample's facts and gives them their entries in the order the shop learned them, so that the ledger reads
/// like one written day by day.
/// </summary>
internal sealed class SampleLedger
{
    private readonly List<Line> _lines = [];
    private readonly Dictionary<string, Fact> _byRef = new(StringComparer.Ordinal);

    /// <param name="fact">Its references to other facts are filled by <paramref name="refer"/>.</param>
    /// <param name="at">When it happened.</param>
    /// <param name="learned">When it was entered; the same time where the shop wrote it down at once.</param>
    /// <param name="personId">Who entered it.</param>
    /// <param name="refer">Run once every entry has its number.</param>
    public T Add<T>(T fact, DateTime at, DateTime? learned, int? personId, Action<T>? refer = null)
        where T : Fact
    {
        var kind = fact is VoidFact ? "Void" : typeof(T).Name;
        var entry = new Entry { Op = Guid.NewGuid(), Kind = kind, AtUtc = at, EnteredUtc = learned ?? at, PersonId = personId };
        fact.Entry = entry;
        _lines.Add(new Line(fact, entry, refer is null ? null : () => refer(fact)));
        return fact;
    }

    /// <summary>Remembers a fact by the name other rows call it.</summary>
    public void Name(SampleRow row, Fact fact)
    {
        if (!_byRef.TryAdd(row.Text("ref"), fact))
        {
            throw row.Wrong("ref", $"{row.Text("ref")} stands twice");
        }
    }

    /// <summary>The fact a cell names, of the kind it must be.</summary>
    public T Named<T>(SampleRow row, string column)
        where T : Fact => row.Of(column, _byRef, "row") as T ?? throw row.Wrong(column, $"{row.Text(column)} is a row of another kind");

    /// <summary>Numbers the entries and hands out everything to be saved.</summary>
    public IReadOnlyList<Fact> Close()
    {
        // A stable sort: what was entered in the same minute keeps the order of the files.
        var ordered = _lines.OrderBy(l => l.Entry.EnteredUtc).ToList();
        for (var i = 0; i < ordered.Count; i++)
        {
            ordered[i].Entry.Id = i + 1;
            ordered[i].Fact.EntryId = i + 1;
        }

        foreach (var line in ordered)
        {
            line.Refer?.Invoke();
        }

        return [.. ordered.Select(l => l.Fact)];
    }

    private sealed record Line(Fact Fact, Entry Entry, Action? Refer);
}

using System.Security.Cryptography;
using BladeLog.Records.Writing;
using BladeLog.Ui;

namespace BladeLog.Features.Import;

/// <summary>One kind of thing a file can hold. Three of them: saws, blades, cuts.</summary>
internal interface IImportKind
{
    string Key { get; }

    string Name { get; }

    /// <summary>Where one works on with what was imported.</summary>
    string Onwards { get; }

    IReadOnlyList<Column> Columns { get; }

    /// <summary>What is taken where a column is not there or empty, in words.</summary>
    IReadOnlyList<string> Defaults { get; }

    /// <summary>A small file of this kind, line by line.</summary>
    IReadOnlyList<string> Sample { get; }

    IReadOnlyList<Command> Read(RowReader row, List<string> remarks);
}

/// <summary>A row as it was understood, column by column.</summary>
public sealed record Understood(int Line, IReadOnlyList<string> Cells);

/// <summary>What a file says, before anything is kept.</summary>
public sealed record Reading
{
    public const int MostWrongs = 100;
    public const int MostShown = 200;

    public required string Sha256 { get; init; }

    /// <summary>saws, blades or cuts; null where it could not be told.</summary>
    public string? Kind { get; init; }

    public IReadOnlyList<string> Columns { get; init; } = [];

    public IReadOnlyList<string> Ignored { get; init; } = [];

    public IReadOnlyList<string> Defaults { get; init; } = [];

    public IReadOnlyList<Understood> Rows { get; init; } = [];

    public int Count { get; init; }

    public IReadOnlyList<Wrong> Wrongs { get; init; } = [];

    public IReadOnlyList<string> Remarks { get; init; } = [];

    internal IReadOnlyList<ImportRow> Commands { get; init; } = [];

    internal static Reading Of(byte[] bytes, string? kind, IReadOnlyList<IImportKind> kinds, ShopUnits units, DateTime now)
    {
        Reading reading = new() { Sha256 = Convert.ToHexStringLower(SHA256.HashData(bytes)) };
        (string? text, string? problem) = FileText.Read(bytes);
        if (text is null)
        {
            return reading with { Wrongs = [new Wrong(0, null, null, problem!)] };
        }

        CsvTable table = CsvTable.Read(text);
        if (table.Wrongs.Count > 0)
        {
            return reading with { Wrongs = table.Wrongs };
        }

        IImportKind? chosen = kinds.FirstOrDefault(k => k.Key == kind) ?? Recognised(table.Headings, kinds);
        return chosen is null
            ? reading with { Wrongs = [new Wrong(1, null, null, "The first line does not name columns known here. Choose what the file holds, and look below how its columns are called.")] }
            : Rowwise(reading, table, chosen, units, now);
    }

    private static IImportKind? Recognised(string[] headings, IReadOnlyList<IImportKind> kinds)
    {
        var best = kinds
            .Select(k => (Kind: k, Headings.Match(headings, k.Columns).Found))
            .Select(m => (m.Kind, m.Found.Count, Needed: m.Kind.Columns.Count(c => c.Needed && m.Found.All(f => f.Column != c))))
            .OrderBy(m => m.Needed).ThenByDescending(m => m.Count).First();
        return best.Needed == 0 ? best.Kind : null;
    }

    private static Reading Rowwise(Reading reading, CsvTable table, IImportKind kind, ShopUnits units, DateTime now)
    {
        (IReadOnlyList<Found> found, IReadOnlyList<string> ignored, Wrong? twice) = Headings.Match(table.Headings, kind.Columns);
        List<Wrong> wrongs = twice is null ? [] : [twice];
        string[] missing = [.. kind.Columns.Where(c => c.Needed && found.All(f => f.Column != c)).Select(c => c.Name)];
        if (missing.Length > 0)
        {
            wrongs.Add(new Wrong(1, null, null, $"The first line lacks: {string.Join(", ", missing)}. It must name the columns."));
        }
        else if (table.Rows.Count == 0)
        {
            wrongs.Add(new Wrong(1, null, null, "There are headings and no rows under them."));
        }

        List<Understood> rows = [];
        List<ImportRow> commands = [];
        List<string> remarks = [];
        foreach (CsvRow row in wrongs.Count > 0 ? [] : table.Rows)
        {
            if (wrongs.Count >= MostWrongs)
            {
                break;
            }

            if (row.Cells.Skip(table.Headings.Length).Any(c => c.Length > 0))
            {
                wrongs.Add(new Wrong(row.Line, null, null, $"There are {row.Cells.Length} cells under {table.Headings.Length} headings. A comma inside a cell wants quotation marks around the cell."));
                continue;
            }

            RowReader reader = new(row, found, units.Typing, now, wrongs);
            commands.AddRange(kind.Read(reader, remarks).Select(c => new ImportRow(row.Line, c)));
            if (rows.Count < MostShown)
            {
                rows.Add(new Understood(row.Line, [.. found.Select(f => reader.Understood.GetValueOrDefault(f.Column.Key, ""))]));
            }
        }

        return reading with
        {
            Kind = kind.Key,
            Columns = [.. found.Select(f => f.Column.Name)],
            Ignored = ignored,
            Defaults = kind.Defaults,
            Rows = rows,
            Count = table.Rows.Count,
            Wrongs = [.. wrongs.Take(MostWrongs)],
            Remarks = remarks,
            Commands = wrongs.Count > 0 ? [] : commands,
        };
    }
}

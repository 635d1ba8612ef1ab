using System.Text.RegularExpressions;
using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Prints;

/// <summary>One label: the tag to be read by a person, the same for a camera, and what the blade is.</summary>
/// <param name="Tag">As painted.</param>
/// <param name="Holds">What its square code holds.</param>
/// <param name="Section">Width when new by thickness.</param>
/// <param name="Teeth">Pitch and form.</param>
/// <param name="Code">Three figures that are quicker to type, where the tag has them.</param>
/// <param name="Hold">Why it is on hold; null: it is not.</param>
public sealed record LabelRow(string Tag, string Holds, string Section, string Teeth, string? Code, string? Hold)
{
    /// <summary>Too many letters for half the sheet's width.</summary>
    public bool IsLong => Tag.Length > 6;
}

/// <summary>Fourteen labels of one sheet of plain paper, or fewer where some are long.</summary>
public sealed record LabelSheet(IReadOnlyList<LabelRow> Labels);

public sealed record LabelPick(string Tag, string Words, bool Chosen);

public sealed record LabelModel
{
    public required IReadOnlyList<LabelSheet> Sheets { get; init; }

    public required IReadOnlyList<LabelPick> Blades { get; init; }

    public required int New { get; init; }

    public required int WithoutLabel { get; init; }

    public required string Show { get; init; }

    public required string Typed { get; init; }

    /// <summary>Tags asked for that no blade has.</summary>
    public required IReadOnlyList<string> Unknown { get; init; }

    public string? LanName { get; init; }

    public required int ShopVersion { get; init; }

    public required string When { get; init; }

    public FormState State { get; init; } = FormState.New;

    public LanForm Form { get; init; } = new();

    public IReadOnlyList<string> Tags => [.. Sheets.SelectMany(s => s.Labels).Select(l => l.Tag)];
}

/// <summary>From the shop to its labels.</summary>
internal static partial class Labels
{
    private const int RowsOnSheet = 7;

    /// <summary>What a code holds: an address where the shop's network knows this machine by name, else the tag alone.</summary>
    public static string Holds(Shop shop, string tag) => shop.LanName is { } name ? $"http://{name}/b/{tag}" : tag;

    /// <summary>The three figures of a tag that has just three in a row: quicker to type than the whole.</summary>
    public static string? Code(string tag) => ThreeFigures().Matches(tag) is [{ Value: var code }] ? code : null;

    public static LabelRow Row(BladeAdvice blade, Shop shop, ShopUnits units, Wording words)
    {
        var file = blade.File;
        return new LabelRow(
            file.Blade.Tag,
            Holds(shop, file.Blade.Tag),
            Said.Section(file, units) + (units.Units == UnitSystem.Inch ? "" : $"{Figures.Glue}mm"),
            Said.Teeth(file.Spec, units),
            Code(file.Blade.Tag),
            file.Hold is { } hold ? LifeWords.HoldReason(hold, words) ?? "" : null);
    }

    /// <summary>Sheets of seven rows; a long label takes a row for itself.</summary>
    public static IReadOnlyList<LabelSheet> Sheets(IEnumerable<LabelRow> labels)
    {
        List<List<LabelRow>> sheets = [];
        var cells = RowsOnSheet * 2;
        foreach (var label in labels)
        {
            if (label.IsLong && cells % 2 == 1)
            {
                cells++;
            }

            if (cells >= RowsOnSheet * 2)
            {
                sheets.Add([]);
                cells = 0;
            }

            sheets[^1].Add(label);
            cells += label.IsLong ? 2 : 1;
        }

        return [.. sheets.Select(s => new LabelSheet(s))];
    }

    [GeneratedRegex("(?<![0-9])[0-9]{3}(?![0-9])")]
    private static partial Regex ThreeFigures();
}

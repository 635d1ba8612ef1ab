using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Stock;

/// <summary>One specification on the stock page.</summary>
public sealed record StockRow
{
    public required string Code { get; init; }

    public required string Section { get; init; }

    public required string Teeth { get; init; }

    public required ToothSpec Strip { get; init; }

    public required string Counts { get; init; }

    /// <summary>What is not at hand: at the sharpener, on hold; null: nothing.</summary>
    public string? Besides { get; init; }

    public required int AtHand { get; init; }

    public required int Least { get; init; }

    /// <summary>Whose figure the least is.</summary>
    public required string LeastFrom { get; init; }

    public required string Use { get; init; }

    /// <summary>"Order 2 of E1 by 8 Dec"; null: nothing to order.</summary>
    public string? Order { get; init; }

    /// <summary>Order now: it would be late tomorrow.</summary>
    public bool Now { get; init; }

    /// <summary>The used blades, each by its tag; the spares are one line.</summary>
    public required IReadOnlyList<StockBlade> Blades { get; init; }

    /// <summary>Where its figures are changed; null where no page does that.</summary>
    public string? Edit { get; init; }

    public required string Price { get; init; }
}

public sealed record StockBlade(string Tag, string Says, Worked? Worked);

public sealed record StockForm : PostedForm
{
    public string? Spec { get; init; }

    /// <summary>came or went.</summary>
    public string? Way { get; init; }

    public string? Count { get; init; }

    public string? Reason { get; init; }
}

public sealed record StockModel
{
    public required string Title { get; init; }

    public required IReadOnlyList<StockRow> Rows { get; init; }

    public required string LeadDays { get; init; }

    public required string Least { get; init; }

    public required string Basis { get; init; }

    public required StockForm Form { get; init; }

    public required FormState State { get; init; }

    public string? Who { get; init; }

    public required IReadOnlyList<string> People { get; init; }
}

/// <summary>One line of costs; an empty figure is not logged.</summary>
public sealed record CostRow(string Name, string? Href, string Bought, string Sharpened, string Broke, string Metre, string SquareMetre, string BoardFoot, string Cut, string Hour);

public sealed record KeepPart(string Title, string Keep, string Retire, string Chance, IReadOnlyList<Worked> Worked);

public sealed record CostsModel
{
    public required string Title { get; init; }

    public required IReadOnlyList<CostRow> Specs { get; init; }

    public required IReadOnlyList<CostRow> Blades { get; init; }

    public required IReadOnlyList<(string What, string Each, string Says)> Grinds { get; init; }

    public required IReadOnlyList<(string Spec, string Teeth, string Cost)> Teeth { get; init; }

    public required string TeethOn { get; init; }

    public required IReadOnlyList<string> Tags { get; init; }

    public string? Tag { get; init; }

    public KeepPart? Keep { get; init; }

    /// <summary>Why nothing is told of the blade asked.</summary>
    public string? NoKeep { get; init; }

    public required bool Inch { get; init; }
}

using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Cuts;

/// <summary>The words of the cut pages.</summary>
internal static class CutSays
{
    /// <summary>The answer as a title.</summary>
    public static string Title(CutAnswer answer, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(answer);
        if (answer.First is { } best)
        {
            return best.Verdict == Verdict.Fits ? $"Use {best.Tag}: {Window(best, units)}" : $"Use {best.Tag} with care: {Window(best, units)}";
        }

        return "Nothing fits: " + Instead(answer);
    }

    /// <summary>What to do where nothing fits.</summary>
    public static string Instead(CutAnswer answer) => answer.Proposals is [var first, ..]
        ? first.Kind switch
        {
            ProposalKind.Stack => $"stack {Few(first.Outcome.Work.Stack)} {(answer.Work.Cut.Material == MaterialKind.Panel ? "sheets" : "pieces")}",
            ProposalKind.SharpenFirst => $"sharpen {first.Outcome.Tag} first",
            ProposalKind.SlowerSpeed => $"run {first.Outcome.Saw.Saw.Name} slower",
            ProposalKind.ReliefCuts => "make relief cuts",
            ProposalKind.Buy => $"buy another blade for {first.Outcome.Saw.Saw.Name}",
            _ => $"wait for {first.Outcome.Tag}",
        }
        : answer.Work.IsWood ? "see why below" : CutWords.NotWood(answer.Work).Split(':')[0];

    /// <summary>"1.8 to 4.8 m/min".</summary>
    public static string Window(Choice choice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return choice.Gate is { LowMps: { } low, HighMps: { } high } ? Between(low, high, units) : "no feed";
    }

    public static string Between(double lowMps, double highMps, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch
            ? $"{Figures.Feed(lowMps * 60 / Foot)} to {Figures.With(Figures.Feed(highMps * 60 / Foot), "ft/min")}"
            : $"{Figures.Feed(lowMps * 60)} to {Figures.With(Figures.Feed(highMps * 60), "m/min")}";
    }

    public static string Feed(double mps, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch
            ? Figures.With(Figures.Feed(mps * 60 / Foot), "ft/min")
            : Figures.With(Figures.Feed(mps * 60), "m/min");
    }

    private const double Foot = Handbook.Units.Exact.Foot;

    /// <summary>"Cut 2, drawer fronts: cherry, 200 mm deep, 6 pieces of 1.2 m, straight."</summary>
    public static string Lede(QueuedCut cut, CutWork work, Wording words, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(cut);
        ArgumentNullException.ThrowIfNull(work);
        ArgumentNullException.ThrowIfNull(words);
        string bevel = cut.BevelRad > 0 ? $" ({words.Length(cut.HeightM)} at {Figures.Number(double.RadiansToDegrees(cut.BevelRad))}°)" : "";
        string shape = cut.RadiusM is { } r ? $"tightest curve {words.Length(r)}" : "straight";
        return $"Cut {cut.Number}, {cut.Job}: {Wood(cut)}, {words.Length(work.HeightM)} deep{bevel}, {Said.Count(cut.Pieces, "piece", "pieces")} of {Piece(cut.LengthM, units)}, {shape}.";
    }

    /// <summary>"beech, taken as European beech".</summary>
    public static string Wood(QueuedCut cut)
    {
        ArgumentNullException.ThrowIfNull(cut);
        return cut.TakenAs is { Length: > 0 } name && !string.Equals(name, cut.SpeciesTyped, StringComparison.OrdinalIgnoreCase)
            ? $"{cut.SpeciesTyped} (taken as {name})"
            : cut.SpeciesTyped;
    }

    public static string Piece(double metres, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch
            ? units.Show(new Length(metres), Fields.Board)
            : Figures.With(metres.ToString("0.###", System.Globalization.CultureInfo.InvariantCulture), "m");
    }

    /// <summary>fits, care or no: the mark of a verdict.</summary>
    public static string Mark(Verdict verdict) => verdict switch
    {
        Verdict.Fits => "fits",
        Verdict.WithCare => "care",
        _ => "no",
    };

    /// <summary>Where the blade is: "On Osprey now", "Rack R2-4".</summary>
    public static string Where(Choice choice, ShopNow shop)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(shop);
        BladeFile file = choice.Blade.File;
        return choice.Mounted ? $"On {choice.Saw.Saw.Name} now"
            : file.Place switch
            {
                Place.OnSaw => $"On {shop.Saws.FirstOrDefault(s => s.Saw.Id == file.SawId)?.Saw.Name ?? "a saw"} now",
                Place.Bench => "On the bench",
                Place.AtSharpener => "At the sharpener",
                _ => file.Hook is { } hook ? $"Rack {hook}" : "On the rack",
            };
    }

    /// <summary>" at 7.6 m/s" where the saw is to run at another than its usual speed.</summary>
    public static string AtSpeed(Choice choice, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(units);
        return choice.Saw.Setup.Speeds.Count > 1 ? $" at {units.ShowBandSpeed(new Speed(choice.SpeedMps))}" : "";
    }

    /// <summary>"5 minutes, no swap." or "14 minutes with the swap."</summary>
    public static string Minutes(Choice choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        string minutes = Said.Count((int)Math.Round(choice.Job!.Minutes, MidpointRounding.AwayFromZero), "minute", "minutes");
        return choice.Mounted ? $"{minutes}, no swap." : $"{minutes} with the swap.";
    }

    public static string Money(double minor, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.ShowMoney((long)Math.Round(minor, MidpointRounding.AwayFromZero));
    }

    public static string Few(int n) => n switch { 2 => "two", 3 => "three", 4 => "four", 5 => "five", _ => Figures.Number(n) };
}

using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Problem = BladeLog.Ui.Forms.Problem;

namespace BladeLog.Features.Cuts;

/// <summary>A cut that was made, as typed at the saw.</summary>
public sealed record LogForm
{
    public string? Op { get; init; }

    /// <summary>Of the cut on the list.</summary>
    public string? Version { get; init; }

    public string? Pick { get; init; }

    public string? Saw { get; init; }

    public string? Speed { get; init; }

    public string? Species { get; init; }

    public string? Height { get; init; }

    public string? Length { get; init; }

    public string? Pieces { get; init; }

    /// <summary>Empty: assumed, at the feed the form offers.</summary>
    public string? Feed { get; init; }

    public string? Minutes { get; init; }

    /// <summary>The feed taken where none is typed, in m/s.</summary>
    public string? Assumed { get; init; }

    public string? Ended { get; init; }

    public string? Moisture { get; init; }

    public string? Frozen { get; init; }

    public string? Dirt { get; init; }

    public string? Nail { get; init; }

    public string? Unfinished { get; init; }

    /// <summary>One more tap: hardly so, and yet cut.</summary>
    public string? AsTyped { get; init; }

    internal static LogForm Of(QueuedCut cut, SawNow? saw, double? speed, double? feed, ShopUnits units) => new()
    {
        Op = Guid.NewGuid().ToString(),
        Version = units.Typing.Show(cut.Version),
        Saw = saw?.Saw.Code,
        Speed = Plain(speed ?? saw?.Setup.UsualSpeedMps),
        Species = cut.SpeciesTyped,
        Height = units.BareLength(cut.HeightM / Math.Cos(cut.BevelRad), Fields.CutHeight),
        Length = units.BareLength(cut.LengthM, Fields.Board),
        Pieces = units.Typing.Show(cut.Pieces),
        Assumed = Plain(feed),
        Moisture = cut.MoisturePct is { } m ? Figures.Plain(m, 1) : null,
        Frozen = cut.Frozen ? "true" : null,
        Dirt = cut.Dirt.ToString(),
    };

    internal static LogForm Of(CutDone last, SawNow saw, ShopUnits units) => new()
    {
        Op = Guid.NewGuid().ToString(),
        Saw = saw.Saw.Code,
        Speed = Plain(last.SpeedMps),
        Species = last.SpeciesTyped,
        Height = units.BareLength(last.HeightM, Fields.CutHeight),
        Length = units.BareLength(last.LengthM, Fields.Board),
        Pieces = units.Typing.Show(last.Pieces),
        Assumed = Plain(last.FeedMps),
        Moisture = last.MoisturePct is { } m ? Figures.Plain(m, 1) : null,
        Frozen = last.Frozen ? "true" : null,
        Dirt = last.Dirt.ToString(),
    };

    internal static LogForm Empty(SawNow saw, double feed) => new()
    {
        Op = Guid.NewGuid().ToString(),
        Saw = saw.Saw.Code,
        Speed = Plain(saw.Setup.UsualSpeedMps),
        Pieces = "1",
        Dirt = nameof(Handbook.Quantities.Dirt.Clean),
        Assumed = Plain(feed),
    };

    internal static string? Plain(double? si) => si?.ToString("R", System.Globalization.CultureInfo.InvariantCulture);

    internal static double? Si(string? text) =>
        double.TryParse(text, System.Globalization.NumberStyles.Float, System.Globalization.CultureInfo.InvariantCulture, out double v) && double.IsFinite(v) && v > 0 ? v : null;

    /// <summary>The command it says, or null with the sentences in the reader.</summary>
    internal RecordCut? Read(FormReader read, ShopNow shop, int? number)
    {
        SawNow? saw = string.IsNullOrWhiteSpace(Saw) ? null : shop.Saw(Saw);
        if (saw is null)
        {
            read.Refuse(nameof(Saw), "Choose the saw it was cut on.");
        }

        Wood? wood = read.Wood(Species, nameof(Species));
        if (wood is { Kind: MaterialKind.Other })
        {
            read.Refuse(nameof(Species), $"{wood.Typed} is not wood: its wear on an edge is not known here, so such a cut is not counted.");
        }

        double? height = read.NeedLength(Height, nameof(Height), Fields.CutHeight), length = read.NeedLength(Length, nameof(Length), Fields.CutLength);
        int? pieces = read.NeedPieces(Pieces, nameof(Pieces));
        double? typed = read.Feed(Feed, nameof(Feed)), minutes = read.Minutes(Minutes, nameof(Minutes)), assumed = Si(Assumed), moisture = read.Moisture(Moisture, nameof(Moisture));
        Dirt? dirt = read.OneOf<Dirt>(Dirt, nameof(Dirt), "Choose how clean the wood was.");
        DateTime? ended = read.Time(Ended, nameof(Ended));
        if (saw is not null && Si(Speed) is { } speedTyped && saw.Setup.Speeds.All(s => Math.Abs(s.SpeedMps - speedTyped) > 1e-6))
        {
            read.Refuse(nameof(Speed), $"{saw.Saw.Name} does not run at that speed.");
        }

        if (minutes is <= 0)
        {
            read.Refuse(nameof(Minutes), "The time must be above zero.");
        }
        else if (minutes is not null && typed is not null)
        {
            read.Refuse(nameof(Minutes), "Write the feed or the minutes, not both.");
        }
        else if (minutes is null && typed is null && assumed is null && string.IsNullOrWhiteSpace(Feed) && string.IsNullOrWhiteSpace(Minutes))
        {
            read.Refuse(nameof(Feed), "Write the feed or the minutes of sawing.");
        }

        if (read.Problems.Count > 0)
        {
            return null;
        }

        double feed = minutes is { } m ? length!.Value * pieces!.Value / (m * 60) : typed ?? assumed!.Value;
        return new RecordCut(saw!.Saw.Code)
        {
            At = ended,
            CutNumber = number,
            CutVersion = int.TryParse(Version, out int v) ? v : null,
            Finishes = Unfinished != "true",
            Material = wood!.Kind,
            SpeciesKey = wood.Key,
            SpeciesTyped = wood.Typed,
            WoodClass = wood.WearClass,
            HeightM = height!.Value,
            HeightTyped = Height!.Trim(),
            LengthM = length!.Value,
            LengthTyped = Length!.Trim(),
            Pieces = pieces!.Value,
            FeedMps = feed,
            FeedGrade = minutes is not null ? FeedGrade.Timed : typed is not null ? FeedGrade.Typed : FeedGrade.Assumed,
            SpeedMps = Si(Speed),
            MoisturePct = moisture,
            Frozen = Frozen == "true",
            Dirt = dirt!.Value,
            Nail = Nail == "true",
            AsTyped = AsTyped is not null,
            HoursFromCuts = !saw.Saw.HasHourMeter,
        };
    }
}

/// <summary>The page on which a cut is logged.</summary>
public sealed record LogModel(QueuedCut? Cut, SawNow? AtSaw, LogForm Form, IReadOnlyList<Problem> Problems, ShopNow Shop, ShopUnits Units)
{
    /// <summary>The cut as it was planned, or the one before it on this saw: what the keys of last time say.</summary>
    public LogForm? Before { get; init; }

    /// <summary>Moisture reckoned with where none is typed, in percent.</summary>
    public string? MoistureReckoned { get; init; }

    /// <summary>The last cut on this saw, to be repeated in one tap.</summary>
    public LogForm? Last { get; init; }

    public string? LastSays { get; init; }

    public string? BladeAsked { get; init; }

    /// <summary>The words of the button that records it although; null where nothing is asked.</summary>
    public string? OneMoreTap { get; init; }

    public string Action => Cut is { } cut ? $"/cuts/{cut.Number}/done" : $"/saws/{AtSaw!.Saw.Code}/cut";

    public SawNow? Saw => AtSaw ?? (string.IsNullOrWhiteSpace(Form.Saw) ? null : Shop.Saw(Form.Saw));

    public BladeFile? Blade => Saw?.MountedBladeId is { } id ? Shop.Blades.FirstOrDefault(b => b.Blade.Id == id) : null;

    public IReadOnlyList<string> Offers => Wood.Offers(Form.Species);

    public string? Error(string field) => Problems.FirstOrDefault(p => p.Field == field)?.Sentence;

    /// <summary>Which clock this feeds, in words.</summary>
    public IReadOnlyList<string> Clocks
    {
        get
        {
            if (Saw is not { } saw)
            {
                return ["A cut dulls the blade that is on the saw."];
            }

            string dulls = Blade is { } blade
                ? $"This counts for the edge of {blade.Blade.Tag}, which is on {saw.Saw.Name}: wood path past each tooth."
                : $"No blade is on {saw.Saw.Name} in the record: this is kept, and counts for a blade once the swap is recorded.";
            return
            [
                dulls,
                saw.Saw.HasHourMeter
                    ? $"It does not count for running hours: those of {saw.Saw.Name} come from its hour meter."
                    : $"{saw.Saw.Name} has no hour meter: it counts for running hours too, for the time that no timer or typed hours cover.",
            ];
        }
    }

    public string? NotOnTheSaw => BladeAsked is { Length: > 0 } tag && Saw is { } saw && !string.Equals(Blade?.Blade.Tag, tag, StringComparison.OrdinalIgnoreCase)
        ? $"{tag} is not on {saw.Saw.Name} in the record. Record the swap first, or this counts for {Blade?.Blade.Tag ?? "no blade"}."
        : null;
}

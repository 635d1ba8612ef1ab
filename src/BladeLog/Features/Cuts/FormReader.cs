using BladeLog.Handbook.Quantities;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Problem = BladeLog.Ui.Forms.Problem;

namespace BladeLog.Features.Cuts;

/// <summary>Typed fields to quantities, gathering a sentence for each that cannot be read.</summary>
internal sealed class FormReader(ShopUnits units, DateTime now)
{
    public List<Problem> Problems { get; } = [];

    public ShopUnits Units => units;

    public Wood? Wood(string? text, string field)
    {
        Wood? wood = Features.Wood.Read(text, out string? wrong);
        if (wrong is not null)
        {
            Refuse(field, wrong);
        }

        return wood;
    }

    public double? Length(string? text, string field, TypedField kind) => Read(text, field, t => units.ReadLength(t, kind))?.Metres;

    public double? NeedLength(string? text, string field, TypedField kind) => Need(text, field, t => units.ReadLength(t, kind))?.Metres;

    public double? Feed(string? text, string field) => Read(text, field, t => units.ReadFeed(t))?.MetresPerSecond;

    public int? NeedPieces(string? text, string field) => (int?)Need(text, field, t => units.ReadCount(t, Fields.Pieces));

    public Angle? Bevel(string? text, string field) => Read(text, field, t => units.ReadAngle(t, Fields.Bevel));

    public double? Moisture(string? text, string field) => Read(text, field, units.ReadMoisture);

    public double? Percent(string? text, string field) => Read(text, field, t => units.ReadPercent(t));

    public long? Money(string? text, string field) => Read(text, field, t => units.ReadMoney(t));

    public DateOnly? Date(string? text, string field) => Read(text, field, t => units.ReadDate(t, now, ahead: true));

    public double? Minutes(string? text, string field) => Read(text, field, t => units.ReadDuration(t, Fields.Minutes))?.TotalMinutes;

    /// <summary>Empty means now.</summary>
    public DateTime? Time(string? text, string field)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        TypedMoment read = units.ReadTime(text, now);
        if (read.IsGood)
        {
            return read.Utc;
        }

        Refuse(field, read.Problem ?? $"The clocks went back then: write {string.Join(" or ", read.Candidates.Select(c => c.Text))}.");
        return null;
    }

    public T? OneOf<T>(string? text, string field, string sentence)
        where T : struct, Enum
    {
        if (Enum.TryParse(text, out T value) && Enum.IsDefined(value) && text == value.ToString())
        {
            return value;
        }

        Refuse(field, sentence);
        return null;
    }

    public void Refuse(string field, string sentence) => Problems.Add(new Problem(field, sentence));

    private T? Need<T>(string? text, string field, Func<string, Parsed<T>> read)
        where T : struct => Take(read(text ?? ""), field);

    private T? Read<T>(string? text, string field, Func<string, Parsed<T>> read)
        where T : struct => string.IsNullOrWhiteSpace(text) ? null : Take(read(text), field);

    private T? Take<T>(Parsed<T> read, string field)
        where T : struct
    {
        if (read.TryGet(out T value, out string problem))
        {
            return value;
        }

        Refuse(field, problem);
        return null;
    }
}

/// <summary>What kept a form from being recorded, in sentences for the page.</summary>
internal static class Unwritten
{
    public static IReadOnlyList<Problem> Of(WriteResult result, ShopUnits units, Func<string, string?> field)
    {
        ArgumentNullException.ThrowIfNull(field);
        return result switch
        {
            WriteResult.Refused refused => [.. refused.Problems.Select(p => new Problem(field(p.Field), p.Sentence))],
            WriteResult.Ask ask => [.. ask.Problems.Select(p => new Problem(field(p.Field), p.Sentence))],
            WriteResult.Clash clash => [new Problem(null, $"{clash.Who} {clash.What} at {Said.Moment(clash.When, units)}. Open it again and look before you save.")],
            _ => [],
        };
    }
}

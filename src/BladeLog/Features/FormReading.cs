using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features;

/// <summary>Reads the texts of one form; what cannot be read becomes a sentence beside its field. An empty field is null.</summary>
internal sealed class FormReading(ShopUnits units, DateTime now)
{
    private readonly List<Problem> _problems = [];
    private readonly Dictionary<string, IReadOnlyList<Moment>> _twice = [];

    public DateTime Now => now;

    public bool IsGood => _problems.Count == 0;

    /// <summary>The sentences so far, as the page is given them.</summary>
    public FormState State => new(_problems, Status: StatusCodes.Status422UnprocessableEntity) { Twice = _twice };

    public void Refuse(string? field, string sentence) => _problems.Add(new Problem(field, sentence));

    public void RefuseUnless(bool holds, string? field, string sentence)
    {
        if (!holds)
        {
            Refuse(field, sentence);
        }
    }

    public double? Length(string field, string? text, TypedField kind) => Read(field, text, t => units.ReadLength(t, kind))?.Metres;

    public double? Stress(string field, string? text) => Read(field, text, t => units.ReadStress(t))?.Pascals;

    public double? Force(string field, string? text) => Read(field, text, t => units.ReadForce(t))?.Newtons;

    public double? Power(string field, string? text) => Read(field, text, t => units.ReadPower(t))?.Watts;

    public double? BandSpeed(string field, string? text) => Read(field, text, t => units.ReadBandSpeed(t))?.MetresPerSecond;

    public double? Feed(string field, string? text) => Read(field, text, t => units.ReadFeed(t))?.MetresPerSecond;

    public double? Angle(string field, string? text, TypedField? kind = null) => Read(field, text, t => units.ReadAngle(t, kind))?.Radians;

    public TimeSpan? Duration(string field, string? text, TypedField kind) => Read(field, text, t => units.ReadDuration(t, kind));

    public ToothPitch? Pitch(string field, string? text) => Read(field, text, units.ReadPitch);

    public long? Money(string field, string? text) => Read(field, text, t => units.ReadMoney(t));

    public long? Count(string field, string? text, TypedField? kind = null) => Read(field, text, t => units.ReadCount(t, kind));

    public DateOnly? Date(string field, string? text) => Read(field, text, t => units.ReadDate(t, now));

    /// <summary>A plain number, where no unit belongs to it.</summary>
    public double? Number(string field, string? text, string example)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        if (Amount.TryReadAll(Amount.Clean(text), false, out var amount) && double.IsFinite(amount.Value))
        {
            return amount.Value;
        }

        Refuse(field, $"\"{text.Trim()}\" is not a number. Write {example}.");
        return null;
    }

    /// <summary>A day that lies ahead: the sentence offers none that is over.</summary>
    public DateOnly? DayAhead(string field, string? text) => Read(field, text, t => units.ReadDate(t, now, ahead: true));

    /// <summary>A moment where the hour may be forgotten: a date alone is its first moment, or its last that has been.</summary>
    public DateTime? TimeOrDay(string field, string? text, bool ends = false)
    {
        if (string.IsNullOrWhiteSpace(text) || units.ReadTime(text, now).IsGood || !units.ReadDate(text, now).TryGet(out DateOnly day, out _))
        {
            return Time(field, text);
        }

        DateTime begins = FirstMoment(day), over = FirstMoment(day.AddDays(1)).AddMinutes(-1);
        return !ends ? begins : over < now || begins > now ? over : now;
    }

    /// <summary>Midnight on the shop's clock, or the first minute after it where the clocks went forward over it.</summary>
    private DateTime FirstMoment(DateOnly day)
    {
        DateTime at = day.ToDateTime(TimeOnly.MinValue);
        while (units.Zone.IsInvalidTime(at))
        {
            at = at.AddMinutes(1);
        }

        // Of a midnight that came twice the earlier one.
        return units.Zone.IsAmbiguousTime(at)
            ? DateTime.SpecifyKind(at - units.Zone.GetAmbiguousTimeOffsets(at).Max(), DateTimeKind.Utc)
            : TimeZoneInfo.ConvertTimeToUtc(at, units.Zone);
    }

    /// <summary>A moment on the shop's clock; one that came twice that night is asked.</summary>
    public DateTime? Time(string field, string? text)
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        var read = units.ReadTime(text, now);
        if (read.IsGood)
        {
            return read.Utc;
        }

        if (read.IsChoice)
        {
            _twice[field] = read.Candidates;
        }

        Refuse(field, read.Problem!);
        return null;
    }

    /// <summary>One answer out of a few, by its name.</summary>
    public T? Choice<T>(string field, string? text, string? whenMissing)
        where T : struct, Enum
    {
        if (!string.IsNullOrEmpty(text) && Enum.GetNames<T>().Contains(text))
        {
            return Enum.Parse<T>(text);
        }

        if (whenMissing is not null)
        {
            Refuse(field, whenMissing);
        }

        return null;
    }

    /// <summary>A value that must be there.</summary>
    public T Need<T>(string field, T? value, string? text, string sentence)
        where T : struct
    {
        if (value is null && string.IsNullOrWhiteSpace(text))
        {
            Refuse(field, sentence);
        }

        return value ?? default;
    }

    private T? Read<T>(string field, string? text, Func<string, Parsed<T>> read)
        where T : struct
    {
        if (string.IsNullOrWhiteSpace(text))
        {
            return null;
        }

        if (read(text).TryGet(out var value, out var problem))
        {
            return value;
        }

        Refuse(field, problem);
        return null;
    }
}

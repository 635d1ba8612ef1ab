using System.Globalization;
using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;

namespace BladeLog.Features;

/// <summary>One field of a form that is an address: what it is called there, what stands in it and where that comes from.</summary>
/// <param name="Name">The query parameter.</param>
/// <param name="Label">In words.</param>
/// <param name="Value">The text in the field.</param>
/// <param name="Hint">Where it comes from, or what was understood.</param>
/// <param name="Error">What is wrong, beside the field.</param>
/// <param name="Choices">One out of these; null: typed.</param>
/// <param name="Empty">Words of the empty choice.</param>
/// <param name="Offers">Offered while typing.</param>
public sealed record AskField(
    string Name, string Label, string Value, string? Hint, string? Error, IReadOnlyList<Answer>? Choices = null, string? Empty = null, IReadOnlyList<string>? Offers = null);

/// <summary>What stands in a field before anybody typed: from the shop, or the example. In SI.</summary>
internal readonly record struct Given(double? Si, string Mark)
{
    public static Given None { get; } = new(null, "");

    public static Given Example(double si) => new(si, "example");

    /// <summary>The shop's own figure where there is one, else the example.</summary>
    public static Given Of(Known? known, double example) => known is { } k ? new(k.Value, k.From) : Example(example);

    public static Given Of(double? known, string from, double? example) =>
        known is { } k ? new(k, from) : example is { } e ? Example(e) : None;
}

/// <summary>
/// Reads a query field by field. An empty field takes the shop's figure or the example; a bad one keeps its
/// text, gets a sentence, and gives no figure, so that what does not need it can still be answered.
/// </summary>
internal sealed class AskForm(IQueryCollection query, ShopUnits units, bool fromShop)
{
    private readonly List<AskField> _fields = [];
    private readonly List<Problem> _problems = [];
    private bool _typed;

    public ShopUnits Units => units;

    public IReadOnlyList<AskField> Fields => _fields;

    public IReadOnlyList<Problem> Problems => _problems;

    public bool Example => !_typed && !fromShop;

    /// <summary>A length in metres.</summary>
    public double? Length(string name, string label, TypedField kind, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadLength(t, kind), l => l.Metres, v => units.Typing.Show(new Length(v), kind));

    public double? Stress(string name, string label, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadStress(t), s => s.Pascals, v => units.Typing.Show(new Stress(v)));

    public double? Force(string name, string label, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadForce(t), f => f.Newtons, v => units.Typing.Show(new Force(v)));

    public double? BandSpeed(string name, string label, Given start) =>
        Read(name, label, start, false, t => units.ReadBandSpeed(t), s => s.MetresPerSecond, v => units.Typing.ShowBandSpeed(new Speed(v)));

    public double? Feed(string name, string label, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadFeed(t), s => s.MetresPerSecond, v => units.Typing.ShowFeed(new Speed(v)));

    public double? Power(string name, string label, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadPower(t, AtTheBand), p => p.Watts, v => units.Typing.Show(new Power(v)));

    public double? Density(string name, string label, Given start, bool optional = false) =>
        Read(name, label, start, optional, t => units.ReadDensity(t), d => d.KilogramsPerCubicMetre, v => units.Typing.Show(new Density(v)));

    public double? Angle(string name, string label, Given start) =>
        Read(name, label, start, false, t => units.ReadAngle(t, Ui.Fields.Hook), a => a.Radians, v => units.Typing.Show(new Angle(v)));

    /// <summary>The mean pitch in metres.</summary>
    public double? Pitch(string name, string label, Given start) =>
        Read(name, label, start, false, units.ReadPitch, p => p.Mean.Metres, v => units.Typing.Show(ToothPitch.Between(v, v)));

    public double? Moisture(string name, string label, Given start) =>
        Read(name, label, start, false, units.ReadMoisture, m => m, units.Typing.ShowPercent);

    /// <summary>A plain number within bounds, with the words of its unit behind it.</summary>
    public double? Number(string name, string label, string article, double least, double most, string unit, Given start, bool optional = false)
    {
        Parsed<double> Parse(string text)
        {
            string clean = Amount.Clean(text);
            string bare = unit.Length > 0 && clean.EndsWith(unit.ToLowerInvariant(), StringComparison.Ordinal) ? clean[..^unit.Length].Trim() : clean;
            return !Amount.TryReadAll(bare, false, out var amount)
                ? Parsed<double>.Refused(text, $"\"{text}\" is not {article}. Write a number between {Plain(least)} and {Plain(most)}.")
                : amount.Value < least || amount.Value > most
                    ? Parsed<double>.Refused(text, $"\"{text}\" cannot be right: {article} lies between {Plain(least)} and {Plain(most)}.")
                    : Parsed<double>.Good(amount.Value, text, Plain(amount.Value));
        }

        return Read(name, unit.Length > 0 ? $"{label}, {unit}" : label, start, optional, Parse, v => v, Plain);
    }

    /// <summary>One wheel diameter after the other, in metres.</summary>
    public IReadOnlyList<double>? Wheels(string name, string label, IReadOnlyList<double> start, string mark)
    {
        string Show(IEnumerable<double> wheels) => string.Join("; ", wheels.Select(w => units.Typing.Show(new Length(w), Ui.Fields.WheelDiameter)));
        string typed = Typed(name);
        if (typed.Length == 0)
        {
            _fields.Add(new(name, label, Show(start), mark, null));
            return start;
        }

        _typed = true;
        List<double> read = [];
        foreach (string part in typed.Split([';', '\n'], StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries))
        {
            if (!units.ReadLength(part, Ui.Fields.WheelDiameter).TryGet(out Length wheel, out string problem))
            {
                return Wrong(name, label, typed, problem);
            }

            read.Add(wheel.Metres);
        }

        if (read.Count is 0 or > 6)
        {
            return Wrong(name, label, typed, "Write the diameter of each wheel, one to six of them, with a semicolon between.");
        }

        _fields.Add(new(name, label, typed, Show(read), null));
        return read;

        IReadOnlyList<double>? Wrong(string field, string words, string text, string sentence)
        {
            _fields.Add(new(field, words, text, null, sentence));
            _problems.Add(new Problem(field, sentence));
            return null;
        }
    }

    /// <summary>Plain factors one after the other, none at all where it is empty.</summary>
    public IReadOnlyList<double>? Factors(string name, string label, string hint)
    {
        string typed = Typed(name);
        _typed |= typed.Length > 0;
        List<double> read = [];
        foreach (string part in typed.Split([';', '\n'], StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries))
        {
            if (!Amount.TryReadAll(Amount.Clean(part), false, out var amount) || amount.Value < 0.1 || amount.Value > 10 || read.Count == 100)
            {
                Add(new(name, label, typed, null, $"\"{part}\" is no factor. Write numbers between 0.1 and 10, with a semicolon between two, at most 100."));
                return null;
            }

            read.Add(amount.Value);
        }

        Add(new(name, label, typed, typed.Length > 0 ? null : hint, null));
        return read;
    }

    /// <summary>One word out of a few.</summary>
    public T Choose<T>(string name, string label, T start, string mark, params (T Value, string Word, string Label)[] words)
        where T : struct, Enum
    {
        string typed = Typed(name);
        T value = start;
        string? error = null;
        if (typed.Length > 0)
        {
            int at = Array.FindIndex(words, w => w.Word == typed);
            error = at < 0 ? $"\"{Short(typed)}\" is none of these. Choose one." : null;
            value = at < 0 ? start : words[at].Value;
            _typed |= at >= 0 && !EqualityComparer<T>.Default.Equals(value, start);
        }

        Add(new(name, label, words.First(w => EqualityComparer<T>.Default.Equals(w.Value, value)).Word, typed.Length == 0 ? mark : null, error, [.. words.Select(w => new Answer(w.Word, w.Label))]));
        return value;
    }

    /// <summary>One of the shop's own things by its short name; empty where none is chosen.</summary>
    public string Pick(string name, string label, string start, string mark, string? empty, IReadOnlyList<Answer> answers)
    {
        string typed = Typed(name);
        string? found = typed.Length == 0 ? null : answers.FirstOrDefault(a => string.Equals(a.Value, typed, StringComparison.OrdinalIgnoreCase))?.Value;
        _typed |= found is not null;
        string? error = typed.Length > 0 && found is null ? $"\"{typed}\" is none of these. Choose one." : null;
        Add(new(name, label, found ?? start, typed.Length == 0 ? mark : null, error, answers, empty));
        return error is null ? found ?? start : "";
    }

    /// <summary>A word as typed, looked up by the caller.</summary>
    public T? Look<T>(string name, string label, string start, string mark, Func<string, (T? Found, string? Understood, string? Error)> find, IReadOnlyList<string>? offers = null)
        where T : class
    {
        string typed = Typed(name);
        _typed |= typed.Length > 0;
        string text = typed.Length > 0 ? typed : start;
        if (text.Length == 0)
        {
            Add(new(name, label, "", mark, null, null, null, offers));
            return null;
        }

        var (found, understood, error) = find(text);
        Add(new(name, label, text, typed.Length > 0 ? understood : mark, error, null, null, offers));
        return found;
    }

    /// <summary>A sentence beside a field about figures that do not go together.</summary>
    public void Refuse(string name, string sentence)
    {
        int at = _fields.FindIndex(f => f.Name == name);
        if (at >= 0 && _fields[at].Error is null)
        {
            _fields[at] = _fields[at] with { Error = sentence };
        }

        _problems.Add(new Problem(at >= 0 ? name : null, sentence));
    }

    /// <summary>Works something out; what the handbook refuses is said and left out.</summary>
    public T? Try<T>(Func<T> work)
        where T : class
    {
        try
        {
            return work();
        }
        catch (ArgumentOutOfRangeException refused)
        {
            string sentence = refused.Message.Split(" (Parameter", StringSplitOptions.None)[0].Split('\n')[0].Trim();
            if (!_problems.Exists(p => p.Sentence == sentence))
            {
                _problems.Add(new Problem(null, sentence));
            }

            return null;
        }
    }

    private double? Read<T>(string name, string label, Given start, bool optional, Func<string, Parsed<T>> read, Func<T, double> si, Func<double, string> show)
    {
        string typed = Typed(name);
        if (typed.Length > 0)
        {
            _typed = true;
            Parsed<T> parsed = read(typed);
            string? understood = parsed.IsGood && Same(parsed.Understood, typed) ? null : parsed.Understood;
            Add(new(name, label, typed, understood, parsed.Problem));
            return parsed.IsGood ? si(parsed.Value) : null;
        }

        bool emptied = optional && query.ContainsKey(name);
        double? value = emptied ? null : start.Si;
        Add(new(name, label, value is { } v ? show(v) : "", value is null ? optional ? "may stay empty" : null : start.Mark, null));
        return value;
    }

    private void Add(AskField field)
    {
        _fields.Add(field);
        if (field.Error is { } error)
        {
            _problems.Add(new Problem(field.Name, error));
        }
    }

    private string Typed(string name) => Short(query[name].ToString().Trim());

    private static string Short(string text) => text.Length > 200 ? text[..200] : text;

    private static bool Same(string? understood, string typed) =>
        understood is not null && Amount.Clean(understood) == Amount.Clean(typed);

    private static string Plain(double v) => v.ToString("#,##0.######", CultureInfo.InvariantCulture).Replace(",", "", StringComparison.Ordinal);

    private static readonly TypedField AtTheBand = new("a power at the band", 1, 500e3);
}

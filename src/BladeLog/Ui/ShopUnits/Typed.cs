namespace BladeLog.Ui;

/// <summary>A quantity in SI and the text somebody typed for it; both are kept.</summary>
public sealed record Typed<T>(T Value, string Text);

/// <summary>What came of reading a text: a value, or one plain sentence saying what is wrong and what would be right.</summary>
public readonly record struct Parsed<T>
{
    private readonly T? _value;
    private readonly string? _text;
    private readonly string? _problem;
    private readonly bool _good;

    private Parsed(bool good, T? value, string text, string? understood, string? problem)
    {
        _good = good;
        _value = value;
        _text = text;
        Understood = understood;
        _problem = problem;
    }

    /// <summary>True when there is a value.</summary>
    public bool IsGood => _good;

    /// <summary>The value in SI. Ask <see cref="IsGood"/> first.</summary>
    public T Value => _good ? _value! : throw new InvalidOperationException(Problem);

    /// <summary>The text as typed, without blanks around it.</summary>
    public string Text => _text ?? "";

    /// <summary>What was understood, in the shop's unit, to be shown back beside the field.</summary>
    public string? Understood { get; }

    /// <summary>What is wrong and what would be right; null when there is a value.</summary>
    public string? Problem => _good ? null : _problem ?? "Nothing is typed.";

    /// <summary>The value with its text, as records keep it.</summary>
    public Typed<T> Typed => new(Value, Text);

    /// <summary>The value, or else the sentence.</summary>
    public bool TryGet(out T value, out string problem)
    {
        value = _good ? _value! : default!;
        problem = Problem ?? "";
        return _good;
    }

    /// <summary>What was understood, or the sentence. Never throws, unlike the printing the compiler would write.</summary>
    public override string ToString() => Problem ?? Understood ?? Text;

    internal static Parsed<T> Good(T value, string text, string understood) => new(true, value, text, understood, null);

    internal static Parsed<T> Refused(string text, string problem) => new(false, default, text, null, problem);

    /// <summary>The same outcome with the bare number dressed as a quantity, and shown back as one.</summary>
    internal Parsed<TOther> As<TOther>(Func<T, TOther> dress, Func<TOther, string> show)
    {
        if (!_good)
            return Parsed<TOther>.Refused(Text, Problem!);
        var value = dress(_value!);
        return Parsed<TOther>.Good(value, Text, show(value));
    }
}

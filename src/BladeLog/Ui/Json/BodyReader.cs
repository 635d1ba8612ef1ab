using System.Collections;
using System.Globalization;
using System.Runtime.CompilerServices;
using System.Text.Json;

namespace BladeLog.Ui.Json;

/// <summary>
/// Reads a JSON body field by field. The framework's binding answers an unknown field or a text for a number with an
/// empty body, takes a missing number for 0 and stumbles over 1e999; this says each of them in a sentence.
/// </summary>
internal sealed class BodyReader
{
    private static readonly JsonDocumentOptions Strict = new() { MaxDepth = 16, AllowTrailingCommas = false };

    public Dictionary<string, List<string>> Errors { get; } = new(StringComparer.Ordinal);

    /// <summary>The body as a <typeparamref name="T"/>, or null with <see cref="Errors"/> filled.</summary>
    public async Task<T?> Read<T>(HttpRequest request)
        where T : class
    {
        JsonDocument document;
        try
        {
            document = await JsonDocument.ParseAsync(request.Body, Strict, request.HttpContext.RequestAborted);
        }
        catch (JsonException)
        {
            Say("body", "The body is not JSON. Send one object, such as {\"thickness_mm\": 0.9}.");
            return null;
        }

        using (document)
        {
            var value = ReadObject(typeof(T), document.RootElement, "");
            return Errors.Count == 0 ? (T?)value : null;
        }
    }

    public void Say(string field, string sentence)
    {
        if (!Errors.TryGetValue(field, out var list))
        {
            Errors[field] = list = [];
        }

        list.Add(sentence);
    }

    /// <summary>400 with RFC 9457 problem details; each field maps to its sentences.</summary>
    public IResult Refusal() => Problem(Errors);

    public static IResult Problem(IReadOnlyDictionary<string, List<string>> errors) =>
        Results.ValidationProblem(
            errors.ToDictionary(e => e.Key, e => e.Value.ToArray()),
            title: "Some fields are not right. Nothing was done.",
            statusCode: StatusCodes.Status400BadRequest);

    private object? ReadObject(Type type, JsonElement element, string path)
    {
        if (element.ValueKind != JsonValueKind.Object)
        {
            Say(path.Length == 0 ? "body" : path, "Send an object with named fields in { }.");
            return null;
        }

        var made = RuntimeHelpers.GetUninitializedObject(type);
        if (type.GetConstructor(Type.EmptyTypes) is { } plain)
        {
            made = plain.Invoke(null);
        }

        var seen = new HashSet<string>(StringComparer.Ordinal);
        var fields = BodyFields.Of(type);
        foreach (var item in element.EnumerateObject())
        {
            if (NameOf(item) is null)
            {
                Say(path.Length == 0 ? "body" : path, "A field's name has a character that cannot be read.");
                continue;
            }

            var at = path.Length == 0 ? item.Name : $"{path}.{item.Name}";
            if (!fields.TryGetValue(item.Name, out var field))
            {
                Say(at.Length > 80 ? at[..80] : at, $"There is no such field. {BodyFields.Nearest(item.Name, fields.Keys)}");
                continue;
            }

            if (!seen.Add(item.Name))
            {
                Say(at, "This field stands twice. Send it once.");
                continue;
            }

            if (item.Value.ValueKind == JsonValueKind.Null)
            {
                seen.Remove(item.Name);
                continue;
            }

            var value = ReadValue(field.Type, field.Attribute, item.Value, at);
            if (value is not null)
            {
                field.Property.SetValue(made, value);
            }
        }

        foreach (var (name, field) in fields)
        {
            if (field.Required && !seen.Contains(name))
            {
                var at = path.Length == 0 ? name : $"{path}.{name}";
                Say(at, $"Missing: {field.Attribute.Says}.");
            }
        }

        return made;
    }

    private object? ReadValue(Type type, FieldAttribute field, JsonElement value, string at)
    {
        if (type == typeof(double))
        {
            return Number(field, value, at);
        }

        if (type == typeof(int))
        {
            return Number(field, value, at) is not { } n ? null : n == Math.Floor(n) && Math.Abs(n) < int.MaxValue ? (int)n : Refused(at, $"{Sentence(field)} is a whole number.");
        }

        if (type == typeof(bool))
        {
            return value.ValueKind is JsonValueKind.True or JsonValueKind.False ? value.GetBoolean() : Refused(at, $"{Sentence(field)} is true or false.");
        }

        if (type == typeof(string))
        {
            return Text(field, value, at);
        }

        if (type == typeof(Guid))
        {
            return Guid.TryParse(TextOf(value), out var id) ? id : Refused(at, $"{Sentence(field)} is a GUID, such as 6f9619ff-8b86-d011-b42d-00c04fc964ff.");
        }

        if (type == typeof(DateTimeOffset))
        {
            return DateTimeOffset.TryParse(TextOf(value), CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var when)
                ? when
                : Refused(at, $"{Sentence(field)} is a date and time such as 2026-05-04T07:30:00Z.");
        }

        if (type == typeof(DateOnly))
        {
            return DateOnly.TryParseExact(TextOf(value), "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var day)
                ? day
                : Refused(at, $"{Sentence(field)} is a date such as 2026-05-04.");
        }

        if (type.IsEnum)
        {
            var words = BodyFields.WordsOf(type);
            return TextOf(value) is { } word && words.TryGetValue(word, out var chosen)
                ? chosen
                : Refused(at, $"{Sentence(field)} is one of: {string.Join(", ", words.Keys)}.");
        }

        return type.IsGenericType ? ReadList(type, field, value, at) : ReadObject(type, value, at);
    }

    private IList? ReadList(Type type, FieldAttribute field, JsonElement value, string at)
    {
        if (value.ValueKind != JsonValueKind.Array || value.GetArrayLength() == 0)
        {
            Say(at, $"{Sentence(field)} is a list in [ ], with at least one value.");
            return null;
        }

        if (value.GetArrayLength() > field.Longest)
        {
            Say(at, $"{Sentence(field)} has {value.GetArrayLength()} values; {field.Longest} are the most.");
            return null;
        }

        var of = type.GetGenericArguments()[0];
        var list = (IList)Activator.CreateInstance(typeof(List<>).MakeGenericType(of))!;
        var i = 0;
        foreach (var item in value.EnumerateArray())
        {
            if (ReadValue(of, field, item, $"{at}[{i++}]") is { } one)
            {
                list.Add(one);
            }
        }

        return list;
    }

    private double? Number(FieldAttribute field, JsonElement value, string at)
    {
        if (value.ValueKind != JsonValueKind.Number)
        {
            return (double?)Refused(at, $"{Sentence(field)} is a number without quotes.");
        }

        var number = value.TryGetDouble(out var n) ? n : double.NaN;
        if (!double.IsFinite(number))
        {
            return (double?)Refused(at, $"{Sentence(field)} is too large a number to work with.");
        }

        if (number <= field.Over)
        {
            return (double?)Refused(at, $"{Sentence(field)} must be more than {field.Over.ToString(CultureInfo.InvariantCulture)}.");
        }

        return number < field.Least || number > field.Most
            ? (double?)Refused(at, $"{Sentence(field)} must lie {Bounds(field)}.")
            : number;
    }

    private string? Text(FieldAttribute field, JsonElement value, string at)
    {
        if (value.ValueKind != JsonValueKind.String)
        {
            return (string?)Refused(at, $"{Sentence(field)} is a text in quotes.");
        }

        if (TextOf(value)?.Trim() is not { } text)
        {
            return (string?)Refused(at, $"{Sentence(field)} has a character that cannot be read.");
        }

        return text.Length == 0 || text.Length > field.Longest || text.Any(char.IsControl)
            ? (string?)Refused(at, $"{Sentence(field)} is a text of 1 to {field.Longest} characters.")
            : text;
    }

    /// <summary>Null for what is no text, and for a lone surrogate such as "\ud800": valid JSON, not a text.</summary>
    private static string? TextOf(JsonElement value)
    {
        try
        {
            return value.ValueKind == JsonValueKind.String ? value.GetString() : null;
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    private static string? NameOf(JsonProperty property)
    {
        try
        {
            return property.Name;
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    private object? Refused(string at, string sentence)
    {
        Say(at, sentence);
        return null;
    }

    private static string Sentence(FieldAttribute field) => char.ToUpperInvariant(field.Says[0]) + field.Says[1..];

    private static string Bounds(FieldAttribute f)
    {
        var most = f.Most.ToString(CultureInfo.InvariantCulture);
        return double.IsNegativeInfinity(f.Least)
            ? double.IsNegativeInfinity(f.Over) ? $"at {most} at the most" : $"above {f.Over.ToString(CultureInfo.InvariantCulture)} and at {most} at the most"
            : double.IsPositiveInfinity(f.Most) ? $"at {f.Least.ToString(CultureInfo.InvariantCulture)} at the least" : $"between {f.Least.ToString(CultureInfo.InvariantCulture)} and {most}";
    }
}

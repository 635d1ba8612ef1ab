using System.Collections.Concurrent;
using System.Reflection;
using System.Runtime.CompilerServices;
using System.Text.Json;
using System.Text.Json.Serialization.Metadata;

namespace BladeLog.Ui.Json;

/// <summary>The fields a body type declares, and the names they have in JSON.</summary>
internal static class Fields
{
    private static readonly ConcurrentDictionary<Type, IReadOnlyDictionary<string, Field>> Known = new();
    private static readonly ConcurrentDictionary<Type, IReadOnlyDictionary<string, object>> Words = new();

    internal sealed record Field(PropertyInfo Property, Type Type, FieldAttribute Attribute, bool Required);

    public static IReadOnlyDictionary<string, Field> Of(Type type) => Known.GetOrAdd(type, t =>
        t.GetProperties()
            .Select(p => (Property: p, Attribute: p.GetCustomAttribute<FieldAttribute>()))
            .Where(p => p.Attribute is not null)
            .Select(p => new Field(
                p.Property,
                Nullable.GetUnderlyingType(p.Property.PropertyType) ?? p.Property.PropertyType,
                p.Attribute!,
                p.Property.IsDefined(typeof(RequiredMemberAttribute))))
            .ToDictionary(f => f.Attribute.Name, StringComparer.Ordinal));

    /// <summary>An enumeration's words in JSON: snake_case of its names.</summary>
    public static IReadOnlyDictionary<string, object> WordsOf(Type type) => Words.GetOrAdd(type, t =>
        Enum.GetValues(t).Cast<object>().ToDictionary(v => JsonNamingPolicy.SnakeCaseLower.ConvertName(v.ToString()!), StringComparer.Ordinal));

    public static string Nearest(string typed, IEnumerable<string> names)
    {
        var near = names.Select(n => (Name: n, Shared: Shared(typed, n))).OrderByDescending(n => n.Shared).First();
        return near.Shared >= 3 ? $"Did you mean {near.Name}?" : $"Known are: {string.Join(", ", names)}.";
    }

    /// <summary>Gives declared fields their JSON names, so that the interface's description speaks of them as the reader does.</summary>
    public static void Name(JsonTypeInfo info)
    {
        foreach (var property in info.Properties)
        {
            if (property.AttributeProvider?.GetCustomAttributes(typeof(FieldAttribute), true).FirstOrDefault() is FieldAttribute field)
            {
                property.Name = field.Name;
            }
        }
    }

    private static int Shared(string a, string b)
    {
        var n = 0;
        while (n < Math.Min(a.Length, b.Length) && char.ToLowerInvariant(a[n]) == char.ToLowerInvariant(b[n]))
        {
            n++;
        }

        return n;
    }
}

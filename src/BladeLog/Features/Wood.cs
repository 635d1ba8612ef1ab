using BladeLog.Handbook.Quantities;
using Material = BladeLog.Handbook.Tables.Material;
using MaterialTable = BladeLog.Handbook.Tables.MaterialTable;

namespace BladeLog.Features;

/// <summary>A word for a wood, and what the handbook takes it for: typed on a form, brought in by a file or sent by a program.</summary>
/// <param name="Key">Of the handbook's table.</param>
/// <param name="Typed">As it was said.</param>
/// <param name="TakenAs">The name it was understood as, where that is not what was typed.</param>
/// <param name="Kind">Wood, panel or other.</param>
/// <param name="WearClass">What it does to edges.</param>
internal sealed record Wood(string Key, string Typed, string? TakenAs, MaterialKind Kind, string WearClass)
{
    private const int LongestName = 60;

    /// <summary>The wood; null with a sentence where the handbook does not know it.</summary>
    public static Wood? Read(string? text, out string? wrong)
    {
        string typed = (text ?? "").Trim();
        wrong = null;
        if (typed.Length is 0 or > LongestName)
        {
            wrong = "Say which wood or panel it is, such as European oak or birch plywood.";
            return null;
        }

        if (MaterialTable.Find(typed, out string? takenAs) is { } found)
        {
            return new Wood(found.Key, typed, takenAs, found.Kind, found.WearClass);
        }

        IReadOnlyList<string> near = MaterialTable.NearestNames(typed);
        wrong = near.Count > 0
            ? $"\"{typed}\" is not a wood known here. The nearest names are: {string.Join(", ", near)}."
            : $"\"{typed}\" is not a wood known here, nor near one. Write its usual name, such as European oak; the field Wood of a new cut lists them all.";
        return null;
    }

    /// <summary>Names to tap where the word is not known; none where it is.</summary>
    public static IReadOnlyList<string> Offers(string? text)
    {
        string typed = (text ?? "").Trim();
        return typed.Length is 0 or > LongestName || MaterialTable.Find(typed, out _) is not null ? [] : MaterialTable.NearestNames(typed);
    }

    /// <summary>A wood whose cutting can be reckoned, for a form that is an address.</summary>
    public static (Material? Found, string? Understood, string? Error) Sawn(string typed)
    {
        Material? found = MaterialTable.Find(typed, out string? takenAs);
        return found is null ? (null, null, Unknown(typed))
            : found.Density12 is null ? (null, null, $"{found.Name} is not sawn on these saws.")
            : (found, takenAs is null ? null : $"taken as {takenAs}", null);
    }

    /// <summary>What is said beside a field that lists the woods.</summary>
    public static string Unknown(string typed)
    {
        IReadOnlyList<string> near = MaterialTable.NearestNames(typed);
        return $"\"{(typed.Length > 40 ? typed[..40] : typed)}\" is not in the handbook. {(near.Count > 0 ? $"Near it: {string.Join(", ", near)}." : "The field itself lists all that are.")}";
    }

    public static IReadOnlyList<string> Names { get; } = [.. MaterialTable.All.Select(m => m.Name)];
}

using BladeLog.Advice;
using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>What an inspection looked at and saw, beside what it found.</summary>
internal static class InspectionWords
{
    /// <summary>"; seen: rust in the gullets; looked at the whole loop"; empty where nothing was said.</summary>
    public static string Beside(Inspection look)
    {
        ArgumentNullException.ThrowIfNull(look);
        string seen = MarkWords.Seen(look.Marks, look.TeethMissing);
        return (seen.Length > 0 ? $"; seen: {seen}" : "") + (MarkWords.Looked(look.LookedAt) is { } at ? $"; looked at {at}" : "");
    }
}

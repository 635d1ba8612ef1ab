using BladeLog.Handbook.Units;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What a measured kerf and set tell of how a blade runs.</summary>
public static class KerfWords
{
    /// <summary>Sentences, none where nothing was measured that says anything.</summary>
    public static IReadOnlyList<string> Of(BladeFile file, AdviceSettings settings, Wording words)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(words);
        return [.. new[] { Lead(file, settings, words), Flutter(file, settings, words) }.OfType<string>()];
    }

    /// <summary>A blade leads to the side on which its teeth are set further: that side of the slot gives way first.</summary>
    public static string? Lead(BladeFile file, AdviceSettings settings, Wording words)
    {
        if (file.Kerf.Set is not { LeftM: { } left, RightM: { } right })
        {
            return null;
        }

        string sides = $"Set {Bare(left, words)} left and {Fine(right, words)} right";
        double more = left - right;
        string side = more > 0 ? "left" : "right";
        return Math.Abs(more) < settings[BladeSettings.SetUneven] * 1e-3
            ? $"{sides}: even, so a lead has another cause."
            : $"{sides}: {Fine(Math.Abs(more), words)} more on the {side}, so it leads to the {side}.";
    }

    /// <summary>A slot wider than the teeth are set was not cut by teeth that ran true: the blade moved sideways in it.</summary>
    public static string? Flutter(BladeFile file, AdviceSettings settings, Wording words)
    {
        if (file.Kerf.Slot is not { } slot || file.Kerf.OverSet(file.ThicknessM) is not { } teeth)
        {
            return null;
        }

        double over = slot.Metres - teeth;
        return over >= settings[BladeSettings.Flutter] * 1e-3 && over > 0
            ? $"Its slot is {Fine(slot.Metres, words)} wide and its teeth only {Fine(teeth, words)}: it flutters by {Fine(over, words)}. Look at the guides, the {words.Tension}, the weld and the wheels."
            : null;
    }

    private static string Fine(double metres, Wording words) => Bare(metres, words) + (words.Lengths == LengthUnit.Inch ? " in" : " mm");

    private static string Bare(double metres, Wording words) =>
        words.Lengths == LengthUnit.Inch ? Wording.Number(metres / Exact.Inch, 3) : Wording.Number(metres * 1e3, 2);
}

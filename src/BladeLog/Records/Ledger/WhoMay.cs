namespace BladeLog.Records;

/// <summary>Who may enter each kind of fact: a role, or anyone. The one place where roles are held.</summary>
public static class WhoMay
{
    private static readonly Dictionary<string, Mark> Marks = new()
    {
        [nameof(HoldCleared)] = new(Role.ClearHolds, Enforced: true),
        [nameof(Sharpening)] = new(Role.Sharpen, Enforced: false),
        [nameof(Joint)] = new(Role.Weld, Enforced: false),
        [nameof(StartCheck)] = new(null, Enforced: false),
        [nameof(TimerStarted)] = new(null, Enforced: false),
        // Anyone with a caliper may measure; only setting the teeth is a sharpener's work.
        [nameof(KerfReading)] = new(null, Enforced: false),
        [nameof(HandOver)] = new(null, Enforced: false),
        [nameof(HandOverRead)] = new(null, Enforced: false),
        // Training to clear holds gives the right to it, so its handler asks for that right.
        [nameof(Trained)] = new(null, Enforced: false),
        [nameof(LabelPrinted)] = new(null, Enforced: false),
    };

    /// <summary>The role a kind of fact is meant for, and whether it is asked for already.</summary>
    public static Mark Of(string kind) => Marks.GetValueOrDefault(kind, new Mark(null, Enforced: false));

    /// <summary>The role in the shop's words.</summary>
    public static string Words(Role role) => role switch
    {
        Role.ClearHolds => "clear a hold",
        Role.Sharpen => "sharpen",
        Role.Weld => "make a joint",
        _ => throw new ArgumentOutOfRangeException(nameof(role)),
    };

    /// <summary>No role: anyone may.</summary>
    public readonly record struct Mark(Role? Role, bool Enforced);
}

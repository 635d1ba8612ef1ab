using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>What will end a blade.</summary>
public enum LimitKind
{
    New,
    Fatigue,
    Width,
    Sharpenings,
    Edge,
    Crack,
    UnknownHistory,
    Welds,
}

/// <summary>How much of one limit is used.</summary>
public sealed record LimitShare(LimitKind Kind, double Share);

/// <summary>The limits of a blade's life, how far each is used, and which of them governs.</summary>
public sealed record LifeLimits
{
    /// <summary>Greatest first.</summary>
    public required IReadOnlyList<LimitShare> Shares { get; init; }

    public required LimitKind GovernedBy { get; init; }

    /// <summary>Second weld made: no other is allowed.</summary>
    public required bool WeldLimitReached { get; init; }

    /// <summary>The largest used fraction, at most all.</summary>
    public double Largest => Shares.Count == 0 ? 0 : Math.Min(1, Shares[0].Share);

    public static LifeLimits Of(BladeFile file, BladeBody body, LifeOfBlade life, Sharpness edge, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(life);
        ArgumentNullException.ThrowIfNull(edge);
        ArgumentNullException.ThrowIfNull(settings);
        List<LimitShare> shares = [new(LimitKind.Fatigue, life.Reckoned.Blade)];
        double toLose = body.NewWidth.Value - body.LeastWidth.Value;
        if (toLose > 0)
        {
            shares.Add(new(LimitKind.Width, Math.Max(0, (body.NewWidth.Value - body.Width.Value) / toLose)));
        }

        if (file.Spec.MostSharpenings is > 0 and int most)
        {
            shares.Add(new(LimitKind.Sharpenings, (double)file.Sharpenings / most));
        }

        if (file.Spec.MostSharpenings == 0)
        {
            shares.Add(new(LimitKind.Edge, edge.Used));
        }

        LimitShare[] sorted = [.. shares.OrderByDescending(s => s.Share)];
        bool welds = file.Welds >= settings[BladeSettings.MostWelds];
        return new LifeLimits
        {
            Shares = sorted,
            WeldLimitReached = welds,
            GovernedBy = file.Hold is not null ? LimitKind.Crack
                : life.UnknownHistory ? LimitKind.UnknownHistory
                : welds ? LimitKind.Welds
                : sorted[0].Share > 0 ? sorted[0].Kind
                : LimitKind.New,
        };
    }
}

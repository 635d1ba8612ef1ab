using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Features.Saws;

public sealed record SwapForm : PostedForm
{
    public string? SawVersion { get; init; }

    /// <summary>How the blade comes off.</summary>
    public string? Reason { get; init; }

    public string? OnTag { get; init; }

    public string? At { get; init; }

    public string? Tension { get; init; }

    public string? Measured { get; init; }

    public string? InsideOut { get; init; }

    public string? Although { get; init; }

    /// <summary>Only take off.</summary>
    public string? OnlyOff { get; init; }

    /// <summary>What is written is not what is on the saw.</summary>
    public string? Found { get; init; }
}

/// <summary>A blade as the swap form shows it.</summary>
public sealed record SwapBlade(string Tag, ToothSpec Teeth);

/// <summary>A sentence beside a tick, a triangle or a cross.</summary>
public sealed record CheckLine(string State, string Sentence, string? Source = null);

/// <summary>A blade that could go on, and the shortest thing to say of it.</summary>
public sealed record SwapOffer(string Tag, string Remark);

public sealed record SwapModel
{
    public required SwapForm Form { get; init; }

    public required FormState State { get; init; }

    public required string Code { get; init; }

    public required string Name { get; init; }

    public required int Version { get; init; }

    /// <summary>On the saw as it is written.</summary>
    public SwapBlade? Off { get; init; }

    public required string OffSince { get; init; }

    /// <summary>Where a sharp one goes back to.</summary>
    public string? OffHook { get; init; }

    public SwapBlade? On { get; init; }

    public IReadOnlyList<CheckLine> Checks { get; init; } = [];

    /// <summary>Where the figures of the checks are worked out.</summary>
    public IReadOnlyList<Worked> Worked { get; init; } = [];

    public IReadOnlyList<SwapOffer> Offers { get; init; } = [];

    public IReadOnlyList<SwapOffer> MoreOffers { get; init; } = [];

    public required string PullWord { get; init; }

    public required string PullUnit { get; init; }

    public required decimal PullStep { get; init; }

    /// <summary>As it was measured last of the blade that goes on, on this saw.</summary>
    public string? PullLast { get; init; }

    /// <summary>What its specification wants.</summary>
    public string? PullUsual { get; init; }

    public string? Who { get; init; }

    public required IReadOnlyList<string> People { get; init; }

    public bool Found => Form.Found == "1";

    public bool OptionsOpen => Found || Form.At is { Length: > 0 } || Form.Tension is { Length: > 0 } || Form.InsideOut is not null || State.Has("At", "Tension");

    public string Title => (Off, On) switch
    {
        _ when Found => $"{Name}: what is really on it?",
        ({ } off, { } on) => $"{Name}: {off.Tag} off, {on.Tag} on",
        ({ } off, null) => $"{Name}: {off.Tag} off, what goes on?",
        (null, { } on) => $"{Name}: {on.Tag} on",
        _ => $"{Name}: what goes on?",
    };

    public static SwapModel Of(ShopAdvice advice, SawNow saw, SwapForm form, FormState state, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(advice);
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(form);
        ArgumentNullException.ThrowIfNull(units);
        BladeFile? off = advice.Now.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId);
        BladeFile? on = string.IsNullOrWhiteSpace(form.OnTag) ? null : advice.Now.Blade(Tags.Read(form.OnTag));
        List<SwapOffer> offers = on is null ? [.. Offered(advice, saw, units)] : [];
        return new SwapModel
        {
            Form = form,
            State = state,
            Code = saw.Saw.Code,
            Name = saw.Saw.Name,
            Version = saw.Saw.Version,
            Off = off is null ? null : Picture(advice, off),
            OffSince = saw.MountedSince is { } since ? Said.When(since, advice.Now.AsOf, units) : "",
            OffHook = off?.Hook,
            On = on is null ? null : Picture(advice, on),
            Checks = on is null ? [] : SwapChecks.Of(advice, saw, on, units),
            Worked = on is null ? [] : WorkedOut.Rows(WorkedOut.Life(advice.On(on, saw), saw), WorkedOut.Tension(advice.On(on, saw), saw, advice.Words)),
            Offers = [.. offers.Take(4)],
            MoreOffers = [.. offers.Skip(4)],
            PullWord = units.PullName,
            PullUnit = units.StressUnit,
            PullStep = units.Step(Fields.Stress),
            PullLast = on is not null && on.LastTensionPa.TryGetValue(saw.Saw.Id, out double pulled) ? units.BareStress(pulled) : null,
            PullUsual = on is null ? null : units.BareStress(advice.Of(on).Body.TargetPa),
            People = [],
        };
    }

    private static SwapBlade Picture(ShopAdvice advice, BladeFile file) => new(file.Blade.Tag, Drawn.Teeth(advice.Of(file).Body, file.Spec));

    /// <summary>Sharp blades at hand that fit, the best for this saw's next cut first.</summary>
    private static IEnumerable<SwapOffer> Offered(ShopAdvice advice, SawNow saw, ShopUnits units)
    {
        PlannedCut? next = advice.NextCut(saw);
        string[] ranked = next is null
            ? []
            : [.. advice.For(next.Cut).Choices.Where(c => c.Saw.Saw.Id == saw.Saw.Id && c.Verdict != Verdict.No).Select(c => c.Tag)];
        return advice.Now.Blades
            .Where(b => b.Place is Place.Rack or Place.Bench && ShopAdvice.Fits(b, saw) && advice.Of(b).State is BladeState.Ready or BladeState.Look
                && b.Place is Place.Rack or Place.Bench && b.Hold is null)
            .Where(b => advice.On(b, saw).Record.Verdict != Handbook.Fatigue.LifeVerdict.Unsuitable)
            .OrderBy(b => Array.IndexOf(ranked, b.Blade.Tag) is >= 0 and var i ? i : int.MaxValue)
            .ThenBy(b => b.Blade.Tag, StringComparer.Ordinal)
            .Select(b => new SwapOffer(b.Blade.Tag, Remark(b, next, ranked, units)));
    }

    private static string Remark(BladeFile blade, PlannedCut? next, string[] ranked, ShopUnits units)
    {
        string teeth = Said.Teeth(blade.Spec, units);
        string kind = $"{Said.Section(blade, units)}, {teeth}";
        return next is not null && ranked.Length > 0 && ranked[0] == blade.Blade.Tag ? $"{kind}; first for cut {next.Cut.Number}" : kind;
    }
}

using BladeLog.Advice.Life;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Changes;

/// <summary>What would be changed. Null leaves it as it is. Lengths in metres.</summary>
/// <param name="Saw">Another saw.</param>
/// <param name="LoopM">Cut and welded again to this length.</param>
/// <param name="Weld">How good the new weld is.</param>
/// <param name="ThicknessM">Another thickness: another blade, bought new.</param>
/// <param name="WidthM">Another width: another blade, bought new.</param>
/// <param name="Hrc">Another hardness: another blade, bought new.</param>
/// <param name="TensionPa">Tension on the body.</param>
/// <param name="AsNew">The same kind of blade, bought new.</param>
public sealed record BladeChange(
    SawNow? Saw = null, double? LoopM = null, WeldQuality? Weld = null, double? ThicknessM = null, double? WidthM = null, double? Hrc = null, double? TensionPa = null, bool AsNew = false);

/// <summary>A blade today and as it would be.</summary>
/// <param name="Today">Null where it stands on no saw and fits none.</param>
/// <param name="Then">With the change.</param>
/// <param name="AnotherBlade">The change is a purchase: nothing of the old blade's life goes with it.</param>
/// <param name="Rewelded">Its loop was cut and welded again.</param>
public sealed record BladeComparison(BladeStand? Today, BladeStand Then, bool AnotherBlade, bool Rewelded);

/// <summary>Before a mount, a weld or a purchase: what it would do.</summary>
public static class BladeWhatIf
{
    private const double Same = 1e-6;

    /// <summary>Both columns for one height of wood.</summary>
    public static BladeComparison Compare(BladeFile file, SawNow? today, BladeChange change, double heightM, LevelPrior level, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(change);
        ArgumentNullException.ThrowIfNull(settings);
        SawNow saw = change.Saw ?? today ?? throw new ArgumentOutOfRangeException(nameof(change), "Say on which saw: the blade stands on none.");
        BladeBody body = BladeBody.Of(file, settings);
        BladeBody then = Changed(body, change);
        bool another = change.AsNew || Other(body.Thickness, then.Thickness) || Other(body.Width, then.Width) || Other(body.Hrc, then.Hrc);
        bool rewelded = !another && change.LoopM is { } loop && file.LoopM is { } now && Math.Abs(loop - now) > Same;
        return new BladeComparison(
            today is null ? null : BladeStand.Of(file, body, today, heightM, level, settings),
            BladeStand.Of(Then(file, saw, change, another, rewelded), then, saw, heightM, level, settings),
            another,
            rewelded);
    }

    private static bool Other(Known a, Known b) => Math.Abs(a.Value - b.Value) > Same * Math.Abs(a.Value);

    private static BladeBody Changed(BladeBody body, BladeChange change)
    {
        Known Asked(Known now, double? asked) => asked is { } v && Math.Abs(v - now.Value) > Same * now.Value ? Known.Yours(v, "asked") : now;
        BladeBody then = body with { Thickness = Asked(body.Thickness, change.ThicknessM), Width = Asked(body.Width, change.WidthM), Hrc = Asked(body.Hrc, change.Hrc) };
        if (change.AsNew && change.WidthM is null)
        {
            then = then with { Width = body.NewWidth };
        }

        // Set goes with thickness: another body is taken to be set in the same proportion.
        double share = body.Kerf.Value / body.Thickness.Value;
        return Other(body.Thickness, then.Thickness)
            ? then with { Kerf = new Known(share * then.Thickness.Value, Provenance.EngineeringDefault, "set in the same proportion") }
            : then;
    }

    /// <summary>The blade's file as it would be: what it has lived through goes with it, a new weld begins its own clock.</summary>
    private static BladeFile Then(BladeFile file, SawNow saw, BladeChange change, bool another, bool rewelded)
    {
        BladeFile then = file with
        {
            SawId = change.TensionPa is null ? file.SawId : saw.Setup.SawId,
            TensionThisSpellPa = change.TensionPa ?? file.TensionThisSpellPa,
            LoopM = change.LoopM ?? file.LoopM,
            Weld = rewelded || another ? change.Weld ?? WeldQuality.Good : change.Weld ?? file.Weld,
        };
        return another
            ? then with
            {
                Exposures = [],
                PriorUse = null,
                Hold = null,
                Break = null,
                Retirement = null,
                Welds = 1,
                Sharpenings = 0,
                TensionThisSpellPa = change.TensionPa,
                LastTensionPa = new Dictionary<int, double>(),
            }
            : rewelded
                ? then with { Exposures = [.. file.Exposures.Select(e => e with { OnThisWeld = false })], Welds = file.Welds + 1, Break = null }
                : then;
    }
}

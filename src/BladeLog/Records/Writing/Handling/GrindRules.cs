using Microsoft.EntityFrameworkCore;

namespace BladeLog.Records.Writing;

/// <summary>What was measured of a blade after a grind: what cannot be is refused, what is hardly so is asked about.</summary>
/// <param name="WidthM">Width over the teeth.</param>
/// <param name="GulletM">Gullet depth.</param>
/// <param name="KerfM">Kerf over set or tips.</param>
/// <param name="EdgeM">Edge radius.</param>
/// <param name="LeastM">Least width, where it is known.</param>
internal sealed record Ground(double? WidthM, double? GulletM, double? KerfM, double? EdgeM, double? LeastM);

internal static class GrindRules
{
    /// <summary>A kerf of more bodies than this is asked about: no set or tip is as wide.</summary>
    public const double WideInBodies = 3;

    /// <summary>More off the width than both of these in one grind is asked about: engineering default.</summary>
    private const double MuchM = 3e-3;
    private const double MuchOfWidth = 0.08;

    /// <summary>An edge rounder than this is dull before it has cut.</summary>
    private const double RoundM = 100e-6;

    private const string Tap = "It is as measured: record it";

    /// <summary>What cannot be after a grind.</summary>
    public static async Task Refuse(WriteSession w, Blade blade, BladeNow now, Ground g, string line)
    {
        var width = g.WidthM ?? now.WidthM;
        w.RefuseUnless(g.WidthM is null or > 0, $"{line}WidthM", "The width must be above zero.");
        w.RefuseUnless(g.GulletM is null || g.GulletM < width, $"{line}GulletM", "The gullet must be less deep than the blade is wide.");
        var gullet = g.GulletM ?? await LastGullet(w, blade) ?? blade.Spec.GulletDepthM;
        w.RefuseUnless(g.WidthM is null || g.GulletM is not null || gullet is null || gullet < width, $"{line}WidthM", $"{w.Say(width)} cannot be its width: its gullets are {w.Say(gullet ?? 0)} deep. It was {w.Say(now.WidthM)} wide.");
        var thickness = blade.MeasuredThicknessM ?? blade.Spec.ThicknessM;
        w.RefuseUnless(g.EdgeM is null or < RoundM, $"{line}EdgeAfterM", $"An edge of {g.EdgeM * 1e6:0} µm is dull before it has cut: a fresh one has 3 to 20 µm.");
        w.RefuseUnless(g.KerfM is null || g.KerfM > thickness, $"{line}KerfM", "The kerf must be wider than the body is thick.");
    }

    /// <summary>What is hardly so: one more tap records it.</summary>
    public static void Ask(WriteSession w, Blade blade, BladeNow now, Ground g, string line)
    {
        var thickness = blade.MeasuredThicknessM ?? blade.Spec.ThicknessM;
        if (g.WidthM > now.WidthM)
        {
            w.Ask($"{line}WidthM", $"{blade.Tag} was {w.Say(now.WidthM)} wide before; grinding does not make it wider.", Tap);
        }
        else if (g.WidthM < g.LeastM)
        {
            w.Ask($"{line}WidthM", $"{blade.Tag} was {w.Say(now.WidthM)} wide before and is {w.Say(g.WidthM.Value)} wide then; its least width is {w.Say(g.LeastM.Value)}. Retire it, or record it as it is: it is offered for no cut.", Tap);
        }
        else if (now.WidthM - g.WidthM is { } less && less > Math.Max(MuchM, MuchOfWidth * now.WidthM))
        {
            w.Ask($"{line}WidthM", $"{blade.Tag} was {w.Say(now.WidthM)} wide before: that is {w.Say(less)} less in one grind.", Tap);
        }

        if (g.KerfM > WideInBodies * thickness)
        {
            w.Ask($"{line}KerfM", $"That is a kerf of {w.Say(g.KerfM.Value)} by a body of {w.Say(thickness)}.", Tap);
        }
    }

    private static Task<double?> LastGullet(WriteSession w, Blade blade) => w.Db.Sharpenings.AsNoTracking()
        .Where(s => s.BladeId == blade.Id && s.GulletM != null && s.Entry.Void == null)
        .OrderByDescending(s => s.Entry.AtUtc).ThenByDescending(s => s.EntryId)
        .Select(s => s.GulletM).FirstOrDefaultAsync();
}

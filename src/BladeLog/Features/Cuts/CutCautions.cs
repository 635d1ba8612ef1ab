using BladeLog.Advice;
using BladeLog.Advice.Cuts;

namespace BladeLog.Features.Cuts;

/// <summary>One caution and where it is written.</summary>
public sealed record SaidCaution(string Sentence, string? Source);

/// <summary>Cautions where they belong: those of the choice, and those of the kind of work.</summary>
internal static class CutCautions
{
    private const double GrabbingHook = 25;

    public static IReadOnlyList<SaidCaution> Of(Choice c, ShopAdvice advice)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(advice);
        List<SaidCaution> said = [];
        if (c.Work.Cut.NailChance > 0)
        {
            said.Add(new($"{Said.Capital(CutWords.Nails())}. A nail strips teeth and can break the blade.", "common practice"));
        }

        if (c.Work.Cut.ClassWork)
        {
            string with = c.Cautions.Contains(CutWords.Supervisor()) ? $"On {c.Saw.Saw.Name} only with a supervisor. " : "";
            said.Add(new(with + "Nobody saws untrained.", "HSE, WIS31 (revision 1), training"));
        }

        if (c.Work.IsCurve(advice.Settings))
        {
            said.Add(new("Do not back out of a curve under power. Do not twist a wide blade round a tight curve: make relief cuts.", "WorkSafe New Zealand, band saws fact sheet"));
        }

        if (double.RadiansToDegrees(c.Blade.Body.Rake.Value) >= GrabbingHook || c.AtAdvised is { ThrustN: <= 0 })
        {
            said.Add(new("A hook this steep pulls itself in and grabs thin stock: hold the work back.", "Woodson 1979, USDA Forest Service SO-146"));
        }

        said.AddRange(c.Cautions
            .Where(s => s != CutWords.Nails() && s != CutWords.Supervisor())
            .Select(s => new SaidCaution(Said.Capital(s).TrimEnd('.') + ".", null)));
        return said;
    }
}

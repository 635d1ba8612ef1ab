using BladeLog.Advice;
using BladeLog.Advice.Cuts;
using BladeLog.Records;
using BladeLog.Ui.Forms;
using Choice = BladeLog.Advice.Cuts.Choice;

namespace BladeLog.Features.Workings;

/// <summary>The blade, saw and cut whose figures a working takes over: from <c>?blade=Q-09&amp;saw=S2&amp;cut=2</c>.</summary>
internal sealed class WorkingCase
{
    private readonly List<AskField> _picks = [];

    public BladeAdvice? Blade { get; private init; }

    public SawNow? Saw { get; private init; }

    public CutWork? Cut { get; private init; }

    public required ShopAdvice Advice { get; init; }

    public IReadOnlyList<AskField> Picks => _picks;

    public IEnumerable<Problem> Problems => _picks.Where(p => p.Error is not null).Select(p => new Problem(p.Name, p.Error!));

    public bool Any => Blade is not null || Saw is not null || Cut is not null;

    public AdviceSettings Settings => Advice.Settings;

    /// <summary>Tension of the blade on the saw; null where either is missing.</summary>
    public BladeTension? Tension => Blade is { } blade && Saw is { } saw ? blade.Body.TensionOn(saw.Setup, blade.File, Settings) : null;

    /// <summary>The blade in the cut on the saw as the choices reckon it; null where it is refused before, or one of the three is missing.</summary>
    public Choice? Choice => Cut is { } cut && Blade is { } blade && Saw is { } saw
        ? Advice.For(cut.Cut).Choices.FirstOrDefault(c => c.Gate is not null && c.Blade.File.Blade.Id == blade.File.Blade.Id && c.Saw.Saw.Id == saw.Saw.Id)
        : null;

    /// <summary>The speed the saw is run at for the cut, else its usual one.</summary>
    public Given Speed(double example) => Choice is { } c && c.SpeedMps != c.Saw.Setup.UsualSpeedMps
        ? new Given(c.SpeedMps, "speed chosen for the cut")
        : Given.Of(Saw?.Setup.UsualSpeedMps, "usual speed of the saw", example);

    /// <summary>"Q-09 on Osprey, cut 2".</summary>
    public string? Words
    {
        get
        {
            string blade = Blade is { } b ? b.File.Blade.Tag : "";
            string saw = Saw is { } s ? blade.Length > 0 ? $" on {s.Saw.Name}" : s.Saw.Name : "";
            string cut = Cut is { } c ? $"{(blade.Length + saw.Length > 0 ? ", " : "")}cut {c.Cut.Number}" : "";
            return Any ? blade + saw + cut : null;
        }
    }

    /// <summary>Why no life is told of this blade; null where it may be.</summary>
    public string? Held => Blade?.File.Hold is not null
        ? $"{Blade.File.Blade.Tag} is on hold. No life is told of a blade that may be cracked: look at it first."
        : null;

    public static WorkingCase Of(IQueryCollection query, ShopAdvice advice)
    {
        ShopNow now = advice.Now;
        string tag = query["blade"].ToString().Trim(), code = query["saw"].ToString().Trim(), number = query["cut"].ToString().Trim().TrimStart('#');
        BladeFile? file = tag.Length > 0 ? now.Blade(tag) : null;
        SawNow? asked = code.Length > 0 ? now.Saw(code) : null;
        QueuedCut? cut = int.TryParse(number, out int n) ? now.Cuts.FirstOrDefault(c => c.Number == n) : null;
        BladeAdvice? blade = file is null ? null : asked is null ? advice.Of(file) : advice.On(file, asked);
        WorkingCase found = new()
        {
            Advice = advice,
            Blade = blade,
            Saw = asked ?? (code.Length == 0 ? blade?.Record.On : null),
            Cut = cut is null ? null : CutWork.Of(cut, now.Shop, advice.Settings),
        };
        if (now.Blades.Count > 0)
        {
            found.Pick("blade", "Blade", tag, file?.Blade.Tag, "no blade: as typed", "No blade carries the tag",
                [.. now.Blades.OrderBy(b => b.Place == Place.Gone).ThenBy(b => b.Blade.Tag, StringComparer.Ordinal).Select(b => new Answer(b.Blade.Tag, b.Blade.Tag, b.Place == Place.Gone ? "gone" : null))]);
        }

        if (now.Saws.Count > 0)
        {
            found.Pick("saw", "Saw", code, asked?.Saw.Code, "the blade's own", "No saw has the code",
                [.. now.Saws.Select(s => new Answer(s.Saw.Code, s.Saw.Name))]);
        }

        if (now.Cuts.Count > 0)
        {
            found.Pick("cut", "Cut", number, cut?.Number.ToString(System.Globalization.CultureInfo.InvariantCulture), "no cut: as typed", "No cut has the number",
                [.. now.Cuts.OrderBy(c => c.Number).Select(c => new Answer(c.Number.ToString(System.Globalization.CultureInfo.InvariantCulture), $"{c.Number}", $"{c.Job}, {Said.Wood(c, advice.Words)}"))]);
        }

        return found;
    }

    private void Pick(string name, string label, string typed, string? found, string empty, string unknown, IReadOnlyList<Answer> answers) =>
        _picks.Add(new AskField(name, label, found ?? "", null, typed.Length > 0 && found is null ? $"{unknown} \"{(typed.Length > 40 ? typed[..40] : typed)}\". Choose one of the list." : null, answers, empty));
}

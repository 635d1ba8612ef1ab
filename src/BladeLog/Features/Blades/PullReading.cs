using BladeLog.Advice;
using BladeLog.Handbook.Band;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using Microsoft.EntityFrameworkCore;
using static BladeLog.Features.Shown;
using TensionReading = BladeLog.Handbook.Band.TensionReading;

namespace BladeLog.Features.Blades;

/// <summary>What a typed reading means: the stress on the body, the band it lies in, and what the saw can reach.</summary>
internal sealed class PullReading
{
    private readonly ShopUnits units;
    private readonly BladeBody body;

    private PullReading(TensionReading reading, TensionMethod method, string field, string typed, BladeBody body, ShopUnits units)
    {
        (Reading, Method, Field, Typed) = (reading, method, field, typed);
        (this.body, this.units) = (body, units);
    }

    public TensionReading Reading { get; }

    public TensionMethod Method { get; }

    /// <summary>The form's field the figure came from.</summary>
    public string Field { get; }

    /// <summary>As it was typed, for the record.</summary>
    public string Typed { get; }

    private Length Thickness => new(body.Thickness.Value);

    private Length Width => new(body.BodyWidth);

    /// <summary>Null where a figure is missing or cannot be; the sentences are in the reading of the form.</summary>
    public static PullReading? Of(PullForm form, FormReading read, BladeBody body, AdviceSettings settings, ShopUnits units)
    {
        if (Pull.Ways.All(w => w.How != form.How))
        {
            read.Refuse(nameof(form.How), "Say how it was measured.");
            return null;
        }

        var method = Pull.Ways.First(w => w.How == form.How).Method;
        Length t = new(body.Thickness.Value), b = new(body.BodyWidth);
        double Need(string field, double? value, string? text, string sentence) => read.Need(field, value, text, sentence);
        PullReading? Found(string field, string typed, Func<Stress> tension)
        {
            if (!read.IsGood)
            {
                return null;
            }

            try
            {
                var stress = tension();
                read.RefuseUnless(stress.Pascals > 0, field, "A slack blade has no tension to record.");
                return read.IsGood ? new PullReading(TensionReading.Of(stress, method), method, field, typed, body, units) : null;
            }
            catch (ArgumentOutOfRangeException wrong)
            {
                read.Refuse(field, wrong.Message.Split(" (Parameter")[0]);
                return null;
            }
        }

        switch (form.How)
        {
            case "gauge":
                var pa = Need(nameof(form.Tension), read.Stress(nameof(form.Tension), form.Tension), form.Tension, "Write what was measured, such as 120 MPa.");
                return Found(nameof(form.Tension), form.Tension?.Trim() ?? "", () => new Stress(pa));
            case "strand" or "wheel":
                var pull = new Force(Need(nameof(form.Force), read.Force(nameof(form.Force), form.Force), form.Force, "Write what the scale shows, such as 1400 N, 140 kg or 312 lbf."));
                return Found(nameof(form.Force), form.Force?.Trim() ?? "", () => form.How == "strand" ? Tension.FromStrandForce(pull, t, b) : Tension.FromWheelLoad(pull, t, b));
            case "stretch":
                var stretch = Need(nameof(form.Stretch), read.Length(nameof(form.Stretch), form.Stretch, Fields.Deflection), form.Stretch, "Write how far it stretched, such as 0.08 mm.");
                var over = Need(nameof(form.Over), read.Length(nameof(form.Over), form.Over, Fields.Board), form.Over, "Write over which length, such as 127 mm.");
                read.RefuseUnless(!read.IsGood || stretch < over / 100, nameof(form.Stretch), "No blade stretches by a hundredth of its length: look at the units.");
                return Found(nameof(form.Stretch), $"{form.Stretch?.Trim()} over {form.Over?.Trim()}", () => Tension.FromStretch(new Length(stretch), new Length(over), settings.Steel.YoungsModulus));
            default:
                var note = Need(nameof(form.Note), read.Number(nameof(form.Note), form.Note, "a note such as 92"), form.Note, "Write the note in Hz, such as 92.");
                var span = Need(nameof(form.Span), read.Length(nameof(form.Span), form.Span, Fields.Board), form.Span, "Write the free span between the wheels, such as 600 mm.");
                return Found(
                    nameof(form.Note), $"{form.Note?.Trim()} Hz over {form.Span?.Trim()}",
                    () => Tension.FromPluck(new Frequency(note), new Length(span), t, b, new Length(body.Gullet.Value), settings.Steel));
        }
    }

    /// <summary>The pull it means and the saw's greatest, where it is more than that even at the low end of its band.</summary>
    public (string Pull, string Most)? Over(SawSetup setup)
    {
        var low = Tension.StrandForce(Reading.Low, Thickness, Width);
        return setup.StrandForceMostN is { } most && low.Newtons > most
            ? (units.Show(Tension.StrandForce(Reading.Value, Thickness, Width)), units.Show(new Force(most)))
            : null;
    }

    /// <summary>The last reading of this blade, as each way of measuring would have it.</summary>
    public static async Task<IReadOnlyDictionary<string, string?>> LastTime(ShopDb db, PullForm form, BladeFormModel<PullForm> model, AdviceSettings settings)
    {
        var (body, units) = (model.Advice.Body, model.Units);
        Length t = new(body.Thickness.Value), b = new(body.BodyWidth);
        string? Load(double? pascals) => pascals is { } pa
            ? units.BareForce((form.How == "wheel" ? 2 : 1) * Tension.StrandForce(new Stress(pa), t, b).Newtons)
            : null;
        var readings = db.TensionReadings.AsNoTracking().Where(r => r.BladeId == model.File.Blade.Id).OrderByDescending(r => r.Entry.AtUtc).ThenByDescending(r => r.EntryId);
        var last = await readings.Select(r => (double?)r.TensionPa).FirstOrDefaultAsync();
        var lasts = new Dictionary<string, string?>
        {
            [nameof(form.Tension)] = units.BareStress(last),
            [nameof(form.Force)] = Load(last),
            ["FromForce"] = Load(body.TargetPa),
        };
        if (form.How is "stretch" or "pluck" && await readings.FirstOrDefaultAsync(r => r.How == form.How) is { } same
            && same.Typed.Split(" over ") is [var figure, var length])
        {
            figure = figure.Replace(" Hz", "", StringComparison.Ordinal);
            PullForm again = form.How == "stretch" ? new() { How = form.How, Stretch = figure, Over = length } : new() { How = form.How, Note = figure, Span = length };

            // Typed while the shop measured in other units, or before the blade was ground, it would now mean another tension.
            if (Of(again, new FormReading(units, model.Now), body, settings, units) is { } read && Math.Abs(read.Reading.Value.Pascals / same.TensionPa - 1) < 0.1)
            {
                (lasts[nameof(form.Stretch)], lasts[nameof(form.Over)], lasts[nameof(form.Note)], lasts[nameof(form.Span)]) = (again.Stretch, again.Over, again.Note, again.Span);
            }
        }

        return lasts;
    }

    public IReadOnlyList<BecauseLine> Lines(SawNow? saw, BladeBody of)
    {
        Shown shown = new(units);
        var strand = Tension.StrandForce(Reading.Value, Thickness, Width);
        List<BecauseLine> lines =
        [
            Line($"{Said.Capital(units.PullName)} on the body", shown.StressText(Reading.Value.Pascals), $"on {units.Show(Width, Fields.BladeWidth)} by {units.Show(Thickness, Fields.Thickness)}: width less gullets, by thickness; the teeth carry nothing", Method == TensionMethod.Pluck ? "fletcher-rossing" : "derived", Method == TensionMethod.Pluck ? Provenance.FromMemory : Provenance.Derived),
            Line("The true one lies between", $"{shown.StressText(Reading.Low.Pascals)} and {shown.StressText(Reading.High.Pascals)}", $"give or take {Tension.Uncertainty(Method) * 100:0} of 100", "engineering-default", Provenance.EngineeringDefault),
            Line("Pull in one strand", shown.ForceText(strand.Newtons), $"{units.PullName} times that section", "derived", Provenance.Derived),
            Line("Load on the wheel", shown.ForceText(2 * strand.Newtons), "two strands pull on it", "derived", Provenance.Derived),
        ];
        if (saw?.Setup.StrandForceMostN is { } most)
        {
            var reach = Tension.FromStrandForce(new Force(most), Thickness, Width);
            lines.Add(Line($"{saw.Saw.Name} can reach", $"{shown.StressText(reach.Pascals)}; this is {Wording.Number(100 * strand.Newtons / most, 0)} of 100 of it", "its greatest pull in one strand over that section", "derived", Provenance.Derived));
        }

        if (of.TargetPa is { } target)
        {
            lines.Add(Line("Its specification wants", shown.StressText(target), Reading.Low.Pascals > target ? "this is more" : Reading.High.Pascals < target ? "this is less" : "which lies inside that band", "derived", Provenance.Yours));
        }

        return lines;
    }
}

using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Blades;

/// <summary>The figures of a specification as a form holds them. What is left empty is a default of the handbook, and marked so.</summary>
public abstract record SpecFields : PostedForm
{
    public string? Code { get; init; }

    public string? Width { get; init; }

    public string? Thickness { get; init; }

    public string? Pitch { get; init; }

    public string? NewLoop { get; init; }

    public string? ToothForm { get; init; }

    public string? TipKind { get; init; }

    public string? TipMaterial { get; init; }

    public string? BodySteel { get; init; }

    public string? BodyHrc { get; init; }

    public string? Rake { get; init; }

    public string? GulletDepth { get; init; }

    public string? GulletArea { get; init; }

    public string? SetPattern { get; init; }

    public string? Kerf { get; init; }

    public string? Tension { get; init; }

    public string? LeastWidth { get; init; }

    public string? SharpeningPrice { get; init; }

    public string? MostSharpenings { get; init; }

    public string? Price { get; init; }

    public string? LeastStock { get; init; }
}

internal static class SpecReading
{
    public static Spec Read(SpecFields form, FormReading read)
    {
        double Need(string field, double? value, string? text, string sentence) => read.Need(field, value, text, sentence);
        var pitch = read.Pitch(nameof(form.Pitch), form.Pitch);
        read.Need(nameof(form.Pitch), pitch, form.Pitch, "Write the tooth pitch, such as 3 TPI or 8.5 mm.");
        var width = Need(nameof(form.Width), read.Length(nameof(form.Width), form.Width, Fields.BladeWidth), form.Width, "Write how wide it is.");
        var thickness = Need(nameof(form.Thickness), read.Length(nameof(form.Thickness), form.Thickness, Fields.Thickness), form.Thickness, "Write how thick its body is.");
        var tooth = read.Choice<ToothForm>(nameof(form.ToothForm), form.ToothForm, "Say which tooth form it has.") ?? default;
        var tip = read.Choice<TipKind>(nameof(form.TipKind), form.TipKind, "Say how the teeth clear the body.") ?? default;
        var teeth = read.Choice<TipMaterial>(nameof(form.TipMaterial), form.TipMaterial, "Say what the teeth are made of.") ?? default;
        return new Spec
        {
            Code = string.IsNullOrWhiteSpace(form.Code) ? AutoCode(width, thickness, pitch, tooth) : form.Code.Trim(),
            WidthM = width,
            WidthTyped = form.Width?.Trim(),
            ThicknessM = thickness,
            ThicknessTyped = form.Thickness?.Trim(),
            PitchCoarseM = pitch?.Coarse.Metres ?? 0,
            PitchFineM = pitch?.Fine.Metres ?? 0,
            PitchTyped = form.Pitch?.Trim(),
            ToothForm = tooth,
            TipKind = tip,
            SetPattern = tip == Handbook.Quantities.TipKind.Set ? read.Choice<SetPattern>(nameof(form.SetPattern), form.SetPattern, null) ?? SetPattern.Alternate : SetPattern.None,
            TipMaterial = teeth,
            BodySteel = read.Choice<BodySteel>(nameof(form.BodySteel), form.BodySteel, null) ?? UsualBody(teeth),
            BodyHrc = read.Number(nameof(form.BodyHrc), form.BodyHrc, "a hardness such as 46"),
            RakeRad = read.Angle(nameof(form.Rake), form.Rake, Fields.Hook),
            GulletDepthM = read.Length(nameof(form.GulletDepth), form.GulletDepth, Fields.GulletDepth),
            GulletAreaM2 = Area(read, form),
            KerfM = read.Length(nameof(form.Kerf), form.Kerf, Fields.Kerf),
            KerfTyped = form.Kerf?.Trim(),
            NewLoopM = read.Length(nameof(form.NewLoop), form.NewLoop, Fields.Loop),
            NewLoopTyped = form.NewLoop?.Trim(),
            TensionPa = read.Stress(nameof(form.Tension), form.Tension),
            TensionTyped = form.Tension?.Trim(),
            LeastWidthM = read.Length(nameof(form.LeastWidth), form.LeastWidth, Fields.BladeWidth),
            SharpeningPriceMinor = read.Money(nameof(form.SharpeningPrice), form.SharpeningPrice),
            MostSharpenings = (int?)read.Count(nameof(form.MostSharpenings), form.MostSharpenings),
            PriceMinor = read.Money(nameof(form.Price), form.Price),
            LeastStock = (int?)read.Count(nameof(form.LeastStock), form.LeastStock, Fields.Stock),
        };
    }

    /// <summary>In mm², as it is counted on squared paper.</summary>
    private static double? Area(FormReading read, SpecFields form)
    {
        double? area = read.Number(nameof(form.GulletArea), form.GulletArea, "an area in mm² such as 18");
        if (area is < 0.1 or > 5000)
        {
            read.Refuse(nameof(form.GulletArea), $"{form.GulletArea!.Trim()} mm² is no area of a gullet. It lies between 0.1 and 5,000 mm².");
        }

        return area * 1e-6;
    }

    /// <summary>The form's field for a field of the specification.</summary>
    public static string FieldOf(string field) => field == nameof(Spec.GulletAreaM2) ? nameof(SpecFields.GulletArea) : field.EndsWith('M') ? field[..^1] switch { "PitchFine" or "PitchCoarse" => "Pitch", var f => f } : field;

    private static BodySteel UsualBody(TipMaterial teeth) => teeth switch
    {
        TipMaterial.Bimetal => BodySteel.Bimetal,
        TipMaterial.Carbide => BodySteel.CarbideTipped,
        TipMaterial.HardenedCarbon => BodySteel.FlexibleBack,
        _ => BodySteel.WideStrip,
    };

    private static string AutoCode(double width, double thickness, ToothPitch? pitch, ToothForm form) =>
        string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{width * 1e3:0.#}x{thickness * 1e3:0.###}x{(pitch?.Mean.Metres ?? 0) * 1e3:0.##} {form.ToString().ToLowerInvariant()}");
}

using BladeLog.Handbook.Quantities;
using BladeLog.Ui.Forms;

namespace BladeLog.Features.Blades;

/// <summary>The answers a specification's form offers.</summary>
internal static class SpecAnswers
{
    public static IReadOnlyList<Answer> Forms { get; } = [new(nameof(ToothForm.Hook), "Hook"), new(nameof(ToothForm.Skip), "Skip"), new(nameof(ToothForm.Regular), "Regular")];

    public static IReadOnlyList<Answer> Tips { get; } = [new(nameof(TipKind.Set), "Set", "bent left and right"), new(nameof(TipKind.Swaged), "Swaged", "upset wider"), new(nameof(TipKind.Tipped), "Tipped", "brazed or welded on")];

    public static IReadOnlyList<Answer> Patterns { get; } = [new(nameof(SetPattern.Alternate), "Left, right"), new(nameof(SetPattern.Raker), "Raker", "left, right, straight")];

    public static IReadOnlyList<Answer> Materials { get; } =
    [
        new(nameof(TipMaterial.HardenedCarbon), "Carbon steel, hardened tips"),
        new(nameof(TipMaterial.Bimetal), "Bi-metal"),
        new(nameof(TipMaterial.Carbide), "Carbide"),
        new(nameof(TipMaterial.CobaltAlloy), "Cobalt alloy"),
        new(nameof(TipMaterial.PlainSteel), "Plain saw steel"),
    ];

    public static IReadOnlyList<Answer> Bodies { get; } =
    [
        new(nameof(BodySteel.FlexibleBack), "Flexible back"),
        new(nameof(BodySteel.SpringTempered), "Spring-tempered"),
        new(nameof(BodySteel.Bimetal), "Bi-metal back"),
        new(nameof(BodySteel.CarbideTipped), "Carbide-tipped back"),
        new(nameof(BodySteel.WideStrip), "Wide strip"),
    ];
}

using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Saws;

/// <summary>A form on one saw, as its page is given it.</summary>
public sealed record SawFormModel<TForm>(TForm Form, FormState State, SawNow Saw, BladeFile? On, ShopUnits Units, DateTime Now)
    where TForm : PostedForm
{
    public string Code => Saw.Saw.Code;

    public string Name => Saw.Saw.Name;

    public string? Tag => On?.Blade.Tag;

    /// <summary>Who is at this tablet; null: nobody has said.</summary>
    public string? Who { get; init; }

    public IReadOnlyList<string> People { get; init; } = [];

    /// <summary>What this form says of how the saw stood before: the last reading, the last speed.</summary>
    public string? Hint { get; init; }

    /// <summary>The last reading as it is typed, to step up from.</summary>
    public string? Last { get; init; }
}

internal static class SawForm
{
    public static async Task<IResult> Show<TView, TForm>(Desk desk, string code, TForm form, FormState state, string? hint = null, string? last = null)
        where TView : View<SawFormModel<TForm>>
        where TForm : PostedForm
    {
        var shop = await desk.Shop();
        return shop.Saw(code) is { } saw
            ? await desk.Page<TView, SawFormModel<TForm>>(
                new(form, state, saw, shop.Blades.FirstOrDefault(b => b.Blade.Id == saw.MountedBladeId), await desk.Units(), desk.Now)
                {
                    Hint = hint,
                    Last = last,
                    Who = (await desk.Who())?.Initials,
                    People = await Swap.Initials(desk),
                },
                state.Status)
            : Results.NotFound();
    }
}

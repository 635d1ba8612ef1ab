using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record KerfForm : PostedForm
{
    public string? How { get; init; }

    public string? Kerf { get; init; }

    public string? SetLeft { get; init; }

    public string? SetRight { get; init; }

    public string? SetBoth { get; init; }

    public string? Note { get; init; }

    public string? At { get; init; }

    public string? WideMeant { get; init; }
}

/// <summary>Kerf and set as measured between sharpenings: what the blade really cuts, and whether its sides agree.</summary>
internal static class Kerf
{
    /// <summary>Both sides typed and their sum typed may differ by what a gauge reads.</summary>
    private const double Agrees = 0.02e-3;

    public static Task<IResult> Get(Desk desk, string tag) => Show(desk, tag, new KerfForm(), FormState.New);

    public static async Task<IResult> Post([FromForm] KerfForm? form, Desk desk, string tag)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Blade(Tags.Read(tag)) is not { } blade)
        {
            return Results.NotFound();
        }

        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var how = read.Choice<KerfHow>(nameof(form.How), form.How, "Say how it was measured.");
        var kerf = read.Length(nameof(form.Kerf), form.Kerf, Fields.Kerf);
        var left = read.Length(nameof(form.SetLeft), form.SetLeft, Fields.Set);
        var right = read.Length(nameof(form.SetRight), form.SetRight, Fields.Set);
        var both = read.Length(nameof(form.SetBoth), form.SetBoth, Fields.Set);
        Check(form, read, how);
        read.RefuseUnless(
            left is not { } l || right is not { } r || both is not { } sum || Math.Abs(l + r - sum) <= Agrees, nameof(form.SetBoth),
            $"Left and right together are {units.Show(new Length((left ?? 0) + (right ?? 0)), Fields.Set)}. Leave this empty, or put it right.");
        var on = shop.Saws.FirstOrDefault(s => s.MountedBladeId == blade.Blade.Id);
        var command = new RecordKerf(tag, how ?? default)
        {
            Saw = how == KerfHow.TestCut ? on?.Saw.Code : null,
            KerfM = kerf,
            KerfTyped = form.Kerf?.Trim(),
            SetLeftM = left,
            SetRightM = right,
            SetBothM = both,
            SetTyped = string.IsNullOrWhiteSpace(form.SetLeft) ? form.SetBoth?.Trim() : $"{form.SetLeft.Trim()}; {form.SetRight?.Trim()}",
            Note = form.Note,
            At = read.Time(nameof(form.At), form.At),
            WideMeant = form.WideMeant is not null,
        };
        return read.IsGood
            ? await desk.Send(command, form, BladeForm.Of(tag), $"Kerf of {Tags.Read(tag)}", state => Show(desk, tag, form, state))
            : await Show(desk, tag, form, read.State);
    }

    /// <summary>What the way of measuring asks for, and what it cannot tell.</summary>
    private static void Check(KerfForm form, FormReading read, KerfHow? how)
    {
        static bool Empty(string? text) => string.IsNullOrWhiteSpace(text);
        if (how == KerfHow.DialGauge)
        {
            read.RefuseUnless(Empty(form.Kerf), nameof(form.Kerf), "A gauge on single teeth tells the set. Say how the kerf was measured, or leave it empty.");
            read.RefuseUnless(!Empty(form.SetLeft + form.SetRight + form.SetBoth), nameof(form.SetLeft), "Write the set of each side, or of both together.");
        }
        else if (how is not null)
        {
            read.RefuseUnless(!Empty(form.Kerf), nameof(form.Kerf), how == KerfHow.TestCut ? "Write how wide the slot is." : "Write the width over the teeth.");
        }

        const string Other = "Write this side too, or both together.";
        read.RefuseUnless(!Empty(form.SetLeft) || Empty(form.SetRight), nameof(form.SetLeft), Other);
        read.RefuseUnless(!Empty(form.SetRight) || Empty(form.SetLeft), nameof(form.SetRight), Other);
    }

    private static Task<IResult> Show(Desk desk, string tag, KerfForm form, FormState state) =>
        BladeForm.Show<KerfPage, KerfForm>(desk, tag, form, state);
}

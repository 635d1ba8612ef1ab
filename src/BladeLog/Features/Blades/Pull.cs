using BladeLog.Handbook.Band;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;

namespace BladeLog.Features.Blades;

public sealed record PullForm : PostedForm
{
    public string? Saw { get; init; }

    /// <summary>gauge, strand, wheel, stretch or pluck.</summary>
    public string? How { get; init; }

    /// <summary>A gauge that shows the stress itself.</summary>
    public string? Tension { get; init; }

    public string? Force { get; init; }

    public string? Stretch { get; init; }

    public string? Over { get; init; }

    public string? Note { get; init; }

    public string? Span { get; init; }

    public string? At { get; init; }

    /// <summary>Only work it out; nothing is recorded.</summary>
    public string? Reckon { get; init; }

    /// <summary>One more tap: more than the saw pulls, and meant.</summary>
    public string? OverMeant { get; init; }
}

/// <summary>The pull as somebody measured it, by whatever is at hand, as a stress on the body section.</summary>
internal static class Pull
{
    /// <summary>Ways to measure, by the word kept with the reading.</summary>
    public static IReadOnlyList<(string How, string Words, TensionMethod Method)> Ways { get; } =
    [
        ("gauge", "Gauge that shows stress", TensionMethod.Stretch),
        ("strand", "Pull in one strand", TensionMethod.StrandForce),
        ("wheel", "Load on the wheel", TensionMethod.WheelLoad),
        ("stretch", "Stretch over a length", TensionMethod.Stretch),
        ("pluck", "Plucked, by its note", TensionMethod.Pluck),
    ];

    public static Task<IResult> Get(Desk desk, string tag, string? how) =>
        Show(desk, tag, new PullForm { How = Ways.Any(w => w.How == how) ? how : Ways[0].How }, FormState.New);

    public static async Task<IResult> Post([FromForm] PullForm? form, Desk desk, string tag)
    {
        form ??= new();
        var shop = await desk.Shop();
        if (shop.Blade(Tags.Read(tag)) is not { } blade)
        {
            return Results.NotFound();
        }

        var advice = await desk.Advice();
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        var saw = Saw(shop, blade, form);
        read.RefuseUnless(saw is not null, nameof(form.Saw), "Say on which saw it was measured.");
        var found = PullReading.Of(form, read, advice.Of(blade).Body, advice.Settings, units);
        var at = read.Time(nameof(form.At), form.At);
        if (!read.IsGood || found is null)
        {
            return await Show(desk, tag, form, read.State);
        }

        if (form.Reckon is not null)
        {
            return await Show(desk, tag, form, FormState.New);
        }

        if (found.Over(saw!.Setup) is { } over && form.OverMeant is null)
        {
            read.Refuse(found.Field, $"That is {over.Pull} in one strand, and {saw.Saw.Name} pulls {over.Most} at most. Is it the load on the wheel, which is twice as much?");
            return await Show(desk, tag, form, read.State with { OneMoreTap = "It was measured so: record it", Title = "Not recorded yet" });
        }

        var command = new RecordTension(saw.Saw.Code, tag, found.Reading.Value.Pascals, found.Typed, form.How!, at);
        return await desk.Send(command, form, BladeForm.Of(tag), $"Reading of {Tags.Read(tag)}", state => Show(desk, tag, form, state));
    }

    private static SawNow? Saw(ShopNow shop, BladeFile blade, PullForm form) =>
        shop.Saws.FirstOrDefault(s => s.Saw.Id == blade.SawId) ?? shop.Saws.FirstOrDefault(s => s.Saw.Code == form.Saw);

    private static Task<IResult> Show(Desk desk, string tag, PullForm form, FormState state) =>
        BladeForm.Show<PullPage, PullForm>(desk, tag, form, state, async model =>
        {
            var shop = await desk.Shop();
            var settings = (await desk.Advice()).Settings;
            var found = PullReading.Of(form, new FormReading(model.Units, desk.Now), model.Advice.Body, settings, model.Units);
            return model with
            {
                Names = [.. shop.Saws.Select(s => s.Saw.Code)],
                LastTime = await PullReading.LastTime(desk.Db, form, model, settings),
                Lines = found?.Lines(Saw(shop, model.File, form), model.Advice.Body) ?? [],
            };
        });
}

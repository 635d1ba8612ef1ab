using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using BladeLog.Handbook.Units;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Blades;

public sealed record NewBladeForm : SpecFields
{
    /// <summary>The line printed on the blade.</summary>
    public string? Print { get; init; }

    /// <summary>A specification the shop has; empty: a new one.</summary>
    public string? Spec { get; init; }

    public string? Tags { get; init; }

    public string? Folded { get; init; }

    public string? InspectEvery { get; init; }

    public string? InspectEachMount { get; init; }

    /// <summary>Bought or found used, and nobody knows how much.</summary>
    public string? Used { get; init; }

    /// <summary>Used before this record began, from and to.</summary>
    public string? UsedLow { get; init; }

    public string? UsedHigh { get; init; }

    public string? Source { get; init; }
}

public sealed record NewBladeModel(NewBladeForm Form, FormState State, IReadOnlyList<Spec> Specs, ShopUnits Units)
{
    /// <summary>The loops the saws here take, so that none is measured at a blade that was never right.</summary>
    public IReadOnlyList<(string Loop, string Saws)> Loops { get; init; } = [];
}

/// <summary>Blades new to the record: by the line printed on them, or by a specification the shop has.</summary>
internal static class NewBlade
{
    /// <summary>Life used of a blade of which nobody knows anything: engineering defaults.</summary>
    public const double UnknownLow = 0.2, UnknownHigh = 0.6;

    public static Task<IResult> Get(Desk desk, string? spec) => Show(desk, new NewBladeForm { Spec = spec }, FormState.New);

    public static async Task<IResult> Post([FromForm] NewBladeForm? form, Desk desk)
    {
        form ??= new();
        var units = await desk.Units();
        var read = new FormReading(units, desk.Now);
        form = FormFromPrint(form, read, units) with { Op = FormFlow.Op(form.Op) };
        var known = await desk.Db.Specs.AsNoTracking().FirstOrDefaultAsync(s => s.Code == form.Spec);
        read.RefuseUnless(string.IsNullOrEmpty(form.Spec) || known is not null, nameof(form.Spec), $"There is no specification {form.Spec}.");
        var spec = known ?? SpecReading.Read(form, read);
        var tags = (form.Tags ?? "").Split([' ', ',', ';', '\n', '\r'], StringSplitOptions.RemoveEmptyEntries).Select(Records.Tags.Read).ToList();
        await CheckTags(desk, form, read, tags);
        var every = read.Duration(nameof(form.InspectEvery), form.InspectEvery, Fields.RunHours);
        var (low, high) = (read.Number(nameof(form.UsedLow), form.UsedLow, "a part such as 0.2"), read.Number(nameof(form.UsedHigh), form.UsedHigh, "a part such as 0.6"));
        if (form.Used is not null && string.IsNullOrWhiteSpace(form.UsedLow) && string.IsNullOrWhiteSpace(form.UsedHigh))
        {
            (low, high) = (UnknownLow, UnknownHigh);
        }

        read.RefuseUnless(high is not 0, nameof(form.UsedHigh), "A used blade has used something of its life: write more than 0.");
        read.RefuseUnless(low is null == high is null, nameof(form.UsedHigh), "Write both: used at least, and at most.");
        read.RefuseUnless(low is null || (low >= 0 && low <= high && high <= 2), nameof(form.UsedHigh), "From 0 to 2, the lower one first; 1 is where half of such blades have broken.");
        if (!read.IsGood)
        {
            return await Show(desk, form, read.State);
        }

        if (known is null && await WriteSpec(desk, form, spec) is { } refused)
        {
            return refused;
        }

        if (low is { } from && high is { } to)
        {
            return await WithPriorUse(desk, form, spec.Code, tags, every, from, to);
        }

        return await desk.Send(Blades(form, spec.Code, tags, every), form, Leads(tags), "Blades added", state => Show(desk, form, state), canUndo: false);
    }

    private static AddBlades Blades(NewBladeForm form, string spec, IReadOnlyList<string> tags, TimeSpan? every) => new(spec, tags)
    {
        Folded = form.Folded is not null,
        InspectEveryH = every?.TotalHours,
        InspectEachMount = form.InspectEachMount is not null,
    };

    private static string Leads(List<string> tags) => tags.Count == 1 ? BladeForm.Of(tags[0]) : "/rack?show=new";

    /// <summary>The blades first, then what is told of their use; each with an op made from the form's, so that a resent form adds nothing.</summary>
    private static async Task<IResult> WithPriorUse(Desk desk, NewBladeForm form, string spec, List<string> tags, TimeSpan? every, double low, double high)
    {
        var added = await desk.Write(Blades(form, spec, tags, every), form.Op, Leads(tags));
        if (added is not WriteResult.Done)
        {
            return await desk.Send(Blades(form, spec, tags, every), form, Leads(tags), "Blades added", state => Show(desk, form, state), canUndo: false);
        }

        foreach (var tag in tags.SkipLast(1))
        {
            await desk.Write(new RecordPriorUse(tag, low, high, Source: form.Source?.Trim()), Derived(form.Op!, tag), Leads(tags));
        }

        return await desk.Send(
            new RecordPriorUse(tags[^1], low, high, Source: form.Source?.Trim()), form with { Op = Derived(form.Op!, tags[^1]) }, Leads(tags), "Blades added",
            state => Show(desk, form, state), canUndo: false);
    }

    private static async Task<IResult?> WriteSpec(Desk desk, NewBladeForm form, Spec spec) =>
        await desk.Write(new AddSpec(spec), Derived(form.Op!, "spec"), "/stock") is WriteResult.Refused refused
            ? await Show(desk, form, new FormState([.. refused.Problems.Select(p => new Ui.Forms.Problem(SpecReading.FieldOf(p.Field), p.Sentence))], Status: 422))
            : null;

    /// <summary>Looked at before anything is written, unless this form has been recorded already.</summary>
    private static async Task CheckTags(Desk desk, NewBladeForm form, FormReading read, List<string> tags)
    {
        read.RefuseUnless(tags.Count > 0, nameof(form.Tags), "Give each blade a tag.");
        read.RefuseUnless(tags.Distinct().Count() == tags.Count, nameof(form.Tags), "The same tag is there twice.");
        var op = Guid.Parse(form.Op!);
        if (await desk.Db.Entries.AnyAsync(e => e.Op == op))
        {
            return;
        }

        foreach (var tag in tags)
        {
            var used = await desk.Db.TagsUsed.AsNoTracking().AnyAsync(t => t.Tag == tag);
            var why = Records.Tags.Refusal(tag) ?? (used ? $"There is, or was, a blade {tag}: a tag is never used again." : null);
            read.RefuseUnless(why is null, nameof(form.Tags), why ?? "");
        }
    }

    private static NewBladeForm FormFromPrint(NewBladeForm form, FormReading read, ShopUnits units)
    {
        if (string.IsNullOrWhiteSpace(form.Print) || !string.IsNullOrEmpty(form.Spec))
        {
            return form;
        }

        var print = units.ReadBladePrint(form.Print);
        if (!print.IsGood)
        {
            read.Refuse(nameof(form.Print), print.Problem!);
            return form;
        }

        // The figures go on as exact as they were printed, so that 3 TPI stays 3 TPI.
        string Exactly(double metres) => units.Units == UnitSystem.Inch
            ? string.Create(CultureInfo.InvariantCulture, $"{metres / Exact.Inch:0.######} in")
            : string.Create(CultureInfo.InvariantCulture, $"{metres * 1e3:0.######} mm");
        string Teeth(ToothPitch pitch) => pitch.IsVariable
            ? string.Create(CultureInfo.InvariantCulture, $"{Exact.Inch / pitch.Coarse.Metres:0.######}-{Exact.Inch / pitch.Fine.Metres:0.######} TPI")
            : string.Create(CultureInfo.InvariantCulture, $"{Exact.Inch / pitch.Coarse.Metres:0.############} TPI");
        string? Or(string? typed, string? printed) => string.IsNullOrWhiteSpace(typed) ? printed : typed;
        return form with
        {
            Width = Or(form.Width, print.Value.Width is { } w ? Exactly(w.Metres) : null),
            Thickness = Or(form.Thickness, print.Value.Thickness is { } t ? Exactly(t.Metres) : null),
            Pitch = Or(form.Pitch, print.Value.Pitch is { } p ? Teeth(p) : null),
            NewLoop = Or(form.NewLoop, print.Value.Loop is { } l ? Exactly(l.Metres) : null),
        };
    }

    private static string Derived(string op, string part) =>
        new Guid(SHA256.HashData(Encoding.UTF8.GetBytes($"{op}/{part}")).AsSpan(0, 16)).ToString();

    private static async Task<IResult> Show(Desk desk, NewBladeForm form, FormState state)
    {
        var units = await desk.Units();
        var loops = (await desk.Shop()).Saws.Where(s => s.Saw.Active).GroupBy(s => s.Setup.LoopM).OrderBy(g => g.Key)
            .Select(g => (units.Show(new Handbook.Quantities.Length(g.Key), Fields.Loop), string.Join(", ", g.Select(s => s.Saw.Name))));
        return await desk.Page<NewBladePage, NewBladeModel>(
            new(form, state, await desk.Db.Specs.AsNoTracking().OrderBy(s => s.Code).ToListAsync(), units) { Loops = [.. loops] }, state.Status);
    }
}

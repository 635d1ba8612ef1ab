using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Records;
using BladeLog.Records.Writing;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;

namespace BladeLog.Features.Shift;

public sealed record HandOverForm : PostedForm
{
    public string? Text { get; init; }
}

/// <summary>A note of a shift before.</summary>
public sealed record ShiftNote(int EntryId, string When, string Who, IReadOnlyList<string> Lines, IReadOnlyList<string> ReadBy, bool MayTick);

public sealed record HandOverModel(HandOverForm Form, FormState State, IReadOnlyList<ShiftNote> Notes, IReadOnlyList<string> People, string? Who);

/// <summary>What the next shift must know: drafted from what stands, changed by hand, ticked by who has read it.</summary>
internal static class HandOverPages
{
    private const int Shown = 12;

    public static void Map(WebApplication app)
    {
        app.MapGet("/handover", (Desk desk) => Show(desk, new HandOverForm(), FormState.New));
        app.MapPost("/handover", Save);
        app.MapPost("/handover/{entry:int}/read", Read);
    }

    private static async Task<IResult> Save([FromForm] HandOverForm? form, Desk desk)
    {
        form ??= new();
        return await desk.Send(
            new SaveHandOver(form.Text ?? ""), form, "/handover", "Hand-over note", state => Show(desk, form, state));
    }

    private static async Task<IResult> Read([FromForm] HandOverForm? form, Desk desk, int entry)
    {
        form ??= new();
        return await desk.Send(
            new ReadHandOver(entry), form, "/handover", "Note read", state => Show(desk, new HandOverForm { Who = form.Who }, state));
    }

    private static async Task<IResult> Show(Desk desk, HandOverForm form, FormState state)
    {
        var db = desk.Db;
        var units = await desk.Units();
        var who = await desk.Who();
        var notes = await Past.Standing(db.HandOvers).Reverse().Take(Shown).ToListAsync();
        var ids = notes.Select(n => n.EntryId).ToList();
        var reads = (await Past.Standing(db.HandOversRead.Where(r => ids.Contains(r.HandOverId))).ToListAsync()).ToLookup(r => r.HandOverId);
        var rows = notes.ConvertAll(n => new ShiftNote(
            n.EntryId,
            Said.When(n.Entry.AtUtc, desk.Now, units),
            n.Entry.Person?.Initials ?? "somebody",
            n.Text.Split('\n', StringSplitOptions.RemoveEmptyEntries),
            [.. reads[n.EntryId].Select(r => r.Entry.Person?.Initials ?? "somebody")],
            who is null || (n.Entry.PersonId != who.Id && !reads[n.EntryId].Any(r => r.Entry.PersonId == who.Id))));
        var people = await db.People.AsNoTracking().Where(p => p.Active).OrderBy(p => p.Initials).Select(p => p.Initials).ToListAsync();
        var draft = form.Text ?? string.Join('\n', Draft(await desk.Advice(), await Orders(desk)));
        return await desk.Page<HandOverPage, HandOverModel>(
            new(form with { Text = draft }, state, rows, people, who?.Initials), state.Status);
    }

    /// <summary>One line for each thing the next shift would ask; nothing to tell is told too.</summary>
    internal static IReadOnlyList<string> Draft(ShopAdvice advice, IReadOnlyList<string> orders)
    {
        var here = advice.Now.Blades.Where(b => b.Place is not (Place.Gone or Place.AtSharpener)).OrderBy(b => b.Blade.Tag, NaturalOrder.Instance).Select(advice.Of)
            .Where(b => b.State is not (BladeState.Broken or BladeState.Retired)).ToList();
        List<string> lines = [.. here.Where(b => b.File.Hold is not null).Select(b => $"Hold: {b.File.Blade.Tag}, {LifeWords.HoldReason(b.File.Hold!, advice.Words) ?? "no reason told"}{Where(b.File, advice.Now)}.")];
        void Say(string what, IEnumerable<string> things)
        {
            string[] all = [.. things];
            if (all.Length > 0)
            {
                lines.Add($"{what}: {string.Join(", ", all)}.");
            }
        }

        var free = here.Where(b => b.File.Hold is null).ToList();
        bool Dull(BladeAdvice b) => b.State == BladeState.Sharpen;
        Say("To sharpen", free.Where(b => Dull(b) && b.Grind.Pays).Select(b => b.File.Blade.Tag + Where(b.File, advice.Now)));
        Say("Dull, no further grind", free.Where(b => Dull(b) && !b.Grind.Pays).Select(b => b.File.Blade.Tag + Where(b.File, advice.Now)));
        Say("To look at", free.Where(b => !Dull(b) && (b.InspectionOverdue || b.State == BladeState.Look)).Select(b => b.File.Blade.Tag + Where(b.File, advice.Now)));
        Say(advice.Words.Tension == "strain" ? "Strain off" : "Tension off", advice.Now.Saws.Where(s => s.Slack).Select(s => s.Saw.Name));
        Say("Timer runs", advice.Now.Saws.Where(s => s.Timer is not null).Select(s => s.Saw.Name));
        Say("Found not right at the last check", advice.Now.Saws.Where(s => s.Saw.Active && s.LastCheck?.SawNotRight == true).Select(s => $"{s.Saw.Name}, {CheckWords.ToPutRight(s.LastCheck)}"));
        Say("No blade on", advice.Now.Saws.Where(s => s.Saw.Active && s.MountedBladeId is null).Select(s => s.Saw.Name));
        Say("Stock", orders);
        Say("Spares on the rack", advice.Now.Saws.Where(s => s.Saw.Active).Select(s => Low(s, advice)).OfType<string>());
        Say("At the sharpener", advice.Now.Blades.Where(b => b.Away is not null).GroupBy(b => b.Away!.BatchNumber).OrderBy(g => g.Key, NaturalOrder.Instance)
            .Select(g => $"{g.Key} ({string.Join(' ', g.Select(b => b.Blade.Tag).Order(NaturalOrder.Instance))}){(g.First().Away!.PromisedUtc < advice.Now.AsOf ? ", late" : "")}"));
        return lines.Count > 0 ? lines : ["Nothing on hold, nothing dull, nothing to look at."];
    }

    /// <summary>What the stock page asks to order now or soon, in its words.</summary>
    private static async Task<IReadOnlyList<string>> Orders(Desk desk)
    {
        var units = await desk.Units();
        var lead = (await desk.Advice()).Settings[StockSettings.LeadDays];
        return [.. (await StockNow.Of(desk)).Where(l => l.OrderInDays <= lead).OrderBy(l => l.OrderInDays).Select(l => StockNow.Order(l, desk.Now, units)!).Select(o => "o" + o[1..])];
    }

    /// <summary>A saw with at most one sharp spare on the rack.</summary>
    private static string? Low(SawNow saw, ShopAdvice advice)
    {
        string[] spare = [.. advice.Now.Blades.Where(b => b.Place == Place.Rack && ShopAdvice.Fits(b, saw) && advice.Of(b).State == BladeState.Ready).Select(b => b.Blade.Tag)];
        return spare.Length switch
        {
            0 => $"{saw.Saw.Name} has no sharp spare",
            1 => $"{saw.Saw.Name} has one sharp spare ({spare[0]})",
            _ => null,
        };
    }

    private static string Where(BladeFile file, ShopNow now) => file.Place switch
    {
        Place.OnSaw => $" on {now.Saws.First(s => s.Saw.Id == file.SawId).Saw.Name}",
        Place.Bench => " on the bench",
        _ => file.Hook is { } hook ? $" on {hook}" : "",
    };
}

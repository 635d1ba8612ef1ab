using System.Text.Json;
using BladeLog.Records.Writing;

namespace BladeLog.Features;

/// <summary>The one way from a form to the records and on: saved and away, or the same page again with what stands against it.</summary>
internal static class FormFlow
{
    private static readonly string[] Units = ["M", "M2", "Ms", "Utc", "Pa", "Mps", "Minor", "H", "Rad", "N", "W"];

    /// <param name="desk">The request's desk.</param>
    /// <param name="command">What is to be recorded.</param>
    /// <param name="form">The form as sent; its fields are named like the command's, without the unit.</param>
    /// <param name="leadsTo">Where its sender is taken.</param>
    /// <param name="what">What was done, short, for the undo: "Q-17 on Wren".</param>
    /// <param name="again">The same page with the same texts.</param>
    /// <param name="canUndo">Whether one tap can take it back.</param>
    /// <param name="undone">This takes back what was saved a moment ago.</param>
    public static async Task<IResult> Send<TForm>(
        this Desk desk, Command command, TForm form, string leadsTo, string what, Func<FormState, Task<IResult>> again, bool canUndo = true, bool undone = false)
        where TForm : PostedForm
    {
        if (!string.IsNullOrEmpty(form.Who) && !await desk.SayWho(form.Who))
        {
            return await again(new([new(nameof(form.Who), $"Nobody here is called {form.Who}.")], Status: StatusCodes.Status422UnprocessableEntity));
        }

        return await desk.Write(command, form.Op, leadsTo, form: JsonSerializer.Serialize(form)) switch
        {
            WriteResult.Done done => undone ? desk.Undone(done, what) : desk.Saved(done, what, canUndo),
            WriteResult.Refused refused => await again(State<TForm>(refused.Problems, null)),
            WriteResult.Ask ask => await again(State<TForm>(ask.Problems, ask.OneMoreTap)),
            WriteResult.Clash clash => await again(await Clashed(desk, clash)),
            var other => throw new InvalidOperationException($"Unknown answer {other.GetType().Name}."),
        };
    }

    /// <summary>A new op for a new form; a form that comes back keeps its own.</summary>
    public static string Op(string? op) => Guid.TryParse(op, out var known) ? known.ToString() : Guid.NewGuid().ToString();

    private static FormState State<TForm>(IReadOnlyList<Problem> problems, string? oneMoreTap) =>
        new([.. problems.Select(p => new Ui.Forms.Problem(FieldOf<TForm>(p.Field), p.Sentence))], oneMoreTap, StatusCodes.Status422UnprocessableEntity)
        {
            Title = oneMoreTap is null ? null : "Not recorded yet",
        };

    private static async Task<FormState> Clashed(Desk desk, WriteResult.Clash clash)
    {
        var when = Said.When(clash.When, desk.Now, await desk.Units());
        return new FormState(
            [new(null, $"{Said.Capital(clash.Who)} {clash.What} at {when}. This page now shows what stands; what you typed is kept. Look, then record it if it is still right.")],
            Status: StatusCodes.Status409Conflict)
        {
            Title = "Not recorded: somebody was quicker",
        };
    }

    /// <summary>The form's own field for a field of the command; null where the form has none, so that the sentence stands over it.</summary>
    private static string? FieldOf<TForm>(string field)
    {
        // A row of a list keeps its place: Lines[2].Width.
        if (field.IndexOf('[') is > 0 and var bracket && typeof(TForm).GetProperty(field[..bracket]) is not null)
        {
            return field;
        }

        foreach (var name in Units.Where(u => field.EndsWith(u, StringComparison.Ordinal)).Select(u => field[..^u.Length]).Prepend(field))
        {
            if (typeof(TForm).GetProperty(name) is not null)
            {
                return name;
            }
        }

        return field == "Person" ? nameof(PostedForm.Who) : null;
    }
}

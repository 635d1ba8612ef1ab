using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Http.HttpResults;

namespace BladeLog.Ui;

/// <summary>A page or fragment with one model; a wrong model does not compile.</summary>
public abstract class View<TModel> : ComponentBase
{
    [Parameter, EditorRequired]
    public required TModel Model { get; set; }

    [Parameter]
    public Chrome Chrome { get; set; } = Chrome.Bare;
}

/// <summary>What the title block says about the shop and the person in front of the screen.</summary>
/// <param name="ShopName">The shop's own name.</param>
/// <param name="Who">Initials of the person who records, or null when nobody has said.</param>
/// <param name="SavedAt">Clock time of the last entry, as the shop writes it.</param>
/// <param name="Undo">The entry that can still be taken back, if any.</param>
public sealed record Chrome(string ShopName, string? Who, string? SavedAt, UndoOffer? Undo)
{
    /// <summary>What was undone last, where nothing was saved since; null: the last was saved and stands.</summary>
    public string? Undone { get; init; }

    /// <summary>What is tapped often stands at the left of this tablet.</summary>
    public bool LeftHand { get; init; }

    /// <summary>A sheet without a shop: first start, sign-in, a failure.</summary>
    public static Chrome Bare { get; } = new("", null, null, null);
}

/// <summary>An entry that can be taken back by one tap for a minute.</summary>
/// <param name="What">What it undoes, short: "Q-17 on Wren".</param>
/// <param name="Action">Where the form posts to.</param>
/// <param name="Op">The entry's own operation id.</param>
public sealed record UndoOffer(string What, string Action, string Op);

/// <summary>The one way from an endpoint to a page.</summary>
public static class Html
{
    public static RazorComponentResult View<TView, TModel>(TModel model, Chrome chrome, int status = 200)
        where TView : View<TModel> =>
        new(typeof(TView), new Dictionary<string, object?>
        {
            [nameof(View<TModel>.Model)] = model,
            [nameof(View<TModel>.Chrome)] = chrome,
        })
        {
            StatusCode = status,
            // A page is sent whole, so that its status code can still say what happened.
            PreventStreamingRendering = true,
        };
}

namespace BladeLog.Features.Blades;

/// <summary>Where the blades' entry forms answer.</summary>
internal static class BladeForms
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/blades/new", NewBlade.Get);
        app.MapPost("/blades/new", NewBlade.Post);
        app.MapGet("/specs/{code}/edit", SpecEdit.Get);
        app.MapPost("/specs/{code}/edit", SpecEdit.Post);
        app.MapGet("/blades/{tag}/edit", Change.Get);
        app.MapPost("/blades/{tag}/edit", Change.Post);
        app.MapGet("/blades/{tag}/sharpen", Sharpen.Get);
        app.MapPost("/blades/{tag}/sharpen", Sharpen.Post);
        app.MapGet("/blades/{tag}/inspect", Inspect.Get);
        app.MapPost("/blades/{tag}/inspect", Inspect.Post);
        app.MapGet("/blades/{tag}/hold", Hold.Get);
        app.MapPost("/blades/{tag}/hold", Hold.Post);
        app.MapGet("/blades/{tag}/clear", Clear.Get);
        app.MapPost("/blades/{tag}/clear", Clear.Post);
        app.MapGet("/blades/{tag}/retire", Retire.Get);
        app.MapPost("/blades/{tag}/retire", Retire.Post);
        app.MapGet("/blades/{tag}/break", Break.Get);
        app.MapPost("/blades/{tag}/break", Break.Post);
        app.MapGet("/blades/{tag}/join", Join.Get);
        app.MapPost("/blades/{tag}/join", Join.Post);
        app.MapGet("/blades/{tag}/tension", Pull.Get);
        app.MapPost("/blades/{tag}/tension", Pull.Post);
        app.MapGet("/blades/{tag}/drift", Lead.Get);
        app.MapPost("/blades/{tag}/drift", Lead.Post);
        app.MapGet("/blades/{tag}/kerf", Kerf.Get);
        app.MapPost("/blades/{tag}/kerf", Kerf.Post);
        app.MapGet("/blades/{tag}/two", TwoBlades.Get);
        app.MapPost("/blades/{tag}/two", TwoBlades.Post);
        app.MapGet("/blades/{tag}/hang", Hang.Get);
        app.MapPost("/blades/{tag}/hang", Hang.Post);
    }
}

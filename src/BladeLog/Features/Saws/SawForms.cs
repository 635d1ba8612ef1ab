namespace BladeLog.Features.Saws;

/// <summary>Where the saws' entry forms answer.</summary>
internal static class SawForms
{
    public static void Map(WebApplication app)
    {
        app.MapGet("/saws/new", SetupSaw.GetNew);
        app.MapPost("/saws/new", SetupSaw.PostNew);
        app.MapGet("/saws/{code}/edit", SetupSaw.GetEdit);
        app.MapPost("/saws/{code}/edit", SetupSaw.PostEdit);
        app.MapGet("/saws/{code}/swap", Swap.Get);
        app.MapPost("/saws/{code}/swap", Swap.Post);
        app.MapGet("/saws/{code}/then", Then.Get);
        app.MapPost("/saws/{code}/then", Then.Post);
        app.MapGet("/saws/{code}/hours", Hours.Get);
        app.MapPost("/saws/{code}/hours", Hours.Post);
        app.MapGet("/saws/{code}/timer", Timer.Get);
        app.MapPost("/saws/{code}/timer", Timer.Stop);
        app.MapPost("/saws/{code}/timer/start", Timer.Start);
        app.MapPost("/saws/{code}/timer/never", Timer.Never);
        app.MapGet("/saws/{code}/check", Check.Get);
        app.MapPost("/saws/{code}/check", Check.Post);
        app.MapGet("/checks", Checks.Get);
        app.MapGet("/saws/{code}/clicking", Clicking.Get);
        app.MapPost("/saws/{code}/clicking", Clicking.Post);
        app.MapGet("/saws/{code}/slack", Slack.Get);
        app.MapPost("/saws/{code}/slack", Slack.Post);
    }
}

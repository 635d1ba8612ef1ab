namespace BladeLog.Features.Workings;

/// <summary>Every formula group as a page of its own: the form is a GET, so an answer is an address.</summary>
internal static class WorkingsPages
{
    private static readonly WorkingGroup[] Groups =
    [
        new(BandLifePage.Path, "Life of a band on its wheels", "Bending, tension and hardness to bends and hours; against thickness and wheel."),
        new(TensionPage.Path, "Tension", "From a pull, a wheel load, a stretch or a plucked note; what the same scale mark means on another blade."),
        new(ThrustLimitsPage.Path, "Push a blade stands", "Front edge slack and twisting away; against the height of the guide and the tension."),
        new(CutPage.Path, "A cut", "Bite, chip room, forces, power and the feeds that work; against the edge and the depth."),
        new(CurvePage.Path, "Tightest curve", "Radius from width, thickness and kerf; against the kerf."),
        new(WearPage.Path, "Wear of the edge", "Rounding from the wood gone through; path, area and metres to dull."),
        new(GrindingPage.Path, "Width and set", "What sharpening takes away; sharpenings left, when to set again."),
        new(ForceFactorPage.Path, "Your own force factor", "From the ammeter in a cut, so that force and power are your saw's."),
        new(CrackPage.Path, "How fast a crack runs", "Why any crack is a hold. Never for a blade of the shop."),
    ];

    public static void Map(WebApplication app)
    {
        app.MapGet("/workings", (Desk desk) => desk.Page<WorkingsPage, IReadOnlyList<WorkingGroup>>(Groups));
        Get(app, BandLifePage.Path, BandLifePage.Of);
        Get(app, TensionPage.Path, TensionPage.Of);
        Get(app, ThrustLimitsPage.Path, ThrustLimitsPage.Of);
        Get(app, CutPage.Path, CutPage.Of);
        Get(app, CurvePage.Path, CurvePage.Of);
        Get(app, WearPage.Path, WearPage.Of);
        Get(app, GrindingPage.Path, GrindingPage.Of);
        Get(app, ForceFactorPage.Path, ForceFactorPage.Of);
        app.MapGet(CrackPage.Path, async (HttpRequest request, Desk desk) =>
        {
            WorkingModel model = CrackPage.Of(new AskForm(request.Query, await desk.Units(), false), (await desk.Advice()).Settings);
            return await desk.Page<WorkingPage, WorkingModel>(model, Status(model));
        });
    }

    private static void Get(WebApplication app, string path, Func<AskForm, WorkingCase, WorkingModel> answer) =>
        app.MapGet(path, async (HttpRequest request, Desk desk) =>
        {
            WorkingCase from = WorkingCase.Of(request.Query, await desk.Advice());
            WorkingModel model = answer(new AskForm(request.Query, await desk.Units(), from.Any), from);
            model = model with { Problems = [.. from.Problems, .. model.Problems] };
            return await desk.Page<WorkingPage, WorkingModel>(model, Status(model));
        });

    private static int Status(WorkingModel model) => model.Problems.Count == 0 ? StatusCodes.Status200OK : StatusCodes.Status422UnprocessableEntity;
}

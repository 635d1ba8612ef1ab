using BladeLog.Advice;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Wear;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>Rounding of the edge with the wood gone through.</summary>
internal static class WearPage
{
    public const string Path = "/workings/wear";

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeAdvice? blade = from.Blade;
        SawSetup? setup = from.Saw?.Setup;
        TipMaterial tip = form.Choose("tip", "Tooth", blade?.Body.TipMaterial ?? TipMaterial.HardenedCarbon, blade is null ? "example" : "specification",
            (TipMaterial.PlainSteel, "plain", "plain saw steel"), (TipMaterial.HardenedCarbon, "hardened", "hardened tips"), (TipMaterial.Bimetal, "bimetal", "bi-metal"),
            (TipMaterial.CobaltAlloy, "cobalt", "cobalt alloy tips"), (TipMaterial.Carbide, "carbide", "carbide tips"));
        double? r0 = form.Length("fresh", "Edge radius after the last grind", Fields.EdgeRadius, Given.Of(blade?.Body.FreshEdge, tip == TipMaterial.Carbide ? 10e-6 : 8e-6));
        Known rate = settings.Wear(tip);
        double? wear = form.Number("wear", "Wear", "a wear rate", 0.01, 40, "µm/km", new Given(rate.Value, rate.From));
        Shown shown = new(form.Units);
        double? path = form.Number("path", "Path since the last grind, per tooth", "a path", 0, 1000, shown.PathUnit, Given.Of(shown.Path(blade?.Edge.PathKm), "from its cuts, wood and dirt counted in", 5));
        double? dull = form.Length("dull", "Dull at", Fields.EdgeRadius, Given.Of(settings.Known(LifeSettings.Dull, 1e-6), 40e-6));
        (double depth, double referenceFeed) = setup is null ? (0.1, 2.0 / 60) : Sharpness.Reference(setup, settings);
        double? H = form.Length("height", "Height of the wood along the blade", Fields.CutHeight, Given.Of(from.Cut?.HeightM ?? (setup is null ? null : depth), from.Cut is null ? "depth for metres left" : "of the cut", 0.1));
        double? f = form.Feed("feed", "Feed", from.Choice?.Gate?.AdvisedMps is { } advised ? new Given(advised, "advised for the cut") : Given.Of(setup is null ? null : referenceFeed, "feed for metres left", 2.0 / 60));
        double? v = form.BandSpeed("speed", "Band speed", from.Speed(16));
        double? L = form.Length("loop", "Loop", Fields.Loop, Given.Of(blade?.File.LoopM ?? setup?.LoopM, "of the blade", 3.4));
        double? factor = form.Number("factor", "Wear of the wood against a clean medium one, dirt counted in", "a wear factor", 0.1, 100, "", Given.Of(from.Cut is { } c ? c.WoodFactor with { Value = c.WoodFactor.Value * c.DirtFactor.Value } : null, 1));

        List<BecauseLine> lines = [];
        List<CurveFigure> curves = [];
        string title = "How round is the edge?";
        double? perSquareMetre = null;
        if (v is { } V && f is { } F && L is { } loop)
        {
            double S = Kinematics.WoodPathPerTooth(new Area(1), new Speed(F), new Length(loop), new Speed(V)).Metres;
            perSquareMetre = factor is { } m ? S * m / 1000 : null;
            lines.Add(Line("Wood path for a square metre", shown.FarText(S), "band speed over feed and loop; the pitch cancels", "derived", Provenance.Derived));
        }

        if (r0 is { } fresh && wear is { } w && path is { } typed && dull is { } limit)
        {
            RunIn run = settings.RunIn;
            double each = shown.Path(1.0)!.Value, x = typed / each;
            double r = EdgeRadius.After(new Length(fresh), w, x, run).Metres, most = EdgeRadius.PathTo(new Length(limit), new Length(fresh), w, run), left = Math.Max(0, most - x);
            title = left > 0 ? $"{Micrometres(r, 0)}: {Said.Path(left, form.Units, 1)} of wood per tooth to dull" : $"{Micrometres(r, 0)}: dull";
            lines.Insert(0, Line("Edge radius now", Micrometres(r), $"radius after the grind, running in by {run.Growth.Micrometres:0.#} µm, and wear times path", "engineering-default", rate.Provenance));
            lines.Insert(1, Line("Path to dull", Said.Path(most, form.Units, 1), "the same solved for the dull radius", "derived", rate.Provenance));
            if (perSquareMetre is { } km && km > 0)
            {
                double area = left / km;
                lines.Add(Line("Area left", shown.AreaText(area), "path left over path for a square metre and the wood's factor", "derived", rate.Provenance));
                if (H is { } height)
                {
                    (double metres, string unit) = Said.Cut(area / height, form.Units);
                    lines.Add(Line("Metres left", Figures.With(Figures.Number(metres, metres < 10 ? 1 : 0), unit), "area left over the height of the wood", "derived", rate.Provenance));
                }
            }

            AxisScale across = AxisScale.FromNought(Math.Max(0.1, 1.25 * each * Math.Max(most, x)));
            curves.Add(new CurveFigure(
                "Edge radius against the wood path", across, $"path per tooth, {shown.PathUnit}", AxisScale.FromNought(1.25e6 * Math.Max(limit, r)), "edge radius, µm",
                [
                    new CurveLine("edge radius", Points(across, d => EdgeRadius.After(new Length(fresh), w, d / each, run).Micrometres)),
                    new CurveLine("dull", Points(across, _ => limit * 1e6, 1)),
                    new CurveLine("if it wore two and a half times as fast", Points(across, d => EdgeRadius.After(new Length(fresh), 2.5 * w, d / each, run).Micrometres)),
                    new CurveLine("two and a half times as slow", Points(across, d => EdgeRadius.After(new Length(fresh), w / 2.5, d / each, run).Micrometres)),
                ],
                new CurveHere(typed, r * 1e6, $"{Said.Path(x, form.Units, 1)}: {Micrometres(r, 0)}"))
            {
                Lesson = "Wear rates are known within a factor of about 2.5 until your own sharpenings teach them.",
            });
        }

        return WorkingModel.Of(Path, "Wear of the edge", title, form, from) with
        {
            Lines = lines,
            Curves = curves,
            Range =
            [
                "Equivalent kilometres: a metre in a dense or dirty wood counts for several.",
                "The linear growth is from saw-teeth texts, from memory; the rates are engineering defaults. Not checked beyond 80 µm.",
                "A nail, grit or a burn ends an edge at once.",
            ],
            Leads = from.Blade is { } on ? WorkedOut.Rows(from.Choice is { } choice ? WorkedOut.Cut(choice) : null, WorkedOut.Grinding(on)) : [],
            Cautions = [],
        };
    }
}

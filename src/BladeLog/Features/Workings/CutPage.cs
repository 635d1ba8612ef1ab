using BladeLog.Advice;
using BladeLog.Advice.Changes;
using BladeLog.Advice.Cuts;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Tables;
using BladeLog.Records;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using BladeLog.Ui.Pictures.Geometry;
using Choice = BladeLog.Advice.Cuts.Choice;

namespace BladeLog.Features.Workings;

/// <summary>Bite, chip room, forces, power and the feeds that work.</summary>
internal static class CutPage
{
    public const string Path = "/workings/cut";

    public static WorkingModel Of(AskForm form, WorkingCase from)
    {
        AdviceSettings settings = from.Settings;
        BladeBody? body = from.Blade?.Body;
        SawSetup? setup = from.Saw?.Setup;
        double? t = form.Length("thickness", "Thickness", Fields.Thickness, Given.Of(body?.Thickness, 0.6e-3));
        double? k = form.Length("kerf", "Kerf", Fields.Kerf, Given.Of(body?.Kerf, 1.1e-3));
        double? p = form.Pitch("pitch", "Pitch, the mean", Given.Of(body?.PitchMean, "specification", 8.5e-3));
        double? g = form.Length("gullet", "Gullet depth", Fields.GulletDepth, Given.Of(body?.Gullet, 3.4e-3));
        ToothForm tooth = form.Choose("form", "Tooth form", body?.Form ?? ToothForm.Hook, Mark(body), (ToothForm.Regular, "regular", "regular"), (ToothForm.Skip, "skip", "skip"), (ToothForm.Hook, "hook", "hook"));
        double? rake = form.Angle("hook", "Hook angle", Given.Of(body?.Rake, double.DegreesToRadians(10)));
        TipKind tip = form.Choose("tip", "Tip", body?.Tip ?? TipKind.Set, Mark(body), (TipKind.Set, "set", "set"), (TipKind.Swaged, "swaged", "swaged"), (TipKind.Tipped, "tipped", "tipped"));
        SetPattern pattern = tip == TipKind.Set
            ? form.Choose("set", "Set", from.Blade?.File.Spec.SetPattern is SetPattern.Raker ? SetPattern.Raker : SetPattern.Alternate, Mark(body), (SetPattern.Alternate, "alternate", "left, right"), (SetPattern.Raker, "raker", "left, right, straight"))
            : SetPattern.None;
        double? area = form.Number("area", "Gullet area, where it was measured", "a gullet area", 0.1, 5000, "mm²", Given.Of(body?.GulletAreaM2 * 1e6, "specification", null), optional: true);
        double? r = form.Length("edge", "Edge radius", Fields.EdgeRadius, Given.Of(from.Blade?.Edge.RadiusM, "from its path since the last sharpening", 20e-6));
        double? L = form.Length("loop", "Loop", Fields.Loop, Given.Of(from.Blade?.File.LoopM ?? setup?.LoopM, "of the blade", 3.4));
        double? v = form.BandSpeed("speed", "Band speed", from.Speed(16));
        double? H = form.Length("height", "Height of the wood along the blade", Fields.CutHeight, Given.Of(from.Cut?.HeightM, "of the cut", 0.150));
        Material? wood = form.Look("wood", "Wood", from.Cut?.Material?.Name ?? "Scots pine", from.Cut is null ? "example" : "of the cut", Wood.Sawn, [.. MaterialTable.All.Where(m => m.Density12 is not null).Select(m => m.Name)]);
        double? rho = form.Density("density", "Density at 12 % moisture", Given.Of(wood?.Density12, $"of {wood?.Name ?? "the wood"}, {Figures.Mark(wood?.Provenance ?? Provenance.FromMemory)}", null));
        double? moisture = form.Moisture("moisture", "Moisture", Given.Of(from.Cut?.Moisture, wood?.DefaultMoisture ?? 12));
        CutDirection direction = form.Choose("direction", "Direction", from.Cut?.Cut.Direction ?? CutDirection.Rip, from.Cut is null ? "example" : "of the cut", (CutDirection.Rip, "rip", "along the grain"), (CutDirection.Cross, "cross", "across the grain"));
        YesNo frozen = form.Choose("frozen", "Frozen", from.Cut?.Cut.Frozen == true ? YesNo.Yes : YesNo.No, from.Cut is null ? "example" : "of the cut", (YesNo.No, "no", "no"), (YesNo.Yes, "yes", "yes"));
        Choice? chosen = from.Choice;
        double? f = form.Feed("feed", "Feed", chosen?.Gate?.AdvisedMps is { } advised ? new Given(advised, "advised for the cut") : form.Example ? Given.Example(2.0 / 60) : Given.None, optional: true);
        double? fill = form.Number("fill", "Gullet fill allowed", "a gullet fill", 0.05, 1, "", Given.Of(from.Cut is { IsWood: true } && setup is not null ? from.Cut.Fill(setup, settings).Fill : settings.Known(CutSettings.FillDryHand), 0.4));
        double? power = form.Power("power", "Power left for cutting, at the band", Given.Of(setup is null ? null : BandPower.Easy(setup, settings), "motor less idling and drive", 1200), optional: true);
        bool feeder = setup?.FeederN is not null && from.Cut?.WithFeeder(setup) != false;
        double? push = form.Force("push", feeder ? "Push of the feeder" : "Push of a hand", feeder ? Given.Of(setup!.FeederN, "as the saw is set up", null) : Given.Of(settings.Known(CutSettings.PushGreen), 70), optional: true);
        double? most = form.Feed("most", "Greatest feed that can be guided", feeder ? Given.Of(setup!.FeederMostMps, "as the saw is set up", null)
            : Given.Of(settings.Known(from.Cut?.IsCurve(settings) == true ? CutSettings.FeedOnCurve : CutSettings.FeedByHand, 1 / 60.0), 4 / 60.0), optional: true);
        double? bite = form.Length("bite", "Greatest bite of the finish", Fields.Bite, from.Cut?.FinishBite is { } fine ? new Given(fine.Value, fine.From) : Given.None, optional: true);
        double? opens = form.Length("opens", "What the saw opens to", Fields.CutHeight, Given.Of(setup?.CutHeightMostM, "as the saw is set up", null), optional: true);
        ThrustLimits? stands = from is { Blade: { } blade, Saw: { } saw, Tension: { } tension } && H is { } high ? form.Try(() => from.Advice.Beams.Of(blade.Body, tension, saw.Setup, v ?? saw.Setup.UsualSpeedMps, high)) : null;
        double? thrust = form.Force("thrust", "Push the blade stands", Given.Of(stands?.Allowed.Newtons, "from its section, tension and guides", 120), optional: true);

        Shown shown = new(form.Units);
        if (k is { } kerf && t is { } thick && kerf < thick)
        {
            form.Refuse("kerf", $"A kerf of {shown.SmallText(kerf, 2)} is narrower than the body of {shown.SmallText(thick, 2)}.");
            k = null;
        }

        CutCase? asked = t is { } T && k is { } K && p is { } P && g is { } G && rake is { } angle && r is { } R && v is { } V && H is { } height && rho is { } density && moisture is { } wet
            ? new CutCase
            {
                Thickness = new Length(T),
                Kerf = new Length(K),
                Pitch = new Length(P),
                GulletDepth = new Length(G),
                Form = tooth,
                Rake = new Angle(angle),
                Tip = tip,
                EdgeRadius = new Length(R),
                BandSpeed = new Speed(V),
                CutHeight = new Length(height),
                Density12 = new Density(density),
                MoisturePercent = wet,
                Direction = direction,
                Frozen = frozen == YesNo.Yes,
                MeasuredGulletArea = area is { } mm2 ? new Area(mm2 * 1e-6) : null,
                Model = settings.Force,
            }
            : null;
        List<BecauseLine> lines = [.. CutLines.OfGeometry(p, v, H, f, L, shown)];
        string title = "Which feeds work in this cut?";
        IReadOnlyList<CurveFigure> curves = [];
        List<string> cautions = [];
        if (asked is not null && fill is { } filled)
        {
            CutHeld held = new(filled, power, push, thrust, most, bite, feeder);
            CutLimitsAt? limits = form.Try(() => CutLimitsAt.Of(asked, held)), care = form.Try(() => CutLimitsAt.Of(asked, AtMost(held, setup, stands, settings)));
            if (limits is not null && care is not null)
            {
                title = limits.Title(care, shown);
                lines.AddRange(form.Try(() => CutLines.Of(asked, limits, care, pattern, f, shown).ToList()) ?? []);
                if (f is { } at)
                {
                    lines.Add(CutLines.Deepest(asked, limits, at, opens, body is null ? 0 : DeepestStock.Least(body, settings), shown));
                }

                curves = form.Try(() => CutCurves.Of(asked, limits, shown)) ?? [];
                cautions.AddRange(form.Try(() => CutChecks.Cautions(asked, f is { } feed ? new Speed(feed) : null)) ?? []);
                if (Kerf.SetTooWide(Kerf.SetPerSide(asked.Kerf, asked.Thickness), asked.Thickness, pattern) && !cautions.Exists(c => c.Contains("core", StringComparison.Ordinal)))
                {
                    cautions.Add("The set is over 0.45 of the body a side: alternate teeth this wide nearly leave a core standing in the kerf.");
                }

                if (f is { } pace && Kerf.Spills(Kinematics.BitePerTooth(new Speed(pace), asked.Pitch, asked.BandSpeed), Kerf.SetPerSide(asked.Kerf, asked.Thickness), feeder))
                {
                    cautions.Add("The bite is smaller than the side clearance: dust slips out past the body. Feed faster, or set the teeth less.");
                }
            }
        }

        cautions.Add("Forces and power hold within -30 to +40 per cent until the shop's own ammeter readings have taught the factor.");
        return WorkingModel.Of(Path, "A cut", title, form, from) with
        {
            Stopped = from.Blade?.File.Hold is null ? null : $"{from.Blade.File.Blade.Tag} is on hold: it cuts nothing until it is cleared.",
            Lines = lines,
            Curves = curves,
            Range =
            [
                "Bite 0.003 to 1.5 mm, band speed 3 to 60 m/s, pitch 1 to 75 mm, edge radius 3 to 120 µm, density 200 to 1,300 kg/m³.",
                "Straight sawing with sharp-to-dull edges; the set, the swage or the tips cut the whole kerf.",
                "The force model agrees with the published coefficients within 10 % up to a bite of 0.1 mm; its constants for pine are from memory.",
            ],
            Leads = from is { Blade: { } on, Saw: { } near } ? WorkedOut.Rows(chosen is { } c && c.UsualRadiusM is not null ? WorkedOut.Curve(c) : null, WorkedOut.Push(on, near, from.Cut?.Cut.Number), WorkedOut.Edge(on, near, from.Cut?.Cut.Number), WorkedOut.Ammeter(on, near, from.Cut?.Cut.Number)) : [new Worked("Your own force factor", "from the ammeter, so that force and power are yours", ForceFactorPage.Path)],
            Cautions = cautions,
        };
    }

    /// <summary>The same limits at their most, as the choices reckon the amber edge.</summary>
    private static CutHeld AtMost(CutHeld held, SawSetup? setup, ThrustLimits? stands, AdviceSettings settings)
    {
        double low = settings[CutSettings.LowEnd];
        double? motor = setup is null ? null : BandPower.Most(setup, settings);
        return held with
        {
            Fill = Math.Max(held.Fill, settings[CutSettings.FillAmber]),
            PowerW = held.PowerW is { } w ? Math.Max(w, motor ?? 0) / low : null,
            PushN = held.PushN is { } n ? (held.PowerFed ? n : Math.Max(n, settings[CutSettings.PushAmber])) / low : null,
            ThrustN = held.ThrustN is { } f ? Math.Max(f, stands?.Stop.Newtons ?? 0) / low : null,
        };
    }

    private enum YesNo
    {
        No,
        Yes,
    }

    private static string Mark(BladeBody? body) => body is null ? "example" : "specification";
}

using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Records.Writing;
using BladeLog.Ui;

namespace BladeLog.Features.Import;

/// <summary>Blades, each with the specification it is of; a specification not known yet is added with it.</summary>
internal sealed class BladeRows(IReadOnlySet<string> tagsUsed, IReadOnlyDictionary<string, Spec> specs) : IImportKind
{
    private readonly Dictionary<string, int> _tags = new(StringComparer.OrdinalIgnoreCase);
    private readonly Dictionary<string, Spec> _added = new(StringComparer.OrdinalIgnoreCase);

    public string Key => "blades";

    public string Name => "Blades";

    public string Onwards => "/rack";

    public IReadOnlyList<string> Defaults =>
    [
        "Tooth form: hook from 6 mm pitch on, regular below. Teeth: set, hardened. Body: flexible back.",
        "Kerf, gullet depth, hook and tension: the handbook's, default, not yours, until you say.",
        "Blades come in as new. Put used ones right on their own pages.",
    ];

    public IReadOnlyList<Column> Columns { get; } =
    [
        new("tag", "Tag", true, "as painted on the blade", "blade", "label", "id", "code", "blade no", "blade number", "no", "number", "name"),
        new("spec", "Specification", false, "a name for all blades of a kind", "specification", "model", "kind", "type", "spec code"),
        new("print", "Print", false, "all in one: 1/2 x .025 x 3 x 105", "size", "dimensions", "printed", "blade size"),
        new("width", "Width", false, "", "w", "breite", "blade width"),
        new("thickness", "Thickness", false, "of the body", "body", "gauge", "gage", "t", "dicke", "body thickness"),
        new("pitch", "Pitch", false, "TPI or a length; 3-4 TPI where it varies", "tpi", "teeth", "teeth per inch", "ppi", "points", "points per inch", "tooth pitch", "pitch_coarse", "coarse pitch", "coarse tpi", "tooth spacing"),
        new("pitch_fine", "Fine pitch", false, "where it varies", "finest pitch", "fine tpi"),
        new("loop", "Loop", false, "length round", "length", "loop length", "new_loop", "band length", "l"),
        new("form", "Tooth form", false, "regular, skip, hook", "tooth_form", "tooth shape", "tooth type"),
        new("hook", "Hook", false, "angle", "hook angle", "rake", "rake angle"),
        new("gullet", "Gullet depth", false, "", "gullet_depth"),
        new("kerf", "Kerf", false, "", "kerf width"),
        new("set_pattern", "Set pattern", false, "alternate or raker", "pattern of set"),
        new("tip", "Tip", false, "set, swaged, tipped", "tip_kind", "set"),
        new("tip_material", "Tooth material", false, "plain, hardened, bi-metal, cobalt alloy, carbide", "teeth material", "tip material"),
        new("steel", "Body steel", false, "flexible back, spring, bi-metal, carbide tipped, wide strip", "body_steel", "back", "material"),
        new("tension", "Tension", false, "your target, on the body", "strain", "target tension", "psi", "mpa"),
        new("least_width", "Least width", false, "scrap below", "minimum width", "min width"),
        new("sharpening_price", "Sharpening price", false, "", "sharpening cost", "price of sharpening"),
        new("most_sharpenings", "Most sharpenings", false, "0: not worth it", "max sharpenings", "sharpenings"),
        new("least_stock", "Least at hand", false, "blades of the kind", "least stock", "minimum stock", "min stock"),
        new("price", "Price", false, "", "cost", "purchase price"),
        new("folded", "Folded", false, "still as it came, yes or no"),
        new("inspect", "Inspect every", false, "running hours", "inspect_every", "inspection interval"),
        new("each_mount", "Inspect at each mount", false, "yes or no", "inspect_each_mount"),
    ];

    public IReadOnlyList<string> Sample =>
    [
        "Tag;Width (mm);Thickness (mm);Pitch;Loop (mm);Tooth form;Price",
        "B-01;13;0,65;3 TPI;2667;hook;24,00",
        "B-02;6;0,65;6 TPI;2667;regular;18,00",
        "B-03;25;0,9;3-4 TPI;5080;hook;40,00",
    ];

    public IReadOnlyList<Command> Read(RowReader row, List<string> remarks)
    {
        row.Need("tag", "Each blade needs its tag.");
        string? typed = row.Text("tag"), tag = typed is null ? null : Tags.Read(typed);
        if (tag is not null)
        {
            row.Say("tag", tag);
            CheckTag(row, tag);
        }

        Spec? given = Dimensions(row);
        bool? folded = row.Yes("folded"), eachMount = row.Yes("each_mount");
        double? inspect = row.Hours("inspect");
        if (!row.Stands || given is null)
        {
            return [];
        }

        _tags[tag!] = row.Line;
        AddBlades blade = new(given.Code, [tag!]) { Folded = folded ?? false, InspectEachMount = eachMount ?? false, InspectEveryH = inspect };
        if (specs.ContainsKey(given.Code) || !_added.TryAdd(given.Code, given))
        {
            return [blade];
        }

        return [new AddSpec(given), blade];
    }

    private void CheckTag(RowReader row, string tag)
    {
        if (Tags.Refusal(tag) is { } why)
        {
            row.Refuse("tag", why);
        }
        else if (_tags.TryGetValue(tag, out int first))
        {
            row.Refuse("tag", $"{tag} stands on line {first} already.");
        }
        else if (tagsUsed.Contains(tag))
        {
            row.Refuse("tag", $"{tag} is or was painted on another blade: a tag is never used again.");
        }
    }

    private Spec? Dimensions(RowReader row)
    {
        string? code = row.Text("spec");
        BladePrint? print = row.Print("print");
        double? width = row.Length("width", Fields.BladeWidth) ?? print?.Width?.Metres;
        double? thickness = row.Length("thickness", Fields.Thickness) ?? print?.Thickness?.Metres;
        ToothPitch? pitch = row.Pitch("pitch") ?? print?.Pitch, fine = row.Pitch("pitch_fine");
        double? loop = row.Length("loop", Fields.Loop) ?? print?.Loop?.Metres;
        if (!row.Stands)
        {
            return null;
        }

        if (code is not null && width is null && thickness is null && pitch is null)
        {
            if (specs.TryGetValue(code, out Spec? known) || _added.TryGetValue(code, out known))
            {
                return known;
            }

            row.Refuse("spec", $"There is no specification \"{code}\" yet: give width, thickness and pitch with it.");
            return null;
        }

        if (width is not { } w || thickness is not { } t || pitch is not { } p)
        {
            row.Refuse(width is null ? "width" : thickness is null ? "thickness" : "pitch", "A blade needs width, thickness and pitch, or a specification that is known.");
            return null;
        }

        Spec spec = Fill(row, w, t, p, fine ?? p, loop);
        if (!row.Stands)
        {
            return null;
        }

        spec.Code = code ?? CodeOf(spec);
        return Agrees(row, spec) ? spec : null;
    }

    private static Spec Fill(RowReader row, double width, double thickness, ToothPitch pitch, ToothPitch fine, double? loop)
    {
        double coarse = Math.Max(pitch.Coarse.Metres, fine.Coarse.Metres);
        ToothForm? form = row.OneOf("form", (ToothForm.Regular, ["regular", "standard", "raker tooth"]), (ToothForm.Skip, ["skip"]), (ToothForm.Hook, ["hook", "claw"]));
        TipKind? tip = row.OneOf("tip", (TipKind.Set, ["set"]), (TipKind.Swaged, ["swaged", "swage"]), (TipKind.Tipped, ["tipped", "carbide", "tip"]));
        SetPattern? pattern = row.OneOf("set_pattern", (SetPattern.Alternate, ["alternate", "left right"]), (SetPattern.Raker, ["raker"]));
        TipMaterial? material = row.OneOf(
            "tip_material", (TipMaterial.PlainSteel, ["plain", "plain steel"]), (TipMaterial.HardenedCarbon, ["hardened", "hardened carbon", "carbon"]),
            (TipMaterial.Bimetal, ["bi-metal"]), (TipMaterial.CobaltAlloy, ["cobalt alloy", "cobalt"]), (TipMaterial.Carbide, ["carbide"]));
        BodySteel? steel = row.OneOf(
            "steel", (BodySteel.FlexibleBack, ["flexible back", "flexible", "carbon"]), (BodySteel.SpringTempered, ["spring", "spring tempered", "spring steel"]),
            (BodySteel.Bimetal, ["bi-metal"]), (BodySteel.CarbideTipped, ["carbide tipped", "carbide"]), (BodySteel.WideStrip, ["wide strip", "wide"]));
        Spec spec = new()
        {
            Code = "",
            WidthM = width,
            WidthTyped = row.Understood.GetValueOrDefault("width"),
            ThicknessM = thickness,
            ThicknessTyped = row.Understood.GetValueOrDefault("thickness"),
            PitchCoarseM = coarse,
            PitchFineM = Math.Min(pitch.Fine.Metres, fine.Fine.Metres),
            PitchTyped = row.Understood.GetValueOrDefault("pitch"),
            ToothForm = form ?? (coarse >= 6e-3 ? ToothForm.Hook : ToothForm.Regular),
            TipKind = tip ?? TipKind.Set,
            SetPattern = tip is null or TipKind.Set ? pattern ?? SetPattern.Alternate : SetPattern.None,
            TipMaterial = material ?? (tip == TipKind.Tipped ? TipMaterial.Carbide : TipMaterial.HardenedCarbon),
            BodySteel = steel ?? (tip == TipKind.Tipped ? BodySteel.CarbideTipped : BodySteel.FlexibleBack),
            NewLoopM = loop,
            NewLoopTyped = row.Understood.GetValueOrDefault("loop"),
            RakeRad = row.Angle("hook", Fields.Hook),
            GulletDepthM = row.Length("gullet", Fields.GulletDepth),
            KerfM = row.Length("kerf", Fields.Kerf),
            TensionPa = row.Stress("tension"),
            LeastWidthM = row.Length("least_width", Fields.BladeWidth),
            SharpeningPriceMinor = row.Money("sharpening_price"),
            MostSharpenings = row.Count("most_sharpenings", Fields.Count),
            PriceMinor = row.Money("price"),
            LeastStock = row.Count("least_stock", Fields.Stock),
        };
        Possible(row, spec);
        return spec;
    }

    private static void Possible(RowReader row, Spec spec)
    {
        if (spec.ThicknessM >= spec.WidthM)
        {
            row.Refuse("thickness", "The blade must be wider than it is thick.");
        }

        if (spec.GulletDepthM >= spec.WidthM)
        {
            row.Refuse("gullet", "The gullet must be less deep than the blade is wide.");
        }

        if (spec.KerfM <= spec.ThicknessM)
        {
            row.Refuse("kerf", "The kerf must be wider than the body is thick.");
        }

        if (spec.LeastWidthM > spec.WidthM)
        {
            row.Refuse("least_width", "The least width must not be more than the width when new.");
        }

        if (spec.TensionPa is 0)
        {
            row.Refuse("tension", "A tension must be above zero; leave it empty where you have no target.");
        }
    }

    /// <summary>One name, one kind of blade.</summary>
    private bool Agrees(RowReader row, Spec spec)
    {
        if ((specs.TryGetValue(spec.Code, out Spec? other) || _added.TryGetValue(spec.Code, out other))
            && (Differ(other.WidthM, spec.WidthM) || Differ(other.ThicknessM, spec.ThicknessM) || Differ(other.PitchCoarseM, spec.PitchCoarseM)))
        {
            row.Refuse("spec", $"Specification {spec.Code} is known with other sizes: give this one another name.");
            return false;
        }

        return true;
    }

    private static bool Differ(double a, double b) => Math.Abs(a - b) > 1e-3 * Math.Max(a, b);

    private static string CodeOf(Spec s)
    {
        string pitch = Math.Abs(s.PitchCoarseM - s.PitchFineM) < 1e-9 ? Mm(s.PitchCoarseM) : $"{Mm(s.PitchFineM)}-{Mm(s.PitchCoarseM)}";
        string loop = s.NewLoopM is { } l ? " " + Mm(l) : "";
        return $"{Mm(s.WidthM)}x{Mm(s.ThicknessM)} p{pitch} {s.ToothForm.ToString().ToLowerInvariant()}{loop}";
    }

    private static string Mm(double metres) => (metres * 1e3).ToString("0.###", System.Globalization.CultureInfo.InvariantCulture);
}

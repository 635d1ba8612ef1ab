using BladeLog.Advice;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features;

/// <summary>Words that several pages use for the same thing.</summary>
internal static class Said
{
    /// <summary>"3 TPI hook", "2-3 TPI tipped", "22 mm hook": how the trade calls a row of teeth.</summary>
    public static string Teeth(Spec spec, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(spec);
        ArgumentNullException.ThrowIfNull(units);
        string form = spec.TipKind switch
        {
            TipKind.Tipped => "tipped",
            TipKind.Swaged => "swaged",
            _ => spec.ToothForm switch
            {
                ToothForm.Hook => "hook",
                ToothForm.Skip => "skip",
                _ => "regular",
            },
        };
        double few = Exact.Inch / spec.PitchCoarseM, many = Exact.Inch / spec.PitchFineM;
        string pitch = Whole(few) && Whole(many)
            ? spec.PitchCoarseM == spec.PitchFineM ? $"{few:0.#} TPI" : $"{few:0.#}-{many:0.#} TPI"
            : units.Units == UnitSystem.Inch ? units.Show(new Length(spec.PitchMeanM), Fields.Pitch)
            : $"{Figures.Number(spec.PitchMeanM * 1e3, 1)} mm".Replace(".0 mm", " mm", StringComparison.Ordinal);
        return $"{pitch.Replace(' ', Figures.Glue)} {form}";
    }

    /// <summary>"38 × 0.9", "1.496 × 0.035": width when new by thickness, in the shop's unit.</summary>
    public static string Section(BladeFile blade, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch
            ? $"{Bare(units.Show(new Length(blade.Spec.WidthM), Fields.BladeWidth))} × {Bare(units.Show(new Length(blade.ThicknessM), Fields.Thickness))}"
            : $"{blade.Spec.WidthM * 1e3:0.###} × {blade.ThicknessM * 1e3:0.###}";
    }

    /// <summary>A figure without the unit behind it.</summary>
    private static string Bare(string figure) => figure[..figure.LastIndexOf(Figures.Glue)];

    public static string Width(double metres, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch ? units.Show(new Length(metres), Fields.BladeWidth) : Figures.With(Figures.Number(metres * 1e3, 1), "mm");
    }

    /// <summary>A path of a tooth through wood: km, or miles.</summary>
    public static string Path(double km, ShopUnits units, int decimals)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch ? Figures.With(Figures.Number(km * 1e3 / Mile, decimals), "miles") : Figures.With(Figures.Number(km, decimals), "km");
    }

    private const double Mile = 5280 * Exact.Foot;

    public static (double Value, string Unit) Cut(double metres, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return units.Units == UnitSystem.Inch ? (metres / Exact.Foot, "ft") : (metres, "m");
    }

    /// <summary>"900 mm wheels", "3 wheels, 205 mm", "489 mm, mill", "356 mm, 2 speeds".</summary>
    public static string Wheels(SawSetup setup, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(units);
        double[] sizes = [.. setup.Wheels.Select(w => w.DiameterM).Distinct()];
        string size = string.Join(" and ", sizes.Select(d => units.Units == UnitSystem.Inch ? Figures.With(Figures.Number(d / Exact.Inch, 1), "in") : units.Show(new Length(d), Fields.WheelDiameter)));
        return setup.Wheels.Count > 2 ? $"{setup.Wheels.Count} wheels, {size}"
            : setup.Takes.HasFlag(Takes.Log) ? $"{size}, mill"
            : setup.Speeds.Count > 1 ? $"{size}, {setup.Speeds.Count} speeds"
            : $"{size} wheels";
    }

    public static string Count(int n, string one, string many) => n == 1 ? $"1{Figures.Glue}{one}" : $"{Figures.Number(n)}{Figures.Glue}{many}";

    /// <summary>The cut as a line names it: "oak 50 mm".</summary>
    public static string Wood(QueuedCut cut, Wording words)
    {
        ArgumentNullException.ThrowIfNull(cut);
        ArgumentNullException.ThrowIfNull(words);
        return $"{cut.SpeciesTyped} {Height(cut, words)}";
    }

    /// <summary>"50 mm"; of a bevel "50 mm, 54 mm along the blade at this bevel", where that reads otherwise.</summary>
    public static string Height(QueuedCut cut, Wording words)
    {
        ArgumentNullException.ThrowIfNull(cut);
        ArgumentNullException.ThrowIfNull(words);
        string thick = words.Length(cut.HeightM).Replace(' ', Figures.Glue), along = words.Length(cut.HeightM / Math.Cos(cut.BevelRad)).Replace(' ', Figures.Glue);
        return along == thick ? thick : $"{thick}, {along} along the blade at this bevel";
    }

    /// <summary>A day as people say it: "3 Dec", "4 Oct 2025".</summary>
    public static string Day(DateOnly day, DateTime now, ShopUnits units) =>
        day.ToString(day.Year == Local(now, units).Year ? "d MMM" : "d MMM yyyy", System.Globalization.CultureInfo.InvariantCulture);

    public static string Day(DateTime utc, DateTime now, ShopUnits units) => Day(DateOnly.FromDateTime(Local(utc, units)), now, units);

    public static string When(DateTime utc, DateTime now, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        DateTime at = Local(utc, units), today = Local(now, units).Date;
        int days = (today - at.Date).Days;
        return days switch
        {
            0 => at.ToString("HH:mm", System.Globalization.CultureInfo.InvariantCulture),
            > 0 and < 7 => at.ToString("ddd HH:mm", System.Globalization.CultureInfo.InvariantCulture),
            _ when at.Year == today.Year => at.ToString("d MMM", System.Globalization.CultureInfo.InvariantCulture),
            _ => at.ToString("d MMM yyyy", System.Globalization.CultureInfo.InvariantCulture),
        };
    }

    /// <summary>"4 Oct 2025 10:42", where the hour matters and the day may be long ago.</summary>
    public static string Moment(DateTime utc, ShopUnits units) => Local(utc, units).ToString("d MMM yyyy HH:mm", System.Globalization.CultureInfo.InvariantCulture);

    /// <summary>"1:25 h" of a time that has passed.</summary>
    public static string Clock(TimeSpan time) => Figures.With($"{Math.Floor(time.TotalHours):0}:{time.Minutes:00}", "h");

    public static string Day(DateTime utc, ShopUnits units) => Local(utc, units).ToString("d MMM yyyy", System.Globalization.CultureInfo.InvariantCulture);

    public static DateTime Local(DateTime utc, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(units);
        return TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), units.Zone);
    }

    /// <summary>"leads 0.8° left: set the fence"; null where nothing was found since it was last sharpened.</summary>
    public static string? Leads(BladeFile blade, int sawId, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(blade);
        ArgumentNullException.ThrowIfNull(units);
        return !blade.LeadsRad.TryGetValue(sawId, out double rad) ? null
            : Math.Abs(rad) < 0.0008 ? "runs true: set the fence parallel"
            : $"leads {units.Show(new Angle(Math.Abs(rad)))} {(rad > 0 ? "left" : "right")}: set the fence";
    }

    /// <summary>"1.2 mm in a test cut; set 0.27 mm left, 0.21 mm right".</summary>
    public static string Kerf(KerfReading reading, ShopUnits units)
    {
        ArgumentNullException.ThrowIfNull(reading);
        ArgumentNullException.ThrowIfNull(units);
        string? kerf = reading.KerfM is { } k ? $"{units.Show(new Length(k), Fields.Kerf)} {(reading.How == KerfHow.TestCut ? "in a test cut" : "over the teeth")}" : null;
        string? set = reading switch
        {
            { SetLeftM: { } left, SetRightM: { } right } => $"set {units.Show(new Length(left), Fields.Set)} left, {units.Show(new Length(right), Fields.Set)} right",
            { SetBothM: { } both } => $"set {units.Show(new Length(both), Fields.Set)}, both sides together",
            _ => null,
        };
        return string.Join("; ", new[] { kerf, set }.OfType<string>());
    }

    public static string Capital(string words) => words.Length == 0 ? words : char.ToUpperInvariant(words[0]) + words[1..];

    private static bool Whole(double teeth) => Math.Abs((teeth * 2) - Math.Round(teeth * 2)) < 0.02;
}

using System.Text.RegularExpressions;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>Power of a motor, density of wood, angles.</content>
public sealed partial record ShopUnits
{
    private const double Kilowatt = 1e3;
    private const double PoundACubicFoot = Exact.Pound / (Exact.Foot * Exact.Foot * Exact.Foot);

    private static readonly Family PowerFamily = new("power", "kW, W, hp or PS", "2.2, 2200 W or 3 hp", "3, 3 hp or 2.2 kW", "kw", "hp", new()
    {
        ["kw"] = new(Kilowatt),
        ["w"] = new(1, Thousands: true),
        ["watt"] = new(1, Thousands: true),
        ["watts"] = new(1, Thousands: true),
        ["hp"] = new(Exact.Horsepower),
        ["bhp"] = new(Exact.Horsepower),
        ["ps"] = new(Exact.MetricHorsepower),
        ["cv"] = new(Exact.MetricHorsepower),
    });

    private static readonly Family DensityFamily = new("density", "kg/m3, g/cm3 or lb/ft3", "650, 0.65 g/cm3 or 40 lb/ft3", "40, 40 lb/ft3 or 650 kg/m3", "kg/m3", "lb/ft3", new()
    {
        ["kg/m3"] = new(1, Thousands: true),
        ["g/cm3"] = new(1000),
        ["g/cc"] = new(1000),
        ["kg/l"] = new(1000),
        ["t/m3"] = new(1000),
        ["lb/ft3"] = new(PoundACubicFoot),
        ["lbs/ft3"] = new(PoundACubicFoot),
        ["pcf"] = new(PoundACubicFoot),
    });

    private static readonly Family AngleFamily = new("angle", "° or rad", "10, 10° or 0.17 rad", "10, 10° or 0.17 rad", "°", "°", new()
    {
        ["°"] = new(Math.PI / 180),
        ["deg"] = new(Math.PI / 180),
        ["degree"] = new(Math.PI / 180),
        ["degrees"] = new(Math.PI / 180),
        ["rad"] = new(1),
        ["radians"] = new(1),
    });

    /// <summary>Reads a power; hp is the mechanical horsepower, PS the metric one.</summary>
    public Parsed<Power> ReadPower(string? text, TypedField? field = null)
        => ReadOne(text, field ?? Fields.Power, PowerFamily, si => Show(new Power(si))).As(si => new Power(si), Show);

    /// <summary>Reads a density.</summary>
    public Parsed<Density> ReadDensity(string? text, TypedField? field = null)
        => ReadOne(text, field ?? Fields.Density, DensityFamily, si => Show(new Density(si))).As(si => new Density(si), Show);

    /// <summary>Reads an angle; a bare number is degrees, and 10°30' is ten and a half.</summary>
    public Parsed<Angle> ReadAngle(string? text, TypedField? field = null)
    {
        field ??= Fields.AnyAngle;
        var typed = (text ?? "").Trim();
        string Shown(double si) => Show(new Angle(si));
        if (DegreesAndMinutes().Match(Amount.Clean(text)) is { Success: true } m
            && Amount.TryReadAll(m.Groups["deg"].Value, false, out var deg)
            && Amount.TryReadAll(m.Groups["min"].Value, false, out var min))
        {
            if (min.Value >= 60)
                return Parsed<Angle>.Refused(typed, $"In {Quote(typed)} the minutes must be less than 60. Write 10°30' or 10.5°.");
            var size = (deg.Value + (min.Value / 60)) * Math.PI / 180;
            return InRange(m.Groups["sign"].Length > 0 ? -size : size, typed, field, Shown).As(si => new Angle(si), Show);
        }

        return ReadOne(text, field, AngleFamily, Shown).As(si => new Angle(si), Show);
    }

    /// <summary>2.2 kW, or 2.95 hp.</summary>
    public string Show(Power power) => IsInch
        ? With(power.Watts / Exact.Horsepower, 2, "hp")
        : With(power.Watts / Kilowatt, 2, "kW");

    /// <summary>650 kg/m³, or 40.6 lb/ft³.</summary>
    public string Show(Density density) => IsInch
        ? With(density.KilogramsPerCubicMetre / PoundACubicFoot, 1, "lb/ft³")
        : With(density.KilogramsPerCubicMetre, 0, "kg/m³");

    /// <summary>10.5°.</summary>
    public string Show(Angle angle) => Num(angle.Degrees, 1) + "°";

    [GeneratedRegex(@"^(?<sign>-)?\s*(?<deg>\d+)\s*°\s*(?<min>[\d.,]+)\s*(?:'|min)$", RegexOptions.CultureInvariant)]
    private static partial Regex DegreesAndMinutes();
}

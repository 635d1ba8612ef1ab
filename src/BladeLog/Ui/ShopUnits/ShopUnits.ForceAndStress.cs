using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Units;

namespace BladeLog.Ui;

/// <content>Stress in the blade and force on a strand.</content>
public sealed partial record ShopUnits
{
    private const double Megapascal = 1e6;

    private static readonly Family StressFamily = new("stress", "MPa, N/mm2, psi, ksi or bar", "120, 120 MPa or 15000 psi", "15000, 15 ksi or 103 MPa", "mpa", "psi", new()
    {
        ["mpa"] = new(Megapascal),
        ["n/mm2"] = new(Megapascal),
        ["kpa"] = new(1e3),
        ["gpa"] = new(1e9),
        ["pa"] = new(1, Thousands: true),
        ["bar"] = new(1e5),
        ["psi"] = new(Exact.Psi, Thousands: true),
        ["lb/in2"] = new(Exact.Psi, Thousands: true),
        ["lbf/in2"] = new(Exact.Psi, Thousands: true),
        ["ksi"] = new(1000 * Exact.Psi),
        ["kpsi"] = new(1000 * Exact.Psi),
    });

    private static readonly Family ForceFamily = new("force", "N, kN, lbf or kgf", "1400, 1.4 kN or 312 lbf", "312, 312 lbf or 1400 N", "n", "lbf", new()
    {
        ["n"] = new(1, Thousands: true),
        ["kn"] = new(1e3),
        ["dan"] = new(10, Thousands: true),
        ["lbf"] = new(Exact.PoundForce, Thousands: true),
        ["lb"] = new(Exact.PoundForce, Thousands: true),
        ["lbs"] = new(Exact.PoundForce, Thousands: true),
        ["kgf"] = new(Exact.KilogramForce, Thousands: true),
        ["kg"] = new(Exact.KilogramForce, Thousands: true),
        ["kp"] = new(Exact.KilogramForce, Thousands: true),
    });

    /// <summary>Reads a stress; a bare number is MPa or psi.</summary>
    public Parsed<Stress> ReadStress(string? text, TypedField? field = null)
        => ReadOne(text, field ?? PullField, StressFamily, si => Show(new Stress(si))).As(si => new Stress(si), Show);

    /// <summary>Reads a force; pounds and kilograms are taken as pounds-force and kilograms-force.</summary>
    public Parsed<Force> ReadForce(string? text, TypedField? field = null)
        => ReadOne(text, field ?? Fields.Force, ForceFamily, si => Show(new Force(si))).As(si => new Force(si), Show);

    /// <summary>120 MPa, or 17,400 psi: no tension is known to a single psi.</summary>
    public string Show(Stress stress) => IsInch
        ? With(ForFields ? stress.Pascals / Exact.Psi : Math.Round(stress.Pascals / Exact.Psi / 10, MidpointRounding.AwayFromZero) * 10, 0, "psi")
        : With(stress.Megapascals, Math.Abs(stress.Megapascals) < 10 ? 2 : 1, "MPa");

    /// <summary>1390 N, or 312.5 lbf.</summary>
    public string Show(Force force) => IsInch
        ? With(force.Newtons / Exact.PoundForce, 1, "lbf")
        : With(force.Newtons, Math.Abs(force.Newtons) < 100 ? 1 : 0, "N");

    private TypedField PullField => Fields.Stress with { Name = "a " + PullName };
}

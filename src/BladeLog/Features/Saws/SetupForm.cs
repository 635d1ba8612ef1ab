using BladeLog.Handbook.Quantities;
using BladeLog.Records;
using BladeLog.Ui;

namespace BladeLog.Features.Saws;

/// <summary>A saw as its form holds it: every figure as it was typed.</summary>
public sealed record SetupForm : PostedForm
{
    public string? Version { get; init; }

    public string? Code { get; init; }

    public string? Name { get; init; }

    public string? Active { get; init; }

    public string? HasHourMeter { get; init; }

    public string? Wheel1 { get; init; }

    public string? Wheel2 { get; init; }

    public string? Wheel3 { get; init; }

    /// <summary>Measured without the tyre.</summary>
    public string? Rim { get; init; }

    public string? Tyre { get; init; }

    public string? Loop { get; init; }

    public string? LoopLeast { get; init; }

    public string? LoopMost { get; init; }

    public string? WidthLeast { get; init; }

    public string? WidthMost { get; init; }

    public string? Speed1 { get; init; }

    public string? Speed2 { get; init; }

    public string? LowerGuide { get; init; }

    public string? Clearance { get; init; }

    public string? CutHeight { get; init; }

    public string? LongestPiece { get; init; }

    public string? Board { get; init; }

    public string? Resaw { get; init; }

    public string? Beam { get; init; }

    public string? Log { get; init; }

    public string? ClassWork { get; init; }

    public string? StrandForce { get; init; }

    public string? TensionSystem { get; init; }

    public string? Motor { get; init; }

    public string? Idle { get; init; }

    public string? Feeder { get; init; }

    public string? FeederLeast { get; init; }

    public string? FeederMost { get; init; }

    public string? ChangeMinutes { get; init; }

    public string? BreakCost { get; init; }

    public string? Tilt { get; init; }

    public string? MeterFactor { get; init; }

    /// <summary>name, change or error: which of its buttons was pressed.</summary>
    public string? Do { get; init; }

    public string? From { get; init; }

    public string? Reason { get; init; }
}

internal static class SetupReading
{
    /// <summary>Where the shop has not said: engineering defaults.</summary>
    public const double LowerGuideM = 0.050, ClearanceM = 0.010, ChangeMinutes = 8;

    public static SawSetup Read(SetupForm f, FormReading read)
    {
        double Need(string field, double? value, string? text, string sentence) => read.Need(field, value, text, sentence);
        var loop = Need(nameof(f.Loop), read.Length(nameof(f.Loop), f.Loop, Fields.Loop), f.Loop, "Write the loop length it is made for.");
        var takes = (f.Board is null ? 0 : Takes.Board) | (f.Resaw is null ? 0 : Takes.Resaw) | (f.Beam is null ? 0 : Takes.Beam) | (f.Log is null ? 0 : Takes.Log);
        read.RefuseUnless(takes != Takes.None, nameof(f.Board), "Tick at least one kind of work.");
        var setup = new SawSetup
        {
            LoopM = loop,
            LoopLeastM = read.Length(nameof(f.LoopLeast), f.LoopLeast, Fields.Loop) ?? loop,
            LoopMostM = read.Length(nameof(f.LoopMost), f.LoopMost, Fields.Loop) ?? loop,
            WidthLeastM = Need(nameof(f.WidthLeast), read.Length(nameof(f.WidthLeast), f.WidthLeast, Fields.BladeWidth), f.WidthLeast, "Write the narrowest blade it takes."),
            WidthMostM = Need(nameof(f.WidthMost), read.Length(nameof(f.WidthMost), f.WidthMost, Fields.BladeWidth), f.WidthMost, "Write the widest blade it takes."),
            LowerGuideM = read.Length(nameof(f.LowerGuide), f.LowerGuide, Fields.AnyLength) ?? LowerGuideM,
            ClearanceM = read.Length(nameof(f.Clearance), f.Clearance, Fields.AnyLength) ?? ClearanceM,
            CutHeightMostM = Need(nameof(f.CutHeight), read.Length(nameof(f.CutHeight), f.CutHeight, Fields.CutHeight), f.CutHeight, "Write how high it opens."),
            LongestPieceM = read.Length(nameof(f.LongestPiece), f.LongestPiece, Fields.Board),
            Takes = takes,
            ClassWork = read.Choice<ClassWork>(nameof(f.ClassWork), f.ClassWork, null) ?? ClassWork.No,
            StrandForceMostN = read.Force(nameof(f.StrandForce), f.StrandForce),
            TensionSystem = read.Choice<TensionSystem>(nameof(f.TensionSystem), f.TensionSystem, null) ?? TensionSystem.Sprung,
            MotorW = Need(nameof(f.Motor), read.Power(nameof(f.Motor), f.Motor), f.Motor, "Write the motor's power."),
            IdleW = read.Power(nameof(f.Idle), f.Idle),
            FeederN = read.Force(nameof(f.Feeder), f.Feeder),
            FeederLeastMps = read.Feed(nameof(f.FeederLeast), f.FeederLeast),
            FeederMostMps = read.Feed(nameof(f.FeederMost), f.FeederMost),
            ChangeMinutes = read.Duration(nameof(f.ChangeMinutes), f.ChangeMinutes, Fields.Minutes)?.TotalMinutes ?? ChangeMinutes,
            BreakCostMinor = read.Money(nameof(f.BreakCost), f.BreakCost) ?? 0,
            TiltMostRad = read.Angle(nameof(f.Tilt), f.Tilt, Fields.Bevel) ?? 0,
            MeterFactor = read.Number(nameof(f.MeterFactor), f.MeterFactor, "a factor such as 1 or 0.8") ?? 1,
        };
        read.RefuseUnless(setup.MeterFactor is > 0 and <= 1, nameof(f.MeterFactor), "Running hours for each metered hour: above 0, at most 1.");
        AddWheels(setup, f, read);
        AddSpeeds(setup, f, read);
        return setup;
    }

    public static SetupForm FormOf(SawNow saw, ShopUnits units)
    {
        SawSetup s = saw.Setup;
        string L(double m, TypedField? field = null) => units.Typing.Show(new Length(m), field);
        string? Lo(double? m, TypedField? field = null) => m is { } v ? L(v, field) : null;
        string? Tick(Takes kind) => s.Takes.HasFlag(kind) ? "true" : null;
        string? Wheel(int i) => i < s.Wheels.Count ? L(s.Wheels[i].DiameterM, Fields.WheelDiameter) : null;
        SetupSpeed[] speeds = [.. s.Speeds.OrderByDescending(x => x.Usual).ThenBy(x => x.Position)];
        return new SetupForm
        {
            Code = saw.Saw.Code,
            Name = saw.Saw.Name,
            Active = saw.Saw.Active ? "true" : null,
            HasHourMeter = saw.Saw.HasHourMeter ? "true" : null,
            Wheel1 = Wheel(0),
            Wheel2 = Wheel(1),
            Wheel3 = Wheel(2),
            Loop = L(s.LoopM, Fields.Loop),
            LoopLeast = L(s.LoopLeastM, Fields.Loop),
            LoopMost = L(s.LoopMostM, Fields.Loop),
            WidthLeast = L(s.WidthLeastM, Fields.BladeWidth),
            WidthMost = L(s.WidthMostM, Fields.BladeWidth),
            Speed1 = units.Typing.ShowBandSpeed(new Speed(speeds[0].SpeedMps)),
            Speed2 = speeds.Length > 1 ? units.Typing.ShowBandSpeed(new Speed(speeds[1].SpeedMps)) : null,
            LowerGuide = L(s.LowerGuideM),
            Clearance = L(s.ClearanceM),
            CutHeight = L(s.CutHeightMostM, Fields.CutHeight),
            LongestPiece = Lo(s.LongestPieceM, Fields.Board),
            Board = Tick(Takes.Board),
            Resaw = Tick(Takes.Resaw),
            Beam = Tick(Takes.Beam),
            Log = Tick(Takes.Log),
            ClassWork = s.ClassWork.ToString(),
            StrandForce = s.StrandForceMostN is { } n ? units.Typing.Show(new Force(n)) : null,
            TensionSystem = s.TensionSystem.ToString(),
            Motor = units.Typing.Show(new Power(s.MotorW)),
            Idle = s.IdleW is { } idle ? units.Typing.Show(new Power(idle)) : null,
            Feeder = s.FeederN is { } feeder ? units.Typing.Show(new Force(feeder)) : null,
            FeederLeast = s.FeederLeastMps is { } least ? units.Typing.ShowFeed(new Speed(least)) : null,
            FeederMost = s.FeederMostMps is { } most ? units.Typing.ShowFeed(new Speed(most)) : null,
            ChangeMinutes = units.Typing.Show(TimeSpan.FromMinutes(s.ChangeMinutes)),
            BreakCost = units.Typing.ShowMoney(s.BreakCostMinor),
            Tilt = s.TiltMostRad > 0 ? units.Typing.Show(new Angle(s.TiltMostRad)) : null,
            MeterFactor = s.MeterFactor.ToString(System.Globalization.CultureInfo.InvariantCulture),
        };
    }

    /// <summary>Over the tyre; or the rim with twice the tyre, for both wheels.</summary>
    private static void AddWheels(SawSetup setup, SetupForm f, FormReading read)
    {
        string?[] typed = [f.Wheel1, f.Wheel2, f.Wheel3];
        var rim = read.Length(nameof(f.Rim), f.Rim, Fields.WheelDiameter);
        var tyre = read.Length(nameof(f.Tyre), f.Tyre, Fields.TyreThickness);
        for (var i = 0; i < typed.Length; i++)
        {
            var over = read.Length($"Wheel{i + 1}", typed[i], Fields.WheelDiameter) ?? (i < 2 && rim is { } r ? r + (2 * (tyre ?? 0)) : (double?)null);
            if (over is { } diameter)
            {
                setup.Wheels.Add(new SetupWheel { Position = i, DiameterM = diameter, DiameterTyped = typed[i]?.Trim(), Driven = i == 0 });
            }
        }

        read.RefuseUnless(setup.Wheels.Count >= 2 || !read.IsGood, nameof(f.Wheel1), "Write both wheels' diameters over the tyre, or the rim and the tyre.");
    }

    private static void AddSpeeds(SawSetup setup, SetupForm f, FormReading read)
    {
        string?[] typed = [f.Speed1, f.Speed2];
        for (var i = 0; i < typed.Length; i++)
        {
            if (read.BandSpeed($"Speed{i + 1}", typed[i]) is { } speed)
            {
                setup.Speeds.Add(new SetupSpeed { Position = i, SpeedMps = speed, SpeedTyped = typed[i]?.Trim(), Usual = i == 0 });
            }
        }

        read.RefuseUnless(setup.Speeds.Count > 0 || !string.IsNullOrWhiteSpace(f.Speed1), nameof(f.Speed1), "Write the blade speed used for wood.");
    }
}

using BladeLog.Advice.Cuts;
using BladeLog.Advice.Life;
using BladeLog.Handbook.BeamStrength;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Changes;

/// <summary>How a blade would stand on a saw: bending, life, tension and push, all from one set of figures.</summary>
public sealed record BladeStand
{
    public required BladeFile File { get; init; }

    public required BladeBody Body { get; init; }

    public required SawNow Saw { get; init; }

    public required double LoopM { get; init; }

    /// <summary>Tension reckoned with: never more than the saw can pull.</summary>
    public required BladeTension Tension { get; init; }

    /// <summary>Tension the greatest pull of the saw gives this blade; null where that pull is not known.</summary>
    public double? ReachPa { get; init; }

    /// <summary>Tension that was wished for, where the saw cannot give it.</summary>
    public double? WishedPa { get; init; }

    /// <summary>Must not be shown for a held blade: see <see cref="LifeTold"/>.</summary>
    public required LifeOfBlade Life { get; init; }

    public bool LifeTold => File.Hold is null;

    public required ThrustLimits Thrust { get; init; }

    /// <summary>Height of wood the push is told for.</summary>
    public required double HeightM { get; init; }

    public double? UsualRadiusM { get; init; }

    public bool LoopFits => LoopM >= Saw.Setup.LoopLeastM - 1e-9 && LoopM <= Saw.Setup.LoopMostM + 1e-9;

    public bool WidthFits => Body.Width.Value >= Saw.Setup.WidthLeastM - 1e-9 && Body.Width.Value <= Saw.Setup.WidthMostM + 1e-9;

    public Stress Bending => new(Life.Rate!.Result.Bending.Max(b => b.Pascals));

    public BandLifeResult Result => Life.Rate!.Result;

    public double PullN => Tension.Stress.Value * Body.Thickness.Value * Body.BodyWidth;

    public static BladeStand Of(BladeFile file, BladeBody body, SawNow saw, double heightM, LevelPrior level, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(saw);
        ArgumentNullException.ThrowIfNull(settings);
        double section = body.Thickness.Value * body.BodyWidth;
        double? reach = saw.Setup.StrandForceMostN / section;
        BladeTension wished = body.TensionOn(saw.Setup, file, settings), tension = wished;
        if (reach < wished.Stress.Value)
        {
            file = file with { SawId = saw.Setup.SawId, TensionThisSpellPa = reach };
            tension = wished with { Stress = new Known(reach.Value, Provenance.Derived, "greatest pull of the saw"), PullOverSaw = 1 };
        }

        BeamTable beams = new(settings);
        return new BladeStand
        {
            File = file,
            Body = body,
            Saw = saw,
            LoopM = file.LoopM ?? saw.Setup.LoopM,
            Tension = tension,
            ReachPa = reach,
            WishedPa = reach < wished.Stress.Value ? wished.Stress.Value : null,
            Life = LifeOfBlade.Of(file, body, saw, new DamageTable(settings), level, settings),
            Thrust = beams.Of(body, tension, saw.Setup, saw.Setup.UsualSpeedMps, heightM),
            HeightM = heightM,
            UsualRadiusM = body.Kerf.Value > body.Thickness.Value
                ? CurveRadius.Usual(new Length(body.Width.Value), new Length(body.Kerf.Value), new Length(body.Thickness.Value), settings[CutSettings.CurveFactor]).Metres
                : null,
        };
    }
}

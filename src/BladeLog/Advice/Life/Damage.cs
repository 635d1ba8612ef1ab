using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Records;

namespace BladeLog.Advice.Life;

/// <summary>What an hour of running takes from a blade on a saw.</summary>
/// <param name="Gullet">Share of the median life of the gullets.</param>
/// <param name="Weld">Share of the median life of the weld.</param>
/// <param name="Result">The handbook's full answer.</param>
public sealed record Damage(double Gullet, double Weld, BandLifeResult Result)
{
    private double? inner;

    /// <summary>The case it was reckoned for; null: made up for another purpose, and no inner face is known.</summary>
    public BandCase? Case { get; init; }

    /// <summary>Share of the median life of the gullets on the face that lies on the wheels: a blade turned inside out lays its worn face there.</summary>
    public double InnerFace => Case is null ? Gullet : inner ??= Faces.PerLoop(Case).Inner * Result.BendsPerHour / Case.Wheels.Count;

    /// <summary>Share of the median life of the whole blade: 1 over its median hours.</summary>
    public double Blade => 1 / Result.MedianHours;
}

/// <summary>Damage rates, each found once: a shop has few pairs of blade section and saw, and many spells.</summary>
public sealed class DamageTable(AdviceSettings settings)
{
    private readonly Dictionary<Key, Damage> known = [];

    public Damage Of(BladeBody body, WeldQuality weld, SawSetup setup, double speedMps, double tensionPa, double loopM)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(setup);
        Key key = new(body.Thickness.Value, body.BodyWidth, body.Hrc.Value, body.GulletFinish, body.Rusty, weld, setup, speedMps, tensionPa, loopM);
        if (!known.TryGetValue(key, out Damage? damage))
        {
            BandCase asked = new()
            {
                Thickness = new Length(key.Thickness),
                BodyWidth = new Length(key.BodyWidth),
                BodyHrc = key.Hrc,
                Weld = weld,
                Wheels = [.. setup.Wheels.Select(w => new Length(w.DiameterM))],
                BandSpeed = new Speed(speedMps),
                Loop = new Length(loopM),
                Tension = new Stress(tensionPa),
                System = setup.TensionSystem,
                GulletTensionFactor = settings[BladeSettings.GulletTension],
                GulletBendingFactor = settings[BladeSettings.GulletBending],
                KneeBends = settings[BladeSettings.Knee],
                WeibullShape = settings[LifeSettings.Shape],
                Steel = settings.Steel,
                Finish = key.Finish,
                Rusty = key.Rusty,
            };
            BandLifeResult life = BandLife.Of(asked);
            known[key] = damage = new Damage(life.Gullet.DamagePerHour, life.Weld.DamagePerHour, life) { Case = asked };
        }

        return damage;
    }

    // The setup is compared by reference: one row read once for the whole shop.
    private readonly record struct Key(
        double Thickness, double BodyWidth, double Hrc, GulletFinish Finish, bool Rusty, WeldQuality Weld, SawSetup Setup, double Speed, double Tension, double Loop);
}

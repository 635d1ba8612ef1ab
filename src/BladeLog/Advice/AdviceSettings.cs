using BladeLog.Advice.Life;
using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Wear;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>The constants in force: the shop's own where it has set one, the handbook's elsewhere.</summary>
public sealed class AdviceSettings
{
    private readonly Dictionary<SettingDefinition, double> own = [];

    private AdviceSettings(IReadOnlyDictionary<string, Setting> stored)
    {
        List<string> refused = [];
        foreach (Setting setting in stored.Values)
        {
            if (SettingList.Find(setting.Key) is not { } definition)
            {
                continue;
            }

            if (definition.Refuse(setting.Value) is { } why)
            {
                refused.Add(why);
            }
            else
            {
                own[definition] = setting.Value;
            }
        }

        Refused = refused;
        Steel = new Steel(new Stress(this[BladeSettings.YoungsModulus] * 1e9), this[BladeSettings.Poisson], new Density(this[BladeSettings.Density]));
        RunIn = new RunIn(Length.FromMicrometres(this[LifeSettings.RunIn]), this[LifeSettings.RunInPath]);
        Force = new CutModel
        {
            Lambda = this[CutSettings.Lambda],
            ReferenceRadius = Length.FromMicrometres(this[CutSettings.ReferenceRadius]),
            Eta = this[CutSettings.Eta],
            Xi = this[CutSettings.Xi],
            ThrustOffset = Length.FromMicrometres(this[CutSettings.ThrustOffset]),
            ThrustAngle = Angle.FromDegrees(this[CutSettings.ThrustAngle]),
            Friction = this[CutSettings.Friction],
            FractureToughness = this[CutSettings.Toughness],
            ShearYield = Stress.FromMegapascals(this[CutSettings.ShearYield]),
            StiffnessPerDensity = this[CutSettings.PerDensity],
            MoistureDrop = this[CutSettings.MoistureDrop],
            CrossFactor = this[CutSettings.Cross],
            FrozenFactor = this[CutSettings.Frozen],
            FitFactor = this[CutSettings.Fit],
            LeastRadius = Length.FromMicrometres(this[CutSettings.LeastRadius]),
        };
        Level = LevelPrior.Handbook(this);
        WatchMark = Math.Pow(-Math.Log(1 - this[LifeSettings.WatchShare]) / Math.Log(2), 1 / this[LifeSettings.Shape]);
    }

    /// <summary>All at their defaults.</summary>
    public static AdviceSettings Handbook { get; } = From(new Dictionary<string, Setting>());

    public static AdviceSettings From(IReadOnlyDictionary<string, Setting> stored)
    {
        ArgumentNullException.ThrowIfNull(stored);
        return new AdviceSettings(stored);
    }

    /// <summary>Sentences for stored values that lie outside their bounds; their defaults act instead.</summary>
    public IReadOnlyList<string> Refused { get; }

    public Steel Steel { get; }

    public RunIn RunIn { get; }

    public CutModel Force { get; }

    /// <summary>What the handbook alone says of the shop's level of life.</summary>
    public LevelPrior Level { get; }

    /// <summary>Life used at which one in ten of such blades has broken.</summary>
    public double WatchMark { get; }

    /// <summary>The value in the setting's own unit.</summary>
    public double this[SettingDefinition definition] => own.TryGetValue(definition, out double value) ? value : definition.Default;

    public Provenance ProvenanceOf(SettingDefinition definition) => own.ContainsKey(definition) ? Provenance.Yours : definition.Provenance;

    /// <summary>The value with where it comes from.</summary>
    public Known Known(SettingDefinition definition, double toSi = 1) =>
        new(this[definition] * toSi, ProvenanceOf(definition), own.ContainsKey(definition) ? "your setting" : "default, not yours");

    /// <summary>Hardness of the body, HRC, where none is given.</summary>
    public Known Hrc(BodySteel steel) => Known(steel switch
    {
        BodySteel.FlexibleBack => BladeSettings.HrcFlexible,
        BodySteel.SpringTempered => BladeSettings.HrcSpring,
        BodySteel.Bimetal => BladeSettings.HrcBimetal,
        BodySteel.CarbideTipped => BladeSettings.HrcCarbide,
        _ => BladeSettings.HrcWide,
    });

    /// <summary>Tension on the body, Pa, where none is known.</summary>
    public Known Tension(BodySteel steel) => Known(
        steel switch
        {
            BodySteel.FlexibleBack => BladeSettings.TensionFlexible,
            BodySteel.SpringTempered => BladeSettings.TensionSpring,
            BodySteel.Bimetal => BladeSettings.TensionBimetal,
            BodySteel.CarbideTipped => BladeSettings.TensionCarbide,
            _ => BladeSettings.TensionWide,
        },
        1e6);

    /// <summary>Wear, µm per equivalent km.</summary>
    public Known Wear(TipMaterial tip) => Known(tip switch
    {
        TipMaterial.PlainSteel => LifeSettings.WearPlain,
        TipMaterial.HardenedCarbon => LifeSettings.WearHardened,
        TipMaterial.Bimetal => LifeSettings.WearBimetal,
        TipMaterial.CobaltAlloy => LifeSettings.WearCobalt,
        _ => LifeSettings.WearCarbide,
    });

    /// <summary>How a class of wood wears an edge, against a clean medium one.</summary>
    public Known WoodFactor(string woodClass) => woodClass switch
    {
        "A1" => Known(LifeSettings.ClassA1),
        "A2" => Known(LifeSettings.ClassA2),
        "A3" => Known(LifeSettings.ClassA3),
        "A4" => Known(LifeSettings.ClassA4),
        "A5" => Known(LifeSettings.ClassA5),
        "P" => Known(LifeSettings.ClassP),
        "none" => new Known(1, Provenance.EngineeringDefault, "not wood"),
        _ => throw new ArgumentOutOfRangeException(nameof(woodClass), woodClass, "The wear class must be A1 to A5, P or none."),
    };

    public Known DirtFactor(Dirt dirt) => dirt switch
    {
        Dirt.BarkOn => Known(LifeSettings.BarkOn),
        Dirt.Reclaimed => Known(LifeSettings.Reclaimed),
        _ => new Known(1, Provenance.Derived, "clean wood"),
    };
}

using BladeLog.Handbook.Cutting;
using BladeLog.Handbook.Quantities;
using BladeLog.Handbook.Wear;
using BladeLog.Records;

namespace BladeLog.Advice;

/// <summary>What an edge can still do.</summary>
/// <param name="Metres">Metres of cut to dull.</param>
/// <param name="DepthM">Depth they are reckoned at.</param>
/// <param name="FeedMps">Feed they are reckoned at.</param>
/// <param name="CutNumber">The queued cut they are of; null for the reference depth and feed.</param>
public sealed record MetresLeft(double Metres, double DepthM, double FeedMps, int? CutNumber = null);

/// <summary>The cutting edge now: radius, path since the last sharpening, path to dull.</summary>
public sealed record Sharpness
{
    /// <summary>Edge radius now, m.</summary>
    public required double RadiusM { get; init; }

    /// <summary>Radius after the last grind.</summary>
    public required Known Fresh { get; init; }

    /// <summary>Wear, µm per equivalent km.</summary>
    public required Known Wear { get; init; }

    /// <summary>x, equivalent km of wood per tooth since the last sharpening: class and dirt factors applied.</summary>
    public required double PathKm { get; init; }

    /// <summary>x_max, path at which the edge is dull for rough work.</summary>
    public required double PathToDullKm { get; init; }

    /// <summary>Sharpening is due.</summary>
    public required bool Due { get; init; }

    public required RunIn RunIn { get; init; }

    /// <summary>Share of the edge used.</summary>
    public double Used => PathToDullKm > 0 ? PathKm / PathToDullKm : 1;

    /// <summary>At the reference depth and feed of the saw; null where no saw is known.</summary>
    public MetresLeft? Left { get; init; }

    public static Sharpness Of(BladeFile file, BladeBody body, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(settings);
        double x = file.SinceSharpening.Sum(line => Km(line, settings));
        return At(x, body, settings);
    }

    /// <summary>The edge after a given equivalent path.</summary>
    public static Sharpness At(double pathKm, BladeBody body, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(body);
        ArgumentNullException.ThrowIfNull(settings);
        Known wear = settings.Wear(body.TipMaterial);
        Length fresh = new(body.FreshEdge.Value), dull = Length.FromMicrometres(settings[LifeSettings.Dull]);
        double r = EdgeRadius.After(fresh, wear.Value, pathKm, settings.RunIn).Metres;
        return new Sharpness
        {
            RadiusM = r,
            Fresh = body.FreshEdge,
            Wear = wear,
            PathKm = pathKm,
            PathToDullKm = EdgeRadius.PathTo(dull, fresh, wear.Value, settings.RunIn),
            Due = r >= settings[LifeSettings.DueShare] * dull.Metres,
            RunIn = settings.RunIn,
        };
    }

    /// <summary>Radius after so many more equivalent km.</summary>
    public double RadiusAfter(double moreKm) => EdgeRadius.After(new Length(Fresh.Value), Wear.Value, PathKm + moreKm, RunIn).Metres;

    /// <summary>Metres of cut to dull at a depth and feed: (x_max − x)·f L/(v H), the reverse of wood path per tooth.</summary>
    public MetresLeft LeftAt(double depthM, double feedMps, double loopM, double speedMps, double woodFactor = 1, double dirtFactor = 1, int? cut = null)
    {
        double metresOfPath = Math.Max(0, PathToDullKm - PathKm) * 1000 / (woodFactor * dirtFactor);
        double area = Kinematics.SawnAreaForPath(new Length(metresOfPath), new Speed(feedMps), new Length(loopM), new Speed(speedMps)).SquareMetres;
        return new MetresLeft(area / depthM, depthM, feedMps, cut);
    }

    /// <summary>The reference depth and feed of a saw: a mill's where it takes logs.</summary>
    public static (double DepthM, double FeedMps) Reference(SawSetup setup, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(settings);
        return setup.Takes.HasFlag(Takes.Log)
            ? (settings[LifeSettings.ReferenceDepthMill] * 1e-3, settings[LifeSettings.ReferenceFeedMill] / 60)
            : (settings[LifeSettings.ReferenceDepth] * 1e-3, settings[LifeSettings.ReferenceFeed] / 60);
    }

    private static double Km(PathLine line, AdviceSettings settings) => line.PathMm == 0
        ? 0
        : EdgeRadius.EquivalentKm(new Length(line.PathMm * 1e-3), settings.WoodFactor(line.WoodClass).Value, settings.DirtFactor(line.Dirt).Value);
}

using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Tables;

/// <summary>How fast a tooth rounds off.</summary>
/// <param name="Tip">Material of the cutting corner.</param>
/// <param name="WearPerKm">w, µm per equivalent km.</param>
/// <param name="Low">Low end of its range.</param>
/// <param name="High">High end of its range.</param>
/// <param name="RelativeLife">Life between sharpenings against hardened carbon steel (common practice).</param>
/// <param name="FreshRadius">r₀ after a professional grind.</param>
/// <param name="Provenance">Where the rate comes from.</param>
/// <param name="SourceKey">Row of docs/sources.md.</param>
public sealed record ToothWear(TipMaterial Tip, double WearPerKm, double Low, double High, double RelativeLife, Length FreshRadius, Provenance Provenance, string SourceKey);

/// <summary>Wear rates by tooth material.</summary>
public static class ToothWearTable
{
    /// <summary>All rows.</summary>
    public static IReadOnlyList<ToothWear> All { get; } =
    [
        new(TipMaterial.PlainSteel, 4, 1.5, 8, 0.6, Length.FromMicrometres(8), Provenance.EngineeringDefault, "engineering-default"),
        new(TipMaterial.HardenedCarbon, 2.5, 1, 6, 1, Length.FromMicrometres(8), Provenance.EngineeringDefault, "engineering-default"),
        new(TipMaterial.Bimetal, 1.0, 0.4, 2.5, 2.5, Length.FromMicrometres(8), Provenance.EngineeringDefault, "engineering-default"),
        new(TipMaterial.CobaltAlloy, 1.0, 0.4, 2.5, 2.5, Length.FromMicrometres(8), Provenance.EngineeringDefault, "engineering-default"),
        new(TipMaterial.Carbide, 0.25, 0.1, 0.6, 10, Length.FromMicrometres(10), Provenance.EngineeringDefault, "engineering-default"),
    ];

    /// <summary>r₀ after filing by hand (engineering default).</summary>
    public static Length FreshRadiusHandFiled { get; } = Length.FromMicrometres(12);

    /// <summary>The row of a tooth material.</summary>
    /// <remarks>w in µm per equivalent km: plain steel 4, hardened carbon 2.5, bi-metal and cobalt alloy 1, carbide 0.25; a lognormal median, spread ln 2.5.</remarks>
    /// <source key="engineering-default" where="no published rate with author and table was found"/>
    public static ToothWear Of(TipMaterial tip) => All.FirstOrDefault(r => r.Tip == tip)
        ?? throw new ArgumentOutOfRangeException(nameof(tip), tip, "The tooth material must be one of the five known.");
}

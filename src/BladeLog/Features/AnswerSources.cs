namespace BladeLog.Features;

/// <summary>Keys of docs/sources.md behind each kind of computed answer.</summary>
internal static class AnswerSources
{
    public static readonly IReadOnlyList<string> BandLife =
    [
        "derived", "mote-1965", "astm-e140", "dowling-book", "roessle-fatemi-2000", "noll-lipson-1946", "dowling-2009", "haibach", "miner-1945",
        "engineering-default",
    ];

    public static readonly IReadOnlyList<string> Thrust =
    [
        "derived", "pahlitzsch-puttkammer-1974", "timoshenko-gere", "timoshenko-goodier", "lengoc-1990", "lehmann-1993", "wickert-mote",
        "engineering-default",
    ];

    public static readonly IReadOnlyList<string> Cut =
    [
        "derived", "gullet-capacity-note", "orlowski-2013", "loehnertz-cooz", "woodson-1979", "son-2005", "blackman-2012", "radius-tables",
        "engineering-default",
    ];

    /// <summary>A blade by itself: its life on wheels of any width, its edge, what is left of its width.</summary>
    public static readonly IReadOnlyList<string> Blade = [.. BandLife, "ashwell-1950", "common-practice"];

    /// <summary>Which blade for a cut: all of it.</summary>
    public static readonly IReadOnlyList<string> Choice = [.. Blade.Union(Cut).Union(Thrust), "hse-l23"];
}

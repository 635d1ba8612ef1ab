namespace BladeLog.Handbook.Quantities;

/// <summary>The shape of a tooth and its gullet.</summary>
public enum ToothForm
{
    /// <summary>Standard tooth: straight face, triangular gullet over the full pitch.</summary>
    Regular,

    /// <summary>The tooth takes half the pitch; the rest is a wide flat gullet.</summary>
    Skip,

    /// <summary>Face leans forward; round gullet.</summary>
    Hook,
}

/// <summary>What gives the tooth its side clearance.</summary>
public enum TipKind
{
    /// <summary>Teeth bent left and right (spring set).</summary>
    Set,

    /// <summary>Tips upset wider than the body, then side-dressed.</summary>
    Swaged,

    /// <summary>Hard tips brazed or welded on.</summary>
    Tipped,
}

/// <summary>What the cutting corner is made of; governs how fast it rounds off.</summary>
public enum TipMaterial
{
    /// <summary>Plain saw steel, 45 to 50 HRC at the tooth.</summary>
    PlainSteel,

    /// <summary>Carbon steel with hardened tips, 62 to 65 HRC.</summary>
    HardenedCarbon,

    /// <summary>High-speed steel edge on a springy back.</summary>
    Bimetal,

    /// <summary>Cobalt alloy tips.</summary>
    CobaltAlloy,

    /// <summary>Carbide tips.</summary>
    Carbide,
}

/// <summary>The order in which set teeth lean.</summary>
public enum SetPattern
{
    /// <summary>Left, right.</summary>
    Alternate,

    /// <summary>Left, right, straight.</summary>
    Raker,

    /// <summary>No set: swaged or tipped.</summary>
    None,
}

/// <summary>The body (back) of the band, for the default hardness and tension.</summary>
public enum BodySteel
{
    /// <summary>Carbon steel, flexible back.</summary>
    FlexibleBack,

    /// <summary>Carbon steel, spring-tempered.</summary>
    SpringTempered,

    /// <summary>Bi-metal back.</summary>
    Bimetal,

    /// <summary>Back of a carbide-tipped band.</summary>
    CarbideTipped,

    /// <summary>Wide sawmill strip.</summary>
    WideStrip,
}

/// <summary>What is to be cut.</summary>
public enum MaterialKind
{
    /// <summary>Solid wood.</summary>
    Wood,

    /// <summary>Panel of wood and glue.</summary>
    Panel,

    /// <summary>Not wood: known and stored, but no blade is ever advised for it.</summary>
    Other,
}

/// <summary>How smooth the sawn face must be.</summary>
public enum Finish
{
    /// <summary>Bite up to 0.03 mm.</summary>
    Fine,

    /// <summary>Bite up to 0.10 mm.</summary>
    Medium,

    /// <summary>No limit on the bite.</summary>
    Rough,
}

/// <summary>How dirty the wood is.</summary>
public enum Dirt
{
    /// <summary>Clean.</summary>
    Clean,

    /// <summary>Bark on, or dragged logs.</summary>
    BarkOn,

    /// <summary>Reclaimed timber.</summary>
    Reclaimed,
}

/// <summary>How the cut runs to the fibres.</summary>
public enum CutDirection
{
    /// <summary>Rip or resaw: edge and motion both across the fibres, feed along them.</summary>
    Rip,

    /// <summary>Cross-cut.</summary>
    Cross,
}

/// <summary>How well the joint of the loop was made.</summary>
public enum WeldQuality
{
    /// <summary>Dressed flush and tempered.</summary>
    Good,

    /// <summary>Doubtful, or a repair nobody knows about.</summary>
    Doubtful,

    /// <summary>The best that is done: tested, dressed and tempered under control.</summary>
    Best,
}

/// <summary>How the saw holds its wheel load.</summary>
public enum TensionSystem
{
    /// <summary>Spring, weight, air or hydraulic: the load stays when the band stretches.</summary>
    Sprung,

    /// <summary>A rigid screw: the length stays.</summary>
    Locked,
}

/// <summary>Where a number comes from; travels with it to the screen.</summary>
public enum Provenance
{
    /// <summary>Published, and read in the source.</summary>
    Published,

    /// <summary>Follows from other numbers by geometry or algebra.</summary>
    Derived,

    /// <summary>A trade rule without a published source.</summary>
    CommonPractice,

    /// <summary>Published somewhere, quoted from memory.</summary>
    FromMemory,

    /// <summary>Chosen for this program; the shop can set its own.</summary>
    EngineeringDefault,

    /// <summary>The shop's own figure.</summary>
    Yours,
}

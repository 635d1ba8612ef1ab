namespace BladeLog.Ui;

/// <summary>The moment a caution belongs to.</summary>
public enum CautionAt
{
    Mounting,
    Starting,
    Running,
    Breaking,
    Dull,
    Crack,
    Sharpening,
    Tension,
    EndOfDay,
    Joint,
    Folding,
    Retiring,
    UsedBlade,
    Noise,
    People,
    Injury,
}

/// <summary>One caution: what to mind and where that is written. It never stands in the way of recording a fact.</summary>
/// <param name="At">The moment it belongs to.</param>
/// <param name="Sentence">What to mind.</param>
/// <param name="Source">Where it is written, or what it is worth.</param>
public sealed record CautionLine(CautionAt At, string Sentence, string Source);

/// <summary>The one list of cautions; pages and forms take theirs from here.</summary>
public static class CautionList
{
    /// <summary>Stands over the list and under each part of it that is shown elsewhere.</summary>
    public const string Deference = "Guidance only. Local law, the machine's manual and competent people decide.";

    /// <summary>The one line of the swap form.</summary>
    public const string MountingShort = "Power locked off, wheels stopped. Gloves and eye protection on while you hold a blade; gloves off before it runs.";

    private const string Manuals = "common practice in machine manuals";

    public static IReadOnlyList<CautionLine> All { get; } =
    [
        new(CautionAt.Mounting, "Switch off and lock off the power. Wait until every wheel stands still.", "Common practice in machine manuals; 29 CFR 1910.147 (from memory, not checked)"),
        new(CautionAt.Mounting, "Wear gloves and eye protection while a blade is in your hands. Let it uncoil at arm's length.", Manuals),
        new(CautionAt.Mounting, "Teeth point forward and down. Turn the wheels by hand, close guards and doors, take the gloves off, then switch on.", "Common practice in machine manuals; CCOHS on gloves near moving blades"),
        new(CautionAt.Mounting, "The blade must be thin enough for the wheels it bends over.", "HSE WIS31, list of settings"),
        new(CautionAt.Starting, "Blade guarded between guide and wheel case, wheels fully enclosed, a tension device in place.", "29 CFR 1910.213(i)(1)-(2); WAC 296-806-48042"),
        new(CautionAt.Starting, "The guard under the table holds the blade in when it snaps. A worn mouthpiece shows poor upkeep.", "HSE"),
        new(CautionAt.Starting, "Set the upper guide as low as the work allows. Sources say 3 to 13 mm above it: set your shop's own figure.", "WorkSafe New Zealand says within 6 mm; manuals differ"),
        new(CautionAt.Running, "Clicking means a crack. Stop the saw. A narrow blade may crack without any warning, so silence proves nothing.", "HSE; users' reports for narrow blades"),
        new(CautionAt.Running, "Do not brake hard: that can snap a blade.", "HSE"),
        new(CautionAt.Running, "Do not stand in line with the blade, at the side where it would come out.", "University workshop rules"),
        new(CautionAt.Running, "Do not back out of a curve under power, and do not twist a wide blade round a tight one. Make relief cuts.", "WorkSafe New Zealand; university workshop rules"),
        new(CautionAt.Running, "Never run a blade faster than its maker states.", "Cal. 8 CCR 4310(c)"),
        new(CautionAt.Breaking, "Step back and switch off. Wait for all wheels to stop before you open a door: the driven wheel can push the broken end out.", "School workshop rules; a user's account"),
        new(CautionAt.Dull, "A dull, badly set or badly tensioned blade comes off at once. Clean off resin.", "29 CFR 1910.213(s)(1)"),
        new(CautionAt.Crack, "Any crack that can be seen means hold, whatever its length.", "House rule of this program; HSE on cracked blades"),
        new(CautionAt.Crack, "Wide blades of sawmills: a crack longer than 1/10 of the width puts them out of service by law in the US; Washington State adds an inspection each day and at least 60 % of the width.", "29 CFR 1910.265(e)(2)(i); WAC 296-79-27005"),
        new(CautionAt.Crack, "On other saws a cracked blade comes out of service too.", "29 CFR 1910.213(s) (from memory, not checked)"),
        new(CautionAt.Sharpening, "Only people of proven skill sharpen. Eye protection, mind the dust, look for cracks before and after.", "29 CFR 1910.213(s)(5)"),
        new(CautionAt.Tension, "Do not pass the saw's greatest pull. Wide blades are the saw doctor's.", "29 CFR 1910.213(s)(5); Cal. 8 CCR 4296(d)"),
        new(CautionAt.EndOfDay, "Let the tension off at the end of the day and hang the notice on the saw: a slack blade must not be started.", "HSE WIS31; a user's account"),
        new(CautionAt.Joint, "Sawdust burns: keep a fire watch. Air the place, use cadmium-free silver alloy, protect your eyes. Dress and anneal the joint, and test it behind guards. Trained people only.", "A woodworking article on cadmium; common practice for hot work, local rules hold"),
        new(CautionAt.Folding, "Gloves and eye protection, nobody close by. Tie it before you let go.", "common practice"),
        new(CautionAt.Retiring, "Cut it up and throw it away as sharp scrap. Two people for a wide blade.", "common practice"),
        new(CautionAt.UsedBlade, "No proof of its history: inspect the whole loop, the weld and the body, and give it no demanding work first.", "House rule of this program"),
        new(CautionAt.Noise, "Band resaws make 90 to 105 dB: wear ear protection.", "HSE; UK action values 80 and 85 dB a day"),
        new(CautionAt.People, "Only competent people who have been told they may.", "HSE WIS31 rev 1"),
        new(CautionAt.People, "In schools nobody untrained starts a saw, and the teacher clears a hold. A ready checklist for band saws exists.", "NIOSH Publ. 2004-101"),
        new(CautionAt.Injury, "Somebody is hurt: call help and use your accident book. This program keeps blades, not accidents.", "House rule of this program"),
    ];

    /// <summary>Titles only, for those who want to read the rules themselves.</summary>
    public static IReadOnlyList<string> Standards { get; } =
    [
        "EN ISO 19085-16 (table band saws and band re-saws; not log saws, horizontal band saws or engine-driven machines)",
        "ISO 19085-1 (general)", "EN 1807-2 (log band saws)", "EN 1807-1:2013 (older, partly superseded)",
        "29 CFR 1910.213, .265, .147, .95, .132", "HSE L114, WIS31 rev 1, WIS13", "PUWER 1998",
    ];

    public static IEnumerable<CautionLine> For(CautionAt at) => All.Where(c => c.At == at);

    public static string Name(CautionAt at) => at switch
    {
        CautionAt.Mounting => "Changing a blade",
        CautionAt.Starting => "Before starting",
        CautionAt.Running => "While it runs",
        CautionAt.Breaking => "When a blade breaks",
        CautionAt.Dull => "Dull or burning",
        CautionAt.Crack => "Cracks",
        CautionAt.Sharpening => "Sharpening",
        CautionAt.Tension => "Tension",
        CautionAt.EndOfDay => "End of the day",
        CautionAt.Joint => "Welding and brazing",
        CautionAt.Folding => "Folding and coiling",
        CautionAt.Retiring => "Scrapping",
        CautionAt.UsedBlade => "A used blade",
        CautionAt.Noise => "Noise",
        CautionAt.People => "People and training",
        _ => "Somebody is hurt",
    };
}

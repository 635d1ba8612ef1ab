using BladeLog.Advice;
using BladeLog.Advice.Life;
using BladeLog.Handbook.Fatigue;
using BladeLog.Handbook.Quantities;
using BladeLog.Ui;
using BladeLog.Ui.Forms;
using static BladeLog.Features.Shown;

namespace BladeLog.Features.Workings;

/// <summary>The lines of a band's life.</summary>
internal static class BandLifeLines
{
    public static IEnumerable<BecauseLine> Of(BandLifeResult life, Shown shown, AdviceSettings settings)
    {
        bool hours = life.Verdict is LifeVerdict.Marginal or LifeVerdict.Finite;
        yield return Line("Running tension", shown.StressText(life.RunningTension.Pascals), "tension at rest and, where the wheel is sprung, density times speed squared", "mote-1965", Provenance.FromMemory);
        yield return Line("Reversed amplitude at the gullets", shown.StressText(life.Gullet.EquivalentAmplitude.Max(a => a.Pascals)), "Walker: greatest stress to the power 1 less g, times half the bending to the power g; g from the strength of the body", "dowling-2009", Provenance.Published);
        yield return Line("Reversed amplitude at the weld", shown.StressText(life.Weld.EquivalentAmplitude.Max(a => a.Pascals)), "the same over the weld's strength factor, at no more than 40 HRC", "engineering-default", Provenance.EngineeringDefault);
        yield return Line("Median bends at the gullets", Bends(life.Gullet.MedianBends), "stress-life line from the hardness: 4.25 HB + 225 MPa, slope -0.09 with the factor of a ground surface", "roessle-fatemi-2000", Provenance.Published);
        yield return Line("Median bends at the weld", Bends(life.Weld.MedianBends), "the same line at the weld's hardness", "roessle-fatemi-2000", Provenance.EngineeringDefault);
        yield return Line("Median bends of the blade", Bends(life.MedianBends), "gullets and weld in series, whichever breaks first", "derived", settings.ProvenanceOf(LifeSettings.Shape));
        if (hours)
        {
            yield return Line("Median life", Figures.With(Figures.Hours(life.MedianHours), "h"), "median bends over bends an hour", "derived", Provenance.EngineeringDefault);
            yield return Line("1 in 10 broken", Figures.With(Figures.Hours(life.TenthPercentileBends / life.BendsPerHour), "h"), "from the scatter between blades alone, as if the handbook were right in this shop", "engineering-default", settings.ProvenanceOf(LifeSettings.Shape));
        }
    }

    private static string Bends(double bends) => bends switch
    {
        >= 1e9 => "over 1,000 million",
        >= 1e6 => Figures.Number(bends / 1e6, 2) + " million",
        _ => Figures.Number(Math.Round(bends, 0)),
    };

    /// <summary>What a blade of the shop has used, and what is left of it at the rate worked out here.</summary>
    public static IEnumerable<BecauseLine> OfRecord(BandLifeResult life, WorkingCase from)
    {
        if (from.Blade is not { Record: { } record } blade)
        {
            yield break;
        }

        AdviceSettings settings = from.Settings;
        yield return Line("Life used so far", Figures.Used(record.Used.Blade, record.UsedLow, record.UsedHigh),
            record.UnknownHistory ? "bends over median bends on every saw it ran on, with what it may have used before it came" : "bends over median bends on every saw it ran on, 1 where half have broken; in brackets the band that holds 80 of 100",
            "miner-1945", Provenance.EngineeringDefault);
        if (blade.State is BladeState.Broken or BladeState.Retired || record.UnknownHistory || life.Verdict is not (LifeVerdict.Marginal or LifeVerdict.Finite))
        {
            yield break;
        }

        double shape = settings[LifeSettings.Shape], retire = settings[LifeSettings.RetireMark];
        Damage rate = new(life.Gullet.DamagePerHour, life.Weld.DamagePerHour, life);
        string Hours(double mark) => Figures.With(Figures.Hours(record.Reckoned.HoursTo(mark, rate, shape)), "h");
        yield return Line("Hours to where 1 in 10 has broken", Hours(settings.WatchMark), $"until {settings.WatchMark:0.00} of that life is used: look at it before each mount from there on", "derived", settings.ProvenanceOf(LifeSettings.WatchShare));
        yield return Line("Hours to its retire mark", Hours(retire), $"until {retire:0.##} of that life is used", "derived", settings.ProvenanceOf(LifeSettings.RetireMark));
        yield return Line("Hours left to where half have broken", Hours(1), "until all of it is used", "derived", Provenance.EngineeringDefault);
        double ahead = settings[LifeSettings.ChanceHours];
        yield return Line($"To break in the next {Figures.With(Figures.Hours(ahead), "h")}",
            Figures.Chance(Math.Clamp(from.Advice.Level.BreakChance(record.Reckoned.Blade, record.Reckoned.After(ahead, rate, shape).Blade - record.Reckoned.Blade), 0, 1)),
            "over what is known of the shop's level of life, the blade known to be whole", "derived", Provenance.EngineeringDefault);
    }
}

using BladeLog.Handbook.Quantities;

namespace BladeLog.Handbook.Band;

/// <summary>The note of a plucked free span of a band at rest, and the tension heard in it.</summary>
public static class Pluck
{
    /// <summary>The shortest free span the pluck formulas hold for.</summary>
    public static Length ShortestSpan { get; } = Length.FromMillimetres(150);

    /// <summary>The mass of the vibrating band over the mass of the body that carries the tension.</summary>
    /// <remarks>m = (b + h/2) / b. b body width, m; h gullet depth, m, zero or above: the row of teeth half fills its height.</remarks>
    /// <source key="engineering-default" where="teeth as a half-filled sawtooth"/>
    public static double MassRatio(Length bodyWidth, Length gulletDepth)
    {
        double b = Require.Positive(bodyWidth, nameof(bodyWidth), "body width");
        double h = Require.NotNegative(gulletDepth.Metres, nameof(gulletDepth), "gullet depth");
        return (b + h / 2) / b;
    }

    /// <summary>The note of a span whose ends are free to turn.</summary>
    /// <remarks>
    /// f = (1/2l) √(σ/(m ρ)) √(1 + π² e), e = E t²/(12 σ l²). l free span, m; t, m; σ, Pa; E, Pa; ρ, kg/m³; m mass ratio, 1 or above.
    /// From 150 mm of span and t/l under 1/200; outside it throws. With E t² → 0 the note of a string.
    /// </remarks>
    /// <source key="fletcher-rossing" where="ch. 2, stiff string with pinned ends; from memory"/>
    public static Frequency PinnedNote(Stress tension, Length freeSpan, Length thickness, Steel steel, double massRatio)
    {
        ArgumentNullException.ThrowIfNull(steel);
        double sigma = Require.Positive(tension, nameof(tension), "tension");
        (double l, double t) = Span(freeSpan, thickness);
        double m = Require.Positive(massRatio, nameof(massRatio), "mass ratio");
        double e = steel.YoungsModulus.Pascals * t * t / (12 * sigma * l * l);
        return new Frequency(Math.Sqrt(sigma / (m * steel.Density.KilogramsPerCubicMetre)) * Math.Sqrt(1 + Math.PI * Math.PI * e) / (2 * l));
    }

    /// <summary>The note of a span whose ends are held from turning.</summary>
    /// <remarks>f = (1/2l) √(σ/(m ρ)) (1 + 2√e + (4 + π²/2) e), e = E t²/(12 σ l²). Symbols and range as for pinned ends; for small e.</remarks>
    /// <source key="fletcher-rossing" where="ch. 2, stiff string with clamped ends; from memory"/>
    public static Frequency ClampedNote(Stress tension, Length freeSpan, Length thickness, Steel steel, double massRatio)
    {
        ArgumentNullException.ThrowIfNull(steel);
        double sigma = Require.Positive(tension, nameof(tension), "tension");
        (double l, double t) = Span(freeSpan, thickness);
        double m = Require.Positive(massRatio, nameof(massRatio), "mass ratio");
        double e = steel.YoungsModulus.Pascals * t * t / (12 * sigma * l * l);
        double clamped = 1 + 2 * Math.Sqrt(e) + (4 + Math.PI * Math.PI / 2) * e;
        return new Frequency(Math.Sqrt(sigma / (m * steel.Density.KilogramsPerCubicMetre)) * clamped / (2 * l));
    }

    /// <summary>The tension of a span whose ends are free to turn, from its note.</summary>
    /// <remarks>
    /// σ = m ρ (2 l f)² − π² E t²/(12 l²). f, Hz; symbols and range as for the note. A note too low for any tension throws.
    /// </remarks>
    /// <source key="fletcher-rossing" where="ch. 2, stiff string with pinned ends, solved for the tension; from memory"/>
    public static Stress PinnedTension(Frequency note, Length freeSpan, Length thickness, Steel steel, double massRatio)
    {
        ArgumentNullException.ThrowIfNull(steel);
        double f = Require.Positive(note.Hertz, nameof(note), "note");
        (double l, double t) = Span(freeSpan, thickness);
        double m = Require.Positive(massRatio, nameof(massRatio), "mass ratio");
        double string_ = m * steel.Density.KilogramsPerCubicMetre * (2 * l * f) * (2 * l * f);
        double stiff = Math.PI * Math.PI * steel.YoungsModulus.Pascals * t * t / (12 * l * l);
        return string_ > stiff
            ? new Stress(string_ - stiff)
            : throw new ArgumentOutOfRangeException(nameof(note), f, "A note this low means a slack band: there is no tension to hear.");
    }

    /// <summary>The tension of a span whose ends are held from turning, from its note.</summary>
    /// <remarks>
    /// Solves f = (1/2l) √(σ/(m ρ)) (1 + 2√e + (4 + π²/2) e) for σ, by halving between nothing and the tension of the pinned span.
    /// The formula holds for small e; where e at the answer is above 0.02 it throws, as the band is then nearly slack.
    /// </remarks>
    /// <source key="fletcher-rossing" where="ch. 2, stiff string with clamped ends, solved for the tension; from memory"/>
    public static Stress ClampedTension(Frequency note, Length freeSpan, Length thickness, Steel steel, double massRatio)
    {
        double high = PinnedTension(note, freeSpan, thickness, steel, massRatio).Pascals;
        double l = freeSpan.Metres;
        double t = thickness.Metres;
        // Where e is larger the series is past its range and no longer rises with the tension.
        double low = steel.YoungsModulus.Pascals * t * t / (12 * 0.02 * l * l);
        if (low >= high || ClampedNote(new Stress(low), freeSpan, thickness, steel, massRatio).Hertz > note.Hertz)
        {
            throw new ArgumentOutOfRangeException(nameof(note), note.Hertz, "A note this low means a slack band: there is no tension to hear.");
        }

        for (int i = 0; i < 200 && high - low > 1e-12 * high; i++)
        {
            double middle = (low + high) / 2;
            if (ClampedNote(new Stress(middle), freeSpan, thickness, steel, massRatio).Hertz > note.Hertz)
            {
                high = middle;
            }
            else
            {
                low = middle;
            }
        }

        return new Stress((low + high) / 2);
    }

    private static (double Span, double Thickness) Span(Length freeSpan, Length thickness)
    {
        double l = Require.Positive(freeSpan, nameof(freeSpan), "free span");
        double t = Require.Positive(thickness, nameof(thickness), "band thickness");
        if (l < ShortestSpan.Metres)
        {
            throw new ArgumentOutOfRangeException(nameof(freeSpan), l, "The free span must be at least 150 mm: on a shorter one the ends decide the note.");
        }

        return t / l <= 1.0 / 200
            ? (l, t)
            : throw new ArgumentOutOfRangeException(nameof(freeSpan), l, "The free span must be at least 200 times the band thickness: on a shorter one the ends decide the note.");
    }
}

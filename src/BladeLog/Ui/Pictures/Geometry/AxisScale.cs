using System.Globalization;

namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A tick with its number; minor ones lose the number, never the tick, on a narrow page.</summary>
/// <param name="Value">In the unit of the axis.</param>
/// <param name="Percent">Place on the axis.</param>
/// <param name="Text">The number as written.</param>
/// <param name="Minor">Written on wide pages only.</param>
public readonly record struct Tick(double Value, double Percent, string Text, bool Minor);

/// <summary>An axis from one value to another, even or logarithmic, with round ticks that leave each other room.</summary>
public sealed record AxisScale
{
    /// <summary>Widest a figure of the page's type is drawn, px.</summary>
    public const double Letter = 11;

    /// <summary>Plot width of the narrowest page that shows every number, and of the narrowest page at all, px.</summary>
    public const double Wide = 560;
    public const double Narrow = 216;

    private const double Air = 10;
    private const int Most = 9;

    private AxisScale(double from, double to, bool log)
    {
        if (!(double.IsFinite(from) && double.IsFinite(to) && from < to) || (log && from <= 0))
        {
            throw new ArgumentOutOfRangeException(nameof(from), "An axis runs from a smaller to a larger number; a logarithmic one above nought.");
        }

        (From, To, Logarithmic) = (from, to, log);
    }

    public double From { get; }

    public double To { get; }

    public bool Logarithmic { get; }

    public static AxisScale Even(double from, double to) => new(from, to, false);

    public static AxisScale Log(double from, double to) => new(from, to, true);

    /// <summary>From nought to a round number at or above the greatest value.</summary>
    public static AxisScale FromNought(double greatest)
    {
        if (!(double.IsFinite(greatest) && greatest > 0))
        {
            throw new ArgumentOutOfRangeException(nameof(greatest), "The greatest value must be a number above nought.");
        }

        double power = Math.Pow(10, Math.Floor(Math.Log10(greatest)));
        double[] round = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];
        return Even(0, power * round.First(r => r * power >= greatest * (1 - 1e-12)));
    }

    /// <summary>Place of a value in percent of the axis; beyond its ends below 0 or above 100.</summary>
    public double At(double value) => Logarithmic
        ? value <= 0 ? double.NegativeInfinity : 100 * Math.Log(value / From) / Math.Log(To / From)
        : 100 * (value - From) / (To - From);

    public bool Holds(double value) => value >= From && value <= To;

    /// <summary>The value at a place: the reverse of <see cref="At"/>.</summary>
    public double Value(double percent) => Logarithmic
        ? From * Math.Pow(To / From, percent / 100)
        : From + ((To - From) * percent / 100);

    /// <summary>Ticks of a level axis: numbers side by side leave room on a wide page, those not minor also on the narrowest.</summary>
    public IReadOnlyList<Tick> Across()
    {
        double[] values = Choose(v => Room(v, Wide));
        double need = values.Length == 0 ? 0 : values.Max(v => Text(v, values).Length) * Letter + Air;
        List<Tick> ticks = [];
        double last = double.NegativeInfinity;
        foreach (double v in values)
        {
            double at = At(v);
            bool minor = (at - last) / 100 * Narrow < need;
            ticks.Add(new Tick(v, at, Text(v, values), minor));
            last = minor ? last : at;
        }

        return ticks;
    }

    /// <summary>Ticks of an upright axis of a height in px: numbers one above the other leave room.</summary>
    public IReadOnlyList<Tick> Up(double height)
    {
        double[] values = Choose(v => v.Zip(v.Skip(1), (a, b) => (At(b) - At(a)) / 100 * height >= 28).All(x => x));
        return [.. values.Select(v => new Tick(v, At(v), Text(v, values), false))];
    }

    /// <summary>Moves labels apart until each has its room, in their order, inside the ends; the room shrinks when they would not all go in.</summary>
    public static IReadOnlyList<double> Spread(IReadOnlyList<double> wished, double room, double least, double most)
    {
        ArgumentNullException.ThrowIfNull(wished);
        int n = wished.Count;
        double gap = n < 2 ? room : Math.Min(room, (most - least) / (n - 1));
        int[] order = [.. Enumerable.Range(0, n).OrderBy(i => wished[i])];
        double[] placed = new double[n];
        double floor = least;
        foreach (int i in order)
        {
            placed[i] = Math.Max(floor, wished[i]);
            floor = placed[i] + gap;
        }

        double ceiling = most;
        foreach (int i in order.Reverse())
        {
            placed[i] = Math.Min(ceiling, placed[i]);
            ceiling = placed[i] - gap;
        }

        return placed;
    }

    private double[] Choose(Func<double[], bool> fits)
    {
        double[] best = [];
        foreach (double[] values in Candidates())
        {
            if (values.Length <= Most && values.Length > 0 && fits(values))
            {
                return values;
            }

            best = values.Length == 1 ? values : best;
        }

        return best;
    }

    /// <summary>Sets of round numbers inside the axis, from many to few.</summary>
    private IEnumerable<double[]> Candidates()
    {
        double decades = Logarithmic ? Math.Log10(To / From) : 0;
        if (Logarithmic && decades > 1.2)
        {
            foreach (double[] mantissas in (double[][])[[1, 2, 5], [1, 3], [1]])
            {
                yield return Decades(mantissas, 1);
            }

            for (int every = 2; every <= 12; every++)
            {
                yield return Decades([1], every);
            }

            yield break;
        }

        int top = (int)Math.Floor(Math.Log10(To - From)) + 1;
        for (int power = top - 3; power <= top; power++)
        {
            foreach (double m in (double[])[1, 2, 5])
            {
                double step = m * Math.Pow(10, power);
                double first = Math.Ceiling((From / step) - 1e-9), last = Math.Floor((To / step) + 1e-9);
                yield return last - first > 100 ? [] : [.. Enumerable.Range(0, (int)(last - first) + 1).Select(i => Round((first + i) * step, power))];
            }
        }
    }

    private double[] Decades(double[] mantissas, int every)
    {
        int low = (int)Math.Floor(Math.Log10(From)) - 1, high = (int)Math.Ceiling(Math.Log10(To)) + 1;
        return
        [
            .. Enumerable.Range(low, high - low + 1).Where(d => ((d % every) + every) % every == 0)
                .SelectMany(d => mantissas.Select(m => Round(m * Math.Pow(10, d), d)))
                .Where(v => v >= From * (1 - 1e-9) && v <= To * (1 + 1e-9)),
        ];
    }

    private bool Room(double[] values, double width)
    {
        double need = values.Max(v => Text(v, values).Length) * Letter + Air;
        return values.Zip(values.Skip(1), (a, b) => (At(b) - At(a)) / 100 * width >= need).All(x => x);
    }

    // As many decimals as the set needs, the same for all of an even axis; on a logarithmic one each number its own.
    private string Text(double value, double[] values)
    {
        IEnumerable<double> shared = Logarithmic && Math.Log10(To / From) > 1.2 ? [value] : values;
        int decimals = shared.Max(Decimals);
        return value.ToString("#,##0" + (decimals > 0 ? "." + new string('0', decimals) : ""), CultureInfo.InvariantCulture);
    }

    private static int Decimals(double v)
    {
        int d = 0;
        while (d < 9 && Math.Abs((v * Math.Pow(10, d)) - Math.Round(v * Math.Pow(10, d))) > 1e-6 * Math.Max(1, Math.Abs(v * Math.Pow(10, d))))
        {
            d++;
        }

        return d;
    }

    private static double Round(double value, int power) => power >= 0 ? Math.Round(value) : Math.Round(value, Math.Min(15, 1 - power));
}

using BladeLog.Ui.Pictures.Geometry;

namespace BladeLog.Tests.Ui;

/// <summary>Labels of gates and life bands never meet, on any width of page, by their order alone.</summary>
public class AxisPropertyTests
{
    // Half an em is the usual mean width of figures and small letters; bold words are a little wider.
    private const double LetterWidth = 10;
    private const double BoldWidth = 10.6;
    private static readonly double[] Widths = [176, 240, 400, 640, 900];
    private static readonly string[] Names = ["chip room", "motor", "push", "feeder", "blade bends", "usual feed", "finish"];

    [Fact]
    public void Labels_of_random_gates_never_meet()
    {
        var random = new Random(5);
        for (var i = 0; i < 4_000; i++)
        {
            var (noChip, rubs, limits) = Gate(random);
            foreach (var full in new[] { true, false })
            {
                var picture = FeedGateGeometry.Of(noChip, rubs, limits, full, axis: true).Picture;
                foreach (var width in Widths)
                {
                    NothingMeets(picture, width, $"{noChip} {rubs} {string.Join(' ', limits.AsEnumerable())} at {width}");
                }
            }
        }
    }

    [Fact]
    public void Labels_of_random_life_bands_never_meet()
    {
        var random = new Random(6);
        for (var i = 0; i < 4_000; i++)
        {
            var life = Life(random);
            foreach (var width in (double[])[336, 400, 640, 900, 1200])
            {
                NothingMeets(LifeBandGeometry.Of(life, compact: false), width, $"{life} at {width}");
            }
        }
    }

    [Fact]
    public void A_gate_says_what_the_verdict_rule_says()
    {
        var random = new Random(7);
        for (var i = 0; i < 4_000; i++)
        {
            var (noChip, rubs, limits) = Gate(random);
            var (g, a) = (limits.Min(l => l.Green), limits.Min(l => l.Amber));
            var gate = FeedGateGeometry.Of(noChip, rubs, limits, true, true);
            var open = gate.Picture.Marks.OfType<Bar>().Any(b => b.Css == "openpart");
            var passage = gate.Picture.Marks.OfType<Upright>().Where(u => u.Css == "jamb").Select(u => u.X).ToList();
            Assert.Equal(g >= rubs, open);
            Assert.Equal(a < noChip, passage.Count == 0);
            Assert.Equal(a < noChip, gate.Picture.Marks.OfType<Words>().Any(w => w.Text == "shut"));
            if (passage.Count > 0)
            {
                Assert.Equal([FeedGateGeometry.X(a >= rubs || g >= rubs ? rubs : noChip), FeedGateGeometry.X(g >= rubs ? g : a)], passage);
            }

            // Both edges are drawn: beyond the amber one all is wall, and no wall begins before it.
            var wall = gate.Picture.Marks.OfType<Bar>().Where(b => b.Css == "wall").ToList();
            Assert.Contains(wall, b => Math.Abs(b.X - FeedGateGeometry.X(a)) < 1e-9 && Math.Abs(b.X + b.Width - 100) < 1e-9);
        }
    }

    [Fact]
    public void All_marks_of_an_axis_lie_on_it()
    {
        var random = new Random(8);
        for (var i = 0; i < 4_000; i++)
        {
            var (noChip, rubs, limits) = Gate(random);
            var marks = FeedGateGeometry.Of(noChip, rubs, limits, true, true).Picture.Marks
                .Concat(LifeBandGeometry.Of(Life(random), i % 2 == 0).Marks)
                .Concat(WearLineGeometry.Of(2 * random.NextDouble()).Marks);
            foreach (var bar in marks.OfType<Bar>())
            {
                Assert.InRange(bar.X, 0, 100);
                Assert.InRange(bar.Width, 0, 100.000001 - bar.X);
            }
        }
    }

    [Fact]
    public void The_amber_edge_is_hatched_to_where_care_ends()
    {
        var gate = FeedGateGeometry.Of(0.4, 1, [new("push", 4, 8), new("motor", 6, 12)], true, true);
        Assert.Equal(GateVerdict.Fits, gate.Verdict);
        Assert.Equal(4, gate.To);
        var hatched = gate.Picture.Marks.OfType<Bar>().Where(b => b.Css == "hatched").ToList();
        Assert.Equal(2, hatched.Count);
        Assert.Equal(FeedGateGeometry.X(4), hatched[1].X, 1e-9);
        Assert.Equal(FeedGateGeometry.X(8), hatched[1].X + hatched[1].Width, 1e-9);
        Assert.Contains(gate.Picture.Marks.OfType<Words>(), w => w.Text == "with care to 8.0");
        Assert.Contains(gate.Picture.Marks.OfType<Words>(), w => w is { Text: "push 4.0", Css: "gov" });
    }

    [Fact]
    public void The_median_mark_stays_in_the_last_eighth()
    {
        var random = new Random(9);
        for (var i = 0; i < 4_000; i++)
        {
            var life = Life(random);
            Assert.InRange(100 * life.Median / LifeBandGeometry.End(life), 87.5, 100.000001);
        }
    }

    private static (double NoChip, double Rubs, GateLimit[] Limits) Gate(Random random)
    {
        var rubs = Feed(random);
        var limits = Names[..(1 + random.Next(Names.Length))].Select(n =>
        {
            var green = Feed(random) * 1.5;
            return new GateLimit(n, green, random.Next(3) == 0 ? green : green * (1 + random.NextDouble()));
        }).ToArray();
        return (rubs * 0.2, rubs, limits);
    }

    private static double Feed(Random random) => 0.1 * Math.Pow(250, random.NextDouble());

    private static LifeFigures Life(Random random)
    {
        var median = Math.Pow(10, 4 * random.NextDouble());
        var used = 1.6 * median * random.NextDouble();
        var perhaps = random.Next(2) == 0 ? used + median * random.NextDouble() : (double?)null;
        return new(used, median, median * (0.2 + 0.3 * random.NextDouble()), perhaps, random.Next(2) == 0);
    }

    private static void NothingMeets(AxisPicture picture, double width, string what)
    {
        var boxes = picture.Marks.OfType<Words>().Where(w => Shown(w, width)).Select(w => Box(w, width)).ToList();
        for (var i = 0; i < boxes.Count; i++)
        {
            for (var j = i + 1; j < boxes.Count; j++)
            {
                var (a, b) = (boxes[i], boxes[j]);
                Assert.False(a.L < b.R - 1 && b.L < a.R - 1 && a.T < b.B && b.T < a.B, $"'{a.Text}' meets '{b.Text}': {what}");
            }
        }

        foreach (var lead in picture.Marks.OfType<Upright>().Where(u => u.Css == "lead"))
        {
            var x = lead.X * width / 100;
            Assert.DoesNotContain(boxes, t => x > t.L + 1 && x < t.R - 1 && lead.Y1 < t.B && lead.Y2 > t.T);
        }
    }

    // As in the stylesheet: some numbers leave on narrow pages, their ticks stay. The axis of a gate is 184 px narrower than its page.
    private static bool Shown(Words w, double width) => w.Css switch
    {
        { } css when css.Contains("m2", StringComparison.Ordinal) => width > 900,
        { } css when css.Contains("m3", StringComparison.Ordinal) => width > 176,
        { } css when css.Contains("minor", StringComparison.Ordinal) => width > 516,
        _ => true,
    };

    // Letters stand about 15 px above their line and 5 below it.
    private static (double L, double R, double T, double B, string Text) Box(Words w, double width)
    {
        var length = w.Text.Length * (w.Css == "gov" ? BoldWidth : LetterWidth);
        var x = w.X * width / 100 + w.Dx;
        var left = w.Anchor switch { "end" => x - length, "middle" => x - length / 2, _ => x };
        return (left, left + length, w.Y - 14, w.Y + 4, w.Text);
    }
}

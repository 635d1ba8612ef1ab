using System.Globalization;

namespace BladeLog.Tests.Advice;

/// <summary>A figure as printed: it cannot be held closer than its last digit.</summary>
internal readonly record struct Printed(double Value, double HalfDigit)
{
    internal static Printed Of(string text)
    {
        double value = double.Parse(text, CultureInfo.InvariantCulture);
        string mantissa = text.Split('e')[0];
        int exponent = text.Contains('e', StringComparison.Ordinal) ? int.Parse(text.Split('e')[1], CultureInfo.InvariantCulture) : 0;
        int point = mantissa.IndexOf('.', StringComparison.Ordinal), decimals = point < 0 ? 0 : mantissa.Length - point - 1;
        return new Printed(value, 0.5 * Math.Pow(10, exponent - decimals));
    }

    internal bool Holds(double actual, double relative) => Math.Abs(actual - Value) <= (HalfDigit * 1.0001) + (relative * Math.Abs(Value));
}

/// <summary>What the invented shop must show. The figures come from an independent program, not from this one.</summary>
internal static class DemoShopExpected
{
    internal sealed record BladeFigures(
        string Tag, string Bending, string MegaBends, string Gullet, string Weld, string Used, string? Low, string? High, bool NotLimiting,
        string? Median, string? OneInTen, string? Left, string? Governs, string? EdgeUm, string? Metres);

    internal sealed record CutFigures(
        int Number, string Tag, string Saw, double Speed, string Verdict, string Low, string High, string SetBy, string Minutes, string Cost, string? Second, string? SecondVerdict, string? SecondCost);

    internal static readonly BladeFigures[] Blades =
    [
        new("Q-01", "207", "5.553", "0.00684", "0.000997", "0.00691", "0.0014", "0.033", true, null, null, null, "sharpenings", "14.6", "916"),
        new("Q-02", "184", "3.877", "0.000694", "9.5e-05", "0.000701", "0.00015", "0.0033", true, null, null, null, "sharpenings", "11.2", "990"),
        new("Q-03", "149", "1.598", "5.16e-06", "7.03e-07", "5.21e-06", "1.1e-06", "2.5e-05", true, null, null, null, "sharpenings", "13.2", "953"),
        new("Q-04", "207", "1.650", "0.00203", "0.000296", "0.00205", "0.00043", "0.0098", true, null, null, null, null, null, null),
        new("Q-05", "230", "7.989", "0.00349", "0.00095", "0.00362", "0.00076", "0.017", true, null, null, null, "width", "11.0", "614"),
        new("Q-06", "184", "0.681", "0.000122", "1.67e-05", "0.000123", "2.6e-05", "0.00059", true, null, null, null, "unknown history", "16.9", "843"),
        new("Q-04b", "266", "2.783", "0.0953", "0.391", "0.402", "0.084", "1.9", false, "84.59", "33", "50.5", "welds", "14.0", "735"),
        new("Q-07", "266", "3.930", "0.0109", "0.00523", "0.0121", "0.0025", "0.058", true, null, null, null, "sharpenings", "10.0", "7494"),
        new("Q-08", "266", "2.132", "0.00591", "0.00284", "0.00655", "0.0014", "0.031", true, null, null, null, "sharpenings", "12.7", "7458"),
        new("Q-09", "266", "10.325", "0.85", "0.141", "0.862", "0.18", "4.1", false, "360", "140", "49.7", "fatigue", "18.0", "634"),
        new("Q-10", "236", "2.931", "0.0304", "0.00483", "0.0307", "0.0064", "0.15", false, "2863", "1116", "2775", "sharpenings", "8.0", "807"),
        new("Q-11", "188", "1.499", "0.000211", "3.23e-05", "0.000213", "4.5e-05", "0.001", true, null, null, null, "sharpenings", "9.0", "800"),
        new("Q-12", "188", "0.633", "5.28e-05", "8.95e-06", "5.35e-05", "1.1e-05", "0.00025", true, null, null, null, "edge", "14.0", "735"),
        new("Q-13", "192", "2.398", "4.85e-05", "1.6e-05", "5.11e-05", "1.1e-05", "0.00024", true, null, null, null, "sharpenings", "11.4", "1974"),
        new("Q-14", "266", "4.430", "0.365", "0.0606", "0.37", "0.078", "1.8", false, "360", "140", null, "crack", "16.9", "663"),
        new("Q-15", "266", "0.000", "0", "0", "0", null, null, false, "360", "140", "360", "new", "8.0", "807"),
        new("Q-16", "188", "0.000", "0", "0", "0", null, null, true, null, null, null, "new", "8.0", "807"),
        new("Q-17", "369", "0.369", "0.309", "0.143", "0.34", "0.071", "1.6", false, "26.44", "10.3", "17.4", "fatigue", "12.3", "620"),
        new("Q-18", "290", "1.559", "0.132", "0.0276", "0.135", "0.028", "0.64", false, "281", "110", "243", "sharpenings", "15.6", "567"),
        new("Q-19", "369", "0.328", "0.275", "0.127", "0.303", "0.063", "1.4", false, "26.44", "10.3", "18.4", "fatigue", "15.8", "561"),
        new("Q-20", "369", "0.554", "0.421", "0.199", "0.466", "0.098", "2.2", false, "29", "11.3", "15.5", "fatigue", "13.2", "608"),
        new("Q-21", "369", "0.246", "0.169", "0.0821", "0.188", "0.039", "0.9", false, "31.88", "12.4", "25.9", "fatigue", "9.4", "646"),
        new("Q-22", "464", "0.172", "0.984", "0.508", "1.11", "0.23", "5.3", false, "3.792", "1.48", null, null, null, null),
        new("Q-23", "369", "1.190", "0.995", "0.46", "1.1", "0.23", "5.2", false, "26.44", "10.3", null, null, null, null),
        new("Q-24", "369", "0.000", "0", "0", "0", null, null, false, "26.44", "10.3", "26.4", "new", "8.0", "655"),
        new("Q-25", "369", "0.164", "0.137", "0.0635", "0.151", "0.032", "0.72", false, "26.44", "10.3", "22.4", "fatigue", "13.6", "602"),
        new("Q-26", "639", "0.027", "0.255", "0.473", "0.537", "0.11", "2.6", false, "0.5586", "0.218", null, null, null, null),
        new("Q-27", "639", "0.045", "0.425", "0.788", "0.895", "0.19", "4.3", false, "0.5586", "0.218", null, null, null, null),
        new("Q-28", "639", "0.064", "0.595", "1.1", "1.25", "0.26", "6", false, "0.5586", "0.218", null, null, null, null),
        new("Q-29", "639", "0.100", "0.934", "1.73", "1.97", "0.41", "9.4", false, "0.5586", "0.218", null, null, null, null),
        new("Q-30", "363", "1.046", "0.0298", "0.0628", "0.0695", "0.015", "0.33", false, "165", "64.5", "154", "edge", "13.6", "408"),
        new("Q-31", "363", "0.000", "0", "0", "0", null, null, false, "165", "64.5", "165", "new", "8.0", "443"),
        new("Q-32", "452", "0.422", "0.422", "0.414", "0.591", "0.12", "2.8", false, "15.91", "6.2", "6.51", "fatigue", "39.2", "21"),
        new("Q-33", "452", "0.534", "0.534", "0.524", "0.748", "0.16", "3.6", false, "15.91", "6.2", "4.01", "fatigue", "8.0", "799"),
        new("Q-34", "452", "0.287", "0.287", "0.282", "0.402", "0.084", "1.9", false, "15.91", "6.2", "9.51", "fatigue", "8.0", "799"),
        new("Q-35", "452", "0.359", "0.359", "0.352", "0.503", "0.11", "2.4", false, "15.91", "6.2", "7.91", "fatigue", "8.0", "799"),
        new("Q-36", "452", "0.709", "0.709", "0.695", "0.993", "0.21", "4.7", false, "15.91", "6.2", null, null, null, null),
        new("Q-37", "452", "0.848", "0.848", "0.832", "1.19", "0.25", "5.7", false, "15.91", "6.2", null, null, null, null),
        new("Q-38", "452", "0.628", "0.628", "0.616", "0.88", "0.18", "4.2", false, "15.91", "6.2", null, "width", null, null),
        new("Q-39", "452", "0.139", "0.139", "0.136", "0.195", "0.041", "0.93", false, "15.91", "6.2", null, null, null, null),
        new("Q-40", "380", "0.000", "0", "0", "0", null, null, false, "75.08", "29.3", "75.1", "new", "8.0", "799"),
    ];

    internal static readonly CutFigures[] Cuts =
    [
        new(1, "Q-17", "S3", 15.2, "fits", "0.76", "2.00", "practical", "12", "10.36", "Q-18", "fits", "14.82"),
        new(2, "Q-08", "S2", 23.5, "fits", "1.76", "4.79", "power", "5", "9.38", "Q-13", "fits", "13.63"),
        new(3, "Q-13", "S2", 23.5, "fits", "1.51", "5.25", "power", "14", "102.63", "Q-15", "fits", "156.12"),
        new(4, "Q-13", "S2", 23.5, "fits", "1.51", "4.94", "chip room", "13", "25.66", "Q-08", "fits", "27.81"),
        new(5, "Q-02", "S1", 20.7, "fits", "0.97", "2.00", "practical", "31", "26.38", "Q-03", "fits", "26.17"),
        new(6, "Q-02", "S1", 20.7, "fits", "0.97", "4.00", "practical", "46", "39.68", "Q-03", "fits", "39.27"),
        new(7, "Q-01", "S1", 20.7, "fits", "0.89", "5.91", "chip room", "5", "8.01", "Q-40", "fits", "11.71"),
        new(8, "Q-21", "S3", 7.6, "with care", "1.43", "2.00", "beam", "47", "38.33", null, null, null),
        new(9, "Q-21", "S3", 7.6, "with care", "1.43", "2.00", "beam", "36", "29.13", null, null, null),
        new(10, "Q-17", "S3", 15.2, "fits", "0.76", "2.00", "practical", "8", "7.74", "Q-18", "fits", "12.22"),
        new(11, "Q-40", "S5", 25.0, "fits", "0.29", "9.64", "chip room", "12", "20.51", "Q-32", "with care", "19.90"),
        new(12, "Q-32", "S5", 25.0, "fits", "1.47", "14.29", "chip room", "4", "9.36", "Q-01", "fits", "10.64"),
        new(14, "Q-08", "S2", 23.5, "fits", "1.76", "4.50", "power", "7", "11.35", "Q-13", "fits", "14.97"),
        new(15, "Q-21", "S3", 7.6, "with care", "1.43", "2.00", "beam", "21", "17.05", "Q-20", "with care", "19.17"),
    ];
}

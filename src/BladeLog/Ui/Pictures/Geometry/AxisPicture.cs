namespace BladeLog.Ui.Pictures.Geometry;

/// <summary>A mark on a picture whose x runs in percent of the page and whose y runs in px, so that text never scales.</summary>
public abstract record AxisMark;

/// <summary>A filled part of a band.</summary>
public sealed record Bar(string Css, double X, double Y, double Width, double Height, string? Fill = null) : AxisMark;

/// <summary>An upright line.</summary>
public sealed record Upright(string Css, double X, double Y1, double Y2) : AxisMark;

/// <summary>A level line.</summary>
public sealed record Level(string Css, double X1, double X2, double Y) : AxisMark;

/// <summary>An arrow head of fixed size, its point at (X, Y); Right means it points to the right.</summary>
public sealed record Head(double X, double Y, bool Right) : AxisMark;

/// <summary>A solid head at the frame: the bar goes on beyond it.</summary>
public sealed record Beyond(double X, double Y, double Half, double Length) : AxisMark;

/// <summary>Words at a leader.</summary>
public sealed record Words(string? Css, double X, int Dx, double Y, string Text, string Anchor = "start") : AxisMark;

/// <summary>A whole picture on an axis.</summary>
public sealed record AxisPicture(double Height, IReadOnlyList<AxisMark> Marks);

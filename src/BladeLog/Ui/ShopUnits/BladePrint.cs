using BladeLog.Handbook.Quantities;

namespace BladeLog.Ui;

/// <summary>What the printed strip on a blade says; null where it does not say.</summary>
public sealed record BladePrint(Length? Width, Length? Thickness, ToothPitch? Pitch, Length? Loop);

using System.Globalization;
using BladeLog.Ui;

namespace BladeLog.Features.Prints;

/// <summary>Times as a printout tells them: paper is read another day, so the day and the year stand there.</summary>
internal static class Printing
{
    public static string When(DateTime utc, ShopUnits units) => Said.Local(utc, units).ToString("d MMM yyyy, HH:mm", CultureInfo.InvariantCulture);
}

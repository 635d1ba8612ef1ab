using static BladeLog.Handbook.Quantities.Provenance;

namespace BladeLog.Advice;

/// <summary>When to order, and how long a timer may run on.</summary>
public static class StockSettings
{
    public static readonly SettingDefinition Least = new("stock.least", "Least blades at hand of each kind that is in use", 1, "blades", 0, 100, EngineeringDefault, "when to order");
    public static readonly SettingDefinition LeadDays = new("stock.lead_days", "Days from an order until the blades are here", 14, "days", 0, 365, EngineeringDefault, "when to order");
    public static readonly SettingDefinition RecentWeeks = new("stock.recent_weeks", "Weeks looked back for the hours a kind runs", 8, "weeks", 1, 104, EngineeringDefault, "when to order");
    public static readonly SettingDefinition TimerCap = new("stock.timer_cap", "Hours after which a timer still running is asked about", 12, "h", 1, 72, EngineeringDefault, "the timer of a saw without an hour meter");

    public static IReadOnlyList<SettingDefinition> All { get; } = [Least, LeadDays, RecentWeeks, TimerCap];
}

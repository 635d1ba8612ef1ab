
namespace BladeLog.Features;

/// <summary>What every page has at hand for one request: the moment, and what its title block says.</summary>
internal sealed class Desk(TimeProvider clock)
{
    /// <summary>Taken once, so that one request has one now.</summary>
    public DateTime Now { get; } = clock.GetUtcNow().UtcDateTime;
}

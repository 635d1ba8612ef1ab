namespace BladeLog.Records.Writing;

/// <summary>The shop itself; the first one makes its row.</summary>
public sealed record SaveShop(Shop Shop, int? Version = null) : Command;

/// <summary>What the shop's network calls this machine, for the codes on labels; nothing: a label holds the bare tag.</summary>
public sealed record SaveLanName(string? LanName, int? Version = null) : Command;

/// <summary>A default set by the shop; without a value it goes back to the handbook's.</summary>
public sealed record SaveSetting(string Key, double? Value, string Typed) : Command;

public sealed record AddPerson(string Initials, string Name, IReadOnlyList<Role> Roles) : Command;

public sealed record EditPerson(string Initials, int Version, string Name, bool Active, IReadOnlyList<Role> Roles) : Command;

namespace BladeLog.Records.Writing;

/// <summary>The shop itself; the first one makes its row.</summary>
public sealed record SaveShop(Shop Shop, int? Version = null) : Command;

/// <summary>A default set by the shop; without a value it goes back to the handbook's.</summary>
public sealed record SaveSetting(string Key, double? Value, string Typed) : Command;

public sealed record AddPerson(string Initials, string Name, IReadOnlyList<Role> Roles) : Command;

public sealed record EditPerson(string Initials, int Version, string Name, bool Active, IReadOnlyList<Role> Roles) : Command;

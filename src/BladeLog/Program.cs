using BladeLog.Hosting;

var call = CommandLine.Read(args);
if (call.Wrong is { } sentence)
{
    await Console.Error.WriteLineAsync(sentence);
    return 2;
}

if (call.Verb is not null)
{
    return await Commands.Run(call);
}

await using var app = ShopHost.Build(call);
if (await ShopHost.Open(app) is { } trouble)
{
    await Console.Error.WriteLineAsync(trouble);
    return 2;
}

await app.RunAsync();
return 0;

/// <summary>The program's entry point; public so that the tests can host it.</summary>
public partial class Program;

using BladeLog.Hosting;

namespace BladeLog.Tests;

public sealed class CommandLineTests
{
    [Fact]
    public void Without_a_word_the_program_serves()
    {
        var call = CommandLine.Read([]);
        Assert.Null(call.Wrong);
        Assert.Null(call.Verb);
        Assert.False(call.Sample);
        Assert.Empty(call.ForTheFramework);
    }

    [Theory]
    [InlineData("verify", null)]
    [InlineData("backup copy.db", "copy.db")]
    [InlineData("restore copy.db", "copy.db")]
    [InlineData("backup copy.db --data shop", "copy.db")]
    [InlineData("--data shop backup copy.db", "copy.db")]
    public void A_verb_is_known_wherever_it_stands(string line, string? operand)
    {
        var call = CommandLine.Read(line.Split(' '));
        Assert.Null(call.Wrong);
        Assert.Equal(line.Split(' ').Single(w => w is "verify" or "backup" or "restore"), call.Verb);
        Assert.Equal(operand, call.Operand);
        Assert.Equal(line.Contains("--data", StringComparison.Ordinal) ? "shop" : null, call.DataDir);
    }

    [Theory]
    [InlineData("--urls http://127.0.0.1:7000", "http://127.0.0.1:7000")]
    [InlineData("--urls=http://localhost:7000;http://[::1]:7001", "http://localhost:7000;http://[::1]:7001")]
    [InlineData("--urls http://*:7000", "http://*:7000")]
    [InlineData("--urls http://+:7000", "http://+:7000")]
    public void An_address_is_passed_on(string line, string urls)
    {
        var call = CommandLine.Read(line.Split(' '));
        Assert.Null(call.Wrong);
        Assert.Equal(urls, call.Urls);
        Assert.Contains($"--urls={urls}", call.ForTheFramework);
    }

    [Theory]
    [InlineData("--sample")]
    [InlineData("--sample --urls http://127.0.0.1:7000")]
    [InlineData("--sample --urls http://localhost:7000")]
    [InlineData("--urls http://[::1]:7000 --sample")]
    public void The_sample_is_served_to_this_machine(string line)
    {
        var call = CommandLine.Read(line.Split(' '));
        Assert.Null(call.Wrong);
        Assert.True(call.Sample);
        Assert.Contains("--sample=true", call.ForTheFramework);
    }

    [Theory]
    [InlineData("serve", "'serve' is not a command.")]
    [InlineData("verify now", "'now' is not a command.")]
    [InlineData("Verify", "'Verify' is not a command.")]
    [InlineData("backup a.db b.db", "'b.db' is not a command.")]
    [InlineData("backup", "backup needs a file: backup shop-copy.db.")]
    [InlineData("restore --data shop", "restore needs a file: restore shop-copy.db.")]
    [InlineData("--port 80", "'--port' is not an option. Known are: --sample, --data DIR, --urls ADDRESS.")]
    [InlineData("--sample=maybe", "--sample takes no value")]
    [InlineData("--data", "--data needs a folder: --data /path/to/folder.")]
    [InlineData("--data --sample", "--data needs a folder")]
    [InlineData("--data=", "--data needs a folder")]
    [InlineData("--urls", "--urls needs an address such as http://127.0.0.1:5080.")]
    [InlineData("--urls 5080", "--urls needs an address such as http://127.0.0.1:5080.")]
    [InlineData("--urls http://127.0.0.1:1;nonsense", "--urls needs an address")]
    [InlineData("--sample --urls http://0.0.0.0:5080", "only to this machine")]
    [InlineData("--sample --urls http://*:5080", "only to this machine")]
    [InlineData("--sample --urls http://192.0.2.7:5080", "only to this machine")]
    [InlineData("--sample --urls http://127.0.0.1:5080;http://192.0.2.7:5080", "only to this machine")]
    [InlineData("--urls http://shop.example:5080 --sample", "only to this machine")]
    public void A_bad_call_is_answered_with_one_sentence(string line, string sentence)
    {
        var call = CommandLine.Read(line.Split(' '));
        Assert.NotNull(call.Wrong);
        Assert.Contains(sentence, call.Wrong, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', call.Wrong);
        Assert.EndsWith(".", call.Wrong, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_bad_call_ends_with_two_and_one_line_on_standard_error()
    {
        var start = new System.Diagnostics.ProcessStartInfo("dotnet")
        {
            RedirectStandardError = true,
            RedirectStandardOutput = true,
            ArgumentList = { typeof(Program).Assembly.Location, "--sample", "--urls", "http://192.0.2.7:5080" },
        };
        using var program = System.Diagnostics.Process.Start(start)!;
        var said = await program.StandardError.ReadToEndAsync();
        await program.WaitForExitAsync();
        Assert.Equal(2, program.ExitCode);
        Assert.Single(said.Split('\n', StringSplitOptions.RemoveEmptyEntries));
        Assert.Contains("only to this machine", said, StringComparison.Ordinal);
    }
}

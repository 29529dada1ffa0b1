using SampleWell.Twins;

namespace DepthStress.Tests.Cli;

/// <summary>An interrupted run ends with 130 and leaves earlier results whole.</summary>
public sealed class CliInterruptTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task A_command_cancelled_before_it_starts_ends_with_130_and_writes_nothing()
    {
        var name = _cli.SmallWell("well.toml");
        using var source = new CancellationTokenSource();
        await source.CancelAsync();
        foreach (var command in new[] { "run", "check" })
        {
            var result = await _cli.RunAsync(source.Token, command, name);
            Assert.Equal((130, "", "interrupted; earlier results are as they were\n"), (result.Code, result.Output, result.Error));
        }

        Assert.Empty(Directory.EnumerateDirectories(_cli.Folder.Path));
    }

    [Fact]
    public async Task A_run_cancelled_in_the_middle_leaves_earlier_results_whole()
    {
        // The second run has other input, so that its results would differ; it is stopped when it has begun to write them.
        _cli.SmallWell("a.toml");
        Assert.Equal(0, (await _cli.RunAsync("run", "a.toml")).Code);
        var before = _cli.Files("a-results");
        Twin.Write(_cli.Folder.Path, 200_000, 1);
        File.Move(_cli.Folder.Of("twin.toml"), _cli.Folder.Of("a.toml"), overwrite: true);

        using var source = new CancellationTokenSource();
        var run = _cli.RunAsync(source.Token, "run", "a.toml");
        while (!run.IsCompleted && !HasIncoming()) await Task.Delay(1);
        await source.CancelAsync();
        var result = await run;

        Assert.Equal((130, "interrupted; earlier results are as they were\n"), (result.Code, result.Error));
        Assert.Equal(before, _cli.Files("a-results"));
        Assert.False(HasIncoming(), "half-written results are removed");
    }

    /// <summary>True while new results are being written beside the earlier ones.</summary>
    private bool HasIncoming() => Directory.EnumerateDirectories(_cli.Folder.Path).Any(d => Path.GetFileName(d) != "a-results");
}

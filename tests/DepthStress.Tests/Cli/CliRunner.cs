using DepthStress.Cli;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Cli;

/// <summary>What a command line did.</summary>
/// <param name="Code">Exit code.</param>
/// <param name="Output">Results.</param>
/// <param name="Error">Messages.</param>
internal sealed record CliResult(int Code, string Output, string Error);

/// <summary>Runs command lines in this process, in a folder of their own that goes away with it.</summary>
internal sealed class CliRunner : IDisposable
{
    public TestFolder Folder { get; } = new();

    /// <summary>Columns of the terminal.</summary>
    public int Width { get; init; } = 120;

    public Task<CliResult> RunAsync(params string[] args) => RunAsync(CancellationToken.None, args);

    public async Task<CliResult> RunAsync(CancellationToken cancellation, params string[] args)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = await Application.RunAsync(args, new Terminal(output, error, Folder.Path, Width: Width), cancellation);
        return new CliResult(code, output.ToString(), error.ToString());
    }

    /// <summary>Writes a small sound well and its logs into a folder below this one; gives the well file's name.</summary>
    public string SmallWell(string name, string folder = "")
    {
        Folder.Write(Path.Combine(folder, name), WellText.Sound);
        Folder.Write(Path.Combine(folder, "logs.csv"), WellText.Logs);
        return Path.Combine(folder, name);
    }

    /// <summary>Writes the small well with its logs or its well file exchanged; runs <c>check</c> and gives the messages.</summary>
    public async Task<string[]> CheckAsync(string well, string? logs)
    {
        Folder.Write("well.toml", well);
        if (logs is not null) Folder.Write("logs.csv", logs);
        var result = await RunAsync("check", "well.toml");
        Assert.True(result.Code == 2 || !result.Error.Contains(": error: ", StringComparison.Ordinal), "errors end with 2");
        Assert.True(result.Code == 0 || result.Output.Length == 0, "what cannot be used gives no results");
        return result.Error.Split('\n', StringSplitOptions.RemoveEmptyEntries);
    }

    /// <summary>The names and bytes of a folder's files, hidden ones included.</summary>
    public SortedDictionary<string, string> Files(string folder) => new(
        Directory.EnumerateFiles(Folder.Of(folder)).ToDictionary(f => Path.GetFileName(f), f => Convert.ToHexString(File.ReadAllBytes(f))), StringComparer.Ordinal);

    public void Dispose() => Folder.Dispose();
}

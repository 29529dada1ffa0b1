using BenchmarkDotNet.Attributes;
using DepthStress.Cli;

namespace DepthStress.Benchmarks;

/// <summary>A whole <c>run</c> in process, results on disk.</summary>
[MemoryDiagnoser]
public class RunBenchmarks
{
    private BenchmarkWell _well = null!;

    [Params(15_000, 1_000_000)]
    public int Samples { get; set; }

    [GlobalSetup]
    public void Setup() => _well = new BenchmarkWell(Samples);

    [GlobalCleanup]
    public void Cleanup() => _well.Dispose();

    [Benchmark]
    public async Task<int> Run()
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var terminal = new Terminal(output, error, Path.GetDirectoryName(_well.Path)!);
        return await Application.RunAsync(["run", _well.Path], terminal, CancellationToken.None);
    }
}

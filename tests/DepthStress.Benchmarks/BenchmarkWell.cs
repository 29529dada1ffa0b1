using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using SampleWell.Twins;

namespace DepthStress.Benchmarks;

/// <summary>An invented well of a chosen size in a folder of its own, removed when it is disposed.</summary>
internal sealed class BenchmarkWell : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("depthstress-bench-").FullName;

    public BenchmarkWell(int samples) => Path = Large.Write(_folder, samples);

    /// <summary>Path of the well file.</summary>
    public string Path { get; }

    /// <summary>Reads the well file.</summary>
    public WellFile ReadSetup() => WellFileReader.Read(Path, new DiagnosticBag())!;

    /// <summary>Reads the logs.</summary>
    public static IngestedLogs ReadLogs(WellFile well) => LogIngest.Read(well, new DiagnosticBag())!;

    /// <summary>Computes the model.</summary>
    public static EarthModel Compute(WellFile well, IngestedLogs logs) => Chain.Run(well.Setup, logs.Logs, new DiagnosticBag())!;

    public void Dispose() => Directory.Delete(_folder, recursive: true);
}

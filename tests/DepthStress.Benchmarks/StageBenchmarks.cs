using BenchmarkDotNet.Attributes;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Files.Writing;
using DepthStress.Report;

namespace DepthStress.Benchmarks;

/// <summary>Reading, computing and writing one well, each alone.</summary>
[MemoryDiagnoser]
public class StageBenchmarks
{
    private BenchmarkWell _well = null!;
    private WellFile _file = null!;
    private IngestedLogs _logs = null!;
    private EarthModel _model = null!;

    [Params(15_000, 1_000_000)]
    public int Samples { get; set; }

    [GlobalSetup]
    public void Setup()
    {
        _well = new BenchmarkWell(Samples);
        _file = _well.ReadSetup();
        _logs = BenchmarkWell.ReadLogs(_file);
        _model = BenchmarkWell.Compute(_file, _logs);
    }

    [GlobalCleanup]
    public void Cleanup() => _well.Dispose();

    [Benchmark]
    public IngestedLogs Ingest() => BenchmarkWell.ReadLogs(_file);

    [Benchmark]
    public EarthModel Compute() => BenchmarkWell.Compute(_file, _logs);

    [Benchmark]
    public void WriteDepthCsv() => DepthCsv.Write(_model, UnitSystem.Metric, Stream.Null);

    [Benchmark]
    public void WriteResultsLas() => ResultsLas.Write(_model, UnitSystem.Metric, Stream.Null);

    [Benchmark]
    public void DrawTracks() => TracksPicture.Write(_model, new PictureOptions(UnitSystem.Metric), Stream.Null);
}

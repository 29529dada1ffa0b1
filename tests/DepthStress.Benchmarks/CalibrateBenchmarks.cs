using BenchmarkDotNet.Attributes;
using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using SampleWell;

namespace DepthStress.Benchmarks;

/// <summary>A calibration of the sample well (16,404 samples, 21 observations), its files being read: the model, the estimates, and every admissible choice.</summary>
[MemoryDiagnoser]
public class CalibrateBenchmarks
{
    private string _folder = null!;
    private WellFile _file = null!;
    private IngestedLogs _logs = null!;
    private EarthModel _model = null!;

    [GlobalSetup]
    public void Setup()
    {
        _folder = Directory.CreateTempSubdirectory("calibrate-").FullName;
        SampleLogs.Write(_folder);
        var diagnostics = new DiagnosticBag();
        _file = WellFileReader.Read(Path.Combine(_folder, "quillback-4.toml"), diagnostics)!;
        _logs = LogIngest.Read(_file, diagnostics)!;
        _model = Chain.Run(_file.Setup, _logs.Logs, diagnostics)!;
    }

    [GlobalCleanup]
    public void Cleanup() => Directory.Delete(_folder, recursive: true);

    [Benchmark]
    public CalibrationResult Estimate() => StrainCalibration.Run(_model, _file.Sections.Calibration, new DiagnosticBag())!;

    [Benchmark]
    public EarthModel Compute() => Chain.Run(_file.Setup, _logs.Logs, new DiagnosticBag())!;

    [Benchmark]
    public IReadOnlyList<ChoiceSpread> Spread() => ChoiceSpread.Of(_model);
}

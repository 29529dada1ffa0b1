using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Tests.SampleWell;
using SampleWell;
using Xunit.Abstractions;

namespace DepthStress.Tests.Recovery;

/// <summary>The hidden strains of the sample well, from its own tests and from the same tests made 200 times again.</summary>
public sealed class StrainRecoveryTests(ITestOutputHelper output)
{
    private const double Micro = 1e-6;

    [Fact]
    public void The_shipped_tests_determine_both_strains()
    {
        using var well = new Loaded();
        var result = well.Calibrate();
        var strain = result.Strains[0];
        output.WriteLine(FormattableString.Invariant($"along Shmin {strain.AlongShmin.Value / Micro:F0} +- {strain.AlongShmin.StandardError / Micro:F0}, along SHmax {strain.AlongShmax.Value / Micro:F0} +- {strain.AlongShmax.StandardError / Micro:F0} microstrain; model error {result.ModelError / 1e6:F2} MPa"));
        Assert.True(strain.Separated);
        Assert.True(strain.AlongShmin.StandardError < 40 * Micro);
        Assert.True(strain.AlongShmax.StandardError < 100 * Micro);
        Assert.All(result.AfterFit.Where(c => double.IsFinite(c.Residual)), c => Assert.True(Math.Abs(c.Residual) < 3, c.Reading.Interval.Observation.Note));
        Assert.True(result.AfterFit.Count(c => c.Inside) >= 0.9 * result.AfterFit.Count);
    }

    // Errors of the model are the same for every repetition of a well's tests, so the wells are many and nothing was tuned to them.
    [Fact]
    public void Intervals_of_95_percent_hold_the_hidden_strains_as_often_as_they_say()
    {
        const int Wells = 40;
        const int Repetitions = 5;
        const int Seeds = Wells * Repetitions;
        int shmin = 0, shmax = 0, both = 0;
        Parallel.For(1, Wells + 1, number =>
        {
            using var well = new Loaded(WrittenWell.Other((ulong)(100 + number)));
            var plan = well.Written.Result.Truth.Plan;
            for (var k = 1; k <= Repetitions; k++)
            {
                SampleLogs.WriteTestsAgain(Path.Combine(well.Written.Folder, "quillback-4-observations.csv"), well.Written.Result, (ulong)((1000 * number) + k));
                var strain = well.Calibrate().Strains[0];
                var holdsShmin = plan.StrainMin >= strain.AlongShmin.Low && plan.StrainMin <= strain.AlongShmin.High;
                var holdsShmax = plan.StrainMax >= strain.AlongShmax.Low && plan.StrainMax <= strain.AlongShmax.High;
                if (holdsShmin) Interlocked.Increment(ref shmin);
                if (holdsShmax) Interlocked.Increment(ref shmax);
                if (holdsShmin && holdsShmax) Interlocked.Increment(ref both);
            }
        });

        output.WriteLine(FormattableString.Invariant($"of {Seeds}: along Shmin {shmin}, along SHmax {shmax}, both {both}"));
        Assert.InRange(shmin, 0.90 * Seeds, 0.99 * Seeds);
        Assert.InRange(shmax, 0.90 * Seeds, 0.99 * Seeds);
    }

    [Fact]
    public void Closures_alone_cannot_separate_the_strains_and_that_is_said()
    {
        using var well = new Loaded();
        var result = well.Calibrate(o => o.Kind == ObservationKind.Closure);
        Assert.False(result.Strains[0].Separated);
        Assert.Contains(result.Findings, f => f.Text.Format.Contains("do not separate the two strains", StringComparison.Ordinal));
    }

    /// <summary>The shipped well, computed once; its tests are read again for each calibration.</summary>
    private sealed class Loaded : IDisposable
    {
        private readonly EarthModel _model;
        private readonly Func<WellSetup, EarthModel?> _run;

        public Loaded(WrittenWell? written = null)
        {
            Written = written ?? WrittenWell.Shipped();
            var diagnostics = new DiagnosticBag();
            var file = WellFileReader.Read(Path.Combine(Written.Folder, "quillback-4.toml"), diagnostics)!;
            var logs = LogIngest.Read(file, diagnostics)!;
            _run = setup => Chain.Run(setup, logs.Logs, diagnostics);
            _model = _run(file.Setup)!;
        }

        public WrittenWell Written { get; }

        public CalibrationResult Calibrate(Predicate<Observation>? chosen = null)
        {
            var diagnostics = new DiagnosticBag();
            var file = WellFileReader.Read(Path.Combine(Written.Folder, "quillback-4.toml"), diagnostics)!;
            var observations = file.Setup.Observations.Where(o => chosen?.Invoke(o) ?? true).ToList();
            var model = _model with { Setup = _model.Setup with { Observations = observations } };
            return StrainCalibration.Run(model, file.Sections.Calibration, diagnostics)!;
        }

        public void Dispose() => Written.Dispose();
    }
}

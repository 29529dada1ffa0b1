using DepthStress.Core.Calibration;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Stress;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Calibration;

/// <summary>An invented vertical well of nine samples from 1000 to 2600 m in rocks of contrasting stiffness, with its tests.</summary>
internal static class CalibrationWell
{
    public const double AlongShmin = 130e-6;
    public const double AlongShmax = 470e-6;

    private static readonly double[] Depths = [1000, 1200, 1400, 1600, 1800, 2000, 2200, 2400, 2600];
    private static readonly double[] Vp = [3100, 4400, 3300, 4900, 3500, 5200, 3700, 4700, 3600];
    private static readonly double[] Vs = [1600, 2650, 1750, 2900, 1850, 2950, 2000, 2800, 1950];

    /// <summary>The setup with strains along Shmin and along SHmax.</summary>
    public static WellSetup Setup(double alongShmin = AlongShmin, double alongShmax = AlongShmax) => SmallWell.Setup with
    {
        Overburden = SmallWell.Setup.Overburden with { AboveLog = SmallWell.Chosen(Core.Pressure.ShallowDensity.Mean(2300)) },
        Settings = SmallWell.Settings with
        {
            HorizontalStress = new HorizontalStressSettings
            {
                StrainAlongShmin = SmallWell.Chosen(alongShmin),
                StrainAlongShmax = SmallWell.Chosen(alongShmax),
            },
        },
    };

    public static LogTable Logs { get; } = SmallWell.Table(
        Depths, SmallWell.Curve(Property.Vp, Vp), SmallWell.Curve(Property.Vs, Vs), SmallWell.Curve(Property.Density, SmallWell.Same(2500, Depths.Length)));

    public static EarthModel Run(WellSetup setup) => SmallWell.Run(setup, Logs);

    /// <summary>A closure at each sample: the truth's Shmin with an error, Pa.</summary>
    public static IReadOnlyList<Observation> Closures(EarthModel truth, double sigma, Func<int, double> error) =>
        [.. Depths.Select((_, i) => At(ObservationKind.Closure, i, truth.Column(Property.MinHorizontalStress)[i] + error(i), sigma))];

    public static Observation At(ObservationKind kind, int sample, double value, double sigma) => new()
    {
        Top = Depths[sample],
        Base = Depths[sample],
        DepthKind = DepthKind.Measured,
        Kind = kind,
        Value = value,
        Sigma = sigma,
        Position = new SourcePosition("tests.csv", sample + 2, 1),
    };

    public static CalibrationResult Calibrate(WellSetup setup, CalibrationSettings? settings = null)
    {
        var diagnostics = new DiagnosticBag();
        var result = WellCalibration.Run(Run(setup), settings ?? new CalibrationSettings(), Run, diagnostics);
        Assert.Empty(diagnostics.Items);
        return result!;
    }

    public static string Refusal(WellSetup setup, CalibrationSettings? settings = null)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(WellCalibration.Run(Run(setup), settings ?? new CalibrationSettings(), Run, diagnostics));
        return Assert.Single(diagnostics.Items).ToString();
    }
}

using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>
/// An invented well, logged from 500 to 3000 m every 2 m: shale on the trend 65 + 125 exp(-z / 1700 m) us/ft down to 2000 m, slower below, with a
/// clean sand of 30 m in every 150 m.
/// </summary>
internal static class PressureWell
{
    public const double Unit = 1e-6 / 0.3048; // us/ft
    public const double G = 9.80665; // standard gravity, exact
    public const double Water = 1030;

    public static double[] Md { get; } = [.. Enumerable.Range(0, 1251).Select(i => 500 + (2.0 * i))];

    public static bool IsSand(double z) => z % 150 >= 100 && z % 150 < 130;

    public static double Normal(double z) => (65 + (125 * Math.Exp(-z / 1700))) * Unit;

    public static double Slowness(double z) => IsSand(z) ? 70 * Unit : z > 2000 ? Normal(z) * (1 + ((z - 2000) * 1e-4)) : Normal(z);

    public static double Resistivity(double z) => IsSand(z) ? 40 : 0.9 * Math.Exp(z / 3000) * (z > 2000 ? 0.7 : 1);

    public static NormalTrendSettings Interval { get; } = new() { Top = Chosen(600.0, 11), Base = Chosen(2000.0), DepthKind = Chosen(DepthKind.TrueVertical) };

    public static PorePressureSettings Eaton { get; } = new()
    {
        Method = Chosen(PorePressureMethod.EatonSonic, 21),
        FluidDensity = Chosen(Water),
        NormalTrend = Interval,
        ShaleCutoff = Chosen(0.5),
        Sands = Chosen(SandPressure.Shale),
    };

    public static WellSetup With(PorePressureSettings pore, FluidSettings? fluids = null, params Observation[] observations) => Setup with
    {
        Settings = SmallWell.Settings with { PorePressure = pore, Fluids = fluids ?? new() },
        Overburden = new() { AboveLog = Chosen(ShallowDensity.Mean(2200.0)) },
        Observations = observations,
    };

    public static LogTable LogsOf(Func<double, double>? slowness = null, Func<double, double>? volume = null, Func<double, double>? porosity = null)
    {
        double[] vp = [.. Md.Select(z => 1 / (slowness ?? Slowness)(z))];
        return Table(
            Md,
            Curve(Property.Vp, vp), Curve(Property.Vs, [.. vp.Select(v => v / 2)]), Curve(Property.Density, Same(2400, Md.Length)),
            Curve(Property.ShaleVolume, [.. Md.Select(volume ?? (z => IsSand(z) ? 0.1 : 0.8))]),
            Curve(Property.DeepResistivity, [.. Md.Select(Resistivity)]),
            Curve(Property.Porosity, [.. Md.Select(porosity ?? (z => IsSand(z) ? 0.25 : 0.46 * Math.Exp(-z * 0.001118)))]));
    }

    public static EarthModel Computed(PorePressureSettings pore, FluidSettings? fluids = null, params Observation[] observations) =>
        Run(With(pore, fluids, observations), LogsOf());

    public static string[] Problems(PorePressureSettings pore, params Observation[] observations) => Errors(With(pore, null, observations), LogsOf());

    public static int At(double md) => Array.IndexOf(Md, md);

    public static double Hydrostatic(double z) => Water * G * z;

    public static double Weight(double z) => G * ((2200 * 500) + (2400 * (z - 500)));

    public static Observation Test(double md, double pressure, double sigma = 0.1e6) => new()
    {
        Position = new SourcePosition("tests.csv", 4),
        Top = md - 0.5,
        Base = md + 0.5,
        DepthKind = DepthKind.Measured,
        Kind = ObservationKind.FormationPressure,
        Value = pressure,
        Sigma = sigma,
    };
}

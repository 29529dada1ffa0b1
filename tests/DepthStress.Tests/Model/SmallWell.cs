using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Tests.Model;

/// <summary>An invented well of round numbers: vertical, ground at sea level, five samples from 0 to 400 m.</summary>
internal static class SmallWell
{
    public static readonly SourcePosition WellFile = new("well.toml", 1, 1);

    public static double[] Depths => [0, 100, 200, 300, 400];

    public static DepthFrame Ground { get; } = new(DatumKind.Ground, 0, 0, null, null);

    /// <summary>Datum 25 m above the sea, water 100 m deep: mudline at 125 m.</summary>
    public static DepthFrame Sea { get; } = new(DatumKind.RotaryTable, 25, null, 100, null);

    public static LawInput DynamicModulus { get; } = new("Ed", Property.YoungsDynamic, Units.Gigapascal);

    public static Setting<T> Chosen<T>(T value, int line = 5, SettingKind kind = SettingKind.WellFile) =>
        new(value, new SettingSource(kind, new SourcePosition("well.toml", line, 1)));

    public static Law Method(string id) => MethodCatalogue.Find(id) ?? throw new ArgumentException(id, nameof(id));

    public static Law ConstantPoisson(double value) => UserLaw.Constant(Property.PoissonStatic, Units.One, value);

    public static StageSettings Settings { get; } = new()
    {
        Moduli = new ModuliSettings
        {
            StaticYoungs = Chosen(UserLaw.Linear(Property.YoungsStatic, Units.Gigapascal, DynamicModulus, 0.5, 0)),
            StaticPoisson = Chosen(Method("equal-to-dynamic")),
        },
        Biot = new BiotSettings { Coefficient = Chosen(UserLaw.Constant(Property.Biot, Units.One, 0.8)) },
        PorePressure = new PorePressureSettings
        {
            Method = Chosen(PorePressureMethod.Hydrostatic),
            FluidDensity = Chosen(1000.0),
        },
    };

    public static HorizontalStressSettings Strains { get; } = new()
    {
        StrainAlongShmin = Chosen(2e-4),
        StrainAlongShmax = Chosen(6e-4),
    };

    public static WellSetup Setup { get; } = new()
    {
        Position = WellFile,
        Name = "small",
        Frame = Ground,
        Trajectory = Trajectory.Vertical,
        Settings = Settings,
    };

    public static double[] Same(double value, int count = 5) => [.. Enumerable.Repeat(value, count)];

    public static Curve Curve(Property property, params double[] values) =>
        new(CurveRoles.Of(property)!, "test", values, OriginTrack.Of(values, SampleOrigin.Measured, "test"));

    public static LogTable Table(double[] depths, params Curve[] curves) => new(depths, curves);

    /// <summary>Vp 4000 m/s, Vs 2400 m/s, 2500 kg/m3 everywhere, unless a curve replaces one.</summary>
    public static LogTable LogsWith(params Curve[] replaced) => Table(
        Depths,
        Curve(Property.Vp, Same(4000)),
        Curve(Property.Vs, Same(2400)),
        Curve(Property.Density, Same(2500))).With(replaced);

    public static EarthModel Run(WellSetup setup, LogTable logs)
    {
        var diagnostics = new DiagnosticBag();
        var model = Chain.Run(setup, logs, diagnostics);
        Assert.Empty(diagnostics.Items);
        return model!;
    }

    public static EarthModel Run(params Curve[] replaced) => Run(Setup, LogsWith(replaced));

    public static string[] Errors(WellSetup setup, LogTable logs)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(Chain.Run(setup, logs, diagnostics));
        return [.. diagnostics.Items.Select(d => d.ToString())];
    }

    public static double[] Column(this EarthModel model, Property property) => model.Values.Read(property).ToArray();

    public static string[] Texts(this EarthModel model) => [.. model.Findings.Select(f => UnitSystem.Metric.Show(f.Text))];

    public static LayerTable Layered(EarthModel model, LayerSettings settings)
    {
        var diagnostics = new DiagnosticBag();
        var table = LayerBuilder.Build(model, settings, diagnostics);
        Assert.Empty(diagnostics.Items);
        return table!;
    }

    public static LayerSettings AtMost(double thickness) => new() { MaxThickness = Chosen(thickness) };

    /// <summary>A hole that turns from vertical to an inclination, in rad, at a measured depth and keeps it.</summary>
    public static Trajectory Bent(params SurveyStation[] stations)
    {
        Assert.True(Trajectory.TryCreate(stations, out var trajectory, [], []));
        return trajectory;
    }
}

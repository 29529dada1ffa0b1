using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using DepthStress.Report;

namespace DepthStress.Tests.Report;

/// <summary>Invented models for the pictures, made by the chain itself.</summary>
internal static class PictureModels
{
    private static readonly SettingSource Here = new(SettingKind.WellFile, SourcePosition.None);

    /// <summary>A deviated well with every curve, gaps, filled density and zones.</summary>
    public static EarthModel Full(
        int samples = 3000, string name = "Example 1", IReadOnlyList<Zone>? zones = null, bool strains = true, bool layered = false, bool comparisons = false)
    {
        var md = Depths(samples, 900, 3400);
        return Run(name, md, zones ?? (layered ? [.. Zones().Select(Layered)] : Zones()), Stress(strains, comparisons), Deviated(),
            ("gamma_ray", Shape(md, i => 75 + (45 * Wave(md[i], 260)) + (22 * Noise(i)))),
            ("caliper", Shape(md, i => 0.0254 * (8.6 + (Wave(md[i], 400) > 0.8 ? 9 * Math.Abs(Noise(i)) : 0.15 * Noise(i))))),
            ("bit_size", Shape(md, i => 0.0254 * (md[i] < 1500 ? 12.25 : 8.5))),
            ("compressional", Gap(md, 1900, 1960, i => Velocity(md[i], i))),
            ("shear", Gap(md, 900, 1250, i => (Velocity(md[i], i) * 0.62) - 180)),
            ("density", Gap(md, 2300, 2380, i => 2120 + (0.13 * md[i]) + (60 * Wave(md[i], 260)) + (45 * Noise(i + 7)))),
            ("neutron", Shape(md, i => 0.28 - (0.00004 * md[i]) + (0.05 * Noise(i + 3)))));
    }

    /// <summary>A vertical well with density and perhaps little else.</summary>
    public static EarthModel Small(double[] md, string name, IReadOnlyList<Zone> zones, params (string Role, double[] Values)[] curves) =>
        Run(name, md, zones, Stress(false, false), Trajectory.Vertical, curves);

    /// <summary>The layers of a model, no thicker than so many m.</summary>
    public static LayerTable Layers(EarthModel model, double thickness)
    {
        var diagnostics = new DiagnosticBag();
        return LayerBuilder.Build(model, new LayerSettings { MaxThickness = Set(thickness), LargestMissingShare = Set(1.0) }, diagnostics)
            ?? throw new InvalidOperationException(string.Join("\n", diagnostics.Items.Select(d => d.Text)));
    }

    /// <summary>A model beside itself with a twentieth more stress.</summary>
    public static ProfilePair Pair(EarthModel model)
    {
        double[] tvd = [.. model.Values.Read(Property.TrueVerticalDepth)];
        (string Id, Property Stress)[] curves = [("pp", Property.PorePressure), ("shmax", Property.MaxHorizontalStress), ("shmin", Property.MinHorizontalStress), ("sv", Property.VerticalStress)];
        return new ProfilePair(
            model.Setup.Name, model.Setup.Frame, "before-results", "after-results", tvd, tvd,
            [.. curves.Select(c => (c.Id, Values: (double[])[.. model.Values.Read(c.Stress)])).Select(c => new ProfilePairCurve(
                c.Id, c.Values, [.. c.Values.Select(v => v * 1.05)], [.. c.Values.Select(v => v * 0.05)]))]);
    }

    /// <summary>Evenly spaced depths, m.</summary>
    public static double[] Depths(int samples, double top, double bottom) =>
        [.. Enumerable.Range(0, samples).Select(i => top + ((bottom - top) * i / Math.Max(1, samples - 1)))];

    /// <summary>A zone without choices of its own.</summary>
    public static Zone Zone(string name, double top) => new(name, top, null, DepthKind.Measured, new StageSettings(), SourcePosition.None);

    private static HorizontalStressSettings Stress(bool strains, bool comparisons)
    {
        var settings = strains ? new HorizontalStressSettings { StrainAlongShmin = Set(1e-4), StrainAlongShmax = Set(7e-4) } : new();
        return !comparisons ? settings : settings with
        {
            Compare = Set<IReadOnlyList<ComparisonChoice>>(
            [
                .. ComparisonMethods.All.Select(l => new ComparisonChoice
                {
                    Method = Set(l), Ratio = l.Inputs.Any(i => i.Property == Property.MatrixStressRatio) ? Set(0.44) : default,
                }),
            ]),
        };
    }

    private static Zone[] Zones() =>
    [
        Zone("apricot shale", 900), Zone("bracken sand", 1420), Zone("cinder marl", 1610), Zone("thin streak", 1622),
        Zone("dapple shale", 1630), Zone("elm limestone", 2450), Zone("fern shale", 2900),
    ];

    /// <summary>The zone with beds whose parameters are invented.</summary>
    private static Zone Layered(Zone zone) => zone with
    {
        Overrides = zone.Overrides with
        {
            Anisotropy = new() { Model = Set(AnisotropyModel.Thomsen), Epsilon = Set(0.1), Gamma = Set(0.1), Delta = Set(0.05), AlongHole = Set(false) },
        },
    };

    private static EarthModel Run(
        string name, double[] md, IReadOnlyList<Zone> zones, HorizontalStressSettings stress, Trajectory path, params (string Role, double[] Values)[] curves)
    {
        var settings = new StageSettings
        {
            Shale = new() { Volume = Law("linear-gamma-ray"), Clean = Set(30.0), Shale = Set(120.0) },
            Porosity = new() { Porosity = Law("density-porosity"), MatrixDensity = Set(2680.0), FluidDensity = Set(1020.0) },
            Moduli = new() { StaticYoungs = First(Property.YoungsStatic), StaticPoisson = First(Property.PoissonStatic) },
            Strength = new() { Ucs = First(Property.Ucs), FrictionAngle = First(Property.FrictionAngle) },
            Biot = new() { Coefficient = First(Property.Biot) },
            PorePressure = new() { Method = Set(PorePressureMethod.Hydrostatic), FluidDensity = Set(1040.0) },
            HorizontalStress = stress,
        };
        var setup = new WellSetup
        {
            Name = name,
            Frame = new DepthFrame(DatumKind.RotaryTable, 312.4, 305.2, null, 20),
            Trajectory = path,
            Zones = zones,
            Settings = settings,
            Overburden = new() { AboveLog = Set(ShallowDensity.Mean(2150.0)), Gaps = Set(new DensityFill(DensityFillKind.Linear)), BelowLog = Set(new DensityFill(DensityFillKind.Hold)) },
        };
        var table = new LogTable(md, curves.Select(c => new Curve(
            CurveRoles.Find(c.Role)!, c.Role, c.Values, OriginTrack.Of(c.Values, SampleOrigin.Measured, "invented"))));
        var diagnostics = new DiagnosticBag();
        return Chain.Run(setup, table, diagnostics)
            ?? throw new InvalidOperationException(string.Join("\n", diagnostics.Items.Select(d => d.Text)));
    }

    private static Trajectory Deviated()
    {
        var stations = Enumerable.Range(0, 36).Select(i => new SurveyStation(i * 100, Math.Clamp((i - 11) * 3.5, 0, 35) * Math.PI / 180, 1)).ToArray();
        return Trajectory.TryCreate(stations, out var path, [], []) ? path : throw new InvalidOperationException("The invented survey is not sound.");
    }

    private static Setting<T> Set<T>(T value) => new(value, Here);

    private static Setting<Law> Law(string id) => Set(MethodCatalogue.Find(id) ?? throw new ArgumentException($"There is no law \"{id}\".", nameof(id)));

    private static Setting<Law> First(Property property) => Set(MethodCatalogue.For(property).First());

    private static double Velocity(double md, int i) => 1700 + (0.75 * md) + (350 * Wave(md, 260)) + (160 * Noise(i + 11)) + (md > 2450 && md < 2900 ? 900 : 0);

    private static double Wave(double md, double length) => Math.Sin(2 * Math.PI * md / length) * Math.Cos(md / 170);

    /// <summary>A number between -1 and 1 that looks like beds of a few samples and is the same on every machine.</summary>
    private static double Noise(int i) => (Random(i / 23) + (0.4 * Random(i / 7)) + (0.15 * Random(i))) / 1.55;

    private static double Random(int i) => ((Mixed((uint)i) >> 8) / (double)(1 << 23)) - 1;

    private static uint Mixed(uint i)
    {
        i = unchecked((i ^ (i >> 16)) * 0x45D9F3Bu);
        return unchecked((i ^ (i >> 16)) * 0x45D9F3Bu);
    }

    private static double[] Shape(double[] md, Func<int, double> value) => [.. md.Select((_, i) => value(i))];

    private static double[] Gap(double[] md, double from, double to, Func<int, double> value) =>
        [.. md.Select((d, i) => d > from && d < to ? double.NaN : value(i))];
}

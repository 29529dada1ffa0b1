using System.Text;
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

namespace DepthStress.Tests.Writing;

/// <summary>A small invented well, run through the whole chain: two zones, one missing shear velocity, a bridged density gap.</summary>
internal static class TinyWell
{
    public static EarthModel Model(
        string name = "Tiny 1", string upper = "heath shale", string lower = "iris sand", int count = 8, double step = 0.5, bool strained = true)
    {
        var depths = new double[count];
        var (vp, vs, density) = (new double[count], new double[count], new double[count]);
        for (var i = 0; i < count; i++)
        {
            depths[i] = 1200 + (i * step);
            vp[i] = 3000 + (40 * Math.Sin(i));
            vs[i] = i == 3 ? double.NaN : 1600 + (25 * Math.Cos(i));
            density[i] = i == 5 ? double.NaN : 2350 + (30 * Math.Sin(2 * i));
        }

        var bag = new DiagnosticBag();
        var model = Chain.Run(
            Setup(name, upper, lower, depths[count / 2], strained),
            new LogTable(depths, [Curve(Property.Vp, vp), Curve(Property.Vs, vs), Curve(Property.Density, density)]),
            bag);
        Assert.True(model is not null, string.Join("\n", bag.Items));
        return model;
    }

    public static LayerTable Layers(EarthModel model) => LayerBuilder.Build(model, new LayerSettings(), new DiagnosticBag())!;

    /// <summary>The bytes a writer gives, as text; throws on bytes that are not UTF-8.</summary>
    public static string Text(Action<Stream> write)
    {
        using var stream = new MemoryStream();
        write(stream);
        return new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(stream.ToArray());
    }

    private static WellSetup Setup(string name, string upper, string lower, double middle, bool strained) => new()
    {
        Name = name,
        Frame = new DepthFrame(DatumKind.RotaryTable, 112.5, 105, null, 12),
        Trajectory = Path(),
        Zones =
        [
            new Zone(upper, 1100, null, DepthKind.Measured, new StageSettings(), SourcePosition.None),
            new Zone(lower, middle, null, DepthKind.Measured, new StageSettings(), SourcePosition.None),
        ],
        Settings = new StageSettings
        {
            Moduli = new ModuliSettings
            {
                StaticYoungs = Chosen(MethodCatalogue.Find("lacy-1997-combined")!),
                StaticPoisson = Chosen(MethodCatalogue.Find("equal-to-dynamic")!),
            },
            Biot = new BiotSettings { Coefficient = Chosen(UserLaw.Constant(Property.Biot, Units.One, 0.85)) },
            PorePressure = new PorePressureSettings { Method = Chosen(PorePressureMethod.Hydrostatic), FluidDensity = Chosen(1030.0) },
            HorizontalStress = strained
                ? new HorizontalStressSettings { StrainAlongShmin = Chosen(1e-4), StrainAlongShmax = Chosen(4e-4) }
                : new HorizontalStressSettings(),
        },
        Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2200.0)), Gaps = Chosen(new DensityFill(DensityFillKind.Linear)) },
    };

    private static Trajectory Path()
    {
        Assert.True(Trajectory.TryCreate([new(1000, 0, 0), new(1100, 0.2, 0.5), new(3000, 0.2, 0.5)], out var path, [], []));
        return path;
    }

    private static Setting<T> Chosen<T>(T value) => new(value, new SettingSource(SettingKind.WellFile, SourcePosition.None));

    private static Curve Curve(Property property, double[] values) =>
        new(CurveRoles.Of(property)!, "tiny", values, OriginTrack.Of(values, SampleOrigin.Measured, "tiny"));
}

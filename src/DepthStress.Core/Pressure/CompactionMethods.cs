using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Pore pressure of shale from laws of compaction: porosity or slowness as an exponential of effective stress or depth.</summary>
public static class CompactionMethods
{
    private const string Zhang =
        "Zhang 2013, Effective stress, porosity, velocity and abnormal pore pressure prediction, Marine and Petroleum Geology 45, 2-11, form read in its abstract and solved for the pressure; also Zhang 2011, Earth-Science Reviews 108, 50-63";

    private static readonly LawInput Depth = new("Z", Property.DepthBelowSurface, Units.Metre, PressureEntry.Positive, Interval.All);

    private static readonly LawInput SurfacePorosity = new("phi_0", Property.TrendSurfacePorosity, Units.Fraction, new(double.Epsilon, 1), Interval.All);

    private static readonly LawInput Length = new("L", Property.TrendScaleLength, Units.Metre, PressureEntry.Positive, Interval.All);

    /// <summary>Zhang's relation for porosity.</summary>
    public static Law ZhangPorosity { get; } = PressureEntry.Of(
        "zhang-2011-porosity", "Zhang's pore pressure from porosity against a normal trend",
        [PressureEntry.Stress, PressureEntry.Normal, Depth, InputOf.PorosityAboveZero, SurfacePorosity, Length],
        [], "S - (S - Pn) ln(phi_0 / phi) L / Z",
        (x, _) => x[0] - ((x[0] - x[1]) * Math.Log(x[4] / x[3]) * x[5] / x[2]),
        "shale; the trend phi_n = phi_0 exp(-Z / L), L one over the published c; Z below the ground or mudline",
        Zhang, Standing.Confirmed,
        new([44, 20.6, 2000, 0.10, 0.46, 1 / 0.001118], 28.029643, 8, ExampleBasis.SelfComputed, "2000 m, phi_0 0.46, c 0.001118 1/m, porosity 0.10"));

    /// <summary>Zhang's relation for sonic slowness.</summary>
    public static Law ZhangSonic { get; } = PressureEntry.Of(
        "zhang-2011-sonic", "Zhang's pore pressure from sonic slowness against a normal trend",
        [
            PressureEntry.Stress with { Unit = Units.Psi }, PressureEntry.Normal with { Unit = Units.Psi }, Depth with { Unit = Units.Foot }, InputOf.Slowness,
            new("dt_ml", Property.TrendSurfaceSlowness, Units.MicrosecondPerFoot, PressureEntry.Positive, Interval.All),
            new("dt_m", Property.TrendMatrixSlowness, Units.MicrosecondPerFoot, PressureEntry.Positive, Interval.All),
            Length with { Unit = Units.Foot },
        ],
        [], "S - (S - Pn) ln((dt_ml - dt_m) / (dt - dt_m)) L / Z",
        (x, _) => x[0] - ((x[0] - x[1]) * Math.Log((x[4] - x[5]) / (x[3] - x[5])) * x[6] / x[2]),
        "shale slower than its matrix; the trend dt_n = dt_m + (dt_ml - dt_m) exp(-Z / L), L one over the published c; Z below the ground or mudline",
        Zhang, Standing.Confirmed,
        new([9500, 4650, 10000, 90, 200, 70, 1 / 0.00028], 6257.771, 7, ExampleBasis.SelfComputed, "10,000 ft, trend 70 + 130 exp(-0.00028 z) us/ft, slowness 90 us/ft"));

    /// <summary>Equivalent depth, its effective stress found on the normal trend by the stage.</summary>
    public static Law EquivalentDepth { get; } = PressureEntry.Of(
        "equivalent-depth-sonic", "Pore pressure by the depth at which normally compacted shale has the same slowness",
        [PressureEntry.Stress, new("s_B", Property.EquivalentStress, Units.Megapascal, Interval.NotNegative, Interval.All)],
        [], "S - s_B, s_B = S - Pn at the equivalent depth",
        (x, _) => x[0] - x[1],
        "shale that was never unloaded; the equivalent depth must lie between the ground or mudline and the last vertical stress",
        "Rezaee (ed.) 2015, Fundamentals of Gas Shale Reservoirs, p. 150, eq. 7.14", Standing.Confirmed,
        new([12000, 4280], 7720, 4, ExampleBasis.Identity, "12,000 less the 4280 that the source's line gives at 8000 ft"));

    /// <summary>Porosity as an exponential of effective stress.</summary>
    public static Law CompactionPorosity { get; } = PressureEntry.Of(
        "compaction-porosity", "Pore pressure from porosity that falls off exponentially with effective stress",
        [
            PressureEntry.Stress, InputOf.PorosityAboveZero, SurfacePorosity,
            new("s_c", Property.CompactionStress, Units.Megapascal, PressureEntry.Positive, Interval.All),
        ],
        [], "S + s_c ln(phi / phi_0)",
        (x, _) => x[0] + (x[3] * Math.Log(x[1] / x[2])),
        "shale that was never unloaded, where phi = phi_0 exp(-s / s_c)",
        "from the exponential compaction law by algebra", Standing.Identity,
        new([60, 0.4 / Math.E, 0.4, 30], 30, 6, ExampleBasis.Identity, "porosity lower by a factor e means an effective stress of s_c"));
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Lithology;

/// <summary>Catalogue entries that give porosity.</summary>
public static class PorosityMethods
{
    private const double Raymers = 0.37;

    private static readonly LawInput MatrixSlowness = InputOf.Slowness with { Symbol = "dt_ma", Property = Property.MatrixSlowness };

    private static readonly LawInput FluidSlowness = InputOf.Slowness with { Symbol = "dt_f", Property = Property.FluidSlowness };

    private static readonly LawFamily Family = new(Property.Porosity, "", Units.Fraction, new(0, 1));

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("density-porosity", "Porosity from bulk density",
            [
                InputOf.DensityGram with { Symbol = "rho_b" },
                InputOf.DensityGram with { Symbol = "rho_ma", Property = Property.MatrixDensity },
                InputOf.DensityGram with { Symbol = "rho_f", Property = Property.PoreFluidDensity },
            ],
            "phi = (rho_ma - rho_b) / (rho_ma - rho_f)", (x, _) => (x[1] - x[0]) / (x[1] - x[2]), [],
            "one matrix and one fluid density per zone; shale and gas bias it (common practice)",
            "mass balance; printed in Hydrocarbon Exploration and Production, 2nd ed.", Standing.Identity,
            new([2.32, 2.65, 1.0], 0.2, 2, ExampleBasis.Printed, "Rider, The Geological Interpretation of Well Logs, p. 115: sandstone of 20 % porosity in fresh water reads 2.32 g/cm3")),
        Entry("wyllie-1956", "Wyllie's porosity from slowness", [InputOf.Slowness, MatrixSlowness, FluidSlowness],
            "phi = (dt - dt_ma) / (dt_f - dt_ma)", (x, _) => (x[0] - x[1]) / (x[2] - x[1]), [],
            "clean, compacted rock; matrix 55.5 quartz, 47.6 limestone, 43.5 dolomite (read); fluid 189 fresh, 185 salt water (from memory), all us/ft",
            "Wyllie, Gregory and Gardner 1956; read in Gregory, Aspects of rock physics", Standing.Confirmed,
            new([80, 55.5, 189], 0.18, 2, ExampleBasis.Printed, "public log-interpretation chart: 80 us/ft on the quartz line reads 18 porosity units")),
        Entry("wyllie-1956-compaction", "Wyllie's porosity from slowness in rock that is not compacted",
            [InputOf.Slowness, MatrixSlowness, FluidSlowness, new("Cp", Property.CompactionFactor, Units.One, new(1, double.PositiveInfinity), Interval.All)],
            "phi = (dt - dt_ma) / (dt_f - dt_ma) / Cp", (x, _) => (x[0] - x[1]) / (x[2] - x[1]) / x[3], [],
            "sand that is not compacted; the slowness law was read, the compaction factor is from memory",
            "Wyllie, Gregory and Gardner 1956; the compaction factor recalled, not read", Standing.FromMemory, WorkedExample.Computed(0.152934, 6, 80, 55.5, 189, 1.2)),
        Entry("raymer-1980", "Raymer's porosity from velocity",
            [
                InputOf.VpMetre with { Symbol = "V" },
                InputOf.VpMetre with { Symbol = "V_ma", Property = Property.MatrixVelocity },
                InputOf.VpMetre with { Symbol = "V_f", Property = Property.FluidVelocity },
            ],
            "V = (1 - phi)^2 V_ma + phi V_f, solved for phi", Raymer, [],
            "consolidated and unconsolidated rock below 37 % porosity (limit from memory), where the relation changes: no result beyond",
            "Raymer, Hunt and Gardner 1980, SPWLA 21; read in Dvorkin 2008, Geophysics 73(2) E35-E39", Standing.Confirmed,
            WorkedExample.Computed(0.204339, 6, 3800, 5486, 1600)) with { ResultDomain = new(0, Raymers) },
        Entry("raymer-1980-short", "Raymer's porosity from slowness, short form", [InputOf.Slowness, MatrixSlowness],
            "phi = {a} (dt - dt_ma) / dt", (x, c) => c[0] * (x[0] - x[1]) / x[0], [0.625],
            "factors from 0.625 to 0.70 are in use", "after Raymer, Hunt and Gardner 1980, SPWLA 21; factor recalled, not read", Standing.FromMemory,
            WorkedExample.Computed(0.191406, 6, 80, 55.5)),
    ];

    /// <summary>The smaller root of <c>V_ma phi^2 + (V_f - 2 V_ma) phi + V_ma - V = 0</c>.</summary>
    private static double Raymer(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        double v = x[0], matrix = x[1], fluid = x[2], b = (2 * matrix) - fluid;
        return (b - Math.Sqrt((b * b) - (4 * matrix * (matrix - v)))) / (2 * matrix);
    }

    private static Law Entry(
        string id, string title, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) =>
        Family.Entry(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, standing, example);
}

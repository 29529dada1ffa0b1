using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;
using static DepthStress.Core.Catalogue.RockKinds;
using static DepthStress.Core.Catalogue.Standing;

namespace DepthStress.Core.Prediction;

/// <summary>Catalogue entries that give bulk density where it is not logged.</summary>
public static class DensityMethods
{
    private const string Gardner = "Gardner, Gardner and Gregory 1974, Geophysics 39, 770-780";

    private const string Castagna1993 = "Castagna, Batzle and Kan 1993; power and quadratic forms agree with each other";

    private const string Bellotti = "Bellotti and Giacca 1978";

    private const string NoJoin = "the relations of consolidated and unconsolidated rock do not join: at 100 us/ft they give 2.156 and 2.377 g/cm3";

    private static readonly LawInput Feet = InputOf.Vp with { Symbol = "V", Unit = Units.FootPerSecond };

    private static readonly LawInput Kilometres = InputOf.Vp with { Symbol = "V" };

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        PredictionEntry.Density(
            "gardner-1974", "Gardner's density from velocity", Any, InputOf.VpMetre with { Symbol = "V" }, "{a} V^{b}", LawForms.Power, [0.31, 0.25],
            "brine-saturated sedimentary rock, salt and anhydrite left out (common practice); 0.15 % above the form for ft/s", Gardner, Confirmed, WorkedExample.Computed(2.29426, 6, 3000)),
        PredictionEntry.Density(
            "gardner-1974-feet", "Gardner's density from velocity, as printed for ft/s", Any, Feet, "{a} V^{b}", LawForms.Power, [0.23, 0.25],
            "as gardner-1974; 0.15 % below the form for m/s, since both constants are rounded", $"{Gardner}; read in Zhang 2019, Applied Petroleum Geomechanics, p. 33", Confirmed, WorkedExample.Computed(2.3, 7, 10000)),
        .. Both("shale", Shale, [1.75, 0.265], [-0.0261, 0.373, 1.458], 1.5, 5.0, 3, 2.3414, 2.3421),
        .. Both("sandstone", Sandstone, [1.66, 0.261], [-0.0115, 0.261, 1.515], 1.5, 6.0, 4, 2.3837, 2.3750),
        .. Both("limestone", Limestone, [1.36, 0.386], [-0.0296, 0.461, 0.963], 3.5, 6.4, 5, 2.5313, 2.5280),
        .. Both("dolomite", Dolomite, [1.74, 0.252], [-0.0235, 0.390, 1.242], 4.5, 7.1, 6, 2.7330, 2.7360),
        .. Both("anhydrite", Evaporite, [2.19, 0.160], [-0.0203, 0.321, 1.732], 4.6, 7.4, 6, 2.9171, 2.9272),
        PredictionEntry.Density(
            "lindseth-1979", "Lindseth's density from velocity", Any, Feet, "(V - {b}) / ({a} V)", (x, c) => (x[0] - c[1]) / (c[0] * x[0]), [0.308, 3460],
            "sedimentary rock", "Lindseth 1979, Geophysics 44", FromMemory, WorkedExample.Computed(2.12338, 6, 10000)),
        PredictionEntry.Density(
            "bellotti-1978-consolidated", "Density of consolidated rock from slowness", Any, InputOf.Slowness, "{a} - dt / {b}", (x, c) => c[0] - (x[0] / c[1]), [3.28, 88.95],
            $"consolidated rock; {NoJoin}", Bellotti, FromMemory, WorkedExample.Computed(2.38062, 6, 80)),
        PredictionEntry.Density(
            "bellotti-1978-unconsolidated", "Density of unconsolidated rock from slowness", Any, InputOf.Slowness, "{a} - {b} (dt - {c}) / (dt + {d})",
            (x, c) => c[0] - (c[1] * (x[0] - c[2]) / (x[0] + c[3])), [2.75, 2.11, 47, 200],
            $"unconsolidated rock with a matrix of 47 us/ft; {NoJoin}", Bellotti, FromMemory, WorkedExample.Computed(2.26866, 6, 120)),
    ];

    private static Law[] Both(
        string rock, RockKinds kind, double[] power, double[] quadratic, double low, double high, double v, double byPower, double byQuadratic) =>
    [
        PredictionEntry.Density(
            $"castagna-1993-{rock}-power", $"Density of {rock} from velocity", kind, Kilometres.Within(low, high), "{a} V^{b}", LawForms.Power, power,
            rock, Castagna1993, FromMemory, WorkedExample.Computed(byPower, 5, v)),
        PredictionEntry.Density(
            $"castagna-1993-{rock}-quadratic", $"Density of {rock} from velocity, quadratic form", kind, Kilometres.Within(low, high), "{a} V^2 + {b} V + {c}",
            (x, c) => (((c[0] * x[0]) + c[1]) * x[0]) + c[2], quadratic, rock, Castagna1993, FromMemory, WorkedExample.Computed(byQuadratic, 5, v)),
    ];
}

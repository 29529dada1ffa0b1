using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using static DepthStress.Core.Catalogue.RockKinds;
using static DepthStress.Core.Catalogue.Standing;

namespace DepthStress.Core.Prediction;

/// <summary>Catalogue entries that give shear velocity where it is not logged.</summary>
public static class ShearMethods
{
    private const string Wet = "water-saturated rock; gas in the pores lowers Vp and so falsifies Vs";

    private const string Castagna1993 = "Castagna, Batzle and Kan 1993";

    private const string Krief1990 = "Krief and others 1990";

    private static readonly LawInput Phi = InputOf.Porosity;

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        PredictionEntry.Shear(
            "castagna-1985-mudrock", "The mudrock line", Sandstone | Shale, [InputOf.Vp], "(Vp - {b}) / {a}", (x, c) => (x[0] - c[1]) / c[0], [1.16, 1.36],
            $"brine-saturated clastic rock; {Wet}", "Castagna, Batzle and Eastwood 1985, Geophysics 50, 571-581", Confirmed, WorkedExample.Computed(1.844828, 7, 3.5)),
        Line("castagna-1993-sandstone", Sandstone, [0.804, -0.856], Castagna1993, 2.36, 4),
        Line("castagna-1993-shale", Shale, [0.770, -0.867], Castagna1993, 1.443, 3),
        PredictionEntry.Shear(
            "castagna-1993-limestone", "Shear velocity of limestone from the compressional one", Limestone, [InputOf.Vp], "{a} Vp^2 + {b} Vp + {c}",
            (x, c) => (((c[0] * x[0]) + c[1]) * x[0]) + c[2], [-0.055, 1.017, -1.031], Wet, Castagna1993, FromMemory, WorkedExample.Computed(2.89875, 6, 5.5)),
        Line("castagna-1993-dolomite", Dolomite, [0.583, -0.078], Castagna1993, 3.42, 6),
        .. GreenbergCastagna.All,
        Line("han-1986-sandstone", Sandstone, [0.794, -0.787], "Han 1986", 2.389, 4),
        PredictionEntry.Shear(
            "han-1986-shaly-sandstone", "Shear velocity of shaly sandstone from porosity and clay", Sandstone,
            [Phi.Within(0.02, 0.30), InputOf.Clay.Within(0, 0.5) with { Symbol = "C" }], "{a} - {b} phi - {c} C", (x, c) => c[0] - (c[1] * x[0]) - (c[2] * x[1]), [3.52, 4.91, 1.89],
            "water-saturated laboratory samples at 40 MPa confining and 1 MPa pore pressure; deviations under 5 %; clean sandstone is 11 % faster",
            "Han, Nur and Morgan 1986, Geophysics 51, 2093-2107, abstract", Confirmed, WorkedExample.Computed(2.349, 4, 0.2, 0.1)),
        Ratio("pickett-1963-limestone", Limestone, 1.9, Wet, WorkedExample.Computed(2.894737, 7, 5.5)),
        Ratio("pickett-1963-dolomite", Dolomite, 1.8, Wet, WorkedExample.Computed(3.333333, 7, 6)),
        Ratio("pickett-1963-sandstone", Sandstone, 1.6, $"clean sandstone, ratios from 1.6 to 1.75 are in use; {Wet}", WorkedExample.Computed(2.5, 5, 4)),
        Squares("krief-1990-wet-sandstone", Sandstone, 2.213, 3.857, Wet, WorkedExample.Computed(2.342460, 6, 4)),
        Squares("krief-1990-gas-sandstone", Sandstone, 2.282, 0.902, "gas-bearing sandstone", WorkedExample.Computed(1.883784, 6, 3)),
        Squares("krief-1990-shaly-sandstone", Sandstone | Shale, 2.033, 4.894, Wet, WorkedExample.Computed(1.902180, 6, 3.5)),
        Squares("krief-1990-limestone", Limestone, 2.872, 2.755, Wet, WorkedExample.Computed(3.094100, 6, 5.5)),
        PredictionEntry.Shear(
            "dvorkin-2008", "Shear velocity from porosity and the matrix", Any,
            [
                Phi,
                new("Vs_ma", Property.MatrixShearVelocity, Units.KilometrePerSecond),
                InputOf.DensityGram with { Symbol = "rho_ma", Property = Property.MatrixDensity },
                InputOf.DensityGram with { Symbol = "rho_b" },
            ],
            "(1 - phi)^2 Vs_ma sqrt((1 - phi) rho_ma / rho_b)", (x, _) => (1 - x[0]) * (1 - x[0]) * x[1] * Math.Sqrt((1 - x[0]) * x[2] / x[3]), [],
            "consolidated clastic rock and carbonate; dry rock by Raymer's form, made wet by its density alone",
            "Dvorkin 2008, Geophysics 73(2) E35-E39", Confirmed, WorkedExample.Computed(2.6176, 5, 0.2, 4.09, 2.65, 2.12)),
    ];

    private static Law Line(string id, RockKinds rock, double[] c, string source, double result, double vp) => PredictionEntry.Shear(
        id, $"Shear velocity of {Name(rock)} from the compressional one", rock, [InputOf.Vp], "{a} Vp + {b}", LawForms.Linear, c, Wet, source, FromMemory,
        WorkedExample.Computed(result, 4, vp));

    private static Law Ratio(string id, RockKinds rock, double ratio, string validity, WorkedExample example) => PredictionEntry.Shear(
        id, $"Shear velocity of {Name(rock)} by a ratio", rock, [InputOf.Vp], "Vp / {a}", LawForms.Share, [ratio], validity, "Pickett 1963", FromMemory, example);

    private static Law Squares(string id, RockKinds rock, double a, double b, string validity, WorkedExample example) => PredictionEntry.Shear(
        id, "Shear velocity from a line between the squares of the velocities", rock, [InputOf.Vp], "sqrt((Vp^2 - {b}) / {a})",
        (x, c) => Math.Sqrt(((x[0] * x[0]) - c[1]) / c[0]), [a, b], validity, Krief1990, FromMemory, example);

    private static string Name(RockKinds rock) => rock switch
    {
        Sandstone => "sandstone",
        Shale => "shale",
        Limestone => "limestone",
        _ => "dolomite",
    };
}

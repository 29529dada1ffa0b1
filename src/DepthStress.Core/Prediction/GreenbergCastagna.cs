using DepthStress.Core.Catalogue;
using static DepthStress.Core.Catalogue.RockKinds;

namespace DepthStress.Core.Prediction;

/// <summary>
/// Shear velocity of brine-saturated rock by lithology and of mixtures (Greenberg and Castagna 1992, Geophysical
/// Prospecting 40, 195-209). Velocities in km/s.
/// </summary>
public static class GreenbergCastagna
{
    private const string Paper =
        "Greenberg and Castagna 1992, Geophysical Prospecting 40, 195-209; the paper's nearly linear mixing was read in its abstract";

    private const string Valid =
        "brine-saturated rock; the abstract gives a precision of 9 % and an accuracy of 3 %; gas or oil in the pores lowers Vp and so falsifies Vs";

    // a2, a1, a0 of Vs = a2 Vp^2 + a1 Vp + a0.
    private static readonly double[] Sand = [0.80416, -0.85588];
    private static readonly double[] Clay = [0.76969, -0.86735];
    private static readonly double[] Lime = [-0.05508, 1.01677, -1.03049];
    private static readonly double[] Dolostone = [0.58321, -0.07775];

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Pure("sandstone", Sandstone, Sand, 2.36076, 4),
        Pure("shale", Shale, Clay, 1.44172, 3),
        Pure("limestone", Limestone, Lime, 2.89557, 5.5),
        Pure("dolomite", Dolomite, Dolostone, 3.42151, 6),
        Mixed("greenberg-castagna-1992", "sandstone", Sandstone | Shale, Sand, new(
            [3.0, 0.4], 1.509583, 7, ExampleBasis.SelfComputed, "the formula as written; a handbook example recalled from memory gives 1.5095")),
        Mixed("greenberg-castagna-1992-marl", "limestone", Limestone | Shale, Lime, WorkedExample.Computed(2.171989, 7, 4, 0.3)),
    ];

    /// <summary>Half the sum of the arithmetic and the harmonic mean of the pure rocks' shear velocities.</summary>
    /// <param name="shares">Volume share of each rock, adding up to 1.</param>
    /// <param name="velocities">Shear velocity of each pure rock, km/s, above zero.</param>
    /// <returns>The mixture's shear velocity, km/s; NaN where a rock that takes part has no positive velocity.</returns>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public static double Mix(ReadOnlySpan<double> shares, ReadOnlySpan<double> velocities)
    {
        if (shares.Length != velocities.Length) throw new ArgumentException("Lengths differ.", nameof(velocities));
        double sum = 0, inverse = 0;
        for (var k = 0; k < shares.Length; k++)
        {
            if (shares[k] == 0) continue;
            if (!(velocities[k] > 0)) return double.NaN;
            sum += shares[k] * velocities[k];
            inverse += shares[k] / velocities[k];
        }

        return 0.5 * (sum + (1 / inverse));
    }

    private static Law Pure(string rock, RockKinds kind, double[] c, double result, double vp) => PredictionEntry.Shear(
        $"greenberg-castagna-1992-{rock}", $"Shear velocity of pure {rock} from the compressional one", kind, [InputOf.Vp],
        Polynomial(c, 'a'), c.Length == 2 ? LawForms.Linear : Quadratic, c, Valid, Paper, Standing.FromMemory, WorkedExample.Computed(result, 6, vp));

    private static Law Mixed(string id, string rock, RockKinds kinds, double[] c, WorkedExample example) => PredictionEntry.Shear(
        id, $"Shear velocity of {rock} mixed with shale, by shale volume", kinds,
        [InputOf.Vp, InputOf.Clay with { Symbol = "Vsh" }],
        $"((1 - Vsh) V1 + Vsh V2 + 1 / ((1 - Vsh) / V1 + Vsh / V2)) / 2, V1 = {Polynomial(c, 'a')}, V2 = {Polynomial(Clay, (char)('a' + c.Length))}",
        c.Length == 2
            ? (x, k) => Mix([1 - x[1], x[1]], [(k[0] * x[0]) + k[1], (k[2] * x[0]) + k[3]])
            : (x, k) => Mix([1 - x[1], x[1]], [(((k[0] * x[0]) + k[1]) * x[0]) + k[2], (k[3] * x[0]) + k[4]]),
        [.. c, .. Clay], $"{Valid}; shale volume stands for the share of shale, {rock} for the rest", Paper, Standing.FromMemory, example);

    private static string Polynomial(double[] c, char first) => c.Length == 2
        ? $"{{{first}}} Vp + {{{(char)(first + 1)}}}"
        : $"{{{first}}} Vp^2 + {{{(char)(first + 1)}}} Vp + {{{(char)(first + 2)}}}";

    private static double Quadratic(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => (((c[0] * x[0]) + c[1]) * x[0]) + c[2];
}

using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>What a reader should know about the layers before a solver takes them.</summary>
internal static class MediumFindings
{
    /// <summary>Beyond this share of a layer's own stress the strains do not explain it (the program's own choice).</summary>
    private const double LargeClosing = 0.05;

    /// <summary>From here on rock hardly changes its volume, and solvers lose digits (common practice).</summary>
    private const double NearlyIncompressible = 0.49;

    /// <summary>The findings about some layers.</summary>
    public static IEnumerable<Finding> Of(IReadOnlyList<Layer> layers)
    {
        var without = layers.Where(l => l.Medium is null).ToList();
        if (without.Count == layers.Count)
        {
            yield return Finding.General(Severity.Note, $"no layer has a stable stiffness, Biot's coefficient, density, pore pressure and Shmin at one sample: column.inp and column-balanced.inp are not written");
        }
        else if (without.Count > 0)
        {
            yield return new Finding(
                Severity.Warning,
                $"some layers have no sample with a stable stiffness, Biot's coefficient, density, pore pressure and Shmin, or no stable mean: the solver's column leaves them out ({Numbers(without)}), and what lies below begins anew with the profile's vertical stress",
                without.Sum(l => l.Samples), Where(without));
        }

        var stiff = layers.Where(l => l.Medium is { Pair.Poisson: >= NearlyIncompressible }).ToList();
        if (stiff.Count > 0)
        {
            yield return new Finding(
                Severity.Warning, $"Poisson's ratio of some upscaled layers is {NearlyIncompressible.ToString(CultureInfo.InvariantCulture)} or more ({Numbers(stiff)}): a solver loses digits there", stiff.Sum(l => l.Samples), Where(stiff));
        }

        var closed = layers.Where(l => Worst(l) > LargeClosing).ToList();
        if (closed.Count == 0) yield break;
        var worst = closed.MaxBy(Worst)!;
        yield return new Finding(
            Severity.Warning,
            $"one pair of lateral strains does not explain the horizontal stresses of some layers ({Numbers(closed)}): initial stress closes the gap in the solver's column, most in layer {worst.Number} with {Quantity.Pressure(Closing(worst))}",
            closed.Sum(l => l.Samples), Where(closed));
    }

    private static double Closing(Layer layer) =>
        Share(layer, Property.MaxHorizontalStress) > Share(layer, Property.MinHorizontalStress) ? layer.Medium!.ClosingShmax : layer.Medium!.ClosingShmin;

    private static double Worst(Layer layer) =>
        layer.Medium is null ? 0 : Math.Max(Share(layer, Property.MinHorizontalStress), Share(layer, Property.MaxHorizontalStress));

    private static double Share(Layer layer, Property property)
    {
        var closing = property == Property.MinHorizontalStress ? layer.Medium!.ClosingShmin : layer.Medium!.ClosingShmax;
        var share = Math.Abs(closing / layer.Profile(property).Mean);
        return double.IsNaN(share) ? 0 : share;
    }

    private static string Numbers(IEnumerable<Layer> layers) =>
        "layer " + string.Join(", ", layers.Select(l => l.Number.ToString(CultureInfo.InvariantCulture)));

    private static List<DepthRange> Where(IEnumerable<Layer> layers) => [.. layers.Select(l => new DepthRange(l.TopMd, l.BaseMd))];
}

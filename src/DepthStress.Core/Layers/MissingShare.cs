using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>How much of a layer lacks what a solver needs: static moduli and Shmin.</summary>
internal static class MissingShare
{
    private static readonly Property[] Needed = [Property.YoungsStatic, Property.PoissonStatic, Property.MinHorizontalStress];

    /// <summary>Share of the thickness where one of them is missing, 0 to 1; NaN for a layer without thickness.</summary>
    public static double Of(EarthModel model, LayerBounds bounds, double[] weights)
    {
        double missing = 0, total = 0;
        var lacking = Needed.Any(p => !model.Values.Has(p));
        for (var i = bounds.Start; i < bounds.End; i++)
        {
            total += weights[i];
            if (lacking || Array.Exists(Needed, p => double.IsNaN(model.Values.Read(p)[i]))) missing += weights[i];
        }

        return total > 0 ? missing / total : double.NaN;
    }

    /// <summary>True when no layer lacks more than it may; each that does is reported.</summary>
    public static bool Accepts(IReadOnlyList<Layer> layers, Setting<double> largest, DiagnosticBag diagnostics)
    {
        if (!largest.IsSet) return true;
        var refused = layers.Where(l => l.Missing > largest.Value).ToList();
        foreach (var layer in refused)
        {
            diagnostics.Error(
                largest.Source.Position,
                UnitSystem.Metric.Show($"[layers]: found layer {layer.Number} from {Quantity.Length(layer.TopMd)} to {Quantity.Length(layer.BaseMd)} measured depth with {Percent(layer.Missing)} of its thickness without static moduli or Shmin, expected at most {Percent(largest.Value)}; fill or predict the logs, or cut thicker layers"));
        }

        return refused.Count == 0;
    }

    private static string Percent(double share) => string.Create(CultureInfo.InvariantCulture, $"{100 * share:F1} %");
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>
/// Reads what is assumed for density above the log: a mean density, a method id, a table
/// <c>{ method = "exponential", surface_density, matrix_density }</c>, or a list of points <c>{ depth, density }</c>.
/// </summary>
internal static class ShallowDensityReader
{
    /// <summary>The name of the exponential that meets the first logged value.</summary>
    public const string Exponential = "exponential";

    private static readonly (string, string)[] Methods = [(Exponential, Exponential)];

    /// <summary>The catalogue entries that may stand above the log.</summary>
    public static IEnumerable<Law> Laws => MethodCatalogue.For(Property.MeanDensityAbove).Concat(MethodCatalogue.For(Property.ShallowDensity));

    /// <summary>Reads one choice; null when it is wrong, with the reason reported.</summary>
    public static ShallowDensity? Read(TomlNode node, string key, DiagnosticBag diagnostics)
    {
        switch (node)
        {
            case TomlText text when Words.StartsNumber(text.Value):
                return Mean(text, key, diagnostics);
            case TomlText text:
                return FromCatalogue(text, key, diagnostics);
            case TomlTable table:
                var wrong = new WrongKeys();
                var section = new ReadingSection(table, key, diagnostics, wrong);
                var exponential = FromTable(section, key, wrong, diagnostics);
                section.ReportUnknown();
                return exponential;
            case TomlArray array:
                return Points(array, key, diagnostics);
            default:
                diagnostics.Error(node.Position, $"found {node.Kind}, expected {key} = a mean density with a unit ({Units.Symbols(Dimension.Density)}), a method id, a table or a list of points");
                return null;
        }
    }

    private static ShallowDensity? Mean(TomlText text, string key, DiagnosticBag diagnostics)
    {
        if (!QuantityText.TryParse(text.Value, [Dimension.Density], out var si, out _, out var problem))
            diagnostics.Error(text.Position, $"{key}: {problem}");
        else if (si <= 0)
            diagnostics.Error(text.Position, $"found {text.Kind}, expected {key} above zero");
        else
            return ShallowDensity.Mean(si);
        return null;
    }

    private static ShallowDensity? FromCatalogue(TomlText text, string key, DiagnosticBag diagnostics)
    {
        var laws = Laws.ToList();
        if (laws.Find(l => l.Id == text.Value) is { } law)
            return law.Predicts == Property.MeanDensityAbove ? new MeanDensityLaw(law) : new LocalDensityLaw(law);
        var ids = laws.ConvertAll(l => l.Id);
        diagnostics.Error(text.Position, $"found the unknown method \"{text.Value}\", expected {key} = one of {string.Join(", ", ids)}{NearestName.Hint(text.Value, ids)}");
        return null;
    }

    private static ExponentialDensity? FromTable(ReadingSection section, string key, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var method = section.Choice("method", default, Methods, "the shape of the curve");
        var surface = section.Quantity("surface_density", default, Sign.Positive, Dimension.Density, "density at the ground or mudline");
        var matrix = section.Quantity("matrix_density", default, Sign.Positive, Dimension.Density, "density that great depth tends to");
        if (wrong.Has(key, "method", "surface_density", "matrix_density")) return null;
        if (!method.IsSet || !surface.IsSet || !matrix.IsSet)
            diagnostics.Error(section.Position, $"{key}: expected method = \"{Exponential}\", surface_density and matrix_density");
        else if (surface.Value >= matrix.Value)
            diagnostics.Error(section.Position, $"{key}: expected surface_density below matrix_density");
        else
            return new ExponentialDensity(surface.Value, matrix.Value);
        return null;
    }

    private static PointDensity? Points(TomlArray array, string key, DiagnosticBag diagnostics)
    {
        var points = new List<DensityPoint>();
        var sound = array.Items.Count > 0;
        foreach (var item in array.Items)
        {
            if (item is not TomlTable table)
            {
                diagnostics.Error(item.Position, $"found {item.Kind}, expected {key} = a list of {{ depth, density }}");
                return null;
            }

            var wrong = new WrongKeys();
            var section = new ReadingSection(table, key, diagnostics, wrong);
            var depth = section.Quantity("depth", default, Sign.NotNegative, Dimension.Length, "depth below the ground or mudline");
            var density = section.Quantity("density", default, Sign.Positive, Dimension.Density, "density there");
            section.ReportUnknown();
            if (depth.IsSet && density.IsSet && (points.Count == 0 || depth.Value > points[^1].Depth))
            {
                points.Add(new DensityPoint(depth.Value, density.Value));
                continue;
            }

            sound = false;
            if (!wrong.Has(key, "depth", "density")) diagnostics.Error(item.Position, $"{key}: expected each point with depth below ground or mudline and density, from top to bottom");
        }

        if (array.Items.Count == 0) diagnostics.Error(array.Position, $"{key}: found no points");
        return sound ? new PointDensity(points) : null;
    }
}

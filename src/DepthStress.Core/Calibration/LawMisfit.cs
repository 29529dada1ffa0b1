using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>How far a law of the catalogue misses the plugs: law minus plug.</summary>
/// <param name="Law">The law.</param>
/// <param name="Count">Plugs it gives a value for.</param>
/// <param name="Mean">Mean misfit, SI.</param>
/// <param name="RootMeanSquare">Root mean square misfit, SI.</param>
public sealed record LawMisfit(Law Law, int Count, double Mean, double RootMeanSquare)
{
    /// <summary>
    /// Every law of the catalogue for a property on the same plugs, the laws that serve most plugs first, and of those the least
    /// misfit first; laws without an input are left out.
    /// </summary>
    public static IReadOnlyList<LawMisfit> All(Property property, IReadOnlyList<(double Depth, double Value)> plugs, PlugDepth at)
    {
        ArgumentNullException.ThrowIfNull(plugs);
        ArgumentNullException.ThrowIfNull(at);
        return [.. MethodCatalogue.For(property).Select(l => Of(l, plugs, at)).OfType<LawMisfit>().OrderByDescending(m => m.Count).ThenBy(m => m.RootMeanSquare)];
    }

    private static LawMisfit? Of(Law law, IReadOnlyList<(double Depth, double Value)> plugs, PlugDepth at)
    {
        var inputs = default(LawInputs);
        foreach (var input in law.Inputs) inputs.Add(plugs.Select(p => at.At(input.Property, p.Depth)).ToArray());
        var results = new double[plugs.Count];
        LawKernel.Apply(law, inputs, results);
        var misfits = results.Zip(plugs, (r, p) => r - p.Value).Where(m => !double.IsNaN(m)).ToList();
        return misfits.Count == 0 ? null : new LawMisfit(law, misfits.Count, misfits.Average(), Math.Sqrt(misfits.Average(m => m * m)));
    }
}

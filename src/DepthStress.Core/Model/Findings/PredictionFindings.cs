using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Over which depths stresses rest on predictions, and how sure those are.</summary>
internal static class PredictionFindings
{
    /// <summary>Looks at what was predicted, all sets of predictors of a relation together.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        foreach (var group in model.Predictions.GroupBy(p => (p.Property, p.Words)))
        {
            var (property, words) = group.Key;
            var title = PropertyNames.Title(property);
            var rests = property == Property.Vs ? "the horizontal stresses there rest on it" : "the stresses there and the vertical stress below rest on it";
            foreach (var finding in SampleMarks.Where(
                model, Severity.Note, $"{title} predicted ({words}), {Error(property, [.. group.Select(p => p.Error)])}: {rests}", i => group.Any(p => p.Samples[i])))
            {
                yield return finding;
            }

            foreach (var finding in SampleMarks.Where(
                model, Severity.Warning, $"{title} predicted ({words}) beyond the range of the samples it was trained on", i => group.Any(p => p.Beyond[i])))
            {
                yield return finding;
            }
        }
    }

    private static FormattableString Error(Property property, double[] errors)
    {
        var dimension = PropertyNames.Dimension(property);
        var (low, high) = (new Quantity(errors.Min(), dimension), new Quantity(errors.Max(), dimension));
        if (double.IsNaN(low.Si)) return $"standard error not known, since nothing logged is there to compare with";
        // Metric rounding: errors that would read the same are one.
        return UnitSystem.Metric.Show(low) == UnitSystem.Metric.Show(high) ? $"standard error {high}" : (FormattableString)$"standard error {low} to {high}";
    }
}

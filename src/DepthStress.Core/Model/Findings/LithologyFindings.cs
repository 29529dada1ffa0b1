using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Facies that no lithology rule names.</summary>
internal static class LithologyFindings
{
    /// <summary>Looks at facies codes, when at least one rule goes by facies.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var known = model.Setup.Lithologies.SelectMany(l => l.Rule.Facies).ToHashSet();
        if (known.Count == 0) return [];
        var facies = SampleMarks.Column(model, Property.Facies);
        var unknown = facies.Where(f => !double.IsNaN(f) && !known.Contains(f)).Distinct().Order()
            .Select(f => f.ToString(CultureInfo.InvariantCulture));
        return SampleMarks.Where(
            model, Severity.Warning, $"facies without a [[lithology]] rule: {string.Join(", ", unknown)}; the zone's settings hold there",
            i => !double.IsNaN(facies[i]) && !known.Contains(facies[i]));
    }
}

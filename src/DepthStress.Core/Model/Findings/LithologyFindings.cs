using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Facies that no lithology rule names.</summary>
internal static class LithologyFindings
{
    /// <summary>A curve of something else has thousands of values; so many say enough.</summary>
    private const int MostCodes = 10;

    /// <summary>Looks at facies codes, when at least one rule goes by facies.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var known = model.Setup.Lithologies.SelectMany(l => l.Rule.Facies).ToHashSet();
        if (known.Count == 0) return [];
        var facies = SampleMarks.Column(model, Property.Facies);
        bool Unnamed(int i) => !double.IsNaN(facies[i]) && !known.Contains(facies[i]) && model.Lithologies[i] < 0;
        var codes = Enumerable.Range(0, facies.Length).Where(Unnamed).Select(i => facies[i]).Distinct().Order().ToList();
        var shown = string.Join(", ", codes.Take(MostCodes).Select(c => c.ToString(CultureInfo.InvariantCulture)));
        var more = codes.Count > MostCodes ? FormattableString.Invariant($" and {codes.Count - MostCodes} others") : "";
        return SampleMarks.Where(
            model, Severity.Warning, $"facies without a [[lithology]] rule: {shown}{more}; the zone's settings hold there", Unnamed);
    }
}

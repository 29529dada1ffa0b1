using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>A finding as one line of text.</summary>
public static class FindingText
{
    private const int MostRanges = 3;

    /// <summary>The finding with its severity, how many samples it touches and where, in measured depth.</summary>
    public static string Of(Finding finding, UnitSystem units, int samples)
    {
        var word = finding.Severity switch { Severity.Error => "error", Severity.Warning => "warning", _ => "note" };
        var text = $"{word}: {units.Show(finding.Text)}";
        if (finding.Samples == 0) return text;
        text += string.Create(
            CultureInfo.InvariantCulture, $"; {finding.Samples} samples ({100.0 * finding.Samples / samples:F1} %)");
        return finding.Where.Count == 0 ? text : $"{text} at {Ranges(finding.Where, units)}";
    }

    private static string Ranges(IReadOnlyList<DepthRange> ranges, UnitSystem units)
    {
        var (unit, decimals) = units.UnitFor(Dimension.Length);
        var format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
        string Number(double si) => unit.FromSi(si).ToString(format, CultureInfo.InvariantCulture);
        var largest = ranges.OrderByDescending(r => r.Base - r.Top).Take(MostRanges).OrderBy(r => r.Top);
        var shown = string.Join(", ", largest.Select(r => r.Top == r.Base ? Number(r.Top) : $"{Number(r.Top)}-{Number(r.Base)}"));
        var more = ranges.Count - MostRanges;
        return $"{shown} {unit.Symbol} md" + (more > 0 ? FormattableString.Invariant($" and {more} shorter {(more == 1 ? "interval" : "intervals")}") : "");
    }
}

using System.Globalization;
using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using DepthStress.Files.Reading;
using MathNet.Numerics.Statistics;

namespace DepthStress.Files.Setup;

/// <summary>The [survey] section of a starter well file, from the depth curves that the log has.</summary>
internal static class StarterSurvey
{
    private const string File = "file = \"survey.csv\" and north = \"true\", \"grid\" or \"magnetic\"";

    /// <summary>The line that says what the path of the hole is, to be confirmed.</summary>
    public static string Line(LogFile log)
    {
        var depths = Metres(log.Columns[log.DepthColumn]);
        foreach (var property in (ReadOnlySpan<Property>)[Property.LoggedVerticalDepth, Property.LoggedVerticalPosition])
        {
            var role = CurveRoles.Of(property)!;
            foreach (var choice in RoleAssignment.Candidates(role, [log]))
            {
                if (Departure(role, depths, Metres(choice.Column)) is not var (largest, isVertical, elevation)) continue;
                var datum = double.IsNaN(elevation) ? "" : string.Create(CultureInfo.InvariantCulture, $", its datum {elevation:F1} m above sea level");
                var size = largest.ToString("F2", CultureInfo.InvariantCulture);
                return isVertical
                    ? $"{"vertical = true",-38}# <- confirm: {choice.Column.Name} agrees with a vertical hole within {size} m{datum}; or instead: {File}"
                    : $"{$"curve = \"{role.Id}\"",-38}# <- confirm: {choice.Column.Name} departs from a vertical hole by up to {size} m; or instead: {File}";
            }
        }

        return $"{"vertical = true",-38}# <- confirm; or instead: {File}";
    }

    /// <summary>How far a curve departs from a vertical hole, and the height of the datum when the curve counts from sea level; null without values.</summary>
    private static (double Largest, bool IsVertical, double Elevation)? Departure(CurveRole role, double[] md, double[] values)
    {
        var known = Enumerable.Range(0, md.Length).Where(i => double.IsFinite(values[i])).ToArray();
        if (known.Length < 2) return null;
        var elevation = double.NaN;
        if (role.Property == Property.LoggedVerticalPosition)
        {
            var sign = values[known[^1]] < values[known[0]] ? -1 : 1;
            values = Array.ConvertAll(values, v => sign * v);
            elevation = ArrayStatistics.MedianInplace(Array.ConvertAll(known, i => md[i] - values[i]));
            values = Array.ConvertAll(values, v => v + elevation);
        }

        var largest = known.Max(i => Math.Abs(values[i] - md[i]));
        return (largest, Array.TrueForAll(known, i => Math.Abs(values[i] - md[i]) <= DepthAgreement.Tolerance(md[i])), elevation);
    }

    /// <summary>A column in metres; one without a known unit is taken to be in metres, as the starter file proposes.</summary>
    private static double[] Metres(LogColumn column)
    {
        var values = (double[])column.Values.Clone();
        (Units.Find(column.Unit ?? "", Dimension.Length) ?? Units.Metre).ToSi(values);
        return values;
    }
}

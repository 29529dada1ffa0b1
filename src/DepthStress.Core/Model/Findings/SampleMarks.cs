using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Marks samples that meet a condition and turns them into a finding.</summary>
internal static class SampleMarks
{
    /// <summary>A finding about the samples that meet the condition, if there are any.</summary>
    public static IEnumerable<Finding> Where(EarthModel model, Severity severity, FormattableString text, Predicate<int> condition)
    {
        var marks = new bool[model.Count];
        for (var i = 0; i < marks.Length; i++) marks[i] = condition(i);
        if (Finding.About(severity, text, model.Values.Read(Property.MeasuredDepth), marks) is { } finding) yield return finding;
    }

    /// <summary>A column as an array that lambdas can hold; all missing when the model has no such column.</summary>
    public static double[] Column(EarthModel model, Property property)
    {
        if (model.Values.Held(property) is { } held) return held;
        var missing = new double[model.Count];
        Array.Fill(missing, double.NaN);
        return missing;
    }
}

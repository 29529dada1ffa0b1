using DepthStress.Core.Logs;

namespace DepthStress.Core.Conditioning;

/// <summary>A reason for taking samples out, and which.</summary>
/// <param name="Reason">Why, in plain words.</param>
/// <param name="Samples">True where a sample was taken out.</param>
public sealed record SampleRemoval(string Reason, bool[] Samples);

/// <summary>
/// Takes out single samples that cannot be right: density outside 1-4 g/cm3 (common practice), velocities that are not
/// positive, and pairs of velocities with <c>Vp/Vs &lt;= sqrt(4/3)</c>, which would need a bulk modulus that is not positive
/// (identity). Of such a pair both go, since nobody can say which is wrong.
/// </summary>
public static class ImpossibleSamples
{
    /// <summary>The least credible bulk density, kg/m3.</summary>
    public const double LowestDensity = 1000;

    /// <summary>The greatest credible bulk density, kg/m3.</summary>
    public const double HighestDensity = 4000;

    /// <summary>The smallest Vp/Vs; above it the bulk modulus is positive.</summary>
    public static readonly double SmallestRatio = Math.Sqrt(4.0 / 3.0);

    /// <summary>Gives the logs without impossible samples, marked as edited, and what was taken out.</summary>
    public static (LogTable Logs, IReadOnlyList<SampleRemoval> Removals) Remove(LogTable logs)
    {
        ArgumentNullException.ThrowIfNull(logs);
        var removals = new List<SampleRemoval>();
        logs = Remove(logs, Property.Density, removals, "bulk density outside 1-4 g/cm3", d => d is < LowestDensity or > HighestDensity);
        logs = Remove(logs, Property.Vp, removals, "compressional velocity that is not positive", v => v <= 0);
        logs = Remove(logs, Property.Vs, removals, "shear velocity that is not positive", v => v <= 0);
        return (RemovePairs(logs, removals), removals);
    }

    private static LogTable Remove(LogTable logs, Property property, List<SampleRemoval> removals, string reason, Predicate<double> impossible) =>
        logs[property] is { } curve ? TakeOut(logs, Array.ConvertAll(curve.Values, v => impossible(v)), reason, removals, curve) : logs;

    private static LogTable RemovePairs(LogTable logs, List<SampleRemoval> removals)
    {
        if (logs[Property.Vp] is not { } vp || logs[Property.Vs] is not { } vs) return logs;
        var marks = new bool[logs.Count];
        for (var i = 0; i < marks.Length; i++) marks[i] = vp.Values[i] <= SmallestRatio * vs.Values[i];
        return TakeOut(logs, marks, "Vp/Vs not above sqrt(4/3)", removals, vp, vs);
    }

    private static LogTable TakeOut(LogTable logs, bool[] marks, string reason, List<SampleRemoval> removals, params Curve[] curves)
    {
        if (!marks.Contains(true)) return logs;
        removals.Add(new SampleRemoval(reason, marks));
        return logs.With(curves.Select(c => TakeOut(c, marks, reason)));
    }

    private static Curve TakeOut(Curve curve, bool[] marks, string reason)
    {
        var values = (double[])curve.Values.Clone();
        for (var i = 0; i < values.Length; i++)
        {
            if (marks[i]) values[i] = double.NaN;
        }

        return curve with { Values = values, Origins = curve.Origins.Mark(marks, SampleOrigin.Edited, "taken out: " + reason) };
    }
}

using System.Globalization;
using System.Text;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>The choice between a fast and a slow shear wave in a starter well file, with what it moves.</summary>
internal static class StarterShear
{
    /// <summary>True when the log has a fast or a slow shear wave.</summary>
    public static bool HasWave(LogFile log) => Find(log, Property.FastShear) is not null || Find(log, Property.SlowShear) is not null;

    /// <summary>The line for <c>shear_from</c> as a comment; nothing where the log has neither wave.</summary>
    public static void Append(StringBuilder text, LogFile log)
    {
        var (plain, fast, slow) = (Find(log, Property.Vs), Find(log, Property.FastShear), Find(log, Property.SlowShear));
        if (fast is null && slow is null) return;
        var word = fast is null ? "slow" : "fast";
        var why = (fast, slow) switch
        {
            (null, _) => $"of the two shear waves only the slow one is there ({slow!.Name})",
            (_, null) => $"of the two shear waves only the fast one is there ({fast.Name})",
            _ => $"fast ({fast.Name}), slow ({slow.Name}) or mean: stress or bedding parts the two waves, the isotropic chain takes one; {Difference(fast, slow)}",
        };
        var mark = plain is null ? "# <-" : $"# {plain.Name} serves below; to take another, remove shear there:";
        text.AppendLine(CultureInfo.InvariantCulture, $"{$"# shear_from = \"{word}\"",-38}{mark} {why}");
    }

    private static string Difference(LogColumn fast, LogColumn slow)
    {
        var (share, samples) = ShearServing.MeanDifference(Velocity(fast), Velocity(slow));
        return samples == 0
            ? "no sample has both"
            : string.Create(CultureInfo.InvariantCulture, $"the choice moves Vs by {100 * Math.Abs(share):F1} % on average{(share < 0 ? "; the fast one is slower: are they exchanged?" : "")}");
    }

    private static LogColumn? Find(LogFile log, Property property) =>
        RoleAssignment.Candidates(CurveRoles.Of(property)!, [log]) is [var first, ..] ? first.Column : null;

    /// <summary>A column in m/s; one without a known unit is taken in the one that the starter file proposes.</summary>
    private static double[] Velocity(LogColumn column)
    {
        var dimensions = CurveRoles.Of(Property.FastShear)!.Dimensions;
        var unit = Units.Find(column.Unit ?? "", dimensions) ?? Units.Of(dimensions[0]).First();
        var values = (double[])column.Values.Clone();
        unit.ToSi(values);
        return unit.Dimension == Dimension.Slowness ? Array.ConvertAll(values, v => v > 0 ? 1 / v : double.NaN) : values;
    }
}

namespace DepthStress.Files.Results;

/// <summary>Values of one profile at the depths of another.</summary>
public static class ProfileMatch
{
    /// <summary>Rows farther apart than so many usual steps have a gap between them.</summary>
    private const double WidestStep = 1.5;

    /// <summary>Half the last printed decimal of a depth in m and in ft together, m.</summary>
    private const double PrintedDepth = 0.51e-4 * (1 + 0.3048);

    /// <summary>
    /// Values at other depths by straight lines between neighbouring rows; missing outside, where a neighbour is missing, and
    /// between rows farther apart than one and a half of the usual step. At a row's own depth its value stands as it is.
    /// </summary>
    /// <param name="depths">Depths of the rows, growing.</param>
    /// <param name="values">Their values; NaN is missing.</param>
    /// <param name="wanted">Depths at which values are wanted, growing.</param>
    public static double[] At(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, ReadOnlySpan<double> wanted)
    {
        if (depths.Length != values.Length) throw new ArgumentException("found spans of different lengths, expected one value for each depth", nameof(values));
        var steps = new double[Math.Max(0, depths.Length - 1)];
        for (var i = 0; i < steps.Length; i++) steps[i] = depths[i + 1] - depths[i];
        Array.Sort(steps);
        var widest = steps.Length == 0 ? 0 : WidestStep * steps[steps.Length / 2];
        var result = new double[wanted.Length];
        var at = 0;
        for (var k = 0; k < wanted.Length; k++)
        {
            while (at + 1 < depths.Length && depths[at + 1] <= wanted[k]) at++;
            result[k] = At(depths, values, at, wanted[k], widest);
        }

        return result;
    }

    /// <summary>True when two depth grids are the same within what the files print.</summary>
    public static bool SameDepths(ResultCsv first, ResultCsv second)
    {
        ArgumentNullException.ThrowIfNull(first);
        ArgumentNullException.ThrowIfNull(second);
        var (a, b) = (first.Numbers["md"], second.Numbers["md"]);
        var rounding = first.Units == second.Units ? 0 : PrintedDepth;
        return a.Length == b.Length && Enumerable.Range(0, a.Length).All(i => Math.Abs(a[i] - b[i]) <= rounding);
    }

    private static double At(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, int row, double depth, double widest)
    {
        if (depths.IsEmpty || !(depth >= depths[row])) return double.NaN;
        if (depth == depths[row]) return values[row];
        if (row + 1 >= depths.Length || depths[row + 1] - depths[row] > widest) return double.NaN;
        var share = (depth - depths[row]) / (depths[row + 1] - depths[row]);
        return values[row] + ((values[row + 1] - values[row]) * share);
    }
}

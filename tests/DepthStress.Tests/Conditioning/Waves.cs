namespace DepthStress.Tests.Conditioning;

/// <summary>An invented smooth curve, steps of about 0.01, on a depth step of 0.15 m.</summary>
internal static class Waves
{
    public static double[] Depths(int count) => [.. Enumerable.Range(0, count).Select(i => 1000 + (0.15 * i))];

    /// <summary>The curve, raised inside beds [from, to).</summary>
    public static double[] Curve(int count, params (int From, int To, double By)[] beds) =>
        [.. Enumerable.Range(0, count).Select(i => 2 + (0.02 * Math.Sin(0.7 * i)) + (0.01 * Math.Cos(1.9 * i)) + beds.Where(b => i >= b.From && i < b.To).Sum(b => b.By))];
}

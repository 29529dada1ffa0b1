using CsCheck;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.Pressure;

public class RunningWindowTests
{
    private static double[] Smooth(double[] depth, double[] values, double window, Smoothing smoothing)
    {
        var result = new double[values.Length];
        RunningWindow.Fill(depth, values, window, smoothing, result);
        return result;
    }

    [Fact]
    public void A_window_holds_what_lies_within_half_of_it_on_either_side()
    {
        double[] depth = [0, 1, 2, 3, 10];
        double[] values = [1, 2, 30, 4, 7];
        Assert.Equal([1.5, 11, 12, 17, 7], Smooth(depth, values, 2, Smoothing.Mean));
        Assert.Equal([1.5, 2, 4, 17, 7], Smooth(depth, values, 2, Smoothing.Median));
    }

    [Fact]
    public void Lengths_must_agree() => Assert.Throws<ArgumentException>(() => Smooth([1, 2], [1], 1, Smoothing.Mean));

    // Against sorting each window anew. Tolerance: the running sum rounds.
    [Fact]
    public void Smoothing_is_what_each_window_gives_alone() =>
        Gen.Select(Gen.Double[0, 3].Array[1, 60], Gen.Double[0.1, 12], Gen.Int[0, 5].Array[60]).Sample((steps, window, levels) =>
        {
            var depth = steps.Select((_, i) => steps.Take(i + 1).Sum()).ToArray();
            double[] values = [.. depth.Select((_, i) => (double)levels[i])];
            var (means, medians) = (Smooth(depth, values, window, Smoothing.Mean), Smooth(depth, values, window, Smoothing.Median));
            for (var i = 0; i < depth.Length; i++)
            {
                double[] inside = [.. values.Where((_, k) => depth[k] >= depth[i] - (window / 2) && depth[k] <= depth[i] + (window / 2)).Order()];
                Assert.Equal(inside.Average(), means[i], 1e-9);
                Assert.Equal(0.5 * (inside[(inside.Length - 1) / 2] + inside[inside.Length / 2]), medians[i]);
            }
        });
}

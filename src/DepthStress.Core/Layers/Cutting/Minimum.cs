using System.Numerics;

namespace DepthStress.Core.Layers;

/// <summary>Finds the smallest sum of two columns.</summary>
internal static class Minimum
{
    /// <summary>The smallest a + b and the first place where it stands; infinity and -1 when no sum is finite.</summary>
    public static (double Value, int At) OfSum(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        var (value, at, i) = (double.PositiveInfinity, -1, 0);
        var lowest = new Vector<double>(double.PositiveInfinity);
        var (place, here, step) = (new Vector<double>(-1), Vector<double>.Indices, new Vector<double>(Vector<double>.Count));
        for (; i <= a.Length - Vector<double>.Count; i += Vector<double>.Count)
        {
            var sum = new Vector<double>(a[i..]) + new Vector<double>(b[i..]);
            var lower = Vector.LessThan(sum, lowest);
            lowest = Vector.ConditionalSelect(lower, sum, lowest);
            place = Vector.ConditionalSelect(lower, here, place);
            here += step;
        }

        for (var lane = 0; lane < Vector<double>.Count; lane++)
        {
            if (lowest[lane] < value || (lowest[lane] == value && place[lane] < at)) (value, at) = (lowest[lane], (int)place[lane]);
        }

        for (; i < a.Length; i++)
        {
            if (a[i] + b[i] < value) (value, at) = (a[i] + b[i], i);
        }

        return (value, at);
    }
}

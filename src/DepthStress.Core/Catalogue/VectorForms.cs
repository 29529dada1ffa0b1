using System.Numerics;
using System.Runtime.CompilerServices;

namespace DepthStress.Core.Catalogue;

/// <summary>
/// Lines and parabolas of one input, several samples at a time: the operations of <see cref="LawForms"/> in the same order,
/// so that results are equal to the last bit.
/// </summary>
internal static class VectorForms
{
    /// <summary>
    /// Evaluates a block in which every sample and every result is within all limits of the law; otherwise, and for any other
    /// law, gives false and leaves the destination as it was.
    /// </summary>
    /// <param name="law">The law.</param>
    /// <param name="column">Its only input, SI.</param>
    /// <param name="scratch">Room for the results.</param>
    /// <param name="destination">Gets the results, SI; may be the input.</param>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static bool TryApply(Law law, ReadOnlySpan<double> column, Span<double> scratch, Span<double> destination)
    {
        var square = ReferenceEquals(law.Formula, LawForms.Quadratic);
        if ((!square && !ReferenceEquals(law.Formula, LawForms.Linear)) || column.Length % Vector<double>.Count != 0) return false;
        var input = law.Inputs[0];
        Vector<double> low = new(Math.Max(input.Domain.Low, input.Range.Low)), high = new(Math.Min(input.Domain.High, input.Range.High));
        Vector<double> least = new(Math.Max(law.ResultDomain.Low, double.MinValue)), most = new(Math.Min(law.ResultDomain.High, double.MaxValue));
        Vector<double> a = new(law.Values[0]), b = new(law.Values[1]);
        Vector<double> offset = new(input.Unit.Offset), factor = new(input.Unit.Factor);
        Vector<double> resultOffset = new(law.Unit.Offset), resultFactor = new(law.Unit.Factor);
        for (var i = 0; i < column.Length; i += Vector<double>.Count)
        {
            var x = (new Vector<double>(column[i..]) - offset) / factor;
            var y = square ? ((a * x) + b) * x : (a * x) + b;
            if (!Within(x, low, high) || !Within(y, least, most)) return false;
            ((y * resultFactor) + resultOffset).CopyTo(scratch[i..]);
        }

        scratch[..column.Length].CopyTo(destination);
        return true;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static bool Within(Vector<double> value, Vector<double> low, Vector<double> high) =>
        Vector.GreaterThanOrEqualAll(value, low) && Vector.LessThanOrEqualAll(value, high);
}

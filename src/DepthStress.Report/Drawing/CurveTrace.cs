using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Drawing;

/// <summary>What a picture needs of one curve: its thinned lines and what the thinning leaves out.</summary>
/// <param name="Curve">The curve.</param>
/// <param name="Lines">Lines without gaps.</param>
/// <param name="Least">The least value on the scale.</param>
/// <param name="Greatest">The greatest value on the scale.</param>
/// <param name="OffScale">How many samples lie beyond an end of the scale.</param>
internal sealed record CurveTrace(
    CurveDefinition Curve, IReadOnlyList<IReadOnlyList<LogPoint>> Lines, double Least, double Greatest, int OffScale)
{
    private const int Chunk = 4096;

    /// <summary>Fills a span with values in the picture's unit, from a sample on.</summary>
    private delegate void Filler(int start, Span<double> destination);

    /// <summary>Reads a curve in one pass over chunks; null when it has no value.</summary>
    /// <param name="model">The model.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="units">The picture's units.</param>
    /// <param name="depths">Depth of each sample, in the picture's unit.</param>
    /// <param name="axis">The depth axis, which decides what can still be told apart.</param>
    public static CurveTrace? Read(EarthModel model, CurveDefinition curve, UnitSystem units, double[] depths, DepthAxis axis) =>
        Read(curve, units, depths, axis, (start, destination) => curve.Column.Fill(model, start, units, destination));

    /// <summary>The same of values in SI, one for each depth; null when none is there.</summary>
    public static CurveTrace? Of(CurveDefinition curve, double[] values, UnitSystem units, double[] depths, DepthAxis axis)
    {
        var unit = curve.Column.In(units).Unit;
        return Read(curve, units, depths, axis, (start, destination) =>
        {
            values.AsSpan(start, destination.Length).CopyTo(destination);
            unit.FromSi(destination);
        });
    }

    private static CurveTrace? Read(CurveDefinition curve, UnitSystem units, double[] depths, DepthAxis axis, Filler fill)
    {
        var values = new double[Math.Min(Chunk, depths.Length)];
        var decimator = new Decimator(axis.Top, axis.Pixel);
        var (low, high) = (curve.Scale(units).Low, curve.Scale(units).High);
        var (least, greatest, offScale) = (double.NaN, double.NaN, 0);
        for (var start = 0; start < depths.Length; start += Chunk)
        {
            var n = Math.Min(Chunk, depths.Length - start);
            fill(start, values.AsSpan(0, n));
            for (var i = 0; i < n; i++)
            {
                var value = values[i];
                decimator.Add(depths[start + i], value);
                if (!double.IsFinite(value)) continue;
                if (value < low || value > high)
                {
                    offScale++;
                    value = Math.Clamp(value, low, high);
                }

                if (!(value >= least)) least = value;
                if (!(value <= greatest)) greatest = value;
            }
        }

        var lines = decimator.Lines();
        return lines.Count == 0 ? null : new CurveTrace(curve, lines, least, greatest, offScale);
    }

    /// <summary>The scale of each curve of a track, those that follow the data set to round ends.</summary>
    public static IReadOnlyList<CurveScale> Scales(IReadOnlyList<CurveTrace> traces, UnitSystem units)
    {
        var fitted = traces.Where(t => t.Curve.Scale(units).Fit != ScaleFit.Fixed).ToList();
        if (fitted.Count == 0) return [.. traces.Select(t => t.Curve.Scale(units))];
        var first = fitted[0].Curve.Scale(units);
        var low = first.Fit == ScaleFit.RightEnd ? first.Left : fitted.Min(t => t.Least);
        var shared = RoundSteps.Around(low, fitted.Max(t => t.Greatest), first.Divisions);
        return [.. traces.Select(t => t.Curve.Scale(units) is { Fit: ScaleFit.Fixed } fixedScale ? fixedScale : shared)];
    }
}

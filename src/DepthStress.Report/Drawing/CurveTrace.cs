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

    /// <summary>Reads a curve in one pass over chunks; null when it has no value.</summary>
    /// <param name="model">The model.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="units">The picture's units.</param>
    /// <param name="depths">Depth of each sample, in the picture's unit.</param>
    /// <param name="axis">The depth axis, which decides what can still be told apart.</param>
    public static CurveTrace? Read(EarthModel model, CurveDefinition curve, UnitSystem units, double[] depths, DepthAxis axis)
    {
        var values = new double[Math.Min(Chunk, model.Count)];
        var decimator = new Decimator(axis.Top, axis.Pixel);
        var (low, high) = (curve.Scale(units).Low, curve.Scale(units).High);
        var (least, greatest, offScale) = (double.NaN, double.NaN, 0);
        for (var start = 0; start < model.Count; start += Chunk)
        {
            var n = Math.Min(Chunk, model.Count - start);
            curve.Column.Fill(model, start, units, values.AsSpan(0, n));
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

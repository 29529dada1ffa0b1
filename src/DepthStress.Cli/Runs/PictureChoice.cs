using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;
using DepthStress.Files.Setup;
using DepthStress.Report;

namespace DepthStress.Cli.Runs;

/// <summary>Turns the [output] section into picture options, and reports tracks and scales that do not exist.</summary>
internal static class PictureChoice
{
    /// <summary>The picture options of a well file; problems are reported.</summary>
    public static PictureOptions Of(OutputSection output, DiagnosticBag diagnostics)
    {
        var units = output.Units.Value;
        if (output.Tracks.IsSet)
        {
            var known = TrackTable.All.Select(t => t.Id).ToList();
            foreach (var id in output.Tracks.Value.Where(id => !known.Contains(id)))
                diagnostics.Error(output.Tracks.Source.Position, $"found the unknown track \"{id}\", expected some of {string.Join(", ", known)}{NearestName.Hint(id, known)}");
        }

        var scales = new Dictionary<string, CurveScale>();
        foreach (var scale in output.Scales) Add(scale, units, scales, diagnostics);
        return new PictureOptions(units, output.Tracks.IsSet ? output.Tracks.Value : null, scales);
    }

    private static void Add(ScaleSection scale, UnitSystem units, Dictionary<string, CurveScale> scales, DiagnosticBag diagnostics)
    {
        if (!scale.Curve.IsSet || !scale.Left.IsSet || !scale.Right.IsSet)
        {
            diagnostics.Error(scale.Position, "[[output.scales]]: expected curve, left and right");
            return;
        }

        var curves = TrackTable.All.SelectMany(t => t.Curves).ToList();
        if (curves.Find(c => c.Column.Id == scale.Curve.Value) is not { } curve)
        {
            var names = curves.Select(c => c.Column.Id).Distinct().ToList();
            diagnostics.Error(scale.Curve.Source.Position, $"found the unknown curve \"{scale.Curve.Value}\", expected one of {string.Join(", ", names)}{NearestName.Hint(scale.Curve.Value, names)}");
            return;
        }

        if (scales.ContainsKey(curve.Column.Id))
        {
            diagnostics.Error(scale.Position, $"[[output.scales]]: found a second scale for \"{curve.Column.Id}\", expected one");
            return;
        }

        var unit = curve.Column.In(units).Unit;
        if (End(scale.Left, unit, diagnostics) is not { } left || End(scale.Right, unit, diagnostics) is not { } right) return;
        if (left == right) diagnostics.Error(scale.Position, "[[output.scales]]: found the same value left and right, expected two values");
        else scales[curve.Column.Id] = curve.Scale(units) with { Left = left, Right = right, Fit = ScaleFit.Fixed };
    }

    private static double? End(Setting<string> text, Unit unit, DiagnosticBag diagnostics)
    {
        // A fraction has no unit to write.
        ReadOnlySpan<Dimension> fitting = unit.Dimension == Dimension.Fraction ? [Dimension.Fraction, Dimension.None] : [unit.Dimension];
        if (QuantityText.TryParse(text.Value, fitting, out var si, out _, out var problem)) return unit.FromSi(si);
        diagnostics.Error(text.Source.Position, $"[[output.scales]]: {problem}");
        return null;
    }
}

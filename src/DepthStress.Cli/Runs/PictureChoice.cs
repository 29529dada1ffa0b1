using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
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
        return new PictureOptions(units, output.Tracks.IsSet ? output.Tracks.Value : null, scales, PolygonDepths(output, diagnostics));
    }

    /// <summary>Warns of depths of stress polygons that the well does not have.</summary>
    public static void Check(PictureOptions pictures, OutputSection output, EarthModel model, DiagnosticBag diagnostics)
    {
        foreach (var (depth, kind) in pictures.Depths ?? [])
        {
            if (StressState.At(model, depth, kind) is null)
                diagnostics.Warning(output.PolygonDepths.Source.Position, $"[output] polygon_depths: found {pictures.Units.Show(Quantity.Length(depth))}, expected a depth within the logs; it is left out");
        }
    }

    private static List<(double Depth, DepthKind Kind)>? PolygonDepths(OutputSection output, DiagnosticBag diagnostics)
    {
        var (depths, kind) = (output.PolygonDepths, output.PolygonDepthKind);
        if (!depths.IsSet)
        {
            if (kind.IsSet) diagnostics.Error(kind.Source.Position, "[output] polygon_depth_kind is set without polygon_depths, expected both or neither");
            return null;
        }

        if (!kind.IsSet) diagnostics.Error(depths.Source.Position, "[output] polygon_depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"");
        if (depths.Value.Count is 0 or > StressState.MostChosen)
            diagnostics.Error(depths.Source.Position, FormattableString.Invariant($"[output] polygon_depths: found {depths.Value.Count} depths, expected 1 to {StressState.MostChosen}"));
        var known = new List<(double, DepthKind)>();
        foreach (var text in depths.Value)
        {
            if (QuantityText.TryParse(text, [Dimension.Length], out var si, out _, out var problem)) known.Add((si, kind.Value));
            else diagnostics.Error(depths.Source.Position, $"[output] polygon_depths: {problem}");
        }

        return known;
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

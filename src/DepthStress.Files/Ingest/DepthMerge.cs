using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using DepthStress.Files.Setup;
using MathNet.Numerics.Statistics;
using static System.FormattableString;

namespace DepthStress.Files.Ingest;

/// <summary>A column on the wanted depths.</summary>
/// <param name="Column">The column.</param>
/// <param name="Values">Its values in SI.</param>
/// <param name="Changes">Which of them were made, and how; none where a value is as logged.</param>
/// <param name="Gaps">Gaps that were left because they are too long, where that was asked.</param>
internal sealed record CurvePart(ColumnChoice Column, double[] Values, SampleOrigin[] Changes, IReadOnlyList<DepthGap> Gaps);

/// <summary>The depths that all curves are brought onto: those of the first file continued by the others, or the regular grid that the well file asks for.</summary>
internal sealed class DepthMerge
{
    private const int MostDepths = 10_000_000;
    private const int MostGapsNamed = 5;
    private readonly Resampling? _rule;

    private DepthMerge(double[] grid, Resampling? rule) => (Grid, _rule) = (grid, rule);

    /// <summary>The wanted depths, m, strictly increasing.</summary>
    public double[] Grid { get; }

    /// <summary>The step that made samples, as origins name it.</summary>
    public string Step => _rule is null ? "brought onto the depths of the first file by a straight line" : "resampling";

    /// <summary>Lays out the depths; null when the grid that is asked for cannot be used, which is reported.</summary>
    public static DepthMerge? Of(ResampleSection section, List<LogFile> files, List<double[]> depths, DiagnosticBag diagnostics)
    {
        if (section.Rule is not { } rule) return new DepthMerge(DepthGrid.Union(depths), null);
        var (top, bottom) = (depths.Min(d => d[0]), depths.Max(d => d[^1]));
        if (!((bottom - top) / rule.Step < MostDepths))
        {
            diagnostics.Error(section.Step.Source.Position, Invariant($"found a step of {rule.Step:0.#######} m, which makes more than {MostDepths:N0} depths of {top:F1} to {bottom:F1} m, expected a coarser one"));
            return null;
        }

        var grid = rule.Depths(top, bottom);
        if (grid.Length < 2)
        {
            diagnostics.Error(section.Step.Source.Position, Invariant($"found a step of {rule.Step:0.#######} m, of which fewer than two whole multiples lie within {top:F1} to {bottom:F1} m, expected a finer one"));
            return null;
        }

        for (var f = 0; f < files.Count; f++) CheckSteps(section, rule, files[f], depths[f], diagnostics);
        return new DepthMerge(grid, rule);
    }

    /// <summary>Brings a column onto the wanted depths.</summary>
    public CurvePart Bring(CurveRole role, ColumnChoice column, double[] depths, double[] si)
    {
        if (_rule is not null)
        {
            var (values, made, gaps) = _rule.Bring(depths, si, Grid, Shape(role));
            return new CurvePart(column, values, made, gaps);
        }

        var changes = new SampleOrigin[Grid.Length];
        if (ReferenceEquals(depths, Grid)) return new CurvePart(column, si, changes, []);
        var resampled = new bool[Grid.Length];
        var brought = DepthGrid.Bring(depths, si, Grid, resampled);
        for (var i = 0; i < changes.Length; i++) changes[i] = resampled[i] ? SampleOrigin.Edited : SampleOrigin.None;
        return new CurvePart(column, brought, changes, []);
    }

    /// <summary>Notes how many samples of a curve were made, and which gaps were too long.</summary>
    public void Report(Curve curve, List<CurvePart> parts, DiagnosticBag diagnostics)
    {
        var position = parts[0].Column.Column.Position;
        var made = curve.Origins.Runs.Where(r => r.Step == Step).ToLookup(r => r.Origin, r => r.End - r.Start);
        var (edited, filled) = (made[SampleOrigin.Edited].Sum(), made[SampleOrigin.Filled].Sum());
        if (_rule is null)
        {
            if (edited > 0) diagnostics.Note(position, Invariant($"{curve.Role.Id}: {edited} samples were {Step}"));
            return;
        }

        if (edited + filled > 0)
        {
            diagnostics.Note(position, Invariant(
                $"{curve.Role.Id}: {edited + filled} of {curve.Values.Count(double.IsFinite)} samples come from resampling{(filled > 0 ? Invariant($", {filled} of them bridge missing values") : "")}"));
        }

        var gaps = LeftOpen(parts);
        if (gaps.Count == 0) return;
        var named = string.Join(", ", gaps.Take(MostGapsNamed).Select(g => Invariant($"{g.Top:F1} to {g.Base:F1} m")));
        var more = gaps.Count > MostGapsNamed ? Invariant($" and {gaps.Count - MostGapsNamed} more") : "";
        diagnostics.Note(position, Invariant($"{curve.Role.Id}: {gaps.Count} {(gaps.Count == 1 ? "gap" : "gaps")} longer than max_gap ({_rule.MaxGap:0.####} m) stay{(gaps.Count == 1 ? "s" : "")} missing: {named}{more}"));
    }

    /// <summary>The gaps of each part over the depths where it serves.</summary>
    private static List<DepthGap> LeftOpen(List<CurvePart> parts)
    {
        var gaps = new List<DepthGap>();
        var top = double.NegativeInfinity;
        foreach (var part in parts)
        {
            var bottom = part.Column.Source is { Base.IsSet: true } source ? source.Base.Value : double.PositiveInfinity;
            gaps.AddRange(part.Gaps.Where(g => g.Base > top && g.Top < bottom));
            top = bottom;
        }

        return gaps;
    }

    private static void CheckSteps(ResampleSection section, Resampling rule, LogFile file, double[] depths, DiagnosticBag diagnostics)
    {
        if (depths.Length < 2) return;
        var steps = new double[depths.Length - 1];
        for (var i = 0; i < steps.Length; i++) steps[i] = depths[i + 1] - depths[i];
        var (least, most) = (steps.Min(), steps.Max());
        var usual = ArrayStatistics.MedianInplace(steps);
        var odd = steps.Count(s => Math.Abs(s - usual) > 0.1 * usual);
        if (odd > 0)
        {
            diagnostics.Note(
                file.Columns[file.DepthColumn].Position,
                Invariant($"uneven depths: {odd} of {steps.Length} steps differ by more than a tenth from the usual {usual:0.####} m, they run from {least:0.####} to {most:0.####} m; all curves are brought onto whole multiples of {rule.Step:0.#######} m"));
        }

        if (rule.MaxGap < usual - DepthGrid.Tolerance)
            diagnostics.Error(section.MaxGap.Source.Position, Invariant($"found max_gap = {rule.MaxGap:0.####} m, expected at least the usual step of {file.Name}, {usual:0.####} m: no two of its samples would be joined"));
    }

    private static CurveShape Shape(CurveRole role) =>
        role.Dimensions is [Dimension.None] || role.Property == Property.BitSize ? CurveShape.Steps
        : role.Dimensions.Contains(Dimension.Slowness) ? CurveShape.Reciprocal
        : CurveShape.Line;
}

using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using static System.FormattableString;

namespace DepthStress.Files.Ingest;

/// <summary>Joins the runs of a curve at their splice depths; the origins record which run each sample came from.</summary>
internal static class Splice
{
    /// <summary>Joins one or several runs into a curve.</summary>
    public static Curve Join(
        CurveRole role, IReadOnlyList<(ColumnChoice Column, double[] Values, bool[] Resampled)> parts, double[] grid, DiagnosticBag diagnostics)
    {
        var origin = parts.Count > 1 ? SampleOrigin.Spliced : SampleOrigin.Measured;
        var values = parts.Count == 1 ? parts[0].Values : new double[grid.Length];
        var resampled = parts.Count == 1 ? parts[0].Resampled : new bool[grid.Length];
        var tracks = new List<OriginRun>();
        var start = 0;
        foreach (var (column, run, marks) in parts)
        {
            var end = column.Source is { Base.IsSet: true } s ? FirstBelow(grid, s.Base.Value) : grid.Length;
            end = Math.Max(end, start);
            if (parts.Count > 1)
            {
                run.AsSpan(start..end).CopyTo(values.AsSpan(start));
                marks.AsSpan(start..end).CopyTo(resampled.AsSpan(start));
            }

            var step = $"{column.Column.Name} in {column.File.Name}";
            tracks.AddRange(OriginTrack.Of(values.AsSpan(start..end), origin, step).Runs
                .Select(r => r with { Start = r.Start + start, End = r.End + start }));
            start = end;
        }

        // Below the last splice depth there is no run.
        values.AsSpan(start).Fill(double.NaN);
        resampled.AsSpan(start).Clear();
        if (start < grid.Length) tracks.Add(new OriginRun(start, grid.Length, SampleOrigin.None, ""));

        var origins = OriginTrack.From(tracks);
        var moved = resampled.Count(r => r);
        if (moved > 0)
        {
            origins = origins.Mark(resampled, SampleOrigin.Edited, "brought onto the depths of the first file by a straight line");
            diagnostics.Note(parts[0].Column.Column.Position, Invariant($"{role.Id}: {moved} samples were brought onto the depths of the first file by a straight line"));
        }

        return new Curve(role, string.Join(", ", parts.Select(p => $"{p.Column.Column.Name} in {p.Column.File.Name}")), values, origins);
    }

    private static int FirstBelow(double[] grid, double depth)
    {
        var i = Array.BinarySearch(grid, depth);
        return i < 0 ? ~i : i + 1;
    }
}

using DepthStress.Core.Logs;

namespace DepthStress.Files.Ingest;

/// <summary>Joins the runs of a curve at their splice depths; the origins record which run each sample came from.</summary>
internal static class Splice
{
    /// <summary>Joins one or several runs into a curve.</summary>
    /// <param name="role">What the curve is.</param>
    /// <param name="parts">Its runs from top to bottom, on the wanted depths.</param>
    /// <param name="grid">The wanted depths, m.</param>
    /// <param name="made">The step that made samples of the parts.</param>
    public static Curve Join(CurveRole role, IReadOnlyList<CurvePart> parts, double[] grid, string made)
    {
        var origin = parts.Count > 1 ? SampleOrigin.Spliced : SampleOrigin.Measured;
        var values = parts.Count == 1 ? parts[0].Values : new double[grid.Length];
        var changes = parts.Count == 1 ? parts[0].Changes : new SampleOrigin[grid.Length];
        var tracks = new List<OriginRun>();
        var start = 0;
        foreach (var (column, run, marks, _) in parts)
        {
            var end = column.Source is { Base.IsSet: true } s ? FirstBelow(grid, s.Base.Value) : grid.Length;
            end = Math.Max(end, start);
            if (parts.Count > 1)
            {
                run.AsSpan(start..end).CopyTo(values.AsSpan(start));
                marks.AsSpan(start..end).CopyTo(changes.AsSpan(start));
            }

            var step = $"{column.Column.Name} in {column.File.Name}";
            tracks.AddRange(OriginTrack.Of(values.AsSpan(start..end), origin, step).Runs
                .Select(r => r with { Start = r.Start + start, End = r.End + start }));
            start = end;
        }

        // Below the last splice depth there is no run.
        values.AsSpan(start).Fill(double.NaN);
        changes.AsSpan(start).Clear();
        if (start < grid.Length) tracks.Add(new OriginRun(start, grid.Length, SampleOrigin.None, ""));

        var origins = OriginTrack.From(tracks);
        foreach (var change in (ReadOnlySpan<SampleOrigin>)[SampleOrigin.Edited, SampleOrigin.Filled])
        {
            if (changes.Contains(change)) origins = origins.Mark(Array.ConvertAll(changes, c => c == change), change, made);
        }

        return new Curve(role, string.Join(", ", parts.Select(p => $"{p.Column.Column.Name} in {p.Column.File.Name}")), values, origins);
    }

    private static int FirstBelow(double[] grid, double depth)
    {
        var i = Array.BinarySearch(grid, depth);
        return i < 0 ? ~i : i + 1;
    }
}

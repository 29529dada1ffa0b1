namespace DepthStress.Files.Results;

/// <summary>A layer of one result with the one of the other that shares most of its depth.</summary>
/// <param name="Before">Row of the first result's layer table, or null.</param>
/// <param name="After">Row of the second's, or null.</param>
/// <param name="Overlap">Share of the thicker one's true vertical thickness that both have, 0 to 1.</param>
public sealed record LayerMatch(int? Before, int? After, double Overlap)
{
    /// <summary>Every layer of both at least once, from top to bottom of the first; those of the second that no layer chose follow in their place.</summary>
    public static IReadOnlyList<LayerMatch> Of(ResultCsv before, ResultCsv after)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(after);
        var matches = Enumerable.Range(0, before.Count).Select(k =>
        {
            var best = Best(before, k, after);
            return new LayerMatch(k, best, best is { } b ? Share(before, k, after, b) : 0);
        }).ToList();
        var left = Enumerable.Range(0, after.Count).Except(matches.Select(m => m.After).OfType<int>());
        matches.AddRange(left.Select(k =>
        {
            var best = Best(after, k, before);
            return new LayerMatch(best, k, best is { } b ? Share(before, b, after, k) : 0);
        }));
        return [.. matches.OrderBy(m => m.Before is { } b ? before.Numbers["top_tvd"][b] : after.Numbers["top_tvd"][m.After!.Value]).ThenBy(m => m.After ?? -1)];
    }

    private static int? Best(ResultCsv of, int row, ResultCsv among) => among.Count == 0
        ? null
        : Enumerable.Range(0, among.Count).Select(k => (Row: k, Common: Common(of, row, among, k))).MaxBy(k => k.Common) is { Common: > 0 } best ? best.Row : null;

    private static double Share(ResultCsv a, int i, ResultCsv b, int j) => Common(a, i, b, j) / Math.Max(Thickness(a, i), Thickness(b, j));

    private static double Common(ResultCsv a, int i, ResultCsv b, int j) =>
        Math.Min(a.Numbers["base_tvd"][i], b.Numbers["base_tvd"][j]) - Math.Max(a.Numbers["top_tvd"][i], b.Numbers["top_tvd"][j]);

    private static double Thickness(ResultCsv table, int row) => table.Numbers["base_tvd"][row] - table.Numbers["top_tvd"][row];
}

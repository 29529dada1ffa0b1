using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Report.Page;

/// <summary>A column of words as runs of rows that share one.</summary>
/// <param name="Column">The column.</param>
/// <param name="Words">The different words, in the order they come.</param>
/// <param name="Runs">For each run one past its last row, and the number of its word.</param>
internal sealed record WordRuns(TextColumn<EarthModel> Column, IReadOnlyList<string> Words, IReadOnlyList<(int End, int Word)> Runs)
{
    private const int Chunk = 4096;
    private static readonly string[] Origins = [.. Enum.GetValues<SampleOrigin>().Select(o => o.Name())];

    /// <summary>Reads a column. In a bin of several samples the weakest origin holds; other words are all named.</summary>
    public static WordRuns Of(EarthModel model, TextColumn<EarthModel> column, Bins bins)
    {
        var origins = column.Id.EndsWith("_origin", StringComparison.Ordinal) || column.Id == "stress_basis";
        var (numbers, words, runs) = (new Dictionary<string, int>(StringComparer.Ordinal), new List<string>(), new List<(int End, int Word)>());
        var chunk = new string[Math.Min(Chunk, model.Count)];
        var row = new List<string>();
        for (var i = 0; i < model.Count; i++)
        {
            if (i % Chunk == 0) column.Read(model, i, chunk.AsSpan(0, Math.Min(Chunk, model.Count - i)));
            if (chunk[i % Chunk] is { Length: > 0 } word && !row.Contains(word)) row.Add(word);
            if ((i + 1) % bins.PerRow != 0 && i + 1 < model.Count) continue;
            var text = row.Count == 0 ? "" : origins ? row.MaxBy(w => Array.IndexOf(Origins, w))! : string.Join(" / ", row);
            row.Clear();
            if (!numbers.TryGetValue(text, out var number))
            {
                numbers.Add(text, number = words.Count);
                words.Add(text);
            }

            var end = (i / bins.PerRow) + 1;
            if (runs.Count > 0 && runs[^1].Word == number) runs[^1] = (end, number);
            else runs.Add((end, number));
        }

        return new WordRuns(column, words, runs);
    }
}

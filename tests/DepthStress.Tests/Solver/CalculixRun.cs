using System.Globalization;

namespace DepthStress.Tests.Solver;

/// <summary>What an element carries at its middle: mean of its eight integration points, Pa, tension positive; and where that is, m.</summary>
internal readonly record struct SolvedElement(double Along1, double Along2, double Vertical, double Depth);

/// <summary>A deck solved by CalculiX.</summary>
internal sealed class CalculixRun
{
    private const int Points = 8;

    private CalculixRun(string[] printed)
    {
        var (stress, place) = (Table(printed, "stresses"), Table(printed, "global coordinates"));
        Elements = [.. stress.Keys.Order().Select(e => new SolvedElement(Mean(stress[e], 0), Mean(stress[e], 1), Mean(stress[e], 2), -Mean(place[e], 2)))];
        var first = Array.FindIndex(printed, l => l.StartsWith(" displacements", StringComparison.Ordinal)) + 2;
        TopDisplacements = [.. printed[first..].TakeWhile(l => l.Trim().Length > 0).Select(l => Numbers(l)[^1])];
    }

    /// <summary>The elements in the order of their numbers.</summary>
    public IReadOnlyList<SolvedElement> Elements { get; }

    /// <summary>Vertical displacement of each node of the tops, m.</summary>
    public IReadOnlyList<double> TopDisplacements { get; }

    public static CalculixRun Of(string deck)
    {
        using var folder = new TestFolder();
        folder.Write("deck.inp", deck);
        Assert.True(Outside.Ccx is not null, "CalculiX (ccx) is not on the path: install the Debian package calculix-ccx");
        var (code, output) = Outside.Run(Outside.Ccx, folder.Path, "-i", "deck");
        Assert.True(code == 0 && output.Contains("Job finished", StringComparison.Ordinal), output);
        Assert.DoesNotContain("*ERROR", output, StringComparison.Ordinal);
        Assert.DoesNotContain("*WARNING", output, StringComparison.Ordinal);
        return new CalculixRun(File.ReadAllLines(folder.Of("deck.dat")));
    }

    private static Dictionary<int, List<double[]>> Table(string[] printed, string title)
    {
        var first = Array.FindIndex(printed, l => l.StartsWith(" " + title, StringComparison.Ordinal)) + 2;
        var table = printed[first..].TakeWhile(l => l.Trim().Length > 0).Select(Numbers).GroupBy(n => (int)n[0]).ToDictionary(g => g.Key, g => g.Select(n => n[2..]).ToList());
        Assert.NotEmpty(table);
        Assert.All(table.Values, rows => Assert.Equal(Points, rows.Count));
        return table;
    }

    private static double[] Numbers(string line) =>
        [.. line.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(w => double.Parse(w, CultureInfo.InvariantCulture))];

    private static double Mean(List<double[]> rows, int column) => rows.Average(r => r[column]);
}

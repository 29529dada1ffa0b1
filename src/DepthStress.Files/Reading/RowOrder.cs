namespace DepthStress.Files.Reading;

/// <summary>Brings the rows of a table into the order of increasing depth, each depth once.</summary>
internal static class RowOrder
{
    /// <summary>Joins neighbouring rows of equal depth; gives the number of rows that remain.</summary>
    public static int Join(double[][] columns, int depth, int rows, bool mean)
    {
        var kept = 0;
        for (int start = 0, end; start < rows; start = end, kept++)
        {
            end = start + 1;
            while (end < rows && columns[depth][end] == columns[depth][start]) end++;
            for (var c = 0; c < columns.Length; c++)
            {
                var values = columns[c];
                values[kept] = mean && c != depth && end - start > 1 ? Mean(values.AsSpan(start, end - start)) : values[start];
            }
        }

        return kept;
    }

    /// <summary>Turns the rows round.</summary>
    public static void Reverse(double[][] columns, int rows)
    {
        foreach (var values in columns) values.AsSpan(0, rows).Reverse();
    }

    private static double Mean(ReadOnlySpan<double> values)
    {
        var (sum, count) = (0.0, 0);
        foreach (var value in values)
        {
            if (double.IsNaN(value)) continue;
            sum += value;
            count++;
        }

        return count > 0 ? sum / count : double.NaN;
    }
}

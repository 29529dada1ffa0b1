namespace DepthStress.Report.Drawing;

/// <summary>Moves labels apart along a line, each as near to its place as the others let it.</summary>
internal static class LabelSpread
{
    /// <summary>The centres of labels so that none overlaps the next and all lie between two ends, if there is room for all.</summary>
    /// <param name="wanted">Where each centre belongs, growing.</param>
    /// <param name="heights">Heights of the labels.</param>
    /// <param name="top">The upper end.</param>
    /// <param name="bottom">The lower end.</param>
    public static double[] Place(ReadOnlySpan<double> wanted, ReadOnlySpan<double> heights, double top, double bottom)
    {
        var centres = wanted.ToArray();
        var edge = top;
        for (var i = 0; i < centres.Length; i++)
        {
            centres[i] = Math.Max(centres[i], edge + (heights[i] / 2));
            edge = centres[i] + (heights[i] / 2);
        }

        edge = bottom;
        for (var i = centres.Length - 1; i >= 0; i--)
        {
            centres[i] = Math.Min(centres[i], edge - (heights[i] / 2));
            edge = centres[i] - (heights[i] / 2);
        }

        return centres;
    }
}

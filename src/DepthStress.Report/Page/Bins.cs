namespace DepthStress.Report.Page;

/// <summary>The rows of the page: samples one by one, or bins of so many samples in a row where there are too many to carry.</summary>
/// <param name="Samples">Number of samples.</param>
/// <param name="PerRow">Samples in a row; the last row may hold fewer.</param>
internal readonly record struct Bins(int Samples, int PerRow)
{
    /// <summary>Up to so many samples the page carries each of them.</summary>
    public const int MostSamples = 20_000;

    /// <summary>So many bins at most, which carry two values each.</summary>
    public const int MostBins = 8_000;

    /// <summary>Number of rows.</summary>
    public int Rows => (Samples + PerRow - 1) / PerRow;

    /// <summary>The rows for a number of samples.</summary>
    public static Bins Of(int samples) => new(samples, samples <= MostSamples ? 1 : (samples + MostBins - 1) / MostBins);
}

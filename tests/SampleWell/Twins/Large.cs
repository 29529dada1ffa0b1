namespace SampleWell.Twins;

/// <summary>Wells of any size for benchmarks: the twin on land with a step as small as the count of samples asks.</summary>
public static class Large
{
    /// <summary>Samples of an ordinary well.</summary>
    public const int Ordinary = 15_000;

    /// <summary>Samples of a very large well.</summary>
    public const int Million = 1_000_000;

    /// <summary>Writes the well and returns the path of its well file.</summary>
    public static string Write(string folder, int samples) => Twin.Write(folder, samples, seed: 1).WellFile;
}

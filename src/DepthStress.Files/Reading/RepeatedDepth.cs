namespace DepthStress.Files.Reading;

/// <summary>What to do with neighbouring rows of the same depth.</summary>
public enum RepeatedDepth
{
    /// <summary>They are an error.</summary>
    Error,

    /// <summary>The first of them is kept.</summary>
    First,

    /// <summary>Each column takes the mean of their values that are not missing.</summary>
    Mean,
}

namespace DepthStress.Core.Depth;

/// <summary>What a depth is counted along.</summary>
public enum DepthKind
{
    /// <summary>Along the hole from the datum (md).</summary>
    Measured,

    /// <summary>Vertically down from the datum (tvd).</summary>
    TrueVertical,

    /// <summary>Vertically down from mean sea level (tvdss), positive below it.</summary>
    TrueVerticalSubsea,
}

namespace DepthStress.Core.Depth;

/// <summary>The surface from which a depth-based method counts its depth.</summary>
public enum DepthReference
{
    /// <summary>The datum of the well, as a rule the rotary table.</summary>
    Datum,

    /// <summary>The ground of an onshore well.</summary>
    Ground,

    /// <summary>The sea surface of an offshore well.</summary>
    SeaSurface,

    /// <summary>The sea floor of an offshore well.</summary>
    Mudline,
}

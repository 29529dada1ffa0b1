namespace DepthStress.Core.Depth;

/// <summary>The surface at which measured and true vertical depth are zero.</summary>
public enum DatumKind
{
    /// <summary>The rotary table (or kelly bushing, or drill floor).</summary>
    RotaryTable,

    /// <summary>The ground at the well.</summary>
    Ground,

    /// <summary>Mean sea level.</summary>
    SeaLevel,
}

using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>How a plug was cut.</summary>
public enum PlugOrientation
{
    /// <summary>The table does not say.</summary>
    NotStated,

    /// <summary>Across the bedding.</summary>
    Vertical,

    /// <summary>Along the bedding.</summary>
    Horizontal,

    /// <summary>At another angle to the bedding.</summary>
    Inclined,
}

/// <summary>One plug of core, as its row states it, in SI; NaN is missing.</summary>
public sealed record CorePlug
{
    /// <summary>Where the row stands.</summary>
    public SourcePosition Position { get; init; }

    /// <summary>Measured depth as the core was logged, m.</summary>
    public required double Depth { get; init; }

    /// <summary>How it was cut.</summary>
    public PlugOrientation Orientation { get; init; }

    /// <summary>Angle between its axis and the bedding, rad.</summary>
    public double AngleToBedding { get; init; } = double.NaN;

    /// <summary>Confining pressure of the test, Pa.</summary>
    public double ConfiningPressure { get; init; } = double.NaN;

    /// <summary>Static Young's modulus, Pa.</summary>
    public double YoungsStatic { get; init; } = double.NaN;

    /// <summary>Static Poisson's ratio.</summary>
    public double PoissonStatic { get; init; } = double.NaN;

    /// <summary>Unconfined compressive strength, Pa; a strength under confining pressure is none.</summary>
    public double Ucs { get; init; } = double.NaN;

    /// <summary>What its modulus may be pooled with: plugs cut alike and tested alike, unconfined or under pressure.</summary>
    public string Group => $"{OrientationWord}; {(double.IsNaN(ConfiningPressure) ? "confining pressure not stated" : ConfiningPressure > 0 ? "confined" : "unconfined")}";

    /// <summary>How it was cut, in words.</summary>
    public string OrientationWord => Orientation == PlugOrientation.NotStated ? "orientation not stated" : Orientation.ToString().ToLowerInvariant();
}

/// <summary>The core of a well and how it is laid beside the logs.</summary>
public sealed record CoreData
{
    /// <summary>The plugs in the order of their rows.</summary>
    public IReadOnlyList<CorePlug> Plugs { get; init; } = [];

    /// <summary>What is added to core depths to give log depths, m; not set means nothing.</summary>
    public Setting<double> DepthShift { get; init; }

    /// <summary>How far a better shift is looked for either way, m; not set means that none is looked for.</summary>
    public Setting<double> DepthShiftLimit { get; init; }

    /// <summary>The shift in force, m.</summary>
    public double Shift => DepthShift.IsSet ? DepthShift.Value : 0;
}

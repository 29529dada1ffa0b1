using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>How a parameter of a normal trend was had.</summary>
public enum TrendParameterKind
{
    /// <summary>It was given.</summary>
    Given,

    /// <summary>It was estimated.</summary>
    Estimated,

    /// <summary>Its estimate stopped at a bound.</summary>
    AtBound,
}

/// <summary>One parameter of a normal trend.</summary>
/// <param name="Key">Its key in the well file.</param>
/// <param name="Value">Its value, SI.</param>
/// <param name="Error">Its standard error, SI; zero unless estimated.</param>
/// <param name="Dimension">What it measures.</param>
/// <param name="Kind">How it was had.</param>
public sealed record TrendParameter(string Key, double Value, double Error, Dimension Dimension, TrendParameterKind Kind);

/// <summary>A normal trend as it was fitted, with its uncertainty.</summary>
public sealed record FittedTrend
{
    /// <summary>The trend.</summary>
    public required ExponentialTrend Trend { get; init; }

    /// <summary>Its parameters.</summary>
    public required IReadOnlyList<TrendParameter> Parameters { get; init; }

    /// <summary>Number of shale samples it was fitted to; zero when every parameter was given.</summary>
    public int Samples { get; init; }

    /// <summary>How many independent samples those are worth.</summary>
    public double Effective { get; init; }

    /// <summary>Standard deviation of the residuals, SI; of the natural logarithm for resistivity.</summary>
    public double Scatter { get; init; }

    /// <summary>True vertical depth of the first shale sample, m.</summary>
    public double Top { get; init; }

    /// <summary>True vertical depth of the last shale sample, m.</summary>
    public double Base { get; init; }

    /// <summary>The zone it belongs to, where one has its own; else -1.</summary>
    public short Zone { get; init; } = -1;
}

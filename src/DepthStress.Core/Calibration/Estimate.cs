namespace DepthStress.Core.Calibration;

/// <summary>An estimated parameter with its uncertainty, in SI.</summary>
/// <param name="Value">The estimate.</param>
/// <param name="StandardError">Its standard error; NaN where a bound is active and none is valid.</param>
/// <param name="Low">Lower end of the 95 % interval.</param>
/// <param name="High">Upper end of the 95 % interval.</param>
/// <param name="Start">The value before.</param>
public sealed record Estimate(double Value, double StandardError, double Low, double High, double Start)
{
    /// <summary>True when it was held or lies at a bound, so that the interval is not symmetric.</summary>
    public bool AtBound { get; init; }

    /// <summary>True when it was not estimated but kept, as the user chose.</summary>
    public bool Held { get; init; }
}

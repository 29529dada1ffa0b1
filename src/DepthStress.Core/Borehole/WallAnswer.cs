namespace DepthStress.Core.Borehole;

/// <summary>A number, or why there is none.</summary>
/// <param name="Value">The number in SI; NaN when there is none.</param>
/// <param name="Reason">Why there is none, in plain words; null when there is one.</param>
public readonly record struct WallAnswer(double Value, string? Reason)
{
    /// <summary>True when there is a number.</summary>
    public bool IsKnown => Reason is null;

    /// <summary>A number.</summary>
    public static WallAnswer Of(double value) => double.IsFinite(value) ? new(value, null) : None("an input is missing");

    /// <summary>No number.</summary>
    public static WallAnswer None(string reason) => new(double.NaN, reason);
}

namespace DepthStress.Core.Layers;

/// <summary>How thick a layer may be, m. A layer of a single cell may be thicker: it cannot be cut.</summary>
/// <param name="Least">The least thickness; 0 when there is none.</param>
/// <param name="Most">The greatest thickness; infinite when there is none.</param>
public readonly record struct ThicknessLimits(double Least, double Most)
{
    /// <summary>Room for rounding when a thickness is compared with a limit.</summary>
    private const double Slack = 1e-9;

    /// <summary>Anything goes.</summary>
    public static ThicknessLimits None { get; } = new(0, double.PositiveInfinity);

    /// <summary>True when a thickness is not too small.</summary>
    public bool IsThickEnough(double thickness) => thickness >= Least * (1 - Slack);

    /// <summary>True when a thickness is not too large.</summary>
    public bool IsThinEnough(double thickness) => thickness <= Most * (1 + Slack);
}

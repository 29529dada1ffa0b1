namespace DepthStress.Core.Pressure;

/// <summary>How a log changes with depth in shale that compacted normally; depth counts from the ground or mudline, m.</summary>
public abstract class NormalTrend
{
    /// <summary>What it is a trend of.</summary>
    public abstract TrendQuantity Quantity { get; }

    /// <summary>The trend at a depth, SI; NaN for NaN.</summary>
    public abstract double At(double depth);

    /// <summary>The depth at which the trend has a value, m; NaN when it has it nowhere, and for NaN.</summary>
    public abstract double DepthOf(double value);

    /// <summary>Fills the trend for every sample.</summary>
    /// <param name="tvd">True vertical depth, m.</param>
    /// <param name="solidTop">True vertical depth of the ground or mudline, m.</param>
    /// <param name="values">Gets the trend, SI.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> tvd, double solidTop, Span<double> values)
    {
        if (values.Length != tvd.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        for (var i = 0; i < tvd.Length; i++) values[i] = At(tvd[i] - solidTop);
    }
}

/// <summary>
/// An exponential in depth, <c>y = limit + (surface - limit) exp(-z / length)</c>; resistivity grows, <c>y = surface exp(z / length)</c>.
/// One over the length is the c or b of the usual notation.
/// </summary>
/// <param name="quantity">What it is a trend of.</param>
/// <param name="surface">Value at the ground or mudline, SI.</param>
/// <param name="limit">Value that great depth tends to, SI; zero for porosity, of no meaning for resistivity.</param>
/// <param name="length">Depth over which the exponential changes by a factor e, m.</param>
public sealed class ExponentialTrend(TrendQuantity quantity, double surface, double limit, double length) : NormalTrend
{
    private readonly double _rate = (quantity == TrendQuantity.Resistivity ? 1 : -1) / length;
    private readonly double _limit = quantity == TrendQuantity.Slowness ? limit : 0;

    /// <inheritdoc/>
    public override TrendQuantity Quantity => quantity;

    /// <summary>Value at the ground or mudline, SI.</summary>
    public double Surface => surface;

    /// <summary>Value that great depth tends to, SI.</summary>
    public double Limit => _limit;

    /// <summary>Depth over which the exponential changes by a factor e, m.</summary>
    public double Length => length;

    /// <inheritdoc/>
    public override double At(double depth) => _limit + ((surface - _limit) * Math.Exp(_rate * depth));

    /// <inheritdoc/>
    public override double DepthOf(double value) => Math.Log((value - _limit) / (surface - _limit)) / _rate;
}

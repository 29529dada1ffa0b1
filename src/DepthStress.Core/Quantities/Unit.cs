namespace DepthStress.Core.Quantities;

/// <summary>
/// A unit of measure: <c>SI = value * Factor + Offset</c>.
/// </summary>
/// <param name="Symbol">The spelling this program writes.</param>
/// <param name="Dimension">What it measures.</param>
/// <param name="Factor">SI units in one of this unit.</param>
/// <param name="Suffix">The unit as part of a column name, such as <c>g_cm3</c>.</param>
/// <param name="Offset">SI value at zero of this unit (temperatures only).</param>
/// <param name="Aliases">Other spellings that are read, compared without regard to case.</param>
public sealed record Unit(
    string Symbol, Dimension Dimension, double Factor, string Suffix, double Offset = 0, params string[] Aliases)
{
    /// <summary>Converts a value in this unit to SI.</summary>
    public double ToSi(double value) => (value * Factor) + Offset;

    /// <summary>Converts an SI value to this unit.</summary>
    public double FromSi(double value) => (value - Offset) / Factor;

    /// <summary>Converts values in this unit to SI, in place.</summary>
    public void ToSi(Span<double> values)
    {
        for (var i = 0; i < values.Length; i++) values[i] = (values[i] * Factor) + Offset;
    }

    /// <summary>Converts SI values to this unit, in place.</summary>
    public void FromSi(Span<double> values)
    {
        for (var i = 0; i < values.Length; i++) values[i] = (values[i] - Offset) / Factor;
    }

    /// <inheritdoc/>
    public override string ToString() => Symbol;
}

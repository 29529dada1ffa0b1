namespace DepthStress.Core.Quantities;

/// <summary>A value in SI that a message carries, to be shown in the reader's units.</summary>
/// <param name="Si">The value in the dimension's SI unit.</param>
/// <param name="Dimension">What it measures.</param>
public readonly record struct Quantity(double Si, Dimension Dimension)
{
    /// <summary>A depth or length, m.</summary>
    public static Quantity Length(double metres) => new(metres, Dimension.Length);

    /// <summary>A pressure or stress, Pa.</summary>
    public static Quantity Pressure(double pascals) => new(pascals, Dimension.Pressure);

    /// <summary>A pressure gradient, Pa/m.</summary>
    public static Quantity Gradient(double pascalsPerMetre) => new(pascalsPerMetre, Dimension.PressureGradient);
}

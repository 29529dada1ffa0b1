using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Catalogue;

/// <summary>A closed interval of numbers; infinite ends are allowed.</summary>
/// <param name="Low">Lower end.</param>
/// <param name="High">Upper end.</param>
public readonly record struct Interval(double Low, double High)
{
    /// <summary>Every number.</summary>
    public static Interval All { get; } = new(double.NegativeInfinity, double.PositiveInfinity);

    /// <summary>Every number that is not negative.</summary>
    public static Interval NotNegative { get; } = new(0, double.PositiveInfinity);

    /// <summary>The values a property can have at all, in SI.</summary>
    public static Interval Physical(Property property) => property switch
    {
        Property.Biot or Property.Porosity or Property.ShaleVolume => new(0, 1),
        // The ends are left out: at one the shear modulus is infinite, at the other the bulk modulus.
        Property.PoissonStatic or Property.PoissonDynamic => new(Math.BitIncrement(-1.0), Math.BitDecrement(0.5)),
        Property.CrossStiffness => All,
        _ => NotNegative,
    };

    /// <summary>An interval given in SI, in a unit.</summary>
    public Interval In(Unit unit)
    {
        ArgumentNullException.ThrowIfNull(unit);
        return new(unit.FromSi(Low), unit.FromSi(High));
    }

    /// <summary>True when the value lies inside, ends included; false for NaN.</summary>
    public bool Contains(double value) => value >= Low && value <= High;
}

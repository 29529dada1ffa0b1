using System.Globalization;

namespace DepthStress.Core.Quantities;

/// <summary>The units results are shown in.</summary>
public enum UnitSystem
{
    /// <summary>m, MPa, GPa, kPa/m, g/cm3.</summary>
    Metric,

    /// <summary>ft, psi, Mpsi, psi/ft, lb/gal.</summary>
    Field,
}

/// <summary>Shows quantities in a unit system.</summary>
public static class UnitSystems
{
    /// <summary>The unit messages use for a dimension, and its decimals.</summary>
    public static (Unit Unit, int Decimals) UnitFor(this UnitSystem system, Dimension dimension) => (dimension, system) switch
    {
        (Dimension.Length, UnitSystem.Metric) => (Units.Metre, 1),
        (Dimension.Length, _) => (Units.Foot, 1),
        (Dimension.Pressure, UnitSystem.Metric) => (Units.Megapascal, 2),
        (Dimension.Pressure, _) => (Units.Psi, 0),
        (Dimension.PressureGradient, UnitSystem.Metric) => (Units.KilopascalPerMetre, 2),
        (Dimension.PressureGradient, _) => (Units.PsiPerFoot, 3),
        (Dimension.Velocity, UnitSystem.Metric) => (Units.MetrePerSecond, 0),
        (Dimension.Velocity, _) => (Units.FootPerSecond, 0),
        (Dimension.Slowness, _) => (Units.MicrosecondPerFoot, 1),
        (Dimension.Density, _) => (Units.GramPerCubicCentimetre, 3),
        (Dimension.GammaRay, _) => (Units.GammaApi, 0),
        (Dimension.Angle, _) => (Units.Degree, 1),
        (Dimension.Strain, _) => (Units.Microstrain, 0),
        (Dimension.Fraction, _) => (Units.Fraction, 3),
        (Dimension.Temperature, UnitSystem.Metric) => (Units.Celsius, 1),
        (Dimension.Temperature, _) => (Units.Fahrenheit, 1),
        _ => (Units.Of(dimension).First(), 4),
    };

    /// <summary>A quantity as text with its unit.</summary>
    public static string Show(this UnitSystem system, Quantity quantity)
    {
        var (unit, decimals) = system.UnitFor(quantity.Dimension);
        var number = unit.FromSi(quantity.Si).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return unit.Symbol.Length == 0 ? number : number + " " + unit.Symbol;
    }

    /// <summary>A message as text, every <see cref="Quantity"/> in it shown in this system's units.</summary>
    public static string Show(this UnitSystem system, FormattableString message)
    {
        ArgumentNullException.ThrowIfNull(message);
        var arguments = Array.ConvertAll(message.GetArguments(), a => a switch
        {
            Quantity q => system.Show(q),
            FormattableString inner => system.Show(inner),
            _ => a,
        });
        return string.Format(CultureInfo.InvariantCulture, message.Format, arguments);
    }
}

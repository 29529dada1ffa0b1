using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>The units and decimals of result columns, metric and field, once.</summary>
public static class ColumnUnits
{
    /// <summary>Depths and thicknesses.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Depths { get; } = (new(Units.Metre, 4), new(Units.Foot, 4));

    /// <summary>Velocities.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Velocities { get; } = (new(Units.MetrePerSecond, 1), new(Units.FootPerSecond, 1));

    /// <summary>Slownesses, as logs print them everywhere.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Slownesses { get; } =
        (new(Units.MicrosecondPerFoot, 3), new(Units.MicrosecondPerFoot, 3));

    /// <summary>Rock densities.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Densities { get; } =
        (new(Units.GramPerCubicCentimetre, 4), new(Units.GramPerCubicCentimetre, 4));

    /// <summary>Equivalent mud densities.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) MudDensities { get; } =
        (new(Units.GramPerCubicCentimetre, 3), new(Units.PoundPerGallon, 2));

    /// <summary>Fractions of volume.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Fractions { get; } = (new(Units.Fraction, 4), new(Units.Fraction, 4));

    /// <summary>Resistivities.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Resistivities { get; } = (new(Units.OhmMetre, 4), new(Units.OhmMetre, 4));

    /// <summary>Pure numbers.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Numbers { get; } = (new(Units.One, 5), new(Units.One, 5));

    /// <summary>Counts.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Counts { get; } = (new(Units.One, 0), new(Units.One, 0));

    /// <summary>Elastic moduli.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Moduli { get; } = (new(Units.Gigapascal, 4), new(Units.Mpsi, 5));

    /// <summary>Stresses, pressures and strengths.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Stresses { get; } = (new(Units.Megapascal, 4), new(Units.Psi, 1));

    /// <summary>Fracture toughness.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Toughnesses { get; } = (new(Units.MegapascalRootMetre, 4), new(Units.PsiRootInch, 1));

    /// <summary>Pressure gradients.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Gradients { get; } = (new(Units.KilopascalPerMetre, 4), new(Units.PsiPerFoot, 5));

    /// <summary>Temperatures.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Temperatures { get; } = (new(Units.Celsius, 2), new(Units.Fahrenheit, 2));

    /// <summary>Angles.</summary>
    public static (ColumnUnit Metric, ColumnUnit Field) Angles { get; } = (new(Units.Degree, 3), new(Units.Degree, 3));
}

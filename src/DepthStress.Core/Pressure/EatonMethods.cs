using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Eaton's pore pressure of shale from how far a log lies off its normal trend.</summary>
public static class EatonMethods
{
    /// <summary>Eaton's relation for sonic slowness.</summary>
    public static Law Sonic { get; } = new()
    {
        Id = "eaton-1975-sonic",
        Title = "Eaton's pore pressure from sonic slowness against a normal trend",
        Predicts = Property.PorePressure,
        Unit = Units.Megapascal,
        Rocks = RockKinds.Shale,
        Inputs =
        [
            new("S", Property.VerticalStress, Units.Megapascal, Interval.NotNegative, Interval.All),
            new("Pn", Property.NormalPressure, Units.Megapascal, Interval.NotNegative, Interval.All),
            new("dt_n", Property.NormalSlowness, Units.MicrosecondPerFoot, Interval.NotNegative, Interval.All),
            new("dt", Property.CompressionalSlowness, Units.MicrosecondPerFoot, Interval.NotNegative, Interval.All),
        ],
        Coefficients = [new("n", 3)],
        Template = "Pp = S - (S - Pn) (dt_n / dt)^{n}",
        Formula = (x, c) => x[0] - ((x[0] - x[1]) * Math.Pow(x[2] / x[3], c[0])),
        ResultDomain = Interval.NotNegative,
        Validity = "shale; rock slower than its trend is overpressured; the exponent may be changed in the well file",
        Source = "Eaton 1975, The equation for geopressure prediction from well logs, SPE 5544; the form as in drilling handbooks (one sheet in circulation prints the ratio upside down)",
        Standing = Standing.Confirmed,
        Example = new([93.0792, 43.2818, 83.33333, 100], 64.2613, 6, ExampleBasis.SelfComputed, "13,500 ft, 10,000 ft/s where 12,000 ft/s is normal, 1.0 and 0.465 psi/ft"),
    };

    /// <summary>Eaton's relation for resistivity.</summary>
    public static Law Resistivity { get; } = new()
    {
        Id = "eaton-1975-resistivity",
        Title = "Eaton's pore pressure from resistivity against a normal trend",
        Predicts = Property.PorePressure,
        Unit = Units.Megapascal,
        Rocks = RockKinds.Shale,
        Inputs =
        [
            new("S", Property.VerticalStress, Units.Megapascal, Interval.NotNegative, Interval.All),
            new("Pn", Property.NormalPressure, Units.Megapascal, Interval.NotNegative, Interval.All),
            new("R_n", Property.NormalResistivity, Units.OhmMetre, new(double.Epsilon, double.PositiveInfinity), Interval.All),
            new("R", Property.DeepResistivity, Units.OhmMetre, new(double.Epsilon, double.PositiveInfinity), Interval.All),
        ],
        Coefficients = [new("n", 1.2)],
        Template = "Pp = S - (S - Pn) (R / R_n)^{n}",
        Formula = (x, c) => x[0] - ((x[0] - x[1]) * Math.Pow(x[3] / x[2], c[0])),
        ResultDomain = Interval.NotNegative,
        Validity = "shale; rock less resistive than its trend is overpressured; the exponent may be changed in the well file, some fields use 0.6 (from memory)",
        Source = "Eaton 1975, The equation for geopressure prediction from well logs, SPE 5544; form and exponent read in drilling handbooks",
        Standing = Standing.Confirmed,
        Example = new([70, 30, 2, 1], 52.5890, 6, ExampleBasis.SelfComputed, "the formula as written"),
    };
}

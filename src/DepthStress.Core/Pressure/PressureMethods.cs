using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Catalogue entries that give pore pressure.</summary>
public static class PressureMethods
{
    /// <summary>Eaton's relation for sonic slowness.</summary>
    public static Law EatonSonic { get; } = new()
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

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } = [EatonSonic];
}

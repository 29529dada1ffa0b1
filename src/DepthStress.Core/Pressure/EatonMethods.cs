using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Eaton's pore pressure of shale from how far a log lies off its normal trend.</summary>
public static class EatonMethods
{
    /// <summary>Eaton's relation for sonic slowness.</summary>
    public static Law Sonic { get; } = PressureEntry.Of(
        "eaton-1975-sonic", "Eaton's pore pressure from sonic slowness against a normal trend",
        [
            PressureEntry.Stress, PressureEntry.Normal,
            new("dt_n", Property.NormalSlowness, Units.MicrosecondPerFoot, Interval.NotNegative, Interval.All),
            new("dt", Property.CompressionalSlowness, Units.MicrosecondPerFoot, Interval.NotNegative, Interval.All),
        ],
        [new("n", 3)], "S - (S - Pn) (dt_n / dt)^{n}",
        (x, c) => x[0] - ((x[0] - x[1]) * Math.Pow(x[2] / x[3], c[0])),
        "shale; rock slower than its trend is overpressured; the exponent may be changed in the well file",
        "Eaton 1975, The equation for geopressure prediction from well logs, SPE 5544; the form as in drilling handbooks (one sheet in circulation prints the ratio upside down)", Standing.Confirmed,
        new([93.0792, 43.2818, 83.33333, 100], 64.2613, 6, ExampleBasis.SelfComputed, "13,500 ft, 10,000 ft/s where 12,000 ft/s is normal, 1.0 and 0.465 psi/ft"));

    /// <summary>Eaton's relation for resistivity.</summary>
    public static Law Resistivity { get; } = PressureEntry.Of(
        "eaton-1975-resistivity", "Eaton's pore pressure from resistivity against a normal trend",
        [
            PressureEntry.Stress, PressureEntry.Normal,
            new("R_n", Property.NormalResistivity, Units.OhmMetre, PressureEntry.Positive, Interval.All),
            new("R", Property.DeepResistivity, Units.OhmMetre, PressureEntry.Positive, Interval.All),
        ],
        [new("n", 1.2)], "S - (S - Pn) (R / R_n)^{n}",
        (x, c) => x[0] - ((x[0] - x[1]) * Math.Pow(x[3] / x[2], c[0])),
        "shale; rock less resistive than its trend is overpressured; the exponent may be changed in the well file, some fields use 0.6 (from memory)",
        "Eaton 1975, The equation for geopressure prediction from well logs, SPE 5544; form and exponent read in drilling handbooks", Standing.Confirmed,
        new([70, 30, 2, 1], 52.5890, 6, ExampleBasis.SelfComputed, "the formula as written"));
}

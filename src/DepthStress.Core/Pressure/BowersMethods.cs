using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Bowers's pore pressure from velocity and effective stress. A, B, U and the velocity where unloading began belong to a basin and
/// have no default.
/// </summary>
public static class BowersMethods
{
    private const string Citation =
        "Bowers 1995, Pore pressure estimation from velocity data, SPE Drilling and Completion 10(2), 89-95; read in Rezaee (ed.) 2015, Fundamentals of Gas Shale Reservoirs, p. 150, ";

    private static readonly LawInput Stress = PressureEntry.Stress with { Unit = Units.Psi };

    private static readonly LawInput Velocity = new("V", Property.Vp, Units.FootPerSecond, new(Math.BitIncrement(5000.0), double.PositiveInfinity), Interval.All);

    private static readonly LawInput Factor = new("A", Property.BowersFactor, Units.One, PressureEntry.Positive, Interval.All);

    private static readonly LawInput Exponent = new("B", Property.BowersExponent, Units.One, PressureEntry.Positive, Interval.All);

    /// <summary>Loading: velocity on the virgin curve.</summary>
    public static Law Loading { get; } = PressureEntry.Of(
        "bowers-1995-loading", "Bowers's pore pressure from velocity, on loading",
        [Stress, Velocity, Factor, Exponent],
        [new("V0", 5000, "ft/s")], "S - ((V - {V0}) / A)^(1/B)",
        (x, c) => x[0] - Math.Pow((x[1] - c[0]) / x[2], 1 / x[3]),
        "shale on its loading curve, faster than 5000 ft/s; A in ft/s/psi^B; usual A 10 to 20, B 0.7 to 0.75 (from memory)",
        Citation + "eq. 7.15, solved for the pressure", Standing.Confirmed,
        new([10000, 9000, 4.4567, 0.8168], 5875.369, 7, ExampleBasis.SelfComputed, "9000 ft/s at 10,000 psi"));

    /// <summary>Unloading: velocity below the one at which unloading began.</summary>
    public static Law Unloading { get; } = PressureEntry.Of(
        "bowers-1995-unloading", "Bowers's pore pressure from velocity, on unloading",
        [
            Stress, Velocity, Factor, Exponent,
            new("U", Property.BowersUnloading, Units.One, new(1, double.PositiveInfinity), Interval.All),
            new("V_max", Property.BowersMaxVelocity, Units.FootPerSecond, new(Math.BitIncrement(5000.0), double.PositiveInfinity), Interval.All),
        ],
        [new("V0", 5000, "ft/s")], "S - s_max (s / s_max)^U, s = ((V - {V0}) / A)^(1/B), s_max = ((V_max - {V0}) / A)^(1/B)",
        static (x, c) =>
        {
            if (x[1] > x[5]) return double.NaN;
            var greatest = Math.Pow((x[5] - c[0]) / x[2], 1 / x[3]);
            return x[0] - (greatest * Math.Pow(Math.Pow((x[1] - c[0]) / x[2], 1 / x[3]) / greatest, x[4]));
        },
        "shale that was unloaded, between 5000 ft/s and V_max; A in ft/s/psi^B; usual U 3 to 8 (from memory)",
        Citation + "eq. 7.16, solved for the pressure", Standing.Confirmed,
        new([12000, 9000, 4.4567, 0.8168, 3.13, 10500], 10202.255, 8, ExampleBasis.SelfComputed, "9000 ft/s at 12,000 psi, unloaded from 10,500 ft/s"));
}

using static DepthStress.Core.Quantities.Constants;

namespace DepthStress.Core.Quantities;

/// <summary>The unit table: every unit the program reads or writes, once.</summary>
public static class Units
{
    /// <summary>Pure number.</summary>
    public static readonly Unit One = new("", Dimension.None, 1, "", 0, "1", "unitless", "none", "_");

    /// <summary>Metre.</summary>
    public static readonly Unit Metre = new("m", Dimension.Length, 1, "m", 0, "metre", "metres", "meter", "meters");

    /// <summary>Foot.</summary>
    public static readonly Unit Foot = new("ft", Dimension.Length, Constants.Foot, "ft", 0, "f", "feet", "foot");

    /// <summary>Inch.</summary>
    public static readonly Unit Inch = new("in", Dimension.Length, Constants.Inch, "in", 0, "inch", "inches", "\"");

    /// <summary>Millimetre.</summary>
    public static readonly Unit Millimetre = new("mm", Dimension.Length, 1e-3, "mm", 0, "millimetre", "millimeter");

    /// <summary>Centimetre.</summary>
    public static readonly Unit Centimetre = new("cm", Dimension.Length, 1e-2, "cm");

    /// <summary>Microsecond per foot.</summary>
    public static readonly Unit MicrosecondPerFoot = new(
        "us/ft", Dimension.Slowness, 1e-6 / Constants.Foot, "us_ft", 0, "us/f", "usec/ft", "usec/f", "\u00b5s/ft", "\u03bcs/ft");

    /// <summary>Microsecond per metre.</summary>
    public static readonly Unit MicrosecondPerMetre = new(
        "us/m", Dimension.Slowness, 1e-6, "us_m", 0, "usec/m", "\u00b5s/m", "\u03bcs/m");

    /// <summary>Metre per second.</summary>
    public static readonly Unit MetrePerSecond = new("m/s", Dimension.Velocity, 1, "m_s", 0, "m/sec");

    /// <summary>Kilometre per second.</summary>
    public static readonly Unit KilometrePerSecond = new("km/s", Dimension.Velocity, 1e3, "km_s", 0, "km/sec");

    /// <summary>Foot per second.</summary>
    public static readonly Unit FootPerSecond = new("ft/s", Dimension.Velocity, Constants.Foot, "ft_s", 0, "ft/sec", "f/s");

    /// <summary>Gram per cubic centimetre.</summary>
    public static readonly Unit GramPerCubicCentimetre = new(
        "g/cm3", Dimension.Density, 1e3, "g_cm3", 0, "g/cc", "gm/cc", "g/c3", "gm/c3", "g/cm\u00b3", "gcm3", "gm/cm3");

    /// <summary>Kilogram per cubic metre.</summary>
    public static readonly Unit KilogramPerCubicMetre = new(
        "kg/m3", Dimension.Density, 1, "kg_m3", 0, "k/m3", "kg/m\u00b3", "kgm3");

    /// <summary>Pound per cubic foot.</summary>
    public static readonly Unit PoundPerCubicFoot = new(
        "lb/ft3", Dimension.Density, Pound / (Constants.Foot * Constants.Foot * Constants.Foot), "lb_ft3", 0, "lbm/ft3", "lb/f3", "pcf");

    /// <summary>Pound per US gallon.</summary>
    public static readonly Unit PoundPerGallon = new(
        "lb/gal", Dimension.Density, Pound / Gallon, "lb_gal", 0, "ppg", "lbm/gal", "lb/gl");

    /// <summary>Specific gravity, counted from 1000 kg/m3.</summary>
    public static readonly Unit SpecificGravity = new("sg", Dimension.Density, ReferenceWaterDensity, "sg", 0, "s.g.");

    /// <summary>Pascal.</summary>
    public static readonly Unit Pascal = new("Pa", Dimension.Pressure, 1, "pa");

    /// <summary>Kilopascal.</summary>
    public static readonly Unit Kilopascal = new("kPa", Dimension.Pressure, 1e3, "kpa");

    /// <summary>Megapascal.</summary>
    public static readonly Unit Megapascal = new("MPa", Dimension.Pressure, 1e6, "mpa");

    /// <summary>Gigapascal.</summary>
    public static readonly Unit Gigapascal = new("GPa", Dimension.Pressure, 1e9, "gpa");

    /// <summary>Bar.</summary>
    public static readonly Unit Bar = new("bar", Dimension.Pressure, 1e5, "bar", 0, "bars");

    /// <summary>Pound-force per square inch.</summary>
    public static readonly Unit Psi = new("psi", Dimension.Pressure, Constants.Psi, "psi", 0, "lbf/in2", "psia");

    /// <summary>Thousand psi.</summary>
    public static readonly Unit Ksi = new("ksi", Dimension.Pressure, Constants.Psi * 1e3, "ksi", 0, "kpsi");

    /// <summary>Million psi.</summary>
    public static readonly Unit Mpsi = new("Mpsi", Dimension.Pressure, Constants.Psi * 1e6, "mpsi", 0, "mmpsi");

    /// <summary>Psi per foot.</summary>
    public static readonly Unit PsiPerFoot = new(
        "psi/ft", Dimension.PressureGradient, Constants.Psi / Constants.Foot, "psi_ft", 0, "psi/f");

    /// <summary>Kilopascal per metre.</summary>
    public static readonly Unit KilopascalPerMetre = new("kPa/m", Dimension.PressureGradient, 1e3, "kpa_m");

    /// <summary>Megapascal per kilometre.</summary>
    public static readonly Unit MegapascalPerKilometre = new("MPa/km", Dimension.PressureGradient, 1e3, "mpa_km");

    /// <summary>Bar per metre.</summary>
    public static readonly Unit BarPerMetre = new("bar/m", Dimension.PressureGradient, 1e5, "bar_m");

    /// <summary>Gamma-ray unit of the American Petroleum Institute.</summary>
    public static readonly Unit GammaApi = new("gAPI", Dimension.GammaRay, 1, "gapi", 0, "api", "gr api");

    /// <summary>Barn per electron.</summary>
    public static readonly Unit BarnPerElectron = new("b/e", Dimension.Photoelectric, 1, "b_e", 0, "barn/e", "b/elec");

    /// <summary>Ohm metre.</summary>
    public static readonly Unit OhmMetre = new("ohm.m", Dimension.Resistivity, 1, "ohm_m", 0, "ohmm", "ohm-m", "ohm m");

    /// <summary>Degree Celsius.</summary>
    public static readonly Unit Celsius = new("degC", Dimension.Temperature, 1, "degc", CelsiusZero, "c", "\u00b0c", "deg c");

    /// <summary>Degree Fahrenheit.</summary>
    public static readonly Unit Fahrenheit = new(
        "degF", Dimension.Temperature, 5.0 / 9, "degf", CelsiusZero - (32 * 5.0 / 9), "f", "\u00b0f", "deg f");

    /// <summary>Kelvin.</summary>
    public static readonly Unit Kelvin = new("K", Dimension.Temperature, 1, "k", 0, "kelvin", "degK");

    /// <summary>Degree Celsius per 100 m.</summary>
    public static readonly Unit CelsiusPer100Metre = new("degC/100m", Dimension.TemperatureGradient, 1.0 / 100, "degc_100m");

    /// <summary>Degree Fahrenheit per 100 ft.</summary>
    public static readonly Unit FahrenheitPer100Foot = new(
        "degF/100ft", Dimension.TemperatureGradient, 5.0 / 9 / (100 * Constants.Foot), "degf_100ft");

    /// <summary>Volume per volume.</summary>
    public static readonly Unit Fraction = new(
        "v/v", Dimension.Fraction, 1, "", 0, "m3/m3", "ft3/ft3", "frac", "fraction", "dec", "decp", "v/v_decimal", "1", "_", "unitless");

    /// <summary>Percent.</summary>
    public static readonly Unit Percent = new("%", Dimension.Fraction, 1.0 / 100, "percent", 0, "pct", "percent");

    /// <summary>Porosity unit, one percent of the bulk volume.</summary>
    public static readonly Unit PorosityUnit = new("pu", Dimension.Fraction, 1.0 / 100, "pu", 0, "p.u.");

    /// <summary>Degree of angle.</summary>
    public static readonly Unit Degree = new("deg", Dimension.Angle, Math.PI / 180, "deg", 0, "dega", "degree", "degrees", "\u00b0");

    /// <summary>Radian.</summary>
    public static readonly Unit Radian = new("rad", Dimension.Angle, 1, "rad", 0, "radian", "radians");

    /// <summary>Millidarcy.</summary>
    public static readonly Unit Millidarcy = new("mD", Dimension.Permeability, Constants.Millidarcy, "md");

    /// <summary>Megapascal root metre.</summary>
    public static readonly Unit MegapascalRootMetre = new("MPa.m0.5", Dimension.Toughness, 1e6, "mpa_m05");

    /// <summary>Psi root inch; the root of the exact inch, 0.0254 m.</summary>
    public static readonly Unit PsiRootInch = new(
        "psi.in0.5", Dimension.Toughness, Constants.Psi * Math.Sqrt(Constants.Inch), "psi_in05");

    /// <summary>One millionth of strain.</summary>
    public static readonly Unit Microstrain = new(
        "microstrain", Dimension.Strain, 1e-6, "microstrain", 0, "ustrain", "\u00b5strain", "\u03bcstrain");

    /// <summary>Strain as a plain ratio.</summary>
    public static readonly Unit Strain = new("m/m", Dimension.Strain, 1, "m_m", 0, "strain");

    /// <summary>Linear expansion per kelvin, which is per degree Celsius.</summary>
    public static readonly Unit PerKelvin = new("1/K", Dimension.ThermalExpansion, 1, "per_k", 0, "/K", "1/degC", "/degC", "1/C");

    /// <summary>Linear expansion per degree Fahrenheit.</summary>
    public static readonly Unit PerFahrenheit = new("1/degF", Dimension.ThermalExpansion, 9.0 / 5, "per_degf", 0, "/degF", "1/F");

    /// <summary>Every unit, in the order messages list them.</summary>
    public static IReadOnlyList<Unit> All { get; } =
    [
        One, Metre, Foot, Inch, Millimetre, Centimetre, MicrosecondPerFoot, MicrosecondPerMetre, MetrePerSecond,
        KilometrePerSecond, FootPerSecond, GramPerCubicCentimetre, KilogramPerCubicMetre, PoundPerCubicFoot,
        PoundPerGallon, SpecificGravity, Megapascal, Gigapascal, Kilopascal, Pascal, Bar, Psi, Ksi, Mpsi,
        KilopascalPerMetre, MegapascalPerKilometre, PsiPerFoot, BarPerMetre, GammaApi, BarnPerElectron, OhmMetre,
        Celsius, Fahrenheit, Kelvin, CelsiusPer100Metre, FahrenheitPer100Foot, Fraction, Percent, PorosityUnit, Degree,
        Radian, Millidarcy, MegapascalRootMetre, PsiRootInch, Microstrain, Strain, PerKelvin, PerFahrenheit,
    ];

    /// <summary>The units of a dimension, in table order.</summary>
    public static IEnumerable<Unit> Of(Dimension dimension) => All.Where(u => u.Dimension == dimension);

    /// <summary>The symbols of the units that measure one of the dimensions, for messages: <c>m, ft, in</c>.</summary>
    public static string Symbols(params ReadOnlySpan<Dimension> dimensions)
    {
        var symbols = new List<string>();
        foreach (var dimension in dimensions) symbols.AddRange(Of(dimension).Select(u => u.Symbol).Where(s => s.Length > 0));
        return string.Join(", ", symbols);
    }

    /// <summary>
    /// Finds a unit by its spelling among those of the wanted dimensions: the exact symbol first, then any spelling
    /// without regard to case. Null when none fits.
    /// </summary>
    public static Unit? Find(string spelling, params ReadOnlySpan<Dimension> dimensions)
    {
        ArgumentNullException.ThrowIfNull(spelling);
        spelling = spelling.Trim();
        foreach (var dimension in dimensions)
        {
            if (Of(dimension).FirstOrDefault(u => u.Symbol == spelling) is { } exact) return exact;
        }

        foreach (var dimension in dimensions)
        {
            if (Of(dimension).FirstOrDefault(u => u.IsSpelled(spelling)) is { } loose) return loose;
        }

        return null;
    }

    /// <summary>Finds a unit of any dimension by its spelling: the exact symbol first, then any spelling without regard to case.</summary>
    public static Unit? Find(string spelling)
    {
        ArgumentNullException.ThrowIfNull(spelling);
        spelling = spelling.Trim();
        return All.FirstOrDefault(u => u.Symbol == spelling) ?? All.FirstOrDefault(u => u.IsSpelled(spelling));
    }

    private static bool IsSpelled(this Unit unit, string spelling) =>
        unit.Symbol.Equals(spelling, StringComparison.OrdinalIgnoreCase)
        || unit.Aliases.Contains(spelling, StringComparer.OrdinalIgnoreCase);
}

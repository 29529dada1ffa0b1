using System.Globalization;

namespace DepthStress.Core.Quantities;

/// <summary>Reads quantities such as <c>8.6 lb/gal</c>: a decimal number, blanks, a unit symbol.</summary>
public static class QuantityText
{
    private static readonly NumberFormatInfo Format = new() { NumberGroupSeparator = "" };

    /// <summary>
    /// Reads a quantity of one of the wanted dimensions and gives it in SI.
    /// </summary>
    /// <param name="text">The text, such as <c>312.4 m</c>.</param>
    /// <param name="dimensions">The dimensions that fit.</param>
    /// <param name="si">The value in SI units, NaN on failure.</param>
    /// <param name="unit">The unit it was given in.</param>
    /// <param name="problem">On failure: what was found and which units fit; else null.</param>
    public static bool TryParse(
        string text, ReadOnlySpan<Dimension> dimensions, out double si, out Unit unit, out string? problem)
    {
        ArgumentNullException.ThrowIfNull(text);
        si = double.NaN;
        unit = Units.One;
        var trimmed = text.Trim();
        var length = NumberLength(trimmed);
        var symbol = trimmed[length..].Trim();
        var fitting = Units.Symbols(dimensions);
        if (length == 0 || !TryNumber(trimmed.AsSpan(0, length), out var value))
        {
            problem = $"found \"{text}\", expected a number{(fitting.Length == 0 ? "" : $" and a unit ({fitting})")}";
            return false;
        }

        if (symbol.StartsWith(','))
        {
            problem = $"found a comma in the number of \"{text}\", expected a decimal point and no group separators";
            return false;
        }

        if (symbol.Length == 0 && !dimensions.Contains(Dimension.None))
        {
            problem = $"found \"{text}\" without a unit, expected one of {fitting}";
            return false;
        }

        if (Units.Find(symbol, dimensions) is { } found)
        {
            var converted = found.ToSi(value);
            if (!double.IsFinite(converted))
            {
                problem = $"found \"{text}\", expected a smaller number";
                return false;
            }

            (si, unit, problem) = (converted, found, null);
            return true;
        }

        problem = Units.Find(symbol) is { } other
            ? $"found \"{text}\", {Article(Name(other.Dimension))}; expected {Article(Names(dimensions))}{(fitting.Length == 0 ? "" : $" in one of {fitting}")}"
            : $"found the unknown unit \"{symbol}\" in \"{text}\", expected {(fitting.Length == 0 ? "no unit" : $"one of {fitting}")}";
        return false;
    }

    /// <summary>
    /// Reads a fluid density, or the pressure gradient of a column of that fluid, and gives kg/m3
    /// (<c>gradient = density * 9.80665 m/s2</c>).
    /// </summary>
    public static bool TryParseFluidDensity(string text, out double si, out Unit unit, out string? problem)
    {
        if (!TryParse(text, [Dimension.Density, Dimension.PressureGradient], out si, out unit, out problem)) return false;
        if (unit.Dimension == Dimension.PressureGradient) si /= Constants.StandardGravity;
        return true;
    }

    /// <summary>Reads one decimal number with a point; group separators, decimal commas, NaN and infinities are refused.</summary>
    public static bool TryNumber(ReadOnlySpan<char> text, out double value) =>
        double.TryParse(text, NumberStyles.Float, Format, out value) && double.IsFinite(value);

    /// <summary>A dimension's name in plain words.</summary>
    public static string Name(Dimension dimension) => dimension switch
    {
        Dimension.None => "pure number",
        Dimension.PressureGradient => "pressure gradient",
        Dimension.GammaRay => "gamma-ray value",
        Dimension.Photoelectric => "photoelectric factor",
        Dimension.TemperatureGradient => "temperature gradient",
        Dimension.ThermalExpansion => "thermal expansion",
        _ => dimension.ToString().ToLowerInvariant(),
    };

    private static string Article(string name) => name[0] is 'a' or 'e' or 'i' or 'o' ? $"an {name}" : $"a {name}";

    private static string Names(ReadOnlySpan<Dimension> dimensions)
    {
        var names = new List<string>();
        foreach (var dimension in dimensions) names.Add(Name(dimension));
        return string.Join(" or ", names);
    }

    private static int NumberLength(string text)
    {
        var i = 0;
        if (i < text.Length && text[i] is '+' or '-') i++;
        var digits = i;
        while (i < text.Length && (char.IsAsciiDigit(text[i]) || text[i] == '.')) i++;
        if (i == digits) return 0;
        if (i < text.Length && text[i] is 'e' or 'E')
        {
            var j = i + 1;
            if (j < text.Length && text[j] is '+' or '-') j++;
            if (j < text.Length && char.IsAsciiDigit(text[j]))
            {
                while (j < text.Length && char.IsAsciiDigit(text[j])) j++;
                i = j;
            }
        }

        return i;
    }
}

using System.Globalization;

namespace DepthStress.Files.Writing;

/// <summary>Numbers for solvers: as many digits as give the same double back, within the room the reader has.</summary>
internal static class DeckNumber
{
    /// <summary>CalculiX reads 20 characters of a number and drops the others, the exponent first.</summary>
    public const int Room = 20;

    /// <summary>
    /// The shortest text that gives the same double back; where that needs more than <see cref="Room"/> characters, the nearest
    /// number that fits, which has 13 digits or more.
    /// </summary>
    public static string InDeck(double value)
    {
        var text = Exact(value);
        for (var digits = 16; text.Length > Room; digits--)
            text = value.ToString("E" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).Replace("E-0", "E-", StringComparison.Ordinal).Replace("E+0", "E+", StringComparison.Ordinal);
        return text;
    }

    /// <summary>The shortest text that gives the same double back; zero without a sign.</summary>
    public static string Exact(double value) => (value == 0 ? 0 : value).ToString("R", CultureInfo.InvariantCulture);
}

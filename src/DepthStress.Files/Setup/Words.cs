using System.Globalization;
using DepthStress.Core.Catalogue;

namespace DepthStress.Files.Setup;

/// <summary>Pieces of messages.</summary>
internal static class Words
{
    private const int MostCharacters = 80;

    /// <summary>Words in quotes, with commas.</summary>
    public static string Quoted(IEnumerable<string> words) => string.Join(", ", words.Select(w => $"\"{w}\""));

    /// <summary>A text that a message can hold.</summary>
    public static string Short(string text) => text.Length <= MostCharacters ? text : text[..MostCharacters] + "...";

    /// <summary>An interval in words; an end that lies a hair beside a plain number is left out.</summary>
    public static string Within(Interval interval)
    {
        var (low, high) = (Plain(interval.Low), Plain(interval.High));
        return (double.IsFinite(low), double.IsFinite(high)) switch
        {
            (true, true) when low == interval.Low && high == interval.High => string.Create(CultureInfo.InvariantCulture, $"from {low} to {high}"),
            (true, true) => string.Create(CultureInfo.InvariantCulture, $"above {low} and below {high}"),
            (true, false) => string.Create(CultureInfo.InvariantCulture, $"of {low} or more"),
            (false, true) => string.Create(CultureInfo.InvariantCulture, $"of {high} or less"),
            _ => "of any size",
        };
    }

    /// <summary>True when a text starts like a number.</summary>
    public static bool StartsNumber(string text) => text.TrimStart() is [var first, ..] && (char.IsAsciiDigit(first) || first is '+' or '-' or '.');

    private static double Plain(double end) => double.IsFinite(end) ? Math.Round(end, 12) : end;
}

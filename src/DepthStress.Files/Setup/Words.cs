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

    /// <summary>An interval in words.</summary>
    public static string Within(Interval interval) => (double.IsFinite(interval.Low), double.IsFinite(interval.High)) switch
    {
        (true, true) => string.Create(CultureInfo.InvariantCulture, $"from {interval.Low} to {interval.High}"),
        (true, false) => string.Create(CultureInfo.InvariantCulture, $"of {interval.Low} or more"),
        (false, true) => string.Create(CultureInfo.InvariantCulture, $"of {interval.High} or less"),
        _ => "of any size",
    };

    /// <summary>True when a text starts like a number.</summary>
    public static bool StartsNumber(string text) => text.TrimStart() is [var first, ..] && (char.IsAsciiDigit(first) || first is '+' or '-' or '.');
}

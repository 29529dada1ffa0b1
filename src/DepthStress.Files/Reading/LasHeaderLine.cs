namespace DepthStress.Files.Reading;

/// <summary>
/// One header line of the LAS standard (version 2.0): the mnemonic up to the first dot, the unit from there to the first
/// blank, the data up to the last colon, the description after it.
/// </summary>
internal readonly record struct LasHeaderLine(string Mnemonic, string Unit, string Data, string Description, bool HasColon)
{
    /// <summary>Splits a line; false where it has no dot.</summary>
    public static bool TryParse(string line, out LasHeaderLine parts)
    {
        parts = default;
        var dot = line.IndexOf('.', StringComparison.Ordinal);
        if (dot < 0) return false;
        var colon = line.LastIndexOf(':');
        var hasColon = colon > dot;
        var end = hasColon ? colon : line.Length;
        var blank = line.AsSpan(dot, end - dot).IndexOfAny(' ', '\t');
        var unitEnd = blank < 0 ? end : dot + blank;
        parts = new LasHeaderLine(
            TextCleaner.Clean(line[..dot]),
            TextCleaner.Clean(line[(dot + 1)..unitEnd]),
            TextCleaner.Clean(line[unitEnd..end]),
            hasColon ? TextCleaner.Clean(line[(colon + 1)..]) : "",
            hasColon);
        return true;
    }
}

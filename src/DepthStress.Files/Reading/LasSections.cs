namespace DepthStress.Files.Reading;

/// <summary>What the title of a section says of its content.</summary>
internal static class LasSections
{
    private static readonly string[] OtherData = ["CORE", "PERF", "ANALY", "CASING", "COMPLETION"];

    /// <summary>
    /// The letter of a section of the standard (V, W, C, P, O or A), or a blank for any other. Up to version 2.0 the letter
    /// behind the tilde decides, except for the data sections of other things than logs that version 3.0 brought; in
    /// version 3.0 the word decides.
    /// </summary>
    public static char Kind(string title, double version)
    {
        var text = title.AsSpan(1).TrimStart();
        var end = text.IndexOfAny(" \t|[:");
        var word = (end < 0 ? text : text[..end]).ToString().ToUpperInvariant();
        switch (word)
        {
            case "":
                return ' ';
            case "LOG_DEFINITION":
                return 'C';
            case "LOG_DATA":
                return 'A';
            case "LOG_PARAMETER" or "LOG_PARAMETERS":
                return 'P';
            default:
                break;
        }

        if (version >= 3 ? !IsCommon(word) : IsOther(word)) return ' ';
        return "VWCPOA".Contains(word[0], StringComparison.Ordinal) ? word[0] : ' ';
    }

    private static bool IsCommon(string word) =>
        word.Length == 1 || word.StartsWith("VERS", StringComparison.Ordinal) || word.StartsWith("WELL", StringComparison.Ordinal)
        || word.StartsWith("CURV", StringComparison.Ordinal) || word.StartsWith("ASCII", StringComparison.Ordinal)
        || word is "PARAMETER" or "PARAMETERS" or "OTHER";

    private static bool IsOther(string word) =>
        Array.Exists(OtherData, o => word.StartsWith(o, StringComparison.Ordinal))
        || word.EndsWith("_DATA", StringComparison.Ordinal) || word.EndsWith("_DEFINITION", StringComparison.Ordinal);
}

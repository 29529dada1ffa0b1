namespace DepthStress.Files.Reading;

/// <summary>How the letters of a log file are stored.</summary>
public enum LogEncoding
{
    /// <summary>UTF-8, with or without a mark.</summary>
    Utf8,

    /// <summary>UTF-16, low byte first.</summary>
    Utf16LittleEndian,

    /// <summary>UTF-16, high byte first.</summary>
    Utf16BigEndian,

    /// <summary>Code page 1252 (Western European).</summary>
    Windows1252,
}

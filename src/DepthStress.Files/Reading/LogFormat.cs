namespace DepthStress.Files.Reading;

/// <summary>The form of a log file.</summary>
public enum LogFormat
{
    /// <summary>Values separated by a delimiter or blanks, below one header row.</summary>
    Csv,

    /// <summary>Log ASCII Standard.</summary>
    Las,
}

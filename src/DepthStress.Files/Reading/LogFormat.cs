namespace DepthStress.Files.Reading;

/// <summary>The form of a log file.</summary>
public enum LogFormat
{
    /// <summary>Comma-separated values, one header row.</summary>
    Csv,

    /// <summary>Log ASCII Standard, version 2.0, unwrapped.</summary>
    Las,
}

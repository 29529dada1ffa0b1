namespace DepthStress.Core.Diagnostics;

/// <summary>How much a message matters, in rising order.</summary>
public enum Severity
{
    /// <summary>Something the reader should know; the result stands.</summary>
    Note,

    /// <summary>The result stands but may mislead; <c>--strict</c> turns it into a failure.</summary>
    Warning,

    /// <summary>The input cannot be used.</summary>
    Error,
}

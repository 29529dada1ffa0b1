namespace DepthStress.Cli;

/// <summary>What the process ends with; decided in one place.</summary>
internal static class ExitCodes
{
    /// <summary>Done; warnings are allowed.</summary>
    public const int Done = 0;

    /// <summary>Wrong usage of the command line.</summary>
    public const int Usage = 1;

    /// <summary>Input that cannot be used.</summary>
    public const int Input = 2;

    /// <summary>A fault of the program.</summary>
    public const int Fault = 3;

    /// <summary>Interrupted.</summary>
    public const int Interrupted = 130;
}

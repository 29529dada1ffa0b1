namespace DepthStress.Cli.Actions;

/// <summary>What the command <c>run</c> was asked for.</summary>
/// <param name="Out">Folder for the results, or null.</param>
/// <param name="Jobs">Wells at a time; 0 means one per core.</param>
/// <param name="Strict">True when warnings fail.</param>
/// <param name="Spread">True when every admissible choice is tried.</param>
internal sealed record RunOptions(string? Out, int Jobs, bool Strict, bool Spread);

namespace DepthStress.Core.Model;

/// <summary>What every result says about its use.</summary>
public static class Caution
{
    /// <summary>The caution, in ASCII, without a line break.</summary>
    public const string Text =
        "Estimates for planning, not a substitute for measured tests, local codes and regulations, or the judgement of a licensed engineer. "
        + "Do not set mud weight, casing or treatment pressure from this output alone.";
}

using DepthStress.Core.Quantities;

namespace DepthStress.Core.Logs;

/// <summary>What a log curve can be: its name in the well file, its units, the mnemonics the trade uses for it.</summary>
/// <param name="Id">The role's name in the well file.</param>
/// <param name="Title">The role in plain words.</param>
/// <param name="Property">Where its values go.</param>
/// <param name="Dimensions">Dimensions a column may have; velocities may come as slowness.</param>
/// <param name="TypicalLow">Lower end of credible medians, SI, of the property.</param>
/// <param name="TypicalHigh">Upper end of credible medians, SI, of the property.</param>
/// <param name="Mnemonics">Column names, most specific first; compared without case (common practice).</param>
public sealed record CurveRole(
    string Id,
    string Title,
    Property Property,
    Dimension[] Dimensions,
    double TypicalLow,
    double TypicalHigh,
    params string[] Mnemonics)
{
    /// <summary>True for a curve that tells where the hole is, not what the rock is: of several the first serves.</summary>
    public bool IsPosition => Property is Property.LoggedVerticalDepth or Property.LoggedVerticalPosition;
}

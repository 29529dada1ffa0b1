using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>How rock strength follows from the logs; a strength that is not set stays empty.</summary>
public sealed record StrengthSettings
{
    /// <summary>The relation that gives unconfined compressive strength.</summary>
    public Setting<Law> Ucs { get; init; }

    /// <summary>The relation that gives the angle of internal friction.</summary>
    public Setting<Law> FrictionAngle { get; init; }

    /// <summary>The relation that gives tensile strength.</summary>
    public Setting<Law> TensileStrength { get; init; }

    /// <summary>The relation that gives mode-I fracture toughness.</summary>
    public Setting<Law> Toughness { get; init; }

    /// <summary>The brittleness index.</summary>
    public Setting<Law> Brittleness { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public StrengthSettings Over(StrengthSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new StrengthSettings
        {
            Ucs = Ucs.Over(below.Ucs),
            FrictionAngle = FrictionAngle.Over(below.FrictionAngle),
            TensileStrength = TensileStrength.Over(below.TensileStrength),
            Toughness = Toughness.Over(below.Toughness),
            Brittleness = Brittleness.Over(below.Brittleness),
        };
    }
}

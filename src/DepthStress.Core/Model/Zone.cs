using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;

namespace DepthStress.Core.Model;

/// <summary>A named interval of the well with its own choices.</summary>
/// <param name="Name">The zone's name.</param>
/// <param name="Top">Depth of its top, m, of the stated kind.</param>
/// <param name="Base">Depth of its base, m, or null when the next top ends it.</param>
/// <param name="DepthKind">The kind of depth.</param>
/// <param name="Overrides">What the zone decides; all else comes from the well's settings.</param>
/// <param name="Position">Where the zone stands in the well file.</param>
public sealed record Zone(
    string Name, double Top, double? Base, DepthKind DepthKind, StageSettings Overrides, SourcePosition Position)
{
    /// <summary>True for a zone whose neighbours are looked at as stress barriers.</summary>
    public bool Target { get; init; }
}

/// <summary>A lithology rule with its own choices.</summary>
/// <param name="Rule">When it holds.</param>
/// <param name="Overrides">What it decides; all else comes from the zone.</param>
public sealed record LithologyChoice(LithologyRule Rule, StageSettings Overrides);

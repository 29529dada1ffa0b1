using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Stress;

/// <summary>A relation whose curve the user wants beside the model's least stress.</summary>
public sealed record ComparisonChoice
{
    /// <summary>The relation, one of <see cref="ComparisonMethods.All"/>.</summary>
    public Setting<Law> Method { get; init; }

    /// <summary>The ratio that some relations take, a number that no log gives.</summary>
    public Setting<double> Ratio { get; init; }

    /// <summary>Where the choice stands.</summary>
    public SourcePosition Position { get; init; }
}

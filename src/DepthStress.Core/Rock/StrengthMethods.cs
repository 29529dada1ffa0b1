using DepthStress.Core.Catalogue;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give unconfined compressive strength.</summary>
public static class StrengthMethods
{
    /// <summary>The entries: sandstone, coal-measure rock, shale, limestone and dolomite.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        .. SandstoneSonicStrength.All,
        .. SandstoneStrength.All,
        .. CoalMeasureStrength.All,
        .. ShaleSonicStrength.All,
        .. ShaleStrength.All,
        .. CarbonateStrength.All,
    ];
}

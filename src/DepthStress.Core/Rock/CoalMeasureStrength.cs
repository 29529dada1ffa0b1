using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of the sandstones and shales of coal measures from slowness; two of the laws are in psi.</summary>
internal static class CoalMeasureStrength
{
    private const RockKinds Clastic = RockKinds.Sandstone | RockKinds.Shale;

    private const string Oyler = "read in Oyler, Mark and Molinda 2008, 27th Int. Conf. Ground Control in Mining, 338-346";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Read("mcnally-1987-coal-measures", "McNally's strength of coal-measure rock from slowness, all data", Clastic,
            [InputOf.Slowness], "{a} exp({b} dt)", LawForms.Exponential, [143000, -0.035],
            "rock of 16 Australian mines; strength in psi; not the law for fine-grained sandstone (1200 MPa, -0.036)",
            "McNally 1987; " + Oyler, WorkedExample.Computed(12340, 5, 70)) with { Unit = Units.Psi },
        Read("oyler-2008-coal-measures", "Oyler and others' strength of coal-measure rock from slowness", Clastic,
            [InputOf.Slowness], "{a} exp({b} dt)", LawForms.Exponential, [468000, -0.054],
            "coal-measure rock of the United States, R2 0.87; strength in psi",
            Oyler, WorkedExample.Computed(10681, 5, 70)) with { Unit = Units.Psi },
        Recalled("mcnally-1987-coal-measures-mpa", "Strength of coal-measure rock from slowness, in MPa", Clastic,
            [InputOf.Slowness], "{a} exp({b} dt)", LawForms.Exponential, [1277, -0.0367],
            "seen beside McNally's laws; which data it fits is not known", "attributed to McNally 1987", WorkedExample.Computed(97.834, 5, 70)),
    ];
}

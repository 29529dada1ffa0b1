using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of limestone and dolomite.</summary>
internal static class CarbonateStrength
{
    private const RockKinds Carbonate = RockKinds.Limestone | RockKinds.Dolomite;

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Read("militzer-stoll-1973-carbonate", "Militzer and Stoll's strength of carbonate from slowness", Carbonate,
            [InputOf.Slowness], "({a} / dt)^{b} / {c}", (x, c) => Math.Pow(c[0] / x[0], c[1]) / c[2], [7682, 1.82, 145],
            "limestone and dolomite; the 145 turns psi into MPa; " + Apart, "Militzer and Stoll 1973; " + Handbook, WorkedExample.Computed(47.202, 5, 60)),
        Read("golubev-rabinovich-1976-carbonate", "Golubev and Rabinovich's strength of carbonate from slowness", Carbonate,
            [InputOf.Slowness], "10^({a} + {b} / dt) / {c}", (x, c) => Math.Pow(10, c[0] + (c[1] / x[0])) / c[2], [2.44, 109.14, 145],
            "limestone and dolomite; the 145 turns psi into MPa; " + Apart, "Golubev and Rabinovich 1976; " + Handbook, WorkedExample.Computed(125.208, 6, 60)),
        Read("limestone-modulus", "Strength of limestone from Young's modulus", RockKinds.Limestone,
            [InputOf.StaticModulus], "{a} Es^{b}", LawForms.Power, [13.8, 0.51],
            "limestone with UCS of 10 to 300 MPa; " + StaticTaken, Handbook, WorkedExample.Computed(90.559, 5, 40)),
        Read("dolomite-modulus", "Strength of dolomite from Young's modulus", RockKinds.Dolomite,
            [InputOf.StaticModulus], "{a} Es^{b}", LawForms.Power, [25.1, 0.34],
            "dolomite with UCS of 60 to 100 MPa; " + StaticTaken, Handbook, WorkedExample.Computed(100.982, 6, 60)),
        Read("rzhevsky-novik-1971-carbonate", "Rzhevsky and Novik's strength of carbonate from porosity", Carbonate,
            [InputOf.Porosity.Only(0, 1 / 3.0)], "{a} (1 - {b} phi)^2", LawForms.Parabola, [276, 3],
            "Korobcheyev deposit, Russia; no result beyond 33.3 % porosity, where the parabola turns up again",
            "Rzhevsky and Novik 1971; " + Handbook, WorkedExample.Computed(135.24, 5, 0.1)),
        Read("middle-east-carbonate-porosity", "Strength of Middle East carbonate from porosity", Carbonate,
            [InputOf.Porosity.Within(0.05, 0.2)], "{a} exp({b} phi)", LawForms.Exponential, [143.8, -6.95],
            "Middle East, 5 to 20 % porosity, UCS of 30 to 150 MPa", Handbook, WorkedExample.Computed(71.767, 5, 0.1)),
        Read("carbonate-porosity", "Strength of carbonate from porosity", Carbonate,
            [InputOf.Porosity.Within(0, 0.2)], "{a} exp({b} phi)", LawForms.Exponential, [135.9, -4.8],
            "up to 20 % porosity, UCS of 10 to 300 MPa", Handbook, WorkedExample.Computed(84.093, 5, 0.1)),
    ];

    private const string Apart = "the two laws from slowness differ by 2.65 times at 60 us/ft";
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of shale from Young's modulus and porosity.</summary>
internal static class ShaleStrength
{
    private const string Horsrud = "Horsrud 2001, SPE Drilling & Completion 16(2) 68-73, SPE 56017; ";

    private static readonly LawInput PorosityPercent = InputOf.PorosityAboveZero with { Unit = Units.Percent, Domain = new(double.Epsilon, 100) };

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Modulus("horsrud-2001-shale-youngs", "Horsrud's strength of shale from Young's modulus", 7.97, 0.91,
            "high-porosity Tertiary shale of the North Sea", Horsrud + Handbook, WorkedExample.Computed(34.476, 5, 5)),
        Modulus("strong-shale-modulus", "Strength of strong shale from Young's modulus", 7.22, 0.712,
            "strong, compacted shale", Handbook + "; and in Zhang 2019, Applied Petroleum Geomechanics, p. 98", WorkedExample.Computed(60.936, 5, 20)),
        Modulus("gulf-tertiary-shale-modulus", "Strength of deep Gulf of Mexico shale from Young's modulus", 14.035, 0.5734,
            "deep Tertiary shale, Gulf of Mexico", Zhang + "pp. 98-99", WorkedExample.Computed(52.555, 5, 10)),
        Modulus("haynesville-shale-modulus", "Strength of Haynesville shale from Young's modulus", 23.524, 0.4775,
            "Haynesville shale", Zhang + "p. 99", WorkedExample.Computed(119.354, 6, 30)),
        Porosity("lashkaripour-1993-shale", "Lashkaripour and Dusseault's strength of shale from porosity",
            InputOf.PorosityAboveZero.Within(0, 0.1), 1.001, -1.143,
            "shale below 10 % porosity, about 79 MPa; porosity as a fraction (193.4 with percent)",
            "Lashkaripour and Dusseault 1993; " + Handbook, WorkedExample.Computed(30.726, 5, 0.05)),
        Porosity("horsrud-2001-shale-porosity", "Horsrud's strength of shale from porosity",
            InputOf.PorosityAboveZero, 2.922, -0.96,
            "high-porosity Tertiary shale of the North Sea; porosity as a fraction (243.6 with percent)",
            Horsrud + Handbook, WorkedExample.Computed(13.699, 5, 0.20)),
        Porosity("porous-shale-porosity", "Strength of very porous shale from porosity",
            InputOf.PorosityAboveZero.Within(0.27, 1), 0.286, -1.762,
            "shale above 27 % porosity", Handbook, WorkedExample.Computed(1.8185, 5, 0.35)),
        Porosity("haynesville-shale-porosity", "Strength of Haynesville shale from porosity",
            PorosityPercent, 233.22, -0.553,
            "Haynesville shale; porosity in percent", Zhang + "p. 98, fig. 3.9", WorkedExample.Computed(86.586, 5, 6)),
    ];

    private static Law Modulus(string id, string title, double a, double b, string validity, string source, WorkedExample example) => Read(
        id, title, RockKinds.Shale, [InputOf.StaticModulus], "{a} Es^{b}", LawForms.Power, [a, b], $"{validity}; {StaticTaken}", source, example);

    private static Law Porosity(string id, string title, LawInput porosity, double a, double b, string validity, string source, WorkedExample example) => Read(
        id, title, RockKinds.Shale, [porosity], "{a} phi^{b}", LawForms.Power, [a, b], $"{validity}; without bound towards zero porosity", source, example);
}

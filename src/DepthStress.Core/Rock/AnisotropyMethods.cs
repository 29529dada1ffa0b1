using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give stiffnesses of layered rock; the formulas are those the chain calls.</summary>
public static class AnisotropyMethods
{
    private const double Giga = 1e9;

    private const string Core = "factors from core, without a default; both 1 give the unmodified links";

    private const string Modified = "Quirein and others 2014, SPWLA; Murphy and others 2015, SPE (that a modification with constants from core exists was read in patent application WO2016118360); the form recalled, not read";

    private static readonly Interval Positive = new(double.Epsilon, double.PositiveInfinity);

    private static readonly LawInput C66 = Stiffness("C66", Property.BedShearStiffness);

    private static readonly LawInput[] Velocities = [InputOf.Density, InputOf.VpMetre, InputOf.VsMetre];

    /// <summary>C66 from the Stoneley wave.</summary>
    public static Law Stoneley { get; } = Of(
        "white-stoneley-c66", "White's shear stiffness of the beds from the Stoneley wave", Property.BedShearStiffness, RockKinds.Any,
        [
            new("Vst", Property.Stoneley, Units.MetrePerSecond, Positive, Interval.All),
            new("rho_m", Property.MudDensity, Units.KilogramPerCubicMetre, Positive, Interval.All),
            new("Vm", Property.MudVelocity, Units.MetrePerSecond, Positive, Interval.All),
        ],
        "C66 = rho_m Vst^2 / (1 - Vst^2 / Vm^2), in GPa", (x, _) => StoneleyShear.C66(x[0], x[1], x[2]) / Giga,
        "low frequency, round hole, impermeable rock, hole within 20 deg of the normal of the beds; the tool itself slows the wave",
        "White's relation for tube waves; recalled, not read", 6.7902, 5, 1300, 1000, 1500);

    /// <summary>C11 of the three-parameter shale.</summary>
    public static Law Annie { get; } = Of(
        "annie-1996-shale", "Stiffness along the beds of the three-parameter shale ANNIE", Property.BedStiffness, RockKinds.Shale, [.. Velocities, C66],
        "C11 = rho Vp^2 - 2 rho Vs^2 + 2 C66, in GPa", (x, _) => C11(x, 1),
        "shale; with C13 = C33 - 2 C44 (delta = 0), so the stress ratio without strains stays that of isotropic rock; velocities across the beds",
        "Schoenberg, Muir and Sayers 1996, J. Seismic Exploration 5, 35-49 (delta = 0 and that one more link is made were read in the abstract; the link C12 = C13 recalled, not read)",
        38, 6, 2500, 3464.1016151377544, 1897.366596101028, 13);

    /// <summary>C11 of the modified model.</summary>
    public static Law ModifiedC11 { get; } = Of(
        "modified-annie-c11", "Stiffness along the beds of the three-parameter shale with factors from core", Property.BedStiffness, RockKinds.Shale,
        [.. Velocities, C66, new("z", Property.C11Factor, Units.One, Positive, Interval.All)],
        "C11 = z (2 (C66 - rho Vs^2) + rho Vp^2), in GPa", (x, _) => C11(x, x[4]), Core, Modified,
        41.8, 6, 2500, 3464.1016151377544, 1897.366596101028, 13, 1.1);

    /// <summary>C13 of the modified model.</summary>
    public static Law ModifiedC13 { get; } = Of(
        "modified-annie-c13", "Stiffness between along and across of the three-parameter shale with factors from core", Property.CrossStiffness, RockKinds.Shale,
        [Stiffness("C11", Property.BedStiffness), C66, new("x", Property.C12Factor, Units.One, Positive, Interval.All)],
        "C13 = (C11 - 2 C66) / x", (x, _) => AnnieConstraints.C13(x[0], x[1], x[2]), Core, Modified, 14.36364, 7, 41.8, 13, 1.1);

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } = [Stoneley, Annie, ModifiedC11, ModifiedC13];

    private static double C11(ReadOnlySpan<double> x, double factor) =>
        AnnieConstraints.C11(x[0] * x[1] * x[1] / Giga, x[0] * x[2] * x[2] / Giga, x[3], factor);

    private static LawInput Stiffness(string symbol, Property property) => new(symbol, property, Units.Gigapascal, Positive, Interval.All);

    private static Law Of(
        string id, string title, Property predicts, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, string validity, string source, double result, int digits, params double[] example) =>
        (new LawFamily(predicts, "", Units.Gigapascal, Interval.Physical(predicts)) { Rocks = rocks })
            .Entry(id, title, inputs, template, formula, [], validity, source, Standing.FromMemory, WorkedExample.Computed(result, digits, example));
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Prediction;

/// <summary>Puts together catalogue entries that give shear velocity in km/s or density in g/cm3.</summary>
internal static class PredictionEntry
{
    /// <summary>What bulk density can be, g/cm3 (common practice): that of rock, not of water or ore.</summary>
    public static Interval CredibleDensity { get; } = new(1, 4);

    /// <summary>What a shear velocity can be, km/s: above zero.</summary>
    public static Interval ShearDomain { get; } = new(double.Epsilon, double.PositiveInfinity);

    private static LawFamily Shears { get; } = new(Property.Vs, "Vs", Units.KilometrePerSecond, ShearDomain);

    private static LawFamily Densities { get; } = new(Property.Density, "rho", Units.GramPerCubicCentimetre, CredibleDensity);

    /// <summary>A relation for shear velocity.</summary>
    public static Law Shear(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c,
        string validity, string source, Standing standing, WorkedExample example) =>
        Of(Shears with { Rocks = rocks }, id, title, inputs, template, formula, c, validity, source, standing, example);

    /// <summary>A relation for bulk density.</summary>
    public static Law Density(
        string id, string title, RockKinds rocks, LawInput input, string template, LawFormula formula, double[] c,
        string validity, string source, Standing standing, WorkedExample example) =>
        Of(Densities with { Rocks = rocks }, id, title, [input], template, formula, c, validity, source, standing, example);

    private static Law Of(
        LawFamily family, string id, string title, LawInput[] inputs, string template, LawFormula formula, double[] c,
        string validity, string source, Standing standing, WorkedExample example) => standing == Standing.FromMemory
        ? family.Recalled(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, example)
        : family.Entry(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, standing, example);
}

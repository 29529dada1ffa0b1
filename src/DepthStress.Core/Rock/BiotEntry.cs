using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Puts together catalogue entries that give Biot's coefficient.</summary>
internal static class BiotEntry
{
    private static readonly LawFamily Family = new(Property.Biot, "alpha", Units.One, new(0, 1));

    /// <summary>A modulus of the grains, GPa.</summary>
    public static LawInput Mineral(string symbol, Property property) =>
        new(symbol, property, Units.Gigapascal, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    /// <summary>Puts an entry together.</summary>
    public static Law Of(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) =>
        (Family with { Rocks = rocks }).Entry(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, standing, example);
}

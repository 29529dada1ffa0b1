using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Puts together catalogue entries that give Biot's coefficient.</summary>
internal static class BiotEntry
{
    /// <summary>A modulus of the grains, GPa.</summary>
    public static LawInput Mineral(string symbol, Property property) =>
        new(symbol, property, Units.Gigapascal, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    /// <summary>Puts an entry together.</summary>
    public static Law Of(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Property.Biot,
            Unit = Units.One,
            Rocks = rocks,
            Inputs = inputs,
            Coefficients = Coefficient.Named(c),
            Template = "alpha = " + template,
            Formula = formula,
            ResultDomain = new(0, 1),
            Validity = validity,
            Source = source,
            Standing = standing,
            Example = example,
        };
}

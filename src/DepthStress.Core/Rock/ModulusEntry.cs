using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Puts together catalogue entries that give static Young's modulus, in the unit of their source.</summary>
internal static class ModulusEntry
{
    /// <summary>A law whose coefficients were recalled, not read; moduli in GPa.</summary>
    public static Law Recalled(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, WorkedExample example) =>
        Of(id, title, rocks, Units.Gigapascal, inputs, template, formula, c, validity, source + "; coefficients recalled, not read", Standing.FromMemory, example);

    /// <summary>Any law.</summary>
    public static Law Of(
        string id, string title, RockKinds rocks, Unit unit, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Property.YoungsStatic,
            Unit = unit,
            Rocks = rocks,
            Inputs = inputs,
            Coefficients = Coefficient.Named(c),
            Template = template,
            Formula = formula,
            ResultDomain = Interval.NotNegative,
            Validity = validity,
            Source = source,
            Standing = standing,
            Example = example,
        };
}

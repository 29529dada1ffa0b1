using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Catalogue;

/// <summary>What the entries that give one property have in common.</summary>
/// <param name="Predicts">The property.</param>
/// <param name="Symbol">What stands left of the equals sign of their formulas; empty where each formula says so itself.</param>
/// <param name="Unit">The unit of their results.</param>
/// <param name="ResultDomain">Results outside it have no physical meaning and become missing; in that unit.</param>
internal sealed record LawFamily(Property Predicts, string Symbol, Unit Unit, Interval ResultDomain)
{
    /// <summary>The rocks they were made for.</summary>
    public RockKinds Rocks { get; init; } = RockKinds.Any;

    /// <summary>One entry; its parts are those of <see cref="Law"/>.</summary>
    public Law Entry(
        string id, string title, LawInput[] inputs, string template, LawFormula formula, Coefficient[] coefficients, string validity, string source, Standing standing, WorkedExample? example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Predicts,
            Unit = Unit,
            Rocks = Rocks,
            Inputs = inputs,
            Coefficients = coefficients,
            Template = Symbol.Length > 0 ? $"{Symbol} = {template}" : template,
            Formula = formula,
            ResultDomain = ResultDomain,
            Validity = validity,
            Source = source,
            Standing = standing,
            Example = example,
        };

    /// <summary>An entry whose coefficients were recalled, not read: its source says so.</summary>
    public Law Recalled(
        string id, string title, LawInput[] inputs, string template, LawFormula formula, Coefficient[] coefficients, string validity, string source, WorkedExample? example) =>
        Entry(id, title, inputs, template, formula, coefficients, validity, source + "; coefficients recalled, not read", Standing.FromMemory, example);
}

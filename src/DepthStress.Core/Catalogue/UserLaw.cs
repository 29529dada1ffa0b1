using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Catalogue;

/// <summary>Laws whose coefficients the user gives in the well file.</summary>
public static class UserLaw
{
    /// <summary>One value for every sample, in the unit it is shown in.</summary>
    public static Law Constant(Property predicts, Unit unit, double value) =>
        Make("constant", predicts, unit, [], "{value}", LawForms.Constant, new Coefficient("value", value, unit.Symbol));

    /// <summary>A straight line, <c>factor * input + offset</c>, each side in its own unit.</summary>
    public static Law Linear(Property predicts, Unit unit, LawInput input, double factor, double offset) => Make(
        "linear", predicts, unit, [input], $"{{factor}} {input.Symbol} + {{offset}}", LawForms.Linear,
        new Coefficient("factor", factor), new Coefficient("offset", offset, unit.Symbol));

    /// <summary>A power law, <c>factor * input^exponent</c>, each side in its own unit.</summary>
    public static Law Power(Property predicts, Unit unit, LawInput input, double factor, double exponent) => Make(
        "power", predicts, unit, [input], $"{{factor}} {input.Symbol}^{{exponent}}", LawForms.Power,
        new Coefficient("factor", factor), new Coefficient("exponent", exponent));

    private static Law Make(
        string id, Property predicts, Unit unit, LawInput[] inputs, string template, LawFormula formula, params Coefficient[] coefficients) => new()
        {
            Id = id,
            Title = "given in the well file",
            Predicts = predicts,
            Unit = unit,
            Rocks = RockKinds.Any,
            Inputs = inputs,
            Coefficients = coefficients,
            Template = template,
            Formula = formula,
            ResultDomain = Interval.Physical(predicts).In(unit),
            Validity = "the user's responsibility",
            Source = "well file",
            Standing = Standing.UserGiven,
        };
}

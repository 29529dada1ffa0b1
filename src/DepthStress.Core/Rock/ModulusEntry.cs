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
        Family(rocks, Units.Gigapascal).Recalled(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, example);

    /// <summary>Any law.</summary>
    public static Law Of(
        string id, string title, RockKinds rocks, Unit unit, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) =>
        Family(rocks, unit).Entry(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, standing, example);

    private static LawFamily Family(RockKinds rocks, Unit unit) => new(Property.YoungsStatic, "", unit, Interval.NotNegative) { Rocks = rocks };
}

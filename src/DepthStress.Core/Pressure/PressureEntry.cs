using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Puts together catalogue entries that give the pore pressure of shale.</summary>
internal static class PressureEntry
{
    /// <summary>Values above zero.</summary>
    public static Interval Positive { get; } = new(double.Epsilon, double.PositiveInfinity);

    /// <summary>The vertical stress, MPa.</summary>
    public static LawInput Stress { get; } = new("S", Property.VerticalStress, Units.Megapascal, Interval.NotNegative, Interval.All);

    /// <summary>The normal pressure, MPa.</summary>
    public static LawInput Normal { get; } = new("Pn", Property.NormalPressure, Units.Megapascal, Interval.NotNegative, Interval.All);

    /// <summary>A law in the unit of its stresses.</summary>
    public static Law Of(
        string id, string title, LawInput[] inputs, Coefficient[] coefficients, string template, LawFormula formula, string validity, string source, Standing standing, WorkedExample example) =>
        new LawFamily(Property.PorePressure, "Pp", inputs[0].Unit, Interval.NotNegative) { Rocks = RockKinds.Shale }.Entry(id, title, inputs, template, formula, coefficients, validity, source, standing, example);
}

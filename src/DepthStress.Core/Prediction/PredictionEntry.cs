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

    /// <summary>A relation for shear velocity.</summary>
    public static Law Shear(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c,
        string validity, string source, Standing standing, WorkedExample example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Property.Vs,
            Unit = Units.KilometrePerSecond,
            Rocks = rocks,
            Inputs = inputs,
            Coefficients = Coefficient.Named(c),
            Template = "Vs = " + template,
            Formula = formula,
            ResultDomain = ShearDomain,
            Validity = validity,
            Source = Said(source, standing),
            Standing = standing,
            Example = example,
        };

    /// <summary>A relation for bulk density.</summary>
    public static Law Density(
        string id, string title, RockKinds rocks, LawInput input, string template, LawFormula formula, double[] c,
        string validity, string source, Standing standing, WorkedExample example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Property.Density,
            Unit = Units.GramPerCubicCentimetre,
            Rocks = rocks,
            Inputs = [input],
            Coefficients = Coefficient.Named(c),
            Template = "rho = " + template,
            Formula = formula,
            ResultDomain = CredibleDensity,
            Validity = validity,
            Source = Said(source, standing),
            Standing = standing,
            Example = example,
        };

    private static string Said(string source, Standing standing) =>
        standing == Standing.FromMemory ? source + "; coefficients recalled, not read" : source;
}

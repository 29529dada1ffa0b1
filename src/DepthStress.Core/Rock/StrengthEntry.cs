using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Puts together catalogue entries that give unconfined compressive strength in MPa.</summary>
internal static class StrengthEntry
{
    /// <summary>Where most of these laws were read.</summary>
    public const string Handbook =
        "read in Mavko, Mukerji and Dvorkin 2009, The Rock Physics Handbook, 2nd ed., p. 387, after the compilation of Chang, Zoback and Khaksar 2006, J. Petrol. Sci. Eng. 51, 223-237";

    /// <summary>The book where the others were read.</summary>
    public const string Zhang = "read in Zhang 2019, Applied Petroleum Geomechanics, ";

    /// <summary>For laws whose source names a modulus only by its letter.</summary>
    public const string StaticTaken = "the source does not say whether E is static; static is taken, dynamic would give two to three times the strength";

    private static readonly LawFamily Family = new(Property.Ucs, "UCS", Units.Megapascal, Interval.NotNegative);

    /// <summary>A law whose coefficients were read in its source.</summary>
    public static Law Read(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, WorkedExample example) =>
        (Family with { Rocks = rocks }).Entry(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, Standing.Confirmed, example);

    /// <summary>A law whose coefficients were recalled, not read.</summary>
    public static Law Recalled(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, double[] c, string validity, string source, WorkedExample example) =>
        (Family with { Rocks = rocks }).Recalled(id, title, inputs, template, formula, Coefficient.Named(c), validity, source, example);
}

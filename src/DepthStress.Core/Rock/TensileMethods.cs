using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give tensile strength, each a share of unconfined compressive strength.</summary>
public static class TensileMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("griffith-tensile", "Griffith's tensile strength, an eighth of UCS", 8,
            "brittle rock with Griffith's cracks; measured strengths are often lower",
            "Griffith's criterion (s1 - s3)^2 = 8 T0 (s1 + s3) at s3 = 0", Standing.Identity,
            new([80], 10, 3, ExampleBasis.Identity, "(s1 - s3)^2 = 8 T0 (s1 + s3) at s3 = 0 leaves s1 = 8 T0")),
        Entry("tenth-of-ucs", "Tensile strength as a tenth of UCS", 10,
            "rule of the trade", "common practice; factor recalled, not read", Standing.FromMemory, WorkedExample.Computed(6.0, 3, 60)),
        Entry("twelfth-of-ucs", "Tensile strength as a twelfth of UCS", 12,
            "rule of the trade, lower end", "common practice; factor recalled, not read", Standing.FromMemory, WorkedExample.Computed(5.0, 3, 60)),
    ];

    private static Law Entry(string id, string title, double factor, string validity, string source, Standing standing, WorkedExample example) => new()
    {
        Id = id,
        Title = title,
        Predicts = Property.TensileStrength,
        Unit = Units.Megapascal,
        Rocks = RockKinds.Any,
        Inputs = [new("UCS", Property.Ucs, Units.Megapascal, Interval.NotNegative, Interval.All)],
        Coefficients = Coefficient.Named(factor),
        Template = "T0 = UCS / {a}",
        Formula = LawForms.Share,
        ResultDomain = Interval.NotNegative,
        Validity = validity,
        Source = source,
        Standing = standing,
        Example = example,
    };
}

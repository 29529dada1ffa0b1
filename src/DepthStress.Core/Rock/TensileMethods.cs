using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give tensile strength, each a share of unconfined compressive strength.</summary>
public static class TensileMethods
{
    private static readonly LawFamily Family = new(Property.TensileStrength, "T0", Units.Megapascal, Interval.NotNegative);

    private static readonly LawInput[] Inputs = [new("UCS", Property.Ucs, Units.Megapascal, Interval.NotNegative, Interval.All)];

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

    private static Law Entry(string id, string title, double factor, string validity, string source, Standing standing, WorkedExample example) =>
        Family.Entry(id, title, Inputs, "UCS / {a}", LawForms.Share, Coefficient.Named(factor), validity, source, standing, example);
}

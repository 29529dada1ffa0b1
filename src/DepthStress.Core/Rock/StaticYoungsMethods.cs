using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give static Young's modulus.</summary>
public static class StaticYoungsMethods
{
    private const string LacySource =
        "Lacy 1997, Dynamic rock mechanics testing for optimized fracture designs, SPE 38716; read in Zhang 2019, Applied Petroleum Geomechanics, p. 67, eqs 2.64-2.66, which states the unit Mpsi";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Lacy("lacy-1997-sandstone", "Lacy's sandstone curve", RockKinds.Sandstone, 0.0293, 0.4533, 2.2820),
        Lacy("lacy-1997-shale", "Lacy's shale curve", RockKinds.Shale, 0.0428, 0.2334, 1.6184),
        Lacy("lacy-1997-combined", "Lacy's curve for all rocks", RockKinds.Any, 0.018, 0.422, 1.9760),
        new()
        {
            Id = "horsrud-2001-shale-modulus",
            Title = "Horsrud's static modulus of shale from velocity",
            Predicts = Property.YoungsStatic,
            Unit = Units.Gigapascal,
            Rocks = RockKinds.Shale,
            Inputs = [new("Vp", Property.Vp, Units.KilometrePerSecond, Interval.NotNegative, Interval.All)],
            Coefficients = [new("a", 0.076), new("b", 3.23)],
            Template = "Es = {a} Vp^{b}",
            Formula = LawForms.Power,
            Validity = "high-porosity Tertiary shale of the North Sea, from core",
            Source = "Horsrud 2001, SPE Drilling & Completion 16(2) 68-73, SPE 56017; read in Zhang 2019, Applied Petroleum Geomechanics, p. 96, eq. 3.9",
            Standing = Standing.Confirmed,
            Example = new([3.0], 2.6419, 5, ExampleBasis.SelfComputed, "the formula at 3 km/s"),
        },
    ];

    private static Law Lacy(string id, string title, RockKinds rocks, double a, double b, double at4) => new()
    {
        Id = id,
        Title = title,
        Predicts = Property.YoungsStatic,
        Unit = Units.Mpsi,
        Rocks = rocks,
        Inputs = [new("Ed", Property.YoungsDynamic, Units.Mpsi, Interval.NotNegative, Interval.All)],
        Coefficients = [new("a", a), new("b", b)],
        Template = "Es = {a} Ed^2 + {b} Ed",
        Formula = LawForms.Quadratic,
        Validity = "about 600 cores, Gulf of Mexico; both moduli in Mpsi",
        Source = LacySource,
        Standing = Standing.Confirmed,
        Example = new([4], at4, 5, ExampleBasis.SelfComputed, "the formula at 4 Mpsi"),
    };
}

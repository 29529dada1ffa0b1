using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give unconfined compressive strength.</summary>
public static class StrengthMethods
{
    private const string Handbook =
        "read in Mavko, Mukerji and Dvorkin 2009, The Rock Physics Handbook, 2nd ed., p. 387, after the compilation of Chang, Zoback and Khaksar 2006, J. Petrol. Sci. Eng. 51, 223-237";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        new()
        {
            Id = "horsrud-2001-shale",
            Title = "Horsrud's strength of shale from velocity",
            Predicts = Property.Ucs,
            Unit = Units.Megapascal,
            Rocks = RockKinds.Shale,
            Inputs = [new("Vp", Property.Vp, Units.KilometrePerSecond, Interval.NotNegative, Interval.All)],
            Coefficients = [new("a", 0.77), new("b", 2.93)],
            Template = "UCS = {a} Vp^{b}",
            Formula = LawForms.Power,
            Validity = "high-porosity Tertiary shale of the North Sea",
            Source = "Horsrud 2001, SPE Drilling & Completion 16(2) 68-73, SPE 56017; " + Handbook,
            Standing = Standing.Confirmed,
            Example = new([3.0], 19.251, 5, ExampleBasis.SelfComputed, "the formula at 3 km/s"),
        },
        new()
        {
            Id = "mcnally-1987-sandstone",
            Title = "McNally's strength of fine-grained sandstone from slowness",
            Predicts = Property.Ucs,
            Unit = Units.Megapascal,
            Rocks = RockKinds.Sandstone,
            Inputs = [new("dt", Property.CompressionalSlowness, Units.MicrosecondPerFoot, Interval.NotNegative, Interval.All)],
            Coefficients = [new("a", 1200), new("b", -0.036)],
            Template = "UCS = {a} exp({b} dt)",
            Formula = LawForms.Exponential,
            Validity = "fine-grained, consolidated and unconsolidated sandstone, Bowen Basin",
            Source = "McNally 1987; read in Zhang 2019, Applied Petroleum Geomechanics, p. 100, eq. 3.17",
            Standing = Standing.Confirmed,
            Example = new([70], 96.552, 5, ExampleBasis.SelfComputed, "the formula at 70 us/ft"),
        },
        new()
        {
            Id = "lal-1999-shale",
            Title = "Lal's strength of shale from slowness",
            Predicts = Property.Ucs,
            Unit = Units.Megapascal,
            Rocks = RockKinds.Shale,
            Inputs = [new("dt", Property.CompressionalSlowness, Units.MicrosecondPerFoot, new(1e-9, 304.8), Interval.All)],
            Coefficients = [new("a", 10), new("b", 304.8)],
            Template = "UCS = {a} ({b} / dt - 1)",
            Formula = (x, c) => c[0] * ((c[1] / x[0]) - 1),
            ResultDomain = Interval.NotNegative,
            Validity = "high-porosity Tertiary shale of the North Sea; zero at 304.8 us/ft",
            Source = "Lal 1999, SPE 54356; " + Handbook,
            Standing = Standing.Confirmed,
            Example = new([100], 20.480, 5, ExampleBasis.Identity, "2 c cos(phi) / (1 - sin(phi)) of Lal's cohesion and friction is 10 (Vp - 1) exactly"),
        },
    ];
}

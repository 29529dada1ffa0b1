using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give the angle of internal friction.</summary>
public static class FrictionMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        new()
        {
            Id = "lal-1999-shale-friction",
            Title = "Lal's friction angle of shale from velocity",
            Predicts = Property.FrictionAngle,
            Unit = Units.Degree,
            Rocks = RockKinds.Shale,
            Inputs = [new("Vp", Property.Vp, Units.MetrePerSecond, new(1000, double.PositiveInfinity), Interval.All)],
            Coefficients = [new("a", 1000, "m/s")],
            Template = "sin(angle) = (Vp - {a}) / (Vp + {a})",
            Formula = (x, c) => Units.Degree.FromSi(Math.Asin((x[0] - c[0]) / (x[0] + c[0]))),
            Validity = "shale; zero at 1000 m/s",
            Source = "Lal 1999, SPE 54356; read in Zoback 2007, Reservoir Geomechanics, p. 116, Table 4.4",
            Standing = Standing.Confirmed,
            Example = new([3048], 30.393, 5, ExampleBasis.SelfComputed, "the formula at 3048 m/s"),
        },
    ];
}

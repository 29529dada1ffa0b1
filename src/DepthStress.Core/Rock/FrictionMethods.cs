using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give the angle of internal friction.</summary>
public static class FrictionMethods
{
    private const string Zoback = "read in Zoback 2007, Reservoir Geomechanics, p. 116, Table 4.4";

    private static readonly LawFamily Family = new(Property.FrictionAngle, "", Units.Degree, new(0, 90));

    private static readonly LawInput GammaRay = new("GR", Property.GammaRay, Units.GammaApi, Interval.NotNegative, new(60, 120));

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("lal-1999-shale-friction", "Lal's friction angle of shale from velocity", RockKinds.Shale,
            [InputOf.VpMetre.Only(1000, double.PositiveInfinity)], "sin(angle) = (Vp - {a}) / (Vp + {a})",
            (x, c) => Units.Degree.FromSi(Math.Asin((x[0] - c[0]) / (x[0] + c[0]))), [new("a", 1000, "m/s")],
            "shale; zero at 1000 m/s", "Lal 1999, SPE 54356; " + Zoback, Standing.Confirmed, WorkedExample.Computed(30.393, 5, 3048)),
        Entry("shaly-rock-gamma-ray-friction", "Friction angle of shaly rock from gamma ray", RockKinds.Any,
            [GammaRay], "angle = {a} - {b} GR", (x, c) => c[0] - (c[1] * x[0]), Coefficient.Named(70, 0.417),
            "shaly rock reading 60 to 120 API; no result above 167.9 API, where the line passes zero",
            "unpublished; " + Zoback, Standing.Confirmed, WorkedExample.Computed(32.470, 5, 90)),
        Entry("weingarten-perkins-1995-sandstone", "Weingarten and Perkins's friction angle of sandstone from porosity", RockKinds.Sandstone,
            [InputOf.Porosity], "angle = {a} - {b} phi", (x, c) => c[0] - (c[1] * x[0]), Coefficient.Named(57.8, 105),
            "sandstone; no result beyond 55.0 % porosity, where the line passes zero",
            "Weingarten and Perkins 1995, J. Petrol. Technol., SPE 24797; coefficients recalled, not read", Standing.FromMemory, WorkedExample.Computed(36.80, 4, 0.20)),
        Entry("plumb-1994-clastic", "Plumb's friction angle of clastic rock from porosity and clay", RockKinds.Sandstone | RockKinds.Shale,
            [InputOf.Porosity, InputOf.Clay], "angle = {a} - {b} s + {c} s^2, s = 1 - phi - Vclay",
            Plumb, Coefficient.Named(26.5, 37.4, 62.1),
            "clastic rock; no result for s below 0.301, in very shaly or porous rock, where the curve turns up again from its least value of 20.87 deg",
            "Plumb 1994, SPE 28022; coefficients recalled, not read", Standing.FromMemory, WorkedExample.Computed(28.427, 5, 0.15, 0.2)),
    ];

    private static double Plumb(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        var solid = 1 - x[0] - x[1];
        return solid < c[1] / (2 * c[2]) ? double.NaN : c[0] - (c[1] * solid) + (c[2] * solid * solid);
    }

    private static Law Entry(
        string id, string title, RockKinds rocks, LawInput[] inputs, string template, LawFormula formula, Coefficient[] coefficients, string validity, string source, Standing standing, WorkedExample example) =>
        (Family with { Rocks = rocks }).Entry(id, title, inputs, template, formula, coefficients, validity, source, standing, example);
}

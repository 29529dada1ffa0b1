using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Biot's coefficient from the stiffness of the rock beside that of its grains.</summary>
internal static class BiotModulusMethods
{
    private const string Zhang = "read in Zhang 2019, Applied Petroleum Geomechanics, ";

    private static readonly LawInput BulkModulus = BiotEntry.Mineral("Ks", Property.MineralBulkModulus);

    private static readonly LawInput MatrixVs = new("Vsm", Property.MatrixShearVelocity, Units.MetrePerSecond, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    private static readonly LawInput MatrixDensity = new("rho_m", Property.MatrixDensity, Units.KilogramPerCubicMetre, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    /// <summary>From drained static moduli.</summary>
    public static Law Static { get; } = Read("biot-willis-1957-static", "Biot's coefficient from the static bulk modulus",
        [InputOf.StaticModulus, new("nu_s", Property.PoissonStatic, Units.One, new(-1, 0.499), Interval.All), BulkModulus],
        "1 - K / Ks, K = Es / (3 (1 - 2 nu_s))", (x, _) => 1 - (ElasticConstants.Bulk(x[0], x[1]) / x[2]),
        "needs the drained static modulus: a static Poisson's ratio taken from the sonic is undrained and makes the coefficient too low; compare with a law from porosity",
        "Biot and Willis 1957; Geertsma 1957; Nur and Byerlee 1971; used in Zhang 2019, Applied Petroleum Geomechanics, p. 75",
        WorkedExample.Computed(0.59459, 5, 22.5, 0.25, 37));

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Static,
        Read("dry-rock-sonic-biot", "Biot's coefficient from the sonic of dry rock",
            [InputOf.Density, InputOf.VpMetre, InputOf.VsMetre, BulkModulus],
            "1 - rho (Vp^2 - 4 Vs^2 / 3) / Ks, the modulus in GPa", (x, _) => 1 - (x[0] * ((x[1] * x[1]) - (4 * x[2] * x[2] / 3)) / (1e9 * x[3])),
            "dry rock: in rock with liquid in its pores the sonic gives the undrained modulus and too low a coefficient; the theory asks for static moduli",
            Zhang + "p. 75, eqs 2.80-2.81", WorkedExample.Computed(0.43784, 5, 2500, 4000, 2400, 37)),
        Read("krief-1990-shear-modulus", "Biot's coefficient from the shear modulus",
            [InputOf.Density, InputOf.VsMetre, MatrixDensity, MatrixVs],
            "1 - rho Vs^2 / (rho_m Vsm^2)", (x, _) => 1 - (x[0] * x[1] * x[1] / (x[2] * x[3] * x[3])),
            "takes the shear modulus to fall with porosity as the bulk modulus does; best in gas-filled rock",
            "idea of Krief and others 1990; " + Zhang + "p. 78, eqs 2.90-2.91", WorkedExample.Computed(0.68815, 5, 2400, 2400, 2650, 4090)),
        Read("krief-1990-shear-porosity", "Biot's coefficient from shear velocity and porosity",
            [InputOf.Porosity, InputOf.VsMetre, MatrixVs],
            "1 - (1 - phi) (Vs / Vsm)^2", (x, _) => 1 - ((1 - x[0]) * x[1] * x[1] / (x[2] * x[2])),
            "gas-filled rock of low porosity, where the fluid adds no mass",
            "idea of Krief and others 1990; " + Zhang + "p. 79, eq. 2.94 (there with shear slownesses)", WorkedExample.Computed(0.69010, 5, 0.1, 2400, 4090)),
    ];

    private static Law Read(string id, string title, LawInput[] inputs, string template, LawFormula formula, string validity, string source, WorkedExample example) =>
        BiotEntry.Of(id, title, RockKinds.Any, inputs, template, formula, [], validity, source, Standing.Confirmed, example);
}

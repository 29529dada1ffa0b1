using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give Biot's coefficient: from porosity, then from moduli.</summary>
public static class BiotMethods
{
    private const string Recalled = "; coefficients recalled, not read";

    private static readonly LawInput[] Porosity = [InputOf.Porosity.Only(0, 0.99)];

    /// <summary>The coefficient from drained static moduli, which in layered rock is had in both directions.</summary>
    public static Law Static => BiotModulusMethods.Static;

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        BiotEntry.Of("krief-1990-biot", "Krief's Biot coefficient from porosity", RockKinds.Any, Porosity,
            "1 - (1 - phi)^({a} / (1 - phi))", (x, c) => 1 - Math.Pow(1 - x[0], c[0] / (1 - x[0])), [3],
            "consolidated rock", "Krief, Garat, Stellingwerff and Ventre 1990, The Log Analyst 31" + Recalled,
            Standing.FromMemory, WorkedExample.Computed(0.56690, 5, 0.2)),
        BiotEntry.Of("consolidated-rock-biot", "Biot coefficient of consolidated rock from porosity", RockKinds.Any, Porosity,
            "1 - (1 - phi)^{a}", (x, c) => 1 - Math.Pow(1 - x[0], c[0]), [3.8],
            "consolidated rock", "quoted with the data of Krief and others 1990, The Log Analyst 31" + Recalled,
            Standing.FromMemory, WorkedExample.Computed(0.57171, 5, 0.2)),
        BiotEntry.Of("lee-2003-unconsolidated", "Lee's Biot coefficient of unconsolidated sediment from porosity", RockKinds.Sandstone | RockKinds.Shale, Porosity,
            "{a} - {b} / (1 + exp((phi + {c}) / {d}))", (x, c) => c[0] - (c[1] / (1 + Math.Exp((x[0] + c[2]) / c[3]))), [0.99494, 184.05, 0.56468, 0.10817],
            "unconsolidated sediment at about 20 MPa differential pressure",
            "Lee 2003; read in Zhang 2019, Applied Petroleum Geomechanics, p. 78, eq. 2.89, whose text layer drops the minus sign: only with it is the coefficient near 0 at no porosity",
            Standing.Confirmed, WorkedExample.Computed(0.83847, 5, 0.2)),
        BiotEntry.Of("nur-1998-critical-porosity", "Biot coefficient from critical porosity", RockKinds.Any,
            [InputOf.Porosity, new("phi_c", Property.CriticalPorosity, Units.Fraction, new(0.01, 1), Interval.All)],
            "phi / phi_c, not above 1", (x, _) => Math.Min(1, x[0] / x[1]), [],
            "critical porosity about 0.36-0.40 in sandstone, 0.40-0.60 in limestone, 0.60-0.65 in chalk",
            "Nur, Mavko, Dvorkin and Galmudi 1998, The Leading Edge (the definitions of the moduli read, the linear law and the porosities not)" + Recalled,
            Standing.FromMemory, WorkedExample.Computed(0.50, 2, 0.2, 0.4)),
        BiotEntry.Of("hashin-shtrikman-bound", "Least Biot coefficient a porosity and a mineral allow", RockKinds.Any,
            [InputOf.Porosity, BiotEntry.Mineral("Ks", Property.MineralBulkModulus), BiotEntry.Mineral("Gs", Property.MineralShearModulus)],
            "phi / (1 - (1 - phi) Ks / (Ks + 4 Gs / 3))", (x, _) => x[0] / (1 - ((1 - x[0]) * x[1] / (x[1] + (4 * x[2] / 3)))), [],
            "a lower bound for isotropic rock of one mineral, not an estimate",
            "Hashin and Shtrikman's upper bound on the bulk modulus of the dry rock, put into 1 - K / Ks", Standing.Identity,
            WorkedExample.Computed(0.28961, 5, 0.2, 37, 44)),
        .. BiotModulusMethods.All,
    ];
}

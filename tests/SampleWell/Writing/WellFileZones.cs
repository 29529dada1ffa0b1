using SampleWell.Hidden;
using static SampleWell.Writing.FixedText;

namespace SampleWell.Writing;

/// <summary>The zones of a well file, with the choices that hold in one zone alone.</summary>
internal static class WellFileZones
{
    /// <summary>The section of one zone.</summary>
    public static string Zone(Formation formation) =>
        $"""
        [[zones]]
        name = "{formation.Name}"
        top = "{Quantity(formation.Top, 1, "m")}"
        depth_kind = "md"
        {Overrides(formation.Kind)}

        """;

    private static string Overrides(RockKind kind) => kind switch
    {
        RockKind.Shale => """
            [zones.moduli]
            static_youngs = "lacy-1997-shale"

            """,
        RockKind.Sand => """
            target = true                        # the reservoir: the summary names its stress barriers
            [zones.moduli]
            static_youngs = "lacy-1997-sandstone"
            [zones.strength]
            ucs = "mcnally-1987-sandstone"
            [zones.biot]
            coefficient = 0.80

            """,
        RockKind.Marl => """
            [zones.porosity]
            matrix_density = "2.69 g/cm3"        # lime mud and clay
            [zones.strength]
            ucs = { law = "linear", input = "youngs_static", factor = 0.0020, offset = "24 MPa" }
            [zones.biot]
            coefficient = 0.72

            """,
        _ => """
            [zones.porosity]
            matrix_density = "2.71 g/cm3"        # calcite
            [zones.strength]
            ucs = { law = "linear", input = "youngs_static", factor = 0.0020, offset = "24 MPa" }   # fitted to crushed plugs
            [zones.biot]
            coefficient = 0.60

            """,
    };
}

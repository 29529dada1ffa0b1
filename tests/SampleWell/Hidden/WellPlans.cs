namespace SampleWell.Hidden;

/// <summary>The plans of wells: the one that is shipped, and others drawn from a seed.</summary>
public static class WellPlans
{
    /// <summary>The shipped well, Quillback 4 in the Sorrel basin; both are invented.</summary>
    public static WellPlan Quillback4 { get; } = new() { Seed = 4, Formations = Column };

    private static Formation[] Column =>
    [
        new("apricot shale", RockKind.Shale, 900, 0.86, 0.07, 0, 3.2, 0.14, 0.52, 0.215, 0.012, 0.05, 0.88),
        new("bracken sand", RockKind.Sand, 1042.5, 0.17, 0.08, 0.10, 2.2, 0.13, 0.72, 0.225, 0.016, 0.04, 0.80),
        new("cinder marl", RockKind.Marl, 1386, 0.44, 0.10, 0.05, 3.5, 0.12, 0.16, 0.120, 0.018, 0.85, 0.72),
        new("dapple shale", RockKind.Shale, 1731.5, 0.84, 0.08, 0.04, 3.6, 0.12, 0.54, 0.165, 0.012, 0.12, 0.85),
        new("elm limestone", RockKind.Limestone, 2268, 0.10, 0.05, -0.03, 2.8, 0.10, 0.50, 0.072, 0.034, 0.95, 0.60),
        new("fern shale", RockKind.Shale, 2704.5, 0.85, 0.08, 0.03, 3.4, 0.13, 0.56, 0.120, 0.012, 0.10, 0.82),
    ];

    /// <summary>Another well of the same basin: tops, rock, pressures and strains are drawn from the seed.</summary>
    public static WellPlan Drawn(ulong seed)
    {
        var draws = new Draws(seed, "plan");
        return new WellPlan
        {
            Seed = seed,
            Formations = [.. Column.Select((formation, i) => Vary(formation, i, draws))],
            Path = new WellPath(1140, 1680, draws.Whole(28, 38), draws.Whole(0, 359)),
            Excess = (draws.Between(2.5, 5), draws.Between(7, 10)),
            StrainMin = draws.Between(60e-6, 180e-6),
            StrainMax = draws.Between(360e-6, 520e-6),
            ShmaxAzimuth = draws.Whole(0, 179),
        };
    }

    private static Formation Vary(Formation formation, int index, Draws draws) => formation with
    {
        Top = index == 0 ? formation.Top : Math.Round(formation.Top + 0.5 * draws.Whole(-50, 50) * (index == 1 ? 0.4 : 1), 1),
        Shale = formation.Shale + draws.Between(-0.03, 0.03),
        Porosity = formation.Porosity * draws.Between(0.93, 1.07),
        Biot = formation.Biot + draws.Between(-0.03, 0.03),
    };
}

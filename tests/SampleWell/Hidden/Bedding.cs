namespace SampleWell.Hidden;

/// <summary>Shale volume and porosity along the hole, bed by bed, as a tool of 0.6 m resolution averages them.</summary>
internal sealed class Bedding
{
    private const double Resolution = 0.6;

    /// <summary>Draws the beds of a well.</summary>
    public Bedding(WellPlan plan, FineGrid grid, double[] excess)
    {
        var shale = new double[grid.Md.Length];
        var porosity = new double[grid.Md.Length];
        for (var f = 0; f < plan.Formations.Count; f++)
            LayBeds(plan, grid, f, shale, porosity);
        var slow = Noise.Curve(new Draws(plan.Seed, "slow"), shale.Length, grid.Step, 45, 0.035);
        var cycles = Noise.Curve(new Draws(plan.Seed, "cycles"), shale.Length, grid.Step, 5, 0.035);
        var within = Noise.Curve(new Draws(plan.Seed, "within"), shale.Length, grid.Step, 0.8, 0.035);
        var pores = Noise.Curve(new Draws(plan.Seed, "pores"), shale.Length, grid.Step, 1.1, 0.007);
        var mudPores = Noise.Curve(new Draws(plan.Seed, "mud pores"), shale.Length, grid.Step, 9, 0.010);
        for (var i = 0; i < shale.Length; i++)
        {
            shale[i] = Math.Clamp(shale[i] + slow[i] + cycles[i] + within[i], 0.01, 0.99);
            var clean = Math.Max(0.008, porosity[i] + pores[i]);
            var mud = MudPorosity(plan.Path.Tvd(grid.Md[i]), excess[i]) + mudPores[i] + 0.6 * pores[i];
            porosity[i] = (1 - shale[i]) * clean + shale[i] * mud;
        }

        ShaleVolume = Noise.Resolve(shale, grid.Step, Resolution);
        Porosity = Noise.Resolve(porosity, grid.Step, Resolution);
    }

    /// <summary>Shale volume, fraction.</summary>
    public double[] ShaleVolume { get; }

    /// <summary>Total porosity, fraction.</summary>
    public double[] Porosity { get; }

    /// <summary>Mud compacts with depth; pressure above hydrostatic keeps some of its pores open.</summary>
    private static double MudPorosity(double tvd, double excessMpa) => 0.385 * Math.Exp(-tvd / 2450) + 0.0022 * excessMpa;

    private static void LayBeds(WellPlan plan, FineGrid grid, int index, double[] shale, double[] porosity)
    {
        var formation = plan.Formations[index];
        var draws = new Draws(plan.Seed, formation.Name);
        var (top, bottom) = plan.Span(index);
        var i = Math.Clamp((int)Math.Ceiling((top - grid.Md[0]) / grid.Step), 0, grid.Md.Length);
        while (i < grid.Md.Length && (grid.Md[i] < bottom || index == plan.Formations.Count - 1))
        {
            var odd = draws.Uniform() < formation.OddShare;
            var thickness = Math.Clamp(formation.BedThickness * Math.Exp(0.75 * draws.Normal()) * (odd ? 0.5 : 1), 0.3, 18);
            var mean = odd ? formation.OddShale : formation.Shale + formation.ShaleTrend * ((grid.Md[i] - top) / (bottom - top) - 0.5);
            var level = mean + formation.ShaleSpread * draws.Normal();
            var pores = formation.Porosity + formation.PorositySpread * draws.Normal();
            var lean = formation.ShaleSpread * draws.Between(-2.5, 2.5);    // a bed grows shalier or sandier towards its base
            for (var start = i; i < grid.Md.Length && grid.Md[i] < bottom + grid.Step && (i - start) * grid.Step < thickness; i++)
            {
                shale[i] = level + lean * ((i - start) * grid.Step / thickness - 0.5);
                porosity[i] = pores;
            }
        }
    }
}

namespace SampleWell.Hidden;

/// <summary>The rock along the hole on the fine grid: what it is made of and how fast and heavy it is.</summary>
public sealed class RockColumn
{
    /// <summary>Draws the rock of a well.</summary>
    public RockColumn(WellPlan plan)
    {
        Grid = new FineGrid(plan);
        Excess = ExcessPressure.Along(plan, Grid);
        var beds = new Bedding(plan, Grid, Excess);
        (ShaleVolume, Porosity) = (beds.ShaleVolume, beds.Porosity);
        var count = Grid.Md.Length;
        (Vp, Vs, Density, Calcite) = (new double[count], new double[count], new double[count], new double[count]);
        var hard = Noise.Curve(new Draws(plan.Seed, "hard"), count, Grid.Step, 1.4, 0.009);
        var shear = Noise.Curve(new Draws(plan.Seed, "shear"), count, Grid.Step, 2.3, 0.011);
        for (var i = 0; i < count; i++)
            Calcite[i] = plan.Formations[plan.FormationAt(Grid.Md[i])].Calcite;
        Calcite = Noise.Resolve(Calcite, Grid.Step, 0.6);
        for (var i = 0; i < count; i++)
        {
            var clay = ClayInShale * ShaleVolume[i];
            var calcite = Calcite[i] * (1 - ShaleVolume[i]);
            var quartz = 1 - clay - calcite;
            var porosity = Porosity[i];
            var solid = 1 / (quartz / 5.70 + clay / 3.55 + calcite / 6.35);
            Vp[i] = 1000 * ((1 - porosity) * (1 - porosity) * solid + porosity * 1.6) * (1 + hard[i]);
            var ratio = 1.545 * quartz + 1.90 * clay + 1.86 * calcite + (0.45 + 0.75 * ShaleVolume[i]) * porosity;
            Vs[i] = Vp[i] / (ratio + shear[i]);
            Density[i] = (1 - porosity) * (2650 * quartz + 2770 * clay + 2710 * calcite) + porosity * plan.FluidDensity;
        }
    }

    /// <summary>Share of clay in shale; the rest is quartz silt.</summary>
    internal const double ClayInShale = 0.65;

    /// <summary>The depths of every column.</summary>
    public FineGrid Grid { get; }

    /// <summary>Pore pressure above hydrostatic, MPa.</summary>
    public double[] Excess { get; }

    /// <summary>Shale volume, fraction.</summary>
    public double[] ShaleVolume { get; }

    /// <summary>Total porosity, fraction.</summary>
    public double[] Porosity { get; }

    /// <summary>Share of calcite in the shale-free solid.</summary>
    public double[] Calcite { get; }

    /// <summary>Compressional velocity across the bedding, m/s.</summary>
    public double[] Vp { get; }

    /// <summary>Shear velocity across the bedding, m/s.</summary>
    public double[] Vs { get; }

    /// <summary>Bulk density, kg/m3.</summary>
    public double[] Density { get; }
}

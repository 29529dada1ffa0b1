namespace SampleWell.Hidden;

/// <summary>
/// The hidden truth of a well on the fine grid. Depths m, velocities m/s, density kg/m3, moduli GPa, strengths and stresses MPa,
/// angles degrees. Shale is stiffer along its bedding than across it; the velocities are those across it.
/// </summary>
public sealed class Truth
{
    private readonly double[] slip;

    /// <summary>Draws the truth of a well.</summary>
    public Truth(WellPlan plan)
    {
        Plan = plan;
        Rock = new RockColumn(plan);
        var count = Grid.Md.Length;
        (Pore, Biot, Strength) = (new double[count], new double[count], new double[count]);
        (DynamicVertical, StaticVertical, StaticHorizontal) = (new double[count], new double[count], new double[count]);
        (PoissonVertical, PoissonHorizontal) = (new double[count], new double[count]);
        (Shmin, Shmax) = (new double[count], new double[count]);
        Tvd = [.. Grid.Md.Select(plan.Path.Tvd)];
        Zone = [.. Grid.Md.Select(plan.FormationAt)];
        Sv = Overburden.Along(plan, Tvd, Rock.Density);
        slip = Noise.Curve(new Draws(plan.Seed, "static"), count, Grid.Step, 25, 0.045);
        var strength = Noise.Curve(new Draws(plan.Seed, "strength"), count, Grid.Step, 6, 0.035);
        var usual = Usual();
        for (var i = 0; i < count; i++)
        {
            var formation = plan.Formations[Zone[i]];
            Biot[i] = Laws.Biot(formation, Rock.Porosity[i], usual[Zone[i]]);
            Pore[i] = Physics.ColumnMpa(plan.FluidDensity, Tvd[i] - plan.WaterTvd) + Rock.Excess[i];
            AddRock(i, formation.Kind);
            Strength[i] = Laws.Strength(formation.Kind, Rock.Vp[i], StaticVertical[i]) * (1 + strength[i]);
        }
    }

    /// <summary>What was decided before the rock was drawn.</summary>
    public WellPlan Plan { get; }

    /// <summary>Composition, velocities and density.</summary>
    public RockColumn Rock { get; }

    /// <summary>The measured depths.</summary>
    public FineGrid Grid => Rock.Grid;

    /// <summary>True vertical depth below the datum.</summary>
    public double[] Tvd { get; }

    /// <summary>Index of the formation.</summary>
    public int[] Zone { get; }

    /// <summary>Overburden stress.</summary>
    public double[] Sv { get; }

    /// <summary>Pore pressure.</summary>
    public double[] Pore { get; }

    /// <summary>Biot's coefficient.</summary>
    public double[] Biot { get; }

    /// <summary>Dynamic Young's modulus across the bedding.</summary>
    public double[] DynamicVertical { get; }

    /// <summary>Static Young's modulus across the bedding.</summary>
    public double[] StaticVertical { get; }

    /// <summary>Static Young's modulus along the bedding.</summary>
    public double[] StaticHorizontal { get; }

    /// <summary>Poisson's ratio under vertical load, static and dynamic alike.</summary>
    public double[] PoissonVertical { get; }

    /// <summary>Poisson's ratio in the bedding plane, static and dynamic alike.</summary>
    public double[] PoissonHorizontal { get; }

    /// <summary>Unconfined strength.</summary>
    public double[] Strength { get; }

    /// <summary>Least horizontal stress.</summary>
    public double[] Shmin { get; }

    /// <summary>Greatest horizontal stress.</summary>
    public double[] Shmax { get; }

    private void AddRock(int i, RockKind kind)
    {
        var layered = Rock.ShaleVolume[i] * Rock.ShaleVolume[i];
        var (epsilon, gamma, delta) = Plan.Anisotropy;
        var moving = Elastic.FromVelocities(Rock.Vp[i], Rock.Vs[i], Rock.Density[i], epsilon * layered, gamma * layered, delta * layered);
        var still = moving.Static(e => Laws.Static(kind, e) * (1 + slip[i]));
        DynamicVertical[i] = moving.Vertical;
        StaticVertical[i] = still.Vertical;
        StaticHorizontal[i] = still.Horizontal;
        PoissonVertical[i] = still.PoissonVertical;
        PoissonHorizontal[i] = still.PoissonHorizontal;
        Shmin[i] = still.HorizontalStress(Sv[i], Pore[i], Biot[i], Plan.StrainMin, Plan.StrainMax);
        Shmax[i] = still.HorizontalStress(Sv[i], Pore[i], Biot[i], Plan.StrainMax, Plan.StrainMin);
    }

    private double[] Usual() =>
        [.. Plan.Formations.Select((_, zone) => Grid.Mean(Rock.Porosity, Plan.Span(zone).Top, Plan.Span(zone).Base))];
}

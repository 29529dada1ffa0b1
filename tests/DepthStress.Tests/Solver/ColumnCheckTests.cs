using DepthStress.Core.Layers;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Solver;

public class ColumnCheckTests
{
    // One rock over 400 m: by hand, C33 e = -Sv + C13 (e_h + e_H) + a p at every depth, so the top moves by 400 m times the strain in
    // the middle. E 17.55 GPa, nu 0.21875: lambda 5.6, G 7.2, so C33 20 and C13 5.6 GPa. Tolerance: rounding.
    [Fact]
    public void One_rock_shortens_by_its_mean_strain()
    {
        var setup = Setup with { Settings = Settings with { HorizontalStress = Strains } };
        var block = Assert.Single(ColumnCheck.Of(SolverColumn.Of(Layered(Run(setup, LogsWith()), AtMost(150)), SolverRock.Layered)!));
        var strain = ((-2500 * 9.80665 * 200) + (5.6e9 * 8e-4) + (0.8 * 1000 * 9.80665 * 200)) / 20e9;
        Assert.Equal((0, 400), (block.Top, block.Base));
        Assert.Equal(400 * strain, block.Displacement, 1e-12);
        Assert.InRange(block.Residual, 0, 1e-12);
        Assert.InRange(block.Stress, 0, 1e-9);
    }

    [Fact]
    public void The_sample_wells_column_is_in_balance()
    {
        foreach (var rock in Enum.GetValues<SolverRock>())
        {
            var block = Assert.Single(ColumnCheck.Of(SolverColumn.Of(SampleColumn.Table, rock)!));
            Assert.InRange(block.Residual, 0, 1e-12); // rounding of some seventy elements
            Assert.InRange(block.Stress, 0, 1e-12);
            Assert.InRange(block.Displacement, -100, 0);
        }
    }
}

using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
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

    // The same rock by hand: C13/C33 (Sv - a p) + a p + (C11 - C13^2/C33) e + (C12 - C13^2/C33) e', at the middle of each layer; all is linear in depth.
    [Fact]
    public void Horizontal_stresses_follow_from_the_strain_that_is_found()
    {
        var setup = Setup with { Settings = Settings with { HorizontalStress = Strains } };
        var table = Layered(Run(setup, LogsWith()), AtMost(150));
        var blocks = ColumnCheck.Of(SolverColumn.Of(table, SolverRock.Layered)!);
        var (along, across) = (table.Strains.AlongShmin, table.Strains.AlongShmax);
        Assert.Equal((2e-4, 6e-4), (along, across));
        foreach (var solved in blocks.SelectMany(b => b.Layers))
        {
            var layer = table.Layers.Single(l => l.Number == solved.Number);
            var middle = (layer.TopTvd + layer.BaseTvd) / 2;
            var (sv, pore) = (2500 * 9.80665 * middle, 1000 * 9.80665 * middle);
            double Horizontal(double e, double other) => (0.28 * (sv - (0.8 * pore))) + (0.8 * pore) + ((20e9 - (5.6e9 * 0.28)) * e) + ((5.6e9 - (5.6e9 * 0.28)) * other);
            Assert.Equal(sv, solved.Vertical, 1e-3);
            Assert.Equal(Horizontal(along, across), solved.Shmin, 1e-3);
            Assert.Equal(Horizontal(across, along), solved.Shmax, 1e-3);
            Assert.InRange(solved.FormulaError, 0, 1e-12);
        }
    }

    [Fact]
    public void The_loop_names_the_worst_layer_and_stress()
    {
        var table = SampleColumn.Table;
        var loop = ClosedLoop.Of(table, ColumnCheck.Of(SolverColumn.Of(table, SolverRock.Isotropic)!));
        Assert.Equal(loop.Layers.Max(l => l.Solved.FormulaError), loop.Formula.Share);
        var shares = loop.Layers.SelectMany(l => new[]
        {
            (l.Layer.Number, "Sv", l.Vertical / l.Layer.Profile(Property.VerticalStress).Mean, l.Vertical),
            (l.Layer.Number, "Shmin", l.Shmin / l.Layer.Profile(Property.MinHorizontalStress).Mean, l.Shmin),
            (l.Layer.Number, "SHmax", l.Shmax / l.Layer.Profile(Property.MaxHorizontalStress).Mean, l.Shmax),
        }).OrderByDescending(s => Math.Abs(s.Item3)).ToList();
        Assert.Equal((shares[0].Number, shares[0].Item2, Math.Abs(shares[0].Item3), shares[0].Item4), (loop.Profile.Layer, loop.Profile.Stress, loop.Profile.Share, loop.Profile.Pressure));
        Assert.InRange(loop.Profile.Share, 1e-6, 0.005);
    }
}

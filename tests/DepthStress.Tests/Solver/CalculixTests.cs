using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Stress;
using DepthStress.Files.Writing;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Solver;

/// <summary>The decks solved by CalculiX, an open-source finite-element program that nobody here made (Debian package calculix-ccx).</summary>
public class CalculixTests(Xunit.Abstractions.ITestOutputHelper output)
{
    /// <summary>What the solver prints has seven digits.</summary>
    private const double Printed = 1e-6;

    private static WellSetup Strained => Setup with { Settings = Settings with { HorizontalStress = Strains } };

    private void Check(LayerTable table, WellSetup setup, LayerSettings settings, DeckStart start)
    {
        var column = SolverColumn.Of(table, settings.Deck.Value)!;
        var run = CalculixRun.Of(SampleColumn.Deck(table, setup, settings, start));
        var loop = CalculixLoop.Of(table, column, run, settings);
        output.WriteLine($"{settings.Deck.Value}, {start}: {loop}");
        Assert.InRange(loop.Formula.Share, 0, Printed);
        Assert.True(loop.WithinProfile, loop.ToString());
        // The program's own elements, which make the report's numbers, find what CalculiX finds.
        var own = ClosedLoop.Of(table, ColumnCheck.Of(column));
        Assert.Equal(loop.Profile.Share, own.Profile.Share, 2 * Printed);
        var moved = ColumnCheck.Of(column).Select(b => start == DeckStart.FromLoads ? b.Displacement : 0).ToList();
        var nodes = run.TopDisplacements.Count / moved.Count;
        for (var k = 0; k < run.TopDisplacements.Count; k++) Assert.Equal(moved[k / nodes], run.TopDisplacements[k], Printed * (Math.Abs(moved[k / nodes]) + 1e-3));
    }

    [SolverTheory]
    [InlineData(SolverRock.Isotropic, DeckStart.FromLoads, 1, 1)]
    [InlineData(SolverRock.Isotropic, DeckStart.Balanced, 1, 1)]
    [InlineData(SolverRock.Layered, DeckStart.FromLoads, 1, 1)]
    [InlineData(SolverRock.Layered, DeckStart.Balanced, 1, 1)]
    [InlineData(SolverRock.Layered, DeckStart.FromLoads, 3, 2)]
    public void The_sample_wells_deck_carries_the_stresses_of_its_layers_and_of_its_profile(SolverRock rock, DeckStart start, int nx, int ny) =>
        Check(SampleColumn.Table, SampleColumn.Model.Setup, SampleColumn.Settings(rock, nx, ny), start);

    // Strains of a zone's own, a stress ratio, heat: initial stress closes the gap to the one pair of strains.
    [SolverTheory]
    [InlineData(DeckStart.FromLoads)]
    [InlineData(DeckStart.Balanced)]
    public void Stress_that_one_pair_of_strains_does_not_give_is_there_too(DeckStart start)
    {
        var own = new StageSettings { HorizontalStress = new HorizontalStressSettings { StrainAlongShmin = Chosen(5e-4) } };
        var ratio = new StageSettings { HorizontalStress = new HorizontalStressSettings { Method = Chosen(HorizontalStressMethod.EffectiveStressRatio), Ratio = Chosen(0.6), RatioShmax = Chosen(0.9) } };
        var setup = Strained with { Zones = [Of("A", 0, new StageSettings()), Of("B", 200, own), Of("C", 300, ratio)] };
        var table = Layered(Run(setup, Fine(_ => 2400)), AtMost(60));
        Assert.Contains(table.Layers, l => l.Medium!.ClosingShmin != 0);
        Check(table, setup, new LayerSettings(), start);
    }

    [SolverTheory]
    [InlineData(DeckStart.FromLoads)]
    [InlineData(DeckStart.Balanced)]
    public void Layers_without_values_part_the_column_and_what_lies_below_keeps_its_stress(DeckStart start)
    {
        var setup = Strained with { Zones = [Of("A", 0, new StageSettings()), Of("B", 150, new StageSettings()), Of("C", 250, new StageSettings())] };
        var table = Layered(Run(setup, Fine(depth => depth is >= 150 and < 250 ? double.NaN : 2400)), AtMost(60));
        var column = SolverColumn.Of(table, SolverRock.Isotropic)!;
        Assert.Equal(2, column.Blocks.Count);
        Check(table, setup, new LayerSettings(), start);
    }

    // Held sides and a free top: a drop of pore pressure changes the horizontal stress by (a_h - a_v C13/C33) dp (identity).
    [SolverTheory]
    [InlineData(SolverRock.Isotropic)]
    [InlineData(SolverRock.Layered)]
    public void A_drop_of_pressure_loads_the_balanced_deck_further(SolverRock rock)
    {
        const double Drop = 5; // MPa
        var settings = SampleColumn.Settings(rock);
        var deck = SampleColumn.Deck(SampleColumn.Table, SampleColumn.Model.Setup, settings, DeckStart.Balanced);
        var pressures = deck.Split("*INITIAL CONDITIONS, TYPE=TEMPERATURE\n")[1].Split('*')[0].Split('\n', StringSplitOptions.RemoveEmptyEntries)
            .Select(l => l.Split(", ")).Select(p => $"{p[0]}, {DeckNumber(double.Parse(p[1], System.Globalization.CultureInfo.InvariantCulture) - Drop)}");
        var before = CalculixRun.Of(deck).Elements;
        var after = CalculixRun.Of(deck.Replace("*DLOAD\n", "*TEMPERATURE\n" + string.Join('\n', pressures) + "\n*DLOAD\n", StringComparison.Ordinal)).Elements;
        var layers = SolverColumn.Of(SampleColumn.Table, rock)!.Layers.SelectMany(l => Enumerable.Repeat(l, 4)).ToList();
        for (var k = 0; k < layers.Count; k++)
        {
            var r = layers[k].Rock;
            var change = (r.BiotHorizontal - (r.BiotVertical * r.Stiffness.StressRatio)) * Drop * 1e6;
            Assert.Equal(change, after[k].Along2 - before[k].Along2, 100.0); // seven printed digits of two stresses of up to 70 MPa
            Assert.Equal(before[k].Vertical, after[k].Vertical, 100.0);
        }
    }

    private static string DeckNumber(double value) => value.ToString("R", System.Globalization.CultureInfo.InvariantCulture);

    private static Zone Of(string name, double top, StageSettings settings) => new(name, top, null, DepthKind.Measured, settings, WellFile);

    /// <summary>Samples every 2 m down to 400 m, the shear velocity a function of depth.</summary>
    private static LogTable Fine(Func<double, double> shear)
    {
        double[] depths = [.. Enumerable.Range(0, 201).Select(i => 2.0 * i)];
        var n = depths.Length;
        return Table(depths, Curve(Property.Vp, Same(4000, n)), Curve(Property.Vs, [.. depths.Select(shear)]), Curve(Property.Density, Same(2500, n)));
    }
}

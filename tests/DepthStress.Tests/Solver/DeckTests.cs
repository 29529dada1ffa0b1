using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Writing;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Solver;

public class DeckTests
{
    private static readonly WellSetup Strained = Setup with { Settings = Settings with { HorizontalStress = Strains with { ShmaxAzimuth = Chosen(Math.PI / 3) } } };

    [Theory]
    [InlineData(SolverRock.Isotropic, DeckStart.FromLoads, "column.inp")]
    [InlineData(SolverRock.Layered, DeckStart.Balanced, "column-balanced.inp")]
    public void The_deck_of_a_small_well_is_as_agreed(SolverRock rock, DeckStart start, string golden) =>
        Golden.Match(golden, SampleColumn.Deck(Layered(Run(Strained, LogsWith()), AtMost(250)), Strained, new LayerSettings { Deck = Chosen(rock) }, start));

    [Fact]
    public void Every_number_of_a_deck_fits_what_the_solver_reads()
    {
        foreach (var start in Enum.GetValues<DeckStart>())
        {
            var deck = SampleColumn.Deck(SampleColumn.Table, SampleColumn.Model.Setup, SampleColumn.Settings(SolverRock.Layered, 2, 2), start);
            foreach (var line in deck.Split('\n').Where(l => l.Length > 0 && l[0] != '*'))
                Assert.All(line.Split(','), word => Assert.InRange(word.Trim().Length, 0, 20));
            Assert.All(deck, c => Assert.True(c is '\n' or (>= ' ' and <= '~')));
            Assert.DoesNotContain("NaN", deck, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_deck_carries_the_caution_and_the_azimuth()
    {
        var words = SampleColumn.Deck(Layered(Run(Strained, LogsWith()), new LayerSettings()), Strained, new LayerSettings(), DeckStart.FromLoads).ReplaceLineEndings("").Replace("**", "", StringComparison.Ordinal);
        Assert.Contains(Caution.Text, words, StringComparison.Ordinal);
        Assert.Contains("Total stresses by the thermal analogy, linear elasticity only.", words, StringComparison.Ordinal);
        Assert.Contains("Axis 1 runs along SHmax, 60.000 degrees", words, StringComparison.Ordinal);
    }

    [Fact]
    public void Without_rock_there_is_no_column()
    {
        var table = Layered(Run(Curve(Core.Logs.Property.Vs, Same(double.NaN))), new LayerSettings());
        Assert.Null(SolverColumn.Of(table, SolverRock.Isotropic));
        Assert.Contains(table.Findings, f => f.Text.Format.Contains("are not written", StringComparison.Ordinal));
    }

    [Fact]
    public void A_fraction_of_an_element_is_refused()
    {
        var diagnostics = new DiagnosticBag();
        LayerCheck.Report(new LayerSettings { ElementsAlongShmax = Chosen(1.5) }, diagnostics);
        Assert.Equal("well.toml(5,1): error: [layers]: found a fraction, expected nx = a whole number", Assert.Single(diagnostics.Items).ToString());
    }
}

using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Tests.Cli;
using SampleWell.Twins;

namespace DepthStress.Tests.Recovery;

/// <summary>
/// From an unspoilt well of known rock the program must find the numbers that made it. The truth comes from the sample well's own
/// formulas, which share no code with the program.
/// </summary>
public sealed class TwinRecoveryTests : IDisposable
{
    /// <summary>Relative: the logs carry ten digits, and moduli lose two of them.</summary>
    private const double Exact = 1e-7;

    /// <summary>
    /// Relative: Sv is a sum over trapezia in a hole that turns, where the program's vertical depths come from survey stations and
    /// the truth's from the path itself.
    /// </summary>
    private const double Integrated = 1e-4;

    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Theory]
    [InlineData(3_000, 1, false)]
    [InlineData(15_000, 1, false)]
    [InlineData(3_000, 5, false)]
    [InlineData(3_000, 1, true)]
    public void The_chain_returns_the_hidden_truth(int samples, ulong seed, bool offshore)
    {
        var truth = offshore ? Twin.WriteOffshore(_cli.Folder.Path, samples, seed) : Twin.Write(_cli.Folder.Path, samples, seed);
        var diagnostics = new DiagnosticBag();
        var well = WellFileReader.Read(truth.WellFile, diagnostics)!;
        var model = Chain.Run(well.Setup, LogIngest.Read(well, diagnostics)!.Logs, diagnostics)!;
        Assert.Empty(diagnostics.Items);
        Assert.Equal(samples, model.Count);

        Compare(truth.Md, Property.MeasuredDepth, 1, Exact);
        Compare(truth.Tvd, Property.TrueVerticalDepth, 1, Integrated);
        Compare(truth.YoungsDynamic, Property.YoungsDynamic, 1e9, Exact);
        Compare(truth.Poisson, Property.PoissonDynamic, 1, Exact);
        Compare(truth.YoungsStatic, Property.YoungsStatic, 1e9, Exact);
        Compare(truth.Poisson, Property.PoissonStatic, 1, Exact);
        Compare(truth.Sv, Property.VerticalStress, 1e6, Integrated);
        Compare(truth.Pp, Property.PorePressure, 1e6, Integrated);
        Compare(truth.Shmin, Property.MinHorizontalStress, 1e6, Integrated);
        Compare(truth.Shmax, Property.MaxHorizontalStress, 1e6, Integrated);
        Assert.Equal(truth.Zone.Select(z => truth.Zones[z].Name), Enumerable.Range(0, samples).Select(i => model.ZoneName(model.Zones[i])));
        Assert.All(model.StressBasis, b => Assert.Equal(SampleOrigin.Measured, b));

        void Compare(double[] expected, Property property, double unit, double tolerance)
        {
            var found = model.Values.Read(property);
            for (var i = 0; i < samples; i++) Assert.Equal(expected[i], found[i] / unit, tolerance * Math.Abs(expected[i]));
        }
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public async Task The_table_of_a_whole_run_returns_the_hidden_truth(bool field)
    {
        var truth = Twin.Write(_cli.Folder.Path, 3_000, 1);
        if (field) await File.AppendAllTextAsync(truth.WellFile, "[output]\nunits = \"field\"\n");
        Assert.Equal(0, (await _cli.RunAsync("run", "twin.toml")).Code);

        var lines = _cli.Folder.Read("twin-results/depth.csv").Split('\n', StringSplitOptions.RemoveEmptyEntries).SkipWhile(l => l[0] == '#').ToArray();
        var names = lines[0].Split(',');
        var rows = lines[1..].Select(l => l.Split(',')).ToArray();
        Assert.Equal(3_000, rows.Length);

        // Factors as defined: 1 ft = 0.3048 m, 1 psi = 6894.757293168 Pa.
        var (length, stress, modulus) = field ? (0.3048, 6894.757293168e-6, 6.894757293168) : (1.0, 1.0, 1.0);
        Compare(truth.Md, field ? "md_ft" : "md_m", length);
        Compare(truth.Density, "density_g_cm3", 1);
        Compare(truth.YoungsDynamic, field ? "youngs_dynamic_mpsi" : "youngs_dynamic_gpa", modulus);
        Compare(truth.YoungsStatic, field ? "youngs_static_mpsi" : "youngs_static_gpa", modulus);
        Compare(truth.Poisson, "poisson_static", 1);
        Compare(truth.Sv, field ? "sv_psi" : "sv_mpa", stress);
        Compare(truth.Pp, field ? "pp_psi" : "pp_mpa", stress);
        Compare(truth.Shmin, field ? "shmin_psi" : "shmin_mpa", stress);
        Compare(truth.Shmax, field ? "shmax_psi" : "shmax_mpa", stress);

        void Compare(double[] expected, string column, double unit)
        {
            var index = Array.IndexOf(names, column);
            Assert.True(index >= 0, column);
            for (var i = 0; i < rows.Length; i++)
            {
                var cell = rows[i][index];
                var digit = unit * Math.Pow(10, -(cell.Length - 1 - cell.IndexOf('.', StringComparison.Ordinal)));
                Assert.Equal(expected[i], double.Parse(cell, CultureInfo.InvariantCulture) * unit, Integrated * Math.Abs(expected[i]) + digit); // and the last digit written
            }
        }
    }
}

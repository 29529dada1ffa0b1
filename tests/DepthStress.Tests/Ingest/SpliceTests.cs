using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

/// <summary>Runs joined at stated depths, and files brought onto one set of depths.</summary>
public sealed class SpliceTests
{
    private const string TwoRuns = "gamma_ray = [{ column = \"GR\", file = \"a.csv\", base = \"1002 m\" }, { column = \"GR\", file = \"b.csv\" }]";

    [Fact]
    public void Two_runs_join_at_the_base_of_the_first()
    {
        var (logs, messages) = Ingesting.Two(Ingesting.Csv("GR[gAPI]", 1000, 1, 50, 51, 52, 53), Ingesting.Csv("GR[gAPI]", 1001, 1, 61, 62, 63, 64), TwoRuns);
        Assert.Empty(messages);
        Assert.Equal([1000, 1001, 1002, 1003, 1004], logs!.Depths);
        Assert.Equal([50, 51, 52, 63, 64], logs[Property.GammaRay]!.Values); // a sample at the base belongs to the run above
        Assert.Equal(["0-3 Spliced GR in a.csv", "3-5 Spliced GR in b.csv"], logs[Property.GammaRay]!.Origins());
        Assert.Equal("GR in a.csv, GR in b.csv", logs[Property.GammaRay]!.Source);
    }

    [Theory]
    [InlineData("1001.999 m", 2)]
    [InlineData("1002 m", 3)]
    [InlineData("1002.5 m", 3)]
    [InlineData("999 m", 0)]
    [InlineData("5000 m", 4)]
    public void The_base_decides_how_many_samples_the_upper_run_gives(string depth, int upper)
    {
        var (logs, _) = Ingesting.Two(
            Ingesting.Csv("GR[gAPI]", 1000, 1, 50, 50, 50, 50), Ingesting.Csv("GR[gAPI]", 1000, 1, 60, 60, 60, 60), TwoRuns.Replace("1002 m", depth, StringComparison.Ordinal));
        Assert.Equal(upper, logs![Property.GammaRay]!.Values.Count(v => v == 50));
        Assert.Equal(4 - upper, logs[Property.GammaRay]!.Values.Count(v => v == 60));
    }

    [Fact]
    public void Three_runs_join()
    {
        var (logs, messages) = Ingesting.One(
            "DEPT[m],G1[gAPI],G2[gAPI],G3[gAPI]\n1000,50,60,70\n1001,50,60,70\n1002,50,60,70\n1003,50,60,-999.25\n",
            "gamma_ray = [{ column = \"G1\", base = \"1000 m\" }, { column = \"G2\", base = \"1001 m\" }, { column = \"G3\" }]");
        Assert.Empty(messages);
        Assert.Equal([50, 60, 70, double.NaN], logs![Property.GammaRay]!.Values);
        Assert.Equal(["0-1 Spliced G1 in a.csv", "1-2 Spliced G2 in a.csv", "2-3 Spliced G3 in a.csv", "3-4 None"], logs[Property.GammaRay]!.Origins());
    }

    [Fact]
    public void Below_the_base_of_the_last_run_there_is_nothing()
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv("GR[gAPI]", 1000, 1, 50, 51, 52), "gamma_ray = { column = \"GR\", base = \"1001 m\" }");
        Assert.Empty(messages);
        Assert.Equal([50, 51, double.NaN], logs![Property.GammaRay]!.Values);
        Assert.Equal(["0-2 Measured GR in a.csv", "2-3 None"], logs[Property.GammaRay]!.Origins());
    }

    [Theory]
    [InlineData(
        "gamma_ray = [{ column = \"G1\", base = \"1002 m\" }, { column = \"G2\", base = \"1001 m\" }]",
        "well.toml(28,74): error: gamma_ray: expected the splice depths in increasing order")]
    [InlineData("gamma_ray = [\"G1\", \"G2\"]", "well.toml(28,14): error: gamma_ray: expected base = the measured depth where the next column takes over")]
    public void Runs_need_splice_depths_in_order(string curves, string expected) => Assert.Equal(
        [expected], Ingesting.One("DEPT[m],G1[gAPI],G2[gAPI]\n1000,50,60\n1001,50,60\n", curves).Messages);

    [Fact]
    public void Files_with_the_same_depths_are_merged_as_they_are()
    {
        var (logs, messages) = Ingesting.Two(Ingesting.Csv("GR[gAPI]", 1000, 0.1524, 50, 51, 52), Ingesting.Csv("RD[ohm.m]", 1000, 0.1524, 2, 3, 4));
        Assert.Empty(messages);
        Assert.Equal([2, 3, 4], logs![Property.DeepResistivity]!.Values);
        Assert.Equal(["0-3 Measured RD in b.csv"], logs[Property.DeepResistivity]!.Origins());
    }

    [Fact]
    public void A_file_that_reaches_further_extends_the_depths()
    {
        var (logs, messages) = Ingesting.Two(Ingesting.Csv("GR[gAPI]", 1001, 1, 50, 51), Ingesting.Csv("RD[ohm.m]", 999, 1, 1, 2, 3, 4, 5));
        Assert.Empty(messages);
        Assert.Equal([999, 1000, 1001, 1002, 1003], logs!.Depths);
        Assert.Equal([double.NaN, double.NaN, 50, 51, double.NaN], logs[Property.GammaRay]!.Values);
        Assert.Equal([1, 2, 3, 4, 5], logs[Property.DeepResistivity]!.Values);
    }

    [Fact]
    public void Another_step_is_brought_onto_the_first_files_depths_and_marked()
    {
        // The second file has a gap from 1002 to 1005: nothing is drawn across it.
        var (logs, messages) = Ingesting.Two(
            Ingesting.Csv("GR[gAPI]", 1000, 0.5, Enumerable.Repeat(50.0, 13)), "DEPT[m],RD[ohm.m]\n1000,2\n1001,4\n1002,6\n1005,8\n1006,-999.25\n");
        Assert.Equal(["b.csv(1,9): note: deep_resistivity: 2 samples were brought onto the depths of the first file by a straight line"], messages);
        var n = double.NaN;
        Assert.Equal([2, 3, 4, 5, 6, n, n, n, n, n, 8, n, n], logs![Property.DeepResistivity]!.Values);
        Assert.Equal(
            [
                "0-1 Measured RD in b.csv", "1-2 Edited brought onto the depths of the first file by a straight line", "2-3 Measured RD in b.csv",
                "3-4 Edited brought onto the depths of the first file by a straight line", "4-5 Measured RD in b.csv", "5-10 None", "10-11 Measured RD in b.csv", "11-13 None",
            ],
            logs[Property.DeepResistivity]!.Origins());
    }

    [Fact]
    public void What_a_base_cuts_off_is_not_marked_as_edited()
    {
        var (logs, messages) = Ingesting.Two(
            Ingesting.Csv("GR[gAPI]", 1000, 0.5, Enumerable.Repeat(50.0, 5)), Ingesting.Csv("RD[ohm.m]", 1000, 1, 2, 4, 6),
            "deep_resistivity = { column = \"RD\", base = \"1001 m\" }");
        Assert.Equal(["b.csv(1,9): note: deep_resistivity: 1 samples were brought onto the depths of the first file by a straight line"], messages);
        Assert.Equal("3-5 None", logs![Property.DeepResistivity]!.Origins()[^1]);
    }
}

using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

/// <summary>Which column serves which role.</summary>
public sealed class RoleTests
{
    [Fact]
    public void Usual_names_find_their_roles_whatever_their_case()
    {
        var (logs, messages) = Ingesting.One("Dept[m],dtco[us/ft],DTSM[us/ft],rhoz[g/cm3],GR[gAPI],Odd\n1000,100,200,2.4,60,1\n1001,100,200,2.4,60,1\n");
        Assert.Empty(messages);
        Assert.Equal(["compressional", "shear", "density", "gamma_ray"], logs!.Curves.Select(c => c.Role.Id));
        Assert.Equal("dtco in a.csv", logs[Property.Vp]!.Source);
    }

    [Fact]
    public void The_well_files_word_goes_before_the_usual_name()
    {
        var (logs, messages) = Ingesting.One("DEPT[m],DTC[us/ft],DTC_EDIT[us/ft]\n1000,100,80\n1001,100,80\n", "compressional = \"DTC_EDIT\"");
        Assert.Empty(messages);
        Assert.Equal("DTC_EDIT in a.csv", logs![Property.Vp]!.Source);
    }

    [Fact]
    public void Two_columns_of_one_file_for_a_role_need_a_word() => Assert.Equal(
        ["a.csv(1,20): error: found 2 columns for the role compressional (DTC in a.csv, DT in a.csv); expected one, or their order in [logs.curves]: compressional = \"DTC\""],
        Ingesting.One("DEPT[m],DTC[us/ft],DT[us/ft]\n1000,100,100\n").Messages);

    [Fact]
    public void The_same_column_in_two_files_needs_an_order() => Assert.Equal(
        ["b.csv(1,9): error: found 2 columns for the role gamma_ray (GR in a.csv, GR in b.csv); expected one, or their order in [logs.curves]: gamma_ray = [{ column = \"GR\", file = \"a.csv\", base = \"1234 m\" }, { column = \"GR\", file = \"b.csv\" }]"],
        Ingesting.Two(Ingesting.Csv("GR[gAPI]", 1000, 1, 50), Ingesting.Csv("GR[gAPI]", 1001, 1, 60)).Messages);

    [Theory]
    [InlineData(
        "gamma_ray = \"GRR\"",
        "well.toml(28,13): error: gamma_ray: found no column \"GRR\"; the files have DEPT, GR, RD; did you mean \"GR\"?")]
    [InlineData(
        "gamma_ray = { column = \"GR\", file = \"c.csv\" }",
        "well.toml(28,37): error: gamma_ray: found the file \"c.csv\", expected one of [logs] files: a.csv, b.csv; did you mean \"a.csv\"?")]
    [InlineData("gamma_ray = { unit = \"gAPI\" }", "well.toml(28,13): error: gamma_ray: expected column = the name of a column")]
    [InlineData("gamma_ray = \"GR\"\nshale_volume = { column = \"GR\", unit = \"v/v\" }",
        "well.toml(29,27): error: found the column \"GR\" for gamma_ray and shale_volume, expected a column of its own for each role")]
    public void A_stated_column_must_be_there_and_serve_one_role(string curves, string expected) => Assert.Contains(
        expected,
        Ingesting.Two(Ingesting.Csv("GR[gAPI]", 1000, 1, 50), Ingesting.Csv("RD[ohm.m]", 1000, 1, 2), curves).Messages);

    [Fact]
    public void A_column_that_two_files_have_needs_its_file()
    {
        var (a, b) = (Ingesting.Csv("GR[gAPI]", 1000, 1, 50, 51), Ingesting.Csv("GR[gAPI]", 1000, 1, 60, 61));
        Assert.Equal(
            ["well.toml(28,13): error: gamma_ray: found the column \"GR\" in a.csv and b.csv; expected file = one of them, or both in order with base depths"],
            Ingesting.Two(a, b, "gamma_ray = \"GR\"").Messages);
        Assert.Equal([60, 61], Ingesting.Two(a, b, "gamma_ray = { column = \"GR\", file = \"b.csv\" }").Logs![Property.GammaRay]!.Values);
    }

    [Fact]
    public void The_depth_column_and_its_unit_can_be_named()
    {
        var (logs, messages) = Ingesting.One("GR[gAPI],ALONG\n50,100\n51,200\n", "depth = { column = \"ALONG\", unit = \"ft\" }");
        Assert.Empty(messages);
        Assert.Equal(30.48, logs!.Depths[0], 1e-12); // 100 ft of 0.3048 m, exact by definition
        Assert.Equal(60.96, logs.Depths[1], 1e-12);
    }

    [Theory]
    [InlineData(
        "", "a.csv(1,1): error: depth column DEPT: found no unit, expected one of m, ft, in, mm, cm; state it in [logs.curves]: depth = { column = \"DEPT\", unit = \"m\" }")]
    [InlineData(
        "depth = { column = \"DEPT\", unit = \"psi\" }",
        "well.toml(28,35): error: depth column DEPT: found the unit \"psi\", expected one of m, ft, in, mm, cm; state it in [logs.curves]: depth = { column = \"DEPT\", unit = \"m\" }")]
    [InlineData("depth = \"DEPTHS\"", "a.csv: error: found no column \"DEPTHS\", expected it as depth; did you mean \"DEPT\"?")]
    public void Depth_needs_a_unit_and_a_column(string curves, string expected) =>
        Assert.Equal([expected], Ingesting.One("DEPT,GR[gAPI]\n1000,50\n1001,50\n", curves).Messages);

    [Fact]
    public void Depth_is_one_column() => Assert.Equal(
        ["well.toml(28,18): error: found a second column for depth, expected one: every file is read with it"],
        Ingesting.One("DEPT[m],MD[m],GR[gAPI]\n1000,1000,50\n", "depth = [\"DEPT\", \"MD\"]").Messages);

    [Fact]
    public void Depth_has_no_splice() => Assert.Equal(
        ["well.toml(28,28): error: found the unknown key \"base\" in depth, expected one of column, unit"],
        Ingesting.One("DEPT[m],GR[gAPI]\n1000,50\n", "depth = { column = \"DEPT\", base = \"3 m\" }").Messages[..1]);
}

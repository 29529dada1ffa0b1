using DepthStress.Core.Model;

namespace DepthStress.Tests.WellFiles;

public class CoreFileTests
{
    private const string Section = "[core]\nfiles = \"core.csv\"\n";

    private static (IReadOnlyList<CorePlug> Plugs, string[] Messages) Read(string table)
    {
        var (well, messages) = WellText.Read(WellText.Sound + Section, ("core.csv", table));
        return (well!.Setup.Core.Plugs, messages);
    }

    // Tolerance: rounding of unit conversions.
    [Fact]
    public void Units_stand_in_the_cells_or_in_the_header()
    {
        var (plugs, messages) = Read("Depth (ft),Orientation,Confining pressure (MPa),Youngs modulus,Poisson's ratio,UCS_psi\n1000,V,0,2 Mpsi,0.25,5000\n1001,30 deg,8,20 GPa,,\n");
        Assert.Empty(messages);
        Assert.Equal(304.8, plugs[0].Depth, 1e-9);
        Assert.Equal(2e6 * 6894.757293168361, plugs[0].YoungsStatic, 1);
        Assert.Equal(5000 * 6894.757293168361, plugs[0].Ucs, 1e-3);
        Assert.Equal((PlugOrientation.Vertical, 0.0, 0.25), (plugs[0].Orientation, plugs[0].ConfiningPressure, plugs[0].PoissonStatic));
        Assert.Equal((PlugOrientation.Inclined, 8e6), (plugs[1].Orientation, plugs[1].ConfiningPressure));
        Assert.Equal(Math.PI / 6, plugs[1].AngleToBedding, 1e-12);
        Assert.True(double.IsNaN(plugs[1].PoissonStatic) && double.IsNaN(plugs[1].Ucs));
    }

    [Fact]
    public void A_strength_under_pressure_is_no_UCS()
    {
        var (plugs, messages) = Read("depth_m,confining_pressure_mpa,strength_mpa\n1000,0,60\n1001,10,95\n");
        Assert.Equal(60e6, plugs[0].Ucs, 1e-6);
        Assert.True(double.IsNaN(plugs[1].Ucs));
        Assert.Equal(["core.csv(3,9): note: strength: not compared with UCS, which takes a confining pressure of zero"], messages);
    }

    [Fact]
    public void Every_bad_cell_is_reported_with_its_place()
    {
        var (plugs, messages) = Read("depth_m,orientation,confining_pressure,youngs_static,poisson_static,ucs\n,diagonal,-1 MPa,12,0.7,5 GPA/m\n1001,vertical,8 MPa,13 GPa,0.2,50 MPa\n");
        Assert.Single(plugs);
        Assert.Equal(6, messages.Length);
        Assert.All(messages, m => Assert.Matches(@"^core\.csv\(2,\d+\): error: (depth|orientation|confining_pressure|youngs_static|poisson_static|ucs): found ", m));
        Assert.Contains("core.csv(2,2): error: orientation: found \"diagonal\", expected \"vertical\", \"horizontal\" or degrees to the bedding such as \"45 deg\"", messages);
    }

    [Theory]
    [InlineData("plug,ucs_mpa\n1,50\n", "found no column for depth, expected one named depth, md, measured_depth, core_depth")]
    [InlineData("depth_m,md_m,ucs_mpa\n1,1,50\n", "found a second column for depth, expected one")]
    [InlineData("depth_psi,ucs_mpa\n1,50\n", "column depth: found the unit \"psi\", expected one of m, ft, in, mm, cm")]
    public void A_header_that_cannot_be_used_is_refused(string table, string message)
    {
        var (plugs, messages) = Read(table);
        Assert.Empty(plugs);
        Assert.Contains(messages, m => m.StartsWith("core.csv(1", StringComparison.Ordinal) && m.Contains(message, StringComparison.Ordinal));
    }

    [Fact]
    public void A_missing_file_is_an_error()
    {
        var (_, messages) = WellText.Read(WellText.Sound + Section);
        Assert.Contains(messages, m => m.StartsWith("core.csv: error: ", StringComparison.Ordinal));
    }

    [Fact]
    public void A_shift_without_files_is_an_error() => Assert.Equal(
        ["well.toml(28,15): error: [core] files is not set; expected the names of the tables of plugs"],
        WellText.Messages(WellText.Sound + "[core]\ndepth_shift = \"1 m\"\n"));
}

using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Layers;

/// <summary>What the [layers] section says, and what is said of it.</summary>
public sealed class LayerSettingTests
{
    [Fact]
    public void Every_key_is_read()
    {
        var (well, messages) = WellText.Read(WellText.Sound + """
            [layers]
            cut = "change of properties"
            count = 12
            min_thickness = "10 ft"
            max_thickness = "100 m"
            boundaries = ["1000.7 m", "3285 ft"]
            depth_kind = "md"
            curves = ["gamma_ray", "pp"]
            resolution = "2 ft"
            largest_missing_share = 0.25
            barrier_contrast = "2 MPa"
            """);
        Assert.DoesNotContain(messages, m => m.Contains("[layers]", StringComparison.Ordinal));
        var layers = well!.Sections.Layers;
        Assert.Equal((LayerCut.ChangeOfProperties, 12, DepthKind.Measured), (layers.Cut.Value, layers.Count.Value, layers.DepthKind.Value));
        Assert.Equal(new ThicknessLimits(3.048, 100), layers.Limits); // 10 ft of 0.3048 m, exact by definition
        Assert.Equal([1000.7, 1001.268], layers.Boundaries.Value, (a, b) => Math.Abs(a - b) < 1e-9); // rounding of 3285 x 0.3048
        Assert.Equal(["gamma_ray", "pp"], layers.Curves.Value);
        Assert.Equal((0.6096, 0.25, 2e6), (layers.Resolution.Value, layers.LargestMissingShare.Value, layers.BarrierContrast.Value));
    }

    [Theory]
    [InlineData("count = 3", "(28,9): error: [layers]: found count with one layer per zone, expected cut = \"equal thickness\" or \"change of properties\" beside it")]
    [InlineData("cut = \"equal thickness\"\ncount = 2.5", "(29,9): error: [layers]: found a fraction, expected count = a whole number")]
    [InlineData("cut = \"equal thickness\"", "(28,7): error: [layers]: found cut = \"equal thickness\" alone, expected count or max_thickness beside it")]
    [InlineData(
        "cut = \"change of properties\"\nmin_thickness = \"5 m\"\nmax_thickness = \"9 m\"",
        "(30,17): error: [layers]: found max_thickness below twice the least thickness (min_thickness), expected room for every thickness between")]
    [InlineData(
        "cut = \"change of properties\"\nmax_thickness = \"1 m\"",
        "(29,17): error: [layers]: found max_thickness below twice the least thickness (resolution, as min_thickness is not set), expected room for every thickness between")]
    [InlineData("thin_layers = \"merge\"", "(28,15): error: [layers]: found thin_layers = \"merge\" alone, expected min_thickness beside it")]
    [InlineData(
        "cut = \"change of properties\"\ncount = 4\nthin_layers = \"merge\"",
        "(29,9): error: [layers]: found count beside thin_layers = \"merge\", expected one of them: merging changes the count")]
    [InlineData("boundaries = [\"1001 m\"]", "(28,14): error: [layers]: found boundaries without depth_kind, expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData("boundaries = [\"1001 m\", 1002]\ndepth_kind = \"md\"", "(28,25): error: found the bare number 1002, expected boundaries = a quantity in quotes with a unit (m, ft, in, mm, cm)")]
    [InlineData("cut = \"change of properties\"\ncurves = []", "(29,10): error: [layers]: found no curves, expected some of youngs_static, poisson_static, youngs_dynamic, poisson_dynamic, density, vp, vs, gamma_ray, shale_volume, porosity, biot, ucs, friction_angle, tensile_strength, sv, pp, shmin, shmax")]
    [InlineData("cut = \"change of properties\"\ncurves = [\"shmin\", \"shmin\"]", "(29,10): error: [layers]: found the curve \"shmin\" twice, expected each once")]
    [InlineData("resolution = \"1 m\"", "(28,14): warning: [layers]: resolution has no effect unless cut = \"change of properties\"")]
    [InlineData("min_thickness = \"1 m\"", "(28,17): warning: [layers]: min_thickness has no effect with this cut unless thin_layers = \"merge\" or count is set")]
    [InlineData("cut = \"change of properties\"\ncount = 4\ncontrast = 2", "(30,12): warning: [layers]: contrast has no effect beside count")]
    [InlineData("depth_kind = \"md\"", "(28,14): warning: [layers]: depth_kind has no effect without boundaries")]
    public void What_does_not_go_together_is_said(string keys, string expected) =>
        Assert.Contains("well.toml" + expected, WellText.Messages(WellText.Sound + "[layers]\n" + keys + "\n"));

    [Fact]
    public void An_unknown_curve_comes_with_the_nearest_known_one() => Assert.Contains(
        WellText.Messages(WellText.Sound + "[layers]\ncut = \"change of properties\"\ncurves = [\"shmim\"]\n"),
        m => m.StartsWith("well.toml(29,10): error: [layers]: found the unknown curve \"shmim\", expected some of ", StringComparison.Ordinal) && m.EndsWith("; did you mean \"shmin\"?", StringComparison.Ordinal));
}

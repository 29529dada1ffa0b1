namespace DepthStress.Tests.WellFiles;

/// <summary>What the reader says of the [anisotropy], [temperature] and [horizontal_stress] sections.</summary>
public sealed class WellFileAnisotropyTests
{
    private const string Annie = "accept_unverified = true\n";

    [Theory]
    [InlineData("model = \"thomsen\"\nepsilon = 0.1\ndelta = 0.05\n", "well.toml: error: [anisotropy] gamma is not set; expected a number, such as one from core")]
    [InlineData(
        "model = \"thomsen\"\nepsilon = 1.5\ngamma = 0.1\ndelta = 0.05\n", "well.toml(29,11): error: found the bare number 1.5, expected epsilon from -0.2 to 1")]
    [InlineData("epsilon = 0.1\n", "well.toml: error: [anisotropy] model is not set; expected \"isotropic\", \"annie\", \"modified-annie\" or \"thomsen\"")]
    [InlineData(
        "model = \"thomson\"\n",
        "well.toml(28,9): error: found \"thomson\", expected model = one of \"isotropic\", \"annie\", \"modified-annie\", \"thomsen\"; did you mean \"thomsen\"?")]
    [InlineData("model = \"isotropic\"\n")]
    [InlineData("model = \"thomsen\"\nepsilon = 0.1\ngamma = 0.1\ndelta = 0.05\n")]
    public void A_model_needs_its_numbers(string keys, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + "[anisotropy]\n" + keys));

    [Theory]
    [InlineData(
        "model = \"annie\"\n",
        "well.toml: error: [anisotropy] c66 is not set; expected \"stoneley\", \"fast shear\", \"slow shear\" or \"gamma\"")]
    [InlineData(
        "model = \"annie\"\nc66 = \"stoneley\"\n",
        "well.toml: error: [anisotropy] mud_density is not set; expected the density of the mud the Stoneley wave ran in, such as \"1.2 g/cm3\"",
        "well.toml: error: [anisotropy] mud_velocity is not set; expected the velocity of sound in that mud, such as \"1500 m/s\"")]
    [InlineData(
        "model = \"modified-annie\"\nc66 = \"gamma\"\ngamma = 0.2\nc12_factor = 1.1\n",
        "well.toml: error: [anisotropy] c11_factor is not set; expected a number, such as one from core")]
    [InlineData(
        "model = \"annie\"\nc66 = \"fast shear\"\nvelocities = \"vertical\"\n",
        "well.toml(30,7): error: [anisotropy] c66 from a shear log needs velocities = \"along hole\" and shear_wave = \"sv\": in a hole across the beds both shear waves give C44, and the wave along the beds cannot stand for both")]
    public void The_three_parameter_shale_needs_a_source_of_C66(string keys, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(Annie + WellText.Sound + "[anisotropy]\n" + keys));

    [Fact]
    public void Recalled_relations_must_be_accepted() => Assert.Equal(
        [
            "well.toml(29,7): error: [anisotropy] c66 = \"white-stoneley-c66\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it",
            "well.toml(28,9): error: [anisotropy] model = \"annie-1996-shale\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it",
        ],
        WellText.Messages(WellText.Sound + "[anisotropy]\nmodel = \"annie\"\nc66 = \"stoneley\"\nmud_density = \"1.2 g/cm3\"\nmud_velocity = \"1500 m/s\"\n").OrderDescending());

    [Fact]
    public void In_a_hole_that_may_be_oblique_the_shear_wave_must_be_named()
    {
        const string Thomsen = "[anisotropy]\nmodel = \"thomsen\"\nepsilon = 0.1\ngamma = 0.1\ndelta = 0.05\n";
        var dipping = WellText.With("vertical = true\n", "vertical = true\nbedding_dip = \"10 deg\"\ndip_azimuth = \"30 deg\"\n");
        Assert.Equal(
            ["well.toml: error: [anisotropy] shear_wave is not set; expected \"sh\" (moves along the beds) or \"sv\" for the wave that the shear log shows where the hole crosses beds obliquely, or velocities = \"vertical\" when the velocities are already those across the beds"],
            WellText.Messages(dipping + Thomsen));
        Assert.Empty(WellText.Messages(dipping + Thomsen + "shear_wave = \"sv\"\n"));
        Assert.Empty(WellText.Messages(dipping + Thomsen + "velocities = \"vertical\"\n"));
    }

    [Fact]
    public void One_factor_on_the_stiffness_keeps_Poissons_ratios() => Assert.Equal(
        ["well.toml(32,21): error: [anisotropy] static_conversion = \"whole stiffness\" keeps the dynamic Poisson's ratios; expected [moduli] static_poisson = \"equal-to-dynamic\""],
        WellText.Messages(
            WellText.With("static_poisson = \"equal-to-dynamic\"", "static_poisson = 0.25")
            + "[anisotropy]\nmodel = \"thomsen\"\nepsilon = 0.1\ngamma = 0.1\ndelta = 0.05\nstatic_conversion = \"whole stiffness\"\n"));

    [Theory]
    [InlineData(
        "[horizontal_stress]\nmethod = \"effective-stress-ratio\"\n",
        "well.toml: error: [horizontal_stress] ratio is not set; expected effective Shmin over effective vertical stress, such as one from leak-off tests")]
    [InlineData(
        "[horizontal_stress]\nmethod = \"effective-stress-ratio\"\nratio = 0.5\nratio_shmax = 0.4\n",
        "well.toml(30,15): error: ratio_shmax is below ratio: exchange them and turn shmax_azimuth by 90 deg")]
    [InlineData(
        "[horizontal_stress]\nthermal_expansion = \"1e-5 1/K\"\n",
        "well.toml: error: [temperature] reference is not set; expected the temperature at which the rock had no thermal stress: thermal_expansion needs it",
        "well.toml: error: [temperature] source is not set; expected \"log\" or \"gradient\": thermal_expansion needs it")]
    [InlineData(
        "[horizontal_stress]\nthermal_expansion = \"1e-5 1/K\"\n[temperature]\nsource = \"gradient\"\nreference = \"15 degC\"\n",
        "well.toml: error: [temperature] surface is not set; expected the temperature at the ground or mudline, such as \"15 degC\"",
        "well.toml: error: [temperature] gradient is not set; expected its rise with depth, such as \"3 degC/100m\"")]
    [InlineData("[horizontal_stress]\nmethod = \"effective-stress-ratio\"\nratio = 0.5\n")]
    [InlineData("[horizontal_stress]\nthermal_expansion = \"6e-6 1/degF\"\n[temperature]\nsource = \"log\"\nreference = \"60 degF\"\n")]
    public void Ratios_and_heat_need_their_numbers(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));
}

using DepthStress.Core.Conditioning;

namespace DepthStress.Tests.WellFiles;

public class WellFileConditioningTests
{
    private const string Sound = """
        [conditioning]
        parked = true
        null_smear = true
        spikes = { window = "10 ft", threshold = 6, curves = ["density", "shear"] }
        washout = { caliper_excess = "1 in", density_correction = "0.1 g/cm3", rule = "either" }
        fill_gaps = "1 m"
        shifts = [{ curve = "density", by = "-0.4 m" }]

        """;

    [Fact]
    public void Every_key_is_read_in_SI()
    {
        var c = WellText.Sections(WellText.Sound + Sound).Setup.Settings.Conditioning;
        Assert.True(c.Parked.Value && c.NullSmear.Value);
        Assert.Equal(3.048, c.Spikes.Window.Value, 1e-12); // exact but for rounding, as the next three
        Assert.Equal(0.0254, c.Washout.CaliperExcess.Value, 1e-12);
        Assert.Equal(100, c.Washout.DensityCorrection.Value, 1e-9);
        Assert.Equal(1, c.FillGaps.Value, 1e-12);
        Assert.Equal(6, c.Spikes.Threshold.Value);
        Assert.Equal(["density", "shear"], c.Spikes.Curves.Value);
        Assert.Equal(WashoutRule.Either, c.Washout.Rule.Value);
        Assert.Equal([new CurveShift("density", -0.4)], c.Shifts.Value);
    }

    [Theory]
    [InlineData("null_smear = true", "null_smear = 1", "null_smear = true or false")]
    [InlineData("\"10 ft\"", "10", "expected window = a quantity in quotes with a unit")]
    [InlineData("threshold = 6", "threshold = 0", "expected threshold from 2 to 100")]
    [InlineData("threshold = 6, ", "", "[spikes] threshold is not set; expected a number of robust standard deviations")]
    [InlineData("[\"density\", \"shear\"]", "[\"densty\"]", "spikes curves: found the curve \"densty\"")]
    [InlineData(", rule = \"either\"", "", "[washout] rule is not set; expected \"either\", \"both\" or \"none\"")]
    [InlineData("density_correction = \"0.1 g/cm3\", rule = \"either\"", "rule = \"both\"", "rule = \"both\" needs caliper_excess and density_correction")]
    [InlineData("curve = \"density\", ", "", "[shifts] curve is not set")]
    [InlineData(", by = \"-0.4 m\"", "", "[shifts] by is not set")]
    [InlineData("by = \"-0.4 m\" }", "by = \"-0.4 m\" }, { curve = \"density\", by = \"1 m\" }", "shifts: found the curve \"density\" twice")]
    [InlineData("window =", "windw =", "found the unknown key \"windw\" in [conditioning.spikes]")]
    public void What_is_wrong_is_named(string old, string replacement, string expected) =>
        Assert.Contains(WellText.Messages(WellText.Sound + Sound.Exchange(old, replacement)), m => m.Contains(expected, StringComparison.Ordinal));

    [Fact]
    public void A_refused_value_is_reported_once() =>
        Assert.Single(WellText.Messages(WellText.Sound + Sound.Exchange("\"-0.4 m\"", "\"far\"")));

    [Fact]
    public void Shifts_hold_for_the_whole_well_and_no_lithology_conditions()
    {
        var messages = WellText.Messages(WellText.Sound + """
            [[zones]]
            name = "a"
            top = "900 m"
            depth_kind = "md"
            [zones.conditioning]
            shifts = [{ curve = "density", by = "1 m" }]
            [[lithology]]
            name = "coal"
            density_max = "1.8 g/cm3"
            [lithology.conditioning]
            parked = true
            """);
        Assert.Contains(messages, m => m.Contains("[conditioning] shifts is set in zone \"a\", expected it for the whole well only", StringComparison.Ordinal));
        Assert.Contains(messages, m => m.Contains("[conditioning] is set for lithology \"coal\", expected it in the well or a zone", StringComparison.Ordinal));
    }
}

using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.WellFiles;

/// <summary>Pore pressure against a normal trend in the well file.</summary>
public sealed class WellFileTrendTests
{
    private const string Old = "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n";
    private const string Method = "method = \"eaton-1975-sonic\"\n";
    private const string Fluid = "fluid_density = \"1.03 g/cm3\"\n";
    private const string Trend = "trend = [{ depth = \"0 m\", slowness = \"180 us/ft\" }, { depth = \"3000 m\", slowness = \"80 us/ft\" }]\n";

    [Fact]
    public void A_trend_and_an_exponent_are_read()
    {
        var pore = WellText.Sections(WellText.With(Old, Method + Fluid + Trend + "exponent = 2.5\n")).Setup.Settings.PorePressure;
        Assert.Equal(PorePressureMethod.EatonSonic, pore.Method.Value);
        Assert.Equal([0, 3000], pore.Trend.Value.Select(p => p.Depth));
        Assert.Equal([180e-6 / 0.3048, 80e-6 / 0.3048], pore.Trend.Value.Select(p => p.Slowness), (a, b) => Math.Abs(a - b) < 1e-15);
        Assert.Equal((2.5, SettingKind.WellFile, 28), (pore.Exponent.Value, pore.Exponent.Source.Kind, pore.Exponent.Source.Position.Line));
    }

    [Theory]
    [InlineData(
        Method,
        ": error: [pore_pressure] fluid_density is not set; expected the fluid of normal pressure, such as \"1.03 g/cm3\"",
        ": error: [pore_pressure] trend is not set; expected two or more points of depth below the ground or mudline and slowness, or [pore_pressure.normal_trend] with top, base and depth_kind of normally compacted shale")]
    [InlineData(
        Method + Fluid, ": error: [pore_pressure] trend is not set; expected two or more points of depth below the ground or mudline and slowness, or [pore_pressure.normal_trend] with top, base and depth_kind of normally compacted shale")]
    [InlineData(Method + Trend, ": error: [pore_pressure] fluid_density is not set; expected the fluid of normal pressure, such as \"1.03 g/cm3\"")]
    [InlineData(
        Method + Fluid + "trend = [{ depth = \"0 m\", slowness = \"180 us/ft\" }]\n",
        "(27,9): error: [pore_pressure] trend: expected two or more points with depth and slowness, from top to bottom")]
    [InlineData(
        Method + Fluid + "trend = [{ depth = \"9 m\", slowness = \"180 us/ft\" }, { depth = \"9 m\", slowness = \"80 us/ft\" }]\n",
        "(27,9): error: [pore_pressure] trend: expected two or more points with depth and slowness, from top to bottom")]
    [InlineData(
        Method + Fluid + "trend = [{ depth = \"0 m\", slowness = \"180 us/ft\" }, { depth = \"3000 m\" }]\n",
        "(27,9): error: [pore_pressure] trend: expected each point with depth and slowness")]
    [InlineData(
        Method + Fluid + "trend = [{ depth = \"0 m\", slowness = 180 }, { depth = \"3000 m\", slowness = \"80 us/ft\" }]\n",
        "(27,38): error: found the bare number 180, expected slowness = a quantity in quotes with a unit (us/ft, us/m)")]
    [InlineData(Method + Fluid + Trend + "exponent = 0\n", "(28,12): error: found the bare number 0, expected exponent from 0.1 to 10")]
    public void A_trend_method_needs_its_numbers(string replacement, params string[] messages) =>
        Assert.Equal(messages.Select(m => "well.toml" + m), WellText.Messages(WellText.With(Old, replacement)));
}

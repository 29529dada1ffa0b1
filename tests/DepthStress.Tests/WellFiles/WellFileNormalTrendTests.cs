using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.WellFiles;

/// <summary>[pore_pressure.normal_trend], methods of shale, sands and [fluids] in the well file.</summary>
public sealed class WellFileNormalTrendTests
{
    private const string Old = "method = \"hydrostatic\"\nfluid_density = \"1.03 g/cm3\"\n";
    private const string Eaton = "method = \"eaton-1975-sonic\"\nfluid_density = \"1.03 g/cm3\"\n";
    private const string Fluid = "method = \"fluid line\"\n[fluids]\ndepth_kind = \"tvdss\"\n";

    [Fact]
    public void A_trend_to_be_fitted_is_read()
    {
        var pore = WellText.Sections(WellText.With(Old, Eaton + """
            shale_cutoff = 0.5
            sands = "fluid line"
            sand_window = "20 m"
            honour_tests = true
            [pore_pressure.normal_trend]
            top = "800 m"
            base = "2000 m"
            depth_kind = "tvd"
            smoothing = "median"
            window = "10 m"
            matrix_slowness = "65 us/ft"
            [fluids]
            water_density = "1.05 g/cm3"
            gas_density = "2 kPa/m"
            gas_water_contact = "1500 m"
            depth_kind = "tvdss"
            anchor = "hydrostatic"

            """)).Setup.Settings;
        Assert.Equal((0.5, SandPressure.FluidLine, 20.0, true), (pore.PorePressure.ShaleCutoff.Value, pore.PorePressure.Sands.Value, pore.PorePressure.SandWindow.Value, pore.PorePressure.HonourTests.Value));
        var trend = pore.PorePressure.NormalTrend;
        Assert.Equal((800.0, 2000.0, Smoothing.Median, 10.0), (trend.Top.Value, trend.Base.Value, trend.Smoothing.Value, trend.Window.Value));
        Assert.Equal(65e-6 / 0.3048, trend.MatrixSlowness.Value, 1e-15); // rounding
        Assert.False(trend.ScaleLength.IsSet);
        Assert.Equal((SettingKind.WellFile, 1500.0), (pore.Fluids.GasWaterContact.Source.Kind, pore.Fluids.GasWaterContact.Value));
        Assert.Equal(2000 / 9.80665, pore.Fluids.GasDensity.Value, 1e-9);
    }

    [Theory]
    [InlineData(
        Eaton + "[pore_pressure.normal_trend]\nmatrix_slowness = \"65 us/ft\"\n",
        ": error: [pore_pressure.normal_trend] top is not set; expected the top of normally compacted shale to fit the trend to",
        ": error: [pore_pressure.normal_trend] base is not set; expected the base of normally compacted shale to fit the trend to",
        ": error: [pore_pressure.normal_trend] depth_kind is not set; expected md, tvd or tvdss")]
    [InlineData(
        Eaton + "[pore_pressure.normal_trend]\ntop = \"800 m\"\nbase = \"700 m\"\ndepth_kind = \"tvd\"\n",
        "(29,8): error: [pore_pressure.normal_trend]: expected base below top")]
    [InlineData(
        Eaton + "[pore_pressure.normal_trend]\nsurface_slowness = \"60 us/ft\"\nmatrix_slowness = \"65 us/ft\"\nscale_length = \"1700 m\"\n",
        "(28,20): error: [pore_pressure.normal_trend]: expected surface_slowness above matrix_slowness: shale gets faster with depth")]
    [InlineData(
        Eaton + "trend = [{ depth = \"0 m\", slowness = \"80 us/ft\" }, { depth = \"3000 m\", slowness = \"90 us/ft\" }]\n",
        "(27,9): error: [pore_pressure] trend: found a trend that gets slower with depth, expected normally compacted shale that gets faster")]
    [InlineData(
        Eaton + "trend = [{ depth = \"0 m\", slowness = \"90 us/ft\" }, { depth = \"3000 m\", slowness = \"80 us/ft\" }]\n[pore_pressure.normal_trend]\ntop = \"800 m\"\nbase = \"900 m\"\ndepth_kind = \"tvd\"\n",
        "(27,9): error: found both [pore_pressure] trend and [pore_pressure.normal_trend], expected the trend as points or as an exponential")]
    [InlineData(
        "method = \"zhang-2011-porosity\"\nfluid_density = \"1.03 g/cm3\"\n",
        ": error: [pore_pressure.normal_trend] is not set; expected top, base and depth_kind of normally compacted shale, or the parameters of the trend")]
    [InlineData(
        "method = \"bowers-1995-unloading\"\n",
        ": error: [pore_pressure] bowers_a is not set; expected a value: bowers-1995-unloading has no default for it",
        ": error: [pore_pressure] bowers_b is not set; expected a value: bowers-1995-unloading has no default for it",
        ": error: [pore_pressure] bowers_u is not set; expected a value: bowers-1995-unloading has no default for it",
        ": error: [pore_pressure] maximum_velocity is not set; expected a value: bowers-1995-unloading has no default for it")]
    [InlineData(
        "method = \"compaction-porosity\"\nshale_lithologies = [\"mud\"]\n[pore_pressure.normal_trend]\nsurface_porosity = 0.5\n",
        ": error: [pore_pressure] compaction_stress is not set; expected a value: compaction-porosity has no default for it",
        "(26,21): error: found the unknown lithology \"mud\" in shale_lithologies, expected one of the names in [[lithology]], of which there are none")]
    [InlineData(
        Fluid + "oil_density = \"0.75 g/cm3\"\ngas_density = \"0.2 g/cm3\"\nwater_density = \"1.05 g/cm3\"\ngas_oil_contact = \"2100 m\"\noil_water_contact = \"2000 m\"\nanchor = \"hydrostatic\"\n",
        "(32,21): error: [fluids]: found the oil_water_contact at 2030.0 m and the gas_oil_contact at 2130.0 m true vertical depth, expected gas above oil above water")]
    [InlineData(
        Fluid + "oil_density = \"1.2 g/cm3\"\nwater_density = \"1.05 g/cm3\"\noil_water_contact = \"2000 m\"\nanchor = \"point\"\n",
        "(28,15): error: [fluids]: expected oil_density below water_density",
        ": error: [fluids] anchor_depth is not set; expected the depth of the known pressure",
        ": error: [fluids] anchor_pressure is not set; expected the known pressure")]
    [InlineData(
        Fluid,
        ": error: [fluids] water_density is not set; expected the density in place, such as \"1.05 g/cm3\"",
        ": error: [fluids] anchor is not set; expected hydrostatic (water below the deepest contact), table (the pressure of [pore_pressure] points at the deepest contact) or point (anchor_depth and anchor_pressure)")]
    [InlineData(
        Fluid + "gas_water_contact = \"2000 m\"\noil_water_contact = \"2000 m\"\n",
        "(28,21): error: [fluids]: found gas_water_contact beside another contact, expected it alone: where there is oil, gas lies on oil and oil on water")]
    public void What_is_missing_or_contradicts_itself_is_said(string replacement, params string[] messages) =>
        Assert.Equal(messages.Select(m => "well.toml" + m), WellText.Messages(WellText.With(Old, replacement)));
}

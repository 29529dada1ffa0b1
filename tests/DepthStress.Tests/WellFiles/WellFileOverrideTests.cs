using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.WellFiles;

/// <summary>Values land in SI where they belong, and know who decided them.</summary>
public sealed class WellFileOverrideTests
{
    private const string Overridden = """
        [layers]
        max_thickness = "100 ft"
        [[zones]]
        name = "upper"
        top = "1000 m"
        depth_kind = "tvdss"
        [zones.moduli]
        static_youngs = "lacy-1997-shale"
        [zones.pore_pressure]
        method = "table"
        depth_kind = "tvd"
        points = [{ depth = "0 m", pressure = "0 MPa" }, { depth = "3000 m", pressure = "30 MPa" }]
        [[lithology]]
        name = "sand"
        shale_volume_max = 0.3
        density_min = "2.1 g/cm3"
        [lithology.biot]
        coefficient = 0.7

        """;

    [Fact]
    public void A_zone_owns_its_overrides()
    {
        var zone = Assert.Single(WellText.Sections(WellText.Sound + Overridden).Setup.Zones);
        Assert.Equal(("upper", 1000.0, null, Core.Depth.DepthKind.TrueVerticalSubsea), (zone.Name, zone.Top, zone.Base, zone.DepthKind));
        var young = zone.Overrides.Moduli.StaticYoungs;
        Assert.Equal("lacy-1997-shale", young.Value.Id);
        Assert.Equal(new SettingSource(SettingKind.Zone, new SourcePosition("well.toml", 34, 17), "upper"), young.Source);
        Assert.False(zone.Overrides.Moduli.StaticPoisson.IsSet);
        Assert.Equal([new PressurePoint(0, 0), new PressurePoint(3000, 30e6)], zone.Overrides.PorePressure.Points.Value);
        Assert.Equal(new SettingSource(SettingKind.Zone, new SourcePosition("well.toml", 38, 10), "upper"), zone.Overrides.PorePressure.Points.Source);
    }

    [Fact]
    public void A_lithology_rule_owns_its_overrides()
    {
        var choice = Assert.Single(WellText.Sections(WellText.Sound + Overridden).Setup.Lithologies);
        Assert.Equal("sand", choice.Rule.Name);
        Assert.Equal(0.3, choice.Rule.ShaleVolume!.Value.High);
        Assert.Equal(2100, choice.Rule.Density!.Value.Low, 1e-9); // one multiplication
        Assert.Null(choice.Rule.Photoelectric);
        Assert.Equal(new SettingSource(SettingKind.Lithology, new SourcePosition("well.toml", 44, 15), "sand"), choice.Overrides.Biot.Coefficient.Source);
    }

    [Fact]
    public void What_no_zone_says_comes_from_the_file_and_what_nobody_says_from_the_program()
    {
        var well = WellText.Sections(WellText.Sound + Overridden);
        var biot = well.Setup.Settings.Biot.Coefficient.Source;
        Assert.Equal((SettingKind.WellFile, 19, null), (biot.Kind, biot.Position.Line, biot.Owner));
        Assert.Equal(SettingSource.Default, well.Setup.Settings.HorizontalStress.FrictionCoefficient.Source);
        Assert.Equal(SettingKind.Default, well.Setup.Overburden.Gaps.Source.Kind);
        Assert.Equal(30.48, well.Sections.Layers.MaxThickness.Value, 1e-12); // 100 ft of 0.3048 m, exact by definition
    }

    [Fact]
    public void A_pressure_gradient_is_as_good_as_a_fluid_density()
    {
        var well = WellText.Sections(WellText.With("fluid_density = \"1.03 g/cm3\"", "fluid_density = \"0.45 psi/ft\""));

        // 0.45 x 6894.757293168 / (0.3048 x 9.80665): the pound-force per square inch, the foot and standard gravity as defined.
        Assert.Equal(0.45 * 6894.757293168 / (0.3048 * 9.80665), well.Setup.Settings.PorePressure.FluidDensity.Value, 1e-6); // ten digits of the psi
    }

    [Fact]
    public void The_users_own_laws_give_their_own_numbers()
    {
        var linear = Law("{ law = \"linear\", factor = 0.7, offset = \"1000 psi\" }");
        Assert.Equal(0.7 * 20e9 + 6.894757293168e6, linear(20e9), 1.0); // Pa, of 1.4e10

        // 0.1 x 3^2 = 0.9 GPa at 3 km/s.
        Assert.Equal(0.9e9, Law("{ law = \"power\", factor = 0.1, exponent = 2, input = \"vp\", input_unit = \"km/s\", unit = \"GPa\" }")(3000), 1.0);
        Assert.Equal(12e9, Law("\"12 GPa\"")(double.NaN), 1.0);
    }

    /// <summary>The law for static Young's modulus as a function in SI.</summary>
    private static Func<double, double> Law(string choice)
    {
        var law = WellText.Sections(WellText.With("\"lacy-1997-combined\"", choice)).Setup.Settings.Moduli.StaticYoungs.Value;
        return x =>
        {
            var result = new double[1];
            var inputs = default(Core.Catalogue.LawInputs);
            if (law.Inputs.Count > 0) inputs.Add(new[] { x });
            Core.Catalogue.LawKernel.Apply(law, inputs, result);
            return result[0];
        };
    }
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Tests.Writing;

namespace DepthStress.Tests.Model;

/// <summary>What methods lack, and what becomes of a method that serves no sample, on a small well of Vp, Vs and density.</summary>
public class MethodNeedsTests
{
    private static readonly EarthModel Tiny = TinyWell.Model();

    private static Setting<T> Chosen<T>(T value) => new(value, new SettingSource(SettingKind.WellFile, SourcePosition.None));

    private static Law Method(string id) => MethodCatalogue.Find(id)!;

    private static EarthModel With(Func<StageSettings, StageSettings> change)
    {
        var bag = new DiagnosticBag();
        var model = Chain.Run(Tiny.Setup with { Settings = change(Tiny.Setup.Settings) }, Tiny.Logs, bag);
        Assert.Empty(bag.Items);
        return model!;
    }

    private static EarthModel WithPorosity(PorositySettings porosity) => With(s => s with { Porosity = porosity });

    private static string[] Texts(EarthModel model) => [.. model.Findings.Select(f => UnitSystem.Metric.Show(f.Text))];

    [Theory]
    [InlineData("lacy-1997-shale")]
    [InlineData("horsrud-2001-shale")]
    [InlineData("mcnally-1987-sandstone")]
    [InlineData("limestone-modulus")]
    public void Nothing_lacks_where_the_curves_or_what_follows_from_them_are_there(string id) =>
        Assert.Empty(MethodNeeds.Missing(Method(id), Tiny));

    [Theory]
    [InlineData("linear-gamma-ray", "gamma ray", "[shale] clean", "[shale] shale")]
    [InlineData("vernik-1993-sandstone", "[porosity] porosity")]
    [InlineData("plumb-1994-clastic", "[porosity] porosity", "[shale] volume")]
    [InlineData("tenth-of-ucs", "[strength] ucs")]
    [InlineData("raymer-1980", "[porosity] matrix_slowness", "[porosity] fluid_slowness")]
    [InlineData("hashin-shtrikman-bound", "[porosity] porosity", "[biot] mineral_bulk_modulus", "[biot] mineral_shear_modulus")]
    [InlineData("krief-1990-shear-modulus", "[porosity] matrix_density", "[biot] matrix_shear_velocity")]
    public void What_lacks_is_named_by_curve_or_key(string id, params string[] expected) =>
        Assert.Equal(expected, MethodNeeds.Missing(Method(id), Tiny));

    [Fact]
    public void A_sonic_that_is_not_there_is_named_once()
    {
        var bag = new DiagnosticBag();
        var logs = new LogTable(Tiny.Logs.Depths, [.. Tiny.Logs.Curves.Where(c => c.Role.Property == Property.Density)]);
        var model = Chain.Run(Tiny.Setup, logs, bag)!;
        Assert.Equal(["compressional velocity", "shear velocity"], MethodNeeds.Missing(Method("lacy-1997-shale"), model));
        Assert.Equal(["compressional velocity"], MethodNeeds.Missing(Method("mcnally-1987-sandstone"), model));
    }

    // Vp near 3000 m/s: Raymer with 5486 and 1600 m/s, computed by hand from (b - sqrt(b^2 - 4 Vm (Vm - V))) / (2 Vm).
    [Fact]
    public void One_slowness_setting_feeds_a_law_of_velocities()
    {
        var porosity = WithPorosity(new()
        {
            Porosity = Chosen(Method("raymer-1980")),
            MatrixSlowness = Chosen(1 / 5486.0),
            FluidSlowness = Chosen(1 / 1600.0),
        });
        var phi = porosity.Values.Read(Property.Porosity);
        var vp = porosity.Values.Read(Property.Vp);
        for (var i = 0; i < phi.Length; i++)
            Assert.Equal(vp[i], ((1 - phi[i]) * (1 - phi[i]) * 5486) + (phi[i] * 1600), 1e-6); // m/s, rounding of a root
        Assert.Empty(MethodNeeds.Missing(Method("wyllie-1956"), porosity));
        Assert.Equal(["[porosity] compaction_factor"], MethodNeeds.Missing(Method("wyllie-1956-compaction"), porosity));
    }

    [Fact]
    public void A_parameter_that_a_method_needs_has_no_default()
    {
        var bag = new DiagnosticBag();
        var settings = Tiny.Setup.Settings with
        {
            Porosity = new PorositySettings { Porosity = Chosen(Method("wyllie-1956")), FluidSlowness = Chosen(6.2e-4) },
            Biot = new BiotSettings { Coefficient = Chosen(Method("hashin-shtrikman-bound")), MineralBulkModulus = Chosen(37e9) },
        };
        SetupCheck.Report(Tiny.Setup with { Zones = [], Settings = settings }, bag);
        Assert.Equal(
            ["error: [porosity] porosity = \"wyllie-1956\" needs [porosity] matrix_slowness", "error: [biot] coefficient = \"hashin-shtrikman-bound\" needs [biot] mineral_shear_modulus"],
            bag.Items.Select(d => d.ToString()));
    }

    // The dynamic modulus is near 15 GPa here; King's line is below zero under 23.4 GPa.
    [Fact]
    public void A_law_without_a_result_at_any_sample_is_told_apart()
    {
        var model = With(s => s with { Moduli = s.Moduli with { StaticYoungs = Chosen(Method("king-1983-crystalline")) } });
        Assert.Contains("[moduli] static_youngs: king-1983-crystalline gives no result at any sample, it has no meaning for their values", Texts(model));
        Assert.DoesNotContain(Texts(Tiny), t => t.Contains("no result", StringComparison.Ordinal));
    }
}

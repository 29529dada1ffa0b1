using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

public class DepthColumnsTests
{
    private const double G = 9.80665; // standard gravity, exact

    // The order and the names are a contract with whoever reads the file; later columns are appended.
    private const string Contract =
        "md_m tvd_m tvdss_m vp_m_s vs_m_s density_g_cm3 shale_volume porosity youngs_dynamic_gpa poisson_dynamic youngs_static_gpa "
        + "poisson_static shear_static_gpa bulk_static_gpa lame_lambda_static_gpa biot ucs_mpa friction_angle_deg tensile_strength_mpa "
        + "sv_mpa pp_mpa shmin_mpa shmax_mpa sv_gradient_kpa_m pp_gradient_kpa_m shmin_gradient_kpa_m shmax_gradient_kpa_m "
        + "pp_emw_g_cm3 shmin_emw_g_cm3 sv_emw_g_cm3 regime a_phi zone lithology vp_origin vs_origin density_origin stress_basis";

    // Datum 20 m above the ground, which lies 130 m above the sea; logs start at the ground.
    private static readonly EarthModel Model = Run(
        Setup with
        {
            Frame = new DepthFrame(DatumKind.RotaryTable, 150, 130, null, null),
            Settings = SmallWell.Settings with { HorizontalStress = Strains },
        },
        Table(
            [20, 120, 220],
            Curve(Property.Density, Same(2500, 3)),
            Curve(Property.Vp, Same(4000, 3)),
            Curve(Property.Vs, Same(2400, 3))));

    private static double[] Read(string id, UnitSystem system = UnitSystem.Metric)
    {
        var values = new double[Model.Count];
        DepthColumns.Get(id).Fill(Model, 0, system, values);
        return values;
    }

    private static string[] Words(string id, int start = 0)
    {
        var words = new string[Model.Count - start];
        DepthColumns.All.OfType<TextColumn<EarthModel>>().Single(c => c.Id == id).Read(Model, start, words);
        return words;
    }

    [Fact]
    public void Headers_and_their_order_are_the_contract() => Assert.Equal(
        $"{Contract} sv_unlogged_share bedding_angle_deg vs_error_m_s density_error_g_cm3 youngs_static_vertical_gpa youngs_static_horizontal_gpa poisson_static_vh poisson_static_hh biot_vertical biot_horizontal temperature_degc normal_slowness_us_ft normal_resistivity_ohm_m normal_porosity toughness_mpa_m05 brittleness".Split(' '), DepthColumns.All.Select(c => c is NumberColumn<EarthModel> n ? n.Header(UnitSystem.Metric) : c.Id));

    [Fact]
    public void Field_headers_carry_field_units() => Assert.Equal(
        ["md_ft", "vp_ft_s", "density_g_cm3", "youngs_static_mpsi", "ucs_psi", "sv_psi", "sv_gradient_psi_ft", "pp_emw_lb_gal"],
        new[] { "md", "vp", "density", "youngs_static", "ucs", "sv", "sv_gradient", "pp_emw" }.Select(id => DepthColumns.Get(id).Header(UnitSystem.Field)));

    [Fact]
    public void Ids_are_unique_and_an_unknown_one_is_refused()
    {
        Assert.Equal(DepthColumns.All.Count, DepthColumns.All.DistinctBy(c => c.Id).Count());
        Assert.Throws<ArgumentException>(() => DepthColumns.Get("regime"));
        Assert.Throws<ArgumentException>(() => DepthColumns.Get("md_m"));
    }

    // All by hand from the round numbers; tolerance: rounding.
    [Fact]
    public void Derived_columns_come_out_as_by_hand()
    {
        Assert.Equal([-130, -30, 70], Read("tvdss"));
        Assert.Equal(7.2, Read("shear_static")[1], 1e-12);
        Assert.Equal(10.4, Read("bulk_static")[1], 1e-12);
        Assert.Equal(5.6, Read("lame_lambda_static")[1], 1e-12);
        Assert.Equal(2500 * G * 200 / 1e6, Read("sv")[2], 1e-12);
        Assert.Equal(2.5 * G, Read("sv_gradient")[2], 1e-12); // below the ground, kPa/m
        Assert.Equal(1.0 * G, Read("pp_gradient")[2], 1e-12);
        Assert.Equal(2.5 * 200 / 220, Read("sv_emw")[2], 1e-12); // from the datum, g/cm3
        Assert.Equal(1.0 * 200 / 220, Read("pp_emw")[2], 1e-12);
        Assert.Equal(Read("shmin")[2] / 0.2, Read("shmin_gradient")[2], 1e-9); // MPa over 0.2 km is kPa/m
        Assert.Equal(Read("shmin")[2] * 1e6 / (G * 220) / 1e3, Read("shmin_emw")[2], 1e-12);
    }

    [Fact]
    public void Gradients_are_missing_at_the_ground() => Assert.True(double.IsNaN(Read("sv_gradient")[0]));

    [Fact]
    public void Offshore_gradients_count_from_the_sea_surface()
    {
        var model = Run(
            Setup with { Frame = Sea, Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2000.0)) } },
            Table([225], Curve(Property.Density, 2400)));
        var gradient = new double[1];
        DepthColumns.Get("sv_gradient").Fill(model, 0, UnitSystem.Metric, gradient);
        Assert.Equal(G * ((1.03 * 100) + (2.0 * 100)) / 200, gradient[0], 1e-12);
    }

    // 0.3048 and 6894.757 are NIST SP 811 factors; field gradients: 1 psi/ft = 22.62059 kPa/m.
    [Fact]
    public void Field_units_convert_on_the_way_out()
    {
        Assert.Equal(220 / 0.3048, Read("md", UnitSystem.Field)[2], 1e-9);
        Assert.Equal(Read("sv")[2] * 1e6 / 6894.757, Read("sv", UnitSystem.Field)[2], 1e-3);
        Assert.Equal(Read("sv_gradient")[2] / 22.62059, Read("sv_gradient", UnitSystem.Field)[2], 1e-6);
        Assert.Equal(Read("sv_emw")[2] * 8.345404, Read("sv_emw", UnitSystem.Field)[2], 1e-5);
    }

    [Fact]
    public void Regime_and_shape_number_agree()
    {
        Assert.Equal(["reverse", "reverse", "reverse"], Words("regime")); // shallow rock under strong strains
        Assert.All(Read("a_phi"), a => Assert.InRange(a, 2, 3));
    }

    [Fact]
    public void Words_can_be_read_from_any_row_on()
    {
        Assert.Equal(["measured", "measured"], Words("stress_basis", 1));
        Assert.Equal(["measured"], Words("vs_origin", 2));
        Assert.Equal(["", "", ""], Words("zone"));
        Assert.Equal(["", "", ""], Words("lithology"));
    }

    [Fact]
    public void A_property_that_is_not_there_is_missing_everywhere() => Assert.All(Read("ucs"), v => Assert.True(double.IsNaN(v)));
}

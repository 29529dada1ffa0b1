using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

public sealed class ResultTableTests
{
    /// <summary>The contract of the results: names, units and order of depth.csv in metric units.</summary>
    private const string Contract =
        "md_m,tvd_m,tvdss_m,vp_m_s,vs_m_s,density_g_cm3,shale_volume,porosity,youngs_dynamic_gpa,poisson_dynamic,youngs_static_gpa,"
        + "poisson_static,shear_static_gpa,bulk_static_gpa,lame_lambda_static_gpa,biot,ucs_mpa,friction_angle_deg,tensile_strength_mpa,"
        + "sv_mpa,pp_mpa,shmin_mpa,shmax_mpa,sv_gradient_kpa_m,pp_gradient_kpa_m,shmin_gradient_kpa_m,shmax_gradient_kpa_m,"
        + "pp_emw_g_cm3,shmin_emw_g_cm3,sv_emw_g_cm3,regime,a_phi,zone,lithology,vp_origin,vs_origin,density_origin,stress_basis";

    /// <summary>Columns that came later, in the order they came.</summary>
    private const string Appended = "sv_unlogged_share,bedding_angle_deg,vs_error_m_s,density_error_g_cm3,youngs_static_vertical_gpa,youngs_static_horizontal_gpa,poisson_static_vh,poisson_static_hh,biot_vertical,biot_horizontal,temperature_degc,normal_slowness_us_ft,normal_resistivity_ohm_m,normal_porosity,toughness_mpa_m05,brittleness";

    private static string[] Header(UnitSystem units) =>
        TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(), units, s)).Split('\n')[0].Split(',');

    private static string Cell(string csv, int row, string column)
    {
        var lines = csv.Split('\n');
        return lines[row + 1].Split(',')[Array.IndexOf(lines[0].Split(','), column)];
    }

    [Fact]
    public void Metric_columns_have_the_names_and_order_of_the_contract() =>
        Assert.Equal($"{Contract},{Appended}".Split(','), Header(UnitSystem.Metric));

    [Fact]
    public void Field_columns_differ_from_metric_ones_in_the_unit_suffix_only()
    {
        var (metric, field) = (Header(UnitSystem.Metric), Header(UnitSystem.Field));
        var expected = DepthColumns.All.Select((c, i) => c is NumberColumn<EarthModel> n && n.Metric.Unit.Suffix.Length > 0
            ? metric[i][..^n.Metric.Unit.Suffix.Length] + n.Field.Unit.Suffix
            : metric[i]);
        Assert.Equal(expected, field);
        Assert.Equal(
            ["md_ft", "vp_ft_s", "youngs_static_mpsi", "sv_psi", "sv_gradient_psi_ft", "pp_emw_lb_gal", "density_g_cm3", "biot"],
            new[] { 0, 3, 10, 19, 23, 27, 5, 15 }.Select(i => field[i]));
    }

    [Fact]
    public void The_whole_depth_table_is_as_kept() =>
        Golden.Match("depth.csv", TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(), UnitSystem.Metric, s)));

    [Fact]
    public void The_whole_layer_table_is_as_kept() =>
        Golden.Match("layers.csv", TinyWell.Text(s => LayersCsv.Write(TinyWell.Layers(TinyWell.Model()), UnitSystem.Metric, s)));

    [Fact]
    public void The_whole_guide_is_as_kept() =>
        Golden.Match("README.txt", TinyWell.Text(s => ResultGuide.Write(TinyWell.Model().Setup, UnitSystem.Metric, s)));

    [Fact]
    public void Every_row_has_as_many_cells_as_the_header()
    {
        var lines = TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(count: 2500), UnitSystem.Field, s)).TrimEnd('\n').Split('\n');
        Assert.Equal(2501, lines.Length);
        Assert.All(lines, l => Assert.Equal(54, l.Split(',').Length));
    }

    [Fact]
    public void Values_stand_in_their_unit_with_its_decimals()
    {
        var model = TinyWell.Model(count: 2500);
        var (metric, field) = (TinyWell.Text(s => DepthCsv.Write(model, UnitSystem.Metric, s)), TinyWell.Text(s => DepthCsv.Write(model, UnitSystem.Field, s)));
        Assert.Equal("2232.0000", Cell(metric, 2064, "md_m"));
        Assert.Equal("7322.8346", Cell(field, 2064, "md_ft")); // 2232 / 0.3048
        Assert.Equal("iris sand", Cell(metric, 2064, "zone"));
        Assert.Equal("filled", Cell(metric, 5, "density_origin"));
    }

    [Fact]
    public void A_missing_value_is_an_empty_field()
    {
        var csv = TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(), UnitSystem.Metric, s));
        Assert.All(["vs_m_s", "youngs_static_gpa", "shmin_mpa", "regime", "a_phi", "vs_origin", "ucs_mpa"], c => Assert.Equal("", Cell(csv, 3, c)));
        Assert.NotEqual("", Cell(csv, 3, "sv_mpa"));
        Assert.DoesNotContain("NaN", csv, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public void Without_strains_shmax_is_empty_not_a_copy_of_shmin()
    {
        var csv = TinyWell.Text(s => DepthCsv.Write(TinyWell.Model(strained: false), UnitSystem.Metric, s));
        Assert.NotEqual("", Cell(csv, 0, "shmin_mpa"));
        Assert.Equal("", Cell(csv, 0, "shmax_mpa"));
    }

    [Fact]
    public void A_comma_culture_and_a_second_run_change_no_byte()
    {
        var invariant = Everything();
        var before = CultureInfo.CurrentCulture;
        var comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        comma.NumberFormat.NumberDecimalSeparator = ",";
        comma.NumberFormat.NegativeSign = "~";
        try
        {
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(invariant, Everything());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        Assert.Equal(invariant, Everything());
    }

    [Fact]
    public void The_guide_names_every_column_the_datum_the_depth_kinds_and_the_caution()
    {
        foreach (var units in Enum.GetValues<UnitSystem>())
        {
            var guide = TinyWell.Text(s => ResultGuide.Write(TinyWell.Model().Setup, units, s));
            var names = guide.Split('\n').Where(l => l.StartsWith("  ", StringComparison.Ordinal)).Select(l => l.Split(' ', StringSplitOptions.RemoveEmptyEntries)[0]).ToHashSet();
            Assert.Empty(DepthColumns.All.Select(c => c is NumberColumn<EarthModel> n ? n.Header(units) : c.Id).Except(names));
            Assert.Empty(LayerColumns.All.Select(c => c is NumberColumn<LayerTable> n ? n.Header(units) : c.Id).Except(names));
            Assert.Contains("rotary table", guide, StringComparison.Ordinal);
            Assert.Contains(Caution.Text, guide, StringComparison.Ordinal);
        }
    }

    private static string Everything()
    {
        var model = TinyWell.Model(count: 1500);
        var layers = TinyWell.Layers(model);
        return string.Concat(
            TinyWell.Text(s => DepthCsv.Write(model, UnitSystem.Field, s)),
            TinyWell.Text(s => ResultsLas.Write(model, UnitSystem.Metric, s)),
            TinyWell.Text(s => LayersCsv.Write(layers, UnitSystem.Metric, s)),
            TinyWell.Text(s => LayersJson.Write(layers, model.Setup, UnitSystem.Field, s)),
            TinyWell.Text(s => ResultGuide.Write(model.Setup, UnitSystem.Field, s)));
    }
}

using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Rock;
using static DepthStress.Core.Model.ColumnUnits;

namespace DepthStress.Core.Layers;

/// <summary>The column table of the layer results: every column once, in the order it is written. Later columns are appended.</summary>
public static class LayerColumns
{
    /// <summary>Every column.</summary>
    public static IReadOnlyList<Column<LayerTable>> All { get; } =
    [
        Number("layer", "number from the top", "", Counts, "count", l => l.Number),
        Words("zone", "zone", "[[zones]]", l => l.Zone),
        Words("lithology", "lithology of most of the thickness", "[[lithology]]", l => l.Lithology),
        Number("top_md", "top, measured depth", "", Depths, "survey", l => l.TopMd),
        Number("base_md", "base, measured depth", "", Depths, "survey", l => l.BaseMd),
        Number("top_tvd", "top, true vertical depth", "", Depths, "halfway between samples", l => l.TopTvd),
        Number("base_tvd", "base, true vertical depth", "", Depths, "halfway between samples", l => l.BaseTvd),
        Number("thickness_md", "thickness along the hole", "", Depths, "base_md - top_md", l => l.BaseMd - l.TopMd),
        Number("thickness_tvd", "true vertical thickness", "", Depths, "base_tvd - top_tvd", l => l.BaseTvd - l.TopTvd),
        Mean("density", "bulk density", "rho", Densities, Property.Density),
        Mean("youngs_static", "static Young's modulus", "Es", Moduli, Property.YoungsStatic),
        Mean("poisson_static", "static Poisson's ratio", "nu_s", ColumnUnits.Numbers, Property.PoissonStatic),
        Elastic("shear_static", "static shear modulus of the means", "G", "E / (2 (1 + nu))", ElasticConstants.Shear),
        Elastic("bulk_static", "static bulk modulus of the means", "K", "E / (3 (1 - 2 nu))", ElasticConstants.Bulk),
        Elastic("lame_lambda_static", "static Lame lambda of the means", "lambda", "E nu / ((1 + nu)(1 - 2 nu))", ElasticConstants.Lambda),
        Elastic("plane_strain_static", "static plane-strain modulus of the means", "E'", "E / (1 - nu^2)", ElasticConstants.PlaneStrain),
        Mean("biot", "Biot's coefficient", "alpha", ColumnUnits.Numbers, Property.Biot),
        Mean("porosity", "porosity", "phi", Fractions, Property.Porosity),
        Mean("shale_volume", "shale volume", "Vsh", Fractions, Property.ShaleVolume),
        Mean("ucs", "unconfined compressive strength", "UCS", Stresses, Property.Ucs),
        Mean("friction_angle", "angle of internal friction", "phi_f", Angles, Property.FrictionAngle),
        Mean("tensile_strength", "tensile strength", "T0", Stresses, Property.TensileStrength),
        .. Profile("pp", "pore pressure", "Pp", Property.PorePressure),
        .. Profile("sv", "vertical stress", "Sv", Property.VerticalStress),
        .. Profile("shmin", "least horizontal stress", "Shmin", Property.MinHorizontalStress),
        .. Profile("shmax", "greatest horizontal stress", "SHmax", Property.MaxHorizontalStress),
        Number("shmin_contrast_above", "mean Shmin of the layer above minus this one's", "", Stresses, "difference of means", l => l.ContrastAbove),
        Number("shmin_contrast_below", "mean Shmin of the layer below minus this one's", "", Stresses, "difference of means", l => l.ContrastBelow),
        Number("samples", "number of samples", "", Counts, "count", l => l.Samples),
        Number("share_not_measured", "share of the thickness that has no Shmin or one that does not rest on measured logs alone", "", Fractions, "stress_basis", l => l.NotMeasured),
        Mean("toughness", "mode-I fracture toughness", "KIC", Toughnesses, Property.Toughness),
        Number("share_missing", "share of the thickness without static moduli or Shmin", "", Fractions, "missing samples", l => l.Missing),
        .. Misfits("shmin", "Shmin", Property.MinHorizontalStress),
        .. Misfits("shmax", "SHmax", Property.MaxHorizontalStress),
        Number("barrier_thickness_above", "true vertical thickness of the nearest stress barrier above", "", Depths, "[layers] barrier_contrast", l => l.BarrierAbove),
        Number("barrier_thickness_below", "true vertical thickness of the nearest stress barrier below", "", Depths, "[layers] barrier_contrast", l => l.BarrierBelow),
    ];

    private static NumberColumn<LayerTable> Number(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, string formula, Func<Layer, double> value) =>
        new(id, title, symbol, units.Metric, units.Field, formula, (table, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = value(table.Layers[start + i]);
        });

    private static NumberColumn<LayerTable> Mean(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, Property property) =>
        Number(id, title, symbol, units, "mean over true vertical thickness", l => l.Mean(property));

    private static NumberColumn<LayerTable> Elastic(string id, string title, string symbol, string formula, Func<double, double, double> constant) =>
        Number(id, title, symbol, Moduli, formula, l => constant(l.Mean(Property.YoungsStatic), l.Mean(Property.PoissonStatic)));

    private static IEnumerable<NumberColumn<LayerTable>> Profile(string id, string title, string symbol, Property property) =>
    [
        Number(id + "_top", title + " at the top", symbol, Stresses, "first sample that has one", l => l.Profile(property).Top),
        Number(id + "_base", title + " at the base", symbol, Stresses, "last sample that has one", l => l.Profile(property).Base),
        Number(id + "_mean", title, symbol, Stresses, "mean over true vertical thickness", l => l.Profile(property).Mean),
    ];

    private static IEnumerable<NumberColumn<LayerTable>> Misfits(string id, string name, Property property) =>
    [
        Number(id + "_misfit_mean", $"mean distance of {name} from a straight line in depth over the layer", "", Stresses, "least squares over true vertical thickness", l => l.Misfit(property).Mean),
        Number(id + "_misfit_max", $"greatest distance of {name} from that line", "", Stresses, "least squares over true vertical thickness", l => l.Misfit(property).Greatest),
    ];

    private static TextColumn<LayerTable> Words(string id, string title, string formula, Func<Layer, string> word) =>
        new(id, title, formula, (table, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = word(table.Layers[start + i]);
        });
}

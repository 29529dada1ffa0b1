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
        Stiffness("c11", "compression along the beds", "Backus 1962", c => c.C11),
        Stiffness("c12", "between the directions along the beds", "C11 - 2 C66", c => c.C12),
        Stiffness("c13", "between along and across the beds", "Backus 1962", c => c.C13),
        Stiffness("c33", "compression across the beds", "Backus 1962", c => c.C33),
        Stiffness("c44", "shear across the beds", "Backus 1962", c => c.C44),
        Stiffness("c66", "shear in the plane of the beds", "Backus 1962", c => c.C66),
        Upscaled("biot_vertical_upscaled", "Biot's coefficient across the beds that carries the mean stress", "alpha_v", ColumnUnits.Numbers, "Backus 1962 with the pressure term", m => m.Rock.BiotVertical),
        Upscaled("biot_horizontal_upscaled", "Biot's coefficient along the beds that carries the mean stress", "alpha_h", ColumnUnits.Numbers, "Backus 1962 with the pressure term", m => m.Rock.BiotHorizontal),
        Upscaled("youngs_upscaled", "Young's modulus of the isotropic rock that carries the mean horizontal stress", "E", Moduli, "E/(1 - nu) = C11 + C12 - 2 C13^2/C33", m => m.Pair.Youngs),
        Upscaled("poisson_upscaled", "Poisson's ratio of that rock", "nu", ColumnUnits.Numbers, "nu/(1 - nu) = C13/C33", m => m.Pair.Poisson),
        Upscaled("biot_upscaled", "Biot's coefficient of that rock", "alpha", ColumnUnits.Numbers, "(alpha_h - alpha_v C13/C33)/(1 - C13/C33)", m => m.Pair.Biot),
        Number("ucs_min", "least unconfined compressive strength", "UCS", Stresses, "least of the samples", l => l.LeastUcs),
        Mean("temperature", "temperature", "T", Temperatures, Property.Temperature),
        Upscaled("shmin_closing", "mean Shmin less what the column's one pair of lateral strains gives", "", Stresses, "profile less strain model at every sample", m => m.ClosingShmin),
        Upscaled("shmax_closing", "mean SHmax less what that pair gives", "", Stresses, "profile less strain model at every sample", m => m.ClosingShmax),
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

    private static NumberColumn<LayerTable> Upscaled(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, string formula, Func<LayerMedium, double> value) =>
        Number(id, title, symbol, units, formula, l => l.Medium is { } medium ? value(medium) : double.NaN);

    private static NumberColumn<LayerTable> Stiffness(string id, string title, string formula, Func<VtiStiffness, double> value) =>
        Upscaled(id, "upscaled static stiffness, " + title, id.ToUpperInvariant(), Moduli, formula, m => value(m.Rock.Stiffness));

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

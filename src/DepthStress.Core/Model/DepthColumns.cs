using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using static DepthStress.Core.Model.ColumnUnits;

namespace DepthStress.Core.Model;

/// <summary>
/// The column table of the depth results: every column once, in the order it is written. Later columns are appended.
/// Derived columns are computed when they are written, never stored.
/// </summary>
public static class DepthColumns
{
    /// <summary>Every column.</summary>
    public static IReadOnlyList<Column<EarthModel>> All { get; } =
    [
        Stored("md", "measured depth", "MD", Depths, Property.MeasuredDepth, "depth along the hole below the datum"),
        Stored("tvd", "true vertical depth", "TVD", Depths, Property.TrueVerticalDepth, "minimum curvature"),
        Number("tvdss", "true vertical depth below sea level", "TVDSS", Depths, "tvd - datum elevation", (model, start, destination) =>
        {
            var tvd = Of(model, Property.TrueVerticalDepth, start, destination.Length);
            for (var i = 0; i < tvd.Length; i++) destination[i] = model.Setup.Frame.ToSubsea(tvd[i]);
        }),
        Stored("vp", "compressional velocity", "Vp", Velocities, Property.Vp, "log"),
        Stored("vs", "shear velocity", "Vs", Velocities, Property.Vs, "log"),
        Stored("density", "bulk density", "rho", Densities, Property.Density, "log, filled as chosen"),
        Stored("shale_volume", "shale volume", "Vsh", Fractions, Property.ShaleVolume, "[shale] volume"),
        Stored("porosity", "porosity", "phi", Fractions, Property.Porosity, "[porosity] porosity"),
        Stored("youngs_dynamic", "dynamic Young's modulus", "Ed", Moduli, Property.YoungsDynamic, "2 rho Vs^2 (1 + nu)"),
        Stored("poisson_dynamic", "dynamic Poisson's ratio", "nu_d", ColumnUnits.Numbers, Property.PoissonDynamic, "(Vp^2 - 2 Vs^2) / (2 (Vp^2 - Vs^2))"),
        Stored("youngs_static", "static Young's modulus", "Es", Moduli, Property.YoungsStatic, "[moduli] static_youngs"),
        Stored("poisson_static", "static Poisson's ratio", "nu_s", ColumnUnits.Numbers, Property.PoissonStatic, "[moduli] static_poisson"),
        Elastic("shear_static", "static shear modulus", "G", "E / (2 (1 + nu))", ElasticConstants.Shear),
        Elastic("bulk_static", "static bulk modulus", "K", "E / (3 (1 - 2 nu))", ElasticConstants.Bulk),
        Elastic("lame_lambda_static", "static Lame lambda", "lambda", "E nu / ((1 + nu)(1 - 2 nu))", ElasticConstants.Lambda),
        Stored("biot", "Biot's coefficient", "alpha", ColumnUnits.Numbers, Property.Biot, "[biot] coefficient"),
        Stored("ucs", "unconfined compressive strength", "UCS", Stresses, Property.Ucs, "[strength] ucs"),
        Stored("friction_angle", "angle of internal friction", "phi_f", Angles, Property.FrictionAngle, "[strength] friction_angle"),
        Stored("tensile_strength", "tensile strength", "T0", Stresses, Property.TensileStrength, "[strength] tensile_strength"),
        Stored("sv", "vertical stress", "Sv", Stresses, Property.VerticalStress, "weight of water and rock above"),
        Stored("pp", "pore pressure", "Pp", Stresses, Property.PorePressure, "[pore_pressure] method"),
        Stored("shmin", "least horizontal stress", "Shmin", Stresses, Property.MinHorizontalStress, "uniaxial strain with tectonic strains"),
        Stored("shmax", "greatest horizontal stress", "SHmax", Stresses, Property.MaxHorizontalStress, "uniaxial strain with tectonic strains"),
        SurfaceGradient("sv", "vertical stress", "Sv/z", Property.VerticalStress),
        SurfaceGradient("pp", "pore pressure", "Pp/z", Property.PorePressure),
        SurfaceGradient("shmin", "least horizontal stress", "Shmin/z", Property.MinHorizontalStress),
        SurfaceGradient("shmax", "greatest horizontal stress", "SHmax/z", Property.MaxHorizontalStress),
        MudEquivalent("pp", "pore pressure", "Pp", Property.PorePressure),
        MudEquivalent("shmin", "least horizontal stress", "Shmin", Property.MinHorizontalStress),
        MudEquivalent("sv", "vertical stress", "Sv", Property.VerticalStress),
        Words("regime", "faulting regime", "order of the three stresses (Anderson 1951)", (m, i) => FaultingRegimes.Of(
            At(m, Property.VerticalStress, i), At(m, Property.MinHorizontalStress, i), At(m, Property.MaxHorizontalStress, i)).Name()),
        Number("a_phi", "stress shape number", "A_phi", ColumnUnits.Numbers, "Simpson 1997", (model, start, destination) =>
        {
            var sv = Of(model, Property.VerticalStress, start, destination.Length);
            var shmin = Of(model, Property.MinHorizontalStress, start, destination.Length);
            var shmax = Of(model, Property.MaxHorizontalStress, start, destination.Length);
            for (var i = 0; i < destination.Length; i++) destination[i] = FaultingRegimes.ShapeNumber(sv[i], shmin[i], shmax[i]);
        }),
        Words("zone", "zone", "[[zones]]", (m, i) => m.ZoneName(m.Zones[i])),
        Words("lithology", "lithology", "[[lithology]]", (m, i) => m.LithologyName(m.Lithologies[i])),
        Origin("vp_origin", "origin of the compressional velocity", Property.Vp),
        Origin("vs_origin", "origin of the shear velocity", Property.Vs),
        Origin("density_origin", "origin of the density", Property.Density),
        Words("stress_basis", "weakest origin the stresses rest on", "weakest of the three origins", (m, i) => m.StressBasis[i].Name()),
        Stored("sv_unlogged_share", "share of the vertical stress from depths without a density log", "", Fractions, Property.UnloggedShare, "weight assumed, filled or predicted / sv"),
        Stored("bedding_angle", "angle between the hole and the normal of the beds", "", Angles, Property.BeddingAngle, "[survey] bedding_dip, dip_azimuth") with { InLas = false },
        Stored("vs_error", "standard error of the shear velocity where it is predicted", "", Velocities, Property.ShearError, "[prediction] shear") with { InLas = false },
        Stored("density_error", "standard error of the density where it is predicted", "", Densities, Property.DensityError, "[prediction] density") with { InLas = false },
        Layered("youngs_static_vertical", "static Young's modulus across the beds of layered rock", "Es_v", Moduli, Property.YoungsStatic, "[anisotropy]; youngs_static where [anisotropy] is chosen"),
        Layered("youngs_static_horizontal", "static Young's modulus along the beds of layered rock", "Es_h", Moduli, Property.YoungsStaticHorizontal, "[anisotropy], [moduli] static_youngs"),
        Layered("poisson_static_vh", "static Poisson's ratio, horizontal strain under vertical load", "nu_v", ColumnUnits.Numbers, Property.PoissonStatic, "[anisotropy]; poisson_static where [anisotropy] is chosen"),
        Layered("poisson_static_hh", "static Poisson's ratio in the plane of the beds", "nu_hh", ColumnUnits.Numbers, Property.PoissonStaticHorizontal, "[anisotropy], [moduli] static_poisson"),
        Layered("biot_vertical", "Biot's coefficient across the beds of layered rock", "alpha_v", ColumnUnits.Numbers, Property.Biot, "[anisotropy]; biot where [anisotropy] is chosen"),
        Layered("biot_horizontal", "Biot's coefficient along the beds of layered rock", "alpha_h", ColumnUnits.Numbers, Property.BiotHorizontal, "[anisotropy], [biot] coefficient"),
        Stored("temperature", "temperature of the rock", "T", Temperatures, Property.Temperature, "log or [temperature]") with { InLas = false },
        Stored("normal_slowness", "compressional slowness of the normal trend", "dt_n", Slownesses, Property.NormalSlowness, "[pore_pressure] trend or normal_trend") with { InLas = false },
        Stored("normal_resistivity", "resistivity of the normal trend", "R_n", Resistivities, Property.NormalResistivity, "[pore_pressure.normal_trend]") with { InLas = false },
        Stored("normal_porosity", "porosity of the normal trend", "phi_n", Fractions, Property.NormalPorosity, "[pore_pressure.normal_trend]") with { InLas = false },
        Stored("toughness", "mode-I fracture toughness", "KIC", Toughnesses, Property.Toughness, "[strength] toughness") with { InLas = false },
        Stored("brittleness", "brittleness index", "B", ColumnUnits.Numbers, Property.Brittleness, "[strength] brittleness") with { InLas = false },
    ];

    /// <summary>The columns of numbers.</summary>
    public static IEnumerable<NumberColumn<EarthModel>> Numbers => All.OfType<NumberColumn<EarthModel>>();

    /// <summary>The column of numbers of an id.</summary>
    /// <exception cref="ArgumentException">There is none.</exception>
    public static NumberColumn<EarthModel> Get(string id) =>
        Numbers.FirstOrDefault(c => c.Id == id) ?? throw new ArgumentException($"There is no number column \"{id}\".", nameof(id));

    private static double At(EarthModel model, Property property, int index) =>
        model.Values.Has(property) ? model.Values.Read(property)[index] : double.NaN;

    /// <summary>Rows of a stored property; all missing when the model has none.</summary>
    private static ReadOnlySpan<double> Of(EarthModel model, Property property, int start, int count)
    {
        if (model.Values.Has(property)) return model.Values.Read(property).Slice(start, count);
        var missing = new double[count];
        Array.Fill(missing, double.NaN);
        return missing;
    }

    private static NumberColumn<EarthModel> Stored(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, Property property, string formula) =>
        new(id, title, symbol, units.Metric, units.Field, formula, (model, start, destination) =>
            Of(model, property, start, destination.Length).CopyTo(destination));

    /// <summary>A property of layered rock; missing where the rock is isotropic.</summary>
    private static NumberColumn<EarthModel> Layered(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, Property property, string formula) =>
        new(id, title, symbol, units.Metric, units.Field, formula, (model, start, destination) =>
        {
            Of(model, property, start, destination.Length).CopyTo(destination);
            var horizontal = Of(model, Property.YoungsStaticHorizontal, start, destination.Length);
            for (var i = 0; i < destination.Length; i++) destination[i] = double.IsNaN(horizontal[i]) ? double.NaN : destination[i];
        })
        {
            InLas = false,
        };

    private static NumberColumn<EarthModel> Number(
        string id, string title, string symbol, (ColumnUnit Metric, ColumnUnit Field) units, string formula, ColumnReader<EarthModel> read) =>
        new(id, title, symbol, units.Metric, units.Field, formula, read);

    private static NumberColumn<EarthModel> Elastic(string id, string title, string symbol, string formula, Func<double, double, double> constant) =>
        Number(id, title, symbol, Moduli, formula, (model, start, destination) =>
        {
            var youngs = Of(model, Property.YoungsStatic, start, destination.Length);
            var poisson = Of(model, Property.PoissonStatic, start, destination.Length);
            for (var i = 0; i < destination.Length; i++) destination[i] = constant(youngs[i], poisson[i]);
        });

    private static NumberColumn<EarthModel> SurfaceGradient(string id, string title, string symbol, Property property) =>
        Number(
            id + "_gradient", title + " gradient", symbol, Gradients, $"{id} / true vertical depth below ground, or below sea surface offshore",
            (model, start, destination) =>
            {
                var surface = model.Setup.Frame.SurfaceTvd;
                var values = Of(model, property, start, destination.Length);
                var tvd = Of(model, Property.TrueVerticalDepth, start, destination.Length);
                for (var i = 0; i < destination.Length; i++) destination[i] = Ratio(values[i], tvd[i] - surface);
            });

    private static NumberColumn<EarthModel> MudEquivalent(string id, string title, string symbol, Property property) =>
        Number(
            id + "_emw", title + " as equivalent mud density", symbol + " EMW", MudDensities, $"{id} / (g * true vertical depth below the datum)",
            (model, start, destination) =>
            {
                var values = Of(model, property, start, destination.Length);
                var tvd = Of(model, Property.TrueVerticalDepth, start, destination.Length);
                for (var i = 0; i < destination.Length; i++) destination[i] = Ratio(values[i], tvd[i] * Constants.StandardGravity);
            });

    private static TextColumn<EarthModel> Words(string id, string title, string formula, Func<EarthModel, int, string> word) =>
        new(id, title, formula, (model, start, destination) =>
        {
            for (var i = 0; i < destination.Length; i++) destination[i] = word(model, start + i);
        });

    private static TextColumn<EarthModel> Origin(string id, string title, Property property) =>
        new(id, title, "conditioning", (model, start, destination) =>
        {
            destination.Fill("");
            foreach (var run in model.Origins(property)?.Runs ?? [])
            {
                var from = Math.Max(run.Start, start);
                var to = Math.Min(run.End, start + destination.Length);
                if (from < to) destination[(from - start)..(to - start)].Fill(run.Origin.Name());
            }
        });

    /// <summary>A value over a depth; missing at and above the reference.</summary>
    private static double Ratio(double value, double depth) => depth > 0 ? value / depth : double.NaN;
}

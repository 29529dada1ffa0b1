using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Report.Palette;

namespace DepthStress.Report;

/// <summary>
/// The track table: every track of the depth picture once, in the order it is drawn. Scales follow the trade's habit
/// (common practice): slowness and neutron porosity grow to the left, so that dense rock lies to the right throughout.
/// </summary>
public static class TrackTable
{
    private static readonly double[] Dashed = [5, 2.5];
    private static readonly double[] Dotted = [1.5, 2];
    private static readonly CurveScale UnitInterval = new(0, 1);
    private static readonly CurveScale Ratio = new(0, 0.5, 5);
    private static readonly CurveScale MetricStress = new(0, 400, 4, ScaleFit.RightEnd);
    private static readonly CurveScale FieldStress = new(0, 60000, 4, ScaleFit.RightEnd);
    private static readonly CurveScale MetricMud = new(0.8, 2.8, 5);
    private static readonly CurveScale FieldMud = new(7, 22, 5);

    /// <summary>Every track.</summary>
    public static IReadOnlyList<TrackDefinition> All { get; } =
    [
        new("hole", "Hole size",
        [
            Same(LogColumns.BitSize, "bit size", new(Gold, 1.1, Dashed), new(6, 16, 5)),
            Same(LogColumns.Caliper, "caliper", new(Ink), new(6, 16, 5)),
        ]),
        new("gamma_ray", "Gamma ray, shale volume",
        [
            Same(Column("shale_volume"), "shale volume", new(Rust, 0.5), UnitInterval),
            Same(LogColumns.GammaRay, "gamma ray", new(Teal), new(0, 150, 5)),
        ]),
        new("slowness", "Slowness",
        [
            Same(LogColumns.ShearSlowness, "shear", new(Rust), new(440, 40), Property.Vs),
            Same(LogColumns.CompressionalSlowness, "compressional", new(Ink), new(240, 40), Property.Vp),
            Same(LogColumns.PickedSlowness, "shale of the trend", new(Gold, 1.6), new(240, 40)),
            Same(Column("normal_slowness"), "normal trend", new(Teal, 1.2, Dashed), new(240, 40)),
        ]),
        new("density", "Density, neutron",
        [
            Same(LogColumns.Neutron, "neutron", new(Sky, 0.7), new(0.45, -0.15)),
            Same(Column("density"), "bulk density", new(Plum), new(1.95, 2.95), Property.Density),
        ]),
        new("porosity", "Porosity",
        [
            Same(Column("porosity"), "porosity", new(Teal), new(0.5, 0, 5)),
            Same(Column("normal_porosity"), "normal trend", new(Rust, 1.2, Dashed), new(0.5, 0, 5)),
        ]),
        new("youngs", "Young's modulus",
        [
            new(Column("youngs_dynamic"), "dynamic", new(Gold), new(0, 80), new(0, 12)),
            new(Column("youngs_static_horizontal"), "along beds", new(Rust), new(0, 80), new(0, 12)),
            new(Column("youngs_static"), "static", new(Ink), new(0, 80), new(0, 12)),
        ]),
        new("poisson", "Poisson's ratio, Biot",
        [
            Same(Column("poisson_dynamic"), "dynamic", new(Gold), Ratio),
            Same(Column("poisson_static"), "static", new(Ink), Ratio),
            Same(Column("biot"), "Biot coefficient", new(Teal, 0.7), UnitInterval),
        ]),
        new("strength", "Strength",
        [
            new(Column("ucs"), "unconfined, UCS", new(Ink), new(0, 160), new(0, 24000)),
            new(Column("tensile_strength"), "tensile", new(Gold), new(0, 40), new(0, 6000)),
            Same(Column("friction_angle"), "friction angle", new(Teal, 0.7), new(0, 60)),
        ]),
        new("stress", "Pressure and total stress",
        [
            new(Column("pp"), "Pp, pore", new(Sky, 1), MetricStress, FieldStress),
            new(Column("shmax"), "SHmax, greatest", new(Gold), MetricStress, FieldStress),
            new(Column("shmin"), "Shmin, least", new(Rust), MetricStress, FieldStress),
            new(Column("sv"), "Sv, vertical", new(Ink, 1.1), MetricStress, FieldStress),
        ]),
        new("mud", "Equivalent mud density",
        [
            new(Column("pp_emw"), "Pp, pore", new(Sky, 1), MetricMud, FieldMud),
            new(Column("shmin_emw"), "Shmin, least", new(Rust), MetricMud, FieldMud),
            new(Column("sv_emw"), "Sv, vertical", new(Ink, 1.1), MetricMud, FieldMud),
        ]),
    ];

    /// <summary>The two panels of the stress picture, which share their pens.</summary>
    internal static (TrackDefinition Stress, TrackDefinition Gradient) StressPanels { get; } =
    (
        new("stress", "Total stress and pore pressure",
        [
            .. All.First(t => t.Id == "stress").Curves,
            new(HydrostaticColumns.Pressure, "hydrostatic", new(Grey, 1.2, Dotted), MetricStress, FieldStress),
        ]),
        new("gradient", "Gradient",
        [
            .. All.First(t => t.Id == "stress").Curves.Select(c => Gradient(Column(c.Column.Id + "_gradient"), c.Label, c.Pen)),
            Gradient(HydrostaticColumns.Gradient, "hydrostatic", new(Grey, 1.2, Dotted)),
        ])
    );

    /// <summary>The track of an id, or null.</summary>
    public static TrackDefinition? Find(string id) => All.FirstOrDefault(t => t.Id == id);

    private static NumberColumn<EarthModel> Column(string id) => DepthColumns.Get(id);

    private static CurveDefinition Same(NumberColumn<EarthModel> column, string label, CurvePen pen, CurveScale scale, Property? ribbon = null) =>
        new(column, label, pen, scale, scale, ribbon);

    private static CurveDefinition Gradient(NumberColumn<EarthModel> column, string label, CurvePen pen) =>
        new(column, label, pen, new(0, 40, 4, ScaleFit.BothEnds), new(0, 1.8, 4, ScaleFit.BothEnds));
}

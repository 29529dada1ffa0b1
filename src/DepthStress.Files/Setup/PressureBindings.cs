using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of [pore_pressure] and [fluids].</summary>
internal static class PressureBindings
{
    private static readonly (string, PorePressureMethod)[] Methods =
    [
        ("hydrostatic", PorePressureMethod.Hydrostatic), ("gradient", PorePressureMethod.Gradient), ("table", PorePressureMethod.Table),
        ("fluid line", PorePressureMethod.FluidLine), .. ShaleMethod.All.Select(m => (m.Law.Id, m.Method)),
    ];

    private static readonly (string, SandPressure)[] Sands =
        [("shale", SandPressure.Shale), ("table", SandPressure.Table), ("fluid line", SandPressure.FluidLine)];

    private static readonly (string, Smoothing)[] Smoothings = [("median", Smoothing.Median), ("mean", Smoothing.Mean)];

    private static readonly (string, FluidAnchor)[] Anchors =
        [("hydrostatic", FluidAnchor.Hydrostatic), ("table", FluidAnchor.Table), ("point", FluidAnchor.Point)];

    /// <summary>The [pore_pressure] section.</summary>
    public static PorePressureSettings PorePressure(ISection s, PorePressureSettings p)
    {
        var points = s.Tables(
            "points", p.Points.IsSet ? p.Points.Value : [], (t, point) => Point(t, point, p.Points.Source), new(double.NaN, double.NaN), "depth and pressure of each point, from top to bottom");
        var trend = s.Tables(
            "trend", p.Trend.IsSet ? p.Trend.Value : [], (t, point) => TrendPoint(t, point, p.Trend.Source), new(double.NaN, double.NaN), "trend methods: slowness of normally compacted shale at depths below the ground or mudline");
        return p with
        {
            Method = s.Choice("method", p.Method, Methods, "how pore pressure is had"),
            FluidDensity = s.FluidDensity("fluid_density", p.FluidDensity, "hydrostatic and trend methods: density of the pore fluid"),
            Gradient = s.FluidDensity("gradient", p.Gradient, "gradient: pressure per depth, or the density of such a fluid"),
            Reference = s.Choice("reference", p.Reference, Bindings.References, "gradient: what depth counts from"),
            Points = points.Count > 0 ? new Setting<IReadOnlyList<PressurePoint>>(points, s.SourceOf("points")) : p.Points,
            DepthKind = s.Choice("depth_kind", p.DepthKind, Bindings.DepthKinds, "table: the kind of depth of its points"),
            Trend = trend.Count > 0 ? new Setting<IReadOnlyList<TrendPoint>>(trend, s.SourceOf("trend")) : p.Trend,
            NormalTrend = s.Table("normal_trend", p.NormalTrend, NormalTrend, "trend methods, instead of trend: an exponential in depth; parameters that are not given are fitted to shale of the interval"),
            Exponent = s.Number("exponent", p.Exponent, new Interval(0.1, 10), "Eaton's methods: exponent, when it is not the published one"),
            ShaleCutoff = s.Number("shale_cutoff", p.ShaleCutoff, new Interval(0, 1), "methods of shale: samples of at least this shale volume are shale"),
            ShaleLithologies = s.Texts("shale_lithologies", p.ShaleLithologies, "methods of shale: the lithologies that are shale"),
            Sands = s.Choice("sands", p.Sands, Sands, "methods of shale: what other rock takes: a straight line between the shale above and below, the table of points, or the fluid column of [fluids]"),
            SandWindow = s.Quantity("sand_window", p.SandWindow, Sign.Positive, Dimension.Length, "sands = \"shale\": height over which shale pressures are averaged before the line is drawn"),
            AtLeastNormal = s.Flag("at_least_normal", p.AtLeastNormal, "methods of shale: true gives the normal pressure where the method gives less; the samples are listed"),
            HonourTests = s.Flag("honour_tests", p.HonourTests, "true moves the pressure of each zone to its measured formation pressures"),
            BowersFactor = s.Number("bowers_a", p.BowersFactor, new Interval(1e-3, 1e3), "Bowers: factor A in ft/s/psi^B"),
            BowersExponent = s.Number("bowers_b", p.BowersExponent, new Interval(0.05, 5), "Bowers: exponent B"),
            BowersUnloading = s.Number("bowers_u", p.BowersUnloading, new Interval(1, 100), "Bowers, unloading: exponent U"),
            BowersMaxVelocity = s.Quantity("maximum_velocity", p.BowersMaxVelocity, Sign.Positive, Dimension.Velocity, "Bowers, unloading: velocity where unloading began"),
            CompactionStress = s.Quantity("compaction_stress", p.CompactionStress, Sign.Positive, Dimension.Pressure, "compaction-porosity: effective stress that reduces porosity by a factor e"),
        };
    }

    /// <summary>The [fluids] section.</summary>
    public static FluidSettings Fluids(ISection s, FluidSettings f) => f with
    {
        GasDensity = s.FluidDensity("gas_density", f.GasDensity, "density of gas in place, or its pressure gradient"),
        OilDensity = s.FluidDensity("oil_density", f.OilDensity, "density of oil in place, or its pressure gradient"),
        WaterDensity = s.FluidDensity("water_density", f.WaterDensity, "density of formation water, or its pressure gradient"),
        GasOilContact = s.Quantity("gas_oil_contact", f.GasOilContact, Sign.Any, Dimension.Length, "depth where gas lies on oil"),
        OilWaterContact = s.Quantity("oil_water_contact", f.OilWaterContact, Sign.Any, Dimension.Length, "depth where oil lies on water"),
        GasWaterContact = s.Quantity("gas_water_contact", f.GasWaterContact, Sign.Any, Dimension.Length, "depth where gas lies on water"),
        DepthKind = s.Choice("depth_kind", f.DepthKind, Bindings.DepthKinds, "the kind of depth of the contacts and of anchor_depth"),
        Anchor = s.Choice("anchor", f.Anchor, Anchors, "what the column hangs on: hydrostatic water below the deepest contact, the table of points at and below it, or one known pressure"),
        AnchorDepth = s.Quantity("anchor_depth", f.AnchorDepth, Sign.Any, Dimension.Length, "anchor = \"point\": depth of the known pressure"),
        AnchorPressure = s.Quantity("anchor_pressure", f.AnchorPressure, Sign.NotNegative, Dimension.Pressure, "anchor = \"point\": the known pressure"),
    };

    private static NormalTrendSettings NormalTrend(ISection s, NormalTrendSettings t) => t with
    {
        Top = s.Quantity("top", t.Top, Sign.Any, Dimension.Length, "top of the interval of normally compacted shale"),
        Base = s.Quantity("base", t.Base, Sign.Any, Dimension.Length, "its base"),
        DepthKind = s.Choice("depth_kind", t.DepthKind, Bindings.DepthKinds, "the kind of top and base"),
        Smoothing = s.Choice("smoothing", t.Smoothing, Smoothings, "how the log of shale is smoothed before the fit"),
        Window = s.Quantity("window", t.Window, Sign.Positive, Dimension.Length, "true vertical height of the smoothing window"),
        SurfaceSlowness = s.Quantity("surface_slowness", t.SurfaceSlowness, Sign.Positive, Dimension.Slowness, "slowness at the ground or mudline; fitted when not given"),
        MatrixSlowness = s.Quantity("matrix_slowness", t.MatrixSlowness, Sign.Positive, Dimension.Slowness, "slowness that great depth tends to; fitted when not given"),
        SurfaceResistivity = s.Quantity("surface_resistivity", t.SurfaceResistivity, Sign.Positive, Dimension.Resistivity, "resistivity at the ground or mudline; fitted when not given"),
        SurfacePorosity = s.Number("surface_porosity", t.SurfacePorosity, new Interval(0.01, 1), "porosity at the ground or mudline; fitted when not given"),
        ScaleLength = s.Quantity("scale_length", t.ScaleLength, Sign.Positive, Dimension.Length, "depth over which the exponential changes by a factor e, one over its c or b; fitted when not given"),
    };

    private static PressurePoint Point(ISection s, PressurePoint p, SettingSource source)
    {
        var depth = s.Quantity("depth", Bindings.Known(p.Depth, source), Sign.Any, Dimension.Length, "depth of the point");
        var pressure = s.Quantity("pressure", Bindings.Known(p.Pressure, source), Sign.NotNegative, Dimension.Pressure, "pore pressure there");
        return new PressurePoint(depth.IsSet ? depth.Value : double.NaN, pressure.IsSet ? pressure.Value : double.NaN);
    }

    private static TrendPoint TrendPoint(ISection s, TrendPoint p, SettingSource source)
    {
        var depth = s.Quantity("depth", Bindings.Known(p.Depth, source), Sign.Any, Dimension.Length, "depth below the ground or mudline");
        var slowness = s.Quantity("slowness", Bindings.Known(p.Slowness, source), Sign.Positive, Dimension.Slowness, "slowness of normally compacted shale there");
        return new TrendPoint(depth.IsSet ? depth.Value : double.NaN, slowness.IsSet ? slowness.Value : double.NaN);
    }
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Declares every key of the well file, once; what a section does with the declaration is its own matter.</summary>
internal static class Bindings
{
    private static readonly Interval FractionRange = new(0, 1);

    internal static readonly (string, DepthKind)[] DepthKinds =
        [("md", DepthKind.Measured), ("tvd", DepthKind.TrueVertical), ("tvdss", DepthKind.TrueVerticalSubsea)];

    private static readonly (string, DatumKind)[] Datums =
        [("rotary table", DatumKind.RotaryTable), ("ground", DatumKind.Ground), ("sea level", DatumKind.SeaLevel)];

    private static readonly (string, DepthReference)[] References =
    [
        ("rotary table", DepthReference.Datum), ("ground", DepthReference.Ground),
        ("sea surface", DepthReference.SeaSurface), ("mudline", DepthReference.Mudline),
    ];

    private static readonly (string, NorthReference)[] Norths =
        [("true", NorthReference.True), ("grid", NorthReference.Grid), ("magnetic", NorthReference.Magnetic)];

    private static readonly (string, Property)[] PathCurves =
        [("true_vertical_depth", Property.LoggedVerticalDepth), ("vertical_position", Property.LoggedVerticalPosition)];

    private static readonly (string, UnitSystem)[] UnitSystems = [("metric", UnitSystem.Metric), ("field", UnitSystem.Field)];

    private static readonly (string, char)[] Delimiters = [(",", ','), (";", ';'), ("|", '|'), ("tab", '\t'), ("blank", CsvOptions.Blanks)];

    private static readonly (string, char)[] DecimalMarks = [(".", '.'), (",", ',')];

    private static readonly (string, LogEncoding)[] Encodings =
    [
        ("utf-8", LogEncoding.Utf8), ("utf-16le", LogEncoding.Utf16LittleEndian),
        ("utf-16be", LogEncoding.Utf16BigEndian), ("windows-1252", LogEncoding.Windows1252),
    ];

    private static readonly (string, RepeatedDepth)[] RepeatedDepths =
        [("error", RepeatedDepth.Error), ("first", RepeatedDepth.First), ("mean", RepeatedDepth.Mean)];

    private static readonly (string, PorePressureMethod)[] PressureWords =
    [
        ("hydrostatic", PorePressureMethod.Hydrostatic), ("gradient", PorePressureMethod.Gradient), ("table", PorePressureMethod.Table),
        (PressureMethods.EatonSonic.Id, PorePressureMethod.EatonSonic),
    ];

    private static readonly (string, DensityFill)[] GapFills =
        [("none", new(DensityFillKind.None)), ("linear", new(DensityFillKind.Linear)), ("hold", new(DensityFillKind.Hold))];

    private static readonly (string, DensityFill)[] BelowFills = [("none", new(DensityFillKind.None)), ("hold", new(DensityFillKind.Hold))];

    /// <summary>The whole file.</summary>
    public static WellFileSections All(ISection s, WellFileSections w)
    {
        var bound = w with
        {
            AcceptUnverified = s.Flag("accept_unverified", w.AcceptUnverified, "true allows methods whose coefficients were recalled, not read in their source"),
            Well = s.Table("well", w.Well, Well, "the well and its reference levels"),
            Logs = s.Table("logs", w.Logs, Logs, "the log files and what their columns are"),
            Survey = s.Table("survey", w.Survey, Survey, "the path of the hole"),
            Zones = s.Tables("zones", w.Zones, Zone, new(), "named intervals, from top to bottom; any settings section may be overridden inside a zone"),
            Lithologies = s.Tables("lithology", w.Lithologies, Lithology, new(), "rules that choose settings by rock inside zones; the first that holds decides"),
            Settings = StageBindings.All(s, w.Settings),
            Overburden = s.Table("overburden", w.Overburden, Overburden, "vertical stress where density is not logged"),
            Layers = s.Table("layers", w.Layers, LayerBindings.All, "how the profile is cut into layers"),
            Output = s.Table("output", w.Output, Output, "how results are written"),
        };
        foreach (var key in (ReadOnlySpan<string>)["anisotropy", "fluids", "mud", "temperature", "casing", "observations", "core"]) s.Later(key);
        return bound;
    }

    private static WellSection Well(ISection s, WellSection w) => w with
    {
        Name = s.Text("name", w.Name, "the well's name"),
        Datum = s.Choice("datum", w.Datum, Datums, "what measured depth counts from"),
        DatumElevation = s.Quantity("datum_elevation", w.DatumElevation, Sign.Any, Dimension.Length, "elevation of the datum above mean sea level"),
        GroundElevation = s.Quantity("ground_elevation", w.GroundElevation, Sign.Any, Dimension.Length, "onshore: elevation of the ground above mean sea level"),
        WaterDepth = s.Quantity("water_depth", w.WaterDepth, Sign.NotNegative, Dimension.Length, "offshore: depth of the sea"),
        WaterTableDepth = s.Quantity("water_table_depth", w.WaterTableDepth, Sign.NotNegative, Dimension.Length, "onshore: depth of the water table below the ground"),
    };

    private static LogsSection Logs(ISection s, LogsSection l) => s.Table(
        "curves",
        l with
        {
            Files = s.Texts("files", l.Files, "the log files (CSV or LAS), relative to the well file"),
            Csv = s.Table("csv", l.Csv, Csv, "how CSV files are written; what is not stated is detected"),
            RepeatedDepth = s.Choice("repeated_depth", l.RepeatedDepth, RepeatedDepths, "what neighbouring rows of the same depth are: an error, or one row: the first of them or their mean"),
        },
        Curves,
        "the column of each role; roles not named here are found by the usual mnemonics");

    private static CsvSection Csv(ISection s, CsvSection c) => c with
    {
        Delimiter = s.Choice("delimiter", c.Delimiter, Delimiters, "what parts the columns; blank stands for runs of blanks"),
        Decimal = s.Choice("decimal", c.Decimal, DecimalMarks, "the decimal mark"),
        HeaderLine = s.Number("header_line", c.HeaderLine, new Interval(1, CsvSection.LastHeaderLine), "the line of the column names, from 1"),
        Encoding = s.Choice("encoding", c.Encoding, Encodings, "how letters are stored"),
    };

    private static LogsSection Curves(ISection s, LogsSection l)
    {
        return l with
        {
            DepthColumns = s.Tables("depth", l.DepthColumns, DepthSource, new CurveSource(), "measured depth", "column"),
            Curves =
            [
                .. CurveRoles.All
                    .Select(role => new CurveChoice(role.Id, s.Tables(
                        role.Id, l.Curves.FirstOrDefault(c => c.Role == role.Id)?.Sources ?? [], Source, new CurveSource(), role.Title, "column")))
                    .Where(choice => choice.Sources.Count > 0),
            ],
        };
    }

    private static CurveSource Source(ISection s, CurveSource c) => c with
    {
        Column = s.Text("column", c.Column, "name of the column"),
        File = s.Text("file", c.File, "the file, when several have the column"),
        Unit = s.Text("unit", c.Unit, "the unit, when the file states none or a wrong one"),
        Missing = s.Number("missing", c.Missing, Interval.All, "a further value that means missing"),
        Base = s.Quantity("base", c.Base, Sign.Any, Dimension.Length, "measured depth down to which this column is used"),
        Position = s.Position,
    };

    private static CurveSource DepthSource(ISection s, CurveSource c) => c with
    {
        Column = s.Text("column", c.Column, "name of the column"),
        Unit = s.Text("unit", c.Unit, "the unit, when the files state none or a wrong one"),
        Position = s.Position,
    };

    private static SurveySection Survey(ISection s, SurveySection v) => v with
    {
        File = s.Text("file", v.File, "survey as CSV with measured depth, inclination and azimuth, relative to the well file"),
        Curve = s.Choice("curve", v.Curve, PathCurves, "instead of a file: the curve of the logs that the path follows"),
        Vertical = s.Flag("vertical", v.Vertical, "true when the hole is vertical"),
        North = s.Choice("north", v.North, Norths, "what azimuths count from"),
        TieIn = s.Table("tie_in", v.TieIn, TieIn, "the point from which the survey counts; above it the hole is taken as straight from the datum"),
        BeddingDip = s.Quantity("bedding_dip", v.BeddingDip, Sign.NotNegative, Dimension.Angle, "angle between the beds and the horizontal"),
        DipAzimuth = s.Quantity("dip_azimuth", v.DipAzimuth, Sign.Any, Dimension.Angle, "direction in which the beds go down, from the north of the survey"),
    };

    private static TieInSection TieIn(ISection s, TieInSection t) => t with
    {
        MeasuredDepth = s.Quantity("md", t.MeasuredDepth, Sign.Positive, Dimension.Length, "measured depth of the point"),
        TrueVerticalDepth = s.Quantity("tvd", t.TrueVerticalDepth, Sign.Positive, Dimension.Length, "true vertical depth of the point below the datum"),
        Position = s.Position,
    };

    private static ZoneSection Zone(ISection s, ZoneSection z)
    {
        var name = s.Text("name", z.Name, "the zone's name");
        var own = s.OwnedBy(SettingKind.Zone, name.Value ?? "");
        return z with
        {
            Name = name,
            Top = s.Quantity("top", z.Top, Sign.Any, Dimension.Length, "depth of the top"),
            Base = s.Quantity("base", z.Base, Sign.Any, Dimension.Length, "depth of the base, when the next top does not end the zone"),
            DepthKind = s.Choice("depth_kind", z.DepthKind, DepthKinds, "the kind of top and base: measured, true vertical, or true vertical below sea level"),
            Target = s.Flag("target", z.Target, "true: the summary names the nearest stress barriers above and below"),
            Overrides = StageBindings.All(own, z.Overrides),
            Position = s.Position,
        };
    }

    private static LithologySection Lithology(ISection s, LithologySection l)
    {
        var name = s.Text("name", l.Name, "the lithology's name");
        var own = s.OwnedBy(SettingKind.Lithology, name.Value ?? "");
        return l with
        {
            Name = name,
            ShaleVolumeMin = s.Number("shale_volume_min", l.ShaleVolumeMin, FractionRange, "least shale volume"),
            ShaleVolumeMax = s.Number("shale_volume_max", l.ShaleVolumeMax, FractionRange, "greatest shale volume"),
            DensityMin = s.Quantity("density_min", l.DensityMin, Sign.Positive, Dimension.Density, "least bulk density"),
            DensityMax = s.Quantity("density_max", l.DensityMax, Sign.Positive, Dimension.Density, "greatest bulk density"),
            PhotoelectricMin = s.Quantity("photoelectric_min", l.PhotoelectricMin, Sign.NotNegative, Dimension.Photoelectric, "least photoelectric factor"),
            PhotoelectricMax = s.Quantity("photoelectric_max", l.PhotoelectricMax, Sign.NotNegative, Dimension.Photoelectric, "greatest photoelectric factor"),
            Facies = s.Numbers("facies", l.Facies, "values of the facies curve"),
            Salt = s.Flag("salt", l.Salt, "true for salt: both horizontal stresses equal the vertical one"),
            Overrides = StageBindings.All(own, l.Overrides),
            Position = s.Position,
        };
    }

    private static OverburdenSettings Overburden(ISection s, OverburdenSettings o) => o with
    {
        AboveLog = s.ShallowDensity("above_log", o.AboveLog, "density from the ground or mudline to the first logged value"),
        Gaps = s.ChoiceOrQuantity("gaps", o.Gaps, GapFills, Dimension.Density, Stated, Density, "what bridges gaps in the density log"),
        BelowLog = s.ChoiceOrQuantity("below_log", o.BelowLog, BelowFills, Dimension.Density, Stated, Density, "what continues density below its last value"),
        WaterDensity = s.FluidDensity("water_density", o.WaterDensity, "density of sea water"),
    };

    private static OutputSection Output(ISection s, OutputSection o) => o with
    {
        Units = s.Choice("units", o.Units, UnitSystems, "the units of the results"),
        Tracks = s.Texts("tracks", o.Tracks, "the tracks to draw, in their order"),
        Scales = s.Tables("scales", o.Scales, Scale, new(), "scales of single curves in the tracks"),
    };

    private static ScaleSection Scale(ISection s, ScaleSection c) => c with
    {
        Curve = s.Text("curve", c.Curve, "the curve, named like its column without the unit"),
        Left = s.Text("left", c.Left, "value at the left edge of the track, with its unit"),
        Right = s.Text("right", c.Right, "value at the right edge of the track, with its unit"),
        Position = s.Position,
    };

    /// <summary>The [pore_pressure] section.</summary>
    public static PorePressureSettings PorePressure(ISection s, PorePressureSettings p)
    {
        var points = s.Tables(
            "points", p.Points.IsSet ? p.Points.Value : [], (t, point) => Point(t, point, p.Points.Source), new(double.NaN, double.NaN), "depth and pressure of each point, from top to bottom");
        var trend = s.Tables(
            "trend", p.Trend.IsSet ? p.Trend.Value : [], (t, point) => TrendPoint(t, point, p.Trend.Source), new(double.NaN, double.NaN), "trend methods: slowness of normally compacted shale at depths below the ground or mudline");
        return p with
        {
            Method = s.Choice("method", p.Method, PressureWords, "how pore pressure is had"),
            FluidDensity = s.FluidDensity("fluid_density", p.FluidDensity, "hydrostatic and trend methods: density of the pore fluid"),
            Gradient = s.FluidDensity("gradient", p.Gradient, "gradient: pressure per depth, or the density of such a fluid"),
            Reference = s.Choice("reference", p.Reference, References, "gradient: what depth counts from"),
            Points = points.Count > 0 ? new Setting<IReadOnlyList<PressurePoint>>(points, s.SourceOf("points")) : p.Points,
            DepthKind = s.Choice("depth_kind", p.DepthKind, DepthKinds, "table: the kind of depth of its points"),
            Trend = trend.Count > 0 ? new Setting<IReadOnlyList<TrendPoint>>(trend, s.SourceOf("trend")) : p.Trend,
            Exponent = s.Number("exponent", p.Exponent, new Interval(0.1, 10), "trend methods: exponent, when it is not the published one"),
        };
    }

    private static PressurePoint Point(ISection s, PressurePoint p, SettingSource source)
    {
        var depth = s.Quantity("depth", Known(p.Depth, source), Sign.Any, Dimension.Length, "depth of the point");
        var pressure = s.Quantity("pressure", Known(p.Pressure, source), Sign.NotNegative, Dimension.Pressure, "pore pressure there");
        return new PressurePoint(depth.IsSet ? depth.Value : double.NaN, pressure.IsSet ? pressure.Value : double.NaN);
    }

    private static Setting<double> Known(double value, SettingSource source) => double.IsNaN(value) ? default : new(value, source);

    private static TrendPoint TrendPoint(ISection s, TrendPoint p, SettingSource source)
    {
        var depth = s.Quantity("depth", Known(p.Depth, source), Sign.Any, Dimension.Length, "depth below the ground or mudline");
        var slowness = s.Quantity("slowness", Known(p.Slowness, source), Sign.Positive, Dimension.Slowness, "slowness of normally compacted shale there");
        return new TrendPoint(depth.IsSet ? depth.Value : double.NaN, slowness.IsSet ? slowness.Value : double.NaN);
    }

    private static DensityFill Stated(double density) => new(DensityFillKind.Stated, density);

    private static double? Density(DensityFill fill) => fill.Kind == DensityFillKind.Stated ? fill.Density : null;
}

using DepthStress.Core.Calibration;
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

    /// <summary>The words for kinds of depth.</summary>
    public static readonly (string, DepthKind)[] DepthKinds =
        [("md", DepthKind.Measured), ("tvd", DepthKind.TrueVertical), ("tvdss", DepthKind.TrueVerticalSubsea)];

    private static readonly (string, DatumKind)[] Datums =
        [("rotary table", DatumKind.RotaryTable), ("ground", DatumKind.Ground), ("sea level", DatumKind.SeaLevel)];

    /// <summary>The words for reference levels.</summary>
    public static readonly (string, DepthReference)[] References =
    [
        ("rotary table", DepthReference.Datum), ("ground", DepthReference.Ground),
        ("sea surface", DepthReference.SeaSurface), ("mudline", DepthReference.Mudline),
    ];

    private static readonly (string, NorthReference)[] Norths =
        [("true", NorthReference.True), ("grid", NorthReference.Grid), ("magnetic", NorthReference.Magnetic)];

    private static readonly (string, Property)[] PathCurves =
        [("true_vertical_depth", Property.LoggedVerticalDepth), ("vertical_position", Property.LoggedVerticalPosition)];

    private static readonly (string, HeldStrain)[] HeldStrains =
    [
        ("none", HeldStrain.None), ("strain_along_shmin", HeldStrain.AlongShmin), ("strain_along_shmax", HeldStrain.AlongShmax),
        ("difference", HeldStrain.Difference),
    ];

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

    private static readonly (string, ShearChoice)[] ShearChoices =
        [("fast", ShearChoice.Fast), ("slow", ShearChoice.Slow), ("mean", ShearChoice.Mean)];

    private static readonly (string, ResampleMethod)[] ResampleMethods = [("linear", ResampleMethod.Linear), ("mean", ResampleMethod.Mean)];

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
            Calibration = s.Table("calibration", w.Calibration, Calibration, "what the command calibrate estimates, and how"),
            Mud = s.Table("mud", w.Mud, HoleBindings.Mud, "the mud the hole was drilled with"),
            Casing = s.Table("casing", w.Casing, HoleBindings.Casing, "the casing strings"),
            Observations = s.Table("observations", w.Observations, HoleBindings.Observations, "tests made in the hole"),
            Core = s.Table("core", w.Core, CoreSection.Bind, "core plugs that the model is compared with; they never change it"),
            Layers = s.Table("layers", w.Layers, LayerBindings.All, "how the profile is cut into layers"),
            Output = s.Table("output", w.Output, Output, "how results are written"),
        };
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
            Resample = s.Table("resample", l.Resample, Resample, "one regular depth grid for all curves, at whole multiples of its step; without it the depths of the first file lead"),
            ShearFrom = s.Choice("shear_from", l.ShearFrom, ShearChoices, "which wave serves as shear where there are a fast and a slow one but no plain shear; mean is that of the slownesses"),
        },
        Curves,
        "the column of each role; roles not named here are found by the usual mnemonics");

    private static ResampleSection Resample(ISection s, ResampleSection r) => r with
    {
        Step = s.Quantity("step", r.Step, Sign.Positive, Dimension.Length, "distance between depths"),
        Method = s.Choice("method", r.Method, ResampleMethods, "a straight line between samples, or the mean over the step where it holds two or more; codes and bit sizes take the nearest sample"),
        MaxGap = s.Quantity("max_gap", r.MaxGap, Sign.Positive, Dimension.Length, "samples further apart than this are not joined: missing between them"),
        Position = s.Position,
    };

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
        Missing = s.Codes("missing", c.Missing, "further values that mean missing"),
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

    private static CalibrationSettings Calibration(ISection s, CalibrationSettings c) => c with
    {
        Free = s.Texts("free", c.Free, $"what may change: {string.Join(", ", CalibrationSettings.Words.Select(w => w.Word))}"),
        Groups = s.Tables("groups", c.Groups, ZoneGroup, new(), "groups of zones whose strains are estimated apart; none means one pair for the well"),
        Hold = s.Choice("hold", c.Hold, HeldStrains, "what is held of the strains when the observations do not determine both; \"none\" accepts both as estimated"),
        Robust = s.Flag("robust", c.Robust, "true: observations far off weigh less"),
    };

    private static ZoneGroup ZoneGroup(ISection s, ZoneGroup g) => g with
    {
        Zones = s.Texts("zones", g.Zones, "names of the zones"),
        Position = s.Position,
    };

    private static OutputSection Output(ISection s, OutputSection o) => o with
    {
        Units = s.Choice("units", o.Units, UnitSystems, "the units of the results"),
        Tracks = s.Texts("tracks", o.Tracks, "the tracks to draw, in their order"),
        PolygonDepths = s.Texts("polygon_depths", o.PolygonDepths, "depths of the stress polygons, at most six, each with its unit"),
        PolygonDepthKind = s.Choice("polygon_depth_kind", o.PolygonDepthKind, DepthKinds, "the kind of these depths: measured, true vertical, or true vertical below sea level"),
        Pdf = s.Flag("pdf", o.Pdf, "true: the pictures also as a PDF, each on a page of A4"),
        Scales = s.Tables("scales", o.Scales, Scale, new(), "scales of single curves in the tracks"),
    };

    private static ScaleSection Scale(ISection s, ScaleSection c) => c with
    {
        Curve = s.Text("curve", c.Curve, "the curve, named like its column without the unit"),
        Left = s.Text("left", c.Left, "value at the left edge of the track, with its unit"),
        Right = s.Text("right", c.Right, "value at the right edge of the track, with its unit"),
        Position = s.Position,
    };

    /// <summary>A number of a list's row as a setting; not set where the row says nothing.</summary>
    public static Setting<double> Known(double value, SettingSource source) => double.IsNaN(value) ? default : new(value, source);

    private static DensityFill Stated(double density) => new(DensityFillKind.Stated, density);

    private static double? Density(DensityFill fill) => fill.Kind == DensityFillKind.Stated ? fill.Density : null;
}

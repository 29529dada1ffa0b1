using DepthStress.Core.Borehole;
using DepthStress.Core.Calibration;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>The [well] section.</summary>
public sealed record WellSection
{
    /// <summary>The well's name.</summary>
    public Setting<string> Name { get; init; }

    /// <summary>What measured depth counts from.</summary>
    public Setting<DatumKind> Datum { get; init; }

    /// <summary>Elevation of the datum above mean sea level, m.</summary>
    public Setting<double> DatumElevation { get; init; }

    /// <summary>Elevation of the ground above mean sea level, m; onshore.</summary>
    public Setting<double> GroundElevation { get; init; }

    /// <summary>Depth of the sea, m; offshore.</summary>
    public Setting<double> WaterDepth { get; init; }

    /// <summary>Depth of the water table below the ground, m; onshore.</summary>
    public Setting<double> WaterTableDepth { get; init; }
}

/// <summary>Where the values of one role come from.</summary>
public sealed record CurveSource
{
    /// <summary>Name of the column.</summary>
    public Setting<string> Column { get; init; }

    /// <summary>The file, when several have the column.</summary>
    public Setting<string> File { get; init; }

    /// <summary>The unit, when the file states none or a wrong one.</summary>
    public Setting<string> Unit { get; init; }

    /// <summary>Further values that mean missing.</summary>
    public Setting<MissingCodes> Missing { get; init; }

    /// <summary>Measured depth down to which the column is used, m; the next source goes on from there.</summary>
    public Setting<double> Base { get; init; }

    /// <summary>Where the source is named.</summary>
    public SourcePosition Position { get; init; }
}

/// <summary>The sources of one role.</summary>
/// <param name="Role">The role's name.</param>
/// <param name="Sources">Its sources from top to bottom.</param>
public sealed record CurveChoice(string Role, IReadOnlyList<CurveSource> Sources);

/// <summary>Which of two shear waves the isotropic chain takes.</summary>
public enum ShearChoice
{
    /// <summary>The faster one.</summary>
    Fast,

    /// <summary>The slower one.</summary>
    Slow,

    /// <summary>The mean of the two slownesses, sample by sample.</summary>
    Mean,
}

/// <summary>The [logs] section.</summary>
public sealed record LogsSection
{
    /// <summary>The log files, relative to the well file.</summary>
    public Setting<IReadOnlyList<string>> Files { get; init; }

    /// <summary>How CSV files are written.</summary>
    public CsvSection Csv { get; init; } = new();

    /// <summary>What to do with neighbouring rows of the same depth.</summary>
    public Setting<RepeatedDepth> RepeatedDepth { get; init; } = Setting.Default(Reading.RepeatedDepth.Error);

    /// <summary>The regular depth grid that all curves are brought onto.</summary>
    public ResampleSection Resample { get; init; } = new();

    /// <summary>Which of a fast and a slow shear wave serves as shear, when no plain shear column does.</summary>
    public Setting<ShearChoice> ShearFrom { get; init; }

    /// <summary>The column that holds measured depth, when it is not the usual one; one at most in a sound file.</summary>
    public IReadOnlyList<CurveSource> DepthColumns { get; init; } = [];

    /// <summary>The column that holds measured depth, or null where it is the usual one.</summary>
    public CurveSource? Depth => DepthColumns is [var first, ..] ? first : null;

    /// <summary>The choices of columns; roles without one are found by their usual names.</summary>
    public IReadOnlyList<CurveChoice> Curves { get; init; } = [];
}

/// <summary>What azimuths of a survey count from.</summary>
public enum NorthReference
{
    /// <summary>Geographic north.</summary>
    True,

    /// <summary>North of the map grid.</summary>
    Grid,

    /// <summary>Magnetic north.</summary>
    Magnetic,
}

/// <summary>The point from which a survey counts.</summary>
public sealed record TieInSection
{
    /// <summary>Measured depth, m.</summary>
    public Setting<double> MeasuredDepth { get; init; }

    /// <summary>True vertical depth, m.</summary>
    public Setting<double> TrueVerticalDepth { get; init; }

    /// <summary>Where it stands; unknown when the file has none.</summary>
    public SourcePosition? Position { get; init; }
}

/// <summary>The [survey] section.</summary>
public sealed record SurveySection
{
    /// <summary>The survey file, relative to the well file.</summary>
    public Setting<string> File { get; init; }

    /// <summary>The depth curve of the logs that the path follows.</summary>
    public Setting<Property> Curve { get; init; }

    /// <summary>True when the hole is taken as vertical.</summary>
    public Setting<bool> Vertical { get; init; }

    /// <summary>What azimuths count from.</summary>
    public Setting<NorthReference> North { get; init; }

    /// <summary>The point from which the survey counts.</summary>
    public TieInSection TieIn { get; init; } = new();

    /// <summary>Angle between the beds and the horizontal, rad.</summary>
    public Setting<double> BeddingDip { get; init; } = Setting.Default(0.0);

    /// <summary>The direction in which the beds go down, rad.</summary>
    public Setting<double> DipAzimuth { get; init; }
}

/// <summary>One [[zones]] table.</summary>
public sealed record ZoneSection
{
    /// <summary>The zone's name.</summary>
    public Setting<string> Name { get; init; }

    /// <summary>Depth of its top, m.</summary>
    public Setting<double> Top { get; init; }

    /// <summary>Depth of its base, m.</summary>
    public Setting<double> Base { get; init; }

    /// <summary>The kind of these depths.</summary>
    public Setting<DepthKind> DepthKind { get; init; }

    /// <summary>True when the zone is a target.</summary>
    public Setting<bool> Target { get; init; }

    /// <summary>What the zone decides.</summary>
    public StageSettings Overrides { get; init; } = new();

    /// <summary>Where the zone stands.</summary>
    public SourcePosition Position { get; init; }
}

/// <summary>One [[lithology]] table.</summary>
public sealed record LithologySection
{
    /// <summary>The lithology's name.</summary>
    public Setting<string> Name { get; init; }

    /// <summary>Least shale volume.</summary>
    public Setting<double> ShaleVolumeMin { get; init; }

    /// <summary>Greatest shale volume.</summary>
    public Setting<double> ShaleVolumeMax { get; init; }

    /// <summary>Least density, kg/m3.</summary>
    public Setting<double> DensityMin { get; init; }

    /// <summary>Greatest density, kg/m3.</summary>
    public Setting<double> DensityMax { get; init; }

    /// <summary>Least photoelectric factor, b/e.</summary>
    public Setting<double> PhotoelectricMin { get; init; }

    /// <summary>Greatest photoelectric factor, b/e.</summary>
    public Setting<double> PhotoelectricMax { get; init; }

    /// <summary>Facies codes.</summary>
    public Setting<IReadOnlyList<double>> Facies { get; init; }

    /// <summary>True for salt.</summary>
    public Setting<bool> Salt { get; init; }

    /// <summary>What the rule decides.</summary>
    public StageSettings Overrides { get; init; } = new();

    /// <summary>Where the rule stands.</summary>
    public SourcePosition Position { get; init; }
}

/// <summary>One [[output.scales]] table.</summary>
public sealed record ScaleSection
{
    /// <summary>The curve, by the id of its column.</summary>
    public Setting<string> Curve { get; init; }

    /// <summary>The value at the left edge of the track, as text with its unit.</summary>
    public Setting<string> Left { get; init; }

    /// <summary>The value at the right edge of the track, as text with its unit.</summary>
    public Setting<string> Right { get; init; }

    /// <summary>Where the scale stands.</summary>
    public SourcePosition Position { get; init; }
}

/// <summary>The [output] section.</summary>
public sealed record OutputSection
{
    /// <summary>Ids of the tracks to draw, in their order; not set means all.</summary>
    public Setting<IReadOnlyList<string>> Tracks { get; init; }

    /// <summary>Scales of single curves.</summary>
    public IReadOnlyList<ScaleSection> Scales { get; init; } = [];

    /// <summary>The depths of the stress polygons, as text with their units; not set means that the picture chooses.</summary>
    public Setting<IReadOnlyList<string>> PolygonDepths { get; init; }

    /// <summary>The kind of these depths.</summary>
    public Setting<DepthKind> PolygonDepthKind { get; init; }

    /// <summary>True when the pictures are also written as a PDF.</summary>
    public Setting<bool> Pdf { get; init; } = Setting.Default(false);

    /// <summary>The units of the results.</summary>
    public Setting<UnitSystem> Units { get; init; } = Setting.Default(UnitSystem.Metric);
}

/// <summary>The [observations] section.</summary>
public sealed record ObservationsSection
{
    /// <summary>The files, relative to the well file.</summary>
    public Setting<IReadOnlyList<string>> Files { get; init; }

    /// <summary>How they are understood.</summary>
    public ObservationSettings Settings { get; init; } = new();
}

/// <summary>A whole well file as it was bound, before it is put together.</summary>
public sealed record WellFileSections
{
    /// <summary>True when methods whose coefficients were recalled may be used.</summary>
    public Setting<bool> AcceptUnverified { get; init; } = Setting.Default(false);

    /// <summary>The [well] section.</summary>
    public WellSection Well { get; init; } = new();

    /// <summary>The [logs] section.</summary>
    public LogsSection Logs { get; init; } = new();

    /// <summary>The [survey] section.</summary>
    public SurveySection Survey { get; init; } = new();

    /// <summary>The [[zones]] tables.</summary>
    public IReadOnlyList<ZoneSection> Zones { get; init; } = [];

    /// <summary>The [[lithology]] tables.</summary>
    public IReadOnlyList<LithologySection> Lithologies { get; init; } = [];

    /// <summary>The settings that zones and rules may override.</summary>
    public StageSettings Settings { get; init; } = new();

    /// <summary>The [overburden] section.</summary>
    public OverburdenSettings Overburden { get; init; } = new();

    /// <summary>The [calibration] section.</summary>
    public CalibrationSettings Calibration { get; init; } = new();

    /// <summary>The [mud] section.</summary>
    public MudSettings Mud { get; init; } = new();

    /// <summary>The [casing] section.</summary>
    public CasingSettings Casing { get; init; } = new();

    /// <summary>The [observations] section.</summary>
    public ObservationsSection Observations { get; init; } = new();

    /// <summary>The [core] section.</summary>
    public CoreSection Core { get; init; } = new();

    /// <summary>The [layers] section.</summary>
    public LayerSettings Layers { get; init; } = new();

    /// <summary>The [output] section.</summary>
    public OutputSection Output { get; init; } = new();
}

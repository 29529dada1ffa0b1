using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>Reads a directional survey from CSV: measured depth, inclination (or dip) and azimuth, each with its unit.</summary>
internal static class SurveyFile
{
    // Common practice.
    private static readonly string[] DepthNames = ["md", "measured_depth", "depth", "dept"];
    private static readonly string[] InclinationNames = ["inclination", "inc", "incl", "devi", "deviation"];
    private static readonly string[] DipNames = ["dip"];
    private static readonly string[] AzimuthNames = ["azimuth", "azi", "azim", "az", "hazi", "bearing"];

    /// <summary>Reads a survey; null when it cannot be used.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the well file names it.</param>
    /// <param name="csv">How CSV files are written.</param>
    /// <param name="tieIn">The point from which the survey counts, or null.</param>
    /// <param name="inputs">Gets the file with its hash.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static Trajectory? Read(
        string path, string name, CsvOptions csv, TieIn? tieIn, List<InputFile> inputs, DiagnosticBag diagnostics)
    {
        var options = new LogReadOptions { DepthNames = DepthNames, UnitSuffixes = true, Csv = csv };
        if (LogFileReader.Read(path, name, options, diagnostics) is not { } file) return null;
        inputs.Add(new InputFile(name, file.Sha256));
        var lines = SurveyLines.Of(path, file);
        var before = diagnostics.Items.Count(d => d.Severity == Severity.Error);
        var md = Values(file.Columns[file.DepthColumn], Dimension.Length, diagnostics);
        var inclination = Inclination(file, lines, diagnostics);
        var azimuth = Find(file, AzimuthNames) is { } column ? Values(column, Dimension.Angle, diagnostics) : Lacking(file, "azimuth", AzimuthNames, diagnostics);
        if (md is null || inclination is null || azimuth is null) return null;

        FillAzimuths(inclination, azimuth);
        for (var i = 0; i < azimuth.Length; i++)
        {
            if (double.IsNaN(inclination[i])) Report(i, $"found no inclination, expected a number");
            else if (double.IsNaN(azimuth[i])) Report(i, $"found no azimuth at an inclination of {Math.Round(inclination[i] * 180 / Math.PI, 6)} deg, expected a number; it may be left out only where the inclination is 0");
        }

        if (diagnostics.Items.Count(d => d.Severity == Severity.Error) > before) return null;
        var stations = new SurveyStation[file.Rows];
        for (var i = 0; i < stations.Length; i++) stations[i] = new SurveyStation(md[i], inclination[i], azimuth[i]);
        var problems = new List<(int Station, string Problem)>();
        var notes = new List<(int Station, string Note)>();
        var sound = Trajectory.TryCreate(stations, tieIn, out var trajectory, problems, notes);
        foreach (var (station, problem) in problems) Report(station, $"{problem}");

        // Nobody can say where such a hole comes from: the depths of everything below would be a guess.
        foreach (var (station, note) in notes)
            Report(station, $"{note}; expected the point where the survey starts: [survey] tie_in = {{ md = \"{md[0]:G10} m\", tvd = ... }}");
        if (sound && md[0] > tieIn?.MeasuredDepth)
        {
            diagnostics.Note(
                new SourcePosition(name, lines[0]),
                Invariant($"survey station 1: the hole between the tie-in at {tieIn.MeasuredDepth:G10} m and this station at {md[0]:G10} m is taken as straight in the station's direction"));
        }

        return sound && notes.Count == 0 ? trajectory : null;

        void Report(int station, FormattableString text) =>
            diagnostics.Error(new SourcePosition(name, lines[station]), Invariant($"survey station {station + 1}: {Invariant(text)}"));
    }

    private static double[]? Inclination(LogFile file, int[] lines, DiagnosticBag diagnostics)
    {
        if (Find(file, InclinationNames) is { } column) return Values(column, Dimension.Angle, diagnostics);
        if (Find(file, DipNames) is not { } dip) return Lacking(file, "inclination", [.. InclinationNames, .. DipNames], diagnostics);
        return Values(dip, Dimension.Angle, diagnostics) is { } angles ? SurveyDip.ToInclination(angles, file, dip, lines, diagnostics) : null;
    }

    /// <summary>Where the hole is vertical the azimuth means nothing: a missing one is the next station's, at the end the one before.</summary>
    private static void FillAzimuths(double[] inclination, double[] azimuth)
    {
        for (var i = azimuth.Length - 2; i >= 0; i--) Take(i, i + 1);
        for (var i = 1; i < azimuth.Length; i++) Take(i, i - 1);
        if (Array.TrueForAll(inclination, angle => angle == 0) && Array.TrueForAll(azimuth, double.IsNaN)) Array.Fill(azimuth, 0);

        void Take(int station, int from)
        {
            if (double.IsNaN(azimuth[station]) && inclination[station] == 0) azimuth[station] = azimuth[from];
        }
    }

    private static LogColumn? Find(LogFile file, string[] names) => names
        .Select(n => file.Columns.FirstOrDefault(c => c.Name.Equals(n, StringComparison.OrdinalIgnoreCase)))
        .FirstOrDefault(c => c is not null);

    private static double[]? Lacking(LogFile file, string title, string[] names, DiagnosticBag diagnostics)
    {
        diagnostics.Error(new SourcePosition(file.Name, 1), $"found no column for {title}, expected one named {string.Join(", ", names)}");
        return null;
    }

    private static double[]? Values(LogColumn column, Dimension dimension, DiagnosticBag diagnostics)
    {
        if (Units.Find(column.Unit ?? "", dimension) is not { } unit)
        {
            diagnostics.Error(column.Position, $"column {column.Name}: found {(column.Unit is null ? "no unit" : $"the unit \"{column.Unit}\"")}, expected one of {Units.Symbols(dimension)}, as in {column.Name}[{Units.Of(dimension).First().Symbol}]");
            return null;
        }

        var values = (double[])column.Values.Clone();
        unit.ToSi(values);
        return values;
    }
}

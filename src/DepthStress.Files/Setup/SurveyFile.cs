using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>Reads a directional survey from CSV: measured depth, inclination and azimuth, each with its unit in the header.</summary>
internal static class SurveyFile
{
    private static readonly string[] DepthNames = ["md", "measured_depth", "depth", "dept"];
    private static readonly string[] InclinationNames = ["inclination", "inc", "incl"];
    private static readonly string[] AzimuthNames = ["azimuth", "azi", "azim", "az"];

    /// <summary>Reads a survey; null when it cannot be used.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the well file names it.</param>
    /// <param name="csv">How CSV files are written.</param>
    /// <param name="inputs">Gets the file with its hash.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static Trajectory? Read(string path, string name, CsvOptions csv, List<InputFile> inputs, DiagnosticBag diagnostics)
    {
        var options = new LogReadOptions { DepthNames = DepthNames, UnitSuffixes = true, Csv = csv };
        if (LogFileReader.Read(path, name, options, diagnostics) is not { } file) return null;
        inputs.Add(new InputFile(name, file.Sha256));
        var md = Column(file, DepthNames, "measured depth", Dimension.Length, diagnostics);
        var inclination = Column(file, InclinationNames, "inclination", Dimension.Angle, diagnostics);
        var azimuth = Column(file, AzimuthNames, "azimuth", Dimension.Angle, diagnostics);
        if (md is null || inclination is null || azimuth is null) return null;

        var stations = new SurveyStation[file.Rows];
        for (var i = 0; i < stations.Length; i++) stations[i] = new SurveyStation(md[i], inclination[i], azimuth[i]);
        var problems = new List<(int Station, string Problem)>();
        var notes = new List<(int Station, string Note)>();
        var sound = Trajectory.TryCreate(stations, out var trajectory, problems, notes);
        foreach (var (station, problem) in problems) diagnostics.Error(new SourcePosition(name), Invariant($"survey station {station + 1}: {problem}"));
        foreach (var (station, note) in notes) diagnostics.Warning(new SourcePosition(name), Invariant($"survey station {station + 1}: {note}"));
        return sound ? trajectory : null;
    }

    private static double[]? Column(LogFile file, string[] names, string title, Dimension dimension, DiagnosticBag diagnostics)
    {
        var column = names.Select(n => file.Columns.FirstOrDefault(c => c.Name.Equals(n, StringComparison.OrdinalIgnoreCase))).FirstOrDefault(c => c is not null);
        if (column is null)
        {
            diagnostics.Error(new SourcePosition(file.Name, 1), $"found no column for {title}, expected one named {string.Join(", ", names)}");
            return null;
        }

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

using DepthStress.Core.Calibration;
using DepthStress.Files.Writing;
using DepthStress.Report;

namespace DepthStress.Cli.Runs;

/// <summary>Writes the results of a calibration into a folder of its own, whole or not at all.</summary>
internal static class CalibrationWriter
{
    /// <summary>The folder beside the well file.</summary>
    public static string DefaultFolder(string wellFile) =>
        Path.Combine(Path.GetDirectoryName(wellFile)!, Path.GetFileNameWithoutExtension(wellFile) + "-calibration");

    /// <summary>Writes the results.</summary>
    public static void Write(LoadedWell well, CalibrationResult result, string folder, Action<string> stage, CancellationToken cancellation)
    {
        var units = well.File.Sections.Output.Units.Value;
        List<(string Name, Action<Stream> Write)> results =
        [
            ("calibration.svg", s => CalibrationPicture.Write(result, units, s)),
            ("calibration.json", s => CalibrationJson.Write(result, units, s)),
            ("observations.csv", s => ObservationsCsv.Write(result.AfterFit, units, s)),
            ("README.txt", s => ResultGuide.WriteCalibration(well.File.Setup, units, s)),
        ];
        if (well.File.Sections.Output.Pdf.Value) results.Add(("calibration.pdf", s => CalibrationPicture.WritePdf(result, units, s)));

        using var target = ResultFolder.Begin(folder);
        foreach (var (name, write) in results)
        {
            stage($"writing {name}");
            using var stream = target.Create(name);
            write(stream);
        }

        cancellation.ThrowIfCancellationRequested();
        target.Commit();
    }
}

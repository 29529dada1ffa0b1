using DepthStress.Cli.Printing;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Writing;
using DepthStress.Report;
using DepthStress.Report.Page;

namespace DepthStress.Cli.Runs;

/// <summary>Brings together what the report page says: the summary's own sentences, findings, messages and inputs.</summary>
internal static class ReportParts
{
    /// <summary>The content of a well's page.</summary>
    /// <param name="well">The well.</param>
    /// <param name="drawn">Its static pictures.</param>
    /// <param name="solved">What the program's own finite elements find in its layers; null where none can be solved.</param>
    /// <param name="diagnostics">Every message.</param>
    public static ReportContent Of(LoadedWell well, DrawnPictures drawn, IReadOnlyList<ColumnBlock>? solved, DiagnosticBag diagnostics)
    {
        var (file, logs, model, pictures) = well;
        var units = file.Sections.Output.Units.Value;
        return new ReportContent(model, well.Layers, pictures)
        {
            Drawn = drawn,
            Comparisons = well.Observed,
            Zones = well.Zones,
            Sensitivities = well.Sensitivities,
            Spreads = well.Spread,
            Core = well.Core,
            Solved = solved,
            Barriers = BarrierPrinter.Lines(well),
            Observed = [.. ObservationPrinter.Lines(well).Select(l => l.Trim())],
            Remarks =
            [
                .. DepletionResult.Of(model).Select(d => DepletionText.Line(d, model, units)),
                .. well.Core is { } core ? CorePrinter.Lines(core, units).Select(l => l.Trim()) : [],
            ],
            Findings = [.. model.Findings.Select(f => FindingText.Of(f, units, model.Count)), .. diagnostics.Items.Select(d => d.ToString())],
            Inputs = [.. file.Inputs.Select(i => (i.Name, i.Sha256)), .. logs.Files.Select(f => (f.Name, f.Sha256))],
            Version = RunJson.Version,
        };
    }
}

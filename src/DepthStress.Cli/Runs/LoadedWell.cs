using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Report;

namespace DepthStress.Cli.Runs;

/// <summary>A well that was read and computed, before anything is written.</summary>
/// <param name="File">The well file.</param>
/// <param name="Logs">The logs.</param>
/// <param name="Model">The model.</param>
/// <param name="Pictures">How its pictures are drawn.</param>
internal sealed record LoadedWell(WellFile File, IngestedLogs Logs, EarthModel Model, PictureOptions Pictures)
{
    /// <summary>The layers that the model is cut into; what is found about them is among the model's findings.</summary>
    public required LayerTable Layers { get; init; }

    /// <summary>Its observations beside the model.</summary>
    public required IReadOnlyList<Comparison> Observed { get; init; }

    /// <summary>Its core beside the model; null without plugs.</summary>
    public required CoreComparison? Core { get; init; }

    /// <summary>Means of its zones.</summary>
    public IReadOnlyList<ZoneMeans> Zones => field ??= ZoneMeans.Of(Model);

    /// <summary>How its mean Shmin hangs on the choices that logs cannot settle.</summary>
    public IReadOnlyList<ShminSensitivity> Sensitivities => field ??= ShminSensitivity.Of(Model);

    /// <summary>What every admissible choice makes of Shmin; null when that was not asked for.</summary>
    public IReadOnlyList<ChoiceSpread>? Spread { get; init; }

    /// <summary>Reads and computes a well; null when its input cannot be used.</summary>
    /// <param name="path">Full path of the well file.</param>
    /// <param name="diagnostics">Gets every message.</param>
    /// <param name="stage">Told the name of each stage as it begins.</param>
    /// <param name="cancellation">Stops between stages.</param>
    public static LoadedWell? Load(string path, DiagnosticBag diagnostics, Action<string> stage, CancellationToken cancellation)
    {
        stage("reading the well file");
        if (WellFileReader.Read(path, diagnostics) is not { } file) return null;
        var pictures = PictureChoice.Of(file.Sections.Output, diagnostics);
        cancellation.ThrowIfCancellationRequested();
        stage("reading the logs");
        var logs = LogIngest.Read(file, diagnostics);
        if (logs is null || diagnostics.HasErrors) return null;
        cancellation.ThrowIfCancellationRequested();
        stage("computing");
        if (Chain.Run(file.Setup, logs.Logs, diagnostics) is not { } model) return null;
        PictureChoice.Check(pictures, file.Sections.Output, model, diagnostics);
        if (LayerBuilder.Build(model, file.Sections.Layers, diagnostics) is not { } layers) return null;
        return new LoadedWell(file, logs, model with { Findings = FindingRules.Sort(model.Findings.Concat(layers.Findings)) }, pictures)
        {
            Layers = layers,
            Observed = Comparison.Of(model),
            Core = CoreComparison.Of(model),
        };
    }
}

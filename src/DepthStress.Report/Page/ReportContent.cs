using DepthStress.Core.Calibration;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;

namespace DepthStress.Report.Page;

/// <summary>What the page shows beside pictures: results, and sentences that were put into words elsewhere.</summary>
/// <param name="Model">The model.</param>
/// <param name="Layers">Its layers.</param>
/// <param name="Pictures">Units, tracks and scales.</param>
public sealed record ReportContent(EarthModel Model, LayerTable Layers, PictureOptions Pictures)
{
    /// <summary>The static pictures, drawn once for their files and the page.</summary>
    public DrawnPictures Drawn { get => field ??= new(Model, Layers, new LayerSettings(), Pictures); init; }

    /// <summary>The observations beside the model.</summary>
    public IReadOnlyList<Comparison> Comparisons { get => field ??= Comparison.Of(Model); init; }

    /// <summary>Means of the zones.</summary>
    public IReadOnlyList<ZoneMeans> Zones { get => field ??= ZoneMeans.Of(Model); init; }

    /// <summary>How mean Shmin hangs on the choices that logs cannot settle.</summary>
    public IReadOnlyList<ShminSensitivity> Sensitivities { get => field ??= ShminSensitivity.Of(Model); init; }

    /// <summary>Up to so many samples the page tries every choice for the rock unasked.</summary>
    public const int MostForSpread = 200_000;

    /// <summary>What every admissible choice for the rock makes of mean Shmin; null where that was not asked for and takes long.</summary>
    public IReadOnlyList<ChoiceSpread>? Spreads { get => field ??= Model.Count <= MostForSpread ? ChoiceSpread.Of(Model) : null; init; }

    /// <summary>The core beside the model; null without plugs.</summary>
    public CoreComparison? Core { get; init; }

    /// <summary>What the program's own finite elements find in the exported layers; null where none can be solved.</summary>
    public IReadOnlyList<ColumnBlock>? Solved { get; init; }

    /// <summary>Lines on the nearest stress barriers of each target zone.</summary>
    public IReadOnlyList<string> Barriers { get; init; } = [];

    /// <summary>How well the model meets its observations.</summary>
    public IReadOnlyList<string> Observed { get; init; } = [];

    /// <summary>Further sentences of the summary.</summary>
    public IReadOnlyList<string> Remarks { get; init; } = [];

    /// <summary>Findings and messages, most important first.</summary>
    public IReadOnlyList<string> Findings { get; init; } = [];

    /// <summary>The input files with their SHA-256.</summary>
    public IReadOnlyList<(string Name, string Sha256)> Inputs { get; init; } = [];

    /// <summary>Version of the program.</summary>
    public string Version { get; init; } = "";
}

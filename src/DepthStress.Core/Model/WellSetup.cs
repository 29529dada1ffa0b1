using DepthStress.Core.Borehole;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>Everything the chain needs to know beside the logs, validated and in SI.</summary>
public sealed record WellSetup
{
    /// <summary>The well file, for messages about what it lacks.</summary>
    public SourcePosition Position { get; init; }

    /// <summary>The well's name.</summary>
    public required string Name { get; init; }

    /// <summary>Where the surfaces lie.</summary>
    public required DepthFrame Frame { get; init; }

    /// <summary>False when the reference levels only stand in for wrong ones, while further problems are looked for.</summary>
    public bool FrameKnown { get; init; } = true;

    /// <summary>The path of the hole; a vertical one stands in while <see cref="PathCurve"/> is still to be read.</summary>
    public required Trajectory Trajectory { get; init; }

    /// <summary>The depth curve of the logs that the path follows; not set where the path is known without.</summary>
    public Setting<Property> PathCurve { get; init; }

    /// <summary>The lie of the beds.</summary>
    public Bedding Bedding { get; init; } = Bedding.Flat;

    /// <summary>The zones from top to bottom; may be empty.</summary>
    public IReadOnlyList<Zone> Zones { get; init; } = [];

    /// <summary>The lithology rules; the first that holds decides.</summary>
    public IReadOnlyList<LithologyChoice> Lithologies { get; init; } = [];

    /// <summary>The well's settings, which zones and lithology rules may override.</summary>
    public StageSettings Settings { get; init; } = new();

    /// <summary>How the vertical stress is had where density is not logged.</summary>
    public OverburdenSettings Overburden { get; init; } = new();

    /// <summary>What was observed in the well, in the order of its rows.</summary>
    public IReadOnlyList<Observation> Observations { get; init; } = [];

    /// <summary>How the observations are understood.</summary>
    public ObservationSettings ObservationSettings { get; init; } = new();

    /// <summary>The mud the hole was drilled with.</summary>
    public MudSettings Mud { get; init; } = new();

    /// <summary>The casing strings.</summary>
    public CasingSettings Casing { get; init; } = new();

    /// <summary>The core plugs, which the model is compared with.</summary>
    public CoreData Core { get; init; } = new();

    /// <summary>True when the user accepts methods whose coefficients were recalled, not read.</summary>
    public bool AcceptUnverified { get; init; }
}

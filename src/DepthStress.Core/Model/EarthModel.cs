using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>How a law served one zone and lithology.</summary>
/// <param name="Slot">Where the law was chosen.</param>
/// <param name="Law">The law.</param>
/// <param name="Zone">Index of the zone, or -1.</param>
/// <param name="Lithology">Index of the lithology rule, or -1.</param>
/// <param name="Outcome">How many samples it served.</param>
public sealed record LawUse(LawSlot Slot, Law Law, short Zone, short Lithology, LawOutcome Outcome);

/// <summary>The result of the chain: properties, pressures and stresses at every depth, with where they came from.</summary>
public sealed record EarthModel
{
    /// <summary>The setup the model was made with.</summary>
    public required WellSetup Setup { get; init; }

    /// <summary>The logs as the chain used them.</summary>
    public required LogTable Logs { get; init; }

    /// <summary>Everything computed, one column per property.</summary>
    public required PropertyTable Values { get; init; }

    /// <summary>Samples that enter the overburden, trends and layers.</summary>
    public required bool[] Usable { get; init; }

    /// <summary>Zone of each sample, or -1.</summary>
    public required short[] Zones { get; init; }

    /// <summary>Lithology rule of each sample, or -1.</summary>
    public required short[] Lithologies { get; init; }

    /// <summary>Samples that share their settings.</summary>
    public required IReadOnlyList<SettingsRun> Runs { get; init; }

    /// <summary>Origin of each density the overburden used.</summary>
    public required OriginTrack DensityOrigins { get; init; }

    /// <summary>The weakest origin each sample's stresses rest on; none where there is no stress.</summary>
    public required SampleOrigin[] StressBasis { get; init; }

    /// <summary>How the laws served.</summary>
    public required IReadOnlyList<LawUse> LawUses { get; init; }

    /// <summary>What was predicted because it was not logged.</summary>
    public IReadOnlyList<Prediction> Predictions { get; init; } = [];

    /// <summary>The exponential normal trends that pore pressure rests on, from top to bottom; those given as points are settings.</summary>
    public IReadOnlyList<FittedTrend> Trends { get; init; } = [];

    /// <summary>Curves that the model's least stress is compared with.</summary>
    public IReadOnlyList<ComparisonCurve> Comparisons { get; init; } = [];

    /// <summary>What a reader should know, most important first.</summary>
    public IReadOnlyList<Finding> Findings { get; init; } = [];

    /// <summary>Number of samples.</summary>
    public int Count => Values.Count;

    /// <summary>The name of a zone, or nothing.</summary>
    public string ZoneName(int zone) => zone < 0 ? "" : Setup.Zones[zone].Name;

    /// <summary>The name of a zone as a table shows it, which needs a word for samples outside zones and for a well without zones.</summary>
    public string ZoneTitle(int zone) => zone >= 0 ? ZoneName(zone) : Setup.Zones.Count == 0 ? "whole log" : "no zone";

    /// <summary>The name of a lithology, or nothing.</summary>
    public string LithologyName(int lithology) => lithology < 0 ? "" : Setup.Lithologies[lithology].Rule.Name;

    /// <summary>Origins of a curve as the results show them; null when the curve is not there.</summary>
    public OriginTrack? Origins(Property property) =>
        property == Property.Density ? DensityOrigins : Logs[property]?.Origins;
}

namespace DepthStress.Core.Model;

/// <summary>Everything that is looked for in the results: a pure pass over a finished model that changes nothing.</summary>
public static class FindingRules
{
    /// <summary>The rules.</summary>
    public static IReadOnlyList<Func<EarthModel, IEnumerable<Finding>>> All { get; } =
    [
        MissingFindings.Of, LawFindings.Of, LithologyFindings.Of, PredictionFindings.Of, PhysicalFindings.Of, PressureFindings.Of, FrictionFindings.Of, BeddingFindings.Of,
        ObservationFindings.Of, AnisotropyFindings.Of, ComparisonFindings.Of,
    ];

    /// <summary>Most important first: by severity, then what concerns the well as a whole, then by the number of samples.</summary>
    public static IReadOnlyList<Finding> Sort(IEnumerable<Finding> findings) =>
    [
        .. findings
            .OrderByDescending(f => f.Severity)
            .ThenByDescending(f => f.Samples == 0 ? int.MaxValue : f.Samples),
    ];
}

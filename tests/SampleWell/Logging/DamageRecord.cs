namespace SampleWell.Logging;

/// <summary>The ways in which real logs are spoiled.</summary>
public enum DamageKind
{
    /// <summary>A stretch without values.</summary>
    Gap,

    /// <summary>One or two samples without values.</summary>
    Null,

    /// <summary>A value that cannot be rock, one or a few samples long.</summary>
    Spike,

    /// <summary>An enlarged hole: caliper up, density low, density correction up.</summary>
    Washout,

    /// <summary>The old, larger hole seen by the run of the next bit.</summary>
    RatHole,

    /// <summary>A long stretch in which the shear arrival was not found.</summary>
    MissingShear,

    /// <summary>The tool stood still while the recorder ran.</summary>
    Parked,

    /// <summary>The number for "missing" was averaged with a value when the curve was resampled.</summary>
    NullSmear,
}

/// <summary>One spoiled stretch of one curve.</summary>
/// <param name="File">File of the run.</param>
/// <param name="Curve">Column name.</param>
/// <param name="Start">Measured depth of the first spoiled sample, m.</param>
/// <param name="End">Measured depth of the last spoiled sample, m.</param>
/// <param name="Kind">What happened.</param>
public sealed record DamageRecord(string File, string Curve, double Start, double End, DamageKind Kind);

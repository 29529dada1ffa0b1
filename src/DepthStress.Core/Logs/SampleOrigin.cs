namespace DepthStress.Core.Logs;

/// <summary>Where a sample's value came from, from the strongest to the weakest.</summary>
public enum SampleOrigin : byte
{
    /// <summary>There is no value and none was taken out.</summary>
    None,

    /// <summary>As logged.</summary>
    Measured,

    /// <summary>As logged, from one of several runs joined at a stated depth.</summary>
    Spliced,

    /// <summary>Logged, then changed or taken out by a named step.</summary>
    Edited,

    /// <summary>Bridged across a gap by a chosen fill.</summary>
    Filled,

    /// <summary>Computed from other logs.</summary>
    Predicted,

    /// <summary>Carried on beyond the logged interval.</summary>
    Extrapolated,

    /// <summary>Put in by the user.</summary>
    Assumed,
}

/// <summary>The names results use for origins.</summary>
public static class SampleOrigins
{
    /// <summary>The origin's lower-case name; empty for <see cref="SampleOrigin.None"/>.</summary>
    public static string Name(this SampleOrigin origin) => origin switch
    {
        SampleOrigin.Measured => "measured",
        SampleOrigin.Spliced => "spliced",
        SampleOrigin.Edited => "edited",
        SampleOrigin.Filled => "filled",
        SampleOrigin.Predicted => "predicted",
        SampleOrigin.Extrapolated => "extrapolated",
        SampleOrigin.Assumed => "assumed",
        _ => "",
    };
}

namespace DepthStress.Core.Calibration;

/// <summary>What an observation says about the model's value (common practice).</summary>
public enum Meaning
{
    /// <summary>Nothing that can be compared.</summary>
    Nothing,

    /// <summary>The value itself.</summary>
    Value,

    /// <summary>The model's value is at most this one.</summary>
    UpperBound,

    /// <summary>The model's value is at least this one.</summary>
    LowerBound,
}

using DepthStress.Core.Calibration;

namespace DepthStress.Report.Page;

/// <summary>What an observation says of the model's value, in words.</summary>
internal static class MeaningWords
{
    /// <summary>The words; the same as in the table of observations.</summary>
    public static string Of(Reading reading) => reading.Meaning switch
    {
        Meaning.Value => "value",
        Meaning.UpperBound => "upper bound",
        Meaning.LowerBound => "lower bound",
        _ => "nothing",
    };
}

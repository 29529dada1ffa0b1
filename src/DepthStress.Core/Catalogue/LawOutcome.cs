namespace DepthStress.Core.Catalogue;

/// <summary>How many samples of a run a law served, and why it did not serve the others.</summary>
/// <param name="Evaluated">Samples with a result.</param>
/// <param name="InputMissing">Samples where an input was missing.</param>
/// <param name="OutsideDomain">Samples where the formula has no meaning; their result is missing.</param>
/// <param name="OutsideRange">Samples with a result beyond the range the law was fitted in.</param>
public readonly record struct LawOutcome(int Evaluated, int InputMissing, int OutsideDomain, int OutsideRange)
{
    /// <summary>Adds two counts.</summary>
    public static LawOutcome operator +(LawOutcome a, LawOutcome b) => new(
        a.Evaluated + b.Evaluated,
        a.InputMissing + b.InputMissing,
        a.OutsideDomain + b.OutsideDomain,
        a.OutsideRange + b.OutsideRange);

    /// <summary>Adds two counts.</summary>
    public static LawOutcome Add(LawOutcome left, LawOutcome right) => left + right;
}

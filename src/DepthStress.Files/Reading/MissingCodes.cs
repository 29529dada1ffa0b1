namespace DepthStress.Files.Reading;

/// <summary>What a column has where there is no value.</summary>
/// <param name="Numbers">Numbers that mean missing.</param>
/// <param name="Texts">Texts that mean missing, without regard to the case of ASCII letters.</param>
public sealed record MissingCodes(IReadOnlyList<double> Numbers, IReadOnlyList<string> Texts);

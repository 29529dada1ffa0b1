using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Samples that a relation filled because they were not logged.</summary>
/// <param name="Property">Shear velocity or density.</param>
/// <param name="Law">The relation.</param>
/// <param name="Words">Its name for messages: an id, or what it was trained on.</param>
/// <param name="Error">Standard error, SI; missing where the well has nothing logged to compare with.</param>
/// <param name="Samples">True where it filled a sample.</param>
/// <param name="Beyond">True where it filled one beyond the range it was trained in.</param>
public sealed record Prediction(Property Property, Law Law, string Words, double Error, bool[] Samples, bool[] Beyond);

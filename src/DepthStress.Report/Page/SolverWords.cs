using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>What comes back when the exported layers are solved, in words.</summary>
internal static class SolverWords
{
    /// <summary>The sentences: balance and formula, which tell whether the layers are solvable, and what layering costs.</summary>
    public static IReadOnlyList<string> Of(ClosedLoop loop, IReadOnlyList<ColumnBlock> blocks, UnitSystem units)
    {
        var many = blocks.Count == 1 ? "in one piece" : string.Create(CultureInfo.InvariantCulture, $"in {blocks.Count} pieces, parted where layers have no values");
        var (formula, profile) = (loop.Formula, loop.Profile);
        return
        [
            string.Create(CultureInfo.InvariantCulture, $"The program's own one-dimensional finite elements solve the {loop.Layers.Count} exported layers {many}: forces balance to {blocks.Max(b => b.Residual):0.0E+0} of the load, and each stress meets the layers' own formula to {formula.Share:0.0E+0} of it (wanted: 1E-6)."),
            profile.Layer == 0
                ? "The layers' means cannot be put beside a profile: it has no stress."
                : string.Create(CultureInfo.InvariantCulture, $"Layer means of the solved stresses and of the profile at log scale differ most in layer {profile.Layer}: {profile.Stress} by {100 * profile.Share:F2} % ({units.Show(Quantity.Pressure(profile.Pressure))})."),
        ];
    }
}

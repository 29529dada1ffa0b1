using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>What a reader of the comparison curves should know.</summary>
internal static class ComparisonFindings
{
    /// <summary>Looks for a well that crosses the join of two branches.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var (upper, lower) = (ComparisonMethods.GulfCoast, ComparisonMethods.GulfCoastDeep);
        if (!Serves(model, upper) || !Serves(model, lower)) yield break;
        var feet = ComparisonMethods.GulfCoastJoin;
        var step = lower.Evaluate(feet, 0) - upper.Evaluate(feet, 0);
        yield return Finding.General(
            Severity.Warning,
            $"[horizontal_stress] compare: the two branches of {upper.Id} are {Quantity.Pressure(Units.Psi.ToSi(step))} apart where they join, at {Quantity.Length(Units.Foot.ToSi(feet))} below the surface; the step is the relation's, not the rock's");
    }

    private static bool Serves(EarthModel model, Law law) => model.LawUses.Any(u => u.Law == law && u.Outcome.Evaluated > 0);
}

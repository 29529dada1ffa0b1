using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Where laws did not serve, or served beyond the range they were fitted in.</summary>
internal static class LawFindings
{
    /// <summary>Looks at how each law served, all zones together.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        foreach (var uses in model.LawUses.GroupBy(u => (u.Slot, u.Law)))
        {
            var (slot, law) = uses.Key;
            var total = uses.Aggregate(default(LawOutcome), (sum, use) => sum + use.Outcome);
            if (total is { OutsideDomain: > 0, Evaluated: 0 })
            {
                yield return new Finding(
                    Severity.Warning, $"{slot.Key}: {law.Id} gives no result at any sample, it has no meaning for their values", total.OutsideDomain, []);
            }
            else if (total.OutsideDomain > 0)
            {
                yield return new Finding(
                    Severity.Warning, $"{slot.Key}: {law.Id} has no meaning for these samples, the result is missing", total.OutsideDomain, []);
            }

            // Of a trained relation, where it went beyond its range is known sample by sample and said elsewhere.
            if (total.OutsideRange > 0 && law.Standing != Standing.Trained)
            {
                yield return new Finding(
                    Severity.Note, $"{slot.Key}: {law.Id} was used beyond the range it was fitted in", total.OutsideRange, []);
            }

            foreach (var input in law.Inputs)
            {
                if (LawParameters.Of(input.Property) is not null || model.Values.Has(input.Property)) continue;
                yield return Finding.General(
                    Severity.Warning, $"{slot.Key}: {law.Id} needs {Name(input.Property)}, which is not there; the result is missing");
            }
        }
    }

    /// <summary>What the user would have to give so that the property is there.</summary>
    private static string Name(Property property) => property switch
    {
        Property.GammaRayIndex => Name(Property.GammaRay),
        Property.CompressionalSlowness => Name(Property.Vp),
        Property.YoungsDynamic or Property.PoissonDynamic => $"{Name(Property.Vp)} and {Name(Property.Vs)}",
        Property.ShearSlowness => Name(Property.Vs),
        _ => CurveRoles.Of(property)?.Title ?? LawSlots.All.FirstOrDefault(s => s.Property == property)?.Key ?? property.ToString(),
    };
}

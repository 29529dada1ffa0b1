using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Finds what a method would need that a computed well does not have.</summary>
public static class MethodNeeds
{
    /// <summary>
    /// What is missing for the law, in words or as keys of the well file, each once; empty when the law could be chosen. A
    /// column is there when one of its values is; a parameter when it is set for any run of samples.
    /// </summary>
    public static IReadOnlyList<string> Missing(Law law, EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(law);
        ArgumentNullException.ThrowIfNull(model);
        return [.. law.Inputs.SelectMany(i => Missing(i.Property, model)).Distinct()];
    }

    private static IEnumerable<string> Missing(Property property, EarthModel model)
    {
        if (LawParameters.Of(property) is { } parameter)
            return model.Runs.Any(r => !double.IsNaN(parameter.Value(r.Settings))) ? [] : [parameter.Key];
        return property switch
        {
            _ when HasValues(model, property) => [],
            Property.DepthBelowSurface or Property.DepthBelowGroundOrSea => [],
            Property.CompressionalSlowness => Missing(Property.Vp, model),
            Property.ShearSlowness => Missing(Property.Vs, model),
            Property.YoungsDynamic or Property.PoissonDynamic =>
                Missing(Property.Vp, model).Concat(Missing(Property.Vs, model)),
            Property.GammaRayIndex => IndexMissing(model),
            _ when LawSlots.All.Except(LawSlots.Prediction).FirstOrDefault(s => s.Property == property) is { } slot => [slot.Key],
            _ => [PropertyNames.Title(property)],
        };
    }

    private static IEnumerable<string> IndexMissing(EarthModel model)
    {
        var shale = model.Runs.Select(r => r.Settings.Shale).ToList();
        if (!HasValues(model, Property.GammaRay)) yield return PropertyNames.Title(Property.GammaRay);
        if (!shale.Exists(s => s.Clean.IsSet)) yield return "[shale] clean";
        if (!shale.Exists(s => s.Shale.IsSet)) yield return "[shale] shale";
    }

    private static bool HasValues(EarthModel model, Property property)
    {
        foreach (var value in model.Values.Read(property))
        {
            if (!double.IsNaN(value)) return true;
        }

        return false;
    }
}

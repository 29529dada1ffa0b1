using DepthStress.Core.Catalogue;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Prediction;
using DepthStress.Core.Pressure;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>The method catalogue: every published relation the program knows, once, put together from the stages' own entries.</summary>
public static class MethodCatalogue
{
    private const int MostListed = 6;

    /// <summary>Every entry, grouped by what it gives.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        .. ShaleMethods.All,
        .. DensityMethods.All,
        .. PorosityMethods.All,
        .. ShearMethods.All,
        .. StaticYoungsMethods.All,
        .. StaticPoissonMethods.All,
        .. StrengthMethods.All,
        .. FrictionMethods.All,
        .. TensileMethods.All,
        .. ToughnessMethods.All,
        .. BrittlenessMethods.All,
        .. BiotMethods.All,
        .. ShallowDensityMethods.All,
        .. PressureMethods.All,
        .. AnisotropyMethods.All,
        .. ComparisonMethods.All,
    ];

    /// <summary>The entry of an id, or null.</summary>
    public static Law? Find(string id) => All.FirstOrDefault(l => l.Id == id);

    /// <summary>The entries that give a property.</summary>
    public static IEnumerable<Law> For(Property property) => All.Where(l => l.Predicts == property);

    /// <summary>The ids that give a property, for messages; where they are many, the first ones and how to list them all.</summary>
    public static string Choices(Property property)
    {
        var ids = For(property).Select(l => l.Id).ToList();
        if (TrainedRelation.For(property) is { } trained) ids.Insert(0, trained.Id);
        return ids.Count <= MostListed
            ? string.Join(", ", ids)
            : $"{string.Join(", ", ids.Take(MostListed - 2))} and others, see \"depthstress methods --for {PropertyNames.Name(property)}\"";
    }
}

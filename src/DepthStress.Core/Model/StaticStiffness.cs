using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>The five static stiffnesses of a sample, for layers and solvers.</summary>
public static class StaticStiffness
{
    /// <summary>
    /// The stiffness, Pa; NaN where a constant is missing. Isotropic where the rock has no constants along its beds. The shear
    /// modulus across the beds keeps the dynamic ratio to that in the plane of the beds, since no law gives it; it enters no stress
    /// of this program.
    /// </summary>
    /// <param name="table">The table, filled up to the static constants.</param>
    /// <param name="sample">The sample.</param>
    public static VtiStiffness At(PropertyTable table, int sample)
    {
        ArgumentNullException.ThrowIfNull(table);
        var (e, nu) = (Value(Property.YoungsStatic), Value(Property.PoissonStatic));
        var (eh, nuh) = (Value(Property.YoungsStaticHorizontal), Value(Property.PoissonStaticHorizontal));
        if (double.IsNaN(eh)) return VtiStiffness.Isotropic(e, nu);
        var across = DynamicModuli.Shear(Value(Property.Vs), Value(Property.Density));
        var within = Value(Property.YoungsDynamicHorizontal) / (2 * (1 + Value(Property.PoissonDynamicHorizontal)));
        return new VtiConstants(e, eh, nu, nuh, ElasticConstants.Shear(eh, nuh) * across / within).ToStiffness();

        double Value(Property property) => table.Has(property) ? table.Read(property)[sample] : double.NaN;
    }
}

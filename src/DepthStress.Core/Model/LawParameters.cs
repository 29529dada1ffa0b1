using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>A number a law needs that no log gives: it stands in the settings, without a default.</summary>
/// <param name="Property">The property that laws name.</param>
/// <param name="Key">The key in the well file that gives it.</param>
/// <param name="Setting">Reads it from the settings, SI.</param>
/// <param name="Reciprocal">True when the property is one over the setting: a velocity given as a slowness.</param>
public sealed record LawParameter(Property Property, string Key, Func<StageSettings, Setting<double>> Setting, bool Reciprocal = false)
{
    /// <summary>Its value in SI, NaN when it is not set.</summary>
    public double Value(StageSettings settings)
    {
        var setting = Setting(settings);
        if (!setting.IsSet) return double.NaN;
        return Reciprocal ? 1 / setting.Value : setting.Value;
    }
}

/// <summary>Every parameter that laws may name.</summary>
public static class LawParameters
{
    private static readonly Dictionary<Property, LawParameter> ByProperty = new[]
    {
        new LawParameter(Property.MatrixDensity, "[porosity] matrix_density", s => s.Porosity.MatrixDensity),
        new(Property.PoreFluidDensity, "[porosity] fluid_density", s => s.Porosity.FluidDensity),
        new(Property.MatrixSlowness, "[porosity] matrix_slowness", s => s.Porosity.MatrixSlowness),
        new(Property.FluidSlowness, "[porosity] fluid_slowness", s => s.Porosity.FluidSlowness),
        new(Property.MatrixVelocity, "[porosity] matrix_slowness", s => s.Porosity.MatrixSlowness, Reciprocal: true),
        new(Property.FluidVelocity, "[porosity] fluid_slowness", s => s.Porosity.FluidSlowness, Reciprocal: true),
        new(Property.CompactionFactor, "[porosity] compaction_factor", s => s.Porosity.CompactionFactor),
        new(Property.MineralBulkModulus, "[biot] mineral_bulk_modulus", s => s.Biot.MineralBulkModulus),
        new(Property.MineralShearModulus, "[biot] mineral_shear_modulus", s => s.Biot.MineralShearModulus),
        new(Property.MatrixShearVelocity, "[biot] matrix_shear_velocity", s => s.Biot.MatrixShearVelocity),
        new(Property.CriticalPorosity, "[biot] critical_porosity", s => s.Biot.CriticalPorosity),
        new(Property.MudDensity, "[anisotropy] mud_density", s => s.Anisotropy.MudDensity),
        new(Property.MudVelocity, "[anisotropy] mud_velocity", s => s.Anisotropy.MudVelocity),
        new(Property.C11Factor, "[anisotropy] c11_factor", s => s.Anisotropy.C11Factor),
        new(Property.C12Factor, "[anisotropy] c12_factor", s => s.Anisotropy.C12Factor),
        new(Property.TrendSurfaceSlowness, "[pore_pressure.normal_trend] surface_slowness", s => s.PorePressure.NormalTrend.SurfaceSlowness),
        new(Property.TrendMatrixSlowness, "[pore_pressure.normal_trend] matrix_slowness", s => s.PorePressure.NormalTrend.MatrixSlowness),
        new(Property.TrendSurfacePorosity, "[pore_pressure.normal_trend] surface_porosity", s => s.PorePressure.NormalTrend.SurfacePorosity),
        new(Property.TrendScaleLength, "[pore_pressure.normal_trend] scale_length", s => s.PorePressure.NormalTrend.ScaleLength),
        new(Property.BowersFactor, "[pore_pressure] bowers_a", s => s.PorePressure.BowersFactor),
        new(Property.BowersExponent, "[pore_pressure] bowers_b", s => s.PorePressure.BowersExponent),
        new(Property.BowersUnloading, "[pore_pressure] bowers_u", s => s.PorePressure.BowersUnloading),
        new(Property.BowersMaxVelocity, "[pore_pressure] maximum_velocity", s => s.PorePressure.BowersMaxVelocity),
        new(Property.CompactionStress, "[pore_pressure] compaction_stress", s => s.PorePressure.CompactionStress),
        new(Property.MatrixStressRatio, "ratio in [horizontal_stress] compare", _ => default),
    }.ToDictionary(p => p.Property);

    /// <summary>The parameter behind a property, or null when the property is a column of samples.</summary>
    public static LawParameter? Of(Property property) => ByProperty.GetValueOrDefault(property);
}

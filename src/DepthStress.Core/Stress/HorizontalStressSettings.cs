using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Stress;

/// <summary>How the horizontal stresses are had.</summary>
public enum HorizontalStressMethod
{
    /// <summary>Lateral strains of elastic rock; none is the uniaxial stress.</summary>
    Strain,

    /// <summary>A ratio of effective stresses.</summary>
    EffectiveStressRatio,
}

/// <summary>The choices for the horizontal stresses.</summary>
public sealed record HorizontalStressSettings
{
    /// <summary>How they are had.</summary>
    public Setting<HorizontalStressMethod> Method { get; init; } = Setting.Default(HorizontalStressMethod.Strain);

    /// <summary>Ratio: effective Shmin over effective vertical stress.</summary>
    public Setting<double> Ratio { get; init; }

    /// <summary>Ratio: effective SHmax over effective vertical stress; not set leaves SHmax empty.</summary>
    public Setting<double> RatioShmax { get; init; }

    /// <summary>Linear thermal expansion of the rock along the beds, 1/K; not set means no thermal stress.</summary>
    public Setting<double> ThermalExpansion { get; init; }

    /// <summary>Tectonic strain along the least horizontal stress, compression positive; not set means none and no SHmax.</summary>
    public Setting<double> StrainAlongShmin { get; init; }

    /// <summary>Tectonic strain along the greatest horizontal stress, compression positive.</summary>
    public Setting<double> StrainAlongShmax { get; init; }

    /// <summary>Azimuth of the greatest horizontal stress from north, rad.</summary>
    public Setting<double> ShmaxAzimuth { get; init; }

    /// <summary>Coefficient of friction of existing faults for the frictional limit; the default is common practice.</summary>
    public Setting<double> FrictionCoefficient { get; init; } = Setting.Default(0.6);

    /// <summary>True when a ratio gives the stresses, and elastic constants do not enter.</summary>
    public bool ByRatio => Method.Value == HorizontalStressMethod.EffectiveStressRatio;

    /// <summary>True when something constrains SHmax.</summary>
    public bool ConstrainsShmax => ByRatio ? RatioShmax.IsSet : BothStrains() is not null;

    /// <summary>True when the temperature of the rock enters.</summary>
    public bool IsThermal => !ByRatio && ThermalExpansion.IsSet;

    /// <summary>A later change of pore pressure, Pa, negative in depletion; the profile states the stresses before it.</summary>
    public Setting<double> PressureChange { get; init; }

    /// <summary>Relations whose curves stand beside the model's least stress; they never enter it.</summary>
    public Setting<IReadOnlyList<ComparisonChoice>> Compare { get; init; }

    /// <summary>The strains along Shmin and SHmax; null where they are not both chosen, which counts as none.</summary>
    public (double AlongShmin, double AlongShmax)? BothStrains() =>
        StrainAlongShmin.IsSet && StrainAlongShmax.IsSet ? (StrainAlongShmin.Value, StrainAlongShmax.Value) : null;

    /// <summary>These settings where they were decided, else those below them.</summary>
    public HorizontalStressSettings Over(HorizontalStressSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new HorizontalStressSettings
        {
            Method = Method.Over(below.Method),
            Ratio = Ratio.Over(below.Ratio),
            RatioShmax = RatioShmax.Over(below.RatioShmax),
            ThermalExpansion = ThermalExpansion.Over(below.ThermalExpansion),
            StrainAlongShmin = StrainAlongShmin.Over(below.StrainAlongShmin),
            StrainAlongShmax = StrainAlongShmax.Over(below.StrainAlongShmax),
            ShmaxAzimuth = ShmaxAzimuth.Over(below.ShmaxAzimuth),
            FrictionCoefficient = FrictionCoefficient.Over(below.FrictionCoefficient),
            PressureChange = PressureChange.Over(below.PressureChange),
            Compare = Compare.Over(below.Compare),
        };
    }
}

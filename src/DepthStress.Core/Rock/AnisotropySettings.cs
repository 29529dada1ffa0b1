using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Rock;

/// <summary>What gives the stiffnesses of layered rock that sonic across the beds does not.</summary>
public enum AnisotropyModel
{
    /// <summary>Rock alike in every direction.</summary>
    Isotropic,

    /// <summary>The three-parameter shale of Schoenberg, Muir and Sayers.</summary>
    Annie,

    /// <summary>The same with two factors from core.</summary>
    ModifiedAnnie,

    /// <summary>Thomsen's three parameters.</summary>
    Thomsen,
}

/// <summary>Where the shear stiffness in the plane of the beds comes from.</summary>
public enum BedShearSource
{
    /// <summary>The Stoneley wave, in a hole nearly across the beds.</summary>
    Stoneley,

    /// <summary>The faster shear wave, in a hole oblique to the beds or along them, where it moves along the beds.</summary>
    FastShear,

    /// <summary>The slower shear wave, likewise.</summary>
    SlowShear,

    /// <summary>Thomsen's gamma.</summary>
    Gamma,
}

/// <summary>How a static stiffness follows from the dynamic one.</summary>
public enum StaticConversion
{
    /// <summary>The law for Young's modulus on both moduli, that for Poisson's ratio on both ratios.</summary>
    EachModulus,

    /// <summary>The law for Young's modulus on the vertical one, and its factor on the whole stiffness.</summary>
    WholeStiffness,
}

/// <summary>How layered rock differs along and across its beds.</summary>
public sealed record AnisotropySettings
{
    /// <summary>The model; not set is isotropic rock.</summary>
    public Setting<AnisotropyModel> Model { get; init; }

    /// <summary>Thomsen's epsilon.</summary>
    public Setting<double> Epsilon { get; init; }

    /// <summary>Thomsen's gamma.</summary>
    public Setting<double> Gamma { get; init; }

    /// <summary>Thomsen's delta.</summary>
    public Setting<double> Delta { get; init; }

    /// <summary>True when the parameters are those of pure shale and are multiplied by shale volume (common practice).</summary>
    public Setting<bool> ScaleWithShale { get; init; } = Setting.Default(false);

    /// <summary>Where C66 comes from.</summary>
    public Setting<BedShearSource> C66 { get; init; }

    /// <summary>Density of the mud the Stoneley wave ran in, kg/m3.</summary>
    public Setting<double> MudDensity { get; init; }

    /// <summary>Velocity of sound in the mud, m/s.</summary>
    public Setting<double> MudVelocity { get; init; }

    /// <summary>Factor of C11 in the modified model.</summary>
    public Setting<double> C11Factor { get; init; }

    /// <summary>C12 over C13 in the modified model.</summary>
    public Setting<double> C12Factor { get; init; }

    /// <summary>True when the velocities given are along the hole, as a tool measures them; false when they are already across the beds.</summary>
    public Setting<bool> AlongHole { get; init; } = Setting.Default(true);

    /// <summary>Which shear wave the shear log shows in an oblique hole.</summary>
    public Setting<ShearWave> ShearWave { get; init; }

    /// <summary>True when samples that the model cannot serve are taken as isotropic; false when they become missing.</summary>
    public Setting<bool> IsotropicOutside { get; init; } = Setting.Default(false);

    /// <summary>How the stiffness becomes static.</summary>
    public Setting<StaticConversion> StaticConversion { get; init; } = Setting.Default(Rock.StaticConversion.EachModulus);

    /// <summary>True when the rock is not isotropic.</summary>
    public bool IsOn => Model.IsSet && Model.Value != AnisotropyModel.Isotropic;

    /// <summary>True when C66 comes from a shear log.</summary>
    public bool NeedsShearLog => Model.Value != AnisotropyModel.Thomsen && C66 is { IsSet: true, Value: BedShearSource.FastShear or BedShearSource.SlowShear };

    /// <summary>These settings where they were decided, else those below them.</summary>
    public AnisotropySettings Over(AnisotropySettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new AnisotropySettings
        {
            Model = Model.Over(below.Model),
            Epsilon = Epsilon.Over(below.Epsilon),
            Gamma = Gamma.Over(below.Gamma),
            Delta = Delta.Over(below.Delta),
            ScaleWithShale = ScaleWithShale.Over(below.ScaleWithShale),
            C66 = C66.Over(below.C66),
            MudDensity = MudDensity.Over(below.MudDensity),
            MudVelocity = MudVelocity.Over(below.MudVelocity),
            C11Factor = C11Factor.Over(below.C11Factor),
            C12Factor = C12Factor.Over(below.C12Factor),
            AlongHole = AlongHole.Over(below.AlongHole),
            ShearWave = ShearWave.Over(below.ShearWave),
            IsotropicOutside = IsotropicOutside.Over(below.IsotropicOutside),
            StaticConversion = StaticConversion.Over(below.StaticConversion),
        };
    }
}

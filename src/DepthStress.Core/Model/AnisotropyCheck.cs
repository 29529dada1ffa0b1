using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>Finds choices of anisotropy that are incomplete or do not go together.</summary>
internal static class AnisotropyCheck
{
    private const string Table = "[anisotropy] ";

    /// <summary>Reports what is wrong in one part of the well.</summary>
    public static void Report(CheckScope scope)
    {
        var settings = scope.Settings.Anisotropy;
        if (!settings.IsOn)
        {
            if (!settings.Model.IsSet && settings != new AnisotropySettings())
                scope.Missing(Table + "model", "\"isotropic\", \"annie\", \"modified-annie\" or \"thomsen\"");
            return;
        }

        if (settings.Model.Value == AnisotropyModel.Thomsen) ReportThomsen(scope, settings);
        else ReportAnnie(scope, settings);
        ReportWave(scope, settings);
        if (settings.StaticConversion.Value == StaticConversion.WholeStiffness
            && scope.Settings.Moduli.StaticPoisson is { IsSet: true } poisson && poisson.Value != StaticPoissonMethods.EqualToDynamic)
        {
            scope.Error(
                settings.StaticConversion.Source.Position,
                $"{Table}static_conversion = \"whole stiffness\" keeps the dynamic Poisson's ratios; expected [moduli] static_poisson = \"{StaticPoissonMethods.EqualToDynamic.Id}\"{scope.Owner}");
        }
    }

    private static void ReportThomsen(CheckScope scope, AnisotropySettings settings)
    {
        Number(scope, settings.Epsilon, "epsilon");
        Number(scope, settings.Gamma, "gamma");
        Number(scope, settings.Delta, "delta");
    }

    private static void ReportAnnie(CheckScope scope, AnisotropySettings settings)
    {
        if (settings.Model.Value == AnisotropyModel.ModifiedAnnie)
        {
            Number(scope, settings.C11Factor, "c11_factor");
            Number(scope, settings.C12Factor, "c12_factor");
        }

        if (!settings.C66.IsSet)
        {
            scope.Missing(Table + "c66", "\"stoneley\", \"fast shear\", \"slow shear\" or \"gamma\"");
        }
        else if (settings.C66.Value == BedShearSource.Gamma)
        {
            Number(scope, settings.Gamma, "gamma");
        }
        else if (settings.C66.Value == BedShearSource.Stoneley)
        {
            if (!settings.MudDensity.IsSet) scope.Missing(Table + "mud_density", "the density of the mud the Stoneley wave ran in, such as \"1.2 g/cm3\"");
            if (!settings.MudVelocity.IsSet) scope.Missing(Table + "mud_velocity", "the velocity of sound in that mud, such as \"1500 m/s\"");
        }
        else if (!settings.AlongHole.Value || settings.ShearWave is { IsSet: true, Value: ShearWave.AlongBeds })
        {
            scope.Error(
                settings.C66.Source.Position,
                $"{Table}c66 from a shear log needs velocities = \"along hole\" and shear_wave = \"sv\"{scope.Owner}: in a hole across the beds both shear waves give C44, and the wave along the beds cannot stand for both");
        }
    }

    /// <summary>In a hole that may cross beds obliquely, somebody must say which wave the shear log shows; a vertical one has only one.</summary>
    private static void ReportWave(CheckScope scope, AnisotropySettings settings)
    {
        var setup = scope.Setup;
        var straight = ReferenceEquals(setup.Trajectory, Trajectory.Vertical) && !setup.PathCurve.IsSet && setup.Bedding == Bedding.Flat;
        if (settings.AlongHole.Value && !settings.ShearWave.IsSet && !straight)
        {
            scope.Missing(
                Table + "shear_wave",
                "\"sh\" (moves along the beds) or \"sv\" for the wave that the shear log shows where the hole crosses beds obliquely, or velocities = \"vertical\" when the velocities are already those across the beds");
        }
    }

    private static void Number(CheckScope scope, Setting<double> setting, string key)
    {
        if (!setting.IsSet) scope.Missing(Table + key, "a number, such as one from core");
    }
}

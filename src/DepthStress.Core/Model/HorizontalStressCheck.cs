using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>Finds choices for the horizontal stresses and their temperature that are incomplete or contradict each other.</summary>
internal static class HorizontalStressCheck
{
    /// <summary>Reports what is wrong in one part of the well.</summary>
    public static void Report(CheckScope scope)
    {
        var stress = scope.Settings.HorizontalStress;
        if (stress.ByRatio) ReportRatios(scope, stress);
        else ReportStrains(scope, stress);
        if (stress.IsThermal) ReportTemperature(scope);
    }

    private static void ReportRatios(CheckScope scope, HorizontalStressSettings stress)
    {
        if (!stress.Ratio.IsSet) scope.Missing("[horizontal_stress] ratio", "effective Shmin over effective vertical stress, such as one from leak-off tests");
        else if (stress.RatioShmax.IsSet && stress.RatioShmax.Value < stress.Ratio.Value)
            scope.Error(stress.RatioShmax.Source.Position, "ratio_shmax is below ratio: exchange them and turn shmax_azimuth by 90 deg");
    }

    private static void ReportStrains(CheckScope scope, HorizontalStressSettings stress)
    {
        var (along, across) = (stress.StrainAlongShmin, stress.StrainAlongShmax);
        if (along.IsSet != across.IsSet)
        {
            scope.Missing(
                along.IsSet ? "[horizontal_stress] strain_along_shmax" : "[horizontal_stress] strain_along_shmin",
                "both strains or neither");
        }
        else if (along.IsSet && across.Value < along.Value)
        {
            scope.Error(across.Source.Position, "strain_along_shmax is below strain_along_shmin: exchange them and turn shmax_azimuth by 90 deg");
        }
    }

    private static void ReportTemperature(CheckScope scope)
    {
        var temperature = scope.Settings.Temperature;
        if (!temperature.Reference.IsSet)
            scope.Missing("[temperature] reference", "the temperature at which the rock had no thermal stress: thermal_expansion needs it");
        if (!temperature.Source.IsSet)
        {
            scope.Missing("[temperature] source", "\"log\" or \"gradient\": thermal_expansion needs it");
            return;
        }

        if (temperature.Source.Value == TemperatureSource.Log) return;
        if (!temperature.Surface.IsSet) scope.Missing("[temperature] surface", "the temperature at the ground or mudline, such as \"15 degC\"");
        if (!temperature.Gradient.IsSet) scope.Missing("[temperature] gradient", "its rise with depth, such as \"3 degC/100m\"");
    }
}

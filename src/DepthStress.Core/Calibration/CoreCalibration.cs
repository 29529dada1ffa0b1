using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Estimates the factor on static Young's modulus from core alone: in closures it stands only as a product with the strains, so
/// stress observations cannot tell it.
/// </summary>
public static class CoreCalibration
{
    /// <summary>The section and key of the factor.</summary>
    private const string Section = "moduli", Key = "static_youngs_factor";

    /// <summary>Estimates the factor; null with an error reported where core does not determine it.</summary>
    public static (WellSetup Setup, ParameterEstimate Estimate)? Run(EarthModel model, SourcePosition position, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var group = CoreComparison.Of(model)?.Groups.FirstOrDefault(g => g.Factor is not null);
        if (group?.Factor is not { } factor)
        {
            diagnostics.Error(position, "[calibration] free: found static_modulus_factor, expected [core] files with two plugs or more whose static modulus and depth the model has, cut and tested alike");
            return null;
        }

        var settings = model.Setup.Settings;
        var before = settings.Moduli.StaticYoungsFactor.Value;
        var setup = model.Setup with
        {
            Settings = settings with
            {
                Moduli = settings.Moduli with { StaticYoungsFactor = new(factor.Value, new SettingSource(SettingKind.Calibrated, SourcePosition.None)) },
            },
        };
        var basis = FormattableString.Invariant($"{group.Rows.Count} plugs, {group.Name}");
        return (setup, new ParameterEstimate(Section, Key, Dimension.None, new Estimate(factor.Value, factor.Error, factor.Low, factor.High, before), basis));
    }
}

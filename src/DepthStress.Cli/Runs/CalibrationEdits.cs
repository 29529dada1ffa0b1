using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;
using DepthStress.Files.Setup;

namespace DepthStress.Cli.Runs;

/// <summary>The estimates of a calibration as values of the well file.</summary>
internal static class CalibrationEdits
{
    private const string Section = "horizontal_stress";

    /// <summary>The values that the well file is to hold.</summary>
    public static IReadOnlyList<WellFileEdit> Of(CalibrationResult result)
    {
        var edits = new List<WellFileEdit>();
        foreach (var strain in result.Strains)
        {
            foreach (var zone in strain.Group.Zones.DefaultIfEmpty(-1))
            {
                if (!strain.AlongShmin.Held) edits.Add(new(zone, Section, "strain_along_shmin", Text(strain.AlongShmin.Value)));
                if (!strain.AlongShmax.Held) edits.Add(new(zone, Section, "strain_along_shmax", Text(strain.AlongShmax.Value)));
            }
        }

        return edits;
    }

    private static string Text(double strain) => string.Create(CultureInfo.InvariantCulture, $"\"{Units.Microstrain.FromSi(strain):F1} {Units.Microstrain.Symbol}\"");
}

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

        foreach (var other in result.Others) edits.Add(new(-1, other.Section, other.Key, Text(other)));
        return edits;
    }

    private static string Text(ParameterEstimate other)
    {
        var (unit, decimals) = UnitOf(other.Dimension);
        var number = unit.FromSi(other.Estimate.Value).ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return unit.Symbol.Length == 0 ? number : $"\"{number} {unit.Symbol}\"";
    }

    /// <summary>The unit in which a parameter is written and shown, with digits enough for its effect.</summary>
    public static (Unit Unit, int Decimals) UnitOf(Dimension dimension) => dimension switch
    {
        Dimension.Slowness => (Units.MicrosecondPerFoot, 2),
        Dimension.Length => (Units.Metre, 1),
        Dimension.Resistivity => (Units.OhmMetre, 4),
        Dimension.Fraction => (Units.Fraction, 4),
        _ => (Units.One, 4),
    };

    private static string Text(double strain) => string.Create(CultureInfo.InvariantCulture, $"\"{Units.Microstrain.FromSi(strain):F1} {Units.Microstrain.Symbol}\"");
}

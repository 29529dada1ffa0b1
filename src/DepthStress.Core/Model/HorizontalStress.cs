using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>The horizontal stresses of samples that share their settings, with any strains: a run and a calibration take the same path.</summary>
public static class HorizontalStress
{
    /// <summary>
    /// Fills Shmin and SHmax of the samples [start, start + length), which all belong to one <see cref="SettingsRun"/>. Missing
    /// where an input is; SHmax is missing where nothing constrains it. Allocates nothing. Salt is the caller's matter.
    /// </summary>
    /// <param name="table">The table, filled up to the static constants, Biot's coefficient and pore pressure.</param>
    /// <param name="settings">The settings of the run.</param>
    /// <param name="start">First sample.</param>
    /// <param name="length">Number of samples.</param>
    /// <param name="strains">Tectonic strains along Shmin and SHmax, compression positive; null means none.</param>
    /// <param name="shmin">Gets Shmin, Pa; as long as <paramref name="length"/>.</param>
    /// <param name="shmax">Gets SHmax, Pa; as long as <paramref name="length"/>.</param>
    /// <exception cref="ArgumentException">A destination has another length.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The samples are not within the table.</exception>
    public static void Fill(
        PropertyTable table,
        StageSettings settings,
        int start,
        int length,
        (double AlongShmin, double AlongShmax)? strains,
        Span<double> shmin,
        Span<double> shmax)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(settings);
        if (shmin.Length != length || shmax.Length != length) throw new ArgumentException("Lengths differ.", nameof(shmin));
        if (!table.Has(Property.YoungsStatic) || !table.Has(Property.PoissonStatic) || !table.Has(Property.Biot))
        {
            shmin.Fill(double.NaN);
            shmax.Fill(double.NaN);
            return;
        }

        StrainModel.Fill(
            table.Read(Property.YoungsStatic).Slice(start, length),
            table.Read(Property.PoissonStatic).Slice(start, length),
            table.Read(Property.Biot).Slice(start, length),
            table.Read(Property.VerticalStress).Slice(start, length),
            table.Read(Property.PorePressure).Slice(start, length),
            strains?.AlongShmin ?? 0,
            strains?.AlongShmax ?? 0,
            shmin,
            shmax);
        if (strains is null) shmax.Fill(double.NaN);
    }
}

using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>The horizontal stresses of samples that share their settings, with any strains: a run and a calibration take the same path.</summary>
public static class HorizontalStress
{
    /// <summary>
    /// Fills Shmin and SHmax of the samples [start, start + length), which all belong to one <see cref="SettingsRun"/>. Missing
    /// where an input is; SHmax is missing where nothing constrains it. Where the settings choose a ratio of effective stresses,
    /// strains do not enter. Allocates nothing. Salt is the caller's matter.
    /// </summary>
    /// <param name="table">The table, filled up to the static constants, Biot's coefficient, temperature and pore pressure.</param>
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
        var stress = settings.HorizontalStress;
        var layered = settings.Anisotropy.IsOn;
        shmin.Fill(double.NaN);
        shmax.Fill(double.NaN);
        if (stress.ByRatio)
        {
            if (!table.Has(Property.PorePressure)) return;
            var vertical = table.Read(Property.VerticalStress).Slice(start, length);
            var pore = table.Read(Property.PorePressure).Slice(start, length);
            if (stress.Ratio.IsSet) EffectiveStressRatio.Fill(stress.Ratio.Value, vertical, pore, shmin);
            if (stress.RatioShmax.IsSet) EffectiveStressRatio.Fill(stress.RatioShmax.Value, vertical, pore, shmax);
            return;
        }

        if (!table.Has(Property.YoungsStatic) || !table.Has(Property.PoissonStatic) || !table.Has(Property.Biot)) return;
        if (layered && !(table.Has(Property.YoungsStaticHorizontal) && table.Has(Property.PoissonStaticHorizontal) && table.Has(Property.BiotHorizontal))) return;
        if (stress.IsThermal && !table.Has(Property.Temperature)) return;
        FromStrains(new Samples(table, start, length), layered, strains ?? (0, 0), shmin, shmax);
        if (stress.IsThermal)
        {
            ThermalStress.Add(
                table.Read(layered ? Property.YoungsStaticHorizontal : Property.YoungsStatic).Slice(start, length),
                table.Read(layered ? Property.PoissonStaticHorizontal : Property.PoissonStatic).Slice(start, length),
                table.Read(Property.Temperature).Slice(start, length),
                stress.ThermalExpansion.Value, settings.Temperature.Reference.Value, shmin, shmax);
        }

        if (strains is null) shmax.Fill(double.NaN);
    }

    private static void FromStrains(
        Samples of, bool layered, (double AlongShmin, double AlongShmax) strains, Span<double> shmin, Span<double> shmax)
    {
        if (layered)
        {
            VtiStrainModel.Fill(
                of[Property.YoungsStatic], of[Property.YoungsStaticHorizontal], of[Property.PoissonStatic], of[Property.PoissonStaticHorizontal],
                of[Property.Biot], of[Property.BiotHorizontal], of[Property.VerticalStress], of[Property.PorePressure],
                strains.AlongShmin, strains.AlongShmax, shmin, shmax);
        }
        else
        {
            StrainModel.Fill(
                of[Property.YoungsStatic], of[Property.PoissonStatic], of[Property.Biot], of[Property.VerticalStress], of[Property.PorePressure],
                strains.AlongShmin, strains.AlongShmax, shmin, shmax);
        }
    }

    /// <summary>Some samples of a table.</summary>
    private readonly record struct Samples(PropertyTable Table, int Start, int Length)
    {
        public ReadOnlySpan<double> this[Property property] => Table.Read(property).Slice(Start, Length);
    }
}

using SampleWell.Hidden;

namespace SampleWell.Logging;

/// <summary>What each tool answers to the rock at one point of the fine grid.</summary>
internal readonly struct Response(Truth truth, int index)
{
    private double Porosity => truth.Rock.Porosity[index];

    private double CleanCalcite => truth.Rock.Calcite[index] * (1 - Shale);

    private double Clay => RockColumn.ClayInShale * Shale;

    private double Quartz => 1 - Clay - CleanCalcite;

    /// <summary>Shale volume.</summary>
    public double Shale => truth.Rock.ShaleVolume[index];

    /// <summary>Compressional slowness, us/ft.</summary>
    public double Compressional => Physics.SlownessTimesVelocity / truth.Rock.Vp[index];

    /// <summary>Shear slowness, us/ft.</summary>
    public double Shear => Physics.SlownessTimesVelocity / truth.Rock.Vs[index];

    /// <summary>Bulk density, g/cm3.</summary>
    public double Density => truth.Rock.Density[index] / 1000;

    /// <summary>Apparent porosity on the limestone scale: clay carries hydrogen, quartz reads low.</summary>
    public double Neutron => Porosity + 0.26 * Clay - 0.035 * Quartz * (1 - Clay);

    /// <summary>Photoelectric factor in barns per electron: cross sections mix by volume, electrons weigh them.</summary>
    public double Photoelectric =>
        ((1 - Porosity) * (4.8 * Quartz + 9.2 * Clay + 13.8 * CleanCalcite) + 0.4 * Porosity) / Density;

    /// <summary>
    /// Deep resistivity, ohm.m: brine in the pores and wet clay side by side. The brine conducts better as the rock grows warmer.
    /// </summary>
    public double Resistivity
    {
        get
        {
            var warm = 16 + 0.027 * truth.Tvd[index];
            var brine = 0.13 * (24 + 21.5) / (warm + 21.5);
            return 1 / (Porosity * Porosity * (1 - 0.7 * Shale) / (0.9 * brine) + 0.36 * Math.Pow(Shale, 1.5) + 0.0012);
        }
    }
}

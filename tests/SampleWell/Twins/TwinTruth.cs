namespace SampleWell.Twins;

/// <summary>
/// What a run on the twin's well file must find, sample by sample. Depths m, moduli GPa, stresses MPa, compression positive.
/// </summary>
public sealed class TwinTruth
{
    /// <summary>Makes room for a number of samples.</summary>
    internal TwinTruth(int samples, string wellFile, IReadOnlyList<TwinZone> zones)
    {
        (WellFile, Zones) = (wellFile, zones);
        (Md, Tvd, Density) = (new double[samples], new double[samples], new double[samples]);
        (YoungsDynamic, YoungsStatic, Poisson) = (new double[samples], new double[samples], new double[samples]);
        (Sv, Pp, Shmin, Shmax) = (new double[samples], new double[samples], new double[samples], new double[samples]);
        Zone = new int[samples];
    }

    /// <summary>Path of the well file.</summary>
    public string WellFile { get; }

    /// <summary>Zones from top to bottom.</summary>
    public IReadOnlyList<TwinZone> Zones { get; }

    /// <summary>Measured depth below the rotary table.</summary>
    public double[] Md { get; }

    /// <summary>True vertical depth below the rotary table.</summary>
    public double[] Tvd { get; }

    /// <summary>Bulk density, g/cm3.</summary>
    public double[] Density { get; }

    /// <summary>Dynamic Young's modulus.</summary>
    public double[] YoungsDynamic { get; }

    /// <summary>Static Young's modulus.</summary>
    public double[] YoungsStatic { get; }

    /// <summary>Poisson's ratio, static and dynamic alike.</summary>
    public double[] Poisson { get; }

    /// <summary>Overburden stress.</summary>
    public double[] Sv { get; }

    /// <summary>Pore pressure.</summary>
    public double[] Pp { get; }

    /// <summary>Least horizontal stress.</summary>
    public double[] Shmin { get; }

    /// <summary>Greatest horizontal stress.</summary>
    public double[] Shmax { get; }

    /// <summary>Index into <see cref="Zones"/>.</summary>
    public int[] Zone { get; }
}

/// <summary>One zone of the twin.</summary>
/// <param name="Name">Its name.</param>
/// <param name="TopMd">Measured depth of its top, m; a sample at the top belongs to it.</param>
/// <param name="TopTvd">True vertical depth of its top, m.</param>
/// <param name="StaticLaw">Catalogue name of its law from dynamic to static Young's modulus.</param>
/// <param name="Biot">Its Biot coefficient.</param>
public sealed record TwinZone(string Name, double TopMd, double TopTvd, string StaticLaw, double Biot);

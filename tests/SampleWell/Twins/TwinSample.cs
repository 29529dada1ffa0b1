using SampleWell.Hidden;

namespace SampleWell.Twins;

/// <summary>The rock of a twin at any measured depth: straight between the points of the fine grid. m/s, kg/m3.</summary>
internal readonly struct TwinSample(RockColumn rock, double md)
{
    /// <summary>Compressional velocity.</summary>
    public double Vp { get; } = rock.Grid.At(rock.Vp, md);

    /// <summary>Shear velocity.</summary>
    public double Vs { get; } = rock.Grid.At(rock.Vs, md);

    /// <summary>Bulk density.</summary>
    public double Density { get; } = rock.Grid.At(rock.Density, md);

    /// <summary>Shale volume.</summary>
    public double Shale { get; } = rock.Grid.At(rock.ShaleVolume, md);
}

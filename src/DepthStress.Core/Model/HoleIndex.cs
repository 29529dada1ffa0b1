using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>What the hole holds at a depth: the mud it was drilled with, and the casing shoe above.</summary>
public static class HoleIndex
{
    /// <summary>Density of the mud at a measured depth, kg/m3; null where [mud] does not reach it or is not set.</summary>
    public static double? MudDensity(WellSetup setup, double measuredDepth)
    {
        ArgumentNullException.ThrowIfNull(setup);
        Span<double> density = [double.NaN];
        FillMudDensity(setup, [measuredDepth], density);
        return double.IsNaN(density[0]) ? null : density[0];
    }

    /// <summary>Pressure of a resting column of the mud at each sample, Pa, from the datum; NaN where the mud is not known.</summary>
    /// <param name="setup">The setup, its path resolved.</param>
    /// <param name="measuredDepth">Measured depths, m.</param>
    /// <param name="verticalDepth">True vertical depths there, m.</param>
    /// <param name="pressure">Gets the pressures.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public static void FillMudPressure(WellSetup setup, ReadOnlySpan<double> measuredDepth, ReadOnlySpan<double> verticalDepth, Span<double> pressure)
    {
        ArgumentNullException.ThrowIfNull(setup);
        if (verticalDepth.Length != measuredDepth.Length || pressure.Length != measuredDepth.Length) throw new ArgumentException("Lengths differ.", nameof(pressure));
        FillMudDensity(setup, measuredDepth, pressure);
        for (var i = 0; i < pressure.Length; i++) pressure[i] *= Constants.StandardGravity * verticalDepth[i];
    }

    private static void FillMudDensity(WellSetup setup, ReadOnlySpan<double> measuredDepth, Span<double> density)
    {
        density.Fill(double.NaN);
        if (!setup.Mud.Density.IsSet || !setup.Mud.DepthKind.IsSet) return;
        foreach (var mud in setup.Mud.Density.Value)
        {
            var top = ZoneIndex.ToMeasured(setup, mud.Top, setup.Mud.DepthKind.Value);
            for (var i = 0; i < density.Length; i++)
            {
                if (measuredDepth[i] >= top) density[i] = mud.Density;
            }
        }
    }

    /// <summary>Measured depths of the casing shoes, m, in the order stated; empty where [casing] is not set.</summary>
    public static IEnumerable<double> Shoes(WellSetup setup)
    {
        ArgumentNullException.ThrowIfNull(setup);
        return setup.Casing.Shoes.IsSet && setup.Casing.DepthKind.IsSet
            ? setup.Casing.Shoes.Value.Select(shoe => ZoneIndex.ToMeasured(setup, shoe, setup.Casing.DepthKind.Value))
            : [];
    }

    /// <summary>The deepest shoe at or above a measured depth, m; null where there is none.</summary>
    public static double? ShoeAbove(WellSetup setup, double measuredDepth)
    {
        var above = Shoes(setup).Where(shoe => shoe <= measuredDepth).ToList();
        return above.Count > 0 ? above.Max() : null;
    }
}

namespace DepthStress.Core.Rock;

/// <summary>
/// Shear stiffness in the plane of the beds from the Stoneley wave at low frequency in a hole across the beds (White's
/// relation for a tube wave, recalled, not read).
/// </summary>
public static class StoneleyShear
{
    /// <summary>
    /// <c>C66 = rho_m Vst^2 / (1 - Vst^2 / Vm^2)</c>, Pa; NaN where the Stoneley wave is not slower than sound in the mud.
    /// </summary>
    /// <param name="stoneley">Velocity of the Stoneley wave, m/s.</param>
    /// <param name="mudDensity">Density of the mud, kg/m3.</param>
    /// <param name="mudVelocity">Velocity of sound in the mud, m/s.</param>
    public static double C66(double stoneley, double mudDensity, double mudVelocity)
    {
        var share = stoneley * stoneley / (mudVelocity * mudVelocity);
        return share < 1 ? mudDensity * stoneley * stoneley / (1 - share) : double.NaN;
    }
}

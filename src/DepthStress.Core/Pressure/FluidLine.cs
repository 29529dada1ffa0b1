using DepthStress.Core.Depth;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Pressure in a column of gas, oil and water at rest: continuous at the contacts, in each fluid growing with its weight, so that above a
/// contact it exceeds the pressure of water by <c>(rho_w - rho_hc) g h</c>.
/// </summary>
public sealed class FluidLine
{
    private readonly double[] _contacts;
    private readonly double[] _gradients;
    private readonly double _depth;
    private readonly double _pressure;
    private readonly PressureLine? _below;

    private FluidLine(double[] contacts, double[] densities, double depth, double pressure, PressureLine? below)
    {
        _contacts = contacts;
        _gradients = [.. densities.Select(d => d * Constants.StandardGravity)];
        (_depth, _pressure, _below) = (depth, pressure, below);
    }

    /// <summary>True vertical depths of the contacts that the settings name, from gas to water, m, and the densities above, between and below them.</summary>
    /// <param name="fluids">The settings.</param>
    /// <param name="toVertical">Turns a depth of the stated kind into true vertical depth, m.</param>
    public static (double[] Contacts, double[] Densities) Column(FluidSettings fluids, Func<double, DepthKind, double> toVertical)
    {
        ArgumentNullException.ThrowIfNull(fluids);
        ArgumentNullException.ThrowIfNull(toVertical);
        double Vertical(double depth) => toVertical(depth, fluids.DepthKind.Value);
        var (gas, oil, water) = (fluids.GasDensity.Value, fluids.OilDensity.Value, fluids.WaterDensity.Value);
        return (fluids.GasOilContact.IsSet, fluids.OilWaterContact.IsSet, fluids.GasWaterContact.IsSet) switch
        {
            (true, true, _) => ([Vertical(fluids.GasOilContact.Value), Vertical(fluids.OilWaterContact.Value)], [gas, oil, water]),
            (true, false, _) => ([Vertical(fluids.GasOilContact.Value)], [gas, oil]),
            (false, true, _) => ([Vertical(fluids.OilWaterContact.Value)], [oil, water]),
            (false, false, true) => ([Vertical(fluids.GasWaterContact.Value)], [gas, water]),
            _ => ([], [water]),
        };
    }

    /// <summary>Makes the plan.</summary>
    /// <param name="fluids">Complete settings.</param>
    /// <param name="pore">The settings that hold the table, where the column hangs on it.</param>
    /// <param name="frame">The well's reference levels.</param>
    /// <param name="toVertical">Turns a depth of the stated kind into true vertical depth, m.</param>
    public static FluidLine Prepare(FluidSettings fluids, PorePressureSettings pore, DepthFrame frame, Func<double, DepthKind, double> toVertical)
    {
        ArgumentNullException.ThrowIfNull(fluids);
        ArgumentNullException.ThrowIfNull(frame);
        ArgumentNullException.ThrowIfNull(toVertical);
        var (contacts, densities) = Column(fluids, toVertical);
        switch (fluids.Anchor.Value)
        {
            case FluidAnchor.Point:
                return new FluidLine(contacts, densities, toVertical(fluids.AnchorDepth.Value, fluids.DepthKind.Value), fluids.AnchorPressure.Value, null);
            case FluidAnchor.Table:
                var table = PressureLine.Table(pore, toVertical);
                return new FluidLine(contacts, densities, contacts[^1], table.At(contacts[^1]), table);
            default:
                var water = PressureLine.Hydrostatic(frame, densities[^1]);
                var from = contacts.Length > 0 ? contacts[^1] : frame.HydrostaticTopTvd;
                return new FluidLine(contacts, densities, from, water.At(from), water);
        }
    }

    /// <summary>Pressure at a true vertical depth, Pa; NaN for NaN and where the table it hangs on has none.</summary>
    public double At(double tvd)
    {
        if (double.IsNaN(tvd)) return double.NaN;
        if (_below is not null && (tvd >= _depth || _contacts.Length == 0)) return _below.At(tvd);
        return _pressure + Weight(tvd) - Weight(_depth);
    }

    /// <summary>Fills pressure for every sample.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> tvd, Span<double> pressure)
    {
        if (pressure.Length != tvd.Length) throw new ArgumentException("Lengths differ.", nameof(pressure));
        for (var i = 0; i < tvd.Length; i++) pressure[i] = At(tvd[i]);
    }

    /// <summary>Weight of the column from depth zero, Pa.</summary>
    private double Weight(double tvd)
    {
        double sum = 0, top = 0;
        var k = 0;
        for (; k < _contacts.Length && tvd > _contacts[k]; k++)
        {
            sum += _gradients[k] * (_contacts[k] - top);
            top = _contacts[k];
        }

        return sum + (_gradients[k] * (tvd - top));
    }
}

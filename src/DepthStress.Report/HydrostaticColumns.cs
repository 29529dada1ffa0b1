using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report;

/// <summary>The reference line of the stress picture: the weight of water from the water table, or from the sea surface, down.</summary>
internal static class HydrostaticColumns
{
    public static NumberColumn<EarthModel> Pressure { get; } = new(
        "hydrostatic", "hydrostatic pressure", "Ph", ColumnUnits.Stresses.Metric, ColumnUnits.Stresses.Field, "density * g * depth",
        (model, start, destination) => Fill(model, start, destination, false));

    public static NumberColumn<EarthModel> Gradient { get; } = new(
        "hydrostatic_gradient", "hydrostatic gradient", "Ph/z", ColumnUnits.Gradients.Metric, ColumnUnits.Gradients.Field, "hydrostatic / depth below the surface",
        (model, start, destination) => Fill(model, start, destination, true));

    /// <summary>Density of the reference water, kg/m3: that of the pore pressure when the well states one, else that of the sea.</summary>
    public static double Density(EarthModel model)
    {
        var stated = model.Setup.Settings.PorePressure.FluidDensity;
        return stated.IsSet ? stated.Value : model.Setup.Overburden.WaterDensity.Value;
    }

    private static void Fill(EarthModel model, int start, Span<double> destination, bool gradient)
    {
        var tvd = model.Values.Read(Property.TrueVerticalDepth).Slice(start, destination.Length);
        var (frame, weight) = (model.Setup.Frame, Density(model) * Constants.StandardGravity);
        for (var i = 0; i < tvd.Length; i++)
        {
            var pressure = weight * Math.Max(0, tvd[i] - frame.HydrostaticTopTvd);
            var below = tvd[i] - frame.SurfaceTvd;
            destination[i] = !gradient ? pressure : below > 0 ? pressure / below : double.NaN;
        }
    }
}

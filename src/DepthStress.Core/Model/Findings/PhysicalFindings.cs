using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Results that are hardly credible. Bounds are common practice; nothing is changed.</summary>
internal static class PhysicalFindings
{
    /// <summary>The credible range of the mean overburden gradient below the ground or mudline, Pa/m (common practice).</summary>
    private const double LowGradient = 16e3, HighGradient = 27e3;

    /// <summary>The gradient says nothing within so many metres of the ground.</summary>
    private const double ShallowDepth = 50;

    /// <summary>Looks for results that are hardly credible.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var poisson = SampleMarks.Column(model, Property.PoissonDynamic);
        var (dynamic, @static) = (SampleMarks.Column(model, Property.YoungsDynamic), SampleMarks.Column(model, Property.YoungsStatic));
        var (sv, pp) = (SampleMarks.Column(model, Property.VerticalStress), SampleMarks.Column(model, Property.PorePressure));
        var shmin = SampleMarks.Column(model, Property.MinHorizontalStress);
        var tvd = SampleMarks.Column(model, Property.TrueVerticalDepth);
        var frame = model.Setup.Frame;
        var water = model.Setup.Overburden.WaterDensity.Value * Constants.StandardGravity * (frame.WaterDepth ?? 0);

        return
        [
            .. SampleMarks.Where(model, Severity.Warning, $"pore pressure is not below Shmin", i => pp[i] > 0 && pp[i] >= shmin[i]),
            .. SampleMarks.Where(model, Severity.Warning, $"pore pressure is not below the vertical stress", i => pp[i] > 0 && pp[i] >= sv[i]),
            .. SampleMarks.Where(model, Severity.Warning, $"static Young's modulus is not below the dynamic one", i => @static[i] >= dynamic[i]),
            .. SampleMarks.Where(model, Severity.Warning, $"dynamic Poisson's ratio outside 0.05-0.45: doubtful sonic", i => poisson[i] is < 0.05 or > 0.45),
            .. SampleMarks.Where(
                model, Severity.Warning,
                $"mean overburden gradient below the ground or mudline outside {Quantity.Gradient(LowGradient)} to {Quantity.Gradient(HighGradient)}",
                i => tvd[i] > frame.SolidTopTvd + ShallowDepth
                    && (sv[i] - water) / (tvd[i] - frame.SolidTopTvd) is < LowGradient or > HighGradient),
        ];
    }
}

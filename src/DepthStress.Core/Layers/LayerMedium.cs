using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A quantity that is a straight line in depth over a layer.</summary>
/// <param name="Depth">True vertical depth of its mean, m.</param>
/// <param name="Mean">Its value there.</param>
/// <param name="Slope">Its change with depth, 1/m.</param>
public readonly record struct DepthLine(double Depth, double Mean, double Slope)
{
    /// <summary>The value at a depth.</summary>
    public double At(double tvd) => Mean + (Slope * (tvd - Depth));
}

/// <summary>One layer as a solver takes it, from the samples that have every constant, pressure and Shmin.</summary>
/// <param name="Rock">Upscaled rock.</param>
/// <param name="Pair">The isotropic rock that stands for it.</param>
/// <param name="Density">Mean bulk density, kg/m3.</param>
/// <param name="Vertical">Vertical stress, Pa.</param>
/// <param name="Pore">Pore pressure, Pa.</param>
/// <param name="ClosingShmin">Mean of Shmin less what one pair of strains gives at the same samples, Pa.</param>
/// <param name="ClosingShmax">The same of SHmax; NaN where nothing constrains SHmax.</param>
public sealed record LayerMedium(
    PorousRock Rock, IsotropicRock Pair, double Density, DepthLine Vertical, DepthLine Pore, double ClosingShmin, double ClosingShmax)
{
    private const double Rounding = 1e-9;

    /// <summary>The medium of a layer's samples; null when no sample has everything or what comes out is not stable.</summary>
    internal static LayerMedium? Of(EarthModel model, LayerBounds bounds, double[] weights, FarField strains)
    {
        var upscaling = new Upscaling();
        var (vertical, pore, shmin, shmax) = (new LineSum(), new LineSum(), new LineSum(), new LineSum());
        double density = 0;
        for (var i = bounds.Start; i < bounds.End; i++)
        {
            if (!(weights[i] > 0) || SampleMedium.At(model, i) is not { } sample) continue;
            upscaling.Add(weights[i], sample.Rock.Stiffness, sample.Rock.BiotVertical, sample.Rock.BiotHorizontal, sample.Pore);
            density += weights[i] * sample.Density;
            vertical.Add(weights[i], sample.Depth, sample.Vertical);
            pore.Add(weights[i], sample.Depth, sample.Pore);
            shmin.Add(weights[i], sample.Depth, sample.Shmin - sample.Rock.Horizontal(sample.Vertical, sample.Pore, strains.AlongShmin, strains.AlongShmax));
            if (!double.IsNaN(sample.Shmax))
                shmax.Add(weights[i], sample.Depth, sample.Shmax - sample.Rock.Horizontal(sample.Vertical, sample.Pore, strains.AlongShmax, strains.AlongShmin));
        }

        if (upscaling.Result() is not { } rock || rock.Isotropic() is not { IsStable: true } pair) return null;
        return new LayerMedium(rock, pair, density / vertical.Weight, vertical.Line(), pore.Line(), Closing(shmin), Closing(shmax));

        // What is left of equal terms by rounding is no gap.
        double Closing(LineSum sum) => sum.Line().Mean is var mean && Math.Abs(mean) <= Rounding * vertical.Line().Mean ? 0 : mean;
    }

    /// <summary>Sums for a mean and for the best straight line in depth.</summary>
    private sealed class LineSum
    {
        private readonly List<(double Weight, double Depth, double Value)> _points = [];

        public double Weight => _points.Sum(p => p.Weight);

        public void Add(double weight, double depth, double value) => _points.Add((weight, depth, value));

        public DepthLine Line()
        {
            var weight = Weight;
            if (!(weight > 0)) return new DepthLine(double.NaN, double.NaN, double.NaN);
            var depth = _points.Sum(p => p.Weight * p.Depth) / weight;
            var mean = _points.Sum(p => p.Weight * p.Value) / weight;
            var spread = _points.Sum(p => p.Weight * (p.Depth - depth) * (p.Depth - depth));
            var rise = _points.Sum(p => p.Weight * (p.Depth - depth) * (p.Value - mean));
            return new DepthLine(depth, mean, spread > 0 ? rise / spread : 0);
        }
    }
}

/// <summary>What the stresses of one sample rest on.</summary>
/// <param name="Rock">Its rock.</param>
/// <param name="Depth">True vertical depth, m.</param>
/// <param name="Density">Bulk density, kg/m3.</param>
/// <param name="Pore">Pore pressure, Pa.</param>
/// <param name="Vertical">Vertical stress, Pa.</param>
/// <param name="Shmin">Least horizontal stress, Pa.</param>
/// <param name="Shmax">Greatest horizontal stress, Pa; NaN where nothing constrains it.</param>
internal readonly record struct SampleMedium(PorousRock Rock, double Depth, double Density, double Pore, double Vertical, double Shmin, double Shmax)
{
    /// <summary>The sample; null when something but SHmax is missing.</summary>
    public static SampleMedium? At(EarthModel model, int i)
    {
        var table = model.Values;
        double Value(Property property) => table.Has(property) ? table.Read(property)[i] : double.NaN;
        var (biot, along) = (Value(Property.Biot), Value(Property.BiotHorizontal));
        var rock = new PorousRock(StaticStiffness.At(table, i), biot, double.IsNaN(along) ? biot : along);
        var sample = new SampleMedium(
            rock, Value(Property.TrueVerticalDepth), Value(Property.Density), Value(Property.PorePressure), Value(Property.VerticalStress),
            Value(Property.MinHorizontalStress), Value(Property.MaxHorizontalStress));
        return model.Usable[i] && double.IsFinite(rock.Horizontal(sample.Vertical, sample.Pore, 0, 0) + sample.Density + sample.Shmin + rock.Stiffness.C44 + rock.Stiffness.C11) ? sample : null;
    }
}

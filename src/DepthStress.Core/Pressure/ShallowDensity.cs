using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Density between the ground or mudline and the first logged value, where nobody measured it: the user's choice of how to
/// assume it. Depths count from the ground or mudline, m.
/// </summary>
public abstract record ShallowDensity
{
    /// <summary>One mean density, kg/m3.</summary>
    public static ShallowDensity Mean(double density) => new MeanDensity(density);

    /// <summary>What is assumed, for findings.</summary>
    public abstract FormattableString Words { get; }

    /// <summary>The catalogue entry it rests on, or null.</summary>
    public virtual Law? Law => null;

    /// <summary>Density at a depth, kg/m3.</summary>
    public abstract double DensityAt(double depth);

    /// <summary>Mass per area of everything from the ground or mudline to a depth, kg/m2.</summary>
    public abstract double MassAbove(double depth);

    /// <summary>
    /// The same assumption tied to the first logged value, where it has something to tie.
    /// </summary>
    /// <param name="depth">Depth of the first logged density, m.</param>
    /// <param name="density">Density there, kg/m3.</param>
    /// <param name="problem">Why it cannot be tied, else null.</param>
    public virtual ShallowDensity Tie(double depth, double density, out FormattableString? problem)
    {
        problem = null;
        return this;
    }
}

/// <summary>One mean density.</summary>
/// <param name="Density">kg/m3.</param>
public sealed record MeanDensity(double Density) : ShallowDensity
{
    /// <inheritdoc/>
    public override FormattableString Words => $"an assumed mean density of {new Quantity(Density, Dimension.Density)}";

    /// <inheritdoc/>
    public override double DensityAt(double depth) => Density;

    /// <inheritdoc/>
    public override double MassAbove(double depth) => Density * depth;
}

/// <summary>A published relation that gives the mean density down to a depth.</summary>
/// <param name="Relation">Its catalogue entry.</param>
public sealed record MeanDensityLaw(Law Relation) : ShallowDensity
{
    private const double HalfStep = 0.5;

    /// <inheritdoc/>
    public override Law Law => Relation;

    /// <inheritdoc/>
    public override FormattableString Words => $"the mean density of {Relation.Id}";

    /// <inheritdoc/>
    public override double DensityAt(double depth)
    {
        var above = Math.Max(0, depth - HalfStep);
        return (MassAbove(depth + HalfStep) - MassAbove(above)) / (depth + HalfStep - above);
    }

    /// <inheritdoc/>
    public override double MassAbove(double depth) => depth <= 0 ? 0 : Of(Relation, depth) * depth;

    /// <summary>The relation at a depth, SI.</summary>
    internal static double Of(Law law, double depth) => law.Unit.ToSi(law.Evaluate(law.Inputs[0].Unit.FromSi(depth)));
}

/// <summary>A published relation that gives the density at a depth.</summary>
/// <param name="Relation">Its catalogue entry.</param>
public sealed record LocalDensityLaw(Law Relation) : ShallowDensity
{
    /// <summary>Panels of this length with ten points each make the quadrature exact far beyond any assumption's worth.</summary>
    private const double Panel = 50;

    /// <inheritdoc/>
    public override Law Law => Relation;

    /// <inheritdoc/>
    public override FormattableString Words => $"the density of {Relation.Id}";

    /// <inheritdoc/>
    public override double DensityAt(double depth) => MeanDensityLaw.Of(Relation, Math.Max(0, depth));

    /// <inheritdoc/>
    public override double MassAbove(double depth)
    {
        double sum = 0;
        for (double top = 0; top < depth; top += Panel)
            sum += MathNet.Numerics.Integration.GaussLegendreRule.Integrate(DensityAt, top, Math.Min(top + Panel, depth), 10);
        return sum;
    }
}

/// <summary>
/// Density that grows from a surface value towards the matrix value as the exponential that meets the first logged value:
/// <c>rho = rho_m - (rho_m - rho_s) exp(-b z)</c>. Source: Athy 1930, AAPG Bull. 14, 1-24, in the form of Zhang 2019, Applied
/// Petroleum Geomechanics, p. 189, eq. 6.3.
/// </summary>
/// <param name="Surface">Density at the ground or mudline, kg/m3.</param>
/// <param name="Matrix">Density that great depth tends to, kg/m3.</param>
/// <param name="Rate">Rate b, 1/m; NaN before it is tied.</param>
public sealed record ExponentialDensity(double Surface, double Matrix, double Rate = double.NaN) : ShallowDensity
{
    /// <summary>Below it two terms of the series are exact to a part in 10^12.</summary>
    private const double SmallExponent = 2e-6;

    /// <inheritdoc/>
    public override FormattableString Words =>
        $"an exponential from {new Quantity(Surface, Dimension.Density)} at the ground or mudline to the first logged density";

    /// <inheritdoc/>
    public override double DensityAt(double depth) => Matrix - ((Matrix - Surface) * Math.Exp(-Rate * depth));

    /// <inheritdoc/>
    public override double MassAbove(double depth)
    {
        // The mean of exp(-b z) down to x = b z; its series where the difference would lose all its digits.
        var x = Rate * depth;
        var mean = x < SmallExponent ? 1 - (x / 2) : (1 - Math.Exp(-x)) / x;
        return depth * (Matrix - ((Matrix - Surface) * mean));
    }

    /// <inheritdoc/>
    public override ShallowDensity Tie(double depth, double density, out FormattableString? problem)
    {
        problem = density > Surface && density < Matrix
            ? null
            : (FormattableString)$"the exponential above the log cannot meet the first logged density of {new Quantity(density, Dimension.Density)}: it runs from {new Quantity(Surface, Dimension.Density)} to {new Quantity(Matrix, Dimension.Density)}; change surface_density or matrix_density in [overburden] above_log";
        return this with { Rate = Math.Log((Matrix - Surface) / (Matrix - density)) / depth };
    }
}

/// <summary>Straight lines between given depths and densities; the first and last values hold beyond them.</summary>
/// <param name="Points">Depth, m, and density, kg/m3, from top to bottom.</param>
public sealed record PointDensity(IReadOnlyList<DensityPoint> Points) : ShallowDensity
{
    /// <inheritdoc/>
    public override FormattableString Words => $"the densities given in [overburden] above_log";

    /// <inheritdoc/>
    public override double DensityAt(double depth)
    {
        if (depth <= Points[0].Depth) return Points[0].Density;
        for (var k = 1; k < Points.Count; k++)
        {
            if (depth <= Points[k].Depth) return Between(Points[k - 1], Points[k], depth);
        }

        return Points[^1].Density;
    }

    /// <inheritdoc/>
    public override double MassAbove(double depth)
    {
        var sum = Points[0].Density * Math.Min(depth, Points[0].Depth);
        for (var k = 1; k < Points.Count && depth > Points[k - 1].Depth; k++)
        {
            var to = Math.Min(depth, Points[k].Depth);
            sum += 0.5 * (Points[k - 1].Density + Between(Points[k - 1], Points[k], to)) * (to - Points[k - 1].Depth);
        }

        return depth > Points[^1].Depth ? sum + (Points[^1].Density * (depth - Points[^1].Depth)) : sum;
    }

    private static double Between(DensityPoint above, DensityPoint below, double depth) =>
        above.Density + ((below.Density - above.Density) * (depth - above.Depth) / (below.Depth - above.Depth));
}

/// <summary>A density at a depth.</summary>
/// <param name="Depth">Depth below the ground or mudline, m.</param>
/// <param name="Density">kg/m3.</param>
public readonly record struct DensityPoint(double Depth, double Density);

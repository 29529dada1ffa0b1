namespace DepthStress.Core.Calibration;

/// <summary>Fills the residuals of a set of parameters, each divided by its standard deviation.</summary>
/// <param name="parameters">The parameters; within their bounds, or beyond by 1e-5 of their scale where the bounds lie closer together than that.</param>
/// <param name="residuals">Gets the residuals. A one-sided one is max(0, x): its square has no kink, so the fit converges.</param>
public delegate void ResidualFunction(ReadOnlySpan<double> parameters, Span<double> residuals);

/// <summary>Fills the derivatives of the residuals.</summary>
/// <param name="parameters">The parameters.</param>
/// <param name="jacobian">Gets the derivative of residual i by parameter j at [i, j].</param>
public delegate void JacobianFunction(ReadOnlySpan<double> parameters, double[,] jacobian);

/// <summary>A parameter of a fit.</summary>
/// <param name="Start">Where the search begins; brought between the bounds.</param>
/// <param name="Lower">Lower bound; minus infinity for none.</param>
/// <param name="Upper">Upper bound, not below the lower one; equal bounds hold the parameter.</param>
/// <param name="Scale">Its usual size, above zero: steps and differences are measured by it where the parameter is near zero.</param>
public readonly record struct FitParameter(double Start, double Lower, double Upper, double Scale);

/// <summary>A least-squares problem: find the parameters within bounds with the least sum of squared residuals.</summary>
/// <param name="Parameters">The parameters, at least one.</param>
/// <param name="Count">How many residuals there are, at least one.</param>
/// <param name="Residuals">The residuals.</param>
/// <param name="Jacobian">Their derivatives; null takes central differences, one-sided at a bound.</param>
public sealed record FitProblem(IReadOnlyList<FitParameter> Parameters, int Count, ResidualFunction Residuals, JacobianFunction? Jacobian = null)
{
    /// <summary>The same problem with one parameter held at a value, which is brought between its bounds.</summary>
    public FitProblem Holding(int parameter, double value)
    {
        var parameters = Parameters.ToArray();
        var held = Math.Clamp(value, parameters[parameter].Lower, parameters[parameter].Upper);
        parameters[parameter] = parameters[parameter] with { Start = held, Lower = held, Upper = held };
        return this with { Parameters = parameters };
    }

    /// <summary>The same problem, begun elsewhere.</summary>
    public FitProblem From(IReadOnlyList<double> start) =>
        this with { Parameters = [.. Parameters.Select((p, j) => p with { Start = start[j] })] };

    /// <summary>Throws where the problem is none.</summary>
    /// <exception cref="ArgumentException">No parameter, no residual, bounds that cross, or a start or scale that cannot serve.</exception>
    internal void Check()
    {
        if (Parameters.Count == 0 || Count < 1) throw new ArgumentException("It has no parameters or no residuals.", nameof(Parameters));
        foreach (var p in Parameters)
        {
            if (!(p.Lower <= p.Upper) || !double.IsFinite(p.Start) || !(p.Scale > 0) || !double.IsFinite(p.Scale))
                throw new ArgumentException("Bounds cross, or a start or scale is not finite.", nameof(Parameters));
        }
    }
}

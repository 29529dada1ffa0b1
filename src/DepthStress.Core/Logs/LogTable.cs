namespace DepthStress.Core.Logs;

/// <summary>Curves on one set of increasing measured depths, in SI.</summary>
public sealed class LogTable
{
    private readonly Dictionary<Property, Curve> _curves = [];

    /// <summary>Makes a table.</summary>
    /// <param name="depths">Measured depths, m below the datum, strictly increasing.</param>
    /// <param name="curves">At most one curve per role, each as long as the depths.</param>
    /// <exception cref="ArgumentException">A curve's length differs, a role comes twice, or depths do not increase.</exception>
    public LogTable(double[] depths, IEnumerable<Curve> curves)
    {
        ArgumentNullException.ThrowIfNull(depths);
        ArgumentNullException.ThrowIfNull(curves);
        for (var i = 1; i < depths.Length; i++)
        {
            if (!(depths[i] > depths[i - 1])) throw new ArgumentException("Depths must increase.", nameof(depths));
        }

        Depths = depths;
        foreach (var curve in curves)
        {
            if (curve.Values.Length != depths.Length || curve.Origins.Count != depths.Length)
                throw new ArgumentException($"The curve for {curve.Role.Id} is not as long as the depths.", nameof(curves));
            if (!_curves.TryAdd(curve.Role.Property, curve))
                throw new ArgumentException($"The role {curve.Role.Id} comes twice.", nameof(curves));
        }
    }

    /// <summary>Measured depths, m below the datum, strictly increasing.</summary>
    public double[] Depths { get; }

    /// <summary>Number of samples.</summary>
    public int Count => Depths.Length;

    /// <summary>The curves, in the order of the role table.</summary>
    public IEnumerable<Curve> Curves => CurveRoles.All.Where(r => _curves.ContainsKey(r.Property)).Select(r => _curves[r.Property]);

    /// <summary>The curve for a property, or null.</summary>
    public Curve? this[Property property] => _curves.GetValueOrDefault(property);

    /// <summary>A copy with some curves replaced.</summary>
    public LogTable With(params IEnumerable<Curve> replacements)
    {
        var merged = new Dictionary<Property, Curve>(_curves);
        foreach (var curve in replacements) merged[curve.Role.Property] = curve;
        return new LogTable(Depths, merged.Values);
    }
}

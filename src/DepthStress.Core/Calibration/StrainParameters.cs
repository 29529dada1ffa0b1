namespace DepthStress.Core.Calibration;

/// <summary>
/// What is estimated of the strains: per group the strain along Shmin and the difference, which is not negative, or what is
/// left of the two when one is held. The strains are straight functions of it.
/// </summary>
public sealed class StrainParameters
{
    /// <summary>The search stays within these strains along Shmin: far beyond what rock bears.</summary>
    private const double Farthest = 0.02;

    /// <summary>The size of strains that sedimentary basins show.</summary>
    private const double Usual = 1e-4;

    private readonly List<Parameter> _parameters = [];
    private readonly double[] _base;

    /// <summary>Makes the parameters.</summary>
    /// <param name="start">Strains before, along Shmin and along SHmax, group by group.</param>
    /// <param name="held">What each group holds at its value before.</param>
    public StrainParameters(ReadOnlySpan<double> start, ReadOnlySpan<HeldStrain> held)
    {
        if (start.Length != 2 * held.Length) throw new ArgumentException("Two strains per group are needed.", nameof(start));
        _base = new double[start.Length];
        for (var g = 0; g < held.Length; g++)
        {
            var (along, across) = (start[2 * g], start[(2 * g) + 1]);
            var difference = Math.Max(0, across - along);
            switch (held[g])
            {
                case HeldStrain.AlongShmin:
                    (_base[2 * g], _base[(2 * g) + 1]) = (along, along);
                    _parameters.Add(new(g, 0, 1, 0, Farthest, difference));
                    break;
                case HeldStrain.AlongShmax:
                    _base[(2 * g) + 1] = across;
                    _parameters.Add(new(g, 1, 0, -Farthest, across, Math.Min(along, across)));
                    break;
                case HeldStrain.Difference:
                    _base[(2 * g) + 1] = difference;
                    _parameters.Add(new(g, 1, 1, -Farthest, Farthest, along));
                    break;
                default:
                    _parameters.Add(new(g, 1, 1, -Farthest, Farthest, along));
                    _parameters.Add(new(g, 0, 1, 0, Farthest, difference));
                    break;
            }
        }
    }

    /// <summary>How many there are.</summary>
    public int Count => _parameters.Count;

    /// <summary>The parameters as a fit sees them.</summary>
    public IReadOnlyList<FitParameter> Parameters => [.. _parameters.Select(p => new FitParameter(p.Start, p.Lower, p.Upper, Usual))];

    /// <summary>Numbers of a group's parameters.</summary>
    public IEnumerable<int> OfGroup(int group) => Enumerable.Range(0, Count).Where(k => _parameters[k].Group == group);

    /// <summary>What a parameter adds to a strain, per unit.</summary>
    /// <param name="parameter">Number of the parameter.</param>
    /// <param name="strain">Number of the strain: along Shmin and along SHmax, group by group.</param>
    public double Slope(int parameter, int strain)
    {
        var p = _parameters[parameter];
        return strain / 2 != p.Group ? 0 : strain % 2 == 0 ? p.PerAlongShmin : p.PerAlongShmax;
    }

    /// <summary>The strains, along Shmin and along SHmax, group by group.</summary>
    public double[] Strains(ReadOnlySpan<double> values)
    {
        var strains = (double[])_base.Clone();
        for (var k = 0; k < values.Length; k++)
        {
            var p = _parameters[k];
            strains[2 * p.Group] += p.PerAlongShmin * values[k];
            strains[(2 * p.Group) + 1] += p.PerAlongShmax * values[k];
        }

        return strains;
    }

    private readonly record struct Parameter(int Group, double PerAlongShmin, double PerAlongShmax, double Lower, double Upper, double Start);
}

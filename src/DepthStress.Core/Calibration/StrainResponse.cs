using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Shmin and SHmax of a stretch of samples as straight functions of the strains to be estimated: what the stress stage gives
/// without them and what it adds for each. It is read off the stage itself, so a calibration and a run cannot differ.
/// </summary>
public sealed class StrainResponse
{
    /// <summary>A strain large enough that its effect carries all digits.</summary>
    private const double Probe = 1e-3;

    private readonly double[] _shmin;
    private readonly double[] _shmax;
    private readonly int[] _groups;
    private readonly (double Shmin, double Shmax)[] _perAlongShmin;
    private readonly (double Shmin, double Shmax)[] _perAlongShmax;
    private (double Shmin, double Shmax)[] _means = [];

    private StrainResponse(int length)
    {
        _shmin = new double[length];
        _shmax = new double[length];
        _groups = new int[length];
        _perAlongShmin = new (double, double)[length];
        _perAlongShmax = new (double, double)[length];
    }

    /// <summary>Number of samples whose stresses are known.</summary>
    public int Known { get; private set; }

    /// <summary>The group of each sample, or -1 where strains are not to be estimated.</summary>
    public ReadOnlySpan<int> Groups => _groups;

    /// <summary>Reads the response of the samples [start, end).</summary>
    public static StrainResponse Of(EarthModel model, IReadOnlyList<StrainGroup> groups, int start, int end)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(groups);
        var response = new StrainResponse(end - start);
        foreach (var run in model.Runs)
        {
            var (from, to) = (Math.Max(run.Start, start), Math.Min(run.End, end));
            if (from < to) response.Read(model, groups, run, from, to, start);
        }

        response.Known = response._shmin.Length - response._shmin.AsSpan().Count(double.NaN);
        response._means = response.MeanTerms(groups.Count);
        return response;
    }

    /// <summary>Mean Shmin and SHmax, Pa, over the samples that have a Shmin; NaN without any.</summary>
    /// <param name="strains">Along Shmin and along SHmax, group by group.</param>
    public (double Shmin, double Shmax) Mean(ReadOnlySpan<double> strains)
    {
        var (shmin, shmax) = _means[0];
        for (var k = 0; k < strains.Length; k++)
        {
            shmin += _means[k + 1].Shmin * strains[k];
            shmax += _means[k + 1].Shmax * strains[k];
        }

        return (shmin, shmax);
    }

    /// <summary>How far Shmin lies above a pressure, Pa, where that is least; NaN where no sample has a Shmin.</summary>
    /// <param name="strains">Along Shmin and along SHmax, group by group.</param>
    /// <param name="pressures">The pressure at each sample, Pa.</param>
    public double LeastMargin(ReadOnlySpan<double> strains, ReadOnlySpan<double> pressures)
    {
        var least = double.NaN;
        for (var i = 0; i < _shmin.Length; i++)
        {
            var margin = At(i, strains).Shmin - pressures[i];
            if (margin < least || double.IsNaN(least)) least = margin;
        }

        return least;
    }

    private (double Shmin, double Shmax) At(int i, ReadOnlySpan<double> strains)
    {
        var group = _groups[i];
        if (group < 0) return (_shmin[i], _shmax[i]);
        var (along, across) = (strains[2 * group], strains[(2 * group) + 1]);
        return (_shmin[i] + (_perAlongShmin[i].Shmin * along) + (_perAlongShmax[i].Shmin * across),
            _shmax[i] + (_perAlongShmin[i].Shmax * along) + (_perAlongShmax[i].Shmax * across));
    }

    /// <summary>Mean of what the strains do not touch, then of what each strain adds per unit.</summary>
    private (double Shmin, double Shmax)[] MeanTerms(int groups)
    {
        var terms = new (double Shmin, double Shmax)[1 + (2 * groups)];
        for (var i = 0; i < _shmin.Length; i++)
        {
            if (double.IsNaN(_shmin[i])) continue;
            Add(0, (_shmin[i], _shmax[i]));
            if (_groups[i] < 0) continue;
            Add(1 + (2 * _groups[i]), _perAlongShmin[i]);
            Add(2 + (2 * _groups[i]), _perAlongShmax[i]);
        }

        for (var k = 0; k < terms.Length; k++) terms[k] = (terms[k].Shmin / Known, terms[k].Shmax / Known);
        return terms;

        void Add(int k, (double Shmin, double Shmax) term) => terms[k] = (terms[k].Shmin + term.Shmin, terms[k].Shmax + term.Shmax);
    }

    private void Read(EarthModel model, IReadOnlyList<StrainGroup> groups, SettingsRun run, int from, int to, int start)
    {
        var (at, n) = (from - start, to - from);
        var group = -1;
        for (var g = 0; g < groups.Count; g++)
        {
            if (groups[g].Holds(model.Setup, run)) group = g;
        }

        _groups.AsSpan(at, n).Fill(group);
        var shmin = _shmin.AsSpan(at, n);
        var shmax = _shmax.AsSpan(at, n);
        if (group < 0)
        {
            model.Values.Read(Logs.Property.MinHorizontalStress).Slice(from, n).CopyTo(shmin);
            model.Values.Read(Logs.Property.MaxHorizontalStress).Slice(from, n).CopyTo(shmax);
            return;
        }

        HorizontalStress.Fill(model.Values, run.Settings, from, n, (0, 0), shmin, shmax);
        double[] low = new double[n], high = new double[n];
        HorizontalStress.Fill(model.Values, run.Settings, from, n, (Probe, 0), low, high);
        for (var i = 0; i < n; i++) _perAlongShmin[at + i] = ((low[i] - shmin[i]) / Probe, (high[i] - shmax[i]) / Probe);
        HorizontalStress.Fill(model.Values, run.Settings, from, n, (0, Probe), low, high);
        for (var i = 0; i < n; i++) _perAlongShmax[at + i] = ((low[i] - shmin[i]) / Probe, (high[i] - shmax[i]) / Probe);
    }
}

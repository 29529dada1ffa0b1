using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>
/// What a change of pore pressure does to the least horizontal stress of a zone, all numbers means over the samples that have a
/// Shmin outside salt. The profile itself states the stresses before it.
/// </summary>
/// <param name="Zone">Index of the zone, or -1.</param>
/// <param name="PressureChange">Change of pore pressure, Pa; negative in depletion.</param>
/// <param name="Coefficient">Change of Shmin for a unit change of pore pressure.</param>
/// <param name="Neutral">The coefficient at which normal faulting is neither approached nor left.</param>
/// <param name="Shmin">Shmin before, Pa.</param>
/// <param name="NewShmin">Shmin after, Pa.</param>
/// <param name="Distance">How far Shmin lies above the frictional limit of normal faulting before, Pa; negative beyond it.</param>
/// <param name="NewDistance">The same after, Pa.</param>
/// <param name="Samples">Number of samples.</param>
/// <param name="BeyondLimit">Samples that are beyond the limit afterwards and were not before.</param>
/// <param name="NegativePressure">Samples whose pore pressure would fall below zero.</param>
public sealed record DepletionResult(
    short Zone, double PressureChange, double Coefficient, double Neutral, double Shmin, double NewShmin, double Distance, double NewDistance,
    int Samples, int BeyondLimit, int NegativePressure)
{
    /// <summary>The results of every zone and pressure change that the settings state, from top to bottom.</summary>
    public static IReadOnlyList<DepletionResult> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var zones = new Dictionary<(short Zone, double Change), Sum>();
        foreach (var run in model.Runs)
        {
            var change = run.Settings.HorizontalStress.PressureChange;
            if (!change.IsSet || StressStage.IsSalt(model.Setup, run.Lithology)) continue;
            var key = (run.Zone, change.Value);
            if (!zones.TryGetValue(key, out var sum)) zones.Add(key, sum = new Sum(model, change.Value));
            sum.Add(run);
        }

        return [.. zones.Where(z => z.Value.Samples > 0).Select(z => z.Value.Result(z.Key.Zone))];
    }

    private sealed class Sum(EarthModel model, double change)
    {
        private readonly double[] _poisson = SampleMarks.Column(model, Property.PoissonStatic);
        private readonly double[] _biot = SampleMarks.Column(model, Property.Biot);
        private readonly double[] _youngs = SampleMarks.Column(model, Property.YoungsStatic);
        private readonly double[] _youngsHorizontal = SampleMarks.Column(model, Property.YoungsStaticHorizontal);
        private readonly double[] _poissonHorizontal = SampleMarks.Column(model, Property.PoissonStaticHorizontal);
        private readonly double[] _biotHorizontal = SampleMarks.Column(model, Property.BiotHorizontal);
        private readonly double[] _vertical = SampleMarks.Column(model, Property.VerticalStress);
        private readonly double[] _pore = SampleMarks.Column(model, Property.PorePressure);
        private readonly double[] _shmin = SampleMarks.Column(model, Property.MinHorizontalStress);
        private double _coefficients, _neutrals, _before, _after, _distances, _newDistances;
        private int _beyond, _negative;

        public int Samples { get; private set; }

        public void Add(in SettingsRun run)
        {
            var friction = run.Settings.HorizontalStress.FrictionCoefficient.Value;
            for (var i = run.Start; i < run.End; i++)
            {
                if (double.IsNaN(_shmin[i])) continue;
                var coefficient = run.Settings.Anisotropy.IsOn
                    ? DepletionPath.Coefficient(_biot[i], _biotHorizontal[i], _youngsHorizontal[i] / _youngs[i], _poisson[i], _poissonHorizontal[i])
                    : DepletionPath.Coefficient(_biot[i], _poisson[i]);
                var after = _shmin[i] + (coefficient * change);
                var distance = _shmin[i] - FrictionalLimit.LowestShmin(_vertical[i], _pore[i], friction);
                var newDistance = after - FrictionalLimit.LowestShmin(_vertical[i], _pore[i] + change, friction);
                Samples++;
                _coefficients += coefficient;
                _neutrals += DepletionPath.Neutral(friction);
                _before += _shmin[i];
                _after += after;
                _distances += distance;
                _newDistances += newDistance;
                if (newDistance < 0 && distance >= 0) _beyond++;
                if (_pore[i] + change < 0) _negative++;
            }
        }

        public DepletionResult Result(short zone) => new(
            zone, change, _coefficients / Samples, _neutrals / Samples, _before / Samples, _after / Samples, _distances / Samples, _newDistances / Samples,
            Samples, _beyond, _negative);
    }
}

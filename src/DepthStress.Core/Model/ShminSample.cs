using DepthStress.Core.Logs;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>Shmin of single samples of a run with other Poisson's ratios or Biot's coefficients, by the formulas of the run itself.</summary>
internal readonly ref struct ShminSample
{
    private readonly StageSettings _settings;
    private readonly (double Along, double Across) _strains;
    private readonly ReadOnlySpan<double> _vertical, _horizontal, _poisson, _poissonHorizontal, _biot, _biotHorizontal, _sv, _pp, _temperature;

    /// <summary>Takes the columns of a model.</summary>
    public ShminSample(EarthModel model, in SettingsRun run)
    {
        _settings = run.Settings;
        _strains = run.Settings.HorizontalStress.BothStrains() ?? (0, 0);
        var (layered, values) = (run.Settings.Anisotropy.IsOn, model.Values);
        _vertical = values.Read(Property.YoungsStatic);
        _poisson = values.Read(Property.PoissonStatic);
        _biot = values.Read(Property.Biot);
        _horizontal = layered ? values.Read(Property.YoungsStaticHorizontal) : _vertical;
        _poissonHorizontal = layered ? values.Read(Property.PoissonStaticHorizontal) : _poisson;
        _biotHorizontal = layered ? values.Read(Property.BiotHorizontal) : _biot;
        _sv = values.Read(Property.VerticalStress);
        _pp = values.Read(Property.PorePressure);
        _temperature = values.Read(Property.Temperature);
    }

    /// <summary>Shmin with Poisson's ratios and Biot's coefficients shifted, held where they would leave their range.</summary>
    public double With(int i, double poissonStep, double biotStep, ref bool held)
    {
        var stress = _settings.HorizontalStress;
        if (stress.ByRatio) return EffectiveStressRatio.Of(stress.Ratio.Value, _sv[i], _pp[i]);
        var (poisson, poissonHorizontal) = (_poisson[i] + poissonStep, _poissonHorizontal[i] + poissonStep);
        var (biot, biotHorizontal) = (_biot[i] + biotStep, _biotHorizontal[i] + biotStep);
        if (poissonStep != 0)
        {
            held |= Hold(ref poisson, -1 + Math.Abs(poissonStep), 0.5) | Hold(ref poissonHorizontal, -1 + Math.Abs(poissonStep), 0.5);
            if (_settings.Anisotropy.IsOn && !VtiConstants.AreStable(_vertical[i], _horizontal[i], poisson, poissonHorizontal))
            {
                held = true;
                (poisson, poissonHorizontal) = (_poisson[i], _poissonHorizontal[i]);
            }
        }
        else
        {
            held |= Hold(ref biot, 0, 1) | Hold(ref biotHorizontal, 0, 1);
        }

        var shmin = VtiStrainModel.Of(
            _vertical[i], _horizontal[i], poisson, poissonHorizontal, biot, biotHorizontal, _sv[i], _pp[i], _strains.Along, _strains.Across);
        return stress.IsThermal
            ? shmin + ThermalStress.Of(_horizontal[i], poissonHorizontal, stress.ThermalExpansion.Value, _temperature[i], _settings.Temperature.Reference.Value)
            : shmin;
    }

    private static bool Hold(ref double value, double low, double high)
    {
        if (value >= low && value <= high) return false;
        value = Math.Clamp(value, low, high);
        return true;
    }
}

using DepthStress.Core.Catalogue;
using DepthStress.Core.Conditioning;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>The samples of one run that lack a property and that a choice is made for.</summary>
/// <param name="Run">The run.</param>
/// <param name="Law">The choice.</param>
/// <param name="Samples">The samples, in order.</param>
internal sealed record MissingSamples(SettingsRun Run, Law Law, int[] Samples);

/// <summary>Where a property is not logged but to be predicted, and what has been put there so far.</summary>
internal sealed class PredictionGap
{
    private readonly WellSetup _setup;
    private readonly LawSlot _slot;
    private readonly Curve? _curve;
    private readonly double[]? _vp;

    /// <summary>Looks for the missing samples below the ground or mudline; in salt only what the salt's own rule decides counts.</summary>
    public PredictionGap(WellSetup setup, LawSlot slot, LogTable logs, PropertyTable table, IReadOnlyList<SettingsRun> runs)
    {
        _setup = setup;
        (_slot, _curve, _vp) = (slot, logs[slot.Property], logs[Property.Vp]?.Values);
        Runs = runs;
        Values = _curve is { } curve ? (double[])curve.Values.Clone() : NoValues(logs.Count);
        Errors = NoValues(logs.Count);
        Refused = new bool[logs.Count];
        Logged = new bool[logs.Count];
        if (_curve is not null)
        {
            foreach (var run in _curve.Origins.Runs)
                Array.Fill(Logged, run.Origin is SampleOrigin.Measured or SampleOrigin.Spliced or SampleOrigin.Edited, run.Start, run.End - run.Start);
        }

        var tvd = table.Read(Property.TrueVerticalDepth);
        var missing = new List<MissingSamples>();
        foreach (var run in runs)
        {
            var (choice, salt) = (slot.Choice(run.Settings), StressStage.IsSalt(setup, run.Lithology));
            var samples = new List<int>();
            for (var i = run.Start; i < run.End; i++)
            {
                if (double.IsNaN(Values[i])) Logged[i] = false;
                if (tvd[i] < setup.Frame.SolidTopTvd || salt) Logged[i] = false;
                if (choice.IsSet && double.IsNaN(Values[i]) && !(tvd[i] < setup.Frame.SolidTopTvd)) samples.Add(i);
            }

            if (samples.Count > 0 && !(salt && choice.Source.Kind != SettingKind.Lithology)) missing.Add(new(run, choice.Value, [.. samples]));
        }

        Missing = missing;
        Count = missing.Sum(m => m.Samples.Length);
    }

    /// <summary>What is predicted.</summary>
    public Property Property => _slot.Property;

    /// <summary>Where the choice is made.</summary>
    public LawSlot Slot => _slot;

    /// <summary>Every run of samples.</summary>
    public IReadOnlyList<SettingsRun> Runs { get; }

    /// <summary>The missing samples, run by run.</summary>
    public IReadOnlyList<MissingSamples> Missing { get; }

    /// <summary>Number of missing samples.</summary>
    public int Count { get; }

    /// <summary>Logged and predicted values, SI.</summary>
    public double[] Values { get; }

    /// <summary>Standard error of each predicted value, SI.</summary>
    public double[] Errors { get; }

    /// <summary>True where a logged value may be learnt from: below the ground or mudline, not in salt.</summary>
    public bool[] Logged { get; }

    /// <summary>True where a prediction could not be rock.</summary>
    public bool[] Refused { get; }

    /// <summary>What filled samples.</summary>
    public List<Prediction> Predictions { get; } = [];

    /// <summary>Where the errors are kept.</summary>
    public Property ErrorProperty => Property == Property.Vs ? Property.ShearError : Property.DensityError;

    /// <summary>Why a prediction was refused.</summary>
    public FormattableString Impossible => Property == Property.Vs
        ? (FormattableString)$"predicted shear velocity with Vp/Vs not above sqrt(4/3): left missing"
        : $"predicted bulk density outside 1-4 g/cm3: left missing";

    /// <summary>Puts predicted values in where they can be rock.</summary>
    public void Put(Law law, string words, double error, ReadOnlySpan<int> samples, ReadOnlySpan<double> predicted, bool[] beyond)
    {
        var (filled, outside) = (new bool[Values.Length], new bool[Values.Length]);
        for (var k = 0; k < samples.Length; k++)
        {
            var (i, value) = (samples[k], predicted[k]);
            if (double.IsNaN(value)) continue;
            if (!CanBe(value, i))
            {
                Refused[i] = true;
                continue;
            }

            (Values[i], Errors[i], filled[i], outside[i]) = (value, error, true, beyond[k]);
        }

        if (filled.Contains(true)) Predictions.Add(new Prediction(Property, law, words, error, filled, outside));
    }

    /// <summary>The curve with its predicted samples marked.</summary>
    public Curve Curve()
    {
        var role = CurveRoles.Of(Property)!;
        var origins = _curve?.Origins ?? OriginTrack.Of(NoValues(Values.Length), SampleOrigin.None, "");
        foreach (var prediction in Predictions) origins = origins.Mark(prediction.Samples, SampleOrigin.Predicted, $"predicted: {prediction.Words}");
        return new Curve(role, _curve?.Source ?? "prediction", Values, origins);
    }

    /// <summary>The name of a zone.</summary>
    public string ZoneName(short zone) => _setup.Zones[zone].Name;

    /// <summary>All missing.</summary>
    public static double[] NoValues(int count)
    {
        var values = new double[count];
        Array.Fill(values, double.NaN);
        return values;
    }

    private bool CanBe(double value, int sample) => Property == Property.Vs
        ? value > 0 && !(_vp is { } vp && vp[sample] <= ImpossibleSamples.SmallestRatio * value)
        : value is >= ImpossibleSamples.LowestDensity and <= ImpossibleSamples.HighestDensity;
}

using SampleWell.Writing;

namespace SampleWell.Twins;

/// <summary>Writes the logs of a twin with ten significant digits, so that nothing is lost on the way through text.</summary>
internal sealed class TwinCsv : IDisposable
{
    private readonly FixedText text;

    /// <summary>Opens the file and writes its first line.</summary>
    public TwinCsv(string path) => text = new FixedText(path).Add("DEPT[m],GR[gAPI],DTC[us/ft],DTS[us/ft],RHOB[g/cm3]\n");

    /// <summary>Writes one sample.</summary>
    public void Add(double md, TwinSample sample) => text
        .Add(md, 9)
        .Add(",").Add(28 + 100 * sample.Shale, 8)
        .Add(",").Add(Physics.SlownessTimesVelocity / sample.Vp, 8)
        .Add(",").Add(Physics.SlownessTimesVelocity / sample.Vs, 8)
        .Add(",").Add(sample.Density / 1000, 10)
        .Add("\n");

    /// <inheritdoc/>
    public void Dispose() => text.Dispose();
}

using SampleWell.Hidden;

namespace SampleWell.Logging;

/// <summary>What sound tools in a sound hole would read: the truth, mixed into each tool's response, with each tool's own unrest.</summary>
internal static class Tools
{
    /// <summary>Logs a stretch of the well.</summary>
    /// <param name="truth">The well.</param>
    /// <param name="file">Name of the run's file; it also names the run's random streams.</param>
    /// <param name="top">Measured depth where the run starts, m.</param>
    /// <param name="bottom">Measured depth where it ends, m.</param>
    /// <param name="bit">Bit size as a function of measured depth, in; the run states the bit at its bottom.</param>
    public static LogRun Record(Truth truth, string file, double top, double bottom, Func<double, double> bit)
    {
        var first = Math.Max(truth.Plan.HalfFeet.First, (int)Math.Ceiling(top / Physics.HalfFoot));
        var last = Math.Min(truth.Plan.HalfFeet.Last, (int)(bottom / Physics.HalfFoot));
        var curves = Curve.All.ToDictionary(curve => curve.Name, _ => new double[last - first + 1]);
        double[] Unrest(string name, double length, double deviation) =>
            Noise.Curve(new Draws(truth.Plan.Seed, file + name), last - first + 1, Physics.HalfFoot, length, deviation);
        var gamma = Unrest("GR", 0.35, 2.4);
        var compressional = Unrest("DTC", 0.5, 0.35);
        var shear = Unrest("DTS", 0.6, 0.9);
        var density = Unrest("RHOB", 0.35, 0.007);
        var correction = Unrest("DRHO", 0.8, 0.007);
        var neutron = Unrest("NPHI", 0.4, 0.006);
        var photo = Unrest("PEF", 0.35, 0.07);
        var resistivity = Unrest("RD", 6, 0.11);
        var hole = Hole(truth, Unrest("CALI", 2.5, 1), Unrest("wall", 0.5, 0.05), first, bit);
        for (var i = 0; i <= last - first; i++)
        {
            var sample = new Response(truth, (first + i - truth.Plan.HalfFeet.First) * FineGrid.PerSample);
            curves["GR"][i] = 28 + 100 * sample.Shale + gamma[i] * (0.5 + 0.6 * sample.Shale);
            curves["CALI"][i] = hole[i];
            curves["BS"][i] = bit(bottom);
            curves["DTC"][i] = sample.Compressional + compressional[i];
            curves["DTS"][i] = sample.Shear + shear[i];
            curves["RHOB"][i] = sample.Density + density[i];
            curves["DRHO"][i] = 0.006 + correction[i];
            curves["NPHI"][i] = Math.Max(0.002, sample.Neutron + neutron[i]);
            curves["PEF"][i] = sample.Photoelectric + photo[i];
            curves["RD"][i] = sample.Resistivity * Math.Exp(resistivity[i]);
        }

        return new LogRun(file, first, curves);
    }

    /// <summary>Diameter in inches: mud cake on sand, a little enlarged in shale, near gauge elsewhere.</summary>
    private static double[] Hole(Truth truth, double[] wander, double[] wall, int first, Func<double, double> bit)
    {
        var hole = new double[wander.Length];
        for (var i = 0; i < hole.Length; i++)
        {
            var at = (first + i - truth.Plan.HalfFeet.First) * FineGrid.PerSample;
            var shale = truth.Rock.ShaleVolume[at];
            var cake = Math.Max(0, truth.Rock.Porosity[at] - 0.12) * (1 - shale) * (1 - shale) * 2.5;
            hole[i] = bit((first + i) * Physics.HalfFoot) + 0.07 + 0.55 * shale * shale * Math.Exp(0.5 * wander[i]) - cake + wall[i];
        }

        return hole;
    }
}

using SampleWell.Logging;

namespace SampleWell.Writing;

/// <summary>Writes one run as comma-separated text: names with units in the first line, fixed decimals, -999.25 for missing.</summary>
internal static class RunCsv
{
    /// <summary>Writes the file of a run into a folder.</summary>
    public static void Write(string folder, LogRun run)
    {
        using var text = new FixedText(Path.Combine(folder, run.File));
        text.Add("DEPT[m]");
        foreach (var curve in Curve.All)
            text.Add($",{curve.Name}[{curve.Unit}]");
        text.Add("\n");
        for (var i = 0; i < run.Count; i++)
        {
            text.Add(run.Md(i), 4);
            foreach (var curve in Curve.All)
                WriteValue(text.Add(","), run.Curves[curve.Name][i], curve.Decimals, 0);
            text.Add("\n");
        }
    }

    /// <summary>Adds a value, or the number for missing with its own two decimals.</summary>
    internal static void WriteValue(FixedText text, double value, int decimals, int width) =>
        text.Add(value, value == Curve.Missing ? 2 : decimals, width);
}

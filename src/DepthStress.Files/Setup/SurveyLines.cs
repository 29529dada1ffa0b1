using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Finds the line of each row of a survey that was read whole.</summary>
internal static class SurveyLines
{
    /// <summary>
    /// Line numbers from 1. A file that was read has no line left out but blank ones, so its rows are the last lines that are not
    /// blank.
    /// </summary>
    public static int[] Of(string path, LogFile file)
    {
        var lines = new List<int>();
        var number = 0;
        foreach (var line in File.ReadLines(path))
        {
            number++;
            if (!string.IsNullOrWhiteSpace(line)) lines.Add(number);
        }

        return [.. lines.TakeLast(file.Rows)];
    }
}

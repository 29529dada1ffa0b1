using System.Globalization;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Reading;

/// <summary>Says where another column gives other depths than the depth column.</summary>
internal static class SecondDepth
{
    // Depths printed with two decimals of a metre or foot may differ by rounding.
    private const double Rounding = 0.01;

    /// <summary>Notes every column named like a depth whose values differ from the depth column by more than rounding; nothing where the well file names the depth column.</summary>
    public static void Report(LogFile file, LogSource source)
    {
        if (source.Options.DepthColumn is not null) return;
        var depth = file.Columns[file.DepthColumn];
        foreach (var column in file.Columns)
        {
            if (column == depth || !source.Options.DepthNames.Contains(column.Name, StringComparer.OrdinalIgnoreCase)) continue;
            var (own, other) = (Metres(depth.Unit), Metres(column.Unit ?? depth.Unit));
            var worst = 0.0;
            for (var i = 0; i < file.Rows; i++)
            {
                var difference = Math.Abs((column.Values[i] * other) - (depth.Values[i] * own)) / own;
                if (difference > worst) worst = difference;
            }

            if (worst <= Rounding) continue;
            var most = string.Create(CultureInfo.InvariantCulture, $"{worst:G4} {depth.Unit}").TrimEnd();
            source.Diagnostics.Note(column.Position, $"column \"{column.Name}\" differs from the depth column \"{depth.Name}\" by up to {most}; the depth is \"{depth.Name}\"");
        }
    }

    private static double Metres(string? unit) => Units.Find(unit ?? "", Dimension.Length)?.ToSi(1.0) ?? 1;
}

using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>Turns the dip of a hole, counted from the horizontal, into inclination, counted from the vertical.</summary>
internal static class SurveyDip
{
    /// <summary>
    /// Inclinations, rad. Dips of zero or less mean that downwards is negative, dips of zero or more that it is positive; a note
    /// says which. Null and an error when both signs occur: then nobody can say.
    /// </summary>
    public static double[]? ToInclination(double[] dip, LogFile file, LogColumn column, int[] lines, DiagnosticBag diagnostics)
    {
        var (up, down) = (Array.FindIndex(dip, d => d > 0), Array.FindIndex(dip, d => d < 0));
        if (up >= 0 && down >= 0)
        {
            diagnostics.Error(
                new SourcePosition(file.Name, lines[Math.Max(up, down)]),
                Invariant($"column {column.Name}: found dips of both signs, {Degrees(dip[up])} deg in line {lines[up]} and {Degrees(dip[down])} deg in line {lines[down]}, expected one sign for a hole that goes down; give the inclination from the vertical instead"));
            return null;
        }

        var negative = down >= 0;
        diagnostics.Note(
            column.Position,
            $"column {column.Name}: read as dip from the horizontal, {(negative ? "negative" : "positive")} downwards: a vertical hole has {(negative ? "-90" : "90")} deg");
        return Array.ConvertAll(dip, d => (Math.PI / 2) - Math.Abs(d));
    }

    private static double Degrees(double angle) => Math.Round(angle * 180 / Math.PI, 6);
}

using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>Makes the path of the hole from the [survey] section, and reports what is missing or contradicts itself.</summary>
internal static class SurveyAssembly
{
    /// <summary>The path, or null with the reason reported.</summary>
    public static Trajectory? Path(
        SurveySection survey, SourcePosition file, string folder, List<InputFile> inputs, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var vertical = survey.Vertical is { IsSet: true, Value: true };
        if (survey.File.IsSet && vertical)
        {
            diagnostics.Error(survey.Vertical.Source.Position, "found both a survey file and vertical = true, expected one of them");
            return null;
        }

        if (!survey.File.IsSet)
        {
            if (survey.TieIn.Position is { } alone) diagnostics.Error(alone, "found tie_in without a survey file, expected file = \"...\" with it");
            if (vertical) return Trajectory.Vertical;
            if (!wrong.Has("[survey]", "file", "vertical")) diagnostics.Error(file, "[survey] is not set; expected file = \"...\" or vertical = true");
            return null;
        }

        if (!survey.North.IsSet)
            diagnostics.Error(file, "[survey] north is not set; expected \"true\", \"grid\" or \"magnetic\", what the survey's azimuths count from");
        var tieIn = TieIn(survey.TieIn, wrong, diagnostics);
        if (tieIn is null && survey.TieIn.Position is not null) return null;
        var path = SurveyFile.Read(System.IO.Path.GetFullPath(survey.File.Value, folder), survey.File.Value, tieIn, inputs, diagnostics);
        if (path is not null && tieIn is not null) Note(tieIn, survey.TieIn.Position ?? file, diagnostics);
        return path;
    }

    private static TieIn? TieIn(TieInSection section, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        if (section.Position is not { } position) return null;
        var (md, tvd) = (section.MeasuredDepth, section.TrueVerticalDepth);
        if (!md.IsSet && !wrong.Has("[survey.tie_in]", "md")) diagnostics.Error(position, "tie_in has no md; expected its measured depth");
        if (!tvd.IsSet && !wrong.Has("[survey.tie_in]", "tvd")) diagnostics.Error(position, "tie_in has no tvd; expected its true vertical depth");
        if (!md.IsSet || !tvd.IsSet) return null;
        if (tvd.Value <= md.Value) return new TieIn(md.Value, tvd.Value);
        diagnostics.Error(tvd.Source.Position, Invariant($"found a tie-in at {tvd.Value:G10} m true vertical depth, expected at most its measured depth of {md.Value:G10} m"));
        return null;
    }

    private static void Note(TieIn tieIn, SourcePosition position, DiagnosticBag diagnostics)
    {
        diagnostics.Note(
            position,
            Invariant($"the hole above the tie-in at {tieIn.MeasuredDepth:G10} m measured depth is taken as straight from the datum, at an inclination of {tieIn.Inclination * 180 / Math.PI:F1} deg"));
    }
}

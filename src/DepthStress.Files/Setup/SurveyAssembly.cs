using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;
using static System.FormattableString;

namespace DepthStress.Files.Setup;

/// <summary>Makes the path of the hole from the [survey] section, and reports what is missing or contradicts itself.</summary>
internal static class SurveyAssembly
{
    /// <summary>The path, or null with the reason reported.</summary>
    public static Trajectory? Path(
        SurveySection survey, CsvOptions csv, SourcePosition file, string folder, List<InputFile> inputs, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var vertical = survey.Vertical is { IsSet: true, Value: true };
        if (survey.File.IsSet && vertical)
        {
            diagnostics.Error(survey.Vertical.Source.Position, "found both a survey file and vertical = true, expected one of them");
            return null;
        }

        if (survey.Curve.IsSet && (survey.File.IsSet || vertical))
        {
            diagnostics.Error(survey.Curve.Source.Position, $"found both a depth curve and {(vertical ? "vertical = true" : "a survey file")}, expected one of them");
            return null;
        }

        if (!survey.File.IsSet)
        {
            if (survey.TieIn.Position is { } alone) diagnostics.Error(alone, "found tie_in without a survey file, expected file = \"...\" with it");
            if (vertical || survey.Curve.IsSet) return Trajectory.Vertical;
            if (!wrong.Has("[survey]", "file", "curve", "vertical")) diagnostics.Error(file, "[survey] is not set; expected file = \"...\", curve = \"...\" or vertical = true");
            return null;
        }

        if (!survey.North.IsSet)
            diagnostics.Error(file, "[survey] north is not set; expected \"true\", \"grid\" or \"magnetic\", what the survey's azimuths count from");
        var tieIn = TieIn(survey.TieIn, wrong, diagnostics);
        if (tieIn is null && survey.TieIn.Position is not null) return null;
        if (string.IsNullOrWhiteSpace(survey.File.Value))
        {
            diagnostics.Error(survey.File.Source.Position, "found an empty name, expected [survey] file = the name of a survey file");
            return null;
        }

        var path = SurveyFile.Read(System.IO.Path.GetFullPath(survey.File.Value, folder), survey.File.Value, csv, tieIn, inputs, diagnostics);
        if (path is not null && tieIn is not null) Note(tieIn, survey.TieIn.Position ?? file, diagnostics);
        return path;
    }

    /// <summary>The lie of the beds; flat, with the reason reported, where it cannot be used.</summary>
    public static Bedding Bedding(SurveySection survey, DiagnosticBag diagnostics)
    {
        var (dip, azimuth) = (survey.BeddingDip, survey.DipAzimuth);
        var stated = dip.Source.Kind != SettingKind.Default;
        if (azimuth.IsSet && !stated) diagnostics.Error(azimuth.Source.Position, "found dip_azimuth without bedding_dip, expected both");
        if (dip.Value == 0) return Core.Depth.Bedding.Flat;
        if (dip.Value > Math.PI / 2)
            diagnostics.Error(dip.Source.Position, Invariant($"found a bedding_dip of {dip.Value * 180 / Math.PI:G6} deg, expected at most 90 deg"));
        else if (survey.Curve.IsSet)
            diagnostics.Error(dip.Source.Position, "found bedding_dip with a depth curve, expected a survey file: the curve does not say in which direction the hole leans");
        else if (!azimuth.IsSet && survey.File.IsSet)
            diagnostics.Error(dip.Source.Position, "found bedding_dip without dip_azimuth, expected both");
        else
            return new Bedding(dip.Value, azimuth.IsSet ? azimuth.Value : 0);
        return Core.Depth.Bedding.Flat;
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

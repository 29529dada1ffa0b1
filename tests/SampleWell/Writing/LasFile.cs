using System.Globalization;
using SampleWell.Hidden;
using SampleWell.Logging;

namespace SampleWell.Writing;

/// <summary>
/// Writes both runs, joined at the splice, as Log ASCII Standard 2.0 (Canadian Well Logging Society): sections in the order of the
/// standard, STRT, STOP and STEP in the unit of the depth column, one line per depth, the missing value in NULL.
/// </summary>
internal static class LasFile
{
    /// <summary>Writes the file.</summary>
    public static void Write(string path, string wellName, WellPlan plan, LogRun upper, LogRun lower)
    {
        using var text = new FixedText(path);
        text.Add("~VERSION INFORMATION\n");
        Line(text, "VERS.", "2.0", "CWLS LOG ASCII STANDARD - VERSION 2.0");
        Line(text, "WRAP.", "NO", "ONE LINE PER DEPTH STEP");
        text.Add("~WELL INFORMATION\n#MNEM.UNIT        DATA                       : DESCRIPTION\n");
        Line(text, "STRT.M", Number(plan.FirstMd, 4), "START DEPTH");
        Line(text, "STOP.M", Number(plan.LastMd, 4), "STOP DEPTH");
        Line(text, "STEP.M", Number(Physics.HalfFoot, 4), "STEP");
        Line(text, "NULL.", Number(Curve.Missing, 2), "NULL VALUE");
        Line(text, "COMP.", "NONE (INVENTED DATA)", "COMPANY");
        Line(text, "WELL.", wellName.ToUpperInvariant(), "WELL");
        Line(text, "FLD.", "SORREL BASIN (INVENTED)", "FIELD");
        Line(text, "LOC.", "INVENTED", "LOCATION");
        Line(text, "PROV.", "INVENTED", "PROVINCE");
        Line(text, "SRVC.", "NONE (COMPUTED LOGS)", "SERVICE COMPANY");
        Line(text, "DATE.", "2023-09-12", "LOG DATE");
        Line(text, "UWI.", "NONE", "UNIQUE WELL ID");
        text.Add("~CURVE INFORMATION\n#MNEM.UNIT        API CODE                   : DESCRIPTION\n");
        Line(text, "DEPT.M", "", "1  MEASURED DEPTH BELOW ROTARY TABLE");
        foreach (var (k, curve) in Curve.All.Index())
        {
            var description = string.Create(CultureInfo.InvariantCulture, $"{k + 2}  {curve.Description}");
            Line(text, $"{curve.Name}.{curve.Unit.ToUpperInvariant()}", "", description);
        }

        text.Add("~PARAMETER INFORMATION\n#MNEM.UNIT        VALUE                      : DESCRIPTION\n");
        Line(text, "EREF.M", Number(plan.DatumElevation, 1), "ELEVATION OF DEPTH REFERENCE (ROTARY TABLE)");
        Line(text, "EGL.M", Number(plan.GroundElevation, 1), "ELEVATION OF GROUND LEVEL");
        Line(text, "SPLC.M", Number(plan.Splice, 1), "DEPTH OF SPLICE BETWEEN RUN 1 AND RUN 2");
        text.Add("~A  DEPT");
        foreach (var curve in Curve.All)
            text.Add(curve.Name.PadLeft(10));
        text.Add("\n");
        for (var halfFoot = plan.HalfFeet.First; halfFoot <= plan.HalfFeet.Last; halfFoot++)
            Row(text, halfFoot, halfFoot * Physics.HalfFoot < plan.Splice ? upper : lower);
    }

    private static void Row(FixedText text, int halfFoot, LogRun run)
    {
        text.Add(halfFoot * Physics.HalfFoot, 4, 9);
        foreach (var curve in Curve.All)
            RunCsv.WriteValue(text, run.Curves[curve.Name][halfFoot - run.FirstHalfFoot], curve.Decimals, 10);
        text.Add("\n");
    }

    private static void Line(FixedText text, string mnemonic, string data, string description) =>
        text.Add($" {mnemonic,-16} {data,-26} : {description}\n");

    private static string Number(double value, int decimals) => FixedText.Quantity(value, decimals, "");
}

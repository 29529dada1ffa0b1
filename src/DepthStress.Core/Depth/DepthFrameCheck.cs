using System.Globalization;

namespace DepthStress.Core.Depth;

/// <summary>Finds what is wrong with a depth frame.</summary>
internal static class DepthFrameCheck
{
    public static IReadOnlyList<string> Problems(DepthFrame frame)
    {
        var problems = new List<string>();
        Finite(problems, frame.DatumElevation, "datum elevation");
        Finite(problems, frame.GroundElevation, "ground elevation");
        Finite(problems, frame.WaterDepth, "water depth");
        Finite(problems, frame.WaterTableDepth, "water table depth");
        if (problems.Count > 0) return problems;

        switch (frame.GroundElevation, frame.WaterDepth)
        {
            case (null, null):
                problems.Add("found neither a ground elevation nor a water depth, expected one of them");
                break;
            case ({ }, { }):
                problems.Add("found both a ground elevation and a water depth, expected one of them");
                break;
            case ({ } ground, null):
                Onshore(problems, frame, ground);
                break;
            case (null, { }):
                Offshore(problems, frame);
                break;
        }

        if (frame.WaterDepth < 0) problems.Add($"found a water depth of {Metres(frame.WaterDepth)}, expected 0 m or more");
        if (frame.WaterTableDepth < 0) problems.Add($"found a water table depth of {Metres(frame.WaterTableDepth)}, expected 0 m or more below ground");
        if (frame.Datum == DatumKind.SeaLevel && frame.DatumElevation != 0)
            problems.Add($"found a datum elevation of {Metres(frame.DatumElevation)}, expected 0 m because the datum is sea level");
        return problems;
    }

    private static void Onshore(List<string> problems, DepthFrame frame, double ground)
    {
        if (frame.Datum == DatumKind.Ground && ground != frame.DatumElevation)
            problems.Add($"found a ground elevation of {Metres(ground)}, expected the datum elevation of {Metres(frame.DatumElevation)} because the datum is the ground");
        else if (frame.Datum == DatumKind.RotaryTable && ground > frame.DatumElevation)
            problems.Add($"found a ground elevation of {Metres(ground)}, expected at most the datum elevation of {Metres(frame.DatumElevation)}");
    }

    private static void Offshore(List<string> problems, DepthFrame frame)
    {
        if (frame.Datum == DatumKind.Ground) problems.Add("found the ground as datum of a well with a water depth, expected the rotary table or sea level");
        if (frame.Datum == DatumKind.RotaryTable && frame.DatumElevation < 0)
            problems.Add($"found a datum elevation of {Metres(frame.DatumElevation)}, expected 0 m or more in a well with a water depth");
        if (frame.WaterTableDepth.HasValue)
            problems.Add($"found a water table depth of {Metres(frame.WaterTableDepth)} with a water depth, expected it onshore only");
    }

    private static void Finite(List<string> problems, double? value, string name)
    {
        if (value is { } number && !double.IsFinite(number))
            problems.Add(string.Create(CultureInfo.InvariantCulture, $"found a {name} of {number}, expected a finite number"));
    }

    private static string Metres(double? value) => string.Create(CultureInfo.InvariantCulture, $"{value:G10} m");
}

namespace SampleWell.Hidden;

/// <summary>Weight of the rock above.</summary>
internal static class Overburden
{
    /// <summary>
    /// Overburden in MPa: the stated mean density from the ground to the first depth, then the density weighted with the vertical part
    /// of each step.
    /// </summary>
    public static double[] Along(WellPlan plan, double[] tvd, double[] density)
    {
        var sv = new double[tvd.Length];
        sv[0] = Physics.ColumnMpa(plan.DensityAbove, tvd[0] - plan.GroundTvd);
        for (var i = 1; i < tvd.Length; i++)
            sv[i] = sv[i - 1] + Physics.ColumnMpa((density[i - 1] + density[i]) / 2, tvd[i] - tvd[i - 1]);
        return sv;
    }
}

using SampleWell.Hidden;

namespace SampleWell.Writing;

/// <summary>The wall of the vertical part of the hole, drilled with a mud of one density (kg/m3).</summary>
internal sealed class HoleWall(Truth truth, double mudDensity)
{
    /// <summary>
    /// Mean opening angle of the breakouts in degrees over an interval; NaN where the wall holds all round or breaks all round. The
    /// wall fails where the hoop stress around a round hole in elastic rock passes what the rock bears under the mud's support.
    /// </summary>
    public double BreakoutWidth(double top, double bottom)
    {
        var sum = 0.0;
        var count = 0;
        for (var md = top; md <= bottom; md += truth.Grid.Step * FineGrid.PerSample, count++)
            sum += Width(md);
        return sum / count;
    }

    private double Width(double md)
    {
        var i = (int)Math.Round((md - truth.Grid.Md[0]) / truth.Grid.Step);
        var support = Physics.ColumnMpa(mudDensity, truth.Tvd[i]) - truth.Pore[i];
        var friction = Math.Sin(double.DegreesToRadians(Laws.FrictionAngle(truth.Rock.Vp[i])));
        var borne = truth.Strength[i] + (1 + friction) / (1 - friction) * support;
        var greater = truth.Shmax[i] - truth.Pore[i];
        var lesser = truth.Shmin[i] - truth.Pore[i];
        // Hoop stress: greater + lesser - support + 2 (greater - lesser) cos x, x twice the angle from the least stress.
        var cosine = (borne + support - greater - lesser) / (2 * (greater - lesser));
        return Math.Abs(cosine) < 1 ? double.RadiansToDegrees(Math.Acos(cosine)) : double.NaN;
    }
}

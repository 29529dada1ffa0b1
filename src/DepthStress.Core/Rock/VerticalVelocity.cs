namespace DepthStress.Core.Rock;

/// <summary>
/// Velocities across the beds from velocities along a hole that crosses them obliquely: Newton's iteration on the exact phase
/// velocities, each step shortened until it helps.
/// </summary>
public static class VerticalVelocity
{
    /// <summary>The relative misfit of the squared velocities at which the search ends.</summary>
    private const double Tolerance = 1e-14;

    /// <summary>The relative misfit that still counts as met where rounding allows no smaller one.</summary>
    private const double Met = 1e-12;

    private const int MostSteps = 40;
    private const double Probe = 1e-7;
    private const double LongestStep = 0.2;

    /// <summary>Finds both velocities across the beds, m/s; NaN where an input is missing or none fit.</summary>
    /// <param name="vp">Compressional velocity along the hole, m/s.</param>
    /// <param name="vs">Shear velocity along the hole, m/s.</param>
    /// <param name="wave">Which of the two shear waves that is.</param>
    /// <param name="angle">Angle between the hole and the normal of the beds, rad.</param>
    /// <param name="closure">What gives the other stiffnesses, divided by density.</param>
    public static (double Vp, double Vs) Of(double vp, double vs, ShearWave wave, double angle, VtiClosure closure)
    {
        double a = vp * vp, b = vs * vs;
        var miss = Miss(a, b);
        for (var step = 0; step < MostSteps && Size(miss) > Tolerance; step++)
        {
            var (alongA, alongB) = (Miss(a * (1 + Probe), b), Miss(a, b * (1 + Probe)));
            double pa = (alongA.P - miss.P) / Probe, pb = (alongB.P - miss.P) / Probe;
            double sa = (alongA.S - miss.S) / Probe, sb = (alongB.S - miss.S) / Probe;
            var determinant = (pa * sb) - (pb * sa);
            var da = Math.Clamp(((pb * miss.S) - (sb * miss.P)) / determinant, -LongestStep, LongestStep);
            var db = Math.Clamp(((sa * miss.P) - (pa * miss.S)) / determinant, -LongestStep, LongestStep);
            var share = 1.0;
            var better = miss;
            for (; share > 1e-6; share /= 2)
            {
                better = Miss(a * (1 + (share * da)), b * (1 + (share * db)));
                if (Size(better) < Size(miss)) break;
            }

            if (!(Size(better) < Size(miss))) break;
            (a, b, miss) = (a * (1 + (share * da)), b * (1 + (share * db)), better);
        }

        return Size(miss) <= Met ? (Math.Sqrt(a), Math.Sqrt(b)) : (double.NaN, double.NaN);

        (double P, double S) Miss(double c33, double c44)
        {
            var waves = new VtiVelocities(closure.Of(c33, c44), angle);
            return ((waves.Compressional / (vp * vp)) - 1, (waves.Shear(wave) / (vs * vs)) - 1);
        }
    }

    private static double Size((double P, double S) miss) => Math.Max(Math.Abs(miss.P), Math.Abs(miss.S));
}

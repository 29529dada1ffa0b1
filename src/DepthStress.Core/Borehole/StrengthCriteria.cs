using MathNet.Numerics.RootFinding;

namespace DepthStress.Core.Borehole;

/// <summary>Three principal effective stresses, Pa: above zero where the rock fails, below where it holds.</summary>
public delegate double FailureFunction(double greatest, double middle, double least);

/// <summary>Strength criteria in principal effective stresses, compression positive; c is cohesion and phi friction angle, rad.</summary>
public static class StrengthCriteria
{
    /// <summary>Cohesion from unconfined strength: C0 (1 - sin phi) / (2 cos phi).</summary>
    public static double Cohesion(double ucs, double frictionAngle) => ucs * (1 - Math.Sin(frictionAngle)) / (2 * Math.Cos(frictionAngle));

    /// <summary>S1 = C0 + q S3. Source: Zhang 2019, eq. 3.37-3.40.</summary>
    public static FailureFunction MohrCoulomb(double ucs, double frictionAngle)
    {
        var q = VerticalHole.FrictionFactor(frictionAngle);
        return (s1, _, s3) => s1 - ucs - (q * s3);
    }

    /// <summary>tau_oct = a + b (S1 + S3) / 2. Source: Al-Ajmi and Zimmerman 2005, IJRMMS 42:431-439, as in Zhang 2019, eq. 3.70-3.71.</summary>
    public static FailureFunction MogiCoulomb(double cohesion, double frictionAngle)
    {
        var factor = 2 * Math.Sqrt(2) / 3;
        var (a, b) = (factor * cohesion * Math.Cos(frictionAngle), factor * Math.Sin(frictionAngle));
        return (s1, s2, s3) => (Math.Sqrt(Squares(s1, s2, s3)) / 3) - a - (b * (s1 + s3) / 2);
    }

    /// <summary>I1^3 / I3 = 27 + eta, stresses raised by c / tan phi. Source: Ewy 1999, SPEDC 14:85-91, as in Zoback 2007, eq. 4.13-4.17. A raised stress of zero or less has failed.</summary>
    public static FailureFunction ModifiedLade(double cohesion, double frictionAngle)
    {
        var (tangent, sine) = (Math.Tan(frictionAngle), Math.Sin(frictionAngle));
        var (raise, eta) = (cohesion / tangent, 4 * tangent * tangent * (9 - (7 * sine)) / (1 - sine));
        return (s1, s2, s3) =>
        {
            var (sum, product) = (s1 + s2 + s3 + (3 * raise), (s1 + raise) * (s2 + raise) * (s3 + raise));
            return s3 + raise > 0 ? sum - Math.Cbrt((27 + eta) * product) : raise;
        };
    }

    /// <summary>sqrt(J2) = k + alpha I1 through the compression edges of Mohr and Coulomb's pyramid (outer). Source: Zhang 2019, pp. 120-121.</summary>
    public static FailureFunction DruckerPragerOuter(double cohesion, double frictionAngle) => Cone(cohesion, frictionAngle, -1);

    /// <summary>The same through the extension edges (inner). Source: Zhang 2019, pp. 120-121.</summary>
    public static FailureFunction DruckerPragerExtension(double cohesion, double frictionAngle) => Cone(cohesion, frictionAngle, 1);

    /// <summary>The same touching the sides (inner tangent, plane strain). Source: Zhang 2019, pp. 120-121.</summary>
    public static FailureFunction DruckerPragerTangent(double cohesion, double frictionAngle)
    {
        var tangent = Math.Tan(frictionAngle);
        var root = Math.Sqrt(9 + (12 * tangent * tangent));
        return DruckerPrager(tangent / root, 3 * cohesion / root);
    }

    /// <summary>S1 = S3 + C0 sqrt(m S3 / C0 + s). Source: Eberhardt 2012, ISRM suggested method. Below the tensile limit the rock has failed.</summary>
    public static FailureFunction HoekBrown(double ucs, double m, double s) => (s1, _, s3) =>
    {
        var under = (m * s3 / ucs) + s;
        return under >= 0 ? s1 - s3 - (ucs * Math.Sqrt(under)) : ucs;
    };

    /// <summary>
    /// The greatest principal stress at failure, at or above the middle one. No answer where the middle and least stress alone have
    /// failed already (a root on the wrong branch is never given), or where no stress up to 1 TPa breaks the rock.
    /// </summary>
    /// <param name="criterion">The criterion.</param>
    /// <param name="middle">The middle stress, not below the least, Pa.</param>
    /// <param name="least">The least stress, Pa.</param>
    public static WallAnswer GreatestAtFailure(FailureFunction criterion, double middle, double least)
    {
        ArgumentNullException.ThrowIfNull(criterion);
        if (!(middle >= least)) return WallAnswer.Of(double.NaN);
        double At(double greatest) => criterion(greatest, middle, least);
        if (At(middle) > 0) return WallAnswer.None("the middle and the least stress alone break the rock");

        for (var step = 1e6; step <= 1e12; step *= 2)
        {
            if (At(middle + step) > 0 && Brent.TryFindRoot(At, middle, middle + step, 1e-6, 200, out var root)) return WallAnswer.Of(root);
        }

        return WallAnswer.None("no greatest stress breaks the rock under this confinement");
    }

    private static FailureFunction Cone(double cohesion, double frictionAngle, int edge)
    {
        var (sine, cosine) = Math.SinCos(frictionAngle);
        var under = Math.Sqrt(3) * (3 + (edge * sine));
        return DruckerPrager(2 * sine / under, 6 * cohesion * cosine / under);
    }

    private static FailureFunction DruckerPrager(double alpha, double k) =>
        (s1, s2, s3) => Math.Sqrt(Squares(s1, s2, s3) / 6) - k - (alpha * (s1 + s2 + s3));

    private static double Squares(double s1, double s2, double s3) => ((s1 - s2) * (s1 - s2)) + ((s2 - s3) * (s2 - s3)) + ((s1 - s3) * (s1 - s3));
}

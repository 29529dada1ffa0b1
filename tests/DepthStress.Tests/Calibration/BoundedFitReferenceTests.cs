using DepthStress.Core.Calibration;
using DepthStress.Tests.Prediction;

namespace DepthStress.Tests.Calibration;

/// <summary>NIST StRD certified values (itl.nist.gov/div898/strd) through the bounded fit, no bound active.</summary>
public sealed class BoundedFitReferenceTests
{
    private static readonly double[] MisraX = [77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0];

    private static readonly double[] MisraY = [10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.40, 75.47, 81.78];

    /// <summary>A line through rows of x, each with a leading 1, with its exact derivatives.</summary>
    private static FitProblem Line(double[][] x, double[] y, double[] scales) => new(
        [.. scales.Select(s => new FitParameter(0, double.NegativeInfinity, double.PositiveInfinity, s))],
        y.Length,
        (p, r) =>
        {
            for (var i = 0; i < y.Length; i++)
            {
                r[i] = -y[i];
                for (var j = 0; j < p.Length; j++) r[i] += p[j] * x[i][j];
            }
        },
        (_, jacobian) =>
        {
            for (var i = 0; i < y.Length; i++)
            {
                for (var j = 0; j < scales.Length; j++) jacobian[i, j] = x[i][j];
            }
        });

    /// <summary>Equal to a certified value in so many digits.</summary>
    private static void Agrees(double certified, double found, int digits) => Assert.Equal(certified, found, Math.Abs(certified) * Math.Pow(10, -digits));

    private static void AgreesWithErrors(FitResult fit, double[] certified, double[] deviations, int digits)
    {
        Assert.True(fit.Converged);
        for (var j = 0; j < certified.Length; j++)
        {
            Agrees(certified[j], fit.Estimates[j], digits);
            // NIST's deviations rest on the residuals, the fit's on stated ones of 1.
            Agrees(deviations[j], fit.StandardErrors[j] * Math.Sqrt(fit.ReducedChiSquare), digits);
        }
    }

    [Fact]
    public void Norris_in_nine_digits()
    {
        var fit = BoundedFit.Solve(Line([.. LinearRegressionReferenceTests.NorrisX.Select(x => new[] { 1, x })], LinearRegressionReferenceTests.NorrisY, [1, 1]));
        AgreesWithErrors(fit, [-0.262323073774029, 1.00211681802045], [0.232818234301152, 0.429796848199937E-03], 9);
        Agrees(26.6173985294224, fit.ChiSquare, 9);
    }

    // Nine digits: the design is so nearly dependent that two of double precision's sixteen digits and five more go.
    [Fact]
    public void Longley_in_nine_digits()
    {
        var fit = BoundedFit.Solve(Line(
            [.. LinearRegressionReferenceTests.Longley.Select(row => row[1..].Prepend(1).ToArray())],
            [.. LinearRegressionReferenceTests.Longley.Select(row => row[0])],
            [1e6, 10, 0.01, 1, 1, 0.1, 1e3]));
        AgreesWithErrors(
            fit,
            [-3482258.63459582, 15.0618722713733, -0.0358191792925910, -2.02022980381683, -1.03322686717359, -0.0511041056535807, 1829.15146461355],
            [890420.383607373, 84.9149257747669, 0.0334910077722432, 0.488399681651699, 0.214274163161675, 0.226073200069370, 455.478499142212],
            9);
    }

    // NIST's own two starts. Certified values quoted from memory; a refit elsewhere agrees to nine digits. Six digits: derivatives
    // are differences.
    [Theory]
    [InlineData(500, 0.0001)]
    [InlineData(250, 0.0005)]
    public void Misra1a_in_six_digits_by_differences(double first, double second)
    {
        var fit = BoundedFit.Solve(new FitProblem(
            [new(first, 0, 1e4, 100), new(second, 0, 1, 1e-4)],
            MisraX.Length,
            (p, r) =>
            {
                for (var i = 0; i < r.Length; i++) r[i] = (p[0] * (1 - Math.Exp(-p[1] * MisraX[i]))) - MisraY[i];
            }));
        AgreesWithErrors(fit, [238.94212918, 5.5015643181E-04], [2.7070075241, 7.2668688436E-06], 6);
        Agrees(0.12455138894, fit.ChiSquare, 6);
    }
}

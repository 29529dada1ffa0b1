using System.Globalization;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Prediction;

/// <summary>The choice to train a relation on the well's own samples, and the laws that come out of it.</summary>
public static class TrainedRelation
{
    /// <summary>What stands for it in well files.</summary>
    public const string Id = "trained";

    private static readonly LawInput Vp = InputOf.VpMetre;

    private static readonly LawInput ShaleVolume = InputOf.Clay with { Symbol = "Vsh" };

    private static readonly LawInput GammaRay = new("GR", Property.GammaRay, Units.GammaApi);

    private static readonly LawInput Density = InputOf.DensityGram;

    private static readonly LawInput Neutron = new("NPHI", Property.NeutronPorosity, Units.Fraction);

    private static readonly Law[] Choices = [Choice(Property.Vs, "Vs"), Choice(Property.Density, "rho")];

    /// <summary>The choice for a property, or null for one that is not predicted.</summary>
    public static Law? For(Property predicts) => Array.Find(Choices, c => c.Predicts == predicts);

    /// <summary>True when a law is the choice to train one.</summary>
    public static bool Is(Law law) => Array.IndexOf(Choices, law) >= 0;

    /// <summary>What a trained relation may start from, the most telling first.</summary>
    /// <param name="predicts">Shear velocity or density.</param>
    /// <param name="shaleVolume">True when there is a shale volume; gamma ray stands in for it otherwise.</param>
    public static LawInput[] Predictors(Property predicts, bool shaleVolume)
    {
        var shale = shaleVolume ? ShaleVolume : GammaRay;
        return predicts == Property.Vs ? [Vp, shale, Density, Neutron] : [Vp, shale, Neutron];
    }

    /// <summary>The law of a fitted line; its coefficients are rounded to seven digits, so that what is shown is what is used.</summary>
    /// <param name="choice">What was chosen.</param>
    /// <param name="predictors">The line's predictors, with the range they were fitted in.</param>
    /// <param name="line">The line, in the predictors' and the law's units.</param>
    /// <param name="scope">What it was trained on, in words.</param>
    public static Law From(Law choice, LawInput[] predictors, LinearRegression line, string scope)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(predictors);
        ArgumentNullException.ThrowIfNull(line);
        var count = predictors.Length;
        var terms = predictors.Select((p, k) => $"{{{(char)('a' + k)}}} {p.Symbol}").Append($"{{{(char)('a' + count)}}}");
        return choice with
        {
            Title = $"trained on {scope}",
            Inputs = predictors,
            Coefficients = Coefficient.Named([.. line.Slopes.Append(line.Intercept).Select(Rounded)]),
            Template = $"{(choice.Predicts == Property.Vs ? "Vs" : "rho")} = {string.Join(" + ", terms)}",
            Formula = (x, c) =>
            {
                var value = c[count];
                for (var k = 0; k < count; k++) value += c[k] * x[k];
                return value;
            },
            Validity = scope,
        };
    }

    private static double Rounded(double value) => double.Parse(value.ToString("G7", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    private static Law Choice(Property predicts, string symbol) => new()
    {
        Id = Id,
        Title = "trained on the well's own samples",
        Predicts = predicts,
        Unit = predicts == Property.Vs ? Units.MetrePerSecond : Units.GramPerCubicCentimetre,
        Rocks = RockKinds.Any,
        Inputs = [],
        Template = $"{symbol} = a line in the other logs, least squares over the well's own samples",
        Formula = (_, _) => double.NaN,
        ResultDomain = predicts == Property.Vs ? PredictionEntry.ShearDomain : PredictionEntry.CredibleDensity,
        Validity = "the range of the well's own samples",
        Source = "least squares over the well's own samples, error by blocked cross-validation",
        Standing = Standing.Trained,
    };
}

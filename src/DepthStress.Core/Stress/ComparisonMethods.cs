using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Stress;

/// <summary>
/// Catalogue entries of classic fracture-gradient relations and regional depth relations. They are drawn beside the model for
/// comparison and never enter it.
/// </summary>
public static class ComparisonMethods
{
    private const string Exercise = "as in the Gulf Coast fracture-gradient exercise after Bourgoyne, Millheim, Chenevert and Young 1986, Applied Drilling Engineering, SPE";

    private const string Zhang = "read in Zhang 2019, Applied Petroleum Geomechanics, ";

    private const string PressuresNotGradients =
        "Breckels and van Eekelen 1982, J. Petrol. Technol. 34, 2191-2199, " + Zhang + "p. 209, which calls P and its normal value gradients: they are pressures, or the term would be nothing";

    private const string Normal = "fitted to normally pressured and overpressured rock; the term in P carries on below normal pressure";

    private static readonly LawInput Vertical = new("S", Property.VerticalStress, Units.Psi, Interval.NotNegative, Interval.All);

    private static readonly LawInput Pore = new("P", Property.PorePressure, Units.Psi, Interval.NotNegative, Interval.All);

    private static readonly LawInput Feet = new("D", Property.DepthBelowGroundOrSea, Units.Foot, Interval.NotNegative, Interval.All);

    private static readonly LawInput Metres = new("Z", Property.DepthBelowGroundOrSea, Units.Metre, Interval.NotNegative, Interval.All);

    private static readonly LawInput BelowMudline = new("Z", Property.DepthBelowSurface, Units.Metre, Interval.NotNegative, Interval.All);

    private static readonly LawInput Porosity = InputOf.Porosity;

    /// <summary>Depth where the two branches of the US Gulf Coast join, ft.</summary>
    public const double GulfCoastJoin = 11500;

    private const string Join = "the branches are 35 psi apart where they join, at 11500 ft";

    /// <summary>Breckels and van Eekelen's relation for the US Gulf Coast, the upper branch.</summary>
    public static Law GulfCoast { get; } = Regional(
        "breckels-1982-gulf-coast", "US Gulf Coast", Feet.Only(0, GulfCoastJoin), 0.197, 0.46, 0.465, PressuresNotGradients, Standing.Confirmed,
        WorkedExample.Computed(9030.731, 7, 10000, 8000)) with
    { Validity = $"US Gulf Coast; {Normal}; {Join}" };

    /// <summary>The lower branch, a straight line.</summary>
    public static Law GulfCoastDeep { get; } = Entry(
        "breckels-1982-gulf-coast-deep", "Breckels and van Eekelen's least stress from depth and pore pressure, deep US Gulf Coast", Units.Psi,
        [Feet.Only(GulfCoastJoin, double.PositiveInfinity), Pore], [new("a", 1.167), new("b", 4596, "psi"), new("k", 0.46), new("g", 0.465, "psi/ft")],
        "{a} D - {b} + {k} (P - {g} D)", (x, c) => (c[0] * x[0]) - c[1] + (c[2] * (x[1] - (c[3] * x[0]))),
        $"US Gulf Coast; {Normal}; {Join}", PressuresNotGradients, Standing.Confirmed, WorkedExample.Computed(11474.30, 7, 13000, 8000));

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry(
            "hubbert-willis-1957-least", "Hubbert and Willis' least injection pressure that opens fractures", Units.Psi, [Vertical, Pore], [new("a", 3)],
            "(S + 2 P) / {a}", (x, c) => (x[0] + (2 * x[1])) / c[0],
            "normal faulting with an effective least stress of a third of the vertical one", $"Hubbert and Willis 1957, Trans. AIME 210, 153-168; {Exercise}", Standing.Confirmed,
            WorkedExample.Computed(9056.667, 7, 11000, 8085)),
        Entry(
            "hubbert-willis-1957-greatest", "Hubbert and Willis' greatest injection pressure that opens fractures", Units.Psi, [Vertical, Pore], [new("a", 2)],
            "(S + P) / {a}", (x, c) => (x[0] + x[1]) / c[0],
            "normal faulting with an effective least stress of half the vertical one", $"Hubbert and Willis 1957, Trans. AIME 210, 153-168; {Exercise}", Standing.Confirmed,
            WorkedExample.Computed(9542.5, 7, 11000, 8085)),
        Entry(
            "matthews-kelly-1967", "Matthews and Kelly's fracture pressure by a matrix stress ratio", Units.Psi,
            [Vertical, Pore, new("K", Property.MatrixStressRatio, Units.One, new(0, 1), Interval.All)], [],
            "K (S - P) + P", (x, _) => (x[2] * (x[0] - x[1])) + x[1],
            "K is read from a local chart at the depth where the normal matrix stress equals S - P; the program has no chart",
            $"Matthews and Kelly 1967, Oil and Gas J., 20 February; {Exercise}", Standing.Confirmed,
            WorkedExample.Computed(10081.775, 8, 11000, 8085, 0.685)),
        Entry(
            "eaton-1969", "Eaton's fracture pressure by a ratio fitted back to leak-offs", Units.Psi,
            [Vertical, Pore, new("r", Property.MatrixStressRatio, Units.One, new(0, 0.5), Interval.All)], [],
            "r/(1 - r) (S - P) + P", (x, _) => (x[2] / (1 - x[2]) * (x[0] - x[1])) + x[1],
            "r is not the Poisson's ratio of the rock: it is what leak-offs of the region give back, such as 0.46 at 11,000 ft on the Gulf Coast",
            $"Eaton 1969, J. Petrol. Technol. 21, 1353-1360; {Exercise}", Standing.Confirmed,
            WorkedExample.Computed(10193.333, 8, 10560, 8085, 0.46)),
        GulfCoast,
        GulfCoastDeep,
        Regional(
            "breckels-1982-venezuela", "Venezuela", Feet.Within(5900, 9200), 0.210, 0.56, 0.433, PressuresNotGradients, Standing.Confirmed,
            WorkedExample.Computed(7043.987, 7, 8000, 5000)),
        Regional(
            "breckels-1982-brunei", "Brunei", Feet.Within(0, 10000), 0.227, 0.49, 0.433,
            PressuresNotGradients + "; the normal pressure gradient recalled, not read, the other numbers read", Standing.FromMemory,
            WorkedExample.Computed(8189.978, 7, 9000, 5000)),
        Entry(
            "holbrook-1993", "Holbrook's least stress from porosity", Units.Psi, [Vertical, Pore, Porosity], [],
            "P + (1 - phi) (S - P)", (x, _) => x[1] + ((1 - x[2]) * (x[0] - x[1])),
            "normally faulted sediment", "Holbrook and others 1993 and 1995; formula recalled, not read", Standing.FromMemory,
            WorkedExample.Computed(9400, 6, 10000, 7000, 0.2)),
        Entry(
            "bonaparte-sub-basin-depth", "Least stress from depth, a sub-basin of the Bonaparte Basin, Australia", Units.Megapascal, [Metres], [new("a", 0.0184, "MPa/m")],
            "{a} Z", (x, c) => c[0] * x[0], "that sub-basin, its place from memory", Zhang + "pp. 209-210", Standing.Confirmed, WorkedExample.Computed(55.2, 6, 3000)),
        Entry(
            "ekofisk-field-depth", "Least stress from depth below the mudline, Ekofisk field", Units.Megapascal, [BelowMudline.Within(500, 2900)], [new("a", 0.0185, "MPa/m")],
            "{a} Z", (x, c) => c[0] * x[0], "the field of that name", Zhang + "pp. 209-210", Standing.Confirmed, WorkedExample.Computed(37.0, 6, 2000)),
    ];

    private static Law Regional(
        string id, string place, LawInput depth, double factor, double over, double normal, string source, Standing standing, WorkedExample example) => Entry(
        id, $"Breckels and van Eekelen's least stress from depth and pore pressure, {place}", Units.Psi, [depth, Pore],
        [new("a", factor), new("n", 1.145), new("k", over), new("g", normal, "psi/ft")],
        "{a} D^{n} + {k} (P - {g} D)", (x, c) => (c[0] * Math.Pow(x[0], c[1])) + (c[2] * (x[1] - (c[3] * x[0]))),
        $"{place}; {Normal}", source, standing, example);

    private static Law Entry(
        string id, string title, Unit unit, LawInput[] inputs, Coefficient[] coefficients, string template, LawFormula formula, string validity, string source,
        Standing standing, WorkedExample example) =>
        new LawFamily(Property.ComparisonShmin, "Shmin", unit, Interval.NotNegative).Entry(id, title, inputs, template, formula, coefficients, validity, source, standing, example);
}

using System.Globalization;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Catalogue;

/// <summary>The scalar formula of a law, in the units its source uses.</summary>
/// <param name="x">One value per input of the law, in published units, none NaN.</param>
/// <param name="c">The law's coefficients, in the order it lists them.</param>
/// <returns>The result in the published unit.</returns>
public delegate double LawFormula(ReadOnlySpan<double> x, ReadOnlySpan<double> c);

/// <summary>One input of a law.</summary>
/// <param name="Symbol">Its symbol in the formula's text.</param>
/// <param name="Property">What feeds it; a modulus is dynamic or static by its property.</param>
/// <param name="Unit">The unit the source uses.</param>
/// <param name="Domain">Where the formula has a meaning; outside, the result is missing. Published unit.</param>
/// <param name="Range">Where the source fitted it; outside, the result stands with a finding. Published unit.</param>
public sealed record LawInput(string Symbol, Property Property, Unit Unit, Interval Domain, Interval Range)
{
    /// <summary>An input without limits.</summary>
    public LawInput(string symbol, Property property, Unit unit) : this(symbol, property, unit, Interval.All, Interval.All)
    {
    }
}

/// <summary>One coefficient of a law, as published.</summary>
/// <param name="Symbol">Its symbol in the formula's text.</param>
/// <param name="Value">Its value.</param>
/// <param name="Unit">Its unit as text, empty for a pure number.</param>
/// <param name="Scatter">Its published standard deviation, if there is one.</param>
public sealed record Coefficient(string Symbol, double Value, string Unit = "", double? Scatter = null)
{
    /// <summary>The value as text, such as 1.745e-9.</summary>
    public string Number => Value.ToString(CultureInfo.InvariantCulture)
        .Replace("E-0", "e-", StringComparison.Ordinal).Replace("E", "e", StringComparison.Ordinal);

    /// <summary>Coefficients named a, b, c ... in order.</summary>
    public static Coefficient[] Named(params double[] values) => [.. values.Select((v, k) => new Coefficient(((char)('a' + k)).ToString(), v))];
}

/// <summary>A worked number that shows a law's use and checks its code.</summary>
/// <param name="Inputs">One value per input, in published units.</param>
/// <param name="Result">The expected result in the published unit.</param>
/// <param name="Digits">Significant digits that must agree.</param>
/// <param name="Basis">What the expected number rests on.</param>
/// <param name="Source">Where it is printed, or why it must hold.</param>
public sealed record WorkedExample(double[] Inputs, double Result, int Digits, ExampleBasis Basis, string Source)
{
    /// <summary>A number computed from the formula as written, in full precision and apart from this code.</summary>
    public static WorkedExample Computed(double result, int digits, params double[] inputs) =>
        new(inputs, result, digits, ExampleBasis.SelfComputed, "the formula as written");
}

/// <summary>
/// An empirical relation that gives one property from others, sample by sample: one entry of the method catalogue.
/// </summary>
public sealed record Law
{
    private readonly double[] _values = [];

    /// <summary>Name used in well files: author, year, rock.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, in plain words.</summary>
    public required string Title { get; init; }

    /// <summary>The property it gives.</summary>
    public required Property Predicts { get; init; }

    /// <summary>The unit of the formula's result.</summary>
    public required Unit Unit { get; init; }

    /// <summary>The rocks it was made for.</summary>
    public required RockKinds Rocks { get; init; }

    /// <summary>What it needs.</summary>
    public required IReadOnlyList<LawInput> Inputs { get; init; }

    /// <summary>Its coefficients as published.</summary>
    public IReadOnlyList<Coefficient> Coefficients
    {
        get;
        init
        {
            field = value;
            _values = [.. value.Select(c => c.Value)];
        }
    } = [];

    /// <summary>The coefficients' values, in order.</summary>
    public ReadOnlySpan<double> Values => _values;

    /// <summary>The formula as text, in published units; <c>{a}</c> stands for the coefficient of that symbol.</summary>
    public required string Template { get; init; }

    /// <summary>The formula as text with its coefficients put in.</summary>
    public string Text => Coefficients
        .Aggregate(Template, (text, c) => text.Replace($"{{{c.Symbol}}}", c.Number, StringComparison.Ordinal))
        .Replace("+ -", "- ", StringComparison.Ordinal);

    /// <summary>The formula as code.</summary>
    public required LawFormula Formula { get; init; }

    /// <summary>Results outside it have no physical meaning and become missing; published unit.</summary>
    public Interval ResultDomain { get; init; } = Interval.All;

    /// <summary>Where it was fitted, in words.</summary>
    public required string Validity { get; init; }

    /// <summary>Author, year, journal, and where the numbers were read.</summary>
    public required string Source { get; init; }

    /// <summary>What the coefficients rest on.</summary>
    public required Standing Standing { get; init; }

    /// <summary>The worked number; null only for a law the user gave.</summary>
    public WorkedExample? Example { get; init; }

    /// <summary>Evaluates the formula in published units, without domain checks.</summary>
    public double Evaluate(params ReadOnlySpan<double> inputs) => Formula(inputs, _values);
}

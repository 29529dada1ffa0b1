using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>A unit with the decimals that results are written with.</summary>
/// <param name="Unit">The unit.</param>
/// <param name="Decimals">Digits after the point.</param>
public readonly record struct ColumnUnit(Unit Unit, int Decimals);

/// <summary>One column of a result table: what it is, once, for every writer and picture.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
/// <param name="Id">Name without a unit, in snake case.</param>
/// <param name="Title">What it is, in plain words.</param>
/// <param name="Formula">Where its values come from.</param>
public abstract record Column<TSource>(string Id, string Title, string Formula);

/// <summary>Fills a span with a column's values in SI, from a row on.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
public delegate void ColumnReader<in TSource>(TSource source, int start, Span<double> destination);

/// <summary>A column of numbers.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
/// <param name="Id">Name without a unit, in snake case.</param>
/// <param name="Title">What it is, in plain words.</param>
/// <param name="Symbol">Its symbol in pictures and tables.</param>
/// <param name="Metric">How metric results write it.</param>
/// <param name="Field">How field results write it.</param>
/// <param name="Formula">Where its values come from.</param>
/// <param name="Read">Fills a span with its values in SI; NaN is missing.</param>
public sealed record NumberColumn<TSource>(
    string Id, string Title, string Symbol, ColumnUnit Metric, ColumnUnit Field, string Formula, ColumnReader<TSource> Read)
    : Column<TSource>(Id, Title, Formula)
{
    /// <summary>False when LAS results leave it out: their lines have at most 256 characters.</summary>
    public bool InLas { get; init; } = true;

    /// <summary>How results of a unit system write it.</summary>
    public ColumnUnit In(UnitSystem system) => system == UnitSystem.Metric ? Metric : Field;

    /// <summary>Its name with the unit as a suffix.</summary>
    public string Header(UnitSystem system) => In(system).Unit.Suffix is { Length: > 0 } suffix ? $"{Id}_{suffix}" : Id;

    /// <summary>Fills a span with its values in a unit system, from a row on.</summary>
    public void Fill(TSource source, int start, UnitSystem system, Span<double> destination)
    {
        Read(source, start, destination);
        In(system).Unit.FromSi(destination);
    }
}

/// <summary>A column of words.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
/// <param name="Id">Name, in snake case.</param>
/// <param name="Title">What it is, in plain words.</param>
/// <param name="Formula">Where its values come from.</param>
/// <param name="Read">Fills a span with its words from a row on; empty is missing.</param>
public sealed record TextColumn<TSource>(string Id, string Title, string Formula, TextReader<TSource> Read)
    : Column<TSource>(Id, Title, Formula);

/// <summary>Fills a span with a column's words, from a row on.</summary>
/// <typeparam name="TSource">What the table is made from.</typeparam>
public delegate void TextReader<in TSource>(TSource source, int start, Span<string> destination);

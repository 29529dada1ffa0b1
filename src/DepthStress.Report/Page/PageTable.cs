using System.Globalization;
using System.Text;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>A column of a table of the page.</summary>
/// <param name="Title">Its heading.</param>
/// <param name="Id">Its name when the table is copied; without a unit.</param>
/// <typeparam name="TRow">What a row is made from.</typeparam>
internal abstract record PageColumn<TRow>(string Title, string Id);

/// <summary>A column of words.</summary>
internal sealed record WordCells<TRow>(string Title, string Id, Func<TRow, string> Word) : PageColumn<TRow>(Title, Id);

/// <summary>A column of numbers, given in SI and shown in either unit system.</summary>
internal sealed record NumberCells<TRow>(string Title, string Id, ColumnUnit Metric, ColumnUnit Field, Func<TRow, double> Si) : PageColumn<TRow>(Title, Id)
{
    /// <summary>The same with the units of a pair.</summary>
    public NumberCells(string title, string id, (ColumnUnit Metric, ColumnUnit Field) units, Func<TRow, double> si)
        : this(title, id, units.Metric, units.Field, si)
    {
    }
}

/// <summary>A table of the page. Cells of numbers carry their printed digits, so that the page can show them in the other units.</summary>
/// <param name="Id">The element's id.</param>
/// <param name="Caption">Its caption.</param>
/// <param name="Columns">Its columns; the first one heads the row.</param>
/// <typeparam name="TRow">What a row is made from.</typeparam>
internal sealed record PageTable<TRow>(string Id, string Caption, IReadOnlyList<PageColumn<TRow>> Columns)
{
    /// <summary>Measured depths, m, that a click on a row's head goes to; null for none.</summary>
    public Func<TRow, (double Top, double Base)>? Place { get; init; }

    /// <summary>Writes the table; a sentence where it has no rows.</summary>
    public string Write(IReadOnlyList<TRow> rows, UnitSystem units, string none)
    {
        if (rows.Count == 0) return Html.Paragraph(none);
        var page = new StringBuilder();
        page.Append(CultureInfo.InvariantCulture, $"<div class=\"sheet\" tabindex=\"0\" role=\"region\" aria-label=\"{Html.Text(Caption)}\">\n<table id=\"{Id}\">\n<caption>{Html.Text(Caption)}</caption>\n<thead><tr>");
        foreach (var column in Columns) page.Append(Head(column, units));
        page.Append("</tr></thead>\n<tbody>\n");
        foreach (var row in rows)
        {
            page.Append("<tr>");
            for (var c = 0; c < Columns.Count; c++) page.Append(Cell(Columns[c], row, units, c == 0));
            page.Append("</tr>\n");
        }

        return page.Append("</tbody>\n</table>\n</div>\n").ToString();
    }

    private static string Head(PageColumn<TRow> column, UnitSystem units)
    {
        if (column is not NumberCells<TRow> number) return $"<th scope=\"col\" data-id=\"{column.Id}\">{Html.Text(column.Title)}</th>";
        var unit = (units == UnitSystem.Metric ? number.Metric : number.Field).Unit.Symbol;
        return $"<th scope=\"col\" class=\"n\" data-id=\"{column.Id}\" data-metric=\"{Unit(number.Metric)}\" data-field=\"{Unit(number.Field)}\">{Html.Text(column.Title)}<span class=\"unit\">{Html.Text(unit)}</span></th>";
    }

    private static string Unit(ColumnUnit unit) =>
        Html.Text(string.Create(CultureInfo.InvariantCulture, $"{unit.Unit.Symbol}|{unit.Unit.Factor:R}|{unit.Unit.Offset:R}|{unit.Decimals}|{unit.Unit.Suffix}"));

    private string Cell(PageColumn<TRow> column, TRow row, UnitSystem units, bool head)
    {
        var (tag, scope) = head ? ("th", " scope=\"row\"") : ("td", "");
        if (column is NumberCells<TRow> number)
        {
            var unit = units == UnitSystem.Metric ? number.Metric : number.Field;
            var value = unit.Unit.FromSi(number.Si(row));
            return $"<{tag}{scope} class=\"n\" data-n=\"{Html.Number(ScaledDigits.Of(value, unit.Decimals))}\">{Linked(ScaledDigits.Show(value, unit.Decimals), row, head)}</{tag}>";
        }

        return $"<{tag}{scope}>{Linked(Html.Text(((WordCells<TRow>)column).Word(row)), row, head)}</{tag}>";
    }

    private string Linked(string text, TRow row, bool head) => head && Place?.Invoke(row) is { } place
        ? $"<span data-top=\"{Html.Number(place.Top)}\" data-base=\"{Html.Number(place.Base)}\">{text}</span>"
        : text;
}

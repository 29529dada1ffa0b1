using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Reads observations from CSV: one row each, quantities with their unit in the cell or in the name of the column.</summary>
internal static class ObservationFile
{
    /// <summary>The sound rows of a file; every bad cell of the others is reported.</summary>
    /// <param name="path">Full path.</param>
    /// <param name="name">The file as the well file names it.</param>
    /// <param name="csv">How CSV files are written.</param>
    /// <param name="inputs">Gets the file with its hash.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    public static IReadOnlyList<Observation> Read(string path, string name, CsvOptions csv, List<InputFile> inputs, DiagnosticBag diagnostics)
    {
        var before = diagnostics.Items.Count;
        if (TextTable.Read(path, name, csv, ObservationColumns.IsName, diagnostics) is not { } table) return [];
        inputs.Add(new InputFile(name, table.Sha256));
        if (ObservationColumns.Of(table, diagnostics) is not { } columns) return [];
        if (table.Rows.Count == 0 && !diagnostics.Items.Skip(before).Any(d => d.Severity == Severity.Error)) diagnostics.Warning(new SourcePosition(name), "found no rows below the header, expected an observation in each");
        var comma = csv.Decimal is { } stated ? stated == ',' : table.Delimiter != ',' && table.Rows.All(r => !r.Any(HasPoint)) && table.Rows.Any(r => r.Any(HasComma));
        var rows = new List<Observation>();
        foreach (var row in table.Rows)
        {
            if (new ObservationRow(columns, row, comma, diagnostics).Read() is { } observation) rows.Add(observation);
        }

        return rows;
    }

    /// <summary>True for a cell that begins like a number with a decimal point.</summary>
    private static bool HasPoint(TextCell cell) => AfterDigits(cell.Text) is ['.', var next, ..] && char.IsAsciiDigit(next);

    private static bool HasComma(TextCell cell) => AfterDigits(cell.Text) is [',', var next, ..] && char.IsAsciiDigit(next);

    private static ReadOnlySpan<char> AfterDigits(string text)
    {
        var rest = text.AsSpan().TrimStart("+-").TrimStart("0123456789");
        return rest.Length < text.Length ? rest : [];
    }
}

namespace DepthStress.Files.Reading;

/// <summary>How a CSV file is written.</summary>
/// <param name="Delimiter">The delimiter; a blank stands for runs of blanks and tabs.</param>
/// <param name="DecimalComma">True where the decimal mark is a comma.</param>
/// <param name="HeaderLine">Line of the header row, from 1.</param>
/// <param name="HeaderStart">Bytes before that line, without a mark, where other text precedes it; else 0.</param>
internal sealed record CsvDialect(char Delimiter, bool DecimalComma, int HeaderLine, int HeaderStart)
{
    /// <summary>Name of a delimiter in messages.</summary>
    public static string Name(char delimiter) => delimiter switch
    {
        CsvOptions.Blanks => "blanks",
        '\t' => "tabs",
        _ => $"'{delimiter}'",
    };

    /// <summary>Says what was detected and is not the plain way of writing.</summary>
    public void Report(LogSource source)
    {
        var stated = source.Options.Csv;
        List<string> found = [];
        if (Delimiter != ',' && stated.Delimiter is null) found.Add($"{Name(Delimiter)} as delimiter");
        if (DecimalComma && stated.Decimal is null) found.Add("decimal commas");
        if (HeaderStart > 0 && stated.HeaderLine is null) found.Add("the header below other lines, which are passed over");
        if (found.Count > 0) source.Diagnostics.Note(source.At(HeaderLine), $"found {string.Join(", ", found)}");
    }
}

using DepthStress.Core.Diagnostics;
using Tomlyn.Syntax;

namespace DepthStress.Files.Setup;

/// <summary>Reports what is wrong with the syntax of a TOML document.</summary>
internal static class TomlErrors
{
    /// <summary>Syntax errors beyond this number add nothing.</summary>
    private const int Most = 10;

    private const string OpenString = "Invalid newline in a string";

    /// <summary>Reports the errors from the top of the file; those after a string that is left open only follow from it.</summary>
    public static void Report(DocumentSyntax document, string file, DiagnosticBag diagnostics)
    {
        var errors = document.Diagnostics.OrderBy(e => e.Span.Start.Line).ThenBy(e => e.Span.Start.Column).ToList();
        var open = errors.FindIndex(e => e.Message.StartsWith(OpenString, StringComparison.Ordinal));
        foreach (var error in errors.Take(Math.Min(Most, open < 0 ? errors.Count : open + 1)))
            diagnostics.Error(At(file, error.Span), $"TOML: {Text(error.Message)}");
    }

    /// <summary>A parser's message in the words of a well file.</summary>
    public static string Text(string message)
    {
        if (message.StartsWith(OpenString, StringComparison.Ordinal)) return "found the end of the line inside a text, expected a closing quote";
        if (message.StartsWith("The maximum depth", StringComparison.Ordinal)) return "found values nested too deeply, expected a well file";

        // A key that comes twice is quoted with all it holds.
        var (quote, end) = (message.IndexOf(" with `", StringComparison.Ordinal), message.LastIndexOf(" and cannot be redefined", StringComparison.Ordinal));
        return Visible((quote > 0 && end > quote ? message[..quote] + message[end..] : message).TrimEnd('.'));
    }

    /// <summary>A message with the control characters it quotes written as escapes: they would drive a terminal.</summary>
    private static string Visible(string message) =>
        message.Any(char.IsControl) ? string.Concat(message.Select(c => char.IsControl(c) ? $"\\u{(int)c:X4}" : c.ToString())) : message;

    /// <summary>The place of a span.</summary>
    public static SourcePosition At(string file, SourceSpan span) => new(file, span.Start.Line + 1, span.Start.Column + 1);
}

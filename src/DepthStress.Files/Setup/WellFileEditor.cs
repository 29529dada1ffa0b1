using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace DepthStress.Files.Setup;

/// <summary>
/// Writes values into the text of a well file and leaves every other character as it is: a value that is there is replaced
/// in its place, a new key goes below its section's last key, a new section to the end of its zone or of the file.
/// </summary>
public static class WellFileEditor
{
    private const string ZoneKey = "zones";

    /// <summary>The text with the values written into it.</summary>
    /// <param name="text">A well file without errors.</param>
    /// <param name="edits">The values.</param>
    /// <exception cref="ArgumentException">The text is not TOML, or a zone is not in it.</exception>
    public static string Apply(string text, IReadOnlyList<WellFileEdit> edits)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(edits);
        return edits.Aggregate(text, Apply);
    }

    private static string Apply(string text, WellFileEdit edit)
    {
        var document = SyntaxParser.Parse(text, "", validate: true);
        if (document.HasErrors) throw new ArgumentException("The text is not TOML.", nameof(text));
        var path = Path(edit);
        var newLine = text.Contains("\r\n", StringComparison.Ordinal) ? "\r\n" : "\n";
        if (Values(document, edit.Zone).FirstOrDefault(v => v.Path.SequenceEqual(path)) is { Item: { } found })
            return Splice(text, found.Value!.Span.Start.Offset, End(found.Value!), edit.Value);

        var section = path[..^1];
        var line = $"{edit.Key} = {edit.Value}";
        if (Values(document, edit.Zone).FirstOrDefault(v => v.Path.SequenceEqual(section) && v.Item.Value is InlineTableSyntax) is { Item: { } inline })
            return IntoInline(text, (InlineTableSyntax)inline.Value!, line);
        if (Headers(document, edit.Zone).FirstOrDefault(h => h.Path.SequenceEqual(section)) is { Table: { } table })
            return NewLine(text, Last(table), newLine, line);
        if (Values(document, edit.Zone).LastOrDefault(v => v.Path.Length > section.Length && v.Path.AsSpan(0, section.Length).SequenceEqual(section)) is { Item: { } dotted } sibling)
        {
            // The section exists only as dotted keys: its new key is dotted from the same table.
            var prefix = string.Join('.', section[sibling.Owner..]);
            return NewLine(text, End(dotted.Value!), newLine, $"{prefix}.{line}");
        }

        var header = $"[{(edit.Zone < 0 ? "" : ZoneKey + ".")}{edit.Section}]";
        return NewSection(text, EndOfOwner(document, edit.Zone, text.Length), newLine, header, line);
    }

    private static string[] Path(WellFileEdit edit) => [.. edit.Section.Split('.'), edit.Key];

    /// <summary>Every key of the zone, or of the well, with its path below it and how much of the path its table's header gives.</summary>
    private static IEnumerable<(string[] Path, int Owner, KeyValueSyntax Item)> Values(DocumentSyntax document, int zone)
    {
        IEnumerable<(string[] Path, SyntaxList<KeyValueSyntax> Items)> tables = Headers(document, zone).Select(h => (h.Path, h.Table.Items));
        if (zone < 0) tables = tables.Prepend(([], document.KeyValues));
        return tables.SelectMany(t => Deep(t.Path, t.Path.Length, t.Items));
    }

    private static IEnumerable<(string[] Path, int Owner, KeyValueSyntax Item)> Deep(string[] path, int owner, IEnumerable<KeyValueSyntax> items)
    {
        foreach (var item in items)
        {
            string[] own = [.. path, .. Names(item.Key!)];
            yield return (own, owner, item);
            if (item.Value is not InlineTableSyntax inline) continue;
            foreach (var inner in Deep(own, own.Length, inline.Items.Select(i => i.KeyValue!))) yield return inner;
        }
    }

    /// <summary>The tables of the zone, or of the well outside zones, with their paths below it.</summary>
    private static IEnumerable<(string[] Path, TableSyntaxBase Table)> Headers(DocumentSyntax document, int zone)
    {
        var at = -1;
        foreach (var table in document.Tables)
        {
            var path = Names(table.Name!);
            if (table is TableArraySyntax && path is [ZoneKey]) at++;
            var inside = path[0] == ZoneKey;
            if (zone < 0 && !inside) yield return (path, table);
            else if (zone >= 0 && inside && at == zone) yield return (path[1..], table);
        }
    }

    /// <summary>Where the last key of a table ends, or its header.</summary>
    private static int Last(TableSyntaxBase table) =>
        table.Items.ChildrenCount > 0 ? End(table.Items.GetChild(table.Items.ChildrenCount - 1)!.Value!) : End(table.CloseBracket!);

    private static int EndOfOwner(DocumentSyntax document, int zone, int length)
    {
        if (zone < 0) return length;
        var own = Headers(document, zone).Select(h => h.Table).ToList();
        if (own.Count == 0) throw new ArgumentException("The zone is not in the text.", nameof(zone));
        return Last(own[^1]);
    }

    private static string IntoInline(string text, InlineTableSyntax table, string line)
    {
        var items = table.Items.ToList();
        if (items.Count == 0) return Splice(text, table.OpenBrace!.Span.Start.Offset + 1, table.CloseBrace!.Span.Start.Offset, $" {line} ");
        var end = End(items[^1].KeyValue!.Value!);
        return Splice(text, end, end, $", {line}");
    }

    private static string NewLine(string text, int after, string newLine, string line)
    {
        var end = text.IndexOf('\n', after);
        return end < 0 ? text + newLine + line + newLine : Splice(text, end + 1, end + 1, line + newLine);
    }

    private static string NewSection(string text, int after, string newLine, string header, string line)
    {
        var end = after >= text.Length ? -1 : text.IndexOf('\n', after);
        var section = header + newLine + line + newLine;
        if (end >= 0) return Splice(text, end + 1, end + 1, section);
        return (text.Length == 0 || text.EndsWith('\n') ? text : text + newLine) + newLine + section;
    }

    private static string Splice(string text, int start, int end, string put) => string.Concat(text.AsSpan(0, start), put, text.AsSpan(end));

    /// <summary>One past the last character of a node.</summary>
    private static int End(SyntaxNode node) => node.Span.End.Offset + 1;

    private static string[] Names(KeySyntax key) => TomlTree.Names(key);
}

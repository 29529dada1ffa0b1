using DepthStress.Core.Diagnostics;
using Tomlyn;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace DepthStress.Files.Setup;

/// <summary>Turns TOML text into nodes that know their place.</summary>
internal sealed class TomlTree
{
    private readonly string _file;
    private readonly DiagnosticBag _diagnostics;

    private TomlTree(string file, DiagnosticBag diagnostics) => (_file, _diagnostics) = (file, diagnostics);

    /// <summary>Parses a document; null when its syntax is wrong, with every error reported.</summary>
    public static TomlTable? Parse(string text, string file, DiagnosticBag diagnostics)
    {
        DocumentSyntax document;
        try
        {
            document = SyntaxParser.Parse(text, file, validate: true);
        }
        catch (TomlException e)
        {
            diagnostics.Error(new SourcePosition(file, e.Line ?? 0, e.Column ?? 0), $"TOML: {TomlErrors.Text(e.Message)}");
            return null;
        }

        TomlErrors.Report(document, file, diagnostics);
        return document.HasErrors ? null : new TomlTree(file, diagnostics).Root(document);
    }

    private TomlTable Root(DocumentSyntax document)
    {
        var root = new TomlTable(new SourcePosition(_file));
        Fill(root, document.KeyValues);
        foreach (var table in document.Tables)
        {
            var position = At(table.Name!.Span);
            var path = Path(table.Name!, position);
            var parent = path.SkipLast(1).Aggregate(root, (t, key) => Descend(t, key, position));
            Fill(table is TableArraySyntax ? Append(parent, path[^1], position) : Descend(parent, path[^1], position), table.Items);
        }

        return root;
    }

    private void Fill(TomlTable table, IEnumerable<KeyValueSyntax> items)
    {
        foreach (var item in items)
        {
            var position = At(item.Key!.Span);
            var path = Path(item.Key!, position);
            var parent = path.SkipLast(1).Aggregate(table, (t, key) => Descend(t, key, position));
            parent.Add(path[^1], position, Value(item.Value!));
        }
    }

    private TomlNode Value(ValueSyntax value)
    {
        var position = At(value.Span);
        switch (value)
        {
            case StringValueSyntax text:
                return new TomlText(Printable(text.Value ?? "", position), position);
            case IntegerValueSyntax integer:
                return new TomlNumber(integer.Value, integer.Token!.Text!, position);
            case FloatValueSyntax number:
                return new TomlNumber(number.Value, number.Token!.Text!, position);
            case BooleanValueSyntax flag:
                return new TomlFlag(flag.Value, position);
            case ArraySyntax array:
                return new TomlArray([.. array.Items.Select(i => Value(i.Value!))], position);
            case InlineTableSyntax inline:
                var table = new TomlTable(position);
                Fill(table, inline.Items.Select(i => i.KeyValue!));
                return table;
            default:
                return new TomlDate(position);
        }
    }

    private TomlTable Descend(TomlTable table, string key, SourcePosition position)
    {
        if (table.Items.TryGetValue(key, out var item))
        {
            if (item.Value is TomlTable inner) return inner;
            if (item.Value is TomlArray { Items: [.., TomlTable last] }) return last;
            _diagnostics.Error(position, $"found \"{Words.Short(key)}\" as a table, expected each key once: it is {item.Value.Kind} at {item.Key}");
        }

        var made = new TomlTable(position);
        table.Add(key, position, made);
        return made;
    }

    private static TomlTable Append(TomlTable parent, string key, SourcePosition position)
    {
        if (!parent.Items.TryGetValue(key, out var item) || item.Value is not TomlArray array)
        {
            array = new TomlArray([], position);
            parent.Add(key, position, array);
        }

        var made = new TomlTable(position);
        array.Items.Add(made);
        return made;
    }

    /// <summary>The names of a key, from the outermost table in.</summary>
    internal static string[] Names(KeySyntax key) => [.. key.DotKeys.Select(d => d.Key!).Prepend(key.Key!).Select(Name)];

    private string[] Path(KeySyntax key, SourcePosition position) => [.. Names(key).Select(k => Printable(k, position))];

    /// <summary>Names end in messages and results: one that breaks lines or drives a terminal is refused.</summary>
    private string Printable(string text, SourcePosition position)
    {
        if (!text.Any(char.IsControl)) return text;
        _diagnostics.Error(position, "found a control character or a line break inside a text, expected plain text");
        return new([.. text.Where(c => !char.IsControl(c))]);
    }

    private static string Name(BareKeyOrStringValueSyntax key) =>
        key is StringValueSyntax text ? text.Value ?? "" : ((BareKeySyntax)key).Key!.Text ?? "";

    private SourcePosition At(SourceSpan span) => TomlErrors.At(_file, span);
}

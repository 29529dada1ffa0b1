using DepthStress.Core.Diagnostics;
using Tomlyn;
using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace DepthStress.Files.Setup;

/// <summary>Turns TOML text into nodes that know their place.</summary>
internal static class TomlTree
{
    /// <summary>Syntax errors beyond this number add nothing: one open string cascades.</summary>
    private const int MostSyntaxErrors = 10;

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
            diagnostics.Error(new SourcePosition(file, e.Line ?? 0, e.Column ?? 0), $"TOML: {e.Message}");
            return null;
        }

        foreach (var message in document.Diagnostics.Take(MostSyntaxErrors))
            diagnostics.Error(At(file, message.Span), $"TOML: {message.Message.TrimEnd('.')}");
        if (document.HasErrors) return null;

        var root = new TomlTable(new SourcePosition(file));
        Fill(root, document.KeyValues, file);
        foreach (var table in document.Tables)
        {
            var path = Path(table.Name!);
            var parent = path.SkipLast(1).Aggregate(root, (t, key) => Descend(t, key, file, table.Name!.Span));
            var position = At(file, table.Name!.Span);
            Fill(table is TableArraySyntax ? Append(parent, path[^1], position) : Descend(parent, path[^1], file, table.Name.Span), table.Items, file);
        }

        return root;
    }

    private static void Fill(TomlTable table, IEnumerable<KeyValueSyntax> items, string file)
    {
        foreach (var item in items)
        {
            var path = Path(item.Key!);
            var parent = path.SkipLast(1).Aggregate(table, (t, key) => Descend(t, key, file, item.Key!.Span));
            parent.Add(path[^1], At(file, item.Key!.Span), Value(item.Value!, file));
        }
    }

    private static TomlNode Value(ValueSyntax value, string file)
    {
        var position = At(file, value.Span);
        switch (value)
        {
            case StringValueSyntax text:
                return new TomlText(text.Value ?? "", position);
            case IntegerValueSyntax integer:
                return new TomlNumber(integer.Value, integer.Token!.Text!, position);
            case FloatValueSyntax number:
                return new TomlNumber(number.Value, number.Token!.Text!, position);
            case BooleanValueSyntax flag:
                return new TomlFlag(flag.Value, position);
            case ArraySyntax array:
                return new TomlArray([.. array.Items.Select(i => Value(i.Value!, file))], position);
            case InlineTableSyntax inline:
                var table = new TomlTable(position);
                Fill(table, inline.Items.Select(i => i.KeyValue!), file);
                return table;
            default:
                return new TomlDate(position);
        }
    }

    private static TomlTable Descend(TomlTable table, string key, string file, SourceSpan span)
    {
        if (table.Items.TryGetValue(key, out var item))
        {
            if (item.Value is TomlTable inner) return inner;
            if (item.Value is TomlArray { Items: [.., TomlTable last] }) return last;
        }

        var made = new TomlTable(At(file, span));
        table.Add(key, At(file, span), made);
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

    private static string[] Path(KeySyntax key) => [Name(key.Key!), .. key.DotKeys.Select(d => Name(d.Key!))];

    private static string Name(BareKeyOrStringValueSyntax key) =>
        key is StringValueSyntax text ? text.Value ?? "" : ((BareKeySyntax)key).Key!.Text ?? "";

    private static SourcePosition At(string file, SourceSpan span) => new(file, span.Start.Line + 1, span.Start.Column + 1);
}

namespace DepthStress.Core.Diagnostics;

/// <summary>Collects messages in the order they were found, so that one run reports every problem.</summary>
public sealed class DiagnosticBag
{
    private readonly List<Diagnostic> _items = [];

    /// <summary>The messages, in the order they were found.</summary>
    public IReadOnlyList<Diagnostic> Items => _items;

    /// <summary>True when at least one message is an error.</summary>
    public bool HasErrors { get; private set; }

    /// <summary>Adds an error.</summary>
    public void Error(SourcePosition position, string text) => Add(new Diagnostic(Severity.Error, position, text));

    /// <summary>Adds a warning.</summary>
    public void Warning(SourcePosition position, string text) => Add(new Diagnostic(Severity.Warning, position, text));

    /// <summary>Adds a note.</summary>
    public void Note(SourcePosition position, string text) => Add(new Diagnostic(Severity.Note, position, text));

    /// <summary>Adds a message.</summary>
    public void Add(Diagnostic diagnostic)
    {
        ArgumentNullException.ThrowIfNull(diagnostic);
        HasErrors |= diagnostic.Severity == Severity.Error;
        _items.Add(diagnostic);
    }
}

namespace DepthStress.Core.Diagnostics;

/// <summary>One message to the user: how bad, where, and what was found against what was expected.</summary>
/// <param name="Severity">How much it matters.</param>
/// <param name="Position">Where, or <see cref="SourcePosition.None"/>.</param>
/// <param name="Text">What was found and what was expected, in plain words, without a full stop.</param>
public sealed record Diagnostic(Severity Severity, SourcePosition Position, string Text)
{
    /// <summary>Gives <c>file(line,column): error: text</c>.</summary>
    public override string ToString()
    {
        var word = Severity switch { Severity.Error => "error", Severity.Warning => "warning", _ => "note" };
        var place = Position.ToString();
        return place.Length == 0 ? $"{word}: {Text}" : $"{place}: {word}: {Text}";
    }
}

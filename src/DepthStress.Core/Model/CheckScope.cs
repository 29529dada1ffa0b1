using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>A part of the well whose resolved settings are checked: the well, a zone, or a lithology in one of them.</summary>
/// <param name="Setup">The setup.</param>
/// <param name="Owner">What the part is, as it is appended to messages; empty for the well.</param>
/// <param name="Position">Where it stands in the well file.</param>
/// <param name="Settings">Its settings.</param>
/// <param name="Error">Takes the messages.</param>
/// <param name="Around">The part around it, checked before; null for the well or a zone.</param>
internal sealed record CheckScope(
    WellSetup Setup, string Owner, SourcePosition Position, StageSettings Settings, Action<SourcePosition, string> Error, CheckScope? Around)
{
    private readonly HashSet<string> _missing = [];

    /// <summary>Reports a key that is not set, unless the part around it lacks it as well and has said so.</summary>
    public void Missing(string key, string expected)
    {
        if (_missing.Add(key) && Around?._missing.Contains(key) != true) Error(Position, $"{key} is not set{Owner}; expected {expected}");
    }
}

using System.CommandLine;
using DepthStress.Cli.Actions;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress check WELLFILE</c>.</summary>
internal sealed class CheckCommand : Command
{
    /// <summary>The well file.</summary>
    public readonly Argument<string> WellFile = new("WELLFILE") { Description = "A well file (TOML)" };

    /// <summary>Whether warnings fail.</summary>
    public readonly Option<bool> Strict = new("--strict") { Description = "End with 2 when there are warnings" };

    /// <summary>Declares the command.</summary>
    public CheckCommand(Terminal terminal)
        : base("check", "Validate a well file and its logs, show what the curves cover and what looks wrong; writes nothing")
    {
        Add(WellFile);
        Add(Strict);
        Validators.Add(result => Names.Check(result, WellFile));
        SetAction((parsed, cancellation) => Task.FromResult(
            CheckAction.Run(terminal, parsed.GetRequiredValue(WellFile), parsed.GetValue(Strict), cancellation)));
    }
}

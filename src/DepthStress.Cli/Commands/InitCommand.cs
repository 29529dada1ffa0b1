using System.CommandLine;
using DepthStress.Cli.Actions;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress init LOGFILE</c>.</summary>
internal sealed class InitCommand : Command
{
    /// <summary>The log file to start from.</summary>
    public readonly Argument<string> LogFile = new("LOGFILE") { Description = "A log file: CSV or LAS 2.0" };

    /// <summary>Whether an existing well file may be replaced.</summary>
    public readonly Option<bool> Force = new("--force") { Description = "Replace the well file if it exists" };

    /// <summary>Declares the command.</summary>
    public InitCommand(Terminal terminal)
        : base("init", "Write a starter well file into the current folder: recognised curves, units, every choice with a comment")
    {
        Add(LogFile);
        Add(Force);
        Validators.Add(result => Names.Check(result, LogFile));
        SetAction(parsed => InitAction.Run(terminal, parsed.GetRequiredValue(LogFile), parsed.GetValue(Force)));
    }
}

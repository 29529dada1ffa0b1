using System.CommandLine;
using DepthStress.Cli.Actions;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress run WELLFILE...</c>.</summary>
internal sealed class RunCommand : Command
{
    /// <summary>The well files.</summary>
    public readonly Argument<string[]> WellFiles = new("WELLFILE")
    {
        Description = "One or more well files (TOML)",
        Arity = ArgumentArity.OneOrMore,
    };

    /// <summary>The folder for the results.</summary>
    public readonly Option<string?> Out = new("--out")
    {
        Description = "Folder for the results, for one well only (default: <well file name>-results beside the well file)",
        HelpName = "DIR",
    };

    /// <summary>How many wells at a time.</summary>
    public readonly Option<int> Jobs = new("--jobs")
    {
        Description = "How many wells to work on at a time (default: one per core)",
        HelpName = "N",
    };

    /// <summary>Whether warnings fail.</summary>
    public readonly Option<bool> Strict = new("--strict") { Description = "Write nothing and end with 2 when there are warnings" };

    /// <summary>Declares the command.</summary>
    public RunCommand(Terminal terminal)
        : base("run", "Read the logs, compute properties, pressures and stresses, and write tables, layers and pictures")
    {
        Add(WellFiles);
        Add(Out);
        Add(Jobs);
        Add(Strict);
        Validators.Add(result =>
        {
            if (result.GetValue(Out) is not null && result.GetValue(WellFiles) is { Length: > 1 })
                result.AddError("--out takes the results of one well; found several well files");
            if (result.GetResult(Jobs) is not null && result.GetValue(Jobs) < 1) result.AddError("--jobs takes a number of 1 or more");
        });
        SetAction((parsed, cancellation) =>
        {
            var options = new RunOptions(parsed.GetValue(Out), parsed.GetValue(Jobs), parsed.GetValue(Strict));
            return RunAction.RunAsync(terminal, parsed.GetRequiredValue(WellFiles), options, cancellation);
        });
    }
}

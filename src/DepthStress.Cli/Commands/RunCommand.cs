using System.CommandLine;
using System.Globalization;
using DepthStress.Cli.Actions;
using DepthStress.Cli.Runs;

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
        CustomParser = result =>
        {
            var text = result.Tokens[0].Value;
            if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var jobs) && jobs > 0) return jobs;
            result.AddError($"found --jobs {text}, expected a whole number of 1 or more");
            return 0;
        },
    };

    /// <summary>Whether warnings fail.</summary>
    public readonly Option<bool> Strict = new("--strict") { Description = "Write nothing and end with 2 when there are warnings" };

    /// <summary>Whether every admissible choice is tried.</summary>
    public readonly Option<bool> Spread = new("--spread") { Description = "Also run every admissible choice of static modulus, Poisson's ratio and Biot's coefficient, and show what it does to Shmin" };

    /// <summary>Declares the command.</summary>
    public RunCommand(Terminal terminal)
        : base("run", "Read the logs, compute properties, pressures and stresses, and write tables, layers and pictures")
    {
        Add(WellFiles);
        Add(Out);
        Add(Jobs);
        Add(Strict);
        Add(Spread);
        Validators.Add(result =>
        {
            var files = Names.Of(result, WellFiles);
            if (result.GetResult(Out) is not null && files.Count > 1) result.AddError("found --out with several well files, expected one: --out takes the results of one well");
            Names.Check(result, WellFiles);
            foreach (var shared in files.Where(f => f.Length > 0).GroupBy(f => ResultWriter.DefaultFolder(Path.GetFullPath(f, terminal.Folder))).Where(g => g.Count() > 1))
                result.AddError($"found well files that share one result folder ({string.Join(", ", shared)}), expected each well once and under a name of its own");
        });
        SetAction((parsed, cancellation) =>
        {
            var options = new RunOptions(parsed.GetValue(Out), parsed.GetValue(Jobs), parsed.GetValue(Strict), parsed.GetValue(Spread));
            return RunAction.RunAsync(terminal, parsed.GetRequiredValue(WellFiles), options, cancellation);
        });
    }
}

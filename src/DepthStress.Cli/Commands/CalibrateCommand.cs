using System.CommandLine;
using DepthStress.Cli.Actions;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress calibrate WELLFILE</c>.</summary>
internal sealed class CalibrateCommand : Command
{
    /// <summary>The well file.</summary>
    public readonly Argument<string> WellFile = new("WELLFILE") { Description = "A well file (TOML) with observations" };

    /// <summary>Whether the estimates go into the well file.</summary>
    public readonly Option<bool> Apply = new("--apply") { Description = "Write the estimates into the well file; comments and layout stay" };

    /// <summary>The folder for the results.</summary>
    public readonly Option<string?> Out = new("--out")
    {
        Description = "Folder for the results (default: <well file name>-calibration beside the well file)",
        HelpName = "DIR",
    };

    /// <summary>Declares the command.</summary>
    public CalibrateCommand(Terminal terminal)
        : base("calibrate", "Estimate tectonic strains, and what else [calibration] frees, from the observations")
    {
        Add(WellFile);
        Add(Apply);
        Add(Out);
        Validators.Add(result => Names.Check(result, WellFile));
        SetAction((parsed, cancellation) => CalibrateAction.RunAsync(
            terminal, parsed.GetRequiredValue(WellFile), parsed.GetValue(Apply), parsed.GetValue(Out), cancellation));
    }
}

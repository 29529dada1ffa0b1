using System.CommandLine;
using DepthStress.Files.Setup;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress schema</c>.</summary>
internal sealed class SchemaCommand : Command
{
    /// <summary>Declares the command.</summary>
    public SchemaCommand(Terminal terminal)
        : base("schema", "Print the JSON Schema of the well file, for completion in editors") =>
        SetAction(_ => terminal.Output.WriteLine(WellFileSchema.Json()));
}

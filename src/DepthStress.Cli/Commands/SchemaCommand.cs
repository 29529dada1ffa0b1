using System.CommandLine;
using DepthStress.Files.Setup;
using DepthStress.Files.Writing;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress schema</c>.</summary>
internal sealed class SchemaCommand : Command
{
    /// <summary>Whether the layers are meant.</summary>
    public readonly Option<bool> Layers = new("--layers") { Description = "Print the schema of layers.json instead, for programs that read it" };

    /// <summary>Declares the command.</summary>
    public SchemaCommand(Terminal terminal)
        : base("schema", "Print the JSON Schema of the well file, for completion in editors")
    {
        Add(Layers);
        SetAction(parsed => terminal.Output.WriteLine(parsed.GetValue(Layers) ? LayersSchema.Json() : WellFileSchema.Json()));
    }
}

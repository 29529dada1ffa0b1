using System.Globalization;
using SampleWell;
using SampleWell.Twins;

namespace DepthStress.Tests.Cli;

/// <summary>Changes the culture of the process, so nothing else runs beside it.</summary>
[CollectionDefinition("culture", DisableParallelization = true)]
public sealed class CultureCollection;

/// <summary>The same input gives the same bytes.</summary>
[Collection("culture")]
public sealed class CliSameBytesTests : IDisposable
{
    private readonly CliRunner _cli = new();

    public void Dispose() => _cli.Dispose();

    [Fact]
    public async Task Results_are_the_same_bytes_for_every_run_number_of_jobs_and_culture()
    {
        string[] wells = ["one/quillback-4.toml", "two/twin.toml", "three/twin.toml"];
        SampleLogs.Write(_cli.Folder.Of("one"));
        File.AppendAllText(_cli.Folder.Of("one/quillback-4.toml"), "\n[output]\npdf = true\n");
        Twin.Write(_cli.Folder.Of("two"), 2000, 2);
        Twin.WriteOffshore(_cli.Folder.Of("three"), 2000, 3);
        var first = await Results("1");
        var second = await Results("4");
        var before = CultureInfo.DefaultThreadCurrentCulture;
        var (here, comma) = (CultureInfo.CurrentCulture, (CultureInfo)CultureInfo.InvariantCulture.Clone());
        comma.NumberFormat.NumberDecimalSeparator = ",";
        comma.NumberFormat.NegativeSign = "\u2212";
        (CultureInfo.CurrentCulture, CultureInfo.DefaultThreadCurrentCulture) = (comma, comma);
        try
        {
            var third = await Results("2");
            Assert.Equal(first, second);
            Assert.Equal(first, third);
        }
        finally
        {
            (CultureInfo.CurrentCulture, CultureInfo.DefaultThreadCurrentCulture) = (here, before);
        }

        async Task<IEnumerable<string>> Results(string jobs)
        {
            var result = await _cli.RunAsync(["run", .. wells, "--jobs", jobs]);
            Assert.Equal(0, result.Code);
            Assert.Contains("pictures.pdf", _cli.Files("one/quillback-4-results").Keys);
            string[] folders = ["one/quillback-4-results", "two/twin-results", "three/twin-results"];
            return [result.Output, .. folders.SelectMany(f => _cli.Files(f).Select(p => $"{f}/{p.Key} {p.Value}"))];
        }
    }
}

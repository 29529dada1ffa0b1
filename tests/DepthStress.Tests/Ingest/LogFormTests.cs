namespace DepthStress.Tests.Ingest;

/// <summary>What the well file says about the form of log files reaches the readers.</summary>
public class LogFormTests
{
    private const string Semicolons = "exported\nDEPT;RHOB [g/cm3]\nm;\n1;2,350\n1,5;2,400\n";

    [Fact]
    public void The_form_of_csv_files_can_be_stated()
    {
        var (logs, messages) = Ingesting.Read(
            "[logs]\nfiles = [\"a.csv\"]\ncsv = { delimiter = \";\", decimal = \",\", header_line = 2, encoding = \"utf-8\" }\n", ("a.csv", Semicolons));
        Assert.Empty(messages);
        Assert.Equal([1, 1.5], logs!.Depths.ToArray());
    }

    [Theory]
    [InlineData("csv = { delimiter = \":\" }", "expected delimiter = one of \",\", \";\", \"|\", \"tab\", \"blank\"")]
    [InlineData("csv = { decimal = \"'\" }", "expected decimal = one of \".\", \",\"")]
    [InlineData("csv = { header_line = 0 }", "expected header_line")]
    [InlineData("csv = { header_line = 1.5 }", "found a fraction, expected header_line = a whole number")]
    [InlineData("csv = { encoding = \"ebcdic\" }", "expected encoding = one of")]
    [InlineData("repeated_depth = \"last\"", "expected repeated_depth = one of \"error\", \"first\", \"mean\"")]
    public void A_form_that_cannot_be_is_an_error_in_the_well_file(string line, string problem)
    {
        var (_, messages) = Ingesting.Read($"[logs]\nfiles = [\"a.csv\"]\n{line}\n", ("a.csv", "DEPT[m],RHOB[g/cm3]\n1,2.35\n"));
        Assert.Contains(problem, Assert.Single(messages), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("first", 2300)]
    [InlineData("mean", 2400)]
    public void Repeated_depths_can_be_joined(string word, double expected)
    {
        var (logs, messages) = Ingesting.Read(
            $"[logs]\nfiles = [\"a.csv\"]\nrepeated_depth = \"{word}\"\n", ("a.csv", "DEPT[m],RHOB[g/cm3]\n1,2.3\n1,2.5\n2,2.6\n"));
        Assert.StartsWith("a.csv(3): note: depth repeats in 1 row, first 1; ", Assert.Single(messages), StringComparison.Ordinal);

        // 1e-9: the rounding of the conversion to kg/m3.
        Assert.Equal(expected, logs!.Curves.Single().Values[0], 1e-9);
    }
}

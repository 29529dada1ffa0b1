namespace DepthStress.Tests.WellFiles;

/// <summary>What the reader says of text that is no sound TOML.</summary>
public sealed class WellFileSyntaxTests
{
    [Theory]
    [InlineData(
        "name = \"Testwell 1\"", "name = \"a\"\nname = \"b\"",
        "well.toml(3,1): error: TOML: The key `well.name` is already defined at (2,1) and cannot be redefined")]
    [InlineData(
        "datum = \"rotary table\"", "datum == \"rotary table\"",
        "well.toml(3,8): error: TOML: Unexpected token `=` for a value",
        "well.toml(3,10): error: TOML: Unexpected token found `\"rotary table\"` (token: `string`) while expecting token `newline`")]
    [InlineData(
        "name = \"Testwell 1\"", "name = \"Testwell 1",
        "well.toml(2,19): error: TOML: found the end of the line inside a text, expected a closing quote")]
    [InlineData(
        "name = \"Testwell 1\"", "name = \"\"\"Testwell 1",
        "well.toml(26,29): error: TOML: Invalid End-Of-File found for multi-line string")]
    [InlineData(
        "coefficient = 0.8", "coefficient = 99999999999999999999999",
        "well.toml(19,15): error: TOML: Unable to parse integer `99999999999999999999999`")]
    public void Syntax_errors_have_their_place(string old, string replacement, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.With(old, replacement)));

    [Fact] // found by the fuzz test: what a message quotes may drive a terminal
    public void A_control_character_is_quoted_as_an_escape()
    {
        var messages = WellText.Messages(WellText.With("coefficient = 0.8", "coefficient = \u007f0.8"));
        Assert.Contains(messages, m => m.StartsWith("well.toml(19,15): error: TOML: ", StringComparison.Ordinal) && m.Contains("\\u007F", StringComparison.Ordinal));
        Assert.DoesNotContain(messages, m => m.Any(char.IsControl));
    }

    [Theory] // found by the fuzz test: a message about a file without a name has no place
    [InlineData("files = [\"logs.csv\"]", "files = [\"logs.csv\", \" \"]", "well.toml(9,9): error: found an empty name in [logs] files, expected the names of the log files")]
    [InlineData("vertical = true", "file = \"\"\nnorth = \"grid\"", "well.toml(12,8): error: found an empty name, expected [survey] file = the name of a survey file")]
    public void A_file_without_a_name_is_an_error_where_it_stands(string old, string replacement, string expected) =>
        Assert.Equal([expected], WellText.Messages(WellText.With(old, replacement)));

    [Theory]
    [InlineData(
        "[well]\nname = \"x\"\n",
        "well.toml(27,1): error: TOML: The key `well` is already defined at (1,1) and cannot be redefined")]
    [InlineData(
        "[pore_pressure.method]\nx = 1\n",
        "well.toml(27,2): error: found \"method\" as a table, expected each key once: it is the text \"hydrostatic\" at well.toml(25,1)")]
    [InlineData(
        "[[zones]]\nname = \"a\"\n[zones.moduli]\n[[zones.moduli]]\n",
        "well.toml(30,1): error: TOML: The key `zones.[1].moduli` is already defined at (29,1) and cannot be redefined")]
    public void A_table_that_comes_twice_or_in_the_place_of_a_value_is_an_error(string added, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(WellText.Sound + added));
}

namespace DepthStress.Tests.Reading;

/// <summary>Log data of LAS version 3.0 (Canadian Well Logging Society), as far as they are written like 2.0 (section names from memory; values our own).</summary>
public class LasVersion3Tests
{
    private const string Head = "~Version\nVERS. 3.0:\nWRAP. NO:\nDLM. COMMA:\n~Well\nNULL. -999.25:\nWELL. Bramble 7 : WELL\n";
    private const string Note = "a.las(2): note: found LAS 3.0, its log data are read by the rules of LAS 2.0";

    [Theory]
    [InlineData("~Curve\n", "~ASCII | Curve\n")]
    [InlineData("~Log_Definition\n", "~Log_Data | Log_Definition\n")]
    [InlineData("~LOG_DEFINITION[1]\n", "~LOG_DATA[1] | LOG_DEFINITION[1]\n")]
    public void Log_data_are_read_by_either_pair_of_names(string definition, string data)
    {
        var read = LogReading.Las($"{Head}~Parameter\nBS.in 8.5:\n{definition}DEPT.m : depth {{F}}\nGR.gAPI : gamma {{F}}\n{data}1,10\n2,\n");
        Assert.Equal([10, double.NaN], read.Column("GR").Values);
        Assert.Equal("Bramble 7", read.File!.WellName);
        Assert.Equal([Note], read.Messages);
    }

    [Fact]
    public void Data_of_other_things_are_passed_over_with_a_note()
    {
        var read = LogReading.Las($"{Head}~Core_Definition\nC.m:\n~Core_Data | Core_Definition\n1,x\n~Curve\nDEPT.m:\n~ASCII\n1\n~Tops_Data\n2,y\n");
        Assert.Equal(
            [
                Note,
                "a.las(8,1): note: section \"~Core_Definition\" is not read",
                "a.las(10,1): note: section \"~Core_Data | Core_Definition\" is not read",
                "a.las(16): note: section \"~Tops_Data\" after the data is not read",
            ],
            read.Messages);
    }

    [Fact]
    public void A_file_without_log_data_is_refused() => Assert.Equal(
        ["a.las: error: found no curves, expected a ~C section that lists them", "a.las: error: found no ~A section, expected the data in it"],
        LogReading.Las($"{Head}~Core_Definition\nC.m:\n~Core_Data\n1\n").Errors);

    [Fact]
    public void Several_sets_of_log_data_are_refused_by_name() => Assert.Equal(
        ["a.las(12): error: found a second section of log data, expected one (several sets in one LAS 3.0 file are not read)"],
        LogReading.Las($"{Head}~Log_Definition[1]\nDEPT.m:\n~Log_Data[1]\n1\n~Log_Data[2]\n2\n").Errors);

    [Fact]
    public void Text_columns_are_errors_that_name_the_column() => Assert.Equal(
        ["a.las(12,4): error: column \"LITH\": found \"shale\", expected a number"],
        LogReading.Las($"{Head}~Curve\nDEPT.m:\nLITH. : {{S}}\n~ASCII\n1,\"shale\"\n").Errors);

    [Fact]
    public void In_version_2_the_names_of_version_3_do_not_pass_for_sections_of_the_standard() => Assert.Equal(
        ["a.las(6,1): note: section \"~Core_Data\" is not read"],
        LogReading.Las($"{LogReading.LasHead}~Core_Data\n1 2 3\n~C\nDEPT.m:\n~A\n1\n").Messages);
}

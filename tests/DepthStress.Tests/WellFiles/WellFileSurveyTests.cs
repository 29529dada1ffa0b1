namespace DepthStress.Tests.WellFiles;

/// <summary>The survey: one way to state it, and a file that can be used.</summary>
public sealed class WellFileSurveyTests
{
    private const string Header = "md_m,inclination_deg,azimuth_deg\n";

    private static string Surveyed { get; } = WellText.With("vertical = true", "file = \"survey.csv\"\nnorth = \"grid\"");

    [Theory]
    [InlineData("", "well.toml: error: [survey] is not set; expected file = \"...\", curve = \"...\" or vertical = true")]
    [InlineData("vertical = false", "well.toml: error: [survey] is not set; expected file = \"...\", curve = \"...\" or vertical = true")]
    [InlineData(
        "vertical = true\nfile = \"survey.csv\"\nnorth = \"grid\"",
        "well.toml(12,12): error: found both a survey file and vertical = true, expected one of them")]
    [InlineData(
        "file = \"survey.csv\"",
        "well.toml: error: [survey] north is not set; expected \"true\", \"grid\" or \"magnetic\", what the survey's azimuths count from")]
    public void The_path_of_the_hole_is_stated_once(string survey, string expected) =>
        Assert.Equal([expected], WellText.Messages(WellText.With("vertical = true", survey), ("survey.csv", Header + "0,0,0\n2000,10,45\n")));

    [Fact]
    public void A_survey_that_is_not_there_is_named() => Assert.Equal(["survey.csv: error: file not found"], WellText.Messages(Surveyed));

    [Theory]
    [InlineData(Header + "0,0,0\n100,190,0\n", "survey.csv(3): error: survey station 2: found an inclination of 190 deg, expected 0 to 180 deg")]
    [InlineData(Header + "0,0,0\n100,10,0\n90,10,0\n", "survey.csv(4): error: depth decreases in 1 row, first from 100 to 90, expected increasing")]
    [InlineData(
        "md_m,inclination_deg\n0,0\n100,10\n", "survey.csv(1): error: found no column for azimuth, expected one named azimuth, azi, azim, az, hazi, bearing")]
    [InlineData(
        "md,inclination,azimuth\n0,0,0\n100,10,4\n",
        "survey.csv(1,1): error: column md: found no unit, expected one of m, ft, in, mm, cm, as in md[m]",
        "survey.csv(1,4): error: column inclination: found no unit, expected one of deg, rad, as in inclination[deg]",
        "survey.csv(1,16): error: column azimuth: found no unit, expected one of deg, rad, as in azimuth[deg]")]
    [InlineData(
        "md_m,inclination_deg,azimuth_m\n0,0,0\n100,10,4\n",
        "survey.csv(1,22): error: column azimuth: found the unit \"m\", expected one of deg, rad, as in azimuth[deg]")]
    [InlineData(Header + "0,x,0\n100,10,4\n", "survey.csv(2,3): error: column \"inclination\": found \"x\", expected a number")]
    [InlineData(Header, "survey.csv: error: found no data rows, expected at least one")]
    public void A_survey_that_cannot_be_used_says_why(string survey, params string[] expected) =>
        Assert.Equal(expected, WellText.Messages(Surveyed, ("survey.csv", survey)));

    [Theory]
    [InlineData("md[ft],inc[deg],az[deg]\n0,0,0\n1000,0,0\n", 304.8)] // 1 ft = 0.3048 m, exact by definition
    [InlineData("MD_M,INCLINATION_DEG,AZIMUTH_DEG\n0,0,0\n1000,0,0\n", 1000)]
    [InlineData("measured_depth,inclination,azimuth\nm,deg,deg\n0,0,0\n1000,0,0\n", 1000)]
    public void Units_may_stand_in_the_names_in_brackets_or_in_a_row_of_their_own(string survey, double deepest)
    {
        var (well, messages) = WellText.Read(Surveyed, ("survey.csv", survey));
        Assert.Empty(messages);
        Assert.Equal(deepest, well!.Setup.Trajectory.LastStation, 1e-9); // one multiplication
        Assert.Equal(["well.toml", "survey.csv"], well.Inputs.Select(i => i.Name));
    }

    [Fact]
    public void A_zone_that_the_hole_never_reaches_is_an_error()
    {
        // The hole turns horizontal at 300 m and stays there.
        var survey = Header + "0,0,0\n200,0,0\n400,90,0\n3000,90,0\n";
        var text = Surveyed + "[[zones]]\nname = \"deep\"\ntop = \"900 m\"\ndepth_kind = \"tvd\"\n";
        Assert.Equal(["well.toml(28,3): error: the hole never reaches the top of zone \"deep\""], WellText.Messages(text, ("survey.csv", survey)));
    }
}

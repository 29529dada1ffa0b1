namespace DepthStress.Tests.WellFiles;

/// <summary>Surveys as others write them: names, units, dip, missing azimuths, the point they count from.</summary>
public sealed class SurveyColumnTests
{
    private const string Surveyed = "file = \"survey.csv\"\nnorth = \"true\"";

    private static (Core.Depth.Trajectory Path, string[] Messages) Read(string survey, string more = "")
    {
        var (well, messages) = WellText.Read(WellText.With("vertical = true", Surveyed + more), ("survey.csv", survey));
        return (well!.Setup.Trajectory, messages);
    }

    // A slanted hole: 60 deg over 100 m is 50 m down and 86.6 m out, here to the east.
    [Theory]
    [InlineData("MD (m),Incl (deg),Azim (deg)")]
    [InlineData("DEPT[m],DEVI[deg],HAZI[deg]")]
    [InlineData("measured depth (m),Deviation (degrees),Bearing (deg)")]
    [InlineData("md_m,inc_deg,azi_deg")]
    [InlineData("Depth,Inclination,AZ\nm,deg,deg")]
    public void Common_names_and_units_are_read(string header)
    {
        var (path, messages) = Read(header + "\n0,60,90\n\n100,60,90\n");
        Assert.Empty(messages);
        Assert.Equal(50, path.At(100).TrueVerticalDepth, 1e-9); // rounding
        Assert.Equal(50 * Math.Sqrt(3), path.At(100).East, 1e-9);
    }

    [Fact]
    public void Radians_and_feet_are_read()
    {
        var (path, messages) = Read("md_ft,inclination_rad,azimuth_rad\n0,1.0471975512,1.5707963268\n1000,1.0471975512,1.5707963268\n");
        Assert.Empty(messages);
        Assert.Equal(152.4, path.At(304.8).TrueVerticalDepth, 1e-6); // ten digits of pi/3
    }

    [Theory]
    [InlineData("0,-90,0\n100,-30,90\n", "negative", "-90")]
    [InlineData("0,90,0\n100,30,90\n", "positive", "90")]
    public void Dip_counts_from_the_horizontal_and_a_note_says_its_sign(string rows, string sign, string vertical)
    {
        var (path, messages) = Read("md_m,dip_deg,azimuth_deg\n" + rows);
        Assert.Equal([$"survey.csv(1,6): note: column dip: read as dip from the horizontal, {sign} downwards: a vertical hole has {vertical} deg"], messages);
        Assert.Equal(0, path.At(0).Inclination, 1e-12);
        Assert.Equal(Math.PI / 3, path.At(100).Inclination, 1e-12); // rounding
    }

    [Fact]
    public void Dips_of_both_signs_are_an_error() => Assert.Equal(
        ["survey.csv(4): error: column dip: found dips of both signs, 5 deg in line 4 and -80 deg in line 2, expected one sign for a hole that goes down; give the inclination from the vertical instead"],
        Read("md_m,dip_deg,azimuth_deg\n0,-80,0\n50,0,0\n100,5,0\n").Messages);

    [Fact]
    public void Where_the_hole_is_vertical_a_missing_azimuth_is_the_next_ones()
    {
        var (path, messages) = Read("md_m,inclination_deg,azimuth_deg\n0,0,\n50,0,\n100,20,90\n200,0,\n");
        Assert.Empty(messages);
        Assert.Equal([90, 90, 90, 90], new double[] { 0, 50, 100, 200 }.Select(md => Math.Round(path.At(md).Azimuth * 180 / Math.PI, 9)));
        Assert.Equal(0, path.At(100).North, 1e-9); // bends due east
    }

    [Fact]
    public void A_vertical_hole_needs_no_azimuth_at_all()
    {
        var (path, messages) = Read("md_m,inclination_deg,azimuth_deg\n0,0,\n100,0,\n");
        Assert.Equal(["survey.csv(1,22): warning: column \"azimuth\" has no values, all are missing"], messages);
        Assert.Equal(100, path.At(100).TrueVerticalDepth, 1e-9); // rounding
    }

    [Fact]
    public void Missing_values_are_named_with_their_lines() => Assert.Equal(
        [
            "survey.csv(4): error: survey station 2: found no azimuth at an inclination of 12.5 deg, expected a number; it may be left out only where the inclination is 0",
            "survey.csv(5): error: survey station 3: found no inclination, expected a number",
        ],
        Read("md_m,inclination_deg,azimuth_deg\n0,0,0\n\n50,12.5,\n100,,40\n").Messages);

    [Fact]
    public void Problems_of_stations_name_their_lines_below_a_unit_row() => Assert.Equal(
        ["survey.csv(5): error: survey station 2: found an inclination of 190 deg, expected 0 to 180 deg"],
        Read("md,inc,azi\nm,deg,deg\n0,0,0\n\n100,190,0\n").Messages);

    [Fact]
    public void A_survey_that_starts_slanted_below_the_datum_needs_a_tie_in()
    {
        const string survey = "md_m,inclination_deg,azimuth_deg\n1500,12,40\n1600,14,40\n";
        Assert.Equal(
            ["survey.csv(2): error: survey station 1: found an inclination of 12 deg at the first station, measured depth 1500 m, below a hole that is taken as vertical; expected the point where the survey starts: [survey] tie_in = { md = \"1500 m\", tvd = ... }"],
            Read(survey).Messages);
        var (path, messages) = Read(survey, "\ntie_in = { md = \"1500 m\", tvd = \"1480.2 m\" }");
        Assert.Equal(["well.toml(14,10): note: the hole above the tie-in at 1500 m measured depth is taken as straight from the datum, at an inclination of 9.3 deg"], messages);
        Assert.Equal(1480.2, path.At(1500).TrueVerticalDepth, 1e-9); // as given
        Assert.Equal(740.1, path.At(750).TrueVerticalDepth, 1e-9); // half way
    }

    [Fact]
    public void A_gap_below_the_tie_in_is_said() => Assert.Equal(
        [
            "survey.csv(2): note: survey station 1: the hole between the tie-in at 1400 m and this station at 1500 m is taken as straight in the station's direction",
            "well.toml(14,10): note: the hole above the tie-in at 1400 m measured depth is taken as straight from the datum, at an inclination of 0.0 deg",
        ],
        Read("md_m,inclination_deg,azimuth_deg\n1500,12,40\n", "\ntie_in = { md = \"1400 m\", tvd = \"1400 m\" }").Messages);

    [Theory]
    [InlineData("{ md = \"1500 m\" }", "well.toml(14,10): error: tie_in has no tvd; expected its true vertical depth")]
    [InlineData("{ tvd = \"1500 m\" }", "well.toml(14,10): error: tie_in has no md; expected its measured depth")]
    [InlineData("{ md = \"1500 m\", tvd = \"1500.5 m\" }", "well.toml(14,33): error: found a tie-in at 1500.5 m true vertical depth, expected at most its measured depth of 1500 m")]
    [InlineData("{ md = 1500, tvd = \"1500.5 m\" }", "well.toml(14,17): error: found the bare number 1500, expected md = a quantity in quotes with a unit (m, ft, in, mm, cm)")]
    [InlineData("{ md = \"1600 m\", tvd = \"1500.5 m\" }", "survey.csv(2): error: survey station 1: found measured depth 1500 m above the tie-in at 1600 m, expected none above it")]
    [InlineData("\"1500 m\"", "well.toml(14,10): error: found the text \"1500 m\", expected a table [survey.tie_in]")]
    public void A_tie_in_that_cannot_be_is_an_error(string tieIn, string expected) =>
        Assert.Equal(expected, Read("md_m,inclination_deg,azimuth_deg\n1500,0.2,40\n", "\ntie_in = " + tieIn).Messages[0]);

    [Theory]
    [InlineData("vertical = true\ncurve = \"true_vertical_depth\"", "well.toml(13,9): error: found both a depth curve and vertical = true, expected one of them")]
    [InlineData(Surveyed + "\ncurve = \"vertical_position\"", "well.toml(14,9): error: found both a depth curve and a survey file, expected one of them")]
    [InlineData("curve = \"tvd\"", "well.toml(12,9): error: found \"tvd\", expected curve = one of \"true_vertical_depth\", \"vertical_position\"")]
    [InlineData("vertical = true\ndip_azimuth = \"90 deg\"", "well.toml(13,15): error: found dip_azimuth without bedding_dip, expected both")]
    [InlineData("vertical = true\nbedding_dip = \"91 deg\"", "well.toml(13,15): error: found a bedding_dip of 91 deg, expected at most 90 deg")]
    [InlineData(Surveyed + "\nbedding_dip = \"12 deg\"", "well.toml(14,15): error: found bedding_dip without dip_azimuth, expected both")]
    [InlineData(
        "curve = \"vertical_position\"\nbedding_dip = \"12 deg\"\ndip_azimuth = \"230 deg\"",
        "well.toml(13,15): error: found bedding_dip with a depth curve, expected a survey file: the curve does not say in which direction the hole leans")]
    public void What_contradicts_itself_in_the_survey_section_is_an_error(string survey, string expected) => Assert.Equal(
        [expected], WellText.Messages(WellText.With("vertical = true", survey), ("survey.csv", "md_m,inc_deg,azi_deg\n0,0,0\n100,0,0\n")));

    [Fact]
    public void The_beds_and_the_depth_curve_reach_the_setup()
    {
        Assert.Equal(0, WellText.Sections(WellText.Sound).Setup.Bedding.Dip);
        var text = WellText.With("vertical = true", "vertical = true\nbedding_dip = \"12 deg\"\ndip_azimuth = \"230 deg\"");
        var bedding = WellText.Sections(text).Setup.Bedding;
        Assert.Equal(12 * Math.PI / 180, bedding.Dip, 1e-12); // rounding
        Assert.Equal(230 * Math.PI / 180, bedding.DipAzimuth, 1e-12);
        Assert.Equal(Core.Logs.Property.LoggedVerticalPosition, WellText.Sections(WellText.With("vertical = true", "curve = \"vertical_position\"")).Setup.PathCurve.Value);
    }

    [Fact]
    public void A_tie_in_without_a_survey_file_is_an_error() => Assert.Equal(
        ["well.toml(13,10): error: found tie_in without a survey file, expected file = \"...\" with it"],
        WellText.Messages(WellText.With("vertical = true", "vertical = true\ntie_in = { md = \"5 m\", tvd = \"5 m\" }")));
}

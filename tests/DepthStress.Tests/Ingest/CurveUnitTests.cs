using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

/// <summary>Units of curves: from the file, from the well file, missing, and such as cannot be right.</summary>
public sealed class CurveUnitTests
{
    [Theory]
    [InlineData("DTC[us/ft]", 100, 3048)] // 0.3048 m / 100e-6 s
    [InlineData("DTC[us/m]", 250, 4000)]
    [InlineData("VP[m/s]", 3200, 3200)]
    [InlineData("VP[km/s]", 3.2, 3200)]
    [InlineData("VP[ft/s]", 10000, 3048)]
    public void Slowness_and_velocity_both_become_velocity(string column, double printed, double velocity)
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv(column, 1000, 1, printed, printed));
        Assert.Empty(messages);
        Assert.Equal(velocity, logs![Property.Vp]!.Values[0], 1e-9 * velocity); // two roundings
    }

    [Theory]
    [InlineData("RHOB[kg/m3]", Property.Density, 2400, 2400)]
    [InlineData("NPHI[%]", Property.NeutronPorosity, 25, 0.25)]
    [InlineData("CALI[in]", Property.Caliper, 10, 0.254)]
    [InlineData("FACIES", Property.Facies, 3, 3)]
    [InlineData("TEMP[degC]", Property.Temperature, 80, 353.15)]
    public void Curves_become_SI(string column, Property property, double printed, double si) =>
        Assert.Equal(si, Ingesting.One(Ingesting.Csv(column, 1000, 1, printed)).Logs![property]!.Values[0], 1e-12 * si); // one or two roundings

    [Fact]
    public void The_well_file_gives_a_unit_that_the_file_lacks_or_has_wrong()
    {
        var lacking = Ingesting.One(Ingesting.Csv("DTC", 1000, 1, 100), "compressional = { column = \"DTC\", unit = \"us/ft\" }");
        var wrong = Ingesting.One(Ingesting.Csv("DTC[us/m]", 1000, 1, 100), "compressional = { column = \"DTC\", unit = \"us/ft\" }");
        Assert.Empty(lacking.Messages.Concat(wrong.Messages));
        Assert.Equal(3048, lacking.Logs![Property.Vp]!.Values[0], 1e-9); // two roundings
        Assert.Equal(3048, wrong.Logs![Property.Vp]!.Values[0], 1e-9);
    }

    [Theory]
    [InlineData("DTC", "found no unit")]
    [InlineData("DTC[psi]", "found the unit \"psi\"")]
    public void A_curve_that_stresses_rest_on_needs_a_unit_that_fits(string column, string found) => Assert.Equal(
        [$"a.csv(1,9): error: column DTC (compressional): {found}, expected one of us/ft, us/m, m/s, km/s, ft/s; state it in [logs.curves]: compressional = {{ column = \"DTC\", unit = \"us/ft\" }}"],
        Ingesting.One(Ingesting.Csv(column, 1000, 1, 100)).Messages);

    [Fact]
    public void A_unit_that_does_not_fit_in_the_well_file_is_an_error_there() => Assert.StartsWith(
        "well.toml(28,42): error: column DTC (compressional): found the unit \"psi\"",
        Assert.Single(Ingesting.One(Ingesting.Csv("DTC[us/ft]", 1000, 1, 100), "compressional = { column = \"DTC\", unit = \"psi\" }").Messages),
        StringComparison.Ordinal);

    [Fact]
    public void Another_curve_without_a_unit_is_left_out_unless_the_well_file_asks_for_it()
    {
        var csv = "DEPT[m],GR[foo],RD[ohm.m]\n1000,60,2\n1001,60,2\n";
        var (logs, messages) = Ingesting.One(csv);
        Assert.Equal(
            ["a.csv(1,9): warning: column GR (gamma_ray): found the unit \"foo\", expected one of gAPI; state it in [logs.curves]: gamma_ray = { column = \"GR\", unit = \"gAPI\" }; the curve is not used"],
            messages);
        Assert.Equal(["deep_resistivity"], logs!.Curves.Select(c => c.Role.Id));
        Assert.Contains(": error: column GR (gamma_ray)", Assert.Single(Ingesting.One(csv, "gamma_ray = \"GR\"").Messages), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(
        "RHOB[g/cm3]", 2400,
        "a.csv(1,9): error: column RHOB (density): its median is 2400 g/cm3, which no rock has (1.3 to 3.3 g/cm3); read as kg/m3 it would be 2.4 g/cm3; state the unit in [logs.curves]: density = { column = \"RHOB\", unit = \"kg/m3\" }")]
    [InlineData(
        "DTC[us/ft]", 250,
        "a.csv(1,9): error: column DTC (compressional): its median is 250 us/ft, which no rock has (40.64 to 217.7 us/ft); read as us/m it would be 76.2 us/ft; state the unit in [logs.curves]: compressional = { column = \"DTC\", unit = \"us/m\" }")]
    [InlineData(
        "NPHI[v/v]", 25,
        "a.csv(1,9): error: column NPHI (neutron): its median is 25 v/v, which no rock has (-0.15 to 0.8 v/v); read as % it would be 0.25 v/v; state the unit in [logs.curves]: neutron = { column = \"NPHI\", unit = \"%\" }")]
    [InlineData(
        "CALI[in]", 311,
        "a.csv(1,9): error: column CALI (caliper): its median is 311 in, which no hole has (1.969 to 59.06 in); read as mm it would be 12.244 in; state the unit in [logs.curves]: caliper = { column = \"CALI\", unit = \"mm\" }")]
    [InlineData(
        "DTST[us/ft]", 790,
        "a.csv(1,9): error: column DTST (stoneley): its median is 790 us/ft, which no rock has (190.5 to 762 us/ft); read as us/m it would be 240.79 us/ft; state the unit in [logs.curves]: stoneley = { column = \"DTST\", unit = \"us/m\" }")]
    [InlineData(
        "DTST[m/s]", 230,
        "a.csv(1,9): error: column DTST (stoneley): its median is 230 m/s, which no rock has (400 to 1600 m/s); read as us/ft it would be 1325.2 m/s; state the unit in [logs.curves]: stoneley = { column = \"DTST\", unit = \"us/ft\" }")]
    public void A_median_that_contradicts_the_unit_is_shown_in_both_readings(string column, double printed, string expected) =>
        Assert.Equal([expected], Ingesting.One(Ingesting.Csv(column, 1000, 1, printed, printed, printed * 1.1)).Messages);

    [Theory]
    [InlineData(
        "DTSF[us/m]", 110,
        "a.csv(1,9): error: column DTSF (fast_shear): its median is 110 us/m, which no rock has (222.2 to 6667 us/m); read as us/ft it would be 360.89 us/m; state the unit in [logs.curves]: fast_shear = { column = \"DTSF\", unit = \"us/ft\" }")]
    [InlineData(
        "DTSS[us/ft]", 2200,
        "a.csv(1,9): error: column DTSS (slow_shear): its median is 2200 us/ft, which no rock has (67.73 to 2032 us/ft); read as us/m it would be 670.56 us/ft; state the unit in [logs.curves]: slow_shear = { column = \"DTSS\", unit = \"us/m\" }")]
    public void The_same_holds_for_the_two_shear_waves(string column, double printed, string expected) =>
        Assert.Equal(expected, Ingesting.One(Ingesting.Csv(column, 1000, 1, printed, printed, printed * 1.1)).Messages[0]); // the second asks which one serves

    [Theory]
    [InlineData("RMED[ohm.m]", "medium_resistivity", 90000)]
    [InlineData("RSHAL[ohm.m]", "shallow_resistivity", 0.004)]
    public void A_resistivity_that_no_rock_has_is_a_warning_for_want_of_another_unit(string column, string role, double printed) => Assert.Equal(
        [FormattableString.Invariant($"a.csv(1,9): warning: column {column.Split('[')[0]} ({role}): its median is {printed:G5} ohm.m, which no rock has (0.02 to 2E+04 ohm.m)")],
        Ingesting.One(Ingesting.Csv(column, 1000, 1, printed, printed)).Messages);

    [Theory]
    [InlineData("DTSF[us/ft]", Property.FastShear, 150, 2032)] // 0.3048 m / 150e-6 s
    [InlineData("DTS_SLOW[us/m]", Property.SlowShear, 500, 2000)]
    [InlineData("STONELEY[us/ft]", Property.Stoneley, 240, 1270)]
    [InlineData("RMED[ohm.m]", Property.MediumResistivity, 12, 12)]
    [InlineData("RSHAL[ohm.m]", Property.ShallowResistivity, 8, 8)]
    public void Further_waves_and_resistivities_become_SI(string column, Property property, double printed, double si) => Assert.Equal(
        si,
        Ingesting.Read("[logs]\nfiles = [\"a.csv\"]\n" + (column.StartsWith("DTSF", StringComparison.Ordinal) ? "shear_from = \"fast\"\n" : column.StartsWith("DTS_", StringComparison.Ordinal) ? "shear_from = \"slow\"\n" : ""), ("a.csv", Ingesting.Csv(column, 1000, 1, printed))).Logs![property]!.Values[0],
        1e-9 * si); // two roundings

    [Fact]
    public void A_median_that_no_unit_explains_is_a_warning()
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv("GR[gAPI]", 1000, 1, 3000, 3000));
        Assert.Equal(["a.csv(1,9): warning: column GR (gamma_ray): its median is 3000 gAPI, which no rock has (5 to 600 gAPI)"], messages);
        Assert.NotNull(logs![Property.GammaRay]);
    }

    [Fact]
    public void A_curve_without_values_is_a_warning()
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv("DTC[us/ft]", 1000, 1, -999.25, -999.25));
        Assert.Equal(["a.csv(1,9): warning: column \"DTC\" has no values, all are missing"], messages);
        Assert.All(logs![Property.Vp]!.Values, v => Assert.Equal(double.NaN, v));
        Assert.Equal(["0-2 None"], logs[Property.Vp]!.Origins());
    }

    [Fact]
    public void Slownesses_of_zero_or_less_are_taken_out_and_counted()
    {
        var (logs, messages) = Ingesting.One(Ingesting.Csv("DTC[us/ft]", 1000, 1, 100, 0, -5, 100));
        Assert.Equal(["a.csv(1,9): warning: column DTC (compressional): found 2 slownesses of zero or less, expected them above zero: taken out"], messages);
        Assert.Equal(["0-1 Measured DTC in a.csv", "1-3 None", "3-4 Measured DTC in a.csv"], logs![Property.Vp]!.Origins());
    }

    [Theory]
    [InlineData("missing = \"off\"", "60,off,60", 60)]
    [InlineData("missing = [0, \"off\", \"-\"]", "0,off,-", double.NaN)]
    public void Texts_can_mean_missing(string missing, string cells, double first)
    {
        var (logs, messages) = Ingesting.One(
            "DEPT[m],GR[gAPI]\n999,61\n" + string.Concat(cells.Split(',').Select((c, i) => FormattableString.Invariant($"{1000 + i},{c}\n"))), $"gamma_ray = {{ column = \"GR\", {missing} }}");
        Assert.Empty(messages);
        Assert.Equal([61, first, double.NaN, first], logs![Property.GammaRay]!.Values);
    }

    [Theory]
    [InlineData("true", "found true")]
    [InlineData("\"\"", "found the text \"\"")]
    [InlineData("[0, [1]]", "found a list")]
    [InlineData("2020-01-01", "found a date")]
    public void Nothing_else_can(string missing, string found) => Assert.Equal(
        [$"well.toml(28,40): error: {found}, expected missing = a number, a text, or a list of numbers and texts"],
        Ingesting.One(Ingesting.Csv("GR[gAPI]", 1000, 1, 60), $"gamma_ray = {{ column = \"GR\", missing = {missing} }}").Messages);

    [Fact]
    public void A_missing_code_holds_for_its_column_in_its_file_only()
    {
        var (logs, messages) = Ingesting.Two(
            Ingesting.Csv("GR[gAPI]", 1000, 1, 60, 0, 60), Ingesting.Csv("GR[gAPI]", 1003, 1, 77, 0, 60),
            "gamma_ray = [{ column = \"GR\", file = \"a.csv\", base = \"1002 m\", missing = 0 }, { column = \"GR\", file = \"b.csv\", missing = 77 }]");
        Assert.Empty(messages);
        Assert.Equal([60, double.NaN, 60, double.NaN, 0, 60], logs![Property.GammaRay]!.Values);
    }
}

using DepthStress.Core.Depth;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Observations;

/// <summary>The file of observations: what its rows mean, and every cell that is wrong in one run.</summary>
public sealed class ObservationFileTests
{
    private const string Header = "top_m,base_m,depth_kind,kind,value,pressure_at,fluid_density,sigma\n";

    private const string Section = "[observations]\nfiles = [\"tests.csv\"]\n";

    private static string[] Messages(string table, string section = Section) => WellText.Messages(WellText.Sound + section, ("tests.csv", table));

    private static IReadOnlyList<Observation> Rows(string table, string section = Section)
    {
        var (well, messages) = WellText.Read(WellText.Sound + section, ("tests.csv", table));
        Assert.Empty(messages);
        return well!.Setup.Observations;
    }

    [Fact]
    public void A_row_is_read_in_SI_with_its_place()
    {
        var row = Assert.Single(Rows("top_m,base_m,depth_kind,kind,value,pressure_at,fluid_density,sigma,pore_pressure,date,note\n1000,1004,md,leak-off,6.5 MPa,surface,9 lb/gal,0.4 MPa,10 MPa,2023-05-02,\"shoe, second try\"\n"));
        Assert.Equal((1000, 1004, DepthKind.Measured, ObservationKind.LeakOff, true), (row.Top, row.Base, row.DepthKind, row.Kind, row.AtSurface));
        Assert.Equal(6.5e6, row.Value, 1e-6); // one multiplication
        Assert.Equal(9 * 119.826427, row.FluidDensity!.Value, 1e-5); // NIST SP 811: 1 lb/gal = 119.8264 kg/m3; nine digits
        Assert.Equal((0.4e6, 10e6), (row.Sigma, row.PorePressure!.Value));
        Assert.Equal(("2023-05-02", "shoe, second try", "tests.csv(2)"), (row.Date, row.Note, row.Position.ToString()));
    }

    [Theory]
    [InlineData("Kind;Depth Kind;Sigma [psi];Value (psi);Top (ft);Base (ft);Pressure at\nClosure;MD;100;5000;3000;3010;Downhole\n")]
    [InlineData("# made by hand\n\nkind\tdepth_kind\tsigma_psi\tvalue_psi\ttop_ft\tbase_ft\tpressure_at\nclosure\tmd\t100\t5000\t3000\t3010\tdownhole\n")]
    [InlineData("kind|depth_kind|sigma|value|top|base|pressure_at\r\nclosure|md|100 psi|5000 psi|3000 ft|3010 ft|downhole\r\n")]
    [InlineData("top_ft;base_ft;kind;depth_kind;sigma;value;pressure_at\n3000,0;3010,0;closure;md;100 psi;5000,0 psi;downhole\n")]
    public void Columns_in_any_order_with_units_in_name_or_cell(string table)
    {
        var row = Assert.Single(Rows(table));
        Assert.Equal(3000 * 0.3048, row.Top, 1e-9); // exact foot
        Assert.Equal(5000 * 6894.757293, row.Value, 0.01); // NIST SP 811, 10 digits
        Assert.Equal((ObservationKind.Closure, false), (row.Kind, row.AtSurface));
    }

    [Fact]
    public void An_equivalent_density_keeps_until_its_depth_is_known()
    {
        var row = Assert.Single(Rows("top_m,base_m,depth_kind,kind,value,pressure_at,sigma\n1000,1000,md,leak-off,14 lb/gal,downhole,0.2 lb/gal\n"));
        Assert.True(row.AsDensity);
        Assert.Equal(14 * 119.826427, row.Value, 1e-5); // NIST SP 811
        var gradient = Assert.Single(Rows("top_m,base_m,depth_kind,kind,value,pressure_at,sigma\n1000,1000,md,leak-off,16 kPa/m,downhole,0.2 kPa/m\n"));
        Assert.Equal(16e3 / Constants.StandardGravity, gradient.Value, 1e-9); // the density whose column has the gradient
        Assert.Equal(200 / Constants.StandardGravity, gradient.Sigma, 1e-9);
    }

    [Theory]
    [InlineData("1000,1004,md,leakof,6 MPa,downhole,,1 MPa", "tests.csv(2,14): error: kind: found \"leakof\", expected one of closure, reopening, shut-in, leak-off, integrity, losses, breakdown, breakout-width, no-breakout, formation-pressure; did you mean \"leak-off\"?")]
    [InlineData("1000,1004,mdd,closure,6 MPa,downhole,,1 MPa", "tests.csv(2,11): error: depth_kind: found \"mdd\", expected one of md, tvd, tvdss; did you mean \"md\"?")]
    [InlineData("1000,1004,md,closure,6 MPa,downhole,,0 MPa", "tests.csv(2,38): error: sigma: found \"0 MPa\", expected a standard deviation above zero")]
    [InlineData("1000,1004,md,closure,6 MPa,downhole,,-1 MPa", "tests.csv(2,38): error: sigma: found \"-1 MPa\", expected a standard deviation above zero")]
    [InlineData("1000,1004,md,closure,6 MPa,downhole,,", "tests.csv(2,38): error: sigma: found nothing, expected a standard deviation with a unit (MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi)")]
    [InlineData("1000,1004,md,closure,6 MPa,surface,,1 MPa", "tests.csv(2,36): error: fluid_density: found nothing, expected the density of the fluid in the hole: the pressure was read at the surface")]
    [InlineData("1004,1000,md,closure,6 MPa,downhole,,1 MPa", "tests.csv(2,6): error: base: found it above the top, expected it at or below")]
    [InlineData("1000,1004,md,closure,,downhole,,1 MPa", "tests.csv(2,22): error: value: found nothing, expected a quantity with a unit (MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi)")]
    [InlineData("1000,1004,md,closure,6,downhole,,1 MPa", "tests.csv(2,22): error: value: found \"6\" without a unit, expected one of MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi")]
    [InlineData("1000,1004,md,closure,6 m,downhole,,1 MPa", "tests.csv(2,22): error: value: found \"6 m\", a length; expected a pressure in one of MPa, GPa, kPa, Pa, bar, psi, ksi, Mpsi")]
    [InlineData("1000,1004,md,closure,0 MPa,downhole,,1 MPa", "tests.csv(2,22): error: value: found \"0 MPa\", expected one above zero")]
    [InlineData("1000,1004,md,closure,6 MPa,,,1 MPa", "tests.csv(2,28): error: pressure_at: found nothing, expected one of surface, downhole")]
    [InlineData("1000,1004,md,closure,14 lb/gal,surface,1 sg,0.1 lb/gal", "tests.csv(2,22): error: value: found \"14 lb/gal\", an equivalent density, for a pressure read at the surface, expected a pressure, or downhole: an equivalent density holds the fluid's column already")]
    [InlineData("1000,1004,md,closure,14 lb/gal,downhole,,1 MPa", "tests.csv(2,42): error: sigma: found \"1 MPa\", a pressure; expected a density or pressure gradient in one of g/cm3, kg/m3, lb/ft3, lb/gal, sg, kPa/m, MPa/km, psi/ft, bar/m")]
    [InlineData("1000,1001,md,breakout-width,200 deg,,1.1 sg,6 deg", "tests.csv(2,29): error: value: found \"200 deg\", expected the full opening angle of one side, from 0 to 180 deg")]
    [InlineData("1000,1001,md,breakout-width,-5 deg,,1.1 sg,6 deg", "tests.csv(2,29): error: value: found \"-5 deg\", expected the full opening angle of one side, from 0 to 180 deg")]
    [InlineData("1000,1001,md,breakout-width,20 deg,surface,1.1 sg,6 deg", "tests.csv(2,36): error: pressure_at: found \"surface\", expected nothing: a breakout is no pressure")]
    [InlineData("1000,1001,md,breakout-width,20 deg,,,6 deg", "tests.csv(2): error: breakout-width: found no fluid_density, expected one, or [mud] density at 1000.0 m measured depth: the mud supports the wall")]
    [InlineData("1000,1001,md,no-breakout,20 deg,,1.1 sg,6 deg", "tests.csv(2,26): error: value: found \"20 deg\", expected nothing or 0 deg for no-breakout, or the kind breakout-width")]
    [InlineData("1000,1004,md,closure,6 MPa,downhole", "tests.csv(2): error: found 6 cells, expected 8 as in the header row; a cell that holds ',' stands in quotes")]
    public void A_cell_that_is_wrong_is_named_where_it_stands(string row, string expected) => Assert.Equal([expected], Messages(Header + row + "\n"));

    [Fact]
    public void All_wrong_cells_are_named_in_one_run() => Assert.Equal(
        ["tests.csv(2,14)", "tests.csv(2,35)", "tests.csv(3,1)", "tests.csv(3,20)"],
        Messages(Header + "1000,1004,md,clsure,6 MPa,surface,,1 MPa\nx,1004,md,closure, ,downhole,,1 MPa\n").Select(m => m.Split(": ")[0]));

    [Fact]
    public void The_same_kind_over_the_same_interval_is_a_warning()
    {
        const string Row = "1000,1004,md,closure,6 MPa,downhole,,1 MPa\n";
        Assert.Equal(
            ["tests.csv(4): warning: closure: found a second one over the same interval, the first at tests.csv(2); both count"],
            Messages(Header + Row + "1010,1014,md,closure,6 MPa,downhole,,1 MPa\n" + Row));
    }

    [Theory]
    [InlineData("top_m,base_m,kind\n1,2,closure\n", "tests.csv(1): error: found no column depth_kind", "tests.csv(1): error: found no column value", "tests.csv(1): error: found no column sigma")]
    [InlineData("a,b\n1,2\n", "tests.csv: error: found no column top", "tests.csv: error: found no column base", "tests.csv: error: found no column depth_kind", "tests.csv: error: found no column kind", "tests.csv: error: found no column value", "tests.csv: error: found no column sigma")]
    [InlineData("top_m,base_m,depth_kind,kind,value,sigma,sigma_mpa,pressure_at\n", "tests.csv(1,42): error: found a second column sigma, expected one")]
    [InlineData("top_psi,base_m,depth_kind,kind,value,sigma,pressure_at\n", "tests.csv(1,1): error: column top: found \"psi\", expected one of m, ft, in, mm, cm")]
    [InlineData("top_m,base_m,depth_kind,kind,value,sigma,pressure_at,fluid_densty\n", "tests.csv(1,54): warning: found the column \"fluid_densty\", which is not read", "tests.csv: warning: found no rows below the header")]
    public void A_header_that_is_wrong_is_named(string table, params string[] expected)
    {
        var messages = Messages(table);
        Assert.Equal(expected.Length, messages.Length);
        Assert.All(expected.Zip(messages), m => Assert.StartsWith(m.First, m.Second, StringComparison.Ordinal));
    }

    [Fact]
    public void Tests_that_break_the_wall_need_to_know_whether_the_fluid_entered_the_rock()
    {
        const string Table = Header + "1000,1004,md,breakdown,30 MPa,downhole,,1 MPa\n";
        Assert.Equal(
            ["well.toml: error: [observations] breakdown_fluid is not set; expected \"non-penetrating\" or \"penetrating\", whether the fluid of the breakdown test at tests.csv(2) entered the rock"],
            Messages(Table));
        Assert.Empty(Messages(Table, Section + "breakdown_fluid = \"penetrating\"\n"));
    }

    [Fact]
    public void A_file_that_is_not_there_is_named() =>
        Assert.Equal(["tests.csv: error: file not found"], WellText.Messages(WellText.Sound + Section));

    [Fact]
    public void The_file_is_among_the_inputs_with_its_hash()
    {
        var (well, _) = WellText.Read(WellText.Sound + Section, ("tests.csv", Header + "1000,1004,md,closure,6 MPa,downhole,,1 MPa\n"));
        Assert.Equal(["well.toml", "tests.csv"], well!.Inputs.Select(i => i.Name));
        Assert.Equal(64, well.Inputs[1].Sha256.Length);
    }

    [Fact]
    public void The_choices_have_the_defaults_of_the_trade_and_can_be_changed()
    {
        var setup = WellText.Sections(WellText.Sound).Setup.ObservationSettings;
        Assert.Equal((LeakOffMeaning.UpperBound, IntegrityMeaning.LeakOff, false), (setup.LeakOff.Value, setup.Integrity.Value, setup.BreakdownFluid.IsSet));
        var changed = WellText.Sections(WellText.Sound + "[observations]\nleak_off = \"value\"\nintegrity = \"shmin\"\n").Setup.ObservationSettings;
        Assert.Equal((LeakOffMeaning.Value, IntegrityMeaning.Shmin), (changed.LeakOff.Value, changed.Integrity.Value));
    }
}

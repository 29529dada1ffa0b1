using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using Xunit.Abstractions;

namespace DepthStress.Tests.Catalogue;

/// <summary>Walks the whole catalogue: no entry is without a check, and what the checks rest on is counted.</summary>
public class CatalogueCensusTests(ITestOutputHelper output)
{
    public static TheoryData<string> Ids => [.. MethodCatalogue.All.Select(l => l.Id)];

    /// <summary>
    /// Entries that StrengthReferenceTests holds to printed numbers: of one shale, Zoback 2007 p. 118 prints the strength from
    /// both, and each follows from the other.
    /// </summary>
    private static readonly string[] PrintedPair = ["horsrud-2001-shale", "gulf-pliocene-shale-slowness"];

    /// <summary>
    /// Entries whose printed result (same page) is met by an input solved for: it shows that units and size are right, no more.
    /// </summary>
    private static readonly string[] SolvedFor = ["horsrud-2001-shale-porosity", "shaly-rock-gamma-ray-friction"];

    [Fact]
    public void No_entry_is_without_a_check_and_what_they_rest_on_is_known()
    {
        var groups = MethodCatalogue.All.GroupBy(Rests).ToDictionary(g => g.Key, g => g.Select(l => l.Id).ToList());
        foreach (var (what, ids) in groups.OrderBy(g => g.Key)) output.WriteLine($"{ids.Count} entries rest on {what}: {string.Join(", ", ids)}");
        foreach (var standing in MethodCatalogue.All.GroupBy(l => l.Standing)) output.WriteLine($"{standing.Count()} entries are {standing.Key}");
        Assert.All(MethodCatalogue.All, l => Assert.NotNull(l.Example));
        Assert.Equal(6, groups["a printed value"].Count);
        Assert.Equal(2, groups["a printed value with an input solved for"].Count);
        Assert.Equal(MethodCatalogue.All.Count, groups.Values.Sum(g => g.Count));
    }

    private static string Rests(Law law) => law.Example!.Basis switch
    {
        _ when PrintedPair.Contains(law.Id) => "a printed value",
        _ when SolvedFor.Contains(law.Id) => "a printed value with an input solved for",
        ExampleBasis.Printed => "a printed value",
        ExampleBasis.Identity => "an identity",
        _ when law.Standing == Standing.Identity => "an identity",
        _ when law.Standing == Standing.FromMemory => "recalled coefficients, computed apart from the code",
        _ => "read coefficients, computed apart from the code",
    };

    // What was read and what was not, kept apart from the entries on purpose.
    [Fact]
    public void As_many_entries_stand_on_reading_as_were_read() => Assert.Equal(
        [(Standing.Confirmed, 72), (Standing.Identity, 6), (Standing.FromMemory, 87)],
        MethodCatalogue.All.GroupBy(l => l.Standing).Select(g => (g.Key, g.Count())).OrderBy(g => g.Key));

    [Theory]
    [MemberData(nameof(Ids))]
    public void A_law_starts_from_what_the_chain_knows_before_its_result(string id)
    {
        var law = Laws.Get(id);
        var before = PropertyNames.LawInputsBefore(law.Predicts).ToList();
        Assert.All(law.Inputs, i => Assert.Contains(i.Property, before));
        var slots = LawSlots.OfCatalogue.Select(s => s.Property).ToList();
        var own = slots.IndexOf(law.Predicts);
        Assert.InRange(own, 0, slots.Count - 1);
        Assert.All(law.Inputs, i => Assert.True(slots.IndexOf(i.Property) < own));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Units_fit_what_they_measure_and_the_example_lies_where_the_law_was_fitted(string id)
    {
        var law = Laws.Get(id);
        Assert.Equal(PropertyNames.Dimension(law.Predicts), law.Unit.Dimension);
        Assert.All(law.Inputs, i => Assert.Equal(PropertyNames.Dimension(i.Property), i.Unit.Dimension));
        Assert.All(law.Inputs.Zip(law.Example!.Inputs), p => Assert.True(p.First.Range.Contains(p.Second)));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void No_law_gives_what_cannot_exist(string id)
    {
        var law = Laws.Get(id);
        var possible = Interval.Physical(law.Predicts);
        for (var scale = 0.02; scale < 20; scale *= 1.15)
        {
            var result = Laws.Apply(id, [.. law.Inputs.Zip(law.Example!.Inputs, (i, x) => i.Unit.ToSi(scale * x))]);
            Assert.True(double.IsNaN(result) || possible.Contains(result), FormattableString.Invariant($"{result} at {scale}"));
        }
    }

    [Fact]
    public void A_strength_from_a_modulus_says_which_modulus()
    {
        foreach (var law in MethodCatalogue.For(Property.Ucs).Where(l => l.Inputs.Any(i => i.Property == Property.YoungsStatic)))
            Assert.Contains("the source does not say whether E is static", law.Validity, StringComparison.Ordinal);
    }

    [Fact]
    public void A_recalled_entry_says_so_and_a_partly_read_one_names_what_was_read()
    {
        foreach (var law in MethodCatalogue.All)
            Assert.Equal(law.Standing == Standing.FromMemory, law.Source.Contains("recalled", StringComparison.Ordinal));
        Assert.All(
            MethodCatalogue.All.Where(l => l.Id.StartsWith("brotons-2016", StringComparison.Ordinal)),
            l => Assert.Contains("read in the abstract", l.Validity, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_parameter_has_a_law_that_needs_it()
    {
        var needed = MethodCatalogue.All.SelectMany(l => l.Inputs).Select(i => LawParameters.Of(i.Property)?.Key).ToHashSet();
        string[] keys =
        [
            "[porosity] matrix_density", "[porosity] fluid_density", "[porosity] matrix_slowness", "[porosity] fluid_slowness", "[porosity] compaction_factor",
            "[biot] mineral_bulk_modulus", "[biot] mineral_shear_modulus", "[biot] matrix_shear_velocity", "[biot] critical_porosity",
            "[anisotropy] mud_density", "[anisotropy] mud_velocity", "[anisotropy] c11_factor", "[anisotropy] c12_factor",
            "[pore_pressure] bowers_a", "[pore_pressure] bowers_b", "[pore_pressure] bowers_u", "[pore_pressure] maximum_velocity", "[pore_pressure] compaction_stress",
            "[pore_pressure.normal_trend] surface_slowness", "[pore_pressure.normal_trend] matrix_slowness", "[pore_pressure.normal_trend] surface_porosity",
            "[pore_pressure.normal_trend] scale_length",
        ];
        Assert.All(keys, key => Assert.Contains(key, needed));
    }

    [Fact]
    public void Messages_list_few_choices_whole_and_many_in_part()
    {
        Assert.Equal("equal-to-dynamic", MethodCatalogue.Choices(Property.PoissonStatic));
        Assert.Equal(
            "lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"",
            MethodCatalogue.Choices(Property.YoungsStatic));
    }
}

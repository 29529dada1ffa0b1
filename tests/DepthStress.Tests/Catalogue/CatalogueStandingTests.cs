using DepthStress.Core.Catalogue;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Catalogue;

/// <summary>
/// What each entry may claim, kept apart from the entries on purpose: an entry is confirmed only when its numbers were read
/// in the named source. A new entry fails until it is listed here.
/// </summary>
public class CatalogueStandingTests
{
    private static readonly Dictionary<string, Standing> Claims = new()
    {
        ["linear-gamma-ray"] = Standing.Confirmed, // definition, printed in public shale-volume references
        ["larionov-1969-tertiary"] = Standing.Confirmed, // printed in public references, example in Asquith and Gibson 1982
        ["larionov-1969-older"] = Standing.Confirmed, // likewise
        ["density-porosity"] = Standing.Identity, // mass balance
        ["lacy-1997-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.64
        ["lacy-1997-shale"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.65
        ["lacy-1997-combined"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.66
        ["horsrud-2001-shale-modulus"] = Standing.Confirmed, // Zhang 2019 p. 96 eq. 3.9
        ["equal-to-dynamic"] = Standing.Confirmed, // Zhang 2019 p. 72
        ["horsrud-2001-shale"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["mcnally-1987-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 100 eq. 3.17
        ["lal-1999-shale"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["lal-1999-shale-friction"] = Standing.Confirmed, // Zoback 2007 p. 116 Table 4.4
        ["krief-1990-biot"] = Standing.FromMemory, // coefficient never read in the source
        ["traugott-1997"] = Standing.Confirmed, // Zhang 2019 p. 190 eqs 6.4-6.6
        ["miller-gulf"] = Standing.Confirmed, // Zhang 2019 p. 34 eqs 2.3-2.4
        ["eaton-1975-sonic"] = Standing.Confirmed, // drilling handbooks, after SPE 5544
    };

    [Fact]
    public void Every_entry_claims_no_more_than_was_read() =>
        Assert.Equal(Claims.OrderBy(c => c.Key), MethodCatalogue.All.Select(l => KeyValuePair.Create(l.Id, l.Standing)).OrderBy(c => c.Key));

    [Fact]
    public void A_recalled_entry_says_so_in_its_source_and_a_read_one_names_its_year()
    {
        foreach (var law in MethodCatalogue.All)
        {
            Assert.Equal(law.Standing == Standing.FromMemory, law.Source.Contains("recalled", StringComparison.Ordinal));
            if (law.Standing == Standing.Confirmed) Assert.Matches("(19|20)[0-9]{2}", law.Source);
        }
    }

    [Fact]
    public void No_entry_pretends_to_be_the_users() => Assert.DoesNotContain(MethodCatalogue.All, l => l.Standing == Standing.UserGiven);

    [Fact]
    public void A_recalled_formula_never_claims_a_printed_example() =>
        Assert.DoesNotContain(MethodCatalogue.All, l => l.Standing == Standing.FromMemory && l.Example!.Basis == ExampleBasis.Printed);
}

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
        ["clavier-1971"] = Standing.Confirmed, // public shale-volume references
        ["steiber-1970"] = Standing.Confirmed, // public shale-volume references
        ["wyllie-1956"] = Standing.Confirmed, // Gregory, Aspects of rock physics
        ["raymer-1980"] = Standing.Confirmed, // Dvorkin 2008, Geophysics 73(2)
        ["lacy-1997-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.64
        ["lacy-1997-shale"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.65
        ["lacy-1997-combined"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.66
        ["ohen-2003-shale"] = Standing.Confirmed, // Zhang 2019 p. 67 eq. 2.67
        ["horsrud-2001-shale-modulus"] = Standing.Confirmed, // Zhang 2019 p. 96 eq. 3.9
        ["equal-to-dynamic"] = Standing.Confirmed, // Zhang 2019 p. 72
        ["mcnally-1987-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 100 eq. 3.17
        ["gulf-north-sea-sandstone-slowness"] = Standing.Confirmed, // Zhang 2019 p. 100 eq. 3.18
        ["zhang-2013-weak-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 100 eq. 3.19
        ["moos-1999-sandstone"] = Standing.Confirmed, // Zhang 2019 pp. 101-102 eq. 3.20
        ["australia-sandstone-modulus"] = Standing.Confirmed, // Zhang 2019 p. 102 eq. 3.21
        ["bradford-1998-sandstone"] = Standing.Confirmed, // Zhang 2019 p. 102 eq. 3.22
        ["gulf-tertiary-sandstone-modulus"] = Standing.Confirmed, // Zhang 2019 p. 102 eq. 3.23
        ["mcnally-1987-coal-measures"] = Standing.Confirmed, // Oyler, Mark and Molinda 2008
        ["oyler-2008-coal-measures"] = Standing.Confirmed, // Oyler, Mark and Molinda 2008
        ["horsrud-2001-shale"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["gulf-pliocene-shale-slowness"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["worldwide-shale-slowness"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["gulf-shale-slowness"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["lal-1999-shale"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["horsrud-2001-shale-youngs"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["strong-shale-modulus"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["lashkaripour-1993-shale"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["horsrud-2001-shale-porosity"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["porous-shale-porosity"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["gulf-tertiary-shale-modulus"] = Standing.Confirmed, // Zhang 2019 pp. 98-99
        ["haynesville-shale-modulus"] = Standing.Confirmed, // Zhang 2019 p. 99
        ["haynesville-shale-porosity"] = Standing.Confirmed, // Zhang 2019 p. 98 fig. 3.9
        ["militzer-stoll-1973-carbonate"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["golubev-rabinovich-1976-carbonate"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["limestone-modulus"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["dolomite-modulus"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["rzhevsky-novik-1971-carbonate"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["middle-east-carbonate-porosity"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["carbonate-porosity"] = Standing.Confirmed, // Rock Physics Handbook p. 387
        ["lal-1999-shale-friction"] = Standing.Confirmed, // Zoback 2007 p. 116 Table 4.4
        ["shaly-rock-gamma-ray-friction"] = Standing.Confirmed, // Zoback 2007 p. 116 Table 4.4
        ["lee-2003-unconsolidated"] = Standing.Confirmed, // Zhang 2019 p. 78 eq. 2.89
        ["biot-willis-1957-static"] = Standing.Confirmed, // Zhang 2019 p. 75
        ["dry-rock-sonic-biot"] = Standing.Confirmed, // Zhang 2019 p. 75 eqs 2.80-2.81
        ["krief-1990-shear-modulus"] = Standing.Confirmed, // Zhang 2019 p. 78 eqs 2.90-2.91
        ["krief-1990-shear-porosity"] = Standing.Confirmed, // Zhang 2019 p. 79 eq. 2.94
        ["density-porosity"] = Standing.Identity, // mass balance
        ["zhang-2002-tensile-toughness"] = Standing.FromMemory,
        ["whittaker-1992-tensile-toughness"] = Standing.FromMemory,
        ["whittaker-1992-ucs-toughness"] = Standing.FromMemory,
        ["whittaker-1992-modulus-toughness"] = Standing.FromMemory,
        ["whittaker-1992-velocity-toughness"] = Standing.FromMemory,
        ["rickman-2008"] = Standing.FromMemory,
        ["strength-ratio-brittleness"] = Standing.Identity, // definition
        ["strength-contrast-brittleness"] = Standing.Identity, // definition
        ["griffith-tensile"] = Standing.Identity, // from Griffith's criterion
        ["hashin-shtrikman-bound"] = Standing.Identity, // from the bound on the bulk modulus

        // Coefficients never read in their sources.
        ["steiber-1970-gentle"] = Standing.FromMemory,
        ["steiber-1970-steep"] = Standing.FromMemory,
        ["wyllie-1956-compaction"] = Standing.FromMemory,
        ["raymer-1980-short"] = Standing.FromMemory,
        ["bradford-1998-sandstone-modulus"] = Standing.FromMemory,
        ["fei-2016-sandstone"] = Standing.FromMemory,
        ["van-heerden-1987-10-mpa"] = Standing.FromMemory,
        ["van-heerden-1987-40-mpa"] = Standing.FromMemory,
        ["morales-1993-sandstone-10-15"] = Standing.FromMemory,
        ["morales-1993-sandstone-15-25"] = Standing.FromMemory,
        ["morales-1993-sandstone-above-25"] = Standing.FromMemory,
        ["ameen-2009-carbonate"] = Standing.FromMemory,
        ["najibi-2015-limestone"] = Standing.FromMemory,
        ["najibi-2015-limestone-velocity"] = Standing.FromMemory,
        ["brotons-2014-calcarenite"] = Standing.FromMemory,
        ["brotons-2014-calcarenite-density"] = Standing.FromMemory,
        ["eissa-kazi-1988-linear"] = Standing.FromMemory,
        ["eissa-kazi-1988-log"] = Standing.FromMemory,
        ["wang-2000-soft"] = Standing.FromMemory,
        ["wang-2000-hard"] = Standing.FromMemory,
        ["canady-2011"] = Standing.FromMemory,
        ["brotons-2016-linear"] = Standing.FromMemory,
        ["brotons-2016-log"] = Standing.FromMemory,
        ["brotons-2016-density"] = Standing.FromMemory,
        ["king-1983-crystalline"] = Standing.FromMemory,
        ["mccann-entwisle-1992"] = Standing.FromMemory,
        ["mockovciakova-pandula-2003"] = Standing.FromMemory,
        ["belikov-1970-granite"] = Standing.FromMemory,
        ["gulf-coast-sandstone-slowness"] = Standing.FromMemory,
        ["freyburg-1972-sandstone"] = Standing.FromMemory,
        ["gulf-of-mexico-sandstone-modulus"] = Standing.FromMemory,
        ["fjaer-1992-sandstone"] = Standing.FromMemory,
        ["sandstone-modulus"] = Standing.FromMemory,
        ["vernik-1993-sandstone"] = Standing.FromMemory,
        ["sandstone-porosity"] = Standing.FromMemory,
        ["mcnally-1987-coal-measures-mpa"] = Standing.FromMemory,
        ["weingarten-perkins-1995-sandstone"] = Standing.FromMemory,
        ["plumb-1994-clastic"] = Standing.FromMemory,
        ["tenth-of-ucs"] = Standing.FromMemory,
        ["twelfth-of-ucs"] = Standing.FromMemory,
        ["krief-1990-biot"] = Standing.FromMemory,
        ["consolidated-rock-biot"] = Standing.FromMemory,
        ["nur-1998-critical-porosity"] = Standing.FromMemory,
        ["castagna-1993-sandstone"] = Standing.FromMemory,
        ["castagna-1993-shale"] = Standing.FromMemory,
        ["castagna-1993-limestone"] = Standing.FromMemory,
        ["castagna-1993-dolomite"] = Standing.FromMemory,
        ["greenberg-castagna-1992-sandstone"] = Standing.FromMemory,
        ["greenberg-castagna-1992-shale"] = Standing.FromMemory,
        ["greenberg-castagna-1992-limestone"] = Standing.FromMemory,
        ["greenberg-castagna-1992-dolomite"] = Standing.FromMemory,
        ["greenberg-castagna-1992"] = Standing.FromMemory,
        ["greenberg-castagna-1992-marl"] = Standing.FromMemory,
        ["han-1986-sandstone"] = Standing.FromMemory,
        ["pickett-1963-limestone"] = Standing.FromMemory,
        ["pickett-1963-dolomite"] = Standing.FromMemory,
        ["pickett-1963-sandstone"] = Standing.FromMemory,
        ["krief-1990-wet-sandstone"] = Standing.FromMemory,
        ["krief-1990-gas-sandstone"] = Standing.FromMemory,
        ["krief-1990-shaly-sandstone"] = Standing.FromMemory,
        ["krief-1990-limestone"] = Standing.FromMemory,
        ["castagna-1993-shale-power"] = Standing.FromMemory,
        ["castagna-1993-shale-quadratic"] = Standing.FromMemory,
        ["castagna-1993-sandstone-power"] = Standing.FromMemory,
        ["castagna-1993-sandstone-quadratic"] = Standing.FromMemory,
        ["castagna-1993-limestone-power"] = Standing.FromMemory,
        ["castagna-1993-limestone-quadratic"] = Standing.FromMemory,
        ["castagna-1993-dolomite-power"] = Standing.FromMemory,
        ["castagna-1993-dolomite-quadratic"] = Standing.FromMemory,
        ["castagna-1993-anhydrite-power"] = Standing.FromMemory,
        ["castagna-1993-anhydrite-quadratic"] = Standing.FromMemory,
        ["lindseth-1979"] = Standing.FromMemory,
        ["bellotti-1978-consolidated"] = Standing.FromMemory,
        ["bellotti-1978-unconsolidated"] = Standing.FromMemory,
        ["castagna-1985-mudrock"] = Standing.Confirmed, // Castagna, Batzle and Eastwood 1985
        ["han-1986-shaly-sandstone"] = Standing.Confirmed, // Han, Nur and Morgan 1986, abstract
        ["dvorkin-2008"] = Standing.Confirmed, // Geophysics 73(2) E35-E39
        ["gardner-1974"] = Standing.Confirmed, // Gardner, Gardner and Gregory 1974
        ["gardner-1974-feet"] = Standing.Confirmed, // likewise, and Zhang 2019 p. 33
        ["traugott-1997"] = Standing.Confirmed, // Zhang 2019 p. 190 eqs 6.4-6.6
        ["barker-wood-1997"] = Standing.FromMemory, // coefficients recalled
        ["miller-gulf"] = Standing.Confirmed, // Zhang 2019 p. 34 eqs 2.3-2.4
        ["hubbert-willis-1957-least"] = Standing.Confirmed, // exercise after Bourgoyne and others 1986
        ["hubbert-willis-1957-greatest"] = Standing.Confirmed, // likewise
        ["matthews-kelly-1967"] = Standing.Confirmed, // likewise
        ["eaton-1969"] = Standing.Confirmed, // likewise, and Lapeyrouse
        ["breckels-1982-gulf-coast"] = Standing.Confirmed, // Zhang 2019 p. 209
        ["breckels-1982-gulf-coast-deep"] = Standing.Confirmed, // Zhang 2019 p. 209
        ["breckels-1982-venezuela"] = Standing.Confirmed, // Zhang 2019 p. 209
        ["breckels-1982-brunei"] = Standing.FromMemory, // Zhang 2019 p. 209, its normal gradient recalled
        ["holbrook-1993"] = Standing.FromMemory,
        ["bonaparte-sub-basin-depth"] = Standing.Confirmed, // Zhang 2019 pp. 209-210
        ["ekofisk-field-depth"] = Standing.Confirmed, // Zhang 2019 pp. 209-210
        ["eaton-1975-sonic"] = Standing.Confirmed, // drilling handbooks, after SPE 5544
        ["white-stoneley-c66"] = Standing.FromMemory,
        ["annie-1996-shale"] = Standing.FromMemory, // delta = 0 read in the abstract, the second link recalled
        ["modified-annie-c11"] = Standing.FromMemory,
        ["modified-annie-c13"] = Standing.FromMemory,
        ["eaton-1975-resistivity"] = Standing.Confirmed, // drilling handbooks, after SPE 5544
        ["bowers-1995-loading"] = Standing.Confirmed, // Rezaee 2015 p. 150 eq. 7.15; A and B are the user's
        ["bowers-1995-unloading"] = Standing.Confirmed, // Rezaee 2015 p. 150 eq. 7.16; A, B, U and V_max are the user's
        ["zhang-2011-porosity"] = Standing.Confirmed, // abstract of Zhang 2013
        ["zhang-2011-sonic"] = Standing.Confirmed, // abstract of Zhang 2013
        ["equivalent-depth-sonic"] = Standing.Confirmed, // Rezaee 2015 p. 150 eq. 7.14
        ["compaction-porosity"] = Standing.Identity, // algebra
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

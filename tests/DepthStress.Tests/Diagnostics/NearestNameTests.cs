using DepthStress.Core.Diagnostics;

namespace DepthStress.Tests.Diagnostics;

public class NearestNameTests
{
    private static readonly string[] Keys = ["name", "datum", "datum_elevation", "ground_elevation", "water_depth"];

    [Theory]
    [InlineData("datum", "datum")]
    [InlineData("Datum", "datum")]
    [InlineData("datun", "datum")]
    [InlineData("dtum", "datum")]
    [InlineData("ddatum", "datum")]
    [InlineData("datmu", "datum")]
    [InlineData("datum_elev", null)]
    [InlineData("datumelevation", "datum_elevation")]
    [InlineData("water-dept", "water_depth")]
    [InlineData("nmae", "name")]
    [InlineData("completely_else", null)]
    [InlineData("", null)]
    public void The_closest_known_name_is_found(string typed, string? expected) => Assert.Equal(expected, NearestName.Find(typed, Keys));

    [Theory]
    [InlineData("kitten", "sitting")] // three edits, Levenshtein's measure (textbook example, from memory): too many for six letters
    [InlineData("ab", "xy")]
    [InlineData("a", "xy")]
    [InlineData("a", "x")]
    public void A_name_too_far_away_is_not_offered(string typed, string candidate) => Assert.Null(NearestName.Find(typed, [candidate]));

    [Fact]
    public void The_limit_is_a_third_of_the_length_and_two_at_least()
    {
        Assert.Equal("abc", NearestName.Find("axy", ["abc"]));
        Assert.Equal("abcdefghi", NearestName.Find("xyzdefghi", ["abcdefghi"])); // 3 edits of 9 letters
        Assert.Null(NearestName.Find("wxyzefghi", ["abcdefghi"])); // 4 edits of 9 letters
    }

    [Fact]
    public void Ties_go_to_the_first_name_and_fewer_edits_go_first()
    {
        Assert.Equal("cat", NearestName.Find("bat", ["cat", "hat"]));
        Assert.Equal("hat", NearestName.Find("hap", ["cat", "hat"]));
    }

    [Fact]
    public void The_hint_is_a_phrase_or_nothing()
    {
        Assert.Equal("; did you mean \"datum\"?", NearestName.Hint("datun", Keys));
        Assert.Equal("", NearestName.Hint("completely_else", Keys));
        Assert.Equal("", NearestName.Hint("datum", []));
    }

    [Fact]
    public void A_very_long_word_is_not_compared() => Assert.Null(NearestName.Find(new string('a', 101), [new string('a', 101)]));
}

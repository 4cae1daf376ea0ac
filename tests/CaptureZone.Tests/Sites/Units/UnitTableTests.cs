using System.Globalization;
using CaptureZone.Sites.Units;

namespace CaptureZone.Tests.Sites.Units;

public sealed class UnitTableTests
{
    [Theory]
    [InlineData("18 m/d", Dimension.Conductivity, 18.0)]
    [InlineData("0.15 m", Dimension.Length, 0.15)]
    [InlineData("-3.2 m", Dimension.Length, -3.2)]
    [InlineData("1 yr", Dimension.Time, 365.25)]
    [InlineData("2 d", Dimension.Resistance, 2.0)]
    [InlineData("36525 mm/yr", Dimension.Recharge, 0.1)]
    [InlineData("18 m/d", Dimension.Recharge, 18.0)]
    [InlineData("216 m2/d", Dimension.Transmissivity, 216.0)]
    [InlineData("6.5 L/s", Dimension.Rate, 561.6)]
    [InlineData("1.5e-3 m/s", Dimension.Conductivity, 129.6)]
    [InlineData("1E3 m3/d", Dimension.Rate, 1000.0)]
    [InlineData("+2 ha", Dimension.Area, 20_000.0)]
    [InlineData("0 m/d", Dimension.Conductivity, 0.0)]
    [InlineData("3937 ftUS", Dimension.Length, 1200.0)]
    public void A_number_with_a_unit_is_read_into_metres_and_days(string text, Dimension dimension, double expected)
    {
        Assert.True(UnitTable.TryRead(text, dimension, out double value, out string problem), problem);
        Assert.Equal(expected, value);
        Assert.Empty(problem);
    }

    [Theory]
    [InlineData("m2/d", "m\u00B2/d", "m^2/d", "m2/day", "m2 / d", "square metres a day")]
    [InlineData("ft/d", "feet/day", "ft/day", "foot/d", "ft./d", "feet a day")]
    [InlineData("gpm", "gal/min", "GPM", "gallons/minute", "gal./min.", "gallons")]
    [InlineData("acre-ft/yr", "ac-ft/yr", "acre-feet/year", "acre ft/yr", "ac-ft / yr", "acre")]
    [InlineData("m3/d", "m\u00B3/d", "m^3/day", "meters3/day", "metres^3 / d", "m3")]
    [InlineData("um/s", "\u00B5m/s", "\u03BCm/s", "um/sec", "um / s", "um")]
    [InlineData("cfs", "ft3/s", "ft\u00B3/s", "CFS", "feet3/second", "c f")]
    [InlineData("ftUS", "US ft", "ft US", "usft", "survey feet", "feet of a survey")]
    [InlineData("yr", "year", "years", "yrs", "yr.", "century")]
    public void A_unit_is_read_in_its_usual_spellings_only(string symbol, string one, string two, string three, string four, string unknown)
    {
        Unit unit = UnitTable.Named(symbol);
        foreach (string spelling in new[] { symbol, one, two, three, four })
        {
            Assert.True(UnitTable.TryRead($"3{spelling}", unit.Dimension, out double value, out string problem), problem);
            Assert.Equal(3 * unit.Factor, value, unit.Factor * 1e-15);
        }

        Assert.False(UnitTable.TryRead($"3 {unknown}", unit.Dimension, out _, out _));
    }

    [Theory]
    [InlineData("6.5 m", Dimension.Rate, "'6.5 m' is a length; a pumping rate is expected, such as \"6.5 L/s\"")]
    [InlineData("18 m/d", Dimension.Transmissivity, "'18 m/d' is a conductivity or a rate of recharge; a transmissivity is expected, such as \"18 m2/d\"")]
    [InlineData("216 m2/d", Dimension.Conductivity, "'216 m2/d' is a transmissivity; a hydraulic conductivity is expected, such as \"216 m/d\"")]
    [InlineData("5 gpm", Dimension.Recharge, "'5 gpm' is a pumping rate; a rate of recharge is expected, such as \"5 mm/yr\"")]
    [InlineData("5 m", Dimension.Resistance, "'5 m' is a length; a resistance (a time) is expected, such as \"5 d\"")]
    [InlineData("5 ha", Dimension.Length, "'5 ha' is an area; a length is expected, such as \"5 m\"")]
    [InlineData("5 yr", Dimension.Area, "'5 yr' is a time; an area is expected, such as \"5 m2\"")]
    [InlineData("18", Dimension.Conductivity, "'18' has no unit; a hydraulic conductivity is expected, such as \"18 m/d\"")]
    [InlineData("5", Dimension.Time, "'5' has no unit; a time is expected, such as \"5 yr\"")]
    [InlineData("L/s", Dimension.Rate, "'L/s' does not start with a number; a pumping rate is expected, such as \"6.5 L/s\"")]
    [InlineData("", Dimension.Rate, "'' does not start with a number; a pumping rate is expected, such as \"6.5 L/s\"")]
    [InlineData("nan m", Dimension.Length, "'nan m' does not start with a number; a length is expected, such as \"6.5 m\"")]
    [InlineData(". m", Dimension.Length, "'. m' does not start with a number; a length is expected, such as \"6.5 m\"")]
    [InlineData("35 GPm", Dimension.Rate, "unknown unit 'GPm'; the nearest known is \"gpm\": write \"35 gpm\" if that is meant")]
    [InlineData("35 mgdd", Dimension.Rate, "unknown unit 'mgdd'; the nearest known is \"MGD\": write \"35 MGD\" if that is meant")]
    [InlineData("18 m/dy", Dimension.Conductivity, "unknown unit 'm/dy'; the nearest known is \"m/d\": write \"18 m/d\" if that is meant")]
    [InlineData("3 fathoms", Dimension.Length, "unknown unit 'fathoms'; a length is expected, such as \"3 m\"")]
    [InlineData("1,000 gpm", Dimension.Rate, "'1,000 gpm' is not read as a number; write it with '.' as the decimal sign and nothing between thousands, such as \"1234.5 L/s\"")]
    [InlineData("1.000.000 m", Dimension.Length, "'1.000.000 m' is not read as a number; write it with '.' as the decimal sign and nothing between thousands, such as \"1234.5 m\"")]
    [InlineData("1_000 m", Dimension.Length, "'1_000 m' is not read as a number; write it with '.' as the decimal sign and nothing between thousands, such as \"1234.5 m\"")]
    [InlineData("1e400 m", Dimension.Length, "'1e400 m' is too large to compute with; give a number that is physically possible")]
    [InlineData("1e308 km", Dimension.Length, "'1e308 km' is too large to compute with; give a number that is physically possible")]
    [InlineData("1e999999999999 km", Dimension.Length, "'1e999999999999 km' is too large to compute with; give a number that is physically possible")]
    [InlineData("5\n\nfathoms", Dimension.Length, "unknown unit 'fathoms'; a length is expected, such as \"5 m\"")]
    public void What_cannot_be_read_says_what_was_found_and_how_to_mend_it(string text, Dimension dimension, string expected)
    {
        Assert.False(UnitTable.TryRead(text, dimension, out double value, out string problem));
        Assert.Equal(expected, problem);
        Assert.Equal(0, value);
    }

    [Fact]
    public void A_number_too_small_for_a_double_is_zero()
    {
        Assert.True(UnitTable.TryRead("1e-999999999999 m", Dimension.Length, out double value, out _));
        Assert.Equal(0, value);
    }

    [Fact]
    public void A_very_long_text_is_cut_in_the_problem()
    {
        Assert.False(UnitTable.TryRead(new string('x', 5000), Dimension.Length, out _, out string problem));
        Assert.Equal($"'{new string('x', 40)}...' does not start with a number; a length is expected, such as \"6.5 m\"", problem);
    }

    [Fact]
    public void Twelve_inches_are_one_foot_to_the_last_bit()
    {
        Assert.True(UnitTable.TryRead("12 in", Dimension.Length, out double inches, out _));
        Assert.True(UnitTable.TryRead("1 ft", Dimension.Length, out double foot, out _));
        Assert.True(UnitTable.TryRead("0.3048 m", Dimension.Length, out double metres, out _));
        Assert.Equal(BitConverter.DoubleToInt64Bits(foot), BitConverter.DoubleToInt64Bits(inches));
        Assert.Equal(BitConverter.DoubleToInt64Bits(foot), BitConverter.DoubleToInt64Bits(metres));
    }

    [Fact]
    public void Every_value_in_the_base_units_reads_as_the_nearest_double()
    {
        // The runtime's own parser rounds correctly; the exact route must agree with it to the last bit.
        foreach (string text in new[] { "0.1", "1e23", "9007199254740993", "2.2250738585072014e-308", "1.7976931348623157e308", "0.30000000000000004", "123456.789e-30" })
        {
            Assert.True(UnitTable.TryRead($"{text} m", Dimension.Length, out double value, out string problem), problem);
            Assert.Equal(BitConverter.DoubleToInt64Bits(double.Parse(text, CultureInfo.InvariantCulture)), BitConverter.DoubleToInt64Bits(value));
        }
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("fa-IR")]
    public void Reading_is_the_same_in_every_culture(string culture)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.True(UnitTable.TryRead("-1.5e-1 in/yr", Dimension.Recharge, out double value, out _));
            Assert.Equal(-0.15 * 0.0254 / 365.25, value, 1e-19);
            Assert.False(UnitTable.TryRead("1.5 GPm", Dimension.Rate, out _, out string problem));
            Assert.Equal("unknown unit 'GPm'; the nearest known is \"gpm\": write \"1.5 gpm\" if that is meant", problem);
            Assert.Equal("0.0254", UnitTable.Named("in").ExactFactor);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void No_two_units_share_a_spelling_and_each_is_found_by_every_one_of_its_own()
    {
        foreach (Unit unit in UnitTable.Units)
        {
            foreach (string text in unit.AlsoWritten.Prepend(unit.Symbol))
            {
                Assert.Same(unit, UnitTable.Named(text));
            }
        }
    }
}

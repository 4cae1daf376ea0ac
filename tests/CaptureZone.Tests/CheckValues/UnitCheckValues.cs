using CaptureZone.Sites.Units;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// 17a and 17c. Source of 17a: published, exact definitions; NIST Special Publication 811, Appendix B, FROM MEMORY.
/// Source of 17c: own computation, the Julian year of 365.25 d. Tolerances: the larger of the one named (1e-9 for 17a, 1e-6 for
/// 17c) and half the last digit that the list prints.
/// </summary>
public sealed class UnitCheckValues
{
    [Theory]
    [InlineData("gpm", "m3/d", 5.45099296896, 1e-9)]
    [InlineData("MGD", "m3/d", 3785.411784, 1e-9)]
    [InlineData("cfs", "m3/d", 2446.57554555, 1e-9)]
    [InlineData("gpd/ft2", "m/d", 0.0407458333333, 1e-9)]
    [InlineData("gpd/ft", "m2/d", 0.01241933, 1e-9)]
    [InlineData("ft/d", "m/d", 0.3048, 1e-9)]
    [InlineData("ft2/d", "m2/d", 0.09290304, 1e-9)]
    [InlineData("cm/s", "m/d", 864, 1e-9)]
    [InlineData("m/s", "m/d", 86400, 1e-9)]
    [InlineData("cm/s", "ft/d", 2834.645669, 1e-9)]
    [InlineData("gpm", "m3/s", 6.30901964e-05, 1e-9)]
    [InlineData("acre", "m2", 4046.8564224, 1e-9)]
    [InlineData("in/yr", "m/d", 6.954140999e-05, 1e-9)]
    public void Factor_17a(string from, string to, double published, double relativeTolerance) =>
        Assert.Equal(published, UnitTable.Named(from).Factor / UnitTable.Named(to).Factor, published * relativeTolerance);

    [Fact]
    public void Gallon_and_acre_foot_17a()
    {
        Assert.Equal(0.0037854117839999997, UnitTable.Named("gpd").Factor, 0.0038 * 1e-9);
        Assert.Equal(7.48051948052, UnitTable.Named("ft3/d").Factor / UnitTable.Named("gpd").Factor, 7.5e-9);
        Assert.Equal(1233.48183755, UnitTable.Named("acre-ft/d").Factor, 1.2e-6);
    }

    /// <summary>The US survey foot: 1200/3937 m, 2 parts in a million longer than the international one (17a's note).</summary>
    [Fact]
    public void Survey_foot_17a()
    {
        Assert.Equal("1200 / 3937", UnitTable.Named("ftUS").ExactFactor);
        Assert.Equal(2e-6, UnitTable.Named("ftUS").Factor / UnitTable.Named("ft").Factor - 1, 1e-10);
    }

    [Fact]
    public void Year_17c()
    {
        double year = UnitTable.Named("yr").Factor;
        Assert.Equal(365.25, year);
        // A fixed radius grows with the root of time: the year's length changes it by this share.
        Assert.Equal(0.0003424, Math.Sqrt(year / 365) - 1, 0.5e-7);
    }
}

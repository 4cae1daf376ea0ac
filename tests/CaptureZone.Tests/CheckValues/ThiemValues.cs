using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Lone wells without regional flow: G. Thiem, 1906 (confined), and J. Dupuit's water table. The engine is asked in the units of
/// each source (any length and any time will do as long as they are the same throughout).
/// </summary>
public sealed class ThiemValues
{
    /// <summary>Gallons (US) in a cubic foot: 1728 / 231 by definition.</summary>
    private const double GallonsPerCubicFoot = 1728.0 / 231;

    private const double MinutesPerDay = 1440;
    private const double SecondsPerDay = 86_400;

    /// <summary>
    /// Case 6a, published and recomputed, seen (a textbook's problem 6.4, solution page; author not shown): b 20 m, Q 0.1 m3/s, drawdown
    /// 4 m at 10 m and 3 m at 60 m give K 123.192 m/d and 6.0588 m at the screen of 0.25 m. Tolerance 0.2 %.
    /// </summary>
    [Fact]
    public void Two_observed_drawdowns_give_the_conductivity_and_the_drawdown_at_the_screen()
    {
        FlowField field = Lone(new Aquifer(123.192, 0, 20, 0.2), 0.1 * SecondsPerDay, knownHead: 100 - 3, at: 60);
        Assert.Equal(100 - 4, field.HeadAt(10), 0.002 * 4);
        Assert.Equal(100 - 6.0588, field.HeadAt(0.25), 0.002 * 6.0588);
    }

    /// <summary>
    /// Case 6b, published and recomputed, seen (solution page; the problem is in K. Subramanya, Engineering Hydrology: from memory): K 45 m/d,
    /// b 20 m, R 300 m, rw 0.15 m; 2231.919 m3/d draw 3 m down. Tolerance 0.01 %.
    /// </summary>
    [Fact]
    public void A_rate_and_a_radius_of_influence_give_the_drawdown_at_the_screen()
    {
        FlowField field = Lone(new Aquifer(45, 0, 20, 0.2), 2231.919, knownHead: 100, at: 300);
        Assert.Equal(100 - 3, field.HeadAt(0.15), 1e-4 * 3);
    }

    /// <summary>
    /// Case 6c, published and recomputed, seen (J. Kuo, Practical Design Calculations, 2nd ed. 2014, ex. 3.10, p. 84): a water table of
    /// 80 ft, 40 gpm, K 200 gpd/ft2, drawdown 5 ft at 10 ft; in feet and days. Tolerance 0.1 ft; the more exact figures were recomputed.
    /// </summary>
    [Fact]
    public void A_water_table_is_drawn_down_as_printed()
    {
        Aquifer aquifer = new(200 / GallonsPerCubicFoot, 0, null, 0.2);
        FlowField field = Lone(aquifer, 40 * MinutesPerDay / GallonsPerCubicFoot, knownHead: 80 - 5, at: 10);
        Assert.Equal(75.7, field.HeadAt(30), 0.1);
        Assert.Equal(72.5, field.HeadAt(2.0 / 12), 0.1);
        Assert.Equal(75.6684, field.HeadAt(30), 5e-5);
        Assert.Equal(72.4545, field.HeadAt(2.0 / 12), 5e-5);
    }

    /// <summary>
    /// Case 6e: constants of the handbook forms, seen (Kuo 2014; G.M. Fair and others), figures computed; tolerance 1e-6 relative. Here: drawdown
    /// between two radii ten times apart, for a transmissivity and a rate of one.
    /// </summary>
    [Theory]
    [InlineData(MinutesPerDay, 527.7136)] // s = 528 Q / T log10(r2 / r1): gpm, gpd/ft, ft
    [InlineData(1, 0.3664678)] // s = 0.366 Q / T log10(r2 / r1): consistent units
    [InlineData(2.728753, 1)] // Q = 2.73 T s / log10(r2 / r1): consistent units
    public void Handbook_constants_of_confined_wells_are(double rate, double constant)
    {
        FlowField field = Lone(new Aquifer(1, 0, 1, 0.2), rate, knownHead: 10_000, at: 100);
        double drawdown = 10_000 - field.HeadAt(10);
        Assert.Equal(constant, drawdown, 1e-6 * constant);
    }

    /// <summary>Case 6e: h2^2 - h1^2 over a tenfold radius for a conductivity and a rate of one. Tolerance 1e-6 relative.</summary>
    [Theory]
    [InlineData(MinutesPerDay, 1055.427)] // Q = K (h2^2 - h1^2) / (1055 log10(r2 / r1)): gpm, gpd/ft2, ft
    [InlineData(1.364376, 1)] // Q = 1.366 K (h2^2 - h1^2) / log10(r2 / r1): consistent units
    public void Handbook_constants_of_water_table_wells_are(double rate, double constant)
    {
        FlowField field = Lone(new Aquifer(1, 0, null, 0.2), rate, knownHead: 50, at: 100);
        double near = field.HeadAt(10);
        Assert.Equal(constant, 50 * 50 - near * near, 1e-6 * constant);
    }

    private static FlowField Lone(Aquifer aquifer, double rate, double knownHead, double at) => Superposed.Field(
        aquifer, new RegionalFlow(Gradient: 0, Direction: 0, Head: knownHead, HeadAt: new Complex(at, 0)), Superposed.Well(0, 0, rate));
}

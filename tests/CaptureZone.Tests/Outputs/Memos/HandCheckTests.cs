using CaptureZone.Outputs.Memos;

namespace CaptureZone.Tests.Outputs.Memos;

/// <summary>
/// Formulas worked by hand against published values. Legend: SEEN = the source's text was read; FROM MEMORY = recalled, not read.
/// </summary>
public sealed class HandCheckTests
{
    private const double Foot = 0.3048;

    /// <summary>231 cubic inches, 1440 times a day, m3/d.</summary>
    private const double GallonsPerMinute = 231 * 0.0254 * 0.0254 * 0.0254 * 1440;

    /// <summary>A US gallon, m3.</summary>
    private const double Gallon = 231 * 0.0254 * 0.0254 * 0.0254;

    /// <summary>
    /// Check value 1a: K 15 m/d, b 20 m, i 0.002, Q 600 m3/d; computed from a published formula, formula SEEN (Kuo 2014 eq. 6.3; a county
    /// file quoting EPA/600/R-08/003); Todd 1980, Javandel and Tsang 1986 FROM MEMORY; tolerance 1e-6 relative.
    /// </summary>
    [Fact]
    public void A_lone_well_in_uniform_flow_has_the_published_distance_and_widths()
    {
        const double Discharge = 15 * 20 * 0.002;
        Assert.Equal(159.15494, HandCheck.StagnationDistance(600, Discharge), 159 * 1e-6);
        Assert.Equal(2 * 250.0, HandCheck.WidthAtWell(600, Discharge), 500 * 1e-6);
        Assert.Equal(1000.0, HandCheck.WidthUpgradient(600, Discharge), 1000 * 1e-6);
    }

    /// <summary>
    /// Check value 1c: 50 gpm, K 1000 gpd/ft2, i 0.015, B 80 ft; published 9.6 ft, 15 ft, 30 ft, recomputed 9.5493, 15, 30; SEEN: Kuo 2014,
    /// Practical Design Calculations, 2nd ed., CRC, example 6.6; tolerance 0.05 ft.
    /// </summary>
    [Fact]
    public void A_textbook_example_in_gallons_and_feet_comes_out()
    {
        const double Conductivity = 1000 * Gallon / (Foot * Foot);
        const double Discharge = Conductivity * 80 * Foot * 0.015;
        const double Rate = 50 * GallonsPerMinute;
        Assert.Equal(9.5493, HandCheck.StagnationDistance(Rate, Discharge) / Foot, 0.05);
        Assert.Equal(2 * 15.0, HandCheck.WidthAtWell(Rate, Discharge) / Foot, 0.05);
        Assert.Equal(2 * 30.0, HandCheck.WidthUpgradient(Rate, Discharge) / Foot, 0.05);
    }

    /// <summary>
    /// Check value 5a: 694.4 gpm, n 0.2, H 300 ft, 5 yr of 365.25 d gives 1138.02 ft (published, recalled: 1138 ft); FROM MEMORY: EPA
    /// 440/6-87-010 (1987); tolerance 1 ft.
    /// </summary>
    [Fact]
    public void The_calculated_fixed_radius_is_the_one_of_the_guidelines() => Assert.Equal(
        1138.02, HandCheck.FixedRadius(694.4 * GallonsPerMinute, 5 * 365.25, 0.2, 300 * Foot) / Foot, 1.0);

    /// <summary>Check value 5d: 1500 m3/d, 1826.25 d, n 0.2, H 30 m; computed, own; pi r2 n H = Q t; tolerance 1e-6 relative.</summary>
    [Fact]
    public void The_calculated_fixed_radius_holds_what_the_well_takes()
    {
        double radius = HandCheck.FixedRadius(1500, 1826.25, 0.2, 30);
        Assert.Equal(381.21957, radius, 381 * 1e-6);
        Assert.Equal(radius, HandCheck.EquivalentRadius(456562.5), 381 * 1e-6);
    }
}

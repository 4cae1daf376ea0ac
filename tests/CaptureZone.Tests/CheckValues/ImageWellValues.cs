using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Case 7b: drawdown by images, T 250 m2/d, Q 800 m3/d, d 120 m from the line x = 0, screen 0.2 m. Formula seen (G.M. Fair, J.C. Geyer,
/// D.A. Okun, 3rd ed. by N.K. Shammas and L.K. Wang, 2011, eq. 3.36); numbers computed from it; tolerance 1e-6 relative. The drawdown at the
/// screen is taken at its landward point.
/// </summary>
public sealed class ImageWellValues
{
    private const double Distance = 120;
    private const double Rate = 800;
    private const double Held = 100;
    private static readonly Aquifer Aquifer = new(Conductivity: 12.5, Base: 0, Top: 20, Porosity: 0.2);

    [Theory]
    [InlineData(120.2, 0, 3.6113707)]
    [InlineData(60, 0, 0.55951864)]
    [InlineData(200, 100, 0.49014186)]
    [InlineData(0, 50, 0)]
    public void Beside_a_straight_stream_the_drawdown_is(double x, double y, double drawdown)
    {
        FlowField field = WithImage(-Rate, knownAt: new Complex(0, 300));
        Assert.Equal(drawdown, Held - field.HeadAt(new Complex(x, y)), Math.Max(1e-6 * drawdown, 1e-12 * Held));
    }

    /// <summary>Radius of influence R 3000 m: s = 0 where the distances to well and image multiply to R2.</summary>
    [Theory]
    [InlineData(120.2, 0, 6.1832083)]
    [InlineData(60, 0, 3.4252353)]
    [InlineData(200, 100, 2.7223426)]
    [InlineData(0, 50, 3.1971892)]
    public void Beside_a_straight_tight_line_the_drawdown_is(double x, double y, double drawdown)
    {
        FlowField field = WithImage(Rate, knownAt: new Complex(0, Math.Sqrt(3000 * 3000 - Distance * Distance)));
        Assert.Equal(drawdown, Held - field.HeadAt(new Complex(x, y)), 1e-6 * drawdown);
    }

    /// <summary>The head does not change across the tight line: dh/dx = 0 on it.</summary>
    [Fact]
    public void No_water_crosses_a_tight_line() =>
        Assert.Equal(0, WithImage(Rate, knownAt: 3000).DischargeAt(new Complex(0, 77)).Real, 1e-12);

    private static FlowField WithImage(double image, Complex knownAt) => Superposed.Field(
        Aquifer,
        new RegionalFlow(Gradient: 0, Direction: 0, Head: Held, HeadAt: knownAt),
        Superposed.Well(Distance, 0, Rate, radius: 0.2),
        Superposed.Well(-Distance, 0, image, radius: 0.2));
}

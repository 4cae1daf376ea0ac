using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Water-table and mixed flow by the discharge potential. Sources: S. Grubb, Ground Water 31(1), 27-32, 1993, doi
/// 10.1111/j.1745-6584.1993.tb00824.x (abstract seen, equations from memory and re-derived); O.D.L. Strack, Groundwater
/// Mechanics, 1989 (from memory). The numbers are computed from the published formulas; tolerance 1e-6 relative.
/// Regional flow toward -x, the well at the origin.
/// </summary>
public sealed class WaterTableValues
{
    private const double Tolerance = 1e-6;

    /// <summary>K 25 m/d; heads 21 and 19 m, 1000 m apart, before pumping: Q0 = K (h1^2 - h2^2) / (2 L) = 1 m2/d.</summary>
    private static readonly Aquifer Table = new(Conductivity: 25, Base: 0, Top: null, Porosity: 0.2);

    private static readonly RegionalFlow Regional = new(Gradient: 0.002, Direction: Math.PI, Head: 20, HeadAt: new Complex(1000, 0));

    /// <summary>Q 400 m3/d.</summary>
    private static readonly FlowField Pumped = Superposed.Field(Table, Regional, Superposed.Well(0, 0, 400));

    /// <summary>Case 3a; also what the gradient of the site file means: Q0 = K x saturated thickness at the known head x gradient.</summary>
    [Fact]
    public void Uniform_discharge_follows_from_two_heads_of_a_water_table()
    {
        Assert.Equal(1, Pumped.Parameters.Regional.Discharge(Table).Magnitude, Tolerance);
        FlowField unpumped = Superposed.Field(Table, Regional with { Gradient = 1 / (25 * 21.0), Head = 21, HeadAt = new Complex(500, 0) });
        Assert.Equal(19, unpumped.HeadAt(new Complex(-500, 0)), 19 * Tolerance);
    }

    /// <summary>Case 3a. The printed place is rounded to 1e-6 m, where the discharge changes by 0.016 m/d.</summary>
    [Fact]
    public void Water_stands_still_downstream_of_the_well() =>
        Assert.Equal(0, Pumped.DischargeAt(new Complex(-63.661977, 0)).Magnitude, Tolerance);

    /// <summary>Case 3a. No water crosses from the stagnation point to any place on the dividing streamline.</summary>
    [Theory]
    [InlineData(-50, 50)]
    [InlineData(0, 100)]
    [InlineData(150, 150)]
    [InlineData(553.983, 180)]
    public void Dividing_streamline_runs_through(double x, double y) =>
        Assert.Equal(0, Pumped.FluxAcross(new Complex(-63.661977, 0), new Complex(x, y)), 400 * Tolerance);

    /// <summary>Case 3a: half width far upstream 200 m, so that a line of 400 m there takes all but the well's share beyond it.</summary>
    [Fact]
    public void Far_upstream_the_wells_water_is_four_hundred_metres_wide()
    {
        Complex far = 1e9;
        double flux = Pumped.FluxAcross(far - 200 * Complex.ImaginaryOne, far + 200 * Complex.ImaginaryOne);
        Assert.Equal(-400, flux, 400 * Tolerance);
    }

    /// <summary>Case 3b.</summary>
    [Theory]
    [InlineData(0.15, 0, 16.58822)]
    [InlineData(10, 0, 17.24373)]
    [InlineData(100, 0, 17.78407)]
    [InlineData(-100, 0, 17.32839)]
    [InlineData(0, 200, 17.65795)]
    [InlineData(-63.66, 0, 17.3459)]
    public void Head_beside_a_well_in_a_water_table_is(double x, double y, double head) =>
        Assert.Equal(head, Pumped.HeadAt(new Complex(x, y)), head * Tolerance);

    /// <summary>Case 3c: K 10 m/d, top at 15 m; 16 m at x = 1000, 12 m at x = -1000; Q0 = 0.2775 m2/d = 10 x 15 x 0.00185.</summary>
    [Fact]
    public void Confined_flow_turns_into_a_water_table_on_its_way()
    {
        Aquifer aquifer = new(Conductivity: 10, Base: 0, Top: 15, Porosity: 0.2);
        FlowField field = Superposed.Field(aquifer, new RegionalFlow(0.00185, Math.PI, 16, new Complex(1000, 0)));
        Assert.Equal(0.2775, -field.DischargeAt(0).Real, 0.2775 * Tolerance);
        Assert.Equal(1275, field.FlowAt(1000).Potential, 1275 * Tolerance);
        Assert.Equal(720, field.FlowAt(-1000).Potential, 720 * Tolerance);
        Assert.Equal(12, field.HeadAt(-1000), 12 * Tolerance);
        Assert.Equal(15, field.HeadAt(459.45946), 15 * Tolerance);
        Assert.Equal(14.124447, field.HeadAt(0), 14 * Tolerance);
    }

    /// <summary>Case 3e: K 10 m/d, top at 15 m.</summary>
    [Theory]
    [InlineData(0, 0)]
    [InlineData(5, 125)]
    [InlineData(15, 1125)]
    [InlineData(16, 1275)]
    [InlineData(40, 4875)]
    public void Potential_of_a_head_is(double head, double potential)
    {
        Aquifer aquifer = new(Conductivity: 10, Base: 0, Top: 15, Porosity: 0.2);
        Assert.Equal(potential, aquifer.PotentialOf(head));
        Assert.Equal(head, aquifer.HeadOf(potential));
    }
}

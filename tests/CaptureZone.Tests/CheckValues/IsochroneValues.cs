using System.Numerics;
using CaptureZone.Tracing;
using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.CheckValues;

/// <summary>
/// Travel times to one well in uniform flow: exp(X - tau) = cos Y + X sin(Y) / Y (J. Bear and M. Jacobs, J. Hydrology 3, 1965, 37, doi
/// 10.1016/0022-1694(65)90065-X: reference seen, formula from memory, confirmed by tracking). Figures computed from it. In the
/// units chosen here X, Y and tau are the coordinates and the time themselves. Times and places of paths keep 1e-6; a
/// zone's outline is made of straight pieces and is held to <see cref="Outline"/> of the radius of a circle of its area.
/// </summary>
public sealed class IsochroneValues
{
    /// <summary>A fifth of the 0.5 % that travel-time zones promise.</summary>
    private const double Outline = 1e-3;

    /// <summary>A path that comes this near to the stagnation point has met it: for tau = 20 the isochrone is nearer still.</summary>
    private const double StagnationReach = 2e-4;

    private const double Year = 365.25;

    private static readonly Model Unit = LoneWell(1, 1, 1, 2 * Math.PI, 1);
    private static readonly Tracer Tracer = Unit.Tracer();

    /// <summary>Case 1a with porosity 0.25.</summary>
    private static readonly Model Site = LoneWell(15, 20, 0.002, 600, 0.25);

    private static readonly Lazy<WellAnswer> Zones = new(() => Assert.Single(Unit.Answer(null, 0.05, 0.25, 1, 3, 5, 20).Wells));

    public static TheoryData<Row> Rows => new()
    {
        new Row(0.05, 0.35040326, -0.28381054, 0.3153501, 0.033370429, 0.31415927, 0.31359924),
        new Row(0.25, 0.88271475, -0.55121797, 0.69732902, 0.16759963, 1.5707963, 0.67804458),
        new Row(1, 2.1461932, -0.84140566, 1.3372357, 0.68186849, 6.2831853, 1.1940688),
        new Row(3, 4.7490314, -0.98133937, 2.0731842, 2.1390219, 18.849556, 1.5209887),
        new Row(5, 7.0907174, -0.99751508, 2.4140369, 3.7108009, 31.415927, 1.5640583),
        new Row(20, 23.185764, -1, 2.9608071, 17.198641, 125.66371, 1.5707963),
    };

    [Theory]
    [MemberData(nameof(Rows))]
    public void Water_on_the_axis_comes_from(Row row)
    {
        PathEnd up = Tracer.Trace(Bore, Sense.Upstream, row.Tau, null);
        AssertPrinted(row.Up, up.At.Real);
        PathEnd down = Tracer.Trace(-Bore, Sense.Upstream, row.Tau, null);
        Assert.Equal(row.Down, down.At.Real, down.Fate.Kind == FateKind.Time ? 1e-6 : StagnationReach);
        Assert.Equal(row.Tau < 10, down.Fate.Kind == FateKind.Time);
    }

    /// <summary>Straight beside the well: cos Y = exp(-tau).</summary>
    [Theory]
    [MemberData(nameof(Rows))]
    public void Water_beside_the_well_comes_from(Row row)
    {
        double near = 0, far = 3;
        while (far - near > 1e-12)
        {
            double middle = (near + far) / 2;
            bool inTime = Tracer.Trace(new Complex(0, middle), Sense.Downstream, double.PositiveInfinity, null)
                is { Fate.Kind: FateKind.Well } end && end.Time <= row.Tau;
            (near, far) = inTime ? (middle, far) : (near, middle);
        }

        AssertPrinted(row.BesideWell, near);
    }

    /// <summary>Where the zone is widest its outline runs along the flow: up and down from there water needs longer.</summary>
    [Theory]
    [MemberData(nameof(Rows))]
    public void The_widest_place_is(Row row)
    {
        Complex widest = new(row.WidestAt, row.Widest);
        AssertPrinted(row.Tau, Tracer.TimeFrom(widest));
        Assert.True(Tracer.TimeFrom(widest + 0.05) > row.Tau * (1 + 1e-6));
        Assert.True(Tracer.TimeFrom(widest - 0.05) > row.Tau * (1 + 1e-6));
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void The_zone_has_these_dimensions(Row row)
    {
        TravelTimeZone zone = Zones.Value.TravelTimeZones.Single(zone => zone.Time == row.Tau);
        double radius = Math.Sqrt(row.Area / Math.PI);
        Envelope box = zone.Polygon.EnvelopeInternal;
        AssertPrinted(row.Up, box.MaxX);
        Assert.Equal(row.Down, box.MinX, Outline * radius);
        Assert.Equal(row.Widest, box.MaxY, Outline * radius);
        Assert.Equal(-row.Widest, box.MinY, Outline * radius);
        Assert.Equal(row.BesideWell, zone.Polygon.FirstIn(new Complex(0, 3), 0).Imaginary, Outline * radius);
        Assert.Equal(row.Area, zone.Area, 1e-3 * row.Area);
        Assert.InRange(zone.PoreVolumeError, 0, 1e-3);
    }

    /// <summary>Cases 4-p0 and 4-p2.</summary>
    [Theory]
    [InlineData(2.31293, 1.98415, 2.7196306)]
    [InlineData(0.850748, 1.93446, 3.7453132)]
    public void Water_from_a_place_off_the_axis_needs(double x, double y, double tau)
    {
        AssertPrinted(tau, Tracer.TimeFrom(new Complex(x, y)));
        AssertPrinted(tau, Tracer.TimeFrom(new Complex(x, -y)));
    }

    /// <summary>Case 4d, computed: K 15 m/d, b 20 m, i 0.002, Q 600 m3/d, n 0.25, years of 365.25 d; area Q t / (n b).</summary>
    [Fact]
    public void A_site_in_metres_has_these_zones()
    {
        (double Years, double Up, double Down, double HalfWidth, double Area, double FixedRadius)[] rows =
        [
            (0.5, 98.72686, -69.59587, 82.88362, 21915, 83.52102),
            (1, 148.9743, -90.88867, 116.3182, 43830, 118.1166),
            (2, 229.9329, -114.4562, 161.9832, 87660, 167.042),
            (5, 426.5075, -142.779, 244.5102, 219150, 264.1167),
            (10, 708.149, -155.3361, 320.381, 438300, 373.5174),
            (25, 1465.494, -159.095, 413.1479, 1095750, 590.5828),
        ];
        WellAnswer well = Assert.Single(Site.Answer(null, [.. rows.Select(row => row.Years * Year)]).Wells);
        Tracer tracer = Site.Tracer();
        foreach ((TravelTimeZone zone, var row) in well.TravelTimeZones.Zip(rows))
        {
            Envelope box = zone.Polygon.EnvelopeInternal;
            AssertPrinted(row.Up, box.MaxX);
            AssertPrinted(row.Up, tracer.Trace(Bore, Sense.Upstream, zone.Time, null).At.Real);
            Assert.Equal(row.Down, box.MinX, Outline * row.FixedRadius);
            AssertPrinted(row.Down, tracer.Trace(-Bore, Sense.Upstream, zone.Time, null).At.Real, 5e-4);
            Assert.Equal(2 * row.HalfWidth, box.Height, 2 * Outline * row.FixedRadius);
            Assert.Equal(row.Area, zone.Area, 1e-3 * row.Area);
            Assert.Equal(row.FixedRadius, Math.Sqrt(zone.Area / Math.PI), Outline * row.FixedRadius);
        }
    }

    /// <summary>One row of the table.</summary>
    public sealed record Row(
        double Tau, double Up, double Down, double Widest, double WidestAt, double Area, double BesideWell);
}

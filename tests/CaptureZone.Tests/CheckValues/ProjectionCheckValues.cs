using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Tests.CheckValues;

/// <summary>Values of section 16 that concern places on the earth.</summary>
public sealed class ProjectionCheckValues
{
    /// <summary>
    /// 16d: length of a degree at 45 degrees north on WGS 84. Source: RFC 7946 section 11.2 (SEEN, quoted) says that 6 decimals are about
    /// 0.1 m; the lengths are computed. Tolerance 1e-6.
    /// </summary>
    [Fact]
    public void Length_of_a_degree_16d()
    {
        const double Step = 1e-3;
        const double ScaleOnTheMeridian = 0.9996;
        Assert.True(CoordinateSystems.TryRead("EPSG:32614", new NoFiles(), out CoordinateSystem? system, out _));
        var utm = (ProjectedSystem)system;
        double perDegree = 1 / (Step * ScaleOnTheMeridian);
        double north = (utm.FromLonLat(-99, 45 + Step / 2).Y - utm.FromLonLat(-99, 45 - Step / 2).Y) * perDegree;
        double east = (utm.FromLonLat(-99 + Step / 2, 45).X - utm.FromLonLat(-99 - Step / 2, 45).X) * perDegree;
        Assert.Equal(111131.777, north, 0.111);
        Assert.Equal(78846.8351, east, 0.0788);
        Assert.Equal(0.1111, north * 1e-6, 0.00005);
        Assert.Equal(0.01111, north * 1e-7, 0.000005);
    }

    /// <summary>
    /// 16e: transverse Mercator on another ellipsoid. Source: IOGP/EPSG Guidance Note 7-2, FROM MEMORY; recomputed, the recalled
    /// 577274.99, 69740.50 agree to 1 cm. Tolerance 1 cm.
    /// </summary>
    [Fact]
    public void Transverse_Mercator_16e()
    {
        Datum airy = Datum.Wgs84 with { Name = "check", Ellipsoid = new Ellipsoid("Airy 1830", 6377563.396, 299.32496, 7001) };
        var projector = new Projector(new ProjectedDefinition(
            "check", airy, ProjectionMethod.TransverseMercator, [49, -2, 0.9996012717, 400_000, -100_000], GridUnit.Metre));
        (double e, double n) = projector.FromLonLat(0.5, 50.5);
        Assert.Equal(577274.984, e, 0.01);
        Assert.Equal(69740.4923, n, 0.01);
    }
}

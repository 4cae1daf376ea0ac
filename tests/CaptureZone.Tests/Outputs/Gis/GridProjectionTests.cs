using CaptureZone.Outputs.Gis;
using FsCheck.Xunit;
using NetTopologySuite.Algorithm;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class GridProjectionTests
{
    private static readonly GeometryFactory Factory = new();

    /// <summary>Whole numbers: so coarse for the polygons below that plain rounding breaks many of them.</summary>
    private static readonly GridProjection Coarse = new((x, y) => (x, y), decimals: 0, srid: 0);

    [Property(Replay = Draws.Seed)]
    public void A_polygon_stays_valid_near_and_rightly_wound_when_rounded(int seed)
    {
        Polygon polygon = SpikyPolygon(new Random(seed));
        Geometry rounded = Coarse.Bring(polygon, ShapeKind.Polygon)!;
        Assert.True(rounded.IsValid);
        Assert.All(rounded.Coordinates, at => Assert.True(double.IsInteger(at.X) && double.IsInteger(at.Y)));
        AssertWound(rounded);

        // A corner moves by at most half a diagonal of the grid, and so does an edge; a ray thinner than that may go.
        double most = Math.Sqrt(2) / 2 + 1e-9;
        Assert.All(rounded.Coordinates, at => Assert.True(polygon.Boundary.Distance(Factory.CreatePoint(at)) <= most));
        Assert.True(polygon.SymmetricDifference(rounded).Area < most * polygon.Length);
    }

    [Fact]
    public void Plain_rounding_would_break_many_of_those_polygons()
    {
        int broken = Enumerable.Range(0, 100).Count(seed =>
        {
            Polygon polygon = SpikyPolygon(new Random(seed));
            return !Factory.CreatePolygon(
                [.. polygon.ExteriorRing.Coordinates.Select(at => new Coordinate(Math.Round(at.X), Math.Round(at.Y)))]).IsValid;
        });
        Assert.InRange(broken, 50, 100);
    }

    [Fact]
    public void A_part_that_is_smaller_than_the_grid_is_left_out()
    {
        Geometry dot = Factory.CreatePoint(new Coordinate(40.3, 40.3)).Buffer(0.1), large = Factory.ToGeometry(new Envelope(0, 9, 0, 9));
        Assert.Null(Coarse.Bring(dot, ShapeKind.Polygon));
        Assert.Equal(81, Coarse.Bring(Factory.BuildGeometry([dot, large]), ShapeKind.Polygon)!.Area);
    }

    [Fact]
    public void A_hole_that_is_smaller_than_the_grid_is_filled()
    {
        Geometry dot = Factory.CreatePoint(new Coordinate(4.3, 4.3)).Buffer(0.1), large = Factory.ToGeometry(new Envelope(0, 9, 0, 9));
        Assert.Equal(81, Coarse.Bring(large.Difference(dot), ShapeKind.Polygon)!.Area);
    }

    [Fact]
    public void A_line_loses_the_corners_that_fall_together() => Assert.Equal(
        "MULTILINESTRING ((0 0, 5 0))",
        Coarse.Bring(Factory.CreateLineString([new(0, 0), new(0.2, 0.1), new(5.1, 0.1), new(5.2, 0)]), ShapeKind.Line)!.ToText());

    [Fact]
    public void A_line_shorter_than_the_grid_is_left_out() =>
        Assert.Null(Coarse.Bring(Factory.CreateLineString([new(0, 0), new(0.2, 0.1)]), ShapeKind.Line));

    internal static void AssertWound(Geometry shape)
    {
        for (int i = 0; i < shape.NumGeometries; i++)
        {
            if (shape.GetGeometryN(i) is Polygon polygon)
            {
                Assert.True(Orientation.IsCCW(polygon.ExteriorRing.CoordinateSequence));
                Assert.All(polygon.InteriorRings, hole => Assert.False(Orientation.IsCCW(hole.CoordinateSequence)));
            }
        }
    }

    /// <summary>A star of many thin rays that come close to each other at their roots; with a hole.</summary>
    private static Polygon SpikyPolygon(Random random)
    {
        const int Corners = 100;
        Coordinate[] shell = new Coordinate[Corners + 1];
        for (int i = 0; i < Corners; i++)
        {
            (double sin, double cos) = Math.SinCos(2 * Math.PI * i / Corners);
            double radius = i % 2 == 0 ? 5 + 3 * random.NextDouble() : 12 + 25 * random.NextDouble();
            shell[i] = new Coordinate(radius * cos, radius * sin);
        }

        shell[Corners] = shell[0].Copy();
        LinearRing hole = Factory.CreateLinearRing([new(-1, -1), new(2, -1), new(2, 2), new(-1, 2), new(-1, -1)]);
        Polygon polygon = Factory.CreatePolygon(Factory.CreateLinearRing(shell), [hole]);
        Assert.True(polygon.IsValid);
        return polygon;
    }
}

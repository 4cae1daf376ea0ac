using System.Numerics;
using NetTopologySuite;
using NetTopologySuite.Geometries;
using NetTopologySuite.Geometries.Utilities;
using NetTopologySuite.Operation.OverlayNG;

namespace CaptureZone.Zones;

/// <summary>The few geometric operations that zones need, on NetTopologySuite, always with its robust overlay.</summary>
internal static class GeometryKit
{
    private static readonly NtsGeometryServices Services = new(GeometryOverlay.NG, GeometryRelate.NG);

    /// <summary>Makes geometries.</summary>
    internal static GeometryFactory Factory { get; } = Services.CreateGeometryFactory();

    /// <summary>A point of the plane as a coordinate.</summary>
    /// <param name="at">The point, m.</param>
    internal static Coordinate ToCoordinate(Complex at) => new(at.Real, at.Imaginary);

    /// <summary>A coordinate as a point of the plane.</summary>
    /// <param name="at">The coordinate, m.</param>
    internal static Complex ToComplex(Coordinate at) => new(at.X, at.Y);

    /// <summary>A circle as a ring of straight pieces.</summary>
    /// <param name="centre">Its centre, m.</param>
    /// <param name="radius">Its radius, m.</param>
    /// <param name="pieces">How many pieces.</param>
    internal static LinearRing Circle(Complex centre, double radius, int pieces)
    {
        Coordinate[] ring = new Coordinate[pieces + 1];
        for (int i = 0; i < pieces; i++)
        {
            ring[i] = ToCoordinate(centre + Complex.FromPolarCoordinates(radius, 2 * Math.PI * i / pieces));
        }

        ring[pieces] = ring[0].Copy();
        return Factory.CreateLinearRing(ring);
    }

    /// <summary>The common part of two areas, without the lines and points in which they merely touch.</summary>
    internal static Geometry Intersection(Geometry a, Geometry b) =>
        Areas(OverlayNGRobust.Overlay(a, b, NetTopologySuite.Operation.Overlay.SpatialFunction.Intersection));

    /// <summary>What of one area is not in the other.</summary>
    internal static Geometry Difference(Geometry a, Geometry b) =>
        Areas(OverlayNGRobust.Overlay(a, b, NetTopologySuite.Operation.Overlay.SpatialFunction.Difference));

    /// <summary>Polygons only, without parts and holes below a size.</summary>
    /// <param name="geometry">Any geometry.</param>
    /// <param name="smallest">The size, m2.</param>
    internal static Geometry Areas(Geometry geometry, double smallest = 0)
    {
        Polygon[] parts =
        [
            .. PolygonExtracter.GetPolygons(geometry).Cast<Polygon>()
                .Where(part => !part.IsEmpty && part.Area > smallest)
                .Select(part => WithoutSmallHoles(part, smallest)),
        ];
        return parts.Length == 1 ? parts[0]
            : parts.Length == 0 ? Factory.CreatePolygon()
            : Factory.CreateMultiPolygon(parts);
    }

    private static Polygon WithoutSmallHoles(Polygon polygon, double smallest)
    {
        LinearRing[] holes = [.. polygon.Holes.Where(hole => Factory.CreatePolygon(hole).Area > smallest)];
        return holes.Length == polygon.NumInteriorRings
            ? polygon
            : Factory.CreatePolygon((LinearRing)polygon.ExteriorRing, holes);
    }
}

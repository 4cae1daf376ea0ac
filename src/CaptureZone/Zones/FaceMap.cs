using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;
using NetTopologySuite.Geometries.Utilities;
using NetTopologySuite.Operation.OverlayNG;
using NetTopologySuite.Operation.Polygonize;
using NetTopologySuite.Operation.Union;

namespace CaptureZone.Zones;

/// <summary>A piece of the plane from all of which the water comes from one origin and goes to one destination.</summary>
/// <param name="Polygon">The piece, within the frame, m.</param>
/// <param name="Origin">Where its water comes from.</param>
/// <param name="Destination">Where it goes.</param>
public sealed record Face(Polygon Polygon, Fate Origin, Fate Destination);

/// <summary>The plane within a circle, cut into faces by the dividing streamlines.</summary>
/// <param name="Centre">Centre of the circle, m.</param>
/// <param name="Radius">Its radius, m.</param>
/// <param name="Faces">The faces.</param>
/// <param name="Zones">For each destination, the union of the faces whose water goes there.</param>
public sealed record FaceMap(
    Complex Centre, double Radius, ImmutableArray<Face> Faces, ImmutableDictionary<Fate, Geometry> Zones)
{
    /// <summary>Straight pieces of the circle.</summary>
    private const int CirclePieces = 720;

    /// <summary>Faces smaller than this share of the circle are rounding of lines that run together.</summary>
    private const double SliverShare = 1e-13;

    /// <summary>Cuts the circle into faces.</summary>
    /// <param name="topology">The field's dividing streamlines.</param>
    /// <param name="radius">Radius of the circle about the site's centre, m.</param>
    /// <param name="workers">Who does the work.</param>
    public static FaceMap Build(FlowTopology topology, double radius, IWorkers workers)
    {
        Complex centre = topology.Stops.Centre;
        LinearRing circle = GeometryKit.Circle(centre, radius, CirclePieces);
        List<Geometry> lines = [circle];
        foreach (DividingBranch branch in topology.Branches)
        {
            // The base cuts the plane as well, but only below every well: lines that end there part nothing that is asked for.
            if (branch.End.Fate.Kind != FateKind.Dry)
            {
                lines.Add(LineOf(branch));
            }
        }

        Polygonizer polygonizer = new();
        polygonizer.Add(UnaryUnionOp.Union(lines));
        Polygon disc = GeometryKit.Factory.CreatePolygon(circle);
        Polygon[] polygons =
        [
            .. polygonizer.GetPolygons().Cast<Polygon>().Where(face => face.Area > SliverShare * disc.Area),
        ];
        Face?[] faces = new Face?[polygons.Length];
        workers.For(polygons.Length, i => faces[i] = FaceOf(topology, polygons[i], centre, radius));
        ImmutableArray<Face> known = [.. faces.OfType<Face>()];
        return new FaceMap(centre, radius, known, ZonesOf(known, SliverShare * disc.Area));
    }

    /// <summary>The zone from which water goes to a destination; empty where none does.</summary>
    /// <param name="destination">The destination.</param>
    public Geometry ZoneOf(Fate destination) => Zones.GetValueOrDefault(destination) ?? GeometryKit.Factory.CreatePolygon();

    /// <summary>The zone from which water goes to one of some destinations.</summary>
    /// <param name="isChosen">Tells whether a destination is one of them.</param>
    public Geometry ZoneOf(Func<Fate, bool> isChosen) =>
        UnionOf(Faces.Where(face => isChosen(face.Destination)), SliverShare * Math.PI * Radius * Radius);

    private static ImmutableDictionary<Fate, Geometry> ZonesOf(ImmutableArray<Face> faces, double smallest) =>
        faces.GroupBy(face => face.Destination).ToImmutableDictionary(group => group.Key, group => UnionOf(group, smallest));

    /// <summary>
    /// Faces meet in the same vertices all along their common edges: their union only drops these edges. Where two lines run together
    /// a sliver that is no face may be left between faces, and a ring that touches itself.
    /// </summary>
    private static Geometry UnionOf(IEnumerable<Face> faces, double smallest)
    {
        Geometry[] parts = [.. faces.Select(face => face.Polygon)];
        if (parts.Length == 0)
        {
            return GeometryKit.Factory.CreatePolygon();
        }

        Geometry union = CoverageUnion.Union(GeometryKit.Factory.BuildGeometry(parts));
        return GeometryKit.Areas(union.IsValid ? union : GeometryFixer.Fix(union), smallest);
    }

    private static LineString LineOf(DividingBranch branch) =>
        GeometryKit.Factory.CreateLineString([.. branch.Points.Select(point => GeometryKit.ToCoordinate(point.At))]);

    private static Face? FaceOf(FlowTopology topology, Polygon polygon, Complex centre, double radius)
    {
        Complex inside = GeometryKit.ToComplex(polygon.InteriorPoint.Coordinate);
        if (Complex.Abs(inside - centre) > radius)
        {
            return null;
        }

        Fate origin = topology.Scout.Trace(inside, Sense.Upstream, double.PositiveInfinity, null).Fate;
        Fate destination = topology.Scout.Trace(inside, Sense.Downstream, double.PositiveInfinity, null).Fate;
        return new Face(polygon, origin, destination);
    }
}

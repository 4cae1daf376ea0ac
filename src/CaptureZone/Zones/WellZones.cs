using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Zones;

/// <summary>The steady capture zone of a well with its figures.</summary>
internal static class WellZones
{
    /// <summary>A saddle is on a zone's edge when it lies within this share of the frame's radius of it.</summary>
    private const double OnEdge = 1e-9;

    /// <summary>The zone of one extraction well.</summary>
    /// <param name="topology">The field's dividing streamlines.</param>
    /// <param name="map">Its faces.</param>
    /// <param name="screen">The well's screen.</param>
    /// <param name="stretches">Stretches of the screen by origin.</param>
    /// <param name="extent">The frame of clipped output, m.</param>
    internal static WellZone Of(
        FlowTopology topology, FaceMap map, Screen screen, ImmutableArray<ScreenStretch> stretches, Geometry extent)
    {
        Geometry polygon = map.ZoneOf(new Fate(FateKind.Well, screen.Well));
        Geometry inExtent = GeometryKit.Intersection(polygon, extent);
        Geometry edges = ZoneEdges.Of(polygon, map);
        ImmutableArray<SourceShare> shares = WaterOrigins.Shares(stretches);
        bool open = shares.Any(share => share.Source.Kind == FateKind.Far) || ZoneEdges.TouchFrame(polygon, map);
        double uniform = Complex.Abs(topology.Field.UniformDischarge);
        double fromFar = shares.Where(share => share.Source.Kind == FateKind.Far).Sum(share => share.Rate);
        return new WellZone(
            polygon,
            inExtent,
            open ? null : polygon.Area,
            inExtent.Area,
            open,
            uniform > 0 ? WidthAt(topology.Field, screen.At, polygon, map) : null,
            uniform > 0 ? fromFar / uniform : null,
            StagnationDistance(topology, screen.At, edges, map),
            shares,
            ZoneEdges.Leak(edges.Intersection(extent), topology.Field, at => IsInScreen(topology.Stops, at)) / screen.Rate);
    }

    /// <summary>
    /// Extent of a zone on the line through the well across the regional flow, from outermost edge to outermost edge; null where the
    /// frame cuts it off.
    /// </summary>
    private static double? WidthAt(FlowField field, Complex well, Geometry zone, FaceMap map)
    {
        Complex flow = field.UniformDischarge;
        Complex across = Complex.ImaginaryOne * flow / Complex.Abs(flow) * (2 * map.Radius);
        LineString line = GeometryKit.Factory.CreateLineString(
            [GeometryKit.ToCoordinate(well - across), GeometryKit.ToCoordinate(well + across)]);
        Coordinate[] met = line.Intersection(zone).Coordinates;
        if (met.Length < 2 || met.Any(at => ZoneEdges.IsOnFrame(at, map)))
        {
            return null;
        }

        double[] along = [.. met.Select(at => ((GeometryKit.ToComplex(at) - well) * Complex.Conjugate(across)).Real / Complex.Abs(across))];
        return along.Max() - along.Min();
    }

    private static double? StagnationDistance(FlowTopology topology, Complex well, Geometry edges, FaceMap map)
    {
        double? nearest = null;
        foreach (StagnationPoint point in topology.Points)
        {
            double distance = Complex.Abs(point.At - well);
            if (!(distance >= nearest)
                && edges.IsWithinDistance(GeometryKit.Factory.CreatePoint(GeometryKit.ToCoordinate(point.At)), OnEdge * map.Radius))
            {
                nearest = distance;
            }
        }

        return nearest;
    }

    private static bool IsInScreen(PathStops stops, Complex at)
    {
        foreach (Screen screen in stops.Screens)
        {
            if (Complex.Abs(at - screen.At) <= screen.Radius)
            {
                return true;
            }
        }

        return false;
    }
}

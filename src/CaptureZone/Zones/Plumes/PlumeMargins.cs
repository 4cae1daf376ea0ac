using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Densify;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Distance;
using NetTopologySuite.Simplify;

namespace CaptureZone.Zones.Plumes;

/// <summary>How far a plume is from the edge of the joint containment zone; negative where it sticks out.</summary>
/// <param name="Nearest">To the nearest edge, m.</param>
/// <param name="Side">Across the regional flow, m.</param>
/// <param name="Downgradient">With the regional flow, m.</param>
/// <param name="Share">Clean water on the tighter side, of the containment pumping; null when it sticks out.</param>
internal sealed record PlumeMargins(double? Nearest, double? Side, double? Downgradient, double? Share)
{
    /// <summary>Points on the plume's outline, about, between its corners.</summary>
    private const int OutlinePoints = 400;

    /// <summary>Edges are thinned out by as much as this share of the plume's size.</summary>
    private const double EdgeShare = 1e-6;

    /// <summary>The margins of one plume.</summary>
    internal static PlumeMargins Of(
        FlowTopology topology, FaceMap map, Geometry joint, Plume plume, bool captured, Func<Fate, bool> isChosen)
    {
        if (joint.IsEmpty)
        {
            return new PlumeMargins(null, null, null, null);
        }

        double tolerance = EdgeShare * plume.Outline.EnvelopeInternal.Diameter;
        Geometry edges = DouglasPeuckerSimplifier.Simplify(ZoneEdges.Of(joint, map), tolerance);
        if (edges.IsEmpty)
        {
            return new PlumeMargins(null, null, null, null);
        }

        double pumping = topology.Stops.Screens.Where(screen => isChosen(new Fate(FateKind.Well, screen.Well))).Sum(screen => Math.Max(screen.Rate, 0));
        Geometry outside = captured ? GeometryKit.Factory.CreatePolygon() : GeometryKit.Difference(plume.Outline, joint);
        Complex[] outline = OutlineOf(captured ? plume.Outline : DouglasPeuckerSimplifier.Simplify(outside, tolerance));
        IndexedFacetDistance toEdges = new(edges);
        double nearest = captured
            ? toEdges.Distance(plume.Outline)
            : -outline.Select(at => DistanceOutside(at, toEdges)).DefaultIfEmpty(0).Max();
        Complex flow = topology.Field.UniformDischarge;
        Complex? direction = flow == Complex.Zero ? null : flow / Complex.Abs(flow);
        double? share = captured && pumping > 0 ? CleanWater.Least(topology, outline, isChosen) / pumping : null;
        return direction is { } along
            ? new PlumeMargins(
                nearest,
                Cast(outline, edges, [Complex.ImaginaryOne * along, -Complex.ImaginaryOne * along], captured),
                Cast(outline, edges, [captured ? along : -along], captured),
                share)
            : new PlumeMargins(nearest, null, null, share);
    }

    /// <summary>Distance of a point of the part that sticks out to the zone's edges; 0 on the cut itself.</summary>
    private static double DistanceOutside(Complex at, IndexedFacetDistance edges) =>
        edges.Distance(GeometryKit.Factory.CreatePoint(GeometryKit.ToCoordinate(at)));

    private static Complex[] OutlineOf(Geometry area) =>
        area.IsEmpty || area.Length == 0
            ? []
            : [.. Densifier.Densify(area, area.Length / OutlinePoints).Coordinates.Select(GeometryKit.ToComplex)];

    /// <summary>
    /// From every point of the outline to the first edge in some directions: the least of these for a captured plume, minus the
    /// greatest for the part that sticks out. Null where no edge lies that way.
    /// </summary>
    private static double? Cast(Complex[] outline, Geometry edges, Complex[] directions, bool captured)
    {
        double? extreme = null;
        foreach (Complex from in outline)
        {
            double first = directions.Min(direction => FirstMeeting(from, direction, edges));
            if (double.IsFinite(first) && !(captured ? first >= extreme : first <= extreme))
            {
                extreme = first;
            }
        }

        return captured ? extreme : -extreme;
    }

    /// <summary>Distance along a ray to the first edge; infinite when it meets none.</summary>
    private static double FirstMeeting(Complex from, Complex direction, Geometry edges)
    {
        double first = double.PositiveInfinity;
        Complex turned = Complex.Conjugate(direction);
        for (int i = 0; i < edges.NumGeometries; i++)
        {
            CoordinateSequence line = ((LineString)edges.GetGeometryN(i)).CoordinateSequence;
            Complex a = (new Complex(line.GetX(0), line.GetY(0)) - from) * turned;
            for (int k = 1; k < line.Count; k++)
            {
                Complex b = (new Complex(line.GetX(k), line.GetY(k)) - from) * turned;
                if ((a.Imaginary > 0) != (b.Imaginary > 0))
                {
                    double along = a.Real + (b.Real - a.Real) * (a.Imaginary / (a.Imaginary - b.Imaginary));
                    first = along >= 0 ? Math.Min(first, along) : first;
                }

                a = b;
            }
        }

        return first;
    }
}

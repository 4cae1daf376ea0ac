using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;
using NetTopologySuite.Simplify;

namespace CaptureZone.Zones;

/// <summary>The paths that a run reports: dividing streamlines, and water from points round each plume.</summary>
internal static class ReportedPaths
{
    /// <summary>Paths that start from each plume's outline.</summary>
    private const int PathsPerPlume = 16;

    /// <summary>Largest change of direction from vertex to vertex, radians.</summary>
    private const double Turn = 0.05;

    /// <summary>Largest flow that a chord cuts off, as a share of the total rate.</summary>
    private const double LeakShare = 1e-6;

    /// <summary>Dividing streamlines are thinned out by as much as this share of the site's diameter.</summary>
    private const double ThinShare = 1e-6;

    /// <summary>All reported paths.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="plumes">The plumes.</param>
    internal static ImmutableArray<FlowPath> Of(FlowTopology topology, ImmutableArray<Plume> plumes) =>
    [
        .. topology.Branches.Select(branch => OfBranch(branch, ThinShare * topology.Stops.Diameter)),
        .. plumes.SelectMany(plume => StartsOn(plume).Select(start => OfPlume(topology, plume, start))),
    ];

    /// <summary>Drawn lines need fewer vertices than edges of zones, through which nothing may leak.</summary>
    private static ImmutableArray<PathPoint> Thinned(ImmutableArray<PathPoint> points, double tolerance)
    {
        Coordinate[] kept = DouglasPeuckerLineSimplifier.Simplify(
            [.. points.Select(point => GeometryKit.ToCoordinate(point.At))], tolerance);
        int next = 0;
        return [.. points.Where(point => next < kept.Length && kept[next].Equals2D(GeometryKit.ToCoordinate(point.At)) && next++ >= 0)];
    }

    private static FlowPath OfBranch(DividingBranch branch, double tolerance) =>
        new(
            branch.IsStable ? PathRole.DividesDestinations : PathRole.DividesOrigins,
            "",
            Thinned(branch.Points, tolerance),
            branch.End.Fate,
            branch.End.Length);

    private static FlowPath OfPlume(FlowTopology topology, Plume plume, Complex start)
    {
        PathRecorder recorder = new(new PathResolution(Turn, LeakShare * topology.Stops.TotalRate));
        PathEnd end = topology.Tracer.Trace(start, Sense.Downstream, double.PositiveInfinity, recorder);
        return new FlowPath(PathRole.FromPlume, plume.Name, recorder.ToPoints(), end.Fate, end.Length);
    }

    private static IEnumerable<Complex> StartsOn(Plume plume)
    {
        LineString ring = plume.Outline.ExteriorRing;
        NetTopologySuite.LinearReferencing.LengthIndexedLine line = new(ring);
        for (int i = 0; i < PathsPerPlume; i++)
        {
            yield return GeometryKit.ToComplex(line.ExtractPoint(ring.Length * i / PathsPerPlume));
        }
    }
}

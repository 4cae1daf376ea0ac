using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

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

    /// <summary>All reported paths.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="plumes">The plumes.</param>
    internal static ImmutableArray<FlowPath> Of(FlowTopology topology, ImmutableArray<Plume> plumes) =>
    [
        .. topology.Branches.Select(OfBranch),
        .. plumes.SelectMany(plume => StartsOn(plume).Select(start => OfPlume(topology, plume, start))),
    ];

    private static FlowPath OfBranch(DividingBranch branch) =>
        new(
            branch.IsStable ? PathRole.DividesDestinations : PathRole.DividesOrigins,
            "",
            branch.Points,
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

using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Topology;

/// <summary>Keeps the vertices of a dividing streamline: finely within the extent of clipped output, else coarsely.</summary>
/// <param name="stops">The field and where paths in it end.</param>
/// <param name="extent">The extent, m.</param>
internal sealed class BranchRecorder(PathStops stops, Envelope extent) : IPathSink
{
    /// <summary>Largest change of direction from vertex to vertex, radians.</summary>
    private const double Turn = 0.05;

    /// <summary>Largest flow that a chord cuts off within the extent, as a share of the total rate: bounds the side flow of zones.</summary>
    private const double FineLeak = 4e-9;

    /// <summary>The same outside of it.</summary>
    private const double CoarseLeak = 1e-6;

    private readonly ImmutableArray<PathPoint>.Builder _points = ImmutableArray.CreateBuilder<PathPoint>();

    /// <inheritdoc/>
    public PathResolution ResolutionAt(Complex at) =>
        new(Turn, stops.TotalRate * (extent.Contains(at.Real, at.Imaginary) ? FineLeak : CoarseLeak));

    /// <inheritdoc/>
    public void Add(Complex at, double time) => _points.Add(new PathPoint(at, time));

    /// <summary>The vertices.</summary>
    internal ImmutableArray<PathPoint> ToPoints() => _points.DrainToImmutable();
}

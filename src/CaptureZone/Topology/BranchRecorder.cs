using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Topology;

/// <summary>Keeps the vertices of a dividing streamline: finely within the extent of clipped output, else coarsely.</summary>
/// <param name="extent">The extent, m.</param>
/// <param name="fine">Largest flow that a chord cuts off within the extent, m3/d.</param>
/// <param name="coarse">The same outside of it.</param>
internal sealed class BranchRecorder(Envelope extent, double fine, double coarse) : IPathSink
{
    /// <summary>Largest change of direction from vertex to vertex, radians.</summary>
    private const double Turn = 0.05;

    private readonly ImmutableArray<PathPoint>.Builder _points = ImmutableArray.CreateBuilder<PathPoint>();

    /// <inheritdoc/>
    public PathResolution ResolutionAt(Complex at) => new(Turn, extent.Contains(at.Real, at.Imaginary) ? fine : coarse);

    /// <inheritdoc/>
    public void Add(Complex at, double time) => _points.Add(new PathPoint(at, time));

    /// <summary>The vertices; empties the recorder.</summary>
    internal ImmutableArray<PathPoint> ToPoints() => _points.DrainToImmutable();
}

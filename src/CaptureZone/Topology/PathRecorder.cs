using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Tracing;

namespace CaptureZone.Topology;

/// <summary>Keeps the vertices of a path.</summary>
/// <param name="resolution">How finely.</param>
public sealed class PathRecorder(PathResolution resolution) : IPathSink
{
    private readonly ImmutableArray<PathPoint>.Builder _points = ImmutableArray.CreateBuilder<PathPoint>();

    /// <inheritdoc/>
    public PathResolution ResolutionAt(Complex at) => resolution;

    /// <inheritdoc/>
    public void Add(Complex at, double time) => _points.Add(new PathPoint(at, time));

    /// <summary>The vertices; empties the recorder.</summary>
    public ImmutableArray<PathPoint> ToPoints() => _points.DrainToImmutable();
}

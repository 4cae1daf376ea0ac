using System.Collections.Immutable;

namespace CaptureZone.Topology;

/// <summary>The stagnation points of a field.</summary>
/// <param name="Points">The points, from west to east, then from south to north.</param>
/// <param name="Complete">Whether it is certain that none is missing.</param>
public sealed record StagnationSet(ImmutableArray<StagnationPoint> Points, bool Complete)
{
    /// <summary>How many there must be, counted with multiplicity.</summary>
    public required int Expected { get; init; }

    /// <summary>
    /// The largest discharge at a point, as a share of the discharges that cancel there: uniform flow and that of every well.
    /// 0 without points.
    /// </summary>
    public required double Residual { get; init; }
}

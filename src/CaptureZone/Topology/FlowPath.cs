using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Tracing;

namespace CaptureZone.Topology;

/// <summary>Why a path is in the results.</summary>
public enum PathRole
{
    /// <summary>Bounds where water goes to: flows into a stagnation point.</summary>
    DividesDestinations,

    /// <summary>Bounds where water comes from: flows out of a stagnation point.</summary>
    DividesOrigins,

    /// <summary>Water of a plume, from its outline on.</summary>
    FromPlume,
}

/// <summary>One vertex of a path.</summary>
/// <param name="At">Where, m.</param>
/// <param name="Time">Water's travel time from the path's start, d.</param>
public readonly record struct PathPoint(Complex At, double Time);

/// <summary>A path of water, its vertices in the order in which it was followed.</summary>
/// <param name="Role">Why it is here.</param>
/// <param name="From">Name of the plume it starts from; empty for a dividing streamline.</param>
/// <param name="Points">Its vertices; for a branch that flows into a stagnation point, followed upstream from there.</param>
/// <param name="Fate">How it ends.</param>
/// <param name="Length">Its length, m.</param>
public sealed record FlowPath(PathRole Role, string From, ImmutableArray<PathPoint> Points, Fate Fate, double Length);

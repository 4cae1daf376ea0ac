using System.Collections.Immutable;
using CaptureZone.Jobs.Points;
using CaptureZone.Sites;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Jobs.Paths;

/// <summary>How paths are followed.</summary>
/// <param name="Sense">With the water or against it.</param>
/// <param name="Longest">Largest travel time of water, d; infinite for no limit.</param>
/// <param name="Lines">Whether the vertices are wanted too.</param>
public sealed record PathsRequest(Sense Sense, double Longest, bool Lines);

/// <summary>The path of a water particle from a point.</summary>
/// <param name="Start">The point.</param>
/// <param name="End">How it ends; the place in local metres.</param>
/// <param name="Points">Its vertices with the time at each, in the order in which it was followed; local metres; empty
/// when they were not wanted.</param>
public sealed record PathRow(NamedPoint Start, PathEnd End, ImmutableArray<PathPoint> Points);

/// <summary>Paths of water from points.</summary>
public static class PathsJob
{
    /// <summary>Largest change of direction from vertex to vertex, radians: smooth to the eye on a map (3 degrees).</summary>
    private const double Turn = 3 * Math.PI / 180;

    /// <summary>Largest flow that a chord cuts off from its arc, of the largest rate: below what the capture zones allow.</summary>
    private const double LeakShare = 1e-4;

    /// <summary>Follows the path from each point.</summary>
    /// <param name="site">The site.</param>
    /// <param name="points">The points.</param>
    /// <param name="request">How.</param>
    /// <param name="work">Who does it.</param>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public static ImmutableArray<PathRow> Follow(
        SiteDocument site, ImmutableArray<NamedPoint> points, PathsRequest request, Work work)
    {
        Tracer tracer = new(SiteFlow.Solve(site));
        PathRow[] rows = new PathRow[points.Length];
        int done = 0;
        work.Workers.For(rows.Length, i =>
        {
            work.Cancel.ThrowIfCancellationRequested();
            rows[i] = Follow(tracer, site, points[i], request);
            work.Progress?.Report(new Step("following paths", (double)Interlocked.Increment(ref done) / rows.Length));
        });
        return [.. rows];
    }

    private static PathRow Follow(Tracer tracer, SiteDocument site, NamedPoint point, PathsRequest request)
    {
        PathRecorder? vertices = request.Lines ? new PathRecorder(ResolutionFor(site.Model)) : null;
        PathEnd end = tracer.Trace(site.Frame.ToLocal(point.X, point.Y), request.Sense, request.Longest, vertices);
        return new PathRow(point, end, vertices?.ToPoints() ?? []);
    }

    private static PathResolution ResolutionFor(Model model)
    {
        double largest = model.Wells.Select(well => Math.Abs(well.Rate)).DefaultIfEmpty().Max();
        return new PathResolution(Turn, largest > 0 ? LeakShare * largest : double.PositiveInfinity);
    }
}

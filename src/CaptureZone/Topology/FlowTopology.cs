using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Topology;

/// <summary>
/// Stagnation points and dividing streamlines of a field: the only place where it is decided where water comes from and goes to.
/// Immutable and thread-safe.
/// </summary>
public sealed class FlowTopology
{
    /// <summary>Largest change of direction from vertex to vertex of a branch that is drawn coarsely, radians.</summary>
    private const double Turn = 0.05;

    /// <summary>Largest flow that a chord of such a branch cuts off, as a share of the total rate.</summary>
    private const double CoarseLeak = 1e-6;

    private FlowTopology(Tracer tracer, ImmutableArray<DividingBranch> branches)
    {
        Tracer = tracer;
        Scout = new Tracer(tracer.Stops, Tracer.RoughTolerance);
        Branches = branches;
    }

    /// <summary>Follows paths among these stagnation points.</summary>
    public Tracer Tracer { get; }

    /// <summary>The same, roughly, for many paths of which only fates, or times to some 1e-4, are wanted.</summary>
    public Tracer Scout { get; }

    /// <summary>The field.</summary>
    public FlowField Field => Tracer.Stops.Field;

    /// <summary>Where paths end.</summary>
    public PathStops Stops => Tracer.Stops;

    /// <summary>The stagnation points.</summary>
    public ImmutableArray<StagnationPoint> Points => Stops.Stagnation.Points;

    /// <summary>Whether it is certain that no stagnation point is missing.</summary>
    public bool Complete => Stops.Stagnation.Complete;

    /// <summary>All branches, saddle by saddle, each in its order.</summary>
    public ImmutableArray<DividingBranch> Branches { get; }

    /// <summary>Finds the topology of a field.</summary>
    /// <param name="field">The field.</param>
    /// <param name="reach">Radius about the site's centre that must lie well inside the circle at which paths end, m.</param>
    /// <param name="extent">Where the vertices of dividing streamlines are wanted close together, m.</param>
    /// <param name="workers">Who does the work.</param>
    /// <param name="cancel">Stops the work.</param>
    public static FlowTopology Find(
        FlowField field, double reach, Envelope extent, IWorkers workers, CancellationToken cancel)
    {
        PathStops stops = PathStops.Of(field, StagnationFinder.Find(field), reach);
        ImmutableArray<StagnationPoint> points = stops.Stagnation.Points;
        Tracer tracer = new(stops), beside = tracer.PastStagnation();
        List<(int Saddle, int Order, Complex Launch)> launches = [];
        for (int i = 0; i < points.Length; i++)
        {
            Complex[] of = BranchLaunch.Of(field, points, i);
            launches.AddRange(of.Select((launch, order) => (i, order, launch)));
        }

        double coarse = CoarseLeak * stops.TotalRate;
        DividingBranch[] branches = new DividingBranch[launches.Count];
        workers.For(branches.Length, i =>
        {
            cancel.ThrowIfCancellationRequested();
            branches[i] = Follow(tracer, beside, launches[i].Saddle, launches[i].Order, launches[i].Launch, coarse);
        });
        double[] fineness = BranchFineness.Of(stops, branches, extent);
        workers.For(branches.Length, i =>
        {
            cancel.ThrowIfCancellationRequested();
            branches[i] = fineness[i] < coarse
                ? branches[i] with { Points = Vertices(tracer, branches[i], new BranchRecorder(extent, fineness[i], coarse)) }
                : branches[i];
        });
        return new FlowTopology(tracer, [.. branches]);
    }

    /// <summary>The branch with an order at a saddle; orders wrap round.</summary>
    /// <param name="saddle">Index of the stagnation point.</param>
    /// <param name="order">Order of the branch.</param>
    public DividingBranch BranchAt(int saddle, int order)
    {
        int first = 0;
        for (int i = 0; i < saddle; i++)
        {
            first += CountAt(i);
        }

        return Branches[first + (order + CountAt(saddle)) % CountAt(saddle)];
    }

    /// <summary>
    /// What a branch goes on as that ends in another stagnation point: the water beside it, on the side meant, turns there along the
    /// next branch of that point.
    /// </summary>
    /// <param name="branch">A branch that ends in a stagnation point.</param>
    /// <param name="turn">1 or -1: next counter-clockwise or clockwise of the way of arrival, seen from that point.</param>
    internal DividingBranch Beyond(DividingBranch branch, int turn)
    {
        int saddle = branch.End.Fate.Feature;
        Complex centre = Points[saddle].At, arrival = branch.End.At - centre;
        int best = 0;
        double bestCosine = double.NegativeInfinity;
        for (int order = branch.IsStable ? 0 : 1; order < CountAt(saddle); order += 2)
        {
            Complex direction = BranchAt(saddle, order).Launch - centre;
            double cosine = (direction * Complex.Conjugate(arrival)).Real / (Complex.Abs(direction) * Complex.Abs(arrival));
            (best, bestCosine) = cosine > bestCosine ? (order, cosine) : (best, bestCosine);
        }

        return BranchAt(saddle, best + turn);
    }

    private int CountAt(int saddle) => 2 * (Points[saddle].Multiplicity + 1);

    /// <summary>
    /// Follows a branch, and the water on its two sides: so near to the branch that where it meets another stagnation point that water
    /// passes by.
    /// </summary>
    private static DividingBranch Follow(
        Tracer tracer, Tracer beside, int saddle, int order, Complex launch, double coarse)
    {
        PathStops stops = tracer.Stops;
        bool stable = order % 2 != 0;
        PathRecorder recorder = new(new PathResolution(Turn, coarse));
        Sense away = stable ? Sense.Upstream : Sense.Downstream;
        Sense back = stable ? Sense.Downstream : Sense.Upstream;
        PathEnd end = tracer.Trace(launch, away, double.PositiveInfinity, recorder, saddle);
        return new DividingBranch(
            saddle, order, Closed(stops, saddle, recorder.ToPoints(), end), end, FateBeside(1), FateBeside(-1));

        Fate FateBeside(int side)
        {
            Complex companion = BranchLaunch.Companion(
                stops.Field, stops.Stagnation.Points[saddle].At, launch, stops.TotalRate, side);
            return beside.Trace(companion, back, double.PositiveInfinity, null).Fate;
        }
    }

    private static ImmutableArray<PathPoint> Vertices(Tracer tracer, DividingBranch branch, BranchRecorder recorder)
    {
        Sense away = branch.IsStable ? Sense.Upstream : Sense.Downstream;
        PathEnd end = tracer.Trace(branch.Launch, away, double.PositiveInfinity, recorder, branch.Saddle);
        return Closed(tracer.Stops, branch.Saddle, recorder.ToPoints(), end);
    }

    /// <summary>Puts the stagnation point at the front, and the centre of what the branch ends in at the back.</summary>
    private static ImmutableArray<PathPoint> Closed(
        PathStops stops, int saddle, ImmutableArray<PathPoint> points, in PathEnd end)
    {
        ImmutableArray<StagnationPoint> stagnation = stops.Stagnation.Points;
        ImmutableArray<PathPoint>.Builder closed = ImmutableArray.CreateBuilder<PathPoint>(points.Length + 2);
        closed.Add(new PathPoint(stagnation[saddle].At, double.NegativeInfinity));
        closed.AddRange(points);
        Fate fate = end.Fate;
        Complex? centre = fate.Kind switch
        {
            FateKind.Well or FateKind.Injection => stops.Field.System.Wells[fate.Feature].At,
            FateKind.Stagnation => stagnation[fate.Feature].At,
            _ => null,
        };
        if (centre is { } at)
        {
            closed.Add(new PathPoint(at, end.Time));
        }

        return closed.DrainToImmutable();
    }
}

using System.Numerics;
using CaptureZone.Flow;
using CaptureZone.Topology;

namespace CaptureZone.Tracing;

/// <summary>Which way a path is followed.</summary>
public enum Sense
{
    /// <summary>With the water.</summary>
    Downstream,

    /// <summary>Against it.</summary>
    Upstream,
}

/// <summary>Takes the vertices of a path while it is followed.</summary>
public interface IPathSink
{
    /// <summary>How finely it wants them at a place.</summary>
    /// <param name="at">The place, m.</param>
    PathResolution ResolutionAt(Complex at);

    /// <summary>Takes the next vertex.</summary>
    /// <param name="at">Where, m.</param>
    /// <param name="time">Time since the start, d; positive in both senses.</param>
    void Add(Complex at, double time);
}

/// <summary>How finely a path is to be given by its vertices.</summary>
/// <param name="Turn">Largest change of direction from vertex to vertex, radians.</param>
/// <param name="Leak">Largest flow that a chord between two vertices may cut off from its arc, m3/d.</param>
public readonly record struct PathResolution(double Turn, double Leak);

/// <summary>How a path ended.</summary>
/// <param name="At">Where, m.</param>
/// <param name="Fate">How, and at which feature.</param>
/// <param name="Time">Travel time of the water, d; infinite at a stagnation point.</param>
/// <param name="Length">Length, m.</param>
/// <param name="FluxDrift">Flow between the path's start and end, m3/d: 0 were it followed exactly.</param>
public readonly record struct PathEnd(Complex At, Fate Fate, double Time, double Length, double FluxDrift);

/// <summary>
/// Follows water particles: dz/ds = Q/|Q|, dt/ds = n h/|Q| with arc length s, by the Runge-Kutta pair of
/// <see cref="DormandPrince"/> with error control. A step is at most a set share of the distance to the nearest
/// singular place; ends at screens, times and the base are met exactly, by stepping anew to them. Thread-safe.
/// </summary>
public sealed class Tracer
{
    /// <summary>Tolerance with which times err by less than 1e-8 of themselves and streamlines by less than 1e-8 of the total rate.</summary>
    public const double FineTolerance = 2e-8;

    /// <summary>Tolerance for fates and outlines, which are told apart or drawn to some 1e-4.</summary>
    public const double RoughTolerance = 1e-6;

    private readonly PathStops _stops;
    private readonly Snare[] _snares;
    private readonly double _tolerance;

    /// <summary>Prepares to follow paths in a field, finding its stagnation points first.</summary>
    /// <param name="field">The field.</param>
    public Tracer(FlowField field)
        : this(PathStops.Of(field, StagnationFinder.Find(field)))
    {
    }

    /// <summary>Prepares to follow paths in a field.</summary>
    /// <param name="stops">The field and where paths in it end.</param>
    /// <param name="tolerance">
    /// Error allowed in a step, as a share of the distance to the nearest singular place (position) or of the time.
    /// </param>
    public Tracer(PathStops stops, double tolerance = FineTolerance)
    {
        _stops = stops;
        _tolerance = tolerance;
        _snares = [.. stops.Stagnation.Points.Select((point, index) => Snare.About(stops, point, index))];
    }

    private Tracer(PathStops stops, double tolerance, Snare[] snares)
    {
        _stops = stops;
        _tolerance = tolerance;
        _snares = snares;
    }

    /// <summary>Where paths end.</summary>
    public PathStops Stops => _stops;

    /// <summary>Follows paths past stagnation points, however near they come.</summary>
    internal Tracer PastStagnation() => new(_stops, _tolerance, [.. _snares.Select(snare => snare with { Radius = 0 })]);

    /// <summary>Follows one particle.</summary>
    /// <param name="from">Start, m.</param>
    /// <param name="sense">Which way.</param>
    /// <param name="longest">Longest time, d; infinite for no limit.</param>
    /// <param name="sink">Takes the vertices, the start first; null when only the end is wanted.</param>
    /// <param name="leaving">Index of the stagnation point that the path leaves, so that it does not end there; -1 for none.</param>
    public PathEnd Trace(Complex from, Sense sense, double longest, IPathSink? sink, int leaving = -1)
    {
        Walk walk = new(_stops, _snares, _tolerance, from, sense, longest, sink, leaving);
        return walk.ToEnd();
    }
}

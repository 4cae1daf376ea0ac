using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Tracing;

/// <summary>
/// Hands the vertices of a path to its sink, as densely as it asks. Between nodes a position is the quintic of Hermite through
/// places, directions and curvatures, a time the cubic through times and slownesses.
/// </summary>
/// <param name="field">The field.</param>
/// <param name="sign">1 with the water, -1 against it.</param>
/// <param name="sink">Who takes them; may be null.</param>
internal readonly struct PathVertices(FlowField field, double sign, IPathSink? sink)
{
    /// <summary>Most vertices that one step is divided into.</summary>
    private const int MostPerStep = 4000;

    private readonly FlowField _field = field;
    private readonly double _sign = sign;
    private readonly IPathSink? _sink = sink;

    /// <summary>Begins a path.</summary>
    /// <param name="node">Its start.</param>
    internal void Start(in Node node) => _sink?.Add(node.At, node.Time);

    /// <summary>Hands over the vertices of one step, without its start.</summary>
    /// <param name="from">Its start.</param>
    /// <param name="to">Its end.</param>
    internal void Step(in Node from, in Node to)
    {
        double step = to.Length - from.Length;
        if (_sink is null || step <= 0)
        {
            return;
        }

        Complex bendFrom = CurvatureAt(from), bendTo = CurvatureAt(to);
        int parts = Parts(from, to, step, bendFrom, bendTo);
        for (int i = 1; i < parts; i++)
        {
            double share = (double)i / parts;
            _sink.Add(
                Quintic(share, from.At, step * from.Direction, step * step * bendFrom, to.At, step * to.Direction, step * step * bendTo),
                Cubic(share, from.Time, step * from.Slowness, to.Time, step * to.Slowness));
        }

        _sink.Add(to.At, to.Time);
    }

    /// <summary>
    /// A chord of length l on an arc that turns by a cuts off about |Q| l a / 8 on each half. The step is divided as the more
    /// demanding of its ends asks.
    /// </summary>
    private int Parts(in Node from, in Node to, double step, Complex bendFrom, Complex bendTo)
    {
        double turn = Math.Max(
            step * (Complex.Abs(bendFrom) + Complex.Abs(bendTo)) / 2,
            Complex.Abs(to.Direction - from.Direction));
        double leak = Math.Max(from.Speed, to.Speed) * step * turn / 8;
        PathResolution start = _sink!.ResolutionAt(from.At), end = _sink.ResolutionAt(to.At);
        double parts = Math.Max(turn / Math.Min(start.Turn, end.Turn), Math.Sqrt(leak / Math.Min(start.Leak, end.Leak)));
        return (int)Math.Clamp(Math.Ceiling(parts), 1, MostPerStep);
    }

    private Complex CurvatureAt(in Node node)
    {
        double x = node.At.Real, y = node.At.Imaginary, qxx = 0, qxy = 0, qyy = 0;
        _field.Evaluate(
            new Points(new(in x), new(in y)),
            Ask.Gradient,
            new FlowBlock { Qxx = new(ref qxx), Qxy = new(ref qxy), Qyy = new(ref qyy) });
        double ux = node.Direction.Real, uy = node.Direction.Imaginary;
        double bend = ux * (qxy * ux + qyy * uy) - uy * (qxx * ux + qxy * uy);
        double curvature = _sign * bend / node.Speed;
        return double.IsFinite(curvature) ? new Complex(-uy, ux) * curvature : Complex.Zero;
    }

    private static Complex Quintic(double t, Complex p0, Complex v0, Complex a0, Complex p1, Complex v1, Complex a1)
    {
        double t2 = t * t, t3 = t2 * t, t4 = t3 * t, t5 = t4 * t;
        return p0
            + v0 * (t - 6 * t3 + 8 * t4 - 3 * t5)
            + a0 * (0.5 * t2 - 1.5 * t3 + 1.5 * t4 - 0.5 * t5)
            + a1 * (0.5 * t3 - t4 + 0.5 * t5)
            + v1 * (-4 * t3 + 7 * t4 - 3 * t5)
            + (p1 - p0) * (10 * t3 - 15 * t4 + 6 * t5);
    }

    private static double Cubic(double t, double p0, double v0, double p1, double v1)
    {
        double t2 = t * t, t3 = t2 * t;
        return p0 + v0 * (t - 2 * t2 + t3) + v1 * (t3 - t2) + (p1 - p0) * (3 * t2 - 2 * t3);
    }
}

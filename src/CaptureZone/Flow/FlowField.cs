using System.Numerics;
using CaptureZone.Aquifers;

namespace CaptureZone.Flow;

/// <summary>
/// Steady flow in the aquifer: banks, shared, with strengths of its own. Immutable; every member is pure and thread-safe.
/// </summary>
public sealed class FlowField
{
    /// <summary>Points that go through all banks before the next: few enough for their answers to stay in the nearest cache.</summary>
    private const int PointsAtATime = 1024;

    /// <summary>Points that a worker takes at a time: about 50 microseconds of work with a dozen wells.</summary>
    private const int PointsPerWorker = 4 * PointsAtATime;

    private readonly IBank[] _banks;
    private readonly Ask[] _gives;
    private readonly double[][] _strengths;

    internal FlowField(FlowSystem system, Parameters parameters, IBank[] banks, double[][] strengths)
    {
        System = system;
        Parameters = parameters;
        _banks = banks;
        _gives = [.. banks.Select(bank => bank.Gives)];
        _strengths = strengths;
    }

    /// <summary>The system it solves.</summary>
    public FlowSystem System { get; }

    /// <summary>What it is solved for.</summary>
    public Parameters Parameters { get; }

    /// <summary>The uniform regional discharge vector Qx + i Qy, m2/d; zero without regional flow.</summary>
    public Complex UniformDischarge => Parameters.Regional.Discharge(Parameters.Aquifer);

    /// <summary>The aquifer at a place.</summary>
    /// <param name="at">The place, m.</param>
    public Aquifer AquiferAt(Complex at) => Parameters.Aquifer;

    /// <summary>Evaluates the field at many points on the calling thread; overwrites what stands in the block.</summary>
    /// <param name="at">The points.</param>
    /// <param name="ask">What is wanted; the other spans of the block may be empty.</param>
    /// <param name="into">Where it goes.</param>
    /// <param name="side">Which limit, for points on a line with two sides.</param>
    public void Evaluate(Points at, Ask ask, in FlowBlock into, Side side = Side.Off)
    {
        if (at.Count <= PointsAtATime)
        {
            EvaluateTogether(at, ask, into, side);
            return;
        }

        for (int start = 0; start < at.Count; start += PointsAtATime)
        {
            int count = Math.Min(PointsAtATime, at.Count - start);
            EvaluateTogether(at.Slice(start, count), ask, into.Slice(ask, start, count), side);
        }
    }

    /// <summary>Evaluates the field at very many points, shared out among workers; the same bytes for any number of them.</summary>
    /// <param name="x">Eastings, m.</param>
    /// <param name="y">Northings, m; as many.</param>
    /// <param name="ask">What is wanted; the other memories may be empty.</param>
    /// <param name="into">Where it goes; overwritten.</param>
    /// <param name="workers">Who does the work.</param>
    /// <param name="side">Which limit, for points on a line with two sides.</param>
    public void EvaluateMany(
        ReadOnlyMemory<double> x, ReadOnlyMemory<double> y, Ask ask, FlowMemory into, IWorkers workers, Side side = Side.Off) =>
        ShareOut(x.Length, workers, (start, count) =>
            Evaluate(new Points(x.Span, y.Span).Slice(start, count), ask, into.Block.Slice(ask, start, count), side));

    /// <summary>Heads at very many points, m elevation, NaN where the aquifer is dry; shared out among workers.</summary>
    /// <param name="x">Eastings, m.</param>
    /// <param name="y">Northings, m; as many.</param>
    /// <param name="heads">Where they go; overwritten.</param>
    /// <param name="workers">Who does the work.</param>
    public void HeadsAt(ReadOnlyMemory<double> x, ReadOnlyMemory<double> y, Memory<double> heads, IWorkers workers) =>
        ShareOut(x.Length, workers, (start, count) =>
            HeadsAt(new Points(x.Span, y.Span).Slice(start, count), heads.Span.Slice(start, count)));

    /// <summary>Heads at many points, m elevation, on the calling thread; NaN where the aquifer is dry.</summary>
    /// <param name="at">The points.</param>
    /// <param name="heads">Where they go; overwritten.</param>
    public void HeadsAt(Points at, Span<double> heads)
    {
        for (int start = 0; start < at.Count; start += PointsAtATime)
        {
            int count = Math.Min(PointsAtATime, at.Count - start);
            Span<double> part = heads.Slice(start, count);
            EvaluateTogether(at.Slice(start, count), Ask.Potential, new FlowBlock { Potential = part }, Side.Off);
            Parameters.Aquifer.HeadsOf(part, part);
        }
    }

    /// <summary>Evaluates the field at one point; the same bits as in a block.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="ask">What is wanted; the rest stays zero.</param>
    /// <param name="side">Which limit, for a point on a line with two sides.</param>
    public PointFlow EvaluateAt(Complex at, Ask ask, Side side = Side.Off)
    {
        PointFlow flow = default;
        AddAt(at, ask, side, ref flow);
        return flow;
    }

    /// <summary>Potential and discharge at one point.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="side">Which limit, for a point on a line with two sides.</param>
    public FlowAt FlowAt(Complex at, Side side = Side.Off)
    {
        PointFlow flow = default;
        AddAt(at, Ask.Potential | Ask.Discharge, side, ref flow);
        return new FlowAt(flow.Potential, new Complex(flow.Qx, flow.Qy));
    }

    /// <summary>Discharge vector Qx + i Qy at one point, m2/d.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="side">Which limit, for a point on a line with two sides.</param>
    public Complex DischargeAt(Complex at, Side side = Side.Off)
    {
        PointFlow flow = default;
        AddAt(at, Ask.Discharge, side, ref flow);
        return new Complex(flow.Qx, flow.Qy);
    }

    /// <summary>
    /// Head at one point, m elevation; NaN where the aquifer is dry, the axis of an extraction well included (its potential is
    /// -infinity there: ask at the screen).
    /// </summary>
    /// <param name="at">The point, m.</param>
    public double HeadAt(Complex at) => AquiferAt(at).HeadOf(EvaluateAt(at, Ask.Potential).Potential);

    /// <summary>Flow across a polyline, m3/d, positive from its left to its right; the only stream-function difference there is.</summary>
    /// <param name="line">Its vertices, m.</param>
    public double FluxAcross(ReadOnlySpan<Complex> line)
    {
        double flux = 0;
        for (int i = 1; i < line.Length; i++)
        {
            flux += FluxAcross(line[i - 1], line[i]);
        }

        return flux;
    }

    /// <summary>Flow across a straight segment, m3/d, positive from its left to its right.</summary>
    /// <param name="a">Start, m.</param>
    /// <param name="b">End, m.</param>
    public double FluxAcross(Complex a, Complex b)
    {
        double flux = 0;
        for (int i = 0; i < _banks.Length; i++)
        {
            flux += _banks[i].FluxAcross(a, b, _strengths[i]);
        }

        return flux;
    }

    /// <summary>Divergence of the discharge vector: recharge, m/d.</summary>
    /// <param name="at">A point on no singular place, m.</param>
    public double DivergenceAt(Complex at)
    {
        double divergence = 0;
        for (int i = 0; i < _banks.Length; i++)
        {
            divergence += _banks[i].DivergenceAt(at, _strengths[i]);
        }

        return divergence;
    }

    /// <summary>What all elements together take out of the aquifer, m3/d.</summary>
    public double NetRate()
    {
        double sum = 0;
        for (int i = 0; i < _banks.Length; i++)
        {
            sum += _banks[i].NetRate(_strengths[i]);
        }

        return sum;
    }

    /// <summary>A bound on the norm of the discharge's derivative everywhere in a disc, m/d.</summary>
    /// <param name="centre">The disc's centre, m.</param>
    /// <param name="radius">Its radius, m.</param>
    public double GradientBound(Complex centre, double radius)
    {
        double bound = 0;
        for (int i = 0; i < _banks.Length; i++)
        {
            bound += _banks[i].GradientBound(centre, radius, _strengths[i]);
        }

        return bound;
    }

    /// <summary>Distance to the nearest singular place, m.</summary>
    /// <param name="at">A point, m.</param>
    public double DistanceToSingular(Complex at)
    {
        double nearest = double.PositiveInfinity;
        foreach (IBank bank in _banks)
        {
            nearest = Math.Min(nearest, bank.DistanceToSingular(at));
        }

        return nearest;
    }

    private static void ShareOut(int points, IWorkers workers, Action<int, int> body)
    {
        if (points <= PointsPerWorker)
        {
            body(0, points);
            return;
        }

        workers.For((points + PointsPerWorker - 1) / PointsPerWorker, part =>
        {
            int start = part * PointsPerWorker;
            body(start, Math.Min(PointsPerWorker, points - start));
        });
    }

    private void EvaluateTogether(Points at, Ask ask, in FlowBlock into, Side side)
    {
        Clear(at.Count, ask, into);
        for (int i = 0; i < _banks.Length; i++)
        {
            if ((_gives[i] & ask) != 0)
            {
                _banks[i].Add(at, side, ask, _strengths[i], into);
            }
        }
    }

    private void AddAt(Complex at, Ask ask, Side side, ref PointFlow into)
    {
        for (int i = 0; i < _banks.Length; i++)
        {
            if ((_gives[i] & ask) != 0)
            {
                _banks[i].AddAt(at.Real, at.Imaginary, side, ask, _strengths[i], ref into);
            }
        }
    }

    private static void Clear(int count, Ask ask, in FlowBlock into)
    {
        if ((ask & Ask.Potential) != 0)
        {
            into.Potential[..count].Clear();
        }

        if ((ask & Ask.Discharge) != 0)
        {
            into.Qx[..count].Clear();
            into.Qy[..count].Clear();
        }

        if ((ask & Ask.Gradient) != 0)
        {
            into.Qxx[..count].Clear();
            into.Qxy[..count].Clear();
            into.Qyy[..count].Clear();
        }
    }
}

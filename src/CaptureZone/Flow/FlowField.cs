using System.Numerics;
using CaptureZone.Aquifers;

namespace CaptureZone.Flow;

/// <summary>
/// Steady flow in the aquifer: banks, shared, with strengths of its own. Immutable; every member is pure and thread-safe.
/// </summary>
public sealed class FlowField
{
    private readonly IBank[] _banks;
    private readonly double[][] _strengths;

    internal FlowField(FlowSystem system, Parameters parameters, IBank[] banks, double[][] strengths)
    {
        System = system;
        Parameters = parameters;
        _banks = banks;
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
        into.Potential.Clear();
        into.Qx.Clear();
        into.Qy.Clear();
        into.Qxx.Clear();
        into.Qxy.Clear();
        into.Qyy.Clear();
        for (int i = 0; i < _banks.Length; i++)
        {
            _banks[i].Add(at, side, ask, _strengths[i], into);
        }
    }

    /// <summary>Potential and discharge at one point.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="side">Which limit, for a point on a line with two sides.</param>
    public FlowAt FlowAt(Complex at, Side side = Side.Off)
    {
        double x = at.Real, y = at.Imaginary, potential = 0, qx = 0, qy = 0;
        Evaluate(
            new Points(new(in x), new(in y)),
            Ask.Potential | Ask.Discharge,
            new FlowBlock { Potential = new(ref potential), Qx = new(ref qx), Qy = new(ref qy) },
            side);
        return new FlowAt(potential, new Complex(qx, qy));
    }

    /// <summary>Discharge vector Qx + i Qy at one point, m2/d.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="side">Which limit, for a point on a line with two sides.</param>
    public Complex DischargeAt(Complex at, Side side = Side.Off)
    {
        double x = at.Real, y = at.Imaginary, qx = 0, qy = 0;
        Evaluate(new Points(new(in x), new(in y)), Ask.Discharge, new FlowBlock { Qx = new(ref qx), Qy = new(ref qy) }, side);
        return new Complex(qx, qy);
    }

    /// <summary>Head at one point, m elevation; NaN where the aquifer is dry.</summary>
    /// <param name="at">The point, m.</param>
    public double HeadAt(Complex at) => AquiferAt(at).HeadOf(FlowAt(at).Potential);

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
}

using System.Numerics;
using BenchmarkDotNet.Attributes;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Tracing;

namespace CaptureZone.Benchmarks;

/// <summary>Paths from uniform random starts to their fates among 12 wells; vertices not stored, two threads.</summary>
public class PathTracing
{
    /// <summary>How many paths one operation follows.</summary>
    public const int Paths = 20_000;

    /// <summary>Half the side of the square in which wells and starts lie, m.</summary>
    private const double HalfSide = 1000;

    private readonly Tracer _tracer;
    private readonly Complex[] _starts;
    private readonly IWorkers _workers = new ThreadWorkers(2);

    /// <summary>Twelve wells of seeded places and rates, four of them injecting, in confined regional flow.</summary>
    public PathTracing()
    {
        Random random = new(12);
        Complex Place() => new(HalfSide * (2 * random.NextDouble() - 1), HalfSide * (2 * random.NextDouble() - 1));
        Element[] wells =
        [
            .. Enumerable.Range(0, 12).Select(i => new Well(
                $"W-{i + 1}", Place(), (i % 3 == 2 ? -1 : 1) * (50 + 250 * random.NextDouble()), 0.15, WellPurpose.Other)),
        ];
        Aquifer aquifer = new(18, 0, 12, 0.24);
        RegionalFlow regional = new(0.003, -0.4, 40, new Complex(-4000, 1500));
        _tracer = new Tracer(FlowSystem.Assemble(new Model(aquifer, regional, [.. wells])).Solve());
        _starts = [.. Enumerable.Range(0, Paths).Select(_ => Place())];
    }

    /// <summary>Follows every path with the water to its fate.</summary>
    [Benchmark(OperationsPerInvoke = Paths)]
    public double ToTheirFates()
    {
        double[] times = new double[Paths];
        _workers.For(Paths, i => times[i] = _tracer.Trace(_starts[i], Sense.Downstream, double.PositiveInfinity, null).Time);
        return times[0];
    }

    /// <summary>Largest drift of the stream function over the paths, as a share of the total rate.</summary>
    public double LargestDrift() => _starts.Max(start =>
        Math.Abs(_tracer.Trace(start, Sense.Downstream, double.PositiveInfinity, null).FluxDrift)) / _tracer.Stops.TotalRate;
}

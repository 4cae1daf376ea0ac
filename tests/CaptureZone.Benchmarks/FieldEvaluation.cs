using System.Numerics;
using BenchmarkDotNet.Attributes;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using NetTopologySuite.Geometries;

namespace CaptureZone.Benchmarks;

/// <summary>The flow of twelve wells in regional flow: at a million points at once, at one point at a time, and as contours.</summary>
[MemoryDiagnoser]
public class FieldEvaluation
{
    private const int Million = 1_000_000;

    private readonly double[] _x = new double[Million];
    private readonly double[] _y = new double[Million];
    private readonly double[] _one = new double[Million];
    private readonly double[] _other = new double[Million];
    private readonly FlowField _field;
    private int _next;

    public FieldEvaluation()
    {
        Random random = new(1);
        double Place() => 1000 * random.NextDouble() - 500;
        Element[] wells =
        [
            .. Enumerable.Range(0, 12).Select(j =>
                new Well($"W-{j}", new Complex(Place(), Place()), 200 * random.NextDouble() - 50, 0.15, WellPurpose.Other)),
        ];
        _field = FlowSystem.Assemble(new Model(
            new Aquifer(Conductivity: 18, Base: 212, Top: 224, Porosity: 0.24),
            new RegionalFlow(Gradient: 0.0031, Direction: -0.4, Head: 231.6, HeadAt: new Complex(-1500, 500)),
            [.. wells])).Solve();
        for (int i = 0; i < Million; i++)
        {
            (_x[i], _y[i]) = (2 * Place(), 2 * Place());
        }
    }

    [Benchmark]
    public void HeadsAtAMillionPoints() => _field.HeadsAt(new Points(_x, _y), _one);

    [Benchmark]
    public void DischargesAtAMillionPoints() =>
        _field.Evaluate(new Points(_x, _y), Ask.Discharge, new FlowBlock { Qx = _one, Qy = _other });

    [Benchmark]
    public void HeadsAtAMillionPointsOnTwoThreads() => _field.HeadsAt(_x, _y, _one, new ThreadWorkers(2));

    [Benchmark]
    public Complex DischargeAtOnePoint() => _field.DischargeAt(Next());

    [Benchmark]
    public double DischargeAndGradientAtOnePoint() => _field.EvaluateAt(Next(), Ask.Discharge | Ask.Gradient).Qxx;

    [Benchmark]
    public double HeadAtOnePoint() => _field.HeadAt(Next());

    [Benchmark]
    public double DistanceToTheNearestWell() => _field.DistanceToSingular(Next());

    [Benchmark]
    public HeadContourMap Contours() => HeadContours.Find(_field, new Envelope(-1000, 1000, -750, 750), 1);

    [Benchmark]
    public int Arrows() => FlowArrows.Sample(_field, new Envelope(-1000, 1000, -750, 750), across: 24).Length;

    private Complex Next()
    {
        _next = (_next + 1) & 0xFFFF;
        return new Complex(_x[_next], _y[_next]);
    }
}

using System.Numerics;
using System.Runtime.Intrinsics;
using CaptureZone.Flow;

namespace CaptureZone.Tracing;

/// <summary>One particle on its way from its start to its end.</summary>
internal ref struct Walk
{
    /// <summary>Longest step, as a share of the distance to the nearest singular place.</summary>
    private const double ShareOfSingular = 0.5;

    /// <summary>Longest step, as a share of the distance to the nearest stagnation point, where the direction jumps.</summary>
    private const double ShareOfStagnation = 0.5;

    /// <summary>First step, as a share of the longest.</summary>
    private const double FirstShare = 0.3;

    /// <summary>A step may grow by this factor, and shrink by its inverse, as a share of the longest.</summary>
    private const double MostGrowth = 2;

    /// <summary>Safety factor of the choice of steps.</summary>
    private const double Safety = 0.8;

    /// <summary>Cosine between the path and the ray from the centre above which a far particle moves outward for good.</summary>
    private const double OutwardCosine = 0.2;

    /// <summary>More steps than any path takes; reached only through a defect.</summary>
    private const int MostSteps = 100_000;

    private readonly PathStops _stops;
    private readonly FlowField _field;
    private readonly ReadOnlySpan<Snare> _snares;
    private readonly double _sign;
    private readonly double _longest;
    private readonly Stepper _stepper;
    private readonly PathVertices _vertices;
    private readonly int _leaving;
    private Node _node;
    private double _drift;

    internal Walk(
        PathStops stops,
        ReadOnlySpan<Snare> snares,
        double tolerance,
        Complex from,
        Sense sense,
        double longest,
        IPathSink? sink,
        int leaving)
    {
        _stops = stops;
        _field = stops.Field;
        _snares = snares;
        _sign = sense == Sense.Downstream ? 1 : -1;
        _longest = longest;
        _stepper = new Stepper(_field, _sign, tolerance);
        _vertices = new PathVertices(_field, _sign, sink);
        _leaving = leaving;
        _node = _stepper.Start(from);
    }

    internal PathEnd ToEnd()
    {
        _vertices.Start(_node);
        if (FateHere() is { } here)
        {
            return End(here);
        }

        Span<Vector256<double>> work = stackalloc Vector256<double>[Stepper.Workspace];
        double share = FirstShare;
        for (int i = 0; i < MostSteps; i++)
        {
            // The step is kept as a share of the longest one, which shrinks toward a well as the step must.
            double step = share * LongestStep(out double clearance);
            Node next = _stepper.Step(_node, step, clearance, work, out double error);
            if (!(error <= 1) || double.IsNaN(next.Slowness))
            {
                share *= double.IsFinite(error) ? Factor(error) : 1 / MostGrowth;
                continue;
            }

            Fate? fate = FateOnTheWay(ref next, work);
            Accept(next);
            if (fate is { } end)
            {
                return End(end);
            }

            share = Math.Min(1, share * Factor(error));
        }

        throw new InvalidOperationException("A path took more steps than any path takes.");
    }

    private static double Factor(double error) =>
        Math.Clamp(Safety * Math.Pow(error, -1.0 / DormandPrince.Order), 1 / MostGrowth, MostGrowth);

    private readonly PathEnd End(Fate fate)
    {
        double time = fate.Kind == FateKind.Stagnation ? double.PositiveInfinity : _node.Time;
        return new PathEnd(_node.At, fate, time, _node.Length, _drift);
    }

    private void Accept(in Node next)
    {
        _vertices.Step(_node, next);
        _drift += _field.FluxAcross(_node.At, next.At);
        _node = next;
    }

    /// <summary>The fate of a particle that need not move.</summary>
    private readonly Fate? FateHere()
    {
        if (ScreenAt(_node.At) is { } screen)
        {
            return FateOf(screen);
        }

        if (_node.Potential <= 0)
        {
            return new Fate(FateKind.Dry);
        }

        if (_longest <= 0)
        {
            return new Fate(FateKind.Time);
        }

        return SnareAt(_node.At) ?? (_node.Speed > 0 ? null : new Fate(FateKind.Stagnation));
    }

    /// <summary>Whether the path ends within a step that was computed; if so the step is cut to end there exactly.</summary>
    private readonly Fate? FateOnTheWay(ref Node next, Span<Vector256<double>> work)
    {
        Fate? fate = null;
        if (ScreenAt(next.At) is { } screen)
        {
            fate = FateOf(screen);
            Cut(ref next, new Mark(MarkKind.Circle, screen.At, screen.Radius), work);
        }
        else if (next.Potential < 0)
        {
            fate = new Fate(FateKind.Dry);
            Cut(ref next, new Mark(MarkKind.Base, default, 0), work);
        }

        if (next.Time >= _longest)
        {
            Cut(ref next, new Mark(MarkKind.Time, default, _longest), work);
            return new Fate(FateKind.Time);
        }

        return fate ?? SnareAt(next.At) ?? FarFate(next);
    }

    private readonly Fate FateOf(in Screen screen) => new(_sign > 0 ? FateKind.Well : FateKind.Injection, screen.Well);

    private readonly Screen? ScreenAt(Complex at)
    {
        foreach (ref readonly Screen screen in _stops.Screens.AsSpan())
        {
            if (screen.Rate * _sign > 0 && IsWithin(at, screen.At, screen.Radius))
            {
                return screen;
            }
        }

        return null;
    }

    private readonly Fate? SnareAt(Complex at)
    {
        foreach (ref readonly Snare snare in _snares)
        {
            if (snare.Index != _leaving && IsWithin(at, snare.At, snare.Radius))
            {
                return new Fate(FateKind.Stagnation, snare.Index);
            }
        }

        return null;
    }

    /// <summary>A path with a limit of time goes on until then, however far it is.</summary>
    private readonly Fate? FarFate(in Node node)
    {
        Complex ray = node.At - _stops.Centre;
        double distance = Complex.Abs(ray);
        if (distance >= _stops.InfinityRadius)
        {
            return new Fate(FateKind.Far);
        }

        if (distance < _stops.FarRadius || double.IsFinite(_longest))
        {
            return null;
        }

        double outward = (ray.Real * node.Direction.Real + ray.Imaginary * node.Direction.Imaginary) / distance;
        return outward > OutwardCosine ? new Fate(FateKind.Far) : null;
    }

    private static bool IsWithin(Complex at, Complex centre, double radius)
    {
        double dx = at.Real - centre.Real, dy = at.Imaginary - centre.Imaginary;
        return dx * dx + dy * dy <= radius * radius;
    }

    private readonly double LongestStep(out double clearance)
    {
        clearance = Math.Min(
            _field.DistanceToSingular(_node.At), Complex.Abs(_node.At - _stops.Centre) + _stops.Diameter);
        double nearest = double.PositiveInfinity;
        foreach (ref readonly Snare snare in _snares)
        {
            double dx = _node.At.Real - snare.At.Real, dy = _node.At.Imaginary - snare.At.Imaginary;
            nearest = Math.Min(nearest, dx * dx + dy * dy);
        }

        return Math.Min(ShareOfSingular * clearance, ShareOfStagnation * Math.Sqrt(nearest));
    }

    /// <summary>
    /// Cuts a step to where what remains before a mark is zero: Newton's method within a bracket, every trial a step of its own, so that
    /// the end is as exact as the method; the last correction, too short for any error, goes straight on.
    /// </summary>
    private readonly void Cut(ref Node next, in Mark mark, Span<Vector256<double>> work)
    {
        double low = 0, atLow = mark.Remaining(_node), high = next.Length - _node.Length, atHigh = mark.Remaining(next);
        double straight = Mark.StraightShare * high;
        double trial = high * (atLow / (atLow - atHigh));
        for (int i = 0; i < Mark.MostTrials && atLow > 0 && trial > low && trial < high; i++)
        {
            next = _stepper.Step(_node, trial, 1, work, out _);
            double left = mark.Remaining(next), ahead = left / mark.Rate(next);
            if (Math.Abs(ahead) <= straight)
            {
                next = _stepper.Straight(next, ahead);
                return;
            }

            (low, high) = left > 0 ? (trial, high) : (low, trial);
            trial += ahead;
            trial = trial > low && trial < high ? trial : (low + high) / 2;
        }
    }
}

using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;

namespace CaptureZone.Tracing;

/// <summary>
/// Takes single steps along paths: dz/ds = Q/|Q|, dt/ds = n h/|Q|, dPhi/ds = -|Q|. The four rates of a stage stand in one vector: x, y,
/// time, potential.
/// </summary>
/// <param name="field">The field.</param>
/// <param name="sign">1 with the water, -1 against it.</param>
/// <param name="tolerance">
/// Error allowed in a step, as a share of the distance to the nearest singular place (position) or of the time.
/// </param>
internal readonly struct Stepper(FlowField field, double sign, double tolerance)
{
    /// <summary>Weight of the error estimate of order 3 against that of order 5 (Hairer, Norsett and Wanner 1993, section II.10).</summary>
    private const double LowOrderWeight = 0.01;

    /// <summary>Space that one step needs.</summary>
    internal const int Workspace = DormandPrince.Stages;

    private readonly FlowField _field = field;
    private readonly double _sign = sign;
    private readonly double _tolerance = tolerance;
    private readonly Aquifer _aquifer = field.Parameters.Aquifer;

    /// <summary>The node at which a path starts.</summary>
    /// <param name="at">The place, m.</param>
    internal Node Start(Complex at)
    {
        FlowAt flow = _field.FlowAt(at);
        return NodeOf(at, 0, 0, flow.Discharge, flow.Potential);
    }

    /// <summary>One step.</summary>
    /// <param name="from">Where it starts.</param>
    /// <param name="step">Its arc length, m.</param>
    /// <param name="clearance">Distance to the nearest singular place, m.</param>
    /// <param name="work">Space for the stages.</param>
    /// <param name="error">Its error over the error allowed; not a number when it met a stagnation point.</param>
    internal Node Step(in Node from, double step, double clearance, Span<Vector256<double>> work, out double error)
    {
        bool confined = _aquifer.IsConfined(from.Potential);
        Node next = Step(from, step, clearance, work, confined, out error);
        return confined && !_aquifer.IsConfined(next.Potential) ? Step(from, step, clearance, work, false, out error) : next;
    }

    /// <summary>A way so short that it is straight.</summary>
    /// <param name="node">Where it starts.</param>
    /// <param name="step">Its arc length, m; negative to go back.</param>
    internal Node Straight(in Node node, double step) => node with
    {
        At = node.At + step * node.Direction,
        Time = node.Time + step * node.Slowness,
        Length = node.Length + step,
        Potential = node.Potential - _sign * step * node.Speed,
    };

    private Node Step(
        in Node from, double step, double clearance, Span<Vector256<double>> work, bool confined, out double error)
    {
        work[0] = Vector256.Create(from.Direction.Real, from.Direction.Imaginary, from.Slowness, -_sign * from.Speed);
        for (int stage = 1; stage < DormandPrince.Stages; stage++)
        {
            Vector256<double> moved = step * Weighted(DormandPrince.A(stage), work);
            work[stage] = RatesAt(new Complex(from.At.Real + moved[0], from.At.Imaginary + moved[1]), confined);
        }

        Vector256<double> order8 = Weighted(DormandPrince.B, work);
        Vector256<double> change = step * order8;
        Complex end = new(from.At.Real + change[0], from.At.Imaginary + change[1]);
        double time = from.Time + change[2];
        Vector256<double> high = Weighted(DormandPrince.E5, work);
        Vector256<double> low = order8
            - (DormandPrince.Bh[0] * work[0] + DormandPrince.Bh[1] * work[8] + DormandPrince.Bh[2] * work[11]);
        double place = _tolerance * clearance;
        error = Math.Max(
            Math.Max(Error(high[0], low[0], step, place), Error(high[1], low[1], step, place)),
            Error(high[2], low[2], step, _tolerance * time));
        return NodeOf(end, time, from.Length + step, _field.DischargeAt(end), from.Potential + change[3]);
    }

    private Node NodeOf(Complex at, double time, double length, Complex discharge, double potential)
    {
        double speed = Complex.Abs(discharge);
        double slowness = _aquifer.Porosity * _aquifer.SaturatedThickness(potential) / speed;
        return new Node(at, time, length, discharge * (_sign / speed), speed, slowness, potential);
    }

    private Vector256<double> RatesAt(Complex at, bool confined)
    {
        Complex discharge;
        double thickness;
        if (confined)
        {
            discharge = _field.DischargeAt(at);
            thickness = _aquifer.Thickness;
        }
        else
        {
            FlowAt flow = _field.FlowAt(at);
            discharge = flow.Discharge;
            thickness = _aquifer.SaturatedThickness(flow.Potential);
        }

        double speed = Math.Sqrt(discharge.Real * discharge.Real + discharge.Imaginary * discharge.Imaginary);
        double along = _sign / speed;
        return Vector256.Create(
            along * discharge.Real, along * discharge.Imaginary, _aquifer.Porosity * thickness / speed, -_sign * speed);
    }

    /// <summary>Even and odd stages are summed apart, so that the additions need not wait for each other.</summary>
    private static Vector256<double> Weighted(ReadOnlySpan<double> weights, ReadOnlySpan<Vector256<double>> rates)
    {
        ref double weight = ref MemoryMarshal.GetReference(weights);
        ref Vector256<double> rate = ref MemoryMarshal.GetReference(rates[..weights.Length]);
        Vector256<double> even = Vector256<double>.Zero, odd = Vector256<double>.Zero;
        int j = 0;
        for (; j + 1 < weights.Length; j += 2)
        {
            even += Unsafe.Add(ref weight, j) * Unsafe.Add(ref rate, j);
            odd += Unsafe.Add(ref weight, j + 1) * Unsafe.Add(ref rate, j + 1);
        }

        return j == weights.Length ? even + odd : even + odd + Unsafe.Add(ref weight, j) * Unsafe.Add(ref rate, j);
    }

    private static double Error(double high, double low, double step, double allowed)
    {
        double norm = Math.Sqrt(high * high + LowOrderWeight * low * low);
        return norm == 0 ? 0 : step * high * high / (norm * allowed);
    }
}

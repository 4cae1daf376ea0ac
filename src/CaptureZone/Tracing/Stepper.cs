using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;

namespace CaptureZone.Tracing;

/// <summary>Takes single steps along paths: dz/ds = Q/|Q|, dt/ds = n h/|Q|.</summary>
/// <param name="field">The field.</param>
/// <param name="sign">1 with the water, -1 against it.</param>
/// <param name="tolerance">
/// Error allowed in a step, as a share of the distance to the nearest singular place (position) or of the time.
/// </param>
internal readonly struct Stepper(FlowField field, double sign, double tolerance)
{
    /// <summary>Weight of the error estimate of order 3 against that of order 5 (Hairer, Norsett and Wanner 1993, section II.10).</summary>
    private const double LowOrderWeight = 0.01;

    private readonly FlowField _field = field;
    private readonly double _sign = sign;
    private readonly double _tolerance = tolerance;
    private readonly Aquifer _aquifer = field.Parameters.Aquifer;

    /// <summary>Space that one step needs.</summary>
    internal const int Workspace = 3 * DormandPrince.Stages;

    /// <summary>The node at a place.</summary>
    /// <param name="at">The place, m.</param>
    /// <param name="time">Time since the start, d.</param>
    /// <param name="length">Arc length since the start, m.</param>
    internal Node NodeAt(Complex at, double time, double length)
    {
        FlowAt flow = _field.FlowAt(at);
        double speed = Complex.Abs(flow.Discharge);
        double slowness = _aquifer.Porosity * _aquifer.SaturatedThickness(flow.Potential) / speed;
        return new Node(at, time, length, flow.Discharge * (_sign / speed), speed, slowness, flow.Potential);
    }

    /// <summary>One step.</summary>
    /// <param name="from">Where it starts.</param>
    /// <param name="step">Its arc length, m.</param>
    /// <param name="clearance">Distance to the nearest singular place, m.</param>
    /// <param name="work">Space for the stages.</param>
    /// <param name="error">Its error over the error allowed; not a number when it met a stagnation point.</param>
    internal Node Step(in Node from, double step, double clearance, Span<double> work, out double error)
    {
        bool confined = _aquifer.IsConfined(from.Potential);
        Node next = Step(from, step, clearance, work, confined, out error);
        return confined && !_aquifer.IsConfined(next.Potential) ? Step(from, step, clearance, work, false, out error) : next;
    }

    private Node Step(in Node from, double step, double clearance, Span<double> work, bool confined, out double error)
    {
        Span<double> kx = work[..DormandPrince.Stages];
        Span<double> ky = work.Slice(DormandPrince.Stages, DormandPrince.Stages);
        Span<double> kt = work[(2 * DormandPrince.Stages)..];
        (kx[0], ky[0], kt[0]) = (from.Direction.Real, from.Direction.Imaginary, from.Slowness);
        for (int stage = 1; stage < DormandPrince.Stages; stage++)
        {
            ReadOnlySpan<double> a = DormandPrince.A(stage);
            double x = 0, y = 0;
            for (int j = 0; j < a.Length; j++)
            {
                x += a[j] * kx[j];
                y += a[j] * ky[j];
            }

            Complex at = new(from.At.Real + step * x, from.At.Imaginary + step * y);
            Stage(at, confined, out kx[stage], out ky[stage], out kt[stage]);
        }

        double dx = 0, dy = 0, dt = 0;
        ReadOnlySpan<double> b = DormandPrince.B;
        for (int j = 0; j < b.Length; j++)
        {
            dx += b[j] * kx[j];
            dy += b[j] * ky[j];
            dt += b[j] * kt[j];
        }

        Complex end = new(from.At.Real + step * dx, from.At.Imaginary + step * dy);
        double time = from.Time + step * dt;
        error = Math.Max(
            Math.Max(Error(kx, step, _tolerance * clearance), Error(ky, step, _tolerance * clearance)),
            Error(kt, step, _tolerance * time));
        return NodeAt(end, time, from.Length + step);
    }

    private void Stage(Complex at, bool confined, out double x, out double y, out double slowness)
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

        double inverse = 1 / Math.Sqrt(discharge.Real * discharge.Real + discharge.Imaginary * discharge.Imaginary);
        x = _sign * discharge.Real * inverse;
        y = _sign * discharge.Imaginary * inverse;
        slowness = _aquifer.Porosity * thickness * inverse;
    }

    private static double Error(ReadOnlySpan<double> k, double step, double allowed)
    {
        double high = 0, low = 0;
        ReadOnlySpan<double> b = DormandPrince.B, e5 = DormandPrince.E5, bh = DormandPrince.Bh;
        for (int j = 0; j < k.Length; j++)
        {
            high += e5[j] * k[j];
            low += b[j] * k[j];
        }

        low -= bh[0] * k[0] + bh[1] * k[8] + bh[2] * k[11];
        double norm = Math.Sqrt(high * high + LowOrderWeight * low * low);
        return norm == 0 ? 0 : step * high * high / (norm * allowed);
    }
}

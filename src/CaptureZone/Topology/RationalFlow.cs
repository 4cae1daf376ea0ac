using System.Numerics;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;

namespace CaptureZone.Topology;

/// <summary>
/// Wells in uniform flow as one rational function, W(z) = W0 - sum q_j / (2 pi (z - z_j)), with W = Qx - i Qy
/// (O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989). Wells at one place are one sink; sinks without a rate are left out.
/// Immutable; needs no field, so that sizing and reliability can ask it thousands of times.
/// </summary>
public sealed class RationalFlow
{
    /// <summary>A sink is the nearer one only when its squared distance is below this share, so that ties do not alternate.</summary>
    private const double Closer = 0.5;

    private readonly double[] _x;
    private readonly double[] _y;
    private readonly double[] _strength;

    private RationalFlow(Complex uniform, double[] x, double[] y, double[] strength)
    {
        Uniform = uniform;
        _x = x;
        _y = y;
        _strength = strength;
    }

    /// <summary>The uniform part W0 = Qx - i Qy, m2/d.</summary>
    public Complex Uniform { get; }

    /// <summary>How many sinks, each at a place of its own.</summary>
    public int Count => _strength.Length;

    /// <summary>The flow of a field that superposes nothing but uniform flow and wells.</summary>
    /// <param name="field">The field.</param>
    public static RationalFlow Of(FlowField field)
    {
        Well[] wells = field.System.Wells;
        Complex[] places = new Complex[wells.Length];
        for (int j = 0; j < places.Length; j++)
        {
            places[j] = wells[j].At;
        }

        Parameters parameters = field.Parameters;
        Complex uniform = Complex.Conjugate(parameters.Regional.Discharge(parameters.Aquifer));
        return Of(uniform, places, parameters.Rates.AsSpan());
    }

    /// <summary>The flow of sinks in uniform flow.</summary>
    /// <param name="uniform">The uniform part W0 = Qx - i Qy, m2/d.</param>
    /// <param name="places">Where the sinks are, m; places that are equal to the last bit become one sink.</param>
    /// <param name="rates">Their rates, m3/d, positive for extraction.</param>
    public static RationalFlow Of(Complex uniform, ReadOnlySpan<Complex> places, ReadOnlySpan<double> rates)
    {
        double[] x = new double[places.Length], y = new double[places.Length], strength = new double[places.Length];
        int count = 0;
        for (int j = 0; j < places.Length; j++)
        {
            double rate = RateAtFirst(j, places, rates);
            if (rate != 0)
            {
                x[count] = places[j].Real;
                y[count] = places[j].Imaginary;
                strength[count++] = rate / (2 * Math.PI);
            }
        }

        return new RationalFlow(uniform, x[..count], y[..count], strength[..count]);
    }

    /// <summary>All zeros of W, certified.</summary>
    public RationalZeros Zeros() => RationalZeros.Of(this);

    /// <summary>Place of a sink, m.</summary>
    /// <param name="sink">Its index, from 0.</param>
    public Complex Place(int sink) => new(_x[sink], _y[sink]);

    /// <summary>Strength s = q / (2 pi) of a sink, m3/d.</summary>
    /// <param name="sink">Its index, from 0.</param>
    public double Strength(int sink) => _strength[sink];

    /// <summary>W = Qx - i Qy, m2/d.</summary>
    /// <param name="at">A place that is no sink's, m.</param>
    public Complex At(Complex at)
    {
        Complex w = Uniform;
        for (int j = 0; j < Count; j++)
        {
            w -= _strength[j] / (at - Place(j));
        }

        return w;
    }

    /// <summary>From one sink to another, m; good to the last bit however far both are from the origin.</summary>
    internal Complex Between(int from, int to) => new(_x[to] - _x[from], _y[to] - _y[from]);

    /// <summary>
    /// The flow near a sink a, that sink's pole lifted: with d = z - z_a the function g = W d = W_rest d - s_a is smooth
    /// there, and keeps its digits however weak the sink is.
    /// </summary>
    internal LiftedFlow Lifted(in NearSink at)
    {
        double wx = Uniform.Real, wy = Uniform.Imaginary, slopeX = 0, slopeY = 0, polesX = 0, polesY = 0;
        double size = Math.Abs(wx) + Math.Abs(wy);
        double own = at.X * at.X + at.Y * at.Y, nearest = own;
        int nearestSink = at.Sink;
        double sinkX = _x[at.Sink], sinkY = _y[at.Sink];
        for (int j = 0; j < _strength.Length; j++)
        {
            if (j == at.Sink)
            {
                continue;
            }

            double dx = at.X + (sinkX - _x[j]), dy = at.Y + (sinkY - _y[j]);
            double square = dx * dx + dy * dy;
            double inverse = 1 / square;
            double ux = dx * inverse, uy = -dy * inverse, s = _strength[j];
            polesX += ux;
            polesY += uy;
            wx -= s * ux;
            wy -= s * uy;
            slopeX += s * (ux * ux - uy * uy);
            slopeY += s * (2 * ux * uy);
            size += Math.Abs(s) * (Math.Abs(ux) + Math.Abs(uy));
            if (square < nearest)
            {
                nearest = square;
                nearestSink = j;
            }
        }

        double strength = _strength[at.Sink];
        return new LiftedFlow
        {
            Value = new Complex(wx * at.X - wy * at.Y - strength, wx * at.Y + wy * at.X),
            Slope = new Complex(wx + slopeX * at.X - slopeY * at.Y, wy + slopeX * at.Y + slopeY * at.X),
            OtherPoles = new Complex(polesX, polesY),
            Size = Math.Abs(strength) + size * Math.Sqrt(own),
            Nearest = nearest < Closer * own ? nearestSink : at.Sink,
        };
    }

    private static double RateAtFirst(int well, ReadOnlySpan<Complex> places, ReadOnlySpan<double> rates)
    {
        double sum = rates[well];
        for (int j = 0; j < places.Length; j++)
        {
            if (j != well && places[j] == places[well])
            {
                if (j < well)
                {
                    return 0;
                }

                sum += rates[j];
            }
        }

        return sum;
    }
}

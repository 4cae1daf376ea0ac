using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Wells: Omega = (q / 2 pi) ln(z - zw), W = -(q / 2 pi) / (z - zw) (Thiem, 1906; O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989).
/// Strength: the rate q of each well, m3/d, positive for extraction.
/// </summary>
public sealed class WellBank : IBank
{
    private readonly double[] _x;
    private readonly double[] _y;

    /// <summary>Takes the wells' places.</summary>
    /// <param name="wells">The wells, in the order of the strengths.</param>
    public WellBank(IReadOnlyList<Well> wells)
    {
        _x = [.. wells.Select(well => well.At.Real)];
        _y = [.. wells.Select(well => well.At.Imaginary)];
    }

    /// <inheritdoc/>
    public int Columns => _x.Length;

    /// <inheritdoc/>
    public void Add(Points at, Side side, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into)
    {
        for (int i = 0; i < at.Count; i++)
        {
            double potential = 0, qx = 0, qy = 0, qxx = 0, qxy = 0;
            for (int j = 0; j < _x.Length; j++)
            {
                double dx = at.X[i] - _x[j], dy = at.Y[i] - _y[j];
                double r2 = dx * dx + dy * dy;
                double s = strength[j] / (2 * Math.PI);
                double c = s / r2;
                if (ask.HasFlag(Ask.Potential))
                {
                    potential += s * 0.5 * Math.Log(r2);
                }

                qx -= c * dx;
                qy -= c * dy;
                qxx += c * (dx * dx - dy * dy) / r2;
                qxy += c * 2 * dx * dy / r2;
            }

            if (ask.HasFlag(Ask.Potential))
            {
                into.Potential[i] += potential;
            }

            if (ask.HasFlag(Ask.Discharge))
            {
                into.Qx[i] += qx;
                into.Qy[i] += qy;
            }

            if (ask.HasFlag(Ask.Gradient))
            {
                into.Qxx[i] += qxx;
                into.Qxy[i] += qxy;
                into.Qyy[i] -= qxx;
            }
        }
    }

    /// <inheritdoc/>
    public void Influence(Points at, Side side, Ask ask, Span<double> rows, int stride)
    {
        int row = 0;
        for (int i = 0; i < at.Count; i++)
        {
            int potential = ask.HasFlag(Ask.Potential) ? row++ : -1;
            int qx = ask.HasFlag(Ask.Discharge) ? row++ : -1;
            int qy = ask.HasFlag(Ask.Discharge) ? row++ : -1;
            for (int j = 0; j < _x.Length; j++)
            {
                double dx = at.X[i] - _x[j], dy = at.Y[i] - _y[j];
                double r2 = dx * dx + dy * dy;
                if (potential >= 0)
                {
                    rows[potential * stride + j] = Math.Log(r2) / (4 * Math.PI);
                }

                if (qx >= 0)
                {
                    rows[qx * stride + j] = -dx / (2 * Math.PI * r2);
                    rows[qy * stride + j] = -dy / (2 * Math.PI * r2);
                }
            }
        }
    }

    /// <inheritdoc/>
    public double FluxAcross(Complex a, Complex b, ReadOnlySpan<double> strength)
    {
        double flux = 0;
        for (int j = 0; j < _x.Length; j++)
        {
            double ax = a.Real - _x[j], ay = a.Imaginary - _y[j];
            double bx = b.Real - _x[j], by = b.Imaginary - _y[j];
            flux -= strength[j] * Math.Atan2(ax * by - ay * bx, ax * bx + ay * by);
        }

        return flux / (2 * Math.PI);
    }

    /// <inheritdoc/>
    public double GradientBound(Complex centre, double radius, ReadOnlySpan<double> strength)
    {
        double bound = 0;
        for (int j = 0; j < _x.Length; j++)
        {
            double near = Complex.Abs(centre - new Complex(_x[j], _y[j])) - radius;
            bound += near > 0 ? Math.Abs(strength[j]) / (2 * Math.PI * near * near) : double.PositiveInfinity;
        }

        return bound;
    }

    /// <inheritdoc/>
    public double NetRate(ReadOnlySpan<double> strength)
    {
        double sum = 0;
        foreach (double rate in strength)
        {
            sum += rate;
        }

        return sum;
    }

    /// <inheritdoc/>
    public double DivergenceAt(Complex at, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double DistanceToSingular(Complex at)
    {
        double nearest = double.PositiveInfinity;
        for (int j = 0; j < _x.Length; j++)
        {
            double dx = at.Real - _x[j], dy = at.Imaginary - _y[j];
            nearest = Math.Min(nearest, dx * dx + dy * dy);
        }

        return Math.Sqrt(nearest);
    }
}

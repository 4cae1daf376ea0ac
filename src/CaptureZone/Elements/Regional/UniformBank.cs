using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Regional;

/// <summary>
/// Uniform flow, Phi = -(Qx (x - x0) + Qy (y - y0)). Strengths: Qx and Qy, m2/d.
/// </summary>
/// <param name="origin">Where its potential is zero, m.</param>
public sealed class UniformBank(Complex origin) : IBank
{
    /// <inheritdoc/>
    public int Columns => 2;

    /// <inheritdoc/>
    public Ask Gives => Ask.Potential | Ask.Discharge;

    /// <inheritdoc/>
    public void Add(Points at, Side side, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into)
    {
        double qx = strength[0], qy = strength[1];
        if ((ask & Ask.Potential) != 0)
        {
            for (int i = 0; i < at.Count; i++)
            {
                into.Potential[i] -= qx * (at.X[i] - origin.Real) + qy * (at.Y[i] - origin.Imaginary);
            }
        }

        if ((ask & Ask.Discharge) != 0)
        {
            for (int i = 0; i < at.Count; i++)
            {
                into.Qx[i] += qx;
                into.Qy[i] += qy;
            }
        }
    }

    /// <inheritdoc/>
    public void AddAt(double x, double y, Side side, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        double qx = strength[0], qy = strength[1];
        if ((ask & Ask.Potential) != 0)
        {
            into.Potential -= qx * (x - origin.Real) + qy * (y - origin.Imaginary);
        }

        if ((ask & Ask.Discharge) != 0)
        {
            into.Qx += qx;
            into.Qy += qy;
        }
    }

    /// <inheritdoc/>
    public void Influence(Points at, Side side, Ask ask, Span<double> rows, int stride)
    {
        for (int i = 0, row = 0; i < at.Count; i++)
        {
            if (ask.HasFlag(Ask.Potential))
            {
                rows[row * stride] = origin.Real - at.X[i];
                rows[row++ * stride + 1] = origin.Imaginary - at.Y[i];
            }

            if (ask.HasFlag(Ask.Discharge))
            {
                rows[row * stride] = 1;
                rows[row++ * stride + 1] = 0;
                rows[row * stride] = 0;
                rows[row++ * stride + 1] = 1;
            }
        }
    }

    /// <inheritdoc/>
    public double FluxAcross(Complex a, Complex b, ReadOnlySpan<double> strength) =>
        strength[0] * (b.Imaginary - a.Imaginary) - strength[1] * (b.Real - a.Real);

    /// <inheritdoc/>
    public double GradientBound(Complex centre, double radius, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double NetRate(ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double DivergenceAt(Complex at, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double DistanceToSingular(Complex at) => double.PositiveInfinity;
}

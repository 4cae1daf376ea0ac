using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Regional;

/// <summary>A constant potential. Strength: the potential itself, m3/d.</summary>
public sealed class ConstantBank : IBank
{
    /// <inheritdoc/>
    public int Columns => 1;

    /// <inheritdoc/>
    public Ask Gives => Ask.Potential;

    /// <inheritdoc/>
    public void Add(Points at, Side side, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into)
    {
        if ((ask & Ask.Potential) == 0)
        {
            return;
        }

        double constant = strength[0];
        Span<double> potential = into.Potential;
        for (int i = 0; i < at.Count; i++)
        {
            potential[i] += constant;
        }
    }

    /// <inheritdoc/>
    public void AddAt(double x, double y, Side side, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        if ((ask & Ask.Potential) != 0)
        {
            into.Potential += strength[0];
        }
    }

    /// <inheritdoc/>
    public void Influence(Points at, Side side, Ask ask, Span<double> rows, int stride)
    {
        for (int i = 0, row = 0; i < at.Count; i++)
        {
            if (ask.HasFlag(Ask.Potential))
            {
                rows[row++ * stride] = 1;
            }

            if (ask.HasFlag(Ask.Discharge))
            {
                rows[row++ * stride] = 0;
                rows[row++ * stride] = 0;
            }
        }
    }

    /// <inheritdoc/>
    public double FluxAcross(Complex a, Complex b, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double GradientBound(Complex centre, double radius, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double NetRate(ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double DivergenceAt(Complex at, ReadOnlySpan<double> strength) => 0;

    /// <inheritdoc/>
    public double DistanceToSingular(Complex at) => double.PositiveInfinity;
}

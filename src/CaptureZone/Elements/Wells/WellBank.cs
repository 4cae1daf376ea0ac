using System.Numerics;
using System.Runtime.Intrinsics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Wells: Omega = (q / 2 pi) ln(z - zw), W = -(q / 2 pi) / (z - zw) (Thiem, 1906; O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989).
/// Strength: the rate q of each well, m3/d, positive for extraction. On its own axis a well has the potential -infinity when it
/// extracts and +infinity when it injects, and adds nothing to the discharge and its derivatives (their mean over any circle
/// round the axis). A well of strength zero adds nothing anywhere.
/// </summary>
public sealed class WellBank : IBank
{
    /// <summary>
    /// Both coordinates of the wells of strength zero that fill the last lanes, m: so far that they are never the nearest, and
    /// near enough for the square of their distance to stay finite.
    /// </summary>
    private const double Nowhere = 1e150;

    private readonly double[] _x;
    private readonly double[] _y;

    /// <summary>Takes the wells' places.</summary>
    /// <param name="wells">The wells, in the order of the strengths.</param>
    public WellBank(IReadOnlyList<Well> wells)
    {
        Columns = wells.Count;
        _x = InLanes(wells, well => well.At.Real);
        _y = InLanes(wells, well => well.At.Imaginary);
    }

    /// <inheritdoc/>
    public int Columns { get; }

    private WellPlaces Places => new(_x, _y);

    /// <inheritdoc/>
    public void Add(Points at, Side side, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into)
    {
        int together = Vector256.IsHardwareAccelerated ? at.Count & ~(WellPlaces.Lanes - 1) : 0;
        WellsAtFourPoints.Add(Places, at, together, ask, strength, into);
        for (int i = together; i < at.Count; i++)
        {
            PointFlow flow = default;
            AddAt(at.X[i], at.Y[i], side, ask, strength, ref flow);
            into.Add(i, ask, flow);
        }
    }

    /// <inheritdoc/>
    public void AddAt(double x, double y, Side side, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        if (Vector256.IsHardwareAccelerated)
        {
            WellsAtOnePoint.Add(Places, x, y, ask, strength, ref into);
        }
        else
        {
            ScalarWells.Add(Places, x, y, ask, strength, ref into);
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
            for (int j = 0; j < Columns; j++)
            {
                double dx = at.X[i] - _x[j], dy = at.Y[i] - _y[j];
                double r2 = dx * dx + dy * dy;
                if (potential >= 0)
                {
                    rows[potential * stride + j] = Math.Log(r2) * WellPlaces.OneOverFourPi;
                }

                if (qx >= 0)
                {
                    double reciprocal = 1 / Math.Max(r2, WellPlaces.OnAxis);
                    rows[qx * stride + j] = -dx * reciprocal * WellPlaces.OneOverTwoPi;
                    rows[qy * stride + j] = -dy * reciprocal * WellPlaces.OneOverTwoPi;
                }
            }
        }
    }

    /// <inheritdoc/>
    public double FluxAcross(Complex a, Complex b, ReadOnlySpan<double> strength)
    {
        double sum = WellsAcrossSegment.RateTimesAngle(Places, a.Real, a.Imaginary, b.Real, b.Imaginary, strength);
        return -sum * WellPlaces.OneOverTwoPi;
    }

    /// <inheritdoc/>
    public double GradientBound(Complex centre, double radius, ReadOnlySpan<double> strength)
    {
        double bound = 0;
        for (int j = 0; j < strength.Length; j++)
        {
            if (strength[j] != 0)
            {
                double near = Complex.Abs(centre - new Complex(_x[j], _y[j])) - radius;
                bound += near > 0 ? Math.Abs(strength[j]) / (near * near) : double.PositiveInfinity;
            }
        }

        return bound * WellPlaces.OneOverTwoPi;
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
        if (Columns == 0)
        {
            return double.PositiveInfinity;
        }

        Vector256<double> nearest = Vector256.Create(double.PositiveInfinity);
        for (int j = 0; j < _x.Length; j += WellPlaces.Lanes)
        {
            Vector256<double> dx = Vector256.Create(at.Real) - Vector256.Create(_x, j);
            Vector256<double> dy = Vector256.Create(at.Imaginary) - Vector256.Create(_y, j);
            nearest = Vector256.MinNative(nearest, dx * dx + dy * dy);
        }

        Vector128<double> half = Vector128.MinNative(nearest.GetLower(), nearest.GetUpper());
        return Math.Sqrt(Math.Min(half[0], half[1]));
    }

    private static double[] InLanes(IReadOnlyList<Well> wells, Func<Well, double> coordinate)
    {
        double[] lanes = new double[(wells.Count + WellPlaces.Lanes - 1) / WellPlaces.Lanes * WellPlaces.Lanes];
        Array.Fill(lanes, Nowhere);
        for (int j = 0; j < wells.Count; j++)
        {
            lanes[j] = coordinate(wells[j]);
        }

        return lanes;
    }
}

using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// Zeros that rounding cannot tell apart, as one zero of their number m: it lies where the derivative of order m - 1 is zero,
/// which is a simple zero of that derivative and keeps all digits.
/// </summary>
internal static class MultipleZero
{
    /// <summary>A value is as good as zero below this many times its rounding: overlapping discs of two zeros imply 4.</summary>
    private const double Tolerance = 16;

    /// <summary>Most Newton steps: the start is the mean of the group, which is good already.</summary>
    private const int MostSteps = 20;

    /// <summary>Finds the multiple zero of a group.</summary>
    /// <param name="flow">The flow.</param>
    /// <param name="mean">Mean of the group.</param>
    /// <param name="reach">Farthest that the zeros can be from the mean, m.</param>
    /// <param name="order">How many they are.</param>
    /// <param name="at">Where it is.</param>
    /// <returns>False when the zeros of the group do differ.</returns>
    internal static bool TryFind(RationalFlow flow, NearSink mean, double reach, int order, out NearSink at)
    {
        at = mean;
        Span<Complex> terms = stackalloc Complex[order + 1];
        for (int step = 0; step < MostSteps; step++)
        {
            double unit = Expand(flow, at, terms);
            Complex move = -unit * terms[order - 1] / (order * terms[order]);
            at = at.Moved(move);
            if (!(Complex.Abs(move) > 2 * Rounding.Unit * at.Distance))
            {
                break;
            }
        }

        Complex moved = at.Offset - mean.Offset;
        return Complex.Abs(moved) <= reach && IsMultiple(flow, at, order, terms);
    }

    /// <summary>Whether all lower derivatives vanish as far as rounding lets them be known.</summary>
    private static bool IsMultiple(RationalFlow flow, NearSink at, int order, Span<Complex> terms)
    {
        Expand(flow, at, terms);
        double zero = Tolerance * Rounding.OfSum(flow.Count) * flow.Lifted(at).Size / at.Distance;

        // Within this distance, in the unit of the expansion, the term of the multiple zero itself is below rounding.
        double blur = Math.Pow(zero / Complex.Abs(terms[order]), 1.0 / order), power = 1;
        for (int k = 0; k < order; k++, power *= blur)
        {
            if (!(Complex.Abs(terms[k]) * power <= zero))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Taylor's coefficients of W about a place, in the unit returned: the distance to its sink, m.</summary>
    private static double Expand(RationalFlow flow, NearSink at, Span<Complex> terms)
    {
        double unit = at.Distance;
        terms.Clear();
        terms[0] = flow.Uniform;
        for (int j = 0; j < flow.Count; j++)
        {
            Complex inverse = -unit / (flow.Between(j, at.Sink) + at.Offset);
            Complex term = flow.Strength(j) / unit;
            for (int k = 0; k < terms.Length; k++)
            {
                term *= inverse;
                terms[k] += term;
            }
        }

        return unit;
    }
}

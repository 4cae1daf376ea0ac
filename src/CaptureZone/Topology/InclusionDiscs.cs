using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// Discs that together hold every zero, and a separate group of m of them exactly m (B.T. Smith, J. ACM 17 (1970) 661, from memory:
/// Gerschgorin's theorem on the matrix diag(r) - w 1^T, whose eigenvalues are the zeros, r being the approximations and
/// w_i = P(r_i) / prod (r_i - r_k)). Scaling the matrix by the roots of the w makes the radius of a disc
/// sqrt |w_i| times the sum of sqrt |w_k|, so that an ill-determined zero does not blow up the others' discs.
/// </summary>
internal static class InclusionDiscs
{
    /// <summary>Room for the zeros at infinity, which bend the leading coefficient by less than a third, and for rounding here.</summary>
    private const double Slack = 1.5;

    /// <summary>Writes the radius of every disc, m.</summary>
    internal static void Write(RationalFlow flow, FarFlow far, ReadOnlySpan<NearSink> zeros, Span<double> radius)
    {
        double sum = 0;
        for (int i = 0; i < zeros.Length; i++)
        {
            radius[i] = Math.Sqrt(Slack * Correction(flow, far, zeros, i));
            sum += radius[i];
        }

        for (int i = 0; i < zeros.Length; i++)
        {
            radius[i] *= sum;
        }
    }

    /// <summary>Distance between two approximations, m.</summary>
    internal static double Distance(RationalFlow flow, in NearSink a, in NearSink b) => Complex.Abs(Apart(flow, a, b));

    /// <summary>Writes for every approximation the first one of its group: of those whose discs hang together.</summary>
    internal static void Group(RationalFlow flow, ReadOnlySpan<NearSink> zeros, ReadOnlySpan<double> radius, Span<int> first)
    {
        for (int i = 0; i < zeros.Length; i++)
        {
            first[i] = i;
            for (int k = 0; k < i; k++)
            {
                double reach = radius[i] + radius[k];
                if (first[k] != first[i] && !(Square(Apart(flow, zeros[i], zeros[k])) > reach * reach))
                {
                    int kept = Math.Min(first[i], first[k]);
                    first[..(i + 1)].Replace(Math.Max(first[i], first[k]), kept);
                }
            }
        }
    }

    /// <summary>Bound on |w_i|, m, rounding included.</summary>
    private static double Correction(RationalFlow flow, FarFlow far, ReadOnlySpan<NearSink> zeros, int i)
    {
        NearSink at = zeros[i];
        LiftedFlow near = flow.Lifted(at);
        double value = Complex.Abs(near.Value) + Rounding.OfSum(flow.Count) * near.Size;

        // The pole of its own sink is in the lifted value. Factors go in pairs, so that the product stays in range.
        double square = 1;
        for (int j = 0; j < flow.Count; j++)
        {
            double toSink = j == at.Sink ? 1 : Square(flow.Between(j, at.Sink) + at.Offset);
            double toZero = j == i || j >= zeros.Length ? 1 : Square(Apart(flow, zeros[j], at));
            square *= toSink / toZero;
        }

        return value / Complex.Abs(far.Leading) * Math.Sqrt(square);
    }

    private static Complex Apart(RationalFlow flow, in NearSink from, in NearSink to) =>
        to.Offset - from.Offset + flow.Between(from.Sink, to.Sink);

    private static double Square(Complex z) => z.Real * z.Real + z.Imaginary * z.Imaginary;
}

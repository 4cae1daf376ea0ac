using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// All zeros of a rational flow at once, by the iteration of Ehrlich and Aberth (L.W. Ehrlich, Comm. ACM 10 (1967) 107; O. Aberth,
/// Math. Comp. 27 (1973) 339; from memory) on P = W prod (z - z_j), of which only P'/P = W'/W + sum 1 / (z - z_j) is needed.
/// </summary>
internal static class SimultaneousIteration
{
    /// <summary>A zero rests when its next move is below this share of the distances to sinks and zeros: the move after it, of the
    /// order of the square, is lost in rounding.</summary>
    private const double LastMove = 1e-8;

    /// <summary>Most rounds. A double zero takes about 20; zeros of high order stop earlier, as they are less distinct.</summary>
    private const int MostRounds = 300;

    /// <summary>Where the step has no direction, the approximation steps aside by this share of its offset from the sink.</summary>
    private static readonly Complex s_aside = new(0.1, 0.1);

    /// <summary>Moves the approximations onto the zeros; gives the rounds that it took.</summary>
    internal static int Run(RationalFlow flow, Span<NearSink> zeros)
    {
        Span<bool> rests = stackalloc bool[zeros.Length];
        int moving = zeros.Length, rounds = 0;
        for (; moving > 0 && rounds < MostRounds; rounds++)
        {
            for (int i = 0; i < zeros.Length; i++)
            {
                if (!rests[i] && Move(flow, zeros, i))
                {
                    rests[i] = true;
                    moving--;
                }
            }
        }

        return rounds;
    }

    /// <summary>Moves one approximation; gives whether it rests.</summary>
    private static bool Move(RationalFlow flow, Span<NearSink> zeros, int i)
    {
        LiftedFlow near = flow.Lifted(zeros[i]);
        if (near.Nearest != zeros[i].Sink)
        {
            zeros[i] = zeros[i].SeenFrom(near.Nearest, flow);
            near = flow.Lifted(zeros[i]);
        }

        if (Size(near.Value) <= Rounding.OfSum(flow.Count) * near.Size)
        {
            return true;
        }

        Complex push = Push(flow, zeros, i, out double distance);
        Complex move = -Divide(near.Value, near.Slope + near.Value * (near.OtherPoles - push));
        move = double.IsFinite(move.Real + move.Imaginary) ? move : s_aside * zeros[i].Offset;
        zeros[i] = zeros[i].Moved(move);
        return Size(move) <= LastMove * Math.Min(distance, zeros[i].Distance);
    }

    /// <summary>Sum of 1 / (z_i - z_k) over the other approximations, which keeps them apart; and the distance to the nearest. Two
    /// at one place do not push: one moves first, and they are apart.</summary>
    private static Complex Push(RationalFlow flow, ReadOnlySpan<NearSink> zeros, int i, out double distance)
    {
        NearSink at = zeros[i];
        Complex place = flow.Place(at.Sink);
        double x = 0, y = 0, nearest = double.PositiveInfinity;
        for (int k = 0; k < zeros.Length; k++)
        {
            if (k == i)
            {
                continue;
            }

            NearSink other = zeros[k];
            Complex otherPlace = flow.Place(other.Sink);
            double dx = at.X - other.X + (place.Real - otherPlace.Real);
            double dy = at.Y - other.Y + (place.Imaginary - otherPlace.Imaginary);
            double square = dx * dx + dy * dy;
            nearest = Math.Min(nearest, square);
            if (square > 0)
            {
                double inverse = 1 / square;
                x += dx * inverse;
                y -= dy * inverse;
            }
        }

        distance = Math.Sqrt(nearest);
        return new Complex(x, y);
    }

    private static double Size(Complex z) => Math.Sqrt(z.Real * z.Real + z.Imaginary * z.Imaginary);

    private static Complex Divide(Complex a, Complex b)
    {
        double scale = 1 / (b.Real * b.Real + b.Imaginary * b.Imaginary);
        return new Complex(
            (a.Real * b.Real + a.Imaginary * b.Imaginary) * scale,
            (a.Imaginary * b.Real - a.Real * b.Imaginary) * scale);
    }
}

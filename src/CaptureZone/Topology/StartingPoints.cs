using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// Where the iteration for the zeros starts: beside every sink, where it alone would stop the flow of all the others there, and
/// one far out where the leading terms balance.
/// </summary>
internal static class StartingPoints
{
    /// <summary>A start is at most this share of the way to the nearest other sink, where the others' flow is still about even.</summary>
    private const double Share = 0.5;

    /// <summary>A zero this many site radii out is far.</summary>
    private const double FarRadii = 2;

    /// <summary>
    /// A start is turned by this angle, rad, times its doubt: wells along the flow would else give starts along the flow, which
    /// never leave it for zeros that lie to both sides.
    /// </summary>
    private const double Turn = 0.4;

    /// <summary>Writes as many starts as there are zeros.</summary>
    internal static void Write(RationalFlow flow, FarFlow far, Span<NearSink> into)
    {
        Span<NearSink> starts = stackalloc NearSink[flow.Count];
        Span<double> doubt = stackalloc double[flow.Count];
        for (int j = 0; j < starts.Length; j++)
        {
            starts[j] = Beside(j, flow, out doubt[j]);
        }

        Complex balance = -far.Next / far.Leading;
        bool hasFar = into.Length > 0 && Complex.Abs(balance) > FarRadii * far.Radius;
        int count = into.Length - (hasFar ? 1 : 0);
        DropDoubtful(starts, doubt, count);
        starts[..count].CopyTo(into);
        if (hasFar)
        {
            into[count] = new NearSink(0, 0, 0).Moved(far.Centre - flow.Place(0) + balance);
        }
    }

    private static NearSink Beside(int sink, RationalFlow flow, out double doubt)
    {
        Complex others = flow.Uniform;
        double nearest = double.PositiveInfinity;
        for (int j = 0; j < flow.Count; j++)
        {
            if (j != sink)
            {
                Complex from = flow.Between(j, sink);
                double square = from.Real * from.Real + from.Imaginary * from.Imaginary;
                others -= flow.Strength(j) * Complex.Conjugate(from) / square;
                nearest = Math.Min(nearest, square);
            }
        }

        double limit = Share * Math.Sqrt(nearest);
        Complex offset = flow.Strength(sink) / others;
        doubt = Complex.Abs(offset) / limit;
        if (!double.IsFinite(doubt))
        {
            doubt = double.PositiveInfinity;
            offset = limit;
        }
        else if (doubt > 1)
        {
            offset /= doubt;
        }

        return new NearSink(sink, 0, 0).Moved(offset * new Complex(1, Turn * Math.Min(doubt, 1)));
    }

    private static void DropDoubtful(Span<NearSink> starts, Span<double> doubt, int keep)
    {
        for (int count = starts.Length; count > keep; count--)
        {
            int worst = 0;
            for (int j = 1; j < count; j++)
            {
                if (doubt[j] > doubt[worst])
                {
                    worst = j;
                }
            }

            starts[worst] = starts[count - 1];
            doubt[worst] = doubt[count - 1];
        }
    }
}

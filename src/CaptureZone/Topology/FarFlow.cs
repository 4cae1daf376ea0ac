using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// W far from all sinks: W0 - sum M_k / (z - c)^(k + 1) with the moments M_k = sum s_j (z_j - c)^k. The term that leads at the
/// edge of the plane that is looked at tells how many zeros are at infinity.
/// </summary>
internal readonly struct FarFlow
{
    /// <summary>Zeros beyond this many site diameters from the middle count as at infinity.</summary>
    private const double FarDiameters = 1e6;

    /// <summary>A site counts as at least this wide, m: the limit is then farther than round the Earth.</summary>
    private const double SmallestSite = 100;

    /// <summary>Zeros up to this many times as far are found all the same, so that those left out do not bend the others.</summary>
    private const double Clearance = 4;

    /// <summary>Middle of the sinks' bounding box, m.</summary>
    internal Complex Centre { get; private init; }

    /// <summary>Radius of a circle about <see cref="Centre"/> that holds every sink, m.</summary>
    internal double Radius { get; private init; }

    /// <summary>Zeros farther from <see cref="Centre"/> than this count as at infinity, m.</summary>
    internal double Edge { get; private init; }

    /// <summary>How many zeros of the polynomial of degree <see cref="RationalFlow.Count"/> need no finding: they are that far.</summary>
    internal int Beyond { get; private init; }

    /// <summary>Coefficient of the term that leads: W is about this over (z - c)^<see cref="Beyond"/>.</summary>
    internal Complex Leading { get; private init; }

    /// <summary>Coefficient of the term after it.</summary>
    internal Complex Next { get; private init; }

    internal static FarFlow Of(RationalFlow flow)
    {
        (Complex centre, double radius, double diameter) = Site(flow);
        double edge = FarDiameters * Math.Max(diameter, SmallestSite), reach = Clearance * edge / radius;
        double strength = 0;
        for (int j = 0; j < flow.Count; j++)
        {
            strength += Math.Abs(flow.Strength(j));
        }

        // A moment below the rounding of its own terms is zero.
        double rounding = Rounding.OfSum(flow.Count) * strength;
        Span<Complex> powers = stackalloc Complex[flow.Count];
        for (int j = 0; j < powers.Length; j++)
        {
            powers[j] = flow.Strength(j);
        }

        int leads = 0;
        Complex leading = flow.Uniform * radius, next = default, term = leading;
        double before = 0;
        for (int k = 0; k <= flow.Count && before <= 2 * strength; k++)
        {
            double size = Complex.Abs(term);
            bool vanishes = k > 0 && size <= rounding;
            if (!vanishes && 2 * before < size)
            {
                leads = k;
                leading = term;
            }

            before = (before + (vanishes ? 0 : size)) * reach;
            term = -NextMoment(flow, powers, centre, radius);
            if (leads == k)
            {
                next = term;
            }
        }

        // Terms were taken in units in which the radius is 1.
        double unit = Math.Pow(radius, leads - 1);
        return new FarFlow
        {
            Centre = centre,
            Radius = radius,
            Edge = edge,
            Beyond = leads,
            Leading = leading * unit,
            Next = next * unit * radius,
        };
    }

    /// <summary>The moment of the powers as they stand; takes them to the next power.</summary>
    private static Complex NextMoment(RationalFlow flow, Span<Complex> powers, Complex centre, double radius)
    {
        Complex moment = default;
        for (int j = 0; j < powers.Length; j++)
        {
            moment += powers[j];
            powers[j] *= (flow.Place(j) - centre) / radius;
        }

        return moment;
    }

    private static (Complex Centre, double Radius, double Diameter) Site(RationalFlow flow)
    {
        double left = double.PositiveInfinity, right = double.NegativeInfinity, low = left, high = right;
        for (int j = 0; j < flow.Count; j++)
        {
            Complex place = flow.Place(j);
            left = Math.Min(left, place.Real);
            right = Math.Max(right, place.Real);
            low = Math.Min(low, place.Imaginary);
            high = Math.Max(high, place.Imaginary);
        }

        Complex centre = new((left + right) / 2, (low + high) / 2);
        double square = 0;
        for (int j = 0; j < flow.Count; j++)
        {
            Complex from = flow.Place(j) - centre;
            square = Math.Max(square, from.Real * from.Real + from.Imaginary * from.Imaginary);
        }

        return square == 0 ? (centre, SmallestSite, 0) : (centre, Math.Sqrt(square), 2 * Math.Sqrt(square));
    }
}

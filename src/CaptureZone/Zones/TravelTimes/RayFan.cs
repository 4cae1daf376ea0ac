using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Topology;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>
/// The rays of one stretch of a well's screen, from its first side to its second, as close together as their fronts need. Where
/// two neighbours part at a stagnation point no angle on the screen is fine enough, so a new ray is launched between them where
/// they are still close, and its time to the well is found by following it there.
/// </summary>
internal sealed class RayFan
{
    /// <summary>Rays that a full turn begins with.</summary>
    private const int FirstRaysPerTurn = 32;

    /// <summary>Fronts bend between neighbours by no more than this share of the zone's radius.</summary>
    private const double Flatness = 4e-4;

    /// <summary>Fronts of neighbours this close need no ray between, as a share of the zone's radius.</summary>
    private const double CloseShare = 0.02;

    /// <summary>A ray between tells whether a front is flat when it meets it no farther from the middle, as a share of the chord.</summary>
    private const double MostOffMiddle = 0.3;

    /// <summary>Fronts of neighbours are never farther apart than this, as a share of the zone's radius.</summary>
    private const double FarShare = 0.25;

    /// <summary>A front within this share of the zone's radius of a side runs along it.</summary>
    private const double ClingShare = 3e-4;

    /// <summary>Sides are thinned out by as much as this share of the smallest zone's radius.</summary>
    private const double ChainShare = 1e-5;

    /// <summary>Angles this close on the screen are not divided there, radians.</summary>
    private const double FineAngle = 1e-3;

    /// <summary>
    /// Neighbours are that far apart where a ray is launched between them, as a share of the smallest zone's radius or of the distance
    /// from the well to a side's stagnation point, the smaller: farther past that point a middle need not lie between them.
    /// </summary>
    private const double LaunchShare = 5e-3;

    /// <summary>
    /// Distances between neighbours are told from their vertices, whose times are rough: this share of what was told must be found.
    /// </summary>
    private const double LeastApart = 0.02;

    /// <summary>Error of the water's volume between two neighbours that needs no ray between, as a share of rate x time.</summary>
    private const double VolumeShare = 1e-5;

    /// <summary>Trials to launch a ray beside a side, each half as far from the other neighbour as the one before.</summary>
    private const int MostRetreats = 12;

    /// <summary>Divisions after which what double precision tells apart has been reached.</summary>
    private const int MostDivisions = 64;

    /// <summary>More rays than any stretch needs: beyond, the outline is left as it is and its pore volume tells.</summary>
    private const int MostRays = 5000;

    private readonly RayTracing _tracing;
    private readonly ImmutableArray<double> _times;
    private readonly ImmutableArray<double> _radii;
    private readonly Polyline[] _chains;
    private readonly double _middle;
    private readonly double _toStagnation;
    private readonly List<Ray> _rays = [];

    private RayFan(
        RayTracing tracing, ImmutableArray<double> times, ImmutableArray<double> radii, Polyline[] chains, ScreenStretch stretch, double toStagnation)
    {
        _tracing = tracing;
        _times = times;
        _radii = radii;
        _chains = chains;
        _middle = (stretch.From + stretch.To) / 2;
        _toStagnation = toStagnation;
    }

    /// <summary>The rays, the sides' own first and last.</summary>
    internal IReadOnlyList<Ray> Rays => _rays;

    /// <summary>Makes the fan of one stretch.</summary>
    /// <param name="topology">The dividing streamlines.</param>
    /// <param name="tracing">Follows the rays.</param>
    /// <param name="stretch">The stretch.</param>
    /// <param name="times">The times asked, d.</param>
    /// <param name="radii">For each time, radius of the circle that has the zone's area, m.</param>
    internal static RayFan Of(
        FlowTopology topology, RayTracing tracing, ScreenStretch stretch, ImmutableArray<double> times, ImmutableArray<double> radii)
    {
        Polyline[] chains = stretch is { Begin: { } begin, End: { } end }
            ? [SideChain.Of(topology, begin, -1, ChainShare * radii[0]), SideChain.Of(topology, end, 1, ChainShare * radii[0])]
            : [];
        double toStagnation = new[] { stretch.Begin, stretch.End }.OfType<DividingBranch>()
            .Select(side => Complex.Abs(side.Points[0].At - side.Points[^1].At))
            .DefaultIfEmpty(double.PositiveInfinity)
            .Min();
        RayFan fan = new(tracing, times, radii, chains, stretch, toStagnation);
        fan.Fill(stretch);
        return fan;
    }

    /// <summary>The front for one time, from the first side to the second, along the sides where it clings to them.</summary>
    /// <param name="index">Index of the time.</param>
    internal IEnumerable<Complex> Front(int index)
    {
        for (int i = 0; i < _rays.Count; i++)
        {
            if (i > 0 && Clinging(_rays[i - 1], _rays[i], index) is var (chain, from, to))
            {
                yield return from.Nearest;
                foreach (Complex vertex in chain.Between(from, to))
                {
                    yield return vertex;
                }

                yield return to.Nearest;
            }

            yield return _rays[i].Fronts[index];
        }
    }

    private void Fill(ScreenStretch stretch)
    {
        int count = Math.Max(2, (int)Math.Ceiling(FirstRaysPerTurn * (stretch.To - stretch.From) / (2 * Math.PI)));
        bool sided = stretch.Begin is not null;
        Ray last = sided ? _tracing.Along(stretch.Begin!, stretch.From) : _tracing.FromScreen(stretch.From);
        Ray final = sided ? _tracing.Along(stretch.End!, stretch.To) : last with { Angle = stretch.To };
        _rays.Add(last);
        for (int i = 1; i < count && stretch.To - stretch.From > FineAngle; i++)
        {
            Ray next = _tracing.FromScreen(stretch.From + (stretch.To - stretch.From) * i / count);
            Divide(last, next, 0);
            _rays.Add(next);
            last = next;
        }

        Divide(last, final, 0);
        _rays.Add(final);
    }

    /// <summary>Adds the rays that are needed between two neighbours, in order.</summary>
    private void Divide(Ray a, Ray b, int depth)
    {
        if (depth >= MostDivisions
            || _rays.Count >= MostRays
            || AllTimes(i => VolumeDiffers(a, b, i) <= VolumeShare && (IsClose(a, b, i) || Clinging(a, b, i) is not null)))
        {
            return;
        }

        if (Between(a, b) is not { } middle)
        {
            return;
        }

        if (AllTimes(i => IsFlat(a, middle, b, i)))
        {
            _rays.Add(middle);
            return;
        }

        Divide(a, middle, depth + 1);
        _rays.Add(middle);
        Divide(middle, b, depth + 1);
    }

    private bool AllTimes(Func<int, bool> holds) => Enumerable.Range(0, _times.Length).All(holds);

    private bool IsClose(Ray a, Ray b, int index) =>
        Complex.Abs(a.Fronts[index] - b.Fronts[index]) <= CloseShare * _radii[index];

    private bool IsFlat(Ray a, Ray middle, Ray b, int index)
    {
        Complex chord = b.Fronts[index] - a.Fronts[index];
        double length = Complex.Abs(chord);
        if (length > FarShare * _radii[index])
        {
            return false;
        }

        Complex to = middle.Fronts[index] - a.Fronts[index];
        double share = length > 0 ? Math.Clamp((to * Complex.Conjugate(chord)).Real / (length * length), 0, 1) : 0;
        return (IsClose(a, b, index) || Math.Abs(share - 0.5) <= MostOffMiddle)
            && Complex.Abs(to - share * chord) <= Flatness * _radii[index]
            && VolumeDiffers(a, middle, index) + VolumeDiffers(middle, b, index) <= 4 * VolumeShare;
    }

    /// <summary>Half the water that two neighbours' ages leave uncertain, as a share of rate x time.</summary>
    private double VolumeDiffers(Ray a, Ray b, int index)
    {
        double time = _times[index];
        double ages = Math.Abs(Math.Min(a.Age, time) - Math.Min(b.Age, time)) / time;
        return ages * Math.Abs(b.Angle - a.Angle) / (4 * Math.PI);
    }

    private (Polyline Chain, Polyline.Foot From, Polyline.Foot To)? Clinging(Ray a, Ray b, int index)
    {
        if (IsClose(a, b, index))
        {
            return null;
        }

        double cling = ClingShare * _radii[index];
        foreach (Polyline chain in IsNearerEnd(a, b) ? _chains.AsEnumerable().Reverse() : _chains)
        {
            Polyline.Foot from = chain.FootOf(a.Fronts[index]);
            if (from.Distance <= cling && chain.FootOf(b.Fronts[index]) is var to && to.Distance <= cling)
            {
                return (chain, from, to);
            }
        }

        return null;
    }

    /// <summary>Both sides may lead from one stagnation point to one injection well: neighbours run along the one that they are next to.</summary>
    private bool IsNearerEnd(Ray a, Ray b) => (a.Angle + b.Angle) / 2 > _middle;

    private Ray? Between(Ray a, Ray b)
    {
        Ray? middle = b.Angle - a.Angle > FineAngle
            ? _tracing.FromScreen((a.Angle + b.Angle) / 2)
            : WherePartedLittle(a, b) is var (first, second) ? Launched(a.Side is null ? first : second, a.Side is null ? second : first) : null;
        return middle is null ? null : middle with { Angle = Unwrapped(middle.Angle, a.Angle, b.Angle) };
    }

    /// <summary>
    /// The ray through the middle of two places on neighbours. Beside a side the middle may lie beyond it, where water goes
    /// elsewhere: then closer to the other neighbour, whose water comes to the well for certain.
    /// </summary>
    /// <param name="inner">A place on a neighbour that is no side, m.</param>
    /// <param name="outer">A place on the other neighbour, m.</param>
    private Ray? Launched(Complex inner, Complex outer)
    {
        Complex apart = outer - inner;
        for (int i = 0; i < MostRetreats; i++)
        {
            apart /= 2;
            if (_tracing.Through(inner + apart) is { } ray)
            {
                return ray;
            }
        }

        return null;
    }

    /// <summary>Places on two neighbours, the first from the well outward where these are far enough apart.</summary>
    private (Complex First, Complex Second)? WherePartedLittle(Ray a, Ray b)
    {
        double apart = LaunchShare * Math.Min(_radii[0], _toStagnation);
        double[] times = [.. a.Course.Concat(b.Course).Select(point => point.Time).Where(time => time > 0 && double.IsFinite(time)).Order()];
        for (int i = 0, stride = 1; i < times.Length; i++)
        {
            if (Complex.Abs(a.At(times[i]) - b.At(times[i])) >= apart)
            {
                Complex first = _tracing.PlaceAt(a, times[i]), second = _tracing.PlaceAt(b, times[i]);
                if (Complex.Abs(first - second) >= LeastApart * apart)
                {
                    return (first, second);
                }

                i += stride;
                stride *= 2;
            }
        }

        return null;
    }

    /// <summary>An angle on the turn that its neighbours are on; rounding never puts it outside them.</summary>
    private static double Unwrapped(double angle, double low, double high)
    {
        double turns = Math.Round(((low + high) / 2 - angle) / (2 * Math.PI));
        return Math.Clamp(angle + turns * 2 * Math.PI, low, high);
    }
}

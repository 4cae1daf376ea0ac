using System.Numerics;
using CaptureZone.Topology;

namespace CaptureZone.Tests.Topology;

/// <summary>1 000 seeded fields of 1 to 60 wells, with their uniform flow and without it; see <see cref="RandomWells"/>.</summary>
public sealed class RandomFieldTests
{
    private const int Fields = 1000;

    private const double LargestResidual = 1e-12;

    /// <summary>Agreement with the eigenvalues, as a share of the site's diameter.</summary>
    private const double Agreement = 1e-9;

    /// <summary>Share of the eigenvalues that may need a step of Newton: far zeros of rates that nearly cancel.</summary>
    private const double MostRefined = 0.003;

    public static TheoryData<bool> WithAndWithoutFlow => [true, false];

    [Theory]
    [MemberData(nameof(WithAndWithoutFlow))]
    public void Every_field_has_exactly_as_many_stagnation_points_as_its_degree_says(bool hasFlow)
    {
        ForEach(hasFlow, (wells, flow, zeros) =>
        {
            int expected = wells.Places.Length - (hasFlow ? 0 : HasFarZero(wells) ? 2 : 1);
            Assert.True(zeros.Complete);
            Assert.Equal(expected, zeros.Expected);
            Assert.Equal(expected, zeros.Zeros.Sum(zero => zero.Multiplicity));
        });
    }

    [Theory]
    [MemberData(nameof(WithAndWithoutFlow))]
    public void The_indices_inside_a_circle_sum_to_how_often_the_flow_turns_round_it(bool hasFlow)
    {
        ForEach(hasFlow, (wells, flow, zeros) =>
        {
            Complex centre = flow.Place(0);
            double radius = Farthest(flow, zeros, centre) * 2 + 1;
            int turns = Winding.Round(at => Complex.Conjugate(flow.At(at)), centre, radius);
            Assert.Equal(turns, flow.Count - zeros.Zeros.Sum(zero => zero.Multiplicity));
        });
    }

    [Theory]
    [MemberData(nameof(WithAndWithoutFlow))]
    public void The_discharge_at_a_stagnation_point_is_below_1e_12_of_what_cancels_there(bool hasFlow)
    {
        ForEach(hasFlow, (wells, flow, zeros) =>
        {
            foreach (RationalZero zero in zeros.Zeros)
            {
                (Complex w, _, double size) = FlowNear(flow, zero.Sink, zero.Offset);
                Assert.InRange(Complex.Abs(w) / size, 0, LargestResidual);
                Assert.InRange(zero.Residual, 0, LargestResidual);
            }
        });
    }

    /// <summary>
    /// Where eigenvalue and zero differ by more than the agreement, it is the eigenvalue that lost digits: rates that nearly cancel
    /// make its matrix all but singular. One step of Newton on W from the eigenvalue, which the iteration has no part in, must then
    /// bring it there, or into the disc of a far zero.
    /// </summary>
    [Theory]
    [MemberData(nameof(WithAndWithoutFlow))]
    public void Stagnation_points_agree_with_eigenvalues_to_1e_9_of_the_site(bool hasFlow)
    {
        int compared = 0, refined = 0;
        ForEach(hasFlow, (wells, flow, zeros) =>
        {
            double site = Site(wells);
            HashSet<int> used = [];
            foreach (Complex eigenvalue in Eigenvalues(hasFlow, wells).Where(value => !IsFar(value, wells)))
            {
                int nearest = Enumerable.Range(0, zeros.Zeros.Length).MinBy(i => Complex.Abs(zeros.Zeros[i].At - eigenvalue));
                RationalZero zero = zeros.Zeros[nearest];
                Assert.True(used.Add(nearest));
                compared++;
                if (Complex.Abs(zero.At - eigenvalue) > Agreement * site)
                {
                    refined++;
                    Complex offset = eigenvalue - flow.Place(zero.Sink);
                    (Complex w, Complex slope, _) = FlowNear(flow, zero.Sink, offset);
                    double apart = Complex.Abs(offset - w / slope - zero.Offset);
                    Assert.InRange(apart, 0, Math.Max(Agreement * site, zero.Radius));
                }
            }

            Assert.Equal(zeros.Zeros.Length, used.Count);
        });
        Assert.InRange(refined, 0, hasFlow ? 0 : MostRefined * compared);
    }

    /// <summary>Without uniform flow, one zero is about where the first two moments balance.</summary>
    private static bool HasFarZero(RandomWells wells)
    {
        if (wells.Places.Length == 1)
        {
            return false;
        }

        Complex sum = wells.Places.Zip(wells.Rates, (place, rate) => (place - wells.Places[0]) * rate).Aggregate((a, b) => a + b);
        return IsFar(wells.Places[0] + sum / wells.Rates.Sum(), wells);
    }

    private static bool IsFar(Complex at, RandomWells wells) => Complex.Abs(at - wells.Places[0]) > 1e6 * Site(wells);

    /// <summary>Diameter of the circle about the middle of the wells' bounding box, m; at least 100.</summary>
    private static double Site(RandomWells wells)
    {
        Complex middle = new(
            (wells.Places.Min(place => place.Real) + wells.Places.Max(place => place.Real)) / 2,
            (wells.Places.Min(place => place.Imaginary) + wells.Places.Max(place => place.Imaginary)) / 2);
        return Math.Max(100, 2 * wells.Places.Max(place => Complex.Abs(place - middle)));
    }

    private static Complex[] Eigenvalues(bool hasFlow, RandomWells wells) =>
        hasFlow
            ? EigenvalueForm.With(wells.Uniform, wells.Places, wells.Rates)
            : EigenvalueForm.Without(wells.Places, wells.Rates);

    private static double Farthest(RationalFlow flow, RationalZeros zeros, Complex from) =>
        Enumerable.Range(0, flow.Count).Select(flow.Place)
            .Concat(zeros.Zeros.Select(zero => zero.At))
            .Max(at => Complex.Abs(at - from));

    private static (Complex W, Complex Slope, double Size) FlowNear(RationalFlow flow, int sink, Complex offset)
    {
        Complex w = flow.Uniform, slope = 0;
        double size = Complex.Abs(w);
        for (int j = 0; j < flow.Count; j++)
        {
            Complex inverse = 1 / (offset + (flow.Place(sink) - flow.Place(j)));
            w -= flow.Strength(j) * inverse;
            slope += flow.Strength(j) * inverse * inverse;
            size += Complex.Abs(flow.Strength(j) * inverse);
        }

        return (w, slope, size);
    }

    private static void ForEach(bool hasFlow, Action<RandomWells, RationalFlow, RationalZeros> check)
    {
        for (int seed = 0; seed < Fields; seed++)
        {
            RandomWells wells = RandomWells.Of(seed);
            RationalFlow flow = RationalFlow.Of(hasFlow ? wells.Uniform : 0, wells.Places, wells.Rates);
            check(wells, flow, flow.Zeros());
        }
    }
}

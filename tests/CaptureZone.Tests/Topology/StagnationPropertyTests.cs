using System.Numerics;
using CaptureZone.Topology;
using FsCheck.Xunit;

namespace CaptureZone.Tests.Topology;

/// <summary>What is done to a site is done to its stagnation points. A case is a seed of <see cref="RandomWells"/>.</summary>
public sealed class StagnationPropertyTests
{
    private const int Cases = 60;

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Moving_a_site_moves_its_stagnation_points(ushort seed, short east, short north)
    {
        Complex by = new(east, north);
        RandomWells wells = RandomWells.Of(seed);
        AssertSame(
            wells,
            RationalFlow.Of(wells.Uniform, [.. wells.Places.Select(place => place + by)], wells.Rates),
            at => at + by);
    }

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Turning_a_site_turns_its_stagnation_points(ushort seed, byte angle)
    {
        Complex turn = Complex.FromPolarCoordinates(1, angle * 2 * Math.PI / 256);
        RandomWells wells = RandomWells.Of(seed);
        AssertSame(
            wells,
            RationalFlow.Of(wells.Uniform * Complex.Conjugate(turn), [.. wells.Places.Select(place => place * turn)], wells.Rates),
            at => at * turn);
    }

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Scaling_a_site_and_its_rates_scales_its_stagnation_points(ushort seed, byte steps)
    {
        double scale = Math.Pow(10, steps / 64.0 - 2);
        RandomWells wells = RandomWells.Of(seed);
        AssertSame(
            wells,
            RationalFlow.Of(
                wells.Uniform, [.. wells.Places.Select(place => place * scale)], [.. wells.Rates.Select(rate => rate * scale)]),
            at => at * scale,
            scale);
    }

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Mirroring_a_site_mirrors_its_stagnation_points(ushort seed)
    {
        RandomWells wells = RandomWells.Of(seed);
        AssertSame(
            wells,
            RationalFlow.Of(Complex.Conjugate(wells.Uniform), [.. wells.Places.Select(Complex.Conjugate)], wells.Rates),
            Complex.Conjugate);
    }

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Reversing_rates_and_flow_changes_no_stagnation_point(ushort seed)
    {
        RandomWells wells = RandomWells.Of(seed);
        AssertSame(wells, RationalFlow.Of(-wells.Uniform, wells.Places, [.. wells.Rates.Select(rate => -rate)]), at => at);
    }

    /// <summary>Each point of the changed site is where the change takes one of the site's, to 1e-9 of the site.</summary>
    private static void AssertSame(RandomWells wells, RationalFlow changed, Func<Complex, Complex> change, double scale = 1)
    {
        RationalZeros before = RationalFlow.Of(wells.Uniform, wells.Places, wells.Rates).Zeros();
        RationalZeros after = changed.Zeros();
        Assert.True(after.Complete);
        Assert.Equal(before.Zeros.Sum(zero => zero.Multiplicity), after.Zeros.Sum(zero => zero.Multiplicity));
        double site = Math.Max(wells.Diameter, before.Zeros.Max(zero => Complex.Abs(zero.At - wells.Places[0])));
        foreach (RationalZero zero in before.Zeros)
        {
            Assert.InRange(after.Zeros.Min(other => Complex.Abs(other.At - change(zero.At))), 0, 1e-9 * site * scale);
        }
    }
}

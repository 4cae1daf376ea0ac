using System.Numerics;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.Elements.Wells;

/// <summary>
/// Bits and singular places. The plain sums below follow the order that docs/decisions/006-lanes-and-order-of-summation.md states;
/// with DOTNET_EnableAVX2=0 or DOTNET_EnableHWIntrinsic=0 in the environment the same tests hold the paths without vectors to it.
/// </summary>
public sealed class WellBankTests
{
    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(5)]
    [InlineData(12)]
    [InlineData(63)]
    public void Discharges_and_gradients_are_sums_in_the_stated_order_to_the_last_bit(int count)
    {
        Well[] wells = Superposed.Wells(count, seed: count);
        WellBank bank = new(wells);
        double[] strength = [.. wells.Select(well => well.Rate)];
        (double[] x, double[] y) = Superposed.Places(103, 800, seed: 1);
        double[] qx = new double[103], qy = new double[103], qxx = new double[103], qxy = new double[103], qyy = new double[103];
        bank.Add(
            new Points(x, y),
            Side.Off,
            Ask.Discharge | Ask.Gradient,
            strength,
            new FlowBlock { Qx = qx, Qy = qy, Qxx = qxx, Qxy = qxy, Qyy = qyy });
        for (int i = 0; i < x.Length; i++)
        {
            PointFlow expected = InOrder(wells, x[i], y[i]);
            Assert.Equal(expected.Qx, qx[i]);
            Assert.Equal(expected.Qy, qy[i]);
            Assert.Equal(expected.Qxx, qxx[i]);
            Assert.Equal(expected.Qxy, qxy[i]);
            Assert.Equal(-expected.Qxx, qyy[i]);
        }
    }

    /// <summary>The vector logarithm may differ from the plain one by its last digits: 4 units in the last place of the sizes added.</summary>
    [Fact]
    public void Potentials_are_sums_of_logarithms()
    {
        Well[] wells = Superposed.Wells(12, seed: 3);
        WellBank bank = new(wells);
        double[] strength = [.. wells.Select(well => well.Rate)];
        (double[] x, double[] y) = Superposed.Places(103, 800, seed: 1);
        double[] potential = new double[103];
        bank.Add(new Points(x, y), Side.Off, Ask.Potential, strength, new FlowBlock { Potential = potential });
        for (int i = 0; i < x.Length; i++)
        {
            double[] terms =
            [
                .. wells.Select(well => well.Rate / (2 * Math.PI) * Math.Log((new Complex(x[i], y[i]) - well.At).Magnitude)),
            ];
            Assert.Equal(terms.Sum(), potential[i], 4 * 2.2e-16 * terms.Sum(Math.Abs));
        }
    }

    /// <summary>Potentials may differ as the logarithms do, by the last digits of the sizes added.</summary>
    [Theory]
    [InlineData(1)]
    [InlineData(7)]
    [InlineData(12)]
    public void A_machine_without_vectors_gives_the_same_bits(int count)
    {
        Well[] wells = Superposed.Wells(count, seed: count);
        WellBank bank = new(wells);
        double[] strength = [.. wells.Select(well => well.Rate)];
        WellPlaces places = new([.. wells.Select(well => well.At.Real)], [.. wells.Select(well => well.At.Imaginary)]);
        (double[] x, double[] y) = Superposed.Places(50, 800, seed: 1);
        for (int i = 0; i < x.Length; i++)
        {
            const Ask everything = Ask.Potential | Ask.Discharge | Ask.Gradient;
            PointFlow plain = default, lanes = default;
            ScalarWells.Add(places, x[i], y[i], everything, strength, ref plain);
            bank.AddAt(x[i], y[i], Side.Off, everything, strength, ref lanes);
            Assert.Equal(lanes.Potential, plain.Potential, 1e-15 * 8 * strength.Sum(Math.Abs));
            Assert.Equal(lanes with { Potential = 0 }, plain with { Potential = 0 });
        }
    }

    [Theory]
    [InlineData(200, double.NegativeInfinity)]
    [InlineData(-200, double.PositiveInfinity)]
    public void On_its_axis_a_well_has_an_infinite_potential_and_no_discharge(double rate, double potential)
    {
        WellBank bank = new([Superposed.Well(10, 20, rate)]);
        foreach (int count in new[] { 1, 4, 5 })
        {
            double[] x = [.. Enumerable.Repeat(10.0, count)], y = [.. Enumerable.Repeat(20.0, count)];
            double[] phi = new double[count], qx = new double[count], qy = new double[count], qxx = new double[count];
            bank.Add(
                new Points(x, y),
                Side.Off,
                Ask.Potential | Ask.Discharge | Ask.Gradient,
                [rate],
                new FlowBlock { Potential = phi, Qx = qx, Qy = qy, Qxx = qxx, Qxy = new double[count], Qyy = new double[count] });
            Assert.All(phi, value => Assert.Equal(potential, value));
            Assert.All(qx.Concat(qy).Concat(qxx), value => Assert.Equal(0, value));
        }
    }

    [Fact]
    public void A_well_that_stands_idle_adds_nothing_even_on_its_axis()
    {
        WellBank bank = new([Superposed.Well(10, 20, 0)]);
        PointFlow flow = default;
        bank.AddAt(10, 20, Side.Off, Ask.Potential | Ask.Discharge | Ask.Gradient, [0], ref flow);
        Assert.Equal(default, flow);
        double[] potential = new double[4];
        bank.Add(
            new Points([10, 10, 10, 10], [20, 20, 20, 20]), Side.Off, Ask.Potential, [0], new FlowBlock { Potential = potential });
        Assert.Equal(new double[4], potential);
        Assert.Equal(0, bank.GradientBound(new Complex(10, 20), 1, [0]));
    }

    [Fact]
    public void Gradient_has_no_bound_where_a_well_lies_in_the_disc() =>
        Assert.Equal(double.PositiveInfinity, new WellBank([Superposed.Well(10, 20, 5)]).GradientBound(new Complex(11, 20), 2, [5]));

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(6)]
    [InlineData(8)]
    public void Distance_to_the_nearest_well_is_found(int count)
    {
        Well[] wells = Superposed.Wells(count, seed: 9);
        double nearest = wells.Select(well => (well.At - new Complex(30, -40)).Magnitude).Prepend(double.PositiveInfinity).Min();
        double found = new WellBank(wells).DistanceToSingular(new Complex(30, -40));
        Assert.True(nearest == found || Math.Abs(nearest - found) < 1e-12 * nearest);
    }

    private static PointFlow InOrder(Well[] wells, double x, double y)
    {
        double[] sumX = new double[4], sumY = new double[4], sumXX = new double[4], sumXY = new double[4];
        for (int j = 0; j < wells.Length; j++)
        {
            double dx = x - wells[j].At.Real, dy = y - wells[j].At.Imaginary;
            double reciprocal = 1 / (dx * dx + dy * dy), u = wells[j].Rate * reciprocal;
            sumX[j % 4] += u * dx;
            sumY[j % 4] += u * dy;
            sumXX[j % 4] += (u * dx * dx - u * dy * dy) * reciprocal;
            sumXY[j % 4] += u * dx * dy * reciprocal;
        }

        static double Total(double[] sums) => (sums[0] + sums[1] + (sums[2] + sums[3])) * (1 / (2 * Math.PI));
        return new PointFlow { Qx = 0 - Total(sumX), Qy = 0 - Total(sumY), Qxx = Total(sumXX), Qxy = 2 * Total(sumXY) };
    }
}

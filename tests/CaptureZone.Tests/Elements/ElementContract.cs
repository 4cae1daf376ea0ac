using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Tests.Flow;
using MathNet.Numerics.Integration;

namespace CaptureZone.Tests.Elements;

/// <summary>
/// What every element must keep, tested once for all: derive a sealed class for a new kind of element and give it some elements.
/// Each statement holds for every bank that the elements bring, with the strengths that follow from the parameters, or any
/// where the solver would decide.
/// </summary>
/// <typeparam name="T">The kind of element.</typeparam>
public abstract class ElementContract<T>
    where T : Element
{
    private const Ask Everything = Ask.Potential | Ask.Discharge | Ask.Gradient;
    private readonly Random _random = new(20);

    /// <summary>Elements of the kind; several, unlike one another.</summary>
    protected abstract ImmutableArray<T> Elements { get; }

    /// <summary>Every part of them lies within this distance of the origin, m.</summary>
    protected abstract double Size { get; }

    private Parameters Parameters => new(
        Superposed.Confined,
        Elements.OfType<RegionalFlow>().FirstOrDefault(Superposed.Regional),
        [.. Elements.OfType<Well>().Select(well => well.Rate)]);

    /// <summary>Fourth-order central differences; the allowed error is theirs at a hundredth of the distance to what is singular.</summary>
    [Fact]
    public void Discharge_is_minus_the_gradient_of_the_potential()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 50))
            {
                double step = Step(bank, at);
                double Potential(Complex z) => At(bank, strength, z, Ask.Potential).Potential;
                PointFlow flow = At(bank, strength, at, Everything);
                double allowed = 1e-6 * Size1(flow.Qx, flow.Qy) + 1e-13 * Math.Abs(flow.Potential) / step;
                Assert.InRange(flow.Qx + Derivative(Potential, at, step, 1), -allowed, allowed);
                Assert.InRange(flow.Qy + Derivative(Potential, at, step, Complex.ImaginaryOne), -allowed, allowed);
            }
        }
    }

    [Fact]
    public void Gradient_is_the_derivative_of_the_discharge()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 50))
            {
                double step = Step(bank, at);
                double Qx(Complex z) => At(bank, strength, z, Ask.Discharge).Qx;
                double Qy(Complex z) => At(bank, strength, z, Ask.Discharge).Qy;
                PointFlow flow = At(bank, strength, at, Everything);
                double allowed = 1e-6 * (Size1(flow.Qxx, flow.Qxy) + Math.Abs(flow.Qyy)) + 1e-13 * Size1(flow.Qx, flow.Qy) / step;
                Assert.InRange(flow.Qxx - Derivative(Qx, at, step, 1), -allowed, allowed);
                Assert.InRange(flow.Qxy - Derivative(Qx, at, step, Complex.ImaginaryOne), -allowed, allowed);
                Assert.InRange(flow.Qxy - Derivative(Qy, at, step, 1), -allowed, allowed);
                Assert.InRange(flow.Qyy - Derivative(Qy, at, step, Complex.ImaginaryOne), -allowed, allowed);
            }
        }
    }

    [Fact]
    public void Divergence_is_the_recharge()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 100))
            {
                PointFlow flow = At(bank, strength, at, Ask.Gradient);
                double allowed = 1e-12 * Size1(flow.Qxx, flow.Qyy);
                Assert.InRange(flow.Qxx + flow.Qyy - bank.DivergenceAt(at, strength), -allowed, allowed);
            }
        }
    }

    [Fact]
    public void Flux_round_a_contour_is_the_strength_inside()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            Complex[] ring = Ring(0, 3 * Size, 12);
            double flux = RoundTrip(bank, strength, ring, out double gross);
            Assert.Equal(-bank.NetRate(strength), flux, 1e-12 * gross);
        }
    }

    [Fact]
    public void Flux_round_an_empty_place_is_its_recharge()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 20))
            {
                double radius = 0.9 * Math.Min(bank.DistanceToSingular(at), Size);
                double flux = RoundTrip(bank, strength, Ring(at, radius, 3), out double gross);
                double area = 0.75 * Math.Sqrt(3) * radius * radius;
                Assert.Equal(area * bank.DivergenceAt(at, strength), flux, 1e-12 * gross);
            }
        }
    }

    [Fact]
    public void Flux_across_a_segment_is_the_integral_of_the_normal_discharge()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex middle in PlainPlaces(bank, 50))
            {
                Complex half = Complex.FromPolarCoordinates(
                    0.8 * Math.Min(bank.DistanceToSingular(middle), Size), 2 * Math.PI * _random.NextDouble());
                double Normal(double s)
                {
                    PointFlow flow = At(bank, strength, middle + s * half, Ask.Discharge);
                    return flow.Qx * half.Imaginary - flow.Qy * half.Real;
                }

                double integral = GaussLegendreRule.Integrate(Normal, -1, 0, 64) + GaussLegendreRule.Integrate(Normal, 0, 1, 64);
                PointFlow there = At(bank, strength, middle, Ask.Discharge);
                double allowed = 1e-10 * Size1(there.Qx, there.Qy) * half.Magnitude;
                Assert.Equal(integral, bank.FluxAcross(middle - half, middle + half, strength), allowed);
            }
        }
    }

    [Fact]
    public void Superposition_is_linear()
    {
        foreach ((IBank bank, double[] one) in Banks())
        {
            double[] other = [.. one.Select(value => 3 * value * _random.NextDouble())];
            double[] both = [.. one.Zip(other, (a, b) => 2 * a - 5 * b)];
            foreach (Complex at in PlainPlaces(bank, 50))
            {
                PointFlow a = At(bank, one, at, Everything), b = At(bank, other, at, Everything), c = At(bank, both, at, Everything);
                foreach (Func<PointFlow, double> part in Parts)
                {
                    double allowed = 1e-11 * (Scale(bank, one, at, part) + Scale(bank, other, at, part));
                    Assert.Equal(2 * part(a) - 5 * part(b), part(c), allowed);
                }
            }
        }
    }

    [Theory]
    [InlineData(Ask.Potential)]
    [InlineData(Ask.Discharge)]
    [InlineData(Ask.Potential | Ask.Discharge)]
    public void Influence_times_strength_is_what_is_added(Ask ask)
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            Complex[] places = PlainPlaces(bank, 7);
            double[] x = [.. places.Select(at => at.Real)], y = [.. places.Select(at => at.Imaginary)];
            int potential = ask.HasFlag(Ask.Potential) ? 1 : 0, rowsPerPoint = potential + (ask.HasFlag(Ask.Discharge) ? 2 : 0);
            int stride = bank.Columns + 2;
            double[] rows = new double[rowsPerPoint * places.Length * stride];
            bank.Influence(new Points(x, y), Side.Off, ask, rows, stride);
            double Sum(int point, int row) =>
                strength.Select((value, k) => value * rows[(point * rowsPerPoint + row) * stride + k]).Sum();
            for (int i = 0; i < places.Length; i++)
            {
                PointFlow flow = At(bank, strength, places[i], ask);
                if (ask.HasFlag(Ask.Potential))
                {
                    Assert.Equal(flow.Potential, Sum(i, 0), 1e-12 * Scale(bank, strength, places[i], Parts[0]));
                }

                if (ask.HasFlag(Ask.Discharge))
                {
                    Assert.Equal(flow.Qx, Sum(i, potential), 1e-12 * Scale(bank, strength, places[i], Parts[1]));
                    Assert.Equal(flow.Qy, Sum(i, potential + 1), 1e-12 * Scale(bank, strength, places[i], Parts[2]));
                }
            }
        }
    }

    /// <summary>Mean over a circle: what is uniform drops out, and so does everything but the net rate's logarithm.</summary>
    [Fact]
    public void Far_away_only_the_net_rate_is_felt()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            double near = 10 * Size, far = 1000 * Size;
            double MeanPotential(double radius) => Ring(0, radius, 256).Average(z => At(bank, strength, z, Ask.Potential).Potential);
            double logarithm = bank.NetRate(strength) / (2 * Math.PI) * Math.Log(far / near);
            double allowed = 1e-12 * Ring(0, far, 8).Max(z => Scale(bank, strength, z, Parts[0]));
            Assert.Equal(logarithm, MeanPotential(far) - MeanPotential(near), allowed);
            double Unlike(double radius) => Ring(0, radius, 8).Zip(Ring(0, 10 * radius, 8), (a, b) =>
                (Discharge(bank, strength, a) - Radial(bank, strength, a)
                - Discharge(bank, strength, b) + Radial(bank, strength, b)).Magnitude).Max();
            double uniform = Discharge(bank, strength, far).Magnitude;
            Assert.InRange(Unlike(far), 0, Unlike(near) / 1000 + 1e-13 * uniform);
        }
    }

    [Fact]
    public void Gradient_bound_bounds_the_gradient()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex centre in PlainPlaces(bank, 50))
            {
                double radius = 0.95 * _random.NextDouble() * Math.Min(bank.DistanceToSingular(centre), Size);
                double bound = bank.GradientBound(centre, radius, strength);
                Assert.True(double.IsFinite(bound));
                for (int i = 0; i < 100; i++)
                {
                    Complex at = centre + Complex.FromPolarCoordinates(
                        radius * Math.Sqrt(_random.NextDouble()), 2 * Math.PI * _random.NextDouble());
                    Assert.InRange(Norm(At(bank, strength, at, Ask.Gradient)), 0, bound * (1 + 1e-12));
                }
            }
        }
    }

    [Fact]
    public void A_point_alone_and_in_any_block_has_the_same_bits()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            (double[] x, double[] y) = Superposed.Places(203, 2 * Size, 5);
            double[][] whole = InPieces(bank, strength, x, y, x.Length);
            foreach (int piece in new[] { 1, 2, 3, 5, 7, 64 })
            {
                double[][] split = InPieces(bank, strength, x, y, piece);
                for (int part = 0; part < Parts.Length; part++)
                {
                    AssertSameBits(whole[part], split[part]);
                }
            }

            for (int part = 0; part < Parts.Length; part++)
            {
                AssertSameBits(
                    whole[part], [.. x.Zip(y, (px, py) => Parts[part](At(bank, strength, new Complex(px, py), Everything)))]);
            }
        }
    }

    [Fact]
    public void What_is_asked_beside_a_quantity_does_not_change_its_bits()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 20))
            {
                PointFlow all = At(bank, strength, at, Everything);
                PointFlow discharge = At(bank, strength, at, Ask.Discharge);
                AssertSameBits(
                    [all.Potential, all.Qx, all.Qy, all.Qxx, all.Qxy, all.Qyy],
                    [
                        At(bank, strength, at, Ask.Potential).Potential, discharge.Qx, discharge.Qy,
                        At(bank, strength, at, Ask.Gradient).Qxx, At(bank, strength, at, Ask.Gradient).Qxy,
                        At(bank, strength, at, Ask.Gradient).Qyy,
                    ]);
            }
        }
    }

    [Fact]
    public void What_a_bank_says_it_does_not_give_is_zero()
    {
        foreach ((IBank bank, double[] strength) in Banks())
        {
            foreach (Complex at in PlainPlaces(bank, 20))
            {
                PointFlow flow = At(bank, strength, at, Everything);
                Assert.True(bank.Gives.HasFlag(Ask.Potential) || flow.Potential == 0);
                Assert.True(bank.Gives.HasFlag(Ask.Discharge) || Size1(flow.Qx, flow.Qy) == 0);
                Assert.True(bank.Gives.HasFlag(Ask.Gradient) || Size1(flow.Qxx, flow.Qxy) + Math.Abs(flow.Qyy) == 0);
            }
        }
    }

    [Fact]
    public void One_thread_and_two_give_the_same_bits()
    {
        RegionalFlow regional = Parameters.Regional;
        FlowField field = Superposed.Field(Superposed.Confined, regional, [.. Elements.Where(element => element is not RegionalFlow)]);
        (double[] x, double[] y) = Superposed.Places(20_011, 2 * Size, 6);
        double[] One(IWorkers workers)
        {
            double[] potential = new double[x.Length], qx = new double[x.Length], qy = new double[x.Length], heads = new double[x.Length];
            field.EvaluateMany(
                x, y, Ask.Potential | Ask.Discharge, new FlowMemory { Potential = potential, Qx = qx, Qy = qy }, workers);
            field.HeadsAt(x, y, heads, workers);
            return [.. potential, .. qx, .. qy, .. heads];
        }

        AssertSameBits(One(new OneWorker()), One(new ThreadWorkers(2)));
    }

    private static readonly Func<PointFlow, double>[] Parts =
        [flow => flow.Potential, flow => flow.Qx, flow => flow.Qy, flow => flow.Qxx, flow => flow.Qxy, flow => flow.Qyy];

    private static void AssertSameBits(double[] expected, double[] actual) =>
        Assert.Equal(expected.Select(BitConverter.DoubleToInt64Bits), actual.Select(BitConverter.DoubleToInt64Bits));

    private static double Size1(double a, double b) => Math.Abs(a) + Math.Abs(b);

    private static PointFlow At(IBank bank, double[] strength, Complex at, Ask ask)
    {
        PointFlow flow = default;
        bank.AddAt(at.Real, at.Imaginary, Side.Off, ask, strength, ref flow);
        return flow;
    }

    private static Complex Discharge(IBank bank, double[] strength, Complex at)
    {
        PointFlow flow = At(bank, strength, at, Ask.Discharge);
        return new Complex(flow.Qx, flow.Qy);
    }

    private static Complex Radial(IBank bank, double[] strength, Complex at) =>
        -bank.NetRate(strength) / (2 * Math.PI) / Complex.Conjugate(at);

    /// <summary>The sum of the columns' sizes: what rounding is measured against.</summary>
    private static double Scale(IBank bank, double[] strength, Complex at, Func<PointFlow, double> part) =>
        Enumerable.Range(0, strength.Length).Sum(k =>
        {
            double[] alone = new double[strength.Length];
            alone[k] = strength[k];
            return Math.Abs(part(At(bank, alone, at, Everything)));
        });

    private static double Norm(PointFlow flow)
    {
        double mean = (flow.Qxx + flow.Qyy) / 2, half = (flow.Qxx - flow.Qyy) / 2;
        return Math.Abs(mean) + Math.Sqrt(half * half + flow.Qxy * flow.Qxy);
    }

    private static double Derivative(Func<Complex, double> of, Complex at, double step, Complex along) =>
        (8 * (of(at + step * along) - of(at - step * along)) - (of(at + 2 * step * along) - of(at - 2 * step * along))) / (12 * step);

    private static Complex[] Ring(Complex centre, double radius, int count) =>
        [.. Enumerable.Range(0, count).Select(k => centre + Complex.FromPolarCoordinates(radius, 2 * Math.PI * (k + 0.3) / count))];

    private static double RoundTrip(IBank bank, double[] strength, Complex[] ring, out double gross)
    {
        double[] sides = [.. ring.Select((a, k) => bank.FluxAcross(a, ring[(k + 1) % ring.Length], strength))];
        gross = sides.Sum(Math.Abs) + strength.Sum(Math.Abs);
        return sides.Sum();
    }

    private static double[][] InPieces(IBank bank, double[] strength, double[] x, double[] y, int piece)
    {
        double[][] parts = [.. Parts.Select(_ => new double[x.Length])];
        FlowBlock block = new()
        {
            Potential = parts[0],
            Qx = parts[1],
            Qy = parts[2],
            Qxx = parts[3],
            Qxy = parts[4],
            Qyy = parts[5],
        };
        for (int start = 0; start < x.Length; start += piece)
        {
            int count = Math.Min(piece, x.Length - start);
            bank.Add(new Points(x, y).Slice(start, count), Side.Off, Everything, strength, block.Slice(Everything, start, count));
        }

        return parts;
    }

    private (IBank Bank, double[] Strength)[] Banks()
    {
        SystemBuilder parts = new();
        foreach (T element in Elements)
        {
            element.Contribute(parts);
        }

        parts.Finish();
        (IBank, double[])[] banks =
        [
            .. parts.Known.Select(known => (known.Bank, KnownStrengths(known.Bank, known.Strength))),
            .. parts.Unknown.Select(bank => (bank, AnyStrengths(bank))),
        ];
        Assert.NotEmpty(banks);
        return banks;
    }

    private double[] KnownStrengths(IBank bank, KnownStrength known)
    {
        double[] strength = new double[bank.Columns];
        known(Parameters, strength);
        return strength;
    }

    private double[] AnyStrengths(IBank bank) =>
        [.. Enumerable.Range(0, bank.Columns).Select(_ => 100 * (2 * _random.NextDouble() - 1))];

    private double Step(IBank bank, Complex at) => 0.01 * Math.Min(bank.DistanceToSingular(at), Size);

    /// <summary>Places that are not too near to what is singular.</summary>
    private Complex[] PlainPlaces(IBank bank, int count)
    {
        List<Complex> places = [];
        while (places.Count < count)
        {
            Complex at = new(2 * Size * (2 * _random.NextDouble() - 1), 2 * Size * (2 * _random.NextDouble() - 1));
            if (bank.DistanceToSingular(at) > 0.01 * Size)
            {
                places.Add(at);
            }
        }

        return [.. places];
    }
}

using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using CaptureZone.Tests.Topology;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using static CaptureZone.Tests.SampleModels;

namespace CaptureZone.Tests.Tracing;

public sealed class TracerTests
{
    private const double Relative = 1e-8;

    /// <summary>L of the lone well, m.</summary>
    private const double Scale = 600 / (2 * Math.PI * 0.6);

    /// <summary>Two extraction wells and one injection well; flow toward -x, discharge 0.6 m2/d.</summary>
    private static readonly Model Three = Confined(15, 20, 0.002, 0.25, 0.15, (0, 400), (new(120, 250), 200), (new(-300, 90), -150));

    /// <summary>
    /// Closed form on the axis (J. Bear and M. Jacobs 1965, from memory): t = (n / q0) (x - L ln(1 + x / L)), L = Q / (2 pi q0 b).
    /// </summary>
    [Theory]
    [InlineData(700.0)]
    [InlineData(20.0)]
    [InlineData(-100.0)]
    [InlineData(-159.0)]
    public void Time_on_the_axis_is_that_of_the_closed_form_in_both_senses(double x)
    {
        Tracer tracer = LoneWell(15, 20, 0.002, 600, 0.25, bore: 0.15).Tracer();
        double screen = Math.CopySign(0.15, x), time = TimeOnAxis(x) - TimeOnAxis(screen);
        PathEnd down = tracer.Trace(x, Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(new Fate(FateKind.Well, 0), down.Fate);
        Assert.Equal(time, down.Time, Relative * time);
        Assert.Equal(Math.Abs(x - screen), down.Length, 1e-9);
        PathEnd up = tracer.Trace(screen, Sense.Upstream, time, null);
        Assert.Equal(FateKind.Time, up.Fate.Kind);
        Assert.Equal(x, up.At.Real, 1e-6 * Math.Abs(x));

        static double TimeOnAxis(double x) => 0.25 / 0.03 * (x - Scale * Math.Log(1 + x / Scale));
    }

    [Fact]
    public void A_path_ends_on_the_screen_exactly()
    {
        PathEnd end = Three.Tracer().Trace(new Complex(400, 90), Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(FateKind.Well, end.Fate.Kind);
        Assert.Equal(0.15, Complex.Abs(end.At - Three.Wells[end.Fate.Feature].At), 1e-11);
    }

    [Fact]
    public void A_path_ends_at_its_time_exactly_wherever_that_is()
    {
        Tracer tracer = Three.Tracer();
        PathEnd whole = tracer.Trace(new Complex(400, 90), Sense.Downstream, double.PositiveInfinity, null);
        foreach (double share in (double[])[1e-6, 0.1, 0.5, 0.999999])
        {
            PathEnd part = tracer.Trace(new Complex(400, 90), Sense.Downstream, share * whole.Time, null);
            Assert.Equal(FateKind.Time, part.Fate.Kind);
            Assert.Equal(share * whole.Time, part.Time, 1e-12 * whole.Time);
            PathEnd rest = tracer.Trace(part.At, Sense.Downstream, double.PositiveInfinity, null);
            Assert.Equal(whole.Time, part.Time + rest.Time, Relative * whole.Time);
        }
    }

    [Fact]
    public void Upstream_and_then_downstream_for_the_same_time_returns_to_the_start()
    {
        Tracer tracer = Three.Tracer();
        foreach (Complex start in (Complex[])[new(400, 90), new(-150, 200), new(30, -40), new(90, 230)])
        {
            PathEnd up = tracer.Trace(start, Sense.Upstream, 3000, null);
            PathEnd back = tracer.Trace(up.At, Sense.Downstream, up.Time, null);
            Assert.InRange(Complex.Abs(back.At - start), 0, 1e-4);
        }
    }

    /// <summary>
    /// Derived: Phi falls by Q0 for each metre, h = sqrt(2 Phi / K), so that t = (n / Q0^2) sqrt(2 / K) (2 / 3) Phi0^(3/2).
    /// </summary>
    [Fact]
    public void A_water_table_runs_dry_at_the_place_and_time_of_the_closed_form()
    {
        FlowField field = Of(new Aquifer(10, 0, null, 0.2), new RegionalFlow(0.01, Math.PI, 12, 0), Bore).Field();
        Tracer tracer = new(PathStops.Of(field, StagnationFinder.Find(field), reach: 5000));
        PathEnd end = tracer.Trace(0, Sense.Downstream, double.PositiveInfinity, null);
        double discharge = 10 * 12 * 0.01, potential = 10 * 12 * 12 / 2.0;
        double time = 0.2 / (discharge * discharge) * Math.Sqrt(2 / 10.0) * 2 / 3 * Math.Pow(potential, 1.5);
        Assert.Equal(FateKind.Dry, end.Fate.Kind);
        Assert.Equal(-12 / (2 * 0.01), end.At.Real, 1e-9 * 600);
        Assert.Equal(time, end.Time, 1e-6 * time);
        Assert.Equal(FateKind.Dry, tracer.Trace(-601, Sense.Downstream, double.PositiveInfinity, null).Fate.Kind);
    }

    /// <summary>
    /// K 10 m/d, top at 15 m, 16 m at x = 1000, Q0 0.2775 m2/d: confined down to x = 459.459, where Phi is 1125, then a water table down to
    /// 12 m at x = -1000, where it is 720 (O.D.L. Strack, <i>Groundwater Mechanics</i>, 1989, from memory). Time by both closed forms.
    /// </summary>
    [Fact]
    public void Water_keeps_its_time_from_a_confined_aquifer_into_a_water_table()
    {
        Tracer tracer = Of(new Aquifer(10, 0, 15, 0.2), new RegionalFlow(0.00185, Math.PI, 16, 1000), Bore).Tracer();
        double confined = 0.2 * 15 * (1000 - 459.45945945945945) / 0.2775;
        double table = 0.2 / (0.2775 * 0.2775) * Math.Sqrt(2 / 10.0) * 2 / 3 * (Math.Pow(1125, 1.5) - Math.Pow(720, 1.5));
        PathEnd down = tracer.Trace(1000, Sense.Downstream, confined + table, null);
        Assert.Equal(-1000, down.At.Real, 2000 * 1e-7);
        PathEnd up = tracer.Trace(-1000, Sense.Upstream, confined + table, null);
        Assert.Equal(1000, up.At.Real, 2000 * 1e-7);
    }

    [Fact]
    public void Between_two_equal_wells_water_on_the_axis_ends_at_the_stagnation_point()
    {
        Tracer tracer = Confined(15, 20, 0.002, 0.25, 0.15, (new(0, 60), 300), (new(0, -60), 300)).Tracer();
        ImmutableArray<StagnationPoint> points = tracer.Stops.Stagnation.Points;
        PathEnd end = tracer.Trace(500, Sense.Downstream, double.PositiveInfinity, null);
        int meant = Enumerable.Range(0, points.Length).MinBy(i => Complex.Abs(points[i].At - end.At));
        Assert.Equal(new Fate(FateKind.Stagnation, meant), end.Fate);
        Assert.True(double.IsPositiveInfinity(end.Time));
        Assert.Equal(FateKind.Well, tracer.Trace(new Complex(500, 1e-3), Sense.Downstream, double.PositiveInfinity, null).Fate.Kind);
        Assert.Equal(FateKind.Time, tracer.Trace(500, Sense.Downstream, 100, null).Fate.Kind);
    }

    [Fact]
    public void Water_comes_from_far_or_from_injection_and_goes_past_the_wells_far()
    {
        Tracer tracer = Three.Tracer();
        PathEnd past = tracer.Trace(new Complex(400, -2000), Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(FateKind.Far, past.Fate.Kind);
        Assert.True(past.At.Real < -300);
        Assert.Equal(FateKind.Far, tracer.Trace(new Complex(0, 60), Sense.Upstream, double.PositiveInfinity, null).Fate.Kind);
        Assert.Equal(
            new Fate(FateKind.Injection, 2),
            tracer.Trace(new Complex(-290, 90), Sense.Upstream, double.PositiveInfinity, null).Fate);
    }

    [Fact]
    public void Inside_a_screen_water_has_arrived()
    {
        PathEnd end = Three.Tracer().Trace(new Complex(0.1, 0), Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(new PathEnd(new Complex(0.1, 0), new Fate(FateKind.Well, 0), 0, 0, 0), end);
        PathEnd axis = Three.Tracer().Trace(0, Sense.Downstream, double.PositiveInfinity, null);
        Assert.Equal(new Fate(FateKind.Well, 0), axis.Fate);
    }

    [Fact]
    public void Without_wells_water_moves_straight_at_one_speed()
    {
        Tracer tracer = Confined(15, 20, 0.002, 0.25, Bore).Tracer();
        PathEnd end = tracer.Trace(new Complex(300, 40), Sense.Downstream, 1000, null);
        Assert.Equal(new Fate(FateKind.Time), end.Fate);
        Assert.InRange(Complex.Abs(end.At - new Complex(300 - 120, 40)), 0, 1e-9);
        Assert.Equal(120, end.Length, 1e-9);
    }

    [Fact]
    public void No_water_crosses_a_path()
    {
        foreach (int seed in (int[])[3, 4, 5, 17, 42])
        {
            Tracer tracer = RandomSite(seed);
            foreach (PathEnd end in EndsOf(tracer, 40, seed))
            {
                Assert.InRange(Math.Abs(end.FluxDrift), 0, 1e-8 * tracer.Stops.TotalRate);
            }
        }
    }

    [Fact]
    public void Vertices_of_a_recorded_path_lie_on_the_path_at_their_times()
    {
        Tracer tracer = Three.Tracer();
        foreach (Complex start in (Complex[])[new(400, 90), new(900, -260), new(-250, 150)])
        {
            PathRecorder recorder = new(new PathResolution(0.05, 1e-5 * tracer.Stops.TotalRate));
            PathEnd end = tracer.Trace(start, Sense.Downstream, double.PositiveInfinity, recorder);
            ImmutableArray<PathPoint> points = recorder.ToPoints();
            Assert.Equal(start, points[0].At);
            Assert.Equal(new PathPoint(end.At, end.Time), points[^1]);
            double across = 0;
            for (int i = 1; i < points.Length - 1; i++)
            {
                across += tracer.Stops.Field.FluxAcross(points[i - 1].At, points[i].At);
                Assert.InRange(Math.Abs(across), 0, 1e-6 * tracer.Stops.TotalRate);
                PathEnd exact = tracer.Trace(start, Sense.Downstream, points[i].Time, null);
                Assert.InRange(Complex.Abs(exact.At - points[i].At), 0, 1e-4 * end.Length);
            }
        }
    }

    [Fact]
    public void Paths_are_the_same_on_many_threads()
    {
        Tracer tracer = RandomSite(17);
        PathEnd[] one = [.. EndsOf(tracer, 200, 1)];
        PathEnd[] many = new PathEnd[one.Length];
        Complex[] starts = StartsOf(tracer, 200, 1);
        Parallel.For(0, many.Length, i => many[i] = tracer.Trace(starts[i], Sense.Downstream, double.PositiveInfinity, null));
        Assert.Equal(one, many);
    }

    private static Tracer RandomSite(int seed)
    {
        RandomWells wells = RandomWells.Of(seed);
        RegionalFlow regional = new(wells.Uniform.Magnitude / 200, wells.Uniform.Phase, 1e6, 3000);
        return Of(
            new Aquifer(10, 0, 20, 0.25),
            regional,
            0.1,
            [.. wells.Places.Zip(wells.Rates)]).Tracer();
    }

    private static IEnumerable<PathEnd> EndsOf(Tracer tracer, int count, int seed) =>
        StartsOf(tracer, count, seed).Select(start => tracer.Trace(start, Sense.Downstream, double.PositiveInfinity, null));

    private static Complex[] StartsOf(Tracer tracer, int count, int seed)
    {
        Random random = new(seed);
        return
        [
            .. Enumerable.Range(0, count).Select(_ => tracer.Stops.Centre
                + tracer.Stops.Diameter * new Complex(random.NextDouble() - 0.5, random.NextDouble() - 0.5)),
        ];
    }
}

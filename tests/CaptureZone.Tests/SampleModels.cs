using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests;

/// <summary>
/// Small sites in any consistent units. Water moves toward -x; the base is at 0; a confined aquifer's head stands high enough to keep
/// it confined at every rate.
/// </summary>
public static class SampleModels
{
    /// <summary>So small that water within the bore changes no figure that is printed.</summary>
    public const double Bore = 1e-4;

    private const double HighHead = 1e5;

    /// <summary>The well at the origin.</summary>
    public static Model LoneWell(
        double conductivity, double thickness, double gradient, double rate, double porosity, double bore = Bore) =>
        Confined(conductivity, thickness, gradient, porosity, bore, (Complex.Zero, rate));

    public static Model Confined(
        double conductivity,
        double thickness,
        double gradient,
        double porosity,
        double bore,
        params (Complex At, double Rate)[] wells) =>
        Of(
            new Aquifer(conductivity, 0, thickness, porosity),
            new RegionalFlow(gradient, Math.PI, HighHead, new Complex(1000, 0)),
            bore,
            wells);

    public static Model Of(Aquifer aquifer, RegionalFlow regional, double bore, params (Complex At, double Rate)[] wells) =>
        new(
            aquifer,
            regional,
            [.. wells.Select((well, i) => new Well($"W{i}", well.At, well.Rate, bore, WellPurpose.Containment))]);

    public static FlowField Field(this Model model) => FlowSystem.Assemble(model).Solve();

    public static Tracer Tracer(this Model model) => new(model.Field());

    /// <summary>The run that every command makes; the extent is where zones are given finely.</summary>
    public static SiteAnswers Answer(this Model model, Envelope? extent = null, params double[] times) =>
        SiteAnalysis.Run(model, new Questions([], [.. times], extent, 1), new OneWorker(), null, CancellationToken.None);

    /// <summary>Water's travel time from a place to where it ends.</summary>
    public static double TimeFrom(this Tracer tracer, Complex at) =>
        tracer.Trace(at, Sense.Downstream, double.PositiveInfinity, null).Time;

    /// <summary>Where the way from one place to another first meets a zone.</summary>
    public static Complex FirstIn(this Geometry zone, Complex from, Complex to)
    {
        LineString way = zone.Factory.CreateLineString(
            [new Coordinate(from.Real, from.Imaginary), new Coordinate(to.Real, to.Imaginary)]);
        return way.Intersection(zone).Coordinates
            .Select(at => new Complex(at.X, at.Y))
            .MinBy(at => Complex.Abs(at - from));
    }

    /// <summary>Compares with a printed figure: within 1e-6 of it, or half its last digit where that is more.</summary>
    public static void AssertPrinted(double printed, double actual, double halfDigit = 0) =>
        Assert.Equal(printed, actual, Math.Max(1e-6 * Math.Abs(printed), halfDigit));

    /// <summary>
    /// Compares with a figure of a zone as it is drawn: its edges are chords of streamlines that may let 0.1 % of the water through, which
    /// moves them by some millionths.
    /// </summary>
    public static void AssertDrawn(double printed, double actual, double halfDigit = 0) =>
        Assert.Equal(printed, actual, Math.Max(1e-5 * Math.Abs(printed), halfDigit));

    /// <summary>The edge of what a well takes, by paths: on one side of a place they end in a well, on the other they do not.</summary>
    public static void AssertEdge(this Tracer tracer, Complex place, Complex inward, double within)
    {
        Assert.Equal(FateKind.Well, End(within));
        Assert.Equal(FateKind.Far, End(-within));

        FateKind End(double by) => tracer.Trace(place + by * inward, Sense.Downstream, double.PositiveInfinity, null).Fate.Kind;
    }
}

using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Zones;
using NetTopologySuite.Algorithm.Locate;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Zones.TravelTimes;

/// <summary>
/// Outlines of travel-time zones against the truth as <see cref="PlainFlow"/> tells it: whether water reaches the well within the
/// time. The true outline passes within 0.5 % of the zone's equivalent radius of every vertex and every middle of an edge,
/// and no point of a grid farther than that from the outline is on its wrong side.
/// </summary>
public sealed class OutlineTests
{
    private const double Year = 365.25;
    private const double Screen = 0.15;

    /// <summary>Of the radius of the circle with the zone's area.</summary>
    private const double Tolerance = 5e-3;

    /// <summary>Directions and distances within the tolerance in which the true outline is looked for.</summary>
    private const int Directions = 16, Rings = 4;

    /// <summary>Golden sections that narrow a metre down to a hundredth of a micrometre.</summary>
    private const int Sections = 40;

    private const int Grid = 120;

    private static readonly Aquifer s_aquifer = new(Conductivity: 18, Base: 0, Top: 12, Porosity: 0.24);

    [Theory]
    [InlineData(2)]
    [InlineData(10)]
    [InlineData(40)]
    public void The_outline_that_wraps_past_a_stagnation_point_is_true(double years) =>
        AssertTrue(Model(2e-3, (0, 300)), 0, years);

    [Theory]
    [InlineData(2)]
    [InlineData(5)]
    [InlineData(20)]
    public void The_outline_that_swallows_an_injection_well_is_true(double years) =>
        AssertTrue(Model(1e-3, (0, 400), (new Complex(-120, 30), -60)), 0, years, swallows: true);

    [Theory]
    [InlineData(0, 1)]
    [InlineData(0, 5)]
    [InlineData(0, 25)]
    [InlineData(1e-3, 25)]
    public void The_outlines_of_two_wells_200_m_apart_are_true(double gradient, double years)
    {
        Model model = Model(gradient, (0, 300), (200, 300));
        AssertTrue(model, 0, years);
        AssertTrue(model, 1, years);
    }

    [Theory]
    [Trait("Category", "Slow")]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(6)]
    [InlineData(16)]
    [InlineData(20)]
    [InlineData(103)]
    public void The_outlines_of_seeded_sites_are_true(int seed)
    {
        RandomSite site = RandomSite.Of(seed);
        Assert.NotNull(site.Model.Aquifer.Top);
        SiteAnswers answers = SiteAnalysis.Run(site.Model, site.Questions, new ThreadWorkers(2), null, CancellationToken.None);
        foreach (WellAnswer well in answers.Wells)
        {
            foreach (TravelTimeZone zone in well.TravelTimeZones)
            {
                AssertTrue(site.Model, well.Well, zone);
            }
        }
    }

    private static void AssertTrue(Model model, int well, double years, bool swallows = false)
    {
        Questions questions = new([], [years * Year], null, 1);
        SiteAnswers answers = SiteAnalysis.Run(model, questions, new ThreadWorkers(2), null, CancellationToken.None);
        TravelTimeZone zone = Assert.Single(answers.Wells[well].TravelTimeZones);
        Assert.InRange(zone.PoreVolumeError, 0, 1e-3);
        double full = model.Wells[well].Rate * zone.Time / (s_aquifer.Porosity * s_aquifer.Thickness);
        Assert.InRange(zone.Area / full, swallows ? 0 : 1 - 1e-3, swallows ? 1 : 1 + 1e-3);
        AssertTrue(model, well, zone);
    }

    private static void AssertTrue(Model model, int well, TravelTimeZone zone)
    {
        PlainFlow plain = new(model);
        double near = Tolerance * Math.Sqrt(zone.Area / Math.PI);
        double TimeFrom(Complex at) => plain.TimeTo(well, at, zone.Time, Screen);
        bool IsWithin(Complex at) => double.IsFinite(TimeFrom(at));
        (Complex At, Complex Normal)[] places = [.. Places(zone.Polygon)];
        bool[] isTrue = new bool[places.Length];
        new ThreadWorkers(2).For(places.Length, i => isTrue[i] =
            IsOnTruth(IsWithin, places[i].At, places[i].Normal * near) || IsOnCleft(TimeFrom, places[i].At, places[i].Normal * near));
        Assert.Equal([], places.Where((_, i) => !isTrue[i]).Select(place => place.At));
        AssertGrid(zone.Polygon, near, IsWithin);
    }

    /// <summary>Whether both kinds of water are found within a distance, first along the normal, then (at corners) all round.</summary>
    private static bool IsOnTruth(Func<Complex, bool> isWithin, Complex at, Complex reach)
    {
        bool within = false, beyond = false;
        for (int i = 0; i < Directions * Rings && !(within && beyond); i++)
        {
            double angle = Math.PI * (i % Directions) * (1 + 2.0 / Directions);
            bool here = isWithin(at + reach * Complex.FromPolarCoordinates(1 - (double)(i / Directions) / Rings, angle));
            within |= here;
            beyond |= !here;
        }

        return within && beyond;
    }

    /// <summary>
    /// Late water clings to the streamline that ends in a stagnation point, in a cleft too narrow to be met by chance: the time to the
    /// well rises toward it as a logarithm, so that a search for the latest water (golden section) finds it.
    /// </summary>
    private static bool IsOnCleft(Func<Complex, double> timeFrom, Complex at, Complex reach)
    {
        double golden = (Math.Sqrt(5) - 1) / 2;
        foreach (Complex across in new[] { reach, Complex.ImaginaryOne * reach })
        {
            double low = -1, high = 1;
            for (int i = 0; i < Sections; i++)
            {
                double a = high - golden * (high - low), b = low + golden * (high - low);
                double atA = timeFrom(at + across * a), atB = timeFrom(at + across * b);
                if (double.IsInfinity(atA) || double.IsInfinity(atB))
                {
                    return true;
                }

                (low, high) = atA > atB ? (low, b) : (a, high);
            }
        }

        return false;
    }

    private static void AssertGrid(Geometry zone, double near, Func<Complex, bool> isWithin)
    {
        Envelope box = zone.EnvelopeInternal.Copy();
        box.ExpandBy(4 * near);
        IndexedPointInAreaLocator locator = new(zone);
        locator.Locate(box.Centre);
        int[] wrong = new int[Grid];
        new ThreadWorkers(2).For(Grid, row =>
        {
            for (int column = 0; column < Grid; column++)
            {
                Coordinate at = new(box.MinX + box.Width * (column + 0.5) / Grid, box.MinY + box.Height * (row + 0.5) / Grid);
                bool drawn = locator.Locate(at) != Location.Exterior;
                wrong[row] += drawn != isWithin(GeometryKit.ToComplex(at))
                    && !zone.Boundary.IsWithinDistance(GeometryKit.Factory.CreatePoint(at), near) ? 1 : 0;
            }
        });
        Assert.Equal(0, wrong.Sum());
    }

    /// <summary>Vertices and middles of edges, with unit normals.</summary>
    private static IEnumerable<(Complex At, Complex Normal)> Places(Geometry zone)
    {
        for (int part = 0; part < zone.NumGeometries; part++)
        {
            Polygon polygon = (Polygon)zone.GetGeometryN(part);
            foreach (LineString ring in polygon.InteriorRings.Prepend(polygon.ExteriorRing))
            {
                Complex[] corners = [.. ring.Coordinates.Select(GeometryKit.ToComplex)];
                for (int i = 1; i < corners.Length; i++)
                {
                    Complex edge = corners[i] - corners[i - 1], normal = Complex.ImaginaryOne * edge / Complex.Abs(edge);
                    yield return (corners[i - 1], normal);
                    yield return ((corners[i - 1] + corners[i]) / 2, normal);
                }
            }
        }
    }

    private static Model Model(double gradient, params (Complex At, double Rate)[] wells)
    {
        ImmutableArray<Element> elements =
            [.. wells.Select((well, i) => new Well($"W-{i + 1}", well.At, well.Rate, Screen, WellPurpose.Other))];
        return new Model(s_aquifer, new RegionalFlow(gradient, 0, 200, -5000), elements);
    }
}

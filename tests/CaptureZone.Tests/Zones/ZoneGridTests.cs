using CaptureZone.Flow;
using CaptureZone.Zones;
using NetTopologySuite.Algorithm.Locate;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Zones;

/// <summary>
/// Zones against a method of their own: every point of a grid over the extent is followed with the water by
/// <see cref="PlainFlow"/>. None that is farther than 1e-4 of the extent's diagonal from a zone's edge may be on its wrong side.
/// </summary>
public sealed class ZoneGridTests
{
    private const int Fields = 10;
    private const double EdgeShare = 1e-4;
    private const int QuickGrid = 120, FullGrid = 1000;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, Fields)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Every_point_of_a_grid_ends_in_the_well_whose_zone_it_lies_in(int seed) => AssertAgree(seed, QuickGrid);

    [Theory]
    [Trait("Category", "Slow")]
    [MemberData(nameof(Seeds))]
    public void Every_one_of_a_million_points_ends_in_the_well_whose_zone_it_lies_in(int seed) => AssertAgree(seed, FullGrid);

    private static void AssertAgree(int seed, int grid)
    {
        RandomSite site = RandomSite.Of(seed);
        IWorkers workers = new ThreadWorkers(2);
        SiteAnswers answers = SiteAnalysis.Run(site.Model, site.Questions, workers, null, CancellationToken.None);
        PlainFlow plain = new(site.Model);
        Geometry?[] zones = [.. answers.Wells.Select(well => well.Zone?.Polygon)];
        Geometry edges = GeometryKit.Factory.BuildGeometry([.. zones.OfType<Geometry>().Select(zone => zone.Boundary)]);
        IndexedPointInAreaLocator?[] locators = [.. zones.Select(zone => zone is null ? null : LocatorOf(zone))];
        int[] missed = new int[grid], captured = new int[grid];
        workers.For(grid, row =>
        {
            for (int column = 0; column < grid; column++)
            {
                Coordinate at = CentreOf(answers.Extent, grid, column, row);
                int destination = plain.Destination(GeometryKit.ToComplex(at));
                int zone = Array.FindIndex(locators, locator => locator is not null && locator.Locate(at) != Location.Exterior);
                captured[row] += destination == PlainFlow.None ? 0 : 1;
                missed[row] += destination != zone && IsOffEdge(edges, at, answers.Extent) ? 1 : 0;
            }
        });
        Assert.InRange(captured.Sum(), 1, grid * grid);
        Assert.Equal(0, missed.Sum());
    }

    /// <summary>Its index is built at the first question: asked here, so that the workers only read it.</summary>
    private static IndexedPointInAreaLocator LocatorOf(Geometry zone)
    {
        IndexedPointInAreaLocator locator = new(zone);
        locator.Locate(zone.EnvelopeInternal.Centre);
        return locator;
    }

    private static Coordinate CentreOf(Envelope extent, int grid, int column, int row) => new(
        extent.MinX + extent.Width * (column + 0.5) / grid, extent.MinY + extent.Height * (row + 0.5) / grid);

    private static bool IsOffEdge(Geometry edges, Coordinate at, Envelope extent) =>
        !edges.IsWithinDistance(GeometryKit.Factory.CreatePoint(at), EdgeShare * extent.Diameter);
}

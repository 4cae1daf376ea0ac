using System.Collections.Immutable;
using CaptureZone.Flow;
using FsCheck.Xunit;

namespace CaptureZone.Tests.Zones;

/// <summary>Every kind of <see cref="RandomSite"/> keeps every one of the <see cref="Promises"/>.</summary>
public sealed class RandomSiteTests(RandomSiteTests.Answered answered) : IClassFixture<RandomSiteTests.Answered>
{
    private const int Sites = 14, Cases = 6, ManyCases = 30;

    [Fact]
    public void Side_flow_and_pore_volumes_stay_within_a_thousandth_and_every_check_holds() =>
        Assert.All(answered.Sites, site => Promises.AssertChecksHold(site.Answers));

    [Fact]
    public void Every_figure_is_a_number() => Assert.All(answered.Sites, site => Promises.AssertAllAreNumbers(site.Answers));

    [Fact]
    public void Every_zone_is_a_valid_polygon() => Assert.All(answered.Sites, site => Promises.AssertShapesAreValid(site.Answers));

    [Fact]
    public void Zones_of_different_wells_do_not_overlap() =>
        Assert.All(answered.Sites, site => Promises.AssertZonesDoNotOverlap(site.Answers, site.Site.Model));

    [Fact]
    public void Water_by_origin_sums_to_the_rate() =>
        Assert.All(answered.Sites, site => Promises.AssertWaterIsAccountedFor(site.Answers, site.Site.Model));

    [Fact]
    public void Verdicts_by_topology_agree_with_the_polygons() =>
        Assert.All(answered.Sites, site => Promises.AssertVerdictsAgree(site.Answers, site.Site.Model, site.Seed));

    [Fact]
    public void One_worker_and_two_give_the_same_bits() =>
        Assert.All(answered.Sites, site => Promises.AssertSameBits(site.Answers, Run(site.Site, new ThreadWorkers(2))));

    [Property(MaxTest = Cases, Replay = Draws.Seed)]
    public void Any_site_keeps_every_promise(ushort seed) => AssertEveryPromise(seed);

    [Property(MaxTest = ManyCases, Replay = Draws.Seed)]
    [Trait("Category", "Slow")]
    public void Any_of_many_sites_keeps_every_promise(ushort seed) => AssertEveryPromise(seed);

    private static void AssertEveryPromise(int seed)
    {
        RandomSite site = RandomSite.Of(seed);
        SiteAnswers answers = Run(site, new ThreadWorkers(2));
        Promises.AssertChecksHold(answers);
        Promises.AssertAllAreNumbers(answers);
        Promises.AssertShapesAreValid(answers);
        Promises.AssertZonesDoNotOverlap(answers, site.Model);
        Promises.AssertWaterIsAccountedFor(answers, site.Model);
        Promises.AssertVerdictsAgree(answers, site.Model, seed);
    }

    private static SiteAnswers Run(RandomSite site, IWorkers workers) =>
        SiteAnalysis.Run(site.Model, site.Questions, workers, null, CancellationToken.None);

    /// <summary>The answers of some sites, found once.</summary>
    public sealed class Answered
    {
        public ImmutableArray<(int Seed, RandomSite Site, SiteAnswers Answers)> Sites { get; } =
            [.. Enumerable.Range(0, RandomSiteTests.Sites).Select(RandomSite.Of).Select((site, seed) => (seed, site, Run(site, new OneWorker())))];
    }
}

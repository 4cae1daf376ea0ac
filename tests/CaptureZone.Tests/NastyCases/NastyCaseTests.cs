using System.Text;
using CaptureZone.Flow;
using CaptureZone.Sites;
using CaptureZone.Sites.Reading;
using CaptureZone.Tests.Outputs;
using CaptureZone.Zones;

namespace CaptureZone.Tests.NastyCases;

/// <summary>Sites that are hard by their make, each told in the comments at the top of its file; what must come of each stands in <see cref="Expectations"/>.</summary>
public sealed class NastyCaseTests
{
    private const string Folder = "tests/CaptureZone.Tests/NastyCases";

    public static TheoryData<string> Names => [.. RepositoryFiles.Names(Folder, "*.toml")];

    [Theory]
    [MemberData(nameof(Names))]
    public void Each_case_comes_out_as_expected(string name)
    {
        Assert.True(Expectations.ByName.TryGetValue(name, out Action<SiteDocument>? expectation), $"{name}.toml has no expectation");
        expectation(Read(name));
    }

    [Fact]
    public void Each_expectation_has_its_case() =>
        Assert.Equal(Expectations.ByName.Keys.Order(StringComparer.Ordinal), RepositoryFiles.Names(Folder, "*.toml"));

    /// <summary>The site of a file of this folder.</summary>
    internal static SiteDocument Read(string name)
    {
        byte[] bytes = Encoding.UTF8.GetBytes(RepositoryFiles.Read($"{Folder}/{name}.toml"));
        SiteReading reading = SiteReader.Read($"{name}.toml", bytes, new NoFiles());
        Assert.DoesNotContain(reading.Complaints, complaint => complaint.Severity == Severity.Error);
        return reading.Document!;
    }

    /// <summary>Runs a site, and asserts what must hold of every site: figures are numbers, polygons are valid, every check is passed.</summary>
    internal static SiteAnswers Run(Model model, Questions questions)
    {
        SiteAnswers answers = SiteAnalysis.Run(model, questions, new OneWorker(), null, CancellationToken.None);
        Assert.True(answers.StagnationComplete);
        Assert.All(answers.Checks, check => Assert.True(check.Passed, $"{check.Name}: {check.Value}, allowed {check.Limit}"));
        Assert.All(answers.Wells, AssertSound);
        Assert.True(answers.ContainmentZone.IsValid);
        return answers;
    }

    private static void AssertSound(WellAnswer well)
    {
        Assert.All([well.HeadAtScreen, well.DrawdownAtScreen, well.LargestRate ?? 0], AssertNumber);
        foreach (TravelTimeZone timed in well.TravelTimeZones)
        {
            Assert.True(timed.Polygon.IsValid);
            Assert.All([timed.Area, timed.PoreVolumeError], AssertNumber);
        }

        if (well.Zone is { } zone)
        {
            Assert.True(zone.Polygon.IsValid);
            Assert.True(zone.InExtent.IsValid);
            Assert.False(zone.Polygon.IsEmpty);
            Assert.All(
                [
                    zone.Area ?? 0, zone.AreaInExtent, zone.WidthAtWell ?? 0, zone.WidthUpgradient ?? 0, zone.StagnationDistance ?? 0,
                    zone.SideFlow, .. zone.WaterFrom.SelectMany(share => new[] { share.Rate, share.Share }),
                ],
                AssertNumber);
            Assert.Equal(1, zone.WaterFrom.Sum(share => share.Share), 1e-9);
        }
    }

    private static void AssertNumber(double figure) => Assert.True(double.IsFinite(figure));
}

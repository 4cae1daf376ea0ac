using CaptureZone.Outputs;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Tracing;

namespace CaptureZone.Tests.Outputs.Text;

public sealed class TextTests
{
    private static readonly Report Sample = SampleReport.Create();

    [Theory]
    [InlineData(FateKind.Well, 0, "well:RW-1", "well RW-1", "well RW-1")]
    [InlineData(FateKind.Injection, 3, "injection:IW-1", "injection well IW-1", "injection well IW-1")]
    [InlineData(FateKind.Far, -1, "far", "far downgradient", "regional flow")]
    [InlineData(FateKind.Dry, -1, "dry", "where the aquifer is dry", "where the aquifer is dry")]
    [InlineData(FateKind.Time, -1, "time", "no end within the time asked", "farther than was followed")]
    [InlineData(FateKind.Stagnation, 0, "stagnation", "a stagnation point", "a stagnation point")]
    [InlineData(FateKind.Summit, -1, "summit", "a summit of the head", "recharge")]
    public void A_fate_has_a_token_and_words(FateKind kind, int feature, string token, string destination, string source)
    {
        Fate fate = new(kind, feature);
        Assert.Equal(token, FateText.Token(fate, Sample.Site.Model));
        Assert.Equal(destination, FateText.Destination(fate, Sample.Site.Model));
        Assert.Equal(source, FateText.Source(fate, Sample.Site.Model));
    }

    [Theory]
    [InlineData(FateKind.Well, 5)]
    [InlineData(FateKind.Stream, 0)]
    public void A_fate_at_a_feature_that_the_model_has_not_is_refused(FateKind kind, int feature) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FateText.Token(new Fate(kind, feature), Sample.Site.Model));

    [Fact]
    public void Every_kind_of_finding_has_a_code_of_its_own_one_sentence_and_a_line_in_the_reference()
    {
        FindingSentence[] all =
        [
            .. Enum.GetValues<FindingKind>().Select(kind => FindingText.Of(new Finding(kind, "A", "B", 0.5, 1), Sample)),
        ];
        Assert.Equal(all.Length, all.Select(told => told.Code).Distinct().Count());
        Assert.All(all, told => Assert.Contains($"`{told.Code}`", RepositoryFiles.Read("docs/results.md"), StringComparison.Ordinal));
        Assert.All(all, told => Assert.Matches("^[a-z]+(-[a-z]+)*$", told.Code));
        Assert.All(all, told => Assert.Matches(@"^[A-Z].*[^.]\.$", told.Text));
    }

    [Fact]
    public void A_finding_speaks_in_the_reports_units()
    {
        Finding finding = new(FindingKind.LevelBelowTop, "RW-1", "", 223.5, 224);
        Assert.Equal(
            "The level at the screen of well RW-1, 733.3 ft, is below the aquifer's top, 734.9 ft.",
            FindingText.Of(finding, SampleReport.Create(ReportUnits.Us)).Text);
    }

    [Fact]
    public void A_held_head_that_wells_raise_is_told_as_raised() => Assert.StartsWith(
        "Wells would raise the head where it is held by 0.310 m,",
        FindingText.Of(new Finding(FindingKind.KnownHeadInfluenced, "", "", -0.31, 0.27), Sample).Text,
        StringComparison.Ordinal);

    [Fact]
    public void The_caution_in_parts_is_the_caution() => Assert.Equal(Caution.Text, string.Join(' ', Caution.Lines));
}

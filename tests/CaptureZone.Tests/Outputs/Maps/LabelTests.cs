using System.Collections.Immutable;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Maps;
using CaptureZone.Sites;
using FsCheck.Xunit;
using SkiaSharp;

namespace CaptureZone.Tests.Outputs.Maps;

public sealed class LabelTests
{
    [Theory]
    [InlineData(ReportUnits.Metric)]
    [InlineData(ReportUnits.Us)]
    public void No_two_texts_of_a_map_share_a_place_and_none_leaves_the_sheet(ReportUnits units) =>
        AssertApart(new MapSheet(SampleReport.Create(units)));

    [Property(MaxTest = 25, Replay = Draws.Seed)]
    public void On_sites_with_clustered_wells_no_two_texts_share_a_place_and_every_well_has_its_name(int seed)
    {
        Report report = MapCases.Clustered(seed, 1 + (seed & 15));
        MapSheet sheet = new(report);
        AssertApart(sheet);
        HashSet<string> written = [.. WritingCanvas.TextsOf(sheet).Select(text => text.Text)];
        Assert.All(report.Site.Model.Wells, well => Assert.Contains(well.Name, written));
    }

    [Fact]
    public void Names_for_which_there_is_no_room_are_told_beside_the_plan()
    {
        Report report = MapCases.Clustered(3, 250);
        MapSheet sheet = new(report);
        int placed = sheet.Placement.Labels.Count(label => label.Block.Lines.Length == 2);
        Assert.NotEmpty(sheet.Placement.LeftOut);
        Assert.Equal(report.Site.Model.Wells.Length, placed + sheet.Placement.LeftOut.Count(label => label.Block.Lines.Length == 2));
        Assert.Contains(WritingCanvas.TextsOf(sheet), text => text.Text.StartsWith("Names without room:", StringComparison.Ordinal));
        AssertApart(sheet);
    }

    [Fact]
    public void Labels_stand_on_no_symbol_and_cross_no_frame()
    {
        Report report = MapCases.Clustered(11, 14);
        MapSheet sheet = new(report);
        LabelBox[] wells =
        [
            .. report.Site.Model.Wells.Select(well => new LabelBox(sheet.View.At(well.At), Look.SymbolRadius, Look.SymbolRadius, 0)),
        ];
        Assert.All(sheet.Placement.Labels, label =>
        {
            Assert.True(label.Box.Within(sheet.View.Area));
            Assert.DoesNotContain(wells, well => well.Meets(label.Box));
        });
    }

    [Fact]
    public void Text_is_never_upside_down() =>
        Assert.All(WritingCanvas.TextsOf(new MapSheet(SampleReport.Create())), text => Assert.InRange(text.Angle, -90, 90));

    [Fact]
    public void A_label_that_had_to_move_away_has_a_leader_from_its_thing()
    {
        LabelBlock block = LabelBlock.Of("RW-1", new TextStyle(Look.NameSize, Look.Ink));
        SKPoint at = new(500, 500);
        LabelPlacement placement = LabelPlacement.Of(
            new SKRect(0, 0, 1000, 1000),
            [new LabelBox(at, 150, 150, 0)],
            [],
            [new LabelRequest(block, LabelSpots.Around(at, 20, block))]);
        PlacedLabel label = Assert.Single(placement.Labels);
        Assert.Equal(20, SKPoint.Distance(at, label.Leader!.Value.From), 0.01);
    }

    [Theory]
    [InlineData(0, 0, 0, true)]
    [InlineData(19, 0, 0, true)]
    [InlineData(21, 0, 0, false)]
    [InlineData(0, 9, 0, true)]
    [InlineData(0, 11, 0, false)]
    [InlineData(0, 14, 90, true)]
    [InlineData(0, 16, 90, false)]
    [InlineData(15, 15, 45, false)]
    [InlineData(14, 14, 45, true)]
    public void Boxes_meet_when_no_side_parts_them(float x, float y, float angle, bool meet)
    {
        LabelBox fixedBox = new(new SKPoint(0, 0), 10, 5, 0), other = new(new SKPoint(x, y), 10, 5, angle);
        Assert.Equal(meet, fixedBox.Meets(other));
        Assert.Equal(meet, other.Meets(fixedBox));
    }

    [Fact]
    public void Long_names_are_shortened_and_control_characters_become_spaces()
    {
        TextStyle style = new(Look.NameSize, Look.Ink);
        string fitted = Lettering.Fitted("Parcel\n12 " + new string('w', 5000), style, 400);
        Assert.StartsWith("Parcel 12 w", fitted, StringComparison.Ordinal);
        Assert.EndsWith("...", fitted, StringComparison.Ordinal);
        Assert.True(Lettering.Width(fitted, style) <= 400);
    }

    private static void AssertApart(MapSheet sheet)
    {
        ImmutableArray<MapText> texts = WritingCanvas.TextsOf(sheet);
        SKRect paper = new(0, 0, Look.SheetWidth, sheet.Height);
        for (int i = 0; i < texts.Length; i++)
        {
            Assert.True(texts[i].Box.Within(paper), texts[i].Text);
            for (int j = 0; j < i; j++)
            {
                // Lines of one label touch; a hair's breadth is rounding.
                Assert.False(texts[i].Box.Grown(-0.1f).Meets(texts[j].Box), $"{texts[i].Text} and {texts[j].Text}");
            }
        }
    }
}

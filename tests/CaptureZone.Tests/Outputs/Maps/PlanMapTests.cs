using System.Globalization;
using System.Numerics;
using System.Text;
using System.Xml.Linq;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Maps;
using CaptureZone.Outputs.Text;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Tests.Outputs.Maps;

public sealed class PlanMapTests
{
    private const int LeastWidth = 2400;
    private const int MostPngBytes = 1_000_000;
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";
    private static readonly Lazy<MapPictures> Sample = new(() => PlanMap.Draw(SampleReport.Create()));

    [Fact]
    public void The_png_is_wide_enough_for_print_and_compact()
    {
        using SKBitmap picture = SKBitmap.Decode(Sample.Value.Png);
        Assert.True(picture.Width >= LeastWidth);
        Assert.InRange(Sample.Value.Png.Length, 1, MostPngBytes);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void The_bytes_are_the_same_in_every_culture(string culture)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo(culture);
            MapPictures there = PlanMap.Draw(SampleReport.Create());
            Assert.Equal(Sample.Value.Png, there.Png);
            Assert.Equal(Sample.Value.Svg, there.Svg);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Metres_are_equally_long_in_both_directions_and_north_is_up()
    {
        PlanView view = new MapSheet(SampleReport.Create()).View;
        SKPoint from = view.At(new Complex(0, 0)), east = view.At(new Complex(100, 0)), north = view.At(new Complex(0, 100));
        Assert.Equal(east.X - from.X, from.Y - north.Y, 0.01);
        Assert.Equal(from.Y, east.Y);
        Assert.Equal(from.X, north.X);
    }

    [Theory]
    [InlineData(1, 100)]
    [InlineData(100, 100)]
    [InlineData(100, 1)]
    public void Slender_extents_are_shown_whole_in_a_frame_that_can_be_read(double width, double height)
    {
        Report report = SampleReport.Create();
        Envelope extent = new(-width / 2, width / 2, -height / 2, height / 2);
        MapSheet sheet = new(report with { Answers = report.Answers with { Extent = extent } });
        Assert.True(sheet.View.Frame.Contains(extent));
        Assert.InRange(sheet.View.Frame.Width / sheet.View.Frame.Height, 0.619, 2.601);
    }

    [Fact]
    public void The_svg_needs_no_font_and_says_its_texts_to_machines()
    {
        XDocument svg = XDocument.Load(new MemoryStream(Sample.Value.Svg));
        Assert.Empty(svg.Descendants(Svg + "text"));
        HashSet<string> glyphs = [.. svg.Root!.Element(Svg + "defs")!.Elements().Select(glyph => glyph.Attribute("id")!.Value)];
        XName link = XName.Get("href", "http://www.w3.org/1999/xlink");
        Assert.All(svg.Descendants(Svg + "use"), use => Assert.Contains(use.Attribute(link)!.Value[1..], glyphs));
        Assert.Contains(svg.Descendants(Svg + "g"), group => group.Attribute("aria-label")?.Value == "RW-1");
    }

    [Fact]
    public void Every_map_bears_the_caution_and_what_a_reader_must_know()
    {
        string words = Words(SampleReport.Create());
        Assert.Contains(Caution.Text, words, StringComparison.Ordinal);
        Assert.All(
            [
                "Larch Hollow Plating Works, chromium plume", "Predicted heads and zones", "open at frame", "NAD83 / UTM zone 14N",
                "Vertical datum: NAVD 88", "Date: 2026-12-01", "Prepared by: A. Sample, licence 0000", "interval 0.5 m", "Easting, m",
                "Northing, m", "grid north", "Cr(VI) above 50 ug/L", "County road 9", "RW-1", "1.74 L/s", "injects 2.08 L/s", "5 yr",
            ],
            part => Assert.Contains(part, words, StringComparison.Ordinal));
    }

    [Fact]
    public void A_datum_that_is_not_given_is_said_to_be_missing_and_a_date_is_left_out()
    {
        Report report = SampleReport.Create();
        string words = Words(report with
        {
            Site = report.Site with { Report = report.Site.Report with { VerticalDatum = "", Date = "" } },
        });
        Assert.Contains("Vertical datum not given", words, StringComparison.Ordinal);
        Assert.DoesNotContain("Date:", words, StringComparison.Ordinal);
    }

    [Fact]
    public void A_hole_in_a_zone_shows_the_paper_and_the_zone_round_it_its_tint()
    {
        Report report = SampleReport.Create();
        PlanView view = new MapSheet(report).View;
        Polygon zone = report.Answers.Wells.Select(well => well.Zone?.Polygon).OfType<Polygon>()
            .Single(polygon => polygon.NumInteriorRings == 1);
        using SKBitmap picture = SKBitmap.Decode(Sample.Value.Png);
        Assert.Equal(Look.Paper, Prevailing(picture, view.At(zone.GetInteriorRingN(0).Centroid.Coordinate)));
        Assert.Equal(Look.SupplyTint1, Prevailing(picture, view.At(zone.InteriorPoint.Coordinate)));
    }

    [Fact]
    public void A_map_of_nothing_but_regional_flow_can_be_drawn()
    {
        Report report = MapCases.Clustered(1, 0);
        SiteAnswers answers = report.Answers with
        {
            StagnationPoints = [],
            ContainmentZone = new GeometryFactory().CreatePolygon(),
            Plumes = [],
            Paths = [],
            Contours = [],
            Arrows = [],
            Questions = report.Answers.Questions with { Plumes = [] },
        };
        MapPictures pictures = PlanMap.Draw(report with { Answers = answers, Site = report.Site with { Backdrops = [] } });
        using SKBitmap picture = SKBitmap.Decode(pictures.Png);
        Assert.NotNull(picture);
    }

    [Fact]
    public void Flat_colours_survive_the_palette()
    {
        SKColor[] colors = [.. Look.FlatColors.Distinct()];
        uint[] pixels = [.. colors.Select(color => (uint)(color.Red | (color.Green << 8) | (color.Blue << 16) | (color.Alpha << 24)))];
        PngFile file = new(colors.Length, 1, colors);
        file.Add(pixels);
        using SKBitmap picture = SKBitmap.Decode(file.ToArray());
        Assert.Equal(colors, Enumerable.Range(0, colors.Length).Select(x => picture.GetPixel(x, 0)));
    }

    /// <summary>The colour of most pixels in a small square: lines may cross it.</summary>
    private static SKColor Prevailing(SKBitmap picture, SKPoint at)
    {
        const int Half = 8;
        return Enumerable.Range(-Half, 2 * Half)
            .SelectMany(x => Enumerable.Range(-Half, 2 * Half).Select(y => picture.GetPixel((int)at.X + x, (int)at.Y + y)))
            .GroupBy(color => color).MaxBy(group => group.Count())!.Key;
    }

    private static string Words(Report report)
    {
        StringBuilder words = new();
        foreach (MapText text in WritingCanvas.TextsOf(new MapSheet(report)))
        {
            words.Append(text.Text).Append(' ');
        }

        return words.ToString();
    }
}

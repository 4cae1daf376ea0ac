using System.Globalization;
using System.Reflection;
using System.Text.RegularExpressions;
using CaptureZone.Outputs.Maps;
using SkiaSharp;

namespace CaptureZone.Tests.Outputs.Maps;

public sealed partial class LookPageTests
{
    /// <summary>As docs/look.md promises.</summary>
    private const double LeastBetweenFills = 3.5, LeastBetweenFillAndEdge = 35;

    private static readonly SKColor[] Fills = [.. Look.Tints(true), .. Look.Tints(false), Look.Paper];

    [GeneratedRegex(@"^\| (?<name>\w+) \| `(?<hex>#[0-9A-F]{6})` \| (?<light>[0-9.]+) \|", RegexOptions.Multiline)]
    private static partial Regex ColorRow();

    [Fact]
    public void The_page_states_every_colour_of_the_code_and_no_other()
    {
        Dictionary<string, SKColor> stated = Rows().ToDictionary(row => row.Groups["name"].Value, Stated);
        Dictionary<string, SKColor> used = typeof(Look).GetFields(BindingFlags.Static | BindingFlags.Public)
            .Where(field => field.FieldType == typeof(SKColor)).ToDictionary(field => field.Name, field => (SKColor)field.GetValue(null)!);
        Assert.NotEmpty(used);
        Assert.Equal(used.OrderBy(pair => pair.Key, StringComparer.Ordinal), stated.OrderBy(pair => pair.Key, StringComparer.Ordinal));
    }

    [Fact]
    public void The_page_states_the_lightness_of_its_colours() => Assert.All(Rows(), row =>
        Assert.Equal(
            double.Parse(row.Groups["light"].Value, CultureInfo.InvariantCulture), Lightness(Stated(row)), 0.051));

    [Fact]
    public void Fills_that_can_lie_side_by_side_differ_in_grey_print()
    {
        double[] lightness = [.. Fills.Select(Lightness).Order()];
        Assert.All(lightness.Zip(lightness.Skip(1)), pair => Assert.True(pair.Second - pair.First >= LeastBetweenFills));
    }

    [Fact]
    public void Edges_of_zones_stand_out_from_every_fill_in_grey_print()
    {
        double darkestFill = Fills.Min(Lightness);
        Assert.All(
            [Look.Containment, Look.Supply, Look.Plume, Look.TravelTime],
            edge => Assert.True(darkestFill - Lightness(edge) >= LeastBetweenFillAndEdge));
    }

    /// <summary>CIE 1976 L* of an sRGB colour; constants of IEC 61966-2-1 and CIE 15, from memory.</summary>
    private static double Lightness(SKColor color)
    {
        double y = 0.2126 * Linear(color.Red) + 0.7152 * Linear(color.Green) + 0.0722 * Linear(color.Blue);
        return y > 0.008856 ? 116 * Math.Cbrt(y) - 16 : 903.3 * y;

        static double Linear(byte channel)
        {
            double value = channel / 255.0;
            return value <= 0.04045 ? value / 12.92 : Math.Pow((value + 0.055) / 1.055, 2.4);
        }
    }

    private static SKColor Stated(Match row) => SKColor.Parse(row.Groups["hex"].Value);

    private static MatchCollection Rows() => ColorRow().Matches(File.ReadAllText(Path.Combine(Root(), "docs", "look.md")));

    private static string Root()
    {
        string folder = AppContext.BaseDirectory;
        while (!File.Exists(Path.Combine(folder, "CaptureZone.sln")))
        {
            folder = Path.GetDirectoryName(folder)!;
        }

        return folder;
    }
}

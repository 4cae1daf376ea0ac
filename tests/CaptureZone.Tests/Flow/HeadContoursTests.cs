using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Flow;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Flow;

public sealed class HeadContoursTests
{
    /// <summary>What the doc comment of the contours promises, with room for the rounding of the head itself, m.</summary>
    private const double OnLevel = 1.1e-7;

    private static readonly Envelope Frame = new(-1000, 1000, -750, 750);

    private static readonly RegionalFlow Still = new(Gradient: 0, Direction: 0, Head: 231.6, HeadAt: new Complex(-3000, 1000));

    /// <summary>Confined in the whole frame.</summary>
    private static readonly RegionalFlow Near = Superposed.Regional with { HeadAt = new Complex(-1000, 0) };

    /// <summary>A lone well that extracts, the demo's regional flow, a pair across the flow, and a water table that falls dry.</summary>
    public static TheoryData<string> Fields => [.. All.Keys];

    private static Dictionary<string, FlowField> All { get; } = new()
    {
        ["lone well"] = Superposed.Field(Superposed.Confined, Still, Superposed.Well(13, -21, 400)),
        ["uniform"] = Superposed.Field(Superposed.Confined, Near),
        ["twelve wells"] = Superposed.Field(Superposed.Confined, Superposed.Regional, Superposed.Wells(12, seed: 4)),
        ["pair"] = Superposed.Field(Superposed.Confined, Still, Superposed.Well(-300, 0, 400), Superposed.Well(300, 0, -400)),
        ["water table"] = Superposed.Field(
            Superposed.Confined with { Top = null },
            Superposed.Regional with { Head = 215, HeadAt = new Complex(-500, 0), Gradient = 0.002 },
            Superposed.Well(-600, 100, 8)),
        ["both"] = Superposed.Field(
            Superposed.Confined, Superposed.Regional with { Head = 224.5, HeadAt = new Complex(-500, 0) }, Superposed.Well(-100, 100, 60)),
    };

    private static Dictionary<string, HeadContourMap> Maps { get; } =
        All.ToDictionary(entry => entry.Key, entry => HeadContours.Find(entry.Value, Frame, 1));

    [Theory]
    [MemberData(nameof(Fields))]
    public void Every_vertex_lies_on_its_level_and_in_the_frame(string name)
    {
        FlowField field = All[name];
        HeadContourMap map = Maps[name];
        Assert.InRange(map.Contours.Length, 8, 40);
        foreach (HeadContour contour in map.Contours)
        {
            foreach (Complex vertex in contour.Lines.SelectMany(line => line))
            {
                Assert.InRange(field.HeadAt(vertex), contour.Head - OnLevel, contour.Head + OnLevel);
                Assert.True(Frame.Contains(vertex.Real, vertex.Imaginary));
            }
        }
    }

    /// <summary>Between two neighbours a line bulges from its chord by less than a hundredth of a cell of the grid's 160 x 120.</summary>
    [Theory]
    [MemberData(nameof(Fields))]
    public void Lines_follow_the_head_between_their_vertices(string name)
    {
        FlowField field = All[name];
        double cell = Frame.Width / 160;
        foreach (HeadContour contour in Maps[name].Contours)
        {
            foreach ((Complex a, Complex b) in contour.Lines.SelectMany(line => line.Zip(line.Skip(1))))
            {
                Complex middle = (a + b) / 2;
                Complex slope = field.FlowAt(middle).Discharge;
                double thickness = field.AquiferAt(middle).SaturatedThickness(field.FlowAt(middle).Potential);
                double off = (field.HeadAt(middle) - contour.Head) * field.AquiferAt(middle).Conductivity * thickness / slope.Magnitude;
                Assert.InRange(Math.Abs(off), 0, 0.02 * cell);
            }
        }
    }

    [Theory]
    [MemberData(nameof(Fields))]
    public void Lines_are_closed_or_end_at_the_frame(string name)
    {
        foreach (ImmutableArray<Complex> line in Maps[name].Contours.SelectMany(contour => contour.Lines))
        {
            Assert.True(line.Length > 1);
            Assert.True(line[0] == line[^1] || (AtFrame(line[0]) && AtFrame(line[^1])));
        }
    }

    [Fact]
    public void A_lone_well_has_concentric_closed_circles()
    {
        Complex axis = new(13, -21);
        HeadContourMap map = Maps["lone well"];
        HeadContour[] whole = [.. map.Contours.Where(contour => contour.Lines is [var line] && line[0] == line[^1])];
        Assert.NotEmpty(whole);
        double last = 0;
        foreach (HeadContour contour in whole)
        {
            double radius = contour.Lines[0].Average(vertex => (vertex - axis).Magnitude);
            Assert.True(radius > last);
            Assert.All(contour.Lines[0], vertex => Assert.Equal(radius, (vertex - axis).Magnitude, 1e-4 * radius));
            last = radius;
        }
    }

    [Fact]
    public void Uniform_flow_has_straight_lines_across_it()
    {
        HeadContourMap map = Maps["uniform"];
        Complex along = Complex.FromPolarCoordinates(1, Near.Direction);
        foreach (HeadContour contour in map.Contours)
        {
            ImmutableArray<Complex> line = Assert.Single(contour.Lines);
            double distance = (Near.Head - contour.Head) / Near.Gradient;
            Assert.All(line, vertex => Assert.Equal(
                distance, ((vertex - Near.HeadAt) / along).Real, OnLevel / Near.Gradient));
        }
    }

    [Fact]
    public void No_line_enters_the_dry_part()
    {
        FlowField field = All["water table"];
        Assert.True(double.IsNaN(field.HeadAt(new Complex(990, -740))));
        HeadContourMap map = Maps["water table"];
        Assert.All(map.Contours, contour => Assert.True(contour.Head > field.Parameters.Aquifer.Base));
        Assert.All(map.Contours.SelectMany(c => c.Lines).SelectMany(l => l), at => Assert.False(double.IsNaN(field.HeadAt(at))));
    }

    [Theory]
    [InlineData(1)]
    [InlineData(0.3048)]
    public void Heads_are_whole_multiples_of_a_round_interval_of_the_unit(double unit)
    {
        foreach (FlowField field in All.Values)
        {
            HeadContourMap map = HeadContours.Find(field, Frame, unit);
            double interval = map.Interval / unit, decade = Math.Pow(10, Math.Floor(Math.Log10(interval * 1.0001)));
            Assert.Contains(Math.Round(interval / decade, 9), new[] { 1.0, 2, 5 });
            Assert.All(map.Contours, contour =>
                Assert.Equal(Math.Round(contour.Head / map.Interval), contour.Head / map.Interval, 1e-9));
            Assert.Equal(map.Contours.Select(contour => contour.Head).Order(), map.Contours.Select(contour => contour.Head));
        }
    }

    [Fact]
    public void Still_water_a_dry_aquifer_and_an_empty_frame_have_no_contours()
    {
        Aquifer table = Superposed.Confined with { Top = null };
        FlowField dry = Superposed.Field(table, Superposed.Regional with { Head = 213, HeadAt = new Complex(-90_000, 0) });
        foreach (HeadContourMap map in new[]
        {
            HeadContours.Find(Superposed.Field(Superposed.Confined, Still), Frame, 1),
            HeadContours.Find(dry, Frame, 1),
            HeadContours.Find(All["uniform"], new Envelope(), 1),
        })
        {
            Assert.Empty(map.Contours);
            Assert.Equal(0, map.Interval);
        }
    }

    /// <summary>Nodes of the grid fall on the well's axis and into its screen.</summary>
    [Fact]
    public void A_screen_as_wide_as_cells_leaves_no_hole()
    {
        Element caisson = Superposed.Well(0, 0, 400, radius: 30);
        HeadContourMap map = HeadContours.Find(Superposed.Field(Superposed.Confined, Still, caisson), Frame, 1);
        Assert.NotEmpty(map.Contours);
        Assert.All(map.Contours.SelectMany(c => c.Lines).SelectMany(l => l), at => Assert.InRange(at.Magnitude, 30 * 0.999, 1e4));
        Assert.All(map.Contours.SelectMany(c => c.Lines), line => Assert.True(line[0] == line[^1] || (AtFrame(line[0]) && AtFrame(line[^1]))));
    }

    private static bool AtFrame(Complex at) =>
        Math.Min(
            Math.Min(at.Real - Frame.MinX, Frame.MaxX - at.Real),
            Math.Min(at.Imaginary - Frame.MinY, Frame.MaxY - at.Imaginary)) < 1e-9;
}

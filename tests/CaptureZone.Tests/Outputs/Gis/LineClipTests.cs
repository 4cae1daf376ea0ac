using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Outputs.Gis;
using FsCheck.Xunit;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Outputs.Gis;

public sealed class LineClipTests
{
    private static readonly Envelope Frame = new(0, 10, 0, 10);

    [Fact]
    public void A_line_inside_stays_as_it_is() =>
        Assert.Equal("MULTILINESTRING ((1 1, 5 9, 10 10))", Clip([new(1, 1), new(5, 9), new(10, 10)]));

    [Fact]
    public void A_line_that_leaves_and_comes_back_gives_its_parts_in_order() => Assert.Equal(
        "MULTILINESTRING ((5 5, 10 5), (10 7, 5 7))", Clip([new(5, 5), new(12, 5), new(12, 7), new(5, 7)]));

    [Fact]
    public void A_segment_that_crosses_the_frame_gives_its_middle() =>
        Assert.Equal("MULTILINESTRING ((0 5, 10 5))", Clip([new(-3, 5), new(14, 5)]));

    [Fact]
    public void A_line_outside_gives_nothing() =>
        Assert.Equal("MULTILINESTRING EMPTY", Clip([new(-1, -1), new(-1, 20), new(20, 20)]));

    [Fact]
    public void A_line_that_touches_a_corner_gives_nothing() =>
        Assert.Equal("MULTILINESTRING EMPTY", Clip([new(-4, 4), new(4, -4)]));

    [Property(Replay = Draws.Seed)]
    public void The_parts_have_the_length_that_an_overlay_finds(int seed)
    {
        Random random = new(seed);
        ImmutableArray<Complex> line =
        [
            .. Enumerable.Range(0, 12).Select(_ => new Complex(30 * random.NextDouble() - 10, 30 * random.NextDouble() - 10)),
        ];
        GeometryFactory factory = new();
        double expected = line.Zip(line.Skip(1), (a, b) =>
            factory.CreateLineString([new(a.Real, a.Imaginary), new(b.Real, b.Imaginary)]).Intersection(factory.ToGeometry(Frame)).Length).Sum();
        Geometry clipped = LineClip.Clip(line, Frame);
        Assert.Equal(expected, clipped.Length, 1e-9);
        Envelope slightlyLarger = Frame.Copy();
        slightlyLarger.ExpandBy(1e-12);
        Assert.All(clipped.Coordinates, at => Assert.True(slightlyLarger.Contains(at)));
    }

    private static string Clip(ImmutableArray<Complex> line) => LineClip.Clip(line, Frame).ToText();
}

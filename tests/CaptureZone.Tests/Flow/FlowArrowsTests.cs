using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Flow;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Flow;

public sealed class FlowArrowsTests
{
    [Fact]
    public void Arrows_stand_on_squares_over_the_frame_and_tell_the_discharge_there()
    {
        FlowField field = Superposed.Field(Superposed.Confined, Superposed.Regional, Superposed.Wells(3, seed: 8));
        ImmutableArray<FlowArrow> arrows = FlowArrows.Sample(field, new Envelope(-400, 400, -300, 300), across: 8);
        Assert.Equal(8 * 6, arrows.Length);
        Assert.Equal(new Complex(-350, -250), arrows[0].At);
        Assert.Equal(new Complex(350, 250), arrows[^1].At);
        Assert.All(arrows, arrow => Assert.Equal(field.DischargeAt(arrow.At), arrow.Discharge));
    }

    [Fact]
    public void Arrows_leave_out_the_dry_part()
    {
        FlowField field = Superposed.Field(
            Superposed.Confined with { Top = null }, Superposed.Regional with { Head = 215, HeadAt = new Complex(-300, 0), Gradient = 0.004 });
        ImmutableArray<FlowArrow> arrows = FlowArrows.Sample(field, new Envelope(-400, 400, -300, 300), across: 8);
        Assert.InRange(arrows.Length, 1, 47);
        Assert.All(arrows, arrow => Assert.False(double.IsNaN(field.HeadAt(arrow.At))));
    }

    [Fact]
    public void Arrows_leave_out_the_inside_of_a_screen()
    {
        FlowField field = Superposed.Field(Superposed.Confined, Superposed.Regional, Superposed.Well(-350, -250, 20));
        ImmutableArray<FlowArrow> arrows = FlowArrows.Sample(field, new Envelope(-400, 400, -300, 300), across: 8);
        Assert.Equal(8 * 6 - 1, arrows.Length);
        Assert.DoesNotContain(arrows, arrow => arrow.At == new Complex(-350, -250));
    }

    [Fact]
    public void An_empty_frame_has_no_arrows() =>
        Assert.Empty(FlowArrows.Sample(Superposed.Field(Superposed.Confined, Superposed.Regional), new Envelope(), across: 8));
}

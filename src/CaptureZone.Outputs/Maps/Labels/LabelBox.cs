using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>A rectangle on the sheet, turned by an angle.</summary>
/// <param name="Centre">Its centre.</param>
/// <param name="HalfWidth">Half of its width.</param>
/// <param name="HalfHeight">Half of its height.</param>
/// <param name="Angle">Degrees clockwise.</param>
internal readonly record struct LabelBox(SKPoint Centre, float HalfWidth, float HalfHeight, float Angle)
{
    private SKPoint Along { get; } = Shape.Polar(1, Angle * MathF.PI / 180);

    private SKPoint Across => new(-Along.Y, Along.X);

    /// <summary>A thin box along a line.</summary>
    /// <param name="from">One end.</param>
    /// <param name="to">The other.</param>
    /// <param name="width">Its width.</param>
    public static LabelBox Around(SKPoint from, SKPoint to, float width)
    {
        SKPoint way = to - from;
        return new(
            new((from.X + to.X) / 2, (from.Y + to.Y) / 2), way.Length / 2, width / 2, MathF.Atan2(way.Y, way.X) * 180 / MathF.PI);
    }

    /// <summary>The box with a rim round it.</summary>
    /// <param name="rim">Width of the rim.</param>
    public LabelBox Grown(float rim) => this with { HalfWidth = HalfWidth + rim, HalfHeight = HalfHeight + rim };

    /// <summary>Whether two boxes share a place: they do when no line along a side of either parts them.</summary>
    /// <param name="other">The other.</param>
    public bool Meets(in LabelBox other)
    {
        float reach = HalfWidth + HalfHeight + other.HalfWidth + other.HalfHeight;
        SKPoint apart = other.Centre - Centre;
        return MathF.Abs(apart.X) < reach && MathF.Abs(apart.Y) < reach
            && !Parts(Along, other) && !Parts(Across, other) && !Parts(other.Along, other) && !Parts(other.Across, other);
    }

    /// <summary>Whether all of it lies within an upright rectangle.</summary>
    /// <param name="area">The rectangle.</param>
    public bool Within(SKRect area)
    {
        float x = Reach(new(1, 0)), y = Reach(new(0, 1));
        return Centre.X - x >= area.Left && Centre.X + x <= area.Right && Centre.Y - y >= area.Top && Centre.Y + y <= area.Bottom;
    }

    /// <summary>The place in an upright box that is nearest to a point.</summary>
    /// <param name="to">The point.</param>
    public SKPoint Nearest(SKPoint to) => new(
        Math.Clamp(to.X, Centre.X - HalfWidth, Centre.X + HalfWidth), Math.Clamp(to.Y, Centre.Y - HalfHeight, Centre.Y + HalfHeight));

    private static float Dot(SKPoint a, SKPoint b) => a.X * b.X + a.Y * b.Y;

    private float Reach(SKPoint way) => HalfWidth * MathF.Abs(Dot(Along, way)) + HalfHeight * MathF.Abs(Dot(Across, way));

    private bool Parts(SKPoint way, in LabelBox other) =>
        MathF.Abs(Dot(other.Centre - Centre, way)) >= Reach(way) + other.Reach(way);
}

using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>A line on the sheet.</summary>
/// <param name="Points">Its vertices.</param>
/// <param name="Closed">Whether it returns to its first vertex.</param>
internal readonly record struct Trace(IReadOnlyList<SKPoint> Points, bool Closed);

/// <summary>Lines on the sheet that are drawn as one; filled, a place is inside when it lies within an odd number of them.</summary>
/// <param name="Traces">The lines.</param>
internal sealed record Shape(IReadOnlyList<Trace> Traces)
{
    /// <summary>Sides of the polygon that stands for a circle: at the sizes of symbols the difference is below 0.1.</summary>
    private const int CircleSides = 36;

    /// <summary>An open line.</summary>
    /// <param name="points">Its vertices.</param>
    public static Shape Line(params SKPoint[] points) => new([new Trace(points, false)]);

    /// <summary>A closed line.</summary>
    /// <param name="points">Its vertices.</param>
    public static Shape Polygon(params SKPoint[] points) => new([new Trace(points, true)]);

    /// <summary>A rectangle.</summary>
    /// <param name="area">The rectangle.</param>
    public static Shape Rectangle(SKRect area) => Polygon(
        new(area.Left, area.Top), new(area.Right, area.Top), new(area.Right, area.Bottom), new(area.Left, area.Bottom));

    /// <summary>An upright square.</summary>
    /// <param name="centre">Its centre.</param>
    /// <param name="halfSide">Half of its side.</param>
    public static Shape Square(SKPoint centre, float halfSide) =>
        Rectangle(new(centre.X - halfSide, centre.Y - halfSide, centre.X + halfSide, centre.Y + halfSide));

    /// <summary>A circle.</summary>
    /// <param name="centre">Its centre.</param>
    /// <param name="radius">Its radius.</param>
    public static Shape Circle(SKPoint centre, float radius) => Polygon(
        [.. Enumerable.Range(0, CircleSides).Select(i => centre + Polar(radius, i * MathF.Tau / CircleSides))]);

    /// <summary>A vector from length and angle.</summary>
    /// <param name="length">Its length.</param>
    /// <param name="angle">Its angle, radians from right toward down.</param>
    public static SKPoint Polar(float length, float angle) => new(length * MathF.Cos(angle), length * MathF.Sin(angle));

    /// <summary>Lines at 45 degrees, rising to the right, over a rectangle.</summary>
    /// <param name="over">The rectangle.</param>
    /// <param name="spacing">Distance between the lines.</param>
    public static Shape Hatch(SKRect over, float spacing)
    {
        float step = spacing * MathF.Sqrt(2);
        int count = (int)((over.Width + over.Height) / step) + 1;
        return new(
        [
            .. Enumerable.Range(0, count).Select(i => over.Left + i * step).Select(x =>
                new Trace([new(x - over.Height, over.Bottom), new(x, over.Top)], false)),
        ]);
    }

    /// <summary>Thin boxes along its lines.</summary>
    /// <param name="width">Width of the boxes.</param>
    public IEnumerable<LabelBox> Boxes(float width) => Traces.SelectMany(trace =>
        trace.Points.Zip(trace.Points.Skip(1), (from, to) => LabelBox.Around(from, to, width)));

    /// <summary>The smallest rectangle round it.</summary>
    public SKRect Bounds
    {
        get
        {
            SKRect bounds = SKRect.Empty;
            foreach (SKPoint p in Traces.SelectMany(trace => trace.Points))
            {
                SKRect point = new(p.X, p.Y, p.X, p.Y);
                bounds = bounds == SKRect.Empty
                    ? point
                    : new(
                        MathF.Min(bounds.Left, p.X),
                        MathF.Min(bounds.Top, p.Y),
                        MathF.Max(bounds.Right, p.X),
                        MathF.Max(bounds.Bottom, p.Y));
            }

            return bounds;
        }
    }
}

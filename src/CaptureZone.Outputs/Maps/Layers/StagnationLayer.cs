using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Stagnation points as upright crosses.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class StagnationLayer(MapScene scene) : IMapLayer
{
    private const float Arm = 16;
    private const float Width = 6;
    private const float Rim = 12;

    /// <inheritdoc/>
    public string Name => "stagnation-points";

    private IEnumerable<SKPoint> Shown =>
        scene.Answers.StagnationPoints.Where(point => scene.View.Shows(point.At)).Select(point => scene.View.At(point.At));

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => Shown.Any()
        ? [new("Stagnation point", (canvas, area) => Draw(canvas, new SKPoint(area.MidX, area.MidY)))]
        : [];

    /// <inheritdoc/>
    public IEnumerable<LabelBox> Symbols => Shown.Select(at => new LabelBox(at, Arm, Arm, 0));

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach (SKPoint at in Shown)
        {
            Draw(canvas, at);
        }
    }

    private static void Draw(IMapCanvas canvas, SKPoint at)
    {
        Shape cross = new(
        [
            new Trace([new(at.X - Arm, at.Y), new(at.X + Arm, at.Y)], false),
            new Trace([new(at.X, at.Y - Arm), new(at.X, at.Y + Arm)], false),
        ]);
        canvas.Stroke(cross, new Pen(Look.Paper, Rim));
        canvas.Stroke(cross, new Pen(Look.Ink, Width));
    }
}

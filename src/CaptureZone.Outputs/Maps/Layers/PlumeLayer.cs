using CaptureZone.Zones;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Plumes, hatched, with their names.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class PlumeLayer(MapScene scene) : IMapLayer
{
    /// <summary>From the outline to a name beside it, units of the sheet.</summary>
    private const float Clearance = 14;

    private static readonly TextStyle NameStyle = new(Look.NameSize, Look.Plume, Bold: true, Halo: true);

    /// <inheritdoc/>
    public string Name => "plumes";

    private IEnumerable<Plume> Shown => scene.Answers.Questions.Plumes
        .Where(plume => plume.Outline.EnvelopeInternal.Intersects(scene.View.Frame));

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => Shown.Any()
        ? [new("Plume", (canvas, area) => Draw(canvas, Shape.Rectangle(area), Shape.Rectangle(area)))]
        : [];

    /// <inheritdoc/>
    public IEnumerable<LabelRequest> Labels => Shown.Select(plume =>
    {
        LabelBlock block = LabelBlock.Of(plume.Name, NameStyle);
        return new LabelRequest(block, Spots(plume, block));
    });

    /// <summary>Their outlines, as thin boxes.</summary>
    public IEnumerable<LabelBox> HeavyLines =>
        Shown.SelectMany(plume => scene.View.Lines(plume.Outline).Boxes(Look.PlumePen.Width));

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach (Plume plume in Shown)
        {
            Draw(canvas, scene.View.Inside(plume.Outline), scene.View.Lines(plume.Outline));
        }
    }

    private static void Draw(IMapCanvas canvas, Shape inside, Shape edge)
    {
        if (inside.Traces.Count > 0)
        {
            canvas.Clipped(inside, () => canvas.Stroke(Shape.Hatch(inside.Bounds, Look.HatchSpacing), Look.HatchPen));
            canvas.Stroke(edge, Look.PlumePen);
        }
    }

    /// <summary>Beside the plume's four sides, then round its middle.</summary>
    private IEnumerable<LabelSpot> Spots(Plume plume, LabelBlock block)
    {
        Geometry shown = plume.Outline.Intersection(plume.Outline.Factory.ToGeometry(scene.View.Frame));
        SKPoint middle = scene.View.At(shown.InteriorPoint.Coordinate);
        SKRect box = scene.View.Inside(plume.Outline).Bounds;
        float x = Clearance + block.HalfWidth, y = Clearance + block.HalfHeight;
        return
        [
            new(new(box.MidX, box.Top - y)), new(new(box.MidX, box.Bottom + y)),
            new(new(box.Left - x, box.MidY)), new(new(box.Right + x, box.MidY)),
            .. LabelSpots.Around(middle, Clearance, block),
        ];
    }
}

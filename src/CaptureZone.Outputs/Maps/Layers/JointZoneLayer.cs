namespace CaptureZone.Outputs.Maps;

/// <summary>The joint zone of all containment wells: the answer of the map, so its edge is the heaviest line.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class JointZoneLayer(MapScene scene) : IMapLayer
{
    private readonly Shape _inside = scene.View.Inside(scene.Answers.ContainmentZone);
    private readonly Shape _edge = scene.View.Lines(scene.Answers.ContainmentZone);

    /// <inheritdoc/>
    public string Name => "containment-zone";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => _edge.Traces.Count == 0
        ? []
        : [new("Joint zone of all containment wells", (canvas, area) => Draw(canvas, Shape.Rectangle(area), Shape.Rectangle(area)))];

    /// <summary>Its edge, as thin boxes.</summary>
    public IEnumerable<LabelBox> HeavyLines => _edge.Boxes(Look.JointPen.Width);

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas) => Draw(canvas, _inside, _edge);

    private static void Draw(IMapCanvas canvas, Shape inside, Shape edge)
    {
        if (inside.Traces.Count > 0)
        {
            canvas.Clipped(inside, () => canvas.Stroke(edge, Look.GlowPen));
            canvas.Stroke(edge, Look.JointPen);
        }
    }
}

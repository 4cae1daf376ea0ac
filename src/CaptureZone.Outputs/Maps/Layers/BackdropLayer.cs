using CaptureZone.Sites;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>What is drawn and never computed with: property lines, roads, receptors.</summary>
internal sealed class BackdropLayer : IMapLayer
{
    /// <summary>Half of the side of a point's square, units of the sheet.</summary>
    private const float HalfSquare = 9;

    /// <summary>From a point or line to a name beside it, units of the sheet.</summary>
    private const float Clearance = 16;

    private static readonly TextStyle NameStyle = new(Look.SmallSize, Look.SoftInk, Halo: true);

    private readonly PlanView _view;
    private readonly List<(string Name, Shape Lines, IReadOnlyList<SKPoint> Points)> _items = [];

    /// <summary>Takes what is in the frame.</summary>
    /// <param name="scene">What is drawn.</param>
    public BackdropLayer(MapScene scene)
    {
        _view = scene.View;
        foreach (Backdrop backdrop in scene.Report.Site.Backdrops)
        {
            Shape lines = backdrop.Shape is IPuntal ? new([]) : _view.Lines(backdrop.Shape);
            List<SKPoint> points = backdrop.Shape is IPuntal
                ? [.. backdrop.Shape.Coordinates.Where(at => _view.Frame.Contains(at)).Select(_view.At)]
                : [];
            if (lines.Traces.Count + points.Count > 0)
            {
                _items.Add((backdrop.Name, lines, points));
            }
        }
    }

    /// <inheritdoc/>
    public string Name => "backdrop";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => _items.Count == 0
        ? []
        : [LegendItem.Line("Named on the plan: drawn only, no part of the calculation", Look.BackdropPen)];

    /// <inheritdoc/>
    public IEnumerable<LabelBox> Symbols =>
        _items.SelectMany(item => item.Points).Select(at => new LabelBox(at, HalfSquare, HalfSquare, 0));

    /// <inheritdoc/>
    public IEnumerable<LabelRequest> Labels
    {
        get
        {
            foreach ((string name, Shape lines, IReadOnlyList<SKPoint> points) in _items)
            {
                LabelBlock block = LabelBlock.Of(name, NameStyle);
                yield return new LabelRequest(
                    block,
                    lines.Traces.SelectMany(trace => OnLine(trace, block))
                        .Concat(points.SelectMany(at => LabelSpots.Around(at, Clearance, block))));
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((_, Shape lines, IReadOnlyList<SKPoint> points) in _items)
        {
            canvas.Stroke(lines, Look.BackdropPen);
            foreach (SKPoint at in points)
            {
                canvas.Fill(Shape.Square(at, HalfSquare), Look.Backdrop);
            }
        }
    }

    /// <summary>On the line, away from the middle of the plan where the answers are; else beside its middle with a leader.</summary>
    private IEnumerable<LabelSpot> OnLine(Trace trace, LabelBlock block)
    {
        SKPoint middle = new(_view.Area.MidX, _view.Area.MidY);
        return LabelSpots.Along(trace.Points, block, at => -SKPoint.Distance(at, middle))
            .Concat(LabelSpots.Around(LabelSpots.PointAt(trace.Points, LabelSpots.Length(trace.Points) / 2), Clearance, block));
    }
}

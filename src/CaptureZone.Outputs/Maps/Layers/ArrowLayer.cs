using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Flow arrows, thinned to an even pattern, left out where labels and symbols stand.</summary>
internal sealed class ArrowLayer : IMapLayer
{
    /// <summary>Arrows are at least this far apart, units of the sheet.</summary>
    private const float Spacing = 150;

    /// <summary>Grid lines of the engine that are nearer than this are one, m: far below any grid, far above rounding.</summary>
    private const double SameLine = 1e-6;

    private const float HeadLength = 17;
    private const float HeadHalfWidth = 8;

    private readonly List<(SKPoint Tail, SKPoint Tip)> _arrows = [];

    /// <summary>Chooses arrows.</summary>
    /// <param name="scene">What is drawn.</param>
    /// <param name="taken">Where none may be.</param>
    public ArrowLayer(MapScene scene, IReadOnlyList<LabelBox> taken)
    {
        HashSet<double> columns = Thinned(scene, arrow => arrow.At.Real), rows = Thinned(scene, arrow => arrow.At.Imaginary);
        FlowArrow[] chosen =
        [
            .. scene.Answers.Arrows.Where(arrow => columns.Contains(Rounded(arrow.At.Real)) && rows.Contains(Rounded(arrow.At.Imaginary))
                && arrow.Discharge.Magnitude > 0),
        ];
        double usual = chosen.Length == 0 ? 1 : chosen.Select(arrow => arrow.Discharge.Magnitude).Order().ElementAt(chosen.Length / 2);
        foreach (FlowArrow arrow in chosen)
        {
            float length = Length(arrow.Discharge.Magnitude / usual);
            SKPoint middle = scene.View.At(arrow.At), half = Shape.Polar(length / 2, -(float)arrow.Discharge.Phase);
            LabelBox box = LabelBox.Around(middle - half, middle + half, 2 * HeadHalfWidth);
            if (box.Within(scene.View.Area) && !taken.Any(other => box.Meets(other)))
            {
                _arrows.Add((middle - half, middle + half));
            }
        }
    }

    /// <inheritdoc/>
    public string Name => "flow-arrows";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend => _arrows.Count == 0
        ? []
        :
        [
            new("Direction of flow, longer where it is stronger", (canvas, area) =>
                Draw(canvas, new(area.Left, area.MidY), new(area.Right, area.MidY))),
        ];

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((SKPoint tail, SKPoint tip) in _arrows)
        {
            Draw(canvas, tail, tip);
        }
    }

    /// <summary>
    /// Grows with the square root, so that flow near a well does not dwarf all other; the usual strength lies a third up.
    /// </summary>
    private static float Length(double strength) =>
        Math.Clamp((float)Math.Sqrt(strength) * (2 * Look.ShortestArrow + Look.LongestArrow) / 3, Look.ShortestArrow, Look.LongestArrow);

    private static double Rounded(double at) => Math.Round(at / SameLine);

    /// <summary>Grid lines of the engine's grid that are far enough apart on the sheet.</summary>
    private static HashSet<double> Thinned(MapScene scene, Func<FlowArrow, double> at)
    {
        double[] lines = [.. scene.Answers.Arrows.Select(arrow => Rounded(at(arrow))).Distinct().Order()];
        double step = lines.Length < 2 ? 1 : (lines[^1] - lines[0]) / (lines.Length - 1) * SameLine * scene.View.Scale;
        int every = Math.Max(1, (int)Math.Ceiling(Spacing / step));
        int first = (lines.Length - 1) % every / 2;
        return [.. lines.Where((_, i) => i >= first && (i - first) % every == 0)];
    }

    private static void Draw(IMapCanvas canvas, SKPoint tail, SKPoint tip)
    {
        SKPoint way = tip - tail;
        SKPoint along = new(way.X / way.Length, way.Y / way.Length), across = new(-along.Y, along.X);
        SKPoint neck = tip - new SKPoint(HeadLength * along.X, HeadLength * along.Y);
        SKPoint side = new(HeadHalfWidth * across.X, HeadHalfWidth * across.Y);
        canvas.Stroke(Shape.Line(tail, neck), Look.ArrowPen);
        canvas.Fill(Shape.Polygon(tip, neck + side, neck - side), Look.Arrow);
    }
}

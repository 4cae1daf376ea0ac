using System.Collections.Immutable;
using System.Globalization;
using CaptureZone.Sites;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Lines of equal predicted head with their values.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class ContourLayer(MapScene scene) : IMapLayer
{
    /// <summary>Each fifth line is heavier (common practice, no source).</summary>
    private const int IndexEvery = 5;

    /// <summary>One value on each such length of line, units of the sheet.</summary>
    private const float LabelEvery = 1300;

    private const int MostDecimals = 4;

    /// <summary>For an interval that no number of decimals gives exactly.</summary>
    private const int UsualDecimals = 2;

    /// <summary>A line is at a round multiple of the interval when it is nearer than this share of it.</summary>
    private const double Nearly = 1e-6;

    private static readonly TextStyle ValueStyle = new(Look.SmallSize, Look.Head, Halo: true);

    private readonly ImmutableArray<(double Head, Shape Lines)> _contours =
    [
        .. scene.Answers.Contours.Select(contour => (
            scene.Print.In(QuantityKind.Length, contour.Head),
            new Shape([.. contour.Lines.SelectMany(line => scene.View.Line(line).Traces)]))),
    ];

    private readonly double _interval = scene.Print.In(QuantityKind.Length, scene.Answers.ContourInterval);

    /// <inheritdoc/>
    public string Name => "head-contours";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend
    {
        get
        {
            string unit = scene.Print.Unit(QuantityKind.Length);
            return _contours.Length == 0
                ? []
                : [LegendItem.Line($"Predicted head, elevation in {unit}; interval {Text(_interval)} {unit}", Look.HeadPen)];
        }
    }

    /// <inheritdoc/>
    public IEnumerable<LabelRequest> Labels
    {
        get
        {
            foreach ((double head, Shape lines) in _contours)
            {
                LabelBlock block = LabelBlock.Of(Text(head), ValueStyle);
                foreach (IReadOnlyList<SKPoint> part in lines.Traces.SelectMany(trace => Stretches(trace.Points)))
                {
                    SKPoint middle = LabelSpots.PointAt(part, LabelSpots.Length(part) / 2);
                    yield return new LabelRequest(
                        block, LabelSpots.Along(part, block, at => SKPoint.Distance(at, middle)), Optional: true);
                }
            }
        }
    }

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((double head, Shape lines) in _contours)
        {
            double order = head / (IndexEvery * _interval);
            bool index = Math.Abs(order - Math.Round(order)) < Nearly * Math.Max(1, Math.Abs(order));
            canvas.Stroke(lines, index ? Look.IndexHeadPen : Look.HeadPen);
        }
    }

    private static IEnumerable<IReadOnlyList<SKPoint>> Stretches(IReadOnlyList<SKPoint> line)
    {
        float length = LabelSpots.Length(line);
        int count = Math.Max(1, (int)MathF.Round(length / LabelEvery));
        return Enumerable.Range(0, count).Select(i => LabelSpots.Part(line, i * length / count, (i + 1) * length / count));
    }

    /// <summary>As many decimals as the interval has.</summary>
    private string Text(double value)
    {
        int decimals = Enumerable.Range(0, MostDecimals + 1).FirstOrDefault(IsEnough, UsualDecimals);
        return value.ToString(string.Create(CultureInfo.InvariantCulture, $"F{decimals}"), CultureInfo.InvariantCulture);
    }

    private bool IsEnough(int decimals)
    {
        double scaled = _interval * Math.Pow(10, decimals);
        return Math.Abs(scaled - Math.Round(scaled)) < Nearly * scaled;
    }
}

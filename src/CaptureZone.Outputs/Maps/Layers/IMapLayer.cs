using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>One kind of thing on the plan: how it is drawn, named and explained.</summary>
internal interface IMapLayer
{
    /// <summary>Its name in files that have layers: lower case, words joined by hyphens.</summary>
    string Name { get; }

    /// <summary>Its lines of the legend; none when it draws nothing.</summary>
    IEnumerable<LegendItem> Legend => [];

    /// <summary>What labels may not cover.</summary>
    IEnumerable<LabelBox> Symbols => [];

    /// <summary>Its labels, most important first.</summary>
    IEnumerable<LabelRequest> Labels => [];

    /// <summary>Draws it, without labels.</summary>
    /// <param name="canvas">Where to.</param>
    void Draw(IMapCanvas canvas);
}

/// <summary>One line of the legend.</summary>
/// <param name="Text">What it is.</param>
/// <param name="Draw">Draws the sample into a rectangle.</param>
internal sealed record LegendItem(string Text, Action<IMapCanvas, SKRect> Draw)
{
    /// <summary>A legend line with a line as its sample.</summary>
    /// <param name="text">What it is.</param>
    /// <param name="pen">How it is drawn.</param>
    public static LegendItem Line(string text, Pen pen) => new(text, (canvas, area) =>
        canvas.Stroke(Shape.Line(new(area.Left, area.MidY), new(area.Right, area.MidY)), pen));
}

using System.Collections.Immutable;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>A piece of the panel beside or below the plan.</summary>
/// <param name="Height">Its height, units of the sheet.</param>
/// <param name="Draw">Draws it with its upper left corner at a place.</param>
internal sealed record PanelBlock(float Height, Action<IMapCanvas, SKPoint> Draw)
{
    private const float SampleWidth = 96;
    private const float SampleHeight = 34;
    private const float SampleGap = 24;
    private const float ItemGap = 14;

    private static readonly TextStyle BodyStyle = new(Look.BodySize, Look.Ink);
    private static readonly TextStyle HeadStyle = new(Look.HeadSize, Look.Ink, Bold: true);

    private static float LineHeight => Look.BodySize * Lettering.LineHeight;

    /// <summary>A heading.</summary>
    /// <param name="text">What it says.</param>
    public static PanelBlock Heading(string text)
    {
        float height = Look.HeadSize * Lettering.LineHeight;
        return new(height + ItemGap, (canvas, at) => canvas.Write(MapText.From(text, at.X, at.Y + height / 2, HeadStyle)));
    }

    /// <summary>A line of the legend: sample and text.</summary>
    /// <param name="item">The line.</param>
    /// <param name="width">Width of the column.</param>
    public static PanelBlock Of(LegendItem item, float width)
    {
        ImmutableArray<string> lines = Lettering.Wrapped(item.Text, BodyStyle, width - SampleWidth - SampleGap);
        return new(lines.Length * LineHeight + ItemGap, (canvas, at) =>
        {
            float middle = at.Y + LineHeight / 2;
            item.Draw(canvas, SKRect.Create(at.X, middle - SampleHeight / 2, SampleWidth, SampleHeight));
            Write(canvas, lines, at.X + SampleWidth + SampleGap, at.Y);
        });
    }

    /// <summary>A note.</summary>
    /// <param name="text">What it says.</param>
    /// <param name="width">Width of the column.</param>
    public static PanelBlock Note(string text, float width)
    {
        ImmutableArray<string> lines = Lettering.Wrapped(text, BodyStyle, width);
        return new(lines.Length * LineHeight + ItemGap / 2, (canvas, at) => Write(canvas, lines, at.X, at.Y));
    }

    private static void Write(IMapCanvas canvas, ImmutableArray<string> lines, float x, float y)
    {
        for (int i = 0; i < lines.Length; i++)
        {
            canvas.Write(MapText.From(lines[i], x, y + (i + 0.5f) * LineHeight, BodyStyle));
        }
    }
}

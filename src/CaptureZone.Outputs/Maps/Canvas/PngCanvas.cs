using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Draws into pixels, one per unit of the sheet.</summary>
internal sealed class PngCanvas : IMapCanvas, IDisposable
{
    private readonly SKSurface _surface;

    /// <summary>Begins a blank sheet.</summary>
    /// <param name="width">Pixels.</param>
    /// <param name="height">Pixels.</param>
    public PngCanvas(int width, int height)
    {
        _surface = SKSurface.Create(new SKImageInfo(width, height, SKColorType.Rgba8888, SKAlphaType.Opaque));
        _surface.Canvas.Clear(Look.Paper);
    }

    private SKCanvas Canvas => _surface.Canvas;

    /// <summary>The picture as a PNG file.</summary>
    public byte[] ToFile()
    {
        using SKPixmap pixels = _surface.PeekPixels();
        return PngFile.Write(pixels.GetPixelSpan<byte>(), pixels.Width, pixels.Height);
    }

    /// <inheritdoc/>
    public void Dispose() => _surface.Dispose();

    /// <inheritdoc/>
    public void Layer(string name)
    {
        // Pixels have no layers.
    }

    /// <inheritdoc/>
    public void Fill(Shape shape, SKColor color)
    {
        using SKPath path = ToPath(shape);
        using SKPaint paint = new() { Color = color, IsAntialias = true };
        Canvas.DrawPath(path, paint);
    }

    /// <inheritdoc/>
    public void Stroke(Shape shape, Pen pen)
    {
        using SKPath path = ToPath(shape);
        using SKPaint paint = StrokePaint(pen.Color, pen.Width);
        using SKPathEffect? dash = pen.Dash.Length > 0 ? SKPathEffect.CreateDash(pen.Dash, 0) : null;
        paint.PathEffect = dash;
        Canvas.DrawPath(path, paint);
    }

    /// <inheritdoc/>
    public void Write(MapText text)
    {
        TextStyle style = text.Style;
        using SKFont font = Lettering.Font(style);
        float x = -Lettering.Width(text.Text, style) / 2, y = style.Size * Lettering.BaselineDrop;
        Canvas.Save();
        Canvas.Translate(text.Centre);
        Canvas.RotateDegrees(text.Angle);
        if (style.Halo)
        {
            using SKPaint halo = StrokePaint(Look.Paper, Look.HaloWidth);
            Canvas.DrawText(text.Text, x, y, font, halo);
        }

        using SKPaint paint = new() { Color = style.Color, IsAntialias = true };
        Canvas.DrawText(text.Text, x, y, font, paint);
        Canvas.Restore();
    }

    /// <inheritdoc/>
    public void Clipped(Shape within, Action draw)
    {
        using SKPath path = ToPath(within);
        Canvas.Save();
        Canvas.ClipPath(path, antialias: true);
        draw();
        Canvas.Restore();
    }

    private static SKPaint StrokePaint(SKColor color, float width) => new()
    {
        Color = color,
        IsAntialias = true,
        Style = SKPaintStyle.Stroke,
        StrokeWidth = width,
        StrokeJoin = SKStrokeJoin.Round,
    };

    private static SKPath ToPath(Shape shape)
    {
        SKPath path = new() { FillType = SKPathFillType.EvenOdd };
        foreach (Trace trace in shape.Traces)
        {
            path.AddPoly([.. trace.Points], trace.Closed);
        }

        return path;
    }
}

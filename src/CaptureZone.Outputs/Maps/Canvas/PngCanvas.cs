using System.Runtime.InteropServices;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Draws into pixels, one per unit of the sheet.</summary>
/// <param name="width">Pixels per row.</param>
/// <param name="height">Rows.</param>
internal sealed class PngCanvas(int width, int height) : IMapCanvas, IDisposable
{
    /// <summary>Rows that are in memory at a time: a whole sheet would take 29 MB, and most of the time to get hold of them.</summary>
    private const int BandHeight = 128;

    private readonly SKPictureRecorder _recorder = new();
    private SKCanvas? _canvas;

    private SKCanvas Canvas => _canvas ??= _recorder.BeginRecording(SKRect.Create(width, height), useRTree: true);

    /// <summary>The picture as a PNG file; nothing can be drawn after.</summary>
    public byte[] ToFile()
    {
        _ = Canvas;
        using SKPicture picture = _recorder.EndRecording();
        using SKBitmap band = new(new SKImageInfo(width, BandHeight, SKColorType.Rgba8888, SKAlphaType.Opaque));
        using SKCanvas pixels = new(band);
        PngFile file = new(width, height, Look.FlatColors);
        for (int top = 0; top < height; top += BandHeight)
        {
            pixels.ResetMatrix();
            pixels.Clear(Look.Paper);
            pixels.Translate(0, -top);
            pixels.DrawPicture(picture);
            file.Add(MemoryMarshal.Cast<byte, uint>(band.GetPixelSpan())[..(width * Math.Min(BandHeight, height - top))]);
        }

        return file.ToArray();
    }

    /// <inheritdoc/>
    public void Dispose() => _recorder.Dispose();

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

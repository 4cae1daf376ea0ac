using System.Globalization;
using System.Security;
using System.Text;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>
/// Draws into an SVG 1.1 document. Coordinates are whole tenths of the sheet's unit; a glyph is stored once as an outline and reused,
/// so that text shows on machines without the font.
/// </summary>
/// <param name="width">Width of the sheet.</param>
/// <param name="height">Height of the sheet.</param>
/// <param name="title">What the picture is.</param>
internal sealed class SvgCanvas(int width, int height, string title) : IMapCanvas
{
    /// <summary>Units of the document in one of the sheet.</summary>
    private const int Fineness = 10;

    private readonly StringBuilder _body = new();
    private readonly SortedDictionary<string, string> _glyphs = new(StringComparer.Ordinal);
    private int _clips;
    private bool _inLayer;

    /// <summary>The document as a file in UTF-8.</summary>
    public byte[] ToFile()
    {
        StringBuilder file = new();
        file.Append(
            CultureInfo.InvariantCulture,
            $"""
            <svg xmlns="http://www.w3.org/2000/svg" xmlns:xlink="http://www.w3.org/1999/xlink"
              width="{width}" height="{height}" viewBox="0 0 {Fineness * width} {Fineness * height}">
            <title>{SecurityElement.Escape(title)}</title>
            <defs>

            """);
        foreach ((string id, string outline) in _glyphs)
        {
            file.Append("<path id=\"").Append(id).Append("\" d=\"").Append(outline).Append("\"/>\n");
        }

        file.Append("</defs>\n<rect width=\"100%\" height=\"100%\" fill=\"").Append(Hex(Look.Paper)).Append("\"/>\n").Append(_body);
        file.Append(_inLayer ? "</g>\n</svg>\n" : "</svg>\n");
        return Encoding.UTF8.GetBytes(file.ToString());
    }

    /// <inheritdoc/>
    public void Layer(string name)
    {
        _body.Append(_inLayer ? "</g>\n" : "").Append("<g id=\"").Append(name).Append("\">\n");
        _inLayer = true;
    }

    /// <inheritdoc/>
    public void Fill(Shape shape, SKColor color)
    {
        if (shape.Traces.Count > 0)
        {
            _body.Append("<path").Append(Paint("fill", color)).Append(" fill-rule=\"evenodd\" d=\"").Append(Data(shape)).Append("\"/>\n");
        }
    }

    /// <inheritdoc/>
    public void Stroke(Shape shape, Pen pen)
    {
        if (shape.Traces.Count > 0)
        {
            _body.Append("<path fill=\"none\"").Append(Line(pen.Color, Fineness * pen.Width));
            if (pen.Dash.Length > 0)
            {
                _body.Append(" stroke-dasharray=\"").AppendJoin(' ', pen.Dash.Select(length => Round(length))).Append('"');
            }

            _body.Append(" d=\"").Append(Data(shape)).Append("\"/>\n");
        }
    }

    /// <inheritdoc/>
    public void Write(MapText text)
    {
        TextStyle style = text.Style;
        SKTypeface face = Lettering.Face(style.Bold);
        float scale = Fineness * style.Size / face.UnitsPerEm;
        float left = -Lettering.Width(text.Text, style) / 2, baseline = style.Size * Lettering.BaselineDrop;
        _body.Append(
            CultureInfo.InvariantCulture,
            $"<g aria-label=\"{SecurityElement.Escape(text.Text)}\" transform=\"translate({Round(text.Centre.X)} {Round(text.Centre.Y)})");
        _body.Append(text.Angle == 0 ? "" : string.Create(CultureInfo.InvariantCulture, $" rotate({text.Angle:0.##})"));
        _body.Append(CultureInfo.InvariantCulture, $" translate({Round(left)} {Round(baseline)}) scale({scale:0.####})\">\n");
        string glyphs = Glyphs(text.Text, style, face);
        if (style.Halo)
        {
            string halo = Line(Look.Paper, Fineness * Look.HaloWidth / scale);
            _body.Append("<g fill=\"none\"").Append(halo).Append('>').Append(glyphs).Append("</g>\n");
        }

        _body.Append("<g").Append(Paint("fill", style.Color)).Append('>').Append(glyphs).Append("</g>\n</g>\n");
    }

    /// <inheritdoc/>
    public void Clipped(Shape within, Action draw)
    {
        int id = ++_clips;
        _body.Append(CultureInfo.InvariantCulture, $"<clipPath id=\"c{id}\"><path clip-rule=\"evenodd\" d=\"");
        _body.Append(Data(within)).Append("\"/></clipPath>\n");
        _body.Append(CultureInfo.InvariantCulture, $"<g clip-path=\"url(#c{id})\">\n");
        draw();
        _body.Append("</g>\n");
    }

    private static string Paint(string what, SKColor color) => color.Alpha == byte.MaxValue
        ? $" {what}=\"{Hex(color)}\""
        : string.Create(CultureInfo.InvariantCulture, $" {what}=\"{Hex(color)}\" {what}-opacity=\"{color.Alpha / 255.0:0.##}\"");

    private static string Line(SKColor color, float width) =>
        Paint("stroke", color) + string.Create(CultureInfo.InvariantCulture, $" stroke-width=\"{width:0}\" stroke-linejoin=\"round\"");

    private static string Hex(SKColor color) =>
        string.Create(CultureInfo.InvariantCulture, $"#{color.Red:x2}{color.Green:x2}{color.Blue:x2}");

    private static int Round(float value) => (int)MathF.Round(Fineness * value);

    /// <summary>Path data: a place for the first vertex, steps for the others; whole numbers, so that nothing adds up.</summary>
    private static string Data(Shape shape)
    {
        StringBuilder data = new();
        foreach (Trace trace in shape.Traces)
        {
            int x = 0, y = 0;
            for (int i = 0; i < trace.Points.Count; i++)
            {
                int nextX = Round(trace.Points[i].X), nextY = Round(trace.Points[i].Y);
                data.Append(i switch { 0 => "M", 1 => "l", _ => " " });
                data.Append(CultureInfo.InvariantCulture, $"{nextX - x} {nextY - y}");
                (x, y) = (nextX, nextY);
            }

            data.Append(trace.Closed ? "z" : "");
        }

        return data.ToString();
    }

    private string Glyphs(string text, TextStyle style, SKTypeface face)
    {
        using SKFont font = Lettering.Font(style with { Size = face.UnitsPerEm });
        ushort[] glyphs = font.GetGlyphs(text);
        float[] widths = font.GetGlyphWidths(glyphs);
        StringBuilder uses = new();
        float x = 0;
        for (int i = 0; i < glyphs.Length; i++)
        {
            string id = string.Create(CultureInfo.InvariantCulture, $"{(style.Bold ? 'b' : 'r')}{glyphs[i]}");
            if (!_glyphs.TryGetValue(id, out string? outline))
            {
                using SKPath? path = font.GetGlyphPath(glyphs[i]);
                _glyphs[id] = outline = path?.ToSvgPathData() ?? "";
            }

            if (outline.Length > 0)
            {
                uses.Append(CultureInfo.InvariantCulture, $"<use xlink:href=\"#{id}\" x=\"{x:0}\"/>");
            }

            x += widths[i];
        }

        return uses.ToString();
    }
}

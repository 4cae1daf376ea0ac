using System.Buffers.Binary;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Wordprocessing;
using A = DocumentFormat.OpenXml.Drawing;
using Pic = DocumentFormat.OpenXml.Drawing.Pictures;
using W = DocumentFormat.OpenXml.Wordprocessing;
using Wp = DocumentFormat.OpenXml.Drawing.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>The picture of the Word memo.</summary>
internal static class WordFigure
{
    /// <summary>Office counts pictures in 914 400 to the inch: 635 to a twentieth of a point.</summary>
    private const long UnitsPerTwentieth = 635;

    /// <summary>The picture takes at most this share of a page's height, so that heading and caption stay with it.</summary>
    private const double LargestShareOfHeight = 0.85;

    /// <summary>The picture with its caption below it.</summary>
    /// <param name="figure">The figure.</param>
    /// <param name="png">The picture.</param>
    /// <param name="relationship">Its relationship in the document.</param>
    /// <param name="page">The page.</param>
    public static IEnumerable<OpenXmlElement> Of(Figure figure, byte[] png, string relationship, WordPage page)
    {
        (long width, long height) = Size(png, page);
        W.Paragraph caption = WordText.Caption("Figure", figure.Number, figure.Caption);
        caption.ParagraphProperties!.KeepNext = new() { Val = false };
        return [WordText.Paragraph(WordStyles.Picture, new Run(Drawing(figure, relationship, width, height))), caption];
    }

    /// <summary>As wide as the text, or as tall as is allowed.</summary>
    private static (long Width, long Height) Size(byte[] png, WordPage page)
    {
        (double wide, double high) = Pixels(png);
        double width = Math.Min(page.TextWidth, page.TextHeight * LargestShareOfHeight * wide / high);
        return ((long)width * UnitsPerTwentieth, (long)(width * high / wide) * UnitsPerTwentieth);
    }

    /// <summary>Width and height stand big-endian at bytes 16 and 20 of every PNG (PNG specification, IHDR).</summary>
    private static (int Wide, int High) Pixels(byte[] png) =>
        (BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(16)), BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(20)));

    private static Drawing Drawing(Figure figure, string relationship, long width, long height)
    {
        string description = PlainText.OnOneLine(figure.AlternativeText);
        Wp.Inline inline = new(
            new Wp.Extent { Cx = width, Cy = height },
            new Wp.DocProperties { Id = 1, Name = "Figure 1", Description = description },
            new A.Graphic(new A.GraphicData(Picture(figure.File, relationship, width, height))
            {
                Uri = "http://schemas.openxmlformats.org/drawingml/2006/picture",
            }))
        {
            DistanceFromTop = 0,
            DistanceFromBottom = 0,
            DistanceFromLeft = 0,
            DistanceFromRight = 0,
        };
        return new(inline);
    }

    private static Pic.Picture Picture(string name, string relationship, long width, long height) => new(
        new Pic.NonVisualPictureProperties(
            new Pic.NonVisualDrawingProperties { Id = 0, Name = name },
            new Pic.NonVisualPictureDrawingProperties()),
        new Pic.BlipFill(new A.Blip { Embed = relationship }, new A.Stretch(new A.FillRectangle())),
        new Pic.ShapeProperties(
            new A.Transform2D(new A.Offset { X = 0, Y = 0 }, new A.Extents { Cx = width, Cy = height }),
            new A.PresetGeometry(new A.AdjustValueList()) { Preset = A.ShapeTypeValues.Rectangle }));
}

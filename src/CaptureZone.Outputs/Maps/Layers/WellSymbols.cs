using CaptureZone.Elements.Wells;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>What a well's symbol tells.</summary>
internal enum WellSymbol
{
    /// <summary>Extracts to contain a plume.</summary>
    Containment,

    /// <summary>Extracts to supply water.</summary>
    Supply,

    /// <summary>Extracts for another purpose.</summary>
    Other,

    /// <summary>Injects.</summary>
    Injection,

    /// <summary>Neither extracts nor injects.</summary>
    Idle,
}

/// <summary>The symbols of wells; they differ in shape, not only in colour.</summary>
internal static class WellSymbols
{
    private const float Radius = Look.SymbolRadius;
    private const float LightCentre = 0.36f * Radius;
    private const float Line = 5;

    private static readonly Pen RimPen = new(Look.Paper, 12);
    private static readonly Pen OpenPen = new(Look.Ink, Line);

    /// <summary>The symbol of a well.</summary>
    /// <param name="well">The well.</param>
    public static WellSymbol Of(Well well) => well switch
    {
        { Rate: 0 } => WellSymbol.Idle,
        { Rate: < 0 } => WellSymbol.Injection,
        { Purpose: WellPurpose.Containment } => WellSymbol.Containment,
        { Purpose: WellPurpose.Supply } => WellSymbol.Supply,
        _ => WellSymbol.Other,
    };

    /// <summary>Draws a symbol.</summary>
    /// <param name="canvas">Where to.</param>
    /// <param name="symbol">Which.</param>
    /// <param name="at">Its middle.</param>
    public static void Draw(IMapCanvas canvas, WellSymbol symbol, SKPoint at)
    {
        Shape outline = Outline(symbol, at);
        canvas.Stroke(outline, RimPen);
        switch (symbol)
        {
            case WellSymbol.Containment:
                canvas.Fill(outline, Look.Containment);
                canvas.Fill(Shape.Circle(at, LightCentre), Look.Paper);
                break;
            case WellSymbol.Supply:
                canvas.Fill(outline, Look.Supply);
                canvas.Fill(Shape.Circle(at, LightCentre), Look.Paper);
                break;
            case WellSymbol.Idle:
                DrawOpen(canvas, outline);
                SKPoint across = Shape.Polar(Radius, -MathF.PI / 4);
                canvas.Stroke(Shape.Line(at - across, at + across), OpenPen);
                break;
            default:
                DrawOpen(canvas, outline);
                canvas.Fill(Shape.Circle(at, LightCentre), Look.Ink);
                break;
        }
    }

    private static Shape Outline(WellSymbol symbol, SKPoint at) => symbol switch
    {
        WellSymbol.Supply => Shape.Square(at, 0.9f * Radius),
        WellSymbol.Injection => Shape.Polygon(
            new(at.X, at.Y - 1.3f * Radius),
            new(at.X + 1.2f * Radius, at.Y + 0.85f * Radius),
            new(at.X - 1.2f * Radius, at.Y + 0.85f * Radius)),
        WellSymbol.Idle => Shape.Circle(at, 0.7f * Radius),
        _ => Shape.Circle(at, Radius),
    };

    private static void DrawOpen(IMapCanvas canvas, Shape outline)
    {
        canvas.Fill(outline, Look.Paper);
        canvas.Stroke(outline, OpenPen);
    }
}

using System.Globalization;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Grid north, and scale bars in metres and feet.</summary>
internal static class ScaleBlock
{
    private const double Foot = 0.3048;
    private const float Height = 216;
    private const float NorthWidth = 170;
    private const float BarHeight = 16;
    private const int BarParts = 4;

    /// <summary>Room for the number behind a bar, units of the sheet.</summary>
    private const float NumberRoom = 90;

    private static readonly TextStyle NumberStyle = new(Look.SmallSize, Look.Ink);
    private static readonly TextStyle NorthStyle = new(Look.HeadSize, Look.Ink, Bold: true);

    /// <summary>The block.</summary>
    /// <param name="view">Gives the scale.</param>
    /// <param name="width">Width of the column.</param>
    public static PanelBlock Of(PlanView view, float width) => new(Height, (canvas, at) =>
    {
        DrawNorth(canvas, new(at.X + NorthWidth / 2 - 20, at.Y));
        SKPoint bars = new(at.X + NorthWidth, at.Y + 50);
        float room = width - NorthWidth - NumberRoom;
        DrawBar(canvas, bars, room, view.Scale, "m");
        DrawBar(canvas, new(bars.X, bars.Y + 84), room, view.Scale * Foot, "ft");
    });

    private static void DrawNorth(IMapCanvas canvas, SKPoint top)
    {
        const float HalfWidth = 26, Length = 108, Notch = 26, LetterRoom = 44;
        canvas.Write(new MapText("N", new(top.X, top.Y + LetterRoom / 2), 0, NorthStyle));
        SKPoint tip = new(top.X, top.Y + LetterRoom), notch = new(top.X, tip.Y + Length - Notch);
        SKPoint left = new(top.X - HalfWidth, tip.Y + Length), right = new(top.X + HalfWidth, tip.Y + Length);
        canvas.Fill(Shape.Polygon(tip, notch, left), Look.Ink);
        canvas.Stroke(Shape.Polygon(tip, right, notch, left), new Pen(Look.Ink, 3));
        canvas.Write(new MapText("grid north", new(top.X, tip.Y + Length + 26), 0, NumberStyle));
    }

    private static void DrawBar(IMapCanvas canvas, SKPoint at, float room, double perUnit, string unit)
    {
        double length = RoundNumber.NotAbove(room / perUnit);
        float part = (float)(length * perUnit / BarParts);
        for (int i = 0; i < BarParts; i++)
        {
            SKRect box = SKRect.Create(at.X + i * part, at.Y, part, BarHeight);
            canvas.Fill(Shape.Rectangle(box), i % 2 == 0 ? Look.Ink : Look.Paper);
            canvas.Stroke(Shape.Rectangle(box), new Pen(Look.Ink, 2.5f));
        }

        float middle = at.Y - 22;
        canvas.Write(new MapText("0", new(at.X + 6, middle), 0, NumberStyle));
        Number(length / 2, at.X + 2 * part, "");
        Number(length, at.X + 4 * part, $" {unit}");

        void Number(double value, float x, string suffix) => canvas.Write(new MapText(
            value.ToString("0.######", CultureInfo.InvariantCulture) + suffix, new(x, middle), 0, NumberStyle));
    }
}

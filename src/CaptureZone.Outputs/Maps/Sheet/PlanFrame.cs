using System.Globalization;
using System.Numerics;
using CaptureZone.Sites;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>The plan's frame with the site's coordinates along it, and crosses where they meet inside.</summary>
/// <param name="site">The site.</param>
/// <param name="view">Where places lie on the sheet.</param>
internal sealed class PlanFrame(SiteDocument site, PlanView view)
{
    /// <summary>Room that coordinates need on the left and below, units of the sheet.</summary>
    public const float Room = 104;

    /// <summary>Ticks are at least this far apart, units of the sheet.</summary>
    private const double TickSpacing = 210;

    private const float TickLength = 16;
    private const float CrossArm = 12;
    private const float NumberOffset = 26;
    private const float NameOffset = 74;

    private static readonly TextStyle NumberStyle = new(Look.SmallSize, Look.SoftInk);

    private readonly double _step =
        RoundNumber.NotBelow(TickSpacing / view.Scale / site.Frame.MetresPerUnit);

    /// <summary>Draws the crosses; they lie below everything but the zones' tints.</summary>
    /// <param name="canvas">Where to.</param>
    public void DrawCrosses(IMapCanvas canvas)
    {
        foreach ((_, float x) in Eastings())
        {
            foreach ((_, float y) in Northings())
            {
                canvas.Stroke(
                    new Shape(
                    [
                        new Trace([new(x - CrossArm, y), new(x + CrossArm, y)], false),
                        new Trace([new(x, y - CrossArm), new(x, y + CrossArm)], false),
                    ]),
                    Look.GridPen);
            }
        }
    }

    /// <summary>Draws frame, ticks, numbers and the names of the axes.</summary>
    /// <param name="canvas">Where to.</param>
    public void Draw(IMapCanvas canvas)
    {
        SKRect area = view.Area;
        foreach ((string number, float x) in Eastings())
        {
            canvas.Stroke(Shape.Line(new(x, area.Bottom), new(x, area.Bottom - TickLength)), Look.TickPen);
            canvas.Stroke(Shape.Line(new(x, area.Top), new(x, area.Top + TickLength)), Look.TickPen);
            canvas.Write(new MapText(number, new(x, area.Bottom + NumberOffset), 0, NumberStyle));
        }

        foreach ((string number, float y) in Northings())
        {
            canvas.Stroke(Shape.Line(new(area.Left, y), new(area.Left + TickLength, y)), Look.TickPen);
            canvas.Stroke(Shape.Line(new(area.Right, y), new(area.Right - TickLength, y)), Look.TickPen);
            canvas.Write(new MapText(number, new(area.Left - NumberOffset, y), -90, NumberStyle));
        }

        bool local = site.Coordinates.IsLocal;
        string unit = site.Coordinates.Unit;
        canvas.Write(new MapText($"{(local ? "Local x" : "Easting")}, {unit}", new(area.MidX, area.Bottom + NameOffset), 0, NumberStyle));
        canvas.Write(new MapText($"{(local ? "Local y" : "Northing")}, {unit}", new(area.Left - NameOffset, area.MidY), -90, NumberStyle));
        canvas.Stroke(Shape.Rectangle(area), Look.FramePen);
    }

    private IEnumerable<(string Number, float X)> Eastings() =>
        Ticks(site.Frame.SiteX(new Complex(view.Frame.MinX, 0)), site.Frame.SiteX(new Complex(view.Frame.MaxX, 0)), view.Area.Width)
            .Select(tick => (tick.Number, view.Area.Left + tick.At));

    private IEnumerable<(string Number, float Y)> Northings() =>
        Ticks(site.Frame.SiteY(new Complex(0, view.Frame.MinY)), site.Frame.SiteY(new Complex(0, view.Frame.MaxY)), view.Area.Height)
            .Select(tick => (tick.Number, view.Area.Bottom - tick.At));

    /// <summary>Round coordinates between two others, far enough from the frame's corners that their numbers fit.</summary>
    private IEnumerable<(string Number, float At)> Ticks(double low, double high, float length)
    {
        int decimals = Math.Max(0, -(int)Math.Floor(Math.Log10(_step)));
        string format = string.Create(CultureInfo.InvariantCulture, $"F{decimals}");
        for (double k = Math.Ceiling(low / _step); k * _step <= high; k++)
        {
            string number = (k * _step).ToString(format, CultureInfo.InvariantCulture);
            float at = (float)((k * _step - low) / (high - low) * length), half = Lettering.Width(number, NumberStyle) / 2;
            if (at >= half && at <= length - half)
            {
                yield return (number, at);
            }
        }
    }
}

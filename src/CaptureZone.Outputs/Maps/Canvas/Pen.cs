using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>How a line is drawn.</summary>
/// <param name="Color">Its colour.</param>
/// <param name="Width">Its width, units of the sheet.</param>
/// <param name="Dash">Lengths on and off in turn; empty: solid.</param>
internal sealed record Pen(SKColor Color, float Width, params float[] Dash);

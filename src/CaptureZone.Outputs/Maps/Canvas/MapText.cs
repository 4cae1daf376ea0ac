using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>How letters look.</summary>
/// <param name="Size">Size of the type, units of the sheet.</param>
/// <param name="Color">Colour.</param>
/// <param name="Bold">Whether bold.</param>
/// <param name="Halo">Whether in a halo of paper colour.</param>
internal sealed record TextStyle(float Size, SKColor Color, bool Bold = false, bool Halo = false);

/// <summary>One line of text on the sheet.</summary>
/// <param name="Text">The text.</param>
/// <param name="Centre">Middle of its box.</param>
/// <param name="Angle">Degrees clockwise.</param>
/// <param name="Style">How it looks.</param>
internal sealed record MapText(string Text, SKPoint Centre, float Angle, TextStyle Style)
{
    /// <summary>A line that begins at a place.</summary>
    /// <param name="text">The text.</param>
    /// <param name="x">Left end.</param>
    /// <param name="y">Middle of its height.</param>
    /// <param name="style">How it looks.</param>
    public static MapText From(string text, float x, float y, TextStyle style) =>
        new(text, new(x + Lettering.Width(text, style) / 2, y), 0, style);

    /// <summary>The box that it fills, without its halo.</summary>
    public LabelBox Box => new(Centre, Lettering.Width(Text, Style) / 2, Style.Size * Lettering.BoxHeight / 2, Angle);
}

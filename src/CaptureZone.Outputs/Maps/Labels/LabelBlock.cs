using System.Collections.Immutable;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Lines of text that belong together, one below the other.</summary>
/// <param name="Lines">The lines with their looks.</param>
internal sealed record LabelBlock(ImmutableArray<(string Text, TextStyle Style)> Lines)
{
    /// <summary>No label is wider than this: longer names are shortened.</summary>
    private const float Widest = 640;

    /// <summary>A label of one line.</summary>
    /// <param name="text">The text.</param>
    /// <param name="style">How it looks.</param>
    public static LabelBlock Of(string text, TextStyle style) => Of((text, style));

    /// <summary>A label of several lines; the longest are shortened.</summary>
    /// <param name="lines">The lines.</param>
    public static LabelBlock Of(params ReadOnlySpan<(string Text, TextStyle Style)> lines)
    {
        ImmutableArray<(string, TextStyle)>.Builder fitted = ImmutableArray.CreateBuilder<(string, TextStyle)>(lines.Length);
        foreach ((string text, TextStyle style) in lines)
        {
            fitted.Add((Lettering.Fitted(text, style, Widest), style));
        }

        return new(fitted.MoveToImmutable());
    }

    /// <summary>Half of its width, units of the sheet.</summary>
    public float HalfWidth { get; } = Lines.Max(line => Lettering.Width(line.Text, line.Style)) / 2;

    /// <summary>Half of its height, units of the sheet.</summary>
    public float HalfHeight { get; } = Lines.Sum(line => line.Style.Size) * Lettering.BoxHeight / 2;

    /// <summary>The box that it fills at a place.</summary>
    /// <param name="spot">The place.</param>
    public LabelBox At(LabelSpot spot) => new(spot.Centre, HalfWidth, HalfHeight, spot.Angle);

    /// <summary>Its lines at a place.</summary>
    /// <param name="spot">The place.</param>
    public IEnumerable<MapText> Texts(LabelSpot spot)
    {
        float down = -HalfHeight;
        foreach ((string text, TextStyle style) in Lines)
        {
            float height = style.Size * Lettering.BoxHeight;
            float aside = spot.Side * (Lettering.Width(text, style) / 2 - HalfWidth), turn = spot.Angle * MathF.PI / 180;
            SKPoint offset = Shape.Polar(down + height / 2, turn + MathF.PI / 2) + Shape.Polar(aside, turn);
            yield return new MapText(text, spot.Centre + offset, spot.Angle, style);
            down += height;
        }
    }
}

/// <summary>Where a label may stand.</summary>
/// <param name="Centre">Middle of the label.</param>
/// <param name="Angle">Degrees clockwise, -90 to 90: text is never upside down.</param>
/// <param name="LeaderFrom">Where a leader to the label begins; null: it stands beside its thing.</param>
/// <param name="Side">1 to the right of its thing, -1 to the left, else 0: its lines are flush with the thing.</param>
internal readonly record struct LabelSpot(SKPoint Centre, float Angle = 0, SKPoint? LeaderFrom = null, int Side = 0);

/// <summary>A label that wants a place.</summary>
/// <param name="Block">What it says.</param>
/// <param name="Spots">Where it may stand, best first.</param>
/// <param name="Optional">Whether it may be left out without a word: a value that stands elsewhere too.</param>
internal sealed record LabelRequest(LabelBlock Block, IEnumerable<LabelSpot> Spots, bool Optional = false);

/// <summary>A label with its place.</summary>
/// <param name="Block">What it says.</param>
/// <param name="Spot">Where it stands.</param>
internal sealed record PlacedLabel(LabelBlock Block, LabelSpot Spot)
{
    /// <summary>The box that it fills.</summary>
    public LabelBox Box => Block.At(Spot);

    /// <summary>Its leader, from the thing to the nearest place of the label; null when it has none.</summary>
    public (SKPoint From, SKPoint To)? Leader => Spot.LeaderFrom is { } from ? (from, Box.Nearest(from)) : null;
}

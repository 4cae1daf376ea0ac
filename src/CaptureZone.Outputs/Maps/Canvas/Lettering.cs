using System.Collections.Immutable;
using System.Reflection;
using System.Text;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>The letters of all maps: two faces of Inter, carried inside this assembly, so that no font need be installed.</summary>
internal static class Lettering
{
    /// <summary>Height of a line's box over the size of its type: from the top of accents to the foot of descenders.</summary>
    public const float BoxHeight = 1.1f;

    /// <summary>Distance of lines over the size of their type.</summary>
    public const float LineHeight = 1.3f;

    /// <summary>From the middle of a line's box down to its baseline, over the size: half of the height of Inter's capitals.</summary>
    public const float BaselineDrop = 0.364f;

    private const string Ellipsis = "...";

    /// <summary>More than fits on any line of a sheet; keeps long texts from costing time.</summary>
    private const int MostRunes = 300;

    private static readonly Lazy<ImmutableArray<SKTypeface>> Faces = new(Load);

    /// <summary>The face of a style.</summary>
    /// <param name="bold">Whether bold.</param>
    public static SKTypeface Face(bool bold) => Faces.Value[bold ? 1 : 0];

    /// <summary>A font for drawing; its outlines do not depend on the place, nor on hints for a screen.</summary>
    /// <param name="style">How it looks.</param>
    public static SKFont Font(TextStyle style) => new(Face(style.Bold), style.Size)
    {
        Edging = SKFontEdging.Antialias,
        Hinting = SKFontHinting.None,
        Subpixel = true,
        LinearMetrics = true,
    };

    /// <summary>Width of a line, units of the sheet.</summary>
    /// <param name="text">The text.</param>
    /// <param name="style">How it looks.</param>
    public static float Width(string text, TextStyle style)
    {
        using SKFont font = Font(style);
        return font.MeasureText(text);
    }

    /// <summary>The text as one line: spaces for control characters, shortened with "..." to a width.</summary>
    /// <param name="text">The text.</param>
    /// <param name="style">How it looks.</param>
    /// <param name="widest">The width, units of the sheet.</param>
    public static string Fitted(string text, TextStyle style, float widest)
    {
        Rune[] runes = [.. OneLine(text).EnumerateRunes().Take(MostRunes)];
        string fitted = string.Concat(runes);
        for (int kept = runes.Length - 1; kept > 0 && Width(fitted, style) > widest; kept--)
        {
            fitted = string.Concat(runes.Take(kept)).TrimEnd() + Ellipsis;
        }

        return fitted;
    }

    /// <summary>The text in lines no wider than a width, broken at spaces.</summary>
    /// <param name="text">The text.</param>
    /// <param name="style">How it looks.</param>
    /// <param name="widest">The width, units of the sheet.</param>
    public static ImmutableArray<string> Wrapped(string text, TextStyle style, float widest)
    {
        List<string> lines = [];
        foreach (string word in OneLine(text).Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            string longer = lines.Count == 0 ? word : $"{lines[^1]} {word}";
            if (lines.Count > 0 && Width(longer, style) <= widest)
            {
                lines[^1] = longer;
            }
            else
            {
                lines.Add(Fitted(word, style, widest));
            }
        }

        return [.. lines];
    }

    private static string OneLine(string text)
    {
        StringBuilder line = new(text.Length);
        foreach (Rune rune in text.EnumerateRunes())
        {
            line.Append((Rune.IsControl(rune) ? new Rune(' ') : rune).ToString());
        }

        return line.ToString();
    }

    private static ImmutableArray<SKTypeface> Load()
    {
        Assembly fonts = Assembly.Load(Bytes(typeof(Lettering).Assembly.GetManifestResourceStream("Inter")!));
        byte[] archive = Bytes(fonts.GetManifestResourceStream("!AvaloniaResources")!);
        return [FaceIn(archive, "/Inter-Regular.ttf"), FaceIn(archive, "/Inter-Bold.ttf")];
    }

    private static byte[] Bytes(Stream stream)
    {
        using (stream)
        {
            byte[] bytes = new byte[stream.Length];
            stream.ReadExactly(bytes);
            return bytes;
        }
    }

    /// <summary>The archive is: length of the index; version; count; for each file path, offset, size; then the files.</summary>
    private static SKTypeface FaceIn(byte[] archive, string file)
    {
        using BinaryReader reader = new(new MemoryStream(archive));
        int start = sizeof(int) + reader.ReadInt32();
        reader.ReadInt32();
        for (int count = reader.ReadInt32(); count > 0; count--)
        {
            string path = reader.ReadString();
            int offset = reader.ReadInt32(), size = reader.ReadInt32();
            if (path.EndsWith(file, StringComparison.Ordinal))
            {
                using SKData data = SKData.CreateCopy(archive.AsSpan(start + offset, size));
                return SKTypeface.FromData(data);
            }
        }

        throw new FileNotFoundException("The font is missing.", file);
    }
}

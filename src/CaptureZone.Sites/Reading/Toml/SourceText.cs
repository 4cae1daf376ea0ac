using System.Text;

namespace CaptureZone.Sites.Reading.Toml;

/// <summary>A file's text, and where in it an offset lies.</summary>
/// <param name="text">The text, without a byte order mark.</param>
internal sealed class SourceText(string text)
{
    /// <summary>The text.</summary>
    public string Text => text;

    /// <summary>Line and column of an offset, both from 1; the column counts characters, not bytes or half surrogates.</summary>
    /// <param name="offset">Offset in UTF-16 units; clamped to the text.</param>
    public (int Line, int Column) PlaceOf(int offset)
    {
        ReadOnlySpan<char> before = text.AsSpan(0, Math.Clamp(offset, 0, text.Length));
        int line = before.Count('\n') + 1;
        int column = 1;
        foreach (Rune _ in before[(before.LastIndexOf('\n') + 1)..].EnumerateRunes())
        {
            column++;
        }

        return (line, column);
    }

    /// <summary>The same text with another line in place of one of its lines.</summary>
    /// <param name="start">Where the line begins.</param>
    /// <param name="line">The other line.</param>
    public SourceText WithLine(int start, string line)
    {
        int end = text.IndexOf('\n', start);
        return new SourceText(string.Concat(text.AsSpan(0, start), line, end < 0 ? "" : text.AsSpan(end)));
    }

    /// <summary>What a part of the tree looks like in the text.</summary>
    /// <param name="node">The part.</param>
    public string Of(TomlNode node) => text[node.Start..Math.Min(node.End + 1, text.Length)].Trim();
}

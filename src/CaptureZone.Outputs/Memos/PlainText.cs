using System.Text;

namespace CaptureZone.Outputs.Memos;

/// <summary>Text that every writer can write: a file's names may hold characters that XML 1.0 forbids.</summary>
internal static class PlainText
{
    /// <summary>The text on one line: tabs and line ends become spaces, other control characters U+FFFD.</summary>
    /// <param name="text">Any text.</param>
    public static string OnOneLine(string text) => Clean(text.ReplaceLineEndings(" ").Replace('\t', ' '));

    /// <summary>Its lines, tabs kept, other control characters as U+FFFD.</summary>
    /// <param name="text">Any text.</param>
    public static string[] Lines(string text) =>
        [.. text.ReplaceLineEndings("\n").TrimEnd('\n').Split('\n').Select(Clean)];

    private static string Clean(string text)
    {
        StringBuilder clean = new(text.Length);
        foreach (Rune rune in text.EnumerateRunes())
        {
            clean.Append(IsWritable(rune) ? rune : Rune.ReplacementChar);
        }

        return clean.ToString();
    }

    /// <summary>XML 1.0 allows these, and no reader turns them into something else (section 2.2 of the recommendation).</summary>
    private static bool IsWritable(Rune rune) => rune.Value is '\t' || (!Rune.IsControl(rune) && rune.Value is not (0xFFFE or 0xFFFF));
}

using CaptureZone.Sites;

namespace CaptureZone.Cli;

/// <summary>Colours on a terminal.</summary>
internal static class Paint
{
    private const string Red = "\e[1;31m";
    private const string Yellow = "\e[1;33m";
    private const string Plain = "\e[0m";

    /// <summary>Colours the word that says how serious a complaint is.</summary>
    /// <param name="text">A complaint in the GNU form.</param>
    /// <param name="severity">How serious it is.</param>
    /// <param name="colours">Whether colours are wanted.</param>
    public static string Severity(string text, Severity severity, bool colours)
    {
        (string word, string colour) = severity == Sites.Severity.Error ? ("error:", Red) : ("warning:", Yellow);
        int at = text.IndexOf(word, StringComparison.Ordinal);
        return colours && at >= 0 ? $"{text[..at]}{colour}{word}{Plain}{text[(at + word.Length)..]}" : text;
    }
}

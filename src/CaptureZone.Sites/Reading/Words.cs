using System.Globalization;
using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading;

/// <summary>How complaints speak of what they found: always one line, the same in every culture.</summary>
internal static class Words
{
    /// <summary>Longer texts are cut here: a complaint is one line.</summary>
    private const int LongestQuote = 80;

    /// <summary>A text in quotes, on one line and not too long.</summary>
    /// <param name="text">The text.</param>
    public static string Quote(string text) => $"\"{Short(text)}\"";

    /// <summary>A text on one line and not too long.</summary>
    /// <param name="text">The text.</param>
    public static string Short(string text)
    {
        string line = string.Concat(text.Select(c => char.IsControl(c) ? ' ' : c)).Trim();
        return line.Length <= LongestQuote ? line : string.Concat(line.AsSpan(0, LongestQuote), "...");
    }

    /// <summary>A number, shortest form that reads back to it.</summary>
    /// <param name="value">The number.</param>
    public static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>A place.</summary>
    /// <param name="x">Easting.</param>
    /// <param name="y">Northing.</param>
    public static string Place(double x, double y) => string.Create(CultureInfo.InvariantCulture, $"({x:0.###}, {y:0.###})");

    /// <summary>What kind of value something is.</summary>
    /// <param name="node">The value.</param>
    public static string KindOf(TomlNode node) => node switch
    {
        TomlText text => $"the text {Quote(text.Value)}",
        TomlNumber number => $"the number {Number(number.Value)}",
        TomlBoolean => "true or false",
        TomlDate => "a date or time",
        TomlArray => "a list",
        _ => "a table",
    };
}

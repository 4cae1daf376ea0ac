using System.Text;

namespace CaptureZone.Sites.Units;

/// <summary>One spelling for every way of writing a unit: "feet^2/day", "ft²/d" and "ft2 / d" become "ft2/d".</summary>
internal static class UnitSpelling
{
    private static readonly Dictionary<string, string> Words = new (string Symbol, string[] Words)[]
    {
        ("m", ["metre", "metres", "meter", "meters"]),
        ("cm", ["centimetre", "centimetres", "centimeter", "centimeters"]),
        ("mm", ["millimetre", "millimetres", "millimeter", "millimeters"]),
        ("km", ["kilometre", "kilometres", "kilometer", "kilometers"]),
        ("in", ["inch", "inches"]),
        ("ft", ["foot", "feet"]),
        ("yd", ["yard", "yards"]),
        ("mi", ["mile", "miles"]),
        ("ftUS", ["ftus", "usft"]),
        ("ha", ["hectare", "hectares"]),
        ("acre", ["ac", "acres"]),
        ("L", ["l", "litre", "litres", "liter", "liters"]),
        ("gal", ["gallon", "gallons"]),
        ("s", ["sec", "second", "seconds"]),
        ("min", ["mins", "minute", "minutes"]),
        ("h", ["hr", "hrs", "hour", "hours"]),
        ("d", ["day", "days"]),
        ("yr", ["yrs", "year", "years"]),
    }.SelectMany(entry => entry.Words.Select(word => KeyValuePair.Create(word, entry.Symbol))).ToDictionary(StringComparer.Ordinal);

    /// <summary>The one spelling of a unit's text; a text that is no unit comes out as some text that is none either.</summary>
    /// <param name="text">A unit as a person writes it.</param>
    public static string Of(string text)
    {
        var spelling = new StringBuilder(text.Length);
        var word = new StringBuilder();
        bool spaced = false;
        foreach (char c in text)
        {
            if (char.IsAsciiLetter(c))
            {
                spelling.Append(spaced ? " " : string.Empty);
                word.Append(c);
                spaced = false;
                continue;
            }

            // White space counts only between two words: "US ft" is not "USft", but "m / d" is "m/d".
            spaced = char.IsWhiteSpace(c) && (spaced || word.Length > 0);
            Flush(word, spelling);
            spelling.Append(Folded(c));
        }

        Flush(word, spelling);
        return spelling.ToString();
    }

    private static void Flush(StringBuilder word, StringBuilder spelling)
    {
        string letters = word.ToString();
        spelling.Append(Words.GetValueOrDefault(letters, letters));
        word.Clear();
    }

    /// <summary>A character in its one form; null for those that carry no meaning.</summary>
    private static string? Folded(char c) => c switch
    {
        '\u00B2' => "2",
        '\u00B3' => "3",
        '\u00B5' or '\u03BC' => "u",
        '^' or '.' => null,
        _ when char.IsWhiteSpace(c) => null,
        _ => c.ToString(),
    };
}

using System.Globalization;

namespace CaptureZone.Sites.Units;

/// <summary>What is wrong with a quantity, in one line each: what was found, what is expected, how to mend it.</summary>
internal static class UnitProblem
{
    /// <summary>Number of the example where the text has none of its own.</summary>
    private const string ExampleNumber = "6.5";

    /// <summary>Characters of the user's text that are repeated; longer ones are cut.</summary>
    private const int LongestQuote = 40;

    /// <summary>The text does not start with a number.</summary>
    public static string NoNumber(string text, Dimension dimension) =>
        $"{Quote(text)} does not start with a number; {Expectation(ExampleNumber, dimension)}";

    /// <summary>The number has no unit.</summary>
    public static string NoUnit(string number, Dimension dimension) =>
        $"{Quote(number)} has no unit; {Expectation(number, dimension)}";

    /// <summary>The unit measures something else.</summary>
    public static string OtherDimension(string text, string number, Unit unit, Dimension dimension) =>
        $"{Quote(text)} is {DimensionText.Found(unit)}; {Expectation(number, dimension)}";

    /// <summary>The unit is not in the table.</summary>
    public static string UnknownUnit(string number, string written, Dimension dimension)
    {
        if (written[0] is ',' or '_' or '\'' or '.')
        {
            return $"{Quote(number + written)} is not read as a number; write it with '.' as the decimal sign and nothing between "
                + $"thousands, such as \"1234.5 {DimensionText.ExampleUnit(dimension)}\"";
        }

        string found = $"unknown unit {Quote(written)}";
        return NearestUnit.To(written, dimension) is { } nearest
            ? $"{found}; the nearest known is \"{nearest.Symbol}\": write \"{Cut(number)} {nearest.Symbol}\" if that is meant"
            : $"{found}; {Expectation(number, dimension)}";
    }

    /// <summary>No double holds the value.</summary>
    public static string TooLarge(string number, Unit unit) =>
        $"{Quote($"{number} {unit.Symbol}")} is too large to compute with; give a number that is physically possible";

    private static string Expectation(string number, Dimension dimension) => string.Create(
        CultureInfo.InvariantCulture,
        $"{DimensionText.Expected(dimension)} is expected, such as \"{Cut(number)} {DimensionText.ExampleUnit(dimension)}\"");

    private static string Quote(string text) => $"'{Cut(text)}'";

    /// <summary>The text on one line, and not longer than a line can bear.</summary>
    private static string Cut(string text)
    {
        string line = string.Concat(text.Select(c => char.IsControl(c) ? ' ' : c));
        return line.Length <= LongestQuote ? line : $"{line[..LongestQuote]}...";
    }
}

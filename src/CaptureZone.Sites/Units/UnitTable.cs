using System.Globalization;

namespace CaptureZone.Sites.Units;

/// <summary>
/// The one table of units: reads a quantity such as "6.5 L/s" into metres and days, exactly, the same under every culture.
/// </summary>
public static class UnitTable
{
    private static readonly Dictionary<string, Unit> BySpelling = UnitDefinitions.All
        .SelectMany(unit => unit.AlsoWritten.Prepend(unit.Symbol).Select(text => KeyValuePair.Create(UnitSpelling.Of(text), unit)))
        .ToDictionary(StringComparer.Ordinal);

    /// <summary>Every unit that is known.</summary>
    public static IReadOnlyList<Unit> Units => UnitDefinitions.All;

    /// <summary>The unit of a symbol, for writing a value in it: divide the value in metres and days by its factor.</summary>
    /// <param name="symbol">A symbol of the table, such as "gpm".</param>
    /// <exception cref="KeyNotFoundException">There is no such unit.</exception>
    public static Unit Named(string symbol) => BySpelling[UnitSpelling.Of(symbol)];

    /// <summary>Reads a number and its unit.</summary>
    /// <param name="text">Such as "18 m/d": a number with '.' as its decimal sign and an optional exponent, then a unit.</param>
    /// <param name="dimension">What it must measure.</param>
    /// <param name="value">The value in metres and days, the double nearest to the exact one; 0 when the text is refused.</param>
    /// <param name="problem">What was found, what is expected and how to mend it, in one line; empty when the text was read.</param>
    public static bool TryRead(string text, Dimension dimension, out double value, out string problem)
    {
        value = 0;
        string trimmed = text.Trim();
        int digits = QuantityText.NumberLength(trimmed);
        if (digits == 0)
        {
            problem = UnitProblem.NoNumber(trimmed, dimension);
            return false;
        }

        string number = trimmed[..digits];
        string written = trimmed[digits..].Trim();
        if (written.Length == 0)
        {
            problem = UnitProblem.NoUnit(number, dimension);
            return false;
        }

        if (!BySpelling.TryGetValue(UnitSpelling.Of(written), out Unit? unit))
        {
            problem = UnitProblem.UnknownUnit(number, written, dimension);
            return false;
        }

        if (!DimensionText.Fits(unit, dimension))
        {
            problem = UnitProblem.OtherDimension(trimmed, number, unit, dimension);
            return false;
        }

        return TryScale(number, unit, out value, out problem);
    }

    private static bool TryScale(string number, Unit unit, out double value, out string problem)
    {
        // Decided on the double first: an exponent that no double holds would make the exact number enormous.
        double rough = double.Parse(number, NumberStyles.Float, CultureInfo.InvariantCulture);
        value = double.IsFinite(rough) && rough != 0 ? (Exact.Parse(number) * unit.Measure.Factor).ToDouble() : rough;
        problem = double.IsFinite(value) ? string.Empty : UnitProblem.TooLarge(number, unit);
        value = double.IsFinite(value) ? value : 0;
        return problem.Length == 0;
    }
}

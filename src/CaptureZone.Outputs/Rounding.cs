using System.Globalization;

namespace CaptureZone.Outputs;

/// <summary>Rounding of every number that files for machines hold, so that the last bits of a calculation never show.</summary>
public static class Rounding
{
    /// <summary>Ten significant digits, as a format of .NET.</summary>
    private const string TenDigits = "E9";

    /// <summary>The number to ten significant digits; null for one that is not finite.</summary>
    /// <param name="value">The number.</param>
    public static double? TenFigures(double value)
    {
        const int LongestText = 24;
        Span<char> text = stackalloc char[LongestText];
        if (!double.IsFinite(value))
        {
            return null;
        }

        value.TryFormat(text, out int length, TenDigits, CultureInfo.InvariantCulture);
        double rounded = double.Parse(text[..length], CultureInfo.InvariantCulture);
        return rounded == 0 ? 0 : rounded;
    }

    /// <summary>The number to ten significant digits; null for none and for one that is not finite.</summary>
    /// <param name="value">The number.</param>
    public static double? TenFigures(double? value) => value is { } number ? TenFigures(number) : null;
}

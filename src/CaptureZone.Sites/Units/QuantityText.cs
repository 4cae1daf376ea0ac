namespace CaptureZone.Sites.Units;

/// <summary>Finds the number at the start of a quantity.</summary>
internal static class QuantityText
{
    /// <summary>
    /// Length of the number that a text starts with: a sign, digits with at most one '.', an exponent; 0 when there is none.
    /// </summary>
    /// <param name="text">The text, without white space before it.</param>
    public static int NumberLength(string text)
    {
        int start = text.Length > 0 && text[0] is '+' or '-' ? 1 : 0;
        int whole = SkipDigits(text, start);
        int end = whole < text.Length && text[whole] == '.' ? SkipDigits(text, whole + 1) : whole;
        bool hasDigits = end - start > (end > whole ? 1 : 0);
        return hasDigits ? SkipExponent(text, end) : 0;
    }

    private static int SkipExponent(string text, int at)
    {
        if (at >= text.Length || text[at] is not ('e' or 'E'))
        {
            return at;
        }

        int digits = at + 1 < text.Length && text[at + 1] is '+' or '-' ? at + 2 : at + 1;
        int end = SkipDigits(text, digits);
        return end > digits ? end : at;
    }

    private static int SkipDigits(string text, int at)
    {
        while (at < text.Length && char.IsAsciiDigit(text[at]))
        {
            at++;
        }

        return at;
    }
}

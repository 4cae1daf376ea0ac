using System.Globalization;
using System.Numerics;

namespace CaptureZone.Sites.Units;

/// <summary>
/// An exact ratio of whole numbers, so that units derive from each other without rounding and "12 in" is "1 ft" to the last bit.
/// </summary>
internal readonly struct Exact
{
    /// <summary>Bits of a quotient before it is rounded to the 53 of a double; the last one stands for all that follow.</summary>
    private const int QuotientBits = 62;

    private readonly BigInteger _numerator;
    private readonly BigInteger _denominator;

    private Exact(BigInteger numerator, BigInteger denominator)
    {
        BigInteger common = BigInteger.GreatestCommonDivisor(numerator, denominator);
        _numerator = numerator / common;
        _denominator = denominator / common;
    }

    /// <summary>The value that a decimal text stands for, without rounding.</summary>
    /// <param name="text">Digits with '.' and an exponent, both optional, such as "-1.5e-3".</param>
    public static Exact Parse(string text)
    {
        int e = text.AsSpan().IndexOfAny('e', 'E');
        string mantissa = e < 0 ? text : text[..e];
        int exponent = e < 0 ? 0 : int.Parse(text.AsSpan(e + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        int point = mantissa.IndexOf('.', StringComparison.Ordinal);
        int decimals = point < 0 ? 0 : mantissa.Length - point - 1;
        BigInteger digits = BigInteger.Parse(
            mantissa.Replace(".", string.Empty, StringComparison.Ordinal), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        int power = exponent - decimals;
        return power >= 0
            ? new Exact(digits * BigInteger.Pow(10, power), 1)
            : new Exact(digits, BigInteger.Pow(10, -power));
    }

    /// <summary>Product.</summary>
    public static Exact operator *(Exact a, Exact b) => new(a._numerator * b._numerator, a._denominator * b._denominator);

    /// <summary>Quotient.</summary>
    public static Exact operator /(Exact a, Exact b) => new(a._numerator * b._denominator, a._denominator * b._numerator);

    /// <summary>The nearest double, ties to even; infinite when the value is larger than any.</summary>
    public double ToDouble()
    {
        if (_numerator.IsZero)
        {
            return 0;
        }

        BigInteger numerator = BigInteger.Abs(_numerator);
        BigInteger denominator = _denominator;
        int shift = QuotientBits - (int)(numerator.GetBitLength() - denominator.GetBitLength());
        numerator <<= Math.Max(shift, 0);
        denominator <<= Math.Max(-shift, 0);
        var quotient = (ulong)BigInteger.DivRem(numerator, denominator, out BigInteger remainder);
        quotient |= remainder.IsZero ? 0UL : 1UL;
        return _numerator.Sign * Math.ScaleB(quotient, -shift);
    }

    /// <summary>A whole number, a decimal that ends, or else a fraction "a / b": never rounded.</summary>
    public override string ToString()
    {
        BigInteger rest = _denominator;
        int twos = Divisions(ref rest, 2);
        int fives = Divisions(ref rest, 5);
        if (!rest.IsOne)
        {
            return string.Create(CultureInfo.InvariantCulture, $"{_numerator} / {_denominator}");
        }

        int decimals = Math.Max(twos, fives);
        string digits = (BigInteger.Abs(_numerator) * BigInteger.Pow(10, decimals) / _denominator)
            .ToString(CultureInfo.InvariantCulture)
            .PadLeft(decimals + 1, '0');
        string sign = _numerator.Sign < 0 ? "-" : string.Empty;
        return decimals == 0 ? sign + digits : $"{sign}{digits[..^decimals]}.{digits[^decimals..]}";
    }

    private static int Divisions(ref BigInteger value, int divisor)
    {
        int count = 0;
        while ((value % divisor).IsZero)
        {
            value /= divisor;
            count++;
        }

        return count;
    }
}

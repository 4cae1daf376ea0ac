namespace CaptureZone.Sites.Units;

/// <summary>An exact amount of metres^<paramref name="Length"/> days^<paramref name="Time"/>: units derive from units by algebra.</summary>
/// <param name="Factor">How many.</param>
/// <param name="Length">Power of the metre.</param>
/// <param name="Time">Power of the day.</param>
internal readonly record struct Measure(Exact Factor, int Length, int Time)
{
    /// <summary>One metre.</summary>
    public static Measure Metre { get; } = new(Exact.Parse("1"), 1, 0);

    /// <summary>One day.</summary>
    public static Measure Day { get; } = new(Exact.Parse("1"), 0, 1);

    /// <summary>Product of two amounts.</summary>
    public static Measure operator *(Measure a, Measure b) => new(a.Factor * b.Factor, a.Length + b.Length, a.Time + b.Time);

    /// <summary>Quotient of two amounts.</summary>
    public static Measure operator /(Measure a, Measure b) => new(a.Factor / b.Factor, a.Length - b.Length, a.Time - b.Time);

    /// <summary>So many of an amount.</summary>
    public static Measure operator *(string count, Measure amount) => amount with { Factor = Exact.Parse(count) * amount.Factor };

    /// <summary>One of so many equal parts of an amount.</summary>
    public static Measure operator /(Measure amount, string count) => amount with { Factor = amount.Factor / Exact.Parse(count) };
}

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

    /// <summary>The first dimension that an amount of these powers measures.</summary>
    /// <exception cref="InvalidOperationException">Nothing in a site file has these powers.</exception>
    public Dimension Dimension => (Length, Time) switch
    {
        (1, 0) => Dimension.Length,
        (2, 0) => Dimension.Area,
        (0, 1) => Dimension.Time,
        (1, -1) => Dimension.Conductivity,
        (2, -1) => Dimension.Transmissivity,
        (3, -1) => Dimension.Rate,
        _ => throw new InvalidOperationException("a unit of the table measures no dimension"),
    };

    /// <summary>Product of two amounts.</summary>
    public static Measure operator *(Measure a, Measure b) => new(a.Factor * b.Factor, a.Length + b.Length, a.Time + b.Time);

    /// <summary>Quotient of two amounts.</summary>
    public static Measure operator /(Measure a, Measure b) => new(a.Factor / b.Factor, a.Length - b.Length, a.Time - b.Time);

    /// <summary>So many of an amount.</summary>
    public static Measure operator *(string count, Measure amount) => amount with { Factor = Exact.Parse(count) * amount.Factor };

    /// <summary>One of so many equal parts of an amount.</summary>
    public static Measure operator /(Measure amount, string count) => amount with { Factor = amount.Factor / Exact.Parse(count) };
}

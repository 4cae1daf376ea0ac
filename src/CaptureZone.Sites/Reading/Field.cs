namespace CaptureZone.Sites.Reading;

/// <summary>A key of a table as its reader declares it: one declaration for reading, checking and telling.</summary>
/// <param name="Key">The key.</param>
/// <param name="Label">What it is, in words for the memo; empty for what is no input of the calculation.</param>
/// <param name="Example">A value as it may be written, shown in complaints.</param>
internal sealed record Field(string Key, string Label, string Example)
{
    /// <summary>Whether the table cannot do without it.</summary>
    public bool Required { get; init; }

    /// <summary>Which values can be computed with.</summary>
    public Limit Limit { get; init; } = Limit.None;

    /// <summary>The example as a TOML value: numbers, dates and lists bare, all else in quotes.</summary>
    public string ExampleValue =>
        Example[0] == '[' || (char.IsAsciiDigit(Example[0]) && !Example.Contains(' ')) ? Example : $"\"{Example}\"";

    /// <summary>Which values are usual.</summary>
    public UsualRange? Usual { get; init; }
}

/// <summary>Which values can be computed with.</summary>
/// <param name="Holds">Whether a value can.</param>
/// <param name="Words">What a value must be.</param>
internal sealed record Limit(Func<double, bool> Holds, string Words)
{
    /// <summary>Any finite value.</summary>
    public static readonly Limit None = new(_ => true, "finite");

    /// <summary>Above 0.</summary>
    public static readonly Limit Positive = new(value => value > 0, "above 0");

    /// <summary>0 or more.</summary>
    public static readonly Limit NotNegative = new(value => value >= 0, "0 or more");

    /// <summary>Above 0, at most 1.</summary>
    public static readonly Limit Share = new(value => value is > 0 and <= 1, "above 0 and at most 1");

    /// <summary>1 or more.</summary>
    public static readonly Limit OneOrMore = new(value => value >= 1, "1 or more");

    /// <summary>A direction on the compass.</summary>
    public static readonly Limit Compass = new(value => value is >= 0 and <= 360, "0 to 360 degrees");
}

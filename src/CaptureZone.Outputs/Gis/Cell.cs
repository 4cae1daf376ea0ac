namespace CaptureZone.Outputs.Gis;

/// <summary>
/// One value of a feature: a text, a number, a yes or no, or nothing. An empty text and a number that is not finite are nothing.
/// </summary>
public readonly record struct Cell
{
    private Cell(string? text, double? number, bool? flag)
    {
        Text = text;
        Number = number;
        Flag = flag;
    }

    /// <summary>The text, if it is one.</summary>
    public string? Text { get; }

    /// <summary>The number to ten significant digits, if it is one; whole numbers as well.</summary>
    public double? Number { get; }

    /// <summary>The yes or no, if it is one.</summary>
    public bool? Flag { get; }

    /// <summary>Holds a text, or nothing.</summary>
    /// <param name="text">The text.</param>
    public static implicit operator Cell(string text) => new(text.Length > 0 ? text : null, null, null);

    /// <summary>Holds a number, or nothing.</summary>
    /// <param name="number">The number.</param>
    public static implicit operator Cell(double? number) => new(null, Rounding.TenFigures(number), null);

    /// <summary>Holds a yes or no.</summary>
    /// <param name="flag">The yes or no.</param>
    public static implicit operator Cell(bool flag) => new(null, null, flag);
}
